/* Compiles with REFUSED 0, and with no other number: each is a mistake that a compiler must find. */
#include "fieldstop.hpp"

using namespace fieldstop::literals;

int main()
{
    constexpr fieldstop::micrometres focal_length = 1200000_um;
#if REFUSED == 1 /* millimetres for micrometres */
    const auto given = fieldstop::magnification_fx(1200_mm, 12500_um);
#elif REFUSED == 2 /* the same, not as a literal */
    constexpr fieldstop::nanometres eyepiece(12500000);
    const auto given = fieldstop::magnification_fx(focal_length, eyepiece);
#elif REFUSED == 3 /* a plain integer for a length */
    const auto given = fieldstop::magnification_fx(focal_length, 12500);
#elif REFUSED == 4 /* a result as if it were its value */
    const fieldstop::q16 given = fieldstop::magnification_fx(focal_length, 12500_um);
#elif REFUSED == 5 /* a quantity as if it were a number */
    const uint32_t given = fieldstop::magnification_fx(focal_length, 12500_um).value();
#elif REFUSED == 6 /* a fraction of a micrometre */
    const auto given = fieldstop::magnification_fx(focal_length, 12500.5_um);
#elif REFUSED == 7 /* does not fit 32 bits */
    constexpr fieldstop::micrometres given = 4294967296_um;
#elif REFUSED == 8 /* a length in seconds */
    const auto given = fieldstop::convert<fieldstop::microarcseconds>(focal_length);
#elif REFUSED == 9 /* the value of what has none, in a constant expression */
    constexpr fieldstop::nanometres given = fieldstop::convert<fieldstop::nanometres>(5000_mm).value();
#elif REFUSED == 10 /* float for fixed */
    const auto given = fieldstop::magnification_fx(fieldstop::millimetres_f32(1200.0F), 12500_um);
#elif REFUSED == 11 /* an ignored result */
    const int given = 0;
    fieldstop::magnification_fx(focal_length, 12500_um);
#elif REFUSED == 12 /* an ignored status */
    const int given = 0;
    fieldstop::telescope_check(fieldstop::telescope());
#elif REFUSED == 13 /* lengths of different units compared */
    const bool given = focal_length == fieldstop::nanometres(5);
#elif REFUSED == 14 /* an unsigned length below zero */
    constexpr fieldstop::micrometres given = -1_um;
#else
    const auto given = fieldstop::magnification_fx(focal_length, 12500_um);
#endif
    (void)given;
    (void)focal_length;
    return 0;
}
