use super::{Eyepiece, Observer, Telescope};
use crate::optics::field::{exit_pupil_fx, eyepiece_for_exit_pupil_fx, focal_ratio_fx, magnification_fx};
use crate::optics::light::limiting_magnitude_fx;
use crate::optics::resolution::{dawes_limit_fx, rayleigh_limit_obstructed_fx};
use crate::status::{Cause, Error};
use crate::units::{Micrometres, Millimagnitudes, Nanometres};

/// What the eye gets at the eyepiece. Members from `focal_length_um` on are 0 where their bit in `available`
/// is clear.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct VisualReadout {
    /// Bits of the members that were wanted and could be known.
    pub available: u32,
    /// What is worth telling beside the values; named constants.
    pub facts: u32,
    /// Focal length with the Barlow or reducer, micrometres: f k.
    pub focal_length_um: u32,
    /// Focal ratio with the Barlow or reducer: N = f k / D.
    pub focal_ratio_q16: u32,
    /// Magnification: M = f k / fe.
    pub magnification_q16: u32,
    /// Exit pupil, micrometres: D fe / (f k).
    pub exit_pupil_um: u32,
    /// Diameter of the sky in view, milliarcseconds: from the field stop where that is known, otherwise from
    /// the apparent field by the eyepiece's mapping.
    pub true_field_mas: u32,
    /// Rayleigh limit with the central obstruction, microarcseconds.
    pub resolution_uas: u32,
    /// Dawes limit, microarcseconds: 116 arcsec mm / D.
    pub dawes_limit_uas: u32,
    /// Magnification at which the exit pupil fills the eye's pupil: D / p. Below it light falls on the iris.
    pub lowest_magnification_q16: u32,
    /// Magnification at which the resolution limit reaches the smallest angle that this eye parts: eye
    /// resolution / resolution. Above it no new detail shows.
    pub resolving_magnification_q16: u32,
    /// Unobstructed, loss-free aperture that gathers as much light, micrometres: Deff = D sqrt((1 - (d/D)^2)
    /// T).
    pub effective_aperture_um: u32,
    /// Faintest star through the eyepiece, millimagnitudes: m0 + 5 log10(Deff / p). Where the exit pupil is
    /// wider than the eye's, Deff is that of the part of the aperture which the eye takes in, p f k / fe
    /// across instead of D.
    pub limiting_magnitude_mmag: i32,
    /// Brightness of an extended object against the bare eye's view of it: T (min(1, (x/p)^2) - min(1,
    /// (s/p)^2)), x the exit pupil and s the obstruction's shadow within it, d fe / (f k).
    pub surface_brightness_q16: u32,
}

/// Bits of `wanted` and `available`, and those of `facts`. Frozen; in C with FIELDSTOP_VISUAL_ before the
/// name.
///
/// cbindgen:ignore
impl VisualReadout {
    /// `focal_length_um`
    pub const FOCAL_LENGTH: u32 = 0x0001;
    /// `focal_ratio_q16`
    pub const FOCAL_RATIO: u32 = 0x0002;
    /// `magnification_q16`
    pub const MAGNIFICATION: u32 = 0x0004;
    /// `exit_pupil_um`
    pub const EXIT_PUPIL: u32 = 0x0008;
    /// `true_field_mas`
    pub const TRUE_FIELD: u32 = 0x0010;
    /// `resolution_uas`
    pub const RESOLUTION: u32 = 0x0020;
    /// `dawes_limit_uas`
    pub const DAWES_LIMIT: u32 = 0x0040;
    /// `lowest_magnification_q16`
    pub const LOWEST_MAGNIFICATION: u32 = 0x0080;
    /// `resolving_magnification_q16`
    pub const RESOLVING_MAGNIFICATION: u32 = 0x0100;
    /// `effective_aperture_um`
    pub const EFFECTIVE_APERTURE: u32 = 0x0200;
    /// `limiting_magnitude_mmag`
    pub const LIMITING_MAGNITUDE: u32 = 0x0400;
    /// `surface_brightness_q16`
    pub const SURFACE_BRIGHTNESS: u32 = 0x0800;
    /// Every member that there is.
    pub const ALL: u32 = 0x0fff;

    /// The exit pupil is wider than the eye's pupil, and light falls on the iris. Judged where the exit
    /// pupil, the limiting magnitude or the surface brightness is wanted. The threshold is geometry: equal
    /// pupils lose nothing.
    pub const FACT_WIDE_EXIT_PUPIL: u32 = 0x0001;
    /// The magnification is over the resolving magnification: larger, not more detailed (empty
    /// magnification). Judged where both are wanted. The threshold is Rayleigh's criterion (1879) against the
    /// observer's own eye; with an eye resolution of 277 arcsec it is the two times per millimetre of
    /// aperture of common practice.
    pub const FACT_EMPTY_MAGNIFICATION: u32 = 0x0002;
    /// The true field comes from the apparent field, since no field stop is known: it is as good as the
    /// mapping.
    pub const FACT_FIELD_FROM_APPARENT: u32 = 0x0004;
    /// The seeing is wider than the resolution: the air, not the telescope, sets the detail tonight. Judged
    /// where the resolution or the resolving magnification is wanted. To compare these two widths is common
    /// practice.
    pub const FACT_SEEING_LIMITED: u32 = 0x0008;
}

