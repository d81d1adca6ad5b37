//! C exports of `setup`.

use super::{fieldstop_status, give};
use crate::setup::{Camera, CameraReadout, Eyepiece, Observer, Telescope, VisualReadout};
use crate::status::{Cause, Error};

/// Eyepiece mapping: true field = A fe / f, the apparent angle proportional to the true one.
pub const FIELDSTOP_EQUIDISTANT: u8 = 0;
/// Eyepiece mapping: true field = 2 atan(tan(A/2) fe / f), no distortion.
pub const FIELDSTOP_RECTILINEAR: u8 = 1;

/// Visual readout, wanted and available: focal_length_um.
pub const FIELDSTOP_VISUAL_FOCAL_LENGTH: u32 = 0x0001;
/// Visual readout, wanted and available: focal_ratio_q16.
pub const FIELDSTOP_VISUAL_FOCAL_RATIO: u32 = 0x0002;
/// Visual readout, wanted and available: magnification_q16.
pub const FIELDSTOP_VISUAL_MAGNIFICATION: u32 = 0x0004;
/// Visual readout, wanted and available: exit_pupil_um.
pub const FIELDSTOP_VISUAL_EXIT_PUPIL: u32 = 0x0008;
/// Visual readout, wanted and available: true_field_mas.
pub const FIELDSTOP_VISUAL_TRUE_FIELD: u32 = 0x0010;
/// Visual readout, wanted and available: resolution_uas.
pub const FIELDSTOP_VISUAL_RESOLUTION: u32 = 0x0020;
/// Visual readout, wanted and available: dawes_limit_uas.
pub const FIELDSTOP_VISUAL_DAWES_LIMIT: u32 = 0x0040;
/// Visual readout, wanted and available: lowest_magnification_q16.
pub const FIELDSTOP_VISUAL_LOWEST_MAGNIFICATION: u32 = 0x0080;
/// Visual readout, wanted and available: resolving_magnification_q16.
pub const FIELDSTOP_VISUAL_RESOLVING_MAGNIFICATION: u32 = 0x0100;
/// Visual readout, wanted and available: effective_aperture_um.
pub const FIELDSTOP_VISUAL_EFFECTIVE_APERTURE: u32 = 0x0200;
/// Visual readout, wanted and available: limiting_magnitude_mmag.
pub const FIELDSTOP_VISUAL_LIMITING_MAGNITUDE: u32 = 0x0400;
/// Visual readout, wanted and available: surface_brightness_q16.
pub const FIELDSTOP_VISUAL_SURFACE_BRIGHTNESS: u32 = 0x0800;
/// Visual readout, wanted: every member.
pub const FIELDSTOP_VISUAL_ALL: u32 = 0x0fff;
/// Visual readout, fact: the exit pupil is wider than the eye's, and light falls on the iris (geometry).
pub const FIELDSTOP_VISUAL_FACT_WIDE_EXIT_PUPIL: u32 = 0x0001;
/// Visual readout, fact: the magnification is over the resolving magnification (Rayleigh 1879, and the
/// observer's eye).
pub const FIELDSTOP_VISUAL_FACT_EMPTY_MAGNIFICATION: u32 = 0x0002;
/// Visual readout, fact: the true field comes from the apparent field, as good as the mapping.
pub const FIELDSTOP_VISUAL_FACT_FIELD_FROM_APPARENT: u32 = 0x0004;
/// Visual readout, fact: the seeing is wider than the resolution (common practice).
pub const FIELDSTOP_VISUAL_FACT_SEEING_LIMITED: u32 = 0x0008;

/// Camera readout, wanted and available: focal_length_um.
pub const FIELDSTOP_CAMERA_FOCAL_LENGTH: u32 = 0x0001;
/// Camera readout, wanted and available: focal_ratio_q16.
pub const FIELDSTOP_CAMERA_FOCAL_RATIO: u32 = 0x0002;
/// Camera readout, wanted and available: t_number_q16.
pub const FIELDSTOP_CAMERA_T_NUMBER: u32 = 0x0004;
/// Camera readout, wanted and available: frame_width_mas.
pub const FIELDSTOP_CAMERA_FRAME_WIDTH: u32 = 0x0008;
/// Camera readout, wanted and available: frame_height_mas.
pub const FIELDSTOP_CAMERA_FRAME_HEIGHT: u32 = 0x0010;
/// Camera readout, wanted and available: pixel_scale_uas.
pub const FIELDSTOP_CAMERA_PIXEL_SCALE: u32 = 0x0020;
/// Camera readout, wanted and available: plate_scale_mas_per_mm.
pub const FIELDSTOP_CAMERA_PLATE_SCALE: u32 = 0x0040;
/// Camera readout, wanted and available: star_fwhm_uas.
pub const FIELDSTOP_CAMERA_STAR_FWHM: u32 = 0x0080;
/// Camera readout, wanted and available: pixels_per_fwhm_q16.
pub const FIELDSTOP_CAMERA_PIXELS_PER_FWHM: u32 = 0x0100;
/// Camera readout, wanted: every member.
pub const FIELDSTOP_CAMERA_ALL: u32 = 0x01ff;
/// Camera readout, fact: under two pixels to the star image (common practice, after Shannon 1949).
pub const FIELDSTOP_CAMERA_FACT_COARSE_SAMPLING: u32 = 0x0001;
/// Camera readout, fact: over three pixels to the star image (common practice).
pub const FIELDSTOP_CAMERA_FACT_FINE_SAMPLING: u32 = 0x0002;

