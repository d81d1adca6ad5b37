/*
 * fieldstop @VERSION@: telescope optics readouts for firmware, in fixed point and in float.
 *
 * Made from src/capi of the crate `fieldstop`: do not edit.
 *
 * Contents, each under a line of dashes:
@CONTENTS@ *
 * CAUTION. Never look at or near the Sun through a telescope without a full-aperture filter made for
 * it; nothing that this library computes says that it is safe. Moving mounts and high eyepieces can
 * hurt too. The makers' instructions and local rules come first.
 *
 * Forms. Each readout comes in up to three forms:
 *     fieldstop_<name>_fx     integers, for a part without FPU
 *     fieldstop_<name>_f32    float, computed in float throughout
 *     fieldstop_<name>_f64    double
 * Define FIELDSTOP_NO_FLOAT to leave out the prototypes of the last two; those of _f64 are absent on AVR
 * in any case.
 *
 * Units. A name ends in its unit:
 *     _um      micrometres          _mm        millimetres
 *     _nm      nanometres           _mas       milliarcseconds
 *     _uas     microarcseconds      _arcsec    arcseconds
 *     _q16     unsigned Q16.16: 65536 is 1     _milli     thousandths of a plain number
 *     _mmag    millimagnitudes      _mag       magnitudes
 *     _ms _us  milli-, microseconds _s         seconds
 *     _mk      millikelvin          _k         kelvin
 *     _ppb     parts per billion    _ppm       parts per million
 *     _n7      refractive index times 10^7: 15168000 is 1.5168
 *     _day_ms  milliseconds of a circle of 24 hours
 *     _bam     binary angle: 2^32 is one turn  _deg       degrees
 *     _per_mm, _per_s and the like divide the unit before them.
 * The float forms take millimetres for _um, micrometres for _nm (but wavelengths and errors of the
 * wavefront stay in nanometres), metres, _m, for a fixed _mm, arcseconds for _mas and _uas, plain
 * numbers for _q16, _n7 and _ppm, magnitudes for _mmag, degrees for _bam.
 *
 * Ranges. A fixed argument may be anything that its type holds, but for what the function's comment
 * says. A float argument is finite and at most 2^32 in magnitude, and at least 2^-32 where zero is
 * refused, but for what the comment says.
 *
 * Text. The functions fieldstop_text_... write into `text`, an array of `capacity` bytes, in `style`, one
 * of the ready ones or your own, and put the length in bytes into `length`; no zero byte ends it.
 * `readout` is one that fieldstop_visual_readout_compute or fieldstop_camera_readout_compute has filled.
 * No room: `text` is as it was.
 *
 * Errors. A fixed argument is read as exact and the result is the exact value of the formula, rounded
 * to nearest. "Error" is the greatest distance from that exact value over the whole range: in units of
 * the last place of a fixed result (LSB), in units in the last place of a float result (ulp), or as
 * said. A fixed result is the same on every machine, bit for bit.
 *
 * Status. Each readout returns a fieldstop_status: 0 is success. Otherwise FIELDSTOP_CAUSE gives the
 * cause and FIELDSTOP_ARGUMENT the position of the offending argument, counted from 1, a pointer as
 * one; 0 where no single argument is to blame. On any status but 0 nothing is written. The order of
 * checks is fixed: null pointers, then the arguments from left to right, then the result. No result
 * is wrapped or saturated. Numbers of causes never change; treat one that you do not know as an error.
 *
 * Reentrancy. No function keeps state, allocates, locks, loops without a bound or reads past what it
 * was given: all may be called from an interrupt and from several threads.
 *
 * AVR. The library takes no RAM. Its constants are in program memory, and every style and every table
 * of labels is read from there: those that functions below give, and your own, which you declare with
 * PROGMEM, the table of pointers as well as each text. The text of a cause is there too: print it with
 * avr-libc's functions in _P. All else that a pointer goes to is in RAM as usual.
 */
#ifndef FIELDSTOP_H
#define FIELDSTOP_H

#include <stddef.h>
#include <stdint.h>

/* The version of this header; fieldstop_version tells that of the library. */
#define FIELDSTOP_VERSION_MAJOR @MAJOR@
#define FIELDSTOP_VERSION_MINOR @MINOR@
#define FIELDSTOP_VERSION_PATCH @PATCH@
#define FIELDSTOP_VERSION                                                                          \
    (FIELDSTOP_VERSION_MAJOR * 65536L + FIELDSTOP_VERSION_MINOR * 256L + FIELDSTOP_VERSION_PATCH)

/* The cause in a status, one of the causes below, and the position of the offending argument. */
#define FIELDSTOP_CAUSE(status) ((uint8_t)((status)&0xFFu))
#define FIELDSTOP_ARGUMENT(status) ((uint8_t)((status) >> 8))

/* Compilers that can do so warn where a status is ignored. */
#if defined(__cplusplus) && __cplusplus >= 201703L
#define FIELDSTOP_CHECKED [[nodiscard]]
#elif defined(__GNUC__)
#define FIELDSTOP_CHECKED __attribute__((warn_unused_result))
#else
#define FIELDSTOP_CHECKED
#endif

/*
 * A library of another ABI does not link: `undefined reference to fieldstop_abi_...`. Take the header and the
 * library from one release. On a part a note asks for it that is never loaded; no more than the empty function
 * that it names stands in the image. Where there are shared libraries, a word among the debugging data asks,
 * which a linker that strips (-s) does not see. Define FIELDSTOP_NO_ABI_CHECK where a linker script refuses
 * the section.
 */
#if defined(__GNUC__) && defined(__ELF__) && !defined(FIELDSTOP_NO_ABI_CHECK)
#ifdef __unix__
__asm__(".pushsection .debug_fieldstop,\"\"\n\t.long fieldstop_abi_1\n\t.popsection");
#else
__asm__(".pushsection .note.fieldstop,\"\",%note\n\t.balign 4\n\t.long 10, 4, 1\n\t.asciz \"fieldstop\"\n\t"
        ".balign 4\n\t.long fieldstop_abi_1\n\t.popsection");
#endif
#endif

#ifdef __cplusplus
extern "C" {
#endif

@BODY@#ifdef __cplusplus
} /* extern "C" */
#endif

#endif /* FIELDSTOP_H */
