/* Counts one way of making the screen, WAY, over the usual telescopes of CASES. */
#include "../measure.h"
#include "screen.h"
#include CASES

#define JOIN(a, b) a##b
#define HALF(way, half) JOIN(way, half)
#ifndef FIRST_LINE
#define FIRST_LINE 20 /* characters of it that must be right */
#endif
enum { APERTURE, FOCAL_LENGTH, EYEPIECE, FIELD_STOP };

static uint32_t both(const struct screen_input *in)
{
    return HALF(WAY, _compute)(in) | HALF(WAY, _text)();
}

static uint32_t count(uint32_t (*function)(), const struct screen_input *in)
{
    struct call call = {(uintptr_t)function, {(uint32_t)(uintptr_t)in}, 0};
    if ((uint16_t)measure(&call) != 0) {
        puts("a call was refused");
        exit(1);
    }
    return counted(&call);
}

/*
 * Lines that are not those of direct calls; a few are owed to the rounding of float. The library's pages write the
 * magnification, the first line, with decimals of their own.
 */
static uint32_t other_lines(const struct screen_input *in)
{
    char shown[4][20];
    uint32_t other = 0, i;

    memset(screen_lines, 0, sizeof screen_lines);
    both(in);
    for (i = 0; i < 4; i++) {
        memcpy(shown[i], screen_lines[0][0] != 0 ? screen_lines[i] : lines_of_strings[i], 20);
    }
    if (direct_compute(in) != 0 || direct_text() != 0) {
        return 4;
    }
    for (i = 0; i < 4; i++) {
        other += memcmp(shown[i], screen_lines[i], i == 0 ? FIRST_LINE : 20) != 0;
    }
    return other;
}

int main(void)
{
    static uint32_t compute[MOST], text[MOST], total[MOST];
    uint32_t n = sizeof usual / sizeof usual[0], stack = 0, wrong = 0, k;

    verify();
    for (k = 0; k < n; k++) {
        const uint32_t *words = usual[k];
        struct screen_input in = {words[APERTURE], words[FOCAL_LENGTH], words[EYEPIECE], words[FIELD_STOP], 0, 0, 0, 0};
        struct call call = {(uintptr_t)both, {(uint32_t)(uintptr_t)&in}, 0};
        uint32_t used;

        set_millimetres(&in);
        wrong += other_lines(&in);
        used = stack_of(call);
        stack = used > stack ? used : stack;
        compute[k] = count(HALF(WAY, _compute), &in);
        text[k] = count(HALF(WAY, _text), &in);
        total[k] = compute[k] + text[k];
    }
#ifdef SHOW
    for (k = 0; k < 4; k++) {
        printf("%.20s\n", screen_lines[k]);
    }
#endif
    if (wrong > n / 16) {
        printf("%u lines are wrong\n", (unsigned)wrong);
        exit(1);
    }
    print_counts(compute, n);
    print_counts(text, n);
    print_counts(total, n);
    printf(" %u\n", (unsigned)stack);
    return 0;
}
