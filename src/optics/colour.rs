//! Colour: what a single lens does to it, and what a pair of two glasses leaves.

use super::{allowed, present};
use crate::math::divide;
#[cfg(feature = "float")]
use crate::math::double::{Double, quotient};
#[cfg(feature = "float")]
use crate::math::float::{Real, not_negative, positive};
use crate::math::multiply::wide;
use crate::status::Error;
use crate::units::{Microarcseconds, Micrometres, PartsPerMillion, Q16, RefractiveIndex};

/// One radian in microarcseconds times 2^31: the upper 32 and the lower 64 bits.
const RADIAN_UAS: (u32, u64) = (24, 228_440_804_498_431_395);

#[cfg(feature = "float")]
const HALF_RADIAN_ARCSEC: f64 = 103_132.403_123_548_18;

/// How little a glass spreads the colours: its Abbe number, high for a crown and low for a flint.
///
/// (nd - 1) / (nF - nC), the indices at 587.6, 486.1 and 656.3 nm. Source: ISO 10110-18; Born and Wolf, *Principles of
/// Optics*, 4.7.1.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | index at the d line | 10^-7 | plain | over 1 |
/// | index at the F line | 10^-7 | plain | not 0 |
/// | index at the C line | 10^-7 | plain | not 0, under that at the F line |
///
/// Result: Q16.16; float a plain number. Overflow: 65536 or more.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn abbe_number_fx(
    index_d: RefractiveIndex,
    index_f: RefractiveIndex,
    index_c: RefractiveIndex,
) -> Result<Q16, Error> {
    present(index_d.0, 1)?;
    allowed(index_d > RefractiveIndex::ONE, 1)?;
    present(index_f.0, 2)?;
    present(index_c.0, 3)?;
    allowed(index_c < index_f, 3)?;
    let refraction = (index_d.0 - RefractiveIndex::ONE.0) as u64;
    divide::rounded(refraction << 16, index_f.0 - index_c.0).map(Q16)
}

/// Float form of [`abbe_number_fx`].
#[cfg(feature = "float")]
pub fn abbe_number<F: Real>(index_d: F, index_f: F, index_c: F) -> Result<F, Error> {
    positive(index_d, 1)?;
    allowed(index_d > F::of(1.0), 1)?;
    positive(index_f, 2)?;
    positive(index_c, 3)?;
    allowed(index_c < index_f, 3)?;
    Ok(quotient(Double::sum(index_d, F::of(-1.0)), Double::sum(index_f, -index_c)))
}

/// How far apart along the axis a single lens focuses blue and red, F and C.
///
/// f / V, a thin lens. Source: Kingslake, *Lens Design Fundamentals*, chromatic aberration of a thin lens.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal length f | um | mm | not 0 |
/// | Abbe number of its glass V | Q16.16 | plain | not 0 |
///
/// Result: um; float mm. Overflow: 4294967296 um or more.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn singlet_colour_shift_fx(focal_length: Micrometres, abbe: Q16) -> Result<Micrometres, Error> {
    present(focal_length.0, 1)?;
    present(abbe.0, 2)?;
    divide::rounded((focal_length.0 as u64) << 16, abbe.0).map(Micrometres)
}

/// Float form of [`singlet_colour_shift_fx`].
#[cfg(feature = "float")]
pub fn singlet_colour_shift<F: Real>(focal_length_mm: F, abbe: F) -> Result<F, Error> {
    positive(focal_length_mm, 1)?;
    positive(abbe, 2)?;
    Ok(focal_length_mm / abbe)
}

/// How wide on the sky a single lens draws a star in blue and red, F and C, at the best focus, midway.
///
/// (1 rad) / (2 V N), the diameter. Source: Kingslake, *Lens Design Fundamentals*, chromatic aberration of a thin lens;
/// similar triangles.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal ratio N | Q16.16 | plain | not 0 |
/// | Abbe number of the glass V | Q16.16 | plain | not 0 |
///
/// Result: uas; float arcsec. Overflow: 4294967296 uas or more.
/// Error: at most 0.51 LSB; float 2 ulp.
pub fn singlet_colour_blur_fx(focal_ratio: Q16, abbe: Q16) -> Result<Microarcseconds, Error> {
    present(focal_ratio.0, 1)?;
    present(abbe.0, 2)?;
    divide::by_64(RADIAN_UAS.0, RADIAN_UAS.1, wide(focal_ratio.0, abbe.0)).map(Microarcseconds)
}

/// Float form of [`singlet_colour_blur_fx`].
#[cfg(feature = "float")]
pub fn singlet_colour_blur<F: Real>(focal_ratio: F, abbe: F) -> Result<F, Error> {
    positive(focal_ratio, 1)?;
    positive(abbe, 2)?;
    Ok(F::of(HALF_RADIAN_ARCSEC) / (focal_ratio * abbe))
}

