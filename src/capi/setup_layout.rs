//! C exports of `setup`: focus, and the layout of mirrors and tube.

use super::setup::{borrow, status_of};
use super::{fieldstop_status, give};
use crate::setup::{
    FocusReadout, Focuser, NewtonianLayout, NewtonianReadout, Observer, Telescope, TwoMirrorLayout,
    TwoMirrorReadout,
};

/// Focus readout, wanted and available: focal_ratio_q16.
pub const FIELDSTOP_FOCUS_FOCAL_RATIO: u32 = 0x0001;
/// Focus readout, wanted and available: depth_nm.
pub const FIELDSTOP_FOCUS_DEPTH: u32 = 0x0002;
/// Focus readout, wanted and available: depth_steps.
pub const FIELDSTOP_FOCUS_DEPTH_STEPS: u32 = 0x0004;
/// Focus readout, wanted and available: temperature_mk.
pub const FIELDSTOP_FOCUS_TEMPERATURE: u32 = 0x0008;
/// Focus readout, wanted and available: blur_nm.
pub const FIELDSTOP_FOCUS_BLUR: u32 = 0x0010;
/// Focus readout, wanted and available: blur_angle_uas.
pub const FIELDSTOP_FOCUS_BLUR_ANGLE: u32 = 0x0020;
/// Focus readout, wanted and available: wavefront_nm.
pub const FIELDSTOP_FOCUS_WAVEFRONT: u32 = 0x0040;
/// Focus readout, wanted: every member.
pub const FIELDSTOP_FOCUS_ALL: u32 = 0x007f;
/// Focus readout, fact: one step of the motor is over the depth of focus (Rayleigh 1879).
pub const FIELDSTOP_FOCUS_FACT_COARSE_STEP: u32 = 0x0001;
/// Focus readout, fact: the defocus is over the depth of focus (Rayleigh 1879).
pub const FIELDSTOP_FOCUS_FACT_OUT_OF_FOCUS: u32 = 0x0002;

/// Newtonian readout, wanted and available: diagonal_um.
pub const FIELDSTOP_NEWTONIAN_DIAGONAL: u32 = 0x0001;
/// Newtonian readout, wanted and available: diagonal_offset_um.
pub const FIELDSTOP_NEWTONIAN_DIAGONAL_OFFSET: u32 = 0x0002;
/// Newtonian readout, wanted and available: obstruction_q16.
pub const FIELDSTOP_NEWTONIAN_OBSTRUCTION: u32 = 0x0004;
/// Newtonian readout, wanted and available: beam_um.
pub const FIELDSTOP_NEWTONIAN_BEAM: u32 = 0x0008;
/// Newtonian readout, wanted and available: beam_shift_um.
pub const FIELDSTOP_NEWTONIAN_BEAM_SHIFT: u32 = 0x0010;
/// Newtonian readout, wanted and available: edge_light_q16.
pub const FIELDSTOP_NEWTONIAN_EDGE_LIGHT: u32 = 0x0020;
/// Newtonian readout, wanted and available: eyepiece_height_um.
pub const FIELDSTOP_NEWTONIAN_EYEPIECE_HEIGHT: u32 = 0x0040;
/// Newtonian readout, wanted and available: greatest_height_um.
pub const FIELDSTOP_NEWTONIAN_GREATEST_HEIGHT: u32 = 0x0080;
/// Newtonian readout, wanted: every member.
pub const FIELDSTOP_NEWTONIAN_ALL: u32 = 0x00ff;
/// Newtonian readout, fact: the diagonal in place is smaller than the field needs (geometry).
pub const FIELDSTOP_NEWTONIAN_FACT_SMALL_DIAGONAL: u32 = 0x0001;
/// Newtonian readout, fact: the diagonal is wider than the obstruction that the telescope tells (geometry).
pub const FIELDSTOP_NEWTONIAN_FACT_WIDER_THAN_TOLD: u32 = 0x0002;
/// Newtonian readout, fact: the eyepiece is above the height that the layout sets; show the caution.
pub const FIELDSTOP_NEWTONIAN_FACT_HIGH_EYEPIECE: u32 = 0x0004;
/// Newtonian readout, fact: within its altitudes it gets above that height; show the caution.
pub const FIELDSTOP_NEWTONIAN_FACT_HIGH_REACHED: u32 = 0x0008;

