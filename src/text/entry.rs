//! What a person types on a keypad or sends over a line, back to a quantity: integers only, correctly rounded.

use super::spelling::{self, fitting};
use super::style::{Look, TextStyle};
use crate::math::divide::{divide, rounded};
use crate::math::multiply::{wide, wide_by};
use crate::stored::stored;

/// Which quantity an entry is to give. The numbers are frozen.
///
/// | kind | result | a bare number is in | other units |
/// |---|---|---|---|
/// | `Length` | micrometres | mm | m cm um nm in |
/// | `FocalLength` | micrometres | mm | the same, and f/ times the aperture |
/// | `PixelPitch` | nanometres | um | the same as `Length` |
/// | `Wavelength` | nanometres | nm | the same |
/// | `Angle` | milliarcseconds | degrees | ' " |
/// | `SmallAngle` | microarcseconds | seconds of arc | degrees ' |
/// | `Ratio` | Q16.16 | ones | |
/// | `FocalRatio` | Q16.16 | ones | f/ in front |
/// | `Magnification` | Q16.16 | ones | x |
/// | `Percent` | Q16.16, 1.0 for a hundred | per hundred | % |
/// | `Magnitude` | millimagnitudes, signed | magnitudes | mag |
/// | `Latitude` | binary angle, signed, at most a quarter turn | degrees | ' " and N or S behind |
/// | `Longitude` | binary angle, positive east: under a turn, or at most half a turn with a sign or letter | degrees | ' " and E or W behind |
/// | `Declination` | binary angle, signed, at most a quarter turn | degrees | ' " |
/// | `RightAscension` | binary angle under a turn | hours | h m s, or degrees ' " |
/// | `TimeOfDay` | milliseconds under 86,400,000 | hours | h m s |
/// | `Duration` | milliseconds | seconds | h m s |
/// | `Count` | an integer | ones | px steps |
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
#[repr(u8)]
pub enum EntryKind {
    /// Aperture, eyepiece, field stop, pupil.
    Length = 0,
    /// A length, or a focal ratio where the aperture is known.
    FocalLength = 1,
    /// Pixel pitch, motor step, length at the focus.
    PixelPitch = 2,
    /// Wavelength.
    Wavelength = 3,
    /// Field of view, separation.
    Angle = 4,
    /// Seeing, pixel scale.
    SmallAngle = 5,
    /// A plain ratio: amplification, airmass.
    Ratio = 6,
    /// Focal ratio.
    FocalRatio = 7,
    /// Magnification, and the factor of a Barlow.
    Magnification = 8,
    /// Throughput, reflectance, transmittance.
    Percent = 9,
    /// Brightness on the magnitude scale.
    Magnitude = 10,
    /// Latitude of a place.
    Latitude = 11,
    /// Longitude of a place.
    Longitude = 12,
    /// Declination, altitude.
    Declination = 13,
    /// Right ascension, sidereal time.
    RightAscension = 14,
    /// Time of day.
    TimeOfDay = 15,
    /// Exposure, drift time.
    Duration = 16,
    /// Pixels, steps of a motor, anything counted.
    Count = 17,
}

impl EntryKind {
    /// Every kind, in the order of the numbers.
    pub const ALL: [EntryKind; 18] = [
        EntryKind::Length,
        EntryKind::FocalLength,
        EntryKind::PixelPitch,
        EntryKind::Wavelength,
        EntryKind::Angle,
        EntryKind::SmallAngle,
        EntryKind::Ratio,
        EntryKind::FocalRatio,
        EntryKind::Magnification,
        EntryKind::Percent,
        EntryKind::Magnitude,
        EntryKind::Latitude,
        EntryKind::Longitude,
        EntryKind::Declination,
        EntryKind::RightAscension,
        EntryKind::TimeOfDay,
        EntryKind::Duration,
        EntryKind::Count,
    ];

    /// The kind with this number, if there is one. (A list would be data, and on AVR in RAM.)
    pub const fn from_number(number: u8) -> Option<EntryKind> {
        Some(match number {
            0 => EntryKind::Length,
            1 => EntryKind::FocalLength,
            2 => EntryKind::PixelPitch,
            3 => EntryKind::Wavelength,
            4 => EntryKind::Angle,
            5 => EntryKind::SmallAngle,
            6 => EntryKind::Ratio,
            7 => EntryKind::FocalRatio,
            8 => EntryKind::Magnification,
            9 => EntryKind::Percent,
            10 => EntryKind::Magnitude,
            11 => EntryKind::Latitude,
            12 => EntryKind::Longitude,
            13 => EntryKind::Declination,
            14 => EntryKind::RightAscension,
            15 => EntryKind::TimeOfDay,
            16 => EntryKind::Duration,
            17 => EntryKind::Count,
            _ => return None,
        })
    }
}

