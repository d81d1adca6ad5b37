use crate::status::{Cause, Error};
use crate::units::Q16;

/// A telescope: objective or primary mirror, with the Barlow or reducer that is in use.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct Telescope {
    /// Member 1. Diameter of the entrance pupil, micrometres; not 0.
    pub aperture_um: u32,
    /// Member 2. Focal length without Barlow or reducer, micrometres; not 0.
    pub focal_length_um: u32,
    /// Member 3. Diameter of the central obstruction, micrometres, under the aperture; 0: none.
    pub obstruction_um: u32,
    /// Member 4. What a Barlow (over 1) or reducer (under 1) multiplies the focal length by, unsigned Q16.16; 65536
    /// where there is none; not 0.
    pub amplification_q16: u32,
    /// Member 5. Share of the light that mirrors and glass pass on, without the obstruction's loss, unsigned Q16.16, at
    /// most 65536; 0: unknown.
    pub throughput_q16: u32,
}

impl Telescope {
    /// The first bad member: its number is the error's argument.
    ///
    /// # Errors
    ///
    /// [`Cause::Zero`]: aperture (1), focal length (2), amplification (4). [`Cause::OutOfRange`]: an obstruction (3) not
    /// under the aperture, a throughput (5) over 1.
    pub const fn check(&self) -> Result<(), Error> {
        if self.aperture_um == 0 {
            return Err(Error::new(Cause::Zero, 1));
        }
        if self.focal_length_um == 0 {
            return Err(Error::new(Cause::Zero, 2));
        }
        if self.obstruction_um >= self.aperture_um {
            return Err(Error::new(Cause::OutOfRange, 3));
        }
        if self.amplification_q16 == 0 {
            return Err(Error::new(Cause::Zero, 4));
        }
        if self.throughput_q16 > Q16::ONE.0 {
            return Err(Error::new(Cause::OutOfRange, 5));
        }
        Ok(())
    }
}
