//! What can go wrong. The numbers are frozen: they are the `fieldstop_status` of the C interface.

use core::fmt;
use core::num::NonZeroU16;

#[cfg(feature = "capi")]
use crate::stored::stored_text;

macro_rules! causes {
    ($($(#[$doc:meta])* $name:ident = $number:literal, $text:literal;)*) => {
        /// Why a call was refused. New causes may be added; the numbers of these never change.
        #[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
        #[cfg_attr(feature = "defmt", derive(defmt::Format))]
        #[non_exhaustive]
        #[repr(u8)]
        pub enum Cause {
            $(#[doc = concat!("Cause ", $number, ": ", $text, ".")] $(#[$doc])* $name = $number,)*
        }

        impl Cause {
            /// Every cause, in the order of the numbers.
            pub const ALL: &[Cause] = &[$(Cause::$name),*];

            /// One static English sentence.
            pub const fn text(self) -> &'static str {
                match self { $(Cause::$name => $text,)* }
            }

            /// The same sentence with the zero byte that C wants at its end.
            #[cfg(feature = "capi")]
            pub(crate) fn text_for_c(self) -> *const core::ffi::c_char {
                match self { $(Cause::$name => stored_text!(CAUSES, $text),)* }
            }

            /// The cause with this number, if it is one of ours.
            pub const fn from_number(number: u8) -> Option<Cause> {
                match number {
                    $($number => Some(Cause::$name),)*
                    _ => None,
                }
            }
        }
    };
}

causes! {
    /// C only.
    NullPointer = 1, "a pointer is null";
    /// Zero where the definition divides by it, or where the thing must exist for the question to make sense.
    Zero = 2, "zero where the quantity must exist";
    /// Each function gives the range of each argument.
    OutOfRange = 3, "outside the documented range";
    /// A float argument.
    NotFinite = 4, "infinite or not a number";
    /// No number is wrapped or saturated.
    Overflow = 5, "the result does not fit its type";
    /// Nothing is written then.
    NoRoom = 6, "it does not fit its width or buffer";
    /// A question without an answer, at this place or with what is known.
    Undefined = 7, "not defined or not known here";
    /// A star or a place of the sky that never comes to what was asked about.
    NeverReached = 8, "never reached";
    /// A star or a place of the sky that stays in what was asked about, all around the pole.
    NeverLeft = 9, "never left";
    /// Damaged, cut short, or never written.
    NoRecord = 10, "there is no good record";
    /// It is left as it is, unless the call says otherwise.
    NewerRecord = 11, "the record is of a newer version";
    /// What the storage's own functions told.
    Storage = 12, "the storage could not be read or written";
}

/// A refused call: the cause, and which argument is to blame.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub struct Error(NonZeroU16);

impl Error {
    /// `argument` counts from 1; 0 where no single argument is to blame.
    pub const fn new(cause: Cause, argument: u8) -> Error {
        let status = (argument as u16) << 8 | cause as u16;
        match NonZeroU16::new(status) {
            Some(status) => Error(status),
            None => Error(NonZeroU16::MAX), // not reached: causes start at 1
        }
    }

    /// The result does not fit its type.
    pub const OVERFLOW: Error = Error::new(Cause::Overflow, 0);

    /// Why the call was refused.
    pub const fn cause(self) -> Cause {
        match Cause::from_number(self.0.get() as u8) {
            Some(cause) => cause,
            None => Cause::OutOfRange, // not reached: `new` takes a Cause
        }
    }

    /// Position of the offending argument, counted from 1; 0 where no single argument is to blame.
    pub const fn argument(self) -> u8 {
        (self.0.get() >> 8) as u8
    }

    /// The number that C sees: the cause in the low byte, the argument in the high byte.
    pub const fn status(self) -> u16 {
        self.0.get()
    }
}

/// Refuses a zero.
#[inline(always)]
pub(crate) fn present(value: u32, argument: u8) -> Result<(), Error> {
    if value == 0 { Err(Error::new(Cause::Zero, argument)) } else { Ok(()) }
}

/// Refuses what its range leaves out.
#[inline(always)]
pub(crate) fn allowed(condition: bool, argument: u8) -> Result<(), Error> {
    if condition { Ok(()) } else { Err(Error::new(Cause::OutOfRange, argument)) }
}

impl fmt::Display for Error {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        match self.argument() {
            0 => f.write_str(self.cause().text()),
            n => write!(f, "argument {n}: {}", self.cause().text()),
        }
    }
}

impl core::error::Error for Error {}

#[cfg(feature = "defmt")]
impl defmt::Format for Error {
    fn format(&self, f: defmt::Formatter<'_>) {
        defmt::write!(f, "argument {=u8}: {}", self.argument(), self.cause());
    }
}
