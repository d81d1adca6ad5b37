//! Lines of pages: layout, fixed columns, labels that are cut and values that never are, and what changed.

use fieldstop::Cause;
use fieldstop::setup::{CameraReadout, VisualReadout};
use fieldstop::text::*;
use proptest::prelude::*;

const SCREENS: [u8; 5] = [8, 16, 20, 40, 255];

fn visual() -> VisualReadout {
    VisualReadout {
        available: VisualReadout::ALL,
        facts: VisualReadout::FACT_WIDE_EXIT_PUPIL | VisualReadout::FACT_SEEING_LIMITED,
        focal_length_um: 1_000_000,
        focal_ratio_q16: 5 << 16,
        magnification_q16: (62 << 16) + 0x8000,
        exit_pupil_um: 7_250,
        true_field_mas: 4_354_200,
        resolution_uas: 832_000,
        dawes_limit_uas: 580_000,
        lowest_magnification_q16: 30 << 16,
        resolving_magnification_q16: 288 << 16,
        effective_aperture_um: 186_400,
        limiting_magnitude_mmag: 13_449,
        surface_brightness_q16: 0xb000,
    }
}

fn camera() -> CameraReadout {
    CameraReadout {
        available: CameraReadout::ALL,
        facts: CameraReadout::FACT_COARSE_SAMPLING,
        focal_length_um: 1_000_000,
        focal_ratio_q16: 5 << 16,
        t_number_q16: 375_000,
        frame_width_mas: 4_826_000,
        frame_height_mas: 3_220_000,
        pixel_scale_uas: 1_567_800,
        plate_scale_mas_per_mm: 206_265,
        star_fwhm_uas: 2_512_000,
        pixels_per_fwhm_q16: 105_000,
        cutoff_frequency_q16: 23_831_273,
        nyquist_pixel_nm: 1_375,
        diagonal_mas: 5_801_000,
    }
}

fn whole_page(write: impl Fn(u8, &mut [u8]) -> Result<usize, fieldstop::Error>, lines: usize) -> Vec<String> {
    (0..lines as u8)
        .map(|line| {
            let mut out = [0xaa; 300];
            let length = write(line, &mut out).unwrap();
            String::from_utf8(out[..length].to_vec()).unwrap()
        })
        .collect()
}

fn visual_page(readout: &VisualReadout, labels: &[&str; 16], style: &TextStyle, columns: u8) -> Vec<String> {
    whole_page(|line, out| visual_line(readout, labels, style, columns, line, out), lines(16, columns))
}

fn camera_page(readout: &CameraReadout, labels: &[&str; 14], style: &TextStyle, columns: u8) -> Vec<String> {
    whole_page(|line, out| camera_line(readout, labels, style, columns, line, out), lines(14, columns))
}

#[test]
fn visual_20_columns() {
    let expected = [
        "Magnification  62.5x",
        "True field     1d13'",
        "Exit pupil !  7.3 mm",
        "Resolution !   0.83\"",
        "Stars to    13.4 mag",
        "Surf. bright.    69%",
        "Focal ratio    f/5.0",
        "Focal length 1000 mm",
        "Useful from    30.0x",
        "Useful up to    288x",
        "Dawes limit    0.58\"",
        "Eff. aperture 186 mm",
        "Wide exit pupil  yes",
        "Over-magnified    no",
        "Field estimated   no",
        "Seeing-limited   yes",
    ];
    assert_eq!(visual_page(&visual(), &VISUAL_LABELS, &TextStyle::ASCII, 20), expected);
}

#[test]
fn visual_16_columns() {
    let expected = [
        "Magnif.    62.5x",
        "Field      1d13'",
        "Pupil  !  7.3 mm",
        "Resol. !   0.83\"",
        "Stars   13.4 mag",
        "Surface      69%",
        "F ratio    f/5.0",
        "Focal    1000 mm",
        "Lowest     30.0x",
        "Highest     288x",
        "Dawes      0.58\"",
        "Eff.ap.   186 mm",
        "WidePup      yes",
        "OverMag       no",
        "Est.fld       no",
        "Seeing       yes",
    ];
    assert_eq!(visual_page(&visual(), &VISUAL_LABELS_SHORT, &TextStyle::ASCII, 16), expected);
}