/// Why an entry gives no quantity. The numbers are frozen.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
#[non_exhaustive]
#[repr(u8)]
pub enum EntryReason {
    /// It ends where more must come; the position is that of its end.
    Ended = 1,
    /// No entry has this byte here.
    Unexpected = 2,
    /// The quantity is outside its range; the position is that of the last number.
    TooLarge = 3,
    /// Minutes or seconds of 60 or more behind a greater unit; the position is that of the number.
    Sixty = 4,
    /// A focal ratio where the aperture is not known.
    NoAperture = 5,
}

/// An entry that gives no quantity.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub struct EntryError {
    /// Why.
    pub reason: EntryReason,
    /// Where: a byte of the entry, counted from 0.
    pub at: usize,
    /// More characters can make it right, as `1.` or `f/`: the person may still be typing.
    pub partial: bool,
}

impl core::fmt::Display for EntryError {
    fn fmt(&self, f: &mut core::fmt::Formatter<'_>) -> core::fmt::Result {
        let text = match self.reason {
            EntryReason::Ended => "more must come",
            EntryReason::Unexpected => "not expected here",
            EntryReason::TooLarge => "outside the range",
            EntryReason::Sixty => "60 or more",
            EntryReason::NoAperture => "the aperture is not known",
        };
        write!(f, "byte {}: {text}", self.at)
    }
}

impl core::error::Error for EntryError {}

/// Reads an entry as a quantity of a kind, in the integer unit that [`EntryKind`] names; a signed one in two's complement.
///
/// A number has digits, and the decimal mark of the style with digits behind it or none; blanks may stand before, behind
/// and between number and unit. Units are those of the style and `m cm mm um nm in d deg arcmin arcsec h m min s x % mag px steps f/`
/// with ° ′ ″ µ × of UTF-8 and ' and ". Angles and times take several units, each smaller than the one before it, with
/// less than 60 of the later ones and decimals on the last only; the last unit may be left out. Latitude, longitude,
/// declination, right ascension and time of day also take colons, as in 13:10:46. An inch is 25.4 mm. `aperture_um` is
/// for [`EntryKind::FocalLength`], 0 where it is not known.
///
/// Rounding: to nearest, halves away from zero, exact for any count of decimals. Nothing is wrapped but a right ascension,
/// longitude or time that rounds to the full turn: it is 0.
///
/// # Errors
///
/// [`EntryError`] tells reason and place, and whether more characters can make it right.
pub fn read_entry(
    text: &[u8],
    kind: EntryKind,
    aperture_um: u32,
    style: &TextStyle,
) -> Result<u32, EntryError> {
    read_as(text, kind, aperture_um, style)
}

/// + or - in front.
const SIGN: u32 = 1;
/// f/ in front.
const FOCAL: u32 = 2;
/// Several units.
const GROUPS: u32 = 4;
/// Colons between them.
const COLON: u32 = 8;
/// N or S behind.
const NORTH: u32 = 16;
/// E or W behind.
const EAST: u32 = 32;
/// On a circle.
const TURN: u32 = 64;
/// No decimals.
const WHOLE: u32 = 128;

const HOUR: u32 = 54_000;
const DEGREE: u32 = 3_600;
/// Seconds of arc.
const FULL_TURN: u32 = 1_296_000;
const ARC: u32 = GROUPS | COLON;

stored! {
    /// Units that are taken (classes of `spelling`); flags; what a bare number counts, in the least unit of its class;
    /// the result's count of such, as two numbers n / d; the largest result, or the limit in the least unit for a turn.
    static KINDS: [[u32; 6]; 18] = [
        [spelling::LENGTH, 0, 1_000_000, 1, 1000, u32::MAX],
        [spelling::LENGTH, FOCAL, 1_000_000, 1, 1000, u32::MAX],
        [spelling::LENGTH, 0, 1000, 1, 1, u32::MAX],
        [spelling::LENGTH, 0, 1, 1, 1, u32::MAX],
        [spelling::ARC, GROUPS, DEGREE, 1000, 1, u32::MAX],
        [spelling::ARC, GROUPS, 1, 1_000_000, 1, u32::MAX],
        [0, 0, 1, 1 << 16, 1, u32::MAX],
        [0, FOCAL, 1, 1 << 16, 1, u32::MAX],
        [spelling::TIMES, 0, 1, 1 << 16, 1, u32::MAX],
        [spelling::PERCENT, 0, 1, 16_384, 25, u32::MAX],
        [spelling::MAGNITUDE, SIGN, 1, 1000, 1, i32::MAX as u32],
        [spelling::ARC, ARC | SIGN | NORTH, DEGREE, 1 << 25, 10_125, 1 << 30],
        [spelling::ARC, ARC | SIGN | EAST | TURN, DEGREE, 1 << 25, 10_125, FULL_TURN],
        [spelling::ARC, ARC | SIGN, DEGREE, 1 << 25, 10_125, 1 << 30],
        [spelling::ARC | spelling::TIME, ARC | TURN, HOUR, 1 << 25, 10_125, FULL_TURN],
        [spelling::TIME, ARC | TURN, HOUR, 200, 3, FULL_TURN],
        [spelling::TIME, GROUPS, 15, 200, 3, u32::MAX],
        [spelling::COUNT, WHOLE, 1, 1, 1, u32::MAX],
    ];
}

