//! The equipment structs, their checks and the two readouts.

use fieldstop::optics::{field, imaging, light, resolution};
use fieldstop::setup::{
    Camera, CameraReadout, Eyepiece, FocusReadout, Focuser, NewtonianLayout, NewtonianReadout, Observer,
    Telescope, TwoMirrorLayout, TwoMirrorReadout, VisualReadout,
};
use fieldstop::units::{Microarcseconds, Micrometres, Milliarcseconds, Millimagnitudes, Nanometres, Q16};
use fieldstop::{Cause, Error};
use proptest::prelude::*;

const TELESCOPE: Telescope = Telescope {
    aperture_um: 187_500,
    focal_length_um: 1_130_000,
    obstruction_um: 47_000,
    amplification_q16: 65_536,
    throughput_q16: 53_740,
};
const EYEPIECE: Eyepiece = Eyepiece {
    focal_length_um: 19_000,
    field_stop_um: 22_300,
    apparent_field_mas: 66 * 3_600_000,
    mapping: Eyepiece::EQUIDISTANT,
    padding: [0; 3],
};
const CAMERA: Camera = Camera { pixel_nm: 4_100, columns: 4_128, rows: 2_772, binning: 2, padding: [0; 3] };
const OBSERVER: Observer = Observer {
    naked_eye_mmag: 5_300,
    eye_pupil_um: 6_200,
    eye_resolution_mas: 180_000,
    seeing_uas: 2_400_000,
    wavelength_nm: 550,
};

fn visual(wanted: u32) -> VisualReadout {
    VisualReadout::compute(&TELESCOPE, &EYEPIECE, &OBSERVER, wanted).unwrap()
}

fn camera(wanted: u32) -> CameraReadout {
    CameraReadout::compute(&TELESCOPE, &CAMERA, &OBSERVER, wanted).unwrap()
}

/// The values of a visual readout, each beside its bit; signed ones as they lie in memory.
fn visual_values(readout: &VisualReadout) -> [(u32, u32); 12] {
    type V = VisualReadout;
    [
        (V::FOCAL_LENGTH, readout.focal_length_um),
        (V::FOCAL_RATIO, readout.focal_ratio_q16),
        (V::MAGNIFICATION, readout.magnification_q16),
        (V::EXIT_PUPIL, readout.exit_pupil_um),
        (V::TRUE_FIELD, readout.true_field_mas),
        (V::RESOLUTION, readout.resolution_uas),
        (V::DAWES_LIMIT, readout.dawes_limit_uas),
        (V::LOWEST_MAGNIFICATION, readout.lowest_magnification_q16),
        (V::RESOLVING_MAGNIFICATION, readout.resolving_magnification_q16),
        (V::EFFECTIVE_APERTURE, readout.effective_aperture_um),
        (V::LIMITING_MAGNITUDE, readout.limiting_magnitude_mmag as u32),
        (V::SURFACE_BRIGHTNESS, readout.surface_brightness_q16),
    ]
}

fn camera_values(readout: &CameraReadout) -> [(u32, u32); 12] {
    type C = CameraReadout;
    [
        (C::FOCAL_LENGTH, readout.focal_length_um),
        (C::FOCAL_RATIO, readout.focal_ratio_q16),
        (C::T_NUMBER, readout.t_number_q16),
        (C::FRAME_WIDTH, readout.frame_width_mas),
        (C::FRAME_HEIGHT, readout.frame_height_mas),
        (C::PIXEL_SCALE, readout.pixel_scale_uas),
        (C::PLATE_SCALE, readout.plate_scale_mas_per_mm),
        (C::STAR_FWHM, readout.star_fwhm_uas),
        (C::PIXELS_PER_FWHM, readout.pixels_per_fwhm_q16),
        (C::CUTOFF_FREQUENCY, readout.cutoff_frequency_q16),
        (C::NYQUIST_PIXEL, readout.nyquist_pixel_nm),
        (C::DIAGONAL, readout.diagonal_mas),
    ]
}

/// a / b in Q16.16 to nearest, halves up, where it fits.
fn ratio_q16(a: u64, b: u64) -> Option<u32> {
    let nearest = (u128::from(a) * 131_072 + u128::from(b)).checked_div(2 * u128::from(b))?;
    u32::try_from(nearest).ok()
}

