/* What is promised, as each compiler sees it: sizes, offsets, numbers, prototypes; and that every function is in the
   library. Made by tests/interface/promise.rs: do not edit. */
#include "fieldstop.h"

#define HOLDS(name, condition) typedef char name[(condition) ? 1 : -1]

HOLDS(holds_1, FIELDSTOP_CAUSE(0x0302u) == 2 && FIELDSTOP_ARGUMENT(0x0302u) == 3);
HOLDS(holds_2, sizeof(fieldstop_status) == sizeof(uint16_t) && (fieldstop_status)-1 > 0);
HOLDS(holds_3, sizeof(fieldstop_telescope) == 20);
HOLDS(holds_4, offsetof(fieldstop_telescope, aperture_um) == 0 && sizeof(((fieldstop_telescope *)0)->aperture_um) == 4);
HOLDS(holds_5, offsetof(fieldstop_telescope, focal_length_um) == 4 && sizeof(((fieldstop_telescope *)0)->focal_length_um) == 4);
HOLDS(holds_6, offsetof(fieldstop_telescope, obstruction_um) == 8 && sizeof(((fieldstop_telescope *)0)->obstruction_um) == 4);
HOLDS(holds_7, offsetof(fieldstop_telescope, amplification_q16) == 12 && sizeof(((fieldstop_telescope *)0)->amplification_q16) == 4);
HOLDS(holds_8, offsetof(fieldstop_telescope, throughput_q16) == 16 && sizeof(((fieldstop_telescope *)0)->throughput_q16) == 4);
HOLDS(holds_9, sizeof(fieldstop_eyepiece) == 16);
HOLDS(holds_10, offsetof(fieldstop_eyepiece, focal_length_um) == 0 && sizeof(((fieldstop_eyepiece *)0)->focal_length_um) == 4);
HOLDS(holds_11, offsetof(fieldstop_eyepiece, field_stop_um) == 4 && sizeof(((fieldstop_eyepiece *)0)->field_stop_um) == 4);
HOLDS(holds_12, offsetof(fieldstop_eyepiece, apparent_field_mas) == 8 && sizeof(((fieldstop_eyepiece *)0)->apparent_field_mas) == 4);
HOLDS(holds_13, offsetof(fieldstop_eyepiece, mapping) == 12 && sizeof(((fieldstop_eyepiece *)0)->mapping) == 1);
HOLDS(holds_14, offsetof(fieldstop_eyepiece, padding) == 13 && sizeof(((fieldstop_eyepiece *)0)->padding) == 3);
HOLDS(holds_15, sizeof(fieldstop_camera) == 12);
HOLDS(holds_16, offsetof(fieldstop_camera, pixel_nm) == 0 && sizeof(((fieldstop_camera *)0)->pixel_nm) == 4);
HOLDS(holds_17, offsetof(fieldstop_camera, columns) == 4 && sizeof(((fieldstop_camera *)0)->columns) == 2);
HOLDS(holds_18, offsetof(fieldstop_camera, rows) == 6 && sizeof(((fieldstop_camera *)0)->rows) == 2);
HOLDS(holds_19, offsetof(fieldstop_camera, binning) == 8 && sizeof(((fieldstop_camera *)0)->binning) == 1);
HOLDS(holds_20, offsetof(fieldstop_camera, padding) == 9 && sizeof(((fieldstop_camera *)0)->padding) == 3);
HOLDS(holds_21, sizeof(fieldstop_observer) == 20);
HOLDS(holds_22, offsetof(fieldstop_observer, naked_eye_mmag) == 0 && sizeof(((fieldstop_observer *)0)->naked_eye_mmag) == 4);
HOLDS(holds_23, offsetof(fieldstop_observer, eye_pupil_um) == 4 && sizeof(((fieldstop_observer *)0)->eye_pupil_um) == 4);
HOLDS(holds_24, offsetof(fieldstop_observer, eye_resolution_mas) == 8 && sizeof(((fieldstop_observer *)0)->eye_resolution_mas) == 4);
HOLDS(holds_25, offsetof(fieldstop_observer, seeing_uas) == 12 && sizeof(((fieldstop_observer *)0)->seeing_uas) == 4);
HOLDS(holds_26, offsetof(fieldstop_observer, wavelength_nm) == 16 && sizeof(((fieldstop_observer *)0)->wavelength_nm) == 4);
HOLDS(holds_27, sizeof(fieldstop_visual_readout) == 56);
HOLDS(holds_28, offsetof(fieldstop_visual_readout, available) == 0 && sizeof(((fieldstop_visual_readout *)0)->available) == 4);
HOLDS(holds_29, offsetof(fieldstop_visual_readout, facts) == 4 && sizeof(((fieldstop_visual_readout *)0)->facts) == 4);
HOLDS(holds_30, offsetof(fieldstop_visual_readout, focal_length_um) == 8 && sizeof(((fieldstop_visual_readout *)0)->focal_length_um) == 4);
HOLDS(holds_31, offsetof(fieldstop_visual_readout, focal_ratio_q16) == 12 && sizeof(((fieldstop_visual_readout *)0)->focal_ratio_q16) == 4);
HOLDS(holds_32, offsetof(fieldstop_visual_readout, magnification_q16) == 16 && sizeof(((fieldstop_visual_readout *)0)->magnification_q16) == 4);
HOLDS(holds_33, offsetof(fieldstop_visual_readout, exit_pupil_um) == 20 && sizeof(((fieldstop_visual_readout *)0)->exit_pupil_um) == 4);
HOLDS(holds_34, offsetof(fieldstop_visual_readout, true_field_mas) == 24 && sizeof(((fieldstop_visual_readout *)0)->true_field_mas) == 4);
HOLDS(holds_35, offsetof(fieldstop_visual_readout, resolution_uas) == 28 && sizeof(((fieldstop_visual_readout *)0)->resolution_uas) == 4);
HOLDS(holds_36, offsetof(fieldstop_visual_readout, dawes_limit_uas) == 32 && sizeof(((fieldstop_visual_readout *)0)->dawes_limit_uas) == 4);
HOLDS(holds_37, offsetof(fieldstop_visual_readout, lowest_magnification_q16) == 36 && sizeof(((fieldstop_visual_readout *)0)->lowest_magnification_q16) == 4);
HOLDS(holds_38, offsetof(fieldstop_visual_readout, resolving_magnification_q16) == 40 && sizeof(((fieldstop_visual_readout *)0)->resolving_magnification_q16) == 4);
HOLDS(holds_39, offsetof(fieldstop_visual_readout, effective_aperture_um) == 44 && sizeof(((fieldstop_visual_readout *)0)->effective_aperture_um) == 4);
HOLDS(holds_40, offsetof(fieldstop_visual_readout, limiting_magnitude_mmag) == 48 && sizeof(((fieldstop_visual_readout *)0)->limiting_magnitude_mmag) == 4);
HOLDS(holds_41, offsetof(fieldstop_visual_readout, surface_brightness_q16) == 52 && sizeof(((fieldstop_visual_readout *)0)->surface_brightness_q16) == 4);
HOLDS(holds_42, sizeof(fieldstop_camera_readout) == 44);
HOLDS(holds_43, offsetof(fieldstop_camera_readout, available) == 0 && sizeof(((fieldstop_camera_readout *)0)->available) == 4);
HOLDS(holds_44, offsetof(fieldstop_camera_readout, facts) == 4 && sizeof(((fieldstop_camera_readout *)0)->facts) == 4);
HOLDS(holds_45, offsetof(fieldstop_camera_readout, focal_length_um) == 8 && sizeof(((fieldstop_camera_readout *)0)->focal_length_um) == 4);
HOLDS(holds_46, offsetof(fieldstop_camera_readout, focal_ratio_q16) == 12 && sizeof(((fieldstop_camera_readout *)0)->focal_ratio_q16) == 4);
HOLDS(holds_47, offsetof(fieldstop_camera_readout, t_number_q16) == 16 && sizeof(((fieldstop_camera_readout *)0)->t_number_q16) == 4);
HOLDS(holds_48, offsetof(fieldstop_camera_readout, frame_width_mas) == 20 && sizeof(((fieldstop_camera_readout *)0)->frame_width_mas) == 4);
HOLDS(holds_49, offsetof(fieldstop_camera_readout, frame_height_mas) == 24 && sizeof(((fieldstop_camera_readout *)0)->frame_height_mas) == 4);
HOLDS(holds_50, offsetof(fieldstop_camera_readout, pixel_scale_uas) == 28 && sizeof(((fieldstop_camera_readout *)0)->pixel_scale_uas) == 4);
HOLDS(holds_51, offsetof(fieldstop_camera_readout, plate_scale_mas_per_mm) == 32 && sizeof(((fieldstop_camera_readout *)0)->plate_scale_mas_per_mm) == 4);
HOLDS(holds_52, offsetof(fieldstop_camera_readout, star_fwhm_uas) == 36 && sizeof(((fieldstop_camera_readout *)0)->star_fwhm_uas) == 4);
HOLDS(holds_53, offsetof(fieldstop_camera_readout, pixels_per_fwhm_q16) == 40 && sizeof(((fieldstop_camera_readout *)0)->pixels_per_fwhm_q16) == 4);
HOLDS(holds_54, sizeof(fieldstop_visual_target) == 20);
HOLDS(holds_55, offsetof(fieldstop_visual_target, size_mas) == 0 && sizeof(((fieldstop_visual_target *)0)->size_mas) == 4);
HOLDS(holds_56, offsetof(fieldstop_visual_target, room_q16) == 4 && sizeof(((fieldstop_visual_target *)0)->room_q16) == 4);
HOLDS(holds_57, offsetof(fieldstop_visual_target, separation_uas) == 8 && sizeof(((fieldstop_visual_target *)0)->separation_uas) == 4);
HOLDS(holds_58, offsetof(fieldstop_visual_target, exit_pupil_um) == 12 && sizeof(((fieldstop_visual_target *)0)->exit_pupil_um) == 4);
HOLDS(holds_59, offsetof(fieldstop_visual_target, purpose) == 16 && sizeof(((fieldstop_visual_target *)0)->purpose) == 1);
HOLDS(holds_60, offsetof(fieldstop_visual_target, padding) == 17 && sizeof(((fieldstop_visual_target *)0)->padding) == 3);
HOLDS(holds_61, sizeof(fieldstop_visual_choice) == 28);
HOLDS(holds_62, offsetof(fieldstop_visual_choice, available) == 0 && sizeof(((fieldstop_visual_choice *)0)->available) == 4);
HOLDS(holds_63, offsetof(fieldstop_visual_choice, facts) == 4 && sizeof(((fieldstop_visual_choice *)0)->facts) == 4);
HOLDS(holds_64, offsetof(fieldstop_visual_choice, magnification_q16) == 8 && sizeof(((fieldstop_visual_choice *)0)->magnification_q16) == 4);
HOLDS(holds_65, offsetof(fieldstop_visual_choice, exit_pupil_um) == 12 && sizeof(((fieldstop_visual_choice *)0)->exit_pupil_um) == 4);
HOLDS(holds_66, offsetof(fieldstop_visual_choice, true_field_mas) == 16 && sizeof(((fieldstop_visual_choice *)0)->true_field_mas) == 4);
HOLDS(holds_67, offsetof(fieldstop_visual_choice, fit_q16) == 20 && sizeof(((fieldstop_visual_choice *)0)->fit_q16) == 4);
HOLDS(holds_68, offsetof(fieldstop_visual_choice, eyepiece) == 24 && sizeof(((fieldstop_visual_choice *)0)->eyepiece) == 1);
HOLDS(holds_69, offsetof(fieldstop_visual_choice, amplifier) == 25 && sizeof(((fieldstop_visual_choice *)0)->amplifier) == 1);
HOLDS(holds_70, offsetof(fieldstop_visual_choice, standing) == 26 && sizeof(((fieldstop_visual_choice *)0)->standing) == 1);
HOLDS(holds_71, offsetof(fieldstop_visual_choice, padding) == 27 && sizeof(((fieldstop_visual_choice *)0)->padding) == 1);
HOLDS(holds_72, sizeof(fieldstop_camera_target) == 12);
HOLDS(holds_73, offsetof(fieldstop_camera_target, width_mas) == 0 && sizeof(((fieldstop_camera_target *)0)->width_mas) == 4);
HOLDS(holds_74, offsetof(fieldstop_camera_target, height_mas) == 4 && sizeof(((fieldstop_camera_target *)0)->height_mas) == 4);
HOLDS(holds_75, offsetof(fieldstop_camera_target, overlap_q16) == 8 && sizeof(((fieldstop_camera_target *)0)->overlap_q16) == 4);
HOLDS(holds_76, sizeof(fieldstop_camera_choice) == 36);
HOLDS(holds_77, offsetof(fieldstop_camera_choice, available) == 0 && sizeof(((fieldstop_camera_choice *)0)->available) == 4);
HOLDS(holds_78, offsetof(fieldstop_camera_choice, facts) == 4 && sizeof(((fieldstop_camera_choice *)0)->facts) == 4);
HOLDS(holds_79, offsetof(fieldstop_camera_choice, frame_width_mas) == 8 && sizeof(((fieldstop_camera_choice *)0)->frame_width_mas) == 4);
HOLDS(holds_80, offsetof(fieldstop_camera_choice, frame_height_mas) == 12 && sizeof(((fieldstop_camera_choice *)0)->frame_height_mas) == 4);
HOLDS(holds_81, offsetof(fieldstop_camera_choice, pixel_scale_uas) == 16 && sizeof(((fieldstop_camera_choice *)0)->pixel_scale_uas) == 4);
HOLDS(holds_82, offsetof(fieldstop_camera_choice, pixels_per_fwhm_q16) == 20 && sizeof(((fieldstop_camera_choice *)0)->pixels_per_fwhm_q16) == 4);
HOLDS(holds_83, offsetof(fieldstop_camera_choice, tiles_wide) == 24 && sizeof(((fieldstop_camera_choice *)0)->tiles_wide) == 4);
HOLDS(holds_84, offsetof(fieldstop_camera_choice, tiles_high) == 28 && sizeof(((fieldstop_camera_choice *)0)->tiles_high) == 4);
HOLDS(holds_85, offsetof(fieldstop_camera_choice, camera) == 32 && sizeof(((fieldstop_camera_choice *)0)->camera) == 1);
HOLDS(holds_86, offsetof(fieldstop_camera_choice, amplifier) == 33 && sizeof(((fieldstop_camera_choice *)0)->amplifier) == 1);
HOLDS(holds_87, offsetof(fieldstop_camera_choice, padding) == 34 && sizeof(((fieldstop_camera_choice *)0)->padding) == 2);
HOLDS(holds_88, sizeof(fieldstop_text_style) == 195);
HOLDS(holds_89, offsetof(fieldstop_text_style, units) == 0 && sizeof(((fieldstop_text_style *)0)->units) == 168);
HOLDS(holds_90, offsetof(fieldstop_text_style, dash) == 168 && sizeof(((fieldstop_text_style *)0)->dash) == 8);
HOLDS(holds_91, offsetof(fieldstop_text_style, yes) == 176 && sizeof(((fieldstop_text_style *)0)->yes) == 8);
HOLDS(holds_92, offsetof(fieldstop_text_style, no) == 184 && sizeof(((fieldstop_text_style *)0)->no) == 8);
HOLDS(holds_93, offsetof(fieldstop_text_style, decimal_mark) == 192 && sizeof(((fieldstop_text_style *)0)->decimal_mark) == 1);
HOLDS(holds_94, offsetof(fieldstop_text_style, fact_mark) == 193 && sizeof(((fieldstop_text_style *)0)->fact_mark) == 1);
HOLDS(holds_95, offsetof(fieldstop_text_style, utf8) == 194 && sizeof(((fieldstop_text_style *)0)->utf8) == 1);
HOLDS(holds_96, sizeof(fieldstop_span) == 4);
HOLDS(holds_97, offsetof(fieldstop_span, first) == 0 && sizeof(((fieldstop_span *)0)->first) == 2);
HOLDS(holds_98, offsetof(fieldstop_span, count) == 2 && sizeof(((fieldstop_span *)0)->count) == 2);
HOLDS(holds_99, FIELDSTOP_NULL_POINTER == 1);
HOLDS(holds_100, FIELDSTOP_ZERO == 2);
HOLDS(holds_101, FIELDSTOP_OUT_OF_RANGE == 3);
HOLDS(holds_102, FIELDSTOP_NOT_FINITE == 4);
HOLDS(holds_103, FIELDSTOP_OVERFLOW == 5);
HOLDS(holds_104, FIELDSTOP_NO_ROOM == 6);
HOLDS(holds_105, FIELDSTOP_UNDEFINED == 7);
HOLDS(holds_106, FIELDSTOP_NEVER_REACHED == 8);
HOLDS(holds_107, FIELDSTOP_NEVER_LEFT == 9);
HOLDS(holds_108, FIELDSTOP_EQUIDISTANT == 0);
HOLDS(holds_109, FIELDSTOP_RECTILINEAR == 1);
HOLDS(holds_110, FIELDSTOP_VISUAL_FOCAL_LENGTH == 1);
HOLDS(holds_111, FIELDSTOP_VISUAL_FOCAL_RATIO == 2);
HOLDS(holds_112, FIELDSTOP_VISUAL_MAGNIFICATION == 4);
HOLDS(holds_113, FIELDSTOP_VISUAL_EXIT_PUPIL == 8);
HOLDS(holds_114, FIELDSTOP_VISUAL_TRUE_FIELD == 16);
HOLDS(holds_115, FIELDSTOP_VISUAL_RESOLUTION == 32);
HOLDS(holds_116, FIELDSTOP_VISUAL_DAWES_LIMIT == 64);
HOLDS(holds_117, FIELDSTOP_VISUAL_LOWEST_MAGNIFICATION == 128);
HOLDS(holds_118, FIELDSTOP_VISUAL_RESOLVING_MAGNIFICATION == 256);
HOLDS(holds_119, FIELDSTOP_VISUAL_EFFECTIVE_APERTURE == 512);
HOLDS(holds_120, FIELDSTOP_VISUAL_LIMITING_MAGNITUDE == 1024);
HOLDS(holds_121, FIELDSTOP_VISUAL_SURFACE_BRIGHTNESS == 2048);
HOLDS(holds_122, FIELDSTOP_VISUAL_ALL == 4095);
HOLDS(holds_123, FIELDSTOP_VISUAL_FACT_WIDE_EXIT_PUPIL == 1);
HOLDS(holds_124, FIELDSTOP_VISUAL_FACT_EMPTY_MAGNIFICATION == 2);
HOLDS(holds_125, FIELDSTOP_VISUAL_FACT_FIELD_FROM_APPARENT == 4);
HOLDS(holds_126, FIELDSTOP_VISUAL_FACT_SEEING_LIMITED == 8);
HOLDS(holds_127, FIELDSTOP_CAMERA_FOCAL_LENGTH == 1);
HOLDS(holds_128, FIELDSTOP_CAMERA_FOCAL_RATIO == 2);
HOLDS(holds_129, FIELDSTOP_CAMERA_T_NUMBER == 4);
HOLDS(holds_130, FIELDSTOP_CAMERA_FRAME_WIDTH == 8);
HOLDS(holds_131, FIELDSTOP_CAMERA_FRAME_HEIGHT == 16);
HOLDS(holds_132, FIELDSTOP_CAMERA_PIXEL_SCALE == 32);
HOLDS(holds_133, FIELDSTOP_CAMERA_PLATE_SCALE == 64);
HOLDS(holds_134, FIELDSTOP_CAMERA_STAR_FWHM == 128);
HOLDS(holds_135, FIELDSTOP_CAMERA_PIXELS_PER_FWHM == 256);
HOLDS(holds_136, FIELDSTOP_CAMERA_ALL == 511);
HOLDS(holds_137, FIELDSTOP_CAMERA_FACT_COARSE_SAMPLING == 1);
HOLDS(holds_138, FIELDSTOP_CAMERA_FACT_FINE_SAMPLING == 2);
HOLDS(holds_139, FIELDSTOP_PURPOSE_FRAME == 0);
HOLDS(holds_140, FIELDSTOP_PURPOSE_SPLIT == 1);
HOLDS(holds_141, FIELDSTOP_PURPOSE_EXIT_PUPIL == 2);
HOLDS(holds_142, FIELDSTOP_NO_AMPLIFIER == 255);
HOLDS(holds_143, FIELDSTOP_VISUAL_CHOICE_MAGNIFICATION == 1);
HOLDS(holds_144, FIELDSTOP_VISUAL_CHOICE_EXIT_PUPIL == 2);
HOLDS(holds_145, FIELDSTOP_VISUAL_CHOICE_TRUE_FIELD == 4);
HOLDS(holds_146, FIELDSTOP_VISUAL_CHOICE_FIT == 8);
HOLDS(holds_147, FIELDSTOP_VISUAL_CHOICE_FACT_WIDE_EXIT_PUPIL == 1);
HOLDS(holds_148, FIELDSTOP_VISUAL_CHOICE_FACT_EMPTY_MAGNIFICATION == 2);
HOLDS(holds_149, FIELDSTOP_VISUAL_CHOICE_FACT_FIELD_FROM_APPARENT == 4);
HOLDS(holds_150, FIELDSTOP_VISUAL_CHOICE_FACT_SEEING_SHOWS == 8);
HOLDS(holds_151, FIELDSTOP_VISUAL_CHOICE_FACT_SERVES == 16);
HOLDS(holds_152, FIELDSTOP_VISUAL_CHOICE_FACT_UNDER_RESOLUTION == 32);
HOLDS(holds_153, FIELDSTOP_VISUAL_CHOICE_FACT_UNDER_SEEING == 64);
HOLDS(holds_154, FIELDSTOP_CAMERA_CHOICE_FRAME_WIDTH == 1);
HOLDS(holds_155, FIELDSTOP_CAMERA_CHOICE_FRAME_HEIGHT == 2);
HOLDS(holds_156, FIELDSTOP_CAMERA_CHOICE_PIXEL_SCALE == 4);
HOLDS(holds_157, FIELDSTOP_CAMERA_CHOICE_PIXELS_PER_FWHM == 8);
HOLDS(holds_158, FIELDSTOP_CAMERA_CHOICE_TILES == 16);
HOLDS(holds_159, FIELDSTOP_CAMERA_CHOICE_FACT_COARSE_SAMPLING == 1);
HOLDS(holds_160, FIELDSTOP_CAMERA_CHOICE_FACT_FINE_SAMPLING == 2);
HOLDS(holds_161, FIELDSTOP_CAMERA_CHOICE_FACT_FITS == 4);
HOLDS(holds_162, FIELDSTOP_ANGLE_BY_SIZE == 0);
HOLDS(holds_163, FIELDSTOP_ANGLE_DECIMAL_DEGREES == 1);
HOLDS(holds_164, FIELDSTOP_ANGLE_DEGREES_MINUTES == 2);
HOLDS(holds_165, FIELDSTOP_ANGLE_MINUTES_SECONDS == 3);
HOLDS(holds_166, FIELDSTOP_ANGLE_DECIMAL_SECONDS == 4);
HOLDS(holds_167, FIELDSTOP_UNIT_NONE == 0);
HOLDS(holds_168, FIELDSTOP_UNIT_DEGREE == 1);
HOLDS(holds_169, FIELDSTOP_UNIT_MINUTE == 2);
HOLDS(holds_170, FIELDSTOP_UNIT_SECOND == 3);
HOLDS(holds_171, FIELDSTOP_UNIT_DECIMAL_DEGREE == 4);
HOLDS(holds_172, FIELDSTOP_UNIT_METRE == 5);
HOLDS(holds_173, FIELDSTOP_UNIT_MILLIMETRE == 6);
HOLDS(holds_174, FIELDSTOP_UNIT_MICROMETRE == 7);
HOLDS(holds_175, FIELDSTOP_UNIT_NANOMETRE == 8);
HOLDS(holds_176, FIELDSTOP_UNIT_TIMES == 9);
HOLDS(holds_177, FIELDSTOP_UNIT_PERCENT == 10);
HOLDS(holds_178, FIELDSTOP_UNIT_MAGNITUDE == 11);
HOLDS(holds_179, FIELDSTOP_UNIT_FOCAL_RATIO == 12);
HOLDS(holds_180, FIELDSTOP_UNIT_PIXEL == 13);
HOLDS(holds_181, FIELDSTOP_UNIT_SECOND_PER_PIXEL == 14);
HOLDS(holds_182, FIELDSTOP_UNIT_SECOND_PER_MILLIMETRE == 15);
HOLDS(holds_183, FIELDSTOP_UNIT_SECOND_PER_TIME == 16);
HOLDS(holds_184, FIELDSTOP_UNIT_PER_MILLIMETRE == 17);
HOLDS(holds_185, FIELDSTOP_UNIT_TIME == 18);
HOLDS(holds_186, FIELDSTOP_UNIT_STEP == 19);
HOLDS(holds_187, FIELDSTOP_UNIT_KELVIN == 20);
HOLDS(holds_188, FIELDSTOP_UNIT_WATT == 21);
HOLDS(holds_189, FIELDSTOP_VISUAL_ROWS == 16);
HOLDS(holds_190, FIELDSTOP_VISUAL_ROW_MAGNIFICATION == 0);
HOLDS(holds_191, FIELDSTOP_VISUAL_ROW_TRUE_FIELD == 1);
HOLDS(holds_192, FIELDSTOP_VISUAL_ROW_EXIT_PUPIL == 2);
HOLDS(holds_193, FIELDSTOP_VISUAL_ROW_RESOLUTION == 3);
HOLDS(holds_194, FIELDSTOP_VISUAL_ROW_FAINTEST_STAR == 4);
HOLDS(holds_195, FIELDSTOP_VISUAL_ROW_SURFACE_BRIGHTNESS == 5);
HOLDS(holds_196, FIELDSTOP_VISUAL_ROW_FOCAL_RATIO == 6);
HOLDS(holds_197, FIELDSTOP_VISUAL_ROW_FOCAL_LENGTH == 7);
HOLDS(holds_198, FIELDSTOP_VISUAL_ROW_LOWEST_MAGNIFICATION == 8);
HOLDS(holds_199, FIELDSTOP_VISUAL_ROW_RESOLVING_MAGNIFICATION == 9);
HOLDS(holds_200, FIELDSTOP_VISUAL_ROW_DAWES_LIMIT == 10);
HOLDS(holds_201, FIELDSTOP_VISUAL_ROW_EFFECTIVE_APERTURE == 11);
HOLDS(holds_202, FIELDSTOP_VISUAL_ROW_WIDE_EXIT_PUPIL == 12);
HOLDS(holds_203, FIELDSTOP_VISUAL_ROW_EMPTY_MAGNIFICATION == 13);
HOLDS(holds_204, FIELDSTOP_VISUAL_ROW_FIELD_FROM_APPARENT == 14);
HOLDS(holds_205, FIELDSTOP_VISUAL_ROW_SEEING_LIMITED == 15);
HOLDS(holds_206, FIELDSTOP_CAMERA_ROWS == 11);
HOLDS(holds_207, FIELDSTOP_CAMERA_ROW_FRAME_WIDTH == 0);
HOLDS(holds_208, FIELDSTOP_CAMERA_ROW_FRAME_HEIGHT == 1);
HOLDS(holds_209, FIELDSTOP_CAMERA_ROW_PIXEL_SCALE == 2);
HOLDS(holds_210, FIELDSTOP_CAMERA_ROW_STAR_WIDTH == 3);
HOLDS(holds_211, FIELDSTOP_CAMERA_ROW_STAR_PIXELS == 4);
HOLDS(holds_212, FIELDSTOP_CAMERA_ROW_FOCAL_RATIO == 5);
HOLDS(holds_213, FIELDSTOP_CAMERA_ROW_T_NUMBER == 6);
HOLDS(holds_214, FIELDSTOP_CAMERA_ROW_FOCAL_LENGTH == 7);
HOLDS(holds_215, FIELDSTOP_CAMERA_ROW_PLATE_SCALE == 8);
HOLDS(holds_216, FIELDSTOP_CAMERA_ROW_COARSE_SAMPLING == 9);
HOLDS(holds_217, FIELDSTOP_CAMERA_ROW_FINE_SAMPLING == 10);

