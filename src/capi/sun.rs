//! C exports of `sky::sun`.

use super::{fieldstop_status, give};
use crate::sky::sun;
use crate::units::{Bam, Micrometres, SignedBam};

/// Gives the right ascension of the Sun, of the date, as binary angle.
///
/// atan2(cos e sin l, cos l), l = L + 1.915 sin g + 0.020 sin 2g, L = 280.460 + 0.9856474 n, g = 357.528 + 0.9856003
/// n, e = 23.439 - 0.0000004 n, in degrees, n days from 2000 January 1, 12 h (the low-precision expression of The
/// Astronomical Almanac).
/// Caution: nothing that is computed makes it safe to look near the Sun.
/// Ranges: unix_s, seconds from 1970 January 1, 0 h UTC, under 4102444800, the year 2100.
/// Error: at most 5 LSB from the expression. The expression is within 0.017 degrees, on the sky, of a full ephemeris
/// from 1970 to 2100.
/// Statuses: null pointer, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_sun_right_ascension_fx(
    unix_s: u32,
    right_ascension_bam: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(right_ascension_bam, 2, || sun::sun_right_ascension_fx(unix_s)) }
}

/// Gives the right ascension of the Sun, of the date, as degrees, in double.
///
/// atan2(cos e sin l, cos l), l = L + 1.915 sin g + 0.020 sin 2g, L = 280.460 + 0.9856474 n, g = 357.528 + 0.9856003
/// n, e = 23.439 - 0.0000004 n, in degrees, n days from 2000 January 1, 12 h (the low-precision expression of The
/// Astronomical Almanac).
/// Caution: nothing that is computed makes it safe to look near the Sun.
/// Ranges: unix_s, seconds from 1970 January 1, 0 h UTC, under 4102444800, the year 2100.
/// Error: at most 10^-10 degrees from the expression. The expression is within 0.017 degrees, on the sky, of a full
/// ephemeris from 1970 to 2100.
/// Statuses: null pointer, out of range.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_sun_right_ascension_f64(
    unix_s: u32,
    right_ascension_deg: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(right_ascension_deg, 2, || sun::sun_right_ascension(unix_s)) }
}

/// Gives the declination of the Sun, of the date, as binary angle.
///
/// asin(sin e sin l), l = L + 1.915 sin g + 0.020 sin 2g, L = 280.460 + 0.9856474 n, g = 357.528 + 0.9856003 n, e =
/// 23.439 - 0.0000004 n, in degrees, n days from 2000 January 1, 12 h (the low-precision expression of The
/// Astronomical Almanac).
/// Caution: nothing that is computed makes it safe to look near the Sun.
/// Ranges: unix_s, seconds from 1970 January 1, 0 h UTC, under 4102444800, the year 2100.
/// Error: at most 5 LSB from the expression. The expression is within 0.017 degrees, on the sky, of a full ephemeris
/// from 1970 to 2100.
/// Statuses: null pointer, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_sun_declination_fx(
    unix_s: u32,
    declination_bam: *mut i32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(declination_bam, 2, || sun::sun_declination_fx(unix_s)) }
}

/// Gives the declination of the Sun, of the date, as degrees, in double.
///
/// asin(sin e sin l), l = L + 1.915 sin g + 0.020 sin 2g, L = 280.460 + 0.9856474 n, g = 357.528 + 0.9856003 n, e =
/// 23.439 - 0.0000004 n, in degrees, n days from 2000 January 1, 12 h (the low-precision expression of The
/// Astronomical Almanac).
/// Caution: nothing that is computed makes it safe to look near the Sun.
/// Ranges: unix_s, seconds from 1970 January 1, 0 h UTC, under 4102444800, the year 2100.
/// Error: at most 10^-10 degrees from the expression. The expression is within 0.017 degrees, on the sky, of a full
/// ephemeris from 1970 to 2100.
/// Statuses: null pointer, out of range.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_sun_declination_f64(
    unix_s: u32,
    declination_deg: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(declination_deg, 2, || sun::sun_declination(unix_s)) }
}

