//! C exports of `sky::motion`.

use super::{fieldstop_status, give};
use crate::sky::motion;
use crate::units::{
    Bam, MicroarcsecondsPerSecond, Micrometres, Milliarcseconds, MilliarcsecondsPerSecond, Milliseconds,
    Nanometres, Q16, SignedBam,
};

/// Gives how fast a star drifts through the field when the drive stands still, in microarcseconds per second.
///
/// w cos d, with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical Astronomy).
/// Ranges: declination_bam -2^30 to 2^30.
/// Error: at most 0.51 LSB.
/// Statuses: null pointer, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_drift_rate_fx(
    declination_bam: i32,
    rate_uas_per_s: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(rate_uas_per_s, 2, || motion::drift_rate_fx(SignedBam(declination_bam))) }
}

/// Gives how fast a star drifts through the field when the drive stands still, in arcseconds per second.
///
/// w cos d, with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical Astronomy).
/// Ranges: declination_deg -90 to 90.
/// Error: at most 3 ulp.
/// Statuses: null pointer, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_drift_rate_f32(
    declination_deg: f32,
    rate_arcsec_per_s: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(rate_arcsec_per_s, 2, || motion::drift_rate(declination_deg)) }
}

/// Gives how fast a star drifts through the field when the drive stands still, in arcseconds per second, in double.
///
/// w cos d, with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical Astronomy).
/// Ranges: declination_deg -90 to 90.
/// Error: at most 3 ulp.
/// Statuses: null pointer, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_drift_rate_f64(
    declination_deg: f64,
    rate_arcsec_per_s: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(rate_arcsec_per_s, 2, || motion::drift_rate(declination_deg)) }
}

/// Gives how long a star takes through the field, from edge to edge through its centre, when the drive stands still,
/// in milliseconds.
///
/// 4 asin(sin(F/4) / cos d) / w, along the parallel of declination, with w the rate of the sky, 15.0410686 arcsec per
/// second (Smart, Textbook on Spherical Astronomy).
/// Ranges: field_mas not 0, under 1296000000; declination_bam -2^30 to 2^30. Never left where F/4 is 90 degrees less
/// the size of d or more: the star stays in the field all day.
/// Error: at most 1 LSB.
/// Statuses: null pointer, zero, out of range, never left.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_drift_time_fx(
    field_mas: u32,
    declination_bam: i32,
    time_ms: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(time_ms, 3, || motion::drift_time_fx(Milliarcseconds(field_mas), SignedBam(declination_bam)))
    }
}

/// Gives how long a star takes through the field, from edge to edge through its centre, when the drive stands still,
/// in seconds.
///
/// 4 asin(sin(F/4) / cos d) / w, along the parallel of declination, with w the rate of the sky, 15.0410686 arcsec per
/// second (Smart, Textbook on Spherical Astronomy).
/// Ranges: field_arcsec 2^-32 to under 1296000; declination_deg -90 to 90. Never left where F/4 is 90 degrees less
/// the size of d or more: the star stays in the field all day.
/// Error: at most 8 ulp.
/// Statuses: null pointer, zero, out of range, not finite, never left.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_drift_time_f32(
    field_arcsec: f32,
    declination_deg: f32,
    time_s: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(time_s, 3, || motion::drift_time(field_arcsec, declination_deg)) }
}

/// Gives how long a star takes through the field, from edge to edge through its centre, when the drive stands still,
/// in seconds, in double.
///
/// 4 asin(sin(F/4) / cos d) / w, along the parallel of declination, with w the rate of the sky, 15.0410686 arcsec per
/// second (Smart, Textbook on Spherical Astronomy).
/// Ranges: field_arcsec 2^-32 to under 1296000; declination_deg -90 to 90. Never left where F/4 is 90 degrees less
/// the size of d or more: the star stays in the field all day.
/// Error: at most 8 ulp.
/// Statuses: null pointer, zero, out of range, not finite, never left.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_drift_time_f64(
    field_arcsec: f64,
    declination_deg: f64,
    time_s: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(time_s, 3, || motion::drift_time(field_arcsec, declination_deg)) }
}

