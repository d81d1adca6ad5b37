//! Text of arbitrary values, styles, widths and labels: it fits where it says, and what is refused writes nothing.
#![no_main]

use fieldstop::Error;
use fieldstop::setup::{CameraReadout, VisualReadout};
use fieldstop::text::{
    AngleForm, CameraRow, Span, TextStyle, Unit, Value, VisualRow, camera_line, changed, visual_line,
};
use fieldstop::units::{Microarcseconds, Micrometres, Milliarcseconds, Millimagnitudes, Nanometres, Q16};
use libfuzzer_sys::arbitrary::{Arbitrary, Unstructured};
use libfuzzer_sys::fuzz_target;

fuzz_target!(|bytes: &[u8]| {
    let mut input = Input(Unstructured::new(bytes));
    let style = style(&mut input);
    match input.any::<u8>() % 4 {
        0 | 1 => check_value(&mut input, &style),
        2 => check_lines(&mut input, &style),
        _ => check_changed(&mut input, &style),
    }
});

/// Zeros follow when the bytes are at their end.
struct Input<'a>(Unstructured<'a>);

impl<'a> Input<'a> {
    fn any<T: Arbitrary<'a> + Default>(&mut self) -> T {
        self.0.arbitrary().unwrap_or_default()
    }

    fn bytes(&mut self, most: u8) -> Vec<u8> {
        let length = self.any::<u8>() % (most + 1);
        (0..length).map(|_| self.any()).collect()
    }
}

fn style(input: &mut Input) -> TextStyle {
    let mut style = match input.any::<u8>() % 4 {
        0 => TextStyle::ASCII,
        1 => TextStyle::UTF8,
        2 => TextStyle::HD44780_A00,
        _ => TextStyle::HD44780_A02,
    };
    if input.any::<bool>() {
        style.utf8 = input.any();
        // The marks are one character of one byte.
        let mark = if style.utf8 == 0 { 0xff } else { 0x7f };
        style.decimal_mark = input.any::<u8>() & mark;
        style.fact_mark = input.any::<u8>() & mark;
        (style.dash, style.yes, style.no) = (input.any(), input.any(), input.any());
        for _ in 0..input.any::<u8>() % 4 {
            let place = input.any::<u8>() as usize % style.units.len();
            style.units[place] = input.any();
        }
    }
    style
}

/// Bytes that begin a character, in the sense of the style.
fn characters(text: &[u8], style: &TextStyle) -> usize {
    text.iter().filter(|&&byte| style.utf8 == 0 || byte & 0xc0 != 0x80).count()
}

/// What `write` wrote into a buffer of arbitrary size, once it is clear that it wrote nowhere else.
fn written(input: &mut Input, write: impl Fn(&mut [u8]) -> Result<usize, Error>) -> Result<Vec<u8>, Error> {
    let before = input.bytes(80);
    let mut out = before.clone();
    let result = write(&mut out);
    let length = *result.as_ref().unwrap_or(&0);
    assert_eq!(out[length..], before[length..], "written past its end, or though refused");
    result.map(|length| out[..length].to_vec())
}

fn value(input: &mut Input) -> Value {
    let number: u32 = input.any();
    // Near the carries as often as anywhere.
    let near = number / 60_000 * 60_000;
    let number = if input.any() { near.wrapping_sub(input.any::<u16>() as u32) } else { number };
    let decimals = input.any::<u8>() % 12;
    let unit = Unit::from_number(input.any::<u8>() % 24).unwrap_or(Unit::None);
    match input.any::<u8>() % 14 {
        0 => Value::count(number, unit),
        1 => Value::millimetres(Micrometres(number), decimals),
        2 => Value::micrometres(Nanometres(number), decimals),
        3 => Value::ratio(Q16(number), decimals),
        4 => Value::magnification(Q16(number), decimals),
        5 => Value::focal_ratio(Q16(number), decimals),
        6 => Value::percent(Q16(number), decimals),
        7 => Value::arcseconds(Microarcseconds(number), decimals),
        8 => Value::magnitude(Millimagnitudes(number as i32), decimals),
        9 => Value::decimal(number, input.any(), decimals, unit),
        10 => Value::signed_decimal(number as i32, input.any(), decimals, unit),
        11 => Value::answer(number & 1 == 0),
        12 => Value::NOT_AVAILABLE,
        _ => {
            let form = AngleForm::from_number(input.any::<u8>() % 5).unwrap();
            let angle = Value::angle(Milliarcseconds(number), form, decimals);
            let mut out = [0; 64];
            if let Ok(length) = angle.write(&TextStyle::ASCII, 0, &mut out) {
                let text = str::from_utf8(&out[..length]).unwrap();
                // A group is full at 59.
                let sixty = text.contains("d60") || text.contains("'60") || text == "60'00\"";
                assert!(!sixty, "{number} mas as {text}");
            }
            angle
        }
    }
}

