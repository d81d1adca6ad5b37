//! Choosing what to put in: the order against one that is written out here, C against Rust, and what is refused.

use core::cmp::Ordering;
use fieldstop::capi::setup_choice::{fieldstop_camera_choose, fieldstop_visual_choose};
use fieldstop::optics::{field, resolution};
use fieldstop::setup::{
    Camera, CameraChoice, CameraOutfit, CameraTarget, Eyepiece, Observer, Telescope, VisualChoice,
    VisualOutfit, VisualTarget,
};
use fieldstop::units::{Micrometres, Milliarcseconds, Nanometres, Q16};
use fieldstop::{Cause, Error};
use proptest::prelude::*;
use std::ptr::null;

const TELESCOPE: Telescope = Telescope {
    aperture_um: 203_500,
    focal_length_um: 1_220_000,
    obstruction_um: 51_000,
    amplification_q16: 1 << 16,
    throughput_q16: 0,
};
const OBSERVER: Observer = Observer {
    naked_eye_mmag: 5_300,
    eye_pupil_um: 6_500,
    eye_resolution_mas: 180_000,
    seeing_uas: 2_000_000,
    wavelength_nm: 550,
};
const EYEPIECES: [Eyepiece; 4] =
    [eyepiece(40_000, 46_000), eyepiece(21_000, 0), eyepiece(13_000, 18_300), eyepiece(6_000, 9_800)];
const AMPLIFIERS: [Q16; 2] = [Q16(131_072), Q16(41_288)]; // 2 and 0.63

const fn eyepiece(focal_length_um: u32, field_stop_um: u32) -> Eyepiece {
    let apparent_field_mas = 68 * 3_600_000;
    Eyepiece { focal_length_um, field_stop_um, apparent_field_mas, mapping: 0, padding: [0; 3] }
}

const HALF_A_DEGREE: VisualTarget = VisualTarget {
    size_mas: 1_800_000,
    room_q16: 81_920,
    separation_uas: 0,
    exit_pupil_um: 0,
    purpose: VisualTarget::FRAME,
    padding: [0; 3],
};
const PAIR: VisualTarget =
    VisualTarget { separation_uas: 2_500_000, purpose: VisualTarget::SPLIT, ..HALF_A_DEGREE };
const PUPIL: VisualTarget =
    VisualTarget { exit_pupil_um: 2_000, purpose: VisualTarget::EXIT_PUPIL, ..HALF_A_DEGREE };

fn outfit(amplifiers: &[Q16]) -> VisualOutfit<'_> {
    VisualOutfit { telescope: &TELESCOPE, eyepieces: &EYEPIECES, amplifiers }
}

fn chosen(outfit: &VisualOutfit, observer: &Observer, target: &VisualTarget) -> Vec<VisualChoice> {
    let mut choices = [VisualChoice::default(); 144];
    let filled = outfit.choose(observer, target, &mut choices).unwrap();
    choices[..filled].to_vec()
}

fn places(choices: &[VisualChoice]) -> Vec<(u8, u8)> {
    choices.iter().map(|choice| (choice.eyepiece, choice.amplifier)).collect()
}

#[test]
fn half_a_degree_takes_the_smallest_field_with_room() {
    // By hand: 46 mm at 1220 mm are 129.6', 68 deg / 58.1 70.2', 18.3 mm 51.6', 9.8 mm 27.6'; wanted are 37.5'.
    let sharp_eye = Observer { eye_resolution_mas: 200_000, ..OBSERVER };
    let choices = chosen(&outfit(&[]), &sharp_eye, &HALF_A_DEGREE);
    assert_eq!(places(&choices), [(2, 255), (1, 255), (0, 255), (3, 255)]);
    let first = &choices[0];
    assert_eq!(first.true_field_mas / 6_000, 515); // tenths of a minute
    assert_eq!(first.facts, VisualChoice::FACT_SERVES);
    assert_eq!(first.fit_q16, 112_646); // 51.565' / 30'
    assert_eq!(choices[1].facts & VisualChoice::FACT_FIELD_FROM_APPARENT, 4);
    // 203.5 x 40 / 1220 is 6.67 mm, more than the eye's 6.5 mm.
    assert_eq!(choices[2].facts, VisualChoice::FACT_SERVES | VisualChoice::FACT_WIDE_EXIT_PUPIL);
    assert_eq!(choices[3].facts & VisualChoice::FACT_SERVES, 0);

    // 93.8 times are over 180" / 2".
    let choices = chosen(&outfit(&[]), &OBSERVER, &HALF_A_DEGREE);
    assert_eq!(places(&choices), [(1, 255), (2, 255), (0, 255), (3, 255)]);
    assert_eq!(choices[1].facts, VisualChoice::FACT_SERVES | VisualChoice::FACT_SEEING_SHOWS);
}

