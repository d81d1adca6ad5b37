use super::ratio_q16;
use crate::math::multiply::wide;
use crate::optics::resolution::{airy_fwhm_fx, combined_fwhm_fx};
use crate::status::{Cause, Error};
use crate::units::{Microarcseconds, Micrometres, Nanometres, Q16};

/// An eye and the night that it observes in. A camera readout uses the seeing and the wavelength only.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct Observer {
    /// Member 1. Faintest star that the bare eye sees here tonight, millimagnitudes; any value, 0 is
    /// magnitude 0.
    pub naked_eye_mmag: i32,
    /// Member 2. Diameter of the eye's pupil in the dark, micrometres; 0: unknown.
    pub eye_pupil_um: u32,
    /// Member 3. Smallest angle that the eye parts, milliarcseconds; 0: unknown. 60,000 is acuity 1.0 on a
    /// bright chart (ISO 8596); 120,000 to 240,000 at the eyepiece is common practice.
    pub eye_resolution_mas: u32,
    /// Member 4. Full width at half maximum of a star in a long exposure, by the air alone, microarcseconds;
    /// 0: unknown.
    pub seeing_uas: u32,
    /// Member 5. Wavelength that resolution is stated for, nanometres; not 0. 550 is common practice for the
    /// eye.
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

    /// Seeing and diffraction combined.
    pub(super) fn star_fwhm(&self, aperture: Micrometres) -> Result<Microarcseconds, Error> {
        if self.seeing_uas == 0 {
            return Err(Error::new(Cause::Undefined, 0));
        }
        let diffraction = airy_fwhm_fx(aperture, Nanometres(self.wavelength_nm))?;
        combined_fwhm_fx(Microarcseconds(self.seeing_uas), diffraction, Microarcseconds(0))
    }

    /// Where the resolution limit, magnified, is as wide as the smallest angle that the eye parts.
    pub(super) fn resolving_magnification(&self, resolution: Microarcseconds) -> Result<Q16, Error> {
        match self.eye_resolution_mas {
            0 => Err(Error::new(Cause::Undefined, 0)),
            eye => ratio_q16(wide(eye, 1000), resolution.0),
        }
    }
}