/// Gives the true field of an eyepiece by the time that a star takes through its centre when the drive stands still,
/// in milliarcseconds.
///
/// 4 asin(cos d sin(w t/4)), with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical
/// Astronomy).
/// Ranges: drift_ms not 0, under 86164090.5, a sidereal day; declination_bam -2^30 to 2^30.
/// Error: at most 1 LSB or 1 part in 10^6, the larger.
/// Statuses: null pointer, zero, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_true_field_from_drift_fx(
    drift_ms: u32,
    declination_bam: i32,
    field_mas: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(field_mas, 3, || {
            motion::true_field_from_drift_fx(Milliseconds(drift_ms), SignedBam(declination_bam))
        })
    }
}

/// Gives the true field of an eyepiece by the time that a star takes through its centre when the drive stands still,
/// in arcseconds.
///
/// 4 asin(cos d sin(w t/4)), with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical
/// Astronomy).
/// Ranges: drift_s 2^-32 to under 86164.0905, a sidereal day; declination_deg -90 to 90.
/// Error: at most 8 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_true_field_from_drift_f32(
    drift_s: f32,
    declination_deg: f32,
    field_arcsec: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(field_arcsec, 3, || motion::true_field_from_drift(drift_s, declination_deg)) }
}

/// Gives the true field of an eyepiece by the time that a star takes through its centre when the drive stands still,
/// in arcseconds, in double.
///
/// 4 asin(cos d sin(w t/4)), with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical
/// Astronomy).
/// Ranges: drift_s 2^-32 to under 86164.0905, a sidereal day; declination_deg -90 to 90.
/// Error: at most 8 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_true_field_from_drift_f64(
    drift_s: f64,
    declination_deg: f64,
    field_arcsec: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(field_arcsec, 3, || motion::true_field_from_drift(drift_s, declination_deg)) }
}

/// Gives the longest exposure without a drive that draws out a star by no more than the tolerance, in microseconds.
///
/// (t p / f) / (w cos d), t in pixels, with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on
/// Spherical Astronomy).
/// Ranges: pixel_nm, tolerance_q16, focal_length_um not 0; declination_bam -2^30 to 2^30; overflow at the pole.
/// Error: at most 1 LSB or 1 part in 10^6, the larger.
/// Statuses: null pointer, zero, out of range, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_trail_free_exposure_fx(
    pixel_nm: u32,
    tolerance_q16: u32,
    focal_length_um: u32,
    declination_bam: i32,
    exposure_us: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(exposure_us, 5, || {
            motion::trail_free_exposure_fx(
                Nanometres(pixel_nm),
                Q16(tolerance_q16),
                Micrometres(focal_length_um),
                SignedBam(declination_bam),
            )
        })
    }
}

/// Gives the longest exposure without a drive that draws out a star by no more than the tolerance, in seconds.
///
/// (t p / f) / (w cos d), t in pixels, with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on
/// Spherical Astronomy).
/// Ranges: pixel_um, tolerance, focal_length_mm 2^-32 to 2^32; declination_deg -90 to 90; overflow at the pole.
/// Error: at most 6 ulp.
/// Statuses: null pointer, zero, out of range, not finite, overflow.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_trail_free_exposure_f32(
    pixel_um: f32,
    tolerance: f32,
    focal_length_mm: f32,
    declination_deg: f32,
    exposure_s: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(exposure_s, 5, || {
            motion::trail_free_exposure(pixel_um, tolerance, focal_length_mm, declination_deg)
        })
    }
}