/// What each bit should give, from the functions of `optics` alone.
fn expected_visual(t: &Telescope, e: &Eyepiece, o: &Observer) -> [Option<u32>; 12] {
    let aperture = Micrometres(t.aperture_um);
    let obstruction = Micrometres(t.obstruction_um);
    let eyepiece = Micrometres(e.focal_length_um);
    let eye = Micrometres(o.eye_pupil_um);
    let throughput = Some(Q16(t.throughput_q16)).filter(|throughput| throughput.0 != 0);
    let apparent = Milliarcseconds(e.apparent_field_mas);

    let focal =
        field::amplified_focal_length_fx(Micrometres(t.focal_length_um), Q16(t.amplification_q16)).ok();
    let exit_pupil = focal.and_then(|focal| field::exit_pupil_fx(aperture, focal, eyepiece).ok());
    let true_field = focal.and_then(|focal| {
        if e.field_stop_um != 0 {
            field::true_field_from_stop_fx(Micrometres(e.field_stop_um), focal).ok()
        } else if e.mapping == Eyepiece::RECTILINEAR {
            field::true_field_rectilinear_fx(apparent, focal, eyepiece).ok()
        } else {
            field::true_field_equidistant_fx(apparent, focal, eyepiece).ok()
        }
    });
    let resolved =
        resolution::rayleigh_limit_obstructed_fx(aperture, obstruction, Nanometres(o.wavelength_nm)).ok();
    let resolving = match o.eye_resolution_mas {
        0 => None,
        eye => resolved.and_then(|resolved| ratio_q16(u64::from(eye) * 1000, resolved.0.into())),
    };
    let effective = |beam| light::effective_aperture_fx(beam, obstruction, throughput?).ok();
    let taken_in = exit_pupil.and_then(|exit_pupil| {
        if exit_pupil <= eye {
            return effective(aperture);
        }
        // p f / fe: the exit pupil's formula the other way round
        effective(field::exit_pupil_fx(eye, eyepiece, focal?).ok()?)
    });
    let limit = taken_in.and_then(|taken_in| {
        light::limiting_magnitude_fx(Millimagnitudes(o.naked_eye_mmag), taken_in, eye).ok()
    });
    let brightness = |pupil| light::surface_brightness_fx(pupil, eye, throughput?).ok();
    let surface = exit_pupil.and_then(brightness).map(|beam| {
        let shadow = focal
            .and_then(|focal| field::exit_pupil_fx(obstruction, focal, eyepiece).ok())
            .and_then(brightness);
        beam.0.saturating_sub(shadow.map_or(0, |shadow| shadow.0))
    });
    [
        focal.map(|v| v.0),
        focal.and_then(|focal| field::focal_ratio_fx(focal, aperture).ok()).map(|v| v.0),
        focal.and_then(|focal| field::magnification_fx(focal, eyepiece).ok()).map(|v| v.0),
        exit_pupil.map(|v| v.0),
        true_field.map(|v| v.0),
        resolved.map(|v| v.0),
        resolution::dawes_limit_fx(aperture).ok().map(|v| v.0),
        field::magnification_fx(aperture, eye).ok().map(|v| v.0),
        resolving,
        effective(aperture).map(|v| v.0),
        limit.map(|v| v.0 as u32),
        surface,
    ]
}

fn expected_camera(t: &Telescope, c: &Camera, o: &Observer) -> [Option<u32>; 12] {
    let aperture = Micrometres(t.aperture_um);
    let pixel = Nanometres(c.pixel_nm);
    let wavelength = Nanometres(o.wavelength_nm);
    let focal =
        field::amplified_focal_length_fx(Micrometres(t.focal_length_um), Q16(t.amplification_q16)).ok();
    let effective = match t.throughput_q16 {
        0 => None,
        throughput => {
            light::effective_aperture_fx(aperture, Micrometres(t.obstruction_um), Q16(throughput)).ok()
        }
    };
    let frame = |count: u16| {
        focal.and_then(|focal| field::frame_field_fx(pixel, count.into(), focal).ok()).map(|v| v.0)
    };
    let scale = c
        .pixel_nm
        .checked_mul(c.binning.into())
        .and_then(|binned| field::pixel_scale_fx(Nanometres(binned), focal?).ok());
    let fwhm = match o.seeing_uas {
        0 => None,
        seeing => resolution::airy_fwhm_fx(aperture, Nanometres(o.wavelength_nm)).ok().and_then(|airy| {
            resolution::combined_fwhm_fx(Microarcseconds(seeing), airy, Microarcseconds(0)).ok()
        }),
    };
    [
        focal.map(|v| v.0),
        focal.and_then(|focal| field::focal_ratio_fx(focal, aperture).ok()).map(|v| v.0),
        focal.and_then(|focal| field::focal_ratio_fx(focal, effective?).ok()).map(|v| v.0),
        frame(c.columns),
        frame(c.rows),
        scale.map(|v| v.0),
        focal.and_then(|focal| field::plate_scale_fx(focal).ok()).map(|v| v.0),
        fwhm.map(|v| v.0),
        fwhm.and_then(|fwhm| ratio_q16(fwhm.0.into(), scale?.0.into())),
        focal
            .and_then(|focal| resolution::cutoff_frequency_fx(focal, aperture, wavelength).ok())
            .map(|v| v.0),
        focal.and_then(|focal| imaging::nyquist_pixel_fx(focal, aperture, wavelength).ok()).map(|v| v.0),
        focal.and_then(|focal| imaging::diagonal_field_fx(pixel, c.columns, c.rows, focal).ok()).map(|v| v.0),
    ]
}

/// Wanted and known: the value; otherwise 0 and a clear bit.
fn assert_values<const N: usize>(
    wanted: u32,
    available: u32,
    values: [(u32, u32); N],
    expected: [Option<u32>; N],
) {
    let mut bits = 0;
    for ((bit, value), expected) in values.into_iter().zip(expected) {
        let expected = expected.filter(|_| wanted & bit != 0);
        assert_eq!(value, expected.unwrap_or(0), "value of bit {bit:#x}, wanted {wanted:#x}");
        if expected.is_some() {
            bits |= bit;
        }
    }
    assert_eq!(available, bits, "available, wanted {wanted:#x}");
}

