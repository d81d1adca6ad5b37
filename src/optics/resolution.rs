//! Resolution: how fine a telescope shows, and how far the air, the obstruction and the wavefront let it.

use crate::math::divide::{self, Constant};
#[cfg(feature = "float")]
use crate::math::double::{Double, product_ratio};
#[cfg(feature = "float")]
use crate::math::float::{Real, from_zero_to, not_negative, positive};
use crate::math::multiply::{high, high_signed, wide};
use crate::math::{logarithm, root};
use crate::status::Error;
use crate::stored::stored;
use crate::units::{Microarcseconds, Micrometres, Nanometres, Q16};

use super::{allowed, present};

mod transfer;
#[cfg(feature = "float")]
pub use transfer::contrast;
pub use transfer::contrast_fx;

// The constants are those of a circular aperture, in wavelengths over the diameter, times the 206264806.2470964
// microarcseconds that 1 nm over 1 um makes; the tests find them again from the Bessel functions.

/// j11 / pi = 1.2196698912665044549, j11 = 3.8317059702075123 the first positive zero of J1.
const RAYLEIGH: Constant = Constant { whole: 251_574_973, fraction: 3_468_197_346 };
/// 2 v / pi = 0.9471552527091855445, v = 1.4877879918608007 where the second derivative of (J1(v) / v)^2 is zero.
const SPARROW: Constant = Constant { whole: 195_364_794, fraction: 2_946_260_555 };
/// 2 v / pi = 1.0289939699621880515, v = 1.6163399483107032 where (2 J1(v) / v)^2 is 1/2.
const AIRY_FWHM: Constant = Constant { whole: 212_245_241, fraction: 3_623_583_185 };
/// 0.98: the diameter and the width change places.
const FRIED: Constant = Constant { whole: 202_139_510, fraction: 524_649_274 };
/// The fraction of j11 / pi in steps of 2^-64.
const AIRY_RADIUS: u64 = 943_474_998 << 32 | 3_889_147_235;

/// Rayleigh's limit: the separation of two equal stars, one at the other's first dark ring.
///
/// (j11 / pi) lambda / D = 1.2196699 lambda / D, j11 the first positive zero of J1. Source: Born and Wolf, *Principles
/// of Optics*, 8.5.2 and 8.6.2.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | aperture | um | mm | not 0 |
/// | wavelength | nm | nm | not 0 |
///
/// Result: uas, float arcsec.
/// Error: at most 0.51 LSB; float 2 ulp.
#[inline(always)]
pub fn rayleigh_limit_fx(aperture: Micrometres, wavelength: Nanometres) -> Result<Microarcseconds, Error> {
    present(aperture.0, 1)?;
    present(wavelength.0, 2)?;
    divide::constant(wavelength.0, RAYLEIGH, aperture.0).map(Microarcseconds)
}

/// Float form of [`rayleigh_limit_fx`].
#[cfg(feature = "float")]
#[inline(always)]
pub fn rayleigh_limit<F: Real>(aperture_mm: F, wavelength_nm: F) -> Result<F, Error> {
    positive(aperture_mm, 1)?;
    positive(wavelength_nm, 2)?;
    // The inverse is the one that both types round well.
    Ok(wavelength_nm / (aperture_mm * F::of(3.974958179922813)))
}

/// x / (1 + m) as a polynomial in m^2, m = (D - d) / (D + d), times the eighths of a microarcsecond that 1 / pi nm over
/// 1 um makes. A root of e is one of 1 / e times e, so it is even in m: nine terms hold it within 7 parts in 10^8.
const DARK_RING: [i32; 9] =
    [1263132172, -210508089, -85045494, 10346600, 16056364, 68049468, -90048108, 40729469, -6412445];

stored! {
    static STORED_DARK_RING: [i32; 9] = DARK_RING;
}

/// The same in arcseconds that nanometres over millimetres make.
#[cfg(feature = "float")]
const DARK_RING_ARCSEC: [f64; 9] = {
    let mut terms = [0.0; 9];
    let mut i = 0;
    while i < terms.len() {
        terms[i] = DARK_RING[i] as f64 * 1.25e-10;
        i += 1;
    }
    terms
};

