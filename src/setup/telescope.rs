use crate::optics::field::{amplified_focal_length_fx, exit_pupil_fx};
use crate::optics::light::{effective_aperture_fx, surface_brightness_fx};
use crate::status::{Cause, Error};
use crate::units::{Micrometres, Q16};

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
    /// Member 4. What a Barlow (over 1) or reducer (under 1) multiplies the focal length by, unsigned Q16.16;
    /// 65536 where there is none; not 0.
    pub amplification_q16: u32,
    /// Member 5. Share of the light that mirrors and glass pass on, without the obstruction's loss, unsigned
    /// Q16.16, at most 65536; 0: unknown.
    pub throughput_q16: u32,
}

impl Telescope {
    /// The first bad member: its number is the error's argument.
    ///
    /// # Errors
    ///
    /// [`Cause::Zero`]: aperture (1), focal length (2), amplification (4). [`Cause::OutOfRange`]: an
    /// obstruction (3) not under the aperture, a throughput (5) over 1.
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

    /// Focal length with the Barlow or reducer.
    pub(super) fn amplified_focal_length(&self) -> Result<Micrometres, Error> {
        let focal_length = Micrometres(self.focal_length_um);
        match Q16(self.amplification_q16) {
            Q16::ONE => Ok(focal_length),
            amplification => amplified_focal_length_fx(focal_length, amplification),
        }
    }

    /// Effective aperture where the beam that counts is this wide at the objective.
    pub(super) fn effective_aperture(&self, beam: Micrometres) -> Result<Micrometres, Error> {
        effective_aperture_fx(beam, Micrometres(self.obstruction_um), self.known_throughput()?)
    }

    /// Brightness of an extended object: the beam's, less that of the obstruction's shadow in it.
    // Not a call on AVR, where the compiler would give it more arguments than arrive (see `divide::by_64`).
    #[cfg_attr(target_arch = "avr", inline(always))]
    pub(super) fn surface_brightness(
        &self,
        focal_length: Micrometres,
        eyepiece: Micrometres,
        exit_pupil: Micrometres,
        eye: Micrometres,
    ) -> Result<Q16, Error> {
        let throughput = self.known_throughput()?;
        let beam = surface_brightness_fx(exit_pupil, eye, throughput)?;
        let shadow = exit_pupil_fx(Micrometres(self.obstruction_um), focal_length, eyepiece)
            .and_then(|shadow| surface_brightness_fx(shadow, eye, throughput));
        Ok(match shadow {
            Ok(shadow) => Q16(beam.0.saturating_sub(shadow.0)),
            Err(_) => beam, // no obstruction, or its shadow is under a micrometre
        })
    }

    fn known_throughput(&self) -> Result<Q16, Error> {
        match self.throughput_q16 {
            0 => Err(Error::new(Cause::Undefined, 0)),
            throughput => Ok(Q16(throughput)),
        }
    }
}
