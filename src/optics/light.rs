//! Light: what the mirrors, the glass and the hole in the middle leave of it, and the magnitudes that follow.

use super::{allowed, present};
#[cfg(feature = "float")]
use crate::math::double::Double;
#[cfg(feature = "float")]
use crate::math::float::{Real, either_sign, from_zero_to, not_negative, positive};
use crate::math::multiply::{wide, wide_by};
use crate::math::{divide, logarithm, root};
use crate::status::Error;
use crate::units::{Micrometres, Millimagnitudes, MillimagnitudesPerAirmass, Q16};

/// 1 in Q16.16; no share is above it.
const WHOLE: u32 = Q16::ONE.0;

/// -log2 of share^count in the steps of `logarithm`; 0 to the power 0 is 1.
#[inline(always)]
fn loss(share: u32, count: u8) -> u64 {
    match (count, share) {
        (0, _) => 0,
        (_, 0) => u64::MAX >> 1,
        _ => wide(16 * logarithm::ONE - logarithm::log2(share), count as u32),
    }
}

/// The share of the light that mirrors and glass surfaces let through.
///
/// R^m T^s. Source: Smith, *Modern Optical Engineering*, transmission of an optical system.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | mirrors m | count | count | |
/// | reflectance of each, R | Q16.16 | plain | at most 1 |
/// | surfaces between glass and air s | count | count | |
/// | transmittance of each, T | Q16.16 | plain | at most 1 |
///
/// Result: Q16.16; float a plain number; at most 1. 0 to the power 0 is 1.
/// Error: at most 1 LSB; float 3 ulp.
pub fn throughput_fx(mirrors: u8, reflectance: Q16, surfaces: u8, transmittance: Q16) -> Result<Q16, Error> {
    allowed(reflectance.0 <= WHOLE, 2)?;
    allowed(transmittance.0 <= WHOLE, 4)?;
    let loss = loss(reflectance.0, mirrors) + loss(transmittance.0, surfaces);
    if loss >> 32 != 0 {
        return Ok(Q16(0)); // under 2^-32
    }
    Ok(Q16((logarithm::exp2_negative(loss as u32) + (1 << 14)) >> 15))
}

/// Float form of [`throughput_fx`].
#[cfg(feature = "float")]
pub fn throughput<F: Real>(mirrors: u8, reflectance: F, surfaces: u8, transmittance: F) -> Result<F, Error> {
    from_zero_to(1.0, reflectance, 2)?;
    from_zero_to(1.0, transmittance, 4)?;
    Ok(reflectance.powf(F::of_count(mirrors as u32)) * transmittance.powf(F::of_count(surfaces as u32)))
}

/// The share of the aperture's area that the central obstruction leaves.
///
/// 1 - (d / D)^2. Source: Schroeder, *Astronomical Optics*, two-mirror telescopes.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | aperture D | um | mm | not 0 |
/// | diameter of the obstruction d | um | mm | under the aperture |
///
/// Result: Q16.16; float a plain number; at most 1.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn clear_fraction_fx(aperture: Micrometres, obstruction: Micrometres) -> Result<Q16, Error> {
    let clear = clear_square(aperture, obstruction)?;
    divide::by_64((clear >> 48) as u32, clear << 16, wide(aperture.0, aperture.0)).map(Q16)
}

/// Float form of [`clear_fraction_fx`].
#[cfg(feature = "float")]
pub fn clear_fraction<F: Real>(aperture_mm: F, obstruction_mm: F) -> Result<F, Error> {
    positive(aperture_mm, 1)?;
    not_negative(obstruction_mm, 2)?;
    allowed(obstruction_mm < aperture_mm, 2)?;
    // Beside the rim the difference is exact, and t (2 - t) keeps its digits.
    let rim = aperture_mm - obstruction_mm;
    if obstruction_mm > rim {
        let t = rim / aperture_mm;
        return Ok(t * (F::of(2.0) - t));
    }
    let e = obstruction_mm / aperture_mm;
    Ok(F::of(1.0) - e * e)
}

/// D^2 - d^2 of an aperture and its obstruction, arguments 1 and 2.
#[inline(always)]
fn clear_square(aperture: Micrometres, obstruction: Micrometres) -> Result<u64, Error> {
    present(aperture.0, 1)?;
    allowed(obstruction.0 < aperture.0, 2)?;
    Ok(wide(aperture.0, aperture.0) - wide(obstruction.0, obstruction.0))
}