/// Rayleigh's limit with a central obstruction, which makes the first dark ring smaller.
///
/// (x / pi) lambda / D, x the first positive root of J1(x) = e J1(e x), e = d / D. Source: Born and Wolf, *Principles of
/// Optics*, 8.6.2; Schroeder, *Astronomical Optics*, annular aperture.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | aperture | um | mm | not 0 |
/// | obstruction, its diameter | um | mm | under the aperture |
/// | wavelength | nm | nm | not 0 |
///
/// Result: uas, float arcsec; without an obstruction that of [`rayleigh_limit_fx`].
/// Error: at most 1 LSB or 2 parts in 10^6, the larger; float 2 parts in 10^6.
pub fn rayleigh_limit_obstructed_fx(
    aperture: Micrometres,
    obstruction: Micrometres,
    wavelength: Nanometres,
) -> Result<Microarcseconds, Error> {
    present(aperture.0, 1)?;
    allowed(obstruction.0 < aperture.0, 2)?;
    present(wavelength.0, 3)?;
    if obstruction.0 == 0 {
        return rayleigh_limit_fx(aperture, wavelength);
    }
    // 1 - m is more than 2^-32, so m is never rounded up to 1.
    let (less, more) = (aperture.0 - obstruction.0, aperture.0 as u64 + obstruction.0 as u64);
    let m = divide::by_64(0, (less as u64) << 32, more)?;
    let square = high(m, m);
    let y = STORED_DARK_RING.iter().rev().fold(0, |y, term| high_signed(y, square) + term) as u32;
    let eighths = wide(wavelength.0, y + high(y, m));
    divide::with_fraction(eighths >> 3, (eighths as u32) << 29, aperture.0).map(Microarcseconds)
}

/// Float form of [`rayleigh_limit_obstructed_fx`].
#[cfg(feature = "float")]
pub fn rayleigh_limit_obstructed<F: Real>(
    aperture_mm: F,
    obstruction_mm: F,
    wavelength_nm: F,
) -> Result<F, Error> {
    positive(aperture_mm, 1)?;
    not_negative(obstruction_mm, 2)?;
    allowed(obstruction_mm < aperture_mm, 2)?;
    positive(wavelength_nm, 3)?;
    if obstruction_mm == F::of(0.0) {
        return rayleigh_limit(aperture_mm, wavelength_nm);
    }
    let m = (aperture_mm - obstruction_mm) / (aperture_mm + obstruction_mm);
    let square = m * m;
    // Written out, so that each term is a constant of the type.
    let [c0, c1, c2, c3, c4, c5, c6, c7, c8] = DARK_RING_ARCSEC;
    let y = F::of(c7) + square * F::of(c8);
    let y = F::of(c4) + square * (F::of(c5) + square * (F::of(c6) + square * y));
    let y = F::of(c0) + square * (F::of(c1) + square * (F::of(c2) + square * (F::of(c3) + square * y)));
    Ok((y + y * m) * wavelength_nm / aperture_mm)
}

/// Dawes's limit: the separation at which two equal stars of the sixth magnitude are just seen apart.
///
/// 116 arcsec mm / D. Source: common practice after Dawes, *Memoirs of the Royal Astronomical Society* 35, 137 (1867).
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | aperture | um | mm | not 0 |
///
/// Result: uas, float arcsec.
/// Error: at most 0.5 LSB; float 2 ulp.
#[cfg_attr(target_arch = "avr", inline(always))]
pub fn dawes_limit_fx(aperture: Micrometres) -> Result<Microarcseconds, Error> {
    present(aperture.0, 1)?;
    divide::rounded(116_000_000_000, aperture.0).map(Microarcseconds)
}

/// Float form of [`dawes_limit_fx`].
#[cfg(feature = "float")]
pub fn dawes_limit<F: Real>(aperture_mm: F) -> Result<F, Error> {
    positive(aperture_mm, 1)?;
    Ok(F::of(116.0) / aperture_mm)
}