fn check_value(input: &mut Input, style: &TextStyle) {
    let value = value(input);
    let width: u8 = input.any();
    let text = written(input, |out| value.write(style, width, out));
    let whole = written(input, |out| value.without_unit().write(style, 0, out));
    if let Ok(text) = text {
        if width > 0 {
            assert_eq!(characters(&text, style), width as usize);
        }
        if let Ok(whole) = whole {
            assert!(whole.len() <= text.len(), "longer without its unit");
        }
    }
    let _ = style.unit(value.unit());
}

fn readouts(input: &mut Input) -> (VisualReadout, CameraReadout) {
    let visual = VisualReadout {
        available: input.any(),
        facts: input.any(),
        focal_length_um: input.any(),
        focal_ratio_q16: input.any(),
        magnification_q16: input.any(),
        exit_pupil_um: input.any(),
        true_field_mas: input.any(),
        resolution_uas: input.any(),
        dawes_limit_uas: input.any(),
        lowest_magnification_q16: input.any(),
        resolving_magnification_q16: input.any(),
        effective_aperture_um: input.any(),
        limiting_magnitude_mmag: input.any(),
        surface_brightness_q16: input.any(),
    };
    let camera = CameraReadout {
        available: visual.available,
        facts: visual.facts,
        focal_length_um: input.any(),
        focal_ratio_q16: input.any(),
        t_number_q16: input.any(),
        frame_width_mas: input.any(),
        frame_height_mas: input.any(),
        pixel_scale_uas: input.any(),
        plate_scale_mas_per_mm: input.any(),
        star_fwhm_uas: input.any(),
        pixels_per_fwhm_q16: input.any(),
        cutoff_frequency_q16: input.any(),
        nyquist_pixel_nm: input.any(),
        diagonal_mas: input.any(),
    };
    (visual, camera)
}

fn check_lines(input: &mut Input, style: &TextStyle) {
    let labels: [String; VisualRow::ALL.len()] =
        std::array::from_fn(|_| String::from_utf8_lossy(&input.bytes(24)).into_owned());
    let visual_labels: [&str; VisualRow::ALL.len()] = std::array::from_fn(|row| labels[row].as_str());
    let camera_labels: [&str; CameraRow::ALL.len()] = std::array::from_fn(|row| labels[row].as_str());
    let (visual, camera) = readouts(input);
    let columns = input.any::<u8>();
    let line = input.any::<u8>() % 40;
    for text in [
        written(input, |out| visual_line(&visual, &visual_labels, style, columns, line, out)),
        written(input, |out| camera_line(&camera, &camera_labels, style, columns, line, out)),
    ] {
        if let Ok(text) = text {
            assert_eq!(characters(&text, style), columns as usize, "{text:?}");
        }
    }
}

fn check_changed(input: &mut Input, style: &TextStyle) {
    // What a display shows is whole characters.
    let text = |input: &mut Input| {
        let bytes = input.bytes(40);
        if style.utf8 == 0 { bytes } else { String::from_utf8_lossy(&bytes).into_owned().into_bytes() }
    };
    let shown = text(input);
    let mut line = if input.any() { shown.clone() } else { text(input) };
    if style.utf8 == 0 && !line.is_empty() {
        let place = input.any::<u8>() as usize % line.len();
        line[place] = input.any();
    }
    let Span { first, count } = changed(&shown, &line, style);
    let (first, after) = (first as usize, first as usize + count as usize);
    let split = |text: &[u8]| -> Vec<Vec<u8>> {
        let mut characters: Vec<Vec<u8>> = Vec::new();
        for &byte in text {
            match characters.last_mut() {
                Some(last) if style.utf8 != 0 && byte & 0xc0 == 0x80 => last.push(byte),
                _ => characters.push(vec![byte]),
            }
        }
        characters
    };
    let (shown, line) = (split(&shown), split(&line));
    assert!(after <= line.len());
    assert_eq!(shown[..first], line[..first]);
    if shown.len() == line.len() {
        assert_eq!(shown[after..], line[after..]);
        assert_eq!(count == 0, shown == line);
    } else {
        assert_eq!(after, line.len());
    }
}
