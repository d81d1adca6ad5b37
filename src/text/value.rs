//! A quantity together with the form in which it is shown.

use super::digits::scale_down;
use super::style::{DASH, NO, Unit, YES};
use crate::units::{Microarcseconds, Micrometres, Milliarcseconds, Millimagnitudes, Nanometres, Q16};

/// How an angle is shown. The numbers are frozen.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(u8)]
pub enum AngleForm {
    /// Picked by the size of the rounded angle: `DecimalSeconds` under one minute, then `MinutesSeconds` in whole
    /// seconds, from one degree on `DegreesMinutes` in whole minutes. The decimals belong to the first of these.
    #[default]
    BySize = 0,
    /// 1.21°, with at most 3 decimals.
    DecimalDegrees = 1,
    /// 1°12', with at most 3 decimals of a minute.
    DegreesMinutes = 2,
    /// 12'34" and, from sixty minutes on, 1°12'34"; at most 3 decimals of a second.
    MinutesSeconds = 3,
    /// 4354", however large; at most 3 decimals.
    DecimalSeconds = 4,
}

impl AngleForm {
    /// The form with this number, if there is one.
    pub const fn from_number(number: u8) -> Option<AngleForm> {
        Some(match number {
            0 => AngleForm::BySize,
            1 => AngleForm::DecimalDegrees,
            2 => AngleForm::DegreesMinutes,
            3 => AngleForm::MinutesSeconds,
            4 => AngleForm::DecimalSeconds,
            _ => return None,
        })
    }
}

/// A quantity and the form in which it is shown: the unit, and the decimals to which it is rounded.
///
/// Rounding is to nearest, halves away from zero, and exact over the whole range of each quantity. A negative number
/// that rounds to zero has no sign. More decimals than a form allows are refused when the value is written, with the
/// position of `decimals` among the constructor's arguments.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub struct Value {
    /// In steps of the last decimal, rounded.
    pub(super) number: u32,
    pub(super) negative: bool,
    pub(super) decimals: u8,
    /// Of a unit, or of the text that stands for the number.
    pub(super) text: u8,
    pub(super) shape: Shape,
}

/// What the digits in front of the decimals are.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
#[repr(u8)]
pub(super) enum Shape {
    /// One number.
    Plain,
    /// Groups of two digits, counting to sixty.
    Sexagesimal,
    /// None: the text alone.
    Word,
    /// Too many decimals, at this position of the constructor's arguments.
    Refused2,
    Refused3,
}

impl Value {
    /// A value that is not known: shown as the dash of the style.
    pub const NOT_AVAILABLE: Value = Value::word(DASH);

    /// The answer whether a fact holds: shown as the style's word for it.
    pub const fn answer(holds: bool) -> Value {
        Value::word(if holds { YES } else { NO })
    }

    /// An integer.
    pub const fn count(count: u32, unit: Unit) -> Value {
        Value::plain(count, 0, unit, Shape::Plain)
    }

    /// A length in millimetres with 0 to 3 decimals.
    pub fn millimetres(length: Micrometres, decimals: u8) -> Value {
        Value::decimal(length.0, 3, decimals, Unit::Millimetre)
    }

    /// A length in micrometres with 0 to 3 decimals.
    pub fn micrometres(length: Nanometres, decimals: u8) -> Value {
        Value::decimal(length.0, 3, decimals, Unit::Micrometre)
    }

    /// A plain ratio with 0 to 4 decimals.
    pub fn ratio(ratio: Q16, decimals: u8) -> Value {
        Value::from_q16(ratio, 0, decimals, Unit::None)
    }

    /// A magnification, as in 62.5x, with 0 to 4 decimals.
    pub fn magnification(magnification: Q16, decimals: u8) -> Value {
        Value::from_q16(magnification, 0, decimals, Unit::Times)
    }

    /// A focal ratio, as in f/6.0, with 0 to 4 decimals.
    pub fn focal_ratio(focal_ratio: Q16, decimals: u8) -> Value {
        Value::from_q16(focal_ratio, 0, decimals, Unit::FocalRatio)
    }

    /// A ratio in per cent with 0 to 2 decimals.
    pub fn percent(ratio: Q16, decimals: u8) -> Value {
        Value::from_q16(ratio, 2, decimals, Unit::Percent)
    }

