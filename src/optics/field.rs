//! Field of view: what the focal lengths, the eyepiece and the sensor show of the sky.

use super::{allowed, present};
#[cfg(feature = "float")]
use crate::math::double::Double;
#[cfg(feature = "float")]
use crate::math::float::{Real, not_negative, positive};
use crate::math::multiply::wide;
use crate::math::{arc, divide};
#[cfg(feature = "float")]
use crate::status::Cause;
use crate::status::Error;
use crate::units::{
    Microarcseconds, Micrometres, Milliarcseconds, MilliarcsecondsPerMillimetre, Nanometres, Q16,
    SignedMicrometres,
};

pub(super) const HALF_TURN_MAS: u32 = 648_000_000;

/// 1000 radians in microarcseconds, cut: what is cut moves no result by more than 0.002, since 48 um already overflows.
const RADIAN_UAS: u64 = 206_264_806_247;

/// One radian in milliarcseconds, 648000000 / pi.
pub(super) const RADIAN_MAS: divide::Constant =
    divide::Constant { whole: 206_264_806, fraction: 1_061_268_899 };

#[cfg(feature = "float")]
pub(super) const HALF_TURN_ARCSEC: f64 = 648_000.0;

#[cfg(feature = "float")]
const RADIAN_ARCSEC: f64 = 206_264.806_247_096_36;

/// A thousandth of a radian in arcseconds, and what the last digit of that leaves out.
#[cfg(feature = "float")]
pub(super) const RADIAN_ARCSEC_PER_THOUSAND: (f64, f64) = (206.264_806_247_096_35, 9.896_767_216_834_942e-15);

/// tan(angle / 2) in twice the digits but for the error of `tangent` itself, for an angle up to 90 degrees.
#[cfg(feature = "float")]
pub(super) fn half_tangent<F: Real>(angle_arcsec: F) -> Double<F> {
    let Double { upper, lower } = half_tangent_in_parts(angle_arcsec);
    Double::sum(upper, lower)
}

/// The same, with a lower part that may overlap the upper.
#[cfg(feature = "float")]
#[inline(always)]
fn half_tangent_in_parts<F: Real>(angle_arcsec: F) -> Double<F> {
    const TO_HALF: f64 = 0.5 / RADIAN_ARCSEC;
    let constant = Double::of(TO_HALF);
    let half = Double::product(constant.upper, angle_arcsec);
    let (upper, lower) = half.upper.tangent();
    let more = half.lower + constant.lower * angle_arcsec;
    Double { upper, lower: lower + more * (F::of(1.0) + upper * upper) }
}

/// 2 atan(tangent) in arcseconds.
#[cfg(feature = "float")]
pub(super) fn angle_of_tangent<F: Real>(tangent: Double<F>) -> F {
    let x = tangent.upper;
    let (angle, more) = (x.atan(), tangent.lower / (F::of(1.0) + x * x));
    let Double { upper, lower } = Double::of(2.0 * RADIAN_ARCSEC) * angle;
    upper + (lower + F::of(2.0 * RADIAN_ARCSEC) * more)
}

/// The focal ratio (the N of f/N).
///
/// N = f / D. Source: Smith, *Modern Optical Engineering*, the cone of light.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal length of the telescope | um | mm | not 0 |
/// | aperture, the diameter of the beam that enters | um | mm | not 0 |
///
/// Result: Q16.16; float a plain number. Overflow: 65536 or more.
/// Error: at most 0.5 LSB; float 2 ulp.
#[cfg_attr(target_arch = "avr", inline(always))]
pub fn focal_ratio_fx(focal_length: Micrometres, aperture: Micrometres) -> Result<Q16, Error> {
    present(focal_length.0, 1)?;
    present(aperture.0, 2)?;
    divide::rounded((focal_length.0 as u64) << 16, aperture.0).map(Q16)
}

/// Float form of [`focal_ratio_fx`].
#[cfg(feature = "float")]
pub fn focal_ratio<F: Real>(focal_length_mm: F, aperture_mm: F) -> Result<F, Error> {
    positive(focal_length_mm, 1)?;
    positive(aperture_mm, 2)?;
    Ok(focal_length_mm / aperture_mm)
}