/// Two mirror readout, wanted and available: secondary_magnification_q16.
pub const FIELDSTOP_TWO_MIRROR_SECONDARY_MAGNIFICATION: u32 = 0x0001;
/// Two mirror readout, wanted and available: separation_um.
pub const FIELDSTOP_TWO_MIRROR_SEPARATION: u32 = 0x0002;
/// Two mirror readout, wanted and available: secondary_um.
pub const FIELDSTOP_TWO_MIRROR_SECONDARY: u32 = 0x0004;
/// Two mirror readout, wanted and available: secondary_radius_um.
pub const FIELDSTOP_TWO_MIRROR_SECONDARY_RADIUS: u32 = 0x0008;
/// Two mirror readout, wanted and available: obstruction_q16.
pub const FIELDSTOP_TWO_MIRROR_OBSTRUCTION: u32 = 0x0010;
/// Two mirror readout, wanted and available: length_um.
pub const FIELDSTOP_TWO_MIRROR_LENGTH: u32 = 0x0020;
/// Two mirror readout, wanted and available: length_share_q16.
pub const FIELDSTOP_TWO_MIRROR_LENGTH_SHARE: u32 = 0x0040;
/// Two mirror readout, wanted: every member.
pub const FIELDSTOP_TWO_MIRROR_ALL: u32 = 0x007f;
/// Two mirror readout, fact: the secondary is wider than the obstruction that the telescope tells (geometry).
pub const FIELDSTOP_TWO_MIRROR_FACT_WIDER_THAN_TOLD: u32 = 0x0001;

