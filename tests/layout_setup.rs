//! The readouts of focus, a Newtonian's layout and two mirrors against the single functions, every subset of bits; their
//! pages; and hand calculations that the pages agree with.

use fieldstop::capi::setup_layout::*;
use fieldstop::optics::{field, focus, layout};
use fieldstop::setup::{
    FocusReadout, Focuser, NewtonianLayout, NewtonianReadout, Observer, Telescope, TwoMirrorLayout,
    TwoMirrorReadout,
};
use fieldstop::text::*;
use fieldstop::units::*;
use fieldstop::{Cause, Error};
use proptest::prelude::*;
use std::ptr::{null, null_mut};

const TELESCOPE: Telescope = Telescope {
    aperture_um: 254_000,
    focal_length_um: 1_270_000,
    obstruction_um: 58_000,
    amplification_q16: 1 << 16,
    throughput_q16: 0,
};
const OBSERVER: Observer =
    Observer { naked_eye_mmag: 0, eye_pupil_um: 0, eye_resolution_mas: 0, seeing_uas: 0, wavelength_nm: 500 };
const FOCUSER: Focuser = Focuser {
    motor_step_nm: 4_000,
    defocus_nm: 60_000,
    tube_length_um: 1_200_000,
    expansion_ppb_per_k: 23_000,
};
const NEWTONIAN: NewtonianLayout = NewtonianLayout {
    focus_distance_um: 230_000,
    lit_field_um: 12_000,
    edge_offset_um: 15_000,
    diagonal_um: 60_000,
    axis_height_um: 700_000,
    reach_um: 1_100_000,
    altitude_bam: 0x1555_5555, // 30 degrees
    lowest_altitude_bam: 0x0e38_e38e,
    highest_altitude_bam: 0x4000_0000,
    height_limit_um: 1_600_000,
};
const CASSEGRAIN: Telescope = Telescope { focal_length_um: 3_175_000, obstruction_um: 76_000, ..TELESCOPE };
const MIRRORS: TwoMirrorLayout =
    TwoMirrorLayout { primary_focal_um: 1_016_000, back_focus_um: 200_000, lit_field_um: 10_000 };

fn focus_readout(t: &Telescope, f: &Focuser, wanted: u32) -> FocusReadout {
    FocusReadout::compute(t, f, &OBSERVER, wanted).unwrap()
}

/// Each bit with its member and what the functions give.
fn focus_values(t: &Telescope, f: &Focuser, r: &FocusReadout) -> Vec<(u32, u32, Option<u32>)> {
    type F = FocusReadout;
    let focal =
        field::amplified_focal_length_fx(Micrometres(t.focal_length_um), Q16(t.amplification_q16)).ok();
    let ratio = focal.and_then(|focal| field::focal_ratio_fx(focal, Micrometres(t.aperture_um)).ok());
    let depth =
        ratio.and_then(|ratio| focus::depth_of_focus_fx(ratio, Nanometres(OBSERVER.wavelength_nm)).ok());
    let defocus = Nanometres(f.defocus_nm);
    let blur = ratio.and_then(|ratio| focus::defocus_blur_fx(defocus, ratio).ok());
    let angle = match blur {
        Some(Nanometres(0)) => Some(0),
        blur => blur.and_then(|blur| field::pixel_scale_fx(blur, focal?).ok()).map(|v| v.0),
    };
    let temperature = depth.and_then(|depth| {
        let expansion = PartsPerBillionPerKelvin(f.expansion_ppb_per_k);
        focus::refocus_temperature_fx(Micrometres(f.tube_length_um), expansion, depth).ok()
    });
    let steps = depth.and_then(|depth| focus::motor_steps_fx(depth, Nanometres(f.motor_step_nm)).ok());
    let wave = ratio.and_then(|ratio| focus::defocus_wavefront_fx(defocus, ratio).ok());
    vec![
        (F::FOCAL_RATIO, r.focal_ratio_q16, ratio.map(|v| v.0)),
        (F::DEPTH, r.depth_nm, depth.map(|v| v.0)),
        (F::DEPTH_STEPS, r.depth_steps, steps),
        (F::TEMPERATURE, r.temperature_mk, temperature.map(|v| v.0)),
        (F::BLUR, r.blur_nm, blur.map(|v| v.0)),
        (F::BLUR_ANGLE, r.blur_angle_uas, angle),
        (F::WAVEFRONT, r.wavefront_nm, wave.map(|v| v.0)),
    ]
}