#[test]
fn visual_8_columns() {
    let page = visual_page(&visual(), &VISUAL_LABELS_SHORT, &TextStyle::ASCII, 8);
    assert_eq!(page.len(), 32);
    let first =
        ["Magnif. ", "   62.5x", "Field   ", "   1d13'", "Pupil  !", "  7.3 mm", "Resol. !", "   0.83\""];
    assert_eq!(page[..8], first);
    assert_eq!(page[24..26], ["WidePup ", "     yes"]);
}

#[test]
fn camera_pages() {
    let expected = [
        "Frame width    1d20'",
        "Frame height  53'40\"",
        "Pixel scale!1.57\"/px",
        "Star width     2.51\"",
        "Star pixels!  1.6 px",
        "Focal ratio    f/5.0",
        "T-number         5.7",
        "Focal length 1000 mm",
        "Plate scale  206\"/mm",
        "Diagonal       1d37'",
        "Cutoff        364/mm",
        "Pixel up to  1.38 um",
        "Coarse sampling  yes",
        "Fine sampling     no",
    ];
    assert_eq!(camera_page(&camera(), &CAMERA_LABELS, &TextStyle::ASCII, 20), expected);
    let short = camera_page(&camera(), &CAMERA_LABELS_SHORT, &TextStyle::ASCII, 16);
    assert_eq!(short[2], "Scale  !1.57\"/px");
    assert_eq!(short[12], "Coarse       yes");
}

#[test]
fn utf8_and_translation() {
    let style = TextStyle { decimal_mark: b',', yes: text(b"ja"), no: text(b"nein"), ..TextStyle::UTF8 };
    let mut labels = VISUAL_LABELS;
    labels[0] = "Vergrößerung ist sehr lang";
    labels[2] = "Größe";
    let page = visual_page(&visual(), &labels, &style, 20);
    assert_eq!(page[0], "Vergrößerung   62,5×");
    assert_eq!(page[1], "True field     1°13′");
    assert_eq!(page[2], "Größe      !  7,3 mm");
    assert_eq!(page[12], "Wide exit pupil   ja");
    assert_eq!(page[13], "Over-magnified  nein");
    labels[0] = "Увеличениевсегда";
    assert_eq!(visual_page(&visual(), &labels, &style, 20)[0], "Увеличениевсе  62,5×");
}

#[test]
fn not_available_is_a_dash() {
    let none = VisualReadout { available: 0, facts: 0, ..visual() };
    for line in visual_page(&none, &VISUAL_LABELS, &TextStyle::ASCII, 20) {
        assert!(line.ends_with(" -"), "{line}");
    }
    for line in camera_page(&CameraReadout::default(), &CAMERA_LABELS, &TextStyle::ASCII, 20) {
        assert!(line.ends_with(" -"), "{line}");
    }
    for bit in 0..12 {
        let one = VisualReadout { available: 1 << bit, facts: 0, ..visual() };
        let page = visual_page(&one, &VISUAL_LABELS, &TextStyle::ASCII, 20);
        assert_eq!(page[..12].iter().filter(|line| !line.ends_with(" -")).count(), 1, "bit {bit}");
    }
    for bit in 0..12 {
        let one = CameraReadout { available: 1 << bit, facts: 0, ..camera() };
        let page = camera_page(&one, &CAMERA_LABELS, &TextStyle::ASCII, 20);
        assert_eq!(page[..12].iter().filter(|line| !line.ends_with(" -")).count(), 1, "bit {bit}");
    }
}

#[test]
fn each_fact_has_its_mark_and_its_words() {
    let marks = [
        (VisualReadout::FACT_WIDE_EXIT_PUPIL, 2, 12),
        (VisualReadout::FACT_EMPTY_MAGNIFICATION, 0, 13),
        (VisualReadout::FACT_FIELD_FROM_APPARENT, 1, 14),
        (VisualReadout::FACT_SEEING_LIMITED, 3, 15),
    ];
    for (bit, marked, told) in marks {
        let page =
            visual_page(&VisualReadout { facts: bit, ..visual() }, &VISUAL_LABELS, &TextStyle::ASCII, 20);
        for (number, line) in page.iter().enumerate() {
            assert_eq!(line.contains('!'), number == marked, "{line}");
            assert_eq!(line.ends_with(" yes"), number == told, "{line}");
        }
    }
    for (bit, told) in [(CameraReadout::FACT_COARSE_SAMPLING, 12), (CameraReadout::FACT_FINE_SAMPLING, 13)] {
        let page =
            camera_page(&CameraReadout { facts: bit, ..camera() }, &CAMERA_LABELS, &TextStyle::ASCII, 20);
        for (number, line) in page.iter().enumerate() {
            assert_eq!(line.contains('!'), [2, 4].contains(&number), "{line}");
            assert_eq!(line.ends_with(" yes"), number == told, "{line}");
        }
    }
}

