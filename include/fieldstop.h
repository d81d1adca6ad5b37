/*
 * fieldstop 0.1.0: telescope optics readouts for firmware, in fixed point and in float.
 *
 * Made from src/capi of the crate `fieldstop`: do not edit.
 *
 * Contents, each under a line of dashes:
 * - What can go wrong. The numbers are frozen: they are the `fieldstop_status` of the C
 *   interface.
 * - The quantities of the fixed forms, each an integer with its unit in its name.
 * - Field of view: what the focal lengths, the eyepiece and the sensor show of the sky.
 * - Resolution: how fine a telescope shows, and how far the air, the obstruction and the
 *   wavefront let it.
 * - Light: what the mirrors, the glass and the hole in the middle leave of it, and the
 *   magnitudes that follow.
 * - Imaging: how a sensor samples the sky, how large a target falls on it, and what a focal
 *   ratio does to the exposure.
 * - Focus: how deep it is, what a miss costs, and how far heat, a near object and the edge of
 *   the field move it.
 * - Layout of mirrors and tube: how large the mirrors are and where they stand, what they leave
 *   of the light, and what the tube needs around it.
 * - Colour: what a single lens does to it, and what a pair of two glasses leaves.
 * - Motion: how the sky turns past a telescope, how long a star stays in the field or on a
 *   pixel, and what an altazimuth mount has to do.
 * - The Sun: where it stands, how far from it a telescope points, and how much of its light an
 *   aperture collects.
 * - Equipment as plain structs in fixed units, and all readouts of one screen in one call.
 * - The stored record: equipment, observers and sites with their names, as bytes in EEPROM or
 *   flash.
 * - Quantities as characters of a display: integers only, into a buffer of the caller's.
 * - What a person types on a keypad or sends over a line, back to a quantity: integers only,
 *   correctly rounded.
 *
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
#define FIELDSTOP_VERSION_MAJOR 0
#define FIELDSTOP_VERSION_MINOR 1
#define FIELDSTOP_VERSION_PATCH 0
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

/* --------------------------------------------------------------------------------------------------
   What can go wrong. The numbers are frozen: they are the `fieldstop_status` of the C
   interface. */

/** Cause: a pointer is null. */
#define FIELDSTOP_NULL_POINTER 1
/** Cause: zero where the quantity must exist. */
#define FIELDSTOP_ZERO 2
/** Cause: outside the documented range. */
#define FIELDSTOP_OUT_OF_RANGE 3
/** Cause: a float argument is infinite or not a number. */
#define FIELDSTOP_NOT_FINITE 4
/** Cause: the result does not fit its type. */
#define FIELDSTOP_OVERFLOW 5
/** Cause: it does not fit its width or buffer. */
#define FIELDSTOP_NO_ROOM 6
/** Cause: not defined or not known here. */
#define FIELDSTOP_UNDEFINED 7
/** Cause: never reached: a star or a place of the sky that never comes to what was asked about. */
#define FIELDSTOP_NEVER_REACHED 8
/** Cause: never left: a star or a place of the sky that stays in what was asked about, all around the pole. */
#define FIELDSTOP_NEVER_LEFT 9
/** Cause: there is no good record. */
#define FIELDSTOP_NO_RECORD 10
/** Cause: the record is of a newer version. */
#define FIELDSTOP_NEWER_RECORD 11
/** Cause: the storage could not be read or written. */
#define FIELDSTOP_STORAGE 12

/**
 * 0 on success; otherwise the cause in the low byte, and in the high byte the position of the offending argument
 * counted from 1, or 0 where no single argument is to blame.
 */
typedef uint16_t fieldstop_status;

/**
 * Gives a static English sentence for the cause in a status; never null.
 *
 * Success and causes that this version does not know have a sentence too. On AVR it is in program memory (PGM_P).
 */
const char *fieldstop_cause_text(fieldstop_status status);

/** Gives the version of the library: major times 65536 plus minor times 256 plus patch. */
uint32_t fieldstop_version(void);

/** Does nothing; that it is there says that the library has ABI 1, so that a header of another ABI does not link. */
void fieldstop_abi_1(void);

/* --------------------------------------------------------------------------------------------------
   The quantities of the fixed forms, each an integer with its unit in its name. */

/**
 * Gives the binary angle of milliarcseconds, whole turns dropped.
 *
 * 2^32 a / 1296000000.
 * Ranges: angle_mas any value.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_bam_from_mas_fx(int32_t angle_mas,
                                           uint32_t *angle_bam);

/**
 * Gives the milliarcseconds of a binary angle, under 1296000000.
 *
 * 1296000000 b / 2^32; what rounds to a whole turn is 0.
 * Ranges: angle_bam any value.
 * Error: at most 0.5 LSB, on the circle.
 * Statuses: null pointer.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_mas_from_bam_fx(uint32_t angle_bam,
                                           uint32_t *angle_mas);

/**
 * Gives the milliarcseconds of a binary angle either side of zero.
 *
 * 1296000000 b / 2^32.
 * Ranges: angle_bam any value.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_signed_mas_from_bam_fx(int32_t angle_bam,
                                                  int32_t *angle_mas);

/**
 * Gives the binary angle of milliseconds on a circle of 24 hours.
 *
 * 2^32 t / 86400000.
 * Ranges: time_day_ms under 86400000.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_bam_from_day_ms_fx(uint32_t time_day_ms,
                                              uint32_t *angle_bam);

/**
 * Gives the milliseconds on a circle of 24 hours of a binary angle, under 86400000.
 *
 * 86400000 b / 2^32; what rounds to a whole day is 0.
 * Ranges: angle_bam any value.
 * Error: at most 0.5 LSB, on the circle.
 * Statuses: null pointer.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_day_ms_from_bam_fx(uint32_t angle_bam,
                                              uint32_t *time_day_ms);

/**
 * Gives the thousandths of a Q16.16 number.
 *
 * 1000 x.
 * Ranges: number_q16 any value.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_milli_from_q16_fx(uint32_t number_q16,
                                             uint32_t *number_milli);

/**
 * Gives the Q16.16 number of thousandths.
 *
 * m / 1000.
 * Ranges: number_milli any value.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, overflow (65536 or more).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_q16_from_milli_fx(uint32_t number_milli,
                                             uint32_t *number_q16);

/* --------------------------------------------------------------------------------------------------
   Field of view: what the focal lengths, the eyepiece and the sensor show of the sky. */

/**
 * Gives the focal ratio (the N of f/N), in Q16.16.
 *
 * N = f / D.
 * Ranges: focal_length_um not 0; aperture_um not 0.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, overflow (65536 or more).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_focal_ratio_fx(uint32_t focal_length_um,
                                          uint32_t aperture_um,
                                          uint32_t *focal_ratio_q16);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the focal ratio (the N of f/N), a plain number.
 *
 * N = f / D.
 * Ranges: focal_length_mm 2^-32 to 2^32; aperture_mm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_focal_ratio_f32(float focal_length_mm,
                                           float aperture_mm,
                                           float *focal_ratio);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the focal ratio (the N of f/N), a plain number.
 *
 * N = f / D.
 * Ranges: focal_length_mm 2^-32 to 2^32; aperture_mm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_focal_ratio_f64(double focal_length_mm,
                                           double aperture_mm,
                                           double *focal_ratio);
#endif

/**
 * Gives the focal length of a telescope with an amplifier or a reducer in its beam, in micrometres.
 *
 * f k, where k is over 1 for a Barlow lens and under 1 for a reducer.
 * Ranges: focal_length_um not 0; amplification_q16 not 0.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, overflow (4294967296 um or more).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_amplified_focal_length_fx(uint32_t focal_length_um,
                                                     uint32_t amplification_q16,
                                                     uint32_t *amplified_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the focal length of a telescope with an amplifier or a reducer in its beam, in millimetres.
 *
 * f k, where k is over 1 for a Barlow lens and under 1 for a reducer.
 * Ranges: focal_length_mm 2^-32 to 2^32; amplification 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_amplified_focal_length_f32(float focal_length_mm,
                                                      float amplification,
                                                      float *amplified_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the focal length of a telescope with an amplifier or a reducer in its beam, in millimetres.
 *
 * f k, where k is over 1 for a Barlow lens and under 1 for a reducer.
 * Ranges: focal_length_mm 2^-32 to 2^32; amplification 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_amplified_focal_length_f64(double focal_length_mm,
                                                      double amplification,
                                                      double *amplified_mm);
#endif

/**
 * Gives how much a lens before the focus lengthens the focal length, in Q16.16.
 *
 * k = 1 - s' / f, a thin lens of focal length f with the image s' behind it.
 * Ranges: element_focal_length_um not 0; image_distance_um under f where f is positive.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, out of range, overflow (65536 or more).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_amplification_fx(int32_t element_focal_length_um,
                                            uint32_t image_distance_um,
                                            uint32_t *amplification_q16);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how much a lens before the focus lengthens the focal length, a plain number.
 *
 * k = 1 - s' / f, a thin lens of focal length f with the image s' behind it.
 * Ranges: element_focal_length_mm 2^-32 to 2^32, or -2^32 to -2^-32; image_distance_mm 0 to 2^32, and under
 * f where f is positive.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_amplification_f32(float element_focal_length_mm,
                                             float image_distance_mm,
                                             float *amplification);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how much a lens before the focus lengthens the focal length, a plain number.
 *
 * k = 1 - s' / f, a thin lens of focal length f with the image s' behind it.
 * Ranges: element_focal_length_mm 2^-32 to 2^32, or -2^32 to -2^-32; image_distance_mm 0 to 2^32, and under
 * f where f is positive.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_amplification_f64(double element_focal_length_mm,
                                             double image_distance_mm,
                                             double *amplification);
#endif

/**
 * Gives the magnification of a telescope with an eyepiece, in Q16.16.
 *
 * M = f / fe.
 * Ranges: focal_length_um not 0; eyepiece_um not 0.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, overflow (65536 or more).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_magnification_fx(uint32_t focal_length_um,
                                            uint32_t eyepiece_um,
                                            uint32_t *magnification_q16);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the magnification of a telescope with an eyepiece, a plain number.
 *
 * M = f / fe.
 * Ranges: focal_length_mm 2^-32 to 2^32; eyepiece_mm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_magnification_f32(float focal_length_mm,
                                             float eyepiece_mm,
                                             float *magnification);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the magnification of a telescope with an eyepiece, a plain number.
 *
 * M = f / fe.
 * Ranges: focal_length_mm 2^-32 to 2^32; eyepiece_mm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_magnification_f64(double focal_length_mm,
                                             double eyepiece_mm,
                                             double *magnification);
#endif

/**
 * Gives the diameter of the beam that leaves the eyepiece, in micrometres.
 *
 * D fe / f.
 * Ranges: aperture_um not 0; focal_length_um not 0; eyepiece_um not 0.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, overflow (4294967296 um or more).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_exit_pupil_fx(uint32_t aperture_um,
                                         uint32_t focal_length_um,
                                         uint32_t eyepiece_um,
                                         uint32_t *exit_pupil_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the diameter of the beam that leaves the eyepiece, in millimetres.
 *
 * D fe / f.
 * Ranges: aperture_mm 2^-32 to 2^32; focal_length_mm 2^-32 to 2^32; eyepiece_mm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_exit_pupil_f32(float aperture_mm,
                                          float focal_length_mm,
                                          float eyepiece_mm,
                                          float *exit_pupil_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the diameter of the beam that leaves the eyepiece, in millimetres.
 *
 * D fe / f.
 * Ranges: aperture_mm 2^-32 to 2^32; focal_length_mm 2^-32 to 2^32; eyepiece_mm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_exit_pupil_f64(double aperture_mm,
                                          double focal_length_mm,
                                          double eyepiece_mm,
                                          double *exit_pupil_mm);
#endif

/**
 * Gives the eyepiece focal length that gives an exit pupil, in micrometres.
 *
 * p f / D.
 * Ranges: exit_pupil_um not 0; focal_length_um not 0; aperture_um not 0.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, overflow (4294967296 um or more).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_eyepiece_for_exit_pupil_fx(uint32_t exit_pupil_um,
                                                      uint32_t focal_length_um,
                                                      uint32_t aperture_um,
                                                      uint32_t *eyepiece_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the eyepiece focal length that gives an exit pupil, in millimetres.
 *
 * p f / D.
 * Ranges: exit_pupil_mm 2^-32 to 2^32; focal_length_mm 2^-32 to 2^32; aperture_mm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_eyepiece_for_exit_pupil_f32(float exit_pupil_mm,
                                                       float focal_length_mm,
                                                       float aperture_mm,
                                                       float *eyepiece_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the eyepiece focal length that gives an exit pupil, in millimetres.
 *
 * p f / D.
 * Ranges: exit_pupil_mm 2^-32 to 2^32; focal_length_mm 2^-32 to 2^32; aperture_mm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_eyepiece_for_exit_pupil_f64(double exit_pupil_mm,
                                                       double focal_length_mm,
                                                       double aperture_mm,
                                                       double *eyepiece_mm);
#endif

/**
 * Gives the eyepiece focal length that gives a magnification, in micrometres.
 *
 * f / M.
 * Ranges: focal_length_um not 0; magnification_q16 not 0.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, overflow (4294967296 um or more).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_eyepiece_for_magnification_fx(uint32_t focal_length_um,
                                                         uint32_t magnification_q16,
                                                         uint32_t *eyepiece_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the eyepiece focal length that gives a magnification, in millimetres.
 *
 * f / M.
 * Ranges: focal_length_mm 2^-32 to 2^32; magnification 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_eyepiece_for_magnification_f32(float focal_length_mm,
                                                          float magnification,
                                                          float *eyepiece_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the eyepiece focal length that gives a magnification, in millimetres.
 *
 * f / M.
 * Ranges: focal_length_mm 2^-32 to 2^32; magnification 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_eyepiece_for_magnification_f64(double focal_length_mm,
                                                          double magnification,
                                                          double *eyepiece_mm);
#endif

/**
 * Gives the angle of sky inside the eyepiece's field stop, in milliarcseconds.
 *
 * 2 atan(s / 2f).
 * Ranges: field_stop_um not 0; focal_length_um not 0.
 * Error: at most 1 LSB.
 * Statuses: null pointer, zero.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_true_field_from_stop_fx(uint32_t field_stop_um,
                                                   uint32_t focal_length_um,
                                                   uint32_t *true_field_mas);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the angle of sky inside the eyepiece's field stop, in arcseconds.
 *
 * 2 atan(s / 2f).
 * Ranges: field_stop_mm 2^-32 to 2^32; focal_length_mm 2^-32 to 2^32.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_true_field_from_stop_f32(float field_stop_mm,
                                                    float focal_length_mm,
                                                    float *true_field_arcsec);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the angle of sky inside the eyepiece's field stop, in arcseconds.
 *
 * 2 atan(s / 2f).
 * Ranges: field_stop_mm 2^-32 to 2^32; focal_length_mm 2^-32 to 2^32.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_true_field_from_stop_f64(double field_stop_mm,
                                                    double focal_length_mm,
                                                    double *true_field_arcsec);
#endif

/**
 * Gives the angle of sky in an eyepiece that keeps straight lines straight, in milliarcseconds.
 *
 * 2 atan(tan(A/2) fe / f).
 * Ranges: apparent_field_mas not 0, under 648000000 (180 degrees); focal_length_um not 0; eyepiece_um not
 * 0.
 * Error: at most 1 LSB.
 * Statuses: null pointer, zero, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_true_field_rectilinear_fx(uint32_t apparent_field_mas,
                                                     uint32_t focal_length_um,
                                                     uint32_t eyepiece_um,
                                                     uint32_t *true_field_mas);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the angle of sky in an eyepiece that keeps straight lines straight, in arcseconds.
 *
 * 2 atan(tan(A/2) fe / f).
 * Ranges: apparent_field_arcsec 2^-32 to under 648000; focal_length_mm 2^-32 to 2^32; eyepiece_mm 2^-32 to
 * 2^32.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_true_field_rectilinear_f32(float apparent_field_arcsec,
                                                      float focal_length_mm,
                                                      float eyepiece_mm,
                                                      float *true_field_arcsec);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the angle of sky in an eyepiece that keeps straight lines straight, in arcseconds.
 *
 * 2 atan(tan(A/2) fe / f).
 * Ranges: apparent_field_arcsec 2^-32 to under 648000; focal_length_mm 2^-32 to 2^32; eyepiece_mm 2^-32 to
 * 2^32.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_true_field_rectilinear_f64(double apparent_field_arcsec,
                                                      double focal_length_mm,
                                                      double eyepiece_mm,
                                                      double *true_field_arcsec);
#endif

/**
 * Gives the angle of sky in an eyepiece that keeps equal angles equal, in milliarcseconds.
 *
 * A fe / f.
 * Ranges: apparent_field_mas not 0; focal_length_um not 0; eyepiece_um not 0.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, overflow (4294967296 mas or more).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_true_field_equidistant_fx(uint32_t apparent_field_mas,
                                                     uint32_t focal_length_um,
                                                     uint32_t eyepiece_um,
                                                     uint32_t *true_field_mas);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the angle of sky in an eyepiece that keeps equal angles equal, in arcseconds.
 *
 * A fe / f.
 * Ranges: apparent_field_arcsec 2^-32 to 2^32; focal_length_mm 2^-32 to 2^32; eyepiece_mm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_true_field_equidistant_f32(float apparent_field_arcsec,
                                                      float focal_length_mm,
                                                      float eyepiece_mm,
                                                      float *true_field_arcsec);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the angle of sky in an eyepiece that keeps equal angles equal, in arcseconds.
 *
 * A fe / f.
 * Ranges: apparent_field_arcsec 2^-32 to 2^32; focal_length_mm 2^-32 to 2^32; eyepiece_mm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_true_field_equidistant_f64(double apparent_field_arcsec,
                                                      double focal_length_mm,
                                                      double eyepiece_mm,
                                                      double *true_field_arcsec);
#endif

/**
 * Gives the angle of sky along one side of a sensor, in milliarcseconds.
 *
 * 2 atan(p n / 2f).
 * Ranges: pixel_nm not 0; pixel_count not 0; focal_length_um not 0.
 * Error: at most 1 LSB.
 * Statuses: null pointer, zero.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_frame_field_fx(uint32_t pixel_nm,
                                          uint32_t pixel_count,
                                          uint32_t focal_length_um,
                                          uint32_t *frame_mas);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the angle of sky along one side of a sensor, in arcseconds.
 *
 * 2 atan(p n / 2f).
 * Ranges: pixel_um 2^-32 to 2^32; pixel_count not 0, an integer; focal_length_mm 2^-32 to 2^32.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_frame_field_f32(float pixel_um,
                                           uint32_t pixel_count,
                                           float focal_length_mm,
                                           float *frame_arcsec);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the angle of sky along one side of a sensor, in arcseconds.
 *
 * 2 atan(p n / 2f).
 * Ranges: pixel_um 2^-32 to 2^32; pixel_count not 0, an integer; focal_length_mm 2^-32 to 2^32.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_frame_field_f64(double pixel_um,
                                           uint32_t pixel_count,
                                           double focal_length_mm,
                                           double *frame_arcsec);
#endif

/**
 * Gives the angle of sky to a millimetre at the focus, in milliarcseconds per millimetre.
 *
 * (1 rad) / f.
 * Ranges: focal_length_um not 0.
 * Error: at most 0.51 LSB.
 * Statuses: null pointer, zero, overflow (4294967296 mas per mm or more, f under 49 um).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_plate_scale_fx(uint32_t focal_length_um,
                                          uint32_t *plate_scale_mas_per_mm);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the angle of sky to a millimetre at the focus, in arcseconds per millimetre.
 *
 * (1 rad) / f.
 * Ranges: focal_length_mm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_plate_scale_f32(float focal_length_mm,
                                           float *plate_scale_arcsec_per_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the angle of sky to a millimetre at the focus, in arcseconds per millimetre.
 *
 * (1 rad) / f.
 * Ranges: focal_length_mm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_plate_scale_f64(double focal_length_mm,
                                           double *plate_scale_arcsec_per_mm);
#endif

/**
 * Gives the angle of sky to a pixel, in microarcseconds.
 *
 * (1 rad) p / f.
 * Ranges: pixel_nm not 0; focal_length_um not 0.
 * Error: at most 0.51 LSB.
 * Statuses: null pointer, zero, overflow (4294967296 uas or more).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_pixel_scale_fx(uint32_t pixel_nm,
                                          uint32_t focal_length_um,
                                          uint32_t *pixel_scale_uas);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the angle of sky to a pixel, in arcseconds.
 *
 * (1 rad) p / f.
 * Ranges: pixel_um 2^-32 to 2^32; focal_length_mm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_pixel_scale_f32(float pixel_um,
                                           float focal_length_mm,
                                           float *pixel_scale_arcsec);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the angle of sky to a pixel, in arcseconds.
 *
 * (1 rad) p / f.
 * Ranges: pixel_um 2^-32 to 2^32; focal_length_mm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_pixel_scale_f64(double pixel_um,
                                           double focal_length_mm,
                                           double *pixel_scale_arcsec);
#endif

/**
 * Gives the focal length that spreads a field over a width at the focus, in micrometres.
 *
 * x / (2 tan(t/2)).
 * Ranges: extent_um not 0; field_mas not 0, under 648000000 (180 degrees).
 * Error: at most 1 LSB.
 * Statuses: null pointer, zero, out of range, overflow (4294967296 um or more).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_focal_length_for_field_fx(uint32_t extent_um,
                                                     uint32_t field_mas,
                                                     uint32_t *focal_length_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the focal length that spreads a field over a width at the focus, in millimetres.
 *
 * x / (2 tan(t/2)).
 * Ranges: extent_mm 2^-32 to 2^32; field_arcsec 2^-32 to under 648000.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_focal_length_for_field_f32(float extent_mm,
                                                      float field_arcsec,
                                                      float *focal_length_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the focal length that spreads a field over a width at the focus, in millimetres.
 *
 * x / (2 tan(t/2)).
 * Ranges: extent_mm 2^-32 to 2^32; field_arcsec 2^-32 to under 648000.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_focal_length_for_field_f64(double extent_mm,
                                                      double field_arcsec,
                                                      double *focal_length_mm);
#endif

/**
 * Gives how many frames in a row cover a target.
 *
 * the smallest n with n frame - (n - 1) overlap >= target, at least 1.
 * Ranges: target_mas not 0; frame_mas not 0; overlap_mas under the frame.
 * Error: at most 0, it is exact.
 * Statuses: null pointer, zero, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_tiles_fx(uint32_t target_mas,
                                    uint32_t frame_mas,
                                    uint32_t overlap_mas,
                                    uint32_t *count);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how many frames in a row cover a target.
 *
 * the smallest n with n frame - (n - 1) overlap >= target, at least 1.
 * Ranges: target_arcsec 2^-32 to 2^32; frame_arcsec 2^-32 to 2^32; overlap_arcsec 0 to under the frame.
 * Error: at most 0, it is exact.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_tiles_f32(float target_arcsec,
                                     float frame_arcsec,
                                     float overlap_arcsec,
                                     uint32_t *count);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how many frames in a row cover a target.
 *
 * the smallest n with n frame - (n - 1) overlap >= target, at least 1.
 * Ranges: target_arcsec 2^-32 to 2^32; frame_arcsec 2^-32 to 2^32; overlap_arcsec 0 to under the frame.
 * Error: at most 0, it is exact.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_tiles_f64(double target_arcsec,
                                     double frame_arcsec,
                                     double overlap_arcsec,
                                     uint32_t *count);
#endif

/* --------------------------------------------------------------------------------------------------
   Resolution: how fine a telescope shows, and how far the air, the obstruction and the
   wavefront let it. */