/// The focal length of a telescope with an amplifier or a reducer in its beam.
///
/// f k, where k is over 1 for a Barlow lens and under 1 for a reducer. Source: Smith, *Modern Optical Engineering*, lens combinations.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal length of the telescope | um | mm | not 0 |
/// | amplification | Q16.16 | plain | not 0 |
///
/// Result: um; float mm. Overflow: 4294967296 um or more.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn amplified_focal_length_fx(
    focal_length: Micrometres,
    amplification: Q16,
) -> Result<Micrometres, Error> {
    present(focal_length.0, 1)?;
    present(amplification.0, 2)?;
    let product = wide(focal_length.0, amplification.0) + (1 << 15);
    if product >> 48 != 0 {
        return Err(Error::OVERFLOW);
    }
    Ok(Micrometres((product >> 16) as u32))
}

/// Float form of [`amplified_focal_length_fx`].
#[cfg(feature = "float")]
pub fn amplified_focal_length<F: Real>(focal_length_mm: F, amplification: F) -> Result<F, Error> {
    positive(focal_length_mm, 1)?;
    positive(amplification, 2)?;
    Ok(focal_length_mm * amplification)
}

/// How much a lens before the focus lengthens the focal length.
///
/// k = 1 - s' / f, a thin lens of focal length f with the image s' behind it. Source: Hecht, *Optics*, thin lenses.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal length of the lens, negative for a Barlow lens | um | mm | not 0 |
/// | from the lens to the image | um | mm | under f where f is positive |
///
/// Result: Q16.16; float a plain number. Overflow: 65536 or more.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn amplification_fx(
    element_focal_length: SignedMicrometres,
    image_distance: Micrometres,
) -> Result<Q16, Error> {
    let focal_length = element_focal_length.0.unsigned_abs();
    present(focal_length, 1)?;
    let over_focal_length = if element_focal_length.0 < 0 {
        focal_length as u64 + image_distance.0 as u64
    } else {
        allowed(image_distance.0 < focal_length, 2)?;
        (focal_length - image_distance.0) as u64
    };
    divide::rounded(over_focal_length << 16, focal_length).map(Q16)
}

/// Float form of [`amplification_fx`].
#[cfg(feature = "float")]
pub fn amplification<F: Real>(element_focal_length_mm: F, image_distance_mm: F) -> Result<F, Error> {
    let negative = element_focal_length_mm < F::of(0.0);
    let focal_length = if negative { -element_focal_length_mm } else { element_focal_length_mm };
    positive(focal_length, 1)?;
    not_negative(image_distance_mm, 2)?;
    if negative {
        return Ok((focal_length + image_distance_mm) / focal_length);
    }
    if image_distance_mm >= focal_length {
        return Err(Error::new(Cause::OutOfRange, 2));
    }
    Ok((focal_length - image_distance_mm) / focal_length)
}

/// The magnification of a telescope with an eyepiece.
///
/// M = f / fe. Source: Smith, *Modern Optical Engineering*, telescopes.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal length of the telescope | um | mm | not 0 |
/// | focal length of the eyepiece | um | mm | not 0 |
///
/// Result: Q16.16; float a plain number. Overflow: 65536 or more.
/// Error: at most 0.5 LSB; float 2 ulp.
#[cfg_attr(target_arch = "avr", inline(always))]
pub fn magnification_fx(focal_length: Micrometres, eyepiece: Micrometres) -> Result<Q16, Error> {
    present(focal_length.0, 1)?;
    present(eyepiece.0, 2)?;
    divide::rounded((focal_length.0 as u64) << 16, eyepiece.0).map(Q16)
}

/// Float form of [`magnification_fx`].
#[cfg(feature = "float")]
pub fn magnification<F: Real>(focal_length_mm: F, eyepiece_mm: F) -> Result<F, Error> {
    positive(focal_length_mm, 1)?;
    positive(eyepiece_mm, 2)?;
    Ok(focal_length_mm / eyepiece_mm)
}

