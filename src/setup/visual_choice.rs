use super::ranking::Ranking;
use super::{
    Eyepiece, NO_AMPLIFIER, Observer, Telescope, VisualReadout, check_amplifiers, ratio_q16, with_each,
};
use crate::math::divide;
use crate::math::multiply::wide;
use crate::optics::field::{exit_pupil_fx, magnification_fx};
use crate::optics::resolution::rayleigh_limit_obstructed_fx;
use crate::status::{Cause, Error};
use crate::units::{Microarcseconds, Micrometres, Nanometres, Q16};
use core::cmp::Ordering;

/// What an eyepiece is wanted for.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct VisualTarget {
    /// Member 1. To frame: the target's longer side, milliarcseconds; not 0.
    pub size_mas: u32,
    /// Member 2. To frame: the true field over the target's size that is wanted at least, unsigned Q16.16; not
    /// under 65536. 81920, a quarter more than the target, is common practice.
    pub room_q16: u32,
    /// Member 3. To split: the separation of the two stars, microarcseconds; not 0.
    pub separation_uas: u32,
    /// Member 4. For an exit pupil: the one wanted, micrometres; not 0.
    pub exit_pupil_um: u32,
    /// Member 5. What it is: 0 to frame, 1 to split, 2 for an exit pupil (named constants). Members of the
    /// other two are ignored.
    pub purpose: u8,
    /// Ignored.
    pub padding: [u8; 3],
}

impl VisualTarget {
    /// The whole target with room around it, as large as that allows.
    ///
    /// cbindgen:ignore
    pub const FRAME: u8 = 0;
    /// Two stars as far apart to the eye as it needs, magnified no more than that takes.
    ///
    /// cbindgen:ignore
    pub const SPLIT: u8 = 1;
    /// The nearest exit pupil, by the ratio of the two.
    ///
    /// cbindgen:ignore
    pub const EXIT_PUPIL: u8 = 2;

    /// The first bad member: its number is the error's argument.
    ///
    /// # Errors
    ///
    /// [`Cause::Zero`]: size (1), separation (3) or exit pupil (4), each where the purpose needs it.
    /// [`Cause::OutOfRange`]: a room (2) under 65536 where the purpose needs it, a purpose (5) that is none of
    /// the three.
    pub const fn check(&self) -> Result<(), Error> {
        let (needed, member) = match self.purpose {
            VisualTarget::FRAME => (self.size_mas, 1),
            VisualTarget::SPLIT => (self.separation_uas, 3),
            VisualTarget::EXIT_PUPIL => (self.exit_pupil_um, 4),
            _ => return Err(Error::new(Cause::OutOfRange, 5)),
        };
        if needed == 0 {
            return Err(Error::new(Cause::Zero, member));
        }
        if self.purpose == VisualTarget::FRAME && self.room_q16 < Q16::ONE.0 {
            return Err(Error::new(Cause::OutOfRange, 2));
        }
        Ok(())
    }
}

/// An eyepiece, alone or with a Barlow or reducer, and what speaks for and against it. Members from
/// `magnification_q16` to `fit_q16` are 0 where their bit in `available` is clear.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct VisualChoice {
    /// Bits of the members that could be known.
    pub available: u32,
    /// Why it stands where it stands; named constants.
    pub facts: u32,
    /// Magnification: M = f k / fe.
    pub magnification_q16: u32,
    /// Exit pupil, micrometres: D fe / (f k).
    pub exit_pupil_um: u32,
    /// Diameter of the sky in view, milliarcseconds.
    pub true_field_mas: u32,
    /// What it gives over what is wanted. To frame: true field / size. To split: separation times
    /// magnification / eye resolution. For an exit pupil: exit pupil / the one wanted.
    pub fit_q16: u32,
    /// Place of the eyepiece in the list, counted from 0.
    pub eyepiece: u8,
    /// Place of the Barlow or reducer in the list, counted from 0; 255: none.
    pub amplifier: u8,
    /// 0: it serves, and nothing speaks against it; 1: it serves, but its exit pupil is wide, its magnification
    /// empty or the seeing shows; 2: it does not serve; 3: not known. For an exit pupil never 1.
    pub standing: u8,
    /// 0.
    pub padding: u8,
}

