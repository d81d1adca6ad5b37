//! The one list of functions. A row says what goes in and out, what is refused, what the exact value is, and what
//! error is owed; everything else in this folder is derived from it.

use super::big::{Big, big};
use fieldstop::{Cause, Error};

/// Where the rows find their subjects.
mod subjects {
    pub use fieldstop::optics::*;
    pub use fieldstop::sky::*;
}

mod colour;
mod field;
mod focus;
mod imaging;
mod layout;
mod light;
mod motion;
mod resolution;
mod sun;
mod units;

/// A unit of the contract: how many of the fixed form's steps make one of the float form's unit.
#[derive(Clone, Copy, PartialEq, Debug)]
pub struct Unit {
    pub steps: f64,
    pub least: i64,
    pub most: i64,
    /// An integer in the float forms too.
    pub count: bool,
    /// A binary angle, in degrees in the float forms.
    pub angle: bool,
}

const fn unit(steps: f64, least: i64, most: i64) -> Unit {
    Unit { steps, least, most, count: false, angle: false }
}

impl Unit {
    /// Steps in the float forms' unit; exact for an angle.
    pub fn value(&self, steps: f64) -> f64 {
        if self.angle { steps * (360.0 / 4294967296.0) } else { steps / self.steps }
    }
    /// What a float argument may be at most where its row gives no range.
    pub fn float_most(&self) -> f64 {
        if self.angle { 360.0 } else { 2f64.powi(32) }
    }
}

const U32: i64 = u32::MAX as i64;
pub const UM: Unit = unit(1000.0, 0, U32);
pub const SIGNED_UM: Unit = unit(1000.0, i32::MIN as i64, i32::MAX as i64);
pub const NM: Unit = unit(1000.0, 0, U32);
/// Nanometres in the float form too: wavelengths and rms wavefront.
pub const NM_AS_NM: Unit = unit(1.0, 0, U32);
pub const MAS: Unit = unit(1000.0, 0, U32);
pub const MAS_PER_MM: Unit = unit(1000.0, 0, U32);
pub const UAS: Unit = unit(1e6, 0, U32);
pub const Q16: Unit = unit(65536.0, 0, U32);
pub const MMAG: Unit = unit(1000.0, i32::MIN as i64, i32::MAX as i64);
pub const UNSIGNED_MMAG: Unit = unit(1000.0, 0, U32);
/// Any one unit, or none.
pub const PLAIN: Unit = unit(1.0, 0, U32);
/// Binary angles: one that wraps, one either side of zero.
pub const BAM: Unit = Unit { angle: true, ..unit(4294967296.0 / 360.0, 0, U32) };
pub const SIGNED_BAM: Unit = Unit { least: i32::MIN as i64, most: i32::MAX as i64, ..BAM };
pub const COUNT: Unit = Unit { count: true, ..PLAIN };
pub const COUNT_16: Unit = Unit { most: u16::MAX as i64, ..COUNT };
pub const COUNT_8: Unit = Unit { most: u8::MAX as i64, ..COUNT };

#[derive(Clone, Copy)]
pub struct Argument {
    /// The name in the fixed form.
    pub name: &'static str,
    pub unit: Unit,
    /// What a usual telescope has, in steps.
    pub usual: (i64, i64),
    pub zero_refused: bool,
    /// The range, in steps, where it is narrower than the type.
    pub range: (i64, i64),
    /// The upper end itself, one step above `range`, is refused in the float forms too.
    pub under: bool,
}

/// An argument that must not be zero.
pub const fn positive(name: &'static str, unit: Unit, usual: (i64, i64)) -> Argument {
    Argument { name, unit, usual, zero_refused: true, range: (unit.least, unit.most), under: false }
}

/// An argument that may be zero.
pub const fn ordinary(name: &'static str, unit: Unit, usual: (i64, i64)) -> Argument {
    Argument { zero_refused: false, ..positive(name, unit, usual) }
}