/**
 * Gives Rayleigh's limit: the separation of two stars, one at the other's first dark ring, in microarcseconds.
 *
 * (j11 / pi) lambda / D = 1.2196699 lambda / D, j11 the first positive zero of J1 (Born and Wolf).
 * Ranges: aperture_um, wavelength_nm not 0.
 * Error: at most 0.51 LSB.
 * Statuses: null pointer, zero, overflow (the limit is over 4294 arcseconds).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_rayleigh_limit_fx(uint32_t aperture_um,
                                             uint32_t wavelength_nm,
                                             uint32_t *limit_uas);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives Rayleigh's limit: the separation of two stars, one at the other's first dark ring, in arcseconds.
 *
 * (j11 / pi) lambda / D = 1.2196699 lambda / D, j11 the first positive zero of J1 (Born and Wolf).
 * Ranges: aperture_mm, wavelength_nm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_rayleigh_limit_f32(float aperture_mm,
                                              float wavelength_nm,
                                              float *limit_arcsec);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives Rayleigh's limit: the separation of two stars, one at the other's first dark ring, in arcseconds, in
 * double.
 *
 * (j11 / pi) lambda / D = 1.2196699 lambda / D, j11 the first positive zero of J1 (Born and Wolf).
 * Ranges: aperture_mm, wavelength_nm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_rayleigh_limit_f64(double aperture_mm,
                                              double wavelength_nm,
                                              double *limit_arcsec);
#endif

/**
 * Gives Rayleigh's limit with a central obstruction, in microarcseconds.
 *
 * (x / pi) lambda / D, x the first positive root of J1(x) = e J1(e x), e = d / D (Born and Wolf).
 * Ranges: aperture_um, wavelength_nm not 0; obstruction_um under aperture_um.
 * Error: at most 1 LSB or 2 parts in 10^6, the larger.
 * Statuses: null pointer, zero, out of range, overflow (the limit is over 4294 arcseconds).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_rayleigh_limit_obstructed_fx(uint32_t aperture_um,
                                                        uint32_t obstruction_um,
                                                        uint32_t wavelength_nm,
                                                        uint32_t *limit_uas);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives Rayleigh's limit with a central obstruction, in arcseconds.
 *
 * (x / pi) lambda / D, x the first positive root of J1(x) = e J1(e x), e = d / D (Born and Wolf).
 * Ranges: aperture_mm, wavelength_nm 2^-32 to 2^32; obstruction_mm 0 to under aperture_mm.
 * Error: at most 2 parts in 10^6.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_rayleigh_limit_obstructed_f32(float aperture_mm,
                                                         float obstruction_mm,
                                                         float wavelength_nm,
                                                         float *limit_arcsec);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives Rayleigh's limit with a central obstruction, in arcseconds, in double.
 *
 * (x / pi) lambda / D, x the first positive root of J1(x) = e J1(e x), e = d / D (Born and Wolf).
 * Ranges: aperture_mm, wavelength_nm 2^-32 to 2^32; obstruction_mm 0 to under aperture_mm.
 * Error: at most 2 parts in 10^6.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_rayleigh_limit_obstructed_f64(double aperture_mm,
                                                         double obstruction_mm,
                                                         double wavelength_nm,
                                                         double *limit_arcsec);
#endif

/**
 * Gives Dawes's limit: the separation at which two equal stars are just seen apart, in microarcseconds.
 *
 * 116 arcsec mm / D (common practice after Dawes, 1867).
 * Ranges: aperture_um not 0.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, overflow (the limit is over 4294 arcseconds).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_dawes_limit_fx(uint32_t aperture_um,
                                          uint32_t *limit_uas);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives Dawes's limit: the separation at which two equal stars are just seen apart, in arcseconds.
 *
 * 116 arcsec mm / D (common practice after Dawes, 1867).
 * Ranges: aperture_mm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_dawes_limit_f32(float aperture_mm,
                                           float *limit_arcsec);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives Dawes's limit: the separation at which two equal stars are just seen apart, in arcseconds, in double.
 *
 * 116 arcsec mm / D (common practice after Dawes, 1867).
 * Ranges: aperture_mm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_dawes_limit_f64(double aperture_mm,
                                           double *limit_arcsec);
#endif

/**
 * Gives Sparrow's limit: the separation of two stars at which the dip between them is gone, in microarcseconds.
 *
 * 0.9471553 lambda / D (Sparrow 1916).
 * Ranges: aperture_um, wavelength_nm not 0.
 * Error: at most 0.51 LSB.
 * Statuses: null pointer, zero, overflow (the limit is over 4294 arcseconds).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_sparrow_limit_fx(uint32_t aperture_um,
                                            uint32_t wavelength_nm,
                                            uint32_t *limit_uas);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives Sparrow's limit: the separation of two stars at which the dip between them is gone, in arcseconds.
 *
 * 0.9471553 lambda / D (Sparrow 1916).
 * Ranges: aperture_mm, wavelength_nm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_sparrow_limit_f32(float aperture_mm,
                                             float wavelength_nm,
                                             float *limit_arcsec);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives Sparrow's limit: the separation of two stars at which the dip between them is gone, in arcseconds, in
 * double.
 *
 * 0.9471553 lambda / D (Sparrow 1916).
 * Ranges: aperture_mm, wavelength_nm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_sparrow_limit_f64(double aperture_mm,
                                             double wavelength_nm,
                                             double *limit_arcsec);
#endif

/**
 * Gives the full width at half maximum of a star's image in perfect optics and still air, in microarcseconds.
 *
 * 1.0289940 lambda / D (Airy 1835).
 * Ranges: aperture_um, wavelength_nm not 0.
 * Error: at most 0.51 LSB.
 * Statuses: null pointer, zero, overflow (the width is over 4294 arcseconds).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_airy_fwhm_fx(uint32_t aperture_um,
                                        uint32_t wavelength_nm,
                                        uint32_t *fwhm_uas);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the full width at half maximum of a star's image in perfect optics and still air, in arcseconds.
 *
 * 1.0289940 lambda / D (Airy 1835).
 * Ranges: aperture_mm, wavelength_nm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_airy_fwhm_f32(float aperture_mm,
                                         float wavelength_nm,
                                         float *fwhm_arcsec);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the full width at half maximum of a star's image in perfect optics and still air, in arcseconds, in
 * double.
 *
 * 1.0289940 lambda / D (Airy 1835).
 * Ranges: aperture_mm, wavelength_nm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_airy_fwhm_f64(double aperture_mm,
                                         double wavelength_nm,
                                         double *fwhm_arcsec);
#endif

/**
 * Gives the radius of the Airy disc at the focus, centre to first dark ring, in nanometres.
 *
 * (j11 / pi) lambda f / D = 1.2196699 lambda f / D (Born and Wolf).
 * Ranges: focal_length_um, aperture_um, wavelength_nm not 0.
 * Error: at most 0.51 LSB.
 * Statuses: null pointer, zero, overflow (the radius is over 4.29 m).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_airy_radius_fx(uint32_t focal_length_um,
                                          uint32_t aperture_um,
                                          uint32_t wavelength_nm,
                                          uint32_t *radius_nm);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the radius of the Airy disc at the focus, centre to first dark ring, in micrometres.
 *
 * (j11 / pi) lambda f / D = 1.2196699 lambda f / D (Born and Wolf).
 * Ranges: focal_length_mm, aperture_mm, wavelength_nm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_airy_radius_f32(float focal_length_mm,
                                           float aperture_mm,
                                           float wavelength_nm,
                                           float *radius_um);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the radius of the Airy disc at the focus, centre to first dark ring, in micrometres, in double.
 *
 * (j11 / pi) lambda f / D = 1.2196699 lambda f / D (Born and Wolf).
 * Ranges: focal_length_mm, aperture_mm, wavelength_nm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_airy_radius_f64(double focal_length_mm,
                                           double aperture_mm,
                                           double wavelength_nm,
                                           double *radius_um);
#endif

/**
 * Gives the cutoff frequency at the focus, beyond which detail has no contrast, in cycles per millimetre,
 * Q16.16.
 *
 * D / (lambda f) (Goodman).
 * Ranges: focal_length_um, aperture_um, wavelength_nm not 0.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, overflow (the frequency is 65536 or more).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_cutoff_frequency_fx(uint32_t focal_length_um,
                                               uint32_t aperture_um,
                                               uint32_t wavelength_nm,
                                               uint32_t *frequency_q16);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the cutoff frequency at the focus, beyond which detail has no contrast, in cycles per millimetre.
 *
 * D / (lambda f) (Goodman).
 * Ranges: focal_length_mm, aperture_mm, wavelength_nm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_cutoff_frequency_f32(float focal_length_mm,
                                                float aperture_mm,
                                                float wavelength_nm,
                                                float *frequency);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the cutoff frequency at the focus, beyond which detail has no contrast, in cycles per millimetre, in
 * double.
 *
 * D / (lambda f) (Goodman).
 * Ranges: focal_length_mm, aperture_mm, wavelength_nm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_cutoff_frequency_f64(double focal_length_mm,
                                                double aperture_mm,
                                                double wavelength_nm,
                                                double *frequency);
#endif

/**
 * Gives the contrast that the optics keep at a frequency, with a central obstruction, in Q16.16.
 *
 * The area that two annuli share, their centres apart by the frequency times the outer diameter, over the area of one
 * (O'Neill 1956); without an obstruction (2 / pi) (acos v - v sqrt(1 - v^2)).
 * Ranges: frequency_q16 (of the cutoff frequency) at most 1; obstruction_q16 (of the aperture's diameter) under 1.
 * Error: at most 1 LSB.
 * Statuses: null pointer, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_contrast_fx(uint32_t frequency_q16,
                                       uint32_t obstruction_q16,
                                       uint32_t *contrast_q16);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the contrast that the optics keep at a frequency, with a central obstruction, a plain number.
 *
 * The area that two annuli share, their centres apart by the frequency times the outer diameter, over the area of one
 * (O'Neill 1956); without an obstruction (2 / pi) (acos v - v sqrt(1 - v^2)).
 * Ranges: frequency (of the cutoff frequency) 0 to 1; obstruction (of the aperture's diameter) 0 to under 1.
 * Error: at most 4e-6.
 * Statuses: null pointer, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_contrast_f32(float frequency,
                                        float obstruction,
                                        float *contrast);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the contrast that the optics keep at a frequency, with a central obstruction, a plain number, in double.
 *
 * The area that two annuli share, their centres apart by the frequency times the outer diameter, over the area of one
 * (O'Neill 1956); without an obstruction (2 / pi) (acos v - v sqrt(1 - v^2)).
 * Ranges: frequency (of the cutoff frequency) 0 to 1; obstruction (of the aperture's diameter) 0 to under 1.
 * Error: at most 1e-14 / (1 - obstruction).
 * Statuses: null pointer, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_contrast_f64(double frequency,
                                        double obstruction,
                                        double *contrast);
#endif

/**
 * Gives the Strehl ratio of a wavefront: the brightness of the star image's centre against the perfect one, in
 * Q16.16.
 *
 * exp(-(2 pi s / lambda)^2) (Mahajan 1983, after Marechal).
 * Ranges: wavelength_nm not 0; rms_nm any.
 * Error: at most 1 LSB.
 * Statuses: null pointer, zero.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_strehl_ratio_fx(uint32_t rms_nm,
                                           uint32_t wavelength_nm,
                                           uint32_t *ratio_q16);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the Strehl ratio of a wavefront: the brightness of the star image's centre against the perfect one, in a
 * plain number.
 *
 * exp(-(2 pi s / lambda)^2) (Mahajan 1983, after Marechal).
 * Ranges: rms_nm 0 to 2^32; wavelength_nm 2^-32 to 2^32.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_strehl_ratio_f32(float rms_nm,
                                            float wavelength_nm,
                                            float *ratio);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the Strehl ratio of a wavefront: the brightness of the star image's centre against the perfect one, in a
 * plain number, in double.
 *
 * exp(-(2 pi s / lambda)^2) (Mahajan 1983, after Marechal).
 * Ranges: rms_nm 0 to 2^32; wavelength_nm 2^-32 to 2^32.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_strehl_ratio_f64(double rms_nm,
                                            double wavelength_nm,
                                            double *ratio);
#endif

/**
 * Gives Fried's parameter, the aperture that the air leaves, in micrometres.
 *
 * 0.98 lambda / FWHM, at the same wavelength (Fried 1966).
 * Ranges: seeing_uas, wavelength_nm not 0.
 * Error: at most 0.51 LSB.
 * Statuses: null pointer, zero, overflow (the parameter is over 4.29 km).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_fried_parameter_fx(uint32_t seeing_uas,
                                              uint32_t wavelength_nm,
                                              uint32_t *parameter_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives Fried's parameter, the aperture that the air leaves, in millimetres.
 *
 * 0.98 lambda / FWHM, at the same wavelength (Fried 1966).
 * Ranges: seeing_arcsec, wavelength_nm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_fried_parameter_f32(float seeing_arcsec,
                                               float wavelength_nm,
                                               float *parameter_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives Fried's parameter, the aperture that the air leaves, in millimetres, in double.
 *
 * 0.98 lambda / FWHM, at the same wavelength (Fried 1966).
 * Ranges: seeing_arcsec, wavelength_nm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_fried_parameter_f64(double seeing_arcsec,
                                               double wavelength_nm,
                                               double *parameter_mm);
#endif

/**
 * Gives the seeing at an airmass, from that at the zenith, in microarcseconds.
 *
 * FWHM X^0.6 (Fried 1966).
 * Ranges: seeing_uas not 0; airmass_q16 1 to 40.
 * Error: at most 1 LSB or 1 part in 10^6, the larger.
 * Statuses: null pointer, zero, out of range, overflow (the width is over 4294 arcseconds).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_seeing_at_airmass_fx(uint32_t seeing_uas,
                                                uint32_t airmass_q16,
                                                uint32_t *fwhm_uas);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the seeing at an airmass, from that at the zenith, in arcseconds.
 *
 * FWHM X^0.6 (Fried 1966).
 * Ranges: seeing_arcsec 2^-32 to 2^32; airmass 1 to 40.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_seeing_at_airmass_f32(float seeing_arcsec,
                                                 float airmass,
                                                 float *fwhm_arcsec);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the seeing at an airmass, from that at the zenith, in arcseconds, in double.
 *
 * FWHM X^0.6 (Fried 1966).
 * Ranges: seeing_arcsec 2^-32 to 2^32; airmass 1 to 40.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_seeing_at_airmass_f64(double seeing_arcsec,
                                                 double airmass,
                                                 double *fwhm_arcsec);
#endif

/**
 * Gives the width of a star image that three causes blur, in microarcseconds.
 *
 * sqrt(a^2 + b^2 + c^2), full widths at half maximum (exact for Gaussian images).
 * Ranges: a_uas, b_uas, c_uas may be anything.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, overflow (the width is over 4294 arcseconds).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_combined_fwhm_fx(uint32_t a_uas,
                                            uint32_t b_uas,
                                            uint32_t c_uas,
                                            uint32_t *fwhm_uas);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the width of a star image that three causes blur, in arcseconds.
 *
 * sqrt(a^2 + b^2 + c^2), full widths at half maximum (exact for Gaussian images).
 * Ranges: a_arcsec, b_arcsec, c_arcsec 0 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_combined_fwhm_f32(float a_arcsec,
                                             float b_arcsec,
                                             float c_arcsec,
                                             float *fwhm_arcsec);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the width of a star image that three causes blur, in arcseconds, in double.
 *
 * sqrt(a^2 + b^2 + c^2), full widths at half maximum (exact for Gaussian images).
 * Ranges: a_arcsec, b_arcsec, c_arcsec 0 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_combined_fwhm_f64(double a_arcsec,
                                             double b_arcsec,
                                             double c_arcsec,
                                             double *fwhm_arcsec);
#endif

/* --------------------------------------------------------------------------------------------------
   Light: what the mirrors, the glass and the hole in the middle leave of it, and the
   magnitudes that follow. */

/**
 * Gives the share of the light that mirrors and glass surfaces let through, in Q16.16.
 *
 * R^m T^s, where 0 to the power 0 is 1 (Smith, Modern Optical Engineering).
 * Ranges: reflectance_q16, transmittance_q16 at most 1; mirrors, surfaces any.
 * Error: at most 1 LSB.
 * Statuses: null pointer, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_throughput_fx(uint8_t mirrors,
                                         uint32_t reflectance_q16,
                                         uint8_t surfaces,
                                         uint32_t transmittance_q16,
                                         uint32_t *throughput_q16);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the share of the light that mirrors and glass surfaces let through, a plain number.
 *
 * R^m T^s, where 0 to the power 0 is 1 (Smith, Modern Optical Engineering).
 * Ranges: reflectance, transmittance 0 to 1; mirrors, surfaces any.
 * Error: at most 3 ulp.
 * Statuses: null pointer, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_throughput_f32(uint8_t mirrors,
                                          float reflectance,
                                          uint8_t surfaces,
                                          float transmittance,
                                          float *throughput);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the share of the light that mirrors and glass surfaces let through, a plain number, in double.
 *
 * R^m T^s, where 0 to the power 0 is 1 (Smith, Modern Optical Engineering).
 * Ranges: reflectance, transmittance 0 to 1; mirrors, surfaces any.
 * Error: at most 3 ulp.
 * Statuses: null pointer, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_throughput_f64(uint8_t mirrors,
                                          double reflectance,
                                          uint8_t surfaces,
                                          double transmittance,
                                          double *throughput);
#endif

/**
 * Gives the share of the aperture's area that the central obstruction leaves, in Q16.16.
 *
 * 1 - (d / D)^2 (Schroeder, Astronomical Optics).
 * Ranges: aperture_um not 0; obstruction_um under the aperture.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_clear_fraction_fx(uint32_t aperture_um,
                                             uint32_t obstruction_um,
                                             uint32_t *fraction_q16);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the share of the aperture's area that the central obstruction leaves, a plain number.
 *
 * 1 - (d / D)^2 (Schroeder, Astronomical Optics).
 * Ranges: aperture_mm 2^-32 to 2^32; obstruction_mm from 0 to under the aperture.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_clear_fraction_f32(float aperture_mm,
                                              float obstruction_mm,
                                              float *fraction);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the share of the aperture's area that the central obstruction leaves, a plain number, in double.
 *
 * 1 - (d / D)^2 (Schroeder, Astronomical Optics).
 * Ranges: aperture_mm 2^-32 to 2^32; obstruction_mm from 0 to under the aperture.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_clear_fraction_f64(double aperture_mm,
                                              double obstruction_mm,
                                              double *fraction);
#endif

/**
 * Gives the clear, lossless aperture that would gather as much light, in micrometres.
 *
 * D sqrt((1 - (d / D)^2) T) (Schroeder, Astronomical Optics).
 * Ranges: aperture_um not 0; obstruction_um under the aperture; throughput_q16 at most 1.
 * Error: at most 0.51 LSB.
 * Statuses: null pointer, zero, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_effective_aperture_fx(uint32_t aperture_um,
                                                 uint32_t obstruction_um,
                                                 uint32_t throughput_q16,
                                                 uint32_t *effective_aperture_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the clear, lossless aperture that would gather as much light, in millimetres.
 *
 * D sqrt((1 - (d / D)^2) T) (Schroeder, Astronomical Optics).
 * Ranges: aperture_mm 2^-32 to 2^32; obstruction_mm from 0 to under the aperture; throughput 0 to 1.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_effective_aperture_f32(float aperture_mm,
                                                  float obstruction_mm,
                                                  float throughput,
                                                  float *effective_aperture_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the clear, lossless aperture that would gather as much light, in millimetres, in double.
 *
 * D sqrt((1 - (d / D)^2) T) (Schroeder, Astronomical Optics).
 * Ranges: aperture_mm 2^-32 to 2^32; obstruction_mm from 0 to under the aperture; throughput 0 to 1.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_effective_aperture_f64(double aperture_mm,
                                                  double obstruction_mm,
                                                  double throughput,
                                                  double *effective_aperture_mm);
#endif

/**
 * Gives how many magnitudes fainter a telescope shows a star than the bare eye, in millimagnitudes.
 *
 * 5 log10(D / p); negative where the pupil is the wider (Pogson 1856; Schroeder, Astronomical Optics).
 * Ranges: effective_aperture_um, eye_pupil_um not 0.
 * Error: at most 1 LSB.
 * Statuses: null pointer, zero.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_magnitude_gain_fx(uint32_t effective_aperture_um,
                                             uint32_t eye_pupil_um,
                                             int32_t *gain_mmag);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how many magnitudes fainter a telescope shows a star than the bare eye, in magnitudes.
 *
 * 5 log10(D / p); negative where the pupil is the wider (Pogson 1856; Schroeder, Astronomical Optics).
 * Ranges: effective_aperture_mm, eye_pupil_mm 2^-32 to 2^32.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_magnitude_gain_f32(float effective_aperture_mm,
                                              float eye_pupil_mm,
                                              float *gain_mag);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how many magnitudes fainter a telescope shows a star than the bare eye, in magnitudes, in double.
 *
 * 5 log10(D / p); negative where the pupil is the wider (Pogson 1856; Schroeder, Astronomical Optics).
 * Ranges: effective_aperture_mm, eye_pupil_mm 2^-32 to 2^32.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_magnitude_gain_f64(double effective_aperture_mm,
                                              double eye_pupil_mm,
                                              double *gain_mag);
#endif

/**
 * Gives the faintest star that a telescope shows to an eye whose own limit is known, in millimagnitudes.
 *
 * m0 + 5 log10(D / p) (Pogson 1856; Schroeder, Astronomical Optics).
 * Ranges: effective_aperture_um, eye_pupil_um not 0; naked_eye_mmag any.
 * Error: at most 1 LSB.
 * Statuses: null pointer, zero, overflow (beyond 32 bits).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_limiting_magnitude_fx(int32_t naked_eye_mmag,
                                                 uint32_t effective_aperture_um,
                                                 uint32_t eye_pupil_um,
                                                 int32_t *limit_mmag);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the faintest star that a telescope shows to an eye whose own limit is known, in magnitudes.
 *
 * m0 + 5 log10(D / p) (Pogson 1856; Schroeder, Astronomical Optics).
 * Ranges: naked_eye_mag -2^32 to 2^32; effective_aperture_mm, eye_pupil_mm 2^-32 to 2^32.
 * Error: at most 3 ulp of the larger term.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_limiting_magnitude_f32(float naked_eye_mag,
                                                  float effective_aperture_mm,
                                                  float eye_pupil_mm,
                                                  float *limit_mag);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the faintest star that a telescope shows to an eye whose own limit is known, in magnitudes, in
 * double.
 *
 * m0 + 5 log10(D / p) (Pogson 1856; Schroeder, Astronomical Optics).
 * Ranges: naked_eye_mag -2^32 to 2^32; effective_aperture_mm, eye_pupil_mm 2^-32 to 2^32.
 * Error: at most 3 ulp of the larger term.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_limiting_magnitude_f64(double naked_eye_mag,
                                                  double effective_aperture_mm,
                                                  double eye_pupil_mm,
                                                  double *limit_mag);
#endif

/**
 * Gives how bright an extended object looks in the eyepiece, against the bare eye, in Q16.16.
 *
 * T min(1, (x / p)^2) (Born and Wolf, Principles of Optics).
 * Ranges: exit_pupil_um, eye_pupil_um not 0; throughput_q16 at most 1.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_surface_brightness_fx(uint32_t exit_pupil_um,
                                                 uint32_t eye_pupil_um,
                                                 uint32_t throughput_q16,
                                                 uint32_t *brightness_q16);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how bright an extended object looks in the eyepiece, against the bare eye, a plain number.
 *
 * T min(1, (x / p)^2) (Born and Wolf, Principles of Optics).
 * Ranges: exit_pupil_mm, eye_pupil_mm 2^-32 to 2^32; throughput 0 to 1.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_surface_brightness_f32(float exit_pupil_mm,
                                                  float eye_pupil_mm,
                                                  float throughput,
                                                  float *brightness);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how bright an extended object looks in the eyepiece, against the bare eye, a plain number, in
 * double.
 *
 * T min(1, (x / p)^2) (Born and Wolf, Principles of Optics).
 * Ranges: exit_pupil_mm, eye_pupil_mm 2^-32 to 2^32; throughput 0 to 1.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_surface_brightness_f64(double exit_pupil_mm,
                                                  double eye_pupil_mm,
                                                  double throughput,
                                                  double *brightness);
#endif

/**
 * Gives how many magnitudes fainter the first of two lights is than the second, in millimagnitudes.
 *
 * -2.5 log10(a / b); both fluxes in any one unit (Pogson 1856).
 * Ranges: flux_a, flux_b not 0.
 * Error: at most 1 LSB.
 * Statuses: null pointer, zero.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_magnitude_difference_fx(uint32_t flux_a,
                                                   uint32_t flux_b,
                                                   int32_t *difference_mmag);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how many magnitudes fainter the first of two lights is than the second, in magnitudes.
 *
 * -2.5 log10(a / b); both fluxes in any one unit (Pogson 1856).
 * Ranges: flux_a, flux_b 2^-32 to 2^32.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_magnitude_difference_f32(float flux_a,
                                                    float flux_b,
                                                    float *difference_mag);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how many magnitudes fainter the first of two lights is than the second, in magnitudes, in double.
 *
 * -2.5 log10(a / b); both fluxes in any one unit (Pogson 1856).
 * Ranges: flux_a, flux_b 2^-32 to 2^32.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_magnitude_difference_f64(double flux_a,
                                                    double flux_b,
                                                    double *difference_mag);
#endif

/**
 * Gives how many magnitudes a light loses from a near to a distant place, in millimagnitudes.
 *
 * 5 log10(distant / near); both distances in any one unit (the inverse-square law).
 * Ranges: near_distance, distant_distance not 0.
 * Error: at most 1 LSB.
 * Statuses: null pointer, zero.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_distance_dimming_fx(uint32_t near_distance,
                                               uint32_t distant_distance,
                                               int32_t *dimming_mmag);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how many magnitudes a light loses from a near to a distant place, in magnitudes.
 *
 * 5 log10(distant / near); both distances in any one unit (the inverse-square law).
 * Ranges: near_distance, distant_distance 2^-32 to 2^32.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_distance_dimming_f32(float near_distance,
                                                float distant_distance,
                                                float *dimming_mag);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how many magnitudes a light loses from a near to a distant place, in magnitudes, in double.
 *
 * 5 log10(distant / near); both distances in any one unit (the inverse-square law).
 * Ranges: near_distance, distant_distance 2^-32 to 2^32.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_distance_dimming_f64(double near_distance,
                                                double distant_distance,
                                                double *dimming_mag);
#endif

/**
 * Gives how many magnitudes the air takes from a star, in millimagnitudes.
 *
 * k X, of the loss in one airmass (Bouguer 1729).
 * Ranges: coefficient_mmag, airmass_q16 any.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, overflow (2147483648 mmag or more).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_extinction_fx(uint32_t coefficient_mmag,
                                         uint32_t airmass_q16,
                                         int32_t *extinction_mmag);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how many magnitudes the air takes from a star, in magnitudes.
 *
 * k X, of the loss in one airmass (Bouguer 1729).
 * Ranges: coefficient_mag, airmass 0 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_extinction_f32(float coefficient_mag,
                                          float airmass,
                                          float *extinction_mag);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how many magnitudes the air takes from a star, in magnitudes, in double.
 *
 * k X, of the loss in one airmass (Bouguer 1729).
 * Ranges: coefficient_mag, airmass 0 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_extinction_f64(double coefficient_mag,
                                          double airmass,
                                          double *extinction_mag);
#endif

/**
 * Gives the focal ratio of the lossless telescope that would expose a sensor as fast, in Q16.16.
 *
 * N / sqrt(T) (Smith, Modern Optical Engineering).
 * Ranges: focal_ratio_q16 not 0; throughput_q16 not 0, at most 1.
 * Error: at most 0.51 LSB.
 * Statuses: null pointer, zero, out of range, overflow (65536 or more).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_t_number_fx(uint32_t focal_ratio_q16,
                                       uint32_t throughput_q16,
                                       uint32_t *t_number_q16);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the focal ratio of the lossless telescope that would expose a sensor as fast, a plain number.
 *
 * N / sqrt(T) (Smith, Modern Optical Engineering).
 * Ranges: focal_ratio 2^-32 to 2^32; throughput 2^-32 to 1.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_t_number_f32(float focal_ratio,
                                        float throughput,
                                        float *t_number);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the focal ratio of the lossless telescope that would expose a sensor as fast, a plain number, in
 * double.
 *
 * N / sqrt(T) (Smith, Modern Optical Engineering).
 * Ranges: focal_ratio 2^-32 to 2^32; throughput 2^-32 to 1.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_t_number_f64(double focal_ratio,
                                        double throughput,
                                        double *t_number);
#endif

/* --------------------------------------------------------------------------------------------------
   Imaging: how a sensor samples the sky, how large a target falls on it, and what a focal
   ratio does to the exposure. */