// The literals that cbindgen can read are those of the Rust constants.
const _: () = {
    assert!(FIELDSTOP_EQUIDISTANT == Eyepiece::EQUIDISTANT && FIELDSTOP_RECTILINEAR == Eyepiece::RECTILINEAR);
    assert!(FIELDSTOP_VISUAL_FOCAL_LENGTH == VisualReadout::FOCAL_LENGTH);
    assert!(FIELDSTOP_VISUAL_FOCAL_RATIO == VisualReadout::FOCAL_RATIO);
    assert!(FIELDSTOP_VISUAL_MAGNIFICATION == VisualReadout::MAGNIFICATION);
    assert!(FIELDSTOP_VISUAL_EXIT_PUPIL == VisualReadout::EXIT_PUPIL);
    assert!(FIELDSTOP_VISUAL_TRUE_FIELD == VisualReadout::TRUE_FIELD);
    assert!(FIELDSTOP_VISUAL_RESOLUTION == VisualReadout::RESOLUTION);
    assert!(FIELDSTOP_VISUAL_DAWES_LIMIT == VisualReadout::DAWES_LIMIT);
    assert!(FIELDSTOP_VISUAL_LOWEST_MAGNIFICATION == VisualReadout::LOWEST_MAGNIFICATION);
    assert!(FIELDSTOP_VISUAL_RESOLVING_MAGNIFICATION == VisualReadout::RESOLVING_MAGNIFICATION);
    assert!(FIELDSTOP_VISUAL_EFFECTIVE_APERTURE == VisualReadout::EFFECTIVE_APERTURE);
    assert!(FIELDSTOP_VISUAL_LIMITING_MAGNITUDE == VisualReadout::LIMITING_MAGNITUDE);
    assert!(FIELDSTOP_VISUAL_SURFACE_BRIGHTNESS == VisualReadout::SURFACE_BRIGHTNESS);
    assert!(FIELDSTOP_VISUAL_ALL == VisualReadout::ALL);
    assert!(FIELDSTOP_VISUAL_FACT_WIDE_EXIT_PUPIL == VisualReadout::FACT_WIDE_EXIT_PUPIL);
    assert!(FIELDSTOP_VISUAL_FACT_EMPTY_MAGNIFICATION == VisualReadout::FACT_EMPTY_MAGNIFICATION);
    assert!(FIELDSTOP_VISUAL_FACT_FIELD_FROM_APPARENT == VisualReadout::FACT_FIELD_FROM_APPARENT);
    assert!(FIELDSTOP_VISUAL_FACT_SEEING_LIMITED == VisualReadout::FACT_SEEING_LIMITED);
    assert!(FIELDSTOP_CAMERA_FOCAL_LENGTH == CameraReadout::FOCAL_LENGTH);
    assert!(FIELDSTOP_CAMERA_FOCAL_RATIO == CameraReadout::FOCAL_RATIO);
    assert!(FIELDSTOP_CAMERA_T_NUMBER == CameraReadout::T_NUMBER);
    assert!(FIELDSTOP_CAMERA_FRAME_WIDTH == CameraReadout::FRAME_WIDTH);
    assert!(FIELDSTOP_CAMERA_FRAME_HEIGHT == CameraReadout::FRAME_HEIGHT);
    assert!(FIELDSTOP_CAMERA_PIXEL_SCALE == CameraReadout::PIXEL_SCALE);
    assert!(FIELDSTOP_CAMERA_PLATE_SCALE == CameraReadout::PLATE_SCALE);
    assert!(FIELDSTOP_CAMERA_STAR_FWHM == CameraReadout::STAR_FWHM);
    assert!(FIELDSTOP_CAMERA_PIXELS_PER_FWHM == CameraReadout::PIXELS_PER_FWHM);
    assert!(FIELDSTOP_CAMERA_ALL == CameraReadout::ALL);
    assert!(FIELDSTOP_CAMERA_FACT_COARSE_SAMPLING == CameraReadout::FACT_COARSE_SAMPLING);
    assert!(FIELDSTOP_CAMERA_FACT_FINE_SAMPLING == CameraReadout::FACT_FINE_SAMPLING);
};

/// The struct behind a pointer that C gave.
///
/// # Safety
/// `pointer` is null or points to a T that nobody writes while the borrow lives.
#[inline(always)]
pub(super) unsafe fn borrow<'a, T>(pointer: *const T, position: u8) -> Result<&'a T, Error> {
    // SAFETY: the caller's promise.
    unsafe { pointer.as_ref() }.ok_or(Error::new(Cause::NullPointer, position))
}

#[inline(always)]
pub(super) fn status_of(result: Result<(), Error>) -> fieldstop_status {
    match result {
        Ok(()) => 0,
        Err(error) => error.status(),
    }
}