#[test]
fn every_visual_subset_gives_exactly_that() {
    let expected = expected_visual(&TELESCOPE, &EYEPIECE, &OBSERVER);
    assert!(expected.iter().all(Option::is_some));
    for wanted in 0..=VisualReadout::ALL {
        let readout = visual(wanted);
        assert_values(wanted, readout.available, visual_values(&readout), expected);
    }
}

#[test]
fn every_camera_subset_gives_exactly_that() {
    let expected = expected_camera(&TELESCOPE, &CAMERA, &OBSERVER);
    assert!(expected.iter().all(Option::is_some));
    for wanted in 0..=CameraReadout::ALL {
        let readout = camera(wanted);
        assert_values(wanted, readout.available, camera_values(&readout), expected);
    }
}

#[test]
fn bits_cover_the_members_and_unknown_ones_are_ignored() {
    let bits = |values: &[(u32, u32)]| values.iter().fold(0, |bits, value| bits | value.0);
    assert_eq!(bits(&visual_values(&visual(0))), VisualReadout::ALL);
    assert_eq!(bits(&camera_values(&camera(0))), CameraReadout::ALL);
    assert_eq!(visual(0), VisualReadout::default());
    assert_eq!(camera(0), CameraReadout::default());
    assert_eq!(visual(u32::MAX), visual(VisualReadout::ALL));
    assert_eq!(camera(u32::MAX), camera(CameraReadout::ALL));
    assert_eq!(visual(!VisualReadout::ALL), VisualReadout::default());
}

/// The members that become unavailable when something is unknown, and no others.
#[test]
fn what_is_unknown_takes_only_its_dependents_along() {
    type V = VisualReadout;
    type C = CameraReadout;
    let telescope = Telescope { throughput_q16: 0, ..TELESCOPE };
    let seen = VisualReadout::compute(&telescope, &EYEPIECE, &OBSERVER, V::ALL).unwrap();
    assert_eq!(
        V::ALL & !seen.available,
        V::EFFECTIVE_APERTURE | V::LIMITING_MAGNITUDE | V::SURFACE_BRIGHTNESS
    );
    let taken = CameraReadout::compute(&telescope, &CAMERA, &OBSERVER, C::ALL).unwrap();
    assert_eq!(C::ALL & !taken.available, C::T_NUMBER);

    let eyepiece = Eyepiece { field_stop_um: 0, apparent_field_mas: 0, ..EYEPIECE };
    let seen = VisualReadout::compute(&TELESCOPE, &eyepiece, &OBSERVER, V::ALL).unwrap();
    assert_eq!(V::ALL & !seen.available, V::TRUE_FIELD);
    assert_eq!(seen.facts & V::FACT_FIELD_FROM_APPARENT, 0);

    let observer = Observer { eye_pupil_um: 0, ..OBSERVER };
    let seen = VisualReadout::compute(&TELESCOPE, &EYEPIECE, &observer, V::ALL).unwrap();
    assert_eq!(
        V::ALL & !seen.available,
        V::LOWEST_MAGNIFICATION | V::LIMITING_MAGNITUDE | V::SURFACE_BRIGHTNESS
    );
    assert_eq!(seen.facts & V::FACT_WIDE_EXIT_PUPIL, 0);

    let observer = Observer { eye_resolution_mas: 0, ..OBSERVER };
    let seen = VisualReadout::compute(&TELESCOPE, &EYEPIECE, &observer, V::ALL).unwrap();
    assert_eq!(V::ALL & !seen.available, V::RESOLVING_MAGNIFICATION);
    assert_eq!(seen.facts & V::FACT_EMPTY_MAGNIFICATION, 0);

    let observer = Observer { seeing_uas: 0, ..OBSERVER };
    let seen = VisualReadout::compute(&TELESCOPE, &EYEPIECE, &observer, V::ALL).unwrap();
    assert_eq!((seen.available, seen.facts & V::FACT_SEEING_LIMITED), (V::ALL, 0));
    let taken = CameraReadout::compute(&TELESCOPE, &CAMERA, &observer, C::ALL).unwrap();
    assert_eq!(C::ALL & !taken.available, C::STAR_FWHM | C::PIXELS_PER_FWHM);
    assert_eq!(taken.facts, 0);
}

#[test]
fn what_overflows_takes_only_its_dependents_along() {
    type V = VisualReadout;
    // 70 m of focal length over 1 mm of eyepiece: a magnification of 70,000.
    let telescope = Telescope { focal_length_um: 70_000_000, ..TELESCOPE };
    let eyepiece = Eyepiece { focal_length_um: 1000, ..EYEPIECE };
    let seen = VisualReadout::compute(&telescope, &eyepiece, &OBSERVER, V::ALL).unwrap();
    assert_eq!(V::ALL & !seen.available, V::MAGNIFICATION);

    // A focal length of 4.3 km, amplified, does not fit: what rests on it is gone, the aperture's values stay.
    let telescope = Telescope { focal_length_um: u32::MAX, amplification_q16: 2 << 16, ..TELESCOPE };
    let seen = VisualReadout::compute(&telescope, &EYEPIECE, &OBSERVER, V::ALL).unwrap();
    assert_eq!(
        seen.available,
        V::RESOLUTION
            | V::DAWES_LIMIT
            | V::LOWEST_MAGNIFICATION
            | V::RESOLVING_MAGNIFICATION
            | V::EFFECTIVE_APERTURE
    );
    let taken = CameraReadout::compute(&telescope, &CAMERA, &OBSERVER, CameraReadout::ALL).unwrap();
    assert_eq!(taken.available, CameraReadout::STAR_FWHM);

    // So does a binned pixel of 4.3 m and more.
    let camera = Camera { pixel_nm: u32::MAX / 2 + 1, ..CAMERA };
    let taken = CameraReadout::compute(&TELESCOPE, &camera, &OBSERVER, CameraReadout::ALL).unwrap();
    assert_eq!(
        CameraReadout::ALL & !taken.available,
        CameraReadout::PIXEL_SCALE | CameraReadout::PIXELS_PER_FWHM
    );
}

