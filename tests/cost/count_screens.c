/* Counts the screens over usual telescopes: compute, text, both, and the stack of both. */
#include <string.h>

#include "fieldstop.h"
#include "measure.h"
#include "screens.h"
#include CASES

enum { COUNT = sizeof usual / sizeof usual[0], WAYS = 4 };

static struct {
    fieldstop_telescope telescope;
    fieldstop_eyepiece eyepiece;
    fieldstop_observer observer;
} structs;
static struct float_equipment in_float;
static uint32_t values[32];
static uint32_t counts[3][COUNT];

static void prepare(const uint32_t *words)
{
    const struct direct_equipment *e = (const void *)words;

    structs.telescope.aperture_um = e->aperture_um;
    structs.telescope.focal_length_um = e->focal_length_um;
    structs.telescope.amplification_q16 = 65536;
    structs.eyepiece.focal_length_um = e->eyepiece_um;
    structs.eyepiece.field_stop_um = e->field_stop_um;
    structs.observer.wavelength_nm = e->wavelength_nm;
    in_float.aperture_mm = e->aperture_um * 1e-3f;
    in_float.focal_length_mm = e->focal_length_um * 1e-3f;
    in_float.eyepiece_mm = e->eyepiece_um * 1e-3f;
    in_float.field_stop_mm = e->field_stop_um * 1e-3f;
    in_float.wavelength_nm = (float)e->wavelength_nm;
}

static uint32_t run(uint16_t (*function)(), const void *first, const void *second, uint32_t *stack)
{
    struct call call = {0};

    call.function = (uintptr_t)function;
    call.words[0] = (uint32_t)(uintptr_t)first;
    call.words[1] = (uint32_t)(uintptr_t)second;
    if ((uint16_t)measure(&call) != 0) {
        puts("a call was refused");
        exit(1);
    }
    if (stack != NULL) {
        uint32_t used = stack_of(&call);
        *stack = used > *stack ? used : *stack;
    }
    return counted(&call);
}

static char direct_lines[LINES][COLUMNS];

int main(void)
{
#define WAY(way) {#way "_screen", way##_compute, way##_text, way##_screen}
    static const struct {
        const char *name;
        uint16_t (*compute)(const void *, void *);
        uint16_t (*text)(const void *);
        uint16_t (*screen)(const void *);
    } ways[WAYS] = {WAY(direct), WAY(setup), WAY(percent_f), WAY(scaled)};
    uint32_t i, k, line;

    begin();
    for (i = 0; i < WAYS; i++) {
        uint32_t stack = 0, wrong = 0;
        for (k = 0; k < COUNT; k++) {
            const void *equipment = i == 0 ? (const void *)usual[k] : i == 1 ? (const void *)&structs : &in_float;
            prepare(usual[k]);
            counts[0][k] = run(ways[i].compute, equipment, values, NULL);
            counts[1][k] = run(ways[i].text, values, NULL, NULL);
            counts[2][k] = run(ways[i].screen, equipment, NULL, &stack);
            /* All show the same, but where float rounds to the other side, and setup has its own decimals in the first. */
            direct_screen(usual[k]);
            memcpy(direct_lines, screen_lines, sizeof direct_lines);
            if (i == 1) {
                setup_screen(&structs);
            }
            for (line = i == 1; line < LINES; line++) {
                const char *shown = i < 2 ? screen_lines[line] : by_hand_lines[line];
                wrong += memcmp(shown, direct_lines[line], COLUMNS) != 0;
            }
        }
        if (wrong > (i < 2 ? 0 : LINES * COUNT / 50)) {
            printf("%s: %u lines are wrong\n", ways[i].name, (unsigned)wrong);
            exit(1);
        }
        printf("%s", ways[i].name);
        for (k = 0; k < 3; k++) {
            print_counts(counts[k], COUNT);
        }
        printf(" %u\n", (unsigned)stack);
    }
    return 0;
}
