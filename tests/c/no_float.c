/* The header without the float forms: their names are free then. */
#define FIELDSTOP_NO_FLOAT
#include "fieldstop.h"

static int fieldstop_magnification_f32(void)
{
    return 0;
}

static int fieldstop_magnification_f64(void)
{
    return 0;
}

int main(void)
{
    return fieldstop_magnification_f32() + fieldstop_magnification_f64();
}