/// Gives the longest exposure without a drive that draws out a star by no more than the tolerance, in seconds, in
/// double.
///
/// (t p / f) / (w cos d), t in pixels, with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on
/// Spherical Astronomy).
/// Ranges: pixel_um, tolerance, focal_length_mm 2^-32 to 2^32; declination_deg -90 to 90; overflow at the pole.
/// Error: at most 6 ulp.
/// Statuses: null pointer, zero, out of range, not finite, overflow.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_trail_free_exposure_f64(
    pixel_um: f64,
    tolerance: f64,
    focal_length_mm: f64,
    declination_deg: f64,
    exposure_s: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(exposure_s, 5, || {
            motion::trail_free_exposure(pixel_um, tolerance, focal_length_mm, declination_deg)
        })
    }
}

/// Gives the longest exposure on an altazimuth mount on which the turning field draws out a star by no more than the
/// tolerance, in milliseconds.
///
/// (1 rad) t / (r rate): t and r in pixels, r from the centre of the turn; the rate is the size of what
/// field_rotation_rate gives (geometry).
/// Ranges: tolerance_q16, radius_px, rate_uas_per_s not 0.
/// Error: at most 0.51 LSB.
/// Statuses: null pointer, zero, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_rotation_free_exposure_fx(
    tolerance_q16: u32,
    radius_px: u32,
    rate_uas_per_s: u32,
    exposure_ms: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(exposure_ms, 4, || {
            motion::rotation_free_exposure_fx(
                Q16(tolerance_q16),
                radius_px,
                MicroarcsecondsPerSecond(rate_uas_per_s),
            )
        })
    }
}

/// Gives the longest exposure on an altazimuth mount on which the turning field draws out a star by no more than the
/// tolerance, in seconds.
///
/// (1 rad) t / (r rate): t and r in pixels, r from the centre of the turn; the rate is the size of what
/// field_rotation_rate gives (geometry).
/// Ranges: tolerance, rate_arcsec_per_s 2^-32 to 2^32; radius_px not 0.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_rotation_free_exposure_f32(
    tolerance: f32,
    radius_px: u32,
    rate_arcsec_per_s: f32,
    exposure_s: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(exposure_s, 4, || motion::rotation_free_exposure(tolerance, radius_px, rate_arcsec_per_s)) }
}

/// Gives the longest exposure on an altazimuth mount on which the turning field draws out a star by no more than the
/// tolerance, in seconds, in double.
///
/// (1 rad) t / (r rate): t and r in pixels, r from the centre of the turn; the rate is the size of what
/// field_rotation_rate gives (geometry).
/// Ranges: tolerance, rate_arcsec_per_s 2^-32 to 2^32; radius_px not 0.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_rotation_free_exposure_f64(
    tolerance: f64,
    radius_px: u32,
    rate_arcsec_per_s: f64,
    exposure_s: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(exposure_s, 4, || motion::rotation_free_exposure(tolerance, radius_px, rate_arcsec_per_s)) }
}

/// Gives how fast the field turns in an altazimuth telescope, in microarcseconds per second, positive where the
/// parallactic angle grows.
///
/// -w cos lat cos A / cos h, azimuth from north through east, with w the rate of the sky, 15.0410686 arcsec per
/// second (Smart, Textbook on Spherical Astronomy).
/// Ranges: latitude_bam and altitude_bam -2^30 to 2^30, azimuth_bam any; overflow close to the zenith, where it is 0.597 degrees per
/// second or more; undefined at the exact zenith and nadir.
/// Error: at most 1 LSB or 2 parts in 10^6, the larger.
/// Statuses: null pointer, out of range, overflow, undefined.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_field_rotation_rate_fx(
    latitude_bam: i32,
    azimuth_bam: u32,
    altitude_bam: i32,
    rate_uas_per_s: *mut i32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(rate_uas_per_s, 4, || {
            motion::field_rotation_rate_fx(SignedBam(latitude_bam), Bam(azimuth_bam), SignedBam(altitude_bam))
        })
    }
}