/// Bits of `available`, and those of `facts`. Frozen; in C with FIELDSTOP_VISUAL_CHOICE_ before the name.
///
/// cbindgen:ignore
impl VisualChoice {
    /// `magnification_q16`
    pub const MAGNIFICATION: u32 = 0x0001;
    /// `exit_pupil_um`
    pub const EXIT_PUPIL: u32 = 0x0002;
    /// `true_field_mas`
    pub const TRUE_FIELD: u32 = 0x0004;
    /// `fit_q16`
    pub const FIT: u32 = 0x0008;

    /// The exit pupil is wider than the eye's pupil.
    pub const FACT_WIDE_EXIT_PUPIL: u32 = VisualReadout::FACT_WIDE_EXIT_PUPIL;
    /// The magnification is over that at which the resolution reaches the smallest angle that this eye parts.
    pub const FACT_EMPTY_MAGNIFICATION: u32 = VisualReadout::FACT_EMPTY_MAGNIFICATION;
    /// The true field comes from the apparent field.
    pub const FACT_FIELD_FROM_APPARENT: u32 = VisualReadout::FACT_FIELD_FROM_APPARENT;
    /// The magnification is over that at which the seeing reaches the smallest angle that this eye parts: the
    /// air's blur shows. To compare these two is common practice.
    pub const FACT_SEEING_SHOWS: u32 = 0x0008;
    /// What is wanted is reached: the field has the room, or the magnification parts the stars. Set for each
    /// where an exit pupil is wanted and its own is known.
    pub const FACT_SERVES: u32 = 0x0010;
    /// The separation is under the telescope's Rayleigh limit: no magnification parts the stars surely.
    pub const FACT_UNDER_RESOLUTION: u32 = 0x0020;
    /// The separation is under the seeing: only moments of still air part the stars (common practice).
    pub const FACT_UNDER_SEEING: u32 = 0x0040;

    /// `amplifier` where there is none.
    pub const NO_AMPLIFIER: u8 = NO_AMPLIFIER;
}

/// Facts that put one behind those without them.
const DRAWBACKS: u32 = VisualChoice::FACT_WIDE_EXIT_PUPIL
    | VisualChoice::FACT_EMPTY_MAGNIFICATION
    | VisualChoice::FACT_SEEING_SHOWS;

/// The standing of what is not known.
const UNKNOWN: u8 = 3;

/// A telescope, with the eyepieces, and the Barlows and reducers, that can be put in.
#[derive(Clone, Copy, Debug)]
pub struct VisualOutfit<'a> {
    /// Its own amplification is not used.
    pub telescope: &'a Telescope,
    /// 1 to 16.
    pub eyepieces: &'a [Eyepiece],
    /// What each Barlow (over 1) or reducer (under 1) multiplies the focal length by, none 0; up to 8.
    pub amplifiers: &'a [Q16],
}

const MOST_EYEPIECES: usize = 16;

/// What does not depend on the eyepiece.
struct Night<'a> {
    aperture: Micrometres,
    target: &'a VisualTarget,
    observer: &'a Observer,
    resolution_uas: Option<u32>,
    resolving_q16: Option<u32>,
    seeing_q16: Option<u32>,
}

