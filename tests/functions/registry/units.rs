use super::super::big::big;
use super::*;

const DAY: Unit = unit(1.0, 0, U32);
const SIGNED_MAS: Unit = unit(1.0, i32::MIN as i64, i32::MAX as i64);
const BAM: Unit = unit(1.0, 0, U32);
const SIGNED_BAM: Unit = unit(1.0, i32::MIN as i64, i32::MAX as i64);
const MILLI: Unit = unit(1000.0, 0, U32);
const USUAL_BAM: (i64, i64) = (1 << 20, U32);

pub fn rows() -> Vec<Row> {
    vec![
        Row {
            circle: Some(4294967296.0),
            ..row!(fixed only (fieldstop::convert) units::bam_from_mas [0 ordinary("angle_mas", SIGNED_MAS, (1, 648_000_000))] -> BAM, RATIONAL, 0.0, |a| {
            let turns = &a[0] / big(1_296_000_000.0);
            (&turns - turns.floor()) * big(4294967296.0)
        }, bam_from_mas_fx fieldstop_bam_from_mas_fx)
        },
        Row {
            circle: Some(1_296_000_000.0),
            ..row!(fixed only (fieldstop::convert) units::mas_from_bam [0 ordinary("angle_bam", BAM, USUAL_BAM)] -> BAM, RATIONAL, 0.0, |a| &a[0] * big(1_296_000_000.0) / big(4294967296.0), mas_from_bam_fx fieldstop_mas_from_bam_fx)
        },
        row!(fixed only (fieldstop::convert) units::signed_mas_from_bam [0 ordinary("angle_bam", SIGNED_BAM, (1, i32::MAX as i64))] -> SIGNED_MAS, RATIONAL, 0.0, |a| &a[0] * big(1_296_000_000.0) / big(4294967296.0), signed_mas_from_bam_fx fieldstop_signed_mas_from_bam_fx),
        Row {
            circle: Some(4294967296.0),
            ..row!(fixed only (fieldstop::convert) units::bam_from_day_ms [0 ordinary("time_day_ms", DAY, (1, 86_399_999)).under(86_400_000)] -> BAM, RATIONAL, 0.0, |a| &a[0] * big(4294967296.0) / big(86_400_000.0), bam_from_day_ms_fx fieldstop_bam_from_day_ms_fx)
        },
        Row {
            circle: Some(86_400_000.0),
            ..row!(fixed only (fieldstop::convert) units::day_ms_from_bam [0 ordinary("angle_bam", BAM, USUAL_BAM)] -> DAY, RATIONAL, 0.0, |a| &a[0] * big(86_400_000.0) / big(4294967296.0), day_ms_from_bam_fx fieldstop_day_ms_from_bam_fx)
        },
        row!(fixed only (fieldstop::convert) units::milli_from_q16 [0 ordinary("number_q16", Q16, (6_554, 30_000_000))] -> MILLI, RATIONAL, 0.0, |a| a[0].clone(), milli_from_q16_fx fieldstop_milli_from_q16_fx),
        row!(fixed only (fieldstop::convert) units::q16_from_milli [0 ordinary("number_milli", MILLI, (100, 500_000))] -> Q16, RATIONAL, 0.0, |a| a[0].clone(), q16_from_milli_fx fieldstop_q16_from_milli_fx),
    ]
}