const DAY_MS: u32 = 86_400_000;

fn wrong<T>(reason: EntryReason, at: usize) -> Result<T, EntryError> {
    Err(EntryError { reason, at, partial: false })
}

/// A number as it stands: what came before it in least units, its whole part, and where its decimals are.
struct Number<'a> {
    before: u64,
    whole: u32,
    decimals: &'a [u8],
}

/// The row of a kind.
struct Scale {
    flags: u32,
    count: u32,
    parts: u32,
    limit: u32,
}

impl Scale {
    /// The size of the result, if it is in its range. `halved`: half a turn is the most, either way.
    fn result(&self, number: &Number, unit: u32, halved: bool, negative: bool) -> Option<u32> {
        let units = number.before + wide(number.whole, unit);
        let turn = self.flags & TURN != 0;
        if turn && (units >= self.limit.into() || halved && units > u64::from(FULL_TURN / 2)) {
            return None;
        }
        // Twice the decimals' part, cut: cutting after each digit gives the same as cutting the exact sum once.
        let one = wide(unit, self.count) << 1;
        let mut decimals = 0;
        for &digit in number.decimals.iter().rev() {
            decimals = tenth(wide_by(one, digit.wrapping_sub(b'0').into()).1 + decimals);
        }
        let (upper, twice) = wide_by(units << 1, self.count);
        if upper != 0 || twice >> 63 != 0 {
            return None;
        }
        // `one` is under 2^43.
        let Ok(result) = rounded(twice + decimals, self.parts << 1) else {
            return turn.then_some(0);
        };
        if turn {
            // Only milliseconds have the whole turn under 2^32.
            let full = self.parts == 3 && result >= DAY_MS;
            return (!halved || result <= 1 << 31).then_some(if full { 0 } else { result });
        }
        let most = self.limit + u32::from(negative && self.limit == i32::MAX as u32);
        (result <= most).then_some(result)
    }
}

/// n / 10, cut.
fn tenth(n: u64) -> u64 {
    let (upper, rest) = divide(n >> 32, 10);
    let (lower, _) = divide(u64::from(rest) << 32 | n & 0xffff_ffff, 10);
    u64::from(upper) << 32 | u64::from(lower)
}

/// What is left of an entry, by the place reached.
struct Reader<'a> {
    text: &'a [u8],
    at: usize,
}

impl<'a> Reader<'a> {
    fn next(&self) -> Option<u8> {
        self.text.get(self.at).copied()
    }

    fn rest(&self) -> &'a [u8] {
        self.text.get(self.at..).unwrap_or(&[])
    }

    fn skip_blanks(&mut self) {
        while self.next() == Some(b' ') {
            self.at += 1;
        }
    }

    /// More must come at the end, something else anywhere before it.
    fn expected<T>(&self) -> Result<T, EntryError> {
        if self.at < self.text.len() { wrong(EntryReason::Unexpected, self.at) } else { self.ended() }
    }

    fn ended<T>(&self) -> Result<T, EntryError> {
        Err(EntryError { reason: EntryReason::Ended, at: self.text.len(), partial: true })
    }

    fn number(&mut self, before: u64, mark: Option<u8>) -> Result<Number<'a>, EntryError> {
        let start = self.at;
        let mut whole = 0u32;
        while let Some(digit) = self.digit() {
            let Some(next) = times_ten(whole, digit) else { return wrong(EntryReason::TooLarge, start) };
            whole = next;
        }
        let mut decimals: &[u8] = &[];
        let any = self.at > start;
        if mark.is_some() && self.next() == mark {
            self.at += 1;
            let rest = self.rest();
            let first = self.at;
            while self.digit().is_some() {}
            decimals = rest.get(..self.at - first).unwrap_or(&[]);
            if decimals.is_empty() {
                return self.expected();
            }
        } else if !any {
            return self.expected();
        }
        Ok(Number { before, whole, decimals })
    }

    fn digit(&mut self) -> Option<u8> {
        let digit = self.next()?.wrapping_sub(b'0');
        if digit > 9 {
            return None;
        }
        self.at += 1;
        Some(digit)
    }
}