/// Gives 0 for a telescope that can be used; otherwise the cause, with the number of the first bad member,
/// counted from 1, in the place of the argument.
///
/// Members: aperture_um not 0 (1), focal_length_um not 0 (2), obstruction_um under the aperture (3; 0: none),
/// amplification_q16 not 0 (4; 65536: none), throughput_q16 at most 65536 (5; 0: unknown).
/// Statuses: null pointer, zero, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_telescope_check(telescope: *const Telescope) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    status_of(unsafe { borrow(telescope, 1) }.and_then(Telescope::check))
}

/// Gives 0 for an eyepiece that can be used; otherwise the cause, with the number of the first bad member,
/// counted from 1, in the place of the argument.
///
/// Members: focal_length_um not 0 (1), field_stop_um (2; 0: unknown), apparent_field_mas under 648,000,000,
/// half a turn (3; 0: unknown), mapping FIELDSTOP_EQUIDISTANT or FIELDSTOP_RECTILINEAR (4).
/// Statuses: null pointer, zero, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_eyepiece_check(eyepiece: *const Eyepiece) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    status_of(unsafe { borrow(eyepiece, 1) }.and_then(Eyepiece::check))
}

/// Gives 0 for a camera that can be used; otherwise the cause, with the number of the first bad member,
/// counted from 1, in the place of the argument.
///
/// Members: pixel_nm not 0 (1), columns not 0 (2), rows not 0 (3), binning not 0, not over the columns or the
/// rows (4).
/// Statuses: null pointer, zero, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_camera_check(camera: *const Camera) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    status_of(unsafe { borrow(camera, 1) }.and_then(Camera::check))
}

/// Gives 0 for an observer that can be used; otherwise the cause, with the number of the first bad member,
/// counted from 1, in the place of the argument.
///
/// Members: naked_eye_mmag (1), eye_pupil_um (2; 0: unknown), eye_resolution_mas (3; 0: unknown), seeing_uas
/// (4; 0: unknown), wavelength_nm not 0 (5).
/// Statuses: null pointer, zero.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_observer_check(observer: *const Observer) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    status_of(unsafe { borrow(observer, 1) }.and_then(Observer::check))
}

/// Gives what the eye gets at the eyepiece: the wanted values, each in the unit of its name, and the facts
/// about them.
///
/// wanted: any of the FIELDSTOP_VISUAL_ bits; only those values are computed, and unknown bits are ignored.
/// Formulas: beside each member of the readout; a value is exactly that of the fixed function of the formula.
/// A value that rests on something unknown (eye pupil, eye resolution, field, throughput) or that does not
/// fit its type is not available: its bit in `available` is clear and its member 0. The rest still comes.
/// Caution: never point unfiltered optics at the Sun; follow the maker's instructions and local rules.
/// Statuses: null pointer; zero or out of range, as the check of the first bad struct gives it, with the
/// struct's position (telescope 1, eyepiece 2, observer 3): its check names the member.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_visual_readout_compute(
    telescope: *const Telescope,
    eyepiece: *const Eyepiece,
    observer: *const Observer,
    wanted: u32,
    readout: *mut VisualReadout,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    let structs = unsafe { (borrow(telescope, 1), borrow(eyepiece, 2), borrow(observer, 3)) };
    let (telescope, eyepiece, observer) = match structs {
        (Ok(telescope), Ok(eyepiece), Ok(observer)) => (telescope, eyepiece, observer),
        (Err(error), _, _) | (_, Err(error), _) | (_, _, Err(error)) => return error.status(),
    };
    // SAFETY: likewise.
    unsafe { give(readout, 5, || VisualReadout::compute(telescope, eyepiece, observer, wanted)) }
}

/// Gives what a camera gets at the focus: the wanted values, each in the unit of its name, and the facts
/// about them.
///
/// wanted: any of the FIELDSTOP_CAMERA_ bits; only those values are computed, and unknown bits are ignored.
/// Formulas: beside each member of the readout; a value is exactly that of the fixed function of the formula.
/// A value that rests on something unknown (seeing, throughput) or that does not fit its type is not
/// available: its bit in `available` is clear and its member 0. The rest still comes.
/// Caution: never point unfiltered optics at the Sun; follow the maker's instructions and local rules.
/// Statuses: null pointer; zero or out of range, as the check of the first bad struct gives it, with the
/// struct's position (telescope 1, camera 2, observer 3): its check names the member.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_camera_readout_compute(
    telescope: *const Telescope,
    camera: *const Camera,
    observer: *const Observer,
    wanted: u32,
    readout: *mut CameraReadout,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    let structs = unsafe { (borrow(telescope, 1), borrow(camera, 2), borrow(observer, 3)) };
    let (telescope, camera, observer) = match structs {
        (Ok(telescope), Ok(camera), Ok(observer)) => (telescope, camera, observer),
        (Err(error), _, _) | (_, Err(error), _) | (_, _, Err(error)) => return error.status(),
    };
    // SAFETY: likewise.
    unsafe { give(readout, 5, || CameraReadout::compute(telescope, camera, observer, wanted)) }
}