/**
 * Gives how many pixels lie across the width of a star's image, Q16.16.
 *
 * FWHM / scale (Howell, Handbook of CCD Astronomy).
 * Ranges: fwhm_uas, pixel_scale_uas not 0.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_pixels_per_fwhm_fx(uint32_t fwhm_uas,
                                              uint32_t pixel_scale_uas,
                                              uint32_t *pixels_q16);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how many pixels lie across the width of a star's image.
 *
 * FWHM / scale (Howell, Handbook of CCD Astronomy).
 * Ranges: fwhm_arcsec, pixel_scale_arcsec 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_pixels_per_fwhm_f32(float fwhm_arcsec,
                                               float pixel_scale_arcsec,
                                               float *pixels);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how many pixels lie across the width of a star's image, in double.
 *
 * FWHM / scale (Howell, Handbook of CCD Astronomy).
 * Ranges: fwhm_arcsec, pixel_scale_arcsec 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_pixels_per_fwhm_f64(double fwhm_arcsec,
                                               double pixel_scale_arcsec,
                                               double *pixels);
#endif

/**
 * Gives the coarsest pixel that loses nothing of what the telescope shows in still air, in nanometres.
 *
 * lambda f / (2 D): two pixels to the period of the cutoff frequency (Shannon 1949; Goodman, Introduction to Fourier
 * Optics).
 * Ranges: focal_length_um, aperture_um, wavelength_nm not 0.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_nyquist_pixel_fx(uint32_t focal_length_um,
                                            uint32_t aperture_um,
                                            uint32_t wavelength_nm,
                                            uint32_t *pixel_nm);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the coarsest pixel that loses nothing of what the telescope shows in still air, in micrometres.
 *
 * lambda f / (2 D): two pixels to the period of the cutoff frequency (Shannon 1949; Goodman, Introduction to Fourier
 * Optics).
 * Ranges: focal_length_mm, aperture_mm, wavelength_nm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_nyquist_pixel_f32(float focal_length_mm,
                                             float aperture_mm,
                                             float wavelength_nm,
                                             float *pixel_um);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the coarsest pixel that loses nothing of what the telescope shows in still air, in micrometres, in double.
 *
 * lambda f / (2 D): two pixels to the period of the cutoff frequency (Shannon 1949; Goodman, Introduction to Fourier
 * Optics).
 * Ranges: focal_length_mm, aperture_mm, wavelength_nm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_nyquist_pixel_f64(double focal_length_mm,
                                             double aperture_mm,
                                             double wavelength_nm,
                                             double *pixel_um);
#endif

/**
 * Gives the focal length that gives a pixel so much of the sky, in micrometres.
 *
 * (1 rad) p / scale (Schroeder, Astronomical Optics).
 * Ranges: pixel_nm, pixel_scale_uas not 0.
 * Error: at most 0.51 LSB.
 * Statuses: null pointer, zero, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_focal_length_for_pixel_scale_fx(uint32_t pixel_nm,
                                                           uint32_t pixel_scale_uas,
                                                           uint32_t *focal_length_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the focal length that gives a pixel so much of the sky, in millimetres.
 *
 * (1 rad) p / scale (Schroeder, Astronomical Optics).
 * Ranges: pixel_um, pixel_scale_arcsec 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_focal_length_for_pixel_scale_f32(float pixel_um,
                                                            float pixel_scale_arcsec,
                                                            float *focal_length_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the focal length that gives a pixel so much of the sky, in millimetres, in double.
 *
 * (1 rad) p / scale (Schroeder, Astronomical Optics).
 * Ranges: pixel_um, pixel_scale_arcsec 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_focal_length_for_pixel_scale_f64(double pixel_um,
                                                            double pixel_scale_arcsec,
                                                            double *focal_length_mm);
#endif

/**
 * Gives the angle of sky from corner to corner of a sensor, in milliarcseconds.
 *
 * 2 atan(p sqrt(c^2 + r^2) / 2f) (Schroeder, Astronomical Optics).
 * Ranges: pixel_nm, columns, rows, focal_length_um not 0.
 * Error: at most 1 LSB.
 * Statuses: null pointer, zero.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_diagonal_field_fx(uint32_t pixel_nm,
                                             uint16_t columns,
                                             uint16_t rows,
                                             uint32_t focal_length_um,
                                             uint32_t *field_mas);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the angle of sky from corner to corner of a sensor, in arcseconds.
 *
 * 2 atan(p sqrt(c^2 + r^2) / 2f) (Schroeder, Astronomical Optics).
 * Ranges: pixel_um, focal_length_mm 2^-32 to 2^32; columns, rows not 0.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_diagonal_field_f32(float pixel_um,
                                              uint16_t columns,
                                              uint16_t rows,
                                              float focal_length_mm,
                                              float *field_arcsec);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the angle of sky from corner to corner of a sensor, in arcseconds, in double.
 *
 * 2 atan(p sqrt(c^2 + r^2) / 2f) (Schroeder, Astronomical Optics).
 * Ranges: pixel_um, focal_length_mm 2^-32 to 2^32; columns, rows not 0.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_diagonal_field_f64(double pixel_um,
                                              uint16_t columns,
                                              uint16_t rows,
                                              double focal_length_mm,
                                              double *field_arcsec);
#endif

/**
 * Gives how large a target is at the focus, in nanometres.
 *
 * 2 f tan(t/2) (Schroeder, Astronomical Optics).
 * Ranges: field_mas not 0, under 648000000 (180 degrees); focal_length_um not 0.
 * Error: at most 1 LSB.
 * Statuses: null pointer, zero, out of range, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_image_size_fx(uint32_t field_mas,
                                         uint32_t focal_length_um,
                                         uint32_t *size_nm);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how large a target is at the focus, in micrometres.
 *
 * 2 f tan(t/2) (Schroeder, Astronomical Optics).
 * Ranges: field_arcsec 2^-32 to under 648000 (180 degrees); focal_length_mm 2^-32 to 2^32.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_image_size_f32(float field_arcsec,
                                          float focal_length_mm,
                                          float *size_um);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how large a target is at the focus, in micrometres, in double.
 *
 * 2 f tan(t/2) (Schroeder, Astronomical Optics).
 * Ranges: field_arcsec 2^-32 to under 648000 (180 degrees); focal_length_mm 2^-32 to 2^32.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_image_size_f64(double field_arcsec,
                                          double focal_length_mm,
                                          double *size_um);
#endif

/**
 * Gives how many stops more exposure a focal ratio needs than another, negative where it needs less, signed Q16.16.
 *
 * 2 log2(Nto / Nfrom) (ISO 517: a stop is twice the time, the root of two in the focal ratio).
 * Ranges: from_focal_ratio_q16, to_focal_ratio_q16 not 0.
 * Error: at most 1 LSB.
 * Statuses: null pointer, zero.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_exposure_stops_fx(uint32_t from_focal_ratio_q16,
                                             uint32_t to_focal_ratio_q16,
                                             int32_t *stops_q16);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how many stops more exposure a focal ratio needs than another, negative where it needs less.
 *
 * 2 log2(Nto / Nfrom) (ISO 517: a stop is twice the time, the root of two in the focal ratio).
 * Ranges: from_focal_ratio, to_focal_ratio 2^-32 to 2^32.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_exposure_stops_f32(float from_focal_ratio,
                                              float to_focal_ratio,
                                              float *stops);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how many stops more exposure a focal ratio needs than another, negative where it needs less, in double.
 *
 * 2 log2(Nto / Nfrom) (ISO 517: a stop is twice the time, the root of two in the focal ratio).
 * Ranges: from_focal_ratio, to_focal_ratio 2^-32 to 2^32.
 * Error: at most 3 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_exposure_stops_f64(double from_focal_ratio,
                                              double to_focal_ratio,
                                              double *stops);
#endif

/* --------------------------------------------------------------------------------------------------
   Focus: how deep it is, what a miss costs, and how far heat, a near object and the edge of
   the field move it. */

/**
 * Gives how far from the focus, each side, the wavefront is a quarter wave off, in nanometres.
 *
 * 2 lambda N^2 (Born and Wolf, Principles of Optics).
 * Ranges: focal_ratio_q16, wavelength_nm not 0.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_depth_of_focus_fx(uint32_t focal_ratio_q16,
                                             uint32_t wavelength_nm,
                                             uint32_t *depth_nm);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how far from the focus, each side, the wavefront is a quarter wave off, in micrometres.
 *
 * 2 lambda N^2 (Born and Wolf, Principles of Optics).
 * Ranges: focal_ratio, wavelength_nm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_depth_of_focus_f32(float focal_ratio,
                                              float wavelength_nm,
                                              float *depth_um);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how far from the focus, each side, the wavefront is a quarter wave off, in micrometres, in double.
 *
 * 2 lambda N^2 (Born and Wolf, Principles of Optics).
 * Ranges: focal_ratio, wavelength_nm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_depth_of_focus_f64(double focal_ratio,
                                              double wavelength_nm,
                                              double *depth_um);
#endif

/**
 * Gives the diameter of a star's image out of focus, by geometry, in nanometres.
 *
 * d / N (Smith, Modern Optical Engineering).
 * Ranges: focal_ratio_q16 not 0; defocus_nm any.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_defocus_blur_fx(uint32_t defocus_nm,
                                           uint32_t focal_ratio_q16,
                                           uint32_t *blur_nm);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the diameter of a star's image out of focus, by geometry, in micrometres.
 *
 * d / N (Smith, Modern Optical Engineering).
 * Ranges: defocus_um 0 to 2^32; focal_ratio 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_defocus_blur_f32(float defocus_um,
                                            float focal_ratio,
                                            float *blur_um);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the diameter of a star's image out of focus, by geometry, in micrometres, in double.
 *
 * d / N (Smith, Modern Optical Engineering).
 * Ranges: defocus_um 0 to 2^32; focal_ratio 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_defocus_blur_f64(double defocus_um,
                                            double focal_ratio,
                                            double *blur_um);
#endif

/**
 * Gives the error of the wavefront out of focus, from its lowest to its highest point, in nanometres.
 *
 * d / (8 N^2) (Smith, Modern Optical Engineering).
 * Ranges: focal_ratio_q16 not 0; defocus_nm any.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_defocus_wavefront_fx(uint32_t defocus_nm,
                                                uint32_t focal_ratio_q16,
                                                uint32_t *wavefront_nm);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the error of the wavefront out of focus, from its lowest to its highest point, in nanometres.
 *
 * d / (8 N^2) (Smith, Modern Optical Engineering).
 * Ranges: defocus_um 0 to 2^32; focal_ratio 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_defocus_wavefront_f32(float defocus_um,
                                                 float focal_ratio,
                                                 float *wavefront_nm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the error of the wavefront out of focus, from its lowest to its highest point, in nanometres, in double.
 *
 * d / (8 N^2) (Smith, Modern Optical Engineering).
 * Ranges: defocus_um 0 to 2^32; focal_ratio 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_defocus_wavefront_f64(double defocus_um,
                                                 double focal_ratio,
                                                 double *wavefront_nm);
#endif

/**
 * Gives how many steps of the focus motor a distance takes, to the nearest.
 *
 * d / s (counting).
 * Ranges: step_nm not 0; distance_nm any.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_motor_steps_fx(uint32_t distance_nm,
                                          uint32_t step_nm,
                                          uint32_t *steps);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how many steps of the focus motor a distance takes, steps and their fraction.
 *
 * d / s (counting).
 * Ranges: distance_um 0 to 2^32; step_um 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_motor_steps_f32(float distance_um,
                                           float step_um,
                                           float *steps);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how many steps of the focus motor a distance takes, steps and their fraction, in double.
 *
 * d / s (counting).
 * Ranges: distance_um 0 to 2^32; step_um 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_motor_steps_f64(double distance_um,
                                           double step_um,
                                           double *steps);
#endif

/**
 * Gives how much longer a tube or a rod gets by a change of temperature, negative where it gets shorter, in
 * nanometres.
 *
 * L a dT (CRC Handbook of Chemistry and Physics, linear expansion).
 * Ranges: length_um, expansion_ppb_per_k, temperature_change_mk any.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_thermal_shift_fx(uint32_t length_um,
                                            int32_t expansion_ppb_per_k,
                                            int32_t temperature_change_mk,
                                            int32_t *shift_nm);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how much longer a tube or a rod gets by a change of temperature, negative where it gets shorter, in
 * micrometres.
 *
 * L a dT (CRC Handbook of Chemistry and Physics, linear expansion).
 * Ranges: length_mm 0 to 2^32; expansion_ppm_per_k, temperature_change_k -2^32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_thermal_shift_f32(float length_mm,
                                             float expansion_ppm_per_k,
                                             float temperature_change_k,
                                             float *shift_um);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how much longer a tube or a rod gets by a change of temperature, negative where it gets shorter, in
 * micrometres, in double.
 *
 * L a dT (CRC Handbook of Chemistry and Physics, linear expansion).
 * Ranges: length_mm 0 to 2^32; expansion_ppm_per_k, temperature_change_k -2^32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_thermal_shift_f64(double length_mm,
                                             double expansion_ppm_per_k,
                                             double temperature_change_k,
                                             double *shift_um);
#endif

/**
 * Gives the change of temperature that uses up a tolerance of focus, in millikelvin.
 *
 * t / (L a), a the size of the coefficient of linear expansion (CRC Handbook of Chemistry and Physics, linear
 * expansion).
 * Ranges: length_um, expansion_ppb_per_k not 0; tolerance_nm any.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_refocus_temperature_fx(uint32_t length_um,
                                                  uint32_t expansion_ppb_per_k,
                                                  uint32_t tolerance_nm,
                                                  uint32_t *temperature_change_mk);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the change of temperature that uses up a tolerance of focus, in kelvin.
 *
 * t / (L a), a the size of the coefficient of linear expansion (CRC Handbook of Chemistry and Physics, linear
 * expansion).
 * Ranges: length_mm, expansion_ppm_per_k 2^-32 to 2^32; tolerance_um 0 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_refocus_temperature_f32(float length_mm,
                                                   float expansion_ppm_per_k,
                                                   float tolerance_um,
                                                   float *temperature_change_k);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the change of temperature that uses up a tolerance of focus, in kelvin, in double.
 *
 * t / (L a), a the size of the coefficient of linear expansion (CRC Handbook of Chemistry and Physics, linear
 * expansion).
 * Ranges: length_mm, expansion_ppm_per_k 2^-32 to 2^32; tolerance_um 0 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_refocus_temperature_f64(double length_mm,
                                                   double expansion_ppm_per_k,
                                                   double tolerance_um,
                                                   double *temperature_change_k);
#endif

/**
 * Gives how far the focus lies behind its place for a star when the object is near, in micrometres.
 *
 * f^2 / (s - f) (Hecht, Optics).
 * Ranges: focal_length_um not 0; object_distance_mm beyond the focal length.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, out of range, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_near_focus_travel_fx(uint32_t focal_length_um,
                                                uint32_t object_distance_mm,
                                                uint32_t *travel_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how far the focus lies behind its place for a star when the object is near, in millimetres.
 *
 * f^2 / (s - f) (Hecht, Optics).
 * Ranges: focal_length_mm 2^-32 to 2^32; object_distance_m beyond the focal length, to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_near_focus_travel_f32(float focal_length_mm,
                                                 float object_distance_m,
                                                 float *travel_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how far the focus lies behind its place for a star when the object is near, in millimetres, in double.
 *
 * f^2 / (s - f) (Hecht, Optics).
 * Ranges: focal_length_mm 2^-32 to 2^32; object_distance_m beyond the focal length, to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_near_focus_travel_f64(double focal_length_mm,
                                                 double object_distance_m,
                                                 double *travel_mm);
#endif

/**
 * Gives how long the coma of a paraboloid draws a star out, off the axis, in microarcseconds.
 *
 * 3 t / (16 N^2), the tangential coma (Schroeder, Astronomical Optics).
 * Ranges: focal_ratio_q16 not 0; off_axis_mas any.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_coma_length_fx(uint32_t off_axis_mas,
                                          uint32_t focal_ratio_q16,
                                          uint32_t *coma_uas);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how long the coma of a paraboloid draws a star out, off the axis, in arcseconds.
 *
 * 3 t / (16 N^2), the tangential coma (Schroeder, Astronomical Optics).
 * Ranges: off_axis_arcsec 0 to 2^32; focal_ratio 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_coma_length_f32(float off_axis_arcsec,
                                           float focal_ratio,
                                           float *coma_arcsec);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how long the coma of a paraboloid draws a star out, off the axis, in arcseconds, in double.
 *
 * 3 t / (16 N^2), the tangential coma (Schroeder, Astronomical Optics).
 * Ranges: off_axis_arcsec 0 to 2^32; focal_ratio 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_coma_length_f64(double off_axis_arcsec,
                                           double focal_ratio,
                                           double *coma_arcsec);
#endif

/* --------------------------------------------------------------------------------------------------
   Layout of mirrors and tube: how large the mirrors are and where they stand, what they leave
   of the light, and what the tube needs around it. */

/**
 * Gives the minor axis of the smallest 45 degree diagonal that takes in the whole beam of a lit field, in
 * micrometres.
 *
 * 2 w / (1 - g^2), g = (D - F) / 2f, w = F/2 + g L; the primary's rim in the plane of its vertex: for a
 * paraboloid's true rim pass f - D^2 / 16f as the focal length (geometry).
 * Ranges: aperture_um, focal_length_um not 0; focus_distance_um at most the focal length; lit_field_um under the
 * aperture and over it less twice the focal length.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, out of range, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_diagonal_minor_axis_fx(uint32_t aperture_um,
                                                  uint32_t focal_length_um,
                                                  uint32_t focus_distance_um,
                                                  uint32_t lit_field_um,
                                                  uint32_t *minor_axis_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the minor axis of the smallest 45 degree diagonal that takes in the whole beam of a lit field, in
 * millimetres.
 *
 * 2 w / (1 - g^2), g = (D - F) / 2f, w = F/2 + g L; the primary's rim in the plane of its vertex: for a
 * paraboloid's true rim pass f - D^2 / 16f as the focal length (geometry).
 * Ranges: aperture_mm, focal_length_mm 2^-32 to 2^32; focus_distance_mm 0 to the focal length; lit_field_mm from
 * 0, under the aperture and over it less twice the focal length.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_diagonal_minor_axis_f32(float aperture_mm,
                                                   float focal_length_mm,
                                                   float focus_distance_mm,
                                                   float lit_field_mm,
                                                   float *minor_axis_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the minor axis of the smallest 45 degree diagonal that takes in the whole beam of a lit field, in
 * millimetres, in double.
 *
 * 2 w / (1 - g^2), g = (D - F) / 2f, w = F/2 + g L; the primary's rim in the plane of its vertex: for a
 * paraboloid's true rim pass f - D^2 / 16f as the focal length (geometry).
 * Ranges: aperture_mm, focal_length_mm 2^-32 to 2^32; focus_distance_mm 0 to the focal length; lit_field_mm from
 * 0, under the aperture and over it less twice the focal length.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_diagonal_minor_axis_f64(double aperture_mm,
                                                   double focal_length_mm,
                                                   double focus_distance_mm,
                                                   double lit_field_mm,
                                                   double *minor_axis_mm);
#endif

/**
 * Gives how far the diagonal's centre is moved off the axis, away from the focuser, and as much toward the
 * primary, in micrometres.
 *
 * w g / (1 - g^2), g = (D - F) / 2f, w = F/2 + g L (geometry).
 * Ranges: aperture_um, focal_length_um not 0; focus_distance_um at most the focal length; lit_field_um under the
 * aperture and over it less twice the focal length.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, out of range, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_diagonal_offset_fx(uint32_t aperture_um,
                                              uint32_t focal_length_um,
                                              uint32_t focus_distance_um,
                                              uint32_t lit_field_um,
                                              uint32_t *offset_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how far the diagonal's centre is moved off the axis, away from the focuser, and as much toward the
 * primary, in millimetres.
 *
 * w g / (1 - g^2), g = (D - F) / 2f, w = F/2 + g L (geometry).
 * Ranges: aperture_mm, focal_length_mm 2^-32 to 2^32; focus_distance_mm 0 to the focal length; lit_field_mm from
 * 0, under the aperture and over it less twice the focal length.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_diagonal_offset_f32(float aperture_mm,
                                               float focal_length_mm,
                                               float focus_distance_mm,
                                               float lit_field_mm,
                                               float *offset_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how far the diagonal's centre is moved off the axis, away from the focuser, and as much toward the
 * primary, in millimetres, in double.
 *
 * w g / (1 - g^2), g = (D - F) / 2f, w = F/2 + g L (geometry).
 * Ranges: aperture_mm, focal_length_mm 2^-32 to 2^32; focus_distance_mm 0 to the focal length; lit_field_mm from
 * 0, under the aperture and over it less twice the focal length.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_diagonal_offset_f64(double aperture_mm,
                                               double focal_length_mm,
                                               double focus_distance_mm,
                                               double lit_field_mm,
                                               double *offset_mm);
#endif

/**
 * Gives the diameter of the beam to the middle of the field, at a distance before the focus, in micrometres.
 *
 * D L / f (Smith, Modern Optical Engineering).
 * Ranges: aperture_um, focal_length_um not 0; focus_distance_um at most the focal length.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_beam_width_fx(uint32_t aperture_um,
                                         uint32_t focal_length_um,
                                         uint32_t focus_distance_um,
                                         uint32_t *width_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the diameter of the beam to the middle of the field, at a distance before the focus, in millimetres.
 *
 * D L / f (Smith, Modern Optical Engineering).
 * Ranges: aperture_mm, focal_length_mm 2^-32 to 2^32; focus_distance_mm 0 to the focal length.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_beam_width_f32(float aperture_mm,
                                          float focal_length_mm,
                                          float focus_distance_mm,
                                          float *width_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the diameter of the beam to the middle of the field, at a distance before the focus, in millimetres, in
 * double.
 *
 * D L / f (Smith, Modern Optical Engineering).
 * Ranges: aperture_mm, focal_length_mm 2^-32 to 2^32; focus_distance_mm 0 to the focal length.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_beam_width_f64(double aperture_mm,
                                          double focal_length_mm,
                                          double focus_distance_mm,
                                          double *width_mm);
#endif

/**
 * Gives how far off the axis the beam to an image point off the axis has its centre, at a distance before the
 * focus, in micrometres.
 *
 * y (f - L) / f (geometry).
 * Ranges: focal_length_um not 0; focus_distance_um at most the focal length; image_offset_um any.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_beam_shift_fx(uint32_t image_offset_um,
                                         uint32_t focal_length_um,
                                         uint32_t focus_distance_um,
                                         uint32_t *shift_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how far off the axis the beam to an image point off the axis has its centre, at a distance before the
 * focus, in millimetres.
 *
 * y (f - L) / f (geometry).
 * Ranges: image_offset_mm 0 to 2^32; focal_length_mm 2^-32 to 2^32; focus_distance_mm 0 to the focal length.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_beam_shift_f32(float image_offset_mm,
                                          float focal_length_mm,
                                          float focus_distance_mm,
                                          float *shift_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how far off the axis the beam to an image point off the axis has its centre, at a distance before the
 * focus, in millimetres, in double.
 *
 * y (f - L) / f (geometry).
 * Ranges: image_offset_mm 0 to 2^32; focal_length_mm 2^-32 to 2^32; focus_distance_mm 0 to the focal length.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_beam_shift_f64(double image_offset_mm,
                                          double focal_length_mm,
                                          double focus_distance_mm,
                                          double *shift_mm);
#endif

/**
 * Gives how much the second mirror lengthens the primary's focal length, in Q16.16.
 *
 * F / f1 (Schroeder, Astronomical Optics).
 * Ranges: primary_focal_um not 0; system_focal_um over primary_focal_um.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, out of range, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_secondary_magnification_fx(uint32_t primary_focal_um,
                                                      uint32_t system_focal_um,
                                                      uint32_t *magnification_q16);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how much the second mirror lengthens the primary's focal length, a plain number.
 *
 * F / f1 (Schroeder, Astronomical Optics).
 * Ranges: primary_focal_mm 2^-32 to 2^32; system_focal_mm over primary_focal_mm.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_secondary_magnification_f32(float primary_focal_mm,
                                                       float system_focal_mm,
                                                       float *magnification);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how much the second mirror lengthens the primary's focal length, a plain number, in double.
 *
 * F / f1 (Schroeder, Astronomical Optics).
 * Ranges: primary_focal_mm 2^-32 to 2^32; system_focal_mm over primary_focal_mm.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_secondary_magnification_f64(double primary_focal_mm,
                                                       double system_focal_mm,
                                                       double *magnification);
#endif

/**
 * Gives how far the second mirror stands before the primary, from vertex to vertex, in micrometres.
 *
 * f1 - p, p = (f1 + b) / (m + 1), m = F / f1, b from the vertex of the primary to the focus behind it (Schroeder,
 * Astronomical Optics).
 * Ranges: primary_focal_um not 0; system_focal_um over primary_focal_um; back_focus_um at most system_focal_um.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_secondary_separation_fx(uint32_t primary_focal_um,
                                                   uint32_t system_focal_um,
                                                   uint32_t back_focus_um,
                                                   uint32_t *separation_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how far the second mirror stands before the primary, from vertex to vertex, in millimetres.
 *
 * f1 - p, p = (f1 + b) / (m + 1), m = F / f1, b from the vertex of the primary to the focus behind it (Schroeder,
 * Astronomical Optics).
 * Ranges: primary_focal_mm 2^-32 to 2^32; system_focal_mm over primary_focal_mm; back_focus_mm 0 to
 * system_focal_mm.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_secondary_separation_f32(float primary_focal_mm,
                                                    float system_focal_mm,
                                                    float back_focus_mm,
                                                    float *separation_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how far the second mirror stands before the primary, from vertex to vertex, in millimetres, in double.
 *
 * f1 - p, p = (f1 + b) / (m + 1), m = F / f1, b from the vertex of the primary to the focus behind it (Schroeder,
 * Astronomical Optics).
 * Ranges: primary_focal_mm 2^-32 to 2^32; system_focal_mm over primary_focal_mm; back_focus_mm 0 to
 * system_focal_mm.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_secondary_separation_f64(double primary_focal_mm,
                                                    double system_focal_mm,
                                                    double back_focus_mm,
                                                    double *separation_mm);
#endif

/**
 * Gives the diameter of the second mirror for the image point on the axis, in micrometres.
 *
 * D p / f1, p = (f1 + b) / (m + 1), m = F / f1 (Schroeder, Astronomical Optics).
 * Ranges: aperture_um, primary_focal_um not 0; system_focal_um over primary_focal_um; back_focus_um at most
 * system_focal_um.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_secondary_diameter_fx(uint32_t aperture_um,
                                                 uint32_t primary_focal_um,
                                                 uint32_t system_focal_um,
                                                 uint32_t back_focus_um,
                                                 uint32_t *diameter_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the diameter of the second mirror for the image point on the axis, in millimetres.
 *
 * D p / f1, p = (f1 + b) / (m + 1), m = F / f1 (Schroeder, Astronomical Optics).
 * Ranges: aperture_mm, primary_focal_mm 2^-32 to 2^32; system_focal_mm over primary_focal_mm; back_focus_mm 0 to
 * system_focal_mm.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_secondary_diameter_f32(float aperture_mm,
                                                  float primary_focal_mm,
                                                  float system_focal_mm,
                                                  float back_focus_mm,
                                                  float *diameter_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the diameter of the second mirror for the image point on the axis, in millimetres, in double.
 *
 * D p / f1, p = (f1 + b) / (m + 1), m = F / f1 (Schroeder, Astronomical Optics).
 * Ranges: aperture_mm, primary_focal_mm 2^-32 to 2^32; system_focal_mm over primary_focal_mm; back_focus_mm 0 to
 * system_focal_mm.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_secondary_diameter_f64(double aperture_mm,
                                                  double primary_focal_mm,
                                                  double system_focal_mm,
                                                  double back_focus_mm,
                                                  double *diameter_mm);
#endif

/**
 * Gives what a lit field adds to the second mirror's diameter, in micrometres.
 *
 * i (f1 - p) / F, p = (f1 + b) / (m + 1), m = F / f1 (Schroeder, Astronomical Optics).
 * Ranges: primary_focal_um not 0; system_focal_um over primary_focal_um; back_focus_um at most system_focal_um;
 * lit_field_um any.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_secondary_field_margin_fx(uint32_t primary_focal_um,
                                                     uint32_t system_focal_um,
                                                     uint32_t back_focus_um,
                                                     uint32_t lit_field_um,
                                                     uint32_t *margin_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives what a lit field adds to the second mirror's diameter, in millimetres.
 *
 * i (f1 - p) / F, p = (f1 + b) / (m + 1), m = F / f1 (Schroeder, Astronomical Optics).
 * Ranges: primary_focal_mm 2^-32 to 2^32; system_focal_mm over primary_focal_mm; back_focus_mm 0 to
 * system_focal_mm; lit_field_mm 0 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_secondary_field_margin_f32(float primary_focal_mm,
                                                      float system_focal_mm,
                                                      float back_focus_mm,
                                                      float lit_field_mm,
                                                      float *margin_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives what a lit field adds to the second mirror's diameter, in millimetres, in double.
 *
 * i (f1 - p) / F, p = (f1 + b) / (m + 1), m = F / f1 (Schroeder, Astronomical Optics).
 * Ranges: primary_focal_mm 2^-32 to 2^32; system_focal_mm over primary_focal_mm; back_focus_mm 0 to
 * system_focal_mm; lit_field_mm 0 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_secondary_field_margin_f64(double primary_focal_mm,
                                                      double system_focal_mm,
                                                      double back_focus_mm,
                                                      double lit_field_mm,
                                                      double *margin_mm);
#endif

/**
 * Gives the radius of curvature of the second mirror, which is convex, in micrometres.
 *
 * 2 p m / (m - 1), p = (f1 + b) / (m + 1), m = F / f1 (Schroeder, Astronomical Optics).
 * Ranges: primary_focal_um not 0; system_focal_um over primary_focal_um; back_focus_um at most system_focal_um.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, out of range, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_secondary_radius_fx(uint32_t primary_focal_um,
                                               uint32_t system_focal_um,
                                               uint32_t back_focus_um,
                                               uint32_t *radius_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the radius of curvature of the second mirror, which is convex, in millimetres.
 *
 * 2 p m / (m - 1), p = (f1 + b) / (m + 1), m = F / f1 (Schroeder, Astronomical Optics).
 * Ranges: primary_focal_mm 2^-32 to 2^32; system_focal_mm over primary_focal_mm; back_focus_mm 0 to
 * system_focal_mm.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_secondary_radius_f32(float primary_focal_mm,
                                                float system_focal_mm,
                                                float back_focus_mm,
                                                float *radius_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the radius of curvature of the second mirror, which is convex, in millimetres, in double.
 *
 * 2 p m / (m - 1), p = (f1 + b) / (m + 1), m = F / f1 (Schroeder, Astronomical Optics).
 * Ranges: primary_focal_mm 2^-32 to 2^32; system_focal_mm over primary_focal_mm; back_focus_mm 0 to
 * system_focal_mm.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_secondary_radius_f64(double primary_focal_mm,
                                                double system_focal_mm,
                                                double back_focus_mm,
                                                double *radius_mm);
#endif

/**
 * Gives the share of a beam's disc that lies inside a stop's or a mirror's, in Q16.16.
 *
 * the area that the two discs share over that of the beam (CRC Standard Mathematical Tables, circular segment).
 * Ranges: beam_um not 0; stop_um, offset_um any: the first two are diameters, the third is the distance of their
 * centres.
 * Error: at most 1 LSB.
 * Statuses: null pointer, zero.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_illumination_fx(uint32_t beam_um,
                                           uint32_t stop_um,
                                           uint32_t offset_um,
                                           uint32_t *share_q16);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the share of a beam's disc that lies inside a stop's or a mirror's, a plain number.
 *
 * the area that the two discs share over that of the beam (CRC Standard Mathematical Tables, circular segment).
 * Ranges: beam_mm 2^-32 to 2^32; stop_mm, offset_mm 0 to 2^32; the first two are diameters, the third is the
 * distance of their centres.
 * Error: at most 1e-6, absolute.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_illumination_f32(float beam_mm,
                                            float stop_mm,
                                            float offset_mm,
                                            float *share);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the share of a beam's disc that lies inside a stop's or a mirror's, a plain number, in double.
 *
 * the area that the two discs share over that of the beam (CRC Standard Mathematical Tables, circular segment).
 * Ranges: beam_mm 2^-32 to 2^32; stop_mm, offset_mm 0 to 2^32; the first two are diameters, the third is the
 * distance of their centres.
 * Error: at most 1e-14, absolute.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_illumination_f64(double beam_mm,
                                            double stop_mm,
                                            double offset_mm,
                                            double *share);
#endif

/**
 * Gives the radius that the tube's far end sweeps about the pivot, which the room must clear, in micrometres.
 *
 * sqrt(L^2 + (D/2)^2) (geometry).
 * Caution: a moving mount can hurt. Stay clear of all that it can reach, dew caps, counterweights and cables too,
 * and follow the maker's instructions and local rules.
 * Ranges: reach_um, tube_diameter_um any.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_swing_radius_fx(uint32_t reach_um,
                                           uint32_t tube_diameter_um,
                                           uint32_t *radius_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the radius that the tube's far end sweeps about the pivot, which the room must clear, in millimetres.
 *
 * sqrt(L^2 + (D/2)^2) (geometry).
 * Caution: a moving mount can hurt. Stay clear of all that it can reach, dew caps, counterweights and cables too,
 * and follow the maker's instructions and local rules.
 * Ranges: reach_mm, tube_diameter_mm 0 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_swing_radius_f32(float reach_mm,
                                            float tube_diameter_mm,
                                            float *radius_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the radius that the tube's far end sweeps about the pivot, which the room must clear, in millimetres, in
 * double.
 *
 * sqrt(L^2 + (D/2)^2) (geometry).
 * Caution: a moving mount can hurt. Stay clear of all that it can reach, dew caps, counterweights and cables too,
 * and follow the maker's instructions and local rules.
 * Ranges: reach_mm, tube_diameter_mm 0 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_swing_radius_f64(double reach_mm,
                                            double tube_diameter_mm,
                                            double *radius_mm);
#endif

/**
 * Gives how high the eyepiece stands above the floor, in micrometres.
 *
 * h + r sin(altitude), r from the altitude axis to the eyepiece along the tube, negative where it is at the lower
 * end (geometry).
 * Caution: where it is high, stand on a stable platform, never on the top of a ladder, and clear of the moving
 * mount; follow the makers' instructions and local rules.
 * Ranges: altitude_bam 0 to 2^30, 90 degrees; axis_height_um, reach_um any.
 * Error: at most 0.51 LSB.
 * Statuses: null pointer, out of range, overflow (also below the floor).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_eyepiece_height_fx(uint32_t axis_height_um,
                                              int32_t reach_um,
                                              int32_t altitude_bam,
                                              uint32_t *height_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how high the eyepiece stands above the floor, in millimetres.
 *
 * h + r sin(altitude), r from the altitude axis to the eyepiece along the tube, negative where it is at the lower
 * end (geometry).
 * Caution: where it is high, stand on a stable platform, never on the top of a ladder, and clear of the moving
 * mount; follow the makers' instructions and local rules.
 * Ranges: axis_height_mm 0 to 2^32; reach_mm -2^32 to 2^32; altitude_deg 0 to 90.
 * Error: at most 2 ulp of the larger term.
 * Statuses: null pointer, out of range, not finite, overflow (also below the floor).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_eyepiece_height_f32(float axis_height_mm,
                                               float reach_mm,
                                               float altitude_deg,
                                               float *height_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how high the eyepiece stands above the floor, in millimetres, in double.
 *
 * h + r sin(altitude), r from the altitude axis to the eyepiece along the tube, negative where it is at the lower
 * end (geometry).
 * Caution: where it is high, stand on a stable platform, never on the top of a ladder, and clear of the moving
 * mount; follow the makers' instructions and local rules.
 * Ranges: axis_height_mm 0 to 2^32; reach_mm -2^32 to 2^32; altitude_deg 0 to 90.
 * Error: at most 2 ulp of the larger term.
 * Statuses: null pointer, out of range, not finite, overflow (also below the floor).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_eyepiece_height_f64(double axis_height_mm,
                                               double reach_mm,
                                               double altitude_deg,
                                               double *height_mm);
#endif

/* --------------------------------------------------------------------------------------------------
   Colour: what a single lens does to it, and what a pair of two glasses leaves. */

