use crate::status::{Cause, Error};

/// A place to observe from.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct Site {
    /// Member 1. Latitude, north positive, binary angle; within a quarter turn (2^30) either way.
    pub latitude_bam: i32,
    /// Member 2. Longitude, counted toward the east, binary angle; any value.
    pub longitude_bam: u32,
}

impl Site {
    /// The first bad member: its number is the error's argument.
    ///
    /// # Errors
    ///
    /// [`Cause::OutOfRange`]: a latitude (1) beyond a pole.
    pub const fn check(&self) -> Result<(), Error> {
        if self.latitude_bam.unsigned_abs() > 1 << 30 {
            return Err(Error::new(Cause::OutOfRange, 1));
        }
        Ok(())
    }
}