/// The two Abbe numbers of an achromat, arguments 2 and 3.
#[inline(always)]
fn pair(focal_length: Micrometres, crown_abbe: Q16, flint_abbe: Q16) -> Result<u32, Error> {
    present(focal_length.0, 1)?;
    present(crown_abbe.0, 2)?;
    present(flint_abbe.0, 3)?;
    allowed(flint_abbe < crown_abbe, 3)?;
    Ok(crown_abbe.0 - flint_abbe.0)
}

/// f (V1 - V2), correctly rounded.
#[cfg(feature = "float")]
fn pair_of_floats<F: Real>(focal_length_mm: F, crown_abbe: F, flint_abbe: F) -> Result<F, Error> {
    positive(focal_length_mm, 1)?;
    positive(crown_abbe, 2)?;
    positive(flint_abbe, 3)?;
    allowed(flint_abbe < crown_abbe, 3)?;
    Ok((Double::sum(crown_abbe, -flint_abbe) * focal_length_mm).upper)
}

/// The focal length of an achromat's crown lens, so that the pair focuses F and C together.
///
/// f (V1 - V2) / V1, thin lenses in contact. Source: Kingslake, *Lens Design Fundamentals*, thin-lens achromat; Smith,
/// *Modern Optical Engineering*.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal length of the pair f | um | mm | not 0 |
/// | Abbe number of the crown V1 | Q16.16 | plain | not 0 |
/// | Abbe number of the flint V2 | Q16.16 | plain | not 0, under that of the crown |
///
/// Result: um; float mm. It always fits.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn achromat_crown_fx(
    focal_length: Micrometres,
    crown_abbe: Q16,
    flint_abbe: Q16,
) -> Result<Micrometres, Error> {
    let difference = pair(focal_length, crown_abbe, flint_abbe)?;
    divide::scaled(focal_length.0, difference, crown_abbe.0).map(Micrometres)
}

/// Float form of [`achromat_crown_fx`].
#[cfg(feature = "float")]
pub fn achromat_crown<F: Real>(focal_length_mm: F, crown_abbe: F, flint_abbe: F) -> Result<F, Error> {
    Ok(pair_of_floats(focal_length_mm, crown_abbe, flint_abbe)? / crown_abbe)
}

/// The focal length of an achromat's flint lens, in size: the lens is negative.
///
/// f (V1 - V2) / V2, thin lenses in contact. Source: as [`achromat_crown_fx`].
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal length of the pair f | um | mm | not 0 |
/// | Abbe number of the crown V1 | Q16.16 | plain | not 0 |
/// | Abbe number of the flint V2 | Q16.16 | plain | not 0, under that of the crown |
///
/// Result: um; float mm. Overflow: 4294967296 um or more.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn achromat_flint_fx(
    focal_length: Micrometres,
    crown_abbe: Q16,
    flint_abbe: Q16,
) -> Result<Micrometres, Error> {
    let difference = pair(focal_length, crown_abbe, flint_abbe)?;
    divide::scaled(focal_length.0, difference, flint_abbe.0).map(Micrometres)
}

/// Float form of [`achromat_flint_fx`].
#[cfg(feature = "float")]
pub fn achromat_flint<F: Real>(focal_length_mm: F, crown_abbe: F, flint_abbe: F) -> Result<F, Error> {
    Ok(pair_of_floats(focal_length_mm, crown_abbe, flint_abbe)? / flint_abbe)
}

/// How far from the common focus of blue and red, F and C, an achromat brings the colour between.
///
/// f dP / dV, dP and dV how much the two glasses differ in partial dispersion, (nF - nd) / (nF - nC) for the d line, and
/// in Abbe number. Source: Kingslake, *Lens Design Fundamentals*, secondary spectrum.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal length of the pair f | um | mm | not 0 |
/// | difference of the partial dispersions dP, in size | ppm | plain | |
/// | difference of the Abbe numbers dV | Q16.16 | plain | not 0 |
///
/// Result: um; float mm. Overflow: 4294967296 um or more.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn secondary_spectrum_fx(
    focal_length: Micrometres,
    partial_difference: PartsPerMillion,
    abbe_difference: Q16,
) -> Result<Micrometres, Error> {
    present(focal_length.0, 1)?;
    present(abbe_difference.0, 3)?;
    // 2^16 / 10^6 is 2^10 / 15625.
    let product = wide(focal_length.0, partial_difference.0);
    divide::by_64((product >> 54) as u32, product << 10, wide(abbe_difference.0, 15_625)).map(Micrometres)
}

/// Float form of [`secondary_spectrum_fx`].
#[cfg(feature = "float")]
pub fn secondary_spectrum<F: Real>(
    focal_length_mm: F,
    partial_difference: F,
    abbe_difference: F,
) -> Result<F, Error> {
    positive(focal_length_mm, 1)?;
    not_negative(partial_difference, 2)?;
    positive(abbe_difference, 3)?;
    // The last product rounds well however small it is.
    Ok(focal_length_mm / abbe_difference * partial_difference)
}
