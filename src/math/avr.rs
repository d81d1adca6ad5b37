//! Kernels in the instructions of an AVR with a multiplier: the compiler makes calls and loops of single bits out of 32 and
//! 64 bits. Each gives the bits of the form for other parts, and `r1` back as 0, as the compiler wants it.
#![allow(unsafe_code)]

use super::divide::RECIPROCAL;
use core::arch::asm;

#[inline(always)]
fn halves(x: u32) -> (u16, u16) {
    ((x >> 16) as u16, x as u16)
}

#[inline(always)]
fn joined(upper: u16, lower: u16) -> u32 {
    (upper as u32) << 16 | lower as u32
}

/// Adds a byte of a times b to four bytes of the product; the byte's place takes the fifth.
macro_rules! row {
    ($a:literal, $p0:literal, $p1:literal, $p2:literal, $p3:literal) => {
        concat!(
            concat!("mul ", $a, ", {b0:l}\nmovw {t0}, r0\n"),
            concat!("mul ", $a, ", {b2:l}\nmovw {t2}, r0\n"),
            concat!("mul ", $a, ", {b0:h}\nadd {t0:h}, r0\nadc {t2:l}, r1\nadc {t2:h}, {zero}\n"),
            concat!("mul ", $a, ", {b2:h}\nadd {t2:h}, r0\nmov ", $a, ", r1\nadc ", $a, ", {zero}\n"),
            concat!("add ", $p0, ", {t0:l}\nadc ", $p1, ", {t0:h}\n"),
            concat!("adc ", $p2, ", {t2:l}\nadc ", $p3, ", {t2:h}\nadc ", $a, ", {zero}"),
        )
    };
}

/// a b. (Rust's own convention would give the result by way of memory.)
#[inline(never)]
pub(crate) extern "C" fn wide(a: u32, b: u32) -> u64 {
    let ((mut a2, mut a0), (b2, b0)) = (halves(a), halves(b));
    let (p0, p2): (u16, u16);
    // SAFETY: only the registers named change, and r1 is 0 again.
    unsafe {
        asm!(
            "clr {zero}",
            "mul {a0:l}, {b0:l}",
            "movw {p0}, r0",
            "mul {a0:l}, {b2:l}",
            "movw {p2}, r0",
            "mul {a0:l}, {b0:h}",
            "add {p0:h}, r0",
            "adc {p2:l}, r1",
            "adc {p2:h}, {zero}",
            "mul {a0:l}, {b2:h}",
            "add {p2:h}, r0",
            "mov {a0:l}, r1",
            "adc {a0:l}, {zero}",
            row!("{a0:h}", "{p0:h}", "{p2:l}", "{p2:h}", "{a0:l}"),
            row!("{a2:l}", "{p2:l}", "{p2:h}", "{a0:l}", "{a0:h}"),
            row!("{a2:h}", "{p2:h}", "{a0:l}", "{a0:h}", "{a2:l}"),
            "clr r1",
            a0 = inout(reg_pair) a0,
            a2 = inout(reg_pair) a2,
            b0 = in(reg_pair) b0,
            b2 = in(reg_pair) b2,
            p0 = out(reg_pair) p0,
            p2 = out(reg_pair) p2,
            t0 = out(reg_pair) _,
            t2 = out(reg_pair) _,
            zero = out(reg) _,
            options(pure, nomem, nostack)
        );
    }
    (joined(a2, a0) as u64) << 32 | joined(p2, p0) as u64
}

/// A byte of the quotient from four bytes of rest, below `d`, and the next of `n`. The byte takes the place of the first.
/// The reciprocal tells it within 3; it is 0 where the rest is under 2^23.
macro_rules! digit {
    ($n4:literal, $n3:literal, $n2:literal, $n1:literal, $n0:literal) => {
        concat!(
            concat!("tst ", $n4, "\nbrne 3f\ntst ", $n3, "\nbrpl 8f\n"),
            concat!("3: mul ", $n3, ", {reciprocal}\nmov {q}, r1\n"),
            concat!("mul ", $n4, ", {reciprocal}\nadd r0, {q}\nadc r1, {zero}\n"),
            concat!("add r0, ", $n3, "\nadc r1, ", $n4, "\nmov {q}, r1\nbrcc 4f\nldi {q}, 255\n"),
            concat!("4: mul {q}, {d0:l}\nsub ", $n0, ", r0\nsbc ", $n1, ", r1\n"),
            concat!("sbc ", $n2, ", {zero}\nsbc ", $n3, ", {zero}\nsbc ", $n4, ", {zero}\n"),
            concat!("mul {q}, {d0:h}\nsub ", $n1, ", r0\nsbc ", $n2, ", r1\n"),
            concat!("sbc ", $n3, ", {zero}\nsbc ", $n4, ", {zero}\n"),
            concat!("mul {q}, {d2:l}\nsub ", $n2, ", r0\nsbc ", $n3, ", r1\nsbc ", $n4, ", {zero}\n"),
            concat!("mul {q}, {d2:h}\nsub ", $n3, ", r0\nsbc ", $n4, ", r1\nbrmi 7f\n"),
            concat!("5: tst ", $n4, "\nbrne 6f\ncp ", $n0, ", {d0:l}\ncpc ", $n1, ", {d0:h}\n"),
            concat!("cpc ", $n2, ", {d2:l}\ncpc ", $n3, ", {d2:h}\nbrlo 9f\n"),
            concat!("6: inc {q}\nsub ", $n0, ", {d0:l}\nsbc ", $n1, ", {d0:h}\n"),
            concat!("sbc ", $n2, ", {d2:l}\nsbc ", $n3, ", {d2:h}\nsbc ", $n4, ", {zero}\nrjmp 5b\n"),
            concat!("7: dec {q}\nadd ", $n0, ", {d0:l}\nadc ", $n1, ", {d0:h}\n"),
            concat!("adc ", $n2, ", {d2:l}\nadc ", $n3, ", {d2:h}\nadc ", $n4, ", {zero}\nbrmi 7b\n"),
            concat!("9: mov ", $n4, ", {q}\n8:"),
        )
    };
}