/// The clear, lossless aperture that would gather as much light.
///
/// D sqrt((1 - (d / D)^2) T). Source: equal areas, with the throughput; Schroeder, *Astronomical Optics*.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | aperture D | um | mm | not 0 |
/// | diameter of the obstruction d | um | mm | under the aperture |
/// | throughput T | Q16.16 | plain | at most 1 |
///
/// Result: um; float mm; at most the aperture.
/// Error: at most 0.51 LSB; float 2 ulp.
pub fn effective_aperture_fx(
    aperture: Micrometres,
    obstruction: Micrometres,
    throughput: Q16,
) -> Result<Micrometres, Error> {
    let clear = clear_square(aperture, obstruction)?;
    allowed(throughput.0 <= WHOLE, 3)?;
    let (upper, lower) = wide_by(clear, throughput.0);
    root::with_fraction((upper as u64) << 48 | lower >> 16, (lower as u32) << 16).map(Micrometres)
}

/// Float form of [`effective_aperture_fx`].
#[cfg(feature = "float")]
pub fn effective_aperture<F: Real>(aperture_mm: F, obstruction_mm: F, throughput: F) -> Result<F, Error> {
    positive(aperture_mm, 1)?;
    not_negative(obstruction_mm, 2)?;
    allowed(obstruction_mm < aperture_mm, 2)?;
    from_zero_to(1.0, throughput, 3)?;
    let square = |x| Double::product(x, x);
    let clear = (square(aperture_mm) - square(obstruction_mm)).upper;
    // A tiny throughput is brought up by 2^64, so that the product keeps its bits.
    if throughput < F::of(1.0 / (1u64 << 32) as f64) {
        let root = (clear * (throughput * F::of(18_446_744_073_709_551_616.0))).sqrt();
        return Ok(root * F::of(1.0 / (1u64 << 32) as f64));
    }
    Ok((clear * throughput).sqrt())
}

/// 5 log10(a / b) in steps of 2^-15 mmag. Neither is 0. Error: at most 0.05 mmag.
#[inline(always)]
fn five_log10(a: u32, b: u32) -> i32 {
    let octaves = (logarithm::log2(a) >> 12) as i32 - (logarithm::log2(b) >> 12) as i32; // 2^-15, within 2^20
    // 5000 log10(2) = 1505 + 4914.6 / 2^15
    octaves * 1505 + (((octaves >> 5) * 4915) >> 10)
}

/// 5 log10(a / b).
#[cfg(feature = "float")]
fn five_log10_of<F: Real>(a: F, b: F) -> F {
    let (two, scale) = (F::of(2.0), Double::of(2.171_472_409_516_259));
    if a > two * b || b > two * a {
        F::of(5.0) * (a / b).log10()
    } else if a < b {
        -(scale * ((b - a) / a).ln_1p()).upper
    } else {
        // The difference is exact within a factor of two.
        (scale * ((a - b) / b).ln_1p()).upper
    }
}

/// How many magnitudes fainter a telescope shows a star than the bare eye.
///
/// 5 log10(D / p), the ratio of the areas in magnitudes; negative where the pupil is the wider. Source: Schroeder,
/// *Astronomical Optics*; Pogson (1856) for the scale.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | effective aperture D | um | mm | not 0 |
/// | pupil of the eye p | um | mm | not 0 |
///
/// Result: mmag; float magnitudes. It always fits.
/// Error: at most 1 LSB; float 3 ulp, also where the two are nearly equal.
pub fn magnitude_gain_fx(
    effective_aperture: Micrometres,
    eye_pupil: Micrometres,
) -> Result<Millimagnitudes, Error> {
    present(effective_aperture.0, 1)?;
    present(eye_pupil.0, 2)?;
    Ok(Millimagnitudes((five_log10(effective_aperture.0, eye_pupil.0) + (1 << 14)) >> 15))
}

/// Float form of [`magnitude_gain_fx`].
#[cfg(feature = "float")]
pub fn magnitude_gain<F: Real>(effective_aperture_mm: F, eye_pupil_mm: F) -> Result<F, Error> {
    positive(effective_aperture_mm, 1)?;
    positive(eye_pupil_mm, 2)?;
    Ok(five_log10_of(effective_aperture_mm, eye_pupil_mm))
}

