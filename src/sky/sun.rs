//! The Sun: where it stands, how far from it a telescope points, and how much of its light an aperture collects.
//!
//! Never look at or near the Sun through a telescope without a full-aperture filter made for it; nothing here says that it
//! is safe. Finders and guide telescopes need their filters too.

#[cfg(feature = "float")]
use crate::math::degrees;
use crate::math::divide::divide;
#[cfg(feature = "float")]
use crate::math::float::{Real, from_zero_to, positive};
use crate::math::multiply::{high, high_64, high_signed, wide, wide_by};
use crate::math::sine::{sine_fine, size_of_sine};
use crate::math::{arc, root, segment};
use crate::status::{Error, allowed, present};
use crate::units::{Bam, Micrometres, Milliarcseconds, Milliwatts, SignedBam};

/// 2100 January 1, 0 h, in Unix seconds.
const YEAR_2100: u32 = 4_102_444_800;

const QUARTER_TURN: u32 = 1 << 30;

/// 180 degrees.
const HALF_TURN_MAS: u32 = 648_000_000;

/// An angle that grows evenly, from its value at Unix second 0 and what it grows by in a second, in steps of 2^-64 of a
/// turn; to the nearest binary angle.
#[inline(always)]
fn even(at_zero: u64, by_second: u64, unix_s: u32) -> u32 {
    let grown = wide_by(by_second, unix_s).1;
    (at_zero.wrapping_add(grown).wrapping_add(1 << 31) >> 32) as u32
}

/// The Sun's ecliptic longitude and the obliquity of the ecliptic.
#[inline(never)]
fn ecliptic(unix_s: u32) -> (u32, u32) {
    let mean_longitude = even(14_359_182_038_365_870_902, 584_554_569_660, unix_s);
    let anomaly = even(18_334_665_384_497_223_943, 584_526_636_223, unix_s);
    let sine = |angle: u32| {
        let half = (size_of_sine(angle) >> 1) as i32; // 2^-30
        if angle >> 31 == 0 { half } else { -half }
    };
    // 1.915 degrees sin g + 0.020 degrees sin 2g as one product, in steps of 2^-6.
    let cosine = sine(anomaly.wrapping_add(QUARTER_TURN));
    let reach = 1_462_197_755u32.wrapping_add_signed(high_signed(cosine, 30_541_990 << 2));
    let centre = (high_signed(sine(anomaly), reach) + 8) >> 4;
    let longitude = mean_longitude.wrapping_add_signed(centre);
    (longitude, 279_690_454 - high(unix_s, 237_227))
}

/// The binary angle of twice an angle in milliarcseconds.
#[inline(always)]
fn half_in_bam(twice_mas: u32) -> u32 {
    ((wide(twice_mas, 3_558_399_706) + (1 << 30)) >> 31) as u32
}

/// The right ascension of the Sun, of the date.
///
/// atan2(cos e sin l, cos l) for l = L + 1.915 sin g + 0.020 sin 2g, L = 280.460 + 0.9856474 n, g = 357.528 + 0.9856003 n,
/// e = 23.439 - 0.0000004 n, in degrees, n days from 2000 January 1, 12 h. Source: *The Astronomical Almanac*, section C, the
/// low-precision expression for the Sun; the light's aberration is in it.
///
/// Caution: nothing that is computed makes it safe to look near the Sun.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | time in seconds from 1970 January 1, 0 h UTC (Unix time) | s | s, integer | under 4102444800 (the year 2100) |
///
/// Result: bam; float degrees, 0 to 360. It always fits. There is no f32 form.
/// Error: at most 5 LSB from the expression; float 10^-10 degrees. The expression is within 0.017 degrees, on the sky, of a
/// full ephemeris from 1970 to 2100; 0.02 are owed.
pub fn sun_right_ascension_fx(unix_s: u32) -> Result<Bam, Error> {
    allowed(unix_s < YEAR_2100, 1)?;
    let (longitude, obliquity) = ecliptic(unix_s);
    let from_east = longitude.wrapping_add(QUARTER_TURN);
    // Sizes in steps of 2^-31, the first of the product.
    let east = high(size_of_sine(longitude), size_of_sine(obliquity + QUARTER_TURN)) << 1;
    let north = size_of_sine(from_east);
    // From the nearer axis, in a quarter turn.
    let angle = |n: u32, d: u32| half_in_bam(arc::twice_arctangent(divide((n as u64) << 32, d).0));
    let angle = if east < north {
        angle(east, north)
    } else if north < east {
        QUARTER_TURN - angle(north, east)
    } else {
        QUARTER_TURN / 2
    };
    let angle = if from_east >> 31 == 0 { angle } else { (2 * QUARTER_TURN) - angle };
    Ok(Bam(if longitude >> 31 == 0 { angle } else { angle.wrapping_neg() }))
}

