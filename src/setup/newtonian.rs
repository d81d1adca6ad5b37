use super::{Telescope, ratio_q16};
use crate::optics::layout::{
    beam_shift_fx, beam_width_fx, diagonal_minor_axis_fx, diagonal_offset_fx, eyepiece_height_fx,
    illumination_fx,
};
use crate::status::{Cause, Error};
use crate::units::{Micrometres, SignedBam, SignedMicrometres};

/// Where things are in a Newtonian telescope, and how it stands. A Barlow or reducer does not count here.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct NewtonianLayout {
    /// Member 1. From the centre of the diagonal to the focus, micrometres; not over the telescope's focal
    /// length, or what rests on it is not available.
    pub focus_distance_um: u32,
    /// Member 2. Diameter at the focus that the whole aperture is to light, micrometres; 0: the centre only.
    pub lit_field_um: u32,
    /// Member 3. How far from the axis the edge of the field is whose light is asked for, micrometres.
    pub edge_offset_um: u32,
    /// Member 4. Minor axis of the diagonal that is in place, micrometres; 0: as large as it must be.
    pub diagonal_um: u32,
    /// Member 5. The altitude axis above the place where the observer stands, micrometres.
    pub axis_height_um: u32,
    /// Member 6. From the altitude axis to the eyepiece along the tube, micrometres; negative where the
    /// eyepiece is at the lower end.
    pub reach_um: i32,
    /// Member 7. Where the telescope points now, binary angle from 0 to 90 degrees (0x40000000).
    pub altitude_bam: i32,
    /// Member 8. The lowest altitude that it points to, from 0 to 90 degrees.
    pub lowest_altitude_bam: i32,
    /// Member 9. The highest, from 0 to 90 degrees, not under the lowest.
    pub highest_altitude_bam: i32,
    /// Member 10. An eyepiece above this height is told as a fact, micrometres; 0: none is.
    pub height_limit_um: u32,
}

/// 90 degrees.
const ZENITH: i32 = 0x4000_0000;

impl NewtonianLayout {
    /// The first bad member: its number is the error's argument.
    ///
    /// # Errors
    ///
    /// [`Cause::OutOfRange`]: an altitude (7), lowest altitude (8) or highest altitude (9) that is not from 0
    /// to 90 degrees, a highest altitude (9) under the lowest.
    pub const fn check(&self) -> Result<(), Error> {
        if self.altitude_bam < 0 || self.altitude_bam > ZENITH {
            return Err(Error::new(Cause::OutOfRange, 7));
        }
        if self.lowest_altitude_bam < 0 || self.lowest_altitude_bam > ZENITH {
            return Err(Error::new(Cause::OutOfRange, 8));
        }
        if self.highest_altitude_bam < self.lowest_altitude_bam || self.highest_altitude_bam > ZENITH {
            return Err(Error::new(Cause::OutOfRange, 9));
        }
        Ok(())
    }

    fn height_at(&self, altitude_bam: i32) -> Result<Micrometres, Error> {
        let (axis, reach) = (Micrometres(self.axis_height_um), SignedMicrometres(self.reach_um));
        eyepiece_height_fx(axis, reach, SignedBam(altitude_bam))
    }
}

/// A Newtonian's diagonal, the light that it passes, and the height of the eyepiece. Members from
/// `diagonal_um` on are 0 where their bit in `available` is clear.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct NewtonianReadout {
    /// Bits of the members that were wanted and could be known.
    pub available: u32,
    /// What is worth telling beside the values; named constants.
    pub facts: u32,
    /// Minor axis of the smallest diagonal that lights the field wanted, micrometres.
    pub diagonal_um: u32,
    /// How far its centre lies away from the focuser, and as much toward the primary, micrometres.
    pub diagonal_offset_um: u32,
    /// The diagonal in place over the aperture.
    pub obstruction_q16: u32,
    /// Width of the beam at the diagonal, micrometres: D L / f.
    pub beam_um: u32,
    /// How far off the axis the beam to the edge of the field is there, micrometres: y (f - L) / f.
    pub beam_shift_um: u32,
    /// Share of the light on the axis that the diagonal in place passes to the edge of the field.
    pub edge_light_q16: u32,
    /// The eyepiece above the place where the observer stands, now, micrometres.
    pub eyepiece_height_um: u32,
    /// The same at the altitude where it is highest, micrometres.
    pub greatest_height_um: u32,
}

/// Bits of `wanted` and `available`, and those of `facts`. Frozen; in C with FIELDSTOP_NEWTONIAN_ before the
/// name.
///
/// cbindgen:ignore
impl NewtonianReadout {
    /// `diagonal_um`
    pub const DIAGONAL: u32 = 0x0001;
    /// `diagonal_offset_um`
    pub const DIAGONAL_OFFSET: u32 = 0x0002;
    /// `obstruction_q16`
    pub const OBSTRUCTION: u32 = 0x0004;
    /// `beam_um`
    pub const BEAM: u32 = 0x0008;
    /// `beam_shift_um`
    pub const BEAM_SHIFT: u32 = 0x0010;
    /// `edge_light_q16`
    pub const EDGE_LIGHT: u32 = 0x0020;
    /// `eyepiece_height_um`
    pub const EYEPIECE_HEIGHT: u32 = 0x0040;
    /// `greatest_height_um`
    pub const GREATEST_HEIGHT: u32 = 0x0080;
    /// Every member that there is.
    pub const ALL: u32 = 0x00ff;

