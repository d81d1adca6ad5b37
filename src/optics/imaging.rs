//! Imaging: how a sensor samples the sky, how large a target falls on it, and what a focal ratio does to the exposure.

#[cfg(feature = "float")]
use super::field::{HALF_TURN_ARCSEC, RADIAN_ARCSEC_PER_THOUSAND, angle_of_tangent, half_tangent};
use super::field::{HALF_TURN_MAS, RADIAN_MAS};
use super::{allowed, present};
#[cfg(feature = "float")]
use crate::math::double::{Double, product_ratio};
#[cfg(feature = "float")]
use crate::math::float::{Real, positive};
use crate::math::multiply::{of_lower_halves, wide, wide_by};
use crate::math::{arc, divide, logarithm, root};
#[cfg(feature = "float")]
use crate::status::Cause;
use crate::status::Error;
use crate::units::{Microarcseconds, Micrometres, Milliarcseconds, Nanometres, Q16, SignedQ16};

/// How many pixels lie across the width of a star's image.
///
/// FWHM / scale. Two or more keep all that the image holds (common practice, after the sampling theorem). Source:
/// Howell, *Handbook of CCD Astronomy*, pixel sampling.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | full width at half maximum of the star's image | uas | arcsec | not 0 |
/// | angle of sky to a pixel | uas | arcsec | not 0 |
///
/// Result: Q16.16; float a plain number. Overflow: 65536 or more.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn pixels_per_fwhm_fx(fwhm: Microarcseconds, pixel_scale: Microarcseconds) -> Result<Q16, Error> {
    present(fwhm.0, 1)?;
    present(pixel_scale.0, 2)?;
    divide::rounded((fwhm.0 as u64) << 16, pixel_scale.0).map(Q16)
}

/// Float form of [`pixels_per_fwhm_fx`].
#[cfg(feature = "float")]
pub fn pixels_per_fwhm<F: Real>(fwhm_arcsec: F, pixel_scale_arcsec: F) -> Result<F, Error> {
    positive(fwhm_arcsec, 1)?;
    positive(pixel_scale_arcsec, 2)?;
    Ok(fwhm_arcsec / pixel_scale_arcsec)
}

/// The coarsest pixel that loses nothing of what the telescope shows in still air.
///
/// lambda f / (2 D): two pixels to the period of the cutoff frequency. Source: Shannon, *Proceedings of the IRE* 37, 10
/// (1949), the sampling theorem; Goodman, *Introduction to Fourier Optics*, incoherent imaging.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal length of the telescope f | um | mm | not 0 |
/// | aperture D | um | mm | not 0 |
/// | wavelength | nm | nm | not 0 |
///
/// Result: nm; float um. Overflow: 4294967296 nm or more.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn nyquist_pixel_fx(
    focal_length: Micrometres,
    aperture: Micrometres,
    wavelength: Nanometres,
) -> Result<Nanometres, Error> {
    present(focal_length.0, 1)?;
    present(aperture.0, 2)?;
    present(wavelength.0, 3)?;
    let product = wide(focal_length.0, wavelength.0);
    divide::with_fraction(product >> 1, (product as u32) << 31, aperture.0).map(Nanometres)
}

/// Float form of [`nyquist_pixel_fx`].
#[cfg(feature = "float")]
pub fn nyquist_pixel<F: Real>(focal_length_mm: F, aperture_mm: F, wavelength_nm: F) -> Result<F, Error> {
    positive(focal_length_mm, 1)?;
    positive(aperture_mm, 2)?;
    positive(wavelength_nm, 3)?;
    Ok(product_ratio(focal_length_mm, wavelength_nm, aperture_mm, F::of(2000.0)))
}

