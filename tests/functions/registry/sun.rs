use super::super::big::{Big, big, decimal};
use super::motion::{cosine, sine};
use super::*;
use crate::big::{pi, radian};

const UNIX: Argument = ordinary("unix_s", COUNT, (1_500_000_000, 2_500_000_000)).under(4_102_444_800);
const MW: Unit = PLAIN;

fn degrees(radians: Big) -> Big {
    radians * radian() / big(3600.0)
}

/// From 0 to under 360.
fn whole(x: Big) -> Big {
    &x - (&x / big(360.0)).floor() * big(360.0)
}

/// Longitude and obliquity in degrees.
fn ecliptic(unix: &Big) -> (Big, Big) {
    let days = unix / big(86_400.0) - big(10_957.5);
    let anomaly = whole(decimal("357.528") + decimal("0.9856003") * &days);
    let mean = decimal("280.460") + decimal("0.9856474") * &days;
    let twice = whole(big(2.0) * &anomaly);
    let centre = decimal("1.915") * sine(&anomaly) + decimal("0.020") * sine(&twice);
    (whole(mean + centre), decimal("23.439") - decimal("0.0000004") * days)
}

fn right_ascension(a: &[Big]) -> Big {
    let (longitude, obliquity) = ecliptic(&a[0]);
    let (east, north) = (cosine(&obliquity) * sine(&longitude), cosine(&longitude));
    let angle = degrees((&east / &north).atan());
    whole(if north < big(0.0) { angle + big(180.0) } else { angle })
}

fn declination(a: &[Big]) -> Big {
    let (longitude, obliquity) = ecliptic(&a[0]);
    let x = sine(&obliquity) * sine(&longitude);
    degrees((&x / (big(1.0) - &x * &x).sqrt()).atan())
}

/// 2 atan sqrt(hav / (1 - hav)) in arcseconds, hav = sin^2(difference of declinations / 2) and so on.
fn clearance(a: &[Big]) -> Big {
    let sun = [right_ascension(&a[2..]), declination(&a[2..])];
    let half_sine = |x: Big| sine(&(x / big(2.0)));
    let (north, east) = (half_sine(&a[1] - &sun[1]), half_sine(&a[0] - &sun[0]));
    let haversine = &north * &north + cosine(&a[1]) * cosine(&sun[1]) * &east * &east;
    if haversine >= big(1.0) {
        return big(648_000.0);
    }
    big(2.0) * radian() * (&haversine / (big(1.0) - &haversine)).sqrt().atan()
}

/// Of the expression, not of the Sun.
const PLACE: Owed = Owed { lsb: 5.0, part: 0.0 };
const FLOAT_PLACE: FloatOwed = FloatOwed::Absolute(|_| 1e-10);

pub fn rows() -> Vec<Row> {
    vec![
        Row {
            circle: Some(4294967296.0),
            double_owed: FLOAT_PLACE,
            ..row!(f64 only sun::sun_right_ascension [0 UNIX] -> BAM, PLACE, 0.0, right_ascension,
                sun_right_ascension_fx fieldstop_sun_right_ascension_fx fieldstop_sun_right_ascension_f64)
        },
        Row {
            double_owed: FLOAT_PLACE,
            ..row!(f64 only sun::sun_declination [0 UNIX] -> SIGNED_BAM, PLACE, 0.0, declination,
                sun_declination_fx fieldstop_sun_declination_fx fieldstop_sun_declination_f64)
        },
        Row {
            double_owed: FloatOwed::Absolute(|_| 1e-6),
            ..row!(f64 only sun::sun_clearance [0 ordinary("right_ascension_bam", BAM, (1 << 20, U32)), 1 ordinary("declination_bam", SIGNED_BAM, (1 << 20, 1 << 30)).within(-(1 << 30), 1 << 30), 2 UNIX] -> MAS, Owed { lsb: 4.0, part: 0.0 }, 0.0, clearance,
                sun_clearance_fx fieldstop_sun_clearance_fx fieldstop_sun_clearance_f64)
        },
        row!(sun::collected_sunlight [0 positive("effective_aperture_um", UM, (40_000, 500_000))] -> MW, IRRATIONAL, 2.0,
            |a| pi() / big(4.0) * &a[0] * &a[0],
            collected_sunlight_fx fieldstop_collected_sunlight_fx fieldstop_collected_sunlight_f32 fieldstop_collected_sunlight_f64),
    ]
}