// The literals that cbindgen can read are those of the Rust constants.
const _: () = {
    assert!(FIELDSTOP_FOCUS_FOCAL_RATIO == FocusReadout::FOCAL_RATIO);
    assert!(FIELDSTOP_FOCUS_DEPTH == FocusReadout::DEPTH);
    assert!(FIELDSTOP_FOCUS_DEPTH_STEPS == FocusReadout::DEPTH_STEPS);
    assert!(FIELDSTOP_FOCUS_TEMPERATURE == FocusReadout::TEMPERATURE);
    assert!(FIELDSTOP_FOCUS_BLUR == FocusReadout::BLUR);
    assert!(FIELDSTOP_FOCUS_BLUR_ANGLE == FocusReadout::BLUR_ANGLE);
    assert!(FIELDSTOP_FOCUS_WAVEFRONT == FocusReadout::WAVEFRONT);
    assert!(FIELDSTOP_FOCUS_ALL == FocusReadout::ALL);
    assert!(FIELDSTOP_FOCUS_FACT_COARSE_STEP == FocusReadout::FACT_COARSE_STEP);
    assert!(FIELDSTOP_FOCUS_FACT_OUT_OF_FOCUS == FocusReadout::FACT_OUT_OF_FOCUS);
    assert!(FIELDSTOP_NEWTONIAN_DIAGONAL == NewtonianReadout::DIAGONAL);
    assert!(FIELDSTOP_NEWTONIAN_DIAGONAL_OFFSET == NewtonianReadout::DIAGONAL_OFFSET);
    assert!(FIELDSTOP_NEWTONIAN_OBSTRUCTION == NewtonianReadout::OBSTRUCTION);
    assert!(FIELDSTOP_NEWTONIAN_BEAM == NewtonianReadout::BEAM);
    assert!(FIELDSTOP_NEWTONIAN_BEAM_SHIFT == NewtonianReadout::BEAM_SHIFT);
    assert!(FIELDSTOP_NEWTONIAN_EDGE_LIGHT == NewtonianReadout::EDGE_LIGHT);
    assert!(FIELDSTOP_NEWTONIAN_EYEPIECE_HEIGHT == NewtonianReadout::EYEPIECE_HEIGHT);
    assert!(FIELDSTOP_NEWTONIAN_GREATEST_HEIGHT == NewtonianReadout::GREATEST_HEIGHT);
    assert!(FIELDSTOP_NEWTONIAN_ALL == NewtonianReadout::ALL);
    assert!(FIELDSTOP_NEWTONIAN_FACT_SMALL_DIAGONAL == NewtonianReadout::FACT_SMALL_DIAGONAL);
    assert!(FIELDSTOP_NEWTONIAN_FACT_WIDER_THAN_TOLD == NewtonianReadout::FACT_WIDER_THAN_TOLD);
    assert!(FIELDSTOP_NEWTONIAN_FACT_HIGH_EYEPIECE == NewtonianReadout::FACT_HIGH_EYEPIECE);
    assert!(FIELDSTOP_NEWTONIAN_FACT_HIGH_REACHED == NewtonianReadout::FACT_HIGH_REACHED);
    assert!(FIELDSTOP_TWO_MIRROR_SECONDARY_MAGNIFICATION == TwoMirrorReadout::SECONDARY_MAGNIFICATION);
    assert!(FIELDSTOP_TWO_MIRROR_SEPARATION == TwoMirrorReadout::SEPARATION);
    assert!(FIELDSTOP_TWO_MIRROR_SECONDARY == TwoMirrorReadout::SECONDARY);
    assert!(FIELDSTOP_TWO_MIRROR_SECONDARY_RADIUS == TwoMirrorReadout::SECONDARY_RADIUS);
    assert!(FIELDSTOP_TWO_MIRROR_OBSTRUCTION == TwoMirrorReadout::OBSTRUCTION);
    assert!(FIELDSTOP_TWO_MIRROR_LENGTH == TwoMirrorReadout::LENGTH);
    assert!(FIELDSTOP_TWO_MIRROR_LENGTH_SHARE == TwoMirrorReadout::LENGTH_SHARE);
    assert!(FIELDSTOP_TWO_MIRROR_ALL == TwoMirrorReadout::ALL);
    assert!(FIELDSTOP_TWO_MIRROR_FACT_WIDER_THAN_TOLD == TwoMirrorReadout::FACT_WIDER_THAN_TOLD);
};

/// Gives 0 for a Newtonian's layout that can be used; otherwise the cause, with the number of the first bad member,
/// counted from 1, in the place of the argument.
///
/// Members: focus_distance_um (1), lit_field_um (2), edge_offset_um (3), diagonal_um (4; 0: as large as it must be),
/// axis_height_um (5), reach_um (6), altitude_bam 0 to 0x40000000, which is 90 degrees (7), lowest_altitude_bam
/// likewise (8), highest_altitude_bam likewise, not under the lowest (9), height_limit_um (10; 0: none).
/// Statuses: null pointer, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_newtonian_layout_check(
    layout: *const NewtonianLayout,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    status_of(unsafe { borrow(layout, 1) }.and_then(NewtonianLayout::check))
}

/// Gives 0 for a layout of two mirrors that can be used; otherwise the cause, with the number of the first bad member,
/// counted from 1, in the place of the argument.
///
/// Members: primary_focal_um not 0 (1), back_focus_um (2), lit_field_um (3).
/// Statuses: null pointer, zero.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_two_mirror_layout_check(
    layout: *const TwoMirrorLayout,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    status_of(unsafe { borrow(layout, 1) }.and_then(TwoMirrorLayout::check))
}