/**
 * Gives the Abbe number of a glass, Q16.16.
 *
 * (nd - 1) / (nF - nC), the indices at 587.6, 486.1 and 656.3 nm (ISO 10110-18).
 * Ranges: index_d_n7 over 10000000 (1); index_f_n7 not 0; index_c_n7 not 0, under index_f_n7.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, out of range, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_abbe_number_fx(uint32_t index_d_n7,
                                          uint32_t index_f_n7,
                                          uint32_t index_c_n7,
                                          uint32_t *abbe_q16);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the Abbe number of a glass.
 *
 * (nd - 1) / (nF - nC), the indices at 587.6, 486.1 and 656.3 nm (ISO 10110-18).
 * Ranges: index_d over 1 to 2^32; index_f 2^-32 to 2^32; index_c 2^-32 to under index_f.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_abbe_number_f32(float index_d,
                                           float index_f,
                                           float index_c,
                                           float *abbe);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the Abbe number of a glass, in double.
 *
 * (nd - 1) / (nF - nC), the indices at 587.6, 486.1 and 656.3 nm (ISO 10110-18).
 * Ranges: index_d over 1 to 2^32; index_f 2^-32 to 2^32; index_c 2^-32 to under index_f.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_abbe_number_f64(double index_d,
                                           double index_f,
                                           double index_c,
                                           double *abbe);
#endif

/**
 * Gives how far apart along the axis a single lens focuses blue and red, F and C, in micrometres.
 *
 * f / V, a thin lens (Kingslake, Lens Design Fundamentals).
 * Ranges: focal_length_um, abbe_q16 not 0.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_singlet_colour_shift_fx(uint32_t focal_length_um,
                                                   uint32_t abbe_q16,
                                                   uint32_t *shift_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how far apart along the axis a single lens focuses blue and red, F and C, in millimetres.
 *
 * f / V, a thin lens (Kingslake, Lens Design Fundamentals).
 * Ranges: focal_length_mm, abbe 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_singlet_colour_shift_f32(float focal_length_mm,
                                                    float abbe,
                                                    float *shift_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how far apart along the axis a single lens focuses blue and red, F and C, in millimetres, in double.
 *
 * f / V, a thin lens (Kingslake, Lens Design Fundamentals).
 * Ranges: focal_length_mm, abbe 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_singlet_colour_shift_f64(double focal_length_mm,
                                                    double abbe,
                                                    double *shift_mm);
#endif

/**
 * Gives the diameter on the sky to which a single lens draws a star in blue and red, F and C, at the best focus, in
 * microarcseconds.
 *
 * (1 rad) / (2 V N) (Kingslake, Lens Design Fundamentals).
 * Ranges: focal_ratio_q16, abbe_q16 not 0.
 * Error: at most 0.51 LSB.
 * Statuses: null pointer, zero, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_singlet_colour_blur_fx(uint32_t focal_ratio_q16,
                                                  uint32_t abbe_q16,
                                                  uint32_t *blur_angle_uas);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the diameter on the sky to which a single lens draws a star in blue and red, F and C, at the best focus, in
 * arcseconds.
 *
 * (1 rad) / (2 V N) (Kingslake, Lens Design Fundamentals).
 * Ranges: focal_ratio, abbe 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_singlet_colour_blur_f32(float focal_ratio,
                                                   float abbe,
                                                   float *blur_arcsec);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the diameter on the sky to which a single lens draws a star in blue and red, F and C, at the best focus, in
 * arcseconds, in double.
 *
 * (1 rad) / (2 V N) (Kingslake, Lens Design Fundamentals).
 * Ranges: focal_ratio, abbe 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_singlet_colour_blur_f64(double focal_ratio,
                                                   double abbe,
                                                   double *blur_arcsec);
#endif

/**
 * Gives the focal length of the crown lens of an achromat, in micrometres.
 *
 * f (V1 - V2) / V1, thin lenses in contact (Kingslake, Lens Design Fundamentals).
 * Ranges: focal_length_um, crown_abbe_q16, flint_abbe_q16 not 0; flint_abbe_q16 under crown_abbe_q16.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_achromat_crown_fx(uint32_t focal_length_um,
                                             uint32_t crown_abbe_q16,
                                             uint32_t flint_abbe_q16,
                                             uint32_t *crown_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the focal length of the crown lens of an achromat, in millimetres.
 *
 * f (V1 - V2) / V1, thin lenses in contact (Kingslake, Lens Design Fundamentals).
 * Ranges: focal_length_mm, crown_abbe 2^-32 to 2^32; flint_abbe 2^-32 to under crown_abbe.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_achromat_crown_f32(float focal_length_mm,
                                              float crown_abbe,
                                              float flint_abbe,
                                              float *crown_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the focal length of the crown lens of an achromat, in millimetres, in double.
 *
 * f (V1 - V2) / V1, thin lenses in contact (Kingslake, Lens Design Fundamentals).
 * Ranges: focal_length_mm, crown_abbe 2^-32 to 2^32; flint_abbe 2^-32 to under crown_abbe.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_achromat_crown_f64(double focal_length_mm,
                                              double crown_abbe,
                                              double flint_abbe,
                                              double *crown_mm);
#endif

/**
 * Gives the focal length of the flint lens of an achromat, in size: the lens is negative, in micrometres.
 *
 * f (V1 - V2) / V2, thin lenses in contact (Kingslake, Lens Design Fundamentals).
 * Ranges: focal_length_um, crown_abbe_q16, flint_abbe_q16 not 0; flint_abbe_q16 under crown_abbe_q16.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, out of range, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_achromat_flint_fx(uint32_t focal_length_um,
                                             uint32_t crown_abbe_q16,
                                             uint32_t flint_abbe_q16,
                                             uint32_t *flint_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the focal length of the flint lens of an achromat, in size: the lens is negative, in millimetres.
 *
 * f (V1 - V2) / V2, thin lenses in contact (Kingslake, Lens Design Fundamentals).
 * Ranges: focal_length_mm, crown_abbe 2^-32 to 2^32; flint_abbe 2^-32 to under crown_abbe.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_achromat_flint_f32(float focal_length_mm,
                                              float crown_abbe,
                                              float flint_abbe,
                                              float *flint_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the focal length of the flint lens of an achromat, in size: the lens is negative, in millimetres, in double.
 *
 * f (V1 - V2) / V2, thin lenses in contact (Kingslake, Lens Design Fundamentals).
 * Ranges: focal_length_mm, crown_abbe 2^-32 to 2^32; flint_abbe 2^-32 to under crown_abbe.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_achromat_flint_f64(double focal_length_mm,
                                              double crown_abbe,
                                              double flint_abbe,
                                              double *flint_mm);
#endif

/**
 * Gives how far from the common focus of blue and red, F and C, an achromat brings the colour between, in micrometres.
 *
 * f dP / dV, dP and dV the differences of the two glasses in partial dispersion and Abbe number (Kingslake, Lens
 * Design Fundamentals).
 * Ranges: focal_length_um, abbe_difference_q16 not 0; partial_difference_ppm any.
 * Error: at most 0.5 LSB.
 * Statuses: null pointer, zero, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_secondary_spectrum_fx(uint32_t focal_length_um,
                                                 uint32_t partial_difference_ppm,
                                                 uint32_t abbe_difference_q16,
                                                 uint32_t *spectrum_um);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how far from the common focus of blue and red, F and C, an achromat brings the colour between, in millimetres.
 *
 * f dP / dV, dP and dV the differences of the two glasses in partial dispersion and Abbe number (Kingslake, Lens
 * Design Fundamentals).
 * Ranges: focal_length_mm, abbe_difference 2^-32 to 2^32; partial_difference 0 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_secondary_spectrum_f32(float focal_length_mm,
                                                  float partial_difference,
                                                  float abbe_difference,
                                                  float *spectrum_mm);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how far from the common focus of blue and red, F and C, an achromat brings the colour between, in millimetres,
 * in double.
 *
 * f dP / dV, dP and dV the differences of the two glasses in partial dispersion and Abbe number (Kingslake, Lens
 * Design Fundamentals).
 * Ranges: focal_length_mm, abbe_difference 2^-32 to 2^32; partial_difference 0 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_secondary_spectrum_f64(double focal_length_mm,
                                                  double partial_difference,
                                                  double abbe_difference,
                                                  double *spectrum_mm);
#endif

/* --------------------------------------------------------------------------------------------------
   Motion: how the sky turns past a telescope, how long a star stays in the field or on a
   pixel, and what an altazimuth mount has to do. */

/**
 * Gives how fast a star drifts through the field when the drive stands still, in microarcseconds per second.
 *
 * w cos d, with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical Astronomy).
 * Ranges: declination_bam -2^30 to 2^30.
 * Error: at most 0.51 LSB.
 * Statuses: null pointer, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_drift_rate_fx(int32_t declination_bam,
                                         uint32_t *rate_uas_per_s);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how fast a star drifts through the field when the drive stands still, in arcseconds per second.
 *
 * w cos d, with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical Astronomy).
 * Ranges: declination_deg -90 to 90.
 * Error: at most 3 ulp.
 * Statuses: null pointer, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_drift_rate_f32(float declination_deg,
                                          float *rate_arcsec_per_s);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how fast a star drifts through the field when the drive stands still, in arcseconds per second, in double.
 *
 * w cos d, with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical Astronomy).
 * Ranges: declination_deg -90 to 90.
 * Error: at most 3 ulp.
 * Statuses: null pointer, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_drift_rate_f64(double declination_deg,
                                          double *rate_arcsec_per_s);
#endif

/**
 * Gives how long a star takes through the field, from edge to edge through its centre, when the drive stands still,
 * in milliseconds.
 *
 * 4 asin(sin(F/4) / cos d) / w, along the parallel of declination, with w the rate of the sky, 15.0410686 arcsec per
 * second (Smart, Textbook on Spherical Astronomy).
 * Ranges: field_mas not 0, under 1296000000; declination_bam -2^30 to 2^30. Never left where F/4 is 90 degrees less
 * the size of d or more: the star stays in the field all day.
 * Error: at most 1 LSB.
 * Statuses: null pointer, zero, out of range, never left.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_drift_time_fx(uint32_t field_mas,
                                         int32_t declination_bam,
                                         uint32_t *time_ms);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how long a star takes through the field, from edge to edge through its centre, when the drive stands still,
 * in seconds.
 *
 * 4 asin(sin(F/4) / cos d) / w, along the parallel of declination, with w the rate of the sky, 15.0410686 arcsec per
 * second (Smart, Textbook on Spherical Astronomy).
 * Ranges: field_arcsec 2^-32 to under 1296000; declination_deg -90 to 90. Never left where F/4 is 90 degrees less
 * the size of d or more: the star stays in the field all day.
 * Error: at most 8 ulp.
 * Statuses: null pointer, zero, out of range, not finite, never left.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_drift_time_f32(float field_arcsec,
                                          float declination_deg,
                                          float *time_s);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how long a star takes through the field, from edge to edge through its centre, when the drive stands still,
 * in seconds, in double.
 *
 * 4 asin(sin(F/4) / cos d) / w, along the parallel of declination, with w the rate of the sky, 15.0410686 arcsec per
 * second (Smart, Textbook on Spherical Astronomy).
 * Ranges: field_arcsec 2^-32 to under 1296000; declination_deg -90 to 90. Never left where F/4 is 90 degrees less
 * the size of d or more: the star stays in the field all day.
 * Error: at most 8 ulp.
 * Statuses: null pointer, zero, out of range, not finite, never left.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_drift_time_f64(double field_arcsec,
                                          double declination_deg,
                                          double *time_s);
#endif

/**
 * Gives the true field of an eyepiece by the time that a star takes through its centre when the drive stands still,
 * in milliarcseconds.
 *
 * 4 asin(cos d sin(w t/4)), with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical
 * Astronomy).
 * Ranges: drift_ms not 0, under 86164090.5, a sidereal day; declination_bam -2^30 to 2^30.
 * Error: at most 1 LSB or 1 part in 10^6, the larger.
 * Statuses: null pointer, zero, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_true_field_from_drift_fx(uint32_t drift_ms,
                                                    int32_t declination_bam,
                                                    uint32_t *field_mas);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the true field of an eyepiece by the time that a star takes through its centre when the drive stands still,
 * in arcseconds.
 *
 * 4 asin(cos d sin(w t/4)), with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical
 * Astronomy).
 * Ranges: drift_s 2^-32 to under 86164.0905, a sidereal day; declination_deg -90 to 90.
 * Error: at most 8 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_true_field_from_drift_f32(float drift_s,
                                                     float declination_deg,
                                                     float *field_arcsec);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the true field of an eyepiece by the time that a star takes through its centre when the drive stands still,
 * in arcseconds, in double.
 *
 * 4 asin(cos d sin(w t/4)), with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical
 * Astronomy).
 * Ranges: drift_s 2^-32 to under 86164.0905, a sidereal day; declination_deg -90 to 90.
 * Error: at most 8 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_true_field_from_drift_f64(double drift_s,
                                                     double declination_deg,
                                                     double *field_arcsec);
#endif

/**
 * Gives the longest exposure without a drive that draws out a star by no more than the tolerance, in microseconds.
 *
 * (t p / f) / (w cos d), t in pixels, with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on
 * Spherical Astronomy).
 * Ranges: pixel_nm, tolerance_q16, focal_length_um not 0; declination_bam -2^30 to 2^30; overflow at the pole.
 * Error: at most 1 LSB or 1 part in 10^6, the larger.
 * Statuses: null pointer, zero, out of range, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_trail_free_exposure_fx(uint32_t pixel_nm,
                                                  uint32_t tolerance_q16,
                                                  uint32_t focal_length_um,
                                                  int32_t declination_bam,
                                                  uint32_t *exposure_us);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the longest exposure without a drive that draws out a star by no more than the tolerance, in seconds.
 *
 * (t p / f) / (w cos d), t in pixels, with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on
 * Spherical Astronomy).
 * Ranges: pixel_um, tolerance, focal_length_mm 2^-32 to 2^32; declination_deg -90 to 90; overflow at the pole.
 * Error: at most 6 ulp.
 * Statuses: null pointer, zero, out of range, not finite, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_trail_free_exposure_f32(float pixel_um,
                                                   float tolerance,
                                                   float focal_length_mm,
                                                   float declination_deg,
                                                   float *exposure_s);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the longest exposure without a drive that draws out a star by no more than the tolerance, in seconds, in
 * double.
 *
 * (t p / f) / (w cos d), t in pixels, with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on
 * Spherical Astronomy).
 * Ranges: pixel_um, tolerance, focal_length_mm 2^-32 to 2^32; declination_deg -90 to 90; overflow at the pole.
 * Error: at most 6 ulp.
 * Statuses: null pointer, zero, out of range, not finite, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_trail_free_exposure_f64(double pixel_um,
                                                   double tolerance,
                                                   double focal_length_mm,
                                                   double declination_deg,
                                                   double *exposure_s);
#endif

/**
 * Gives the longest exposure on an altazimuth mount on which the turning field draws out a star by no more than the
 * tolerance, in milliseconds.
 *
 * (1 rad) t / (r rate): t and r in pixels, r from the centre of the turn; the rate is the size of what
 * field_rotation_rate gives (geometry).
 * Ranges: tolerance_q16, radius_px, rate_uas_per_s not 0.
 * Error: at most 0.51 LSB.
 * Statuses: null pointer, zero, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_rotation_free_exposure_fx(uint32_t tolerance_q16,
                                                     uint32_t radius_px,
                                                     uint32_t rate_uas_per_s,
                                                     uint32_t *exposure_ms);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the longest exposure on an altazimuth mount on which the turning field draws out a star by no more than the
 * tolerance, in seconds.
 *
 * (1 rad) t / (r rate): t and r in pixels, r from the centre of the turn; the rate is the size of what
 * field_rotation_rate gives (geometry).
 * Ranges: tolerance, rate_arcsec_per_s 2^-32 to 2^32; radius_px not 0.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_rotation_free_exposure_f32(float tolerance,
                                                      uint32_t radius_px,
                                                      float rate_arcsec_per_s,
                                                      float *exposure_s);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the longest exposure on an altazimuth mount on which the turning field draws out a star by no more than the
 * tolerance, in seconds, in double.
 *
 * (1 rad) t / (r rate): t and r in pixels, r from the centre of the turn; the rate is the size of what
 * field_rotation_rate gives (geometry).
 * Ranges: tolerance, rate_arcsec_per_s 2^-32 to 2^32; radius_px not 0.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_rotation_free_exposure_f64(double tolerance,
                                                      uint32_t radius_px,
                                                      double rate_arcsec_per_s,
                                                      double *exposure_s);
#endif

/**
 * Gives how fast the field turns in an altazimuth telescope, in microarcseconds per second, positive where the
 * parallactic angle grows.
 *
 * -w cos lat cos A / cos h, azimuth from north through east, with w the rate of the sky, 15.0410686 arcsec per
 * second (Smart, Textbook on Spherical Astronomy).
 * Ranges: latitude_bam and altitude_bam -2^30 to 2^30, azimuth_bam any; overflow close to the zenith, where it is 0.597 degrees per
 * second or more; undefined at the exact zenith and nadir.
 * Error: at most 1 LSB or 2 parts in 10^6, the larger.
 * Statuses: null pointer, out of range, overflow, undefined.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_field_rotation_rate_fx(int32_t latitude_bam,
                                                  uint32_t azimuth_bam,
                                                  int32_t altitude_bam,
                                                  int32_t *rate_uas_per_s);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how fast the field turns in an altazimuth telescope, in arcseconds per second, positive where the
 * parallactic angle grows.
 *
 * -w cos lat cos A / cos h, azimuth from north through east, with w the rate of the sky, 15.0410686 arcsec per
 * second (Smart, Textbook on Spherical Astronomy).
 * Ranges: latitude_deg and altitude_deg -90 to 90, azimuth_deg 0 to 360; undefined at the exact zenith and nadir.
 * Error: at most 6 ulp.
 * Statuses: null pointer, out of range, not finite, undefined.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_field_rotation_rate_f32(float latitude_deg,
                                                   float azimuth_deg,
                                                   float altitude_deg,
                                                   float *rate_arcsec_per_s);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how fast the field turns in an altazimuth telescope, in arcseconds per second, in double, positive where the
 * parallactic angle grows.
 *
 * -w cos lat cos A / cos h, azimuth from north through east, with w the rate of the sky, 15.0410686 arcsec per
 * second (Smart, Textbook on Spherical Astronomy).
 * Ranges: latitude_deg and altitude_deg -90 to 90, azimuth_deg 0 to 360; undefined at the exact zenith and nadir.
 * Error: at most 6 ulp.
 * Statuses: null pointer, out of range, not finite, undefined.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_field_rotation_rate_f64(double latitude_deg,
                                                   double azimuth_deg,
                                                   double altitude_deg,
                                                   double *rate_arcsec_per_s);
#endif

/**
 * Gives how fast an altazimuth mount turns in azimuth to follow the sky, in microarcseconds per second, positive
 * from north to east.
 *
 * w (sin lat - cos lat cos A tan h), with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on
 * Spherical Astronomy).
 * Caution: a moving mount can hurt. Stay clear of all that it can reach, and follow the maker's instructions.
 * Ranges: latitude_bam and altitude_bam -2^30 to 2^30, azimuth_bam any; overflow close to the zenith, where it is 0.597 degrees per
 * second or more; undefined at the exact zenith and nadir.
 * Error: at most 1 LSB or 2 parts in 10^6, the larger; the parts are of the larger term.
 * Statuses: null pointer, out of range, overflow, undefined.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_azimuth_rate_fx(int32_t latitude_bam,
                                           uint32_t azimuth_bam,
                                           int32_t altitude_bam,
                                           int32_t *rate_uas_per_s);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how fast an altazimuth mount turns in azimuth to follow the sky, in arcseconds per second, positive from
 * north to east.
 *
 * w (sin lat - cos lat cos A tan h), with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on
 * Spherical Astronomy).
 * Caution: a moving mount can hurt. Stay clear of all that it can reach, and follow the maker's instructions.
 * Ranges: latitude_deg and altitude_deg -90 to 90, azimuth_deg 0 to 360; undefined at the exact zenith and nadir.
 * Error: at most 6 ulp of the larger term.
 * Statuses: null pointer, out of range, not finite, undefined.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_azimuth_rate_f32(float latitude_deg,
                                            float azimuth_deg,
                                            float altitude_deg,
                                            float *rate_arcsec_per_s);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how fast an altazimuth mount turns in azimuth to follow the sky, in arcseconds per second, in double,
 * positive from north to east.
 *
 * w (sin lat - cos lat cos A tan h), with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on
 * Spherical Astronomy).
 * Caution: a moving mount can hurt. Stay clear of all that it can reach, and follow the maker's instructions.
 * Ranges: latitude_deg and altitude_deg -90 to 90, azimuth_deg 0 to 360; undefined at the exact zenith and nadir.
 * Error: at most 6 ulp of the larger term.
 * Statuses: null pointer, out of range, not finite, undefined.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_azimuth_rate_f64(double latitude_deg,
                                            double azimuth_deg,
                                            double altitude_deg,
                                            double *rate_arcsec_per_s);
#endif

/**
 * Gives how fast an altazimuth mount turns in altitude to follow the sky, in microarcseconds per second, positive
 * upward.
 *
 * w cos lat sin A, with w the rate of the sky, 15.0410686 arcsec per second; the altitude does not matter (Smart,
 * Textbook on Spherical Astronomy).
 * Caution: a moving mount can hurt. Stay clear of all that it can reach, and follow the maker's instructions.
 * Ranges: latitude_bam and altitude_bam -2^30 to 2^30, azimuth_bam any.
 * Error: at most 0.53 LSB.
 * Statuses: null pointer, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_altitude_rate_fx(int32_t latitude_bam,
                                            uint32_t azimuth_bam,
                                            int32_t altitude_bam,
                                            int32_t *rate_uas_per_s);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how fast an altazimuth mount turns in altitude to follow the sky, in arcseconds per second, positive upward.
 *
 * w cos lat sin A, with w the rate of the sky, 15.0410686 arcsec per second; the altitude does not matter (Smart,
 * Textbook on Spherical Astronomy).
 * Caution: a moving mount can hurt. Stay clear of all that it can reach, and follow the maker's instructions.
 * Ranges: latitude_deg and altitude_deg -90 to 90, azimuth_deg 0 to 360.
 * Error: at most 6 ulp.
 * Statuses: null pointer, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_altitude_rate_f32(float latitude_deg,
                                             float azimuth_deg,
                                             float altitude_deg,
                                             float *rate_arcsec_per_s);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how fast an altazimuth mount turns in altitude to follow the sky, in arcseconds per second, in double,
 * positive upward.
 *
 * w cos lat sin A, with w the rate of the sky, 15.0410686 arcsec per second; the altitude does not matter (Smart,
 * Textbook on Spherical Astronomy).
 * Caution: a moving mount can hurt. Stay clear of all that it can reach, and follow the maker's instructions.
 * Ranges: latitude_deg and altitude_deg -90 to 90, azimuth_deg 0 to 360.
 * Error: at most 6 ulp.
 * Statuses: null pointer, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_altitude_rate_f64(double latitude_deg,
                                             double azimuth_deg,
                                             double altitude_deg,
                                             double *rate_arcsec_per_s);
#endif

/**
 * Gives the radius of the circle about the zenith in which an altazimuth mount cannot follow the sky, in
 * milliarcseconds.
 *
 * z with w (|sin lat| + cos lat cot z) = the fastest rate in azimuth, a circle on the safe side, with w the rate of
 * the sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical Astronomy).
 * Caution: a mount at its top speed can hurt. Stay clear of all that it can reach, and follow the maker's
 * instructions.
 * Ranges: latitude_bam -2^30 to 2^30; top_rate_mas_per_s over w |sin lat|.
 * Error: at most 1 LSB or 2 parts in 10^6, the larger.
 * Statuses: null pointer, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_zenith_blind_radius_fx(int32_t latitude_bam,
                                                  uint32_t top_rate_mas_per_s,
                                                  uint32_t *radius_mas);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the radius of the circle about the zenith in which an altazimuth mount cannot follow the sky, in arcseconds.
 *
 * z with w (|sin lat| + cos lat cot z) = the fastest rate in azimuth, a circle on the safe side, with w the rate of
 * the sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical Astronomy).
 * Caution: a mount at its top speed can hurt. Stay clear of all that it can reach, and follow the maker's
 * instructions.
 * Ranges: latitude_deg -90 to 90; top_rate_arcsec_per_s over w |sin lat|, to 2^32.
 * Error: at most 6 ulp.
 * Statuses: null pointer, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_zenith_blind_radius_f32(float latitude_deg,
                                                   float top_rate_arcsec_per_s,
                                                   float *radius_arcsec);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the radius of the circle about the zenith in which an altazimuth mount cannot follow the sky, in arcseconds,
 * in double.
 *
 * z with w (|sin lat| + cos lat cot z) = the fastest rate in azimuth, a circle on the safe side, with w the rate of
 * the sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical Astronomy).
 * Caution: a mount at its top speed can hurt. Stay clear of all that it can reach, and follow the maker's
 * instructions.
 * Ranges: latitude_deg -90 to 90; top_rate_arcsec_per_s over w |sin lat|, to 2^32.
 * Error: at most 6 ulp.
 * Statuses: null pointer, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_zenith_blind_radius_f64(double latitude_deg,
                                                   double top_rate_arcsec_per_s,
                                                   double *radius_arcsec);
#endif

/**
 * Gives how fast a star leaves its declination on a mount whose polar axis is not on the pole, in microarcseconds
 * per second, positive northward.
 *
 * -w e sin H to first order in e, H the star's hour angle less that of the displaced pole, with w the rate of the
 * sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical Astronomy).
 * Ranges: polar_error_mas at most 18000000, 5 degrees; hour_angle_bam any.
 * Error: at most 0.51 LSB.
 * Statuses: null pointer, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_misalignment_drift_fx(uint32_t polar_error_mas,
                                                 uint32_t hour_angle_bam,
                                                 int32_t *drift_uas_per_s);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives how fast a star leaves its declination on a mount whose polar axis is not on the pole, in arcseconds per
 * second, positive northward.
 *
 * -w e sin H to first order in e, H the star's hour angle less that of the displaced pole, with w the rate of the
 * sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical Astronomy).
 * Ranges: polar_error_arcsec 0 to 18000; hour_angle_deg 0 to 360.
 * Error: at most 4 ulp.
 * Statuses: null pointer, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_misalignment_drift_f32(float polar_error_arcsec,
                                                  float hour_angle_deg,
                                                  float *drift_arcsec_per_s);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives how fast a star leaves its declination on a mount whose polar axis is not on the pole, in arcseconds per
 * second, in double, positive northward.
 *
 * -w e sin H to first order in e, H the star's hour angle less that of the displaced pole, with w the rate of the
 * sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical Astronomy).
 * Ranges: polar_error_arcsec 0 to 18000; hour_angle_deg 0 to 360.
 * Error: at most 4 ulp.
 * Statuses: null pointer, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_misalignment_drift_f64(double polar_error_arcsec,
                                                  double hour_angle_deg,
                                                  double *drift_arcsec_per_s);
#endif

/* --------------------------------------------------------------------------------------------------
   The Sun: where it stands, how far from it a telescope points, and how much of its light an
   aperture collects. */

