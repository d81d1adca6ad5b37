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
HOLDS(holds_27, sizeof(fieldstop_site) == 8);
HOLDS(holds_28, offsetof(fieldstop_site, latitude_bam) == 0 && sizeof(((fieldstop_site *)0)->latitude_bam) == 4);
HOLDS(holds_29, offsetof(fieldstop_site, longitude_bam) == 4 && sizeof(((fieldstop_site *)0)->longitude_bam) == 4);
HOLDS(holds_30, sizeof(fieldstop_visual_readout) == 56);
HOLDS(holds_31, offsetof(fieldstop_visual_readout, available) == 0 && sizeof(((fieldstop_visual_readout *)0)->available) == 4);
HOLDS(holds_32, offsetof(fieldstop_visual_readout, facts) == 4 && sizeof(((fieldstop_visual_readout *)0)->facts) == 4);
HOLDS(holds_33, offsetof(fieldstop_visual_readout, focal_length_um) == 8 && sizeof(((fieldstop_visual_readout *)0)->focal_length_um) == 4);
HOLDS(holds_34, offsetof(fieldstop_visual_readout, focal_ratio_q16) == 12 && sizeof(((fieldstop_visual_readout *)0)->focal_ratio_q16) == 4);
HOLDS(holds_35, offsetof(fieldstop_visual_readout, magnification_q16) == 16 && sizeof(((fieldstop_visual_readout *)0)->magnification_q16) == 4);
HOLDS(holds_36, offsetof(fieldstop_visual_readout, exit_pupil_um) == 20 && sizeof(((fieldstop_visual_readout *)0)->exit_pupil_um) == 4);
HOLDS(holds_37, offsetof(fieldstop_visual_readout, true_field_mas) == 24 && sizeof(((fieldstop_visual_readout *)0)->true_field_mas) == 4);
HOLDS(holds_38, offsetof(fieldstop_visual_readout, resolution_uas) == 28 && sizeof(((fieldstop_visual_readout *)0)->resolution_uas) == 4);
HOLDS(holds_39, offsetof(fieldstop_visual_readout, dawes_limit_uas) == 32 && sizeof(((fieldstop_visual_readout *)0)->dawes_limit_uas) == 4);
HOLDS(holds_40, offsetof(fieldstop_visual_readout, lowest_magnification_q16) == 36 && sizeof(((fieldstop_visual_readout *)0)->lowest_magnification_q16) == 4);
HOLDS(holds_41, offsetof(fieldstop_visual_readout, resolving_magnification_q16) == 40 && sizeof(((fieldstop_visual_readout *)0)->resolving_magnification_q16) == 4);
HOLDS(holds_42, offsetof(fieldstop_visual_readout, effective_aperture_um) == 44 && sizeof(((fieldstop_visual_readout *)0)->effective_aperture_um) == 4);
HOLDS(holds_43, offsetof(fieldstop_visual_readout, limiting_magnitude_mmag) == 48 && sizeof(((fieldstop_visual_readout *)0)->limiting_magnitude_mmag) == 4);
HOLDS(holds_44, offsetof(fieldstop_visual_readout, surface_brightness_q16) == 52 && sizeof(((fieldstop_visual_readout *)0)->surface_brightness_q16) == 4);
HOLDS(holds_45, sizeof(fieldstop_camera_readout) == 56);
HOLDS(holds_46, offsetof(fieldstop_camera_readout, available) == 0 && sizeof(((fieldstop_camera_readout *)0)->available) == 4);
HOLDS(holds_47, offsetof(fieldstop_camera_readout, facts) == 4 && sizeof(((fieldstop_camera_readout *)0)->facts) == 4);
HOLDS(holds_48, offsetof(fieldstop_camera_readout, focal_length_um) == 8 && sizeof(((fieldstop_camera_readout *)0)->focal_length_um) == 4);
HOLDS(holds_49, offsetof(fieldstop_camera_readout, focal_ratio_q16) == 12 && sizeof(((fieldstop_camera_readout *)0)->focal_ratio_q16) == 4);
HOLDS(holds_50, offsetof(fieldstop_camera_readout, t_number_q16) == 16 && sizeof(((fieldstop_camera_readout *)0)->t_number_q16) == 4);
HOLDS(holds_51, offsetof(fieldstop_camera_readout, frame_width_mas) == 20 && sizeof(((fieldstop_camera_readout *)0)->frame_width_mas) == 4);
HOLDS(holds_52, offsetof(fieldstop_camera_readout, frame_height_mas) == 24 && sizeof(((fieldstop_camera_readout *)0)->frame_height_mas) == 4);
HOLDS(holds_53, offsetof(fieldstop_camera_readout, pixel_scale_uas) == 28 && sizeof(((fieldstop_camera_readout *)0)->pixel_scale_uas) == 4);
HOLDS(holds_54, offsetof(fieldstop_camera_readout, plate_scale_mas_per_mm) == 32 && sizeof(((fieldstop_camera_readout *)0)->plate_scale_mas_per_mm) == 4);
HOLDS(holds_55, offsetof(fieldstop_camera_readout, star_fwhm_uas) == 36 && sizeof(((fieldstop_camera_readout *)0)->star_fwhm_uas) == 4);
HOLDS(holds_56, offsetof(fieldstop_camera_readout, pixels_per_fwhm_q16) == 40 && sizeof(((fieldstop_camera_readout *)0)->pixels_per_fwhm_q16) == 4);
HOLDS(holds_57, offsetof(fieldstop_camera_readout, cutoff_frequency_q16) == 44 && sizeof(((fieldstop_camera_readout *)0)->cutoff_frequency_q16) == 4);
HOLDS(holds_58, offsetof(fieldstop_camera_readout, nyquist_pixel_nm) == 48 && sizeof(((fieldstop_camera_readout *)0)->nyquist_pixel_nm) == 4);
HOLDS(holds_59, offsetof(fieldstop_camera_readout, diagonal_mas) == 52 && sizeof(((fieldstop_camera_readout *)0)->diagonal_mas) == 4);
HOLDS(holds_60, sizeof(fieldstop_visual_target) == 20);
HOLDS(holds_61, offsetof(fieldstop_visual_target, size_mas) == 0 && sizeof(((fieldstop_visual_target *)0)->size_mas) == 4);
HOLDS(holds_62, offsetof(fieldstop_visual_target, room_q16) == 4 && sizeof(((fieldstop_visual_target *)0)->room_q16) == 4);
HOLDS(holds_63, offsetof(fieldstop_visual_target, separation_uas) == 8 && sizeof(((fieldstop_visual_target *)0)->separation_uas) == 4);
HOLDS(holds_64, offsetof(fieldstop_visual_target, exit_pupil_um) == 12 && sizeof(((fieldstop_visual_target *)0)->exit_pupil_um) == 4);
HOLDS(holds_65, offsetof(fieldstop_visual_target, purpose) == 16 && sizeof(((fieldstop_visual_target *)0)->purpose) == 1);
HOLDS(holds_66, offsetof(fieldstop_visual_target, padding) == 17 && sizeof(((fieldstop_visual_target *)0)->padding) == 3);
HOLDS(holds_67, sizeof(fieldstop_visual_choice) == 28);
HOLDS(holds_68, offsetof(fieldstop_visual_choice, available) == 0 && sizeof(((fieldstop_visual_choice *)0)->available) == 4);
HOLDS(holds_69, offsetof(fieldstop_visual_choice, facts) == 4 && sizeof(((fieldstop_visual_choice *)0)->facts) == 4);
HOLDS(holds_70, offsetof(fieldstop_visual_choice, magnification_q16) == 8 && sizeof(((fieldstop_visual_choice *)0)->magnification_q16) == 4);
HOLDS(holds_71, offsetof(fieldstop_visual_choice, exit_pupil_um) == 12 && sizeof(((fieldstop_visual_choice *)0)->exit_pupil_um) == 4);
HOLDS(holds_72, offsetof(fieldstop_visual_choice, true_field_mas) == 16 && sizeof(((fieldstop_visual_choice *)0)->true_field_mas) == 4);
HOLDS(holds_73, offsetof(fieldstop_visual_choice, fit_q16) == 20 && sizeof(((fieldstop_visual_choice *)0)->fit_q16) == 4);
HOLDS(holds_74, offsetof(fieldstop_visual_choice, eyepiece) == 24 && sizeof(((fieldstop_visual_choice *)0)->eyepiece) == 1);
HOLDS(holds_75, offsetof(fieldstop_visual_choice, amplifier) == 25 && sizeof(((fieldstop_visual_choice *)0)->amplifier) == 1);
HOLDS(holds_76, offsetof(fieldstop_visual_choice, standing) == 26 && sizeof(((fieldstop_visual_choice *)0)->standing) == 1);
HOLDS(holds_77, offsetof(fieldstop_visual_choice, padding) == 27 && sizeof(((fieldstop_visual_choice *)0)->padding) == 1);
HOLDS(holds_78, sizeof(fieldstop_camera_target) == 12);
HOLDS(holds_79, offsetof(fieldstop_camera_target, width_mas) == 0 && sizeof(((fieldstop_camera_target *)0)->width_mas) == 4);
HOLDS(holds_80, offsetof(fieldstop_camera_target, height_mas) == 4 && sizeof(((fieldstop_camera_target *)0)->height_mas) == 4);
HOLDS(holds_81, offsetof(fieldstop_camera_target, overlap_q16) == 8 && sizeof(((fieldstop_camera_target *)0)->overlap_q16) == 4);
HOLDS(holds_82, sizeof(fieldstop_camera_choice) == 36);
HOLDS(holds_83, offsetof(fieldstop_camera_choice, available) == 0 && sizeof(((fieldstop_camera_choice *)0)->available) == 4);
HOLDS(holds_84, offsetof(fieldstop_camera_choice, facts) == 4 && sizeof(((fieldstop_camera_choice *)0)->facts) == 4);
HOLDS(holds_85, offsetof(fieldstop_camera_choice, frame_width_mas) == 8 && sizeof(((fieldstop_camera_choice *)0)->frame_width_mas) == 4);
HOLDS(holds_86, offsetof(fieldstop_camera_choice, frame_height_mas) == 12 && sizeof(((fieldstop_camera_choice *)0)->frame_height_mas) == 4);
HOLDS(holds_87, offsetof(fieldstop_camera_choice, pixel_scale_uas) == 16 && sizeof(((fieldstop_camera_choice *)0)->pixel_scale_uas) == 4);
HOLDS(holds_88, offsetof(fieldstop_camera_choice, pixels_per_fwhm_q16) == 20 && sizeof(((fieldstop_camera_choice *)0)->pixels_per_fwhm_q16) == 4);
HOLDS(holds_89, offsetof(fieldstop_camera_choice, tiles_wide) == 24 && sizeof(((fieldstop_camera_choice *)0)->tiles_wide) == 4);
HOLDS(holds_90, offsetof(fieldstop_camera_choice, tiles_high) == 28 && sizeof(((fieldstop_camera_choice *)0)->tiles_high) == 4);
HOLDS(holds_91, offsetof(fieldstop_camera_choice, camera) == 32 && sizeof(((fieldstop_camera_choice *)0)->camera) == 1);
HOLDS(holds_92, offsetof(fieldstop_camera_choice, amplifier) == 33 && sizeof(((fieldstop_camera_choice *)0)->amplifier) == 1);
HOLDS(holds_93, offsetof(fieldstop_camera_choice, padding) == 34 && sizeof(((fieldstop_camera_choice *)0)->padding) == 2);
HOLDS(holds_94, sizeof(fieldstop_newtonian_layout) == 40);
HOLDS(holds_95, offsetof(fieldstop_newtonian_layout, focus_distance_um) == 0 && sizeof(((fieldstop_newtonian_layout *)0)->focus_distance_um) == 4);
HOLDS(holds_96, offsetof(fieldstop_newtonian_layout, lit_field_um) == 4 && sizeof(((fieldstop_newtonian_layout *)0)->lit_field_um) == 4);
HOLDS(holds_97, offsetof(fieldstop_newtonian_layout, edge_offset_um) == 8 && sizeof(((fieldstop_newtonian_layout *)0)->edge_offset_um) == 4);
HOLDS(holds_98, offsetof(fieldstop_newtonian_layout, diagonal_um) == 12 && sizeof(((fieldstop_newtonian_layout *)0)->diagonal_um) == 4);
HOLDS(holds_99, offsetof(fieldstop_newtonian_layout, axis_height_um) == 16 && sizeof(((fieldstop_newtonian_layout *)0)->axis_height_um) == 4);
HOLDS(holds_100, offsetof(fieldstop_newtonian_layout, reach_um) == 20 && sizeof(((fieldstop_newtonian_layout *)0)->reach_um) == 4);
HOLDS(holds_101, offsetof(fieldstop_newtonian_layout, altitude_bam) == 24 && sizeof(((fieldstop_newtonian_layout *)0)->altitude_bam) == 4);
HOLDS(holds_102, offsetof(fieldstop_newtonian_layout, lowest_altitude_bam) == 28 && sizeof(((fieldstop_newtonian_layout *)0)->lowest_altitude_bam) == 4);
HOLDS(holds_103, offsetof(fieldstop_newtonian_layout, highest_altitude_bam) == 32 && sizeof(((fieldstop_newtonian_layout *)0)->highest_altitude_bam) == 4);
HOLDS(holds_104, offsetof(fieldstop_newtonian_layout, height_limit_um) == 36 && sizeof(((fieldstop_newtonian_layout *)0)->height_limit_um) == 4);
HOLDS(holds_105, sizeof(fieldstop_two_mirror_layout) == 12);
HOLDS(holds_106, offsetof(fieldstop_two_mirror_layout, primary_focal_um) == 0 && sizeof(((fieldstop_two_mirror_layout *)0)->primary_focal_um) == 4);
HOLDS(holds_107, offsetof(fieldstop_two_mirror_layout, back_focus_um) == 4 && sizeof(((fieldstop_two_mirror_layout *)0)->back_focus_um) == 4);
HOLDS(holds_108, offsetof(fieldstop_two_mirror_layout, lit_field_um) == 8 && sizeof(((fieldstop_two_mirror_layout *)0)->lit_field_um) == 4);
HOLDS(holds_109, sizeof(fieldstop_focuser) == 16);
HOLDS(holds_110, offsetof(fieldstop_focuser, motor_step_nm) == 0 && sizeof(((fieldstop_focuser *)0)->motor_step_nm) == 4);
HOLDS(holds_111, offsetof(fieldstop_focuser, defocus_nm) == 4 && sizeof(((fieldstop_focuser *)0)->defocus_nm) == 4);
HOLDS(holds_112, offsetof(fieldstop_focuser, tube_length_um) == 8 && sizeof(((fieldstop_focuser *)0)->tube_length_um) == 4);
HOLDS(holds_113, offsetof(fieldstop_focuser, expansion_ppb_per_k) == 12 && sizeof(((fieldstop_focuser *)0)->expansion_ppb_per_k) == 4);
HOLDS(holds_114, sizeof(fieldstop_focus_readout) == 36);
HOLDS(holds_115, offsetof(fieldstop_focus_readout, available) == 0 && sizeof(((fieldstop_focus_readout *)0)->available) == 4);
HOLDS(holds_116, offsetof(fieldstop_focus_readout, facts) == 4 && sizeof(((fieldstop_focus_readout *)0)->facts) == 4);
HOLDS(holds_117, offsetof(fieldstop_focus_readout, focal_ratio_q16) == 8 && sizeof(((fieldstop_focus_readout *)0)->focal_ratio_q16) == 4);
HOLDS(holds_118, offsetof(fieldstop_focus_readout, depth_nm) == 12 && sizeof(((fieldstop_focus_readout *)0)->depth_nm) == 4);
HOLDS(holds_119, offsetof(fieldstop_focus_readout, depth_steps) == 16 && sizeof(((fieldstop_focus_readout *)0)->depth_steps) == 4);
HOLDS(holds_120, offsetof(fieldstop_focus_readout, temperature_mk) == 20 && sizeof(((fieldstop_focus_readout *)0)->temperature_mk) == 4);
HOLDS(holds_121, offsetof(fieldstop_focus_readout, blur_nm) == 24 && sizeof(((fieldstop_focus_readout *)0)->blur_nm) == 4);
HOLDS(holds_122, offsetof(fieldstop_focus_readout, blur_angle_uas) == 28 && sizeof(((fieldstop_focus_readout *)0)->blur_angle_uas) == 4);
HOLDS(holds_123, offsetof(fieldstop_focus_readout, wavefront_nm) == 32 && sizeof(((fieldstop_focus_readout *)0)->wavefront_nm) == 4);
HOLDS(holds_124, sizeof(fieldstop_newtonian_readout) == 40);
HOLDS(holds_125, offsetof(fieldstop_newtonian_readout, available) == 0 && sizeof(((fieldstop_newtonian_readout *)0)->available) == 4);
HOLDS(holds_126, offsetof(fieldstop_newtonian_readout, facts) == 4 && sizeof(((fieldstop_newtonian_readout *)0)->facts) == 4);
HOLDS(holds_127, offsetof(fieldstop_newtonian_readout, diagonal_um) == 8 && sizeof(((fieldstop_newtonian_readout *)0)->diagonal_um) == 4);
HOLDS(holds_128, offsetof(fieldstop_newtonian_readout, diagonal_offset_um) == 12 && sizeof(((fieldstop_newtonian_readout *)0)->diagonal_offset_um) == 4);
HOLDS(holds_129, offsetof(fieldstop_newtonian_readout, obstruction_q16) == 16 && sizeof(((fieldstop_newtonian_readout *)0)->obstruction_q16) == 4);
HOLDS(holds_130, offsetof(fieldstop_newtonian_readout, beam_um) == 20 && sizeof(((fieldstop_newtonian_readout *)0)->beam_um) == 4);
HOLDS(holds_131, offsetof(fieldstop_newtonian_readout, beam_shift_um) == 24 && sizeof(((fieldstop_newtonian_readout *)0)->beam_shift_um) == 4);
HOLDS(holds_132, offsetof(fieldstop_newtonian_readout, edge_light_q16) == 28 && sizeof(((fieldstop_newtonian_readout *)0)->edge_light_q16) == 4);
HOLDS(holds_133, offsetof(fieldstop_newtonian_readout, eyepiece_height_um) == 32 && sizeof(((fieldstop_newtonian_readout *)0)->eyepiece_height_um) == 4);
HOLDS(holds_134, offsetof(fieldstop_newtonian_readout, greatest_height_um) == 36 && sizeof(((fieldstop_newtonian_readout *)0)->greatest_height_um) == 4);
HOLDS(holds_135, sizeof(fieldstop_two_mirror_readout) == 36);
HOLDS(holds_136, offsetof(fieldstop_two_mirror_readout, available) == 0 && sizeof(((fieldstop_two_mirror_readout *)0)->available) == 4);
HOLDS(holds_137, offsetof(fieldstop_two_mirror_readout, facts) == 4 && sizeof(((fieldstop_two_mirror_readout *)0)->facts) == 4);
HOLDS(holds_138, offsetof(fieldstop_two_mirror_readout, secondary_magnification_q16) == 8 && sizeof(((fieldstop_two_mirror_readout *)0)->secondary_magnification_q16) == 4);
HOLDS(holds_139, offsetof(fieldstop_two_mirror_readout, separation_um) == 12 && sizeof(((fieldstop_two_mirror_readout *)0)->separation_um) == 4);
HOLDS(holds_140, offsetof(fieldstop_two_mirror_readout, secondary_um) == 16 && sizeof(((fieldstop_two_mirror_readout *)0)->secondary_um) == 4);
HOLDS(holds_141, offsetof(fieldstop_two_mirror_readout, secondary_radius_um) == 20 && sizeof(((fieldstop_two_mirror_readout *)0)->secondary_radius_um) == 4);
HOLDS(holds_142, offsetof(fieldstop_two_mirror_readout, obstruction_q16) == 24 && sizeof(((fieldstop_two_mirror_readout *)0)->obstruction_q16) == 4);
HOLDS(holds_143, offsetof(fieldstop_two_mirror_readout, length_um) == 28 && sizeof(((fieldstop_two_mirror_readout *)0)->length_um) == 4);
HOLDS(holds_144, offsetof(fieldstop_two_mirror_readout, length_share_q16) == 32 && sizeof(((fieldstop_two_mirror_readout *)0)->length_share_q16) == 4);
HOLDS(holds_145, sizeof(fieldstop_equipment_name) == 12);
HOLDS(holds_146, offsetof(fieldstop_equipment_name, text) == 0 && sizeof(((fieldstop_equipment_name *)0)->text) == 12);
HOLDS(holds_147, sizeof(fieldstop_in_use) == 6);
HOLDS(holds_148, offsetof(fieldstop_in_use, telescope) == 0 && sizeof(((fieldstop_in_use *)0)->telescope) == 1);
HOLDS(holds_149, offsetof(fieldstop_in_use, eyepiece) == 1 && sizeof(((fieldstop_in_use *)0)->eyepiece) == 1);
HOLDS(holds_150, offsetof(fieldstop_in_use, amplifier) == 2 && sizeof(((fieldstop_in_use *)0)->amplifier) == 1);
HOLDS(holds_151, offsetof(fieldstop_in_use, camera) == 3 && sizeof(((fieldstop_in_use *)0)->camera) == 1);
HOLDS(holds_152, offsetof(fieldstop_in_use, observer) == 4 && sizeof(((fieldstop_in_use *)0)->observer) == 1);
HOLDS(holds_153, offsetof(fieldstop_in_use, site) == 5 && sizeof(((fieldstop_in_use *)0)->site) == 1);
HOLDS(holds_154, sizeof(fieldstop_slot_pair) == 16);
HOLDS(holds_155, offsetof(fieldstop_slot_pair, first) == 0 && sizeof(((fieldstop_slot_pair *)0)->first) == 4);
HOLDS(holds_156, offsetof(fieldstop_slot_pair, second) == 4 && sizeof(((fieldstop_slot_pair *)0)->second) == 4);
HOLDS(holds_157, offsetof(fieldstop_slot_pair, bytes) == 8 && sizeof(((fieldstop_slot_pair *)0)->bytes) == 4);
HOLDS(holds_158, offsetof(fieldstop_slot_pair, write_bytes) == 12 && sizeof(((fieldstop_slot_pair *)0)->write_bytes) == 1);
HOLDS(holds_159, offsetof(fieldstop_slot_pair, padding) == 13 && sizeof(((fieldstop_slot_pair *)0)->padding) == 3);
HOLDS(holds_160, sizeof(fieldstop_text_style) == 195);
HOLDS(holds_161, offsetof(fieldstop_text_style, units) == 0 && sizeof(((fieldstop_text_style *)0)->units) == 168);
HOLDS(holds_162, offsetof(fieldstop_text_style, dash) == 168 && sizeof(((fieldstop_text_style *)0)->dash) == 8);
HOLDS(holds_163, offsetof(fieldstop_text_style, yes) == 176 && sizeof(((fieldstop_text_style *)0)->yes) == 8);
HOLDS(holds_164, offsetof(fieldstop_text_style, no) == 184 && sizeof(((fieldstop_text_style *)0)->no) == 8);
HOLDS(holds_165, offsetof(fieldstop_text_style, decimal_mark) == 192 && sizeof(((fieldstop_text_style *)0)->decimal_mark) == 1);
HOLDS(holds_166, offsetof(fieldstop_text_style, fact_mark) == 193 && sizeof(((fieldstop_text_style *)0)->fact_mark) == 1);
HOLDS(holds_167, offsetof(fieldstop_text_style, utf8) == 194 && sizeof(((fieldstop_text_style *)0)->utf8) == 1);
HOLDS(holds_168, sizeof(fieldstop_span) == 4);
HOLDS(holds_169, offsetof(fieldstop_span, first) == 0 && sizeof(((fieldstop_span *)0)->first) == 2);
HOLDS(holds_170, offsetof(fieldstop_span, count) == 2 && sizeof(((fieldstop_span *)0)->count) == 2);
HOLDS(holds_171, sizeof(fieldstop_entry_state) == 8);
HOLDS(holds_172, offsetof(fieldstop_entry_state, quantity) == 0 && sizeof(((fieldstop_entry_state *)0)->quantity) == 4);
HOLDS(holds_173, offsetof(fieldstop_entry_state, position) == 4 && sizeof(((fieldstop_entry_state *)0)->position) == 2);
HOLDS(holds_174, offsetof(fieldstop_entry_state, state) == 6 && sizeof(((fieldstop_entry_state *)0)->state) == 1);
HOLDS(holds_175, offsetof(fieldstop_entry_state, reason) == 7 && sizeof(((fieldstop_entry_state *)0)->reason) == 1);
HOLDS(holds_176, FIELDSTOP_NULL_POINTER == 1);
HOLDS(holds_177, FIELDSTOP_ZERO == 2);
HOLDS(holds_178, FIELDSTOP_OUT_OF_RANGE == 3);
HOLDS(holds_179, FIELDSTOP_NOT_FINITE == 4);
HOLDS(holds_180, FIELDSTOP_OVERFLOW == 5);
HOLDS(holds_181, FIELDSTOP_NO_ROOM == 6);
HOLDS(holds_182, FIELDSTOP_UNDEFINED == 7);
HOLDS(holds_183, FIELDSTOP_NEVER_REACHED == 8);
HOLDS(holds_184, FIELDSTOP_NEVER_LEFT == 9);
HOLDS(holds_185, FIELDSTOP_NO_RECORD == 10);
HOLDS(holds_186, FIELDSTOP_NEWER_RECORD == 11);
HOLDS(holds_187, FIELDSTOP_STORAGE == 12);
HOLDS(holds_188, FIELDSTOP_EQUIDISTANT == 0);
HOLDS(holds_189, FIELDSTOP_RECTILINEAR == 1);
HOLDS(holds_190, FIELDSTOP_VISUAL_FOCAL_LENGTH == 1);
HOLDS(holds_191, FIELDSTOP_VISUAL_FOCAL_RATIO == 2);
HOLDS(holds_192, FIELDSTOP_VISUAL_MAGNIFICATION == 4);
HOLDS(holds_193, FIELDSTOP_VISUAL_EXIT_PUPIL == 8);
HOLDS(holds_194, FIELDSTOP_VISUAL_TRUE_FIELD == 16);
HOLDS(holds_195, FIELDSTOP_VISUAL_RESOLUTION == 32);
HOLDS(holds_196, FIELDSTOP_VISUAL_DAWES_LIMIT == 64);
HOLDS(holds_197, FIELDSTOP_VISUAL_LOWEST_MAGNIFICATION == 128);
HOLDS(holds_198, FIELDSTOP_VISUAL_RESOLVING_MAGNIFICATION == 256);
HOLDS(holds_199, FIELDSTOP_VISUAL_EFFECTIVE_APERTURE == 512);
HOLDS(holds_200, FIELDSTOP_VISUAL_LIMITING_MAGNITUDE == 1024);
HOLDS(holds_201, FIELDSTOP_VISUAL_SURFACE_BRIGHTNESS == 2048);
HOLDS(holds_202, FIELDSTOP_VISUAL_ALL == 4095);
HOLDS(holds_203, FIELDSTOP_VISUAL_FACT_WIDE_EXIT_PUPIL == 1);
HOLDS(holds_204, FIELDSTOP_VISUAL_FACT_EMPTY_MAGNIFICATION == 2);
HOLDS(holds_205, FIELDSTOP_VISUAL_FACT_FIELD_FROM_APPARENT == 4);
HOLDS(holds_206, FIELDSTOP_VISUAL_FACT_SEEING_LIMITED == 8);
HOLDS(holds_207, FIELDSTOP_CAMERA_FOCAL_LENGTH == 1);
HOLDS(holds_208, FIELDSTOP_CAMERA_FOCAL_RATIO == 2);
HOLDS(holds_209, FIELDSTOP_CAMERA_T_NUMBER == 4);
HOLDS(holds_210, FIELDSTOP_CAMERA_FRAME_WIDTH == 8);
HOLDS(holds_211, FIELDSTOP_CAMERA_FRAME_HEIGHT == 16);
HOLDS(holds_212, FIELDSTOP_CAMERA_PIXEL_SCALE == 32);
HOLDS(holds_213, FIELDSTOP_CAMERA_PLATE_SCALE == 64);
HOLDS(holds_214, FIELDSTOP_CAMERA_STAR_FWHM == 128);
HOLDS(holds_215, FIELDSTOP_CAMERA_PIXELS_PER_FWHM == 256);
HOLDS(holds_216, FIELDSTOP_CAMERA_CUTOFF_FREQUENCY == 512);
HOLDS(holds_217, FIELDSTOP_CAMERA_NYQUIST_PIXEL == 1024);
HOLDS(holds_218, FIELDSTOP_CAMERA_DIAGONAL == 2048);
HOLDS(holds_219, FIELDSTOP_CAMERA_ALL == 4095);
HOLDS(holds_220, FIELDSTOP_CAMERA_FACT_COARSE_SAMPLING == 1);
HOLDS(holds_221, FIELDSTOP_CAMERA_FACT_FINE_SAMPLING == 2);
HOLDS(holds_222, FIELDSTOP_PURPOSE_FRAME == 0);
HOLDS(holds_223, FIELDSTOP_PURPOSE_SPLIT == 1);
HOLDS(holds_224, FIELDSTOP_PURPOSE_EXIT_PUPIL == 2);
HOLDS(holds_225, FIELDSTOP_NO_AMPLIFIER == 255);
HOLDS(holds_226, FIELDSTOP_VISUAL_CHOICE_MAGNIFICATION == 1);
HOLDS(holds_227, FIELDSTOP_VISUAL_CHOICE_EXIT_PUPIL == 2);
HOLDS(holds_228, FIELDSTOP_VISUAL_CHOICE_TRUE_FIELD == 4);
HOLDS(holds_229, FIELDSTOP_VISUAL_CHOICE_FIT == 8);
HOLDS(holds_230, FIELDSTOP_VISUAL_CHOICE_FACT_WIDE_EXIT_PUPIL == 1);
HOLDS(holds_231, FIELDSTOP_VISUAL_CHOICE_FACT_EMPTY_MAGNIFICATION == 2);
HOLDS(holds_232, FIELDSTOP_VISUAL_CHOICE_FACT_FIELD_FROM_APPARENT == 4);
HOLDS(holds_233, FIELDSTOP_VISUAL_CHOICE_FACT_SEEING_SHOWS == 8);
HOLDS(holds_234, FIELDSTOP_VISUAL_CHOICE_FACT_SERVES == 16);
HOLDS(holds_235, FIELDSTOP_VISUAL_CHOICE_FACT_UNDER_RESOLUTION == 32);
HOLDS(holds_236, FIELDSTOP_VISUAL_CHOICE_FACT_UNDER_SEEING == 64);
HOLDS(holds_237, FIELDSTOP_CAMERA_CHOICE_FRAME_WIDTH == 1);
HOLDS(holds_238, FIELDSTOP_CAMERA_CHOICE_FRAME_HEIGHT == 2);
HOLDS(holds_239, FIELDSTOP_CAMERA_CHOICE_PIXEL_SCALE == 4);
HOLDS(holds_240, FIELDSTOP_CAMERA_CHOICE_PIXELS_PER_FWHM == 8);
HOLDS(holds_241, FIELDSTOP_CAMERA_CHOICE_TILES == 16);
HOLDS(holds_242, FIELDSTOP_CAMERA_CHOICE_FACT_COARSE_SAMPLING == 1);
HOLDS(holds_243, FIELDSTOP_CAMERA_CHOICE_FACT_FINE_SAMPLING == 2);
HOLDS(holds_244, FIELDSTOP_CAMERA_CHOICE_FACT_FITS == 4);
HOLDS(holds_245, FIELDSTOP_FOCUS_FOCAL_RATIO == 1);
HOLDS(holds_246, FIELDSTOP_FOCUS_DEPTH == 2);
HOLDS(holds_247, FIELDSTOP_FOCUS_DEPTH_STEPS == 4);
HOLDS(holds_248, FIELDSTOP_FOCUS_TEMPERATURE == 8);
HOLDS(holds_249, FIELDSTOP_FOCUS_BLUR == 16);
HOLDS(holds_250, FIELDSTOP_FOCUS_BLUR_ANGLE == 32);
HOLDS(holds_251, FIELDSTOP_FOCUS_WAVEFRONT == 64);
HOLDS(holds_252, FIELDSTOP_FOCUS_ALL == 127);
HOLDS(holds_253, FIELDSTOP_FOCUS_FACT_COARSE_STEP == 1);
HOLDS(holds_254, FIELDSTOP_FOCUS_FACT_OUT_OF_FOCUS == 2);
HOLDS(holds_255, FIELDSTOP_NEWTONIAN_DIAGONAL == 1);
HOLDS(holds_256, FIELDSTOP_NEWTONIAN_DIAGONAL_OFFSET == 2);
HOLDS(holds_257, FIELDSTOP_NEWTONIAN_OBSTRUCTION == 4);
HOLDS(holds_258, FIELDSTOP_NEWTONIAN_BEAM == 8);
HOLDS(holds_259, FIELDSTOP_NEWTONIAN_BEAM_SHIFT == 16);
HOLDS(holds_260, FIELDSTOP_NEWTONIAN_EDGE_LIGHT == 32);
HOLDS(holds_261, FIELDSTOP_NEWTONIAN_EYEPIECE_HEIGHT == 64);
HOLDS(holds_262, FIELDSTOP_NEWTONIAN_GREATEST_HEIGHT == 128);
HOLDS(holds_263, FIELDSTOP_NEWTONIAN_ALL == 255);
HOLDS(holds_264, FIELDSTOP_NEWTONIAN_FACT_SMALL_DIAGONAL == 1);
HOLDS(holds_265, FIELDSTOP_NEWTONIAN_FACT_WIDER_THAN_TOLD == 2);
HOLDS(holds_266, FIELDSTOP_NEWTONIAN_FACT_HIGH_EYEPIECE == 4);
HOLDS(holds_267, FIELDSTOP_NEWTONIAN_FACT_HIGH_REACHED == 8);
HOLDS(holds_268, FIELDSTOP_TWO_MIRROR_SECONDARY_MAGNIFICATION == 1);
HOLDS(holds_269, FIELDSTOP_TWO_MIRROR_SEPARATION == 2);
HOLDS(holds_270, FIELDSTOP_TWO_MIRROR_SECONDARY == 4);
HOLDS(holds_271, FIELDSTOP_TWO_MIRROR_SECONDARY_RADIUS == 8);
HOLDS(holds_272, FIELDSTOP_TWO_MIRROR_OBSTRUCTION == 16);
HOLDS(holds_273, FIELDSTOP_TWO_MIRROR_LENGTH == 32);
HOLDS(holds_274, FIELDSTOP_TWO_MIRROR_LENGTH_SHARE == 64);
HOLDS(holds_275, FIELDSTOP_TWO_MIRROR_ALL == 127);
HOLDS(holds_276, FIELDSTOP_TWO_MIRROR_FACT_WIDER_THAN_TOLD == 1);
HOLDS(holds_277, FIELDSTOP_KIND_TELESCOPE == 0);
HOLDS(holds_278, FIELDSTOP_KIND_EYEPIECE == 1);
HOLDS(holds_279, FIELDSTOP_KIND_AMPLIFIER == 2);
HOLDS(holds_280, FIELDSTOP_KIND_CAMERA == 3);
HOLDS(holds_281, FIELDSTOP_KIND_OBSERVER == 4);
HOLDS(holds_282, FIELDSTOP_KIND_SITE == 5);
HOLDS(holds_283, FIELDSTOP_NONE_IN_USE == 255);
HOLDS(holds_284, FIELDSTOP_RECORD_LEAST == 28);
HOLDS(holds_285, FIELDSTOP_RECORD_MOST == 976);
HOLDS(holds_286, FIELDSTOP_KEEP_NEWER == 0);
HOLDS(holds_287, FIELDSTOP_REPLACE_NEWER == 1);
HOLDS(holds_288, FIELDSTOP_ANGLE_BY_SIZE == 0);
HOLDS(holds_289, FIELDSTOP_ANGLE_DECIMAL_DEGREES == 1);
HOLDS(holds_290, FIELDSTOP_ANGLE_DEGREES_MINUTES == 2);
HOLDS(holds_291, FIELDSTOP_ANGLE_MINUTES_SECONDS == 3);
HOLDS(holds_292, FIELDSTOP_ANGLE_DECIMAL_SECONDS == 4);
HOLDS(holds_293, FIELDSTOP_UNIT_NONE == 0);
HOLDS(holds_294, FIELDSTOP_UNIT_DEGREE == 1);
HOLDS(holds_295, FIELDSTOP_UNIT_MINUTE == 2);
HOLDS(holds_296, FIELDSTOP_UNIT_SECOND == 3);
HOLDS(holds_297, FIELDSTOP_UNIT_DECIMAL_DEGREE == 4);
HOLDS(holds_298, FIELDSTOP_UNIT_METRE == 5);
HOLDS(holds_299, FIELDSTOP_UNIT_MILLIMETRE == 6);
HOLDS(holds_300, FIELDSTOP_UNIT_MICROMETRE == 7);
HOLDS(holds_301, FIELDSTOP_UNIT_NANOMETRE == 8);
HOLDS(holds_302, FIELDSTOP_UNIT_TIMES == 9);
HOLDS(holds_303, FIELDSTOP_UNIT_PERCENT == 10);
HOLDS(holds_304, FIELDSTOP_UNIT_MAGNITUDE == 11);
HOLDS(holds_305, FIELDSTOP_UNIT_FOCAL_RATIO == 12);
HOLDS(holds_306, FIELDSTOP_UNIT_PIXEL == 13);
HOLDS(holds_307, FIELDSTOP_UNIT_SECOND_PER_PIXEL == 14);
HOLDS(holds_308, FIELDSTOP_UNIT_SECOND_PER_MILLIMETRE == 15);
HOLDS(holds_309, FIELDSTOP_UNIT_SECOND_PER_TIME == 16);
HOLDS(holds_310, FIELDSTOP_UNIT_PER_MILLIMETRE == 17);
HOLDS(holds_311, FIELDSTOP_UNIT_TIME == 18);
HOLDS(holds_312, FIELDSTOP_UNIT_STEP == 19);
HOLDS(holds_313, FIELDSTOP_UNIT_KELVIN == 20);
HOLDS(holds_314, FIELDSTOP_UNIT_WATT == 21);
HOLDS(holds_315, FIELDSTOP_VISUAL_ROWS == 16);
HOLDS(holds_316, FIELDSTOP_VISUAL_ROW_MAGNIFICATION == 0);
HOLDS(holds_317, FIELDSTOP_VISUAL_ROW_TRUE_FIELD == 1);
HOLDS(holds_318, FIELDSTOP_VISUAL_ROW_EXIT_PUPIL == 2);
HOLDS(holds_319, FIELDSTOP_VISUAL_ROW_RESOLUTION == 3);
HOLDS(holds_320, FIELDSTOP_VISUAL_ROW_FAINTEST_STAR == 4);
HOLDS(holds_321, FIELDSTOP_VISUAL_ROW_SURFACE_BRIGHTNESS == 5);
HOLDS(holds_322, FIELDSTOP_VISUAL_ROW_FOCAL_RATIO == 6);
HOLDS(holds_323, FIELDSTOP_VISUAL_ROW_FOCAL_LENGTH == 7);
HOLDS(holds_324, FIELDSTOP_VISUAL_ROW_LOWEST_MAGNIFICATION == 8);
HOLDS(holds_325, FIELDSTOP_VISUAL_ROW_RESOLVING_MAGNIFICATION == 9);
HOLDS(holds_326, FIELDSTOP_VISUAL_ROW_DAWES_LIMIT == 10);
HOLDS(holds_327, FIELDSTOP_VISUAL_ROW_EFFECTIVE_APERTURE == 11);
HOLDS(holds_328, FIELDSTOP_VISUAL_ROW_WIDE_EXIT_PUPIL == 12);
HOLDS(holds_329, FIELDSTOP_VISUAL_ROW_EMPTY_MAGNIFICATION == 13);
HOLDS(holds_330, FIELDSTOP_VISUAL_ROW_FIELD_FROM_APPARENT == 14);
HOLDS(holds_331, FIELDSTOP_VISUAL_ROW_SEEING_LIMITED == 15);
HOLDS(holds_332, FIELDSTOP_CAMERA_ROWS == 14);
HOLDS(holds_333, FIELDSTOP_CAMERA_ROW_FRAME_WIDTH == 0);
HOLDS(holds_334, FIELDSTOP_CAMERA_ROW_FRAME_HEIGHT == 1);
HOLDS(holds_335, FIELDSTOP_CAMERA_ROW_PIXEL_SCALE == 2);
HOLDS(holds_336, FIELDSTOP_CAMERA_ROW_STAR_WIDTH == 3);
HOLDS(holds_337, FIELDSTOP_CAMERA_ROW_STAR_PIXELS == 4);
HOLDS(holds_338, FIELDSTOP_CAMERA_ROW_FOCAL_RATIO == 5);
HOLDS(holds_339, FIELDSTOP_CAMERA_ROW_T_NUMBER == 6);
HOLDS(holds_340, FIELDSTOP_CAMERA_ROW_FOCAL_LENGTH == 7);
HOLDS(holds_341, FIELDSTOP_CAMERA_ROW_PLATE_SCALE == 8);
HOLDS(holds_342, FIELDSTOP_CAMERA_ROW_DIAGONAL == 9);
HOLDS(holds_343, FIELDSTOP_CAMERA_ROW_CUTOFF == 10);
HOLDS(holds_344, FIELDSTOP_CAMERA_ROW_NYQUIST_PIXEL == 11);
HOLDS(holds_345, FIELDSTOP_CAMERA_ROW_COARSE_SAMPLING == 12);
HOLDS(holds_346, FIELDSTOP_CAMERA_ROW_FINE_SAMPLING == 13);
HOLDS(holds_347, FIELDSTOP_CAUTION_HIGH_EYEPIECE == 0);
HOLDS(holds_348, FIELDSTOP_CAUTION_SUN == 1);
HOLDS(holds_349, FIELDSTOP_FOCUS_ROWS == 9);
HOLDS(holds_350, FIELDSTOP_FOCUS_ROW_DEPTH_OF_FOCUS == 0);
HOLDS(holds_351, FIELDSTOP_FOCUS_ROW_DEPTH_STEPS == 1);
HOLDS(holds_352, FIELDSTOP_FOCUS_ROW_TEMPERATURE == 2);
HOLDS(holds_353, FIELDSTOP_FOCUS_ROW_BLUR == 3);
HOLDS(holds_354, FIELDSTOP_FOCUS_ROW_BLUR_ANGLE == 4);
HOLDS(holds_355, FIELDSTOP_FOCUS_ROW_WAVEFRONT == 5);
HOLDS(holds_356, FIELDSTOP_FOCUS_ROW_FOCAL_RATIO == 6);
HOLDS(holds_357, FIELDSTOP_FOCUS_ROW_COARSE_STEP == 7);
HOLDS(holds_358, FIELDSTOP_FOCUS_ROW_OUT_OF_FOCUS == 8);
HOLDS(holds_359, FIELDSTOP_NEWTONIAN_ROWS == 12);
HOLDS(holds_360, FIELDSTOP_NEWTONIAN_ROW_DIAGONAL == 0);
HOLDS(holds_361, FIELDSTOP_NEWTONIAN_ROW_DIAGONAL_OFFSET == 1);
HOLDS(holds_362, FIELDSTOP_NEWTONIAN_ROW_OBSTRUCTION == 2);
HOLDS(holds_363, FIELDSTOP_NEWTONIAN_ROW_EDGE_LIGHT == 3);
HOLDS(holds_364, FIELDSTOP_NEWTONIAN_ROW_EYEPIECE_HEIGHT == 4);
HOLDS(holds_365, FIELDSTOP_NEWTONIAN_ROW_GREATEST_HEIGHT == 5);
HOLDS(holds_366, FIELDSTOP_NEWTONIAN_ROW_BEAM == 6);
HOLDS(holds_367, FIELDSTOP_NEWTONIAN_ROW_BEAM_SHIFT == 7);
HOLDS(holds_368, FIELDSTOP_NEWTONIAN_ROW_SMALL_DIAGONAL == 8);
HOLDS(holds_369, FIELDSTOP_NEWTONIAN_ROW_WIDER_THAN_TOLD == 9);
HOLDS(holds_370, FIELDSTOP_NEWTONIAN_ROW_HIGH_EYEPIECE == 10);
HOLDS(holds_371, FIELDSTOP_NEWTONIAN_ROW_HIGH_REACHED == 11);
HOLDS(holds_372, FIELDSTOP_TWO_MIRROR_ROWS == 8);
HOLDS(holds_373, FIELDSTOP_TWO_MIRROR_ROW_SEPARATION == 0);
HOLDS(holds_374, FIELDSTOP_TWO_MIRROR_ROW_SECONDARY == 1);
HOLDS(holds_375, FIELDSTOP_TWO_MIRROR_ROW_RADIUS == 2);
HOLDS(holds_376, FIELDSTOP_TWO_MIRROR_ROW_OBSTRUCTION == 3);
HOLDS(holds_377, FIELDSTOP_TWO_MIRROR_ROW_SECONDARY_MAGNIFICATION == 4);
HOLDS(holds_378, FIELDSTOP_TWO_MIRROR_ROW_LENGTH == 5);
HOLDS(holds_379, FIELDSTOP_TWO_MIRROR_ROW_LENGTH_SHARE == 6);
HOLDS(holds_380, FIELDSTOP_TWO_MIRROR_ROW_WIDER_THAN_TOLD == 7);
HOLDS(holds_381, FIELDSTOP_ENTRY_LENGTH == 0);
HOLDS(holds_382, FIELDSTOP_ENTRY_FOCAL_LENGTH == 1);
HOLDS(holds_383, FIELDSTOP_ENTRY_PIXEL_PITCH == 2);
HOLDS(holds_384, FIELDSTOP_ENTRY_WAVELENGTH == 3);
HOLDS(holds_385, FIELDSTOP_ENTRY_ANGLE == 4);
HOLDS(holds_386, FIELDSTOP_ENTRY_SMALL_ANGLE == 5);
HOLDS(holds_387, FIELDSTOP_ENTRY_RATIO == 6);
HOLDS(holds_388, FIELDSTOP_ENTRY_FOCAL_RATIO == 7);
HOLDS(holds_389, FIELDSTOP_ENTRY_MAGNIFICATION == 8);
HOLDS(holds_390, FIELDSTOP_ENTRY_PERCENT == 9);
HOLDS(holds_391, FIELDSTOP_ENTRY_MAGNITUDE == 10);
HOLDS(holds_392, FIELDSTOP_ENTRY_LATITUDE == 11);
HOLDS(holds_393, FIELDSTOP_ENTRY_LONGITUDE == 12);
HOLDS(holds_394, FIELDSTOP_ENTRY_DECLINATION == 13);
HOLDS(holds_395, FIELDSTOP_ENTRY_RIGHT_ASCENSION == 14);
HOLDS(holds_396, FIELDSTOP_ENTRY_TIME_OF_DAY == 15);
HOLDS(holds_397, FIELDSTOP_ENTRY_DURATION == 16);
HOLDS(holds_398, FIELDSTOP_ENTRY_COUNT == 17);
HOLDS(holds_399, FIELDSTOP_ENTRY_COMPLETE == 0);
HOLDS(holds_400, FIELDSTOP_ENTRY_PARTIAL == 1);
HOLDS(holds_401, FIELDSTOP_ENTRY_WRONG == 2);
HOLDS(holds_402, FIELDSTOP_ENTRY_FINE == 0);
HOLDS(holds_403, FIELDSTOP_ENTRY_ENDED == 1);
HOLDS(holds_404, FIELDSTOP_ENTRY_UNEXPECTED == 2);
HOLDS(holds_405, FIELDSTOP_ENTRY_TOO_LARGE == 3);
HOLDS(holds_406, FIELDSTOP_ENTRY_SIXTY == 4);
HOLDS(holds_407, FIELDSTOP_ENTRY_NO_APERTURE == 5);