/// The diameter of the beam that leaves the eyepiece.
///
/// D fe / f. Source: Smith, *Modern Optical Engineering*, telescopes.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | aperture, the diameter of the beam that enters | um | mm | not 0 |
/// | focal length of the telescope | um | mm | not 0 |
/// | focal length of the eyepiece | um | mm | not 0 |
///
/// Result: um; float mm. Overflow: 4294967296 um or more.
/// Error: at most 0.5 LSB; float 2 ulp.
#[inline(always)]
pub fn exit_pupil_fx(
    aperture: Micrometres,
    focal_length: Micrometres,
    eyepiece: Micrometres,
) -> Result<Micrometres, Error> {
    present(aperture.0, 1)?;
    present(focal_length.0, 2)?;
    present(eyepiece.0, 3)?;
    divide::scaled(aperture.0, eyepiece.0, focal_length.0).map(Micrometres)
}

/// Float form of [`exit_pupil_fx`].
#[cfg(feature = "float")]
pub fn exit_pupil<F: Real>(aperture_mm: F, focal_length_mm: F, eyepiece_mm: F) -> Result<F, Error> {
    positive(aperture_mm, 1)?;
    positive(focal_length_mm, 2)?;
    positive(eyepiece_mm, 3)?;
    Ok(aperture_mm * eyepiece_mm / focal_length_mm)
}

/// The eyepiece focal length that gives an exit pupil.
///
/// p f / D. Source: Smith, *Modern Optical Engineering*, telescopes.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | diameter of the exit pupil | um | mm | not 0 |
/// | focal length of the telescope | um | mm | not 0 |
/// | aperture, the diameter of the beam that enters | um | mm | not 0 |
///
/// Result: um; float mm. Overflow: 4294967296 um or more.
/// Error: at most 0.5 LSB; float 2 ulp.
#[inline(always)]
pub fn eyepiece_for_exit_pupil_fx(
    exit_pupil: Micrometres,
    focal_length: Micrometres,
    aperture: Micrometres,
) -> Result<Micrometres, Error> {
    present(exit_pupil.0, 1)?;
    present(focal_length.0, 2)?;
    present(aperture.0, 3)?;
    divide::scaled(exit_pupil.0, focal_length.0, aperture.0).map(Micrometres)
}

/// Float form of [`eyepiece_for_exit_pupil_fx`].
#[cfg(feature = "float")]
pub fn eyepiece_for_exit_pupil<F: Real>(
    exit_pupil_mm: F,
    focal_length_mm: F,
    aperture_mm: F,
) -> Result<F, Error> {
    positive(exit_pupil_mm, 1)?;
    positive(focal_length_mm, 2)?;
    positive(aperture_mm, 3)?;
    Ok(exit_pupil_mm * focal_length_mm / aperture_mm)
}

/// The eyepiece focal length that gives a magnification.
///
/// f / M. Source: Smith, *Modern Optical Engineering*, telescopes.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal length of the telescope | um | mm | not 0 |
/// | magnification | Q16.16 | plain | not 0 |
///
/// Result: um; float mm. Overflow: 4294967296 um or more.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn eyepiece_for_magnification_fx(
    focal_length: Micrometres,
    magnification: Q16,
) -> Result<Micrometres, Error> {
    present(focal_length.0, 1)?;
    present(magnification.0, 2)?;
    divide::rounded((focal_length.0 as u64) << 16, magnification.0).map(Micrometres)
}

/// Float form of [`eyepiece_for_magnification_fx`].
#[cfg(feature = "float")]
pub fn eyepiece_for_magnification<F: Real>(focal_length_mm: F, magnification: F) -> Result<F, Error> {
    positive(focal_length_mm, 1)?;
    positive(magnification, 2)?;
    Ok(focal_length_mm / magnification)
}

/// The angle of sky inside the eyepiece's field stop.
///
/// 2 atan(s / 2f). Source: Smith, *Modern Optical Engineering*, field stops.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | diameter of the field stop | um | mm | not 0 |
/// | focal length of the telescope | um | mm | not 0 |
///
/// Result: mas; float arcsec. It always fits.
/// Error: at most 1 LSB; float 3 ulp.
#[cfg_attr(target_arch = "avr", inline(always))]
pub fn true_field_from_stop_fx(
    field_stop: Micrometres,
    focal_length: Micrometres,
) -> Result<Milliarcseconds, Error> {
    present(field_stop.0, 1)?;
    present(focal_length.0, 2)?;
    Ok(Milliarcseconds(arc::angle_across(field_stop.0, focal_length.0)))
}