#[test]
fn pair_takes_the_lowest_magnification_that_parts_it() {
    // The eye's 180" over 2.5" are 72 times; over the seeing of 2" 90 times.
    let choices = chosen(&outfit(&AMPLIFIERS), &OBSERVER, &PAIR);
    let magnification = |choice: &VisualChoice| f64::from(choice.magnification_q16) / 65_536.0;
    assert_eq!(places(&choices[..1]), [(2, 255)]); // 93.8 times: none has from 72 to 90
    assert!(choices[0].facts & VisualChoice::FACT_SEEING_SHOWS != 0);
    assert!(choices.is_sorted_by_key(|choice| choice.facts & VisualChoice::FACT_SERVES == 0));
    let serving: Vec<f64> = choices
        .iter()
        .filter(|choice| choice.facts & VisualChoice::FACT_SERVES != 0)
        .map(magnification)
        .collect();
    assert!(serving.iter().all(|&m| m >= 72.0));
    let rest: Vec<f64> = choices[serving.len()..].iter().map(magnification).collect();
    assert!(!rest.is_empty() && rest.iter().all(|&m| m < 72.0) && rest.is_sorted_by(|a, b| a >= b));

    // Rayleigh's limit is some 0.66" here.
    let close = VisualTarget { separation_uas: 500_000, ..PAIR };
    let under = VisualChoice::FACT_UNDER_RESOLUTION | VisualChoice::FACT_UNDER_SEEING;
    assert!(chosen(&outfit(&[]), &OBSERVER, &close).iter().all(|choice| choice.facts & under == under));
    assert!(choices.iter().all(|choice| choice.facts & under == 0));
}

#[test]
fn exit_pupil_takes_the_nearest_ratio() {
    let choices = chosen(&outfit(&AMPLIFIERS), &OBSERVER, &PUPIL);
    let ratio = |choice: &VisualChoice| {
        let ratio = f64::from(choice.exit_pupil_um) / 2_000.0;
        ratio.max(ratio.recip())
    };
    assert!(choices.is_sorted_by(|a, b| ratio(a) <= ratio(b)));
    assert_eq!(places(&choices[..1]), [(2, 255)]); // 2.17 mm
}

#[test]
fn ties_keep_the_order_of_the_lists() {
    let alike = [EYEPIECES[2]; 16];
    let outfit = VisualOutfit { eyepieces: &alike, ..outfit(&[Q16::ONE, Q16::ONE]) };
    for target in [HALF_A_DEGREE, PAIR, PUPIL] {
        let expected: Vec<(u8, u8)> =
            [255, 0, 1].into_iter().flat_map(|amplifier| (0..16).map(move |at| (at, amplifier))).collect();
        assert_eq!(places(&chosen(&outfit, &OBSERVER, &target)), expected);
    }
}

/// Written out from the documentation, in floating point and 128 bits.
fn before(a: &VisualChoice, b: &VisualChoice, target: &VisualTarget, eye: u32) -> Ordering {
    let (bit, value): (u32, fn(&VisualChoice) -> u128) = match target.purpose {
        VisualTarget::FRAME => (VisualChoice::TRUE_FIELD, |choice| choice.true_field_mas.into()),
        VisualTarget::SPLIT => (VisualChoice::MAGNIFICATION, |choice| choice.magnification_q16.into()),
        _ => (VisualChoice::EXIT_PUPIL, |choice| choice.exit_pupil_um.into()),
    };
    let to_pupil = target.purpose == VisualTarget::EXIT_PUPIL;
    let class = |choice: &VisualChoice| {
        let drawbacks = VisualChoice::FACT_WIDE_EXIT_PUPIL
            | VisualChoice::FACT_EMPTY_MAGNIFICATION
            | VisualChoice::FACT_SEEING_SHOWS;
        if choice.available & bit == 0 || target.purpose == VisualTarget::SPLIT && eye == 0 {
            3
        } else if choice.facts & VisualChoice::FACT_SERVES == 0 {
            2
        } else {
            i32::from(!to_pupil && choice.facts & drawbacks != 0)
        }
    };
    let by_value = if to_pupil {
        // max / min, as a fraction: a.0 / a.1 against b.0 / b.1
        let wanted = u128::from(target.exit_pupil_um);
        let ratio = |choice: &VisualChoice| (value(choice).max(wanted), value(choice).min(wanted));
        let (a, b) = (ratio(a), ratio(b));
        (a.0 * b.1).cmp(&(b.0 * a.1))
    } else if class(a) < 2 {
        value(a).cmp(&value(b))
    } else {
        value(b).cmp(&value(a))
    };
    let place = |choice: &VisualChoice| (choice.amplifier.wrapping_add(1), choice.eyepiece);
    assert_eq!((i32::from(a.standing), i32::from(b.standing)), (class(a), class(b)));
    class(a).cmp(&class(b)).then(by_value).then(place(a).cmp(&place(b)))
}