/**
 * Gives the right ascension of the Sun, of the date, as binary angle.
 *
 * atan2(cos e sin l, cos l), l = L + 1.915 sin g + 0.020 sin 2g, L = 280.460 + 0.9856474 n, g = 357.528 + 0.9856003
 * n, e = 23.439 - 0.0000004 n, in degrees, n days from 2000 January 1, 12 h (the low-precision expression of The
 * Astronomical Almanac).
 * Caution: nothing that is computed makes it safe to look near the Sun.
 * Ranges: unix_s, seconds from 1970 January 1, 0 h UTC, under 4102444800, the year 2100.
 * Error: at most 5 LSB from the expression. The expression is within 0.017 degrees, on the sky, of a full ephemeris
 * from 1970 to 2100.
 * Statuses: null pointer, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_sun_right_ascension_fx(uint32_t unix_s,
                                                  uint32_t *right_ascension_bam);

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the right ascension of the Sun, of the date, as degrees, in double.
 *
 * atan2(cos e sin l, cos l), l = L + 1.915 sin g + 0.020 sin 2g, L = 280.460 + 0.9856474 n, g = 357.528 + 0.9856003
 * n, e = 23.439 - 0.0000004 n, in degrees, n days from 2000 January 1, 12 h (the low-precision expression of The
 * Astronomical Almanac).
 * Caution: nothing that is computed makes it safe to look near the Sun.
 * Ranges: unix_s, seconds from 1970 January 1, 0 h UTC, under 4102444800, the year 2100.
 * Error: at most 10^-10 degrees from the expression. The expression is within 0.017 degrees, on the sky, of a full
 * ephemeris from 1970 to 2100.
 * Statuses: null pointer, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_sun_right_ascension_f64(uint32_t unix_s,
                                                   double *right_ascension_deg);
#endif

/**
 * Gives the declination of the Sun, of the date, as binary angle.
 *
 * asin(sin e sin l), l = L + 1.915 sin g + 0.020 sin 2g, L = 280.460 + 0.9856474 n, g = 357.528 + 0.9856003 n, e =
 * 23.439 - 0.0000004 n, in degrees, n days from 2000 January 1, 12 h (the low-precision expression of The
 * Astronomical Almanac).
 * Caution: nothing that is computed makes it safe to look near the Sun.
 * Ranges: unix_s, seconds from 1970 January 1, 0 h UTC, under 4102444800, the year 2100.
 * Error: at most 5 LSB from the expression. The expression is within 0.017 degrees, on the sky, of a full ephemeris
 * from 1970 to 2100.
 * Statuses: null pointer, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_sun_declination_fx(uint32_t unix_s,
                                              int32_t *declination_bam);

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the declination of the Sun, of the date, as degrees, in double.
 *
 * asin(sin e sin l), l = L + 1.915 sin g + 0.020 sin 2g, L = 280.460 + 0.9856474 n, g = 357.528 + 0.9856003 n, e =
 * 23.439 - 0.0000004 n, in degrees, n days from 2000 January 1, 12 h (the low-precision expression of The
 * Astronomical Almanac).
 * Caution: nothing that is computed makes it safe to look near the Sun.
 * Ranges: unix_s, seconds from 1970 January 1, 0 h UTC, under 4102444800, the year 2100.
 * Error: at most 10^-10 degrees from the expression. The expression is within 0.017 degrees, on the sky, of a full
 * ephemeris from 1970 to 2100.
 * Statuses: null pointer, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_sun_declination_f64(uint32_t unix_s,
                                               double *declination_deg);
#endif

/**
 * Gives the angle from a direction to the centre of the Sun, in milliarcseconds.
 *
 * The great circle to the place that sun_right_ascension and sun_declination give (Smart, Textbook on Spherical
 * Astronomy).
 * Caution: nothing that is computed makes it safe to look near the Sun. The direction is of the date: one of J2000
 * is 0.36 degrees off in 2026. The disc of the Sun reaches 0.27 degrees from its centre, and a finder or a mount's
 * path may come nearer than the telescope does.
 * Ranges: right_ascension_bam any; declination_bam -2^30 to 2^30; unix_s, seconds from 1970 January 1, 0 h UTC, under
 * 4102444800, the year 2100.
 * Error: at most 4 LSB from the expression. The expression is within 0.017 degrees, on the sky, of a full ephemeris
 * from 1970 to 2100.
 * Statuses: null pointer, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_sun_clearance_fx(uint32_t right_ascension_bam,
                                            int32_t declination_bam,
                                            uint32_t unix_s,
                                            uint32_t *clearance_mas);

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the angle from a direction to the centre of the Sun, in arcseconds, in double.
 *
 * The great circle to the place that sun_right_ascension and sun_declination give (Smart, Textbook on Spherical
 * Astronomy).
 * Caution: nothing that is computed makes it safe to look near the Sun. The direction is of the date: one of J2000
 * is 0.36 degrees off in 2026. The disc of the Sun reaches 0.27 degrees from its centre, and a finder or a mount's
 * path may come nearer than the telescope does.
 * Ranges: right_ascension_deg 0 to 360; declination_deg -90 to 90; unix_s, seconds from 1970 January 1, 0 h UTC,
 * under 4102444800, the year 2100.
 * Error: at most 10^-6 arcsec from the expression. The expression is within 0.017 degrees, on the sky, of a full
 * ephemeris from 1970 to 2100.
 * Statuses: null pointer, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_sun_clearance_f64(double right_ascension_deg,
                                             double declination_deg,
                                             uint32_t unix_s,
                                             double *clearance_arcsec);
#endif

/**
 * Gives the power of the Sun's light that an aperture takes in, in milliwatts.
 *
 * 1000 W/m^2 (pi / 4) D^2: the Sun high in a clear sky (common practice).
 * Caution: some milliwatts at the focus burn an eye or a sensor at once. Use a full-aperture filter made for the
 * Sun.
 * Ranges: effective_aperture_um not 0.
 * Error: at most 0.51 LSB.
 * Statuses: null pointer, zero, overflow.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_collected_sunlight_fx(uint32_t effective_aperture_um,
                                                 uint32_t *power_mw);

#if !defined(FIELDSTOP_NO_FLOAT)
/**
 * Gives the power of the Sun's light that an aperture takes in, in milliwatts.
 *
 * 1000 W/m^2 (pi / 4) D^2: the Sun high in a clear sky (common practice).
 * Caution: some milliwatts at the focus burn an eye or a sensor at once. Use a full-aperture filter made for the
 * Sun.
 * Ranges: effective_aperture_mm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_collected_sunlight_f32(float effective_aperture_mm,
                                                  float *power_mw);
#endif

#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))
/**
 * Gives the power of the Sun's light that an aperture takes in, in milliwatts, in double.
 *
 * 1000 W/m^2 (pi / 4) D^2: the Sun high in a clear sky (common practice).
 * Caution: some milliwatts at the focus burn an eye or a sensor at once. Use a full-aperture filter made for the
 * Sun.
 * Ranges: effective_aperture_mm 2^-32 to 2^32.
 * Error: at most 2 ulp.
 * Statuses: null pointer, zero, out of range, not finite.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_collected_sunlight_f64(double effective_aperture_mm,
                                                  double *power_mw);
#endif

/* --------------------------------------------------------------------------------------------------
   Equipment as plain structs in fixed units, and all readouts of one screen in one call. */

/** Eyepiece mapping: true field = A fe / f, the apparent angle proportional to the true one. */
#define FIELDSTOP_EQUIDISTANT 0
/** Eyepiece mapping: true field = 2 atan(tan(A/2) fe / f), no distortion. */
#define FIELDSTOP_RECTILINEAR 1
/** Visual readout, wanted and available: focal_length_um. */
#define FIELDSTOP_VISUAL_FOCAL_LENGTH 1
/** Visual readout, wanted and available: focal_ratio_q16. */
#define FIELDSTOP_VISUAL_FOCAL_RATIO 2
/** Visual readout, wanted and available: magnification_q16. */
#define FIELDSTOP_VISUAL_MAGNIFICATION 4
/** Visual readout, wanted and available: exit_pupil_um. */
#define FIELDSTOP_VISUAL_EXIT_PUPIL 8
/** Visual readout, wanted and available: true_field_mas. */
#define FIELDSTOP_VISUAL_TRUE_FIELD 16
/** Visual readout, wanted and available: resolution_uas. */
#define FIELDSTOP_VISUAL_RESOLUTION 32
/** Visual readout, wanted and available: dawes_limit_uas. */
#define FIELDSTOP_VISUAL_DAWES_LIMIT 64
/** Visual readout, wanted and available: lowest_magnification_q16. */
#define FIELDSTOP_VISUAL_LOWEST_MAGNIFICATION 128
/** Visual readout, wanted and available: resolving_magnification_q16. */
#define FIELDSTOP_VISUAL_RESOLVING_MAGNIFICATION 256
/** Visual readout, wanted and available: effective_aperture_um. */
#define FIELDSTOP_VISUAL_EFFECTIVE_APERTURE 512
/** Visual readout, wanted and available: limiting_magnitude_mmag. */
#define FIELDSTOP_VISUAL_LIMITING_MAGNITUDE 1024
/** Visual readout, wanted and available: surface_brightness_q16. */
#define FIELDSTOP_VISUAL_SURFACE_BRIGHTNESS 2048
/** Visual readout, wanted: every member. */
#define FIELDSTOP_VISUAL_ALL 4095
/** Visual readout, fact: the exit pupil is wider than the eye's, and light falls on the iris (geometry). */
#define FIELDSTOP_VISUAL_FACT_WIDE_EXIT_PUPIL 1
/**
 * Visual readout, fact: the magnification is over the resolving magnification (Rayleigh 1879, and the
 * observer's eye).
 */
#define FIELDSTOP_VISUAL_FACT_EMPTY_MAGNIFICATION 2

/** Visual readout, fact: the true field comes from the apparent field, as good as the mapping. */
#define FIELDSTOP_VISUAL_FACT_FIELD_FROM_APPARENT 4
/** Visual readout, fact: the seeing is wider than the resolution (common practice). */
#define FIELDSTOP_VISUAL_FACT_SEEING_LIMITED 8
/** Camera readout, wanted and available: focal_length_um. */
#define FIELDSTOP_CAMERA_FOCAL_LENGTH 1
/** Camera readout, wanted and available: focal_ratio_q16. */
#define FIELDSTOP_CAMERA_FOCAL_RATIO 2
/** Camera readout, wanted and available: t_number_q16. */
#define FIELDSTOP_CAMERA_T_NUMBER 4
/** Camera readout, wanted and available: frame_width_mas. */
#define FIELDSTOP_CAMERA_FRAME_WIDTH 8
/** Camera readout, wanted and available: frame_height_mas. */
#define FIELDSTOP_CAMERA_FRAME_HEIGHT 16
/** Camera readout, wanted and available: pixel_scale_uas. */
#define FIELDSTOP_CAMERA_PIXEL_SCALE 32
/** Camera readout, wanted and available: plate_scale_mas_per_mm. */
#define FIELDSTOP_CAMERA_PLATE_SCALE 64
/** Camera readout, wanted and available: star_fwhm_uas. */
#define FIELDSTOP_CAMERA_STAR_FWHM 128
/** Camera readout, wanted and available: pixels_per_fwhm_q16. */
#define FIELDSTOP_CAMERA_PIXELS_PER_FWHM 256
/** Camera readout, wanted and available: cutoff_frequency_q16. */
#define FIELDSTOP_CAMERA_CUTOFF_FREQUENCY 512
/** Camera readout, wanted and available: nyquist_pixel_nm. */
#define FIELDSTOP_CAMERA_NYQUIST_PIXEL 1024
/** Camera readout, wanted and available: diagonal_mas. */
#define FIELDSTOP_CAMERA_DIAGONAL 2048
/** Camera readout, wanted: every member. */
#define FIELDSTOP_CAMERA_ALL 4095
/** Camera readout, fact: under two pixels to the star image (common practice, after Shannon 1949). */
#define FIELDSTOP_CAMERA_FACT_COARSE_SAMPLING 1
/** Camera readout, fact: over three pixels to the star image (common practice). */
#define FIELDSTOP_CAMERA_FACT_FINE_SAMPLING 2
/** Visual target, purpose: the whole target with room around it, as large as that allows. */
#define FIELDSTOP_PURPOSE_FRAME 0
/** Visual target, purpose: two stars as far apart to the eye as it needs. */
#define FIELDSTOP_PURPOSE_SPLIT 1
/** Visual target, purpose: the nearest exit pupil. */
#define FIELDSTOP_PURPOSE_EXIT_PUPIL 2
/** Choices: the place in the list of Barlows and reducers where there is none. */
#define FIELDSTOP_NO_AMPLIFIER 255
/** Visual choice, available: magnification_q16. */
#define FIELDSTOP_VISUAL_CHOICE_MAGNIFICATION 1
/** Visual choice, available: exit_pupil_um. */
#define FIELDSTOP_VISUAL_CHOICE_EXIT_PUPIL 2
/** Visual choice, available: true_field_mas. */
#define FIELDSTOP_VISUAL_CHOICE_TRUE_FIELD 4
/** Visual choice, available: fit_q16. */
#define FIELDSTOP_VISUAL_CHOICE_FIT 8
/** Visual choice, fact: the exit pupil is wider than the eye's (geometry). */
#define FIELDSTOP_VISUAL_CHOICE_FACT_WIDE_EXIT_PUPIL 1
/**
 * Visual choice, fact: the magnification is over the resolving magnification (Rayleigh 1879, and the observer's
 * eye).
 */
#define FIELDSTOP_VISUAL_CHOICE_FACT_EMPTY_MAGNIFICATION 2

/** Visual choice, fact: the true field comes from the apparent field. */
#define FIELDSTOP_VISUAL_CHOICE_FACT_FIELD_FROM_APPARENT 4
/**
 * Visual choice, fact: the magnification is over that at which the seeing reaches the smallest angle that the eye
 * parts (common practice).
 */
#define FIELDSTOP_VISUAL_CHOICE_FACT_SEEING_SHOWS 8

/** Visual choice, fact: what is wanted is reached. */
#define FIELDSTOP_VISUAL_CHOICE_FACT_SERVES 16
/** Visual choice, fact: the separation is under the telescope's Rayleigh limit. */
#define FIELDSTOP_VISUAL_CHOICE_FACT_UNDER_RESOLUTION 32
/** Visual choice, fact: the separation is under the seeing (common practice). */
#define FIELDSTOP_VISUAL_CHOICE_FACT_UNDER_SEEING 64
/** Camera choice, available: frame_width_mas. */
#define FIELDSTOP_CAMERA_CHOICE_FRAME_WIDTH 1
/** Camera choice, available: frame_height_mas. */
#define FIELDSTOP_CAMERA_CHOICE_FRAME_HEIGHT 2
/** Camera choice, available: pixel_scale_uas. */
#define FIELDSTOP_CAMERA_CHOICE_PIXEL_SCALE 4
/** Camera choice, available: pixels_per_fwhm_q16. */
#define FIELDSTOP_CAMERA_CHOICE_PIXELS_PER_FWHM 8
/** Camera choice, available: tiles_wide and tiles_high. */
#define FIELDSTOP_CAMERA_CHOICE_TILES 16
/** Camera choice, fact: under two pixels to the star image (common practice, after Shannon 1949). */
#define FIELDSTOP_CAMERA_CHOICE_FACT_COARSE_SAMPLING 1
/** Camera choice, fact: over three pixels to the star image (common practice). */
#define FIELDSTOP_CAMERA_CHOICE_FACT_FINE_SAMPLING 2
/** Camera choice, fact: one frame takes the whole target. */
#define FIELDSTOP_CAMERA_CHOICE_FACT_FITS 4
/** Focus readout, wanted and available: focal_ratio_q16. */
#define FIELDSTOP_FOCUS_FOCAL_RATIO 1
/** Focus readout, wanted and available: depth_nm. */
#define FIELDSTOP_FOCUS_DEPTH 2
/** Focus readout, wanted and available: depth_steps. */
#define FIELDSTOP_FOCUS_DEPTH_STEPS 4
/** Focus readout, wanted and available: temperature_mk. */
#define FIELDSTOP_FOCUS_TEMPERATURE 8
/** Focus readout, wanted and available: blur_nm. */
#define FIELDSTOP_FOCUS_BLUR 16
/** Focus readout, wanted and available: blur_angle_uas. */
#define FIELDSTOP_FOCUS_BLUR_ANGLE 32
/** Focus readout, wanted and available: wavefront_nm. */
#define FIELDSTOP_FOCUS_WAVEFRONT 64
/** Focus readout, wanted: every member. */
#define FIELDSTOP_FOCUS_ALL 127
/** Focus readout, fact: one step of the motor is over the depth of focus (Rayleigh 1879). */
#define FIELDSTOP_FOCUS_FACT_COARSE_STEP 1
/** Focus readout, fact: the defocus is over the depth of focus (Rayleigh 1879). */
#define FIELDSTOP_FOCUS_FACT_OUT_OF_FOCUS 2
/** Newtonian readout, wanted and available: diagonal_um. */
#define FIELDSTOP_NEWTONIAN_DIAGONAL 1
/** Newtonian readout, wanted and available: diagonal_offset_um. */
#define FIELDSTOP_NEWTONIAN_DIAGONAL_OFFSET 2
/** Newtonian readout, wanted and available: obstruction_q16. */
#define FIELDSTOP_NEWTONIAN_OBSTRUCTION 4
/** Newtonian readout, wanted and available: beam_um. */
#define FIELDSTOP_NEWTONIAN_BEAM 8
/** Newtonian readout, wanted and available: beam_shift_um. */
#define FIELDSTOP_NEWTONIAN_BEAM_SHIFT 16
/** Newtonian readout, wanted and available: edge_light_q16. */
#define FIELDSTOP_NEWTONIAN_EDGE_LIGHT 32
/** Newtonian readout, wanted and available: eyepiece_height_um. */
#define FIELDSTOP_NEWTONIAN_EYEPIECE_HEIGHT 64
/** Newtonian readout, wanted and available: greatest_height_um. */
#define FIELDSTOP_NEWTONIAN_GREATEST_HEIGHT 128
/** Newtonian readout, wanted: every member. */
#define FIELDSTOP_NEWTONIAN_ALL 255
/** Newtonian readout, fact: the diagonal in place is smaller than the field needs (geometry). */
#define FIELDSTOP_NEWTONIAN_FACT_SMALL_DIAGONAL 1
/** Newtonian readout, fact: the diagonal is wider than the obstruction that the telescope tells (geometry). */
#define FIELDSTOP_NEWTONIAN_FACT_WIDER_THAN_TOLD 2
/** Newtonian readout, fact: the eyepiece is above the height that the layout sets; show the caution. */
#define FIELDSTOP_NEWTONIAN_FACT_HIGH_EYEPIECE 4
/** Newtonian readout, fact: within its altitudes it gets above that height; show the caution. */
#define FIELDSTOP_NEWTONIAN_FACT_HIGH_REACHED 8
/** Two mirror readout, wanted and available: secondary_magnification_q16. */
#define FIELDSTOP_TWO_MIRROR_SECONDARY_MAGNIFICATION 1
/** Two mirror readout, wanted and available: separation_um. */
#define FIELDSTOP_TWO_MIRROR_SEPARATION 2
/** Two mirror readout, wanted and available: secondary_um. */
#define FIELDSTOP_TWO_MIRROR_SECONDARY 4
/** Two mirror readout, wanted and available: secondary_radius_um. */
#define FIELDSTOP_TWO_MIRROR_SECONDARY_RADIUS 8
/** Two mirror readout, wanted and available: obstruction_q16. */
#define FIELDSTOP_TWO_MIRROR_OBSTRUCTION 16
/** Two mirror readout, wanted and available: length_um. */
#define FIELDSTOP_TWO_MIRROR_LENGTH 32
/** Two mirror readout, wanted and available: length_share_q16. */
#define FIELDSTOP_TWO_MIRROR_LENGTH_SHARE 64
/** Two mirror readout, wanted: every member. */
#define FIELDSTOP_TWO_MIRROR_ALL 127
/** Two mirror readout, fact: the secondary is wider than the obstruction that the telescope tells (geometry). */
#define FIELDSTOP_TWO_MIRROR_FACT_WIDER_THAN_TOLD 1

/** A telescope: objective or primary mirror, with the Barlow or reducer that is in use. */
typedef struct fieldstop_telescope {
    /** Member 1. Diameter of the entrance pupil, micrometres; not 0. */
    uint32_t aperture_um;
    /** Member 2. Focal length without Barlow or reducer, micrometres; not 0. */
    uint32_t focal_length_um;
    /** Member 3. Diameter of the central obstruction, micrometres, under the aperture; 0: none. */
    uint32_t obstruction_um;
    /**
     * Member 4. What a Barlow (over 1) or reducer (under 1) multiplies the focal length by, unsigned Q16.16;
     * 65536 where there is none; not 0.
     */
    uint32_t amplification_q16;
    /**
     * Member 5. Share of the light that mirrors and glass pass on, without the obstruction's loss, unsigned
     * Q16.16, at most 65536; 0: unknown.
     */
    uint32_t throughput_q16;
} fieldstop_telescope;

/** An eyepiece. The field stop gives the true field best; without it the apparent field serves. */
typedef struct fieldstop_eyepiece {
    /** Member 1. Focal length, micrometres; not 0. */
    uint32_t focal_length_um;
    /**
     * Member 2. Diameter of the field stop as the telescope sees it (the effective one where lenses stand
     * before it), micrometres; 0: unknown.
     */
    uint32_t field_stop_um;
    /** Member 3. Apparent field, milliarcseconds, under 180 degrees (648,000,000); 0: unknown. */
    uint32_t apparent_field_mas;
    /**
     * Member 4. How angles at the eye grow with the angle on the sky: 0 equidistant, 1 rectilinear (named
     * constants). Matters only where the apparent field is used.
     */
    uint8_t mapping;
    /** Ignored. */
    uint8_t padding[3];
} fieldstop_eyepiece;

/** A camera at the focus. */
typedef struct fieldstop_camera {
    /** Member 1. Pitch of the single pixels, without binning, nanometres; not 0. */
    uint32_t pixel_nm;
    /** Member 2. Single pixels across the frame's width; not 0. */
    uint16_t columns;
    /** Member 3. Single pixels across the frame's height; not 0. */
    uint16_t rows;
    /**
     * Member 4. Pixels read out as one, along each side; 1 where they are read singly; not 0, not over the
     * columns or the rows.
     */
    uint8_t binning;
    /** Ignored. */
    uint8_t padding[3];
} fieldstop_camera;

/** An eye and the night that it observes in. A camera readout uses the seeing and the wavelength only. */
typedef struct fieldstop_observer {
    /**
     * Member 1. Faintest star that the bare eye sees here tonight, millimagnitudes; any value, 0 is
     * magnitude 0.
     */
    int32_t naked_eye_mmag;
    /** Member 2. Diameter of the eye's pupil in the dark, micrometres; 0: unknown. */
    uint32_t eye_pupil_um;
    /**
     * Member 3. Smallest angle that the eye parts, milliarcseconds; 0: unknown. 60,000 is acuity 1.0 on a
     * bright chart (ISO 8596); 120,000 to 240,000 at the eyepiece is common practice.
     */
    uint32_t eye_resolution_mas;
    /**
     * Member 4. Full width at half maximum of a star in a long exposure, by the air alone, microarcseconds;
     * 0: unknown.
     */
    uint32_t seeing_uas;
    /**
     * Member 5. Wavelength that resolution is stated for, nanometres; not 0. 550 is common practice for the
     * eye.
     */
    uint32_t wavelength_nm;
} fieldstop_observer;