/// The faintest star that a telescope shows to an eye whose own limit is known.
///
/// m0 + 5 log10(D / p). Source: as [`magnitude_gain_fx`]. It takes the telescope as a collector of light only: a high
/// magnification darkens the sky and shows fainter stars yet (common practice: up to a magnitude).
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | faintest star for the bare eye m0 | mmag | mag | |
/// | effective aperture D | um | mm | not 0 |
/// | pupil of the eye p | um | mm | not 0 |
///
/// Result: mmag; float magnitudes. Overflow: beyond 32 bits.
/// Error: at most 1 LSB; float 3 ulp of the larger term.
pub fn limiting_magnitude_fx(
    naked_eye: Millimagnitudes,
    effective_aperture: Micrometres,
    eye_pupil: Micrometres,
) -> Result<Millimagnitudes, Error> {
    present(effective_aperture.0, 2)?;
    present(eye_pupil.0, 3)?;
    let gain = (five_log10(effective_aperture.0, eye_pupil.0) + (1 << 14)) >> 15;
    naked_eye.0.checked_add(gain).map(Millimagnitudes).ok_or(Error::OVERFLOW)
}

/// Float form of [`limiting_magnitude_fx`].
#[cfg(feature = "float")]
pub fn limiting_magnitude<F: Real>(
    naked_eye_mag: F,
    effective_aperture_mm: F,
    eye_pupil_mm: F,
) -> Result<F, Error> {
    either_sign(naked_eye_mag, 1)?;
    positive(effective_aperture_mm, 2)?;
    positive(eye_pupil_mm, 3)?;
    Ok(naked_eye_mag + five_log10_of(effective_aperture_mm, eye_pupil_mm))
}

/// How bright an extended object looks in the eyepiece, against the bare eye.
///
/// T min(1, (x / p)^2): an exit pupil as wide as the eye's gives all that can be had. Source: Born and Wolf,
/// *Principles of Optics*, photometry of optical images.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | exit pupil x | um | mm | not 0 |
/// | pupil of the eye p | um | mm | not 0 |
/// | throughput T | Q16.16 | plain | at most 1 |
///
/// Result: Q16.16; float a plain number; at most 1.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn surface_brightness_fx(
    exit_pupil: Micrometres,
    eye_pupil: Micrometres,
    throughput: Q16,
) -> Result<Q16, Error> {
    present(exit_pupil.0, 1)?;
    present(eye_pupil.0, 2)?;
    allowed(throughput.0 <= WHOLE, 3)?;
    if exit_pupil >= eye_pupil {
        return Ok(throughput);
    }
    let (upper, lower) = wide_by(wide(exit_pupil.0, exit_pupil.0), throughput.0);
    divide::by_64(upper, lower, wide(eye_pupil.0, eye_pupil.0)).map(Q16)
}

/// Float form of [`surface_brightness_fx`].
#[cfg(feature = "float")]
pub fn surface_brightness<F: Real>(exit_pupil_mm: F, eye_pupil_mm: F, throughput: F) -> Result<F, Error> {
    positive(exit_pupil_mm, 1)?;
    positive(eye_pupil_mm, 2)?;
    from_zero_to(1.0, throughput, 3)?;
    if exit_pupil_mm >= eye_pupil_mm {
        return Ok(throughput);
    }
    let square = |x| Double::product(x, x);
    Ok(throughput * (square(exit_pupil_mm) / square(eye_pupil_mm)).upper)
}

/// How many magnitudes fainter the first of two lights is than the second.
///
/// -2.5 log10(a / b). Source: Pogson, Monthly Notices of the Royal Astronomical Society 17 (1856), 12.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | flux a | any one unit | any one unit | not 0 |
/// | flux b | the same unit | the same unit | not 0 |
///
/// Result: mmag, negative where a is the brighter; float magnitudes. It always fits.
/// Error: at most 1 LSB; float 3 ulp, also where the two are nearly equal.
pub fn magnitude_difference_fx(flux_a: u32, flux_b: u32) -> Result<Millimagnitudes, Error> {
    present(flux_a, 1)?;
    present(flux_b, 2)?;
    Ok(Millimagnitudes((five_log10(flux_b, flux_a) + (1 << 15)) >> 16))
}

/// Float form of [`magnitude_difference_fx`].
#[cfg(feature = "float")]
pub fn magnitude_difference<F: Real>(flux_a: F, flux_b: F) -> Result<F, Error> {
    positive(flux_a, 1)?;
    positive(flux_b, 2)?;
    Ok(F::of(0.5) * five_log10_of(flux_b, flux_a))
}

/// How many magnitudes a light loses from a near to a distant place.
///
/// 5 log10(distant / near), the inverse-square law. Source: Carroll and Ostlie, *An Introduction to Modern
/// Astrophysics*, the distance modulus.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | near distance | any one unit | any one unit | not 0 |
/// | distant distance | the same unit | the same unit | not 0 |
///
/// Result: mmag, negative where the second is the nearer; float magnitudes. It always fits.
/// Error: at most 1 LSB; float 3 ulp, also where the two are nearly equal.
pub fn distance_dimming_fx(near_distance: u32, distant_distance: u32) -> Result<Millimagnitudes, Error> {
    present(near_distance, 1)?;
    present(distant_distance, 2)?;
    Ok(Millimagnitudes((five_log10(distant_distance, near_distance) + (1 << 14)) >> 15))
}