/// Gives how fast the field turns in an altazimuth telescope, in arcseconds per second, positive where the
/// parallactic angle grows.
///
/// -w cos lat cos A / cos h, azimuth from north through east, with w the rate of the sky, 15.0410686 arcsec per
/// second (Smart, Textbook on Spherical Astronomy).
/// Ranges: latitude_deg and altitude_deg -90 to 90, azimuth_deg 0 to 360; undefined at the exact zenith and nadir.
/// Error: at most 6 ulp.
/// Statuses: null pointer, out of range, not finite, undefined.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_field_rotation_rate_f32(
    latitude_deg: f32,
    azimuth_deg: f32,
    altitude_deg: f32,
    rate_arcsec_per_s: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(rate_arcsec_per_s, 4, || motion::field_rotation_rate(latitude_deg, azimuth_deg, altitude_deg))
    }
}

/// Gives how fast the field turns in an altazimuth telescope, in arcseconds per second, in double, positive where the
/// parallactic angle grows.
///
/// -w cos lat cos A / cos h, azimuth from north through east, with w the rate of the sky, 15.0410686 arcsec per
/// second (Smart, Textbook on Spherical Astronomy).
/// Ranges: latitude_deg and altitude_deg -90 to 90, azimuth_deg 0 to 360; undefined at the exact zenith and nadir.
/// Error: at most 6 ulp.
/// Statuses: null pointer, out of range, not finite, undefined.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_field_rotation_rate_f64(
    latitude_deg: f64,
    azimuth_deg: f64,
    altitude_deg: f64,
    rate_arcsec_per_s: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(rate_arcsec_per_s, 4, || motion::field_rotation_rate(latitude_deg, azimuth_deg, altitude_deg))
    }
}

/// Gives how fast an altazimuth mount turns in azimuth to follow the sky, in microarcseconds per second, positive
/// from north to east.
///
/// w (sin lat - cos lat cos A tan h), with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on
/// Spherical Astronomy).
/// Caution: a moving mount can hurt. Stay clear of all that it can reach, and follow the maker's instructions.
/// Ranges: latitude_bam and altitude_bam -2^30 to 2^30, azimuth_bam any; overflow close to the zenith, where it is 0.597 degrees per
/// second or more; undefined at the exact zenith and nadir.
/// Error: at most 1 LSB or 2 parts in 10^6, the larger; the parts are of the larger term.
/// Statuses: null pointer, out of range, overflow, undefined.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_azimuth_rate_fx(
    latitude_bam: i32,
    azimuth_bam: u32,
    altitude_bam: i32,
    rate_uas_per_s: *mut i32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(rate_uas_per_s, 4, || {
            motion::azimuth_rate_fx(SignedBam(latitude_bam), Bam(azimuth_bam), SignedBam(altitude_bam))
        })
    }
}

/// Gives how fast an altazimuth mount turns in azimuth to follow the sky, in arcseconds per second, positive from
/// north to east.
///
/// w (sin lat - cos lat cos A tan h), with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on
/// Spherical Astronomy).
/// Caution: a moving mount can hurt. Stay clear of all that it can reach, and follow the maker's instructions.
/// Ranges: latitude_deg and altitude_deg -90 to 90, azimuth_deg 0 to 360; undefined at the exact zenith and nadir.
/// Error: at most 6 ulp of the larger term.
/// Statuses: null pointer, out of range, not finite, undefined.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_azimuth_rate_f32(
    latitude_deg: f32,
    azimuth_deg: f32,
    altitude_deg: f32,
    rate_arcsec_per_s: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(rate_arcsec_per_s, 4, || motion::azimuth_rate(latitude_deg, azimuth_deg, altitude_deg)) }
}

/// Gives how fast an altazimuth mount turns in azimuth to follow the sky, in arcseconds per second, in double,
/// positive from north to east.
///
/// w (sin lat - cos lat cos A tan h), with w the rate of the sky, 15.0410686 arcsec per second (Smart, Textbook on
/// Spherical Astronomy).
/// Caution: a moving mount can hurt. Stay clear of all that it can reach, and follow the maker's instructions.
/// Ranges: latitude_deg and altitude_deg -90 to 90, azimuth_deg 0 to 360; undefined at the exact zenith and nadir.
/// Error: at most 6 ulp of the larger term.
/// Statuses: null pointer, out of range, not finite, undefined.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_azimuth_rate_f64(
    latitude_deg: f64,
    azimuth_deg: f64,
    altitude_deg: f64,
    rate_arcsec_per_s: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(rate_arcsec_per_s, 4, || motion::azimuth_rate(latitude_deg, azimuth_deg, altitude_deg)) }
}