/// The focal length that gives a pixel so much of the sky.
///
/// (1 rad) p / scale. Source: Schroeder, *Astronomical Optics*, plate scale.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | pixel pitch p | nm | um | not 0 |
/// | angle of sky to a pixel | uas | arcsec | not 0 |
///
/// Result: um; float mm. Overflow: 4294967296 um or more.
/// Error: at most 0.51 LSB; float 2 ulp.
pub fn focal_length_for_pixel_scale_fx(
    pixel: Nanometres,
    pixel_scale: Microarcseconds,
) -> Result<Micrometres, Error> {
    present(pixel.0, 1)?;
    present(pixel_scale.0, 2)?;
    divide::constant(pixel.0, RADIAN_MAS, pixel_scale.0).map(Micrometres)
}

/// Float form of [`focal_length_for_pixel_scale_fx`].
#[cfg(feature = "float")]
pub fn focal_length_for_pixel_scale<F: Real>(pixel_um: F, pixel_scale_arcsec: F) -> Result<F, Error> {
    positive(pixel_um, 1)?;
    positive(pixel_scale_arcsec, 2)?;
    Ok(pixel_um.times(RADIAN_ARCSEC_PER_THOUSAND) / pixel_scale_arcsec)
}

/// The angle of sky from corner to corner of a sensor.
///
/// 2 atan(p sqrt(c^2 + r^2) / 2f). Source: Schroeder, *Astronomical Optics*, plate scale; Pythagoras.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | pixel pitch p | nm | um | not 0 |
/// | pixels across the sensor c | count of 16 bits | count | not 0 |
/// | pixels along its other side r | count of 16 bits | count | not 0 |
/// | focal length of the telescope f | um | mm | not 0 |
///
/// Result: mas; float arcsec. It always fits.
/// Error: at most 1 LSB; float 3 ulp.
pub fn diagonal_field_fx(
    pixel: Nanometres,
    columns: u16,
    rows: u16,
    focal_length: Micrometres,
) -> Result<Milliarcseconds, Error> {
    present(pixel.0, 1)?;
    present(columns as u32, 2)?;
    present(rows as u32, 3)?;
    present(focal_length.0, 4)?;
    let square = |n: u16| of_lower_halves(n as u32, n as u32) as u64;
    let square = square(columns) + square(rows);
    // The root in steps of 2^-down, its top bit set.
    let (root, down) = if square >> 32 == 0 {
        let (normal, shift) = divide::normalise_evenly(square as u32);
        (root::rounded((normal as u64) << 32)?, 16 + shift / 2)
    } else {
        (root::rounded(square << 30)?, 15)
    };
    Ok(Milliarcseconds(arc::angle_of_wide(wide(pixel.0, root), wide(focal_length.0, 2000), down)))
}

/// Float form of [`diagonal_field_fx`].
#[cfg(feature = "float")]
pub fn diagonal_field<F: Real>(pixel_um: F, columns: u16, rows: u16, focal_length_mm: F) -> Result<F, Error> {
    positive(pixel_um, 1)?;
    present(columns as u32, 2)?;
    present(rows as u32, 3)?;
    positive(focal_length_mm, 4)?;
    let square = |n: u16| n as u64 * n as u64;
    let square = square(columns) + square(rows);
    // In two parts that f32 holds, and the root with what one step of Newton adds.
    let square = Double::sum(
        F::of_count((square >> 16) as u32) * F::of(65536.0),
        F::of_count((square & 0xffff) as u32),
    );
    let root = square.upper.sqrt();
    let rest = square - Double::product(root, root);
    let diagonal = Double::sum(root, rest.upper / (root + root)) * pixel_um;
    Ok(angle_of_tangent(diagonal / Double::product(focal_length_mm, F::of(2000.0))))
}