/// Sparrow's limit: the separation of two equal stars at which the dip between them is gone.
///
/// 0.9471553 lambda / D: two equal incoherent Airy patterns whose curvature vanishes midway. Source: Sparrow,
/// *Astrophysical Journal* 44, 76 (1916).
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | aperture | um | mm | not 0 |
/// | wavelength | nm | nm | not 0 |
///
/// Result: uas, float arcsec.
/// Error: at most 0.51 LSB; float 2 ulp.
pub fn sparrow_limit_fx(aperture: Micrometres, wavelength: Nanometres) -> Result<Microarcseconds, Error> {
    present(aperture.0, 1)?;
    present(wavelength.0, 2)?;
    divide::constant(wavelength.0, SPARROW, aperture.0).map(Microarcseconds)
}

/// Float form of [`sparrow_limit_fx`].
#[cfg(feature = "float")]
pub fn sparrow_limit<F: Real>(aperture_mm: F, wavelength_nm: F) -> Result<F, Error> {
    positive(aperture_mm, 1)?;
    positive(wavelength_nm, 2)?;
    Ok(wavelength_nm / (aperture_mm * F::of(5.11862949313541)))
}

/// Full width at half maximum of a star's image in perfect optics and still air.
///
/// 1.0289940 lambda / D, the width of the Airy pattern. Source: Airy, *Transactions of the Cambridge Philosophical
/// Society* 5, 283 (1835); Born and Wolf, *Principles of Optics*, 8.5.2.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | aperture | um | mm | not 0 |
/// | wavelength | nm | nm | not 0 |
///
/// Result: uas, float arcsec.
/// Error: at most 0.51 LSB; float 2 ulp.
#[inline(always)]
pub fn airy_fwhm_fx(aperture: Micrometres, wavelength: Nanometres) -> Result<Microarcseconds, Error> {
    present(aperture.0, 1)?;
    present(wavelength.0, 2)?;
    divide::constant(wavelength.0, AIRY_FWHM, aperture.0).map(Microarcseconds)
}

/// Float form of [`airy_fwhm_fx`].
#[cfg(feature = "float")]
pub fn airy_fwhm<F: Real>(aperture_mm: F, wavelength_nm: F) -> Result<F, Error> {
    positive(aperture_mm, 1)?;
    positive(wavelength_nm, 2)?;
    Ok(wavelength_nm * F::of(0.2122452418436812) / aperture_mm)
}

/// Radius of the Airy disc at the focus: centre to first dark ring.
///
/// (j11 / pi) lambda f / D = 1.2196699 lambda f / D. Source: Born and Wolf, *Principles of Optics*, 8.5.2.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal length | um | mm | not 0 |
/// | aperture | um | mm | not 0 |
/// | wavelength | nm | nm | not 0 |
///
/// Result: nm, float um.
/// Error: at most 0.51 LSB; float 2 ulp.
pub fn airy_radius_fx(
    focal_length: Micrometres,
    aperture: Micrometres,
    wavelength: Nanometres,
) -> Result<Nanometres, Error> {
    present(focal_length.0, 1)?;
    present(aperture.0, 2)?;
    present(wavelength.0, 3)?;
    let product = wide(focal_length.0, wavelength.0);
    let (upper, lower) = ((product >> 32) as u32, product as u32);
    let (first, second) = ((AIRY_RADIUS >> 32) as u32, AIRY_RADIUS as u32);
    let mut whole = wide(upper, first);
    // In steps of 2^-32; below 2^62, for `first` is below 2^30.
    let mut below = wide(lower, first);
    // A result below 2^24 would see the second half of the constant in its 2^-8 at most.
    if product >> 24 >= aperture.0 as u64 {
        let second_part = wide(upper, second) + high(lower, second) as u64;
        whole += second_part >> 32;
        below += second_part & 0xffff_ffff;
    }
    let (n, over) = product.overflowing_add(whole + (below >> 32));
    if over {
        return Err(Error::OVERFLOW);
    }
    divide::with_fraction(n, below as u32, aperture.0).map(Nanometres)
}