fn visual_facts(telescope: &Telescope, eyepiece: &Eyepiece, observer: &Observer, wanted: u32) -> u32 {
    VisualReadout::compute(telescope, eyepiece, observer, wanted).unwrap().facts
}

#[test]
fn fact_wide_exit_pupil() {
    type V = VisualReadout;
    let exit_pupil = visual(V::EXIT_PUPIL).exit_pupil_um;
    for wanted in [V::EXIT_PUPIL, V::LIMITING_MAGNITUDE, V::SURFACE_BRIGHTNESS] {
        let facts = |eye_pupil_um| {
            let observer = Observer { eye_pupil_um, ..OBSERVER };
            visual_facts(&TELESCOPE, &EYEPIECE, &observer, wanted) & V::FACT_WIDE_EXIT_PUPIL
        };
        assert_eq!(facts(exit_pupil - 1), V::FACT_WIDE_EXIT_PUPIL);
        assert_eq!(facts(exit_pupil), 0);
        assert_eq!(facts(exit_pupil + 1), 0);
    }
    let observer = Observer { eye_pupil_um: 1, ..OBSERVER };
    let others = V::ALL & !(V::EXIT_PUPIL | V::LIMITING_MAGNITUDE | V::SURFACE_BRIGHTNESS);
    assert_eq!(visual_facts(&TELESCOPE, &EYEPIECE, &observer, others) & V::FACT_WIDE_EXIT_PUPIL, 0);
}

#[test]
fn fact_empty_magnification() {
    type V = VisualReadout;
    // A magnification of exactly 100, and a wavelength that makes the resolution a multiple of 10 microarcseconds.
    let telescope = Telescope { focal_length_um: 1_000_000, ..TELESCOPE };
    let eyepiece = Eyepiece { focal_length_um: 10_000, ..EYEPIECE };
    let (wavelength_nm, resolution) = (400..700)
        .map(|wavelength_nm| {
            let observer = Observer { wavelength_nm, ..OBSERVER };
            let seen = VisualReadout::compute(&telescope, &eyepiece, &observer, V::RESOLUTION).unwrap();
            (wavelength_nm, seen.resolution_uas)
        })
        .find(|(_, resolution)| resolution % 10 == 0)
        .unwrap();
    let both = V::MAGNIFICATION | V::RESOLVING_MAGNIFICATION;
    let facts = |eye_resolution_mas, wanted| {
        let observer = Observer { eye_resolution_mas, wavelength_nm, ..OBSERVER };
        visual_facts(&telescope, &eyepiece, &observer, wanted) & V::FACT_EMPTY_MAGNIFICATION
    };
    let eye = resolution / 10;
    assert_eq!(facts(eye - 1, both), V::FACT_EMPTY_MAGNIFICATION);
    assert_eq!(facts(eye, both), 0);
    assert_eq!(facts(eye + 1, both), 0);
    // Not judged where only one of the two is wanted.
    assert_eq!(facts(1, V::ALL & !V::MAGNIFICATION), 0);
    assert_eq!(facts(1, V::ALL & !V::RESOLVING_MAGNIFICATION), 0);
}

#[test]
fn fact_seeing_limited() {
    type V = VisualReadout;
    let resolution = visual(V::RESOLUTION).resolution_uas;
    for wanted in [V::RESOLUTION, V::RESOLVING_MAGNIFICATION] {
        let facts = |seeing_uas| {
            let observer = Observer { seeing_uas, ..OBSERVER };
            visual_facts(&TELESCOPE, &EYEPIECE, &observer, wanted)
        };
        assert_eq!(facts(resolution - 1), 0);
        assert_eq!(facts(resolution), 0);
        assert_eq!(facts(resolution + 1), V::FACT_SEEING_LIMITED);
    }
    let others = V::ALL & !(V::RESOLUTION | V::RESOLVING_MAGNIFICATION);
    assert_eq!(visual(others).facts & V::FACT_SEEING_LIMITED, 0);
}

#[test]
fn fact_field_from_apparent() {
    type V = VisualReadout;
    let facts = |field_stop_um, mapping, wanted| {
        let eyepiece = Eyepiece { field_stop_um, mapping, ..EYEPIECE };
        visual_facts(&TELESCOPE, &eyepiece, &OBSERVER, wanted) & V::FACT_FIELD_FROM_APPARENT
    };
    for mapping in [Eyepiece::EQUIDISTANT, Eyepiece::RECTILINEAR] {
        assert_eq!(facts(0, mapping, V::TRUE_FIELD), V::FACT_FIELD_FROM_APPARENT);
        assert_eq!(facts(1, mapping, V::TRUE_FIELD), 0);
        assert_eq!(facts(0, mapping, V::ALL & !V::TRUE_FIELD), 0);
    }
}