    /// An angle in seconds of arc with 0 to 6 decimals.
    pub fn arcseconds(angle: Microarcseconds, decimals: u8) -> Value {
        Value::decimal(angle.0, 6, decimals, Unit::Second)
    }

    /// A magnitude with 0 to 3 decimals.
    pub fn magnitude(magnitude: Millimagnitudes, decimals: u8) -> Value {
        Value::signed_decimal(magnitude.0, 3, decimals, Unit::Magnitude)
    }

    /// An angle with 0 to 3 decimals, in a form given or picked by size.
    pub fn angle(angle: Milliarcseconds, form: AngleForm, decimals: u8) -> Value {
        if decimals > 3 {
            return Value::REFUSED_3;
        }
        let (form, decimals) = match form {
            AngleForm::BySize if angle.0 >= 3_599_500 => (AngleForm::DegreesMinutes, 0),
            AngleForm::BySize if angle.0 >= least_shown_as_a_minute(decimals) => {
                (AngleForm::MinutesSeconds, 0)
            }
            form => (form, decimals),
        };
        let (sixties, unit, shape) = match form {
            AngleForm::DecimalDegrees => (2, Unit::DecimalDegree, Shape::Plain),
            AngleForm::DegreesMinutes => (1, Unit::Minute, Shape::Sexagesimal),
            AngleForm::MinutesSeconds => (0, Unit::Second, Shape::Sexagesimal),
            AngleForm::DecimalSeconds | AngleForm::BySize => (0, Unit::Second, Shape::Plain),
        };
        Value::plain(scale_down(angle.0, 3 - decimals, sixties), decimals, unit, shape)
    }

    /// Any other decimal number: `number` in units of 10^-`places`, shown with at most as many decimals.
    pub fn decimal(number: u32, places: u8, decimals: u8, unit: Unit) -> Value {
        match places.checked_sub(decimals) {
            Some(dropped) => Value::plain(scale_down(number, dropped, 0), decimals, unit, Shape::Plain),
            None => Value::REFUSED_2,
        }
    }

    /// The same with a sign.
    pub fn signed_decimal(number: i32, places: u8, decimals: u8, unit: Unit) -> Value {
        let value = Value::decimal(number.unsigned_abs(), places, decimals, unit);
        Value { negative: number < 0 && value.number > 0, ..value }
    }

    /// The unit that stands by the number, where it can stand alone: a sexagesimal angle has its signs inside.
    pub const fn unit(&self) -> Unit {
        match (&self.shape, Unit::from_number(self.text)) {
            (Shape::Plain, Some(unit)) => unit,
            _ => Unit::None,
        }
    }

    /// The number alone, for a display that sets the unit elsewhere.
    pub const fn without_unit(self) -> Value {
        match self.shape {
            Shape::Plain => Value { text: Unit::None as u8, ..self },
            _ => self,
        }
    }

    pub(crate) const REFUSED_2: Value = Value::plain(0, 0, Unit::None, Shape::Refused2);
    const REFUSED_3: Value = Value::plain(0, 0, Unit::None, Shape::Refused3);

    const fn plain(number: u32, decimals: u8, unit: Unit, shape: Shape) -> Value {
        Value { number, negative: false, decimals, text: unit as u8, shape }
    }

    const fn word(text: u8) -> Value {
        Value { number: 0, negative: false, decimals: 0, text, shape: Shape::Word }
    }

    pub(super) fn from_q16(ratio: Q16, shift: u8, decimals: u8, unit: Unit) -> Value {
        if decimals > 4 - shift {
            return Value::REFUSED_2;
        }
        let mut power = 1; // at most 10^4
        for _ in 0..shift + decimals {
            power *= 10;
        }
        // Whole and broken part on their own: each product stays under 2^16 * 10^4.
        let number = (ratio.0 >> 16) * power + (((ratio.0 & 0xffff) * power + 0x8000) >> 16);
        Value::plain(number, decimals, unit, Shape::Plain)
    }
}

/// The least angle that rounds to sixty seconds with so many decimals, in milliarcseconds.
const fn least_shown_as_a_minute(decimals: u8) -> u32 {
    match decimals {
        0 => 59_500,
        1 => 59_950,
        2 => 59_995,
        _ => 60_000,
    }
}
