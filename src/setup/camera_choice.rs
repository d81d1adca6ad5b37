use super::ranking::Ranking;
use super::{Camera, CameraReadout, NO_AMPLIFIER, Observer, Telescope, check_amplifiers, with_each};
use crate::math::multiply::{high, wide};
use crate::optics::field::tiles_fx;
use crate::status::{Cause, Error};
use crate::units::{Milliarcseconds, Q16};
use core::cmp::Ordering;

/// What a camera is to take.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct CameraTarget {
    /// Member 1. The target's extent along the frame's columns, its width, milliarcseconds; not 0.
    pub width_mas: u32,
    /// Member 2. Its extent along the frame's height, milliarcseconds; not 0.
    pub height_mas: u32,
    /// Member 3. Share of a frame that the next one takes again where it needs more than one, unsigned Q16.16,
    /// under 65536; 0: none. 0.1 to 0.2 is common practice.
    pub overlap_q16: u32,
}

impl CameraTarget {
    /// The first bad member: its number is the error's argument.
    ///
    /// # Errors
    ///
    /// [`Cause::Zero`]: width (1), height (2). [`Cause::OutOfRange`]: an overlap (3) not under 65536.
    pub const fn check(&self) -> Result<(), Error> {
        if self.width_mas == 0 {
            return Err(Error::new(Cause::Zero, 1));
        }
        if self.height_mas == 0 {
            return Err(Error::new(Cause::Zero, 2));
        }
        if self.overlap_q16 >= Q16::ONE.0 {
            return Err(Error::new(Cause::OutOfRange, 3));
        }
        Ok(())
    }
}

/// A camera, alone or with a Barlow or reducer, and what it takes to get the whole target. Members from
/// `frame_width_mas` to `tiles_high` are 0 where their bit in `available` is clear.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct CameraChoice {
    /// Bits of the members that could be known.
    pub available: u32,
    /// Why it stands where it stands; named constants.
    pub facts: u32,
    /// Sky across the frame's columns, milliarcseconds.
    pub frame_width_mas: u32,
    /// Sky across the frame's rows, milliarcseconds.
    pub frame_height_mas: u32,
    /// Sky to one pixel as read out, microarcseconds.
    pub pixel_scale_uas: u32,
    /// Pixels as read out across a star's image.
    pub pixels_per_fwhm_q16: u32,
    /// Frames beside each other that the target's width takes.
    pub tiles_wide: u32,
    /// Frames above each other that its height takes.
    pub tiles_high: u32,
    /// Place of the camera in the list, counted from 0.
    pub camera: u8,
    /// Place of the Barlow or reducer in the list, counted from 0; 255: none.
    pub amplifier: u8,
    /// 0.
    pub padding: [u8; 2],
}

/// Bits of `available`, and those of `facts`. Frozen; in C with FIELDSTOP_CAMERA_CHOICE_ before the name.
///
/// cbindgen:ignore
impl CameraChoice {
    /// `frame_width_mas`
    pub const FRAME_WIDTH: u32 = 0x0001;
    /// `frame_height_mas`
    pub const FRAME_HEIGHT: u32 = 0x0002;
    /// `pixel_scale_uas`
    pub const PIXEL_SCALE: u32 = 0x0004;
    /// `pixels_per_fwhm_q16`
    pub const PIXELS_PER_FWHM: u32 = 0x0008;
    /// `tiles_wide` and `tiles_high`
    pub const TILES: u32 = 0x0010;

    /// Under two pixels to the star image.
    pub const FACT_COARSE_SAMPLING: u32 = CameraReadout::FACT_COARSE_SAMPLING;
    /// Over three pixels to the star image.
    pub const FACT_FINE_SAMPLING: u32 = CameraReadout::FACT_FINE_SAMPLING;
    /// One frame takes the whole target.
    pub const FACT_FITS: u32 = 0x0004;

    /// `amplifier` where there is none.
    pub const NO_AMPLIFIER: u8 = NO_AMPLIFIER;
}

/// A telescope, with the cameras, and the Barlows and reducers, that can be put in.
#[derive(Clone, Copy, Debug)]
pub struct CameraOutfit<'a> {
    /// Its own amplification is not used.
    pub telescope: &'a Telescope,
    /// 1 to 8.
    pub cameras: &'a [Camera],
    /// What each Barlow (over 1) or reducer (under 1) multiplies the focal length by, none 0; up to 8.
    pub amplifiers: &'a [Q16],
}

const MOST_CAMERAS: usize = 8;