/// Float form of [`true_field_from_stop_fx`].
#[cfg(feature = "float")]
pub fn true_field_from_stop<F: Real>(field_stop_mm: F, focal_length_mm: F) -> Result<F, Error> {
    positive(field_stop_mm, 1)?;
    positive(focal_length_mm, 2)?;
    Ok(F::of(2.0 * RADIAN_ARCSEC) * (field_stop_mm / (F::of(2.0) * focal_length_mm)).atan())
}

/// The angle of sky in an eyepiece that keeps straight lines straight.
///
/// 2 atan(tan(A/2) fe / f). Source: Kingslake, *Optical System Design*, eyepieces: rectilinear mapping.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | apparent field | mas | arcsec | not 0, under 648000000 (180 degrees) |
/// | focal length of the telescope | um | mm | not 0 |
/// | focal length of the eyepiece | um | mm | not 0 |
///
/// Result: mas; float arcsec. It always fits.
/// Error: at most 1 LSB; float 3 ulp.
pub fn true_field_rectilinear_fx(
    apparent_field: Milliarcseconds,
    focal_length: Micrometres,
    eyepiece: Micrometres,
) -> Result<Milliarcseconds, Error> {
    present(apparent_field.0, 1)?;
    allowed(apparent_field.0 < HALF_TURN_MAS, 1)?;
    present(focal_length.0, 2)?;
    present(eyepiece.0, 3)?;
    // tan(A / 2) = 8 A / adjacent up to 90 degrees; above, the reciprocal of that of the rest to 180 degrees.
    let rest = HALF_TURN_MAS - apparent_field.0;
    let angle = if apparent_field.0 <= rest {
        let adjacent = arc::adjacent(apparent_field.0);
        arc::angle_of_products(eyepiece.0, 8 * apparent_field.0, focal_length.0, adjacent)
    } else {
        arc::angle_of_products(eyepiece.0, arc::adjacent(rest), focal_length.0, 8 * rest)
    };
    Ok(Milliarcseconds(angle))
}

/// Float form of [`true_field_rectilinear_fx`].
#[cfg(feature = "float")]
pub fn true_field_rectilinear<F: Real>(
    apparent_field_arcsec: F,
    focal_length_mm: F,
    eyepiece_mm: F,
) -> Result<F, Error> {
    positive(apparent_field_arcsec, 1)?;
    if apparent_field_arcsec >= F::of(HALF_TURN_ARCSEC) {
        return Err(Error::new(Cause::OutOfRange, 1));
    }
    positive(focal_length_mm, 2)?;
    positive(eyepiece_mm, 3)?;
    let rest = F::of(HALF_TURN_ARCSEC) - apparent_field_arcsec;
    let is_small = apparent_field_arcsec <= rest;
    let (angle, factor) =
        if is_small { (apparent_field_arcsec, eyepiece_mm) } else { (rest, focal_length_mm) };
    let tangent = half_tangent_in_parts(angle);
    let product = Double::product(tangent.upper, factor);
    // What the tangent and the product leave out, as a part of the product.
    let more = (product.lower + tangent.lower * factor) / product.upper;
    let (x, more) =
        if is_small { (product.upper / focal_length_mm, more) } else { (eyepiece_mm / product.upper, -more) };
    let one = F::of(1.0);
    let constant = Double::of(2.0 * RADIAN_ARCSEC);
    let angle = x.atan();
    let more = constant.upper * (more * x / (one + x * x)) + constant.lower * angle;
    let whole = Double::product(constant.upper, angle);
    Ok(whole.upper + (whole.lower + more))
}

/// The angle of sky in an eyepiece that keeps equal angles equal.
///
/// A fe / f. Source: Kingslake, *Optical System Design*, eyepieces: equidistant mapping.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | apparent field | mas | arcsec | not 0 |
/// | focal length of the telescope | um | mm | not 0 |
/// | focal length of the eyepiece | um | mm | not 0 |
///
/// Result: mas; float arcsec. Overflow: 4294967296 mas or more.
/// Error: at most 0.5 LSB; float 2 ulp.
#[inline(always)]
pub fn true_field_equidistant_fx(
    apparent_field: Milliarcseconds,
    focal_length: Micrometres,
    eyepiece: Micrometres,
) -> Result<Milliarcseconds, Error> {
    present(apparent_field.0, 1)?;
    present(focal_length.0, 2)?;
    present(eyepiece.0, 3)?;
    divide::scaled(apparent_field.0, eyepiece.0, focal_length.0).map(Milliarcseconds)
}

