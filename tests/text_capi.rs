//! The C functions of `text`: null pointers by position, then the same characters and statuses as in Rust.

use core::ffi::{CStr, c_char};
use core::ptr::{null, null_mut};
use fieldstop::capi::text::*;
use fieldstop::capi::text_caution::*;
use fieldstop::capi::text_focus::*;
use fieldstop::capi::text_newtonian::*;
use fieldstop::capi::text_two_mirror::*;
use fieldstop::setup::{CameraReadout, FocusReadout, NewtonianReadout, TwoMirrorReadout, VisualReadout};
use fieldstop::text::*;
use fieldstop::units::*;
use proptest::prelude::*;

const ASCII: &TextStyle = &TextStyle::ASCII;

/// One call: style, text, capacity, length. The rest is bound.
type Call<'a> = &'a dyn Fn(*const TextStyle, *mut c_char, u16, *mut u16) -> u16;

/// Nulls are refused at their positions and change nothing; then the call is worth `expected`.
fn check(call: Call, positions: [u16; 3], expected: Result<&str, u16>) {
    let mut out = [0x55u8; 64];
    let mut length = 0xabcd;
    let text = out.as_mut_ptr().cast();
    for (position, status) in [
        (positions[0], call(null(), text, 64, &mut length)),
        (positions[1], call(ASCII, null_mut(), 64, &mut length)),
        (positions[2], call(ASCII, text, 64, null_mut())),
        (positions[0], call(null(), null_mut(), 64, null_mut())),
    ] {
        assert_eq!(status, position << 8 | 1);
        assert_eq!((out, length), ([0x55; 64], 0xabcd));
    }
    match expected {
        Ok(expected) => {
            let short = expected.len() as u16 - 1;
            assert_eq!(call(ASCII, text, short, &mut length), 6, "{expected}");
            assert_eq!((out, length), ([0x55; 64], 0xabcd));
            assert_eq!(call(ASCII, text, short + 1, &mut length), 0);
            assert_eq!(std::str::from_utf8(&out[..length.into()]).unwrap(), expected);
            assert!(out[length.into()..].iter().all(|&byte| byte == 0x55));
        }
        Err(expected) => {
            assert_eq!(call(ASCII, text, 64, &mut length), expected);
            assert_eq!((out, length), ([0x55; 64], 0xabcd));
        }
    }
}

macro_rules! values {
    ($($function:ident($($argument:expr),*) at $position:literal: $expected:expr;)*) => {$(
        check(
            &|style, text, capacity, length| unsafe {
                $function($($argument,)* style, 9, text, capacity, length)
            },
            [$position, $position + 2, $position + 4],
            $expected,
        );
    )*};
}

#[test]
fn values() {
    values! {
        fieldstop_text_count(4096, FIELDSTOP_UNIT_PIXEL) at 3: Ok("  4096 px");
        fieldstop_text_count(4096, 22) at 3: Err(0x0203);
        fieldstop_text_length_mm(5012, 1) at 3: Ok("   5.0 mm");
        fieldstop_text_length_mm(5012, 4) at 3: Err(0x0203);
        fieldstop_text_length_um(3760, 2) at 3: Ok("  3.76 um");
        fieldstop_text_length_um(3760, 4) at 3: Err(0x0203);
        fieldstop_text_ratio(0x5555, 2) at 3: Ok("     0.33");
        fieldstop_text_ratio(0x5555, 5) at 3: Err(0x0203);
        fieldstop_text_magnification(0x3e_8000, 1) at 3: Ok("    62.5x");
        fieldstop_text_magnification(0x3e_8000, 5) at 3: Err(0x0203);
        fieldstop_text_focal_ratio(0x6_0000, 1) at 3: Ok("    f/6.0");
        fieldstop_text_focal_ratio(0x6_0000, 5) at 3: Err(0x0203);
        fieldstop_text_percent(0xe3d7, 0) at 3: Ok("      89%");
        fieldstop_text_percent(0xe3d7, 3) at 3: Err(0x0203);
        fieldstop_text_arcseconds(832_123, 3) at 3: Ok("   0.832\"");
        fieldstop_text_arcseconds(832_123, 7) at 3: Err(0x0203);
        fieldstop_text_magnitude(-1460, 2) at 3: Ok("-1.46 mag");
        fieldstop_text_magnitude(-1460, 4) at 3: Err(0x0203);
        fieldstop_text_magnitude(-11_460, 2) at 3: Err(6);
        fieldstop_text_angle(3_599_600, FIELDSTOP_ANGLE_BY_SIZE, 0) at 4: Ok("    1d00'");
        fieldstop_text_angle(4_354_200, FIELDSTOP_ANGLE_DECIMAL_DEGREES, 2) at 4: Ok(" 1.21 deg");
        fieldstop_text_angle(4_354_200, FIELDSTOP_ANGLE_DEGREES_MINUTES, 0) at 4: Ok("    1d13'");
        fieldstop_text_angle(4_354_200, FIELDSTOP_ANGLE_MINUTES_SECONDS, 0) at 4: Ok(" 1d12'34\"");
        fieldstop_text_angle(4_354_200, FIELDSTOP_ANGLE_DECIMAL_SECONDS, 1) at 4: Ok("  4354.2\"");
        fieldstop_text_angle(4_354_200, FIELDSTOP_ANGLE_MINUTES_SECONDS, 3) at 4: Err(0x0303);
        fieldstop_text_angle(4_354_200, 5, 200) at 4: Err(0x0203);
    }
}

