use super::{Camera, Observer, Telescope};
use crate::optics::field::{focal_ratio_fx, frame_field_fx, pixel_scale_fx, plate_scale_fx};
use crate::optics::imaging::{diagonal_field_fx, nyquist_pixel_fx, pixels_per_fwhm_fx};
use crate::optics::resolution::cutoff_frequency_fx;
use crate::status::Error;
use crate::units::{Micrometres, Nanometres};

/// What a camera gets at the focus. Members from `focal_length_um` on are 0 where their bit in `available` is
/// clear.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct CameraReadout {
    /// Bits of the members that were wanted and could be known.
    pub available: u32,
    /// What is worth telling beside the values; named constants.
    pub facts: u32,
    /// Focal length with the Barlow or reducer, micrometres: f k.
    pub focal_length_um: u32,
    /// Focal ratio with the Barlow or reducer: N = f k / D.
    pub focal_ratio_q16: u32,
    /// Focal ratio of a loss-free, unobstructed telescope that exposes as long: f k / Deff = N / sqrt((1 -
    /// (d/D)^2) T).
    pub t_number_q16: u32,
    /// Sky across the frame's columns, milliarcseconds: 2 atan(p n / (2 f k)); binning does not change it.
    pub frame_width_mas: u32,
    /// Sky across the frame's rows, milliarcseconds.
    pub frame_height_mas: u32,
    /// Sky to one pixel as read out, with binning, microarcseconds: (1 rad) p b / (f k).
    pub pixel_scale_uas: u32,
    /// Sky to one millimetre at the focus, milliarcseconds per millimetre: (1 rad) / (f k).
    pub plate_scale_mas_per_mm: u32,
    /// Full width at half maximum of a star's image, microarcseconds: seeing and diffraction as the root of
    /// the sum of squares.
    pub star_fwhm_uas: u32,
    /// Pixels as read out across that width.
    pub pixels_per_fwhm_q16: u32,
    /// Finest detail that the optics pass at all, cycles per millimetre at the focus: 1 / (lambda N).
    pub cutoff_frequency_q16: u32,
    /// The coarsest pixel that loses nothing of it in still air, nanometres: lambda f k / (2 D).
    pub nyquist_pixel_nm: u32,
    /// Sky from corner to corner of the frame, milliarcseconds: 2 atan(p sqrt(c^2 + r^2) / (2 f k)).
    pub diagonal_mas: u32,
}

/// Bits of `wanted` and `available`, and those of `facts`. Frozen; in C with FIELDSTOP_CAMERA_ before the
/// name.
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
    /// `cutoff_frequency_q16`
    pub const CUTOFF_FREQUENCY: u32 = 0x0200;
    /// `nyquist_pixel_nm`
    pub const NYQUIST_PIXEL: u32 = 0x0400;
    /// `diagonal_mas`
    pub const DIAGONAL: u32 = 0x0800;
    /// Every member that there is.
    pub const ALL: u32 = 0x0fff;

    /// Under two pixels to the star image: detail that the telescope gives is lost between pixels. Judged
    /// where the pixels across the star image are wanted, like the next. Two to the width is common practice,
    /// after the sampling theorem (Shannon 1949).
    pub const FACT_COARSE_SAMPLING: u32 = 0x0001;
    /// Over three pixels to the star image: more pixels, no more detail, less light in each. Three is common
    /// practice.
    pub const FACT_FINE_SAMPLING: u32 = 0x0002;
}

const FROM_PIXEL_SCALE: u32 = CameraReadout::PIXEL_SCALE | CameraReadout::PIXELS_PER_FWHM;
const FROM_STAR_FWHM: u32 = CameraReadout::STAR_FWHM | CameraReadout::PIXELS_PER_FWHM;
const FROM_FOCAL_LENGTH: u32 = FROM_PIXEL_SCALE
    | CameraReadout::FOCAL_LENGTH
    | CameraReadout::FOCAL_RATIO
    | CameraReadout::T_NUMBER
    | CameraReadout::FRAME_WIDTH
    | CameraReadout::FRAME_HEIGHT
    | CameraReadout::PLATE_SCALE
    | CameraReadout::CUTOFF_FREQUENCY
    | CameraReadout::NYQUIST_PIXEL
    | CameraReadout::DIAGONAL;