#[test]
fn facts_of_sampling() {
    type C = CameraReadout;
    let scale = camera(C::PIXEL_SCALE).pixel_scale_uas;
    // The seeing that makes the star's image exactly as wide.
    let with_fwhm = |fwhm: u32| {
        let observer = (fwhm / 2..=fwhm)
            .rev()
            .map(|seeing_uas| Observer { seeing_uas, ..OBSERVER })
            .find(|observer| {
                let taken = CameraReadout::compute(&TELESCOPE, &CAMERA, observer, C::STAR_FWHM).unwrap();
                taken.star_fwhm_uas == fwhm
            })
            .unwrap();
        CameraReadout::compute(&TELESCOPE, &CAMERA, &observer, C::PIXELS_PER_FWHM).unwrap()
    };
    // 20 microarcseconds are about one step of the ratio here.
    assert_eq!(with_fwhm(2 * scale - 20).facts, C::FACT_COARSE_SAMPLING);
    assert_eq!((with_fwhm(2 * scale).facts, with_fwhm(2 * scale).pixels_per_fwhm_q16), (0, 2 << 16));
    assert_eq!(with_fwhm(2 * scale + 20).facts, 0);
    assert_eq!(with_fwhm(3 * scale - 20).facts, 0);
    assert_eq!((with_fwhm(3 * scale).facts, with_fwhm(3 * scale).pixels_per_fwhm_q16), (0, 3 << 16));
    assert_eq!(with_fwhm(3 * scale + 20).facts, C::FACT_FINE_SAMPLING);
    // Not judged where the pixels across the star image are not wanted.
    let observer = Observer { seeing_uas: 1, ..OBSERVER };
    let others = C::ALL & !C::PIXELS_PER_FWHM;
    assert_eq!(CameraReadout::compute(&TELESCOPE, &CAMERA, &observer, others).unwrap().facts, 0);
}

/// Light that falls on the iris counts for nothing: an eyepiece past the wide pupil shows no fainter star.
#[test]
fn a_wide_exit_pupil_costs_light() {
    type V = VisualReadout;
    let at = |focal_length_um| {
        let eyepiece = Eyepiece { focal_length_um, ..EYEPIECE };
        VisualReadout::compute(&TELESCOPE, &eyepiece, &OBSERVER, V::ALL).unwrap()
    };
    // 6.2 mm of eye pupil at f/6.027: 37.36 mm of eyepiece.
    let (full, over, far_over) = (at(37_000), at(45_000), at(140_000));
    assert_eq!(full.facts & V::FACT_WIDE_EXIT_PUPIL, 0);
    assert_eq!(full.limiting_magnitude_mmag, visual(V::ALL).limiting_magnitude_mmag);
    assert!(over.limiting_magnitude_mmag < full.limiting_magnitude_mmag);
    assert!(over.surface_brightness_q16 < full.surface_brightness_q16);
    // At 150 mm the exit pupil is 24.9 mm wide and the obstruction's shadow in it 6.24 mm: wider than the eye's pupil.
    let dark = at(150_000);
    assert_eq!(dark.surface_brightness_q16, 0);
    assert_eq!(dark.available & V::LIMITING_MAGNITUDE, 0);
    assert!(far_over.limiting_magnitude_mmag < over.limiting_magnitude_mmag);
    // The telescope's own effective aperture does not depend on the eyepiece.
    assert_eq!(over.effective_aperture_um, full.effective_aperture_um);
}