typedef void (*any_function)(void);
static volatile any_function present;

int main(void)
{
    {
        fieldstop_status (*function)(void *context, uint32_t offset, uint8_t *bytes, uint16_t length) = (fieldstop_read)0;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(void *context, uint32_t offset, const uint8_t *bytes, uint16_t length) = (fieldstop_write)0;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(void *context, uint32_t offset, uint32_t length) = (fieldstop_erase)0;
        present = (any_function)function;
    }
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
        fieldstop_status (*function)(const struct fieldstop_site *) = fieldstop_site_check;
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
        fieldstop_status (*function)(const struct fieldstop_newtonian_layout *) = fieldstop_newtonian_layout_check;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_two_mirror_layout *) = fieldstop_two_mirror_layout_check;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_telescope *, const struct fieldstop_focuser *, const struct fieldstop_observer *, uint32_t, struct fieldstop_focus_readout *) = fieldstop_focus_readout_compute;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_telescope *, const struct fieldstop_newtonian_layout *, uint32_t, struct fieldstop_newtonian_readout *) = fieldstop_newtonian_readout_compute;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_telescope *, const struct fieldstop_two_mirror_layout *, uint32_t, struct fieldstop_two_mirror_readout *) = fieldstop_two_mirror_readout_compute;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint8_t *, uint16_t) = fieldstop_record_begin;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const uint8_t *, uint16_t) = fieldstop_record_check;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const uint8_t *, uint16_t, uint16_t *) = fieldstop_record_get_length;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const uint8_t *, uint16_t, uint8_t, uint8_t *) = fieldstop_record_get_count;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const uint8_t *, uint16_t, uint8_t, uint8_t, struct fieldstop_equipment_name *) = fieldstop_record_get_name;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const uint8_t *, uint16_t, struct fieldstop_in_use *) = fieldstop_record_get_in_use;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const uint8_t *, uint16_t, uint8_t, struct fieldstop_telescope *) = fieldstop_record_get_telescope;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const uint8_t *, uint16_t, uint8_t, struct fieldstop_eyepiece *) = fieldstop_record_get_eyepiece;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const uint8_t *, uint16_t, uint8_t, uint32_t *) = fieldstop_record_get_amplifier;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const uint8_t *, uint16_t, uint8_t, struct fieldstop_camera *) = fieldstop_record_get_camera;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const uint8_t *, uint16_t, uint8_t, struct fieldstop_observer *) = fieldstop_record_get_observer;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const uint8_t *, uint16_t, uint8_t, struct fieldstop_site *) = fieldstop_record_get_site;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint8_t *, uint16_t, uint8_t, const struct fieldstop_telescope *, const struct fieldstop_equipment_name *) = fieldstop_record_put_telescope;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint8_t *, uint16_t, uint8_t, const struct fieldstop_eyepiece *, const struct fieldstop_equipment_name *) = fieldstop_record_put_eyepiece;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint8_t *, uint16_t, uint8_t, uint32_t, const struct fieldstop_equipment_name *) = fieldstop_record_put_amplifier;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint8_t *, uint16_t, uint8_t, const struct fieldstop_camera *, const struct fieldstop_equipment_name *) = fieldstop_record_put_camera;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint8_t *, uint16_t, uint8_t, const struct fieldstop_observer *, const struct fieldstop_equipment_name *) = fieldstop_record_put_observer;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint8_t *, uint16_t, uint8_t, const struct fieldstop_site *, const struct fieldstop_equipment_name *) = fieldstop_record_put_site;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint8_t *, uint16_t, const struct fieldstop_in_use *) = fieldstop_record_put_in_use;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(uint8_t *, uint16_t, uint8_t, uint8_t) = fieldstop_record_remove;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_slot_pair *) = fieldstop_slot_pair_check;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_slot_pair *, fieldstop_read, void *, uint8_t *, uint16_t, uint16_t *) = fieldstop_store_load;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_slot_pair *, fieldstop_read, fieldstop_write, fieldstop_erase, void *, const uint8_t *, uint16_t, uint8_t) = fieldstop_store_save;
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
    {
        const char * (*function)(uint8_t) = fieldstop_text_caution;
        present = (any_function)function;
    }
    {
        uint8_t (*function)(const char *, uint8_t) = fieldstop_text_caution_lines;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const char *, uint8_t, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_caution_line;
        present = (any_function)function;
    }
    {
        const char *const * (*function)(void) = fieldstop_text_focus_labels;
        present = (any_function)function;
    }
    {
        const char *const * (*function)(void) = fieldstop_text_focus_labels_short;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_focus_readout *, const char *const *, const struct fieldstop_text_style *, uint8_t, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_focus_line;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_focus_readout *, uint8_t, const struct fieldstop_text_style *, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_focus_value;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_focus_readout *, uint8_t, const struct fieldstop_text_style *, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_focus_number;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_focus_readout *, uint8_t, const struct fieldstop_text_style *, char *, uint16_t, uint16_t *) = fieldstop_text_focus_unit;
        present = (any_function)function;
    }
    {
        const char *const * (*function)(void) = fieldstop_text_newtonian_labels;
        present = (any_function)function;
    }
    {
        const char *const * (*function)(void) = fieldstop_text_newtonian_labels_short;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_newtonian_readout *, const char *const *, const struct fieldstop_text_style *, uint8_t, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_newtonian_line;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_newtonian_readout *, uint8_t, const struct fieldstop_text_style *, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_newtonian_value;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_newtonian_readout *, uint8_t, const struct fieldstop_text_style *, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_newtonian_number;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_newtonian_readout *, uint8_t, const struct fieldstop_text_style *, char *, uint16_t, uint16_t *) = fieldstop_text_newtonian_unit;
        present = (any_function)function;
    }
    {
        const char *const * (*function)(void) = fieldstop_text_two_mirror_labels;
        present = (any_function)function;
    }
    {
        const char *const * (*function)(void) = fieldstop_text_two_mirror_labels_short;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_two_mirror_readout *, const char *const *, const struct fieldstop_text_style *, uint8_t, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_two_mirror_line;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_two_mirror_readout *, uint8_t, const struct fieldstop_text_style *, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_two_mirror_value;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_two_mirror_readout *, uint8_t, const struct fieldstop_text_style *, uint8_t, char *, uint16_t, uint16_t *) = fieldstop_text_two_mirror_number;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const struct fieldstop_two_mirror_readout *, uint8_t, const struct fieldstop_text_style *, char *, uint16_t, uint16_t *) = fieldstop_text_two_mirror_unit;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const char *, uint16_t, uint8_t, uint32_t, const struct fieldstop_text_style *, uint32_t *) = fieldstop_entry_read;
        present = (any_function)function;
    }
    {
        fieldstop_status (*function)(const char *, uint16_t, uint8_t, uint32_t, const struct fieldstop_text_style *, struct fieldstop_entry_state *) = fieldstop_entry_check;
        present = (any_function)function;
    }
    return present == 0;
}