#[test]
fn units() {
    let unit = |number| {
        move |style, text, capacity, length| unsafe {
            fieldstop_text_unit(number, style, text, capacity, length)
        }
    };
    for number in 1..=21 {
        let text = TextStyle::ASCII.unit(Unit::from_number(number).unwrap());
        check(&unit(number), [2, 3, 5], Ok(std::str::from_utf8(text).unwrap()));
    }
    check(&unit(22), [2, 3, 5], Err(0x0103));
    let mut length = 1u16;
    assert_eq!(unit(0)(ASCII as *const TextStyle, [0; 1].as_mut_ptr(), 0, &mut length as *mut u16), 0);
    assert_eq!(length, 0);
}

fn visual() -> VisualReadout {
    VisualReadout {
        available: VisualReadout::ALL,
        facts: VisualReadout::FACT_WIDE_EXIT_PUPIL,
        focal_length_um: 1_000_000,
        focal_ratio_q16: 5 << 16,
        magnification_q16: (62 << 16) + 0x8000,
        exit_pupil_um: 7_250,
        true_field_mas: 4_354_200,
        limiting_magnitude_mmag: 13_449,
        ..VisualReadout::default()
    }
}

fn camera() -> CameraReadout {
    CameraReadout {
        available: CameraReadout::ALL,
        facts: CameraReadout::FACT_COARSE_SAMPLING,
        pixel_scale_uas: 1_567_800,
        frame_width_mas: 4_826_000,
        ..CameraReadout::default()
    }
}

macro_rules! pages {
    ($readout:expr, $row_of:ident, $Row:ident, $line_of:ident, $labels:ident,
     $line:ident, $value:ident, $number:ident, $unit:ident, $c_labels:ident) => {{
        let readout = &$readout;
        let labels = $c_labels();
        let mut out = [0; 64];
        let mut length = 0;
        for row in $Row::ALL {
            let shown = $row_of(readout, row);
            let mut expected = [0; 64];
            let mut written = |value: Value, width| {
                let length = value.write(ASCII, width, &mut expected).unwrap();
                std::str::from_utf8(&expected[..length]).unwrap().to_string()
            };
            let row = row as u8;
            let (whole, bare) = (written(shown.value, 12), written(shown.value.without_unit(), 12));
            check(&|s, t, c, l| unsafe { $value(readout, row, s, 12, t, c, l) }, [3, 5, 7], Ok(&whole));
            check(&|s, t, c, l| unsafe { $number(readout, row, s, 12, t, c, l) }, [3, 5, 7], Ok(&bare));
            let unit = std::str::from_utf8(ASCII.unit(shown.value.unit())).unwrap();
            let call: Call = &|s, t, c, l| unsafe { $unit(readout, row, s, t, c, l) };
            if unit.is_empty() {
                assert_eq!(call(ASCII, out.as_mut_ptr(), 0, &mut length), 0);
                assert_eq!(length, 0);
            } else {
                check(call, [3, 4, 6], Ok(unit));
            }
        }
        let past = $Row::ALL.len() as u8;
        check(&|s, t, c, l| unsafe { $value(readout, past, s, 12, t, c, l) }, [3, 5, 7], Err(0x0203));
        check(&|s, t, c, l| unsafe { $number(readout, past, s, 12, t, c, l) }, [3, 5, 7], Err(0x0203));
        check(&|s, t, c, l| unsafe { $unit(readout, past, s, t, c, l) }, [3, 4, 6], Err(0x0203));
        for columns in [8, 16, 20, 40] {
            for line in 0..=255 {
                let mut expected = [0; 64];
                let length = $line_of(readout, &$labels, ASCII, columns, line, &mut expected).unwrap();
                let expected = std::str::from_utf8(&expected[..length]).unwrap();
                check(
                    &|s, t, c, l| unsafe { $line(readout, labels, s, columns, line, t, c, l) },
                    [3, 6, 8],
                    Ok(expected),
                );
            }
        }
        check(&|s, t, c, l| unsafe { $line(readout, labels, s, 7, 0, t, c, l) }, [3, 6, 8], Err(0x0403));
        let (text, length) = (out.as_mut_ptr(), &mut length as *mut u16);
        unsafe {
            assert_eq!($value(null(), 0, ASCII, 0, text, 64, length), 0x0101);
            assert_eq!($number(null(), 0, ASCII, 0, text, 64, length), 0x0101);
            assert_eq!($unit(null(), 0, ASCII, text, 64, length), 0x0101);
            assert_eq!($line(null(), null(), null(), 0, 0, null_mut(), 0, null_mut()), 0x0101);
            assert_eq!($line(readout, null(), null(), 0, 0, null_mut(), 0, null_mut()), 0x0201);
            // A label that is null is empty.
            let none = [null(); $Row::ALL.len()];
            assert_eq!($line(readout, none.as_ptr(), ASCII, 20, 0, text, 64, length), 0);
            assert_eq!(out[..8], [b' ' as c_char; 8]);
        }
    }};
}