#[test]
fn figures_by_size() {
    let line = |readout: VisualReadout, line: u8| {
        visual_page(&readout, &VISUAL_LABELS, &TextStyle::ASCII, 20).swap_remove(line.into())
    };
    let base = VisualReadout { facts: 0, ..visual() };
    assert_eq!(line(VisualReadout { magnification_q16: 6_550_323, ..base }, 0), "Magnification  99.9x");
    assert_eq!(line(VisualReadout { magnification_q16: 6_550_324, ..base }, 0), "Magnification   100x");
    assert_eq!(line(VisualReadout { magnification_q16: u32::MAX, ..base }, 0), "Magnification 65536x");
    assert_eq!(line(VisualReadout { exit_pupil_um: 949, ..base }, 2), "Exit pupil    0.9 mm");
    assert_eq!(line(VisualReadout { exit_pupil_um: 950, ..base }, 2), "Exit pupil    1.0 mm");
    // Longer than its field: the label gives way, never the value.
    assert_eq!(line(VisualReadout { exit_pupil_um: 99_949, ..base }, 2), "Exit pupil   99.9 mm");
    assert_eq!(line(VisualReadout { exit_pupil_um: 99_950, ..base }, 2), "Exit pupil    100 mm");
    assert_eq!(line(VisualReadout { exit_pupil_um: u32::MAX, ..base }, 2), "Exit pupi 4294967 mm");
    assert_eq!(line(VisualReadout { true_field_mas: u32::MAX, ..base }, 1), "True field  1193d03'");
    let cut = VisualReadout { limiting_magnitude_mmag: i32::MIN, ..base };
    assert_eq!(line(cut, 4), "Stars -2147483.6 mag");
}

#[test]
fn a_value_longer_than_the_line_loses_its_unit_and_then_is_refused() {
    let readout = CameraReadout { pixel_scale_uas: 12_340_000, ..camera() };
    let page = camera_page(&readout, &CAMERA_LABELS_SHORT, &TextStyle::ASCII, 8);
    assert_eq!(page[4..6], ["Scale  !", "12.3\"/px"]);
    let readout = CameraReadout { pixel_scale_uas: u32::MAX, ..camera() };
    let page = camera_page(&readout, &CAMERA_LABELS_SHORT, &TextStyle::ASCII, 8);
    assert_eq!(page[4..6], ["Scale  !", "4295\"/px"]);
    let readout = CameraReadout { plate_scale_mas_per_mm: u32::MAX, ..camera() };
    let page = camera_page(&readout, &CAMERA_LABELS_SHORT, &TextStyle::ASCII, 8);
    assert_eq!(page[16..18], ["Plate   ", " 4294967"]);
    let readout = VisualReadout { limiting_magnitude_mmag: i32::MIN, ..visual() };
    let mut out = [0xaa; 8];
    let error = visual_line(&readout, &VISUAL_LABELS_SHORT, &TextStyle::ASCII, 8, 9, &mut out).unwrap_err();
    assert_eq!((error.cause(), out), (Cause::NoRoom, [0xaa; 8]));
}