/// Gives how fast an altazimuth mount turns in altitude to follow the sky, in microarcseconds per second, positive
/// upward.
///
/// w cos lat sin A, with w the rate of the sky, 15.0410686 arcsec per second; the altitude does not matter (Smart,
/// Textbook on Spherical Astronomy).
/// Caution: a moving mount can hurt. Stay clear of all that it can reach, and follow the maker's instructions.
/// Ranges: latitude_bam and altitude_bam -2^30 to 2^30, azimuth_bam any.
/// Error: at most 0.53 LSB.
/// Statuses: null pointer, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_altitude_rate_fx(
    latitude_bam: i32,
    azimuth_bam: u32,
    altitude_bam: i32,
    rate_uas_per_s: *mut i32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(rate_uas_per_s, 4, || {
            motion::altitude_rate_fx(SignedBam(latitude_bam), Bam(azimuth_bam), SignedBam(altitude_bam))
        })
    }
}

/// Gives how fast an altazimuth mount turns in altitude to follow the sky, in arcseconds per second, positive upward.
///
/// w cos lat sin A, with w the rate of the sky, 15.0410686 arcsec per second; the altitude does not matter (Smart,
/// Textbook on Spherical Astronomy).
/// Caution: a moving mount can hurt. Stay clear of all that it can reach, and follow the maker's instructions.
/// Ranges: latitude_deg and altitude_deg -90 to 90, azimuth_deg 0 to 360.
/// Error: at most 6 ulp.
/// Statuses: null pointer, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_altitude_rate_f32(
    latitude_deg: f32,
    azimuth_deg: f32,
    altitude_deg: f32,
    rate_arcsec_per_s: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(rate_arcsec_per_s, 4, || motion::altitude_rate(latitude_deg, azimuth_deg, altitude_deg)) }
}

/// Gives how fast an altazimuth mount turns in altitude to follow the sky, in arcseconds per second, in double,
/// positive upward.
///
/// w cos lat sin A, with w the rate of the sky, 15.0410686 arcsec per second; the altitude does not matter (Smart,
/// Textbook on Spherical Astronomy).
/// Caution: a moving mount can hurt. Stay clear of all that it can reach, and follow the maker's instructions.
/// Ranges: latitude_deg and altitude_deg -90 to 90, azimuth_deg 0 to 360.
/// Error: at most 6 ulp.
/// Statuses: null pointer, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_altitude_rate_f64(
    latitude_deg: f64,
    azimuth_deg: f64,
    altitude_deg: f64,
    rate_arcsec_per_s: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(rate_arcsec_per_s, 4, || motion::altitude_rate(latitude_deg, azimuth_deg, altitude_deg)) }
}

/// Gives the radius of the circle about the zenith in which an altazimuth mount cannot follow the sky, in
/// milliarcseconds.
///
/// z with w (|sin lat| + cos lat cot z) = the fastest rate in azimuth, a circle on the safe side, with w the rate of
/// the sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical Astronomy).
/// Caution: a mount at its top speed can hurt. Stay clear of all that it can reach, and follow the maker's
/// instructions.
/// Ranges: latitude_bam -2^30 to 2^30; top_rate_mas_per_s over w |sin lat|.
/// Error: at most 1 LSB or 2 parts in 10^6, the larger.
/// Statuses: null pointer, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_zenith_blind_radius_fx(
    latitude_bam: i32,
    top_rate_mas_per_s: u32,
    radius_mas: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(radius_mas, 3, || {
            motion::zenith_blind_radius_fx(
                SignedBam(latitude_bam),
                MilliarcsecondsPerSecond(top_rate_mas_per_s),
            )
        })
    }
}