#[test]
fn checks_name_the_first_bad_member() {
    let zero = |member| Err(Error::new(Cause::Zero, member));
    let range = |member| Err(Error::new(Cause::OutOfRange, member));

    let t = TELESCOPE;
    assert_eq!(t.check(), Ok(()));
    assert_eq!(Telescope { aperture_um: 0, ..t }.check(), zero(1));
    assert_eq!(Telescope { focal_length_um: 0, ..t }.check(), zero(2));
    assert_eq!(Telescope { obstruction_um: t.aperture_um, ..t }.check(), range(3));
    assert_eq!(Telescope { obstruction_um: t.aperture_um - 1, ..t }.check(), Ok(()));
    assert_eq!(Telescope { obstruction_um: 0, ..t }.check(), Ok(()));
    assert_eq!(Telescope { amplification_q16: 0, ..t }.check(), zero(4));
    assert_eq!(Telescope { throughput_q16: 65_537, ..t }.check(), range(5));
    assert_eq!(Telescope { throughput_q16: 65_536, ..t }.check(), Ok(()));
    assert_eq!(Telescope { throughput_q16: 0, ..t }.check(), Ok(()));
    let mut bad = Telescope {
        aperture_um: 0,
        focal_length_um: 0,
        obstruction_um: u32::MAX,
        amplification_q16: 0,
        throughput_q16: u32::MAX,
    };
    assert_eq!(bad.check(), zero(1));
    bad.aperture_um = 9;
    assert_eq!(bad.check(), zero(2));
    bad.focal_length_um = 9;
    assert_eq!(bad.check(), range(3));
    bad.obstruction_um = 0;
    assert_eq!(bad.check(), zero(4));
    bad.amplification_q16 = 1;
    assert_eq!(bad.check(), range(5));

    let e = EYEPIECE;
    assert_eq!(e.check(), Ok(()));
    assert_eq!(Eyepiece { focal_length_um: 0, ..e }.check(), zero(1));
    assert_eq!(Eyepiece { apparent_field_mas: 648_000_000, ..e }.check(), range(3));
    assert_eq!(Eyepiece { apparent_field_mas: 647_999_999, ..e }.check(), Ok(()));
    assert_eq!(Eyepiece { mapping: 2, ..e }.check(), range(4));
    assert_eq!(Eyepiece { apparent_field_mas: u32::MAX, mapping: 2, ..e }.check(), range(3));
    assert_eq!(
        Eyepiece { focal_length_um: 0, apparent_field_mas: u32::MAX, mapping: 2, ..e }.check(),
        zero(1)
    );
    assert_eq!(Eyepiece { padding: [1, 2, 3], ..e }.check(), Ok(()));

    let c = CAMERA;
    assert_eq!(c.check(), Ok(()));
    assert_eq!(Camera { pixel_nm: 0, columns: 0, rows: 0, binning: 0, ..c }.check(), zero(1));
    assert_eq!(Camera { columns: 0, rows: 0, binning: 0, ..c }.check(), zero(2));
    assert_eq!(Camera { rows: 0, binning: 0, ..c }.check(), zero(3));
    assert_eq!(Camera { binning: 0, ..c }.check(), zero(4));
    assert_eq!(Camera { columns: 1, ..c }.check(), range(4));
    assert_eq!(Camera { rows: 1, ..c }.check(), range(4));
    assert_eq!(Camera { columns: 2, rows: 2, padding: [1, 2, 3], ..c }.check(), Ok(()));

    let o = OBSERVER;
    assert_eq!(o.check(), Ok(()));
    assert_eq!(Observer { wavelength_nm: 0, ..o }.check(), zero(5));
    let unknown = Observer { eye_pupil_um: 0, eye_resolution_mas: 0, seeing_uas: 0, naked_eye_mmag: 0, ..o };
    assert_eq!(unknown.check(), Ok(()));
}

#[test]
fn readouts_name_the_first_bad_struct() {
    let bad = |cause, position| Error::new(cause, position);
    let telescope = Telescope { obstruction_um: u32::MAX, ..TELESCOPE };
    let eyepiece = Eyepiece { focal_length_um: 0, ..EYEPIECE };
    let camera = Camera { binning: 0, ..CAMERA };
    let observer = Observer { wavelength_nm: 0, ..OBSERVER };
    let visual = |t: &Telescope, e: &Eyepiece, o: &Observer| VisualReadout::compute(t, e, o, 0).unwrap_err();
    assert_eq!(visual(&telescope, &eyepiece, &observer), bad(Cause::OutOfRange, 1));
    assert_eq!(visual(&TELESCOPE, &eyepiece, &observer), bad(Cause::Zero, 2));
    assert_eq!(visual(&TELESCOPE, &EYEPIECE, &observer), bad(Cause::Zero, 3));
    let taken = |t: &Telescope, c: &Camera, o: &Observer| CameraReadout::compute(t, c, o, 0).unwrap_err();
    assert_eq!(taken(&telescope, &camera, &observer), bad(Cause::OutOfRange, 1));
    assert_eq!(taken(&TELESCOPE, &camera, &observer), bad(Cause::Zero, 2));
    assert_eq!(taken(&TELESCOPE, &CAMERA, &observer), bad(Cause::Zero, 3));
}