#[test]
fn columns_and_lines() {
    for columns in 0..8 {
        let mut out = [0xaa; 8];
        let error =
            visual_line(&visual(), &VISUAL_LABELS, &TextStyle::ASCII, columns, 0, &mut out).unwrap_err();
        assert_eq!((error.cause(), error.argument(), out), (Cause::OutOfRange, 4, [0xaa; 8]));
        let error =
            camera_line(&camera(), &CAMERA_LABELS, &TextStyle::ASCII, columns, 0, &mut out).unwrap_err();
        assert_eq!((error.cause(), error.argument(), out), (Cause::OutOfRange, 4, [0xaa; 8]));
    }
    assert_eq!((lines(16, 8), lines(16, 15), lines(16, 16), lines(11, 20)), (32, 32, 16, 11));
    // Behind the last row: blank.
    for columns in SCREENS {
        for line in lines(16, columns) as u8..=255 {
            let mut out = [0xaa; 256];
            let written = visual_line(&visual(), &VISUAL_LABELS, &TextStyle::UTF8, columns, line, &mut out);
            assert_eq!(written, Ok(columns.into()));
            assert!(out[..usize::from(columns)].iter().all(|&byte| byte == b' '));
        }
    }
}

/// Every English label has the room that it needs beside an ordinary value.
#[test]
fn no_english_label_is_cut() {
    let room = |row: Row| 20 - 1 - usize::from(row.field);
    for row in VisualRow::ALL {
        let number = row as usize;
        assert!(VISUAL_LABELS[number].len() <= room(visual_row(&visual(), row)), "{row:?}");
        assert!(VISUAL_LABELS_SHORT[number].len() <= 7, "{row:?}");
        assert_eq!(VisualRow::from_number(number as u8), Some(row));
    }
    for row in CameraRow::ALL {
        let number = row as usize;
        assert!(CAMERA_LABELS[number].len() <= room(camera_row(&camera(), row)), "{row:?}");
        assert!(CAMERA_LABELS_SHORT[number].len() <= 7, "{row:?}");
        assert_eq!(CameraRow::from_number(number as u8), Some(row));
    }
    assert_eq!((VisualRow::from_number(16), CameraRow::from_number(14)), (None, None));
}

fn any_visual() -> impl Strategy<Value = VisualReadout> {
    (any::<[u32; 14]>(), any::<[u8; 14]>()).prop_map(|(mut n, shift)| {
        for (n, shift) in n.iter_mut().zip(shift).skip(2) {
            *n >>= shift % 32;
        }
        let [available, facts, focal_length_um, focal_ratio_q16, magnification_q16, exit_pupil_um, rest @ ..] = n;
        let [true_field_mas, resolution_uas, dawes_limit_uas, lowest_magnification_q16, rest @ ..] = rest;
        let [resolving_magnification_q16, effective_aperture_um, magnitude, surface_brightness_q16] = rest;
        VisualReadout {
            available,
            facts,
            focal_length_um,
            focal_ratio_q16,
            magnification_q16,
            exit_pupil_um,
            true_field_mas,
            resolution_uas,
            dawes_limit_uas,
            lowest_magnification_q16,
            resolving_magnification_q16,
            effective_aperture_um,
            limiting_magnitude_mmag: magnitude as i32,
            surface_brightness_q16,
        }
    })
}

const STYLES: [TextStyle; 4] =
    [TextStyle::ASCII, TextStyle::UTF8, TextStyle::HD44780_A00, TextStyle::HD44780_A02];

fn characters(style: &TextStyle, bytes: &[u8]) -> Vec<Vec<u8>> {
    if style.utf8 == 0 {
        return bytes.iter().map(|&byte| vec![byte]).collect();
    }
    std::str::from_utf8(bytes).unwrap().chars().map(|c| c.to_string().into_bytes()).collect()
}

