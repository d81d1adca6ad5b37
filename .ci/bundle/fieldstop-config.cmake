# For find_package(fieldstop): the target fieldstop::fieldstop, with the library that fits the part and the float ABI.
#
# The compiler itself is asked, with the flags of the toolchain file, of CMAKE_C_FLAGS and of add_compile_options before
# find_package. Where the flags that name the part come later, or the compiler has other options than GCC's and clang's, name the
# library: set(fieldstop_PART cortex-m4f) before find_package. Compiling with flags for another part stops with a message.

get_filename_component(fieldstop_root "${CMAKE_CURRENT_LIST_DIR}/.." ABSOLUTE)

if(NOT fieldstop_PART)
    set(fieldstop_language C)
    if(NOT CMAKE_C_COMPILER)
        set(fieldstop_language CXX)
    endif()
    separate_arguments(fieldstop_flags UNIX_COMMAND
        "${CMAKE_${fieldstop_language}_COMPILER_ARG1} ${CMAKE_${fieldstop_language}_FLAGS}")
    get_directory_property(fieldstop_options COMPILE_OPTIONS)
    # What depends on the target or the configuration is not known yet.
    list(FILTER fieldstop_options EXCLUDE REGEX "\\$<")
    if(CMAKE_${fieldstop_language}_COMPILER_TARGET)
        list(APPEND fieldstop_options "--target=${CMAKE_${fieldstop_language}_COMPILER_TARGET}")
    endif()
    execute_process(
        COMMAND ${CMAKE_${fieldstop_language}_COMPILER} ${fieldstop_flags} ${fieldstop_options} -x c -E -P
            -DFIELDSTOP_NAME_PART "${fieldstop_root}/include/fieldstop_part.h"
        OUTPUT_VARIABLE fieldstop_named ERROR_VARIABLE fieldstop_said RESULT_VARIABLE fieldstop_status)
    string(STRIP "${fieldstop_named}" fieldstop_named)
    if(NOT fieldstop_status EQUAL 0)
        if(fieldstop_said MATCHES "#error \"?(fieldstop: [^\"\n]*)")
            set(fieldstop_said "${CMAKE_MATCH_1}")
        endif()
        set(fieldstop_FOUND FALSE)
        set(fieldstop_NOT_FOUND_MESSAGE "${fieldstop_said}. Asked: ${CMAKE_${fieldstop_language}_COMPILER} \
${CMAKE_${fieldstop_language}_FLAGS} ${fieldstop_options}. Or name the library: set(fieldstop_PART …) before find_package")
        return()
    endif()
endif()

# From the variable above, or what the compiler says.
if(fieldstop_PART)
    set(fieldstop_named "${fieldstop_PART}")
endif()
set(fieldstop_folder "${fieldstop_root}/lib/${fieldstop_named}")
if(NOT EXISTS "${fieldstop_folder}/libfieldstop.a")
    file(GLOB fieldstop_parts RELATIVE "${fieldstop_root}/lib" "${fieldstop_root}/lib/*")
    string(REPLACE ";" ", " fieldstop_parts "${fieldstop_parts}")
    set(fieldstop_FOUND FALSE)
    set(fieldstop_NOT_FOUND_MESSAGE "fieldstop: no library ${fieldstop_named}; there are ${fieldstop_parts}")
    return()
endif()

if(NOT TARGET fieldstop::fieldstop)
    add_library(fieldstop::fieldstop STATIC IMPORTED)
    set_target_properties(fieldstop::fieldstop PROPERTIES IMPORTED_LOCATION "${fieldstop_folder}/libfieldstop.a"
        INTERFACE_INCLUDE_DIRECTORIES "${fieldstop_root}/include")
    if(CMAKE_C_COMPILER_ID MATCHES "GNU|Clang" OR CMAKE_CXX_COMPILER_ID MATCHES "GNU|Clang")
        set_property(TARGET fieldstop::fieldstop PROPERTY INTERFACE_COMPILE_OPTIONS
            "$<$<COMPILE_LANGUAGE:C,CXX>:SHELL:-include \"${fieldstop_folder}/fieldstop_check.h\">")
    endif()
    message(STATUS "fieldstop: the library for ${fieldstop_named}")
endif()