/// Float form of [`true_field_equidistant_fx`].
#[cfg(feature = "float")]
pub fn true_field_equidistant<F: Real>(
    apparent_field_arcsec: F,
    focal_length_mm: F,
    eyepiece_mm: F,
) -> Result<F, Error> {
    positive(apparent_field_arcsec, 1)?;
    positive(focal_length_mm, 2)?;
    positive(eyepiece_mm, 3)?;
    Ok(apparent_field_arcsec * eyepiece_mm / focal_length_mm)
}

/// The angle of sky along one side of a sensor.
///
/// 2 atan(p n / 2f). Source: Schroeder, *Astronomical Optics*, plate scale.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | pixel pitch | nm | um | not 0 |
/// | pixels along that side | count | count | not 0 |
/// | focal length of the telescope | um | mm | not 0 |
///
/// Result: mas; float arcsec. It always fits.
/// Error: at most 1 LSB; float 3 ulp.
pub fn frame_field_fx(
    pixel: Nanometres,
    pixel_count: u32,
    focal_length: Micrometres,
) -> Result<Milliarcseconds, Error> {
    present(pixel.0, 1)?;
    present(pixel_count, 2)?;
    present(focal_length.0, 3)?;
    Ok(Milliarcseconds(arc::angle_of_products(pixel.0, pixel_count, focal_length.0, 2000)))
}

/// Float form of [`frame_field_fx`].
#[cfg(feature = "float")]
pub fn frame_field<F: Real>(pixel_um: F, pixel_count: u32, focal_length_mm: F) -> Result<F, Error> {
    positive(pixel_um, 1)?;
    present(pixel_count, 2)?;
    positive(focal_length_mm, 3)?;
    Ok(angle_of_tangent(
        Double::product(pixel_um, F::of_count(pixel_count)) / Double::product(focal_length_mm, F::of(2000.0)),
    ))
}

/// The angle of sky to a millimetre at the focus.
///
/// (1 rad) / f. Source: Schroeder, *Astronomical Optics*, plate scale.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal length of the telescope | um | mm | not 0 |
///
/// Result: mas per mm; float arcsec per mm. Overflow: 4294967296 mas per mm or more, f under 49 um.
/// Error: at most 0.51 LSB; float 2 ulp.
pub fn plate_scale_fx(focal_length: Micrometres) -> Result<MilliarcsecondsPerMillimetre, Error> {
    present(focal_length.0, 1)?;
    divide::rounded(RADIAN_UAS, focal_length.0).map(MilliarcsecondsPerMillimetre)
}

/// Float form of [`plate_scale_fx`].
#[cfg(feature = "float")]
pub fn plate_scale<F: Real>(focal_length_mm: F) -> Result<F, Error> {
    positive(focal_length_mm, 1)?;
    Ok(F::of(RADIAN_ARCSEC) / focal_length_mm)
}

/// The angle of sky to a pixel.
///
/// (1 rad) p / f. Source: Schroeder, *Astronomical Optics*, plate scale.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | pixel pitch | nm | um | not 0 |
/// | focal length of the telescope | um | mm | not 0 |
///
/// Result: uas; float arcsec. Overflow: 4294967296 uas or more.
/// Error: at most 0.51 LSB; float 2 ulp.
#[inline(always)]
pub fn pixel_scale_fx(pixel: Nanometres, focal_length: Micrometres) -> Result<Microarcseconds, Error> {
    present(pixel.0, 1)?;
    present(focal_length.0, 2)?;
    divide::constant(pixel.0, RADIAN_MAS, focal_length.0).map(Microarcseconds)
}

/// Float form of [`pixel_scale_fx`].
#[cfg(feature = "float")]
pub fn pixel_scale<F: Real>(pixel_um: F, focal_length_mm: F) -> Result<F, Error> {
    positive(pixel_um, 1)?;
    positive(focal_length_mm, 2)?;
    Ok(pixel_um.times(RADIAN_ARCSEC_PER_THOUSAND) / focal_length_mm)
}

