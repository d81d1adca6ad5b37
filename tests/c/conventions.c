/* The conventions that the header states, seen from C. */
#include <math.h>
#include <stdio.h>
#include <string.h>

#include "fieldstop.h"

static int failed = 0;

#define CHECK(condition)                                                                                             \
    do {                                                                                                             \
        if (!(condition)) {                                                                                          \
            printf("line %d: %s\n", __LINE__, #condition);                                                           \
            failed = 1;                                                                                              \
        }                                                                                                            \
    } while (0)

static void check_status(fieldstop_status status, unsigned cause, unsigned argument)
{
    CHECK(FIELDSTOP_CAUSE(status) == cause);
    CHECK(FIELDSTOP_ARGUMENT(status) == argument);
    CHECK((status == 0) == (cause == 0));
}

static void check_fixed(void)
{
    uint32_t q16 = 0;

    check_status(fieldstop_magnification_fx(1200000, 25000, &q16), 0, 0);
    CHECK(q16 == 48u * 65536u);
    q16 = 7;
    check_status(fieldstop_magnification_fx(0, 0, &q16), FIELDSTOP_ZERO, 1);
    check_status(fieldstop_magnification_fx(1200000, 0, &q16), FIELDSTOP_ZERO, 2);
    check_status(fieldstop_magnification_fx(UINT32_MAX, 1, &q16), FIELDSTOP_OVERFLOW, 0);
    check_status(fieldstop_magnification_fx(0, 0, NULL), FIELDSTOP_NULL_POINTER, 3);
    CHECK(q16 == 7);
}

static void check_float(void)
{
    float single = 0;
    double twice = 0;

    check_status(fieldstop_magnification_f32(1200.0f, 25.0f, &single), 0, 0);
    CHECK(single > 47.99999f && single < 48.00001f);
    check_status(fieldstop_magnification_f64(1200.0, 25.0, &twice), 0, 0);
    CHECK(twice > 47.9999999999 && twice < 48.0000000001);
    single = 7;
    check_status(fieldstop_magnification_f32((float)NAN, 0.0f, &single), FIELDSTOP_NOT_FINITE, 1);
    check_status(fieldstop_magnification_f32(1200.0f, (float)INFINITY, &single), FIELDSTOP_NOT_FINITE, 2);
    check_status(fieldstop_magnification_f32(1200.0f, -25.0f, &single), FIELDSTOP_OUT_OF_RANGE, 2);
    check_status(fieldstop_magnification_f32(1200.0f, 25.0f, NULL), FIELDSTOP_NULL_POINTER, 3);
    CHECK(single > 6.9f && single < 7.1f);
}

static void check_texts(void)
{
    unsigned cause;

    for (cause = 0; cause < 256; cause++) {
        const char *text = fieldstop_cause_text((fieldstop_status)(0x0300u | cause));
        CHECK(text != NULL && strlen(text) > 5 && strlen(text) < 80);
    }
    printf("%s\n%s\n", fieldstop_cause_text(0), fieldstop_cause_text(0x0100 | FIELDSTOP_ZERO));
}

int main(void)
{
    check_fixed();
    check_float();
    check_texts();
    CHECK(fieldstop_version() == (uint32_t)FIELDSTOP_VERSION);
    printf("%s\n", failed ? "failed" : "right");
    return failed;
}