/// How large a target is at the focus.
///
/// 2 f tan(t/2). Source: Schroeder, *Astronomical Optics*, plate scale.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | angle of sky t | mas | arcsec | not 0, under 648000000 (180 degrees) |
/// | focal length of the telescope f | um | mm | not 0 |
///
/// Result: nm; float um. Overflow: 4294967296 nm or more.
/// Error: at most 1 LSB; float 3 ulp.
pub fn image_size_fx(field: Milliarcseconds, focal_length: Micrometres) -> Result<Nanometres, Error> {
    present(field.0, 1)?;
    allowed(field.0 < HALF_TURN_MAS, 1)?;
    present(focal_length.0, 2)?;
    if field.0 <= HALF_TURN_MAS / 2 {
        let (upper, lower) = wide_by(wide(focal_length.0, field.0), 1000);
        if upper != 0 {
            return Err(Error::OVERFLOW);
        }
        if lower >> 55 == 0 {
            // At most 2^28 nm, of which the side is good to 3/8.
            return divide::rounded(lower << 4, arc::adjacent(field.0)).map(Nanometres);
        }
        let adjacent = arc::adjacent_fine(field.0);
        return divide::by_64((lower >> 32) as u32, lower << 32, adjacent).map(Nanometres);
    }
    let rest = HALF_TURN_MAS - field.0;
    if focal_length.0 > u32::MAX / 2000 {
        return Err(Error::OVERFLOW);
    }
    let (upper, lower) = wide_by(arc::adjacent_fine(rest), 2000 * focal_length.0);
    divide::with_fraction((upper as u64) << 33 | lower >> 31, (lower as u32) << 1, rest).map(Nanometres)
}

/// Float form of [`image_size_fx`].
#[cfg(feature = "float")]
pub fn image_size<F: Real>(field_arcsec: F, focal_length_mm: F) -> Result<F, Error> {
    positive(field_arcsec, 1)?;
    if field_arcsec >= F::of(HALF_TURN_ARCSEC) {
        return Err(Error::new(Cause::OutOfRange, 1));
    }
    positive(focal_length_mm, 2)?;
    // Exact where it is the smaller.
    let rest = F::of(HALF_TURN_ARCSEC) - field_arcsec;
    let twice_in_um = Double::product(focal_length_mm, F::of(2000.0));
    Ok(if field_arcsec <= rest {
        (half_tangent(field_arcsec) * twice_in_um).upper
    } else {
        (twice_in_um / half_tangent(rest)).upper
    })
}

/// How many stops more exposure a focal ratio needs than another.
///
/// 2 log2(Nto / Nfrom): a stop is twice the time. Source: ISO 517, aperture markings in powers of the root of two.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal ratio of the exposure that is known, Nfrom | Q16.16 | plain | not 0 |
/// | focal ratio of the one that is wanted, Nto | Q16.16 | plain | not 0 |
///
/// Result: signed Q16.16, negative where less exposure is needed; float a plain number. It always fits.
/// Error: at most 1 LSB; float 3 ulp, also where the two are nearly equal.
pub fn exposure_stops_fx(from_focal_ratio: Q16, to_focal_ratio: Q16) -> Result<SignedQ16, Error> {
    present(from_focal_ratio.0, 1)?;
    present(to_focal_ratio.0, 2)?;
    // In steps of 2^-25, so that their difference has room.
    let log2 = |x: u32| (logarithm::log2(x) >> 2) as i32;
    let stops = log2(to_focal_ratio.0) - log2(from_focal_ratio.0); // 2^-24
    Ok(SignedQ16((stops + (1 << 7)) >> 8))
}

/// Float form of [`exposure_stops_fx`].
#[cfg(feature = "float")]
pub fn exposure_stops<F: Real>(from_focal_ratio: F, to_focal_ratio: F) -> Result<F, Error> {
    positive(from_focal_ratio, 1)?;
    positive(to_focal_ratio, 2)?;
    let (from, to, two) = (from_focal_ratio, to_focal_ratio, F::of(2.0));
    let two_over_ln_2 = Double::of(2.885_390_081_777_926_8);
    Ok(if to >= two * from || from >= two * to {
        two * (to / from).log2()
    } else if to < from {
        -(two_over_ln_2 * ((from - to) / to).ln_1p()).upper
    } else {
        // The difference is exact within a factor of two.
        (two_over_ln_2 * ((to - from) / from).ln_1p()).upper
    })
}