const FROM_EXIT_PUPIL: u32 =
    VisualReadout::EXIT_PUPIL | VisualReadout::LIMITING_MAGNITUDE | VisualReadout::SURFACE_BRIGHTNESS;
const FROM_FOCAL_LENGTH: u32 = FROM_EXIT_PUPIL
    | VisualReadout::FOCAL_LENGTH
    | VisualReadout::FOCAL_RATIO
    | VisualReadout::MAGNIFICATION
    | VisualReadout::TRUE_FIELD;
const FROM_RESOLUTION: u32 = VisualReadout::RESOLUTION | VisualReadout::RESOLVING_MAGNIFICATION;
const FROM_EFFECTIVE_APERTURE: u32 = VisualReadout::EFFECTIVE_APERTURE | VisualReadout::LIMITING_MAGNITUDE;

impl VisualReadout {
    /// The wanted values, and the facts that they show. Unknown bits in `wanted` are ignored.
    ///
    /// # Errors
    ///
    /// The first struct that fails its check, with that check's cause: telescope (1), eyepiece (2), observer
    /// (3).
    pub fn compute(
        telescope: &Telescope,
        eyepiece: &Eyepiece,
        observer: &Observer,
        wanted: u32,
    ) -> Result<VisualReadout, Error> {
        telescope.check().map_err(|error| Error::new(error.cause(), 1))?;
        eyepiece.check().map_err(|error| Error::new(error.cause(), 2))?;
        observer.check().map_err(|error| Error::new(error.cause(), 3))?;

        let mut out = VisualReadout::default();
        let wants = |bits: u32| wanted & bits != 0;
        let aperture = Micrometres(telescope.aperture_um);
        let eyepiece_length = Micrometres(eyepiece.focal_length_um);
        let eye = Micrometres(observer.eye_pupil_um);

        let mut effective_aperture = Err(Error::new(Cause::Undefined, 0));
        if wants(FROM_EFFECTIVE_APERTURE) {
            effective_aperture = telescope.effective_aperture(aperture);
            tell!(out, wanted, EFFECTIVE_APERTURE, effective_aperture_um, effective_aperture);
        }

        if wants(FROM_FOCAL_LENGTH)
            && let Ok(focal_length) = telescope.amplified_focal_length()
        {
            tell!(out, wanted, FOCAL_LENGTH, focal_length_um, Ok::<_, Error>(focal_length));
            tell!(out, wanted, FOCAL_RATIO, focal_ratio_q16, focal_ratio_fx(focal_length, aperture));
            tell!(
                out,
                wanted,
                MAGNIFICATION,
                magnification_q16,
                magnification_fx(focal_length, eyepiece_length)
            );
            tell!(out, wanted, TRUE_FIELD, true_field_mas, eyepiece.true_field(focal_length));
            if out.available & Self::TRUE_FIELD != 0 && eyepiece.field_stop_um == 0 {
                out.facts |= Self::FACT_FIELD_FROM_APPARENT;
            }

            if wants(FROM_EXIT_PUPIL)
                && let Ok(exit_pupil) = exit_pupil_fx(aperture, focal_length, eyepiece_length)
            {
                tell!(out, wanted, EXIT_PUPIL, exit_pupil_um, Ok::<_, Error>(exit_pupil));
                if exit_pupil > eye && eye.0 != 0 {
                    out.facts |= Self::FACT_WIDE_EXIT_PUPIL;
                    if wants(Self::LIMITING_MAGNITUDE) {
                        // What the eye's pupil passes, as wide as it is at the objective: p M.
                        effective_aperture = eyepiece_for_exit_pupil_fx(eye, focal_length, eyepiece_length)
                            .and_then(|beam| telescope.effective_aperture(beam));
                    }
                }
                tell!(
                    out,
                    wanted,
                    LIMITING_MAGNITUDE,
                    limiting_magnitude_mmag,
                    effective_aperture.and_then(|aperture| {
                        limiting_magnitude_fx(Millimagnitudes(observer.naked_eye_mmag), aperture, eye)
                    })
                );
                tell!(
                    out,
                    wanted,
                    SURFACE_BRIGHTNESS,
                    surface_brightness_q16,
                    telescope.surface_brightness(focal_length, eyepiece_length, exit_pupil, eye)
                );
            }
        }

        if wants(FROM_RESOLUTION)
            && let Ok(resolution) = rayleigh_limit_obstructed_fx(
                aperture,
                Micrometres(telescope.obstruction_um),
                Nanometres(observer.wavelength_nm),
            )
        {
            tell!(out, wanted, RESOLUTION, resolution_uas, Ok::<_, Error>(resolution));
            tell!(
                out,
                wanted,
                RESOLVING_MAGNIFICATION,
                resolving_magnification_q16,
                observer.resolving_magnification(resolution)
            );
            if observer.seeing_uas > resolution.0 {
                out.facts |= Self::FACT_SEEING_LIMITED;
            }
        }
        tell!(out, wanted, DAWES_LIMIT, dawes_limit_uas, dawes_limit_fx(aperture));
        tell!(out, wanted, LOWEST_MAGNIFICATION, lowest_magnification_q16, magnification_fx(aperture, eye));

        let both = Self::MAGNIFICATION | Self::RESOLVING_MAGNIFICATION;
        if out.available & both == both && out.magnification_q16 > out.resolving_magnification_q16 {
            out.facts |= Self::FACT_EMPTY_MAGNIFICATION;
        }
        Ok(out)
    }
}
