//! The equipment of one file, in the library's own structs.

use crate::table::{FileError, Table, parse};
use fieldstop::setup::{Camera, Eyepiece, Observer, Telescope};
use fieldstop::units::Q16;

/// Names stand on one line of the display.
pub const DISPLAY_COLUMNS: usize = 20;

/// A thing that can be chosen, with the name that the display shows.
pub struct Named<T> {
    pub name: String,
    pub item: T,
}

pub struct Equipment {
    pub school: String,
    pub observer: Observer,
    pub telescopes: Vec<Named<Telescope>>,
    pub eyepieces: Vec<Named<Eyepiece>>,
    pub camera: Named<Camera>,
}

/// A field of the file for each member of a library struct, in the order in which the library counts them, and
/// what its check asks of it.
type Members = [(&'static str, &'static str)];

const TELESCOPE: &Members = &[
    ("aperture_mm", "must be over 0"),
    ("focal_length_mm", "must be over 0"),
    ("obstruction_mm", "must be under the aperture"),
    ("amplification", "must be over 0"),
    ("throughput", "must be from 0 to 1"),
];
const EYEPIECE: &Members = &[
    ("focal_length_mm", "must be over 0"),
    ("field_stop_mm", "must be a diameter"),
    ("apparent_field_deg", "must be under 180"),
    ("mapping", "must be \"equidistant\" or \"rectilinear\""),
];
const CAMERA: &Members = &[
    ("pixel_um", "must be over 0"),
    ("columns", "must be over 0"),
    ("rows", "must be over 0"),
    ("binning", "must be over 0, and not over the columns or rows"),
];
const OBSERVER: &Members = &[
    ("naked_eye_mag", "must be a magnitude"),
    ("eye_pupil_mm", "must be a diameter"),
    ("eye_resolution_arcsec", "must be an angle"),
    ("seeing_arcsec", "must be an angle"),
    ("wavelength_nm", "must be over 0"),
];

impl Equipment {
    pub fn read(file: &str) -> Result<Equipment, FileError> {
        let document = parse(file)?;
        let root = Table::root(file, document.get_ref());
        root.only(&["school", "observer", "telescope", "eyepiece", "camera"])?;
        Ok(Equipment {
            school: root.name("school", 60)?,
            observer: observer(&root.table("observer")?)?,
            telescopes: root.tables("telescope")?.iter().map(telescope).collect::<Result<_, _>>()?,
            eyepieces: root.tables("eyepiece")?.iter().map(eyepiece).collect::<Result<_, _>>()?,
            camera: camera(&root.table("camera")?)?,
        })
    }
}

fn telescope(table: &Table) -> Result<Named<Telescope>, FileError> {
    only(table, TELESCOPE)?;
    let item = Telescope {
        aperture_um: table.steps("aperture_mm", 1000)?.unwrap_or(0),
        focal_length_um: table.steps("focal_length_mm", 1000)?.unwrap_or(0),
        obstruction_um: table.steps("obstruction_mm", 1000)?.unwrap_or(0),
        amplification_q16: table.ratio("amplification")?.unwrap_or(Q16::ONE).0,
        throughput_q16: table.ratio("throughput")?.unwrap_or(Q16(0)).0,
    };
    accept(table, TELESCOPE, item.check())?;
    Ok(Named { name: table.name("name", DISPLAY_COLUMNS)?, item })
}

fn eyepiece(table: &Table) -> Result<Named<Eyepiece>, FileError> {
    only(table, EYEPIECE)?;
    let item = Eyepiece {
        focal_length_um: table.steps("focal_length_mm", 1000)?.unwrap_or(0),
        field_stop_um: table.steps("field_stop_mm", 1000)?.unwrap_or(0),
        apparent_field_mas: table.steps("apparent_field_deg", 3_600_000)?.unwrap_or(0),
        mapping: match table.text("mapping")? {
            None | Some("equidistant") => Eyepiece::EQUIDISTANT,
            Some("rectilinear") => Eyepiece::RECTILINEAR,
            Some(_) => u8::MAX,
        },
        padding: [0; 3],
    };
    accept(table, EYEPIECE, item.check())?;
    Ok(Named { name: table.name("name", DISPLAY_COLUMNS)?, item })
}

fn camera(table: &Table) -> Result<Named<Camera>, FileError> {
    only(table, CAMERA)?;
    let item = Camera {
        pixel_nm: table.steps("pixel_um", 1000)?.unwrap_or(0),
        columns: table.steps("columns", 1)?.unwrap_or(0),
        rows: table.steps("rows", 1)?.unwrap_or(0),
        binning: table.steps("binning", 1)?.unwrap_or(1),
        padding: [0; 3],
    };
    accept(table, CAMERA, item.check())?;
    Ok(Named { name: table.name("name", DISPLAY_COLUMNS)?, item })
}

fn observer(table: &Table) -> Result<Observer, FileError> {
    table.only(&OBSERVER.iter().map(|member| member.0).collect::<Vec<_>>())?;
    let item = Observer {
        naked_eye_mmag: table
            .steps("naked_eye_mag", 1000)?
            .ok_or_else(|| table.error("naked_eye_mag", "missing".into()))?,
        eye_pupil_um: table.steps("eye_pupil_mm", 1000)?.unwrap_or(0),
        eye_resolution_mas: table.steps("eye_resolution_arcsec", 1000)?.unwrap_or(0),
        seeing_uas: table.steps("seeing_arcsec", 1_000_000)?.unwrap_or(0),
        wavelength_nm: table.steps("wavelength_nm", 1)?.unwrap_or(0),
    };
    accept(table, OBSERVER, item.check())?;
    Ok(item)
}

fn only(table: &Table, members: &Members) -> Result<(), FileError> {
    let fields = members.iter().map(|member| member.0).chain(["name"]);
    table.only(&fields.collect::<Vec<_>>())
}

/// Turns the library's check, which counts members, into a field of the file.
fn accept(table: &Table, members: &Members, check: Result<(), fieldstop::Error>) -> Result<(), FileError> {
    let Err(error) = check else { return Ok(()) };
    let (field, range) = members[usize::from(error.argument()) - 1];
    let reason = if table.has(field) { range.to_string() } else { format!("missing; it {range}") };
    Err(table.error(field, reason))
}
