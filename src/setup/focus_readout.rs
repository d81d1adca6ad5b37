use super::{Focuser, Observer, Telescope};
use crate::optics::field::{focal_ratio_fx, pixel_scale_fx};
use crate::optics::focus::{
    defocus_blur_fx, defocus_wavefront_fx, depth_of_focus_fx, motor_steps_fx, refocus_temperature_fx,
};
use crate::status::Error;
use crate::units::{Microarcseconds, Micrometres, Nanometres, PartsPerBillionPerKelvin, Q16};

/// How exact the focus must be, and what it costs to be off. Members from `focal_ratio_q16` on are 0 where
/// their bit in `available` is clear.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct FocusReadout {
    /// Bits of the members that were wanted and could be known.
    pub available: u32,
    /// What is worth telling beside the values; named constants.
    pub facts: u32,
    /// Focal ratio with the Barlow or reducer: N = f k / D.
    pub focal_ratio_q16: u32,
    /// How far from the best focus, each side, the wavefront is a quarter wave off, nanometres: 2 lambda N^2.
    pub depth_nm: u32,
    /// The same in steps of the motor, to the nearest.
    pub depth_steps: u32,
    /// Change of temperature that moves the focus so far, millikelvin: depth / (length expansion).
    pub temperature_mk: u32,
    /// Width of a star's image at the defocus asked about, by geometry, nanometres: defocus / N.
    pub blur_nm: u32,
    /// The same on the sky, microarcseconds: (1 rad) blur / (f k).
    pub blur_angle_uas: u32,
    /// Error of the wavefront there, peak to valley, nanometres: defocus / (8 N^2).
    pub wavefront_nm: u32,
}

/// Bits of `wanted` and `available`, and those of `facts`. Frozen; in C with FIELDSTOP_FOCUS_ before the name.
///
/// cbindgen:ignore
impl FocusReadout {
    /// `focal_ratio_q16`
    pub const FOCAL_RATIO: u32 = 0x0001;
    /// `depth_nm`
    pub const DEPTH: u32 = 0x0002;
    /// `depth_steps`
    pub const DEPTH_STEPS: u32 = 0x0004;
    /// `temperature_mk`
    pub const TEMPERATURE: u32 = 0x0008;
    /// `blur_nm`
    pub const BLUR: u32 = 0x0010;
    /// `blur_angle_uas`
    pub const BLUR_ANGLE: u32 = 0x0020;
    /// `wavefront_nm`
    pub const WAVEFRONT: u32 = 0x0040;
    /// Every member that there is.
    pub const ALL: u32 = 0x007f;

    /// One step of the motor is over the depth of focus: the best focus may lie between two steps. Judged
    /// where the depth in steps is wanted. The threshold is Rayleigh's quarter wave (1879).
    pub const FACT_COARSE_STEP: u32 = 0x0001;
    /// The defocus asked about is over the depth of focus. Judged where the depth, the blur or the wavefront
    /// is wanted. The threshold is Rayleigh's quarter wave (1879).
    pub const FACT_OUT_OF_FOCUS: u32 = 0x0002;
}

const FROM_DEPTH: u32 = FocusReadout::DEPTH
    | FocusReadout::DEPTH_STEPS
    | FocusReadout::TEMPERATURE
    | FocusReadout::BLUR
    | FocusReadout::BLUR_ANGLE
    | FocusReadout::WAVEFRONT;
const JUDGED_BY_DEFOCUS: u32 = FROM_DEPTH & !(FocusReadout::DEPTH_STEPS | FocusReadout::TEMPERATURE);

impl FocusReadout {
    /// The wanted values, and the facts that they show. Unknown bits in `wanted` are ignored.
    ///
    /// # Errors
    ///
    /// The first struct that fails its check, with that check's cause: telescope (1), observer (3).
    pub fn compute(
        telescope: &Telescope,
        focuser: &Focuser,
        observer: &Observer,
        wanted: u32,
    ) -> Result<FocusReadout, Error> {
        telescope.check().map_err(|error| Error::new(error.cause(), 1))?;
        observer.check().map_err(|error| Error::new(error.cause(), 3))?;

        let mut out = FocusReadout::default();
        let wants = |bits: u32| wanted & bits != 0;
        if let Ok(focal_length) = telescope.amplified_focal_length()
            && let Ok(focal_ratio) = focal_ratio_fx(focal_length, Micrometres(telescope.aperture_um))
        {
            tell!(out, wanted, FOCAL_RATIO, focal_ratio_q16, Ok::<_, Error>(focal_ratio));
            if wants(FROM_DEPTH) {
                out.around_focus(focal_length, focal_ratio, focuser, observer, wanted);
            }
        }
        Ok(out)
    }

    fn around_focus(
        &mut self,
        focal_length: Micrometres,
        focal_ratio: Q16,
        focuser: &Focuser,
        observer: &Observer,
        wanted: u32,
    ) {
        let out = self;
        let wants = |bits: u32| wanted & bits != 0;
        let defocus = Nanometres(focuser.defocus_nm);
        if let Ok(depth) = depth_of_focus_fx(focal_ratio, Nanometres(observer.wavelength_nm)) {
            tell!(out, wanted, DEPTH, depth_nm, Ok::<_, Error>(depth));
            if wants(Self::DEPTH_STEPS)
                && let Ok(steps) = motor_steps_fx(depth, Nanometres(focuser.motor_step_nm))
            {
                out.available |= Self::DEPTH_STEPS;
                out.depth_steps = steps;
                if focuser.motor_step_nm > depth.0 {
                    out.facts |= Self::FACT_COARSE_STEP;
                }
            }
            tell!(
                out,
                wanted,
                TEMPERATURE,
                temperature_mk,
                refocus_temperature_fx(
                    Micrometres(focuser.tube_length_um),
                    PartsPerBillionPerKelvin(focuser.expansion_ppb_per_k),
                    depth
                )
            );
            if wants(JUDGED_BY_DEFOCUS) && defocus > depth {
                out.facts |= Self::FACT_OUT_OF_FOCUS;
            }
        }
        if wants(Self::BLUR | Self::BLUR_ANGLE)
            && let Ok(blur) = defocus_blur_fx(defocus, focal_ratio)
        {
            tell!(out, wanted, BLUR, blur_nm, Ok::<_, Error>(blur));
            let angle = match blur {
                Nanometres(0) => Ok(Microarcseconds(0)),
                blur => pixel_scale_fx(blur, focal_length),
            };
            tell!(out, wanted, BLUR_ANGLE, blur_angle_uas, angle);
        }
        tell!(out, wanted, WAVEFRONT, wavefront_nm, defocus_wavefront_fx(defocus, focal_ratio));
    }
}
