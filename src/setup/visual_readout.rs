/// What the eye gets at the eyepiece. Members from `focal_length_um` on are 0 where their bit in `available` is clear.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct VisualReadout {
    /// Bits of the members that were wanted and could be known.
    pub available: u32,
    /// What is worth telling beside the values; the constants `FACT_…`.
    pub facts: u32,
    /// Focal length with the Barlow or reducer, micrometres: f k.
    pub focal_length_um: u32,
    /// Focal ratio with the Barlow or reducer: N = f k / D.
    pub focal_ratio_q16: u32,
    /// Magnification: M = f k / fe.
    pub magnification_q16: u32,
    /// Exit pupil, micrometres: D fe / (f k).
    pub exit_pupil_um: u32,
    /// Diameter of the sky in view, milliarcseconds: from the field stop where that is known, otherwise from the apparent
    /// field by the eyepiece's mapping.
    pub true_field_mas: u32,
    /// Rayleigh limit with the central obstruction, microarcseconds.
    pub resolution_uas: u32,
    /// Dawes limit, microarcseconds: 116 arcsec mm / D.
    pub dawes_limit_uas: u32,
    /// Magnification at which the exit pupil fills the eye's pupil: D / p. Below it light falls on the iris.
    pub lowest_magnification_q16: u32,
    /// Magnification at which the resolution limit reaches the smallest angle that this eye parts: eye resolution /
    /// resolution. Above it no new detail shows.
    pub resolving_magnification_q16: u32,
    /// Unobstructed, loss-free aperture that gathers as much light, micrometres: D sqrt((1 - (d/D)^2) T).
    pub effective_aperture_um: u32,
    /// Faintest star through the eyepiece, millimagnitudes: m0 + 5 log10(Deff / p).
    pub limiting_magnitude_mmag: i32,
    /// Brightness of an extended object against the bare eye's view of it.
    pub surface_brightness_q16: u32,
}

/// Bits of `wanted` and `available`, and those of `facts`. Frozen; in C `FIELDSTOP_VISUAL_…`.
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

    /// The exit pupil is wider than the eye's pupil, and light falls on the iris.
    pub const FACT_WIDE_EXIT_PUPIL: u32 = 0x0001;
    /// The magnification is over the resolving magnification: larger, not more detailed (empty magnification).
    pub const FACT_EMPTY_MAGNIFICATION: u32 = 0x0002;
    /// The true field comes from the apparent field, since no field stop is known.
    pub const FACT_FIELD_FROM_APPARENT: u32 = 0x0004;
    /// The seeing is wider than the resolution: the air, not the telescope, sets the detail tonight.
    pub const FACT_SEEING_LIMITED: u32 = 0x0008;
}