#[test]
fn visual_pages() {
    pages!(
        visual(),
        visual_row,
        VisualRow,
        visual_line,
        VISUAL_LABELS,
        fieldstop_text_visual_line,
        fieldstop_text_visual_value,
        fieldstop_text_visual_number,
        fieldstop_text_visual_unit,
        fieldstop_text_visual_labels
    );
}

#[test]
fn camera_pages() {
    pages!(
        camera(),
        camera_row,
        CameraRow,
        camera_line,
        CAMERA_LABELS,
        fieldstop_text_camera_line,
        fieldstop_text_camera_value,
        fieldstop_text_camera_number,
        fieldstop_text_camera_unit,
        fieldstop_text_camera_labels
    );
}

#[test]
fn layout_pages() {
    let focus = FocusReadout {
        available: 0x7d,
        facts: 3,
        depth_steps: 31,
        blur_nm: 3_500,
        ..FocusReadout::default()
    };
    pages!(
        focus,
        focus_row,
        FocusRow,
        focus_line,
        FOCUS_LABELS,
        fieldstop_text_focus_line,
        fieldstop_text_focus_value,
        fieldstop_text_focus_number,
        fieldstop_text_focus_unit,
        fieldstop_text_focus_labels
    );
    let newtonian = NewtonianReadout {
        available: 0xef,
        facts: 9,
        obstruction_q16: 16_000,
        eyepiece_height_um: 1_724_000,
        ..NewtonianReadout::default()
    };
    pages!(
        newtonian,
        newtonian_row,
        NewtonianRow,
        newtonian_line,
        NEWTONIAN_LABELS,
        fieldstop_text_newtonian_line,
        fieldstop_text_newtonian_value,
        fieldstop_text_newtonian_number,
        fieldstop_text_newtonian_unit,
        fieldstop_text_newtonian_labels
    );
    let mirrors =
        TwoMirrorReadout { available: 0x5f, facts: 1, separation_um: 612_345, ..TwoMirrorReadout::default() };
    pages!(
        mirrors,
        two_mirror_row,
        TwoMirrorRow,
        two_mirror_line,
        TWO_MIRROR_LABELS,
        fieldstop_text_two_mirror_line,
        fieldstop_text_two_mirror_value,
        fieldstop_text_two_mirror_number,
        fieldstop_text_two_mirror_unit,
        fieldstop_text_two_mirror_labels
    );
}