fn newtonian_values(
    t: &Telescope,
    l: &NewtonianLayout,
    r: &NewtonianReadout,
) -> Vec<(u32, u32, Option<u32>)> {
    type N = NewtonianReadout;
    let (aperture, focal) = (Micrometres(t.aperture_um), Micrometres(t.focal_length_um));
    let (distance, lit) = (Micrometres(l.focus_distance_um), Micrometres(l.lit_field_um));
    let needed = layout::diagonal_minor_axis_fx(aperture, focal, distance, lit).ok();
    let placed = if l.diagonal_um == 0 { needed } else { Some(Micrometres(l.diagonal_um)) };
    let beam = layout::beam_width_fx(aperture, focal, distance).ok();
    let shift = layout::beam_shift_fx(Micrometres(l.edge_offset_um), focal, distance).ok();
    let light = placed.and_then(|placed| layout::illumination_fx(beam?, placed, shift?).ok());
    let height = |altitude: i32| {
        let reach = SignedMicrometres(l.reach_um);
        layout::eyepiece_height_fx(Micrometres(l.axis_height_um), reach, SignedBam(altitude))
            .ok()
            .map(|v| v.0)
    };
    let greatest = if l.reach_um < 0 { l.lowest_altitude_bam } else { l.highest_altitude_bam };
    vec![
        (N::DIAGONAL, r.diagonal_um, needed.map(|v| v.0)),
        (
            N::DIAGONAL_OFFSET,
            r.diagonal_offset_um,
            layout::diagonal_offset_fx(aperture, focal, distance, lit).ok().map(|v| v.0),
        ),
        (N::OBSTRUCTION, r.obstruction_q16, placed.and_then(|placed| ratio_q16(placed.0.into(), aperture.0))),
        (N::BEAM, r.beam_um, beam.map(|v| v.0)),
        (N::BEAM_SHIFT, r.beam_shift_um, shift.map(|v| v.0)),
        (N::EDGE_LIGHT, r.edge_light_q16, light.map(|v| v.0)),
        (N::EYEPIECE_HEIGHT, r.eyepiece_height_um, height(l.altitude_bam)),
        (N::GREATEST_HEIGHT, r.greatest_height_um, height(greatest)),
    ]
}

fn mirror_values(t: &Telescope, l: &TwoMirrorLayout, r: &TwoMirrorReadout) -> Vec<(u32, u32, Option<u32>)> {
    type M = TwoMirrorReadout;
    let (primary, system) = (Micrometres(l.primary_focal_um), Micrometres(t.focal_length_um));
    let (back, aperture) = (Micrometres(l.back_focus_um), Micrometres(t.aperture_um));
    let separation = layout::secondary_separation_fx(primary, system, back).ok();
    let length = separation.and_then(|separation| separation.0.checked_add(back.0));
    let secondary =
        layout::secondary_diameter_fx(aperture, primary, system, back).ok().and_then(|diameter| {
            let margin =
                layout::secondary_field_margin_fx(primary, system, back, Micrometres(l.lit_field_um)).ok()?;
            diameter.0.checked_add(margin.0)
        });
    vec![
        (
            M::SECONDARY_MAGNIFICATION,
            r.secondary_magnification_q16,
            layout::secondary_magnification_fx(primary, system).ok().map(|v| v.0),
        ),
        (M::SEPARATION, r.separation_um, separation.map(|v| v.0)),
        (M::SECONDARY, r.secondary_um, secondary),
        (
            M::SECONDARY_RADIUS,
            r.secondary_radius_um,
            layout::secondary_radius_fx(primary, system, back).ok().map(|v| v.0),
        ),
        (M::OBSTRUCTION, r.obstruction_q16, secondary.and_then(|s| ratio_q16(s.into(), aperture.0))),
        (M::LENGTH, r.length_um, length),
        (M::LENGTH_SHARE, r.length_share_q16, length.and_then(|length| ratio_q16(length.into(), system.0))),
    ]
}

