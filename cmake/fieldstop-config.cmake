# For find_package(fieldstop): the targets fieldstop::static and fieldstop::shared, and fieldstop::fieldstop, which is
# the shared one where BUILD_SHARED_LIBS is on and there is one, and else the static one.
#
# Works beside the library in an install prefix, and from a build tree, whose folders CMakeLists.txt sets beforehand.

if(NOT fieldstop_INCLUDE_DIR)
    get_filename_component(fieldstop_prefix "${CMAKE_CURRENT_LIST_DIR}/../../.." ABSOLUTE)
    set(fieldstop_INCLUDE_DIR "${fieldstop_prefix}/include")
    set(fieldstop_LIBRARY_DIRS "${fieldstop_prefix}/lib/${CMAKE_LIBRARY_ARCHITECTURE}" "${fieldstop_prefix}/lib"
        "${fieldstop_prefix}/lib64" "${fieldstop_prefix}/bin")
endif()

find_library(fieldstop_STATIC_LIBRARY NAMES libfieldstop.a fieldstop.lib PATHS ${fieldstop_LIBRARY_DIRS} NO_DEFAULT_PATH)
find_library(fieldstop_SHARED_LIBRARY NAMES libfieldstop.so libfieldstop.dylib fieldstop.dll PATHS ${fieldstop_LIBRARY_DIRS}
    NO_DEFAULT_PATH)

if(NOT EXISTS "${fieldstop_INCLUDE_DIR}/fieldstop.h" OR NOT (fieldstop_STATIC_LIBRARY OR fieldstop_SHARED_LIBRARY))
    set(fieldstop_FOUND FALSE)
    set(fieldstop_NOT_FOUND_MESSAGE
        "no header in ${fieldstop_INCLUDE_DIR}, or no library in ${fieldstop_LIBRARY_DIRS}: install it by `cmake --install`")
    return()
endif()

if(fieldstop_STATIC_LIBRARY AND NOT TARGET fieldstop::static)
    add_library(fieldstop::static STATIC IMPORTED)
    set_target_properties(fieldstop::static PROPERTIES IMPORTED_LOCATION "${fieldstop_STATIC_LIBRARY}"
        INTERFACE_INCLUDE_DIRECTORIES "${fieldstop_INCLUDE_DIR}")
    # What Rust's standard library asks of the system.
    if(WIN32)
        set_property(TARGET fieldstop::static PROPERTY INTERFACE_LINK_LIBRARIES ws2_32 userenv ntdll bcrypt)
    else()
        find_package(Threads REQUIRED)
        set_property(TARGET fieldstop::static PROPERTY INTERFACE_LINK_LIBRARIES Threads::Threads ${CMAKE_DL_LIBS} m)
    endif()
endif()

if(fieldstop_SHARED_LIBRARY AND NOT TARGET fieldstop::shared)
    add_library(fieldstop::shared SHARED IMPORTED)
    set_target_properties(fieldstop::shared PROPERTIES IMPORTED_LOCATION "${fieldstop_SHARED_LIBRARY}"
        INTERFACE_INCLUDE_DIRECTORIES "${fieldstop_INCLUDE_DIR}")
endif()

if(NOT TARGET fieldstop::fieldstop)
    add_library(fieldstop::fieldstop INTERFACE IMPORTED)
    if(TARGET fieldstop::shared AND (BUILD_SHARED_LIBS OR NOT TARGET fieldstop::static))
        set_property(TARGET fieldstop::fieldstop PROPERTY INTERFACE_LINK_LIBRARIES fieldstop::shared)
    else()
        set_property(TARGET fieldstop::fieldstop PROPERTY INTERFACE_LINK_LIBRARIES fieldstop::static)
    endif()
endif()