fn some_eyepiece() -> impl Strategy<Value = Eyepiece> {
    (3_000_u32..60_000, prop_oneof![Just(0_u32), 2_000_u32..60_000], any::<bool>()).prop_map(
        |(focal_length_um, field_stop_um, apparent)| Eyepiece {
            focal_length_um,
            field_stop_um,
            apparent_field_mas: if apparent { 60 * 3_600_000 } else { 0 },
            ..Eyepiece::default()
        },
    )
}

fn some_target() -> impl Strategy<Value = VisualTarget> {
    (1_u32..20_000_000, 65_536_u32..200_000, 100_000_u32..9_000_000, 200_u32..9_000, 0_u8..3).prop_map(
        |(size_mas, room_q16, separation_uas, exit_pupil_um, purpose)| VisualTarget {
            size_mas,
            room_q16,
            separation_uas,
            exit_pupil_um,
            purpose,
            padding: [0; 3],
        },
    )
}

proptest! {
    #[test]
    fn order_is_that_of_the_documentation(
        eyepieces in prop::collection::vec(some_eyepiece(), 1..=16),
        amplifiers in prop::collection::vec((10_000_u32..400_000).prop_map(Q16), 0..=8),
        target in some_target(),
        eye in prop_oneof![Just(0_u32), 60_000_u32..300_000],
        room in 1_usize..150,
    ) {
        let observer = Observer { eye_resolution_mas: eye, ..OBSERVER };
        let outfit = VisualOutfit { telescope: &TELESCOPE, eyepieces: &eyepieces, amplifiers: &amplifiers };
        let all = chosen(&outfit, &observer, &target);
        prop_assert_eq!(all.len(), eyepieces.len() * (1 + amplifiers.len()));
        prop_assert!(all.is_sorted_by(|a, b| before(a, b, &target, eye).is_lt()));

        // A short list is the beginning of the long one, in C too.
        let mut short = vec![VisualChoice::default(); room];
        let filled = outfit.choose(&observer, &target, &mut short).unwrap();
        prop_assert_eq!(&short[..filled], &all[..all.len().min(room)]);
        let mut in_c = vec![VisualChoice { available: 99, ..VisualChoice::default() }; room];
        let mut count = room as u8;
        let numbers: Vec<u32> = amplifiers.iter().map(|q16| q16.0).collect();
        let status = unsafe {
            fieldstop_visual_choose(
                &TELESCOPE, eyepieces.as_ptr(), eyepieces.len() as u8, numbers.as_ptr(), numbers.len() as u8,
                &observer, &target, in_c.as_mut_ptr(), &mut count,
            )
        };
        prop_assert_eq!((status, usize::from(count)), (0, filled));
        prop_assert_eq!(&in_c[..filled], &short[..filled]);
        prop_assert!(in_c[filled..].iter().all(|choice| *choice == VisualChoice::default()));

        // Each value and each judgement from the functions alone.
        for choice in &all {
            let eyepiece = &eyepieces[usize::from(choice.eyepiece)];
            let amplification = amplifiers.get(usize::from(choice.amplifier)).copied().unwrap_or(Q16::ONE);
            let focal_length =
                field::amplified_focal_length_fx(Micrometres(TELESCOPE.focal_length_um), amplification).unwrap();
            let length = Micrometres(eyepiece.focal_length_um);
            let magnification = field::magnification_fx(focal_length, length).unwrap();
            prop_assert_eq!(choice.magnification_q16, magnification.0);
            let pupil = field::exit_pupil_fx(Micrometres(TELESCOPE.aperture_um), focal_length, length).unwrap();
            prop_assert_eq!(choice.exit_pupil_um, pupil.0);
            let serves = match target.purpose {
                VisualTarget::FRAME => {
                    u128::from(choice.true_field_mas) << 16
                        >= u128::from(target.size_mas) * u128::from(target.room_q16)
                }
                VisualTarget::SPLIT => {
                    eye != 0
                        && u128::from(magnification.0) * u128::from(target.separation_uas)
                            >= (u128::from(eye) * 1000) << 16
                }
                _ => true,
            };
            prop_assert_eq!(choice.facts & VisualChoice::FACT_SERVES != 0, serves);
            let over_seeing = eye != 0
                && f64::from(magnification.0) / 65_536.0 > f64::from(eye) * 1000.0 / f64::from(observer.seeing_uas) + 1e-4;
            prop_assert!(!over_seeing || choice.facts & VisualChoice::FACT_SEEING_SHOWS != 0);
        }
    }
}