#[test]
fn cautions() {
    for (number, sentence) in [
        (FIELDSTOP_CAUTION_HIGH_EYEPIECE, HIGH_EYEPIECE_CAUTION),
        (FIELDSTOP_CAUTION_SUN, SUN_CAUTION),
        (2, ""),
        (255, ""),
    ] {
        let given = fieldstop_text_caution(number);
        assert_eq!(unsafe { CStr::from_ptr(given) }.to_str(), Ok(sentence));
        for columns in [8, 16, 20, 40] {
            let lines = unsafe { fieldstop_text_caution_lines(given, columns) };
            assert_eq!(lines, caution_lines(sentence, columns));
            for line in [0, 1, lines, 255] {
                let mut expected = [0; 64];
                let length = caution_line(sentence, columns, line, &mut expected).unwrap();
                let mut text = [0x55; 64];
                let mut given_length = 0;
                let call = |text, capacity, length| unsafe {
                    fieldstop_text_caution_line(given, columns, line, text, capacity, length)
                };
                assert_eq!(call(null_mut(), 64, &mut given_length), 0x0401);
                assert_eq!(call(text.as_mut_ptr().cast(), 64, null_mut()), 0x0601);
                assert_eq!(call(text.as_mut_ptr().cast(), u16::from(columns) - 1, &mut given_length), 6);
                assert_eq!((text, given_length), ([0x55; 64], 0));
                assert_eq!(call(text.as_mut_ptr().cast(), 64, &mut given_length), 0);
                assert_eq!((usize::from(given_length), &text[..length]), (length, &expected[..length]));
            }
        }
    }
    let mut length = 0;
    let mut text = [0; 64];
    unsafe {
        assert_eq!(fieldstop_text_caution_line(null(), 20, 0, text.as_mut_ptr(), 64, &mut length), 0x0101);
        let some = fieldstop_text_caution(0);
        assert_eq!(fieldstop_text_caution_line(some, 7, 0, text.as_mut_ptr(), 64, &mut length), 0x0203);
        assert_eq!(fieldstop_text_caution_lines(null(), 20), 0);
    }
}

#[test]
fn labels_and_styles() {
    let same = |labels: *const *const c_char, expected: &[&str]| {
        for (at, expected) in expected.iter().enumerate() {
            assert_eq!(unsafe { CStr::from_ptr(*labels.add(at)) }.to_str().unwrap(), *expected);
        }
    };
    same(fieldstop_text_visual_labels(), &VISUAL_LABELS);
    same(fieldstop_text_visual_labels_short(), &VISUAL_LABELS_SHORT);
    same(fieldstop_text_camera_labels(), &CAMERA_LABELS);
    same(fieldstop_text_camera_labels_short(), &CAMERA_LABELS_SHORT);
    same(fieldstop_text_focus_labels(), &FOCUS_LABELS);
    same(fieldstop_text_focus_labels_short(), &FOCUS_LABELS_SHORT);
    same(fieldstop_text_newtonian_labels(), &NEWTONIAN_LABELS);
    same(fieldstop_text_newtonian_labels_short(), &NEWTONIAN_LABELS_SHORT);
    same(fieldstop_text_two_mirror_labels(), &TWO_MIRROR_LABELS);
    same(fieldstop_text_two_mirror_labels_short(), &TWO_MIRROR_LABELS_SHORT);
    unsafe {
        assert_eq!(*fieldstop_text_style_ascii(), TextStyle::ASCII);
        assert_eq!(*fieldstop_text_style_utf8(), TextStyle::UTF8);
        assert_eq!(*fieldstop_text_style_hd44780_a00(), TextStyle::HD44780_A00);
        assert_eq!(*fieldstop_text_style_hd44780_a02(), TextStyle::HD44780_A02);
    }
}

#[test]
fn changed_span() {
    let (shown, line) = ("Exit pupil    5.0 mm", "Exit pupil    4.8 mm");
    let mut span = Span { first: 7, count: 7 };
    let call = |shown: *const u8, line: *const u8, style, span| unsafe {
        fieldstop_text_changed(shown.cast(), 20, line.cast(), 20, style, span)
    };
    assert_eq!(call(null(), null(), null(), null_mut()), 0x0101);
    assert_eq!(call(shown.as_ptr(), null(), null(), null_mut()), 0x0301);
    assert_eq!(call(shown.as_ptr(), line.as_ptr(), null(), null_mut()), 0x0501);
    assert_eq!(call(shown.as_ptr(), line.as_ptr(), ASCII, null_mut()), 0x0601);
    assert_eq!(span, Span { first: 7, count: 7 });
    assert_eq!(call(shown.as_ptr(), line.as_ptr(), ASCII, &mut span), 0);
    assert_eq!(span, Span { first: 14, count: 3 });
    assert_eq!(call(line.as_ptr(), line.as_ptr(), ASCII, &mut span), 0);
    assert_eq!(span.count, 0);
}

