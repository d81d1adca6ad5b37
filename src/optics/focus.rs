//! Focus: how deep it is, what a miss costs, and how far heat, a near object and the edge of the field move it.

use super::{allowed, present};
use crate::math::divide;
#[cfg(feature = "float")]
use crate::math::double::{Double, product_ratio};
#[cfg(feature = "float")]
use crate::math::float::{Real, either_sign, not_negative, positive};
use crate::math::multiply::{wide, wide_by};
use crate::status::Error;
use crate::units::{
    Microarcseconds, Micrometres, Milliarcseconds, Millikelvin, Millimetres, Nanometres,
    PartsPerBillionPerKelvin, Q16, SignedMillikelvin, SignedNanometres, SignedPartsPerBillionPerKelvin,
};

const BILLION: u32 = 1_000_000_000;

/// How far from the focus, each side, the wavefront is a quarter wave off.
///
/// 2 lambda N^2. Source: Born and Wolf, *Principles of Optics*, focal tolerance; Rayleigh's quarter wave.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal ratio N | Q16.16 | plain | not 0 |
/// | wavelength | nm | nm | not 0 |
///
/// Result: nm; float um. Overflow: 4294967296 nm or more.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn depth_of_focus_fx(focal_ratio: Q16, wavelength: Nanometres) -> Result<Nanometres, Error> {
    present(focal_ratio.0, 1)?;
    present(wavelength.0, 2)?;
    // In steps of 2^-31.
    let (upper, lower) = wide_by(wide(focal_ratio.0, focal_ratio.0), wavelength.0);
    if upper != 0 || lower >= (1 << 63) - (1 << 30) {
        return Err(Error::OVERFLOW);
    }
    Ok(Nanometres(((lower + (1 << 30)) >> 31) as u32))
}

/// Float form of [`depth_of_focus_fx`].
#[cfg(feature = "float")]
pub fn depth_of_focus<F: Real>(focal_ratio: F, wavelength_nm: F) -> Result<F, Error> {
    positive(focal_ratio, 1)?;
    positive(wavelength_nm, 2)?;
    // In this order three roundings stay within 2 ulp, whatever the mantissas.
    Ok(wavelength_nm / F::of(500.0) * (focal_ratio * focal_ratio))
}

/// The diameter that a star's image grows to by geometry when it is out of focus.
///
/// d / N. Source: Smith, *Modern Optical Engineering*, depth of focus: the geometric blur.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | distance from the focus d | nm | um | |
/// | focal ratio N | Q16.16 | plain | not 0 |
///
/// Result: nm; float um. Overflow: 4294967296 nm or more.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn defocus_blur_fx(defocus: Nanometres, focal_ratio: Q16) -> Result<Nanometres, Error> {
    present(focal_ratio.0, 2)?;
    divide::rounded((defocus.0 as u64) << 16, focal_ratio.0).map(Nanometres)
}

/// Float form of [`defocus_blur_fx`].
#[cfg(feature = "float")]
pub fn defocus_blur<F: Real>(defocus_um: F, focal_ratio: F) -> Result<F, Error> {
    not_negative(defocus_um, 1)?;
    positive(focal_ratio, 2)?;
    Ok(defocus_um / focal_ratio)
}

/// The error of the wavefront out of focus, from its lowest to its highest point.
///
/// d / (8 N^2). Source: Smith, *Modern Optical Engineering*, depth of focus.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | distance from the focus d | nm | um | |
/// | focal ratio N | Q16.16 | plain | not 0 |
///
/// Result: nm; float nm too. Overflow: 4294967296 nm or more.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn defocus_wavefront_fx(defocus: Nanometres, focal_ratio: Q16) -> Result<Nanometres, Error> {
    present(focal_ratio.0, 2)?;
    divide::by_64(0, (defocus.0 as u64) << 29, wide(focal_ratio.0, focal_ratio.0)).map(Nanometres)
}

/// Float form of [`defocus_wavefront_fx`].
#[cfg(feature = "float")]
pub fn defocus_wavefront<F: Real>(defocus_um: F, focal_ratio: F) -> Result<F, Error> {
    not_negative(defocus_um, 1)?;
    positive(focal_ratio, 2)?;
    Ok(product_ratio(defocus_um, F::of(125.0), focal_ratio, focal_ratio))
}

/// How many steps of the focus motor a distance takes.
///
/// d / s; the fixed form to the nearest whole step, the float form not rounded. Source: counting.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | distance along the axis d | nm | um | |
/// | distance that one step moves the focus s | nm | um | not 0 |
///
/// Result: steps; float steps and their fraction. It always fits.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn motor_steps_fx(distance: Nanometres, step: Nanometres) -> Result<u32, Error> {
    present(step.0, 2)?;
    divide::rounded(distance.0 as u64, step.0)
}

/// Float form of [`motor_steps_fx`].
#[cfg(feature = "float")]
pub fn motor_steps<F: Real>(distance_um: F, step_um: F) -> Result<F, Error> {
    not_negative(distance_um, 1)?;
    positive(step_um, 2)?;
    Ok(distance_um / step_um)
}

