use super::{Telescope, ratio_q16};
use crate::optics::layout::{
    secondary_diameter_fx, secondary_field_margin_fx, secondary_magnification_fx, secondary_radius_fx,
    secondary_separation_fx,
};
use crate::status::{Cause, Error};
use crate::units::Micrometres;

/// What a telescope of two mirrors with a convex secondary is made of. The telescope's focal length is that of
/// the system; a Barlow or reducer does not count here.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct TwoMirrorLayout {
    /// Member 1. Focal length of the primary mirror, micrometres; not 0. Unless the system's is longer, nothing
    /// is available.
    pub primary_focal_um: u32,
    /// Member 2. The focus behind the primary's vertex, micrometres.
    pub back_focus_um: u32,
    /// Member 3. Diameter at the focus that the whole aperture is to light, micrometres; 0: the centre only.
    pub lit_field_um: u32,
}

impl TwoMirrorLayout {
    /// The first bad member: its number is the error's argument.
    ///
    /// # Errors
    ///
    /// [`Cause::Zero`]: focal length of the primary (1).
    pub const fn check(&self) -> Result<(), Error> {
        if self.primary_focal_um == 0 {
            return Err(Error::new(Cause::Zero, 1));
        }
        Ok(())
    }
}

/// Where the second mirror goes and what it is. Members from `secondary_magnification_q16` on are 0 where their
/// bit in `available` is clear.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct TwoMirrorReadout {
    /// Bits of the members that were wanted and could be known.
    pub available: u32,
    /// What is worth telling beside the values; named constants.
    pub facts: u32,
    /// How much longer the secondary makes the focal length: m = F / f1.
    pub secondary_magnification_q16: u32,
    /// From the primary's vertex to the secondary's, micrometres: f1 - p, p = (f1 + b) / (m + 1).
    pub separation_um: u32,
    /// Diameter of the secondary with the margin for the lit field, micrometres: D p / f1 + i (f1 - p) / F.
    pub secondary_um: u32,
    /// Radius of curvature of the secondary, convex, micrometres: 2 p m / (m - 1).
    pub secondary_radius_um: u32,
    /// That diameter over the aperture.
    pub obstruction_q16: u32,
    /// From the secondary to the focus, micrometres: the separation and the back focus.
    pub length_um: u32,
    /// That length over the focal length: how short the tube is for it.
    pub length_share_q16: u32,
}

/// Bits of `wanted` and `available`, and those of `facts`. Frozen; in C with FIELDSTOP_TWO_MIRROR_ before the
/// name.
///
/// cbindgen:ignore
impl TwoMirrorReadout {
    /// `secondary_magnification_q16`
    pub const SECONDARY_MAGNIFICATION: u32 = 0x0001;
    /// `separation_um`
    pub const SEPARATION: u32 = 0x0002;
    /// `secondary_um`
    pub const SECONDARY: u32 = 0x0004;
    /// `secondary_radius_um`
    pub const SECONDARY_RADIUS: u32 = 0x0008;
    /// `obstruction_q16`
    pub const OBSTRUCTION: u32 = 0x0010;
    /// `length_um`
    pub const LENGTH: u32 = 0x0020;
    /// `length_share_q16`
    pub const LENGTH_SHARE: u32 = 0x0040;
    /// Every member that there is.
    pub const ALL: u32 = 0x007f;

    /// The secondary is wider than the obstruction that the telescope's struct tells. Judged where the
    /// obstruction is wanted (geometry).
    pub const FACT_WIDER_THAN_TOLD: u32 = 0x0001;
}

impl TwoMirrorReadout {
    /// The wanted values, and the facts that they show. Unknown bits in `wanted` are ignored.
    ///
    /// # Errors
    ///
    /// The first struct that fails its check, with that check's cause: telescope (1), layout (2).
    pub fn compute(
        telescope: &Telescope,
        layout: &TwoMirrorLayout,
        wanted: u32,
    ) -> Result<TwoMirrorReadout, Error> {
        telescope.check().map_err(|error| Error::new(error.cause(), 1))?;
        layout.check().map_err(|error| Error::new(error.cause(), 2))?;

        let mut out = TwoMirrorReadout::default();
        let wants = |bits: u32| wanted & bits != 0;
        let aperture = Micrometres(telescope.aperture_um);
        let system = Micrometres(telescope.focal_length_um);
        let primary = Micrometres(layout.primary_focal_um);
        let back_focus = Micrometres(layout.back_focus_um);

        tell!(
            out,
            wanted,
            SECONDARY_MAGNIFICATION,
            secondary_magnification_q16,
            secondary_magnification_fx(primary, system)
        );
        if wants(Self::SEPARATION | Self::LENGTH | Self::LENGTH_SHARE)
            && let Ok(separation) = secondary_separation_fx(primary, system, back_focus)
        {
            tell!(out, wanted, SEPARATION, separation_um, Ok::<_, Error>(separation));
            if let Some(length) = separation.0.checked_add(back_focus.0) {
                tell!(out, wanted, LENGTH, length_um, Ok::<_, Error>(Micrometres(length)));
                tell!(out, wanted, LENGTH_SHARE, length_share_q16, ratio_q16(length.into(), system.0));
            }
        }
        if wants(Self::SECONDARY | Self::OBSTRUCTION)
            && let Ok(on_axis) = secondary_diameter_fx(aperture, primary, system, back_focus)
            && let Ok(margin) =
                secondary_field_margin_fx(primary, system, back_focus, Micrometres(layout.lit_field_um))
            && let Some(secondary) = on_axis.0.checked_add(margin.0)
        {
            tell!(out, wanted, SECONDARY, secondary_um, Ok::<_, Error>(Micrometres(secondary)));
            tell!(out, wanted, OBSTRUCTION, obstruction_q16, ratio_q16(secondary.into(), aperture.0));
            if wants(Self::OBSTRUCTION) && secondary > telescope.obstruction_um {
                out.facts |= Self::FACT_WIDER_THAN_TOLD;
            }
        }
        tell!(
            out,
            wanted,
            SECONDARY_RADIUS,
            secondary_radius_um,
            secondary_radius_fx(primary, system, back_focus)
        );
        Ok(out)
    }
}