/// The declination of the Sun, of the date.
///
/// asin(sin e sin l) with l and e of [`sun_right_ascension_fx`], and its source.
///
/// Caution: nothing that is computed makes it safe to look near the Sun.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | time in seconds from 1970 January 1, 0 h UTC (Unix time) | s | s, integer | under 4102444800 (the year 2100) |
///
/// Result: signed bam; float degrees. It always fits. There is no f32 form.
/// Error: at most 5 LSB from the expression; float 10^-10 degrees. The expression is within 0.017 degrees, on the sky, of a
/// full ephemeris from 1970 to 2100; 0.02 are owed.
pub fn sun_declination_fx(unix_s: u32) -> Result<SignedBam, Error> {
    allowed(unix_s < YEAR_2100, 1)?;
    let (longitude, obliquity) = ecliptic(unix_s);
    let north = high(size_of_sine(longitude), size_of_sine(obliquity)) << 1; // 2^-31, at most 0.4
    let adjacent = root::rounded((1 << 62) - wide(north, north))?;
    let angle = half_in_bam(arc::twice_arctangent(divide((north as u64) << 32, adjacent).0)) as i32;
    Ok(SignedBam(if longitude >> 31 == 0 { angle } else { -angle }))
}

/// Longitude and obliquity in radians.
#[cfg(feature = "float")]
fn ecliptic_in_radians(unix_s: u32) -> (f64, f64) {
    const DEGREE: f64 = core::f64::consts::PI / 180.0;
    let days = (unix_s as f64 - 946_728_000.0) / 86_400.0;
    let anomaly = (357.528 + 0.985_600_3 * days) * DEGREE;
    let centre = 1.915 * Real::sin(anomaly) + 0.020 * Real::sin(2.0 * anomaly);
    ((280.460 + 0.985_647_4 * days + centre) * DEGREE, (23.439 - 0.000_000_4 * days) * DEGREE)
}

/// f64 form of [`sun_right_ascension_fx`].
#[cfg(feature = "float")]
pub fn sun_right_ascension(unix_s: u32) -> Result<f64, Error> {
    allowed(unix_s < YEAR_2100, 1)?;
    let (longitude, obliquity) = ecliptic_in_radians(unix_s);
    let east = Real::cos(obliquity) * Real::sin(longitude);
    let angle = Real::atan2(east, Real::cos(longitude)) * (180.0 / core::f64::consts::PI);
    Ok(if angle < 0.0 { angle + 360.0 } else { angle })
}

/// f64 form of [`sun_declination_fx`].
#[cfg(feature = "float")]
pub fn sun_declination(unix_s: u32) -> Result<f64, Error> {
    allowed(unix_s < YEAR_2100, 1)?;
    let (longitude, obliquity) = ecliptic_in_radians(unix_s);
    Ok(Real::asin(Real::sin(obliquity) * Real::sin(longitude)) * (180.0 / core::f64::consts::PI))
}

