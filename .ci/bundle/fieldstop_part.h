/*
 * Which library of the bundle fits the part and the float ABI that the compiler builds for. It stops the compiler where none
 * does. A build system asks for the folder's name:
 *
 *     arm-none-eabi-gcc -mcpu=cortex-m0 -E -P -DFIELDSTOP_NAME_PART include/fieldstop_part.h
 */
#ifndef FIELDSTOP_PART_H
#define FIELDSTOP_PART_H

#if defined(__AVR__)
#if !defined(__AVR_ARCH__)
#error "fieldstop: this compiler does not tell the AVR family: name the part with -mmcu="
#elif __AVR_ARCH__ == 5
#define FIELDSTOP_PART_AVR5
#define FIELDSTOP_PART avr5
#elif __AVR_ARCH__ == 51
#define FIELDSTOP_PART_AVR51
#define FIELDSTOP_PART avr51
#elif __AVR_ARCH__ == 6
#define FIELDSTOP_PART_AVR6
#define FIELDSTOP_PART avr6
#else
#error "fieldstop: no library for this AVR family. There are avr5, avr51 and avr6 (ATmega with 16 KB and more); name the part with -mmcu=, or build one from the sources with .ci/archive"
#endif

#elif defined(__riscv)
#if __riscv_xlen != 32 || !defined(__riscv_mul) || !defined(__riscv_compressed) || defined(__riscv_32e)
#error "fieldstop: no library for this RISC-V. There is rv32imc: compile with -march=rv32imc or more (rv32imac), or build one from the sources with .ci/archive"
#elif !defined(__riscv_float_abi_soft)
#error "fieldstop: no library for this float ABI. The one for RISC-V passes floats in integer registers: compile with -mabi=ilp32, or build one from the sources with .ci/archive"
#else
#define FIELDSTOP_PART_RV32IMC
#define FIELDSTOP_PART rv32imc
#endif

#elif defined(__ARM_ARCH)
#if !defined(__ARM_ARCH_PROFILE) || __ARM_ARCH_PROFILE != 'M'
#error "fieldstop: no library for this ARM core. There are libraries for Cortex-M: name the core with -mcpu=cortex-m4, say, and -mthumb; or build one from the sources with .ci/archive"
#elif defined(__ARM_BIG_ENDIAN)
#error "fieldstop: no library for big-endian parts: build one from the sources with .ci/archive"
#elif __ARM_ARCH_ISA_THUMB == 1
#define FIELDSTOP_PART_CORTEX_M0
#define FIELDSTOP_PART cortex-m0
#elif defined(__ARM_PCS_VFP)
#if !(__ARM_FP & 4)
#error "fieldstop: no library for -mfloat-abi=hard without an FPU: name it with -mfpu=, or compile with -mfloat-abi=soft"
#elif __ARM_ARCH >= 8
#define FIELDSTOP_PART_CORTEX_M33F
#define FIELDSTOP_PART cortex-m33f
#elif __ARM_FP & 8
#define FIELDSTOP_PART_CORTEX_M7
#define FIELDSTOP_PART cortex-m7
#else
#define FIELDSTOP_PART_CORTEX_M4F
#define FIELDSTOP_PART cortex-m4f
#endif
#elif __ARM_ARCH >= 8
#define FIELDSTOP_PART_CORTEX_M33
#define FIELDSTOP_PART cortex-m33
#elif defined(__ARM_FEATURE_DSP)
#define FIELDSTOP_PART_CORTEX_M4
#define FIELDSTOP_PART cortex-m4
#else
#define FIELDSTOP_PART_CORTEX_M3
#define FIELDSTOP_PART cortex-m3
#endif

#else
#error "fieldstop: no library for this compiler's target. There are libraries for Cortex-M, RISC-V RV32IMC and AVR: set the cross compiler (in CMake, a toolchain file); for a desktop, build and install from the sources with CMake"
#endif

#endif

#ifdef FIELDSTOP_NAME_PART
FIELDSTOP_PART
#endif
