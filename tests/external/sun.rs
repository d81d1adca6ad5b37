use super::near;
use fieldstop::sky::sun::*;
use fieldstop::units::{Bam, Micrometres, SignedBam};

/// Right ascension and declination in degrees, of the fixed and of the float form.
fn places(unix: u32) -> [(f64, f64); 2] {
    let degrees = |bam: f64| bam * 360.0 / 4294967296.0;
    let fixed = (sun_right_ascension_fx(unix).unwrap().0 as f64, sun_declination_fx(unix).unwrap().0 as f64);
    [
        (degrees(fixed.0), degrees(fixed.1)),
        (sun_right_ascension(unix).unwrap(), sun_declination(unix).unwrap()),
    ]
}

/// The angle on the sky between two places that are near each other.
fn apart(a: (f64, f64), b: (f64, f64)) -> f64 {
    let along = (a.0 - b.0 + 540.0).rem_euclid(360.0) - 180.0;
    (along * b.1.to_radians().cos()).hypot(a.1 - b.1)
}

#[track_caller]
fn check(unix: u32, right_ascension: f64, declination: f64) -> f64 {
    let off = places(unix).map(|place| apart(place, (right_ascension, declination)));
    assert!(off[0].max(off[1]) < 0.02, "{unix}: {off:?} degrees off");
    off[0].max(off[1])
}

#[test]
fn a_published_place() {
    // Meeus, Astronomical Algorithms, example 25.a and b: 1992 October 13, 0 h dynamical time, 59 s before this.
    check(718_934_400, 198.380_83, -7.785_07);
}

#[test]
fn seasons() {
    // The Astronomical Almanac, equinoxes and solstices (from memory), to the minute of universal time: right ascension of
    // the quarter, and the obliquity of the ecliptic.
    for (unix, right_ascension, declination) in [
        (953_537_700, 0.0, 0.0),         // 2000 March 20, 7 h 35
        (961_552_080, 90.0, 23.439),     // 2000 June 21, 1 h 48
        (969_643_680, 180.0, 0.0),       // 2000 September 22, 17 h 28
        (977_405_820, 270.0, -23.439),   // 2000 December 21, 13 h 37
        (1_608_544_920, 270.0, -23.436), // 2020 December 21, 10 h 02
        (1_718_916_660, 90.0, 23.436),   // 2024 June 20, 20 h 51
    ] {
        check(unix, right_ascension, declination);
    }
}

#[test]
fn apparent_places_from_1970_to_2100() {
    // astropy's apparent places, of ERFA's ephemeris: sun_places.py.
    let mut worst = 0.0f64;
    let mut count = 0;
    for line in include_str!("sun_places.csv").lines() {
        let numbers: Vec<f64> = line.split(',').map(|x| x.parse().unwrap()).collect();
        let (unix, east, north) = (numbers[0] as u32, numbers[1], numbers[2]);
        worst = worst.max(check(unix, east, north));
        // A telescope on the true Sun is told that it is there, and one opposite that it is opposite.
        let bam = |degrees: f64| (degrees / 360.0 * 4294967296.0).round();
        let (east_bam, north_bam) = (bam(east) as u32, bam(north) as i32);
        let fixed =
            |east, north| sun_clearance_fx(Bam(east), SignedBam(north), unix).unwrap().0 as f64 / 3.6e6;
        near(fixed(east_bam, north_bam), 0.0, 0.02);
        near(fixed(east_bam.wrapping_add(1 << 31), -north_bam), 180.0, 0.02);
        near(sun_clearance(east, north, unix).unwrap() / 3600.0, 0.0, 0.02);
        near(sun_clearance((east + 180.0) % 360.0, -north, unix).unwrap() / 3600.0, 180.0, 0.02);
        count += 1;
    }
    println!("the Sun: {worst:.5} degrees off at worst, of {count} places");
    assert_eq!(count, 503);
    // The worst moment of 63310 is among them.
    near(worst, 0.0167, 0.0001);
}

#[test]
fn clearances_by_the_seasons() {
    // At a solstice the Sun is as far from a pole as the obliquity leaves, at an equinox a quarter of the sky from both, and
    // a quarter from the other equinox's points (Meeus, Astronomical Algorithms, 25 to 27; the moments as above).
    for (unix, east, north, published) in [
        (961_552_080, 0.0, 90.0, 90.0 - 23.439),
        (977_405_820, 123.0, 90.0, 90.0 + 23.439),
        (953_537_700, 77.0, -90.0, 90.0),
        (953_537_700, 90.0, 0.0, 90.0),
        (953_537_700, 180.0, 0.0, 180.0),
        (961_552_080, 270.0, -23.439, 180.0),
    ] {
        let bam = |degrees: f64| (degrees / 360.0 * 4294967296.0).round();
        near(sun_clearance(east, north, unix).unwrap() / 3600.0, published, 0.02);
        let fixed = sun_clearance_fx(Bam(bam(east) as u32), SignedBam(bam(north) as i32), unix).unwrap();
        near(fixed.0 as f64 / 3.6e6, published, 0.02);
    }
}

#[test]
fn light_through_an_aperture() {
    let check = |mm: f64, published: f64, tolerance: f64| {
        near(collected_sunlight(mm).unwrap(), published, tolerance);
        let um = Micrometres((mm * 1e3).round() as u32);
        near(collected_sunlight_fx(um).unwrap().0 as f64, published, tolerance + 0.5);
    };
    // A square metre is a disc of 1128.379 mm, and takes in a kilowatt (common practice; ASTM G173: 1000.4 W/m^2).
    check(1_128.379_167, 1e6, 1e-2);
    // A finder of 50 mm: two watts.
    check(50.0, 1963.5, 0.1);
}