fn times_ten(number: u32, digit: u8) -> Option<u32> {
    let next = wide(number, 10) + u64::from(digit);
    (next >> 32 == 0).then_some(next as u32)
}

/// The unit that is meant where none stands behind a greater one; 0 where there is none.
fn next_smaller(unit: u32) -> u32 {
    match unit {
        HOUR => 900,
        900 => 15,
        DEGREE => 60,
        60 => 1,
        _ => 0,
    }
}

pub(crate) fn read_as(
    text: &[u8],
    kind: EntryKind,
    aperture_um: u32,
    style: &impl Look,
) -> Result<u32, EntryError> {
    let row = KINDS.entry((kind as usize).min(EntryKind::ALL.len() - 1));
    let mut classes = row.at(0);
    let mut scale = Scale { flags: row.at(1), count: row.at(3), parts: row.at(4), limit: row.at(5) };
    let mut bare = row.at(2);
    let flags = scale.flags;
    let mut reader = Reader { text, at: 0 };
    reader.skip_blanks();

    let mut negative = false;
    let mut halved = false;
    if flags & SIGN != 0 && matches!(reader.next(), Some(b'+' | b'-')) {
        negative = reader.next() == Some(b'-');
        halved = true;
        reader.at += 1;
        reader.skip_blanks();
    }
    if flags & FOCAL != 0 && reader.at < text.len() {
        let found = spelling::before(reader.rest(), style);
        if found.length > 0 {
            if classes != 0 {
                if aperture_um == 0 {
                    return wrong(EntryReason::NoAperture, reader.at);
                }
                (classes, bare, scale.count, scale.parts) = (0, 1, aperture_um, 1);
            }
            reader.at += found.length;
            reader.skip_blanks();
        } else if found.open {
            return reader.ended();
        } else if found.reach > 0 && !matches!(reader.next(), Some(b'0'..=b'9')) {
            return wrong(EntryReason::Unexpected, reader.at + found.reach);
        }
    }

    let mark = (flags & WHOLE == 0).then_some(style.decimal_mark());
    let mut before = 0;
    let mut larger = u32::MAX;
    let (number, unit, start, smaller) = loop {
        let start = reader.at;
        let number = reader.number(before, mark)?;
        if larger != u32::MAX && number.whole >= 60 {
            return wrong(EntryReason::Sixty, start);
        }
        reader.skip_blanks();
        let found = fitting(reader.rest(), classes, larger, style);
        let mut unit = found.unit;
        let colon = flags & COLON != 0 && reader.next() == Some(b':') && next_smaller(bare) != 0;
        if found.length == 0 {
            if found.open && reader.at < text.len() {
                return reader.ended();
            }
            // A byte of a unit that is none; where nothing of one stands, others may follow.
            if found.reach > 0 {
                return wrong(EntryReason::Unexpected, reader.at + found.reach);
            }
            unit = bare;
        } else if found.open && found.length < reader.rest().len() {
            return reader.ended();
        }
        reader.at += found.length;
        let colon = colon && found.length == 0;
        if !number.decimals.is_empty() || flags & GROUPS == 0 || (found.length == 0 && !colon) {
            break (number, unit, start, found.smaller);
        }
        if colon {
            reader.at += 1;
        }
        reader.skip_blanks();
        let more = matches!(reader.next(), Some(b'0'..=b'9')) || mark.is_some() && reader.next() == mark;
        bare = next_smaller(unit);
        if !(colon || more && bare != 0) {
            break (number, unit, start, found.smaller);
        }
        classes = if matches!(unit, HOUR | 900 | 15) { spelling::TIME } else { spelling::ARC };
        before += wide(number.whole, unit);
        larger = unit;
    };

    reader.skip_blanks();
    let letter = reader.next().unwrap_or(0);
    let lettered = flags & NORTH != 0 && matches!(letter, b'N' | b'S')
        || flags & EAST != 0 && matches!(letter, b'E' | b'W');
    if lettered && !halved {
        halved = true;
        negative = matches!(letter, b'S' | b'W');
        reader.at += 1;
        reader.skip_blanks();
    }
    if reader.at < text.len() {
        return wrong(EntryReason::Unexpected, reader.at);
    }

    match scale.result(&number, unit, halved, negative) {
        Some(result) => Ok(if negative { result.wrapping_neg() } else { result }),
        None => {
            // It may become a smaller unit, as 5000 m becomes 5000 mm.
            let partial =
                !lettered && smaller != 0 && { scale.result(&number, smaller, halved, negative).is_some() };
            Err(EntryError { reason: EntryReason::TooLarge, at: start, partial })
        }
    }
}