/// To nearest, halves up, where it fits.
fn ratio_q16(a: u64, b: u32) -> Option<u32> {
    u32::try_from(((a << 17) + u64::from(b)) / (2 * u64::from(b))).ok()
}

fn assert_values(wanted: u32, available: u32, values: Vec<(u32, u32, Option<u32>)>) {
    let mut bits = 0;
    for (bit, value, expected) in values {
        let expected = expected.filter(|_| wanted & bit != 0);
        assert_eq!(value, expected.unwrap_or(0), "bit {bit:#x}, wanted {wanted:#x}");
        bits |= if expected.is_some() { bit } else { 0 };
    }
    assert_eq!(available, bits, "wanted {wanted:#x}");
}

#[test]
fn every_subset_gives_exactly_that() {
    for wanted in 0..=FocusReadout::ALL {
        let readout = focus_readout(&TELESCOPE, &FOCUSER, wanted);
        assert_values(wanted, readout.available, focus_values(&TELESCOPE, &FOCUSER, &readout));
    }
    for wanted in 0..=NewtonianReadout::ALL {
        let readout = NewtonianReadout::compute(&TELESCOPE, &NEWTONIAN, wanted).unwrap();
        assert_values(wanted, readout.available, newtonian_values(&TELESCOPE, &NEWTONIAN, &readout));
    }
    for wanted in 0..=TwoMirrorReadout::ALL {
        let readout = TwoMirrorReadout::compute(&CASSEGRAIN, &MIRRORS, wanted).unwrap();
        assert_values(wanted, readout.available, mirror_values(&CASSEGRAIN, &MIRRORS, &readout));
    }
    let all = [
        focus_readout(&TELESCOPE, &FOCUSER, u32::MAX).available,
        NewtonianReadout::compute(&TELESCOPE, &NEWTONIAN, u32::MAX).unwrap().available,
        TwoMirrorReadout::compute(&CASSEGRAIN, &MIRRORS, u32::MAX).unwrap().available,
    ];
    assert_eq!(all, [FocusReadout::ALL, NewtonianReadout::ALL, TwoMirrorReadout::ALL]);
}

/// A number of any size up to the whole type.
fn any_size() -> impl Strategy<Value = u32> {
    (any::<u32>(), 0_u32..32).prop_map(|(n, shift)| n >> shift)
}

proptest! {
    #[test]
    fn any_equipment_gives_what_the_functions_give(
        numbers in prop::array::uniform12(any_size()), altitude in 0..=0x4000_0000, wanted: u32,
    ) {
        let [aperture, focal, a, b, c, d, e, f, g, h, i, j] = numbers;
        let telescope = Telescope {
            aperture_um: aperture.max(1),
            focal_length_um: focal.max(1),
            obstruction_um: 0,
            amplification_q16: i.max(1),
            throughput_q16: 0,
        };
        let focuser = Focuser { motor_step_nm: a, defocus_nm: b, tube_length_um: c, expansion_ppb_per_k: d };
        let readout = focus_readout(&telescope, &focuser, wanted);
        assert_values(wanted, readout.available, focus_values(&telescope, &focuser, &readout));
        let newtonian = NewtonianLayout {
            focus_distance_um: a,
            lit_field_um: b,
            edge_offset_um: c,
            diagonal_um: d,
            axis_height_um: e,
            reach_um: f as i32,
            altitude_bam: altitude,
            lowest_altitude_bam: altitude / 2,
            highest_altitude_bam: altitude,
            height_limit_um: g,
        };
        let readout = NewtonianReadout::compute(&telescope, &newtonian, wanted).unwrap();
        assert_values(wanted, readout.available, newtonian_values(&telescope, &newtonian, &readout));
        let mirrors = TwoMirrorLayout { primary_focal_um: h.max(1), back_focus_um: j, lit_field_um: a };
        let readout = TwoMirrorReadout::compute(&telescope, &mirrors, wanted).unwrap();
        assert_values(wanted, readout.available, mirror_values(&telescope, &mirrors, &readout));
    }
}

fn lines_of<R>(
    count: usize,
    readout: &R,
    line: impl Fn(&R, u8, &mut [u8]) -> Result<usize, Error>,
) -> Vec<String> {
    (0..count as u8)
        .map(|number| {
            let mut out = [0; 64];
            let length = line(readout, number, &mut out).unwrap();
            String::from_utf8(out[..length].to_vec()).unwrap()
        })
        .collect()
}