impl VisualOutfit<'_> {
    /// The first bad argument of a call that chooses.
    ///
    /// # Errors
    ///
    /// Those of [`choose`](Self::choose), but for the room.
    pub fn check(&self, observer: &Observer, target: &VisualTarget) -> Result<(), Error> {
        let at = |position| move |error: Error| Error::new(error.cause(), position);
        self.telescope.check().map_err(at(1))?;
        if self.eyepieces.is_empty() {
            return Err(Error::new(Cause::Zero, 3));
        }
        if self.eyepieces.len() > MOST_EYEPIECES {
            return Err(Error::new(Cause::OutOfRange, 3));
        }
        for eyepiece in self.eyepieces {
            eyepiece.check().map_err(at(2))?;
        }
        check_amplifiers(self.amplifiers)?;
        observer.check().map_err(at(6))?;
        target.check().map_err(at(7))?;
        Ok(())
    }

    /// Fills `choices` with the best combinations, the best first, and tells how many they are: each eyepiece
    /// alone, and with each Barlow or reducer.
    ///
    /// The order, from the first that differs:
    /// 1. The lower [`standing`](VisualChoice::standing).
    /// 2. To frame: the smaller true field, or, where it has not the room, the larger. To split: the lower
    ///    magnification, or, where it does not part them, the higher. For an exit pupil: the smaller ratio of
    ///    the larger to the smaller.
    /// 3. Without a Barlow or reducer before with one; then the place of that in its list; then the place of
    ///    the eyepiece.
    ///
    /// Values are those of [`VisualReadout`]; comparisons are exact.
    ///
    /// # Errors
    ///
    /// As the check of the first bad struct gives it: telescope (1), eyepieces (2), observer (6), target (7).
    /// [`Cause::Zero`]: no eyepieces (3), an amplifier (4), no room for a choice (9). [`Cause::OutOfRange`]:
    /// over 16 eyepieces (3), over 8 amplifiers (5). `choices` is then as it was.
    pub fn choose(
        &self,
        observer: &Observer,
        target: &VisualTarget,
        choices: &mut [VisualChoice],
    ) -> Result<usize, Error> {
        self.check(observer, target)?;
        if choices.is_empty() {
            return Err(Error::new(Cause::Zero, 9));
        }

        let night = Night::new(self.telescope, observer, target);
        let order = |a: &VisualChoice, b: &VisualChoice| target.order(a, b);
        let mut ranking = Ranking::new(choices);
        for (amplifier, telescope) in with_each(self.telescope, self.amplifiers) {
            let focal_length = telescope.amplified_focal_length();
            for (place, eyepiece) in self.eyepieces.iter().enumerate() {
                let choice = night.choice(focal_length, eyepiece);
                ranking.offer(VisualChoice { eyepiece: place as u8, amplifier, ..choice }, order);
            }
        }
        Ok(ranking.finish(order))
    }
}

impl<'a> Night<'a> {
    fn new(telescope: &Telescope, observer: &'a Observer, target: &'a VisualTarget) -> Self {
        let aperture = Micrometres(telescope.aperture_um);
        let obstruction = Micrometres(telescope.obstruction_um);
        let resolution =
            rayleigh_limit_obstructed_fx(aperture, obstruction, Nanometres(observer.wavelength_nm));
        let resolving = resolution.and_then(|resolution| observer.resolving_magnification(resolution));
        let seeing = observer.resolving_magnification(Microarcseconds(observer.seeing_uas));
        Night {
            aperture,
            target,
            observer,
            resolution_uas: resolution.ok().map(|limit| limit.0),
            resolving_q16: resolving.ok().map(|magnification| magnification.0),
            seeing_q16: seeing.ok().map(|magnification| magnification.0),
        }
    }

    fn choice(&self, focal_length: Result<Micrometres, Error>, eyepiece: &Eyepiece) -> VisualChoice {
        let mut out = VisualChoice { standing: UNKNOWN, ..VisualChoice::default() };
        let Ok(focal_length) = focal_length else { return out };
        let eyepiece_length = Micrometres(eyepiece.focal_length_um);
        if let Ok(magnification) = magnification_fx(focal_length, eyepiece_length) {
            out.available |= VisualChoice::MAGNIFICATION;
            out.magnification_q16 = magnification.0;
        }
        if let Ok(exit_pupil) = exit_pupil_fx(self.aperture, focal_length, eyepiece_length) {
            out.available |= VisualChoice::EXIT_PUPIL;
            out.exit_pupil_um = exit_pupil.0;
            if exit_pupil.0 > self.observer.eye_pupil_um && self.observer.eye_pupil_um != 0 {
                out.facts |= VisualChoice::FACT_WIDE_EXIT_PUPIL;
            }
        }
        if let Ok(true_field) = eyepiece.true_field(focal_length) {
            out.available |= VisualChoice::TRUE_FIELD;
            out.true_field_mas = true_field.0;
            if eyepiece.field_stop_um == 0 {
                out.facts |= VisualChoice::FACT_FIELD_FROM_APPARENT;
            }
        }
        let beyond = |most: Option<u32>| most.is_some_and(|most| out.magnification_q16 > most);
        if beyond(self.resolving_q16) {
            out.facts |= VisualChoice::FACT_EMPTY_MAGNIFICATION;
        }
        if beyond(self.seeing_q16) {
            out.facts |= VisualChoice::FACT_SEEING_SHOWS;
        }
        self.judge(&mut out);
        out
    }

