/*
 * A screen of four lines of twenty characters: magnification, true field, exit pupil, resolution. Each way to make it
 * has a function that computes, one that writes the text, and one that does both as a firmware would. They give 0, or a
 * status.
 */
#include <stdint.h>

enum { LINES = 4, COLUMNS = 20 };

#define SCREEN(way)                                                                                            \
    uint16_t way##_compute(const void *equipment, void *values);                                               \
    uint16_t way##_text(const void *values);                                                                   \
    uint16_t way##_screen(const void *equipment);

SCREEN(direct) /* the library, called directly */
SCREEN(setup)  /* the library, through the equipment structs */
SCREEN(percent_f) /* by hand, float and %f */
SCREEN(scaled)    /* by hand, float scaled to long and an integer-only snprintf */

/* What direct_compute and the two by hand take: um and mm. */
struct direct_equipment {
    uint32_t aperture_um, focal_length_um, eyepiece_um, field_stop_um, wavelength_nm;
};
struct float_equipment {
    float aperture_mm, focal_length_mm, eyepiece_mm, field_stop_mm, wavelength_nm;
};

/* What they write to; by hand it has room for the zero that snprintf puts behind a line. */
extern char screen_lines[LINES][COLUMNS];
extern char by_hand_lines[LINES][COLUMNS + 1];