/// By hand: f/5 and 500 nm give 2 x 0.5 x 25 = 25 um, 6.25 steps of 4 um; 1.2 m of 23 ppm/K move 27.6 um a kelvin;
/// 60 um out of focus are a blur of 12 um, 12 / 1.27 x 0.206265 = 1.949", and a wavefront of 60 / 200 = 0.3 um.
#[test]
fn focus_page_by_hand() {
    let readout = focus_readout(&TELESCOPE, &FOCUSER, u32::MAX);
    let page = lines_of(9, &readout, |r, n, out| focus_line(r, &FOCUS_LABELS, &TextStyle::ASCII, 20, n, out));
    assert_eq!(
        page,
        [
            "Focus depth  25.0 um",
            "Motor steps  6 steps",
            "Refocus after  0.9 K",
            "Blur       ! 12.0 um",
            "Blur on sky!   1.95\"",
            "Wavefront  !  300 nm",
            "Focal ratio    f/5.0",
            "Coarse steps      no",
            "Out of focus     yes",
        ]
    );
}

/// By hand, the light cone at 230 mm of 1270 mm: w = 6 + 230 g with g = (254 - 12) / 2540 = 0.095276, so 27.9134, and
/// the minor axis 2 w / (1 - g^2) = 56.338; the offset w g / (1 - g^2) = 2.684; the beam 254 x 230 / 1270 = 46 and its
/// shift 15 x 1040 / 1270 = 12.283; of a disc of 46 at that distance one of 60 covers 0.895 by the area of two circular
/// segments; heights 0.7 + 1.1 / 2 and 0.7 + 1.1.
#[test]
fn newtonian_page_by_hand() {
    let readout = NewtonianReadout::compute(&TELESCOPE, &NEWTONIAN, u32::MAX).unwrap();
    let page = lines_of(12, &readout, |r, n, out| {
        newtonian_line(r, &NEWTONIAN_LABELS, &TextStyle::ASCII, 20, n, out)
    });
    assert_eq!(
        page,
        [
            "Diagonal     56.3 mm",
            "Offset        2.7 mm",
            "Obstruction  ! 23.6%",
            "Edge light       90%",
            "Eyepiece at   1.25 m",
            "Eyepiece max! 1.80 m",
            "Beam         46.0 mm",
            "Beam shift   12.3 mm",
            "Small diagonal    no",
            "Wider than told  yes",
            "High eyepiece     no",
            "High reached     yes",
        ]
    );
}

/// By hand: m = 3175 / 1016 = 3.125, p = (1016 + 200) / 4.125 = 294.788, so a separation of 721.212, a secondary of
/// 254 x 294.788 / 1016 = 73.697 and 10 x 721.212 / 3175 = 2.272 for the field, a radius of
/// 2 x 294.788 x 3.125 / 2.125 = 867.023; 921.2 mm from there to the focus are 29 per cent of 3175.
#[test]
fn two_mirror_page_by_hand() {
    let readout = TwoMirrorReadout::compute(&CASSEGRAIN, &MIRRORS, u32::MAX).unwrap();
    let page = lines_of(8, &readout, |r, n, out| {
        two_mirror_line(r, &TWO_MIRROR_LABELS, &TextStyle::ASCII, 20, n, out)
    });
    assert_eq!(
        page,
        [
            "Separation    721 mm",
            "Secondary    76.0 mm",
            "Its radius    867 mm",
            "Obstruction    29.9%",
            "Second. magn.  3.13x",
            "Length        921 mm",
            "Of focal len.    29%",
            "Wider than told   no",
        ]
    );
}

