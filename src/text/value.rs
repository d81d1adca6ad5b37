//! A quantity together with the form in which it is shown.

use super::digits::{split_sixty, split_ten, ten_to_the, without_sixty, without_tens};
use super::style::{DASH, NO, Unit, YES};
use crate::math::multiply::of_lower_halves;
use crate::units::{Microarcseconds, Micrometres, Milliarcseconds, Millimagnitudes, Nanometres, Q16};

/// How an angle is shown. The numbers are frozen.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(u8)]
pub enum AngleForm {
    /// Picked by the size of the rounded angle: `DecimalSeconds` under one minute, then `MinutesSeconds` in whole
    /// seconds, from one degree on `DegreesMinutes` in whole minutes. The decimals, at most 3, belong to the first of these.
    #[default]
    BySize = 0,
    /// 1.21°, with at most 3 decimals.
    DecimalDegrees = 1,
    /// 1°12', with at most 2 decimals of a minute.
    DegreesMinutes = 2,
    /// 12'34" and, from sixty minutes on, 1°12'34"; at most 2 decimals of a second.
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
    /// All digits that are shown, as one number.
    pub(super) number: u32,
    pub(super) form: Form,
}

/// A positive number under 2^16 with its unit behind, or two: the last two digits, before them a sign.
#[cfg(feature = "capi")]
pub(crate) struct Short {
    pub(crate) number: u32,
    pub(crate) unit: u8,
    pub(crate) decimals: usize,
    pub(crate) two: bool,
}

/// What stands around the digits, in one word, so that a value fits in two registers: from the lowest byte the number
/// of a text of the style, the decimals, the groups of two digits before these (minutes and seconds of arc), the kind.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub(super) struct Form(u32);

// Kinds. 2 and 3: too many decimals, at this position of the constructor's arguments.
const POSITIVE: u32 = 0;
const NEGATIVE: u32 = 1;
/// The text alone.
const WORD: u32 = 4;
/// The text before the digits.
const IN_FRONT: u32 = 5;

impl Form {
    const fn new(text: u8, decimals: u8, groups: u8, kind: u32) -> Form {
        Form(text as u32 | (decimals as u32) << 8 | (groups as u32) << 16 | kind << 24)
    }

    pub(super) const fn text(self) -> u8 {
        self.0 as u8
    }

    pub(super) const fn decimals(self) -> usize {
        (self.0 >> 8) as u8 as usize
    }

    pub(super) const fn groups(self) -> usize {
        (self.0 >> 16) as u8 as usize
    }

    pub(super) const fn is_word(self) -> bool {
        self.0 >> 24 == WORD
    }

    pub(super) const fn is_negative(self) -> bool {
        self.0 >> 24 == NEGATIVE
    }

    pub(super) const fn is_in_front(self) -> bool {
        self.0 >> 24 == IN_FRONT
    }

    /// The position of the argument that was refused.
    pub(super) const fn refused(self) -> Option<u8> {
        match self.0 >> 24 {
            position @ 2..=3 => Some(position as u8),
            _ => None,
        }
    }
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
        Value::number(count, 0, unit)
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

    /// An angle, in a form given or picked by size.
    pub fn angle(angle: Milliarcseconds, form: AngleForm, decimals: u8) -> Value {
        let most = if matches!(form, AngleForm::DegreesMinutes | AngleForm::MinutesSeconds) { 2 } else { 3 };
        if decimals > most {
            return Value::REFUSED_3;
        }
        if form == AngleForm::BySize {
            return Value::angle_by_size(angle, decimals);
        }
        Value::angle_as(angle, form, decimals)
    }

    /// `decimals` at most 3.
    pub(super) fn angle_by_size(angle: Milliarcseconds, decimals: u8) -> Value {
        if angle.0 >= 3_599_500 {
            Value::angle_as(angle, AngleForm::DegreesMinutes, 0)
        } else if angle.0 >= least_shown_as_a_minute(decimals) {
            Value::angle_as(angle, AngleForm::MinutesSeconds, 0)
        } else {
            Value::angle_as(angle, AngleForm::DecimalSeconds, decimals)
        }
    }

