/*
 * A call of every function of the header that is not a readout of the registry, with usual arguments. READ gives no
 * status. k counts the telescopes, the lines and rows of all pages are taken in turn.
 */
READ(cause_text, 2)
READ(version, 0)
READ(abi_1, 0)

CALL(telescope_check, P(&telescope))
CALL(eyepiece_check, P(&eyepiece))
CALL(camera_check, P(&camera))
CALL(observer_check, P(&observer))
CALL(visual_readout_compute, P(&telescope), P(&eyepiece), P(&observer), FIELDSTOP_VISUAL_ALL, P(&out))
CALL(camera_readout_compute, P(&telescope), P(&camera), P(&observer), FIELDSTOP_CAMERA_ALL, P(&out))

READ(text_style_ascii, 0)
READ(text_style_utf8, 0)
READ(text_style_hd44780_a00, 0)
READ(text_style_hd44780_a02, 0)
CALL(text_count, camera.columns, FIELDSTOP_UNIT_PIXEL, STYLE, 9, TEXT)
CALL(text_length_mm, visual.exit_pupil_um, 1, STYLE, 9, TEXT)
CALL(text_length_um, camera.pixel_nm, 2, STYLE, 9, TEXT)
CALL(text_ratio, frame.pixels_per_fwhm_q16, 2, STYLE, 9, TEXT)
CALL(text_magnification, visual.magnification_q16, 1, STYLE, 9, TEXT)
CALL(text_focal_ratio, visual.focal_ratio_q16, 1, STYLE, 9, TEXT)
CALL(text_percent, telescope.throughput_q16, 0, STYLE, 9, TEXT)
CALL(text_arcseconds, visual.resolution_uas, 2, STYLE, 9, TEXT)
CALL(text_magnitude, (uint32_t)visual.limiting_magnitude_mmag, 1, STYLE, 9, TEXT)
CALL(text_angle, visual.true_field_mas, FIELDSTOP_ANGLE_BY_SIZE, 0, STYLE, 9, TEXT)
CALL(text_unit, k % (FIELDSTOP_UNIT_WATT + 1), STYLE, TEXT)

READ(text_visual_labels, 0)
READ(text_visual_labels_short, 0)
CALL(text_visual_line, P(&visual), P(fieldstop_text_visual_labels()), STYLE, 20, k % FIELDSTOP_VISUAL_ROWS, TEXT)
CALL(text_visual_value, P(&visual), k % FIELDSTOP_VISUAL_ROWS, STYLE, 9, TEXT)
CALL(text_visual_number, P(&visual), k % FIELDSTOP_VISUAL_ROWS, STYLE, 9, TEXT)
CALL(text_visual_unit, P(&visual), k % FIELDSTOP_VISUAL_ROWS, STYLE, TEXT)

READ(text_camera_labels, 0)
READ(text_camera_labels_short, 0)
CALL(text_camera_line, P(&frame), P(fieldstop_text_camera_labels()), STYLE, 20, k % FIELDSTOP_CAMERA_ROWS, TEXT)
CALL(text_camera_value, P(&frame), k % FIELDSTOP_CAMERA_ROWS, STYLE, 9, TEXT)
CALL(text_camera_number, P(&frame), k % FIELDSTOP_CAMERA_ROWS, STYLE, 9, TEXT)
CALL(text_camera_unit, P(&frame), k % FIELDSTOP_CAMERA_ROWS, STYLE, TEXT)

CALL(text_changed, P(shown), 20, P(line), 20, STYLE, P(&out))