typedef void (*any_function)(void);
static volatile any_function present;

int main(void)
{
    {
        const char * (*function)(fieldstop_status) = fieldstop_cause_text;
        present = (any_function)function;
    }
    {
        uint32_t (*function)(void) = fieldstop_version;
        present = (any_function)function;
    }
    {
        void (*function)(void) = fieldstop_abi_1;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(int32_t, uint32_t *) = fieldstop_bam_from_mas_fx;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint32_t, uint32_t *) = fieldstop_mas_from_bam_fx;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(int32_t, int32_t *) = fieldstop_signed_mas_from_bam_fx;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint32_t, uint32_t *) = fieldstop_bam_from_day_ms_fx;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint32_t, uint32_t *) = fieldstop_day_ms_from_bam_fx;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint32_t, uint32_t *) = fieldstop_milli_from_q16_fx;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint32_t, uint32_t *) = fieldstop_q16_from_milli_fx;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_focal_ratio_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_focal_ratio_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_focal_ratio_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_amplified_focal_length_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_amplified_focal_length_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_amplified_focal_length_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(int32_t, uint32_t, uint32_t *) = fieldstop_amplification_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_amplification_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_amplification_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_magnification_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_magnification_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_magnification_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_exit_pupil_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_exit_pupil_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_exit_pupil_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_eyepiece_for_exit_pupil_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_eyepiece_for_exit_pupil_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_eyepiece_for_exit_pupil_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_eyepiece_for_magnification_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_eyepiece_for_magnification_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_eyepiece_for_magnification_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_true_field_from_stop_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_true_field_from_stop_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_true_field_from_stop_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_true_field_rectilinear_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_true_field_rectilinear_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_true_field_rectilinear_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_true_field_equidistant_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_true_field_equidistant_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_true_field_equidistant_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_frame_field_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, uint32_t, float, float *) = fieldstop_frame_field_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, uint32_t, double, double *) = fieldstop_frame_field_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t *) = fieldstop_plate_scale_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float *) = fieldstop_plate_scale_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double *) = fieldstop_plate_scale_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_pixel_scale_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_pixel_scale_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_pixel_scale_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_focal_length_for_field_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_focal_length_for_field_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_focal_length_for_field_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_tiles_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, uint32_t *) = fieldstop_tiles_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, uint32_t *) = fieldstop_tiles_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_rayleigh_limit_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_rayleigh_limit_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_rayleigh_limit_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_rayleigh_limit_obstructed_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_rayleigh_limit_obstructed_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_rayleigh_limit_obstructed_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t *) = fieldstop_dawes_limit_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float *) = fieldstop_dawes_limit_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double *) = fieldstop_dawes_limit_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_sparrow_limit_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_sparrow_limit_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_sparrow_limit_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_airy_fwhm_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_airy_fwhm_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_airy_fwhm_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_airy_radius_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_airy_radius_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_airy_radius_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_cutoff_frequency_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_cutoff_frequency_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_cutoff_frequency_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_contrast_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_contrast_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_contrast_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_strehl_ratio_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_strehl_ratio_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_strehl_ratio_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_fried_parameter_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_fried_parameter_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_fried_parameter_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_seeing_at_airmass_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_seeing_at_airmass_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_seeing_at_airmass_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_combined_fwhm_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_combined_fwhm_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_combined_fwhm_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint8_t, uint32_t, uint8_t, uint32_t, uint32_t *) = fieldstop_throughput_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(uint8_t, float, uint8_t, float, float *) = fieldstop_throughput_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(uint8_t, double, uint8_t, double, double *) = fieldstop_throughput_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_clear_fraction_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_clear_fraction_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_clear_fraction_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_effective_aperture_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_effective_aperture_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_effective_aperture_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, int32_t *) = fieldstop_magnitude_gain_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_magnitude_gain_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_magnitude_gain_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(int32_t, uint32_t, uint32_t, int32_t *) = fieldstop_limiting_magnitude_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_limiting_magnitude_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_limiting_magnitude_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_surface_brightness_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_surface_brightness_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_surface_brightness_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, int32_t *) = fieldstop_magnitude_difference_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_magnitude_difference_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_magnitude_difference_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, int32_t *) = fieldstop_distance_dimming_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_distance_dimming_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_distance_dimming_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, int32_t *) = fieldstop_extinction_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_extinction_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_extinction_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_t_number_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_t_number_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_t_number_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_pixels_per_fwhm_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_pixels_per_fwhm_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_pixels_per_fwhm_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_nyquist_pixel_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_nyquist_pixel_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_nyquist_pixel_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_focal_length_for_pixel_scale_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_focal_length_for_pixel_scale_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_focal_length_for_pixel_scale_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint16_t, uint16_t, uint32_t, uint32_t *) = fieldstop_diagonal_field_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, uint16_t, uint16_t, float, float *) = fieldstop_diagonal_field_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, uint16_t, uint16_t, double, double *) = fieldstop_diagonal_field_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_image_size_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_image_size_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_image_size_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, int32_t *) = fieldstop_exposure_stops_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_exposure_stops_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_exposure_stops_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_depth_of_focus_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_depth_of_focus_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_depth_of_focus_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_defocus_blur_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_defocus_blur_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_defocus_blur_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_defocus_wavefront_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_defocus_wavefront_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_defocus_wavefront_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_motor_steps_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_motor_steps_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_motor_steps_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, int32_t, int32_t, int32_t *) = fieldstop_thermal_shift_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_thermal_shift_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_thermal_shift_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_refocus_temperature_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_refocus_temperature_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_refocus_temperature_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_near_focus_travel_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_near_focus_travel_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_near_focus_travel_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_coma_length_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_coma_length_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_coma_length_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_diagonal_minor_axis_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float, float *) = fieldstop_diagonal_minor_axis_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double, double *) = fieldstop_diagonal_minor_axis_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_diagonal_offset_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float, float *) = fieldstop_diagonal_offset_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double, double *) = fieldstop_diagonal_offset_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_beam_width_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_beam_width_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_beam_width_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_beam_shift_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_beam_shift_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_beam_shift_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_secondary_magnification_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_secondary_magnification_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_secondary_magnification_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_secondary_separation_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_secondary_separation_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_secondary_separation_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_secondary_diameter_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float, float *) = fieldstop_secondary_diameter_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double, double *) = fieldstop_secondary_diameter_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_secondary_field_margin_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float, float *) = fieldstop_secondary_field_margin_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double, double *) = fieldstop_secondary_field_margin_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_secondary_radius_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_secondary_radius_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_secondary_radius_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_illumination_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_illumination_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_illumination_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_swing_radius_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_swing_radius_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_swing_radius_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, int32_t, int32_t, uint32_t *) = fieldstop_eyepiece_height_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_eyepiece_height_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_eyepiece_height_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_abbe_number_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_abbe_number_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_abbe_number_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_singlet_colour_shift_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_singlet_colour_shift_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_singlet_colour_shift_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t *) = fieldstop_singlet_colour_blur_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_singlet_colour_blur_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_singlet_colour_blur_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_achromat_crown_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_achromat_crown_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_achromat_crown_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_achromat_flint_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_achromat_flint_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_achromat_flint_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_secondary_spectrum_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_secondary_spectrum_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_secondary_spectrum_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(int32_t, uint32_t *) = fieldstop_drift_rate_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float *) = fieldstop_drift_rate_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double *) = fieldstop_drift_rate_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, int32_t, uint32_t *) = fieldstop_drift_time_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_drift_time_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_drift_time_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, int32_t, uint32_t *) = fieldstop_true_field_from_drift_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_true_field_from_drift_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_true_field_from_drift_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, int32_t, uint32_t *) = fieldstop_trail_free_exposure_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float, float *) = fieldstop_trail_free_exposure_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double, double *) = fieldstop_trail_free_exposure_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, uint32_t, uint32_t *) = fieldstop_rotation_free_exposure_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, uint32_t, float, float *) = fieldstop_rotation_free_exposure_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, uint32_t, double, double *) = fieldstop_rotation_free_exposure_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(int32_t, uint32_t, int32_t, int32_t *) = fieldstop_field_rotation_rate_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_field_rotation_rate_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_field_rotation_rate_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(int32_t, uint32_t, int32_t, int32_t *) = fieldstop_azimuth_rate_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_azimuth_rate_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_azimuth_rate_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(int32_t, uint32_t, int32_t, int32_t *) = fieldstop_altitude_rate_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float, float *) = fieldstop_altitude_rate_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double, double *) = fieldstop_altitude_rate_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(int32_t, uint32_t, uint32_t *) = fieldstop_zenith_blind_radius_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_zenith_blind_radius_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_zenith_blind_radius_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t, int32_t *) = fieldstop_misalignment_drift_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float, float *) = fieldstop_misalignment_drift_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, double *) = fieldstop_misalignment_drift_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t *) = fieldstop_sun_right_ascension_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(uint32_t, double *) = fieldstop_sun_right_ascension_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, int32_t *) = fieldstop_sun_declination_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(uint32_t, double *) = fieldstop_sun_declination_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, int32_t, uint32_t, uint32_t *) = fieldstop_sun_clearance_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double, uint32_t, double *) = fieldstop_sun_clearance_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(uint32_t, uint32_t *) = fieldstop_collected_sunlight_fx;
        present = (any_function)function;
    }
