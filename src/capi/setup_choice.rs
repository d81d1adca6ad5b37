//! C exports of `setup` that choose what to put in.

use super::fieldstop_status;
use super::setup::{borrow, status_of};
use crate::setup::{
    Camera, CameraChoice, CameraOutfit, CameraTarget, Eyepiece, Observer, Telescope, VisualChoice,
    VisualOutfit, VisualTarget,
};
use crate::status::{Cause, Error};
use crate::units::Q16;
use core::{ptr, slice};

/// Visual target, purpose: the whole target with room around it, as large as that allows.
pub const FIELDSTOP_PURPOSE_FRAME: u8 = 0;
/// Visual target, purpose: two stars as far apart to the eye as it needs.
pub const FIELDSTOP_PURPOSE_SPLIT: u8 = 1;
/// Visual target, purpose: the nearest exit pupil.
pub const FIELDSTOP_PURPOSE_EXIT_PUPIL: u8 = 2;

/// Choices: the place in the list of Barlows and reducers where there is none.
pub const FIELDSTOP_NO_AMPLIFIER: u8 = 255;

/// Visual choice, available: magnification_q16.
pub const FIELDSTOP_VISUAL_CHOICE_MAGNIFICATION: u32 = 0x0001;
/// Visual choice, available: exit_pupil_um.
pub const FIELDSTOP_VISUAL_CHOICE_EXIT_PUPIL: u32 = 0x0002;
/// Visual choice, available: true_field_mas.
pub const FIELDSTOP_VISUAL_CHOICE_TRUE_FIELD: u32 = 0x0004;
/// Visual choice, available: fit_q16.
pub const FIELDSTOP_VISUAL_CHOICE_FIT: u32 = 0x0008;
/// Visual choice, fact: the exit pupil is wider than the eye's (geometry).
pub const FIELDSTOP_VISUAL_CHOICE_FACT_WIDE_EXIT_PUPIL: u32 = 0x0001;
/// Visual choice, fact: the magnification is over the resolving magnification (Rayleigh 1879, and the observer's
/// eye).
pub const FIELDSTOP_VISUAL_CHOICE_FACT_EMPTY_MAGNIFICATION: u32 = 0x0002;
/// Visual choice, fact: the true field comes from the apparent field.
pub const FIELDSTOP_VISUAL_CHOICE_FACT_FIELD_FROM_APPARENT: u32 = 0x0004;
/// Visual choice, fact: the magnification is over that at which the seeing reaches the smallest angle that the eye
/// parts (common practice).
pub const FIELDSTOP_VISUAL_CHOICE_FACT_SEEING_SHOWS: u32 = 0x0008;
/// Visual choice, fact: what is wanted is reached.
pub const FIELDSTOP_VISUAL_CHOICE_FACT_SERVES: u32 = 0x0010;
/// Visual choice, fact: the separation is under the telescope's Rayleigh limit.
pub const FIELDSTOP_VISUAL_CHOICE_FACT_UNDER_RESOLUTION: u32 = 0x0020;
/// Visual choice, fact: the separation is under the seeing (common practice).
pub const FIELDSTOP_VISUAL_CHOICE_FACT_UNDER_SEEING: u32 = 0x0040;

/// Camera choice, available: frame_width_mas.
pub const FIELDSTOP_CAMERA_CHOICE_FRAME_WIDTH: u32 = 0x0001;
/// Camera choice, available: frame_height_mas.
pub const FIELDSTOP_CAMERA_CHOICE_FRAME_HEIGHT: u32 = 0x0002;
/// Camera choice, available: pixel_scale_uas.
pub const FIELDSTOP_CAMERA_CHOICE_PIXEL_SCALE: u32 = 0x0004;
/// Camera choice, available: pixels_per_fwhm_q16.
pub const FIELDSTOP_CAMERA_CHOICE_PIXELS_PER_FWHM: u32 = 0x0008;
/// Camera choice, available: tiles_wide and tiles_high.
pub const FIELDSTOP_CAMERA_CHOICE_TILES: u32 = 0x0010;
/// Camera choice, fact: under two pixels to the star image (common practice, after Shannon 1949).
pub const FIELDSTOP_CAMERA_CHOICE_FACT_COARSE_SAMPLING: u32 = 0x0001;
/// Camera choice, fact: over three pixels to the star image (common practice).
pub const FIELDSTOP_CAMERA_CHOICE_FACT_FINE_SAMPLING: u32 = 0x0002;
/// Camera choice, fact: one frame takes the whole target.
pub const FIELDSTOP_CAMERA_CHOICE_FACT_FITS: u32 = 0x0004;