/// Published layouts never change.
#[test]
fn layouts_are_as_published() {
    use std::mem::{offset_of, size_of};
    macro_rules! layout {
        ($t:ty, $size:literal: $($member:ident $offset:literal),*) => {
            assert_eq!(size_of::<$t>(), $size, stringify!($t));
            $(assert_eq!(offset_of!($t, $member), $offset, stringify!($t $member));)*
        };
    }
    layout!(Telescope, 20: aperture_um 0, focal_length_um 4, obstruction_um 8, amplification_q16 12, throughput_q16 16);
    layout!(Eyepiece, 16: focal_length_um 0, field_stop_um 4, apparent_field_mas 8, mapping 12, padding 13);
    layout!(Camera, 12: pixel_nm 0, columns 4, rows 6, binning 8, padding 9);
    layout!(Observer, 20: naked_eye_mmag 0, eye_pupil_um 4, eye_resolution_mas 8, seeing_uas 12, wavelength_nm 16);
    layout!(VisualReadout, 56: available 0, facts 4, focal_length_um 8, focal_ratio_q16 12, magnification_q16 16,
        exit_pupil_um 20, true_field_mas 24, resolution_uas 28, dawes_limit_uas 32, lowest_magnification_q16 36,
        resolving_magnification_q16 40, effective_aperture_um 44, limiting_magnitude_mmag 48,
        surface_brightness_q16 52);
    layout!(CameraReadout, 56: available 0, facts 4, focal_length_um 8, focal_ratio_q16 12, t_number_q16 16,
        frame_width_mas 20, frame_height_mas 24, pixel_scale_uas 28, plate_scale_mas_per_mm 32, star_fwhm_uas 36,
        pixels_per_fwhm_q16 40, cutoff_frequency_q16 44, nyquist_pixel_nm 48, diagonal_mas 52);
    layout!(Focuser, 16: motor_step_nm 0, defocus_nm 4, tube_length_um 8, expansion_ppb_per_k 12);
    layout!(FocusReadout, 36: available 0, facts 4, focal_ratio_q16 8, depth_nm 12, depth_steps 16, temperature_mk 20,
        blur_nm 24, blur_angle_uas 28, wavefront_nm 32);
    layout!(NewtonianLayout, 40: focus_distance_um 0, lit_field_um 4, edge_offset_um 8, diagonal_um 12,
        axis_height_um 16, reach_um 20, altitude_bam 24, lowest_altitude_bam 28, highest_altitude_bam 32,
        height_limit_um 36);
    layout!(NewtonianReadout, 40: available 0, facts 4, diagonal_um 8, diagonal_offset_um 12, obstruction_q16 16,
        beam_um 20, beam_shift_um 24, edge_light_q16 28, eyepiece_height_um 32, greatest_height_um 36);
    layout!(TwoMirrorLayout, 12: primary_focal_um 0, back_focus_um 4, lit_field_um 8);
    layout!(TwoMirrorReadout, 36: available 0, facts 4, secondary_magnification_q16 8, separation_um 12,
        secondary_um 16, secondary_radius_um 20, obstruction_q16 24, length_um 28, length_share_q16 32);
}

/// Every size of number about as often, with the edges.
fn any_size() -> impl Strategy<Value = u32> {
    prop_oneof![
        8 => (any::<u32>(), 0..32u32).prop_map(|(n, shift)| n >> shift),
        1 => Just(0),
        1 => Just(u32::MAX),
    ]
}

prop_compose! {
    fn any_telescope()(aperture_um in any_size(), focal_length_um in any_size(), part in any_size(),
        amplification_q16 in prop_oneof![Just(65_536), any_size()], throughput_q16 in 0..65_540u32) -> Telescope {
        // Mostly under the aperture.
        let obstruction_um = if part % 8 == 0 { part } else { part.checked_rem(aperture_um).unwrap_or(0) };
        Telescope { aperture_um, focal_length_um, obstruction_um, amplification_q16, throughput_q16 }
    }
}

prop_compose! {
    fn any_eyepiece()(focal_length_um in any_size(), field_stop_um in prop_oneof![Just(0), any_size()],
        apparent_field_mas in 0..650_000_000u32, mapping in 0..3u8, padding in any::<[u8; 3]>()) -> Eyepiece {
        Eyepiece { focal_length_um, field_stop_um, apparent_field_mas, mapping, padding }
    }
}

prop_compose! {
    fn any_camera()(pixel_nm in any_size(), columns in any::<u16>(), rows in any::<u16>(), binning in any::<u8>(),
        padding in any::<[u8; 3]>()) -> Camera {
        Camera { pixel_nm, columns, rows, binning, padding }
    }
}

prop_compose! {
    fn any_observer()(naked_eye_mmag in any::<i32>(), eye_pupil_um in any_size(), eye_resolution_mas in any_size(),
        seeing_uas in any_size(), wavelength_nm in any_size()) -> Observer {
        Observer { naked_eye_mmag, eye_pupil_um, eye_resolution_mas, seeing_uas, wavelength_nm }
    }
}

fn first_bad(checks: [Result<(), Error>; 3]) -> Option<Error> {
    let position = checks.iter().position(Result::is_err)?;
    Some(Error::new(checks[position].unwrap_err().cause(), position as u8 + 1))
}

proptest! {
    #![proptest_config(ProptestConfig { failure_persistence: None, ..ProptestConfig::with_cases(2000) })]

    #[test]
    fn any_visual_readout_is_the_direct_calls(t in any_telescope(), e in any_eyepiece(), o in any_observer(),
        wanted in prop_oneof![Just(u32::MAX), any::<u32>()]) {
        let seen = VisualReadout::compute(&t, &e, &o, wanted);
        match first_bad([t.check(), e.check(), o.check()]) {
            Some(error) => prop_assert_eq!(seen, Err(error)),
            None => {
                let seen = seen.unwrap();
                assert_values(wanted, seen.available, visual_values(&seen), expected_visual(&t, &e, &o));
            }
        }
    }

    #[test]
    fn any_camera_readout_is_the_direct_calls(t in any_telescope(), c in any_camera(), o in any_observer(),
        wanted in prop_oneof![Just(u32::MAX), any::<u32>()]) {
        let taken = CameraReadout::compute(&t, &c, &o, wanted);
        match first_bad([t.check(), c.check(), o.check()]) {
            Some(error) => prop_assert_eq!(taken, Err(error)),
            None => {
                let taken = taken.unwrap();
                assert_values(wanted, taken.available, camera_values(&taken), expected_camera(&t, &c, &o));
            }
        }
    }
}

mod c {
    use super::*;
    use fieldstop::capi::setup::*;
    use std::ptr::{null, null_mut};