/// Float form of [`airy_radius_fx`].
#[cfg(feature = "float")]
pub fn airy_radius<F: Real>(focal_length_mm: F, aperture_mm: F, wavelength_nm: F) -> Result<F, Error> {
    positive(focal_length_mm, 1)?;
    positive(aperture_mm, 2)?;
    positive(wavelength_nm, 3)?;
    Ok(product_ratio(focal_length_mm, wavelength_nm, aperture_mm, F::of(819.8939788220898)))
}

/// Cutoff frequency at the focus: finer detail has no contrast at all.
///
/// D / (lambda f). Source: Goodman, *Introduction to Fourier Optics*, incoherent imaging.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal length | um | mm | not 0 |
/// | aperture | um | mm | not 0 |
/// | wavelength | nm | nm | not 0 |
///
/// Result: cycles per mm in Q16.16, float plain.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn cutoff_frequency_fx(
    focal_length: Micrometres,
    aperture: Micrometres,
    wavelength: Nanometres,
) -> Result<Q16, Error> {
    present(focal_length.0, 1)?;
    present(aperture.0, 2)?;
    present(wavelength.0, 3)?;
    // 10^6 nm in a millimetre, 2^16 steps in one: 15625 2^22.
    let n = wide(aperture.0, 15_625);
    divide::by_64((n >> 42) as u32, n << 22, wide(focal_length.0, wavelength.0)).map(Q16)
}

/// Float form of [`cutoff_frequency_fx`].
#[cfg(feature = "float")]
pub fn cutoff_frequency<F: Real>(focal_length_mm: F, aperture_mm: F, wavelength_nm: F) -> Result<F, Error> {
    positive(focal_length_mm, 1)?;
    positive(aperture_mm, 2)?;
    positive(wavelength_nm, 3)?;
    Ok(product_ratio(aperture_mm, F::of(1e6), focal_length_mm, wavelength_nm))
}

/// (2 pi)^2 in two parts, the first exact in both types.
#[cfg(feature = "float")]
const FOUR_PI_SQUARED: [f64; 2] = [39.478416442871094, 1.161486340725338e-6];

/// Strehl ratio of a wavefront that is not quite right: the brightness of the star image's centre against the perfect one.
///
/// exp(-(2 pi s / lambda)^2), s the root mean square wavefront error; good where the ratio is over about 0.1. Source:
/// Mahajan, *Journal of the Optical Society of America* 73, 860 (1983), after Marechal.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | rms wavefront error | nm | nm | |
/// | wavelength | nm | nm | not 0 |
///
/// Result: Q16.16, float plain; at most 1.
/// Error: at most 1 LSB; float 3 ulp.
pub fn strehl_ratio_fx(rms: Nanometres, wavelength: Nanometres) -> Result<Q16, Error> {
    present(wavelength.0, 2)?;
    if rms.0 >= wavelength.0 {
        return Ok(Q16(0)); // exp(-39)
    }
    let (waves, _) = divide::divide((rms.0 as u64) << 32, wavelength.0);
    // (2 pi)^2 / ln 2 = 56.955 halvings at one wave, in steps of 2^-26.
    let halvings = high(high(waves, waves), 3_822_206_643);
    if halvings >> 31 != 0 {
        return Ok(Q16(0)); // under 2^-32
    }
    let ratio = logarithm::exp2_negative(halvings << 1);
    Ok(Q16((ratio + (1 << 14)) >> 15))
}