/// The focal length that spreads a field over a width at the focus.
///
/// x / (2 tan(t/2)). Source: Schroeder, *Astronomical Optics*, plate scale.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | width at the focus | um | mm | not 0 |
/// | angle of sky | mas | arcsec | not 0, under 648000000 (180 degrees) |
///
/// Result: um; float mm. Overflow: 4294967296 um or more.
/// Error: at most 1 LSB; float 3 ulp.
pub fn focal_length_for_field_fx(extent: Micrometres, field: Milliarcseconds) -> Result<Micrometres, Error> {
    present(extent.0, 1)?;
    present(field.0, 2)?;
    allowed(field.0 < HALF_TURN_MAS, 2)?;
    if field.0 <= HALF_TURN_MAS / 2 {
        let adjacent = arc::adjacent_fine(field.0);
        let lower = wide(extent.0, adjacent as u32);
        let product = wide(extent.0, (adjacent >> 32) as u32) + (lower >> 32);
        return divide::with_fraction(product, lower as u32, field.0).map(Micrometres);
    }
    let rest = HALF_TURN_MAS - field.0;
    let product = wide(extent.0, rest);
    divide::by_64((product >> 34) as u32, product << 30, arc::adjacent_fine(rest)).map(Micrometres)
}

/// Float form of [`focal_length_for_field_fx`].
#[cfg(feature = "float")]
pub fn focal_length_for_field<F: Real>(extent_mm: F, field_arcsec: F) -> Result<F, Error> {
    positive(extent_mm, 1)?;
    positive(field_arcsec, 2)?;
    if field_arcsec >= F::of(HALF_TURN_ARCSEC) {
        return Err(Error::new(Cause::OutOfRange, 2));
    }
    let rest = F::of(HALF_TURN_ARCSEC) - field_arcsec;
    Ok(F::of(0.5)
        * if field_arcsec <= rest {
            extent_mm / half_tangent(field_arcsec).upper
        } else {
            extent_mm * half_tangent(rest).upper
        })
}

/// How many frames in a row cover a target.
///
/// the smallest n with n frame - (n - 1) overlap >= target, at least 1. Source: counting.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | width of the target | mas | arcsec | not 0 |
/// | width of a frame | mas | arcsec | not 0 |
/// | overlap of neighbours | mas | arcsec | under the frame |
///
/// Result: a count; float a count. It always fits.
/// Error: at most 0, it is exact; float 0, it is exact.
pub fn tiles_fx(
    target: Milliarcseconds,
    frame: Milliarcseconds,
    overlap: Milliarcseconds,
) -> Result<u32, Error> {
    present(target.0, 1)?;
    present(frame.0, 2)?;
    allowed(overlap.0 < frame.0, 3)?;
    let step = frame.0 - overlap.0;
    match target.0.checked_sub(frame.0) {
        None => Ok(1),
        Some(beyond) => {
            let (more, rest) = divide::divide(beyond as u64, step);
            // At most u32::MAX - 1 more, since the frame is at least 1.
            Ok(1 + more + (rest != 0) as u32)
        }
    }
}

/// Float form of [`tiles_fx`].
#[cfg(feature = "float")]
pub fn tiles<F: Real>(target_arcsec: F, frame_arcsec: F, overlap_arcsec: F) -> Result<u32, Error> {
    positive(target_arcsec, 1)?;
    positive(frame_arcsec, 2)?;
    not_negative(overlap_arcsec, 3)?;
    if overlap_arcsec >= frame_arcsec {
        return Err(Error::new(Cause::OutOfRange, 3));
    }
    if target_arcsec <= frame_arcsec {
        return Ok(1);
    }
    let step = Double::sum(frame_arcsec, -overlap_arcsec);
    let mut rest = Double::sum(target_arcsec, -frame_arcsec);
    let mut more = 0;
    // A quotient of 32 bits, 24 at a time in f32; the last time mends the one before by one at most.
    for _ in 0..3 {
        let quotient = (rest.upper / step.upper).floor();
        if quotient >= F::of(4294967296.0) {
            return Err(Error::OVERFLOW);
        }
        more += quotient.to_i64();
        rest = rest - step * quotient;
    }
    let count = 1 + more + (rest.upper > F::of(0.0)) as i64;
    u32::try_from(count).map_err(|_| Error::OVERFLOW)
}