    const BEFORE: u32 = 0xa5a5_a5a5;

    fn null_status(position: u8) -> u16 {
        Error::new(Cause::NullPointer, position).status()
    }

    fn status(result: Result<(), Error>) -> u16 {
        result.map_or_else(Error::status, |()| 0)
    }

    #[test]
    fn checks_are_those_of_rust() {
        let bad_telescope = Telescope { obstruction_um: u32::MAX, ..TELESCOPE };
        let bad_eyepiece = Eyepiece { mapping: 9, ..EYEPIECE };
        let bad_camera = Camera { rows: 0, ..CAMERA };
        let bad_observer = Observer { wavelength_nm: 0, ..OBSERVER };
        // SAFETY: null, or references.
        unsafe {
            assert_eq!(fieldstop_telescope_check(null()), null_status(1));
            assert_eq!(fieldstop_eyepiece_check(null()), null_status(1));
            assert_eq!(fieldstop_camera_check(null()), null_status(1));
            assert_eq!(fieldstop_observer_check(null()), null_status(1));
            assert_eq!(fieldstop_telescope_check(&TELESCOPE), 0);
            assert_eq!(fieldstop_eyepiece_check(&EYEPIECE), 0);
            assert_eq!(fieldstop_camera_check(&CAMERA), 0);
            assert_eq!(fieldstop_observer_check(&OBSERVER), 0);
            assert_eq!(fieldstop_telescope_check(&bad_telescope), status(bad_telescope.check()));
            assert_eq!(fieldstop_eyepiece_check(&bad_eyepiece), status(bad_eyepiece.check()));
            assert_eq!(fieldstop_camera_check(&bad_camera), status(bad_camera.check()));
            assert_eq!(fieldstop_observer_check(&bad_observer), status(bad_observer.check()));
        }
    }

    #[test]
    fn readouts_are_those_of_rust() {
        for wanted in [0, 0x15, VisualReadout::ALL, u32::MAX] {
            let mut seen = VisualReadout { facts: BEFORE, ..VisualReadout::default() };
            let mut taken = CameraReadout { facts: BEFORE, ..CameraReadout::default() };
            // SAFETY: references.
            unsafe {
                let status =
                    fieldstop_visual_readout_compute(&TELESCOPE, &EYEPIECE, &OBSERVER, wanted, &mut seen);
                assert_eq!((status, seen), (0, visual(wanted)));
                let status =
                    fieldstop_camera_readout_compute(&TELESCOPE, &CAMERA, &OBSERVER, wanted, &mut taken);
                assert_eq!((status, taken), (0, camera(wanted)));
            }
        }
    }

    /// Null pointers come first, from left to right, then the structs; the readout stays as it was.
    #[test]
    fn refusals_come_in_order_and_write_nothing() {
        let telescope = &Telescope { aperture_um: 0, ..TELESCOPE };
        let eyepiece = &Eyepiece { mapping: 9, ..EYEPIECE };
        let camera = &Camera { rows: 0, ..CAMERA };
        let observer = &Observer { wavelength_nm: 0, ..OBSERVER };
        let before = VisualReadout { available: BEFORE, facts: BEFORE, ..VisualReadout::default() };
        let mut seen = before;
        let out = &mut seen as *mut VisualReadout;
        // SAFETY: null, or references.
        unsafe {
            use fieldstop_visual_readout_compute as compute;
            assert_eq!(compute(null(), null(), null(), 0, null_mut()), null_status(1));
            assert_eq!(compute(telescope, null(), null(), 0, null_mut()), null_status(2));
            assert_eq!(compute(telescope, eyepiece, null(), 0, null_mut()), null_status(3));
            assert_eq!(compute(telescope, eyepiece, observer, 0, null_mut()), null_status(5));
            assert_eq!(compute(telescope, eyepiece, null(), 0, out), null_status(3));
            assert_eq!(compute(telescope, eyepiece, observer, 0, out), 0x0102);
            assert_eq!(compute(&TELESCOPE, eyepiece, observer, 0, out), 0x0203);
            assert_eq!(compute(&TELESCOPE, &EYEPIECE, observer, 0, out), 0x0302);
        }
        assert_eq!(seen, before);

        let before = CameraReadout { available: BEFORE, facts: BEFORE, ..CameraReadout::default() };
        let mut taken = before;
        let out = &mut taken as *mut CameraReadout;
        // SAFETY: null, or references.
        unsafe {
            use fieldstop_camera_readout_compute as compute;
            assert_eq!(compute(null(), null(), null(), 0, null_mut()), null_status(1));
            assert_eq!(compute(telescope, null(), null(), 0, null_mut()), null_status(2));
            assert_eq!(compute(telescope, camera, null(), 0, null_mut()), null_status(3));
            assert_eq!(compute(telescope, camera, observer, 0, null_mut()), null_status(5));
            assert_eq!(compute(telescope, camera, null(), 0, out), null_status(3));
            assert_eq!(compute(telescope, camera, observer, 0, out), 0x0102);
            assert_eq!(compute(&TELESCOPE, camera, observer, 0, out), 0x0202);
            assert_eq!(compute(&TELESCOPE, &CAMERA, observer, 0, out), 0x0302);
        }
        assert_eq!(taken, before);
    }
}
