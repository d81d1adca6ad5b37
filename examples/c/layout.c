/*
 * Prints the pages of focus, of a Newtonian's layout and of two mirrors, as a display of twenty columns shows them, and the
 * caution where the eyepiece stands high.
 *
 *     cargo rustc --release --lib --crate-type staticlib --features capi
 *     cc -std=c99 -Iinclude examples/c/layout.c target/release/libfieldstop.a -lpthread -ldl -lm -o layout
 *     ./layout
 */
#include <stdio.h>

#include "fieldstop.h"

enum { COLUMNS = 20 };
static const uint32_t one_q16 = 65536;
static const int32_t degree_bam = 11930465; /* 2^32 / 360, to the nearest */

static int refused = 0;

static void print_line(const char *line, uint16_t length)
{
    printf("|%.*s|\n", (int)length, line);
}

/* Whether all is well; tells why where it is not. */
static int is_well(fieldstop_status status)
{
    if (status != 0) {
        printf("argument %u: %s\n", (unsigned)FIELDSTOP_ARGUMENT(status), fieldstop_cause_text(status));
        refused = 1;
    }
    return status == 0;
}

static void print_focus(const fieldstop_telescope *telescope, const fieldstop_observer *observer)
{
    const fieldstop_focuser focuser = {2200, 150000, 1090000, 12000};
    fieldstop_focus_readout readout;
    char line[COLUMNS];
    uint16_t length;
    uint8_t row;

    if (!is_well(fieldstop_focus_readout_compute(telescope, &focuser, observer, FIELDSTOP_FOCUS_ALL, &readout))) {
        return;
    }
    for (row = 0; row < FIELDSTOP_FOCUS_ROWS; row++) {
        if (is_well(fieldstop_text_focus_line(&readout, fieldstop_text_focus_labels(), fieldstop_text_style_ascii(),
                                              COLUMNS, row, line, sizeof line, &length))) {
            print_line(line, length);
        }
    }
}

static void print_newtonian(const fieldstop_telescope *telescope)
{
    fieldstop_newtonian_layout layout = {205000, 10000, 16700, 47000, 850000, 980000, 0, 0, 0, 1700000};
    fieldstop_newtonian_readout readout;
    char line[COLUMNS];
    uint16_t length;
    uint8_t row;

    layout.altitude_bam = 35 * degree_bam;
    layout.lowest_altitude_bam = 10 * degree_bam;
    layout.highest_altitude_bam = 0x40000000;
    if (!is_well(fieldstop_newtonian_readout_compute(telescope, &layout, FIELDSTOP_NEWTONIAN_ALL, &readout))) {
        return;
    }
    for (row = 0; row < FIELDSTOP_NEWTONIAN_ROWS; row++) {
        if (is_well(fieldstop_text_newtonian_line(&readout, fieldstop_text_newtonian_labels(),
                                                  fieldstop_text_style_ascii(), COLUMNS, row, line, sizeof line,
                                                  &length))) {
            print_line(line, length);
        }
    }
    if ((readout.facts & (FIELDSTOP_NEWTONIAN_FACT_HIGH_EYEPIECE | FIELDSTOP_NEWTONIAN_FACT_HIGH_REACHED)) != 0) {
        const char *caution = fieldstop_text_caution(FIELDSTOP_CAUTION_HIGH_EYEPIECE);
        const uint8_t lines = fieldstop_text_caution_lines(caution, COLUMNS);
        for (row = 0; row < lines; row++) {
            if (is_well(fieldstop_text_caution_line(caution, COLUMNS, row, line, sizeof line, &length))) {
                print_line(line, length);
            }
        }
    }
}

static void print_two_mirror(void)
{
    const fieldstop_telescope telescope = {312000, 3725000, 104500, one_q16, 0};
    const fieldstop_two_mirror_layout layout = {1030000, 260000, 14000};
    fieldstop_two_mirror_readout readout;
    char line[COLUMNS];
    uint16_t length;
    uint8_t row;

    if (!is_well(fieldstop_two_mirror_readout_compute(&telescope, &layout, FIELDSTOP_TWO_MIRROR_ALL, &readout))) {
        return;
    }
    for (row = 0; row < FIELDSTOP_TWO_MIRROR_ROWS; row++) {
        if (is_well(fieldstop_text_two_mirror_line(&readout, fieldstop_text_two_mirror_labels(),
                                                   fieldstop_text_style_ascii(), COLUMNS, row, line, sizeof line,
                                                   &length))) {
            print_line(line, length);
        }
    }
}

int main(void)
{
    const fieldstop_telescope telescope = {187500, 1130000, 47000, one_q16, 0};
    const fieldstop_observer observer = {0, 0, 0, 0, 550};

    puts("Focus");
    print_focus(&telescope, &observer);
    puts("Newtonian");
    print_newtonian(&telescope);
    puts("Two mirrors");
    print_two_mirror();
    return refused;
}
