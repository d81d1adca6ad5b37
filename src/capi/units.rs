//! C exports of `convert`.

use super::{fieldstop_status, give};
use crate::convert;
use crate::units::{Bam, DayMilliseconds, Milli, Q16, SignedBam, SignedMilliarcseconds};

/// Gives the binary angle of milliarcseconds, whole turns dropped.
///
/// 2^32 a / 1296000000.
/// Ranges: angle_mas any value.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_bam_from_mas_fx(angle_mas: i32, angle_bam: *mut u32) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(angle_bam, 2, || convert::bam_from_mas_fx(SignedMilliarcseconds(angle_mas))) }
}

/// Gives the milliarcseconds of a binary angle, under 1296000000.
///
/// 1296000000 b / 2^32; what rounds to a whole turn is 0.
/// Ranges: angle_bam any value.
/// Error: at most 0.5 LSB, on the circle.
/// Statuses: null pointer.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_mas_from_bam_fx(angle_bam: u32, angle_mas: *mut u32) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(angle_mas, 2, || convert::mas_from_bam_fx(Bam(angle_bam))) }
}

/// Gives the milliarcseconds of a binary angle either side of zero.
///
/// 1296000000 b / 2^32.
/// Ranges: angle_bam any value.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_signed_mas_from_bam_fx(
    angle_bam: i32,
    angle_mas: *mut i32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(angle_mas, 2, || convert::signed_mas_from_bam_fx(SignedBam(angle_bam))) }
}

/// Gives the binary angle of milliseconds on a circle of 24 hours.
///
/// 2^32 t / 86400000.
/// Ranges: time_day_ms under 86400000.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_bam_from_day_ms_fx(
    time_day_ms: u32,
    angle_bam: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(angle_bam, 2, || convert::bam_from_day_ms_fx(DayMilliseconds(time_day_ms))) }
}

/// Gives the milliseconds on a circle of 24 hours of a binary angle, under 86400000.
///
/// 86400000 b / 2^32; what rounds to a whole day is 0.
/// Ranges: angle_bam any value.
/// Error: at most 0.5 LSB, on the circle.
/// Statuses: null pointer.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_day_ms_from_bam_fx(
    angle_bam: u32,
    time_day_ms: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(time_day_ms, 2, || convert::day_ms_from_bam_fx(Bam(angle_bam))) }
}

/// Gives the thousandths of a Q16.16 number.
///
/// 1000 x.
/// Ranges: number_q16 any value.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_milli_from_q16_fx(
    number_q16: u32,
    number_milli: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(number_milli, 2, || convert::milli_from_q16_fx(Q16(number_q16))) }
}

/// Gives the Q16.16 number of thousandths.
///
/// m / 1000.
/// Ranges: number_milli any value.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, overflow (65536 or more).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_q16_from_milli_fx(
    number_milli: u32,
    number_q16: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(number_q16, 2, || convert::q16_from_milli_fx(Milli(number_milli))) }
}
