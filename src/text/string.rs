//! Text as a `heapless::String`.

use crate::status::{Cause, Error};
use heapless::{String, Vec};

/// What `write` writes into a buffer of `N` bytes, as a string.
///
/// ```
/// use fieldstop::text::{TextStyle, Value, string};
/// use fieldstop::units::Micrometres;
///
/// let pupil = Value::millimetres(Micrometres(5_012), 1);
/// let text = string::<12>(|out| pupil.write(&TextStyle::UTF8, 8, out))?;
/// assert_eq!(text, "  5.0 mm");
/// # Ok::<(), fieldstop::Error>(())
/// ```
///
/// # Errors
///
/// Those of `write`, and [`Cause::OutOfRange`] where it wrote what is not UTF-8: a style of the HD44780 does.
pub fn string<const N: usize>(
    write: impl FnOnce(&mut [u8]) -> Result<usize, Error>,
) -> Result<String<N>, Error> {
    let mut text = Vec::from_array([0; N]);
    let length = write(&mut text)?;
    text.truncate(length);
    String::from_utf8(text).map_err(|_| Error::new(Cause::OutOfRange, 0))
}