// The literals that cbindgen can read are those of the Rust constants.
const _: () = {
    assert!(FIELDSTOP_PURPOSE_FRAME == VisualTarget::FRAME && FIELDSTOP_PURPOSE_SPLIT == VisualTarget::SPLIT);
    assert!(FIELDSTOP_PURPOSE_EXIT_PUPIL == VisualTarget::EXIT_PUPIL);
    assert!(FIELDSTOP_NO_AMPLIFIER == VisualChoice::NO_AMPLIFIER);
    assert!(FIELDSTOP_NO_AMPLIFIER == CameraChoice::NO_AMPLIFIER);
    assert!(FIELDSTOP_VISUAL_CHOICE_MAGNIFICATION == VisualChoice::MAGNIFICATION);
    assert!(FIELDSTOP_VISUAL_CHOICE_EXIT_PUPIL == VisualChoice::EXIT_PUPIL);
    assert!(FIELDSTOP_VISUAL_CHOICE_TRUE_FIELD == VisualChoice::TRUE_FIELD);
    assert!(FIELDSTOP_VISUAL_CHOICE_FIT == VisualChoice::FIT);
    assert!(FIELDSTOP_VISUAL_CHOICE_FACT_WIDE_EXIT_PUPIL == VisualChoice::FACT_WIDE_EXIT_PUPIL);
    assert!(FIELDSTOP_VISUAL_CHOICE_FACT_EMPTY_MAGNIFICATION == VisualChoice::FACT_EMPTY_MAGNIFICATION);
    assert!(FIELDSTOP_VISUAL_CHOICE_FACT_FIELD_FROM_APPARENT == VisualChoice::FACT_FIELD_FROM_APPARENT);
    assert!(FIELDSTOP_VISUAL_CHOICE_FACT_SEEING_SHOWS == VisualChoice::FACT_SEEING_SHOWS);
    assert!(FIELDSTOP_VISUAL_CHOICE_FACT_SERVES == VisualChoice::FACT_SERVES);
    assert!(FIELDSTOP_VISUAL_CHOICE_FACT_UNDER_RESOLUTION == VisualChoice::FACT_UNDER_RESOLUTION);
    assert!(FIELDSTOP_VISUAL_CHOICE_FACT_UNDER_SEEING == VisualChoice::FACT_UNDER_SEEING);
    assert!(FIELDSTOP_CAMERA_CHOICE_FRAME_WIDTH == CameraChoice::FRAME_WIDTH);
    assert!(FIELDSTOP_CAMERA_CHOICE_FRAME_HEIGHT == CameraChoice::FRAME_HEIGHT);
    assert!(FIELDSTOP_CAMERA_CHOICE_PIXEL_SCALE == CameraChoice::PIXEL_SCALE);
    assert!(FIELDSTOP_CAMERA_CHOICE_PIXELS_PER_FWHM == CameraChoice::PIXELS_PER_FWHM);
    assert!(FIELDSTOP_CAMERA_CHOICE_TILES == CameraChoice::TILES);
    assert!(FIELDSTOP_CAMERA_CHOICE_FACT_COARSE_SAMPLING == CameraChoice::FACT_COARSE_SAMPLING);
    assert!(FIELDSTOP_CAMERA_CHOICE_FACT_FINE_SAMPLING == CameraChoice::FACT_FINE_SAMPLING);
    assert!(FIELDSTOP_CAMERA_CHOICE_FACT_FITS == CameraChoice::FACT_FITS);
};

/// A list behind a pointer that C gave, which may be null where the list is empty.
///
/// # Safety
/// `pointer` is null or points to `count` T that nobody writes while the borrow lives.
#[inline(always)]
unsafe fn list<'a, T>(pointer: *const T, count: u8, position: u8) -> Result<&'a [T], Error> {
    match count {
        0 => Ok(&[]),
        _ if pointer.is_null() => Err(Error::new(Cause::NullPointer, position)),
        // SAFETY: the caller's promise.
        count => Ok(unsafe { slice::from_raw_parts(pointer, usize::from(count)) }),
    }
}

/// Lets `choose` fill the caller's array, and gives how many it filled.
///
/// # Safety
/// `choices` is null or points to `*count` T that may be written, and `count` is null or points to a byte.
#[inline(always)]
unsafe fn fill<T>(
    choices: *mut T,
    count: *mut u8,
    check: impl FnOnce() -> Result<(), Error>,
    choose: impl FnOnce(&mut [T]) -> Result<usize, Error>,
) -> Result<(), Error> {
    if choices.is_null() {
        return Err(Error::new(Cause::NullPointer, 8));
    }
    // SAFETY: the caller's promise.
    let Some(count) = (unsafe { count.as_mut() }) else { return Err(Error::new(Cause::NullPointer, 9)) };
    let room = *count;
    check()?;
    if room == 0 {
        return Err(Error::new(Cause::Zero, 9));
    }
    // SAFETY: the caller's promise; all-zero bytes are a T, since it holds integers only.
    let places = unsafe {
        ptr::write_bytes(choices, 0, usize::from(room));
        slice::from_raw_parts_mut(choices, usize::from(room))
    };
    let filled = choose(places)?;
    *count = filled as u8;
    Ok(())
}