impl Argument {
    /// Below `limit`.
    pub const fn under(self, limit: i64) -> Argument {
        Argument { range: (self.unit.least, limit - 1), under: true, ..self }
    }
    /// From `least` to `most`.
    pub const fn within(self, least: i64, most: i64) -> Argument {
        Argument { range: (least, most), ..self }
    }
}

pub const APERTURE: Argument = positive("aperture_um", UM, (50_000, 500_000));
pub const FOCAL_LENGTH: Argument = positive("focal_length_um", UM, (200_000, 5_000_000));
pub const WAVELENGTH: Argument = positive("wavelength_nm", NM_AS_NM, (400, 900));
pub const EYEPIECE: Argument = positive("eyepiece_um", UM, (3_000, 55_000));

/// The error owed by the fixed form.
#[derive(Clone, Copy)]
pub struct Owed {
    pub lsb: f64,
    /// Or this part of the result, if that is larger.
    pub part: f64,
}

pub const EXACT: Owed = Owed { lsb: 0.0, part: 0.0 };
/// Class A without and with an irrational constant or a root, class T.
pub const RATIONAL: Owed = Owed { lsb: 0.5, part: 0.0 };
pub const IRRATIONAL: Owed = Owed { lsb: 0.51, part: 0.0 };
pub const TRANSCENDENTAL: Owed = Owed { lsb: 1.0, part: 0.0 };

/// The error owed by a float form.
#[derive(Clone, Copy)]
pub enum FloatOwed {
    /// Units in the last place of the result, or of the largest term if the row names one.
    Ulp(f64),
    /// A part of the result.
    Part(f64),
    /// Absolute, given the arguments in float units.
    Absolute(fn(&[Big]) -> f64),
}

type Fixed = fn(&[i64]) -> Result<i64, Error>;
type Float = fn(&[f64]) -> Result<f64, Error>;
/// The C form: with a null out pointer or one to a place that holds a value; gives the status and what it holds then.
type CFixed = fn(&[i64], Option<i64>) -> (u16, i64);
type CFloat = fn(&[f64], Option<f64>) -> (u16, f64);

#[derive(Clone, Copy)]
pub struct Row {
    pub subject: &'static str,
    pub stem: &'static str,
    pub arguments: &'static [Argument],
    pub result: Unit,
    pub owed: Owed,
    pub single_owed: FloatOwed,
    pub double_owed: FloatOwed,
    /// The exact value in float units of arguments in float units, all of them accepted.
    pub exact: fn(&[Big]) -> Big,
    /// Whether argument `i` (from 0) is out of its range given the others, all in float units.
    pub refuses: fn(usize, &[Big]) -> bool,
    /// What there is no answer to, though each argument is in its range, in float units.
    pub unanswered: fn(&[Big]) -> Option<Error>,
    /// The largest term that the definition adds, where the error is counted in its last place.
    pub largest: Option<fn(&[Big]) -> Big>,
    /// Steps of the result to a whole turn, where it lies on a circle: a result a turn away is the same.
    pub circle: Option<f64>,
    pub fixed: Fixed,
    pub c_fixed: CFixed,
    pub single: Option<FloatForm>,
    pub double: Option<FloatForm>,
}

#[derive(Clone, Copy)]
pub struct FloatForm {
    pub compute: Float,
    pub through_c: CFloat,
}

impl Row {
    /// The arguments of the fixed form in float units, exactly.
    pub fn in_float_units(&self, arguments: &[i64]) -> Vec<Big> {
        let exact = |(a, &x): (&Argument, &i64)| {
            if a.unit.angle { big(a.unit.value(x as f64)) } else { big(x as f64) / big(a.unit.steps) }
        };
        self.arguments.iter().zip(arguments).map(exact).collect()
    }

    pub fn float_form(&self, single: bool) -> Option<FloatForm> {
        if single { self.single } else { self.double }
    }
}

/// a >= b for what [`Row::in_float_units`] gives: its last digits do not count.
fn at_least(a: Big, b: Big) -> bool {
    a > b - big(2f64.powi(-140))
}