/// Quotient and remainder. `d` is not 0 and above the upper half of `n`.
#[inline(always)]
pub(crate) fn divide(n: u64, d: u32) -> (u32, u32) {
    let quotient = quotient(n, d);
    (quotient, (n as u32).wrapping_sub(quotient.wrapping_mul(d)))
}

#[inline(never)]
fn quotient(n: u64, d: u32) -> u32 {
    let ((mut n6, mut n4), (mut n2, mut n0)) = (halves((n >> 32) as u32), halves(n as u32));
    let (mut d2, mut d0) = halves(d);
    // SAFETY: only the registers named change.
    unsafe {
        // Both are shifted up until the top bit of d is set.
        asm!(
            "2: tst {d2:h}",
            "brne 3f",
            "mov {d2:h}, {d2:l}",
            "mov {d2:l}, {d0:h}",
            "mov {d0:h}, {d0:l}",
            "clr {d0:l}",
            "mov {n6:h}, {n6:l}",
            "mov {n6:l}, {n4:h}",
            "mov {n4:h}, {n4:l}",
            "mov {n4:l}, {n2:h}",
            "mov {n2:h}, {n2:l}",
            "mov {n2:l}, {n0:h}",
            "mov {n0:h}, {n0:l}",
            "clr {n0:l}",
            "rjmp 2b",
            "3: brmi 5f",
            "4: lsl {n0:l}",
            "rol {n0:h}",
            "rol {n2:l}",
            "rol {n2:h}",
            "rol {n4:l}",
            "rol {n4:h}",
            "rol {n6:l}",
            "rol {n6:h}",
            "lsl {d0:l}",
            "rol {d0:h}",
            "rol {d2:l}",
            "rol {d2:h}",
            "brpl 4b",
            "5:",
            d0 = inout(reg_pair) d0,
            d2 = inout(reg_pair) d2,
            n0 = inout(reg_pair) n0,
            n2 = inout(reg_pair) n2,
            n4 = inout(reg_pair) n4,
            n6 = inout(reg_pair) n6,
            options(pure, nomem, nostack)
        );
    }
    let reciprocal = RECIPROCAL.at(usize::from((d2 >> 9) as u8 & 63));
    // SAFETY: only the registers named change, and r1 is 0 again.
    unsafe {
        asm!(
            "clr {zero}",
            digit!("{n6:h}", "{n6:l}", "{n4:h}", "{n4:l}", "{n2:h}"),
            digit!("{n6:l}", "{n4:h}", "{n4:l}", "{n2:h}", "{n2:l}"),
            digit!("{n4:h}", "{n4:l}", "{n2:h}", "{n2:l}", "{n0:h}"),
            digit!("{n4:l}", "{n2:h}", "{n2:l}", "{n0:h}", "{n0:l}"),
            "clr r1",
            reciprocal = in(reg) reciprocal,
            d0 = in(reg_pair) d0,
            d2 = in(reg_pair) d2,
            n0 = inout(reg_pair) n0 => _,
            n2 = inout(reg_pair) n2 => _,
            n4 = inout(reg_pair) n4,
            n6 = inout(reg_pair) n6,
            q = out(reg_upper) _,
            zero = out(reg) _,
            options(pure, nomem, nostack)
        );
    }
    joined(n6, n4)
}

