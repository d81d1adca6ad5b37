//! The short way of writing one value: straight into the caller's memory.
//!
//! It takes what a screen mostly shows, a number under 2^16 with its unit, or two with a sign each, in a style where a byte
//! is a character. All is measured before the first byte, so that nothing is written where there is no room.

use crate::text::{Look, Short, StyleOfC, has_at_most, split_small_hundred, split_small_ten};
use core::sync::atomic::{Ordering, compiler_fence};

/// Writes the value right-aligned into `width` places; tells whether it has room there.
///
/// # Safety
/// `text` goes to so many places.
#[inline(always)]
pub(super) unsafe fn put(short: Short, style: &StyleOfC, text: *mut u8, width: usize) -> bool {
    let Short { mut number, unit, decimals, two } = short;
    let unit_text = style.text(unit);
    let end = width.wrapping_sub(unit_text.clone().count());
    let mut room = end as isize;
    let mut at = text.wrapping_add(end);
    // SAFETY: no place is written before it is known that all have room.
    unsafe {
        if two {
            let (before, last) = split_small_hundred(number);
            let sign = style.text(unit - 1);
            let length = sign.clone().count();
            room -= length as isize + 2;
            if room <= 0 || !has_at_most(before, room as usize) {
                return false;
            }
            put_text(unit_text, at);
            let (ten, one) = split_small_ten(last);
            at = at.sub(2);
            at.add(1).write(b'0' + one as u8);
            at.write(b'0' + ten as u8);
            at = at.sub(length);
            put_text(sign, at);
            number = before;
        } else {
            room -= isize::from(decimals > 0);
            if room <= decimals as isize || !has_at_most(number, room as usize) {
                return false;
            }
            put_text(unit_text, at);
        }
        let mut to_mark = decimals as isize;
        loop {
            let (rest, digit) = split_small_ten(number);
            number = rest;
            at = at.sub(1);
            at.write(b'0' + digit as u8);
            to_mark -= 1;
            if to_mark == 0 {
                at = at.sub(1);
                at.write(style.decimal_mark());
            } else if to_mark < 0 && number == 0 {
                break;
            }
        }
        while at > text {
            at = at.sub(1);
            at.write(b' ');
            // Keeps this loop from becoming a call of memset, which costs more than so few blanks.
            compiler_fence(Ordering::SeqCst);
        }
    }
    true
}

#[inline(always)]
unsafe fn put_text(text: impl Iterator<Item = u8>, mut at: *mut u8) {
    for byte in text {
        // SAFETY: the caller's promise.
        unsafe {
            at.write(byte);
            at = at.add(1);
        }
    }
}