/// Gives how exact the focus must be and what it costs to be off: the wanted values, each in the unit of its name,
/// and the facts about them.
///
/// focuser: any values. wanted: any of the FIELDSTOP_FOCUS_ bits; only those values are computed, and unknown bits are ignored.
/// Formulas: beside each member of the readout; a value is exactly that of the fixed function of the formula.
/// A value that rests on something unknown (motor step, tube, expansion) or that does not fit its type is not
/// available: its bit in `available` is clear and its member 0. The rest still comes.
/// Caution: never point unfiltered optics at the Sun; follow the maker's instructions and local rules.
/// Statuses: null pointer; zero or out of range, as the check of the first bad struct gives it, with the
/// struct's position (telescope 1, observer 3): its check names the member.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_focus_readout_compute(
    telescope: *const Telescope,
    focuser: *const Focuser,
    observer: *const Observer,
    wanted: u32,
    readout: *mut FocusReadout,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    let structs = unsafe { (borrow(telescope, 1), borrow(focuser, 2), borrow(observer, 3)) };
    let (telescope, focuser, observer) = match structs {
        (Ok(telescope), Ok(focuser), Ok(observer)) => (telescope, focuser, observer),
        (Err(error), _, _) | (_, Err(error), _) | (_, _, Err(error)) => return error.status(),
    };
    // SAFETY: likewise.
    unsafe { give(readout, 5, || FocusReadout::compute(telescope, focuser, observer, wanted)) }
}

/// Gives a Newtonian's diagonal, the light that it passes, and the height of the eyepiece: the wanted values, each in
/// the unit of its name, and the facts about them.
///
/// wanted: any of the FIELDSTOP_NEWTONIAN_ bits; only those values are computed, and unknown bits are ignored.
/// Formulas: beside each member of the readout; a value is exactly that of the fixed function of the formula. The
/// telescope's Barlow or reducer does not count.
/// A value that has none with this layout (a focus distance over the focal length, an eyepiece under the floor) or
/// that does not fit its type is not available: its bit in `available` is clear and its member 0. The rest still comes.
/// Caution: at a high eyepiece stand on a stable platform, never on the top of a ladder, and clear of the moving
/// mount; never point unfiltered optics at the Sun; follow the maker's instructions and local rules.
/// Statuses: null pointer; zero or out of range, as the check of the first bad struct gives it, with the
/// struct's position (telescope 1, layout 2): its check names the member.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_newtonian_readout_compute(
    telescope: *const Telescope,
    layout: *const NewtonianLayout,
    wanted: u32,
    readout: *mut NewtonianReadout,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    let (telescope, layout) = match unsafe { (borrow(telescope, 1), borrow(layout, 2)) } {
        (Ok(telescope), Ok(layout)) => (telescope, layout),
        (Err(error), _) | (_, Err(error)) => return error.status(),
    };
    // SAFETY: likewise.
    unsafe { give(readout, 4, || NewtonianReadout::compute(telescope, layout, wanted)) }
}

/// Gives where the second mirror of two goes and what it is: the wanted values, each in the unit of its name, and the
/// facts about them.
///
/// wanted: any of the FIELDSTOP_TWO_MIRROR_ bits; only those values are computed, and unknown bits are ignored.
/// Formulas: beside each member of the readout; a value is that of the fixed functions of the formula, sums and
/// ratios of them rounded once more. The telescope's focal length is the system's; its Barlow or reducer does not count.
/// A value that has none with this layout (a system not longer than the primary) or that does not fit its type is not
/// available: its bit in `available` is clear and its member 0. The rest still comes.
/// Caution: never point unfiltered optics at the Sun; follow the maker's instructions and local rules.
/// Statuses: null pointer; zero or out of range, as the check of the first bad struct gives it, with the
/// struct's position (telescope 1, layout 2): its check names the member.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_two_mirror_readout_compute(
    telescope: *const Telescope,
    layout: *const TwoMirrorLayout,
    wanted: u32,
    readout: *mut TwoMirrorReadout,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    let (telescope, layout) = match unsafe { (borrow(telescope, 1), borrow(layout, 2)) } {
        (Ok(telescope), Ok(layout)) => (telescope, layout),
        (Err(error), _) | (_, Err(error)) => return error.status(),
    };
    // SAFETY: likewise.
    unsafe { give(readout, 4, || TwoMirrorReadout::compute(telescope, layout, wanted)) }
}