pub fn all_rows() -> Vec<Row> {
    [
        units::rows(),
        field::rows(),
        resolution::rows(),
        light::rows(),
        imaging::rows(),
        focus::rows(),
        layout::rows(),
        colour::rows(),
        motion::rows(),
        sun::rows(),
    ]
    .concat()
}

/// Those that FIELDSTOP_ONLY names, for a long run, or all.
pub fn rows() -> Vec<Row> {
    let mut rows = all_rows();
    if let Ok(only) = std::env::var("FIELDSTOP_ONLY") {
        rows.retain(|row| only.split(',').any(|stem| stem == row.stem));
    }
    rows
}

/// Turns the registry's numbers into what the functions take, and back.
pub trait Raw {
    fn raw(self) -> i64;
    fn of(raw: i64) -> Self;
}
pub trait Real {
    fn of(value: f64) -> Self;
    fn value(self) -> f64;
}
macro_rules! numbers {
    ($($t:ty)*) => {$(
        impl Raw for $t {
            fn raw(self) -> i64 { self as i64 }
            fn of(raw: i64) -> Self { raw.try_into().expect("a case within the type") }
        }
        impl Real for $t {
            fn of(value: f64) -> Self { value as $t }
            fn value(self) -> f64 { self as f64 }
        }
    )*};
}
numbers!(u8 u16 u32 i32);
macro_rules! quantities {
    ($($t:ident)*) => {$(
        impl Raw for fieldstop::units::$t {
            fn raw(self) -> i64 { self.0 as i64 }
            fn of(raw: i64) -> Self { Self(raw.try_into().expect("a case within the type")) }
        }
    )*};
}
quantities!(SignedQ16 RefractiveIndex PartsPerMillion);
quantities!(SignedNanometres Millimetres Millikelvin SignedMillikelvin);
quantities!(PartsPerBillionPerKelvin SignedPartsPerBillionPerKelvin);
quantities!(Milliseconds Microseconds Milliwatts);
quantities!(MilliarcsecondsPerSecond MicroarcsecondsPerSecond SignedMicroarcsecondsPerSecond);
quantities!(Micrometres SignedMicrometres Nanometres Milliarcseconds SignedMilliarcseconds Microarcseconds
    MilliarcsecondsPerMillimetre Q16 Milli Millimagnitudes MillimagnitudesPerAirmass Bam SignedBam DayMilliseconds);
impl Real for f32 {
    fn of(value: f64) -> Self {
        value as f32
    }
    fn value(self) -> f64 {
        self as f64
    }
}
impl Real for f64 {
    fn of(value: f64) -> Self {
        value
    }
    fn value(self) -> f64 {
        self
    }
}