/// Two and three pixels, Q16.16.
const COARSE_Q16: u32 = 0x0002_0000;
const FINE_Q16: u32 = 0x0003_0000;

impl CameraReadout {
    /// The wanted values, and the facts that they show. Unknown bits in `wanted` are ignored.
    ///
    /// # Errors
    ///
    /// The first struct that fails its check, with that check's cause: telescope (1), camera (2), observer
    /// (3).
    pub fn compute(
        telescope: &Telescope,
        camera: &Camera,
        observer: &Observer,
        wanted: u32,
    ) -> Result<CameraReadout, Error> {
        telescope.check().map_err(|error| Error::new(error.cause(), 1))?;
        camera.check().map_err(|error| Error::new(error.cause(), 2))?;
        observer.check().map_err(|error| Error::new(error.cause(), 3))?;

        let mut out = CameraReadout::default();
        let wants = |bits: u32| wanted & bits != 0;
        let aperture = Micrometres(telescope.aperture_um);
        let pixel = Nanometres(camera.pixel_nm);
        let mut pixel_scale = None;

        if wants(FROM_FOCAL_LENGTH)
            && let Ok(focal_length) = telescope.amplified_focal_length()
        {
            tell!(out, wanted, FOCAL_LENGTH, focal_length_um, Ok::<_, Error>(focal_length));
            tell!(out, wanted, FOCAL_RATIO, focal_ratio_q16, focal_ratio_fx(focal_length, aperture));
            tell!(
                out,
                wanted,
                T_NUMBER,
                t_number_q16,
                telescope
                    .effective_aperture(aperture)
                    .and_then(|aperture| focal_ratio_fx(focal_length, aperture))
            );
            tell!(
                out,
                wanted,
                FRAME_WIDTH,
                frame_width_mas,
                frame_field_fx(pixel, u32::from(camera.columns), focal_length)
            );
            tell!(
                out,
                wanted,
                FRAME_HEIGHT,
                frame_height_mas,
                frame_field_fx(pixel, u32::from(camera.rows), focal_length)
            );
            tell!(out, wanted, PLATE_SCALE, plate_scale_mas_per_mm, plate_scale_fx(focal_length));
            let wavelength = Nanometres(observer.wavelength_nm);
            tell!(
                out,
                wanted,
                CUTOFF_FREQUENCY,
                cutoff_frequency_q16,
                cutoff_frequency_fx(focal_length, aperture, wavelength)
            );
            tell!(
                out,
                wanted,
                NYQUIST_PIXEL,
                nyquist_pixel_nm,
                nyquist_pixel_fx(focal_length, aperture, wavelength)
            );
            tell!(
                out,
                wanted,
                DIAGONAL,
                diagonal_mas,
                diagonal_field_fx(pixel, camera.columns, camera.rows, focal_length)
            );
            if wants(FROM_PIXEL_SCALE)
                && let Some(binned) = camera.pixel_nm.checked_mul(u32::from(camera.binning))
                && let Ok(scale) = pixel_scale_fx(Nanometres(binned), focal_length)
            {
                tell!(out, wanted, PIXEL_SCALE, pixel_scale_uas, Ok::<_, Error>(scale));
                pixel_scale = Some(scale);
            }
        }

        if wants(FROM_STAR_FWHM)
            && let Ok(fwhm) = observer.star_fwhm(aperture)
        {
            tell!(out, wanted, STAR_FWHM, star_fwhm_uas, Ok::<_, Error>(fwhm));
            if wants(Self::PIXELS_PER_FWHM)
                && let Some(scale) = pixel_scale
                && let Ok(pixels) = pixels_per_fwhm_fx(fwhm, scale)
            {
                out.available |= Self::PIXELS_PER_FWHM;
                out.pixels_per_fwhm_q16 = pixels.0;
                if pixels.0 < COARSE_Q16 {
                    out.facts |= Self::FACT_COARSE_SAMPLING;
                }
                if pixels.0 > FINE_Q16 {
                    out.facts |= Self::FACT_FINE_SAMPLING;
                }
            }
        }
        Ok(out)
    }
}
