use crate::status::{Cause, Error};

/// An eye and the night that it observes in. A camera readout uses the seeing and the wavelength only.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct Observer {
    /// Member 1. Faintest star that the bare eye sees here tonight, millimagnitudes; any value, 0 is magnitude 0.
    pub naked_eye_mmag: i32,
    /// Member 2. Diameter of the eye's pupil in the dark, micrometres; 0: unknown.
    pub eye_pupil_um: u32,
    /// Member 3. Smallest angle that the eye parts, milliarcseconds; 0: unknown. 60,000 is acuity 1.0 on a bright chart
    /// (ISO 8596); 120,000 to 240,000 at the eyepiece is common practice.
    pub eye_resolution_mas: u32,
    /// Member 4. Full width at half maximum of a star in a long exposure, by the air alone, microarcseconds; 0: unknown.
    pub seeing_uas: u32,
    /// Member 5. Wavelength that resolution is stated for, nanometres; not 0. 550 is common practice for the eye.
    pub wavelength_nm: u32,
}

impl Observer {
    /// The first bad member: its number is the error's argument.
    ///
    /// # Errors
    ///
    /// [`Cause::Zero`]: wavelength (5).
    pub const fn check(&self) -> Result<(), Error> {
        if self.wavelength_nm == 0 {
            return Err(Error::new(Cause::Zero, 5));
        }
        Ok(())
    }
}
