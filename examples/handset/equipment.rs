//! The equipment of one file, in the library's own structs.

use crate::table::{FileError, Table, parse};
use fieldstop::convert::bam_from_mas_fx;
use fieldstop::setup::{Camera, Eyepiece, Focuser, NewtonianLayout, Observer, Telescope, TwoMirrorLayout};
use fieldstop::units::{Q16, SignedMilliarcseconds};

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
    pub focuser: Focuser,
    /// Each with the place of its telescope.
    pub newtonians: Vec<(usize, NewtonianLayout)>,
    pub two_mirrors: Vec<(usize, TwoMirrorLayout)>,
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

const FOCUSER: &[&str] = &["motor_step_um", "defocus_um", "tube_length_mm", "expansion_ppm_per_k"];
const NEWTONIAN: &Members = &[
    ("focus_distance_mm", "must be a length"),
    ("lit_field_mm", "must be a diameter"),
    ("edge_offset_mm", "must be a length"),
    ("diagonal_mm", "must be a diameter"),
    ("axis_height_mm", "must be a length"),
    ("reach_mm", "must be a length"),
    ("altitude_deg", "must be from 0 to 90"),
    ("lowest_altitude_deg", "must be from 0 to 90"),
    ("highest_altitude_deg", "must be from the lowest altitude to 90"),
    ("height_limit_mm", "must be a length"),
];
const TWO_MIRROR: &Members = &[
    ("primary_focal_mm", "must be over 0"),
    ("back_focus_mm", "must be a length"),
    ("lit_field_mm", "must be a diameter"),
];

impl Equipment {
    pub fn read(file: &str) -> Result<Equipment, FileError> {
        let document = parse(file)?;
        let root = Table::root(file, document.get_ref());
        root.only(&[
            "school",
            "observer",
            "telescope",
            "eyepiece",
            "camera",
            "focuser",
            "newtonian",
            "two_mirror",
        ])?;
        let school = root.name("school", 60)?;
        let observer = observer(&root.table("observer")?)?;
        let telescopes: Vec<_> = root.tables("telescope")?.iter().map(telescope).collect::<Result<_, _>>()?;
        Ok(Equipment {
            school,
            observer,
            eyepieces: root.tables("eyepiece")?.iter().map(eyepiece).collect::<Result<_, _>>()?,
            camera: camera(&root.table("camera")?)?,
            focuser: if root.has("focuser") { focuser(&root.table("focuser")?)? } else { Focuser::default() },
            newtonians: of_telescopes(&root, "newtonian", &telescopes, newtonian)?,
            two_mirrors: of_telescopes(&root, "two_mirror", &telescopes, two_mirror)?,
            telescopes,
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

fn focuser(table: &Table) -> Result<Focuser, FileError> {
    table.only(FOCUSER)?;
    Ok(Focuser {
        motor_step_nm: table.steps("motor_step_um", 1000)?.unwrap_or(0),
        defocus_nm: table.steps("defocus_um", 1000)?.unwrap_or(0),
        tube_length_um: table.steps("tube_length_mm", 1000)?.unwrap_or(0),
        expansion_ppb_per_k: table.steps("expansion_ppm_per_k", 1000)?.unwrap_or(0),
    })
}

/// The tables of a kind, each for the telescope that it names.
fn of_telescopes<T>(
    root: &Table,
    kind: &str,
    telescopes: &[Named<Telescope>],
    read: impl Fn(&Table) -> Result<T, FileError>,
) -> Result<Vec<(usize, T)>, FileError> {
    if !root.has(kind) {
        return Ok(Vec::new());
    }
    let read_one = |table: &Table| {
        let name = table.name("telescope", DISPLAY_COLUMNS)?;
        let place = telescopes.iter().position(|telescope| telescope.name == name);
        let place =
            place.ok_or_else(|| table.error("telescope", "must be the name of a telescope".into()))?;
        Ok((place, read(table)?))
    };
    root.tables(kind)?.iter().map(read_one).collect()
}

fn newtonian(table: &Table) -> Result<NewtonianLayout, FileError> {
    table.only(&NEWTONIAN.iter().map(|member| member.0).chain(["telescope"]).collect::<Vec<_>>())?;
    let item = NewtonianLayout {
        focus_distance_um: table.steps("focus_distance_mm", 1000)?.unwrap_or(0),
        lit_field_um: table.steps("lit_field_mm", 1000)?.unwrap_or(0),
        edge_offset_um: table.steps("edge_offset_mm", 1000)?.unwrap_or(0),
        diagonal_um: table.steps("diagonal_mm", 1000)?.unwrap_or(0),
        axis_height_um: table.steps("axis_height_mm", 1000)?.unwrap_or(0),
        reach_um: table.steps("reach_mm", 1000)?.unwrap_or(0),
        altitude_bam: altitude(table, "altitude_deg")?.unwrap_or(0),
        lowest_altitude_bam: altitude(table, "lowest_altitude_deg")?.unwrap_or(0),
        highest_altitude_bam: altitude(table, "highest_altitude_deg")?.unwrap_or(1 << 30),
        height_limit_um: table.steps("height_limit_mm", 1000)?.unwrap_or(0),
    };
    accept(table, NEWTONIAN, item.check())?;
    Ok(item)
}

fn two_mirror(table: &Table) -> Result<TwoMirrorLayout, FileError> {
    table.only(&TWO_MIRROR.iter().map(|member| member.0).chain(["telescope"]).collect::<Vec<_>>())?;
    let item = TwoMirrorLayout {
        primary_focal_um: table.steps("primary_focal_mm", 1000)?.unwrap_or(0),
        back_focus_um: table.steps("back_focus_mm", 1000)?.unwrap_or(0),
        lit_field_um: table.steps("lit_field_mm", 1000)?.unwrap_or(0),
    };
    accept(table, TWO_MIRROR, item.check())?;
    Ok(item)
}

/// A binary angle, to the nearest.
fn altitude(table: &Table, field: &str) -> Result<Option<i32>, FileError> {
    let Some(mas) = table.steps::<i32>(field, 3_600_000)? else { return Ok(None) };
    match bam_from_mas_fx(SignedMilliarcseconds(mas)) {
        Ok(bam) => Ok(Some(bam.0 as i32)),
        Err(error) => Err(table.error(field, error.to_string())),
    }
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