#[test]
fn under_the_resolution_is_under_rayleighs_limit() {
    let limit = resolution::rayleigh_limit_obstructed_fx(
        Micrometres(TELESCOPE.aperture_um),
        Micrometres(TELESCOPE.obstruction_um),
        Nanometres(550),
    )
    .unwrap();
    for (separation_uas, under) in [(limit.0 - 1, true), (limit.0, false)] {
        let target = VisualTarget { separation_uas, ..PAIR };
        let facts = chosen(&outfit(&[]), &OBSERVER, &target)[0].facts;
        assert_eq!(facts & VisualChoice::FACT_UNDER_RESOLUTION != 0, under);
    }
}

const CAMERAS: [Camera; 3] = [
    Camera { pixel_nm: 4_100, columns: 4_128, rows: 2_772, binning: 1, padding: [0; 3] },
    Camera { pixel_nm: 2_700, columns: 1_936, rows: 1_096, binning: 1, padding: [0; 3] },
    Camera { pixel_nm: 5_900, columns: 6_060, rows: 4_020, binning: 1, padding: [0; 3] },
];
const WIDE_TARGET: CameraTarget =
    CameraTarget { width_mas: 3 * 3_600_000, height_mas: 3_600_000, overlap_q16: 9_830 }; // 0.15

#[test]
fn cameras_by_frames_sampling_and_scale() {
    let outfit = CameraOutfit { telescope: &TELESCOPE, cameras: &CAMERAS, amplifiers: &AMPLIFIERS };
    let mut choices = [CameraChoice::default(); 9];
    assert_eq!(outfit.choose(&OBSERVER, &WIDE_TARGET, &mut choices), Ok(9));
    for choice in &choices {
        let tiles = |target: u32, frame: u32| {
            let overlap = ((u64::from(frame) * 9_830) >> 16) as u32;
            field::tiles_fx(Milliarcseconds(target), Milliarcseconds(frame), Milliarcseconds(overlap))
                .unwrap()
        };
        assert_eq!(choice.available, 0x1f);
        assert_eq!(choice.tiles_wide, tiles(WIDE_TARGET.width_mas, choice.frame_width_mas));
        assert_eq!(choice.tiles_high, tiles(WIDE_TARGET.height_mas, choice.frame_height_mas));
        assert_eq!(choice.facts & CameraChoice::FACT_FITS != 0, choice.tiles_wide * choice.tiles_high == 1);
    }
    assert!(choices.is_sorted_by_key(|choice| (
        choice.tiles_wide * choice.tiles_high,
        choice.facts & 3 != 0,
        choice.pixel_scale_uas
    )));
    // By hand: 35.8 x 23.7 mm at 1220 mm are 1.68 x 1.11 degrees, two of them with 0.15 overlap 3.1; at 0.63 of that
    // length two as well, but with 1.6" to a pixel of a star of 2.1".
    assert_eq!(choices.each_ref().map(|choice| (choice.camera, choice.amplifier))[..2], [(2, 255), (2, 1)]);
    assert_eq!((choices[0].tiles_wide, choices[0].tiles_high, choices[0].facts), (2, 1, 0));
    assert_eq!(choices[1].facts, CameraChoice::FACT_COARSE_SAMPLING);

    let mut in_c = [CameraChoice::default(); 4];
    let mut count = 4;
    let amplifiers = AMPLIFIERS.map(|q16| q16.0);
    let status = unsafe {
        fieldstop_camera_choose(
            &TELESCOPE,
            CAMERAS.as_ptr(),
            3,
            amplifiers.as_ptr(),
            2,
            &OBSERVER,
            &WIDE_TARGET,
            in_c.as_mut_ptr(),
            &mut count,
        )
    };
    assert_eq!((status, count), (0, 4));
    assert_eq!(in_c, choices[..4]);

    let small = CameraTarget { width_mas: 600_000, height_mas: 300_000, overlap_q16: 0 };
    assert_eq!(outfit.choose(&OBSERVER, &small, &mut choices), Ok(9));
    assert!(choices[0].facts & CameraChoice::FACT_FITS != 0);
}