    /// Whether it serves, and by how much.
    fn judge(&self, out: &mut VisualChoice) {
        type Choice = VisualChoice;
        let (target, eye) = (self.target, self.observer.eye_resolution_mas);
        let known = out.available & target.rests_on() != 0;
        let (serves, fit) = match target.purpose {
            VisualTarget::FRAME => (
                u64::from(out.true_field_mas) << 16 >= wide(target.size_mas, target.room_q16),
                ratio_q16(out.true_field_mas.into(), target.size_mas),
            ),
            VisualTarget::SPLIT => {
                if self.resolution_uas.is_some_and(|limit| target.separation_uas < limit) {
                    out.facts |= Choice::FACT_UNDER_RESOLUTION;
                }
                if target.separation_uas < self.observer.seeing_uas {
                    out.facts |= Choice::FACT_UNDER_SEEING;
                }
                if eye == 0 {
                    return;
                }
                let apparent = wide(out.magnification_q16, target.separation_uas); // uas, 2^-16
                (apparent >= wide(eye, 1000) << 16, divide::by_64(0, apparent, wide(eye, 1000)).map(Q16))
            }
            _ => (true, ratio_q16(out.exit_pupil_um.into(), target.exit_pupil_um)),
        };
        out.standing = match (known, serves) {
            (false, _) => return,
            (true, false) => 2,
            (true, true) => {
                out.facts |= Choice::FACT_SERVES;
                u8::from(target.purpose != VisualTarget::EXIT_PUPIL && out.facts & DRAWBACKS != 0)
            }
        };
        if let Ok(fit) = fit {
            out.available |= Choice::FIT;
            out.fit_q16 = fit.0;
        }
    }
}

impl VisualTarget {
    /// The member of a choice that decides.
    const fn rests_on(&self) -> u32 {
        match self.purpose {
            VisualTarget::FRAME => VisualChoice::TRUE_FIELD,
            VisualTarget::SPLIT => VisualChoice::MAGNIFICATION,
            _ => VisualChoice::EXIT_PUPIL,
        }
    }

    fn order(&self, a: &VisualChoice, b: &VisualChoice) -> Ordering {
        let values = match self.purpose {
            VisualTarget::FRAME => (a.true_field_mas, b.true_field_mas),
            VisualTarget::SPLIT => (a.magnification_q16, b.magnification_q16),
            _ => (a.exit_pupil_um, b.exit_pupil_um),
        };
        let by_value = match self.purpose {
            VisualTarget::EXIT_PUPIL => nearer(values.0, values.1, self.exit_pupil_um),
            _ if a.standing < 2 => values.0.cmp(&values.1),
            _ => values.1.cmp(&values.0),
        };
        let place = |choice: &VisualChoice| (choice.amplifier.wrapping_add(1), choice.eyepiece);
        a.standing.cmp(&b.standing).then(by_value).then_with(|| place(a).cmp(&place(b)))
    }
}

/// Which of two is nearer to a third by the ratio of the larger to the smaller.
fn nearer(a: u32, b: u32, wanted: u32) -> Ordering {
    match (a < wanted, b < wanted) {
        (false, false) => a.cmp(&b),
        (true, true) => b.cmp(&a),
        // a / wanted against wanted / b
        (false, true) => wide(a, b).cmp(&wide(wanted, wanted)),
        (true, false) => wide(wanted, wanted).cmp(&wide(a, b)),
    }
}