impl CameraOutfit<'_> {
    /// The first bad argument of a call that chooses.
    ///
    /// # Errors
    ///
    /// Those of [`choose`](Self::choose), but for the room.
    pub fn check(&self, observer: &Observer, target: &CameraTarget) -> Result<(), Error> {
        let at = |position| move |error: Error| Error::new(error.cause(), position);
        self.telescope.check().map_err(at(1))?;
        if self.cameras.is_empty() {
            return Err(Error::new(Cause::Zero, 3));
        }
        if self.cameras.len() > MOST_CAMERAS {
            return Err(Error::new(Cause::OutOfRange, 3));
        }
        for camera in self.cameras {
            camera.check().map_err(at(2))?;
        }
        check_amplifiers(self.amplifiers)?;
        observer.check().map_err(at(6))?;
        target.check().map_err(at(7))?;
        Ok(())
    }

    /// Fills `choices` with the best combinations, the best first, and tells how many they are: each camera
    /// alone, and with each Barlow or reducer.
    ///
    /// Frames overlap by the share of a frame that the target says, rounded down to a milliarcsecond
    /// ([`tiles_fx`]).
    ///
    /// The order, from the first that differs:
    /// 1. The fewer frames, width times height; last, where they are not known.
    /// 2. Neither coarse nor fine sampling before either, which is not judged where the seeing is not known.
    /// 3. The finer pixel scale.
    /// 4. Without a Barlow or reducer before with one; then the place of that in its list; then the place of
    ///    the camera.
    ///
    /// Values are those of [`CameraReadout`].
    ///
    /// # Errors
    ///
    /// As the check of the first bad struct gives it: telescope (1), cameras (2), observer (6), target (7).
    /// [`Cause::Zero`]: no cameras (3), an amplifier (4), no room for a choice (9). [`Cause::OutOfRange`]:
    /// over 8 cameras (3), over 8 amplifiers (5). `choices` is then as it was.
    pub fn choose(
        &self,
        observer: &Observer,
        target: &CameraTarget,
        choices: &mut [CameraChoice],
    ) -> Result<usize, Error> {
        self.check(observer, target)?;
        if choices.is_empty() {
            return Err(Error::new(Cause::Zero, 9));
        }

        let mut ranking = Ranking::new(choices);
        for (amplifier, telescope) in with_each(self.telescope, self.amplifiers) {
            for (place, camera) in self.cameras.iter().enumerate() {
                let choice = choice(&telescope, camera, observer, target)?;
                ranking.offer(CameraChoice { camera: place as u8, amplifier, ..choice }, order);
            }
        }
        Ok(ranking.finish(order))
    }
}

fn choice(
    telescope: &Telescope,
    camera: &Camera,
    observer: &Observer,
    target: &CameraTarget,
) -> Result<CameraChoice, Error> {
    type Choice = CameraChoice;
    let wanted = CameraReadout::FRAME_WIDTH
        | CameraReadout::FRAME_HEIGHT
        | CameraReadout::PIXEL_SCALE
        | CameraReadout::PIXELS_PER_FWHM;
    let readout = CameraReadout::compute(telescope, camera, observer, wanted)?;
    let mut out = Choice {
        facts: readout.facts,
        frame_width_mas: readout.frame_width_mas,
        frame_height_mas: readout.frame_height_mas,
        pixel_scale_uas: readout.pixel_scale_uas,
        pixels_per_fwhm_q16: readout.pixels_per_fwhm_q16,
        ..Choice::default()
    };
    // Not a loop over pairs, which would be a table in RAM on AVR.
    let mut known = |theirs: u32, ours: u32| {
        if readout.available & theirs != 0 {
            out.available |= ours;
        }
    };
    known(CameraReadout::FRAME_WIDTH, Choice::FRAME_WIDTH);
    known(CameraReadout::FRAME_HEIGHT, Choice::FRAME_HEIGHT);
    known(CameraReadout::PIXEL_SCALE, Choice::PIXEL_SCALE);
    known(CameraReadout::PIXELS_PER_FWHM, Choice::PIXELS_PER_FWHM);
    // A frame that is not available is 0, which `tiles` refuses.
    let tiles = |extent: u32, frame: u32| {
        let overlap = high(frame, target.overlap_q16 << 16);
        tiles_fx(Milliarcseconds(extent), Milliarcseconds(frame), Milliarcseconds(overlap))
    };
    if let Ok(wide) = tiles(target.width_mas, out.frame_width_mas)
        && let Ok(high) = tiles(target.height_mas, out.frame_height_mas)
    {
        out.available |= Choice::TILES;
        (out.tiles_wide, out.tiles_high) = (wide, high);
        if wide == 1 && high == 1 {
            out.facts |= Choice::FACT_FITS;
        }
    }
    Ok(out)
}

fn order(a: &CameraChoice, b: &CameraChoice) -> Ordering {
    let frames = |choice: &CameraChoice| match choice.available & CameraChoice::TILES {
        0 => u64::MAX, // more than any product of two
        _ => wide(choice.tiles_wide, choice.tiles_high),
    };
    let key = |choice: &CameraChoice| {
        let sampling = CameraChoice::FACT_COARSE_SAMPLING | CameraChoice::FACT_FINE_SAMPLING;
        // An unknown pixel scale, 0, comes behind every known one.
        (choice.facts & sampling != 0, choice.pixel_scale_uas.wrapping_sub(1))
    };
    let place = |choice: &CameraChoice| (choice.amplifier.wrapping_add(1), choice.camera);
    frames(a).cmp(&frames(b)).then_with(|| key(a).cmp(&key(b))).then_with(|| place(a).cmp(&place(b)))
}
