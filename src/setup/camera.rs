use crate::status::{Cause, Error};

/// A camera at the focus.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct Camera {
    /// Member 1. Pitch of the single pixels, without binning, nanometres; not 0.
    pub pixel_nm: u32,
    /// Member 2. Single pixels across the frame's width; not 0.
    pub columns: u16,
    /// Member 3. Single pixels across the frame's height; not 0.
    pub rows: u16,
    /// Member 4. Pixels read out as one, along each side; 1 where they are read singly; not 0, not over the
    /// columns or the rows.
    pub binning: u8,
    /// Ignored.
    pub padding: [u8; 3],
}

impl Camera {
    /// The first bad member: its number is the error's argument.
    ///
    /// # Errors
    ///
    /// [`Cause::Zero`]: pixel pitch (1), columns (2), rows (3), binning (4). [`Cause::OutOfRange`]: a binning
    /// (4) over the columns or the rows.
    pub const fn check(&self) -> Result<(), Error> {
        if self.pixel_nm == 0 {
            return Err(Error::new(Cause::Zero, 1));
        }
        if self.columns == 0 {
            return Err(Error::new(Cause::Zero, 2));
        }
        if self.rows == 0 {
            return Err(Error::new(Cause::Zero, 3));
        }
        if self.binning == 0 {
            return Err(Error::new(Cause::Zero, 4));
        }
        let binning = self.binning as u16;
        if binning > self.columns || binning > self.rows {
            return Err(Error::new(Cause::OutOfRange, 4));
        }
        Ok(())
    }
}