proptest! {
    /// Any readout on any display: as wide as the display, the whole value at the right end, the mark and the label
    /// in front; exact capacity is enough, one byte less writes nothing.
    #[test]
    fn layout(
        readout in any_visual(),
        style in proptest::sample::select(&STYLES[..]),
        columns in 8u8..=41,
        line in 0u8..32,
        label in "\\PC{0,20}",
    ) {
        let labels = [label.as_str(); 16];
        let mut out = [0xaa; 300];
        let result = visual_line(&readout, &labels, &style, columns, line, &mut out);
        let narrow = columns < 16;
        let row = VisualRow::from_number(if narrow { line / 2 } else { line }).map(|row| visual_row(&readout, row));
        let Ok(length) = result else {
            prop_assert_eq!(result.unwrap_err(), fieldstop::Error::new(Cause::NoRoom, 0));
            prop_assert!(out.iter().all(|&byte| byte == 0xaa));
            // Only a value that fits with no unit either is refused.
            let mut alone = [0; 64];
            let value = row.unwrap().value.without_unit().write(&style, 0, &mut alone).unwrap();
            prop_assert!(characters(&style, &alone[..value]).len() > usize::from(columns) - usize::from(!narrow));
            return Ok(());
        };
        prop_assert!(out[length..].iter().all(|&byte| byte == 0xaa));
        if style.utf8 == 1 || label.is_ascii() {
            prop_assert_eq!(characters(&style, &out[..length]).len(), usize::from(columns));
        }
        for short in 0..length {
            let mut less = [0xaa; 300];
            let error = visual_line(&readout, &labels, &style, columns, line, &mut less[..short]);
            prop_assert_eq!(error.unwrap_err().cause(), Cause::NoRoom);
            prop_assert!(less.iter().all(|&byte| byte == 0xaa));
        }
        let Some(row) = row else {
            prop_assert!(out[..length].iter().all(|&byte| byte == b' '));
            return Ok(());
        };
        if !narrow || line % 2 == 1 {
            let mut value = [0; 64];
            let long = row.value.write(&style, 0, &mut value).unwrap();
            let bare = row.value.without_unit().write(&style, 0, &mut [0; 64]).unwrap();
            let whole = out[..length].ends_with(&value[..long]);
            prop_assert!(whole || out[..length].ends_with(&value[..bare]), "{:?}", row.value);
        }
        if style.utf8 == 1 && !narrow {
            let line = characters(&style, &out[..length]);
            let mut value = [0; 64];
            let long = row.value.write(&style, 0, &mut value).unwrap();
            let count = characters(&style, &value[..long]).len();
            if count < usize::from(columns) {
                let field = count.max(row.field.into());
                let room = usize::from(columns) - 1 - field;
                let mut wanted = characters(&style, label.as_bytes());
                wanted.resize(room, vec![b' ']);
                prop_assert_eq!(&line[..room], &wanted[..]);
                prop_assert_eq!(&line[room], &vec![if row.fact { b'!' } else { b' ' }]);
                prop_assert!(line[room + 1..room + 1 + field - count].iter().all(|c| c == b" "));
            }
        }
    }

    /// With ordinary values nothing but the value's field and the mark changes from one refresh to the next.
    #[test]
    fn value_column_is_fixed(a in any_visual(), b in any_visual(), line in 0u8..16) {
        let style = TextStyle::ASCII;
        let write = |readout| {
            let mut out = [0; 20];
            visual_line(readout, &VISUAL_LABELS, &style, 20, line, &mut out).map(|_| out)
        };
        let row = |readout| visual_row(readout, VisualRow::from_number(line).unwrap());
        let long = |row: Row| row.value.write(&style, row.field, &mut [0; 40]).is_err();
        prop_assert_eq!(row(&a).field, row(&b).field);
        if long(row(&a)) || long(row(&b)) {
            return Ok(());
        }
        let (shown, now) = (write(&a).unwrap(), write(&b).unwrap());
        let span = changed(&shown, &now, &style);
        if shown == now {
            prop_assert_eq!(span.count, 0);
        } else {
            prop_assert!(usize::from(span.first) >= 19 - usize::from(row(&a).field));
        }
    }

    /// Drawing the span makes the shown line the new one, and it is the shortest that does.
    #[test]
    fn span_is_exact(shown in "[ -3°′é]{0,12}", now in "[ -3°′é]{0,12}", same in any::<bool>(), utf8 in any::<bool>()) {
        let style = if utf8 { TextStyle::UTF8 } else { TextStyle::HD44780_A00 };
        let now = if same { shown.chars().rev().collect() } else { now };
        let span = changed(shown.as_bytes(), now.as_bytes(), &style);
        let (a, b) = (characters(&style, shown.as_bytes()), characters(&style, now.as_bytes()));
        let first = a.iter().zip(&b).take_while(|(a, b)| a == b).count();
        let last = if a.len() != b.len() { b.len() } else {
            b.len() - a.iter().rev().zip(b.iter().rev()).take_while(|(a, b)| a == b).count()
        };
        let expected = if a == b { 0 } else { last - first };
        prop_assert_eq!(span, Span { first: first as u16, count: expected as u16 });
    }
}