/// A row: `row! { subject::stem(ARGUMENT, …) -> UNIT, OWED, exact; forms fx, c_fx, f32, f64; count of arguments }`.
macro_rules! row {
    ($subject:ident :: $stem:ident [$($i:tt $argument:expr),*] -> $result:expr, $owed:expr, $ulp:expr,
     $exact:expr, $fx:ident $c_fx:ident $c_f32:ident $c_f64:ident) => {
        row!(f32 f64, $subject::$stem [$($i $argument),*] -> $result, $owed, $ulp, $exact,
            $fx $c_fx $c_f32 $c_f64)
    };
    // The float forms give a count.
    (count $subject:ident :: $stem:ident [$($i:tt $argument:expr),*] -> $result:expr, $owed:expr, $ulp:expr,
     $exact:expr, $fx:ident $c_fx:ident $c_f32:ident $c_f64:ident) => {
        row!(u32 u32, $subject::$stem [$($i $argument),*] -> $result, $owed, $ulp, $exact,
            $fx $c_fx $c_f32 $c_f64)
    };
    ($single:ident $double:ident, $subject:ident :: $stem:ident [$($i:tt $argument:expr),*] -> $result:expr,
     $owed:expr, $ulp:expr, $exact:expr, $fx:ident $c_fx:ident $c_f32:ident $c_f64:ident) => {
        $crate::registry::Row {
            single: Some($crate::registry::FloatForm {
                compute: |a| {
                    $crate::registry::subjects::$subject::$stem::<f32>($($crate::registry::Real::of(a[$i])),*)
                        .map($crate::registry::Real::value)
                },
                through_c: |a, held| {
                    let mut out = held.unwrap_or(0.0) as $single;
                    let pointer = if held.is_some() { &raw mut out } else { core::ptr::null_mut() };
                    // SAFETY: null or a live local.
                    let status = unsafe { fieldstop::capi::$subject::$c_f32($($crate::registry::Real::of(a[$i]),)* pointer) };
                    (status, $crate::registry::Real::value(out))
                },
            }),
            ..row!(double $double ($crate::registry::subjects::$subject::$stem::<f64>) $subject::$stem
                [$($i $argument),*] -> $result, $owed, $ulp, $exact, $fx $c_fx $c_f64)
        }
    };
    // Without an f32 form; the f64 one is a plain function.
    (f64 only $subject:ident :: $stem:ident [$($i:tt $argument:expr),*] -> $result:expr, $owed:expr, $ulp:expr,
     $exact:expr, $fx:ident $c_fx:ident $c_f64:ident) => {
        row!(double f64 ($crate::registry::subjects::$subject::$stem) $subject::$stem
            [$($i $argument),*] -> $result, $owed, $ulp, $exact, $fx $c_fx $c_f64)
    };
    (double $double:ident ($($function:tt)*) $subject:ident :: $stem:ident [$($i:tt $argument:expr),*] -> $result:expr,
     $owed:expr, $ulp:expr, $exact:expr, $fx:ident $c_fx:ident $c_f64:ident) => {
        $crate::registry::Row {
            double: Some($crate::registry::FloatForm {
                compute: |a| {
                    $($function)*($($crate::registry::Real::of(a[$i])),*).map($crate::registry::Real::value)
                },
                through_c: |a, held| {
                    let mut out = held.unwrap_or(0.0) as $double;
                    let pointer = if held.is_some() { &raw mut out } else { core::ptr::null_mut() };
                    // SAFETY: null or a live local.
                    let status = unsafe { fieldstop::capi::$subject::$c_f64($($crate::registry::Real::of(a[$i]),)* pointer) };
                    (status, $crate::registry::Real::value(out))
                },
            }),
            ..row!(fixed only $subject::$stem [$($i $argument),*] -> $result, $owed, $ulp, $exact, $fx $c_fx)
        }
    };
    (fixed only $subject:ident :: $stem:ident [$($i:tt $argument:expr),*] -> $result:expr, $owed:expr, $ulp:expr,
     $exact:expr, $fx:ident $c_fx:ident) => {
        row!(fixed only ($crate::registry::subjects::$subject) $subject::$stem [$($i $argument),*] -> $result, $owed, $ulp,
            $exact, $fx $c_fx)
    };
    (fixed only ($($module:tt)*) $subject:ident :: $stem:ident [$($i:tt $argument:expr),*] -> $result:expr, $owed:expr,
     $ulp:expr, $exact:expr, $fx:ident $c_fx:ident) => {
        $crate::registry::Row {
            subject: stringify!($subject),
            stem: stringify!($stem),
            arguments: const { &[$($argument),*] },
            result: $result,
            owed: $owed,
            single_owed: $crate::registry::FloatOwed::Ulp($ulp),
            double_owed: $crate::registry::FloatOwed::Ulp($ulp),
            exact: $exact,
            refuses: |_, _| false,
            unanswered: |_| None,
            largest: None,
            circle: None,
            fixed: |a| {
                $($module)*::$fx($($crate::registry::Raw::of(a[$i])),*).map($crate::registry::Raw::raw)
            },
            c_fixed: |a, held| {
                let mut out = $crate::registry::Raw::of(held.unwrap_or(0));
                let pointer = if held.is_some() { &raw mut out } else { core::ptr::null_mut() };
                // SAFETY: null or a live local.
                let status = unsafe { fieldstop::capi::$subject::$c_fx($($crate::registry::Raw::of(a[$i]),)* pointer) };
                (status, $crate::registry::Raw::raw(out))
            },
            single: None,
            double: None,
        }
    };
}
pub(crate) use row;