/// What C sees as numbers are the numbers of the Rust enums.
#[test]
fn constants() {
    assert_eq!(usize::from(FIELDSTOP_VISUAL_ROWS), VisualRow::ALL.len());
    assert_eq!(usize::from(FIELDSTOP_CAMERA_ROWS), CameraRow::ALL.len());
    assert_eq!(FIELDSTOP_VISUAL_ROW_SEEING_LIMITED, VisualRow::SeeingLimited as u8);
    assert_eq!(FIELDSTOP_VISUAL_ROW_EXIT_PUPIL, VisualRow::ExitPupil as u8);
    assert_eq!(FIELDSTOP_CAMERA_ROW_T_NUMBER, CameraRow::TNumber as u8);
    assert_eq!(FIELDSTOP_CAMERA_ROW_FINE_SAMPLING, CameraRow::FineSampling as u8);
    assert_eq!(usize::from(FIELDSTOP_FOCUS_ROWS), FocusRow::ALL.len());
    assert_eq!(FIELDSTOP_FOCUS_ROW_OUT_OF_FOCUS, FocusRow::OutOfFocus as u8);
    assert_eq!(usize::from(FIELDSTOP_NEWTONIAN_ROWS), NewtonianRow::ALL.len());
    assert_eq!(FIELDSTOP_NEWTONIAN_ROW_HIGH_REACHED, NewtonianRow::HighReached as u8);
    assert_eq!(usize::from(FIELDSTOP_TWO_MIRROR_ROWS), TwoMirrorRow::ALL.len());
    assert_eq!(FIELDSTOP_TWO_MIRROR_ROW_WIDER_THAN_TOLD, TwoMirrorRow::WiderThanTold as u8);
    for number in 0..=255 {
        if let Some(unit) = Unit::from_number(number) {
            assert_eq!(unit as u8, number);
        }
        if let Some(form) = AngleForm::from_number(number) {
            assert_eq!(form as u8, number);
        }
    }
    assert_eq!((FIELDSTOP_UNIT_WATT, FIELDSTOP_UNIT_FOCAL_RATIO), (Unit::Watt as u8, Unit::FocalRatio as u8));
}

/// What C and Rust say to the same value, in a buffer of one size and behind it.
fn the_same(
    value: Value,
    width: u8,
    capacity: u16,
    call: impl Fn(*const TextStyle, *mut c_char, u16, *mut u16) -> u16,
) {
    for style in [&TextStyle::ASCII, &TextStyle::UTF8] {
        let (mut of_c, mut of_rust) = ([0x55u8; 40], [0x55u8; 40]);
        let mut length = 0xabcd;
        let status = call(style, of_c.as_mut_ptr().cast(), capacity, &mut length);
        match value.write(style, width, &mut of_rust[..capacity.into()]) {
            Ok(bytes) => assert_eq!((status, usize::from(length)), (0, bytes), "{value:?}"),
            Err(error) => assert_eq!((status & 0xff, length), (error.cause() as u16, 0xabcd), "{value:?}"),
        }
        assert_eq!(of_c, of_rust, "{value:?}");
    }
}

proptest! {
    #![proptest_config(ProptestConfig::with_cases(4096))]
    /// C has a short way of its own.
    #[test]
    fn c_writes_what_rust_writes(
        bits in 0u32..=32, drawn: u32, decimals in 0u8..=5, width in 0u8..=12, capacity in 0u16..=14, form in 0u8..=4,
    ) {
        let n = (u64::from(drawn) & ((1 << bits) - 1)) as u32;
        the_same(Value::millimetres(Micrometres(n), decimals), width, capacity, |style, text, capacity, length| unsafe {
            fieldstop_text_length_mm(n, decimals, style, width, text, capacity, length)
        });
        the_same(Value::magnification(Q16(n), decimals), width, capacity, |style, text, capacity, length| unsafe {
            fieldstop_text_magnification(n, decimals, style, width, text, capacity, length)
        });
        the_same(Value::magnitude(Millimagnitudes(n as i32), decimals), width, capacity, |style, text, capacity, length| unsafe {
            fieldstop_text_magnitude(n as i32, decimals, style, width, text, capacity, length)
        });
        the_same(Value::count(n, Unit::SecondPerMillimetre), width, capacity, |style, text, capacity, length| unsafe {
            fieldstop_text_count(n, FIELDSTOP_UNIT_SECOND_PER_MILLIMETRE, style, width, text, capacity, length)
        });
        let angle_form = AngleForm::from_number(form).unwrap();
        the_same(Value::angle(Milliarcseconds(n), angle_form, decimals), width, capacity, |style, text, capacity, length| unsafe {
            fieldstop_text_angle(n, form, decimals, style, width, text, capacity, length)
        });
    }
}