/// The angle from a direction to the centre of the Sun.
///
/// 2 atan sqrt((cos^2 u sin^2 v + sin^2 u cos^2 w) / (cos^2 u cos^2 v + sin^2 u sin^2 w)): u half the difference in right
/// ascension, v and w half the difference and half the sum of the declinations, the Sun's by [`sun_right_ascension_fx`] and
/// [`sun_declination_fx`]. Source: Smart, *Textbook on Spherical Astronomy*, the haversine formula and its complement, so
/// that no angle is lost next to the Sun or opposite.
///
/// Caution: nothing that is computed makes it safe to look near the Sun. The disc reaches 0.27 degrees from its centre, and
/// the direction must be of the date: one of J2000 is 0.36 degrees off in 2026. A mount may pass nearer on its way.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | right ascension, of the date | bam | degrees | 0 to 360 degrees |
/// | declination, of the date | signed bam | degrees | -90 to 90 degrees |
/// | time in seconds from 1970 January 1, 0 h UTC (Unix time) | s | s, integer | under 4102444800 (the year 2100) |
///
/// Result: mas; float arcsec. It always fits. There is no f32 form.
/// Error: at most 4 LSB from the expression; float 10^-6 arcsec. The expression is within 0.017 degrees of a full ephemeris
/// from 1970 to 2100; 0.02 are owed.
pub fn sun_clearance_fx(
    right_ascension: Bam,
    declination: SignedBam,
    unix_s: u32,
) -> Result<Milliarcseconds, Error> {
    allowed(declination.0.unsigned_abs() <= QUARTER_TURN, 2)?;
    allowed(unix_s < YEAR_2100, 3)?;
    let (sun_east, sun_north) = (sun_right_ascension_fx(unix_s)?, sun_declination_fx(unix_s)?);
    let east = (right_ascension.0.wrapping_sub(sun_east.0) as i32).unsigned_abs();
    let north = (declination.0 - sun_north.0).unsigned_abs();
    let middle = (declination.0 + sun_north.0).unsigned_abs();
    // Squares of the sine and of the cosine of half the angle, in steps of 2^-62.
    let squares = |angle: u32| {
        let half = (angle as u64) << 31;
        [half, (1 << 62) - half].map(|half| {
            let sine = sine_fine(half) << 1;
            high_64(sine, sine)
        })
    };
    let [east, north, middle] = [east, north, middle].map(squares);
    let product = |a: u64, b: u64| high_64(a << 1, b << 1);
    let near = product(east[1], north[0]) + product(east[0], middle[1]);
    let opposite = product(east[1], north[1]) + product(east[0], middle[0]);
    let (small, large) = if near < opposite { (near, opposite) } else { (opposite, near) };
    if small == 0 {
        return Ok(Milliarcseconds(if near < opposite { 0 } else { HALF_TURN_MAS }));
    }
    let square = segment::ratio(small, large, 0).min((1 << 62) - 1);
    let angle = arc::twice_arctangent(root::rounded(square << 2).unwrap_or(u32::MAX));
    Ok(Milliarcseconds(if near < opposite { angle } else { HALF_TURN_MAS - angle }))
}

/// f64 form of [`sun_clearance_fx`].
#[cfg(feature = "float")]
pub fn sun_clearance(right_ascension_deg: f64, declination_deg: f64, unix_s: u32) -> Result<f64, Error> {
    from_zero_to(360.0, right_ascension_deg, 1)?;
    from_zero_to(90.0, if declination_deg < 0.0 { -declination_deg } else { declination_deg }, 2)?;
    allowed(unix_s < YEAR_2100, 3)?;
    let (sun_east, sun_north) = (sun_right_ascension(unix_s)?, sun_declination(unix_s)?);
    let squares = |angle: f64| {
        let (sine, cosine) = (degrees::sine(0.5 * angle), degrees::cosine(0.5 * angle));
        [sine * sine, cosine * cosine]
    };
    let east = squares(right_ascension_deg - sun_east);
    let (north, middle) = (squares(declination_deg - sun_north), squares(declination_deg + sun_north));
    let near = east[1] * north[0] + east[0] * middle[1];
    let opposite = east[1] * north[1] + east[0] * middle[0];
    let angle = Real::atan2(Real::sqrt(near), Real::sqrt(opposite));
    Ok(angle * (2.0 * 648_000.0 / core::f64::consts::PI))
}

/// The power of the Sun's light that an aperture takes in.
///
/// E (pi / 4) D^2, E = 1000 W/m^2: the Sun high in a clear sky (common practice; AM1.5 in ASTM G173 is 1000.4 W/m^2). Source:
/// the area of a circle.
///
/// Caution: some milliwatts at the focus burn an eye or a sensor at once. Use a full-aperture filter made for the Sun.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | effective aperture D | um | mm | not 0 |
///
/// Result: mW; float mW. Overflow: 4294967296 mW or more.
/// Error: at most 0.51 LSB; float 2 ulp.
pub fn collected_sunlight_fx(effective_aperture: Micrometres) -> Result<Milliwatts, Error> {
    /// pi / 4 times 10^-6, in steps of 2^-84.
    const SHARE: u64 = 15_191_809_894_545_354_323;
    present(effective_aperture.0, 1)?;
    let power = high_64(wide(effective_aperture.0, effective_aperture.0), SHARE) + (1 << 19); // 2^-20
    u32::try_from(power >> 20).map(Milliwatts).map_err(|_| Error::OVERFLOW)
}

/// Float form of [`collected_sunlight_fx`].
#[cfg(feature = "float")]
pub fn collected_sunlight<F: Real>(effective_aperture_mm: F) -> Result<F, Error> {
    positive(effective_aperture_mm, 1)?;
    Ok(F::of(core::f64::consts::FRAC_PI_4) * effective_aperture_mm * effective_aperture_mm)
}