/** A place to observe from. */
typedef struct fieldstop_site {
    /** Member 1. Latitude, north positive, binary angle; within a quarter turn (2^30) either way. */
    int32_t latitude_bam;
    /** Member 2. Longitude, counted toward the east, binary angle; any value. */
    uint32_t longitude_bam;
} fieldstop_site;

/**
 * What the eye gets at the eyepiece. Members from `focal_length_um` on are 0 where their bit in `available`
 * is clear.
 */
typedef struct fieldstop_visual_readout {
    /** Bits of the members that were wanted and could be known. */
    uint32_t available;
    /** What is worth telling beside the values; named constants. */
    uint32_t facts;
    /** Focal length with the Barlow or reducer, micrometres: f k. */
    uint32_t focal_length_um;
    /** Focal ratio with the Barlow or reducer: N = f k / D. */
    uint32_t focal_ratio_q16;
    /** Magnification: M = f k / fe. */
    uint32_t magnification_q16;
    /** Exit pupil, micrometres: D fe / (f k). */
    uint32_t exit_pupil_um;
    /**
     * Diameter of the sky in view, milliarcseconds: from the field stop where that is known, otherwise from
     * the apparent field by the eyepiece's mapping.
     */
    uint32_t true_field_mas;
    /** Rayleigh limit with the central obstruction, microarcseconds. */
    uint32_t resolution_uas;
    /** Dawes limit, microarcseconds: 116 arcsec mm / D. */
    uint32_t dawes_limit_uas;
    /** Magnification at which the exit pupil fills the eye's pupil: D / p. Below it light falls on the iris. */
    uint32_t lowest_magnification_q16;
    /**
     * Magnification at which the resolution limit reaches the smallest angle that this eye parts: eye
     * resolution / resolution. Above it no new detail shows.
     */
    uint32_t resolving_magnification_q16;
    /**
     * Unobstructed, loss-free aperture that gathers as much light, micrometres: Deff = D sqrt((1 - (d/D)^2)
     * T).
     */
    uint32_t effective_aperture_um;
    /**
     * Faintest star through the eyepiece, millimagnitudes: m0 + 5 log10(Deff / p). Where the exit pupil is
     * wider than the eye's, Deff is that of the part of the aperture which the eye takes in, p f k / fe
     * across instead of D.
     */
    int32_t limiting_magnitude_mmag;
    /**
     * Brightness of an extended object against the bare eye's view of it: T (min(1, (x/p)^2) - min(1,
     * (s/p)^2)), x the exit pupil and s the obstruction's shadow within it, d fe / (f k).
     */
    uint32_t surface_brightness_q16;
} fieldstop_visual_readout;

/**
 * What a camera gets at the focus. Members from `focal_length_um` on are 0 where their bit in `available` is
 * clear.
 */
typedef struct fieldstop_camera_readout {
    /** Bits of the members that were wanted and could be known. */
    uint32_t available;
    /** What is worth telling beside the values; named constants. */
    uint32_t facts;
    /** Focal length with the Barlow or reducer, micrometres: f k. */
    uint32_t focal_length_um;
    /** Focal ratio with the Barlow or reducer: N = f k / D. */
    uint32_t focal_ratio_q16;
    /**
     * Focal ratio of a loss-free, unobstructed telescope that exposes as long: f k / Deff = N / sqrt((1 -
     * (d/D)^2) T).
     */
    uint32_t t_number_q16;
    /** Sky across the frame's columns, milliarcseconds: 2 atan(p n / (2 f k)); binning does not change it. */
    uint32_t frame_width_mas;
    /** Sky across the frame's rows, milliarcseconds. */
    uint32_t frame_height_mas;
    /** Sky to one pixel as read out, with binning, microarcseconds: (1 rad) p b / (f k). */
    uint32_t pixel_scale_uas;
    /** Sky to one millimetre at the focus, milliarcseconds per millimetre: (1 rad) / (f k). */
    uint32_t plate_scale_mas_per_mm;
    /**
     * Full width at half maximum of a star's image, microarcseconds: seeing and diffraction as the root of
     * the sum of squares.
     */
    uint32_t star_fwhm_uas;
    /** Pixels as read out across that width. */
    uint32_t pixels_per_fwhm_q16;
    /** Finest detail that the optics pass at all, cycles per millimetre at the focus: 1 / (lambda N). */
    uint32_t cutoff_frequency_q16;
    /** The coarsest pixel that loses nothing of it in still air, nanometres: lambda f k / (2 D). */
    uint32_t nyquist_pixel_nm;
    /** Sky from corner to corner of the frame, milliarcseconds: 2 atan(p sqrt(c^2 + r^2) / (2 f k)). */
    uint32_t diagonal_mas;
} fieldstop_camera_readout;

/** What an eyepiece is wanted for. */
typedef struct fieldstop_visual_target {
    /** Member 1. To frame: the target's longer side, milliarcseconds; not 0. */
    uint32_t size_mas;
    /**
     * Member 2. To frame: the true field over the target's size that is wanted at least, unsigned Q16.16; not
     * under 65536. 81920, a quarter more than the target, is common practice.
     */
    uint32_t room_q16;
    /** Member 3. To split: the separation of the two stars, microarcseconds; not 0. */
    uint32_t separation_uas;
    /** Member 4. For an exit pupil: the one wanted, micrometres; not 0. */
    uint32_t exit_pupil_um;
    /**
     * Member 5. What it is: 0 to frame, 1 to split, 2 for an exit pupil (named constants). Members of the
     * other two are ignored.
     */
    uint8_t purpose;
    /** Ignored. */
    uint8_t padding[3];
} fieldstop_visual_target;

/**
 * An eyepiece, alone or with a Barlow or reducer, and what speaks for and against it. Members from
 * `magnification_q16` to `fit_q16` are 0 where their bit in `available` is clear.
 */
typedef struct fieldstop_visual_choice {
    /** Bits of the members that could be known. */
    uint32_t available;
    /** Why it stands where it stands; named constants. */
    uint32_t facts;
    /** Magnification: M = f k / fe. */
    uint32_t magnification_q16;
    /** Exit pupil, micrometres: D fe / (f k). */
    uint32_t exit_pupil_um;
    /** Diameter of the sky in view, milliarcseconds. */
    uint32_t true_field_mas;
    /**
     * What it gives over what is wanted. To frame: true field / size. To split: separation times
     * magnification / eye resolution. For an exit pupil: exit pupil / the one wanted.
     */
    uint32_t fit_q16;
    /** Place of the eyepiece in the list, counted from 0. */
    uint8_t eyepiece;
    /** Place of the Barlow or reducer in the list, counted from 0; 255: none. */
    uint8_t amplifier;
    /**
     * 0: it serves, and nothing speaks against it; 1: it serves, but its exit pupil is wide, its magnification
     * empty or the seeing shows; 2: it does not serve; 3: not known. For an exit pupil never 1.
     */
    uint8_t standing;
    /** 0. */
    uint8_t padding;
} fieldstop_visual_choice;

/** What a camera is to take. */
typedef struct fieldstop_camera_target {
    /** Member 1. The target's extent along the frame's columns, its width, milliarcseconds; not 0. */
    uint32_t width_mas;
    /** Member 2. Its extent along the frame's height, milliarcseconds; not 0. */
    uint32_t height_mas;
    /**
     * Member 3. Share of a frame that the next one takes again where it needs more than one, unsigned Q16.16,
     * under 65536; 0: none. 0.1 to 0.2 is common practice.
     */
    uint32_t overlap_q16;
} fieldstop_camera_target;

/**
 * A camera, alone or with a Barlow or reducer, and what it takes to get the whole target. Members from
 * `frame_width_mas` to `tiles_high` are 0 where their bit in `available` is clear.
 */
typedef struct fieldstop_camera_choice {
    /** Bits of the members that could be known. */
    uint32_t available;
    /** Why it stands where it stands; named constants. */
    uint32_t facts;
    /** Sky across the frame's columns, milliarcseconds. */
    uint32_t frame_width_mas;
    /** Sky across the frame's rows, milliarcseconds. */
    uint32_t frame_height_mas;
    /** Sky to one pixel as read out, microarcseconds. */
    uint32_t pixel_scale_uas;
    /** Pixels as read out across a star's image. */
    uint32_t pixels_per_fwhm_q16;
    /** Frames beside each other that the target's width takes. */
    uint32_t tiles_wide;
    /** Frames above each other that its height takes. */
    uint32_t tiles_high;
    /** Place of the camera in the list, counted from 0. */
    uint8_t camera;
    /** Place of the Barlow or reducer in the list, counted from 0; 255: none. */
    uint8_t amplifier;
    /** 0. */
    uint8_t padding[2];
} fieldstop_camera_choice;

/** Where things are in a Newtonian telescope, and how it stands. A Barlow or reducer does not count here. */
typedef struct fieldstop_newtonian_layout {
    /**
     * Member 1. From the centre of the diagonal to the focus, micrometres; not over the telescope's focal
     * length, or what rests on it is not available.
     */
    uint32_t focus_distance_um;
    /** Member 2. Diameter at the focus that the whole aperture is to light, micrometres; 0: the centre only. */
    uint32_t lit_field_um;
    /** Member 3. How far from the axis the edge of the field is whose light is asked for, micrometres. */
    uint32_t edge_offset_um;
    /** Member 4. Minor axis of the diagonal that is in place, micrometres; 0: as large as it must be. */
    uint32_t diagonal_um;
    /** Member 5. The altitude axis above the place where the observer stands, micrometres. */
    uint32_t axis_height_um;
    /**
     * Member 6. From the altitude axis to the eyepiece along the tube, micrometres; negative where the
     * eyepiece is at the lower end.
     */
    int32_t reach_um;
    /** Member 7. Where the telescope points now, binary angle from 0 to 90 degrees (0x40000000). */
    int32_t altitude_bam;
    /** Member 8. The lowest altitude that it points to, from 0 to 90 degrees. */
    int32_t lowest_altitude_bam;
    /** Member 9. The highest, from 0 to 90 degrees, not under the lowest. */
    int32_t highest_altitude_bam;
    /** Member 10. An eyepiece above this height is told as a fact, micrometres; 0: none is. */
    uint32_t height_limit_um;
} fieldstop_newtonian_layout;

/**
 * What a telescope of two mirrors with a convex secondary is made of. The telescope's focal length is that of
 * the system; a Barlow or reducer does not count here.
 */
typedef struct fieldstop_two_mirror_layout {
    /**
     * Member 1. Focal length of the primary mirror, micrometres; not 0. Unless the system's is longer, nothing
     * is available.
     */
    uint32_t primary_focal_um;
    /** Member 2. The focus behind the primary's vertex, micrometres. */
    uint32_t back_focus_um;
    /** Member 3. Diameter at the focus that the whole aperture is to light, micrometres; 0: the centre only. */
    uint32_t lit_field_um;
} fieldstop_two_mirror_layout;

/** A focuser, and the tube whose length moves the focus. Any values can be used. */
typedef struct fieldstop_focuser {
    /** Member 1. Travel of one step of the motor, nanometres; 0: unknown. */
    uint32_t motor_step_nm;
    /** Member 2. The distance from the best focus that is asked about, nanometres; 0 is in focus. */
    uint32_t defocus_nm;
    /**
     * Member 3. Length that grows with the temperature between the objective and the focus, micrometres; 0:
     * unknown.
     */
    uint32_t tube_length_um;
    /** Member 4. Its thermal expansion, parts per billion per kelvin; 0: unknown. */
    uint32_t expansion_ppb_per_k;
} fieldstop_focuser;

/**
 * How exact the focus must be, and what it costs to be off. Members from `focal_ratio_q16` on are 0 where
 * their bit in `available` is clear.
 */
typedef struct fieldstop_focus_readout {
    /** Bits of the members that were wanted and could be known. */
    uint32_t available;
    /** What is worth telling beside the values; named constants. */
    uint32_t facts;
    /** Focal ratio with the Barlow or reducer: N = f k / D. */
    uint32_t focal_ratio_q16;
    /** How far from the best focus, each side, the wavefront is a quarter wave off, nanometres: 2 lambda N^2. */
    uint32_t depth_nm;
    /** The same in steps of the motor, to the nearest. */
    uint32_t depth_steps;
    /** Change of temperature that moves the focus so far, millikelvin: depth / (length expansion). */
    uint32_t temperature_mk;
    /** Width of a star's image at the defocus asked about, by geometry, nanometres: defocus / N. */
    uint32_t blur_nm;
    /** The same on the sky, microarcseconds: (1 rad) blur / (f k). */
    uint32_t blur_angle_uas;
    /** Error of the wavefront there, peak to valley, nanometres: defocus / (8 N^2). */
    uint32_t wavefront_nm;
} fieldstop_focus_readout;

/**
 * A Newtonian's diagonal, the light that it passes, and the height of the eyepiece. Members from
 * `diagonal_um` on are 0 where their bit in `available` is clear.
 */
typedef struct fieldstop_newtonian_readout {
    /** Bits of the members that were wanted and could be known. */
    uint32_t available;
    /** What is worth telling beside the values; named constants. */
    uint32_t facts;
    /** Minor axis of the smallest diagonal that lights the field wanted, micrometres. */
    uint32_t diagonal_um;
    /** How far its centre lies away from the focuser, and as much toward the primary, micrometres. */
    uint32_t diagonal_offset_um;
    /** The diagonal in place over the aperture. */
    uint32_t obstruction_q16;
    /** Width of the beam at the diagonal, micrometres: D L / f. */
    uint32_t beam_um;
    /** How far off the axis the beam to the edge of the field is there, micrometres: y (f - L) / f. */
    uint32_t beam_shift_um;
    /** Share of the light on the axis that the diagonal in place passes to the edge of the field. */
    uint32_t edge_light_q16;
    /** The eyepiece above the place where the observer stands, now, micrometres. */
    uint32_t eyepiece_height_um;
    /** The same at the altitude where it is highest, micrometres. */
    uint32_t greatest_height_um;
} fieldstop_newtonian_readout;

/**
 * Where the second mirror goes and what it is. Members from `secondary_magnification_q16` on are 0 where their
 * bit in `available` is clear.
 */
typedef struct fieldstop_two_mirror_readout {
    /** Bits of the members that were wanted and could be known. */
    uint32_t available;
    /** What is worth telling beside the values; named constants. */
    uint32_t facts;
    /** How much longer the secondary makes the focal length: m = F / f1. */
    uint32_t secondary_magnification_q16;
    /** From the primary's vertex to the secondary's, micrometres: f1 - p, p = (f1 + b) / (m + 1). */
    uint32_t separation_um;
    /** Diameter of the secondary with the margin for the lit field, micrometres: D p / f1 + i (f1 - p) / F. */
    uint32_t secondary_um;
    /** Radius of curvature of the secondary, convex, micrometres: 2 p m / (m - 1). */
    uint32_t secondary_radius_um;
    /** That diameter over the aperture. */
    uint32_t obstruction_q16;
    /** From the secondary to the focus, micrometres: the separation and the back focus. */
    uint32_t length_um;
    /** That length over the focal length: how short the tube is for it. */
    uint32_t length_share_q16;
} fieldstop_two_mirror_readout;

/**
 * Gives 0 for a telescope that can be used; otherwise the cause, with the number of the first bad member,
 * counted from 1, in the place of the argument.
 *
 * Members: aperture_um not 0 (1), focal_length_um not 0 (2), obstruction_um under the aperture (3; 0: none),
 * amplification_q16 not 0 (4; 65536: none), throughput_q16 at most 65536 (5; 0: unknown).
 * Statuses: null pointer, zero, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_telescope_check(const struct fieldstop_telescope *telescope);

/**
 * Gives 0 for an eyepiece that can be used; otherwise the cause, with the number of the first bad member,
 * counted from 1, in the place of the argument.
 *
 * Members: focal_length_um not 0 (1), field_stop_um (2; 0: unknown), apparent_field_mas under 648,000,000,
 * half a turn (3; 0: unknown), mapping FIELDSTOP_EQUIDISTANT or FIELDSTOP_RECTILINEAR (4).
 * Statuses: null pointer, zero, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_eyepiece_check(const struct fieldstop_eyepiece *eyepiece);

/**
 * Gives 0 for a camera that can be used; otherwise the cause, with the number of the first bad member,
 * counted from 1, in the place of the argument.
 *
 * Members: pixel_nm not 0 (1), columns not 0 (2), rows not 0 (3), binning not 0, not over the columns or the
 * rows (4).
 * Statuses: null pointer, zero, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_camera_check(const struct fieldstop_camera *camera);

/**
 * Gives 0 for an observer that can be used; otherwise the cause, with the number of the first bad member,
 * counted from 1, in the place of the argument.
 *
 * Members: naked_eye_mmag (1), eye_pupil_um (2; 0: unknown), eye_resolution_mas (3; 0: unknown), seeing_uas
 * (4; 0: unknown), wavelength_nm not 0 (5).
 * Statuses: null pointer, zero.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_observer_check(const struct fieldstop_observer *observer);

/**
 * Gives 0 for a site that can be used; otherwise the cause, with the number of the first bad member, counted
 * from 1, in the place of the argument.
 *
 * Members: latitude_bam within a quarter turn either way (1), longitude_bam (2).
 * Statuses: null pointer, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_site_check(const struct fieldstop_site *site);

/**
 * Gives what the eye gets at the eyepiece: the wanted values, each in the unit of its name, and the facts
 * about them.
 *
 * wanted: any of the FIELDSTOP_VISUAL_ bits; only those values are computed, and unknown bits are ignored.
 * Formulas: beside each member of the readout; a value is exactly that of the fixed function of the formula.
 * A value that rests on something unknown (eye pupil, eye resolution, field, throughput) or that does not
 * fit its type is not available: its bit in `available` is clear and its member 0. The rest still comes.
 * Caution: never point unfiltered optics at the Sun; follow the maker's instructions and local rules.
 * Statuses: null pointer; zero or out of range, as the check of the first bad struct gives it, with the
 * struct's position (telescope 1, eyepiece 2, observer 3): its check names the member.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_visual_readout_compute(const struct fieldstop_telescope *telescope,
                                                  const struct fieldstop_eyepiece *eyepiece,
                                                  const struct fieldstop_observer *observer,
                                                  uint32_t wanted,
                                                  struct fieldstop_visual_readout *readout);

/**
 * Gives what a camera gets at the focus: the wanted values, each in the unit of its name, and the facts
 * about them.
 *
 * wanted: any of the FIELDSTOP_CAMERA_ bits; only those values are computed, and unknown bits are ignored.
 * Formulas: beside each member of the readout; a value is exactly that of the fixed function of the formula.
 * A value that rests on something unknown (seeing, throughput) or that does not fit its type is not
 * available: its bit in `available` is clear and its member 0. The rest still comes.
 * Caution: never point unfiltered optics at the Sun; follow the maker's instructions and local rules.
 * Statuses: null pointer; zero or out of range, as the check of the first bad struct gives it, with the
 * struct's position (telescope 1, camera 2, observer 3): its check names the member.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_camera_readout_compute(const struct fieldstop_telescope *telescope,
                                                  const struct fieldstop_camera *camera,
                                                  const struct fieldstop_observer *observer,
                                                  uint32_t wanted,
                                                  struct fieldstop_camera_readout *readout);

/**
 * Fills `choices` with the best eyepieces for a target, each alone and with each Barlow or reducer, the best first.
 *
 * observer: as for the readout.
 * telescope: its own amplification is not used. eyepieces: 1 to 16. amplifiers_q16: what each Barlow or reducer
 * multiplies the focal length by, none 0, up to 8; may be null where there is none. choice_count: on entry the room in
 * `choices`, not 0; on success how many are filled, at most eyepieces times (1 + amplifiers). What stands behind
 * them in `choices` is then 0.
 * The order, from the first that differs: (1) the lower `standing`; (2) to frame the smaller true field, or the larger
 * where it does not serve; to split the lower magnification, or the higher where it does not part the stars; for an
 * exit pupil the smaller ratio of the larger to the smaller; (3) without a Barlow or reducer before with one, then
 * its place in the list, then the place of the eyepiece.
 * Values are those of fieldstop_visual_readout_compute, and comparisons are exact.
 * Caution: never point unfiltered optics at the Sun; follow the maker's instructions and local rules.
 * Statuses: null pointer; zero or out of range, as the check of the first bad struct gives it, with its position;
 * zero: eyepiece_count, an amplifier (argument 4), `*choice_count`; out of range: eyepiece_count, amplifier_count.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_visual_choose(const struct fieldstop_telescope *telescope,
                                         const struct fieldstop_eyepiece *eyepieces,
                                         uint8_t eyepiece_count,
                                         const uint32_t *amplifiers_q16,
                                         uint8_t amplifier_count,
                                         const struct fieldstop_observer *observer,
                                         const struct fieldstop_visual_target *target,
                                         struct fieldstop_visual_choice *choices,
                                         uint8_t *choice_count);

/**
 * Fills `choices` with the best cameras for a target, each alone and with each Barlow or reducer, the best first.
 *
 * observer: as for the readout.
 * telescope: its own amplification is not used. cameras: 1 to 8. amplifiers_q16: what each Barlow or reducer
 * multiplies the focal length by, none 0, up to 8; may be null where there is none. choice_count: on entry the room in
 * `choices`, not 0; on success how many are filled, at most cameras times (1 + amplifiers). What stands behind them
 * in `choices` is then 0.
 * Frames overlap by the share of a frame that the target says, rounded down to a milliarcsecond.
 * The order, from the first that differs: (1) the fewer frames, width times height; last, where they are not known;
 * (2) neither coarse nor fine sampling before either; (3) the finer pixel scale; (4) without a Barlow or reducer
 * before with one, then its place in the list, then the place of the camera.
 * Values are those of fieldstop_camera_readout_compute and fieldstop_tiles_fx.
 * Caution: never point unfiltered optics at the Sun; follow the maker's instructions and local rules.
 * Statuses: null pointer; zero or out of range, as the check of the first bad struct gives it, with its position;
 * zero: camera_count, an amplifier (argument 4), `*choice_count`; out of range: camera_count, amplifier_count.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_camera_choose(const struct fieldstop_telescope *telescope,
                                         const struct fieldstop_camera *cameras,
                                         uint8_t camera_count,
                                         const uint32_t *amplifiers_q16,
                                         uint8_t amplifier_count,
                                         const struct fieldstop_observer *observer,
                                         const struct fieldstop_camera_target *target,
                                         struct fieldstop_camera_choice *choices,
                                         uint8_t *choice_count);

/**
 * Gives 0 for a Newtonian's layout that can be used; otherwise the cause, with the number of the first bad member,
 * counted from 1, in the place of the argument.
 *
 * Members: focus_distance_um (1), lit_field_um (2), edge_offset_um (3), diagonal_um (4; 0: as large as it must be),
 * axis_height_um (5), reach_um (6), altitude_bam 0 to 0x40000000, which is 90 degrees (7), lowest_altitude_bam
 * likewise (8), highest_altitude_bam likewise, not under the lowest (9), height_limit_um (10; 0: none).
 * Statuses: null pointer, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_newtonian_layout_check(const struct fieldstop_newtonian_layout *layout);

/**
 * Gives 0 for a layout of two mirrors that can be used; otherwise the cause, with the number of the first bad member,
 * counted from 1, in the place of the argument.
 *
 * Members: primary_focal_um not 0 (1), back_focus_um (2), lit_field_um (3).
 * Statuses: null pointer, zero.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_two_mirror_layout_check(const struct fieldstop_two_mirror_layout *layout);

/**
 * Gives how exact the focus must be and what it costs to be off: the wanted values, each in the unit of its name,
 * and the facts about them.
 *
 * focuser: any values. wanted: any of the FIELDSTOP_FOCUS_ bits; only those values are computed, and unknown bits are ignored.
 * Formulas: beside each member of the readout; a value is exactly that of the fixed function of the formula.
 * A value that rests on something unknown (motor step, tube, expansion) or that does not fit its type is not
 * available: its bit in `available` is clear and its member 0. The rest still comes.
 * Caution: never point unfiltered optics at the Sun; follow the maker's instructions and local rules.
 * Statuses: null pointer; zero or out of range, as the check of the first bad struct gives it, with the
 * struct's position (telescope 1, observer 3): its check names the member.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_focus_readout_compute(const struct fieldstop_telescope *telescope,
                                                 const struct fieldstop_focuser *focuser,
                                                 const struct fieldstop_observer *observer,
                                                 uint32_t wanted,
                                                 struct fieldstop_focus_readout *readout);

/**
 * Gives a Newtonian's diagonal, the light that it passes, and the height of the eyepiece: the wanted values, each in
 * the unit of its name, and the facts about them.
 *
 * wanted: any of the FIELDSTOP_NEWTONIAN_ bits; only those values are computed, and unknown bits are ignored.
 * Formulas: beside each member of the readout; a value is exactly that of the fixed function of the formula. The
 * telescope's Barlow or reducer does not count.
 * A value that has none with this layout (a focus distance over the focal length, an eyepiece under the floor) or
 * that does not fit its type is not available: its bit in `available` is clear and its member 0. The rest still comes.
 * Caution: at a high eyepiece stand on a stable platform, never on the top of a ladder, and clear of the moving
 * mount; never point unfiltered optics at the Sun; follow the maker's instructions and local rules.
 * Statuses: null pointer; zero or out of range, as the check of the first bad struct gives it, with the
 * struct's position (telescope 1, layout 2): its check names the member.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_newtonian_readout_compute(const struct fieldstop_telescope *telescope,
                                                     const struct fieldstop_newtonian_layout *layout,
                                                     uint32_t wanted,
                                                     struct fieldstop_newtonian_readout *readout);

/**
 * Gives where the second mirror of two goes and what it is: the wanted values, each in the unit of its name, and the
 * facts about them.
 *
 * wanted: any of the FIELDSTOP_TWO_MIRROR_ bits; only those values are computed, and unknown bits are ignored.
 * Formulas: beside each member of the readout; a value is that of the fixed functions of the formula, sums and
 * ratios of them rounded once more. The telescope's focal length is the system's; its Barlow or reducer does not count.
 * A value that has none with this layout (a system not longer than the primary) or that does not fit its type is not
 * available: its bit in `available` is clear and its member 0. The rest still comes.
 * Caution: never point unfiltered optics at the Sun; follow the maker's instructions and local rules.
 * Statuses: null pointer; zero or out of range, as the check of the first bad struct gives it, with the
 * struct's position (telescope 1, layout 2): its check names the member.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_two_mirror_readout_compute(const struct fieldstop_telescope *telescope,
                                                      const struct fieldstop_two_mirror_layout *layout,
                                                      uint32_t wanted,
                                                      struct fieldstop_two_mirror_readout *readout);

/* --------------------------------------------------------------------------------------------------
   The stored record: equipment, observers and sites with their names, as bytes in EEPROM or
   flash. */

/** Kind of entry: telescopes, up to 4 in a record. */
#define FIELDSTOP_KIND_TELESCOPE 0
/** Kind of entry: eyepieces, up to 16 in a record. */
#define FIELDSTOP_KIND_EYEPIECE 1
/** Kind of entry: Barlows and reducers, up to 8 in a record. */
#define FIELDSTOP_KIND_AMPLIFIER 2
/** Kind of entry: cameras, up to 4 in a record. */
#define FIELDSTOP_KIND_CAMERA 3
/** Kind of entry: observers, up to 4 in a record. */
#define FIELDSTOP_KIND_OBSERVER 4
/** Kind of entry: sites, up to 4 in a record. */
#define FIELDSTOP_KIND_SITE 5
/** In use: none of that kind. */
#define FIELDSTOP_NONE_IN_USE 255
/** Bytes of a record without entries. */
#define FIELDSTOP_RECORD_LEAST 28
/** Bytes of the longest record. */
#define FIELDSTOP_RECORD_MOST 976
/** Saving: refuse where there is a good record of a newer version. */
#define FIELDSTOP_KEEP_NEWER 0
/** Saving: save over a good record of a newer version. */
#define FIELDSTOP_REPLACE_NEWER 1