/// Gives the radius of the circle about the zenith in which an altazimuth mount cannot follow the sky, in arcseconds.
///
/// z with w (|sin lat| + cos lat cot z) = the fastest rate in azimuth, a circle on the safe side, with w the rate of
/// the sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical Astronomy).
/// Caution: a mount at its top speed can hurt. Stay clear of all that it can reach, and follow the maker's
/// instructions.
/// Ranges: latitude_deg -90 to 90; top_rate_arcsec_per_s over w |sin lat|, to 2^32.
/// Error: at most 6 ulp.
/// Statuses: null pointer, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_zenith_blind_radius_f32(
    latitude_deg: f32,
    top_rate_arcsec_per_s: f32,
    radius_arcsec: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(radius_arcsec, 3, || motion::zenith_blind_radius(latitude_deg, top_rate_arcsec_per_s)) }
}

/// Gives the radius of the circle about the zenith in which an altazimuth mount cannot follow the sky, in arcseconds,
/// in double.
///
/// z with w (|sin lat| + cos lat cot z) = the fastest rate in azimuth, a circle on the safe side, with w the rate of
/// the sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical Astronomy).
/// Caution: a mount at its top speed can hurt. Stay clear of all that it can reach, and follow the maker's
/// instructions.
/// Ranges: latitude_deg -90 to 90; top_rate_arcsec_per_s over w |sin lat|, to 2^32.
/// Error: at most 6 ulp.
/// Statuses: null pointer, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_zenith_blind_radius_f64(
    latitude_deg: f64,
    top_rate_arcsec_per_s: f64,
    radius_arcsec: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(radius_arcsec, 3, || motion::zenith_blind_radius(latitude_deg, top_rate_arcsec_per_s)) }
}

/// Gives how fast a star leaves its declination on a mount whose polar axis is not on the pole, in microarcseconds
/// per second, positive northward.
///
/// -w e sin H to first order in e, H the star's hour angle less that of the displaced pole, with w the rate of the
/// sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical Astronomy).
/// Ranges: polar_error_mas at most 18000000, 5 degrees; hour_angle_bam any.
/// Error: at most 0.51 LSB.
/// Statuses: null pointer, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_misalignment_drift_fx(
    polar_error_mas: u32,
    hour_angle_bam: u32,
    drift_uas_per_s: *mut i32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(drift_uas_per_s, 3, || {
            motion::misalignment_drift_fx(Milliarcseconds(polar_error_mas), Bam(hour_angle_bam))
        })
    }
}

/// Gives how fast a star leaves its declination on a mount whose polar axis is not on the pole, in arcseconds per
/// second, positive northward.
///
/// -w e sin H to first order in e, H the star's hour angle less that of the displaced pole, with w the rate of the
/// sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical Astronomy).
/// Ranges: polar_error_arcsec 0 to 18000; hour_angle_deg 0 to 360.
/// Error: at most 4 ulp.
/// Statuses: null pointer, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_misalignment_drift_f32(
    polar_error_arcsec: f32,
    hour_angle_deg: f32,
    drift_arcsec_per_s: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(drift_arcsec_per_s, 3, || motion::misalignment_drift(polar_error_arcsec, hour_angle_deg)) }
}

/// Gives how fast a star leaves its declination on a mount whose polar axis is not on the pole, in arcseconds per
/// second, in double, positive northward.
///
/// -w e sin H to first order in e, H the star's hour angle less that of the displaced pole, with w the rate of the
/// sky, 15.0410686 arcsec per second (Smart, Textbook on Spherical Astronomy).
/// Ranges: polar_error_arcsec 0 to 18000; hour_angle_deg 0 to 360.
/// Error: at most 4 ulp.
/// Statuses: null pointer, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_misalignment_drift_f64(
    polar_error_arcsec: f64,
    hour_angle_deg: f64,
    drift_arcsec_per_s: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(drift_arcsec_per_s, 3, || motion::misalignment_drift(polar_error_arcsec, hour_angle_deg)) }
}
