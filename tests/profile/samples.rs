//! Records of invented equipment.

use fieldstop::Error;
use fieldstop::profile::{Editor, EquipmentName, InUse, Record};
use fieldstop::setup::{Camera, Eyepiece, Observer, Site, Telescope};
use fieldstop::units::Q16;

pub fn name(text: &str) -> EquipmentName {
    EquipmentName::new(text.as_bytes()).unwrap()
}

pub const TELESCOPE: Telescope = Telescope {
    aperture_um: 187_500,
    focal_length_um: 1_130_000,
    obstruction_um: 47_000,
    amplification_q16: 1 << 16,
    throughput_q16: 53_740,
};

pub fn eyepiece(n: u8) -> Eyepiece {
    Eyepiece {
        focal_length_um: 5_500 + 3_100 * u32::from(n),
        field_stop_um: if n.is_multiple_of(3) { 0 } else { 6_200 + 2_900 * u32::from(n) },
        apparent_field_mas: 187_200_000 + 7_200_000 * u32::from(n),
        mapping: n % 2,
        padding: [0; 3],
    }
}

pub fn camera(n: u8) -> Camera {
    Camera {
        pixel_nm: 2_315 + u32::from(n),
        columns: 3_210,
        rows: 2_140,
        binning: 1 + n % 2,
        ..Camera::default()
    }
}

pub fn observer(n: u8) -> Observer {
    Observer {
        naked_eye_mmag: 5_300 - 100 * i32::from(n),
        eye_pupil_um: 6_200,
        eye_resolution_mas: 150_000,
        seeing_uas: 2_400_000,
        wavelength_nm: 550,
    }
}

pub fn site(n: u8) -> Site {
    Site { latitude_bam: 0x2345_6789 - (i32::from(n) << 29), longitude_bam: 0x0765_4321 }
}

/// So many of each kind.
pub fn fill(editor: &mut Editor, counts: [u8; 6]) -> Result<(), Error> {
    for n in 0..counts[0] {
        let aperture_um = TELESCOPE.aperture_um - u32::from(n);
        editor.put_telescope(n, &Telescope { aperture_um, ..TELESCOPE }, &name(&format!("Tube {n}")))?;
    }
    for n in 0..counts[1] {
        editor.put_eyepiece(n, &eyepiece(n), &name(&format!("Eyepiece {n:03}")))?;
    }
    for n in 0..counts[2] {
        editor.put_amplifier(n, Q16(0x8000 * (u32::from(n) + 1)), &name(""))?;
    }
    for n in 0..counts[3] {
        editor.put_camera(n, &camera(n), &name("Frame"))?;
    }
    for n in 0..counts[4] {
        editor.put_observer(n, &observer(n), &name("Dark adapted"))?;
    }
    for n in 0..counts[5] {
        editor.put_site(n, &site(n), &name("Hill"))?;
    }
    Ok(())
}

pub const MOST: [u8; 6] = [4, 16, 8, 4, 4, 4];

/// A record with so many of each kind, the last of each in use.
pub fn record(counts: [u8; 6]) -> Vec<u8> {
    let mut buffer = [0xA5; Record::MOST];
    let mut editor = Editor::empty(&mut buffer).unwrap();
    fill(&mut editor, counts).unwrap();
    let [telescope, eyepiece, amplifier, camera, observer, site] = counts.map(|n| n.wrapping_sub(1));
    editor.put_in_use(&InUse { telescope, eyepiece, amplifier, camera, observer, site }).unwrap();
    editor.record().unwrap().bytes().to_vec()
}