/** What the owner calls a piece of equipment: up to 12 bytes in the characters of the owner's display. */
typedef struct fieldstop_equipment_name {
    /** Bytes of the name, and zeros behind it; all 12 may be taken. */
    uint8_t text[12];
} fieldstop_equipment_name;

/** Which entry of each kind is in use: its index, or 255 for none. */
typedef struct fieldstop_in_use {
    /** Index of the telescope, or 255. */
    uint8_t telescope;
    /** Index of the eyepiece, or 255. */
    uint8_t eyepiece;
    /** Index of the Barlow or reducer, or 255. */
    uint8_t amplifier;
    /** Index of the camera, or 255. */
    uint8_t camera;
    /** Index of the observer, or 255. */
    uint8_t observer;
    /** Index of the site, or 255. */
    uint8_t site;
} fieldstop_in_use;

/**
 * Two places for a record in a storage.
 *
 * Where the storage must be erased, both begin and end where its erase units do.
 */
typedef struct fieldstop_slot_pair {
    /** Member 1. Where the first begins; a multiple of `write_bytes`. */
    uint32_t first;
    /** Member 2. Where the second begins; a multiple of `write_bytes`, and not within the first. */
    uint32_t second;
    /** Member 3. Bytes of each; a multiple of `write_bytes`, and at least 28. */
    uint32_t bytes;
    /** Member 4. Bytes that the storage writes at once: 1, 2, 4, 8, 16 or 32. */
    uint8_t write_bytes;
    /** Ignored. */
    uint8_t padding[3];
} fieldstop_slot_pair;

/**
 * Reads storage: fills `bytes` with the `length` bytes from `offset` on, and gives 0; anything else says that they
 * could not be read.
 *
 * Any part of a slot may be asked for, up to all of a record. Bytes that the part itself reports as damaged (flash
 * with an error-correcting code, after a torn write) are given as zeros, with 0.
 */
typedef fieldstop_status (*fieldstop_read)(void *context,
                                           uint32_t offset,
                                           uint8_t *bytes,
                                           uint16_t length);

/**
 * Writes storage: `length` bytes from `offset` on, and gives 0; anything else says that they could not be written.
 *
 * `length` is a multiple of the slot pair's write_bytes and at most 32; a write never crosses a multiple of 32 bytes from
 * the slot's start. It must have ended when the function returns.
 */
typedef fieldstop_status (*fieldstop_write)(void *context,
                                            uint32_t offset,
                                            const uint8_t *bytes,
                                            uint16_t length);

/**
 * Erases storage: the `length` bytes of a slot from `offset` on, and gives 0; anything else says that they could not be
 * erased.
 */
typedef fieldstop_status (*fieldstop_erase)(void *context, uint32_t offset, uint32_t length);

/**
 * Makes a record without entries of the buffer's first 28 bytes, and gives 0.
 *
 * After this and each function that puts something in, the record in the buffer is whole, with its checksum.
 * capacity: the buffer's bytes; one of FIELDSTOP_RECORD_MOST takes every record.
 * Statuses: null pointer; no room (2): under 28 bytes.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_record_begin(uint8_t *record,
                                        uint16_t capacity);

/**
 * Gives 0 for a good record at the front of these bytes: its checksum is right and its equipment passes the checks.
 *
 * length: bytes that may be read; more may follow the record.
 * Statuses: null pointer; no record (1): damaged, cut short, or none; newer record (1): whole, but of a version that
 * this library cannot read.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_record_check(const uint8_t *record,
                                        uint16_t length);

/**
 * Gives the record's own length in bytes, out of its header.
 *
 * length: bytes that may be read; more may follow the record.
 * Statuses: null pointer; no record, newer record (1). The checksum is not looked at: see fieldstop_record_check.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_record_get_length(const uint8_t *record,
                                             uint16_t length,
                                             uint16_t *out);

/**
 * Gives how many entries of a kind there are.
 *
 * length: bytes that may be read; more may follow the record. kind: one of the FIELDSTOP_KIND_ constants.
 * Statuses: null pointer; no record, newer record (1); out of range (3). The checksum is not looked at: see
 * fieldstop_record_check.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_record_get_count(const uint8_t *record,
                                            uint16_t length,
                                            uint8_t kind,
                                            uint8_t *out);

/**
 * Gives the name of an entry.
 *
 * length: bytes that may be read; more may follow the record. kind: one of the FIELDSTOP_KIND_ constants. index: from
 * 0, under the number of entries.
 * Statuses: null pointer; no record, newer record (1); out of range (3, 4). The checksum is not looked at: see
 * fieldstop_record_check.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_record_get_name(const uint8_t *record,
                                           uint16_t length,
                                           uint8_t kind,
                                           uint8_t index,
                                           struct fieldstop_equipment_name *name);

/**
 * Gives which entries are in use.
 *
 * length: bytes that may be read; more may follow the record.
 * Statuses: null pointer; no record, newer record (1). The checksum is not looked at: see fieldstop_record_check.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_record_get_in_use(const uint8_t *record,
                                             uint16_t length,
                                             struct fieldstop_in_use *used);

/**
 * Gives a telescope, of a record.
 *
 * length: bytes that may be read; more may follow the record. index: from 0, under the number of entries.
 * Statuses: null pointer; no record, newer record (1); out of range (3). The checksum is not looked at: see
 * fieldstop_record_check.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_record_get_telescope(const uint8_t *record,
                                                uint16_t length,
                                                uint8_t index,
                                                struct fieldstop_telescope *telescope);

/**
 * Gives an eyepiece, of a record.
 *
 * length: bytes that may be read; more may follow the record. index: from 0, under the number of entries.
 * Statuses: null pointer; no record, newer record (1); out of range (3). The checksum is not looked at: see
 * fieldstop_record_check.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_record_get_eyepiece(const uint8_t *record,
                                               uint16_t length,
                                               uint8_t index,
                                               struct fieldstop_eyepiece *eyepiece);

/**
 * Gives what a Barlow or reducer multiplies the focal length by, Q16.16, of a record.
 *
 * length: bytes that may be read; more may follow the record. index: from 0, under the number of entries.
 * Statuses: null pointer; no record, newer record (1); out of range (3). The checksum is not looked at: see
 * fieldstop_record_check.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_record_get_amplifier(const uint8_t *record,
                                                uint16_t length,
                                                uint8_t index,
                                                uint32_t *amplification_q16);

/**
 * Gives a camera, of a record.
 *
 * length: bytes that may be read; more may follow the record. index: from 0, under the number of entries.
 * Statuses: null pointer; no record, newer record (1); out of range (3). The checksum is not looked at: see
 * fieldstop_record_check.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_record_get_camera(const uint8_t *record,
                                             uint16_t length,
                                             uint8_t index,
                                             struct fieldstop_camera *camera);

/**
 * Gives an observer, of a record.
 *
 * length: bytes that may be read; more may follow the record. index: from 0, under the number of entries.
 * Statuses: null pointer; no record, newer record (1); out of range (3). The checksum is not looked at: see
 * fieldstop_record_check.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_record_get_observer(const uint8_t *record,
                                               uint16_t length,
                                               uint8_t index,
                                               struct fieldstop_observer *observer);

/**
 * Gives a site, of a record.
 *
 * length: bytes that may be read; more may follow the record. index: from 0, under the number of entries.
 * Statuses: null pointer; no record, newer record (1); out of range (3). The checksum is not looked at: see
 * fieldstop_record_check.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_record_get_site(const uint8_t *record,
                                           uint16_t length,
                                           uint8_t index,
                                           struct fieldstop_site *site);

/**
 * Puts a telescope and its name into a record, and gives 0: in place of the one of that index, or one more where the
 * index is their number.
 *
 * capacity: the buffer's bytes. On any status but 0 nothing is changed.
 * Statuses: null pointer; no record, newer record (1); out of range (3): a greater index, or no more of them in a
 * record; zero or out of range (4): fieldstop_telescope_check names the member; out of range (5): a name with bytes behind a zero; no room (2).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_record_put_telescope(uint8_t *record,
                                                uint16_t capacity,
                                                uint8_t index,
                                                const struct fieldstop_telescope *telescope,
                                                const struct fieldstop_equipment_name *name);

/**
 * Puts an eyepiece and its name into a record, and gives 0: in place of the one of that index, or one more where the
 * index is their number.
 *
 * capacity: the buffer's bytes. On any status but 0 nothing is changed.
 * Statuses: null pointer; no record, newer record (1); out of range (3): a greater index, or no more of them in a
 * record; zero or out of range (4): fieldstop_eyepiece_check names the member; out of range (5): a name with bytes behind a zero; no room (2).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_record_put_eyepiece(uint8_t *record,
                                               uint16_t capacity,
                                               uint8_t index,
                                               const struct fieldstop_eyepiece *eyepiece,
                                               const struct fieldstop_equipment_name *name);

/**
 * Puts a Barlow or reducer and its name into a record, and gives 0: in place of the one of that index, or one more where
 * the index is their number.
 *
 * amplification_q16: what it multiplies the focal length by, not 0. capacity: the buffer's bytes. On any status but 0 nothing is changed.
 * Statuses: null pointer; no record, newer record (1); out of range (3): a greater index, or no more of them in a
 * record; zero (4); out of range (5): a name with bytes behind a zero; no room (2).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_record_put_amplifier(uint8_t *record,
                                                uint16_t capacity,
                                                uint8_t index,
                                                uint32_t amplification_q16,
                                                const struct fieldstop_equipment_name *name);

/**
 * Puts a camera and its name into a record, and gives 0: in place of the one of that index, or one more where the
 * index is their number.
 *
 * capacity: the buffer's bytes. On any status but 0 nothing is changed.
 * Statuses: null pointer; no record, newer record (1); out of range (3): a greater index, or no more of them in a
 * record; zero or out of range (4): fieldstop_camera_check names the member; out of range (5): a name with bytes behind a zero; no room (2).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_record_put_camera(uint8_t *record,
                                             uint16_t capacity,
                                             uint8_t index,
                                             const struct fieldstop_camera *camera,
                                             const struct fieldstop_equipment_name *name);

/**
 * Puts an observer and its name into a record, and gives 0: in place of the one of that index, or one more where the
 * index is their number.
 *
 * capacity: the buffer's bytes. On any status but 0 nothing is changed.
 * Statuses: null pointer; no record, newer record (1); out of range (3): a greater index, or no more of them in a
 * record; zero (4): fieldstop_observer_check names the member; out of range (5): a name with bytes behind a zero; no room (2).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_record_put_observer(uint8_t *record,
                                               uint16_t capacity,
                                               uint8_t index,
                                               const struct fieldstop_observer *observer,
                                               const struct fieldstop_equipment_name *name);

/**
 * Puts a site and its name into a record, and gives 0: in place of the one of that index, or one more where the
 * index is their number.
 *
 * capacity: the buffer's bytes. On any status but 0 nothing is changed.
 * Statuses: null pointer; no record, newer record (1); out of range (3): a greater index, or no more of them in a
 * record; out of range (4): beyond a pole; out of range (5): a name with bytes behind a zero; no room (2).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_record_put_site(uint8_t *record,
                                           uint16_t capacity,
                                           uint8_t index,
                                           const struct fieldstop_site *site,
                                           const struct fieldstop_equipment_name *name);

/**
 * Says which entries are in use, and gives 0.
 *
 * capacity: the buffer's bytes. used: of each kind an index, or FIELDSTOP_NONE_IN_USE.
 * Statuses: null pointer; no record, newer record (1); out of range (3): no such entry.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_record_put_in_use(uint8_t *record,
                                             uint16_t capacity,
                                             const struct fieldstop_in_use *used);

/**
 * Takes an entry out of a record, and gives 0. Those behind it move up by one; what was in use stays so, but for the
 * entry itself.
 *
 * capacity: the buffer's bytes. kind: one of the FIELDSTOP_KIND_ constants.
 * Statuses: null pointer; no record, newer record (1); out of range (3, 4).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_record_remove(uint8_t *record,
                                         uint16_t capacity,
                                         uint8_t kind,
                                         uint8_t index);

/**
 * Gives 0 for a slot pair that can be used; otherwise the cause, with the number of the first bad member, counted from 1, in
 * the place of the argument.
 *
 * Members: first (1) and second (2) are multiples of write_bytes, the slots do not overlap nor end beyond 2^32; bytes
 * (3) is a multiple of write_bytes, at least 28; write_bytes (4) is 1, 2, 4, 8, 16 or 32.
 * Statuses: null pointer, out of range.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_slot_pair_check(const struct fieldstop_slot_pair *places);

/**
 * Reads the last good record into the buffer, and gives its length in bytes.
 *
 * places: the two slots, as fieldstop_slot_pair_check has them. capacity: the buffer's bytes; one of
 * FIELDSTOP_RECORD_MOST takes every record. context: given to read as it is, and
 * may be null.
 * Statuses: null pointer (1, 2, 4, 6); out of range (1): fieldstop_slot_pair_check names the member; no record: neither slot
 * has a good one; newer record: the last good one is of a version that this library cannot read; no room (5); storage:
 * read gave another number than 0, or not the same bytes twice, and only then the buffer's bytes may have changed.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_store_load(const struct fieldstop_slot_pair *places,
                                      fieldstop_read read,
                                      void *context,
                                      uint8_t *record,
                                      uint16_t capacity,
                                      uint16_t *out);

/**
 * Saves a record into the slot that does not have the last good one, and gives 0. Wherever the power fails, loading
 * gives the record before or this one, whole.
 *
 * places: the two slots, as fieldstop_slot_pair_check has them. capacity: bytes that may be read; more may follow the record. read, write and erase must be those of one storage;
 * erase is null where bytes can be written over as they are (EEPROM, FRAM). context: given to them as it is, and may be
 * null. newer: FIELDSTOP_KEEP_NEWER or FIELDSTOP_REPLACE_NEWER.
 * Statuses: null pointer (1, 2, 3, 6); out of range (1): fieldstop_slot_pair_check names the member; no record, newer
 * record (6): what is to be saved is not good; out of range (8); no room (7): it is longer than a slot; newer record
 * (0): a slot has one, which newer says to keep; storage: a function gave another number than 0, or what was written
 * does not read the same. The last good record is still there then.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_store_save(const struct fieldstop_slot_pair *places,
                                      fieldstop_read read,
                                      fieldstop_write write,
                                      fieldstop_erase erase,
                                      void *context,
                                      const uint8_t *record,
                                      uint16_t capacity,
                                      uint8_t newer);

/* --------------------------------------------------------------------------------------------------
   Quantities as characters of a display: integers only, into a buffer of the caller's. */

/** Angle: decimal seconds under one minute, whole seconds under one degree, whole minutes from there on. */
#define FIELDSTOP_ANGLE_BY_SIZE 0
/** Angle: degrees with decimals. */
#define FIELDSTOP_ANGLE_DECIMAL_DEGREES 1
/** Angle: degrees and minutes. */
#define FIELDSTOP_ANGLE_DEGREES_MINUTES 2
/** Angle: minutes and seconds, with degrees in front from sixty minutes on. */
#define FIELDSTOP_ANGLE_MINUTES_SECONDS 3
/** Angle: seconds, however many. */
#define FIELDSTOP_ANGLE_DECIMAL_SECONDS 4
/** Unit: a plain number. */
#define FIELDSTOP_UNIT_NONE 0
/** Unit: between degrees and minutes of arc. */
#define FIELDSTOP_UNIT_DEGREE 1
/** Unit: minutes of arc. */
#define FIELDSTOP_UNIT_MINUTE 2
/** Unit: seconds of arc. */
#define FIELDSTOP_UNIT_SECOND 3
/** Unit: degrees with decimals. */
#define FIELDSTOP_UNIT_DECIMAL_DEGREE 4
/** Unit: metres. */
#define FIELDSTOP_UNIT_METRE 5
/** Unit: millimetres. */
#define FIELDSTOP_UNIT_MILLIMETRE 6
/** Unit: micrometres. */
#define FIELDSTOP_UNIT_MICROMETRE 7
/** Unit: nanometres. */
#define FIELDSTOP_UNIT_NANOMETRE 8
/** Unit: magnification. */
#define FIELDSTOP_UNIT_TIMES 9
/** Unit: per hundred. */
#define FIELDSTOP_UNIT_PERCENT 10
/** Unit: magnitudes. */
#define FIELDSTOP_UNIT_MAGNITUDE 11
/** Unit: in front of a focal ratio. */
#define FIELDSTOP_UNIT_FOCAL_RATIO 12
/** Unit: pixels. */
#define FIELDSTOP_UNIT_PIXEL 13
/** Unit: seconds of arc to a pixel. */
#define FIELDSTOP_UNIT_SECOND_PER_PIXEL 14
/** Unit: seconds of arc to a millimetre. */
#define FIELDSTOP_UNIT_SECOND_PER_MILLIMETRE 15
/** Unit: seconds of arc in a second of time. */
#define FIELDSTOP_UNIT_SECOND_PER_TIME 16
/** Unit: cycles to a millimetre. */
#define FIELDSTOP_UNIT_PER_MILLIMETRE 17
/** Unit: seconds of time. */
#define FIELDSTOP_UNIT_TIME 18
/** Unit: steps of a motor. */
#define FIELDSTOP_UNIT_STEP 19
/** Unit: kelvin. */
#define FIELDSTOP_UNIT_KELVIN 20
/** Unit: watts. */
#define FIELDSTOP_UNIT_WATT 21
/** Rows of the visual pages, and labels that they need. */
#define FIELDSTOP_VISUAL_ROWS 16
/** Visual row: magnification. */
#define FIELDSTOP_VISUAL_ROW_MAGNIFICATION 0
/** Visual row: true field. */
#define FIELDSTOP_VISUAL_ROW_TRUE_FIELD 1
/** Visual row: exit pupil. */
#define FIELDSTOP_VISUAL_ROW_EXIT_PUPIL 2
/** Visual row: resolution. */
#define FIELDSTOP_VISUAL_ROW_RESOLUTION 3
/** Visual row: faintest star. */
#define FIELDSTOP_VISUAL_ROW_FAINTEST_STAR 4
/** Visual row: surface brightness. */
#define FIELDSTOP_VISUAL_ROW_SURFACE_BRIGHTNESS 5
/** Visual row: focal ratio. */
#define FIELDSTOP_VISUAL_ROW_FOCAL_RATIO 6
/** Visual row: focal length. */
#define FIELDSTOP_VISUAL_ROW_FOCAL_LENGTH 7
/** Visual row: lowest magnification. */
#define FIELDSTOP_VISUAL_ROW_LOWEST_MAGNIFICATION 8
/** Visual row: resolving magnification. */
#define FIELDSTOP_VISUAL_ROW_RESOLVING_MAGNIFICATION 9
/** Visual row: dawes limit. */
#define FIELDSTOP_VISUAL_ROW_DAWES_LIMIT 10
/** Visual row: effective aperture. */
#define FIELDSTOP_VISUAL_ROW_EFFECTIVE_APERTURE 11
/** Visual row: wide exit pupil. */
#define FIELDSTOP_VISUAL_ROW_WIDE_EXIT_PUPIL 12
/** Visual row: empty magnification. */
#define FIELDSTOP_VISUAL_ROW_EMPTY_MAGNIFICATION 13
/** Visual row: field from apparent. */
#define FIELDSTOP_VISUAL_ROW_FIELD_FROM_APPARENT 14
/** Visual row: seeing limited. */
#define FIELDSTOP_VISUAL_ROW_SEEING_LIMITED 15
/** Rows of the camera pages, and labels that they need. */
#define FIELDSTOP_CAMERA_ROWS 14
/** Camera row: frame width. */
#define FIELDSTOP_CAMERA_ROW_FRAME_WIDTH 0
/** Camera row: frame height. */
#define FIELDSTOP_CAMERA_ROW_FRAME_HEIGHT 1
/** Camera row: pixel scale. */
#define FIELDSTOP_CAMERA_ROW_PIXEL_SCALE 2
/** Camera row: star width. */
#define FIELDSTOP_CAMERA_ROW_STAR_WIDTH 3
/** Camera row: star pixels. */
#define FIELDSTOP_CAMERA_ROW_STAR_PIXELS 4
/** Camera row: focal ratio. */
#define FIELDSTOP_CAMERA_ROW_FOCAL_RATIO 5
/** Camera row: t-number. */
#define FIELDSTOP_CAMERA_ROW_T_NUMBER 6
/** Camera row: focal length. */
#define FIELDSTOP_CAMERA_ROW_FOCAL_LENGTH 7
/** Camera row: plate scale. */
#define FIELDSTOP_CAMERA_ROW_PLATE_SCALE 8
/** Camera row: diagonal. */
#define FIELDSTOP_CAMERA_ROW_DIAGONAL 9
/** Camera row: cutoff. */
#define FIELDSTOP_CAMERA_ROW_CUTOFF 10
/** Camera row: nyquist pixel. */
#define FIELDSTOP_CAMERA_ROW_NYQUIST_PIXEL 11
/** Camera row: coarse sampling. */
#define FIELDSTOP_CAMERA_ROW_COARSE_SAMPLING 12
/** Camera row: fine sampling. */
#define FIELDSTOP_CAMERA_ROW_FINE_SAMPLING 13
/** Caution: where a fact tells that the eyepiece is high. */
#define FIELDSTOP_CAUTION_HIGH_EYEPIECE 0
/** Caution: where the Sun may be near. */
#define FIELDSTOP_CAUTION_SUN 1
/** Rows of the focus pages, and labels that they need. */
#define FIELDSTOP_FOCUS_ROWS 9
/** Focus row: depth of focus. */
#define FIELDSTOP_FOCUS_ROW_DEPTH_OF_FOCUS 0
/** Focus row: depth steps. */
#define FIELDSTOP_FOCUS_ROW_DEPTH_STEPS 1
/** Focus row: temperature. */
#define FIELDSTOP_FOCUS_ROW_TEMPERATURE 2
/** Focus row: blur. */
#define FIELDSTOP_FOCUS_ROW_BLUR 3
/** Focus row: blur angle. */
#define FIELDSTOP_FOCUS_ROW_BLUR_ANGLE 4
/** Focus row: wavefront. */
#define FIELDSTOP_FOCUS_ROW_WAVEFRONT 5
/** Focus row: focal ratio. */
#define FIELDSTOP_FOCUS_ROW_FOCAL_RATIO 6
/** Focus row: coarse step. */
#define FIELDSTOP_FOCUS_ROW_COARSE_STEP 7
/** Focus row: out of focus. */
#define FIELDSTOP_FOCUS_ROW_OUT_OF_FOCUS 8
/** Rows of the pages of a Newtonian's layout, and labels that they need. */
#define FIELDSTOP_NEWTONIAN_ROWS 12
/** Newtonian row: diagonal. */
#define FIELDSTOP_NEWTONIAN_ROW_DIAGONAL 0
/** Newtonian row: diagonal offset. */
#define FIELDSTOP_NEWTONIAN_ROW_DIAGONAL_OFFSET 1
/** Newtonian row: obstruction. */
#define FIELDSTOP_NEWTONIAN_ROW_OBSTRUCTION 2
/** Newtonian row: edge light. */
#define FIELDSTOP_NEWTONIAN_ROW_EDGE_LIGHT 3
/** Newtonian row: eyepiece height. */
#define FIELDSTOP_NEWTONIAN_ROW_EYEPIECE_HEIGHT 4
/** Newtonian row: greatest height. */
#define FIELDSTOP_NEWTONIAN_ROW_GREATEST_HEIGHT 5
/** Newtonian row: beam. */
#define FIELDSTOP_NEWTONIAN_ROW_BEAM 6
/** Newtonian row: beam shift. */
#define FIELDSTOP_NEWTONIAN_ROW_BEAM_SHIFT 7
/** Newtonian row: small diagonal. */
#define FIELDSTOP_NEWTONIAN_ROW_SMALL_DIAGONAL 8
/** Newtonian row: wider than told. */
#define FIELDSTOP_NEWTONIAN_ROW_WIDER_THAN_TOLD 9
/** Newtonian row: high eyepiece. */
#define FIELDSTOP_NEWTONIAN_ROW_HIGH_EYEPIECE 10
/** Newtonian row: high reached. */
#define FIELDSTOP_NEWTONIAN_ROW_HIGH_REACHED 11
/** Rows of the pages of two mirrors' layout, and labels that they need. */
#define FIELDSTOP_TWO_MIRROR_ROWS 8
/** Two-mirror row: separation. */
#define FIELDSTOP_TWO_MIRROR_ROW_SEPARATION 0
/** Two-mirror row: secondary. */
#define FIELDSTOP_TWO_MIRROR_ROW_SECONDARY 1
/** Two-mirror row: radius. */
#define FIELDSTOP_TWO_MIRROR_ROW_RADIUS 2
/** Two-mirror row: obstruction. */
#define FIELDSTOP_TWO_MIRROR_ROW_OBSTRUCTION 3
/** Two-mirror row: secondary magnification. */
#define FIELDSTOP_TWO_MIRROR_ROW_SECONDARY_MAGNIFICATION 4
/** Two-mirror row: length. */
#define FIELDSTOP_TWO_MIRROR_ROW_LENGTH 5
/** Two-mirror row: length share. */
#define FIELDSTOP_TWO_MIRROR_ROW_LENGTH_SHARE 6
/** Two-mirror row: wider than told. */
#define FIELDSTOP_TWO_MIRROR_ROW_WIDER_THAN_TOLD 7

/**
 * The look of all text. Plain data that the caller owns: copy one of the ready ones and change what you like.
 *
 * A text is up to 8 bytes of the display's character set, filled up with zeros.
 */
typedef struct fieldstop_text_style {
    /** The text of unit number n in place n - 1, with the blank before it where one is wanted. */
    uint8_t units[21][8];
    /** Stands where a value is not available. */
    uint8_t dash[8];
    /** Answers whether a fact holds. */
    uint8_t yes[8];
    /** Answers whether a fact holds. */
    uint8_t no[8];
    /** Point or comma, one byte; in UTF-8 one of ASCII. */
    uint8_t decimal_mark;
    /** Stands before a value that a fact of the readout concerns, one byte; in UTF-8 one of ASCII. */
    uint8_t fact_mark;
    /** 1: texts are UTF-8, and a character may take several bytes. 0: every byte is a character. */
    uint8_t utf8;
} fieldstop_text_style;

/** A part of a line, in characters. */
typedef struct fieldstop_span {
    /** The first character that is different, counted from 0. */
    uint16_t first;
    /** Characters from there to the last that is different; 0 where nothing is. */
    uint16_t count;
} fieldstop_span;

/**
 * Gives the style of plain ASCII; never null.
 *
 * `d` and `deg` stand for the degree sign, `u` for micro, `x` for times. Copy it to change the decimal mark or a text.
 * On AVR this and all styles and labels are in program memory (PROGMEM).
 */
const struct fieldstop_text_style *fieldstop_text_style_ascii(void);

/** Gives the style of UTF-8, with the signs of degree, prime, double prime, micro and times; never null. */
const struct fieldstop_text_style *fieldstop_text_style_utf8(void);

/**
 * Gives the style of character displays with ROM A00 (Japanese) of the HD44780U; never null.
 *
 * The codes are from memory of the data sheet: try them on your display.
 */
const struct fieldstop_text_style *fieldstop_text_style_hd44780_a00(void);

/**
 * Gives the style of character displays with ROM A02 (European) of the HD44780U; never null.
 *
 * The codes are from memory of the data sheet: try them on your display.
 */
const struct fieldstop_text_style *fieldstop_text_style_hd44780_a02(void);