    #[inline(never)]
    fn angle_as(angle: Milliarcseconds, form: AngleForm, decimals: u8) -> Value {
        let tens = u32::from(3 - decimals);
        let mut all = angle.0;
        let in_seconds = matches!(form, AngleForm::MinutesSeconds | AngleForm::DecimalSeconds);
        if !in_seconds {
            if form == AngleForm::DecimalDegrees {
                all = split_sixty(all).0;
                if tens == 0 {
                    return Value::number(without_sixty(all), decimals, Unit::DecimalDegree);
                }
            }
            // Rounded down, for tens are taken off behind it.
            all = split_sixty(all).0;
        }
        all = without_tens(all, tens);
        let unit = match form {
            AngleForm::DecimalDegrees => return Value::number(all, decimals, Unit::DecimalDegree),
            AngleForm::DecimalSeconds => return Value::number(all, decimals, Unit::Second),
            AngleForm::MinutesSeconds => Unit::Second,
            _ => Unit::Minute,
        };
        let mut whole = all;
        for _ in 0..decimals {
            whole = split_ten(whole).0;
        }
        let (mut left, mut number) = split_sixty(whole);
        let mut groups = 1;
        if in_seconds && left >= 60 {
            // Degrees too.
            let (degrees, minutes) = split_sixty(left);
            (left, number, groups) = (degrees, number + of_lower_halves(minutes, 100), 2);
        }
        number += of_lower_halves(left, if groups == 1 { 100 } else { 10_000 });
        // At most 1193°02'47.30", ten digits under 2^32.
        if decimals > 0 {
            let power = ten_to_the(decimals);
            number = number * power + (all - whole * power);
        }
        Value { number, form: Form::new(unit as u8, decimals, groups, POSITIVE) }
    }

    /// Any other decimal number: `number` in units of 10^-`places`, shown with at most as many decimals and at most 9.
    #[inline(always)]
    pub fn decimal(number: u32, places: u8, decimals: u8, unit: Unit) -> Value {
        if decimals > places || decimals > 9 {
            return Value::REFUSED_2;
        }
        Value::number(without_tens(number, (places - decimals).into()), decimals, unit)
    }

    /// The same with a sign.
    pub fn signed_decimal(number: i32, places: u8, decimals: u8, unit: Unit) -> Value {
        let mut value = Value::decimal(number.unsigned_abs(), places, decimals, unit);
        if number < 0 && value.number > 0 {
            value.form = Form(value.form.0 | NEGATIVE << 24);
        }
        value
    }

    /// The unit that stands by the number, where it can stand alone: a sexagesimal angle has its signs inside.
    pub const fn unit(self) -> Unit {
        match Unit::from_number(self.form.text()) {
            Some(unit) if self.form.groups() == 0 => unit,
            _ => Unit::None,
        }
    }

    /// The value, if the short way of writing can take it.
    #[cfg(feature = "capi")]
    #[inline(always)]
    pub(crate) fn short(self) -> Option<Short> {
        let (decimals, two) = (self.form.decimals(), self.form.groups() > 0);
        let usual = self.number < 1 << 16 && self.form.0 >> 17 == 0 && !(two && decimals > 0);
        usual.then_some(Short { number: self.number, unit: self.form.text(), decimals, two })
    }

    /// The number alone, for a display that sets the unit elsewhere.
    pub const fn without_unit(self) -> Value {
        match self.unit() {
            Unit::None => self,
            _ => Value { form: Form(self.form.0 & !0xff), ..self },
        }
    }

    pub(crate) const REFUSED_2: Value = Value { number: 0, form: Form::new(0, 0, 0, 2) };
    const REFUSED_3: Value = Value { number: 0, form: Form::new(0, 0, 0, 3) };
    /// Nothing at all.
    pub(super) const BLANK: Value = Value::word(0);

    const fn number(number: u32, decimals: u8, unit: Unit) -> Value {
        let kind = if matches!(unit, Unit::FocalRatio) { IN_FRONT } else { POSITIVE };
        Value { number, form: Form::new(unit as u8, decimals, 0, kind) }
    }

    const fn word(text: u8) -> Value {
        Value { number: 0, form: Form::new(text, 0, 0, WORD) }
    }

    pub(super) fn from_q16(ratio: Q16, shift: u8, decimals: u8, unit: Unit) -> Value {
        if decimals > 4 - shift {
            return Value::REFUSED_2;
        }
        let power = ten_to_the(shift + decimals);
        // Whole and broken part on their own: each product stays under 2^16 * 10^4.
        let number = of_lower_halves(ratio.0 >> 16, power)
            + ((of_lower_halves(ratio.0 & 0xffff, power) + 0x8000) >> 16);
        Value::number(number, decimals, unit)
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