/// Gives the angle from a direction to the centre of the Sun, in milliarcseconds.
///
/// The great circle to the place that sun_right_ascension and sun_declination give (Smart, Textbook on Spherical
/// Astronomy).
/// Caution: nothing that is computed makes it safe to look near the Sun. The direction is of the date: one of J2000
/// is 0.36 degrees off in 2026. The disc of the Sun reaches 0.27 degrees from its centre, and a finder or a mount's
/// path may come nearer than the telescope does.
/// Ranges: right_ascension_bam any; declination_bam -2^30 to 2^30; unix_s, seconds from 1970 January 1, 0 h UTC, under
/// 4102444800, the year 2100.
/// Error: at most 4 LSB from the expression. The expression is within 0.017 degrees, on the sky, of a full ephemeris
/// from 1970 to 2100.
/// Statuses: null pointer, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_sun_clearance_fx(
    right_ascension_bam: u32,
    declination_bam: i32,
    unix_s: u32,
    clearance_mas: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(clearance_mas, 4, || {
            sun::sun_clearance_fx(Bam(right_ascension_bam), SignedBam(declination_bam), unix_s)
        })
    }
}

/// Gives the angle from a direction to the centre of the Sun, in arcseconds, in double.
///
/// The great circle to the place that sun_right_ascension and sun_declination give (Smart, Textbook on Spherical
/// Astronomy).
/// Caution: nothing that is computed makes it safe to look near the Sun. The direction is of the date: one of J2000
/// is 0.36 degrees off in 2026. The disc of the Sun reaches 0.27 degrees from its centre, and a finder or a mount's
/// path may come nearer than the telescope does.
/// Ranges: right_ascension_deg 0 to 360; declination_deg -90 to 90; unix_s, seconds from 1970 January 1, 0 h UTC,
/// under 4102444800, the year 2100.
/// Error: at most 10^-6 arcsec from the expression. The expression is within 0.017 degrees, on the sky, of a full
/// ephemeris from 1970 to 2100.
/// Statuses: null pointer, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_sun_clearance_f64(
    right_ascension_deg: f64,
    declination_deg: f64,
    unix_s: u32,
    clearance_arcsec: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(clearance_arcsec, 4, || sun::sun_clearance(right_ascension_deg, declination_deg, unix_s)) }
}

/// Gives the power of the Sun's light that an aperture takes in, in milliwatts.
///
/// 1000 W/m^2 (pi / 4) D^2: the Sun high in a clear sky (common practice).
/// Caution: some milliwatts at the focus burn an eye or a sensor at once. Use a full-aperture filter made for the
/// Sun.
/// Ranges: effective_aperture_um not 0.
/// Error: at most 0.51 LSB.
/// Statuses: null pointer, zero, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_collected_sunlight_fx(
    effective_aperture_um: u32,
    power_mw: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(power_mw, 2, || sun::collected_sunlight_fx(Micrometres(effective_aperture_um))) }
}

/// Gives the power of the Sun's light that an aperture takes in, in milliwatts.
///
/// 1000 W/m^2 (pi / 4) D^2: the Sun high in a clear sky (common practice).
/// Caution: some milliwatts at the focus burn an eye or a sensor at once. Use a full-aperture filter made for the
/// Sun.
/// Ranges: effective_aperture_mm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_collected_sunlight_f32(
    effective_aperture_mm: f32,
    power_mw: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(power_mw, 2, || sun::collected_sunlight(effective_aperture_mm)) }
}

/// Gives the power of the Sun's light that an aperture takes in, in milliwatts, in double.
///
/// 1000 W/m^2 (pi / 4) D^2: the Sun high in a clear sky (common practice).
/// Caution: some milliwatts at the focus burn an eye or a sensor at once. Use a full-aperture filter made for the
/// Sun.
/// Ranges: effective_aperture_mm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_collected_sunlight_f64(
    effective_aperture_mm: f64,
    power_mw: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(power_mw, 2, || sun::collected_sunlight(effective_aperture_mm)) }
}