/**
 * Writes an integer with its unit as text and gives its length in bytes.
 *
 * Ranges: count any; unit one of FIELDSTOP_UNIT_...; width 0 (as long as it is) or the characters to fill,
 * right-aligned.
 * Statuses: null pointer, out of range (unit), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_count(uint32_t count,
                                      uint8_t unit,
                                      const struct fieldstop_text_style *style,
                                      uint8_t width,
                                      char *text,
                                      uint16_t capacity,
                                      uint16_t *length);

/**
 * Writes a length in millimetres as text and gives its length in bytes.
 *
 * length_um / 1000, to nearest, halves away from zero.
 * Ranges: decimals 0 to 3; width 0 (as long as it is) or the characters to fill, right-aligned.
 * Statuses: null pointer, out of range (decimals), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_length_mm(uint32_t length_um,
                                          uint8_t decimals,
                                          const struct fieldstop_text_style *style,
                                          uint8_t width,
                                          char *text,
                                          uint16_t capacity,
                                          uint16_t *length);

/**
 * Writes a length in micrometres as text and gives its length in bytes.
 *
 * length_nm / 1000, to nearest, halves away from zero.
 * Ranges: decimals 0 to 3; width 0 (as long as it is) or the characters to fill, right-aligned.
 * Statuses: null pointer, out of range (decimals), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_length_um(uint32_t length_nm,
                                          uint8_t decimals,
                                          const struct fieldstop_text_style *style,
                                          uint8_t width,
                                          char *text,
                                          uint16_t capacity,
                                          uint16_t *length);

/**
 * Writes a plain ratio as text and gives its length in bytes.
 *
 * ratio_q16 / 65536, to nearest, halves away from zero.
 * Ranges: decimals 0 to 4; width 0 (as long as it is) or the characters to fill, right-aligned.
 * Statuses: null pointer, out of range (decimals), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_ratio(uint32_t ratio_q16,
                                      uint8_t decimals,
                                      const struct fieldstop_text_style *style,
                                      uint8_t width,
                                      char *text,
                                      uint16_t capacity,
                                      uint16_t *length);

/**
 * Writes a magnification, as in 62.5x as text and gives its length in bytes.
 *
 * magnification_q16 / 65536, to nearest, halves away from zero.
 * Ranges: decimals 0 to 4; width 0 (as long as it is) or the characters to fill, right-aligned.
 * Statuses: null pointer, out of range (decimals), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_magnification(uint32_t magnification_q16,
                                              uint8_t decimals,
                                              const struct fieldstop_text_style *style,
                                              uint8_t width,
                                              char *text,
                                              uint16_t capacity,
                                              uint16_t *length);

/**
 * Writes a focal ratio, as in f/6.0 as text and gives its length in bytes.
 *
 * focal_ratio_q16 / 65536, to nearest, halves away from zero.
 * Ranges: decimals 0 to 4; width 0 (as long as it is) or the characters to fill, right-aligned.
 * Statuses: null pointer, out of range (decimals), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_focal_ratio(uint32_t focal_ratio_q16,
                                            uint8_t decimals,
                                            const struct fieldstop_text_style *style,
                                            uint8_t width,
                                            char *text,
                                            uint16_t capacity,
                                            uint16_t *length);

/**
 * Writes a ratio in per cent as text and gives its length in bytes.
 *
 * 100 ratio_q16 / 65536, to nearest, halves away from zero.
 * Ranges: decimals 0 to 2; width 0 (as long as it is) or the characters to fill, right-aligned.
 * Statuses: null pointer, out of range (decimals), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_percent(uint32_t ratio_q16,
                                        uint8_t decimals,
                                        const struct fieldstop_text_style *style,
                                        uint8_t width,
                                        char *text,
                                        uint16_t capacity,
                                        uint16_t *length);

/**
 * Writes an angle in seconds of arc as text and gives its length in bytes.
 *
 * angle_uas / 1000000, to nearest, halves away from zero.
 * Ranges: decimals 0 to 6; width 0 (as long as it is) or the characters to fill, right-aligned.
 * Statuses: null pointer, out of range (decimals), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_arcseconds(uint32_t angle_uas,
                                           uint8_t decimals,
                                           const struct fieldstop_text_style *style,
                                           uint8_t width,
                                           char *text,
                                           uint16_t capacity,
                                           uint16_t *length);

/**
 * Writes a magnitude as text and gives its length in bytes.
 *
 * magnitude_mmag / 1000, to nearest, halves away from zero.
 * Ranges: decimals 0 to 3; width 0 (as long as it is) or the characters to fill, right-aligned.
 * Statuses: null pointer, out of range (decimals), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_magnitude(int32_t magnitude_mmag,
                                          uint8_t decimals,
                                          const struct fieldstop_text_style *style,
                                          uint8_t width,
                                          char *text,
                                          uint16_t capacity,
                                          uint16_t *length);

/**
 * Writes an angle in degrees, minutes and seconds as text and gives its length in bytes.
 *
 * angle_mas / 1000 seconds of arc, to nearest in the last place shown, halves up, carried through: 59'59.6" in whole
 * seconds is one degree. By size is decided by the rounded angle; the decimals then are those of an angle under one
 * minute, larger ones have none.
 * Ranges: form one of FIELDSTOP_ANGLE_...; decimals 0 to 3, with minutes 0 to 2; width 0 (as long as it is) or
 * the characters to fill, right-aligned.
 * Statuses: null pointer, out of range (form, decimals), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_angle(uint32_t angle_mas,
                                      uint8_t form,
                                      uint8_t decimals,
                                      const struct fieldstop_text_style *style,
                                      uint8_t width,
                                      char *text,
                                      uint16_t capacity,
                                      uint16_t *length);

/**
 * Writes the text of a unit and gives its length in bytes.
 *
 * Ranges: unit one of FIELDSTOP_UNIT_...
 * Statuses: null pointer, out of range (unit), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_unit(uint8_t unit,
                                     const struct fieldstop_text_style *style,
                                     char *text,
                                     uint16_t capacity,
                                     uint16_t *length);

/** Gives the English labels of the visual pages for 20 columns and more, an array of FIELDSTOP_VISUAL_ROWS; never null. */
const char *const *fieldstop_text_visual_labels(void);

/** Gives the English labels of the visual pages for 8 and 16 columns, an array of FIELDSTOP_VISUAL_ROWS; never null. */
const char *const *fieldstop_text_visual_labels_short(void);

/**
 * Writes one line of the visual pages and gives its length in bytes; it is always `columns` characters long.
 *
 * `line` counts over all pages: line r of page p is p rows + r. From 16 columns on a line has the label, cut where it
 * must be, a mark where a fact concerns the value, and the value in its field at the right end; below 16 columns the
 * label and the value have a line each. A line behind the last row is blank.
 * Ranges: columns 8 to 255; labels an array of FIELDSTOP_VISUAL_ROWS.
 * Statuses: null pointer, out of range (columns), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_visual_line(const struct fieldstop_visual_readout *readout,
                                            const char *const *labels,
                                            const struct fieldstop_text_style *style,
                                            uint8_t columns,
                                            uint8_t line,
                                            char *text,
                                            uint16_t capacity,
                                            uint16_t *length);

/**
 * Writes a value of the visual pages with its unit and gives its length in bytes.
 *
 * In the form that the pages show; a dash where it is not available.
 * Ranges: row one of FIELDSTOP_VISUAL_ROW_...; width 0 (as long as it is) or the characters to fill, right-aligned.
 * Statuses: null pointer, out of range (row), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_visual_value(const struct fieldstop_visual_readout *readout,
                                             uint8_t row,
                                             const struct fieldstop_text_style *style,
                                             uint8_t width,
                                             char *text,
                                             uint16_t capacity,
                                             uint16_t *length);

/**
 * Writes a value of the visual pages without its unit and gives its length in bytes.
 *
 * In the form that the pages show; a dash where it is not available.
 * Ranges: row one of FIELDSTOP_VISUAL_ROW_...; width 0 (as long as it is) or the characters to fill, right-aligned.
 * Statuses: null pointer, out of range (row), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_visual_number(const struct fieldstop_visual_readout *readout,
                                              uint8_t row,
                                              const struct fieldstop_text_style *style,
                                              uint8_t width,
                                              char *text,
                                              uint16_t capacity,
                                              uint16_t *length);

/**
 * Writes the unit of a value of the visual pages and gives its length in bytes, which may be 0.
 *
 * It belongs to the number that fieldstop_text_visual_number writes.
 * Ranges: row one of FIELDSTOP_VISUAL_ROW_...
 * Statuses: null pointer, out of range (row), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_visual_unit(const struct fieldstop_visual_readout *readout,
                                            uint8_t row,
                                            const struct fieldstop_text_style *style,
                                            char *text,
                                            uint16_t capacity,
                                            uint16_t *length);

/** Gives the English labels of the camera pages for 20 columns and more, an array of FIELDSTOP_CAMERA_ROWS; never null. */
const char *const *fieldstop_text_camera_labels(void);

/** Gives the English labels of the camera pages for 8 and 16 columns, an array of FIELDSTOP_CAMERA_ROWS; never null. */
const char *const *fieldstop_text_camera_labels_short(void);

/**
 * Writes one line of the camera pages and gives its length in bytes; it is always `columns` characters long.
 *
 * `line` counts over all pages: line r of page p is p rows + r. From 16 columns on a line has the label, cut where it
 * must be, a mark where a fact concerns the value, and the value in its field at the right end; below 16 columns the
 * label and the value have a line each. A line behind the last row is blank.
 * Ranges: columns 8 to 255; labels an array of FIELDSTOP_CAMERA_ROWS.
 * Statuses: null pointer, out of range (columns), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_camera_line(const struct fieldstop_camera_readout *readout,
                                            const char *const *labels,
                                            const struct fieldstop_text_style *style,
                                            uint8_t columns,
                                            uint8_t line,
                                            char *text,
                                            uint16_t capacity,
                                            uint16_t *length);

/**
 * Writes a value of the camera pages with its unit and gives its length in bytes.
 *
 * In the form that the pages show; a dash where it is not available.
 * Ranges: row one of FIELDSTOP_CAMERA_ROW_...; width 0 (as long as it is) or the characters to fill, right-aligned.
 * Statuses: null pointer, out of range (row), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_camera_value(const struct fieldstop_camera_readout *readout,
                                             uint8_t row,
                                             const struct fieldstop_text_style *style,
                                             uint8_t width,
                                             char *text,
                                             uint16_t capacity,
                                             uint16_t *length);

/**
 * Writes a value of the camera pages without its unit and gives its length in bytes.
 *
 * In the form that the pages show; a dash where it is not available.
 * Ranges: row one of FIELDSTOP_CAMERA_ROW_...; width 0 (as long as it is) or the characters to fill, right-aligned.
 * Statuses: null pointer, out of range (row), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_camera_number(const struct fieldstop_camera_readout *readout,
                                              uint8_t row,
                                              const struct fieldstop_text_style *style,
                                              uint8_t width,
                                              char *text,
                                              uint16_t capacity,
                                              uint16_t *length);

/**
 * Writes the unit of a value of the camera pages and gives its length in bytes, which may be 0.
 *
 * It belongs to the number that fieldstop_text_camera_number writes.
 * Ranges: row one of FIELDSTOP_CAMERA_ROW_...
 * Statuses: null pointer, out of range (row), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_camera_unit(const struct fieldstop_camera_readout *readout,
                                            uint8_t row,
                                            const struct fieldstop_text_style *style,
                                            char *text,
                                            uint16_t capacity,
                                            uint16_t *length);

/**
 * Gives the part of a line that is different from what is shown, in characters.
 *
 * span.count is 0 where nothing is. Where the two have different numbers of characters it reaches to the end of the line.
 * Ranges: shown_length, line_length in bytes, any.
 * Statuses: null pointer.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_changed(const char *shown,
                                        uint16_t shown_length,
                                        const char *line,
                                        uint16_t line_length,
                                        const struct fieldstop_text_style *style,
                                        struct fieldstop_span *span);

/**
 * Gives a caution in English, one of FIELDSTOP_CAUTION_...; an empty text for any other number, never null.
 *
 * On AVR it is in program memory (PROGMEM). A translation can take its place in fieldstop_text_caution_line.
 */
const char *fieldstop_text_caution(uint8_t caution);

/**
 * Gives how many lines of `columns` characters a sentence takes, broken between words; 0 for a null pointer.
 *
 * sentence: bytes with a zero byte at their end; on AVR in program memory. Columns under 8 count as 8.
 */
uint8_t fieldstop_text_caution_lines(const char *sentence,
                                     uint8_t columns);

/**
 * Writes one line of a sentence broken between words and gives its length in bytes; it is always `columns`
 * characters long.
 *
 * sentence: bytes with a zero byte at their end, as fieldstop_text_caution gives; on AVR in program memory. A line
 * behind the last is blank; a word longer than a line is cut.
 * Ranges: columns 8 to 255.
 * Statuses: null pointer, out of range (columns), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_caution_line(const char *sentence,
                                             uint8_t columns,
                                             uint8_t line,
                                             char *text,
                                             uint16_t capacity,
                                             uint16_t *length);

/** Gives the English labels of the focus pages for 20 columns and more, an array of FIELDSTOP_FOCUS_ROWS; never null. */
const char *const *fieldstop_text_focus_labels(void);

/** Gives the English labels of the focus pages for 8 and 16 columns, an array of FIELDSTOP_FOCUS_ROWS; never null. */
const char *const *fieldstop_text_focus_labels_short(void);

/**
 * Writes one line of the focus pages and gives its length in bytes; it is always `columns` characters long.
 *
 * `line` counts over all pages: line r of page p is p rows + r. From 16 columns on a line has the label, cut where it
 * must be, a mark where a fact concerns the value, and the value in its field at the right end; below 16 columns the
 * label and the value have a line each. A line behind the last row is blank.
 * Ranges: columns 8 to 255; labels an array of FIELDSTOP_FOCUS_ROWS.
 * Statuses: null pointer, out of range (columns), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_focus_line(const struct fieldstop_focus_readout *readout,
                                           const char *const *labels,
                                           const struct fieldstop_text_style *style,
                                           uint8_t columns,
                                           uint8_t line,
                                           char *text,
                                           uint16_t capacity,
                                           uint16_t *length);

/**
 * Writes a value of the focus pages with its unit and gives its length in bytes.
 *
 * In the form that the pages show; a dash where it is not available.
 * Ranges: row one of FIELDSTOP_FOCUS_ROW_...; width 0 (as long as it is) or the characters to fill, right-aligned.
 * Statuses: null pointer, out of range (row), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_focus_value(const struct fieldstop_focus_readout *readout,
                                            uint8_t row,
                                            const struct fieldstop_text_style *style,
                                            uint8_t width,
                                            char *text,
                                            uint16_t capacity,
                                            uint16_t *length);

/**
 * Writes a value of the focus pages without its unit and gives its length in bytes.
 *
 * In the form that the pages show; a dash where it is not available.
 * Ranges: row one of FIELDSTOP_FOCUS_ROW_...; width 0 (as long as it is) or the characters to fill, right-aligned.
 * Statuses: null pointer, out of range (row), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_focus_number(const struct fieldstop_focus_readout *readout,
                                             uint8_t row,
                                             const struct fieldstop_text_style *style,
                                             uint8_t width,
                                             char *text,
                                             uint16_t capacity,
                                             uint16_t *length);

/**
 * Writes the unit of a value of the focus pages and gives its length in bytes, which may be 0.
 *
 * It belongs to the number that fieldstop_text_focus_number writes.
 * Ranges: row one of FIELDSTOP_FOCUS_ROW_...
 * Statuses: null pointer, out of range (row), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_focus_unit(const struct fieldstop_focus_readout *readout,
                                           uint8_t row,
                                           const struct fieldstop_text_style *style,
                                           char *text,
                                           uint16_t capacity,
                                           uint16_t *length);

/** Gives the English labels of the pages of a Newtonian's layout for 20 columns and more, an array of FIELDSTOP_NEWTONIAN_ROWS; never null. */
const char *const *fieldstop_text_newtonian_labels(void);

/** Gives the English labels of the pages of a Newtonian's layout for 8 and 16 columns, an array of FIELDSTOP_NEWTONIAN_ROWS; never null. */
const char *const *fieldstop_text_newtonian_labels_short(void);

/**
 * Writes one line of the pages of a Newtonian's layout and gives its length in bytes; it is always `columns` characters long.
 *
 * `line` counts over all pages: line r of page p is p rows + r. From 16 columns on a line has the label, cut where it
 * must be, a mark where a fact concerns the value, and the value in its field at the right end; below 16 columns the
 * label and the value have a line each. A line behind the last row is blank.
 * Ranges: columns 8 to 255; labels an array of FIELDSTOP_NEWTONIAN_ROWS.
 * Statuses: null pointer, out of range (columns), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_newtonian_line(const struct fieldstop_newtonian_readout *readout,
                                               const char *const *labels,
                                               const struct fieldstop_text_style *style,
                                               uint8_t columns,
                                               uint8_t line,
                                               char *text,
                                               uint16_t capacity,
                                               uint16_t *length);

/**
 * Writes a value of the pages of a Newtonian's layout with its unit and gives its length in bytes.
 *
 * In the form that the pages show; a dash where it is not available.
 * Ranges: row one of FIELDSTOP_NEWTONIAN_ROW_...; width 0 (as long as it is) or the characters to fill, right-aligned.
 * Statuses: null pointer, out of range (row), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_newtonian_value(const struct fieldstop_newtonian_readout *readout,
                                                uint8_t row,
                                                const struct fieldstop_text_style *style,
                                                uint8_t width,
                                                char *text,
                                                uint16_t capacity,
                                                uint16_t *length);

/**
 * Writes a value of the pages of a Newtonian's layout without its unit and gives its length in bytes.
 *
 * In the form that the pages show; a dash where it is not available.
 * Ranges: row one of FIELDSTOP_NEWTONIAN_ROW_...; width 0 (as long as it is) or the characters to fill, right-aligned.
 * Statuses: null pointer, out of range (row), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_newtonian_number(const struct fieldstop_newtonian_readout *readout,
                                                 uint8_t row,
                                                 const struct fieldstop_text_style *style,
                                                 uint8_t width,
                                                 char *text,
                                                 uint16_t capacity,
                                                 uint16_t *length);

/**
 * Writes the unit of a value of the pages of a Newtonian's layout and gives its length in bytes, which may be 0.
 *
 * It belongs to the number that fieldstop_text_newtonian_number writes.
 * Ranges: row one of FIELDSTOP_NEWTONIAN_ROW_...
 * Statuses: null pointer, out of range (row), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_newtonian_unit(const struct fieldstop_newtonian_readout *readout,
                                               uint8_t row,
                                               const struct fieldstop_text_style *style,
                                               char *text,
                                               uint16_t capacity,
                                               uint16_t *length);

/** Gives the English labels of the pages of two mirrors' layout for 20 columns and more, an array of FIELDSTOP_TWO_MIRROR_ROWS; never null. */
const char *const *fieldstop_text_two_mirror_labels(void);

/** Gives the English labels of the pages of two mirrors' layout for 8 and 16 columns, an array of FIELDSTOP_TWO_MIRROR_ROWS; never null. */
const char *const *fieldstop_text_two_mirror_labels_short(void);

/**
 * Writes one line of the pages of two mirrors' layout and gives its length in bytes; it is always `columns` characters long.
 *
 * `line` counts over all pages: line r of page p is p rows + r. From 16 columns on a line has the label, cut where it
 * must be, a mark where a fact concerns the value, and the value in its field at the right end; below 16 columns the
 * label and the value have a line each. A line behind the last row is blank.
 * Ranges: columns 8 to 255; labels an array of FIELDSTOP_TWO_MIRROR_ROWS.
 * Statuses: null pointer, out of range (columns), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_two_mirror_line(const struct fieldstop_two_mirror_readout *readout,
                                                const char *const *labels,
                                                const struct fieldstop_text_style *style,
                                                uint8_t columns,
                                                uint8_t line,
                                                char *text,
                                                uint16_t capacity,
                                                uint16_t *length);

/**
 * Writes a value of the pages of two mirrors' layout with its unit and gives its length in bytes.
 *
 * In the form that the pages show; a dash where it is not available.
 * Ranges: row one of FIELDSTOP_TWO_MIRROR_ROW_...; width 0 (as long as it is) or the characters to fill, right-aligned.
 * Statuses: null pointer, out of range (row), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_two_mirror_value(const struct fieldstop_two_mirror_readout *readout,
                                                 uint8_t row,
                                                 const struct fieldstop_text_style *style,
                                                 uint8_t width,
                                                 char *text,
                                                 uint16_t capacity,
                                                 uint16_t *length);

/**
 * Writes a value of the pages of two mirrors' layout without its unit and gives its length in bytes.
 *
 * In the form that the pages show; a dash where it is not available.
 * Ranges: row one of FIELDSTOP_TWO_MIRROR_ROW_...; width 0 (as long as it is) or the characters to fill, right-aligned.
 * Statuses: null pointer, out of range (row), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_two_mirror_number(const struct fieldstop_two_mirror_readout *readout,
                                                  uint8_t row,
                                                  const struct fieldstop_text_style *style,
                                                  uint8_t width,
                                                  char *text,
                                                  uint16_t capacity,
                                                  uint16_t *length);

/**
 * Writes the unit of a value of the pages of two mirrors' layout and gives its length in bytes, which may be 0.
 *
 * It belongs to the number that fieldstop_text_two_mirror_number writes.
 * Ranges: row one of FIELDSTOP_TWO_MIRROR_ROW_...
 * Statuses: null pointer, out of range (row), no room.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_text_two_mirror_unit(const struct fieldstop_two_mirror_readout *readout,
                                                uint8_t row,
                                                const struct fieldstop_text_style *style,
                                                char *text,
                                                uint16_t capacity,
                                                uint16_t *length);

/* --------------------------------------------------------------------------------------------------
   What a person types on a keypad or sends over a line, back to a quantity: integers only,
   correctly rounded. */

/** Entry: micrometres; a bare number is in mm; units m cm mm um nm in. */
#define FIELDSTOP_ENTRY_LENGTH 0
/** Entry: the same, and f/ in front of a focal ratio, which is multiplied by the aperture. */
#define FIELDSTOP_ENTRY_FOCAL_LENGTH 1
/** Entry: nanometres; a bare number is in um; units as for a length. */
#define FIELDSTOP_ENTRY_PIXEL_PITCH 2
/** Entry: nanometres; a bare number is in nm; units as for a length. */
#define FIELDSTOP_ENTRY_WAVELENGTH 3
/** Entry: milliarcseconds; a bare number is in degrees; units d deg, ' arcmin, " arcsec. */
#define FIELDSTOP_ENTRY_ANGLE 4
/** Entry: microarcseconds; a bare number is in seconds of arc; units as for an angle. */
#define FIELDSTOP_ENTRY_SMALL_ANGLE 5
/** Entry: Q16.16; no unit. */
#define FIELDSTOP_ENTRY_RATIO 6
/** Entry: Q16.16; f/ may stand in front. */
#define FIELDSTOP_ENTRY_FOCAL_RATIO 7
/** Entry: Q16.16; x may stand behind. */
#define FIELDSTOP_ENTRY_MAGNIFICATION 8
/** Entry: Q16.16, 65536 for a hundred per cent; % may stand behind. */
#define FIELDSTOP_ENTRY_PERCENT 9
/** Entry: millimagnitudes as int32_t; mag may stand behind. */
#define FIELDSTOP_ENTRY_MAGNITUDE 10
/** Entry: binary angle as int32_t, a quarter turn at most; a bare number is in degrees; a sign, or N or S behind. */
#define FIELDSTOP_ENTRY_LATITUDE 11
/** Entry: binary angle, positive east; under 360 degrees, or 180 at most with a sign, or E or W behind. */
#define FIELDSTOP_ENTRY_LONGITUDE 12
/** Entry: binary angle as int32_t, a quarter turn at most; a bare number is in degrees. */
#define FIELDSTOP_ENTRY_DECLINATION 13
/** Entry: binary angle under a turn; a bare number is in hours; units h m s, or those of an angle. */
#define FIELDSTOP_ENTRY_RIGHT_ASCENSION 14
/** Entry: milliseconds of a day, under 86400000; a bare number is in hours; units h m s. */
#define FIELDSTOP_ENTRY_TIME_OF_DAY 15
/** Entry: milliseconds; a bare number is in seconds; units h m s. */
#define FIELDSTOP_ENTRY_DURATION 16
/** Entry: an integer; px or steps may stand behind. */
#define FIELDSTOP_ENTRY_COUNT 17
/** State of an entry: it gives a quantity. */
#define FIELDSTOP_ENTRY_COMPLETE 0
/** State of an entry: it gives none yet; more characters can make it right. */
#define FIELDSTOP_ENTRY_PARTIAL 1
/** State of an entry: it gives none, whatever follows. */
#define FIELDSTOP_ENTRY_WRONG 2
/** Reason: none, for it is complete. */
#define FIELDSTOP_ENTRY_FINE 0
/** Reason: it ends where more must come. */
#define FIELDSTOP_ENTRY_ENDED 1
/** Reason: no entry has this byte here. */
#define FIELDSTOP_ENTRY_UNEXPECTED 2
/** Reason: the quantity is outside its range. */
#define FIELDSTOP_ENTRY_TOO_LARGE 3
/** Reason: minutes or seconds of 60 or more behind a greater unit. */
#define FIELDSTOP_ENTRY_SIXTY 4
/** Reason: a focal ratio where the aperture is not known. */
#define FIELDSTOP_ENTRY_NO_APERTURE 5

/** What an entry is worth. */
typedef struct fieldstop_entry_state {
    /** The quantity in the unit of its kind, where the entry is complete; else 0. */
    uint32_t quantity;
    /** The byte, counted from 0, that the reason is about; where it is complete or more must come, the length. */
    uint16_t position;
    /** FIELDSTOP_ENTRY_COMPLETE, ..._PARTIAL or ..._WRONG. */
    uint8_t state;
    /** FIELDSTOP_ENTRY_FINE, ..._ENDED and the others; callers take an unknown one as wrong. */
    uint8_t reason;
} fieldstop_entry_state;

/**
 * Reads what a person typed as a quantity, in the integer unit of its kind.
 *
 * Digits, with the decimal mark of the style and decimals or without, then a unit or none. Units are those of the kind,
 * in the spelling of the style or m cm mm um nm in, d deg ' arcmin " arcsec, h m min s, x % mag px steps; in UTF-8 the
 * signs of degree, prime, double prime, micro and times too. An inch is 25.4 mm. Angles and times take several units,
 * as in 1d15'30" and 13h10m46s, with less than 60 of the later ones; the last may go without its unit, and where there is
 * a place or a time of day they may be separated by colons.
 * Rounding: to nearest, halves away from zero, exact for any count of decimals. What is 24 hours or 360 degrees only
 * when rounded is 0.
 * Ranges: text_length in bytes, any; kind one of FIELDSTOP_ENTRY_LENGTH and those behind it; aperture_um 0 where it is not known (only a focal
 * ratio as FIELDSTOP_ENTRY_FOCAL_LENGTH needs it). A signed quantity is in two's complement: convert it to int32_t.
 * Statuses: null pointer, out of range (kind; text that is partial or wrong), overflow (argument 1: the quantity is
 * outside its range), zero (aperture). fieldstop_entry_check tells where and why.
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_entry_read(const char *text,
                                      uint16_t text_length,
                                      uint8_t kind,
                                      uint32_t aperture_um,
                                      const struct fieldstop_text_style *style,
                                      uint32_t *quantity);

/**
 * Tells whether what a person has typed so far is complete, partial or wrong, with the reason and the place.
 *
 * The entry is read as by fieldstop_entry_read; that it is partial or wrong is a successful answer.
 * Every beginning of a complete entry is complete or partial.
 * Ranges: text, text_length, kind, aperture_um and style as there. Statuses: null pointer, out of range (kind).
 */
FIELDSTOP_CHECKED
fieldstop_status fieldstop_entry_check(const char *text,
                                       uint16_t text_length,
                                       uint8_t kind,
                                       uint32_t aperture_um,
                                       const struct fieldstop_text_style *style,
                                       struct fieldstop_entry_state *check);

#ifdef __cplusplus
} /* extern "C" */
#endif

#endif /* FIELDSTOP_H */