/// `n` shifted up by 0 to 31 places.
#[inline(never)]
pub(crate) extern "C" fn shift_up(n: u64, shift: u32) -> u64 {
    let ((mut n6, mut n4), (mut n2, mut n0)) = (halves((n >> 32) as u32), halves(n as u32));
    // SAFETY: only the registers named change.
    unsafe {
        asm!(
            "rjmp 3f",
            "2: mov {n6:h}, {n6:l}",
            "mov {n6:l}, {n4:h}",
            "mov {n4:h}, {n4:l}",
            "mov {n4:l}, {n2:h}",
            "mov {n2:h}, {n2:l}",
            "mov {n2:l}, {n0:h}",
            "mov {n0:h}, {n0:l}",
            "clr {n0:l}",
            "3: subi {shift}, 8",
            "brsh 2b",
            "subi {shift}, -8",
            "breq 5f",
            "4: lsl {n0:l}",
            "rol {n0:h}",
            "rol {n2:l}",
            "rol {n2:h}",
            "rol {n4:l}",
            "rol {n4:h}",
            "rol {n6:l}",
            "rol {n6:h}",
            "dec {shift}",
            "brne 4b",
            "5:",
            shift = inout(reg_upper) shift as u8 => _,
            n0 = inout(reg_pair) n0,
            n2 = inout(reg_pair) n2,
            n4 = inout(reg_pair) n4,
            n6 = inout(reg_pair) n6,
            options(pure, nomem, nostack)
        );
    }
    (joined(n6, n4) as u64) << 32 | joined(n2, n0) as u64
}

/// `x` times the fraction whose 32 bits are four times `byte`, over 8: at most 1 too low.
#[inline(never)]
pub(crate) fn times_repeated(x: u32, byte: u8) -> u32 {
    let (mut x2, mut x0) = halves(x);
    // SAFETY: only the registers named change, and r1 is 0 again.
    unsafe {
        // The product with one byte, then the sum of what its four shifts have above 32 bits.
        asm!(
            "clr {zero}",
            "mul {x0:l}, {byte}",
            "mov {p1}, r1",
            "mul {x0:h}, {byte}",
            "add {p1}, r0",
            "adc r1, {zero}",
            "mov {p2:l}, r1",
            "cp {x2:l}, {zero}",
            "cpc {x2:h}, {zero}",
            "brne 2f",
            // Under 2^16 two shifts are enough.
            "mov {x0:h}, {p2:l}",
            "mov {x0:l}, {p1}",
            "add {x0:l}, {p2:l}",
            "adc {x0:h}, {zero}",
            "rjmp 3f",
            "2: clr {p4}",
            "mov {p2:h}, {zero}",
            "mul {x2:l}, {byte}",
            "add {p2:l}, r0",
            "adc {p2:h}, r1",
            "mul {x2:h}, {byte}",
            "add {p2:h}, r0",
            "adc {p4}, r1",
            "mov {x0:l}, {p1}",
            "mov {x0:h}, {p2:l}",
            "mov {x2:l}, {p2:h}",
            "mov {x2:h}, {p4}",
            "add {x0:l}, {p2:l}",
            "adc {x0:h}, {p2:h}",
            "adc {x2:l}, {p4}",
            "adc {x2:h}, {zero}",
            "add {x0:l}, {p2:h}",
            "adc {x0:h}, {p4}",
            "adc {x2:l}, {zero}",
            "adc {x2:h}, {zero}",
            "add {x0:l}, {p4}",
            "adc {x0:h}, {zero}",
            "adc {x2:l}, {zero}",
            "adc {x2:h}, {zero}",
            "lsr {x2:h}",
            "ror {x2:l}",
            "ror {x0:h}",
            "ror {x0:l}",
            "lsr {x2:h}",
            "ror {x2:l}",
            "ror {x0:h}",
            "ror {x0:l}",
            "lsr {x2:h}",
            "ror {x2:l}",
            "ror {x0:h}",
            "ror {x0:l}",
            "rjmp 4f",
            "3: lsr {x0:h}",
            "ror {x0:l}",
            "lsr {x0:h}",
            "ror {x0:l}",
            "lsr {x0:h}",
            "ror {x0:l}",
            "4: clr r1",
            x0 = inout(reg_pair) x0,
            x2 = inout(reg_pair) x2,
            byte = in(reg) byte,
            p1 = out(reg) _,
            p2 = out(reg_pair) _,
            p4 = out(reg) _,
            zero = out(reg) _,
            options(pure, nomem, nostack)
        );
    }
    joined(x2, x0)
}

/// The product of the lower halves.
#[inline(always)]
pub(crate) fn of_lower_halves(a: u32, b: u32) -> u32 {
    let (p0, p2): (u16, u16);
    // SAFETY: only the registers named change, and r1 is 0 again.
    unsafe {
        asm!(
            "clr {zero}",
            "mul {a:l}, {b:l}",
            "movw {p0}, r0",
            "mul {a:h}, {b:h}",
            "movw {p2}, r0",
            "mul {a:l}, {b:h}",
            "add {p0:h}, r0",
            "adc {p2:l}, r1",
            "adc {p2:h}, {zero}",
            "mul {a:h}, {b:l}",
            "add {p0:h}, r0",
            "adc {p2:l}, r1",
            "adc {p2:h}, {zero}",
            "clr r1",
            a = in(reg_pair) a as u16,
            b = in(reg_pair) b as u16,
            p0 = out(reg_pair) p0,
            p2 = out(reg_pair) p2,
            zero = out(reg) _,
            options(pure, nomem, nostack)
        );
    }
    joined(p2, p0)
}