/// Every English label has the room that it needs beside an ordinary value.
#[test]
fn no_english_label_is_cut() {
    let focus = focus_readout(&TELESCOPE, &FOCUSER, u32::MAX);
    let newtonian = NewtonianReadout::compute(&TELESCOPE, &NEWTONIAN, u32::MAX).unwrap();
    let mirrors = TwoMirrorReadout::compute(&CASSEGRAIN, &MIRRORS, u32::MAX).unwrap();
    let all = |rows: Vec<Row>, labels: &[&str], short: &[&str]| {
        assert!(rows.len() == labels.len() && rows.len() == short.len());
        for (row, (label, short)) in rows.iter().zip(labels.iter().zip(short)) {
            assert!(label.len() <= 19 - usize::from(row.field), "{label}");
            assert!(short.len() <= 7, "{short}");
        }
    };
    all(FocusRow::ALL.map(|row| focus_row(&focus, row)).to_vec(), &FOCUS_LABELS, &FOCUS_LABELS_SHORT);
    let rows = NewtonianRow::ALL.map(|row| newtonian_row(&newtonian, row)).to_vec();
    all(rows, &NEWTONIAN_LABELS, &NEWTONIAN_LABELS_SHORT);
    let rows = TwoMirrorRow::ALL.map(|row| two_mirror_row(&mirrors, row)).to_vec();
    all(rows, &TWO_MIRROR_LABELS, &TWO_MIRROR_LABELS_SHORT);
}

#[test]
fn facts_at_their_thresholds() {
    type F = FocusReadout;
    let depth = focus_readout(&TELESCOPE, &FOCUSER, F::DEPTH).depth_nm;
    for (motor_step_nm, coarse) in [(depth, false), (depth + 1, true)] {
        let facts = focus_readout(&TELESCOPE, &Focuser { motor_step_nm, ..FOCUSER }, F::DEPTH_STEPS).facts;
        assert_eq!(facts, if coarse { F::FACT_COARSE_STEP } else { 0 });
    }
    for (defocus_nm, out) in [(depth, false), (depth + 1, true)] {
        for wanted in [F::DEPTH, F::BLUR, F::BLUR_ANGLE, F::WAVEFRONT] {
            let facts = focus_readout(&TELESCOPE, &Focuser { defocus_nm, ..FOCUSER }, wanted).facts;
            assert_eq!(facts, if out { F::FACT_OUT_OF_FOCUS } else { 0 });
        }
    }
    assert_eq!(focus_readout(&TELESCOPE, &FOCUSER, F::FOCAL_RATIO | F::TEMPERATURE).facts, 0);

    type N = NewtonianReadout;
    let facts = |layout: &NewtonianLayout, wanted| N::compute(&TELESCOPE, layout, wanted).unwrap().facts;
    let needed = N::compute(&TELESCOPE, &NEWTONIAN, N::DIAGONAL).unwrap().diagonal_um;
    for wanted in [N::DIAGONAL, N::OBSTRUCTION, N::EDGE_LIGHT] {
        for (diagonal_um, small) in [(0, 0), (needed, 0), (needed - 1, N::FACT_SMALL_DIAGONAL)] {
            let layout = NewtonianLayout { diagonal_um, ..NEWTONIAN };
            assert_eq!(facts(&layout, wanted) & N::FACT_SMALL_DIAGONAL, small);
        }
    }
    for (diagonal_um, wider) in [(58_000, 0), (58_001, N::FACT_WIDER_THAN_TOLD)] {
        let layout = NewtonianLayout { diagonal_um, ..NEWTONIAN };
        assert_eq!(facts(&layout, N::OBSTRUCTION) & N::FACT_WIDER_THAN_TOLD, wider);
    }
    for (height_limit_um, now, reached) in
        [(0, 0, 0), (1_250_000, 0, 8), (1_249_000, 4, 8), (1_800_000, 0, 0), (1_799_999, 0, 8)]
    {
        let layout = NewtonianLayout { height_limit_um, ..NEWTONIAN };
        assert_eq!(facts(&layout, N::EYEPIECE_HEIGHT), now, "{height_limit_um}");
        assert_eq!(facts(&layout, N::GREATEST_HEIGHT), reached, "{height_limit_um}");
    }
    // At the lower end of the tube it is highest when that points lowest.
    let layout = NewtonianLayout { reach_um: -600_000, lowest_altitude_bam: 0, ..NEWTONIAN };
    let readout = N::compute(&TELESCOPE, &layout, u32::MAX).unwrap();
    assert_eq!((readout.eyepiece_height_um, readout.greatest_height_um), (400_000, 700_000));

    type M = TwoMirrorReadout;
    let secondary = M::compute(&CASSEGRAIN, &MIRRORS, M::SECONDARY).unwrap().secondary_um;
    for (obstruction_um, wider) in [(secondary, 0), (secondary - 1, M::FACT_WIDER_THAN_TOLD)] {
        let telescope = Telescope { obstruction_um, ..CASSEGRAIN };
        assert_eq!(M::compute(&telescope, &MIRRORS, M::OBSTRUCTION).unwrap().facts, wider);
    }
}

