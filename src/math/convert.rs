//! Conversions between the fixed units. Integers only: a float needs none.

use super::divide;
use super::multiply::wide;
use crate::status::{Cause, Error};
use crate::units::{Bam, DayMilliseconds, Milli, Milliarcseconds, Q16, SignedBam, SignedMilliarcseconds};

const TURN_MAS: u32 = 1_296_000_000;
const DAY_MS: u32 = 86_400_000;

/// a b / 2^32 to the nearest integer.
#[inline(always)]
fn part_of_turn(a: u32, b: u32) -> u32 {
    ((wide(a, b) + (1 << 31)) >> 32) as u32
}

/// Binary angle of milliarcseconds, whole turns dropped.
///
/// 2^32 a / 1296000000. Source: the definitions of the units.
///
/// | argument | fixed | range |
/// |---|---|---|
/// | angle | mas, either sign | any |
///
/// Result: bam. It always fits.
/// Error: at most 0.5 LSB.
pub fn bam_from_mas_fx(angle: SignedMilliarcseconds) -> Result<Bam, Error> {
    let mut positive = angle.0 as u32;
    if angle.0 < 0 {
        positive = positive.wrapping_add(2 * TURN_MAS); // the sign's 2^32 goes out by wrapping
    }
    while positive >= TURN_MAS {
        positive -= TURN_MAS; // at most three times
    }
    // 1296000000 = 1265625 times 2^10.
    divide::rounded((positive as u64) << 22, TURN_MAS >> 10).map(Bam)
}

/// Milliarcseconds of a binary angle.
///
/// 1296000000 b / 2^32. Source: the definitions of the units.
///
/// | argument | fixed | range |
/// |---|---|---|
/// | angle | bam | any |
///
/// Result: mas, under 1296000000: what rounds to a whole turn is 0.
/// Error: at most 0.5 LSB, on the circle.
pub fn mas_from_bam_fx(angle: Bam) -> Result<Milliarcseconds, Error> {
    let mas = part_of_turn(angle.0, TURN_MAS);
    Ok(Milliarcseconds(if mas == TURN_MAS { 0 } else { mas }))
}

/// Milliarcseconds of a binary angle either side of zero.
///
/// 1296000000 b / 2^32. Source: the definitions of the units.
///
/// | argument | fixed | range |
/// |---|---|---|
/// | angle | signed bam | any |
///
/// Result: signed mas, from -648000000 to 648000000.
/// Error: at most 0.5 LSB.
pub fn signed_mas_from_bam_fx(angle: SignedBam) -> Result<SignedMilliarcseconds, Error> {
    let magnitude = part_of_turn(angle.0.unsigned_abs(), TURN_MAS) as i32;
    Ok(SignedMilliarcseconds(if angle.0 < 0 { -magnitude } else { magnitude }))
}

/// Binary angle of a time on a circle of 24 hours.
///
/// 2^32 t / 86400000. Source: the definitions of the units.
///
/// | argument | fixed | range |
/// |---|---|---|
/// | time | ms | under 86400000 |
///
/// Result: bam. It always fits.
/// Error: at most 0.5 LSB.
pub fn bam_from_day_ms_fx(time: DayMilliseconds) -> Result<Bam, Error> {
    if time.0 >= DAY_MS {
        return Err(Error::new(Cause::OutOfRange, 1));
    }
    // 86400000 = 84375 times 2^10.
    divide::rounded((time.0 as u64) << 22, DAY_MS >> 10).map(Bam)
}

/// Time on a circle of 24 hours of a binary angle.
///
/// 86400000 b / 2^32. Source: the definitions of the units.
///
/// | argument | fixed | range |
/// |---|---|---|
/// | angle | bam | any |
///
/// Result: ms, under 86400000: what rounds to a whole day is 0.
/// Error: at most 0.5 LSB, on the circle.
pub fn day_ms_from_bam_fx(angle: Bam) -> Result<DayMilliseconds, Error> {
    let ms = part_of_turn(angle.0, DAY_MS);
    Ok(DayMilliseconds(if ms == DAY_MS { 0 } else { ms }))
}

/// Thousandths of a Q16.16 number.
///
/// 1000 x. Source: the definitions of the units.
///
/// | argument | fixed | range |
/// |---|---|---|
/// | number | Q16.16 | any |
///
/// Result: thousandths. It always fits.
/// Error: at most 0.5 LSB.
pub fn milli_from_q16_fx(number: Q16) -> Result<Milli, Error> {
    Ok(Milli(((wide(number.0, 1000) + (1 << 15)) >> 16) as u32))
}

/// Q16.16 number of thousandths.
///
/// m / 1000. Source: the definitions of the units.
///
/// | argument | fixed | range |
/// |---|---|---|
/// | number | thousandths | any |
///
/// Result: Q16.16. Overflow: 65536 or more.
/// Error: at most 0.5 LSB.
pub fn q16_from_milli_fx(number: Milli) -> Result<Q16, Error> {
    divide::rounded((number.0 as u64) << 13, 125).map(Q16)
}
