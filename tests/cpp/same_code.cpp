/* Each call as in C and as in C++; .ci/cpp compares the code that is made of the two. Made by
   tests/interface/cpp.rs: do not edit. */
#include "fieldstop.hpp"

extern "C" {

fieldstop_status plain_bam_from_mas_fx(int32_t angle_mas, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_bam_from_mas_fx(angle_mas, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_bam_from_mas_fx(int32_t angle_mas, uint32_t *out)
{
    const auto given = fieldstop::bam_from_mas_fx(fieldstop::signed_milliarcseconds(angle_mas));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

fieldstop_status plain_mas_from_bam_fx(uint32_t angle_bam, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_mas_from_bam_fx(angle_bam, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_mas_from_bam_fx(uint32_t angle_bam, uint32_t *out)
{
    const auto given = fieldstop::mas_from_bam_fx(fieldstop::binary_angle(angle_bam));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

fieldstop_status plain_signed_mas_from_bam_fx(int32_t angle_bam, int32_t *out)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_signed_mas_from_bam_fx(angle_bam, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_signed_mas_from_bam_fx(int32_t angle_bam, int32_t *out)
{
    const auto given = fieldstop::signed_mas_from_bam_fx(fieldstop::signed_binary_angle(angle_bam));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

fieldstop_status plain_bam_from_day_ms_fx(uint32_t time_day_ms, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_bam_from_day_ms_fx(time_day_ms, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_bam_from_day_ms_fx(uint32_t time_day_ms, uint32_t *out)
{
    const auto given = fieldstop::bam_from_day_ms_fx(fieldstop::day_milliseconds(time_day_ms));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

fieldstop_status plain_day_ms_from_bam_fx(uint32_t angle_bam, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_day_ms_from_bam_fx(angle_bam, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_day_ms_from_bam_fx(uint32_t angle_bam, uint32_t *out)
{
    const auto given = fieldstop::day_ms_from_bam_fx(fieldstop::binary_angle(angle_bam));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

fieldstop_status plain_milli_from_q16_fx(uint32_t number_q16, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_milli_from_q16_fx(number_q16, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_milli_from_q16_fx(uint32_t number_q16, uint32_t *out)
{
    const auto given = fieldstop::milli_from_q16_fx(fieldstop::q16(number_q16));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

fieldstop_status plain_q16_from_milli_fx(uint32_t number_milli, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_q16_from_milli_fx(number_milli, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_q16_from_milli_fx(uint32_t number_milli, uint32_t *out)
{
    const auto given = fieldstop::q16_from_milli_fx(fieldstop::thousandths(number_milli));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

fieldstop_status plain_focal_ratio_fx(uint32_t focal_length_um, uint32_t aperture_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_focal_ratio_fx(focal_length_um, aperture_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_focal_ratio_fx(uint32_t focal_length_um, uint32_t aperture_um, uint32_t *out)
{
    const auto given = fieldstop::focal_ratio_fx(fieldstop::micrometres(focal_length_um), fieldstop::micrometres(aperture_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_focal_ratio_f32(float focal_length_mm, float aperture_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_focal_ratio_f32(focal_length_mm, aperture_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_focal_ratio_f32(float focal_length_mm, float aperture_mm, float *out)
{
    const auto given = fieldstop::focal_ratio_f32(fieldstop::millimetres_f32(focal_length_mm), fieldstop::millimetres_f32(aperture_mm));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_focal_ratio_f64(double focal_length_mm, double aperture_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_focal_ratio_f64(focal_length_mm, aperture_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_focal_ratio_f64(double focal_length_mm, double aperture_mm, double *out)
{
    const auto given = fieldstop::focal_ratio_f64(fieldstop::millimetres_f64(focal_length_mm), fieldstop::millimetres_f64(aperture_mm));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_amplified_focal_length_fx(uint32_t focal_length_um, uint32_t amplification_q16, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_amplified_focal_length_fx(focal_length_um, amplification_q16, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_amplified_focal_length_fx(uint32_t focal_length_um, uint32_t amplification_q16, uint32_t *out)
{
    const auto given = fieldstop::amplified_focal_length_fx(fieldstop::micrometres(focal_length_um), fieldstop::q16(amplification_q16));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_amplified_focal_length_f32(float focal_length_mm, float amplification, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_amplified_focal_length_f32(focal_length_mm, amplification, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_amplified_focal_length_f32(float focal_length_mm, float amplification, float *out)
{
    const auto given = fieldstop::amplified_focal_length_f32(fieldstop::millimetres_f32(focal_length_mm), amplification);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_amplified_focal_length_f64(double focal_length_mm, double amplification, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_amplified_focal_length_f64(focal_length_mm, amplification, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_amplified_focal_length_f64(double focal_length_mm, double amplification, double *out)
{
    const auto given = fieldstop::amplified_focal_length_f64(fieldstop::millimetres_f64(focal_length_mm), amplification);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_amplification_fx(int32_t element_focal_length_um, uint32_t image_distance_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_amplification_fx(element_focal_length_um, image_distance_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_amplification_fx(int32_t element_focal_length_um, uint32_t image_distance_um, uint32_t *out)
{
    const auto given = fieldstop::amplification_fx(fieldstop::signed_micrometres(element_focal_length_um), fieldstop::micrometres(image_distance_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_amplification_f32(float element_focal_length_mm, float image_distance_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_amplification_f32(element_focal_length_mm, image_distance_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_amplification_f32(float element_focal_length_mm, float image_distance_mm, float *out)
{
    const auto given = fieldstop::amplification_f32(fieldstop::millimetres_f32(element_focal_length_mm), fieldstop::millimetres_f32(image_distance_mm));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_amplification_f64(double element_focal_length_mm, double image_distance_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_amplification_f64(element_focal_length_mm, image_distance_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_amplification_f64(double element_focal_length_mm, double image_distance_mm, double *out)
{
    const auto given = fieldstop::amplification_f64(fieldstop::millimetres_f64(element_focal_length_mm), fieldstop::millimetres_f64(image_distance_mm));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_magnification_fx(uint32_t focal_length_um, uint32_t eyepiece_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_magnification_fx(focal_length_um, eyepiece_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_magnification_fx(uint32_t focal_length_um, uint32_t eyepiece_um, uint32_t *out)
{
    const auto given = fieldstop::magnification_fx(fieldstop::micrometres(focal_length_um), fieldstop::micrometres(eyepiece_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_magnification_f32(float focal_length_mm, float eyepiece_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_magnification_f32(focal_length_mm, eyepiece_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_magnification_f32(float focal_length_mm, float eyepiece_mm, float *out)
{
    const auto given = fieldstop::magnification_f32(fieldstop::millimetres_f32(focal_length_mm), fieldstop::millimetres_f32(eyepiece_mm));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_magnification_f64(double focal_length_mm, double eyepiece_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_magnification_f64(focal_length_mm, eyepiece_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_magnification_f64(double focal_length_mm, double eyepiece_mm, double *out)
{
    const auto given = fieldstop::magnification_f64(fieldstop::millimetres_f64(focal_length_mm), fieldstop::millimetres_f64(eyepiece_mm));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_exit_pupil_fx(uint32_t aperture_um, uint32_t focal_length_um, uint32_t eyepiece_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_exit_pupil_fx(aperture_um, focal_length_um, eyepiece_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_exit_pupil_fx(uint32_t aperture_um, uint32_t focal_length_um, uint32_t eyepiece_um, uint32_t *out)
{
    const auto given = fieldstop::exit_pupil_fx(fieldstop::micrometres(aperture_um), fieldstop::micrometres(focal_length_um), fieldstop::micrometres(eyepiece_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_exit_pupil_f32(float aperture_mm, float focal_length_mm, float eyepiece_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_exit_pupil_f32(aperture_mm, focal_length_mm, eyepiece_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_exit_pupil_f32(float aperture_mm, float focal_length_mm, float eyepiece_mm, float *out)
{
    const auto given = fieldstop::exit_pupil_f32(fieldstop::millimetres_f32(aperture_mm), fieldstop::millimetres_f32(focal_length_mm), fieldstop::millimetres_f32(eyepiece_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_exit_pupil_f64(double aperture_mm, double focal_length_mm, double eyepiece_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_exit_pupil_f64(aperture_mm, focal_length_mm, eyepiece_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_exit_pupil_f64(double aperture_mm, double focal_length_mm, double eyepiece_mm, double *out)
{
    const auto given = fieldstop::exit_pupil_f64(fieldstop::millimetres_f64(aperture_mm), fieldstop::millimetres_f64(focal_length_mm), fieldstop::millimetres_f64(eyepiece_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_eyepiece_for_exit_pupil_fx(uint32_t exit_pupil_um, uint32_t focal_length_um, uint32_t aperture_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_eyepiece_for_exit_pupil_fx(exit_pupil_um, focal_length_um, aperture_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_eyepiece_for_exit_pupil_fx(uint32_t exit_pupil_um, uint32_t focal_length_um, uint32_t aperture_um, uint32_t *out)
{
    const auto given = fieldstop::eyepiece_for_exit_pupil_fx(fieldstop::micrometres(exit_pupil_um), fieldstop::micrometres(focal_length_um), fieldstop::micrometres(aperture_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_eyepiece_for_exit_pupil_f32(float exit_pupil_mm, float focal_length_mm, float aperture_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_eyepiece_for_exit_pupil_f32(exit_pupil_mm, focal_length_mm, aperture_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_eyepiece_for_exit_pupil_f32(float exit_pupil_mm, float focal_length_mm, float aperture_mm, float *out)
{
    const auto given = fieldstop::eyepiece_for_exit_pupil_f32(fieldstop::millimetres_f32(exit_pupil_mm), fieldstop::millimetres_f32(focal_length_mm), fieldstop::millimetres_f32(aperture_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_eyepiece_for_exit_pupil_f64(double exit_pupil_mm, double focal_length_mm, double aperture_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_eyepiece_for_exit_pupil_f64(exit_pupil_mm, focal_length_mm, aperture_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_eyepiece_for_exit_pupil_f64(double exit_pupil_mm, double focal_length_mm, double aperture_mm, double *out)
{
    const auto given = fieldstop::eyepiece_for_exit_pupil_f64(fieldstop::millimetres_f64(exit_pupil_mm), fieldstop::millimetres_f64(focal_length_mm), fieldstop::millimetres_f64(aperture_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_eyepiece_for_magnification_fx(uint32_t focal_length_um, uint32_t magnification_q16, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_eyepiece_for_magnification_fx(focal_length_um, magnification_q16, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_eyepiece_for_magnification_fx(uint32_t focal_length_um, uint32_t magnification_q16, uint32_t *out)
{
    const auto given = fieldstop::eyepiece_for_magnification_fx(fieldstop::micrometres(focal_length_um), fieldstop::q16(magnification_q16));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_eyepiece_for_magnification_f32(float focal_length_mm, float magnification, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_eyepiece_for_magnification_f32(focal_length_mm, magnification, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_eyepiece_for_magnification_f32(float focal_length_mm, float magnification, float *out)
{
    const auto given = fieldstop::eyepiece_for_magnification_f32(fieldstop::millimetres_f32(focal_length_mm), magnification);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_eyepiece_for_magnification_f64(double focal_length_mm, double magnification, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_eyepiece_for_magnification_f64(focal_length_mm, magnification, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_eyepiece_for_magnification_f64(double focal_length_mm, double magnification, double *out)
{
    const auto given = fieldstop::eyepiece_for_magnification_f64(fieldstop::millimetres_f64(focal_length_mm), magnification);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_true_field_from_stop_fx(uint32_t field_stop_um, uint32_t focal_length_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_true_field_from_stop_fx(field_stop_um, focal_length_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_true_field_from_stop_fx(uint32_t field_stop_um, uint32_t focal_length_um, uint32_t *out)
{
    const auto given = fieldstop::true_field_from_stop_fx(fieldstop::micrometres(field_stop_um), fieldstop::micrometres(focal_length_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_true_field_from_stop_f32(float field_stop_mm, float focal_length_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_true_field_from_stop_f32(field_stop_mm, focal_length_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_true_field_from_stop_f32(float field_stop_mm, float focal_length_mm, float *out)
{
    const auto given = fieldstop::true_field_from_stop_f32(fieldstop::millimetres_f32(field_stop_mm), fieldstop::millimetres_f32(focal_length_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_true_field_from_stop_f64(double field_stop_mm, double focal_length_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_true_field_from_stop_f64(field_stop_mm, focal_length_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_true_field_from_stop_f64(double field_stop_mm, double focal_length_mm, double *out)
{
    const auto given = fieldstop::true_field_from_stop_f64(fieldstop::millimetres_f64(field_stop_mm), fieldstop::millimetres_f64(focal_length_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_true_field_rectilinear_fx(uint32_t apparent_field_mas, uint32_t focal_length_um, uint32_t eyepiece_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_true_field_rectilinear_fx(apparent_field_mas, focal_length_um, eyepiece_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_true_field_rectilinear_fx(uint32_t apparent_field_mas, uint32_t focal_length_um, uint32_t eyepiece_um, uint32_t *out)
{
    const auto given = fieldstop::true_field_rectilinear_fx(fieldstop::milliarcseconds(apparent_field_mas), fieldstop::micrometres(focal_length_um), fieldstop::micrometres(eyepiece_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_true_field_rectilinear_f32(float apparent_field_arcsec, float focal_length_mm, float eyepiece_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_true_field_rectilinear_f32(apparent_field_arcsec, focal_length_mm, eyepiece_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_true_field_rectilinear_f32(float apparent_field_arcsec, float focal_length_mm, float eyepiece_mm, float *out)
{
    const auto given = fieldstop::true_field_rectilinear_f32(fieldstop::arcseconds_f32(apparent_field_arcsec), fieldstop::millimetres_f32(focal_length_mm), fieldstop::millimetres_f32(eyepiece_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_true_field_rectilinear_f64(double apparent_field_arcsec, double focal_length_mm, double eyepiece_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_true_field_rectilinear_f64(apparent_field_arcsec, focal_length_mm, eyepiece_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_true_field_rectilinear_f64(double apparent_field_arcsec, double focal_length_mm, double eyepiece_mm, double *out)
{
    const auto given = fieldstop::true_field_rectilinear_f64(fieldstop::arcseconds_f64(apparent_field_arcsec), fieldstop::millimetres_f64(focal_length_mm), fieldstop::millimetres_f64(eyepiece_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_true_field_equidistant_fx(uint32_t apparent_field_mas, uint32_t focal_length_um, uint32_t eyepiece_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_true_field_equidistant_fx(apparent_field_mas, focal_length_um, eyepiece_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_true_field_equidistant_fx(uint32_t apparent_field_mas, uint32_t focal_length_um, uint32_t eyepiece_um, uint32_t *out)
{
    const auto given = fieldstop::true_field_equidistant_fx(fieldstop::milliarcseconds(apparent_field_mas), fieldstop::micrometres(focal_length_um), fieldstop::micrometres(eyepiece_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_true_field_equidistant_f32(float apparent_field_arcsec, float focal_length_mm, float eyepiece_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_true_field_equidistant_f32(apparent_field_arcsec, focal_length_mm, eyepiece_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_true_field_equidistant_f32(float apparent_field_arcsec, float focal_length_mm, float eyepiece_mm, float *out)
{
    const auto given = fieldstop::true_field_equidistant_f32(fieldstop::arcseconds_f32(apparent_field_arcsec), fieldstop::millimetres_f32(focal_length_mm), fieldstop::millimetres_f32(eyepiece_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_true_field_equidistant_f64(double apparent_field_arcsec, double focal_length_mm, double eyepiece_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_true_field_equidistant_f64(apparent_field_arcsec, focal_length_mm, eyepiece_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_true_field_equidistant_f64(double apparent_field_arcsec, double focal_length_mm, double eyepiece_mm, double *out)
{
    const auto given = fieldstop::true_field_equidistant_f64(fieldstop::arcseconds_f64(apparent_field_arcsec), fieldstop::millimetres_f64(focal_length_mm), fieldstop::millimetres_f64(eyepiece_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_frame_field_fx(uint32_t pixel_nm, uint32_t pixel_count, uint32_t focal_length_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_frame_field_fx(pixel_nm, pixel_count, focal_length_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_frame_field_fx(uint32_t pixel_nm, uint32_t pixel_count, uint32_t focal_length_um, uint32_t *out)
{
    const auto given = fieldstop::frame_field_fx(fieldstop::nanometres(pixel_nm), pixel_count, fieldstop::micrometres(focal_length_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_frame_field_f32(float pixel_um, uint32_t pixel_count, float focal_length_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_frame_field_f32(pixel_um, pixel_count, focal_length_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_frame_field_f32(float pixel_um, uint32_t pixel_count, float focal_length_mm, float *out)
{
    const auto given = fieldstop::frame_field_f32(fieldstop::micrometres_f32(pixel_um), pixel_count, fieldstop::millimetres_f32(focal_length_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_frame_field_f64(double pixel_um, uint32_t pixel_count, double focal_length_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_frame_field_f64(pixel_um, pixel_count, focal_length_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_frame_field_f64(double pixel_um, uint32_t pixel_count, double focal_length_mm, double *out)
{
    const auto given = fieldstop::frame_field_f64(fieldstop::micrometres_f64(pixel_um), pixel_count, fieldstop::millimetres_f64(focal_length_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_plate_scale_fx(uint32_t focal_length_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_plate_scale_fx(focal_length_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_plate_scale_fx(uint32_t focal_length_um, uint32_t *out)
{
    const auto given = fieldstop::plate_scale_fx(fieldstop::micrometres(focal_length_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_plate_scale_f32(float focal_length_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_plate_scale_f32(focal_length_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_plate_scale_f32(float focal_length_mm, float *out)
{
    const auto given = fieldstop::plate_scale_f32(fieldstop::millimetres_f32(focal_length_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_plate_scale_f64(double focal_length_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_plate_scale_f64(focal_length_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_plate_scale_f64(double focal_length_mm, double *out)
{
    const auto given = fieldstop::plate_scale_f64(fieldstop::millimetres_f64(focal_length_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_pixel_scale_fx(uint32_t pixel_nm, uint32_t focal_length_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_pixel_scale_fx(pixel_nm, focal_length_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_pixel_scale_fx(uint32_t pixel_nm, uint32_t focal_length_um, uint32_t *out)
{
    const auto given = fieldstop::pixel_scale_fx(fieldstop::nanometres(pixel_nm), fieldstop::micrometres(focal_length_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_pixel_scale_f32(float pixel_um, float focal_length_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_pixel_scale_f32(pixel_um, focal_length_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_pixel_scale_f32(float pixel_um, float focal_length_mm, float *out)
{
    const auto given = fieldstop::pixel_scale_f32(fieldstop::micrometres_f32(pixel_um), fieldstop::millimetres_f32(focal_length_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_pixel_scale_f64(double pixel_um, double focal_length_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_pixel_scale_f64(pixel_um, focal_length_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_pixel_scale_f64(double pixel_um, double focal_length_mm, double *out)
{
    const auto given = fieldstop::pixel_scale_f64(fieldstop::micrometres_f64(pixel_um), fieldstop::millimetres_f64(focal_length_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_focal_length_for_field_fx(uint32_t extent_um, uint32_t field_mas, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_focal_length_for_field_fx(extent_um, field_mas, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_focal_length_for_field_fx(uint32_t extent_um, uint32_t field_mas, uint32_t *out)
{
    const auto given = fieldstop::focal_length_for_field_fx(fieldstop::micrometres(extent_um), fieldstop::milliarcseconds(field_mas));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_focal_length_for_field_f32(float extent_mm, float field_arcsec, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_focal_length_for_field_f32(extent_mm, field_arcsec, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_focal_length_for_field_f32(float extent_mm, float field_arcsec, float *out)
{
    const auto given = fieldstop::focal_length_for_field_f32(fieldstop::millimetres_f32(extent_mm), fieldstop::arcseconds_f32(field_arcsec));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_focal_length_for_field_f64(double extent_mm, double field_arcsec, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_focal_length_for_field_f64(extent_mm, field_arcsec, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_focal_length_for_field_f64(double extent_mm, double field_arcsec, double *out)
{
    const auto given = fieldstop::focal_length_for_field_f64(fieldstop::millimetres_f64(extent_mm), fieldstop::arcseconds_f64(field_arcsec));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_tiles_fx(uint32_t target_mas, uint32_t frame_mas, uint32_t overlap_mas, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_tiles_fx(target_mas, frame_mas, overlap_mas, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_tiles_fx(uint32_t target_mas, uint32_t frame_mas, uint32_t overlap_mas, uint32_t *out)
{
    const auto given = fieldstop::tiles_fx(fieldstop::milliarcseconds(target_mas), fieldstop::milliarcseconds(frame_mas), fieldstop::milliarcseconds(overlap_mas));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_tiles_f32(float target_arcsec, float frame_arcsec, float overlap_arcsec, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_tiles_f32(target_arcsec, frame_arcsec, overlap_arcsec, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_tiles_f32(float target_arcsec, float frame_arcsec, float overlap_arcsec, uint32_t *out)
{
    const auto given = fieldstop::tiles_f32(fieldstop::arcseconds_f32(target_arcsec), fieldstop::arcseconds_f32(frame_arcsec), fieldstop::arcseconds_f32(overlap_arcsec));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_tiles_f64(double target_arcsec, double frame_arcsec, double overlap_arcsec, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_tiles_f64(target_arcsec, frame_arcsec, overlap_arcsec, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_tiles_f64(double target_arcsec, double frame_arcsec, double overlap_arcsec, uint32_t *out)
{
    const auto given = fieldstop::tiles_f64(fieldstop::arcseconds_f64(target_arcsec), fieldstop::arcseconds_f64(frame_arcsec), fieldstop::arcseconds_f64(overlap_arcsec));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_rayleigh_limit_fx(uint32_t aperture_um, uint32_t wavelength_nm, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_rayleigh_limit_fx(aperture_um, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_rayleigh_limit_fx(uint32_t aperture_um, uint32_t wavelength_nm, uint32_t *out)
{
    const auto given = fieldstop::rayleigh_limit_fx(fieldstop::micrometres(aperture_um), fieldstop::nanometres(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_rayleigh_limit_f32(float aperture_mm, float wavelength_nm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_rayleigh_limit_f32(aperture_mm, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_rayleigh_limit_f32(float aperture_mm, float wavelength_nm, float *out)
{
    const auto given = fieldstop::rayleigh_limit_f32(fieldstop::millimetres_f32(aperture_mm), fieldstop::nanometres_f32(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_rayleigh_limit_f64(double aperture_mm, double wavelength_nm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_rayleigh_limit_f64(aperture_mm, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_rayleigh_limit_f64(double aperture_mm, double wavelength_nm, double *out)
{
    const auto given = fieldstop::rayleigh_limit_f64(fieldstop::millimetres_f64(aperture_mm), fieldstop::nanometres_f64(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_rayleigh_limit_obstructed_fx(uint32_t aperture_um, uint32_t obstruction_um, uint32_t wavelength_nm, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_rayleigh_limit_obstructed_fx(aperture_um, obstruction_um, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_rayleigh_limit_obstructed_fx(uint32_t aperture_um, uint32_t obstruction_um, uint32_t wavelength_nm, uint32_t *out)
{
    const auto given = fieldstop::rayleigh_limit_obstructed_fx(fieldstop::micrometres(aperture_um), fieldstop::micrometres(obstruction_um), fieldstop::nanometres(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_rayleigh_limit_obstructed_f32(float aperture_mm, float obstruction_mm, float wavelength_nm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_rayleigh_limit_obstructed_f32(aperture_mm, obstruction_mm, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_rayleigh_limit_obstructed_f32(float aperture_mm, float obstruction_mm, float wavelength_nm, float *out)
{
    const auto given = fieldstop::rayleigh_limit_obstructed_f32(fieldstop::millimetres_f32(aperture_mm), fieldstop::millimetres_f32(obstruction_mm), fieldstop::nanometres_f32(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_rayleigh_limit_obstructed_f64(double aperture_mm, double obstruction_mm, double wavelength_nm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_rayleigh_limit_obstructed_f64(aperture_mm, obstruction_mm, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_rayleigh_limit_obstructed_f64(double aperture_mm, double obstruction_mm, double wavelength_nm, double *out)
{
    const auto given = fieldstop::rayleigh_limit_obstructed_f64(fieldstop::millimetres_f64(aperture_mm), fieldstop::millimetres_f64(obstruction_mm), fieldstop::nanometres_f64(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_dawes_limit_fx(uint32_t aperture_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_dawes_limit_fx(aperture_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_dawes_limit_fx(uint32_t aperture_um, uint32_t *out)
{
    const auto given = fieldstop::dawes_limit_fx(fieldstop::micrometres(aperture_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_dawes_limit_f32(float aperture_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_dawes_limit_f32(aperture_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_dawes_limit_f32(float aperture_mm, float *out)
{
    const auto given = fieldstop::dawes_limit_f32(fieldstop::millimetres_f32(aperture_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_dawes_limit_f64(double aperture_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_dawes_limit_f64(aperture_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_dawes_limit_f64(double aperture_mm, double *out)
{
    const auto given = fieldstop::dawes_limit_f64(fieldstop::millimetres_f64(aperture_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_sparrow_limit_fx(uint32_t aperture_um, uint32_t wavelength_nm, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_sparrow_limit_fx(aperture_um, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_sparrow_limit_fx(uint32_t aperture_um, uint32_t wavelength_nm, uint32_t *out)
{
    const auto given = fieldstop::sparrow_limit_fx(fieldstop::micrometres(aperture_um), fieldstop::nanometres(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_sparrow_limit_f32(float aperture_mm, float wavelength_nm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_sparrow_limit_f32(aperture_mm, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_sparrow_limit_f32(float aperture_mm, float wavelength_nm, float *out)
{
    const auto given = fieldstop::sparrow_limit_f32(fieldstop::millimetres_f32(aperture_mm), fieldstop::nanometres_f32(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_sparrow_limit_f64(double aperture_mm, double wavelength_nm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_sparrow_limit_f64(aperture_mm, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_sparrow_limit_f64(double aperture_mm, double wavelength_nm, double *out)
{
    const auto given = fieldstop::sparrow_limit_f64(fieldstop::millimetres_f64(aperture_mm), fieldstop::nanometres_f64(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_airy_fwhm_fx(uint32_t aperture_um, uint32_t wavelength_nm, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_airy_fwhm_fx(aperture_um, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_airy_fwhm_fx(uint32_t aperture_um, uint32_t wavelength_nm, uint32_t *out)
{
    const auto given = fieldstop::airy_fwhm_fx(fieldstop::micrometres(aperture_um), fieldstop::nanometres(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_airy_fwhm_f32(float aperture_mm, float wavelength_nm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_airy_fwhm_f32(aperture_mm, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_airy_fwhm_f32(float aperture_mm, float wavelength_nm, float *out)
{
    const auto given = fieldstop::airy_fwhm_f32(fieldstop::millimetres_f32(aperture_mm), fieldstop::nanometres_f32(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_airy_fwhm_f64(double aperture_mm, double wavelength_nm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_airy_fwhm_f64(aperture_mm, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_airy_fwhm_f64(double aperture_mm, double wavelength_nm, double *out)
{
    const auto given = fieldstop::airy_fwhm_f64(fieldstop::millimetres_f64(aperture_mm), fieldstop::nanometres_f64(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_airy_radius_fx(uint32_t focal_length_um, uint32_t aperture_um, uint32_t wavelength_nm, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_airy_radius_fx(focal_length_um, aperture_um, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_airy_radius_fx(uint32_t focal_length_um, uint32_t aperture_um, uint32_t wavelength_nm, uint32_t *out)
{
    const auto given = fieldstop::airy_radius_fx(fieldstop::micrometres(focal_length_um), fieldstop::micrometres(aperture_um), fieldstop::nanometres(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_airy_radius_f32(float focal_length_mm, float aperture_mm, float wavelength_nm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_airy_radius_f32(focal_length_mm, aperture_mm, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_airy_radius_f32(float focal_length_mm, float aperture_mm, float wavelength_nm, float *out)
{
    const auto given = fieldstop::airy_radius_f32(fieldstop::millimetres_f32(focal_length_mm), fieldstop::millimetres_f32(aperture_mm), fieldstop::nanometres_f32(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_airy_radius_f64(double focal_length_mm, double aperture_mm, double wavelength_nm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_airy_radius_f64(focal_length_mm, aperture_mm, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_airy_radius_f64(double focal_length_mm, double aperture_mm, double wavelength_nm, double *out)
{
    const auto given = fieldstop::airy_radius_f64(fieldstop::millimetres_f64(focal_length_mm), fieldstop::millimetres_f64(aperture_mm), fieldstop::nanometres_f64(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_cutoff_frequency_fx(uint32_t focal_length_um, uint32_t aperture_um, uint32_t wavelength_nm, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_cutoff_frequency_fx(focal_length_um, aperture_um, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_cutoff_frequency_fx(uint32_t focal_length_um, uint32_t aperture_um, uint32_t wavelength_nm, uint32_t *out)
{
    const auto given = fieldstop::cutoff_frequency_fx(fieldstop::micrometres(focal_length_um), fieldstop::micrometres(aperture_um), fieldstop::nanometres(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_cutoff_frequency_f32(float focal_length_mm, float aperture_mm, float wavelength_nm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_cutoff_frequency_f32(focal_length_mm, aperture_mm, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_cutoff_frequency_f32(float focal_length_mm, float aperture_mm, float wavelength_nm, float *out)
{
    const auto given = fieldstop::cutoff_frequency_f32(fieldstop::millimetres_f32(focal_length_mm), fieldstop::millimetres_f32(aperture_mm), fieldstop::nanometres_f32(wavelength_nm));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_cutoff_frequency_f64(double focal_length_mm, double aperture_mm, double wavelength_nm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_cutoff_frequency_f64(focal_length_mm, aperture_mm, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_cutoff_frequency_f64(double focal_length_mm, double aperture_mm, double wavelength_nm, double *out)
{
    const auto given = fieldstop::cutoff_frequency_f64(fieldstop::millimetres_f64(focal_length_mm), fieldstop::millimetres_f64(aperture_mm), fieldstop::nanometres_f64(wavelength_nm));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_contrast_fx(uint32_t frequency_q16, uint32_t obstruction_q16, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_contrast_fx(frequency_q16, obstruction_q16, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_contrast_fx(uint32_t frequency_q16, uint32_t obstruction_q16, uint32_t *out)
{
    const auto given = fieldstop::contrast_fx(fieldstop::q16(frequency_q16), fieldstop::q16(obstruction_q16));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_contrast_f32(float frequency, float obstruction, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_contrast_f32(frequency, obstruction, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_contrast_f32(float frequency, float obstruction, float *out)
{
    const auto given = fieldstop::contrast_f32(frequency, obstruction);
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_contrast_f64(double frequency, double obstruction, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_contrast_f64(frequency, obstruction, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_contrast_f64(double frequency, double obstruction, double *out)
{
    const auto given = fieldstop::contrast_f64(frequency, obstruction);
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_strehl_ratio_fx(uint32_t rms_nm, uint32_t wavelength_nm, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_strehl_ratio_fx(rms_nm, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_strehl_ratio_fx(uint32_t rms_nm, uint32_t wavelength_nm, uint32_t *out)
{
    const auto given = fieldstop::strehl_ratio_fx(fieldstop::nanometres(rms_nm), fieldstop::nanometres(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_strehl_ratio_f32(float rms_nm, float wavelength_nm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_strehl_ratio_f32(rms_nm, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_strehl_ratio_f32(float rms_nm, float wavelength_nm, float *out)
{
    const auto given = fieldstop::strehl_ratio_f32(fieldstop::nanometres_f32(rms_nm), fieldstop::nanometres_f32(wavelength_nm));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_strehl_ratio_f64(double rms_nm, double wavelength_nm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_strehl_ratio_f64(rms_nm, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_strehl_ratio_f64(double rms_nm, double wavelength_nm, double *out)
{
    const auto given = fieldstop::strehl_ratio_f64(fieldstop::nanometres_f64(rms_nm), fieldstop::nanometres_f64(wavelength_nm));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_fried_parameter_fx(uint32_t seeing_uas, uint32_t wavelength_nm, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_fried_parameter_fx(seeing_uas, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_fried_parameter_fx(uint32_t seeing_uas, uint32_t wavelength_nm, uint32_t *out)
{
    const auto given = fieldstop::fried_parameter_fx(fieldstop::microarcseconds(seeing_uas), fieldstop::nanometres(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_fried_parameter_f32(float seeing_arcsec, float wavelength_nm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_fried_parameter_f32(seeing_arcsec, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_fried_parameter_f32(float seeing_arcsec, float wavelength_nm, float *out)
{
    const auto given = fieldstop::fried_parameter_f32(fieldstop::arcseconds_f32(seeing_arcsec), fieldstop::nanometres_f32(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_fried_parameter_f64(double seeing_arcsec, double wavelength_nm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_fried_parameter_f64(seeing_arcsec, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_fried_parameter_f64(double seeing_arcsec, double wavelength_nm, double *out)
{
    const auto given = fieldstop::fried_parameter_f64(fieldstop::arcseconds_f64(seeing_arcsec), fieldstop::nanometres_f64(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_seeing_at_airmass_fx(uint32_t seeing_uas, uint32_t airmass_q16, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_seeing_at_airmass_fx(seeing_uas, airmass_q16, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_seeing_at_airmass_fx(uint32_t seeing_uas, uint32_t airmass_q16, uint32_t *out)
{
    const auto given = fieldstop::seeing_at_airmass_fx(fieldstop::microarcseconds(seeing_uas), fieldstop::q16(airmass_q16));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_seeing_at_airmass_f32(float seeing_arcsec, float airmass, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_seeing_at_airmass_f32(seeing_arcsec, airmass, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_seeing_at_airmass_f32(float seeing_arcsec, float airmass, float *out)
{
    const auto given = fieldstop::seeing_at_airmass_f32(fieldstop::arcseconds_f32(seeing_arcsec), airmass);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_seeing_at_airmass_f64(double seeing_arcsec, double airmass, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_seeing_at_airmass_f64(seeing_arcsec, airmass, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_seeing_at_airmass_f64(double seeing_arcsec, double airmass, double *out)
{
    const auto given = fieldstop::seeing_at_airmass_f64(fieldstop::arcseconds_f64(seeing_arcsec), airmass);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_combined_fwhm_fx(uint32_t a_uas, uint32_t b_uas, uint32_t c_uas, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_combined_fwhm_fx(a_uas, b_uas, c_uas, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_combined_fwhm_fx(uint32_t a_uas, uint32_t b_uas, uint32_t c_uas, uint32_t *out)
{
    const auto given = fieldstop::combined_fwhm_fx(fieldstop::microarcseconds(a_uas), fieldstop::microarcseconds(b_uas), fieldstop::microarcseconds(c_uas));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_combined_fwhm_f32(float a_arcsec, float b_arcsec, float c_arcsec, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_combined_fwhm_f32(a_arcsec, b_arcsec, c_arcsec, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_combined_fwhm_f32(float a_arcsec, float b_arcsec, float c_arcsec, float *out)
{
    const auto given = fieldstop::combined_fwhm_f32(fieldstop::arcseconds_f32(a_arcsec), fieldstop::arcseconds_f32(b_arcsec), fieldstop::arcseconds_f32(c_arcsec));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_combined_fwhm_f64(double a_arcsec, double b_arcsec, double c_arcsec, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_combined_fwhm_f64(a_arcsec, b_arcsec, c_arcsec, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_combined_fwhm_f64(double a_arcsec, double b_arcsec, double c_arcsec, double *out)
{
    const auto given = fieldstop::combined_fwhm_f64(fieldstop::arcseconds_f64(a_arcsec), fieldstop::arcseconds_f64(b_arcsec), fieldstop::arcseconds_f64(c_arcsec));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_throughput_fx(uint8_t mirrors, uint32_t reflectance_q16, uint8_t surfaces, uint32_t transmittance_q16, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_throughput_fx(mirrors, reflectance_q16, surfaces, transmittance_q16, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_throughput_fx(uint8_t mirrors, uint32_t reflectance_q16, uint8_t surfaces, uint32_t transmittance_q16, uint32_t *out)
{
    const auto given = fieldstop::throughput_fx(mirrors, fieldstop::q16(reflectance_q16), surfaces, fieldstop::q16(transmittance_q16));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_throughput_f32(uint8_t mirrors, float reflectance, uint8_t surfaces, float transmittance, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_throughput_f32(mirrors, reflectance, surfaces, transmittance, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_throughput_f32(uint8_t mirrors, float reflectance, uint8_t surfaces, float transmittance, float *out)
{
    const auto given = fieldstop::throughput_f32(mirrors, reflectance, surfaces, transmittance);
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_throughput_f64(uint8_t mirrors, double reflectance, uint8_t surfaces, double transmittance, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_throughput_f64(mirrors, reflectance, surfaces, transmittance, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_throughput_f64(uint8_t mirrors, double reflectance, uint8_t surfaces, double transmittance, double *out)
{
    const auto given = fieldstop::throughput_f64(mirrors, reflectance, surfaces, transmittance);
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_clear_fraction_fx(uint32_t aperture_um, uint32_t obstruction_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_clear_fraction_fx(aperture_um, obstruction_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_clear_fraction_fx(uint32_t aperture_um, uint32_t obstruction_um, uint32_t *out)
{
    const auto given = fieldstop::clear_fraction_fx(fieldstop::micrometres(aperture_um), fieldstop::micrometres(obstruction_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_clear_fraction_f32(float aperture_mm, float obstruction_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_clear_fraction_f32(aperture_mm, obstruction_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_clear_fraction_f32(float aperture_mm, float obstruction_mm, float *out)
{
    const auto given = fieldstop::clear_fraction_f32(fieldstop::millimetres_f32(aperture_mm), fieldstop::millimetres_f32(obstruction_mm));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_clear_fraction_f64(double aperture_mm, double obstruction_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_clear_fraction_f64(aperture_mm, obstruction_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_clear_fraction_f64(double aperture_mm, double obstruction_mm, double *out)
{
    const auto given = fieldstop::clear_fraction_f64(fieldstop::millimetres_f64(aperture_mm), fieldstop::millimetres_f64(obstruction_mm));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_effective_aperture_fx(uint32_t aperture_um, uint32_t obstruction_um, uint32_t throughput_q16, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_effective_aperture_fx(aperture_um, obstruction_um, throughput_q16, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_effective_aperture_fx(uint32_t aperture_um, uint32_t obstruction_um, uint32_t throughput_q16, uint32_t *out)
{
    const auto given = fieldstop::effective_aperture_fx(fieldstop::micrometres(aperture_um), fieldstop::micrometres(obstruction_um), fieldstop::q16(throughput_q16));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_effective_aperture_f32(float aperture_mm, float obstruction_mm, float throughput, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_effective_aperture_f32(aperture_mm, obstruction_mm, throughput, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_effective_aperture_f32(float aperture_mm, float obstruction_mm, float throughput, float *out)
{
    const auto given = fieldstop::effective_aperture_f32(fieldstop::millimetres_f32(aperture_mm), fieldstop::millimetres_f32(obstruction_mm), throughput);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_effective_aperture_f64(double aperture_mm, double obstruction_mm, double throughput, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_effective_aperture_f64(aperture_mm, obstruction_mm, throughput, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_effective_aperture_f64(double aperture_mm, double obstruction_mm, double throughput, double *out)
{
    const auto given = fieldstop::effective_aperture_f64(fieldstop::millimetres_f64(aperture_mm), fieldstop::millimetres_f64(obstruction_mm), throughput);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_magnitude_gain_fx(uint32_t effective_aperture_um, uint32_t eye_pupil_um, int32_t *out)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_magnitude_gain_fx(effective_aperture_um, eye_pupil_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_magnitude_gain_fx(uint32_t effective_aperture_um, uint32_t eye_pupil_um, int32_t *out)
{
    const auto given = fieldstop::magnitude_gain_fx(fieldstop::micrometres(effective_aperture_um), fieldstop::micrometres(eye_pupil_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_magnitude_gain_f32(float effective_aperture_mm, float eye_pupil_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_magnitude_gain_f32(effective_aperture_mm, eye_pupil_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_magnitude_gain_f32(float effective_aperture_mm, float eye_pupil_mm, float *out)
{
    const auto given = fieldstop::magnitude_gain_f32(fieldstop::millimetres_f32(effective_aperture_mm), fieldstop::millimetres_f32(eye_pupil_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_magnitude_gain_f64(double effective_aperture_mm, double eye_pupil_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_magnitude_gain_f64(effective_aperture_mm, eye_pupil_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_magnitude_gain_f64(double effective_aperture_mm, double eye_pupil_mm, double *out)
{
    const auto given = fieldstop::magnitude_gain_f64(fieldstop::millimetres_f64(effective_aperture_mm), fieldstop::millimetres_f64(eye_pupil_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_limiting_magnitude_fx(int32_t naked_eye_mmag, uint32_t effective_aperture_um, uint32_t eye_pupil_um, int32_t *out)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_limiting_magnitude_fx(naked_eye_mmag, effective_aperture_um, eye_pupil_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_limiting_magnitude_fx(int32_t naked_eye_mmag, uint32_t effective_aperture_um, uint32_t eye_pupil_um, int32_t *out)
{
    const auto given = fieldstop::limiting_magnitude_fx(fieldstop::millimagnitudes(naked_eye_mmag), fieldstop::micrometres(effective_aperture_um), fieldstop::micrometres(eye_pupil_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_limiting_magnitude_f32(float naked_eye_mag, float effective_aperture_mm, float eye_pupil_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_limiting_magnitude_f32(naked_eye_mag, effective_aperture_mm, eye_pupil_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_limiting_magnitude_f32(float naked_eye_mag, float effective_aperture_mm, float eye_pupil_mm, float *out)
{
    const auto given = fieldstop::limiting_magnitude_f32(fieldstop::magnitudes_f32(naked_eye_mag), fieldstop::millimetres_f32(effective_aperture_mm), fieldstop::millimetres_f32(eye_pupil_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_limiting_magnitude_f64(double naked_eye_mag, double effective_aperture_mm, double eye_pupil_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_limiting_magnitude_f64(naked_eye_mag, effective_aperture_mm, eye_pupil_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_limiting_magnitude_f64(double naked_eye_mag, double effective_aperture_mm, double eye_pupil_mm, double *out)
{
    const auto given = fieldstop::limiting_magnitude_f64(fieldstop::magnitudes_f64(naked_eye_mag), fieldstop::millimetres_f64(effective_aperture_mm), fieldstop::millimetres_f64(eye_pupil_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_surface_brightness_fx(uint32_t exit_pupil_um, uint32_t eye_pupil_um, uint32_t throughput_q16, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_surface_brightness_fx(exit_pupil_um, eye_pupil_um, throughput_q16, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_surface_brightness_fx(uint32_t exit_pupil_um, uint32_t eye_pupil_um, uint32_t throughput_q16, uint32_t *out)
{
    const auto given = fieldstop::surface_brightness_fx(fieldstop::micrometres(exit_pupil_um), fieldstop::micrometres(eye_pupil_um), fieldstop::q16(throughput_q16));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_surface_brightness_f32(float exit_pupil_mm, float eye_pupil_mm, float throughput, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_surface_brightness_f32(exit_pupil_mm, eye_pupil_mm, throughput, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_surface_brightness_f32(float exit_pupil_mm, float eye_pupil_mm, float throughput, float *out)
{
    const auto given = fieldstop::surface_brightness_f32(fieldstop::millimetres_f32(exit_pupil_mm), fieldstop::millimetres_f32(eye_pupil_mm), throughput);
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_surface_brightness_f64(double exit_pupil_mm, double eye_pupil_mm, double throughput, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_surface_brightness_f64(exit_pupil_mm, eye_pupil_mm, throughput, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_surface_brightness_f64(double exit_pupil_mm, double eye_pupil_mm, double throughput, double *out)
{
    const auto given = fieldstop::surface_brightness_f64(fieldstop::millimetres_f64(exit_pupil_mm), fieldstop::millimetres_f64(eye_pupil_mm), throughput);
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_magnitude_difference_fx(uint32_t flux_a, uint32_t flux_b, int32_t *out)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_magnitude_difference_fx(flux_a, flux_b, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_magnitude_difference_fx(uint32_t flux_a, uint32_t flux_b, int32_t *out)
{
    const auto given = fieldstop::magnitude_difference_fx(flux_a, flux_b);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_magnitude_difference_f32(float flux_a, float flux_b, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_magnitude_difference_f32(flux_a, flux_b, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_magnitude_difference_f32(float flux_a, float flux_b, float *out)
{
    const auto given = fieldstop::magnitude_difference_f32(flux_a, flux_b);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_magnitude_difference_f64(double flux_a, double flux_b, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_magnitude_difference_f64(flux_a, flux_b, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_magnitude_difference_f64(double flux_a, double flux_b, double *out)
{
    const auto given = fieldstop::magnitude_difference_f64(flux_a, flux_b);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_distance_dimming_fx(uint32_t near_distance, uint32_t distant_distance, int32_t *out)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_distance_dimming_fx(near_distance, distant_distance, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_distance_dimming_fx(uint32_t near_distance, uint32_t distant_distance, int32_t *out)
{
    const auto given = fieldstop::distance_dimming_fx(near_distance, distant_distance);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_distance_dimming_f32(float near_distance, float distant_distance, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_distance_dimming_f32(near_distance, distant_distance, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_distance_dimming_f32(float near_distance, float distant_distance, float *out)
{
    const auto given = fieldstop::distance_dimming_f32(near_distance, distant_distance);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_distance_dimming_f64(double near_distance, double distant_distance, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_distance_dimming_f64(near_distance, distant_distance, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_distance_dimming_f64(double near_distance, double distant_distance, double *out)
{
    const auto given = fieldstop::distance_dimming_f64(near_distance, distant_distance);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_extinction_fx(uint32_t coefficient_mmag, uint32_t airmass_q16, int32_t *out)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_extinction_fx(coefficient_mmag, airmass_q16, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_extinction_fx(uint32_t coefficient_mmag, uint32_t airmass_q16, int32_t *out)
{
    const auto given = fieldstop::extinction_fx(fieldstop::unsigned_millimagnitudes(coefficient_mmag), fieldstop::q16(airmass_q16));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_extinction_f32(float coefficient_mag, float airmass, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_extinction_f32(coefficient_mag, airmass, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_extinction_f32(float coefficient_mag, float airmass, float *out)
{
    const auto given = fieldstop::extinction_f32(fieldstop::magnitudes_f32(coefficient_mag), airmass);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_extinction_f64(double coefficient_mag, double airmass, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_extinction_f64(coefficient_mag, airmass, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_extinction_f64(double coefficient_mag, double airmass, double *out)
{
    const auto given = fieldstop::extinction_f64(fieldstop::magnitudes_f64(coefficient_mag), airmass);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_t_number_fx(uint32_t focal_ratio_q16, uint32_t throughput_q16, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_t_number_fx(focal_ratio_q16, throughput_q16, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_t_number_fx(uint32_t focal_ratio_q16, uint32_t throughput_q16, uint32_t *out)
{
    const auto given = fieldstop::t_number_fx(fieldstop::q16(focal_ratio_q16), fieldstop::q16(throughput_q16));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_t_number_f32(float focal_ratio, float throughput, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_t_number_f32(focal_ratio, throughput, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_t_number_f32(float focal_ratio, float throughput, float *out)
{
    const auto given = fieldstop::t_number_f32(focal_ratio, throughput);
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_t_number_f64(double focal_ratio, double throughput, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_t_number_f64(focal_ratio, throughput, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_t_number_f64(double focal_ratio, double throughput, double *out)
{
    const auto given = fieldstop::t_number_f64(focal_ratio, throughput);
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_pixels_per_fwhm_fx(uint32_t fwhm_uas, uint32_t pixel_scale_uas, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_pixels_per_fwhm_fx(fwhm_uas, pixel_scale_uas, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_pixels_per_fwhm_fx(uint32_t fwhm_uas, uint32_t pixel_scale_uas, uint32_t *out)
{
    const auto given = fieldstop::pixels_per_fwhm_fx(fieldstop::microarcseconds(fwhm_uas), fieldstop::microarcseconds(pixel_scale_uas));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_pixels_per_fwhm_f32(float fwhm_arcsec, float pixel_scale_arcsec, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_pixels_per_fwhm_f32(fwhm_arcsec, pixel_scale_arcsec, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_pixels_per_fwhm_f32(float fwhm_arcsec, float pixel_scale_arcsec, float *out)
{
    const auto given = fieldstop::pixels_per_fwhm_f32(fieldstop::arcseconds_f32(fwhm_arcsec), fieldstop::arcseconds_f32(pixel_scale_arcsec));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_pixels_per_fwhm_f64(double fwhm_arcsec, double pixel_scale_arcsec, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_pixels_per_fwhm_f64(fwhm_arcsec, pixel_scale_arcsec, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_pixels_per_fwhm_f64(double fwhm_arcsec, double pixel_scale_arcsec, double *out)
{
    const auto given = fieldstop::pixels_per_fwhm_f64(fieldstop::arcseconds_f64(fwhm_arcsec), fieldstop::arcseconds_f64(pixel_scale_arcsec));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_nyquist_pixel_fx(uint32_t focal_length_um, uint32_t aperture_um, uint32_t wavelength_nm, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_nyquist_pixel_fx(focal_length_um, aperture_um, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_nyquist_pixel_fx(uint32_t focal_length_um, uint32_t aperture_um, uint32_t wavelength_nm, uint32_t *out)
{
    const auto given = fieldstop::nyquist_pixel_fx(fieldstop::micrometres(focal_length_um), fieldstop::micrometres(aperture_um), fieldstop::nanometres(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_nyquist_pixel_f32(float focal_length_mm, float aperture_mm, float wavelength_nm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_nyquist_pixel_f32(focal_length_mm, aperture_mm, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_nyquist_pixel_f32(float focal_length_mm, float aperture_mm, float wavelength_nm, float *out)
{
    const auto given = fieldstop::nyquist_pixel_f32(fieldstop::millimetres_f32(focal_length_mm), fieldstop::millimetres_f32(aperture_mm), fieldstop::nanometres_f32(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_nyquist_pixel_f64(double focal_length_mm, double aperture_mm, double wavelength_nm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_nyquist_pixel_f64(focal_length_mm, aperture_mm, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_nyquist_pixel_f64(double focal_length_mm, double aperture_mm, double wavelength_nm, double *out)
{
    const auto given = fieldstop::nyquist_pixel_f64(fieldstop::millimetres_f64(focal_length_mm), fieldstop::millimetres_f64(aperture_mm), fieldstop::nanometres_f64(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_focal_length_for_pixel_scale_fx(uint32_t pixel_nm, uint32_t pixel_scale_uas, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_focal_length_for_pixel_scale_fx(pixel_nm, pixel_scale_uas, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_focal_length_for_pixel_scale_fx(uint32_t pixel_nm, uint32_t pixel_scale_uas, uint32_t *out)
{
    const auto given = fieldstop::focal_length_for_pixel_scale_fx(fieldstop::nanometres(pixel_nm), fieldstop::microarcseconds(pixel_scale_uas));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_focal_length_for_pixel_scale_f32(float pixel_um, float pixel_scale_arcsec, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_focal_length_for_pixel_scale_f32(pixel_um, pixel_scale_arcsec, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_focal_length_for_pixel_scale_f32(float pixel_um, float pixel_scale_arcsec, float *out)
{
    const auto given = fieldstop::focal_length_for_pixel_scale_f32(fieldstop::micrometres_f32(pixel_um), fieldstop::arcseconds_f32(pixel_scale_arcsec));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_focal_length_for_pixel_scale_f64(double pixel_um, double pixel_scale_arcsec, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_focal_length_for_pixel_scale_f64(pixel_um, pixel_scale_arcsec, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_focal_length_for_pixel_scale_f64(double pixel_um, double pixel_scale_arcsec, double *out)
{
    const auto given = fieldstop::focal_length_for_pixel_scale_f64(fieldstop::micrometres_f64(pixel_um), fieldstop::arcseconds_f64(pixel_scale_arcsec));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_diagonal_field_fx(uint32_t pixel_nm, uint16_t columns, uint16_t rows, uint32_t focal_length_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_diagonal_field_fx(pixel_nm, columns, rows, focal_length_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_diagonal_field_fx(uint32_t pixel_nm, uint16_t columns, uint16_t rows, uint32_t focal_length_um, uint32_t *out)
{
    const auto given = fieldstop::diagonal_field_fx(fieldstop::nanometres(pixel_nm), columns, rows, fieldstop::micrometres(focal_length_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_diagonal_field_f32(float pixel_um, uint16_t columns, uint16_t rows, float focal_length_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_diagonal_field_f32(pixel_um, columns, rows, focal_length_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_diagonal_field_f32(float pixel_um, uint16_t columns, uint16_t rows, float focal_length_mm, float *out)
{
    const auto given = fieldstop::diagonal_field_f32(fieldstop::micrometres_f32(pixel_um), columns, rows, fieldstop::millimetres_f32(focal_length_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_diagonal_field_f64(double pixel_um, uint16_t columns, uint16_t rows, double focal_length_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_diagonal_field_f64(pixel_um, columns, rows, focal_length_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_diagonal_field_f64(double pixel_um, uint16_t columns, uint16_t rows, double focal_length_mm, double *out)
{
    const auto given = fieldstop::diagonal_field_f64(fieldstop::micrometres_f64(pixel_um), columns, rows, fieldstop::millimetres_f64(focal_length_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_image_size_fx(uint32_t field_mas, uint32_t focal_length_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_image_size_fx(field_mas, focal_length_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_image_size_fx(uint32_t field_mas, uint32_t focal_length_um, uint32_t *out)
{
    const auto given = fieldstop::image_size_fx(fieldstop::milliarcseconds(field_mas), fieldstop::micrometres(focal_length_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_image_size_f32(float field_arcsec, float focal_length_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_image_size_f32(field_arcsec, focal_length_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_image_size_f32(float field_arcsec, float focal_length_mm, float *out)
{
    const auto given = fieldstop::image_size_f32(fieldstop::arcseconds_f32(field_arcsec), fieldstop::millimetres_f32(focal_length_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_image_size_f64(double field_arcsec, double focal_length_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_image_size_f64(field_arcsec, focal_length_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_image_size_f64(double field_arcsec, double focal_length_mm, double *out)
{
    const auto given = fieldstop::image_size_f64(fieldstop::arcseconds_f64(field_arcsec), fieldstop::millimetres_f64(focal_length_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_exposure_stops_fx(uint32_t from_focal_ratio_q16, uint32_t to_focal_ratio_q16, int32_t *out)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_exposure_stops_fx(from_focal_ratio_q16, to_focal_ratio_q16, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_exposure_stops_fx(uint32_t from_focal_ratio_q16, uint32_t to_focal_ratio_q16, int32_t *out)
{
    const auto given = fieldstop::exposure_stops_fx(fieldstop::q16(from_focal_ratio_q16), fieldstop::q16(to_focal_ratio_q16));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_exposure_stops_f32(float from_focal_ratio, float to_focal_ratio, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_exposure_stops_f32(from_focal_ratio, to_focal_ratio, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_exposure_stops_f32(float from_focal_ratio, float to_focal_ratio, float *out)
{
    const auto given = fieldstop::exposure_stops_f32(from_focal_ratio, to_focal_ratio);
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_exposure_stops_f64(double from_focal_ratio, double to_focal_ratio, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_exposure_stops_f64(from_focal_ratio, to_focal_ratio, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_exposure_stops_f64(double from_focal_ratio, double to_focal_ratio, double *out)
{
    const auto given = fieldstop::exposure_stops_f64(from_focal_ratio, to_focal_ratio);
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_depth_of_focus_fx(uint32_t focal_ratio_q16, uint32_t wavelength_nm, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_depth_of_focus_fx(focal_ratio_q16, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_depth_of_focus_fx(uint32_t focal_ratio_q16, uint32_t wavelength_nm, uint32_t *out)
{
    const auto given = fieldstop::depth_of_focus_fx(fieldstop::q16(focal_ratio_q16), fieldstop::nanometres(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_depth_of_focus_f32(float focal_ratio, float wavelength_nm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_depth_of_focus_f32(focal_ratio, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_depth_of_focus_f32(float focal_ratio, float wavelength_nm, float *out)
{
    const auto given = fieldstop::depth_of_focus_f32(focal_ratio, fieldstop::nanometres_f32(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_depth_of_focus_f64(double focal_ratio, double wavelength_nm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_depth_of_focus_f64(focal_ratio, wavelength_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_depth_of_focus_f64(double focal_ratio, double wavelength_nm, double *out)
{
    const auto given = fieldstop::depth_of_focus_f64(focal_ratio, fieldstop::nanometres_f64(wavelength_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_defocus_blur_fx(uint32_t defocus_nm, uint32_t focal_ratio_q16, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_defocus_blur_fx(defocus_nm, focal_ratio_q16, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_defocus_blur_fx(uint32_t defocus_nm, uint32_t focal_ratio_q16, uint32_t *out)
{
    const auto given = fieldstop::defocus_blur_fx(fieldstop::nanometres(defocus_nm), fieldstop::q16(focal_ratio_q16));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_defocus_blur_f32(float defocus_um, float focal_ratio, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_defocus_blur_f32(defocus_um, focal_ratio, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_defocus_blur_f32(float defocus_um, float focal_ratio, float *out)
{
    const auto given = fieldstop::defocus_blur_f32(fieldstop::micrometres_f32(defocus_um), focal_ratio);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_defocus_blur_f64(double defocus_um, double focal_ratio, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_defocus_blur_f64(defocus_um, focal_ratio, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_defocus_blur_f64(double defocus_um, double focal_ratio, double *out)
{
    const auto given = fieldstop::defocus_blur_f64(fieldstop::micrometres_f64(defocus_um), focal_ratio);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_defocus_wavefront_fx(uint32_t defocus_nm, uint32_t focal_ratio_q16, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_defocus_wavefront_fx(defocus_nm, focal_ratio_q16, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_defocus_wavefront_fx(uint32_t defocus_nm, uint32_t focal_ratio_q16, uint32_t *out)
{
    const auto given = fieldstop::defocus_wavefront_fx(fieldstop::nanometres(defocus_nm), fieldstop::q16(focal_ratio_q16));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_defocus_wavefront_f32(float defocus_um, float focal_ratio, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_defocus_wavefront_f32(defocus_um, focal_ratio, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_defocus_wavefront_f32(float defocus_um, float focal_ratio, float *out)
{
    const auto given = fieldstop::defocus_wavefront_f32(fieldstop::micrometres_f32(defocus_um), focal_ratio);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_defocus_wavefront_f64(double defocus_um, double focal_ratio, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_defocus_wavefront_f64(defocus_um, focal_ratio, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_defocus_wavefront_f64(double defocus_um, double focal_ratio, double *out)
{
    const auto given = fieldstop::defocus_wavefront_f64(fieldstop::micrometres_f64(defocus_um), focal_ratio);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_motor_steps_fx(uint32_t distance_nm, uint32_t step_nm, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_motor_steps_fx(distance_nm, step_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_motor_steps_fx(uint32_t distance_nm, uint32_t step_nm, uint32_t *out)
{
    const auto given = fieldstop::motor_steps_fx(fieldstop::nanometres(distance_nm), fieldstop::nanometres(step_nm));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_motor_steps_f32(float distance_um, float step_um, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_motor_steps_f32(distance_um, step_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_motor_steps_f32(float distance_um, float step_um, float *out)
{
    const auto given = fieldstop::motor_steps_f32(fieldstop::micrometres_f32(distance_um), fieldstop::micrometres_f32(step_um));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_motor_steps_f64(double distance_um, double step_um, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_motor_steps_f64(distance_um, step_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_motor_steps_f64(double distance_um, double step_um, double *out)
{
    const auto given = fieldstop::motor_steps_f64(fieldstop::micrometres_f64(distance_um), fieldstop::micrometres_f64(step_um));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_thermal_shift_fx(uint32_t length_um, int32_t expansion_ppb_per_k, int32_t temperature_change_mk, int32_t *out)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_thermal_shift_fx(length_um, expansion_ppb_per_k, temperature_change_mk, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_thermal_shift_fx(uint32_t length_um, int32_t expansion_ppb_per_k, int32_t temperature_change_mk, int32_t *out)
{
    const auto given = fieldstop::thermal_shift_fx(fieldstop::micrometres(length_um), fieldstop::signed_parts_per_billion_per_kelvin(expansion_ppb_per_k), fieldstop::signed_millikelvin(temperature_change_mk));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_thermal_shift_f32(float length_mm, float expansion_ppm_per_k, float temperature_change_k, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_thermal_shift_f32(length_mm, expansion_ppm_per_k, temperature_change_k, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_thermal_shift_f32(float length_mm, float expansion_ppm_per_k, float temperature_change_k, float *out)
{
    const auto given = fieldstop::thermal_shift_f32(fieldstop::millimetres_f32(length_mm), fieldstop::parts_per_million_per_kelvin_f32(expansion_ppm_per_k), fieldstop::kelvin_f32(temperature_change_k));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_thermal_shift_f64(double length_mm, double expansion_ppm_per_k, double temperature_change_k, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_thermal_shift_f64(length_mm, expansion_ppm_per_k, temperature_change_k, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_thermal_shift_f64(double length_mm, double expansion_ppm_per_k, double temperature_change_k, double *out)
{
    const auto given = fieldstop::thermal_shift_f64(fieldstop::millimetres_f64(length_mm), fieldstop::parts_per_million_per_kelvin_f64(expansion_ppm_per_k), fieldstop::kelvin_f64(temperature_change_k));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_refocus_temperature_fx(uint32_t length_um, uint32_t expansion_ppb_per_k, uint32_t tolerance_nm, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_refocus_temperature_fx(length_um, expansion_ppb_per_k, tolerance_nm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_refocus_temperature_fx(uint32_t length_um, uint32_t expansion_ppb_per_k, uint32_t tolerance_nm, uint32_t *out)
{
    const auto given = fieldstop::refocus_temperature_fx(fieldstop::micrometres(length_um), fieldstop::parts_per_billion_per_kelvin(expansion_ppb_per_k), fieldstop::nanometres(tolerance_nm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_refocus_temperature_f32(float length_mm, float expansion_ppm_per_k, float tolerance_um, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_refocus_temperature_f32(length_mm, expansion_ppm_per_k, tolerance_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_refocus_temperature_f32(float length_mm, float expansion_ppm_per_k, float tolerance_um, float *out)
{
    const auto given = fieldstop::refocus_temperature_f32(fieldstop::millimetres_f32(length_mm), fieldstop::parts_per_million_per_kelvin_f32(expansion_ppm_per_k), fieldstop::micrometres_f32(tolerance_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_refocus_temperature_f64(double length_mm, double expansion_ppm_per_k, double tolerance_um, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_refocus_temperature_f64(length_mm, expansion_ppm_per_k, tolerance_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_refocus_temperature_f64(double length_mm, double expansion_ppm_per_k, double tolerance_um, double *out)
{
    const auto given = fieldstop::refocus_temperature_f64(fieldstop::millimetres_f64(length_mm), fieldstop::parts_per_million_per_kelvin_f64(expansion_ppm_per_k), fieldstop::micrometres_f64(tolerance_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_near_focus_travel_fx(uint32_t focal_length_um, uint32_t object_distance_mm, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_near_focus_travel_fx(focal_length_um, object_distance_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_near_focus_travel_fx(uint32_t focal_length_um, uint32_t object_distance_mm, uint32_t *out)
{
    const auto given = fieldstop::near_focus_travel_fx(fieldstop::micrometres(focal_length_um), fieldstop::millimetres(object_distance_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_near_focus_travel_f32(float focal_length_mm, float object_distance_m, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_near_focus_travel_f32(focal_length_mm, object_distance_m, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_near_focus_travel_f32(float focal_length_mm, float object_distance_m, float *out)
{
    const auto given = fieldstop::near_focus_travel_f32(fieldstop::millimetres_f32(focal_length_mm), fieldstop::metres_f32(object_distance_m));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_near_focus_travel_f64(double focal_length_mm, double object_distance_m, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_near_focus_travel_f64(focal_length_mm, object_distance_m, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_near_focus_travel_f64(double focal_length_mm, double object_distance_m, double *out)
{
    const auto given = fieldstop::near_focus_travel_f64(fieldstop::millimetres_f64(focal_length_mm), fieldstop::metres_f64(object_distance_m));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_coma_length_fx(uint32_t off_axis_mas, uint32_t focal_ratio_q16, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_coma_length_fx(off_axis_mas, focal_ratio_q16, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_coma_length_fx(uint32_t off_axis_mas, uint32_t focal_ratio_q16, uint32_t *out)
{
    const auto given = fieldstop::coma_length_fx(fieldstop::milliarcseconds(off_axis_mas), fieldstop::q16(focal_ratio_q16));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_coma_length_f32(float off_axis_arcsec, float focal_ratio, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_coma_length_f32(off_axis_arcsec, focal_ratio, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_coma_length_f32(float off_axis_arcsec, float focal_ratio, float *out)
{
    const auto given = fieldstop::coma_length_f32(fieldstop::arcseconds_f32(off_axis_arcsec), focal_ratio);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_coma_length_f64(double off_axis_arcsec, double focal_ratio, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_coma_length_f64(off_axis_arcsec, focal_ratio, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_coma_length_f64(double off_axis_arcsec, double focal_ratio, double *out)
{
    const auto given = fieldstop::coma_length_f64(fieldstop::arcseconds_f64(off_axis_arcsec), focal_ratio);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_diagonal_minor_axis_fx(uint32_t aperture_um, uint32_t focal_length_um, uint32_t focus_distance_um, uint32_t lit_field_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_diagonal_minor_axis_fx(aperture_um, focal_length_um, focus_distance_um, lit_field_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_diagonal_minor_axis_fx(uint32_t aperture_um, uint32_t focal_length_um, uint32_t focus_distance_um, uint32_t lit_field_um, uint32_t *out)
{
    const auto given = fieldstop::diagonal_minor_axis_fx(fieldstop::micrometres(aperture_um), fieldstop::micrometres(focal_length_um), fieldstop::micrometres(focus_distance_um), fieldstop::micrometres(lit_field_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_diagonal_minor_axis_f32(float aperture_mm, float focal_length_mm, float focus_distance_mm, float lit_field_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_diagonal_minor_axis_f32(aperture_mm, focal_length_mm, focus_distance_mm, lit_field_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_diagonal_minor_axis_f32(float aperture_mm, float focal_length_mm, float focus_distance_mm, float lit_field_mm, float *out)
{
    const auto given = fieldstop::diagonal_minor_axis_f32(fieldstop::millimetres_f32(aperture_mm), fieldstop::millimetres_f32(focal_length_mm), fieldstop::millimetres_f32(focus_distance_mm), fieldstop::millimetres_f32(lit_field_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_diagonal_minor_axis_f64(double aperture_mm, double focal_length_mm, double focus_distance_mm, double lit_field_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_diagonal_minor_axis_f64(aperture_mm, focal_length_mm, focus_distance_mm, lit_field_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_diagonal_minor_axis_f64(double aperture_mm, double focal_length_mm, double focus_distance_mm, double lit_field_mm, double *out)
{
    const auto given = fieldstop::diagonal_minor_axis_f64(fieldstop::millimetres_f64(aperture_mm), fieldstop::millimetres_f64(focal_length_mm), fieldstop::millimetres_f64(focus_distance_mm), fieldstop::millimetres_f64(lit_field_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_diagonal_offset_fx(uint32_t aperture_um, uint32_t focal_length_um, uint32_t focus_distance_um, uint32_t lit_field_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_diagonal_offset_fx(aperture_um, focal_length_um, focus_distance_um, lit_field_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_diagonal_offset_fx(uint32_t aperture_um, uint32_t focal_length_um, uint32_t focus_distance_um, uint32_t lit_field_um, uint32_t *out)
{
    const auto given = fieldstop::diagonal_offset_fx(fieldstop::micrometres(aperture_um), fieldstop::micrometres(focal_length_um), fieldstop::micrometres(focus_distance_um), fieldstop::micrometres(lit_field_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_diagonal_offset_f32(float aperture_mm, float focal_length_mm, float focus_distance_mm, float lit_field_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_diagonal_offset_f32(aperture_mm, focal_length_mm, focus_distance_mm, lit_field_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_diagonal_offset_f32(float aperture_mm, float focal_length_mm, float focus_distance_mm, float lit_field_mm, float *out)
{
    const auto given = fieldstop::diagonal_offset_f32(fieldstop::millimetres_f32(aperture_mm), fieldstop::millimetres_f32(focal_length_mm), fieldstop::millimetres_f32(focus_distance_mm), fieldstop::millimetres_f32(lit_field_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_diagonal_offset_f64(double aperture_mm, double focal_length_mm, double focus_distance_mm, double lit_field_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_diagonal_offset_f64(aperture_mm, focal_length_mm, focus_distance_mm, lit_field_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_diagonal_offset_f64(double aperture_mm, double focal_length_mm, double focus_distance_mm, double lit_field_mm, double *out)
{
    const auto given = fieldstop::diagonal_offset_f64(fieldstop::millimetres_f64(aperture_mm), fieldstop::millimetres_f64(focal_length_mm), fieldstop::millimetres_f64(focus_distance_mm), fieldstop::millimetres_f64(lit_field_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_beam_width_fx(uint32_t aperture_um, uint32_t focal_length_um, uint32_t focus_distance_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_beam_width_fx(aperture_um, focal_length_um, focus_distance_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_beam_width_fx(uint32_t aperture_um, uint32_t focal_length_um, uint32_t focus_distance_um, uint32_t *out)
{
    const auto given = fieldstop::beam_width_fx(fieldstop::micrometres(aperture_um), fieldstop::micrometres(focal_length_um), fieldstop::micrometres(focus_distance_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_beam_width_f32(float aperture_mm, float focal_length_mm, float focus_distance_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_beam_width_f32(aperture_mm, focal_length_mm, focus_distance_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_beam_width_f32(float aperture_mm, float focal_length_mm, float focus_distance_mm, float *out)
{
    const auto given = fieldstop::beam_width_f32(fieldstop::millimetres_f32(aperture_mm), fieldstop::millimetres_f32(focal_length_mm), fieldstop::millimetres_f32(focus_distance_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_beam_width_f64(double aperture_mm, double focal_length_mm, double focus_distance_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_beam_width_f64(aperture_mm, focal_length_mm, focus_distance_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_beam_width_f64(double aperture_mm, double focal_length_mm, double focus_distance_mm, double *out)
{
    const auto given = fieldstop::beam_width_f64(fieldstop::millimetres_f64(aperture_mm), fieldstop::millimetres_f64(focal_length_mm), fieldstop::millimetres_f64(focus_distance_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_beam_shift_fx(uint32_t image_offset_um, uint32_t focal_length_um, uint32_t focus_distance_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_beam_shift_fx(image_offset_um, focal_length_um, focus_distance_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_beam_shift_fx(uint32_t image_offset_um, uint32_t focal_length_um, uint32_t focus_distance_um, uint32_t *out)
{
    const auto given = fieldstop::beam_shift_fx(fieldstop::micrometres(image_offset_um), fieldstop::micrometres(focal_length_um), fieldstop::micrometres(focus_distance_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_beam_shift_f32(float image_offset_mm, float focal_length_mm, float focus_distance_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_beam_shift_f32(image_offset_mm, focal_length_mm, focus_distance_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_beam_shift_f32(float image_offset_mm, float focal_length_mm, float focus_distance_mm, float *out)
{
    const auto given = fieldstop::beam_shift_f32(fieldstop::millimetres_f32(image_offset_mm), fieldstop::millimetres_f32(focal_length_mm), fieldstop::millimetres_f32(focus_distance_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_beam_shift_f64(double image_offset_mm, double focal_length_mm, double focus_distance_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_beam_shift_f64(image_offset_mm, focal_length_mm, focus_distance_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_beam_shift_f64(double image_offset_mm, double focal_length_mm, double focus_distance_mm, double *out)
{
    const auto given = fieldstop::beam_shift_f64(fieldstop::millimetres_f64(image_offset_mm), fieldstop::millimetres_f64(focal_length_mm), fieldstop::millimetres_f64(focus_distance_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_secondary_magnification_fx(uint32_t primary_focal_um, uint32_t system_focal_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_secondary_magnification_fx(primary_focal_um, system_focal_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_secondary_magnification_fx(uint32_t primary_focal_um, uint32_t system_focal_um, uint32_t *out)
{
    const auto given = fieldstop::secondary_magnification_fx(fieldstop::micrometres(primary_focal_um), fieldstop::micrometres(system_focal_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_secondary_magnification_f32(float primary_focal_mm, float system_focal_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_secondary_magnification_f32(primary_focal_mm, system_focal_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_secondary_magnification_f32(float primary_focal_mm, float system_focal_mm, float *out)
{
    const auto given = fieldstop::secondary_magnification_f32(fieldstop::millimetres_f32(primary_focal_mm), fieldstop::millimetres_f32(system_focal_mm));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_secondary_magnification_f64(double primary_focal_mm, double system_focal_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_secondary_magnification_f64(primary_focal_mm, system_focal_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_secondary_magnification_f64(double primary_focal_mm, double system_focal_mm, double *out)
{
    const auto given = fieldstop::secondary_magnification_f64(fieldstop::millimetres_f64(primary_focal_mm), fieldstop::millimetres_f64(system_focal_mm));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_secondary_separation_fx(uint32_t primary_focal_um, uint32_t system_focal_um, uint32_t back_focus_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_secondary_separation_fx(primary_focal_um, system_focal_um, back_focus_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_secondary_separation_fx(uint32_t primary_focal_um, uint32_t system_focal_um, uint32_t back_focus_um, uint32_t *out)
{
    const auto given = fieldstop::secondary_separation_fx(fieldstop::micrometres(primary_focal_um), fieldstop::micrometres(system_focal_um), fieldstop::micrometres(back_focus_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_secondary_separation_f32(float primary_focal_mm, float system_focal_mm, float back_focus_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_secondary_separation_f32(primary_focal_mm, system_focal_mm, back_focus_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_secondary_separation_f32(float primary_focal_mm, float system_focal_mm, float back_focus_mm, float *out)
{
    const auto given = fieldstop::secondary_separation_f32(fieldstop::millimetres_f32(primary_focal_mm), fieldstop::millimetres_f32(system_focal_mm), fieldstop::millimetres_f32(back_focus_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_secondary_separation_f64(double primary_focal_mm, double system_focal_mm, double back_focus_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_secondary_separation_f64(primary_focal_mm, system_focal_mm, back_focus_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_secondary_separation_f64(double primary_focal_mm, double system_focal_mm, double back_focus_mm, double *out)
{
    const auto given = fieldstop::secondary_separation_f64(fieldstop::millimetres_f64(primary_focal_mm), fieldstop::millimetres_f64(system_focal_mm), fieldstop::millimetres_f64(back_focus_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_secondary_diameter_fx(uint32_t aperture_um, uint32_t primary_focal_um, uint32_t system_focal_um, uint32_t back_focus_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_secondary_diameter_fx(aperture_um, primary_focal_um, system_focal_um, back_focus_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_secondary_diameter_fx(uint32_t aperture_um, uint32_t primary_focal_um, uint32_t system_focal_um, uint32_t back_focus_um, uint32_t *out)
{
    const auto given = fieldstop::secondary_diameter_fx(fieldstop::micrometres(aperture_um), fieldstop::micrometres(primary_focal_um), fieldstop::micrometres(system_focal_um), fieldstop::micrometres(back_focus_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_secondary_diameter_f32(float aperture_mm, float primary_focal_mm, float system_focal_mm, float back_focus_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_secondary_diameter_f32(aperture_mm, primary_focal_mm, system_focal_mm, back_focus_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_secondary_diameter_f32(float aperture_mm, float primary_focal_mm, float system_focal_mm, float back_focus_mm, float *out)
{
    const auto given = fieldstop::secondary_diameter_f32(fieldstop::millimetres_f32(aperture_mm), fieldstop::millimetres_f32(primary_focal_mm), fieldstop::millimetres_f32(system_focal_mm), fieldstop::millimetres_f32(back_focus_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_secondary_diameter_f64(double aperture_mm, double primary_focal_mm, double system_focal_mm, double back_focus_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_secondary_diameter_f64(aperture_mm, primary_focal_mm, system_focal_mm, back_focus_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_secondary_diameter_f64(double aperture_mm, double primary_focal_mm, double system_focal_mm, double back_focus_mm, double *out)
{
    const auto given = fieldstop::secondary_diameter_f64(fieldstop::millimetres_f64(aperture_mm), fieldstop::millimetres_f64(primary_focal_mm), fieldstop::millimetres_f64(system_focal_mm), fieldstop::millimetres_f64(back_focus_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_secondary_field_margin_fx(uint32_t primary_focal_um, uint32_t system_focal_um, uint32_t back_focus_um, uint32_t lit_field_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_secondary_field_margin_fx(primary_focal_um, system_focal_um, back_focus_um, lit_field_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_secondary_field_margin_fx(uint32_t primary_focal_um, uint32_t system_focal_um, uint32_t back_focus_um, uint32_t lit_field_um, uint32_t *out)
{
    const auto given = fieldstop::secondary_field_margin_fx(fieldstop::micrometres(primary_focal_um), fieldstop::micrometres(system_focal_um), fieldstop::micrometres(back_focus_um), fieldstop::micrometres(lit_field_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_secondary_field_margin_f32(float primary_focal_mm, float system_focal_mm, float back_focus_mm, float lit_field_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_secondary_field_margin_f32(primary_focal_mm, system_focal_mm, back_focus_mm, lit_field_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_secondary_field_margin_f32(float primary_focal_mm, float system_focal_mm, float back_focus_mm, float lit_field_mm, float *out)
{
    const auto given = fieldstop::secondary_field_margin_f32(fieldstop::millimetres_f32(primary_focal_mm), fieldstop::millimetres_f32(system_focal_mm), fieldstop::millimetres_f32(back_focus_mm), fieldstop::millimetres_f32(lit_field_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_secondary_field_margin_f64(double primary_focal_mm, double system_focal_mm, double back_focus_mm, double lit_field_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_secondary_field_margin_f64(primary_focal_mm, system_focal_mm, back_focus_mm, lit_field_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_secondary_field_margin_f64(double primary_focal_mm, double system_focal_mm, double back_focus_mm, double lit_field_mm, double *out)
{
    const auto given = fieldstop::secondary_field_margin_f64(fieldstop::millimetres_f64(primary_focal_mm), fieldstop::millimetres_f64(system_focal_mm), fieldstop::millimetres_f64(back_focus_mm), fieldstop::millimetres_f64(lit_field_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_secondary_radius_fx(uint32_t primary_focal_um, uint32_t system_focal_um, uint32_t back_focus_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_secondary_radius_fx(primary_focal_um, system_focal_um, back_focus_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_secondary_radius_fx(uint32_t primary_focal_um, uint32_t system_focal_um, uint32_t back_focus_um, uint32_t *out)
{
    const auto given = fieldstop::secondary_radius_fx(fieldstop::micrometres(primary_focal_um), fieldstop::micrometres(system_focal_um), fieldstop::micrometres(back_focus_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_secondary_radius_f32(float primary_focal_mm, float system_focal_mm, float back_focus_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_secondary_radius_f32(primary_focal_mm, system_focal_mm, back_focus_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_secondary_radius_f32(float primary_focal_mm, float system_focal_mm, float back_focus_mm, float *out)
{
    const auto given = fieldstop::secondary_radius_f32(fieldstop::millimetres_f32(primary_focal_mm), fieldstop::millimetres_f32(system_focal_mm), fieldstop::millimetres_f32(back_focus_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_secondary_radius_f64(double primary_focal_mm, double system_focal_mm, double back_focus_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_secondary_radius_f64(primary_focal_mm, system_focal_mm, back_focus_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_secondary_radius_f64(double primary_focal_mm, double system_focal_mm, double back_focus_mm, double *out)
{
    const auto given = fieldstop::secondary_radius_f64(fieldstop::millimetres_f64(primary_focal_mm), fieldstop::millimetres_f64(system_focal_mm), fieldstop::millimetres_f64(back_focus_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_illumination_fx(uint32_t beam_um, uint32_t stop_um, uint32_t offset_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_illumination_fx(beam_um, stop_um, offset_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_illumination_fx(uint32_t beam_um, uint32_t stop_um, uint32_t offset_um, uint32_t *out)
{
    const auto given = fieldstop::illumination_fx(fieldstop::micrometres(beam_um), fieldstop::micrometres(stop_um), fieldstop::micrometres(offset_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_illumination_f32(float beam_mm, float stop_mm, float offset_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_illumination_f32(beam_mm, stop_mm, offset_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_illumination_f32(float beam_mm, float stop_mm, float offset_mm, float *out)
{
    const auto given = fieldstop::illumination_f32(fieldstop::millimetres_f32(beam_mm), fieldstop::millimetres_f32(stop_mm), fieldstop::millimetres_f32(offset_mm));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_illumination_f64(double beam_mm, double stop_mm, double offset_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_illumination_f64(beam_mm, stop_mm, offset_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_illumination_f64(double beam_mm, double stop_mm, double offset_mm, double *out)
{
    const auto given = fieldstop::illumination_f64(fieldstop::millimetres_f64(beam_mm), fieldstop::millimetres_f64(stop_mm), fieldstop::millimetres_f64(offset_mm));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_swing_radius_fx(uint32_t reach_um, uint32_t tube_diameter_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_swing_radius_fx(reach_um, tube_diameter_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_swing_radius_fx(uint32_t reach_um, uint32_t tube_diameter_um, uint32_t *out)
{
    const auto given = fieldstop::swing_radius_fx(fieldstop::micrometres(reach_um), fieldstop::micrometres(tube_diameter_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_swing_radius_f32(float reach_mm, float tube_diameter_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_swing_radius_f32(reach_mm, tube_diameter_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_swing_radius_f32(float reach_mm, float tube_diameter_mm, float *out)
{
    const auto given = fieldstop::swing_radius_f32(fieldstop::millimetres_f32(reach_mm), fieldstop::millimetres_f32(tube_diameter_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_swing_radius_f64(double reach_mm, double tube_diameter_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_swing_radius_f64(reach_mm, tube_diameter_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_swing_radius_f64(double reach_mm, double tube_diameter_mm, double *out)
{
    const auto given = fieldstop::swing_radius_f64(fieldstop::millimetres_f64(reach_mm), fieldstop::millimetres_f64(tube_diameter_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_eyepiece_height_fx(uint32_t axis_height_um, int32_t reach_um, int32_t altitude_bam, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_eyepiece_height_fx(axis_height_um, reach_um, altitude_bam, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_eyepiece_height_fx(uint32_t axis_height_um, int32_t reach_um, int32_t altitude_bam, uint32_t *out)
{
    const auto given = fieldstop::eyepiece_height_fx(fieldstop::micrometres(axis_height_um), fieldstop::signed_micrometres(reach_um), fieldstop::signed_binary_angle(altitude_bam));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_eyepiece_height_f32(float axis_height_mm, float reach_mm, float altitude_deg, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_eyepiece_height_f32(axis_height_mm, reach_mm, altitude_deg, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_eyepiece_height_f32(float axis_height_mm, float reach_mm, float altitude_deg, float *out)
{
    const auto given = fieldstop::eyepiece_height_f32(fieldstop::millimetres_f32(axis_height_mm), fieldstop::millimetres_f32(reach_mm), fieldstop::degrees_of_arc_f32(altitude_deg));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_eyepiece_height_f64(double axis_height_mm, double reach_mm, double altitude_deg, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_eyepiece_height_f64(axis_height_mm, reach_mm, altitude_deg, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_eyepiece_height_f64(double axis_height_mm, double reach_mm, double altitude_deg, double *out)
{
    const auto given = fieldstop::eyepiece_height_f64(fieldstop::millimetres_f64(axis_height_mm), fieldstop::millimetres_f64(reach_mm), fieldstop::degrees_of_arc_f64(altitude_deg));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_abbe_number_fx(uint32_t index_d_n7, uint32_t index_f_n7, uint32_t index_c_n7, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_abbe_number_fx(index_d_n7, index_f_n7, index_c_n7, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_abbe_number_fx(uint32_t index_d_n7, uint32_t index_f_n7, uint32_t index_c_n7, uint32_t *out)
{
    const auto given = fieldstop::abbe_number_fx(fieldstop::index_n7(index_d_n7), fieldstop::index_n7(index_f_n7), fieldstop::index_n7(index_c_n7));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_abbe_number_f32(float index_d, float index_f, float index_c, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_abbe_number_f32(index_d, index_f, index_c, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_abbe_number_f32(float index_d, float index_f, float index_c, float *out)
{
    const auto given = fieldstop::abbe_number_f32(index_d, index_f, index_c);
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_abbe_number_f64(double index_d, double index_f, double index_c, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_abbe_number_f64(index_d, index_f, index_c, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_abbe_number_f64(double index_d, double index_f, double index_c, double *out)
{
    const auto given = fieldstop::abbe_number_f64(index_d, index_f, index_c);
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_singlet_colour_shift_fx(uint32_t focal_length_um, uint32_t abbe_q16, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_singlet_colour_shift_fx(focal_length_um, abbe_q16, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_singlet_colour_shift_fx(uint32_t focal_length_um, uint32_t abbe_q16, uint32_t *out)
{
    const auto given = fieldstop::singlet_colour_shift_fx(fieldstop::micrometres(focal_length_um), fieldstop::q16(abbe_q16));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_singlet_colour_shift_f32(float focal_length_mm, float abbe, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_singlet_colour_shift_f32(focal_length_mm, abbe, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_singlet_colour_shift_f32(float focal_length_mm, float abbe, float *out)
{
    const auto given = fieldstop::singlet_colour_shift_f32(fieldstop::millimetres_f32(focal_length_mm), abbe);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_singlet_colour_shift_f64(double focal_length_mm, double abbe, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_singlet_colour_shift_f64(focal_length_mm, abbe, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_singlet_colour_shift_f64(double focal_length_mm, double abbe, double *out)
{
    const auto given = fieldstop::singlet_colour_shift_f64(fieldstop::millimetres_f64(focal_length_mm), abbe);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_singlet_colour_blur_fx(uint32_t focal_ratio_q16, uint32_t abbe_q16, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_singlet_colour_blur_fx(focal_ratio_q16, abbe_q16, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_singlet_colour_blur_fx(uint32_t focal_ratio_q16, uint32_t abbe_q16, uint32_t *out)
{
    const auto given = fieldstop::singlet_colour_blur_fx(fieldstop::q16(focal_ratio_q16), fieldstop::q16(abbe_q16));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_singlet_colour_blur_f32(float focal_ratio, float abbe, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_singlet_colour_blur_f32(focal_ratio, abbe, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_singlet_colour_blur_f32(float focal_ratio, float abbe, float *out)
{
    const auto given = fieldstop::singlet_colour_blur_f32(focal_ratio, abbe);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_singlet_colour_blur_f64(double focal_ratio, double abbe, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_singlet_colour_blur_f64(focal_ratio, abbe, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_singlet_colour_blur_f64(double focal_ratio, double abbe, double *out)
{
    const auto given = fieldstop::singlet_colour_blur_f64(focal_ratio, abbe);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_achromat_crown_fx(uint32_t focal_length_um, uint32_t crown_abbe_q16, uint32_t flint_abbe_q16, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_achromat_crown_fx(focal_length_um, crown_abbe_q16, flint_abbe_q16, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_achromat_crown_fx(uint32_t focal_length_um, uint32_t crown_abbe_q16, uint32_t flint_abbe_q16, uint32_t *out)
{
    const auto given = fieldstop::achromat_crown_fx(fieldstop::micrometres(focal_length_um), fieldstop::q16(crown_abbe_q16), fieldstop::q16(flint_abbe_q16));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_achromat_crown_f32(float focal_length_mm, float crown_abbe, float flint_abbe, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_achromat_crown_f32(focal_length_mm, crown_abbe, flint_abbe, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_achromat_crown_f32(float focal_length_mm, float crown_abbe, float flint_abbe, float *out)
{
    const auto given = fieldstop::achromat_crown_f32(fieldstop::millimetres_f32(focal_length_mm), crown_abbe, flint_abbe);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_achromat_crown_f64(double focal_length_mm, double crown_abbe, double flint_abbe, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_achromat_crown_f64(focal_length_mm, crown_abbe, flint_abbe, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_achromat_crown_f64(double focal_length_mm, double crown_abbe, double flint_abbe, double *out)
{
    const auto given = fieldstop::achromat_crown_f64(fieldstop::millimetres_f64(focal_length_mm), crown_abbe, flint_abbe);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_achromat_flint_fx(uint32_t focal_length_um, uint32_t crown_abbe_q16, uint32_t flint_abbe_q16, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_achromat_flint_fx(focal_length_um, crown_abbe_q16, flint_abbe_q16, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_achromat_flint_fx(uint32_t focal_length_um, uint32_t crown_abbe_q16, uint32_t flint_abbe_q16, uint32_t *out)
{
    const auto given = fieldstop::achromat_flint_fx(fieldstop::micrometres(focal_length_um), fieldstop::q16(crown_abbe_q16), fieldstop::q16(flint_abbe_q16));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_achromat_flint_f32(float focal_length_mm, float crown_abbe, float flint_abbe, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_achromat_flint_f32(focal_length_mm, crown_abbe, flint_abbe, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_achromat_flint_f32(float focal_length_mm, float crown_abbe, float flint_abbe, float *out)
{
    const auto given = fieldstop::achromat_flint_f32(fieldstop::millimetres_f32(focal_length_mm), crown_abbe, flint_abbe);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_achromat_flint_f64(double focal_length_mm, double crown_abbe, double flint_abbe, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_achromat_flint_f64(focal_length_mm, crown_abbe, flint_abbe, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_achromat_flint_f64(double focal_length_mm, double crown_abbe, double flint_abbe, double *out)
{
    const auto given = fieldstop::achromat_flint_f64(fieldstop::millimetres_f64(focal_length_mm), crown_abbe, flint_abbe);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_secondary_spectrum_fx(uint32_t focal_length_um, uint32_t partial_difference_ppm, uint32_t abbe_difference_q16, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_secondary_spectrum_fx(focal_length_um, partial_difference_ppm, abbe_difference_q16, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_secondary_spectrum_fx(uint32_t focal_length_um, uint32_t partial_difference_ppm, uint32_t abbe_difference_q16, uint32_t *out)
{
    const auto given = fieldstop::secondary_spectrum_fx(fieldstop::micrometres(focal_length_um), fieldstop::parts_per_million(partial_difference_ppm), fieldstop::q16(abbe_difference_q16));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_secondary_spectrum_f32(float focal_length_mm, float partial_difference, float abbe_difference, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_secondary_spectrum_f32(focal_length_mm, partial_difference, abbe_difference, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_secondary_spectrum_f32(float focal_length_mm, float partial_difference, float abbe_difference, float *out)
{
    const auto given = fieldstop::secondary_spectrum_f32(fieldstop::millimetres_f32(focal_length_mm), partial_difference, abbe_difference);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_secondary_spectrum_f64(double focal_length_mm, double partial_difference, double abbe_difference, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_secondary_spectrum_f64(focal_length_mm, partial_difference, abbe_difference, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_secondary_spectrum_f64(double focal_length_mm, double partial_difference, double abbe_difference, double *out)
{
    const auto given = fieldstop::secondary_spectrum_f64(fieldstop::millimetres_f64(focal_length_mm), partial_difference, abbe_difference);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_drift_rate_fx(int32_t declination_bam, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_drift_rate_fx(declination_bam, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_drift_rate_fx(int32_t declination_bam, uint32_t *out)
{
    const auto given = fieldstop::drift_rate_fx(fieldstop::signed_binary_angle(declination_bam));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_drift_rate_f32(float declination_deg, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_drift_rate_f32(declination_deg, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_drift_rate_f32(float declination_deg, float *out)
{
    const auto given = fieldstop::drift_rate_f32(fieldstop::degrees_of_arc_f32(declination_deg));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_drift_rate_f64(double declination_deg, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_drift_rate_f64(declination_deg, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_drift_rate_f64(double declination_deg, double *out)
{
    const auto given = fieldstop::drift_rate_f64(fieldstop::degrees_of_arc_f64(declination_deg));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_drift_time_fx(uint32_t field_mas, int32_t declination_bam, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_drift_time_fx(field_mas, declination_bam, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_drift_time_fx(uint32_t field_mas, int32_t declination_bam, uint32_t *out)
{
    const auto given = fieldstop::drift_time_fx(fieldstop::milliarcseconds(field_mas), fieldstop::signed_binary_angle(declination_bam));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_drift_time_f32(float field_arcsec, float declination_deg, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_drift_time_f32(field_arcsec, declination_deg, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_drift_time_f32(float field_arcsec, float declination_deg, float *out)
{
    const auto given = fieldstop::drift_time_f32(fieldstop::arcseconds_f32(field_arcsec), fieldstop::degrees_of_arc_f32(declination_deg));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_drift_time_f64(double field_arcsec, double declination_deg, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_drift_time_f64(field_arcsec, declination_deg, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_drift_time_f64(double field_arcsec, double declination_deg, double *out)
{
    const auto given = fieldstop::drift_time_f64(fieldstop::arcseconds_f64(field_arcsec), fieldstop::degrees_of_arc_f64(declination_deg));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_true_field_from_drift_fx(uint32_t drift_ms, int32_t declination_bam, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_true_field_from_drift_fx(drift_ms, declination_bam, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_true_field_from_drift_fx(uint32_t drift_ms, int32_t declination_bam, uint32_t *out)
{
    const auto given = fieldstop::true_field_from_drift_fx(fieldstop::milliseconds(drift_ms), fieldstop::signed_binary_angle(declination_bam));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_true_field_from_drift_f32(float drift_s, float declination_deg, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_true_field_from_drift_f32(drift_s, declination_deg, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_true_field_from_drift_f32(float drift_s, float declination_deg, float *out)
{
    const auto given = fieldstop::true_field_from_drift_f32(fieldstop::seconds_f32(drift_s), fieldstop::degrees_of_arc_f32(declination_deg));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_true_field_from_drift_f64(double drift_s, double declination_deg, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_true_field_from_drift_f64(drift_s, declination_deg, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_true_field_from_drift_f64(double drift_s, double declination_deg, double *out)
{
    const auto given = fieldstop::true_field_from_drift_f64(fieldstop::seconds_f64(drift_s), fieldstop::degrees_of_arc_f64(declination_deg));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_trail_free_exposure_fx(uint32_t pixel_nm, uint32_t tolerance_q16, uint32_t focal_length_um, int32_t declination_bam, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_trail_free_exposure_fx(pixel_nm, tolerance_q16, focal_length_um, declination_bam, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_trail_free_exposure_fx(uint32_t pixel_nm, uint32_t tolerance_q16, uint32_t focal_length_um, int32_t declination_bam, uint32_t *out)
{
    const auto given = fieldstop::trail_free_exposure_fx(fieldstop::nanometres(pixel_nm), fieldstop::q16(tolerance_q16), fieldstop::micrometres(focal_length_um), fieldstop::signed_binary_angle(declination_bam));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_trail_free_exposure_f32(float pixel_um, float tolerance, float focal_length_mm, float declination_deg, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_trail_free_exposure_f32(pixel_um, tolerance, focal_length_mm, declination_deg, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_trail_free_exposure_f32(float pixel_um, float tolerance, float focal_length_mm, float declination_deg, float *out)
{
    const auto given = fieldstop::trail_free_exposure_f32(fieldstop::micrometres_f32(pixel_um), tolerance, fieldstop::millimetres_f32(focal_length_mm), fieldstop::degrees_of_arc_f32(declination_deg));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_trail_free_exposure_f64(double pixel_um, double tolerance, double focal_length_mm, double declination_deg, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_trail_free_exposure_f64(pixel_um, tolerance, focal_length_mm, declination_deg, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_trail_free_exposure_f64(double pixel_um, double tolerance, double focal_length_mm, double declination_deg, double *out)
{
    const auto given = fieldstop::trail_free_exposure_f64(fieldstop::micrometres_f64(pixel_um), tolerance, fieldstop::millimetres_f64(focal_length_mm), fieldstop::degrees_of_arc_f64(declination_deg));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_rotation_free_exposure_fx(uint32_t tolerance_q16, uint32_t radius_px, uint32_t rate_uas_per_s, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_rotation_free_exposure_fx(tolerance_q16, radius_px, rate_uas_per_s, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_rotation_free_exposure_fx(uint32_t tolerance_q16, uint32_t radius_px, uint32_t rate_uas_per_s, uint32_t *out)
{
    const auto given = fieldstop::rotation_free_exposure_fx(fieldstop::q16(tolerance_q16), radius_px, fieldstop::microarcseconds_per_second(rate_uas_per_s));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_rotation_free_exposure_f32(float tolerance, uint32_t radius_px, float rate_arcsec_per_s, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_rotation_free_exposure_f32(tolerance, radius_px, rate_arcsec_per_s, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_rotation_free_exposure_f32(float tolerance, uint32_t radius_px, float rate_arcsec_per_s, float *out)
{
    const auto given = fieldstop::rotation_free_exposure_f32(tolerance, radius_px, fieldstop::arcseconds_per_second_f32(rate_arcsec_per_s));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_rotation_free_exposure_f64(double tolerance, uint32_t radius_px, double rate_arcsec_per_s, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_rotation_free_exposure_f64(tolerance, radius_px, rate_arcsec_per_s, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_rotation_free_exposure_f64(double tolerance, uint32_t radius_px, double rate_arcsec_per_s, double *out)
{
    const auto given = fieldstop::rotation_free_exposure_f64(tolerance, radius_px, fieldstop::arcseconds_per_second_f64(rate_arcsec_per_s));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_field_rotation_rate_fx(int32_t latitude_bam, uint32_t azimuth_bam, int32_t altitude_bam, int32_t *out)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_field_rotation_rate_fx(latitude_bam, azimuth_bam, altitude_bam, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_field_rotation_rate_fx(int32_t latitude_bam, uint32_t azimuth_bam, int32_t altitude_bam, int32_t *out)
{
    const auto given = fieldstop::field_rotation_rate_fx(fieldstop::signed_binary_angle(latitude_bam), fieldstop::binary_angle(azimuth_bam), fieldstop::signed_binary_angle(altitude_bam));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_field_rotation_rate_f32(float latitude_deg, float azimuth_deg, float altitude_deg, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_field_rotation_rate_f32(latitude_deg, azimuth_deg, altitude_deg, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_field_rotation_rate_f32(float latitude_deg, float azimuth_deg, float altitude_deg, float *out)
{
    const auto given = fieldstop::field_rotation_rate_f32(fieldstop::degrees_of_arc_f32(latitude_deg), fieldstop::degrees_of_arc_f32(azimuth_deg), fieldstop::degrees_of_arc_f32(altitude_deg));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_field_rotation_rate_f64(double latitude_deg, double azimuth_deg, double altitude_deg, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_field_rotation_rate_f64(latitude_deg, azimuth_deg, altitude_deg, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_field_rotation_rate_f64(double latitude_deg, double azimuth_deg, double altitude_deg, double *out)
{
    const auto given = fieldstop::field_rotation_rate_f64(fieldstop::degrees_of_arc_f64(latitude_deg), fieldstop::degrees_of_arc_f64(azimuth_deg), fieldstop::degrees_of_arc_f64(altitude_deg));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_azimuth_rate_fx(int32_t latitude_bam, uint32_t azimuth_bam, int32_t altitude_bam, int32_t *out)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_azimuth_rate_fx(latitude_bam, azimuth_bam, altitude_bam, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_azimuth_rate_fx(int32_t latitude_bam, uint32_t azimuth_bam, int32_t altitude_bam, int32_t *out)
{
    const auto given = fieldstop::azimuth_rate_fx(fieldstop::signed_binary_angle(latitude_bam), fieldstop::binary_angle(azimuth_bam), fieldstop::signed_binary_angle(altitude_bam));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_azimuth_rate_f32(float latitude_deg, float azimuth_deg, float altitude_deg, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_azimuth_rate_f32(latitude_deg, azimuth_deg, altitude_deg, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_azimuth_rate_f32(float latitude_deg, float azimuth_deg, float altitude_deg, float *out)
{
    const auto given = fieldstop::azimuth_rate_f32(fieldstop::degrees_of_arc_f32(latitude_deg), fieldstop::degrees_of_arc_f32(azimuth_deg), fieldstop::degrees_of_arc_f32(altitude_deg));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_azimuth_rate_f64(double latitude_deg, double azimuth_deg, double altitude_deg, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_azimuth_rate_f64(latitude_deg, azimuth_deg, altitude_deg, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_azimuth_rate_f64(double latitude_deg, double azimuth_deg, double altitude_deg, double *out)
{
    const auto given = fieldstop::azimuth_rate_f64(fieldstop::degrees_of_arc_f64(latitude_deg), fieldstop::degrees_of_arc_f64(azimuth_deg), fieldstop::degrees_of_arc_f64(altitude_deg));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_altitude_rate_fx(int32_t latitude_bam, uint32_t azimuth_bam, int32_t altitude_bam, int32_t *out)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_altitude_rate_fx(latitude_bam, azimuth_bam, altitude_bam, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_altitude_rate_fx(int32_t latitude_bam, uint32_t azimuth_bam, int32_t altitude_bam, int32_t *out)
{
    const auto given = fieldstop::altitude_rate_fx(fieldstop::signed_binary_angle(latitude_bam), fieldstop::binary_angle(azimuth_bam), fieldstop::signed_binary_angle(altitude_bam));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_altitude_rate_f32(float latitude_deg, float azimuth_deg, float altitude_deg, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_altitude_rate_f32(latitude_deg, azimuth_deg, altitude_deg, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_altitude_rate_f32(float latitude_deg, float azimuth_deg, float altitude_deg, float *out)
{
    const auto given = fieldstop::altitude_rate_f32(fieldstop::degrees_of_arc_f32(latitude_deg), fieldstop::degrees_of_arc_f32(azimuth_deg), fieldstop::degrees_of_arc_f32(altitude_deg));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_altitude_rate_f64(double latitude_deg, double azimuth_deg, double altitude_deg, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_altitude_rate_f64(latitude_deg, azimuth_deg, altitude_deg, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_altitude_rate_f64(double latitude_deg, double azimuth_deg, double altitude_deg, double *out)
{
    const auto given = fieldstop::altitude_rate_f64(fieldstop::degrees_of_arc_f64(latitude_deg), fieldstop::degrees_of_arc_f64(azimuth_deg), fieldstop::degrees_of_arc_f64(altitude_deg));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_zenith_blind_radius_fx(int32_t latitude_bam, uint32_t top_rate_mas_per_s, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_zenith_blind_radius_fx(latitude_bam, top_rate_mas_per_s, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_zenith_blind_radius_fx(int32_t latitude_bam, uint32_t top_rate_mas_per_s, uint32_t *out)
{
    const auto given = fieldstop::zenith_blind_radius_fx(fieldstop::signed_binary_angle(latitude_bam), fieldstop::milliarcseconds_per_second(top_rate_mas_per_s));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_zenith_blind_radius_f32(float latitude_deg, float top_rate_arcsec_per_s, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_zenith_blind_radius_f32(latitude_deg, top_rate_arcsec_per_s, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_zenith_blind_radius_f32(float latitude_deg, float top_rate_arcsec_per_s, float *out)
{
    const auto given = fieldstop::zenith_blind_radius_f32(fieldstop::degrees_of_arc_f32(latitude_deg), fieldstop::arcseconds_per_second_f32(top_rate_arcsec_per_s));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_zenith_blind_radius_f64(double latitude_deg, double top_rate_arcsec_per_s, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_zenith_blind_radius_f64(latitude_deg, top_rate_arcsec_per_s, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_zenith_blind_radius_f64(double latitude_deg, double top_rate_arcsec_per_s, double *out)
{
    const auto given = fieldstop::zenith_blind_radius_f64(fieldstop::degrees_of_arc_f64(latitude_deg), fieldstop::arcseconds_per_second_f64(top_rate_arcsec_per_s));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_misalignment_drift_fx(uint32_t polar_error_mas, uint32_t hour_angle_bam, int32_t *out)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_misalignment_drift_fx(polar_error_mas, hour_angle_bam, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_misalignment_drift_fx(uint32_t polar_error_mas, uint32_t hour_angle_bam, int32_t *out)
{
    const auto given = fieldstop::misalignment_drift_fx(fieldstop::milliarcseconds(polar_error_mas), fieldstop::binary_angle(hour_angle_bam));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_misalignment_drift_f32(float polar_error_arcsec, float hour_angle_deg, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_misalignment_drift_f32(polar_error_arcsec, hour_angle_deg, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_misalignment_drift_f32(float polar_error_arcsec, float hour_angle_deg, float *out)
{
    const auto given = fieldstop::misalignment_drift_f32(fieldstop::arcseconds_f32(polar_error_arcsec), fieldstop::degrees_of_arc_f32(hour_angle_deg));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_misalignment_drift_f64(double polar_error_arcsec, double hour_angle_deg, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_misalignment_drift_f64(polar_error_arcsec, hour_angle_deg, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_misalignment_drift_f64(double polar_error_arcsec, double hour_angle_deg, double *out)
{
    const auto given = fieldstop::misalignment_drift_f64(fieldstop::arcseconds_f64(polar_error_arcsec), fieldstop::degrees_of_arc_f64(hour_angle_deg));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_sun_right_ascension_fx(uint32_t unix_s, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_sun_right_ascension_fx(unix_s, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_sun_right_ascension_fx(uint32_t unix_s, uint32_t *out)
{
    const auto given = fieldstop::sun_right_ascension_fx(fieldstop::seconds(unix_s));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_sun_right_ascension_f64(uint32_t unix_s, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_sun_right_ascension_f64(unix_s, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_sun_right_ascension_f64(uint32_t unix_s, double *out)
{
    const auto given = fieldstop::sun_right_ascension_f64(fieldstop::seconds(unix_s));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_sun_declination_fx(uint32_t unix_s, int32_t *out)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_sun_declination_fx(unix_s, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_sun_declination_fx(uint32_t unix_s, int32_t *out)
{
    const auto given = fieldstop::sun_declination_fx(fieldstop::seconds(unix_s));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_sun_declination_f64(uint32_t unix_s, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_sun_declination_f64(unix_s, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_sun_declination_f64(uint32_t unix_s, double *out)
{
    const auto given = fieldstop::sun_declination_f64(fieldstop::seconds(unix_s));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_sun_clearance_fx(uint32_t right_ascension_bam, int32_t declination_bam, uint32_t unix_s, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_sun_clearance_fx(right_ascension_bam, declination_bam, unix_s, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_sun_clearance_fx(uint32_t right_ascension_bam, int32_t declination_bam, uint32_t unix_s, uint32_t *out)
{
    const auto given = fieldstop::sun_clearance_fx(fieldstop::binary_angle(right_ascension_bam), fieldstop::signed_binary_angle(declination_bam), fieldstop::seconds(unix_s));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_sun_clearance_f64(double right_ascension_deg, double declination_deg, uint32_t unix_s, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_sun_clearance_f64(right_ascension_deg, declination_deg, unix_s, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_sun_clearance_f64(double right_ascension_deg, double declination_deg, uint32_t unix_s, double *out)
{
    const auto given = fieldstop::sun_clearance_f64(fieldstop::degrees_of_arc_f64(right_ascension_deg), fieldstop::degrees_of_arc_f64(declination_deg), fieldstop::seconds(unix_s));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_collected_sunlight_fx(uint32_t effective_aperture_um, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_collected_sunlight_fx(effective_aperture_um, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_collected_sunlight_fx(uint32_t effective_aperture_um, uint32_t *out)
{
    const auto given = fieldstop::collected_sunlight_fx(fieldstop::micrometres(effective_aperture_um));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

#if !defined(FIELDSTOP_NO_FLOAT)
fieldstop_status plain_collected_sunlight_f32(float effective_aperture_mm, float *out)
{
    float given;
    const fieldstop_status number = ::fieldstop_collected_sunlight_f32(effective_aperture_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_collected_sunlight_f32(float effective_aperture_mm, float *out)
{
    const auto given = fieldstop::collected_sunlight_f32(fieldstop::millimetres_f32(effective_aperture_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
fieldstop_status plain_collected_sunlight_f64(double effective_aperture_mm, double *out)
{
    double given;
    const fieldstop_status number = ::fieldstop_collected_sunlight_f64(effective_aperture_mm, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_collected_sunlight_f64(double effective_aperture_mm, double *out)
{
    const auto given = fieldstop::collected_sunlight_f64(fieldstop::millimetres_f64(effective_aperture_mm));
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}
#endif

fieldstop_status plain_telescope_check(const fieldstop::telescope *telescope)
{
    return ::fieldstop_telescope_check(&telescope->c());
}
fieldstop_status typed_telescope_check(const fieldstop::telescope *telescope)
{
    return fieldstop::telescope_check(*telescope).number();
}

fieldstop_status plain_eyepiece_check(const fieldstop::eyepiece *eyepiece)
{
    return ::fieldstop_eyepiece_check(&eyepiece->c());
}
fieldstop_status typed_eyepiece_check(const fieldstop::eyepiece *eyepiece)
{
    return fieldstop::eyepiece_check(*eyepiece).number();
}

fieldstop_status plain_camera_check(const fieldstop::camera *camera)
{
    return ::fieldstop_camera_check(&camera->c());
}
fieldstop_status typed_camera_check(const fieldstop::camera *camera)
{
    return fieldstop::camera_check(*camera).number();
}

fieldstop_status plain_observer_check(const fieldstop::observer *observer)
{
    return ::fieldstop_observer_check(&observer->c());
}
fieldstop_status typed_observer_check(const fieldstop::observer *observer)
{
    return fieldstop::observer_check(*observer).number();
}

fieldstop_status plain_site_check(const fieldstop::site *site)
{
    return ::fieldstop_site_check(&site->c());
}
fieldstop_status typed_site_check(const fieldstop::site *site)
{
    return fieldstop::site_check(*site).number();
}

fieldstop_status plain_filled_visual_readout_compute(const fieldstop::telescope *telescope, const fieldstop::eyepiece *eyepiece, const fieldstop::observer *observer, uint32_t wanted, struct fieldstop_visual_readout *out)
{
    struct fieldstop_visual_readout given;
    const fieldstop_status number = ::fieldstop_visual_readout_compute(&telescope->c(), &eyepiece->c(), &observer->c(), wanted, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_filled_visual_readout_compute(const fieldstop::telescope *telescope, const fieldstop::eyepiece *eyepiece, const fieldstop::observer *observer, uint32_t wanted, struct fieldstop_visual_readout *out)
{
    const auto given = fieldstop::visual_readout_compute(*telescope, *eyepiece, *observer, wanted);
    if (given) {
        *out = given.value().c();
    }
    return given.status().number();
}

fieldstop_status plain_filled_camera_readout_compute(const fieldstop::telescope *telescope, const fieldstop::camera *camera, const fieldstop::observer *observer, uint32_t wanted, struct fieldstop_camera_readout *out)
{
    struct fieldstop_camera_readout given;
    const fieldstop_status number = ::fieldstop_camera_readout_compute(&telescope->c(), &camera->c(), &observer->c(), wanted, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_filled_camera_readout_compute(const fieldstop::telescope *telescope, const fieldstop::camera *camera, const fieldstop::observer *observer, uint32_t wanted, struct fieldstop_camera_readout *out)
{
    const auto given = fieldstop::camera_readout_compute(*telescope, *camera, *observer, wanted);
    if (given) {
        *out = given.value().c();
    }
    return given.status().number();
}

fieldstop_status plain_newtonian_layout_check(const fieldstop::newtonian_layout *layout)
{
    return ::fieldstop_newtonian_layout_check(&layout->c());
}
fieldstop_status typed_newtonian_layout_check(const fieldstop::newtonian_layout *layout)
{
    return fieldstop::newtonian_layout_check(*layout).number();
}

fieldstop_status plain_two_mirror_layout_check(const fieldstop::two_mirror_layout *layout)
{
    return ::fieldstop_two_mirror_layout_check(&layout->c());
}
fieldstop_status typed_two_mirror_layout_check(const fieldstop::two_mirror_layout *layout)
{
    return fieldstop::two_mirror_layout_check(*layout).number();
}

fieldstop_status plain_filled_focus_readout_compute(const fieldstop::telescope *telescope, const fieldstop::focuser *focuser, const fieldstop::observer *observer, uint32_t wanted, struct fieldstop_focus_readout *out)
{
    struct fieldstop_focus_readout given;
    const fieldstop_status number = ::fieldstop_focus_readout_compute(&telescope->c(), &focuser->c(), &observer->c(), wanted, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_filled_focus_readout_compute(const fieldstop::telescope *telescope, const fieldstop::focuser *focuser, const fieldstop::observer *observer, uint32_t wanted, struct fieldstop_focus_readout *out)
{
    const auto given = fieldstop::focus_readout_compute(*telescope, *focuser, *observer, wanted);
    if (given) {
        *out = given.value().c();
    }
    return given.status().number();
}

fieldstop_status plain_filled_newtonian_readout_compute(const fieldstop::telescope *telescope, const fieldstop::newtonian_layout *layout, uint32_t wanted, struct fieldstop_newtonian_readout *out)
{
    struct fieldstop_newtonian_readout given;
    const fieldstop_status number = ::fieldstop_newtonian_readout_compute(&telescope->c(), &layout->c(), wanted, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_filled_newtonian_readout_compute(const fieldstop::telescope *telescope, const fieldstop::newtonian_layout *layout, uint32_t wanted, struct fieldstop_newtonian_readout *out)
{
    const auto given = fieldstop::newtonian_readout_compute(*telescope, *layout, wanted);
    if (given) {
        *out = given.value().c();
    }
    return given.status().number();
}

fieldstop_status plain_filled_two_mirror_readout_compute(const fieldstop::telescope *telescope, const fieldstop::two_mirror_layout *layout, uint32_t wanted, struct fieldstop_two_mirror_readout *out)
{
    struct fieldstop_two_mirror_readout given;
    const fieldstop_status number = ::fieldstop_two_mirror_readout_compute(&telescope->c(), &layout->c(), wanted, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_filled_two_mirror_readout_compute(const fieldstop::telescope *telescope, const fieldstop::two_mirror_layout *layout, uint32_t wanted, struct fieldstop_two_mirror_readout *out)
{
    const auto given = fieldstop::two_mirror_readout_compute(*telescope, *layout, wanted);
    if (given) {
        *out = given.value().c();
    }
    return given.status().number();
}

fieldstop_status plain_record_begin(uint8_t *record, uint16_t capacity)
{
    return ::fieldstop_record_begin(record, capacity);
}
fieldstop_status typed_record_begin(uint8_t *record, uint16_t capacity)
{
    return fieldstop::record_begin(record, capacity).number();
}

fieldstop_status plain_record_check(const uint8_t *record, uint16_t length)
{
    return ::fieldstop_record_check(record, length);
}
fieldstop_status typed_record_check(const uint8_t *record, uint16_t length)
{
    return fieldstop::record_check(record, length).number();
}

fieldstop_status plain_record_get_length(const uint8_t *record, uint16_t length, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_record_get_length(record, length, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_record_get_length(const uint8_t *record, uint16_t length, uint16_t *out)
{
    const auto given = fieldstop::record_get_length(record, length);
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_record_get_count(const uint8_t *record, uint16_t length, uint8_t kind, uint8_t *out)
{
    uint8_t given;
    const fieldstop_status number = ::fieldstop_record_get_count(record, length, kind, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_record_get_count(const uint8_t *record, uint16_t length, uint8_t kind, uint8_t *out)
{
    const auto given = fieldstop::record_get_count(record, length, kind);
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_filled_record_get_name(const uint8_t *record, uint16_t length, uint8_t kind, uint8_t index, struct fieldstop_equipment_name *out)
{
    struct fieldstop_equipment_name given;
    const fieldstop_status number = ::fieldstop_record_get_name(record, length, kind, index, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_filled_record_get_name(const uint8_t *record, uint16_t length, uint8_t kind, uint8_t index, struct fieldstop_equipment_name *out)
{
    const auto given = fieldstop::record_get_name(record, length, kind, index);
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_filled_record_get_in_use(const uint8_t *record, uint16_t length, struct fieldstop_in_use *out)
{
    struct fieldstop_in_use given;
    const fieldstop_status number = ::fieldstop_record_get_in_use(record, length, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_filled_record_get_in_use(const uint8_t *record, uint16_t length, struct fieldstop_in_use *out)
{
    const auto given = fieldstop::record_get_in_use(record, length);
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_filled_record_get_telescope(const uint8_t *record, uint16_t length, uint8_t index, struct fieldstop_telescope *out)
{
    struct fieldstop_telescope given;
    const fieldstop_status number = ::fieldstop_record_get_telescope(record, length, index, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_filled_record_get_telescope(const uint8_t *record, uint16_t length, uint8_t index, struct fieldstop_telescope *out)
{
    const auto given = fieldstop::record_get_telescope(record, length, index);
    if (given) {
        *out = given.value().c();
    }
    return given.status().number();
}

fieldstop_status plain_filled_record_get_eyepiece(const uint8_t *record, uint16_t length, uint8_t index, struct fieldstop_eyepiece *out)
{
    struct fieldstop_eyepiece given;
    const fieldstop_status number = ::fieldstop_record_get_eyepiece(record, length, index, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_filled_record_get_eyepiece(const uint8_t *record, uint16_t length, uint8_t index, struct fieldstop_eyepiece *out)
{
    const auto given = fieldstop::record_get_eyepiece(record, length, index);
    if (given) {
        *out = given.value().c();
    }
    return given.status().number();
}

fieldstop_status plain_record_get_amplifier(const uint8_t *record, uint16_t length, uint8_t index, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_record_get_amplifier(record, length, index, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_record_get_amplifier(const uint8_t *record, uint16_t length, uint8_t index, uint32_t *out)
{
    const auto given = fieldstop::record_get_amplifier(record, length, index);
    if (given) {
        *out = given.value().count();
    }
    return given.status().number();
}

fieldstop_status plain_filled_record_get_camera(const uint8_t *record, uint16_t length, uint8_t index, struct fieldstop_camera *out)
{
    struct fieldstop_camera given;
    const fieldstop_status number = ::fieldstop_record_get_camera(record, length, index, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_filled_record_get_camera(const uint8_t *record, uint16_t length, uint8_t index, struct fieldstop_camera *out)
{
    const auto given = fieldstop::record_get_camera(record, length, index);
    if (given) {
        *out = given.value().c();
    }
    return given.status().number();
}

fieldstop_status plain_filled_record_get_observer(const uint8_t *record, uint16_t length, uint8_t index, struct fieldstop_observer *out)
{
    struct fieldstop_observer given;
    const fieldstop_status number = ::fieldstop_record_get_observer(record, length, index, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_filled_record_get_observer(const uint8_t *record, uint16_t length, uint8_t index, struct fieldstop_observer *out)
{
    const auto given = fieldstop::record_get_observer(record, length, index);
    if (given) {
        *out = given.value().c();
    }
    return given.status().number();
}

fieldstop_status plain_filled_record_get_site(const uint8_t *record, uint16_t length, uint8_t index, struct fieldstop_site *out)
{
    struct fieldstop_site given;
    const fieldstop_status number = ::fieldstop_record_get_site(record, length, index, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_filled_record_get_site(const uint8_t *record, uint16_t length, uint8_t index, struct fieldstop_site *out)
{
    const auto given = fieldstop::record_get_site(record, length, index);
    if (given) {
        *out = given.value().c();
    }
    return given.status().number();
}

fieldstop_status plain_record_put_telescope(uint8_t *record, uint16_t capacity, uint8_t index, const fieldstop::telescope *telescope, const fieldstop::equipment_name *name)
{
    return ::fieldstop_record_put_telescope(record, capacity, index, &telescope->c(), name);
}
fieldstop_status typed_record_put_telescope(uint8_t *record, uint16_t capacity, uint8_t index, const fieldstop::telescope *telescope, const fieldstop::equipment_name *name)
{
    return fieldstop::record_put_telescope(record, capacity, index, *telescope, *name).number();
}

fieldstop_status plain_record_put_eyepiece(uint8_t *record, uint16_t capacity, uint8_t index, const fieldstop::eyepiece *eyepiece, const fieldstop::equipment_name *name)
{
    return ::fieldstop_record_put_eyepiece(record, capacity, index, &eyepiece->c(), name);
}
fieldstop_status typed_record_put_eyepiece(uint8_t *record, uint16_t capacity, uint8_t index, const fieldstop::eyepiece *eyepiece, const fieldstop::equipment_name *name)
{
    return fieldstop::record_put_eyepiece(record, capacity, index, *eyepiece, *name).number();
}

fieldstop_status plain_record_put_amplifier(uint8_t *record, uint16_t capacity, uint8_t index, uint32_t amplification_q16, const fieldstop::equipment_name *name)
{
    return ::fieldstop_record_put_amplifier(record, capacity, index, amplification_q16, name);
}
fieldstop_status typed_record_put_amplifier(uint8_t *record, uint16_t capacity, uint8_t index, uint32_t amplification_q16, const fieldstop::equipment_name *name)
{
    return fieldstop::record_put_amplifier(record, capacity, index, fieldstop::q16(amplification_q16), *name).number();
}

fieldstop_status plain_record_put_camera(uint8_t *record, uint16_t capacity, uint8_t index, const fieldstop::camera *camera, const fieldstop::equipment_name *name)
{
    return ::fieldstop_record_put_camera(record, capacity, index, &camera->c(), name);
}
fieldstop_status typed_record_put_camera(uint8_t *record, uint16_t capacity, uint8_t index, const fieldstop::camera *camera, const fieldstop::equipment_name *name)
{
    return fieldstop::record_put_camera(record, capacity, index, *camera, *name).number();
}

fieldstop_status plain_record_put_observer(uint8_t *record, uint16_t capacity, uint8_t index, const fieldstop::observer *observer, const fieldstop::equipment_name *name)
{
    return ::fieldstop_record_put_observer(record, capacity, index, &observer->c(), name);
}
fieldstop_status typed_record_put_observer(uint8_t *record, uint16_t capacity, uint8_t index, const fieldstop::observer *observer, const fieldstop::equipment_name *name)
{
    return fieldstop::record_put_observer(record, capacity, index, *observer, *name).number();
}

fieldstop_status plain_record_put_site(uint8_t *record, uint16_t capacity, uint8_t index, const fieldstop::site *site, const fieldstop::equipment_name *name)
{
    return ::fieldstop_record_put_site(record, capacity, index, &site->c(), name);
}
fieldstop_status typed_record_put_site(uint8_t *record, uint16_t capacity, uint8_t index, const fieldstop::site *site, const fieldstop::equipment_name *name)
{
    return fieldstop::record_put_site(record, capacity, index, *site, *name).number();
}

fieldstop_status plain_record_put_in_use(uint8_t *record, uint16_t capacity, const fieldstop::in_use *used)
{
    return ::fieldstop_record_put_in_use(record, capacity, used);
}
fieldstop_status typed_record_put_in_use(uint8_t *record, uint16_t capacity, const fieldstop::in_use *used)
{
    return fieldstop::record_put_in_use(record, capacity, *used).number();
}

fieldstop_status plain_record_remove(uint8_t *record, uint16_t capacity, uint8_t kind, uint8_t index)
{
    return ::fieldstop_record_remove(record, capacity, kind, index);
}
fieldstop_status typed_record_remove(uint8_t *record, uint16_t capacity, uint8_t kind, uint8_t index)
{
    return fieldstop::record_remove(record, capacity, kind, index).number();
}

fieldstop_status plain_slot_pair_check(const fieldstop::slot_pair *places)
{
    return ::fieldstop_slot_pair_check(places);
}
fieldstop_status typed_slot_pair_check(const fieldstop::slot_pair *places)
{
    return fieldstop::slot_pair_check(*places).number();
}

fieldstop_status plain_store_load(const fieldstop::slot_pair *places, fieldstop_read read, void *context, uint8_t *record, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_store_load(places, read, context, record, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_store_load(const fieldstop::slot_pair *places, fieldstop_read read, void *context, uint8_t *record, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::store_load(*places, read, context, record, capacity);
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_store_save(const fieldstop::slot_pair *places, fieldstop_read read, fieldstop_write write, fieldstop_erase erase, void *context, const uint8_t *record, uint16_t capacity, uint8_t newer)
{
    return ::fieldstop_store_save(places, read, write, erase, context, record, capacity, newer);
}
fieldstop_status typed_store_save(const fieldstop::slot_pair *places, fieldstop_read read, fieldstop_write write, fieldstop_erase erase, void *context, const uint8_t *record, uint16_t capacity, uint8_t newer)
{
    return fieldstop::store_save(*places, read, write, erase, context, record, capacity, newer).number();
}

fieldstop_status plain_text_count(uint32_t count, uint8_t unit, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_count(count, unit, style, width, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_count(uint32_t count, uint8_t unit, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_count(count, unit, *style, width, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_length_mm(uint32_t length_um, uint8_t decimals, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_length_mm(length_um, decimals, style, width, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_length_mm(uint32_t length_um, uint8_t decimals, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_length_mm(fieldstop::micrometres(length_um), decimals, *style, width, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_length_um(uint32_t length_nm, uint8_t decimals, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_length_um(length_nm, decimals, style, width, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_length_um(uint32_t length_nm, uint8_t decimals, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_length_um(fieldstop::nanometres(length_nm), decimals, *style, width, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_ratio(uint32_t ratio_q16, uint8_t decimals, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_ratio(ratio_q16, decimals, style, width, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_ratio(uint32_t ratio_q16, uint8_t decimals, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_ratio(fieldstop::q16(ratio_q16), decimals, *style, width, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_magnification(uint32_t magnification_q16, uint8_t decimals, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_magnification(magnification_q16, decimals, style, width, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_magnification(uint32_t magnification_q16, uint8_t decimals, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_magnification(fieldstop::q16(magnification_q16), decimals, *style, width, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_focal_ratio(uint32_t focal_ratio_q16, uint8_t decimals, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_focal_ratio(focal_ratio_q16, decimals, style, width, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_focal_ratio(uint32_t focal_ratio_q16, uint8_t decimals, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_focal_ratio(fieldstop::q16(focal_ratio_q16), decimals, *style, width, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_percent(uint32_t ratio_q16, uint8_t decimals, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_percent(ratio_q16, decimals, style, width, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_percent(uint32_t ratio_q16, uint8_t decimals, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_percent(fieldstop::q16(ratio_q16), decimals, *style, width, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_arcseconds(uint32_t angle_uas, uint8_t decimals, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_arcseconds(angle_uas, decimals, style, width, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_arcseconds(uint32_t angle_uas, uint8_t decimals, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_arcseconds(fieldstop::microarcseconds(angle_uas), decimals, *style, width, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_magnitude(int32_t magnitude_mmag, uint8_t decimals, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_magnitude(magnitude_mmag, decimals, style, width, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_magnitude(int32_t magnitude_mmag, uint8_t decimals, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_magnitude(fieldstop::millimagnitudes(magnitude_mmag), decimals, *style, width, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_angle(uint32_t angle_mas, uint8_t form, uint8_t decimals, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_angle(angle_mas, form, decimals, style, width, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_angle(uint32_t angle_mas, uint8_t form, uint8_t decimals, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_angle(fieldstop::milliarcseconds(angle_mas), form, decimals, *style, width, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_unit(uint8_t unit, const fieldstop::text_style *style, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_unit(unit, style, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_unit(uint8_t unit, const fieldstop::text_style *style, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_unit(unit, *style, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_visual_line(const fieldstop::visual_readout *readout, const char *const *labels, const fieldstop::text_style *style, uint8_t columns, uint8_t line, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_visual_line(&readout->c(), labels, style, columns, line, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_visual_line(const fieldstop::visual_readout *readout, const char *const *labels, const fieldstop::text_style *style, uint8_t columns, uint8_t line, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_visual_line(*readout, labels, *style, columns, line, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_visual_value(const fieldstop::visual_readout *readout, uint8_t row, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_visual_value(&readout->c(), row, style, width, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_visual_value(const fieldstop::visual_readout *readout, uint8_t row, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_visual_value(*readout, row, *style, width, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_visual_number(const fieldstop::visual_readout *readout, uint8_t row, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_visual_number(&readout->c(), row, style, width, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_visual_number(const fieldstop::visual_readout *readout, uint8_t row, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_visual_number(*readout, row, *style, width, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_visual_unit(const fieldstop::visual_readout *readout, uint8_t row, const fieldstop::text_style *style, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_visual_unit(&readout->c(), row, style, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_visual_unit(const fieldstop::visual_readout *readout, uint8_t row, const fieldstop::text_style *style, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_visual_unit(*readout, row, *style, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_camera_line(const fieldstop::camera_readout *readout, const char *const *labels, const fieldstop::text_style *style, uint8_t columns, uint8_t line, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_camera_line(&readout->c(), labels, style, columns, line, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_camera_line(const fieldstop::camera_readout *readout, const char *const *labels, const fieldstop::text_style *style, uint8_t columns, uint8_t line, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_camera_line(*readout, labels, *style, columns, line, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_camera_value(const fieldstop::camera_readout *readout, uint8_t row, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_camera_value(&readout->c(), row, style, width, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_camera_value(const fieldstop::camera_readout *readout, uint8_t row, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_camera_value(*readout, row, *style, width, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_camera_number(const fieldstop::camera_readout *readout, uint8_t row, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_camera_number(&readout->c(), row, style, width, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_camera_number(const fieldstop::camera_readout *readout, uint8_t row, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_camera_number(*readout, row, *style, width, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_camera_unit(const fieldstop::camera_readout *readout, uint8_t row, const fieldstop::text_style *style, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_camera_unit(&readout->c(), row, style, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_camera_unit(const fieldstop::camera_readout *readout, uint8_t row, const fieldstop::text_style *style, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_camera_unit(*readout, row, *style, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_filled_text_changed(const char *shown, uint16_t shown_length, const char *line, uint16_t line_length, const fieldstop::text_style *style, struct fieldstop_span *out)
{
    struct fieldstop_span given;
    const fieldstop_status number = ::fieldstop_text_changed(shown, shown_length, line, line_length, style, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_filled_text_changed(const char *shown, uint16_t shown_length, const char *line, uint16_t line_length, const fieldstop::text_style *style, struct fieldstop_span *out)
{
    const auto given = fieldstop::text_changed(shown, shown_length, line, line_length, *style);
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_caution_line(const char *sentence, uint8_t columns, uint8_t line, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_caution_line(sentence, columns, line, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_caution_line(const char *sentence, uint8_t columns, uint8_t line, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_caution_line(sentence, columns, line, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_focus_line(const fieldstop::focus_readout *readout, const char *const *labels, const fieldstop::text_style *style, uint8_t columns, uint8_t line, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_focus_line(&readout->c(), labels, style, columns, line, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_focus_line(const fieldstop::focus_readout *readout, const char *const *labels, const fieldstop::text_style *style, uint8_t columns, uint8_t line, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_focus_line(*readout, labels, *style, columns, line, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_focus_value(const fieldstop::focus_readout *readout, uint8_t row, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_focus_value(&readout->c(), row, style, width, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_focus_value(const fieldstop::focus_readout *readout, uint8_t row, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_focus_value(*readout, row, *style, width, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_focus_number(const fieldstop::focus_readout *readout, uint8_t row, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_focus_number(&readout->c(), row, style, width, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_focus_number(const fieldstop::focus_readout *readout, uint8_t row, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_focus_number(*readout, row, *style, width, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_focus_unit(const fieldstop::focus_readout *readout, uint8_t row, const fieldstop::text_style *style, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_focus_unit(&readout->c(), row, style, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_focus_unit(const fieldstop::focus_readout *readout, uint8_t row, const fieldstop::text_style *style, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_focus_unit(*readout, row, *style, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_newtonian_line(const fieldstop::newtonian_readout *readout, const char *const *labels, const fieldstop::text_style *style, uint8_t columns, uint8_t line, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_newtonian_line(&readout->c(), labels, style, columns, line, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_newtonian_line(const fieldstop::newtonian_readout *readout, const char *const *labels, const fieldstop::text_style *style, uint8_t columns, uint8_t line, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_newtonian_line(*readout, labels, *style, columns, line, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_newtonian_value(const fieldstop::newtonian_readout *readout, uint8_t row, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_newtonian_value(&readout->c(), row, style, width, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_newtonian_value(const fieldstop::newtonian_readout *readout, uint8_t row, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_newtonian_value(*readout, row, *style, width, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_newtonian_number(const fieldstop::newtonian_readout *readout, uint8_t row, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_newtonian_number(&readout->c(), row, style, width, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_newtonian_number(const fieldstop::newtonian_readout *readout, uint8_t row, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_newtonian_number(*readout, row, *style, width, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_newtonian_unit(const fieldstop::newtonian_readout *readout, uint8_t row, const fieldstop::text_style *style, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_newtonian_unit(&readout->c(), row, style, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_newtonian_unit(const fieldstop::newtonian_readout *readout, uint8_t row, const fieldstop::text_style *style, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_newtonian_unit(*readout, row, *style, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_two_mirror_line(const fieldstop::two_mirror_readout *readout, const char *const *labels, const fieldstop::text_style *style, uint8_t columns, uint8_t line, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_two_mirror_line(&readout->c(), labels, style, columns, line, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_two_mirror_line(const fieldstop::two_mirror_readout *readout, const char *const *labels, const fieldstop::text_style *style, uint8_t columns, uint8_t line, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_two_mirror_line(*readout, labels, *style, columns, line, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_two_mirror_value(const fieldstop::two_mirror_readout *readout, uint8_t row, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_two_mirror_value(&readout->c(), row, style, width, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_two_mirror_value(const fieldstop::two_mirror_readout *readout, uint8_t row, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_two_mirror_value(*readout, row, *style, width, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_two_mirror_number(const fieldstop::two_mirror_readout *readout, uint8_t row, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_two_mirror_number(&readout->c(), row, style, width, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_two_mirror_number(const fieldstop::two_mirror_readout *readout, uint8_t row, const fieldstop::text_style *style, uint8_t width, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_two_mirror_number(*readout, row, *style, width, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_text_two_mirror_unit(const fieldstop::two_mirror_readout *readout, uint8_t row, const fieldstop::text_style *style, char *text, uint16_t capacity, uint16_t *out)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_two_mirror_unit(&readout->c(), row, style, text, capacity, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_text_two_mirror_unit(const fieldstop::two_mirror_readout *readout, uint8_t row, const fieldstop::text_style *style, char *text, uint16_t capacity, uint16_t *out)
{
    const auto given = fieldstop::text_two_mirror_unit(*readout, row, *style, fieldstop::buffer(text, capacity));
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_entry_read(const char *text, uint16_t text_length, uint8_t kind, uint32_t aperture_um, const fieldstop::text_style *style, uint32_t *out)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_entry_read(text, text_length, kind, aperture_um, style, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_entry_read(const char *text, uint16_t text_length, uint8_t kind, uint32_t aperture_um, const fieldstop::text_style *style, uint32_t *out)
{
    const auto given = fieldstop::entry_read(text, text_length, kind, fieldstop::micrometres(aperture_um), *style);
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

fieldstop_status plain_filled_entry_check(const char *text, uint16_t text_length, uint8_t kind, uint32_t aperture_um, const fieldstop::text_style *style, struct fieldstop_entry_state *out)
{
    struct fieldstop_entry_state given;
    const fieldstop_status number = ::fieldstop_entry_check(text, text_length, kind, aperture_um, style, &given);
    if (number == 0) {
        *out = given;
    }
    return number;
}
fieldstop_status typed_filled_entry_check(const char *text, uint16_t text_length, uint8_t kind, uint32_t aperture_um, const fieldstop::text_style *style, struct fieldstop_entry_state *out)
{
    const auto given = fieldstop::entry_check(text, text_length, kind, fieldstop::micrometres(aperture_um), *style);
    if (given) {
        *out = given.value();
    }
    return given.status().number();
}

}
