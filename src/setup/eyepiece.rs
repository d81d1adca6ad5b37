use super::HALF_TURN_MAS;
use crate::optics::field::{true_field_equidistant_fx, true_field_from_stop_fx, true_field_rectilinear_fx};
use crate::status::{Cause, Error};
use crate::units::{Micrometres, Milliarcseconds};

/// An eyepiece. The field stop gives the true field best; without it the apparent field serves.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct Eyepiece {
    /// Member 1. Focal length, micrometres; not 0.
    pub focal_length_um: u32,
    /// Member 2. Diameter of the field stop as the telescope sees it (the effective one where lenses stand
    /// before it), micrometres; 0: unknown.
    pub field_stop_um: u32,
    /// Member 3. Apparent field, milliarcseconds, under 180 degrees (648,000,000); 0: unknown.
    pub apparent_field_mas: u32,
    /// Member 4. How angles at the eye grow with the angle on the sky: 0 equidistant, 1 rectilinear (named
    /// constants). Matters only where the apparent field is used.
    pub mapping: u8,
    /// Ignored.
    pub padding: [u8; 3],
}

impl Eyepiece {
    /// The apparent angle is proportional to the true one (constant angular magnification): true field = A fe
    /// / f. To divide the apparent field by the magnification is common practice where the maker says nothing
    /// else.
    ///
    /// cbindgen:ignore
    pub const EQUIDISTANT: u8 = 0;
    /// The tangents of the half angles are proportional (no distortion): true field = 2 atan(tan(A/2) fe /
    /// f).
    ///
    /// cbindgen:ignore
    pub const RECTILINEAR: u8 = 1;

    /// The first bad member: its number is the error's argument.
    ///
    /// # Errors
    ///
    /// [`Cause::Zero`]: focal length (1). [`Cause::OutOfRange`]: an apparent field (3) of half a turn or
    /// more, a mapping (4) that is not one of the two.
    pub const fn check(&self) -> Result<(), Error> {
        if self.focal_length_um == 0 {
            return Err(Error::new(Cause::Zero, 1));
        }
        if self.apparent_field_mas >= HALF_TURN_MAS {
            return Err(Error::new(Cause::OutOfRange, 3));
        }
        if self.mapping > Eyepiece::RECTILINEAR {
            return Err(Error::new(Cause::OutOfRange, 4));
        }
        Ok(())
    }

    pub(super) fn true_field(&self, focal_length: Micrometres) -> Result<Milliarcseconds, Error> {
        let apparent = Milliarcseconds(self.apparent_field_mas);
        let eyepiece = Micrometres(self.focal_length_um);
        match (self.field_stop_um, self.mapping) {
            (0, Self::RECTILINEAR) => true_field_rectilinear_fx(apparent, focal_length, eyepiece),
            (0, _) => true_field_equidistant_fx(apparent, focal_length, eyepiece),
            (field_stop, _) => true_field_from_stop_fx(Micrometres(field_stop), focal_length),
        }
    }
}
