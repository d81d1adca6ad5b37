/* Made from the registry of tests/functions: do not edit. Each row draws its arguments and calls. */
#if HAS_ROW(0)
ROW(bam_from_mas, DRAW(1u, 648000000u, 2147483648u, 2147483647u), fieldstop_bam_from_mas_fx((int32_t)a[0], &result))
#endif
#if HAS_ROW(1)
ROW(mas_from_bam, DRAW(1048576u, 4294967295u, 0u, 4294967295u), fieldstop_mas_from_bam_fx(a[0], &result))
#endif
#if HAS_ROW(2)
ROW(signed_mas_from_bam, DRAW(1u, 2147483647u, 2147483648u, 2147483647u), fieldstop_signed_mas_from_bam_fx((int32_t)a[0], (int32_t *)&result))
#endif
#if HAS_ROW(3)
ROW(bam_from_day_ms, DRAW(1u, 86399999u, 0u, 86399999u), fieldstop_bam_from_day_ms_fx(a[0], &result))
#endif
#if HAS_ROW(4)
ROW(day_ms_from_bam, DRAW(1048576u, 4294967295u, 0u, 4294967295u), fieldstop_day_ms_from_bam_fx(a[0], &result))
#endif
#if HAS_ROW(5)
ROW(milli_from_q16, DRAW(6554u, 30000000u, 0u, 4294967295u), fieldstop_milli_from_q16_fx(a[0], &result))
#endif
#if HAS_ROW(6)
ROW(q16_from_milli, DRAW(100u, 500000u, 0u, 4294967295u), fieldstop_q16_from_milli_fx(a[0], &result))
#endif
#if HAS_ROW(7)
ROW(focal_ratio, DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(50000u, 500000u, 0u, 4294967295u), fieldstop_focal_ratio_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(8)
ROW(amplified_focal_length, DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(26000u, 330000u, 0u, 4294967295u), fieldstop_amplified_focal_length_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(9)
ROW(amplification, DRAW(20000u, 200000u, 2147483648u, 2147483647u) DRAW(10000u, 150000u, 0u, 4294967295u), fieldstop_amplification_fx((int32_t)a[0], a[1], &result))
#endif
#if HAS_ROW(10)
ROW(magnification, DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(3000u, 55000u, 0u, 4294967295u), fieldstop_magnification_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(11)
ROW(exit_pupil, DRAW(50000u, 500000u, 0u, 4294967295u) DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(3000u, 55000u, 0u, 4294967295u), fieldstop_exit_pupil_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(12)
ROW(eyepiece_for_exit_pupil, DRAW(500u, 8000u, 0u, 4294967295u) DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(50000u, 500000u, 0u, 4294967295u), fieldstop_eyepiece_for_exit_pupil_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(13)
ROW(eyepiece_for_magnification, DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(655360u, 32768000u, 0u, 4294967295u), fieldstop_eyepiece_for_magnification_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(14)
ROW(true_field_from_stop, DRAW(2000u, 47000u, 0u, 4294967295u) DRAW(200000u, 5000000u, 0u, 4294967295u), fieldstop_true_field_from_stop_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(15)
ROW(true_field_rectilinear, DRAW(108000000u, 432000000u, 0u, 647999999u) DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(3000u, 55000u, 0u, 4294967295u), fieldstop_true_field_rectilinear_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(16)
ROW(true_field_equidistant, DRAW(108000000u, 432000000u, 0u, 4294967295u) DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(3000u, 55000u, 0u, 4294967295u), fieldstop_true_field_equidistant_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(17)
ROW(frame_field, DRAW(1000u, 15000u, 0u, 4294967295u) DRAW(500u, 10000u, 0u, 4294967295u) DRAW(200000u, 5000000u, 0u, 4294967295u), fieldstop_frame_field_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(18)
ROW(plate_scale, DRAW(200000u, 5000000u, 0u, 4294967295u), fieldstop_plate_scale_fx(a[0], &result))
#endif
#if HAS_ROW(19)
ROW(pixel_scale, DRAW(1000u, 15000u, 0u, 4294967295u) DRAW(200000u, 5000000u, 0u, 4294967295u), fieldstop_pixel_scale_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(20)
ROW(focal_length_for_field, DRAW(2000u, 50000u, 0u, 4294967295u) DRAW(600000u, 40000000u, 0u, 647999999u), fieldstop_focal_length_for_field_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(21)
ROW(tiles, DRAW(100000u, 40000000u, 0u, 4294967295u) DRAW(100000u, 40000000u, 0u, 4294967295u) DRAW(1000u, 100000u, 0u, 4294967295u), fieldstop_tiles_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(22)
ROW(rayleigh_limit, DRAW(50000u, 500000u, 0u, 4294967295u) DRAW(400u, 900u, 0u, 4294967295u), fieldstop_rayleigh_limit_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(23)
ROW(rayleigh_limit_obstructed, DRAW(50000u, 500000u, 0u, 4294967295u) DRAW(10000u, 200000u, 0u, 4294967295u) DRAW(400u, 900u, 0u, 4294967295u), fieldstop_rayleigh_limit_obstructed_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(24)
ROW(dawes_limit, DRAW(50000u, 500000u, 0u, 4294967295u), fieldstop_dawes_limit_fx(a[0], &result))
#endif
#if HAS_ROW(25)
ROW(sparrow_limit, DRAW(50000u, 500000u, 0u, 4294967295u) DRAW(400u, 900u, 0u, 4294967295u), fieldstop_sparrow_limit_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(26)
ROW(airy_fwhm, DRAW(50000u, 500000u, 0u, 4294967295u) DRAW(400u, 900u, 0u, 4294967295u), fieldstop_airy_fwhm_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(27)
ROW(airy_radius, DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(50000u, 500000u, 0u, 4294967295u) DRAW(400u, 900u, 0u, 4294967295u), fieldstop_airy_radius_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(28)
ROW(cutoff_frequency, DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(50000u, 500000u, 0u, 4294967295u) DRAW(400u, 900u, 0u, 4294967295u), fieldstop_cutoff_frequency_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(29)
ROW(fried_parameter, DRAW(300000u, 10000000u, 0u, 4294967295u) DRAW(400u, 900u, 0u, 4294967295u), fieldstop_fried_parameter_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(30)
ROW(contrast, DRAW(3000u, 65536u, 0u, 65536u) DRAW(6000u, 30000u, 0u, 65535u), fieldstop_contrast_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(31)
ROW(strehl_ratio, DRAW(5u, 200u, 0u, 4294967295u) DRAW(400u, 900u, 0u, 4294967295u), fieldstop_strehl_ratio_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(32)
ROW(seeing_at_airmass, DRAW(300000u, 10000000u, 0u, 4294967295u) DRAW(65536u, 400000u, 65536u, 2621440u), fieldstop_seeing_at_airmass_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(33)
ROW(combined_fwhm, DRAW(300000u, 10000000u, 0u, 4294967295u) DRAW(300000u, 10000000u, 0u, 4294967295u) DRAW(300000u, 10000000u, 0u, 4294967295u), fieldstop_combined_fwhm_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(34)
ROW(throughput, DRAW(0u, 5u, 0u, 255u) DRAW(45000u, 65536u, 0u, 65536u) DRAW(0u, 12u, 0u, 255u) DRAW(45000u, 65536u, 0u, 65536u), fieldstop_throughput_fx((uint8_t)a[0], a[1], (uint8_t)a[2], a[3], &result))
#endif
#if HAS_ROW(35)
ROW(clear_fraction, DRAW(50000u, 500000u, 0u, 4294967295u) DRAW(10000u, 200000u, 0u, 4294967295u), fieldstop_clear_fraction_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(36)
ROW(effective_aperture, DRAW(50000u, 500000u, 0u, 4294967295u) DRAW(10000u, 200000u, 0u, 4294967295u) DRAW(45000u, 65536u, 0u, 65536u), fieldstop_effective_aperture_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(37)
ROW(magnitude_gain, DRAW(40000u, 500000u, 0u, 4294967295u) DRAW(2000u, 8000u, 0u, 4294967295u), fieldstop_magnitude_gain_fx(a[0], a[1], (int32_t *)&result))
#endif
#if HAS_ROW(38)
ROW(limiting_magnitude, DRAW(3000u, 7000u, 2147483648u, 2147483647u) DRAW(40000u, 500000u, 0u, 4294967295u) DRAW(2000u, 8000u, 0u, 4294967295u), fieldstop_limiting_magnitude_fx((int32_t)a[0], a[1], a[2], (int32_t *)&result))
#endif
#if HAS_ROW(39)
ROW(surface_brightness, DRAW(500u, 8000u, 0u, 4294967295u) DRAW(2000u, 8000u, 0u, 4294967295u) DRAW(45000u, 65536u, 0u, 65536u), fieldstop_surface_brightness_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(40)
ROW(magnitude_difference, DRAW(1u, 10000000u, 0u, 4294967295u) DRAW(1u, 10000000u, 0u, 4294967295u), fieldstop_magnitude_difference_fx(a[0], a[1], (int32_t *)&result))
#endif
#if HAS_ROW(41)
ROW(distance_dimming, DRAW(1u, 10000u, 0u, 4294967295u) DRAW(1u, 1000000u, 0u, 4294967295u), fieldstop_distance_dimming_fx(a[0], a[1], (int32_t *)&result))
#endif
#if HAS_ROW(42)
ROW(extinction, DRAW(100u, 600u, 0u, 4294967295u) DRAW(65536u, 400000u, 0u, 4294967295u), fieldstop_extinction_fx(a[0], a[1], (int32_t *)&result))
#endif
#if HAS_ROW(43)
ROW(t_number, DRAW(196608u, 1048576u, 0u, 4294967295u) DRAW(30000u, 65536u, 0u, 65536u), fieldstop_t_number_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(44)
ROW(pixels_per_fwhm, DRAW(500000u, 6000000u, 0u, 4294967295u) DRAW(200000u, 5000000u, 0u, 4294967295u), fieldstop_pixels_per_fwhm_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(45)
ROW(nyquist_pixel, DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(50000u, 500000u, 0u, 4294967295u) DRAW(400u, 900u, 0u, 4294967295u), fieldstop_nyquist_pixel_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(46)
ROW(focal_length_for_pixel_scale, DRAW(1000u, 15000u, 0u, 4294967295u) DRAW(200000u, 5000000u, 0u, 4294967295u), fieldstop_focal_length_for_pixel_scale_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(47)
ROW(diagonal_field, DRAW(1000u, 15000u, 0u, 4294967295u) DRAW(500u, 10000u, 0u, 65535u) DRAW(500u, 10000u, 0u, 65535u) DRAW(200000u, 5000000u, 0u, 4294967295u), fieldstop_diagonal_field_fx(a[0], (uint16_t)a[1], (uint16_t)a[2], a[3], &result))
#endif
#if HAS_ROW(48)
ROW(image_size, DRAW(30000u, 7200000u, 0u, 647999999u) DRAW(200000u, 5000000u, 0u, 4294967295u), fieldstop_image_size_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(49)
ROW(exposure_stops, DRAW(131072u, 1048576u, 0u, 4294967295u) DRAW(131072u, 1048576u, 0u, 4294967295u), fieldstop_exposure_stops_fx(a[0], a[1], (int32_t *)&result))
#endif
#if HAS_ROW(50)
ROW(depth_of_focus, DRAW(196608u, 1048576u, 0u, 4294967295u) DRAW(400u, 900u, 0u, 4294967295u), fieldstop_depth_of_focus_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(51)
ROW(defocus_blur, DRAW(1000u, 500000u, 0u, 4294967295u) DRAW(196608u, 1048576u, 0u, 4294967295u), fieldstop_defocus_blur_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(52)
ROW(defocus_wavefront, DRAW(1000u, 500000u, 0u, 4294967295u) DRAW(196608u, 1048576u, 0u, 4294967295u), fieldstop_defocus_wavefront_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(53)
ROW(motor_steps, DRAW(1000u, 5000000u, 0u, 4294967295u) DRAW(50u, 20000u, 0u, 4294967295u), fieldstop_motor_steps_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(54)
ROW(thermal_shift, DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(100u, 24000u, 2147483648u, 2147483647u) DRAW(100u, 20000u, 2147483648u, 2147483647u), fieldstop_thermal_shift_fx(a[0], (int32_t)a[1], (int32_t)a[2], (int32_t *)&result))
#endif
#if HAS_ROW(55)
ROW(refocus_temperature, DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(100u, 24000u, 0u, 4294967295u) DRAW(10000u, 300000u, 0u, 4294967295u), fieldstop_refocus_temperature_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(56)
ROW(near_focus_travel, DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(6000u, 1000000u, 0u, 4294967295u), fieldstop_near_focus_travel_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(57)
ROW(coma_length, DRAW(60000u, 3600000u, 0u, 4294967295u) DRAW(196608u, 1048576u, 0u, 4294967295u), fieldstop_coma_length_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(58)
ROW(diagonal_minor_axis, DRAW(50000u, 500000u, 0u, 4294967295u) DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(80000u, 200000u, 0u, 4294967295u) DRAW(1000u, 40000u, 0u, 4294967295u), fieldstop_diagonal_minor_axis_fx(a[0], a[1], a[2], a[3], &result))
#endif
#if HAS_ROW(59)
ROW(diagonal_offset, DRAW(50000u, 500000u, 0u, 4294967295u) DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(80000u, 200000u, 0u, 4294967295u) DRAW(1000u, 40000u, 0u, 4294967295u), fieldstop_diagonal_offset_fx(a[0], a[1], a[2], a[3], &result))
#endif
#if HAS_ROW(60)
ROW(beam_width, DRAW(50000u, 500000u, 0u, 4294967295u) DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(80000u, 200000u, 0u, 4294967295u), fieldstop_beam_width_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(61)
ROW(beam_shift, DRAW(1000u, 25000u, 0u, 4294967295u) DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(80000u, 200000u, 0u, 4294967295u), fieldstop_beam_shift_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(62)
ROW(secondary_magnification, DRAW(300000u, 2000000u, 0u, 4294967295u) DRAW(2000001u, 10000000u, 0u, 4294967295u), fieldstop_secondary_magnification_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(63)
ROW(secondary_separation, DRAW(300000u, 2000000u, 0u, 4294967295u) DRAW(2000001u, 10000000u, 0u, 4294967295u) DRAW(50000u, 500000u, 0u, 4294967295u), fieldstop_secondary_separation_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(64)
ROW(secondary_diameter, DRAW(50000u, 500000u, 0u, 4294967295u) DRAW(300000u, 2000000u, 0u, 4294967295u) DRAW(2000001u, 10000000u, 0u, 4294967295u) DRAW(50000u, 500000u, 0u, 4294967295u), fieldstop_secondary_diameter_fx(a[0], a[1], a[2], a[3], &result))
#endif
#if HAS_ROW(65)
ROW(secondary_field_margin, DRAW(300000u, 2000000u, 0u, 4294967295u) DRAW(2000001u, 10000000u, 0u, 4294967295u) DRAW(50000u, 500000u, 0u, 4294967295u) DRAW(1000u, 40000u, 0u, 4294967295u), fieldstop_secondary_field_margin_fx(a[0], a[1], a[2], a[3], &result))
#endif
#if HAS_ROW(66)
ROW(secondary_radius, DRAW(300000u, 2000000u, 0u, 4294967295u) DRAW(2000001u, 10000000u, 0u, 4294967295u) DRAW(50000u, 500000u, 0u, 4294967295u), fieldstop_secondary_radius_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(67)
ROW(illumination, DRAW(20000u, 80000u, 0u, 4294967295u) DRAW(30000u, 100000u, 0u, 4294967295u) DRAW(1000u, 40000u, 0u, 4294967295u), fieldstop_illumination_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(68)
ROW(swing_radius, DRAW(300000u, 2000000u, 0u, 4294967295u) DRAW(60000u, 600000u, 0u, 4294967295u), fieldstop_swing_radius_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(69)
ROW(eyepiece_height, DRAW(600000u, 1800000u, 0u, 4294967295u) DRAW(100000u, 1500000u, 2147483648u, 2147483647u) DRAW(1048576u, 1073741824u, 0u, 1073741824u), fieldstop_eyepiece_height_fx(a[0], (int32_t)a[1], (int32_t)a[2], &result))
#endif
#if HAS_ROW(70)
ROW(abbe_number, DRAW(15100000u, 15250000u, 0u, 4294967295u) DRAW(15260000u, 15400000u, 0u, 4294967295u) DRAW(15000000u, 15100000u, 0u, 4294967295u), fieldstop_abbe_number_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(71)
ROW(singlet_colour_shift, DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(1638400u, 5570560u, 0u, 4294967295u), fieldstop_singlet_colour_shift_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(72)
ROW(singlet_colour_blur, DRAW(196608u, 1048576u, 0u, 4294967295u) DRAW(1638400u, 5570560u, 0u, 4294967295u), fieldstop_singlet_colour_blur_fx(a[0], a[1], &result))
#endif
#if HAS_ROW(73)
ROW(achromat_crown, DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(3342336u, 5570560u, 0u, 4294967295u) DRAW(1638400u, 3276800u, 0u, 4294967295u), fieldstop_achromat_crown_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(74)
ROW(achromat_flint, DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(3342336u, 5570560u, 0u, 4294967295u) DRAW(1638400u, 3276800u, 0u, 4294967295u), fieldstop_achromat_flint_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(75)
ROW(secondary_spectrum, DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(500u, 50000u, 0u, 4294967295u) DRAW(655360u, 3932160u, 0u, 4294967295u), fieldstop_secondary_spectrum_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(76)
ROW(drift_rate, DRAW(1048576u, 700000000u, 3221225472u, 1073741824u), fieldstop_drift_rate_fx((int32_t)a[0], &result))
#endif
#if HAS_ROW(77)
ROW(drift_time, DRAW(300000u, 7200000u, 0u, 1295999999u) DRAW(1048576u, 700000000u, 3221225472u, 1073741824u), fieldstop_drift_time_fx(a[0], (int32_t)a[1], &result))
#endif
#if HAS_ROW(78)
ROW(true_field_from_drift, DRAW(20000u, 600000u, 0u, 86164090u) DRAW(1048576u, 700000000u, 3221225472u, 1073741824u), fieldstop_true_field_from_drift_fx(a[0], (int32_t)a[1], &result))
#endif
#if HAS_ROW(79)
ROW(trail_free_exposure, DRAW(1000u, 15000u, 0u, 4294967295u) DRAW(32768u, 196608u, 0u, 4294967295u) DRAW(200000u, 5000000u, 0u, 4294967295u) DRAW(1048576u, 700000000u, 3221225472u, 1073741824u), fieldstop_trail_free_exposure_fx(a[0], a[1], a[2], (int32_t)a[3], &result))
#endif
#if HAS_ROW(80)
ROW(rotation_free_exposure, DRAW(32768u, 196608u, 0u, 4294967295u) DRAW(100u, 5000u, 0u, 4294967295u) DRAW(1000000u, 30000000u, 0u, 4294967295u), fieldstop_rotation_free_exposure_fx(a[0], a[1], a[2], &result))
#endif
#if HAS_ROW(81)
ROW(field_rotation_rate, DRAW(100000000u, 700000000u, 3221225472u, 1073741824u) DRAW(1048576u, 4294967295u, 0u, 4294967295u) DRAW(100000000u, 1050000000u, 3221225472u, 1073741824u), fieldstop_field_rotation_rate_fx((int32_t)a[0], a[1], (int32_t)a[2], (int32_t *)&result))
#endif
#if HAS_ROW(82)
ROW(azimuth_rate, DRAW(100000000u, 700000000u, 3221225472u, 1073741824u) DRAW(1048576u, 4294967295u, 0u, 4294967295u) DRAW(100000000u, 1050000000u, 3221225472u, 1073741824u), fieldstop_azimuth_rate_fx((int32_t)a[0], a[1], (int32_t)a[2], (int32_t *)&result))
#endif
#if HAS_ROW(83)
ROW(altitude_rate, DRAW(100000000u, 700000000u, 3221225472u, 1073741824u) DRAW(1048576u, 4294967295u, 0u, 4294967295u) DRAW(100000000u, 1050000000u, 3221225472u, 1073741824u), fieldstop_altitude_rate_fx((int32_t)a[0], a[1], (int32_t)a[2], (int32_t *)&result))
#endif
#if HAS_ROW(84)
ROW(zenith_blind_radius, DRAW(100000000u, 700000000u, 3221225472u, 1073741824u) DRAW(500000u, 20000000u, 0u, 4294967295u), fieldstop_zenith_blind_radius_fx((int32_t)a[0], a[1], &result))
#endif
#if HAS_ROW(85)
ROW(misalignment_drift, DRAW(10000u, 7200000u, 0u, 18000000u) DRAW(1048576u, 4294967295u, 0u, 4294967295u), fieldstop_misalignment_drift_fx(a[0], a[1], (int32_t *)&result))
#endif
#if HAS_ROW(86)
ROW(sun_right_ascension, DRAW(1500000000u, 2500000000u, 0u, 4102444799u), fieldstop_sun_right_ascension_fx(a[0], &result))
#endif
#if HAS_ROW(87)
ROW(sun_declination, DRAW(1500000000u, 2500000000u, 0u, 4102444799u), fieldstop_sun_declination_fx(a[0], (int32_t *)&result))
#endif
#if HAS_ROW(88)
ROW(sun_clearance, DRAW(1048576u, 4294967295u, 0u, 4294967295u) DRAW(1048576u, 1073741824u, 3221225472u, 1073741824u) DRAW(1500000000u, 2500000000u, 0u, 4102444799u), fieldstop_sun_clearance_fx(a[0], (int32_t)a[1], a[2], &result))
#endif
#if HAS_ROW(89)
ROW(collected_sunlight, DRAW(40000u, 500000u, 0u, 4294967295u), fieldstop_collected_sunlight_fx(a[0], &result))
#endif
#define ROWS 90