/// Float form of [`strehl_ratio_fx`].
#[cfg(feature = "float")]
pub fn strehl_ratio<F: Real>(rms_nm: F, wavelength_nm: F) -> Result<F, Error> {
    not_negative(rms_nm, 1)?;
    positive(wavelength_nm, 2)?;
    let waves = rms_nm / wavelength_nm;
    if waves > F::of(5.0) {
        return Ok(F::of(0.0)); // exp(-987), below the least number of either type
    }
    // The exponent needs more digits than the result.
    let back = Double::product(waves, wavelength_nm);
    let waves_lost = ((rms_nm - back.upper) - back.lower) / wavelength_nm;
    let square = Double::product(waves, waves);
    let square_lost = square.lower + F::of(2.0) * waves * waves_lost;
    let exponent = Double::product(square.upper, F::of(FOUR_PI_SQUARED[0]));
    let exponent_lost =
        exponent.lower + square_lost * F::of(FOUR_PI_SQUARED[0]) + square.upper * F::of(FOUR_PI_SQUARED[1]);
    let exponent = Double::sum(exponent.upper, exponent_lost);
    let ratio = (-exponent.upper).exp();
    Ok(ratio - ratio * exponent.lower)
}

/// Fried's parameter: the aperture that the air leaves, from the width of the star images.
///
/// r0 = 0.98 lambda / FWHM, at the same wavelength. Source: Fried, *Journal of the Optical Society of America* 56, 1372
/// (1966); Dierickx, *Journal of Modern Optics* 39, 569 (1992).
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | seeing, full width at half maximum | uas | arcsec | not 0 |
/// | wavelength | nm | nm | not 0 |
///
/// Result: um, float mm.
/// Error: at most 0.51 LSB; float 2 ulp.
pub fn fried_parameter_fx(seeing: Microarcseconds, wavelength: Nanometres) -> Result<Micrometres, Error> {
    present(seeing.0, 1)?;
    present(wavelength.0, 2)?;
    divide::constant(wavelength.0, FRIED, seeing.0).map(Micrometres)
}

/// Float form of [`fried_parameter_fx`].
#[cfg(feature = "float")]
pub fn fried_parameter<F: Real>(seeing_arcsec: F, wavelength_nm: F) -> Result<F, Error> {
    positive(seeing_arcsec, 1)?;
    positive(wavelength_nm, 2)?;
    Ok(wavelength_nm * F::of(0.20213951012215442) / seeing_arcsec)
}

/// Seeing at an airmass, from that at the zenith: the full width at half maximum of the star images.
///
/// FWHM X^0.6. Source: Fried, *Journal of the Optical Society of America* 56, 1372 (1966), for Kolmogorov turbulence;
/// Roddier, *Progress in Optics* 19, 281 (1981).
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | seeing at the zenith | uas | arcsec | not 0 |
/// | airmass | Q16.16 | plain | 1 to 40 |
///
/// Result: uas, float arcsec.
/// Error: at most 1 LSB or 1 part in 10^6, the larger; float 3 ulp.
pub fn seeing_at_airmass_fx(seeing: Microarcseconds, airmass: Q16) -> Result<Microarcseconds, Error> {
    present(seeing.0, 1)?;
    allowed(airmass.0 >= Q16::ONE.0 && airmass.0 <= MOST_AIRMASS << 16, 2)?;
    let doublings = high(logarithm::log2(airmass.0) - 16 * logarithm::ONE, 2_576_980_378);
    // Under 3.2 doublings; 2^-27.
    let growth = logarithm::exp2_negative(4 * logarithm::ONE - doublings);
    let width = (wide(seeing.0, growth) + (1 << 26)) >> 27;
    if width >> 32 != 0 {
        return Err(Error::OVERFLOW);
    }
    Ok(Microarcseconds(width as u32))
}

const MOST_AIRMASS: u32 = 40;

/// Float form of [`seeing_at_airmass_fx`].
#[cfg(feature = "float")]
pub fn seeing_at_airmass<F: Real>(seeing_arcsec: F, airmass: F) -> Result<F, Error> {
    positive(seeing_arcsec, 1)?;
    from_zero_to(MOST_AIRMASS as f64, airmass, 2)?;
    allowed(airmass >= F::of(1.0), 2)?;
    Ok(seeing_arcsec * airmass.powf(F::of(0.6)))
}