#if !defined(FIELDSTOP_NO_FLOAT)
    {
        fieldstop_status (*function)(float, float *) = fieldstop_collected_sunlight_f32;
        present = (any_function)function;
    }
#endif
#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
    {
        fieldstop_status (*function)(double, double *) = fieldstop_collected_sunlight_f64;
        present = (any_function)function;
    }
#endif
    {
        fieldstop_status (*function)(const struct fieldstop_telescope *) = fieldstop_telescope_check;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_eyepiece *) = fieldstop_eyepiece_check;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_camera *) = fieldstop_camera_check;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_observer *) = fieldstop_observer_check;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_telescope *, const struct fieldstop_eyepiece *, const struct fieldstop_observer *, uint32_t, struct fieldstop_visual_readout *) = fieldstop_visual_readout_compute;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_telescope *, const struct fieldstop_camera *, const struct fieldstop_observer *, uint32_t, struct fieldstop_camera_readout *) = fieldstop_camera_readout_compute;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_telescope *, const struct fieldstop_eyepiece *, uint8_t, const uint32_t *, uint8_t, const struct fieldstop_observer *, const struct fieldstop_visual_target *, struct fieldstop_visual_choice *, uint8_t *) = fieldstop_visual_choose;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_telescope *, const struct fieldstop_camera *, uint8_t, const uint32_t *, uint8_t, const struct fieldstop_observer *, const struct fieldstop_camera_target *, struct fieldstop_camera_choice *, uint8_t *) = fieldstop_camera_choose;
        present = (any_function)function;
    }
    {
        const struct fieldstop_text_style * (*function)(void) = fieldstop_text_style_ascii;
        present = (any_function)function;
    }
    {
        const struct fieldstop_text_style * (*function)(void) = fieldstop_text_style_utf8;
        present = (any_function)function;
    }
    {
        const struct fieldstop_text_style * (*function)(void) = fieldstop_text_style_hd44780_a00;
        present = (any_function)function;
    }
    {
        const struct fieldstop_text_style * (*function)(void) = fieldstop_text_style_hd44780_a02;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint32_t, uint8_t, const struct fieldstop_text_style *, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_count;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint32_t, uint8_t, const struct fieldstop_text_style *, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_length_mm;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint32_t, uint8_t, const struct fieldstop_text_style *, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_length_um;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint32_t, uint8_t, const struct fieldstop_text_style *, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_ratio;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint32_t, uint8_t, const struct fieldstop_text_style *, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_magnification;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint32_t, uint8_t, const struct fieldstop_text_style *, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_focal_ratio;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint32_t, uint8_t, const struct fieldstop_text_style *, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_percent;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint32_t, uint8_t, const struct fieldstop_text_style *, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_arcseconds;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(int32_t, uint8_t, const struct fieldstop_text_style *, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_magnitude;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint32_t, uint8_t, uint8_t, const struct fieldstop_text_style *, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_angle;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint8_t, const struct fieldstop_text_style *, char *, uint16_t, uint16_t *) = fieldstop_text_unit;
        present = (any_function)function;
    }
    {
        const char *const * (*function)(void) = fieldstop_text_visual_labels;
        present = (any_function)function;
    }
    {
        const char *const * (*function)(void) = fieldstop_text_visual_labels_short;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_visual_readout *, const char *const *, const struct fieldstop_text_style *, uint8_t, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_visual_line;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_visual_readout *, uint8_t, const struct fieldstop_text_style *, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_visual_value;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_visual_readout *, uint8_t, const struct fieldstop_text_style *, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_visual_number;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_visual_readout *, uint8_t, const struct fieldstop_text_style *, char *, uint16_t, uint16_t *) = fieldstop_text_visual_unit;
        present = (any_function)function;
    }
    {
        const char *const * (*function)(void) = fieldstop_text_camera_labels;
        present = (any_function)function;
    }
    {
        const char *const * (*function)(void) = fieldstop_text_camera_labels_short;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_camera_readout *, const char *const *, const struct fieldstop_text_style *, uint8_t, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_camera_line;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_camera_readout *, uint8_t, const struct fieldstop_text_style *, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_camera_value;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_camera_readout *, uint8_t, const struct fieldstop_text_style *, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_camera_number;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_camera_readout *, uint8_t, const struct fieldstop_text_style *, char *, uint16_t, uint16_t *) = fieldstop_text_camera_unit;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const char *, uint16_t, const char *, uint16_t, const struct fieldstop_text_style *, struct fieldstop_span *) = fieldstop_text_changed;
        present = (any_function)function;
    }
    return present == 0;
}