/// Float form of [`distance_dimming_fx`].
#[cfg(feature = "float")]
pub fn distance_dimming<F: Real>(near_distance: F, distant_distance: F) -> Result<F, Error> {
    positive(near_distance, 1)?;
    positive(distant_distance, 2)?;
    Ok(five_log10_of(distant_distance, near_distance))
}

/// How many magnitudes the air takes from a star.
///
/// k X. Source: Bouguer, *Essai d'optique sur la gradation de la lumiere* (1729).
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | extinction of one airmass k | mmag | mag | |
/// | airmass X | Q16.16 | plain | |
///
/// Result: mmag; float magnitudes. Overflow: 2147483648 mmag or more.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn extinction_fx(coefficient: MillimagnitudesPerAirmass, airmass: Q16) -> Result<Millimagnitudes, Error> {
    let product = wide(coefficient.0, airmass.0) + (1 << 15);
    if product >> 47 != 0 {
        return Err(Error::OVERFLOW);
    }
    Ok(Millimagnitudes((product >> 16) as i32))
}

/// Float form of [`extinction_fx`].
#[cfg(feature = "float")]
pub fn extinction<F: Real>(coefficient_mag: F, airmass: F) -> Result<F, Error> {
    not_negative(coefficient_mag, 1)?;
    not_negative(airmass, 2)?;
    Ok(coefficient_mag * airmass)
}

/// The focal ratio of the lossless telescope that would expose a sensor as fast.
///
/// N / sqrt(T). Source: Smith, *Modern Optical Engineering*, T-numbers.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal ratio N | Q16.16 | plain | not 0 |
/// | throughput T | Q16.16 | plain | not 0, at most 1 |
///
/// Result: Q16.16; float a plain number. Overflow: 65536 or more.
/// Error: at most 0.51 LSB; float 2 ulp.
pub fn t_number_fx(focal_ratio: Q16, throughput: Q16) -> Result<Q16, Error> {
    present(focal_ratio.0, 1)?;
    present(throughput.0, 2)?;
    allowed(throughput.0 <= WHOLE, 2)?;
    // N^2 2^16 / T in three places of 32 bits, the last of them a fraction.
    let square = wide(focal_ratio.0, focal_ratio.0);
    let first = square >> 16;
    if (first >> 32) as u32 >= throughput.0 {
        return Err(Error::OVERFLOW);
    }
    let (upper, rest) = place(first, throughput.0);
    let (lower, rest) = place((rest as u64) << 32 | (square as u32 as u64) << 16 & 0xffff_ffff, throughput.0);
    let fraction = if upper == 0 { place((rest as u64) << 32, throughput.0).0 } else { 0 };
    root::with_fraction((upper as u64) << 32 | lower as u64, fraction).map(Q16)
}

/// One place of a long division. `d` is not 0 and above the upper half of `n`.
#[inline(always)]
fn place(n: u64, d: u32) -> (u32, u32) {
    if n < d as u64 { (0, n as u32) } else { divide::divide(n, d) }
}

/// Float form of [`t_number_fx`].
#[cfg(feature = "float")]
pub fn t_number<F: Real>(focal_ratio: F, throughput: F) -> Result<F, Error> {
    positive(focal_ratio, 1)?;
    positive(throughput, 2)?;
    allowed(throughput <= F::of(1.0), 2)?;
    Ok(focal_ratio / throughput.sqrt())
}

#[cfg(test)]
mod tests {
    use super::*;

    /// Where the errors of two logarithms count most: many surfaces, each nearly perfect.
    #[test]
    fn throughput_of_many_good_surfaces() {
        let mut worst = 0.0f64;
        for lost in 0..400 {
            let share = WHOLE - lost;
            for count in [1u8, 2, 3, 10, 60, 150, 255] {
                for (mirrors, surfaces) in [(count, 0), (count, count), (count, 255 - count)] {
                    let got = throughput_fx(mirrors, Q16(share), surfaces, Q16(share)).unwrap().0;
                    let times = mirrors as i32 + surfaces as i32;
                    let exact = 65536.0 * (share as f64 / 65536.0).powi(times);
                    worst = worst.max((got as f64 - exact).abs());
                    assert!(times != 1 || got == share);
                }
            }
        }
        assert!(worst < 0.7, "{worst}");
    }
}