/// Fills `choices` with the best eyepieces for a target, each alone and with each Barlow or reducer, the best first.
///
/// telescope: its own amplification is not used. eyepieces: 1 to 16. amplifiers_q16: what each Barlow or reducer
/// multiplies the focal length by, none 0, up to 8; may be null where there is none. choice_count: on entry the room in
/// `choices`, not 0; on success how many are filled, at most eyepieces times (1 + amplifiers). What stands behind
/// them in `choices` is then 0.
/// The order, from the first that differs: (1) the lower `standing`; (2) to frame the smaller true field, or the larger
/// where it does not serve; to split the lower magnification, or the higher where it does not part the stars; for an
/// exit pupil the smaller ratio of the larger to the smaller; (3) without a Barlow or reducer before with one, then
/// its place in the list, then the place of the eyepiece.
/// Values are those of fieldstop_visual_readout_compute, and comparisons are exact.
/// Caution: never point unfiltered optics at the Sun; follow the maker's instructions and local rules.
/// Statuses: null pointer; zero or out of range, as the check of the first bad struct gives it, with its position;
/// zero: eyepiece_count, an amplifier (argument 4), `*choice_count`; out of range: eyepiece_count, amplifier_count.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_visual_choose(
    telescope: *const Telescope,
    eyepieces: *const Eyepiece,
    eyepiece_count: u8,
    amplifiers_q16: *const u32,
    amplifier_count: u8,
    observer: *const Observer,
    target: *const VisualTarget,
    choices: *mut VisualChoice,
    choice_count: *mut u8,
) -> fieldstop_status {
    let choose = || {
        // SAFETY: the caller's promise about the pointers; a Q16 is an integer of 32 bits.
        unsafe {
            let telescope = borrow(telescope, 1)?;
            let eyepieces = list(eyepieces, eyepiece_count, 2)?;
            let amplifiers = list(amplifiers_q16.cast::<Q16>(), amplifier_count, 4)?;
            let (observer, target) = (borrow(observer, 6)?, borrow(target, 7)?);
            let outfit = VisualOutfit { telescope, eyepieces, amplifiers };
            fill(
                choices,
                choice_count,
                || outfit.check(observer, target),
                |places| outfit.choose(observer, target, places),
            )
        }
    };
    status_of(choose())
}

/// Fills `choices` with the best cameras for a target, each alone and with each Barlow or reducer, the best first.
///
/// telescope: its own amplification is not used. cameras: 1 to 8. amplifiers_q16: what each Barlow or reducer
/// multiplies the focal length by, none 0, up to 8; may be null where there is none. choice_count: on entry the room in
/// `choices`, not 0; on success how many are filled, at most cameras times (1 + amplifiers). What stands behind them
/// in `choices` is then 0.
/// Frames overlap by the share of a frame that the target says, rounded down to a milliarcsecond.
/// The order, from the first that differs: (1) the fewer frames, width times height; last, where they are not known;
/// (2) neither coarse nor fine sampling before either; (3) the finer pixel scale; (4) without a Barlow or reducer
/// before with one, then its place in the list, then the place of the camera.
/// Values are those of fieldstop_camera_readout_compute and fieldstop_tiles_fx.
/// Caution: never point unfiltered optics at the Sun; follow the maker's instructions and local rules.
/// Statuses: null pointer; zero or out of range, as the check of the first bad struct gives it, with its position;
/// zero: camera_count, an amplifier (argument 4), `*choice_count`; out of range: camera_count, amplifier_count.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_camera_choose(
    telescope: *const Telescope,
    cameras: *const Camera,
    camera_count: u8,
    amplifiers_q16: *const u32,
    amplifier_count: u8,
    observer: *const Observer,
    target: *const CameraTarget,
    choices: *mut CameraChoice,
    choice_count: *mut u8,
) -> fieldstop_status {
    let choose = || {
        // SAFETY: the caller's promise about the pointers; a Q16 is an integer of 32 bits.
        unsafe {
            let telescope = borrow(telescope, 1)?;
            let cameras = list(cameras, camera_count, 2)?;
            let amplifiers = list(amplifiers_q16.cast::<Q16>(), amplifier_count, 4)?;
            let (observer, target) = (borrow(observer, 6)?, borrow(target, 7)?);
            let outfit = CameraOutfit { telescope, cameras, amplifiers };
            fill(
                choices,
                choice_count,
                || outfit.check(observer, target),
                |places| outfit.choose(observer, target, places),
            )
        }
    };
    status_of(choose())
}