#[test]
fn bad_structs_are_told_and_nothing_changes() {
    let range = |argument| Err(Error::new(Cause::OutOfRange, argument));
    let checked = |layout: NewtonianLayout| {
        let result = layout.check();
        assert_eq!(
            unsafe { fieldstop_newtonian_layout_check(&layout) },
            result.map_or_else(|e| e.status(), |()| 0)
        );
        result
    };
    assert_eq!(checked(NEWTONIAN), Ok(()));
    for bad in [-1, 0x4000_0001, i32::MIN, i32::MAX] {
        assert_eq!(checked(NewtonianLayout { altitude_bam: bad, ..NEWTONIAN }), range(7));
        assert_eq!(checked(NewtonianLayout { lowest_altitude_bam: bad, ..NEWTONIAN }), range(8));
        assert_eq!(checked(NewtonianLayout { highest_altitude_bam: bad, ..NEWTONIAN }), range(9));
    }
    assert_eq!(
        checked(NewtonianLayout { lowest_altitude_bam: 9, highest_altitude_bam: 8, ..NEWTONIAN }),
        range(9)
    );
    let no_primary = TwoMirrorLayout { primary_focal_um: 0, ..MIRRORS };
    assert_eq!(no_primary.check(), Err(Error::new(Cause::Zero, 1)));

    let no_aperture = Telescope { aperture_um: 0, ..TELESCOPE };
    let no_wavelength = Observer { wavelength_nm: 0, ..OBSERVER };
    let bad_layout = NewtonianLayout { altitude_bam: -1, ..NEWTONIAN };
    let mut focus = FocusReadout { facts: 77, ..FocusReadout::default() };
    let mut newtonian = NewtonianReadout { facts: 77, ..NewtonianReadout::default() };
    let mut mirrors = TwoMirrorReadout { facts: 77, ..TwoMirrorReadout::default() };
    unsafe {
        let focused = fieldstop_focus_readout_compute;
        assert_eq!(focused(null(), null(), null(), 0, null_mut()), 0x0101);
        assert_eq!(focused(&TELESCOPE, null(), null(), 0, null_mut()), 0x0201);
        assert_eq!(focused(&TELESCOPE, &FOCUSER, null(), 0, null_mut()), 0x0301);
        assert_eq!(focused(&TELESCOPE, &FOCUSER, &OBSERVER, 0, null_mut()), 0x0501);
        assert_eq!(focused(&no_aperture, &FOCUSER, &OBSERVER, 1, &mut focus), 0x0102);
        assert_eq!(focused(&TELESCOPE, &FOCUSER, &no_wavelength, 1, &mut focus), 0x0302);
        let laid_out = fieldstop_newtonian_readout_compute;
        assert_eq!(laid_out(null(), null(), 0, null_mut()), 0x0101);
        assert_eq!(laid_out(&TELESCOPE, null(), 0, null_mut()), 0x0201);
        assert_eq!(laid_out(&TELESCOPE, &NEWTONIAN, 0, null_mut()), 0x0401);
        assert_eq!(laid_out(&no_aperture, &NEWTONIAN, 1, &mut newtonian), 0x0102);
        assert_eq!(laid_out(&TELESCOPE, &bad_layout, 1, &mut newtonian), 0x0203);
        let mirrored = fieldstop_two_mirror_readout_compute;
        assert_eq!(mirrored(null(), null(), 0, null_mut()), 0x0101);
        assert_eq!(mirrored(&TELESCOPE, null(), 0, null_mut()), 0x0201);
        assert_eq!(mirrored(&CASSEGRAIN, &MIRRORS, 0, null_mut()), 0x0401);
        assert_eq!(mirrored(&no_aperture, &MIRRORS, 1, &mut mirrors), 0x0102);
        assert_eq!(mirrored(&CASSEGRAIN, &no_primary, 1, &mut mirrors), 0x0202);
        assert_eq!((focus.facts, newtonian.facts, mirrors.facts), (77, 77, 77));
        assert_eq!(fieldstop_newtonian_layout_check(null()), 0x0101);
        assert_eq!(fieldstop_two_mirror_layout_check(null()), 0x0101);
        assert_eq!(fieldstop_two_mirror_layout_check(&no_primary), 0x0102);
        assert_eq!(focused(&TELESCOPE, &FOCUSER, &OBSERVER, 0x7f, &mut focus), 0);
        assert_eq!(focus, focus_readout(&TELESCOPE, &FOCUSER, 0x7f));
        assert_eq!(laid_out(&TELESCOPE, &NEWTONIAN, 0xff, &mut newtonian), 0);
        assert_eq!(newtonian, NewtonianReadout::compute(&TELESCOPE, &NEWTONIAN, 0xff).unwrap());
        assert_eq!(mirrored(&CASSEGRAIN, &MIRRORS, 0x7f, &mut mirrors), 0);
        assert_eq!(mirrors, TwoMirrorReadout::compute(&CASSEGRAIN, &MIRRORS, 0x7f).unwrap());
    }
}