/// Width of a star image that three causes blur: such as the seeing, the telescope and the tracking.
///
/// sqrt(a^2 + b^2 + c^2), each a full width at half maximum, 0 for none. Source: exact for Gaussian images, whose
/// variances add; common practice for others.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | three widths | uas | arcsec | |
///
/// Result: uas, float arcsec.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn combined_fwhm_fx(
    a: Microarcseconds,
    b: Microarcseconds,
    c: Microarcseconds,
) -> Result<Microarcseconds, Error> {
    let sum = wide(a.0, a.0).checked_add(wide(b.0, b.0)).and_then(|sum| sum.checked_add(wide(c.0, c.0)));
    // A sum of 2^64 or more has a root of 2^32 or more.
    root::rounded(sum.ok_or(Error::OVERFLOW)?).map(Microarcseconds)
}

/// Float form of [`combined_fwhm_fx`].
#[cfg(feature = "float")]
pub fn combined_fwhm<F: Real>(a_arcsec: F, b_arcsec: F, c_arcsec: F) -> Result<F, Error> {
    not_negative(a_arcsec, 1)?;
    not_negative(b_arcsec, 2)?;
    not_negative(c_arcsec, 3)?;
    let sum = a_arcsec * a_arcsec + b_arcsec * b_arcsec + c_arcsec * c_arcsec;
    // Squares of less would lose bits at the bottom of f32.
    if sum > F::of(1.0 / (1u64 << 60) as f64) {
        Ok(sum.sqrt())
    } else {
        Ok(a_arcsec.hypot(b_arcsec).hypot(c_arcsec))
    }
}

#[cfg(all(test, feature = "float"))]
mod tests {
    use super::*;
    use crate::math::chebyshev::interpolate;
    use libm::{j1, jn};
    use std::f64::consts::PI;

    /// A sign change of `f` between `a` and `b`.
    fn root(f: impl Fn(f64) -> f64, mut a: f64, mut b: f64) -> f64 {
        for _ in 0..60 {
            let middle = (a + b) / 2.0;
            if (f(middle) > 0.0) == (f(a) > 0.0) {
                a = middle;
            } else {
                b = middle;
            }
        }
        a
    }

    fn is(constant: Constant, wavelengths: f64) {
        let value = constant.whole as f64 + constant.fraction as f64 / 4294967296.0;
        let per_radian = 648_000_000.0 / core::f64::consts::PI;
        assert!((value / per_radian - wavelengths).abs() < 2e-15, "{value} / {per_radian}, {wavelengths}");
    }

    #[test]
    fn dark_ring_is_the_interpolation() {
        let per_root = 8.0 * 648e6 / PI / PI;
        let scaled_root = |square: f64| {
            let m = square.sqrt();
            let e = (1.0 - m) / (1.0 + m);
            per_root * root(|x| j1(x) - e * j1(e * x), 2.4, 3.84) / (1.0 + m)
        };
        for (got, exact) in DARK_RING.iter().zip(interpolate(scaled_root, 0.0, 1.0, 9)) {
            assert!((*got as f64 - exact).abs() < 0.6, "{got}: {exact}");
        }
    }

    #[test]
    fn constants_are_those_of_the_airy_pattern() {
        let dark = root(j1, 3.0, 4.0) / PI;
        is(RAYLEIGH, dark);
        assert!((AIRY_RADIUS as f64 / 18446744073709551616.0 + 1.0 - dark).abs() < 2e-15);
        is(AIRY_FWHM, 2.0 * root(|v| 2.0 * j1(v) / v - 0.5f64.sqrt(), 1.0, 2.0) / PI);
        // (g^2)'' = 2 (g'^2 + g g''), g = J1(v) / v, g' = -J2(v) / v, g'' = -(J1(v) - 3 J2(v) / v) / v.
        let curvature = |v| jn(2, v) * jn(2, v) - j1(v) * (j1(v) - 3.0 * jn(2, v) / v);
        is(SPARROW, 2.0 * root(curvature, 1.0, 2.0) / PI);
        is(FRIED, 0.98);
    }
}