    /// The diagonal in place is smaller than the field wanted needs. Judged where the diagonal, the
    /// obstruction or the light at the edge is wanted (geometry).
    pub const FACT_SMALL_DIAGONAL: u32 = 0x0001;
    /// The diagonal is wider than the obstruction that the telescope's struct tells. Judged where the
    /// obstruction is wanted (geometry).
    pub const FACT_WIDER_THAN_TOLD: u32 = 0x0002;
    /// The eyepiece now stands above the height that the layout sets. Judged where its height is wanted.
    /// Caution: a stable platform, never the top of a ladder, and clear of the moving mount; the maker's
    /// instructions and local rules come first.
    pub const FACT_HIGH_EYEPIECE: u32 = 0x0004;
    /// Within its altitudes it stands above that height. Judged where the greatest height is wanted. The same
    /// caution.
    pub const FACT_HIGH_REACHED: u32 = 0x0008;
}

const FROM_DIAGONAL: u32 =
    NewtonianReadout::DIAGONAL | NewtonianReadout::OBSTRUCTION | NewtonianReadout::EDGE_LIGHT;

impl NewtonianReadout {
    /// The wanted values, and the facts that they show. Unknown bits in `wanted` are ignored.
    ///
    /// # Errors
    ///
    /// The first struct that fails its check, with that check's cause: telescope (1), layout (2).
    pub fn compute(
        telescope: &Telescope,
        layout: &NewtonianLayout,
        wanted: u32,
    ) -> Result<NewtonianReadout, Error> {
        telescope.check().map_err(|error| Error::new(error.cause(), 1))?;
        layout.check().map_err(|error| Error::new(error.cause(), 2))?;
        let mut out = NewtonianReadout::default();
        out.diagonal(telescope, layout, wanted);
        out.heights(layout, wanted);
        Ok(out)
    }

    fn diagonal(&mut self, telescope: &Telescope, layout: &NewtonianLayout, wanted: u32) {
        let out = self;
        let wants = |bits: u32| wanted & bits != 0;
        let aperture = Micrometres(telescope.aperture_um);
        let focal_length = Micrometres(telescope.focal_length_um);
        let focus_distance = Micrometres(layout.focus_distance_um);
        let lit_field = Micrometres(layout.lit_field_um);

        if wants(FROM_DIAGONAL) {
            let needed = diagonal_minor_axis_fx(aperture, focal_length, focus_distance, lit_field);
            tell!(out, wanted, DIAGONAL, diagonal_um, needed);
            let in_place = match layout.diagonal_um {
                0 => needed,
                diagonal => Ok(Micrometres(diagonal)),
            };
            if let (Ok(needed), Ok(in_place)) = (needed, in_place)
                && in_place < needed
            {
                out.facts |= Self::FACT_SMALL_DIAGONAL;
            }
            if let Ok(in_place) = in_place {
                tell!(out, wanted, OBSTRUCTION, obstruction_q16, ratio_q16(in_place.0.into(), aperture.0));
                if wants(Self::OBSTRUCTION) && in_place.0 > telescope.obstruction_um {
                    out.facts |= Self::FACT_WIDER_THAN_TOLD;
                }
                if wants(Self::EDGE_LIGHT)
                    && let Ok(beam) = beam_width_fx(aperture, focal_length, focus_distance)
                    && let Ok(shift) =
                        beam_shift_fx(Micrometres(layout.edge_offset_um), focal_length, focus_distance)
                {
                    tell!(out, wanted, EDGE_LIGHT, edge_light_q16, illumination_fx(beam, in_place, shift));
                }
            }
        }
        tell!(
            out,
            wanted,
            DIAGONAL_OFFSET,
            diagonal_offset_um,
            diagonal_offset_fx(aperture, focal_length, focus_distance, lit_field)
        );
        tell!(out, wanted, BEAM, beam_um, beam_width_fx(aperture, focal_length, focus_distance));
        tell!(
            out,
            wanted,
            BEAM_SHIFT,
            beam_shift_um,
            beam_shift_fx(Micrometres(layout.edge_offset_um), focal_length, focus_distance)
        );
    }

    fn heights(&mut self, layout: &NewtonianLayout, wanted: u32) {
        let out = self;
        let limit = layout.height_limit_um;
        let is_high = |height: u32| limit != 0 && height > limit;
        if wanted & Self::EYEPIECE_HEIGHT != 0 {
            let height = layout.height_at(layout.altitude_bam);
            tell!(out, wanted, EYEPIECE_HEIGHT, eyepiece_height_um, height);
            if is_high(out.eyepiece_height_um) {
                out.facts |= Self::FACT_HIGH_EYEPIECE;
            }
        }
        if wanted & Self::GREATEST_HEIGHT != 0 {
            // The sine only grows up to the zenith.
            let altitude =
                if layout.reach_um < 0 { layout.lowest_altitude_bam } else { layout.highest_altitude_bam };
            tell!(out, wanted, GREATEST_HEIGHT, greatest_height_um, layout.height_at(altitude));
            if is_high(out.greatest_height_um) {
                out.facts |= Self::FACT_HIGH_REACHED;
            }
        }
    }
}
