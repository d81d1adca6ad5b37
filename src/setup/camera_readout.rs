/// What a camera gets at the focus. Members from `focal_length_um` on are 0 where their bit in `available` is clear.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct CameraReadout {
    /// Bits of the members that were wanted and could be known.
    pub available: u32,
    /// What is worth telling beside the values; the constants `FACT_…`.
    pub facts: u32,
    /// Focal length with the Barlow or reducer, micrometres: f k.
    pub focal_length_um: u32,
    /// Focal ratio with the Barlow or reducer: N = f k / D.
    pub focal_ratio_q16: u32,
    /// Focal ratio of a loss-free, unobstructed telescope that exposes as long: f k / Deff = N / sqrt((1 - (d/D)^2) T).
    pub t_number_q16: u32,
    /// Sky across the frame's columns, milliarcseconds: 2 atan(p n / (2 f k)); binning does not change it.
    pub frame_width_mas: u32,
    /// Sky across the frame's rows, milliarcseconds.
    pub frame_height_mas: u32,
    /// Sky to one pixel as read out, with binning, microarcseconds: (1 rad) p b / (f k).
    pub pixel_scale_uas: u32,
    /// Sky to one millimetre at the focus, milliarcseconds per millimetre: (1 rad) / (f k).
    pub plate_scale_mas_per_mm: u32,
    /// Full width at half maximum of a star's image, microarcseconds: seeing and diffraction as the root of the sum of
    /// squares.
    pub star_fwhm_uas: u32,
    /// Pixels as read out across that width.
    pub pixels_per_fwhm_q16: u32,
}

/// Bits of `wanted` and `available`, and those of `facts`. Frozen; in C `FIELDSTOP_CAMERA_…`.
///
/// cbindgen:ignore
impl CameraReadout {
    /// `focal_length_um`
    pub const FOCAL_LENGTH: u32 = 0x0001;
    /// `focal_ratio_q16`
    pub const FOCAL_RATIO: u32 = 0x0002;
    /// `t_number_q16`
    pub const T_NUMBER: u32 = 0x0004;
    /// `frame_width_mas`
    pub const FRAME_WIDTH: u32 = 0x0008;
    /// `frame_height_mas`
    pub const FRAME_HEIGHT: u32 = 0x0010;
    /// `pixel_scale_uas`
    pub const PIXEL_SCALE: u32 = 0x0020;
    /// `plate_scale_mas_per_mm`
    pub const PLATE_SCALE: u32 = 0x0040;
    /// `star_fwhm_uas`
    pub const STAR_FWHM: u32 = 0x0080;
    /// `pixels_per_fwhm_q16`
    pub const PIXELS_PER_FWHM: u32 = 0x0100;
    /// Every member that there is.
    pub const ALL: u32 = 0x01ff;

    /// Under two pixels to the star image: detail that the telescope gives is lost between pixels.
    pub const FACT_COARSE_SAMPLING: u32 = 0x0001;
    /// Over three pixels to the star image: more pixels, no more detail, less light in each.
    pub const FACT_FINE_SAMPLING: u32 = 0x0002;
}