#[test]
fn bad_input_changes_nothing() {
    let untouched = [VisualChoice { available: 7, ..VisualChoice::default() }; 2];
    let try_it = |outfit: VisualOutfit, observer: &Observer, target: &VisualTarget, room: usize| {
        let mut choices = untouched;
        let result = outfit.choose(observer, target, &mut choices[..room]).unwrap_err();
        assert_eq!(choices, untouched);
        let mut count = room as u8;
        let amplifiers: Vec<u32> = outfit.amplifiers.iter().map(|q16| q16.0).collect();
        let status = unsafe {
            fieldstop_visual_choose(
                outfit.telescope,
                outfit.eyepieces.as_ptr(),
                outfit.eyepieces.len() as u8,
                if amplifiers.is_empty() { null() } else { amplifiers.as_ptr() },
                amplifiers.len() as u8,
                observer,
                target,
                choices.as_mut_ptr(),
                &mut count,
            )
        };
        assert_eq!((status, usize::from(count), choices), (result.status(), room, untouched));
        result
    };
    let good = outfit(&AMPLIFIERS);
    let zero = |argument| Error::new(Cause::Zero, argument);
    let range = |argument| Error::new(Cause::OutOfRange, argument);
    let no_aperture = Telescope { aperture_um: 0, ..TELESCOPE };
    let no_wavelength = Observer { wavelength_nm: 0, ..OBSERVER };
    let many = [EYEPIECES[0]; 17];
    let bad = [EYEPIECES[0], eyepiece(0, 1)];
    let at = |outfit| try_it(outfit, &OBSERVER, &HALF_A_DEGREE, 2);
    assert_eq!(at(VisualOutfit { telescope: &no_aperture, ..good }), zero(1));
    assert_eq!(at(VisualOutfit { eyepieces: &bad, ..good }), zero(2));
    assert_eq!(at(VisualOutfit { eyepieces: &[], ..good }), zero(3));
    assert_eq!(at(VisualOutfit { eyepieces: &many, ..good }), range(3));
    assert_eq!(at(VisualOutfit { amplifiers: &[Q16(0)], ..good }), zero(4));
    assert_eq!(at(VisualOutfit { amplifiers: &[Q16::ONE; 9], ..good }), range(5));
    assert_eq!(try_it(good, &no_wavelength, &HALF_A_DEGREE, 2), zero(6));
    let target = |target: VisualTarget| try_it(good, &OBSERVER, &target, 2);
    assert_eq!(target(VisualTarget { purpose: 3, ..HALF_A_DEGREE }), range(7));
    assert_eq!(target(VisualTarget { size_mas: 0, ..HALF_A_DEGREE }), zero(7));
    assert_eq!(target(VisualTarget { room_q16: 65_535, ..HALF_A_DEGREE }), range(7));
    assert_eq!(target(VisualTarget { separation_uas: 0, ..PAIR }), zero(7));
    assert_eq!(target(VisualTarget { exit_pupil_um: 0, ..PUPIL }), zero(7));
    assert_eq!(try_it(good, &OBSERVER, &HALF_A_DEGREE, 0), zero(9));

    let mut choices = untouched;
    let mut count = 2;
    let call = |telescope, eyepieces, amplifiers, observer, target, choices, count| unsafe {
        fieldstop_visual_choose(telescope, eyepieces, 4, amplifiers, 1, observer, target, choices, count)
    };
    let (eyepieces, one) = (EYEPIECES.as_ptr(), [65_536]);
    let null_at = |position| Error::new(Cause::NullPointer, position).status();
    let (to, n) = (choices.as_mut_ptr(), &raw mut count);
    let (t, o, p): (*const Telescope, *const Observer, *const VisualTarget) = (&TELESCOPE, &OBSERVER, &PAIR);
    assert_eq!(call(null(), null(), one.as_ptr(), o, p, to, n), null_at(1));
    assert_eq!(call(t, null(), one.as_ptr(), o, p, to, n), null_at(2));
    assert_eq!(call(t, eyepieces, null(), o, p, to, n), null_at(4));
    assert_eq!(call(t, eyepieces, one.as_ptr(), null(), p, to, n), null_at(6));
    assert_eq!(call(t, eyepieces, one.as_ptr(), o, null(), to, n), null_at(7));
    assert_eq!(call(t, eyepieces, one.as_ptr(), o, p, std::ptr::null_mut(), n), null_at(8));
    assert_eq!(call(t, eyepieces, one.as_ptr(), o, p, to, std::ptr::null_mut()), null_at(9));
    assert_eq!(choices, untouched);
}