/// Schroeder, *Astronomical Optics*, the Hubble design (from memory): primary 5.52 m, system 57.6 m, focus 1.5 m behind
/// the vertex: 4.906 m between the mirrors, the secondary's radius 1.358 m.
#[test]
fn a_published_design_on_the_page() {
    let telescope = Telescope { aperture_um: 2_400_000, focal_length_um: 57_600_000, ..TELESCOPE };
    let layout = TwoMirrorLayout { primary_focal_um: 5_520_000, back_focus_um: 1_500_000, lit_field_um: 0 };
    let readout = TwoMirrorReadout::compute(&telescope, &layout, u32::MAX).unwrap();
    assert_eq!((readout.separation_um + 500) / 1000, 4_906);
    assert_eq!((readout.secondary_radius_um + 500) / 1000, 1_358);
    assert_eq!((field::plate_scale_fx(Micrometres(57_600_000)).unwrap().0 + 5) / 10, 358);
}

#[test]
fn a_caution_breaks_between_words() {
    let wrapped = |sentence: &str, columns| -> Vec<String> {
        (0..caution_lines(sentence, columns))
            .map(|line| {
                let mut out = [0xaa; 300];
                let length = caution_line(sentence, columns, line, &mut out).unwrap();
                String::from_utf8(out[..length].to_vec()).unwrap()
            })
            .collect()
    };
    assert_eq!(
        wrapped(HIGH_EYEPIECE_CAUTION, 20),
        [
            "Caution: high       ",
            "eyepiece. Stand on a",
            "stable platform,    ",
            "never on the top of ",
            "a ladder, clear of  ",
            "the moving mount.   ",
            "Follow the maker's  ",
            "instructions and    ",
            "local rules.        ",
        ]
    );
    assert_eq!(wrapped("instructions", 8), ["instruct", "ions    "]);
    assert_eq!(wrapped("größere Höhe", 8), ["größere ", "Höhe    "]);
    assert_eq!(wrapped("exactly8 exactly8", 8), ["exactly8", "exactly8"]);
    for sentence in [HIGH_EYEPIECE_CAUTION, SUN_CAUTION] {
        // Words longer than eight characters are cut there.
        for columns in [12, 16, 20, 40, 255] {
            let lines = wrapped(sentence, columns);
            let words: Vec<&str> = lines.iter().flat_map(|line| line.split_whitespace()).collect();
            assert_eq!(words.join(" "), sentence);
            assert!(lines.iter().all(|line| line.len() == usize::from(columns)));
        }
    }
    let mut out = [0xaa; 20];
    assert_eq!(caution_line("a b", 20, 1, &mut out), Ok(20));
    assert_eq!(out, [b' '; 20]);
    assert_eq!(caution_line("a b", 7, 0, &mut out), Err(Error::new(Cause::OutOfRange, 2)));
    assert_eq!(caution_line("a b", 21, 0, &mut out), Err(Error::new(Cause::NoRoom, 0)));
}