/// How much longer a tube or a rod gets by a change of temperature.
///
/// L a dT; negative where it gets shorter. Source: the definition of the coefficient of linear expansion, *CRC Handbook
/// of Chemistry and Physics*.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | length L | um | mm | |
/// | coefficient of linear expansion a | signed ppb per K | ppm per K | |
/// | change of temperature dT | signed mK | K | |
///
/// Result: signed nm; float um. Overflow: beyond -2147483648 to 2147483647 nm.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn thermal_shift_fx(
    length: Micrometres,
    expansion: SignedPartsPerBillionPerKelvin,
    temperature_change: SignedMillikelvin,
) -> Result<SignedNanometres, Error> {
    let strain = wide(expansion.0.unsigned_abs(), temperature_change.0.unsigned_abs());
    let (upper, lower) = wide_by(strain, length.0);
    // Below 2^62 nothing overflows on the way.
    if upper != 0 || lower >> 62 != 0 {
        return Err(Error::OVERFLOW);
    }
    let shift = divide::rounded(lower, BILLION)?;
    let negative = (expansion.0 < 0) != (temperature_change.0 < 0);
    let shift = if negative { -(shift as i64) } else { shift as i64 };
    i32::try_from(shift).map(SignedNanometres).map_err(|_| Error::OVERFLOW)
}

/// Float form of [`thermal_shift_fx`].
#[cfg(feature = "float")]
pub fn thermal_shift<F: Real>(
    length_mm: F,
    expansion_ppm_per_k: F,
    temperature_change_k: F,
) -> Result<F, Error> {
    not_negative(length_mm, 1)?;
    either_sign(expansion_ppm_per_k, 2)?;
    either_sign(temperature_change_k, 3)?;
    Ok((Double::product(length_mm, expansion_ppm_per_k) * temperature_change_k).upper / F::of(1000.0))
}

/// The change of temperature that uses up a tolerance of focus.
///
/// t / (L a). Source: as [`thermal_shift_fx`].
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | length that grows and carries the focus with it L | um | mm | not 0 |
/// | size of the coefficient of linear expansion a | ppb per K | ppm per K | not 0 |
/// | tolerance of the focus t | nm | um | |
///
/// Result: mK; float K. Overflow: 4294967296 mK or more.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn refocus_temperature_fx(
    length: Micrometres,
    expansion: PartsPerBillionPerKelvin,
    tolerance: Nanometres,
) -> Result<Millikelvin, Error> {
    present(length.0, 1)?;
    present(expansion.0, 2)?;
    divide::by_64(0, wide(tolerance.0, BILLION), wide(length.0, expansion.0)).map(Millikelvin)
}

/// Float form of [`refocus_temperature_fx`].
#[cfg(feature = "float")]
pub fn refocus_temperature<F: Real>(
    length_mm: F,
    expansion_ppm_per_k: F,
    tolerance_um: F,
) -> Result<F, Error> {
    positive(length_mm, 1)?;
    positive(expansion_ppm_per_k, 2)?;
    not_negative(tolerance_um, 3)?;
    Ok(product_ratio(tolerance_um, F::of(1000.0), length_mm, expansion_ppm_per_k))
}

/// How far the focus lies behind its place for a star when the object is near.
///
/// f^2 / (s - f). Source: Hecht, *Optics*, thin lenses: Newton's form.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal length of the telescope f | um | mm | not 0 |
/// | distance of the object from the objective s | mm | m | beyond the focal length |
///
/// Result: um; float mm. Overflow: 4294967296 um or more.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn near_focus_travel_fx(
    focal_length: Micrometres,
    object_distance: Millimetres,
) -> Result<Micrometres, Error> {
    present(focal_length.0, 1)?;
    let distance = wide(object_distance.0, 1000);
    allowed(distance > focal_length.0 as u64, 2)?;
    divide::by_64(0, wide(focal_length.0, focal_length.0), distance - focal_length.0 as u64).map(Micrometres)
}

/// Float form of [`near_focus_travel_fx`].
#[cfg(feature = "float")]
pub fn near_focus_travel<F: Real>(focal_length_mm: F, object_distance_m: F) -> Result<F, Error> {
    positive(focal_length_mm, 1)?;
    not_negative(object_distance_m, 2)?;
    // To the last place also just beyond the focal length.
    let beyond = Double::product(object_distance_m, F::of(1000.0)) - Double::from(focal_length_mm);
    allowed(beyond.upper > F::of(0.0), 2)?;
    Ok((Double::product(focal_length_mm, focal_length_mm) / beyond).upper)
}

/// How long the coma of a paraboloid draws a star out, off the axis.
///
/// 3 t / (16 N^2), the tangential coma. Source: Schroeder, *Astronomical Optics*, paraboloid.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | angle off the axis t | mas | arcsec | |
/// | focal ratio N | Q16.16 | plain | not 0 |
///
/// Result: uas; float arcsec. Overflow: 4294967296 uas or more.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn coma_length_fx(off_axis: Milliarcseconds, focal_ratio: Q16) -> Result<Microarcseconds, Error> {
    present(focal_ratio.0, 2)?;
    // 3000 2^32 / 16 is 375 2^31.
    let product = wide(off_axis.0, 375);
    divide::by_64((product >> 33) as u32, product << 31, wide(focal_ratio.0, focal_ratio.0))
        .map(Microarcseconds)
}

/// Float form of [`coma_length_fx`].
#[cfg(feature = "float")]
pub fn coma_length<F: Real>(off_axis_arcsec: F, focal_ratio: F) -> Result<F, Error> {
    not_negative(off_axis_arcsec, 1)?;
    positive(focal_ratio, 2)?;
    Ok(product_ratio(off_axis_arcsec, F::of(0.1875), focal_ratio, focal_ratio))
}
