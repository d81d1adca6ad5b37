use super::fields::{Fields, FieldsMut};
use super::name::EquipmentName;
use crate::setup::{Camera, Eyepiece, Observer, Site, Telescope};
use crate::status::{Cause, Error};
use crate::stored::stored;
use crate::units::Q16;

/// What a record holds lists of.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
#[repr(u8)]
pub enum Kind {
    /// Up to 4 telescopes.
    Telescope = 0,
    /// Up to 16 eyepieces.
    Eyepiece = 1,
    /// Up to 8 Barlows and reducers.
    Amplifier = 2,
    /// Up to 4 cameras.
    Camera = 3,
    /// Up to 4 observers.
    Observer = 4,
    /// Up to 4 sites.
    Site = 5,
}

pub(super) const KINDS: usize = 6;
pub(super) const NAME: usize = 12;
/// The largest entry.
pub(super) const ENTRY: usize = NAME + BODY;
/// The largest without its name.
pub(super) const BODY: usize = 20;

stored! {
    /// Bytes of an entry, by kind.
    pub(super) static SIZES: [u8; KINDS] = [32, 25, 16, 21, 32, 20];
    /// The most entries of each kind.
    pub(super) static MOST: [u8; KINDS] = [4, 16, 8, 4, 4, 4];
}

impl Kind {
    /// The kind of this number.
    pub const fn from_number(number: u8) -> Option<Kind> {
        Some(match number {
            0 => Kind::Telescope,
            1 => Kind::Eyepiece,
            2 => Kind::Amplifier,
            3 => Kind::Camera,
            4 => Kind::Observer,
            5 => Kind::Site,
            _ => return None,
        })
    }

    /// The most of them in a record.
    pub fn most(self) -> u8 {
        MOST.checked(self as usize).unwrap_or(0)
    }

    pub(super) fn size(self) -> u8 {
        SIZES.checked(self as usize).unwrap_or(0)
    }
}

/// Equipment as the bytes of an entry behind its name.
pub(crate) trait Equipment: Sized {
    const KIND: Kind;
    fn decode(body: &[u8; BODY]) -> Self;
    fn encode(&self, body: &mut [u8; BODY]);
    fn check(&self) -> Result<(), Error>;
}

impl Equipment for Telescope {
    const KIND: Kind = Kind::Telescope;

    fn decode(body: &[u8; BODY]) -> Telescope {
        let mut fields = Fields(body);
        Telescope {
            aperture_um: fields.u32(),
            focal_length_um: fields.u32(),
            obstruction_um: fields.u32(),
            amplification_q16: fields.u32(),
            throughput_q16: fields.u32(),
        }
    }

    fn encode(&self, body: &mut [u8; BODY]) {
        let mut fields = FieldsMut(body);
        fields.u32(self.aperture_um);
        fields.u32(self.focal_length_um);
        fields.u32(self.obstruction_um);
        fields.u32(self.amplification_q16);
        fields.u32(self.throughput_q16);
    }

    fn check(&self) -> Result<(), Error> {
        Telescope::check(self)
    }
}

impl Equipment for Eyepiece {
    const KIND: Kind = Kind::Eyepiece;

    fn decode(body: &[u8; BODY]) -> Eyepiece {
        let mut fields = Fields(body);
        Eyepiece {
            focal_length_um: fields.u32(),
            field_stop_um: fields.u32(),
            apparent_field_mas: fields.u32(),
            mapping: fields.u8(),
            padding: [0; 3],
        }
    }

    fn encode(&self, body: &mut [u8; BODY]) {
        let mut fields = FieldsMut(body);
        fields.u32(self.focal_length_um);
        fields.u32(self.field_stop_um);
        fields.u32(self.apparent_field_mas);
        fields.u8(self.mapping);
    }

    fn check(&self) -> Result<(), Error> {
        Eyepiece::check(self)
    }
}

/// An amplifier is known by what it multiplies the focal length by.
impl Equipment for Q16 {
    const KIND: Kind = Kind::Amplifier;

    fn decode(body: &[u8; BODY]) -> Q16 {
        Q16(Fields(body).u32())
    }

    fn encode(&self, body: &mut [u8; BODY]) {
        FieldsMut(body).u32(self.0);
    }

    fn check(&self) -> Result<(), Error> {
        if self.0 == 0 { Err(Error::new(Cause::Zero, 1)) } else { Ok(()) }
    }
}

impl Equipment for Camera {
    const KIND: Kind = Kind::Camera;

    fn decode(body: &[u8; BODY]) -> Camera {
        let mut fields = Fields(body);
        Camera {
            pixel_nm: fields.u32(),
            columns: fields.u16(),
            rows: fields.u16(),
            binning: fields.u8(),
            ..Camera::default()
        }
    }

    fn encode(&self, body: &mut [u8; BODY]) {
        let mut fields = FieldsMut(body);
        fields.u32(self.pixel_nm);
        fields.u16(self.columns);
        fields.u16(self.rows);
        fields.u8(self.binning);
    }

    fn check(&self) -> Result<(), Error> {
        Camera::check(self)
    }
}

impl Equipment for Observer {
    const KIND: Kind = Kind::Observer;

    fn decode(body: &[u8; BODY]) -> Observer {
        let mut fields = Fields(body);
        Observer {
            naked_eye_mmag: fields.u32().cast_signed(),
            eye_pupil_um: fields.u32(),
            eye_resolution_mas: fields.u32(),
            seeing_uas: fields.u32(),
            wavelength_nm: fields.u32(),
        }
    }

    fn encode(&self, body: &mut [u8; BODY]) {
        let mut fields = FieldsMut(body);
        fields.u32(self.naked_eye_mmag.cast_unsigned());
        fields.u32(self.eye_pupil_um);
        fields.u32(self.eye_resolution_mas);
        fields.u32(self.seeing_uas);
        fields.u32(self.wavelength_nm);
    }

    fn check(&self) -> Result<(), Error> {
        Observer::check(self)
    }
}

impl Equipment for Site {
    const KIND: Kind = Kind::Site;

    fn decode(body: &[u8; BODY]) -> Site {
        let mut fields = Fields(body);
        Site { latitude_bam: fields.u32().cast_signed(), longitude_bam: fields.u32() }
    }

    fn encode(&self, body: &mut [u8; BODY]) {
        let mut fields = FieldsMut(body);
        fields.u32(self.latitude_bam.cast_unsigned());
        fields.u32(self.longitude_bam);
    }

    fn check(&self) -> Result<(), Error> {
        Site::check(self)
    }
}

/// The bytes of an entry, with zeros behind a short one.
#[derive(Clone, Copy)]
pub(super) struct Entry {
    pub(super) name: EquipmentName,
    pub(super) body: [u8; BODY],
}

impl Entry {
    pub(super) fn of(bytes: &[u8]) -> Entry {
        let mut entry = Entry { name: EquipmentName::default(), body: [0; BODY] };
        let all = entry.name.text.iter_mut().chain(entry.body.iter_mut());
        for (to, from) in all.zip(bytes) {
            *to = *from;
        }
        entry
    }

    /// Whether the equipment in it passes its check.
    pub(super) fn is_good(&self, kind: u8) -> bool {
        self.name.check().is_ok()
            && match Kind::from_number(kind) {
                Some(Kind::Telescope) => self.passes::<Telescope>(),
                Some(Kind::Eyepiece) => self.passes::<Eyepiece>(),
                Some(Kind::Amplifier) => self.passes::<Q16>(),
                Some(Kind::Camera) => self.passes::<Camera>(),
                Some(Kind::Observer) => self.passes::<Observer>(),
                Some(Kind::Site) => self.passes::<Site>(),
                None => false,
            }
    }

    fn passes<T: Equipment>(&self) -> bool {
        T::decode(&self.body).check().is_ok()
    }
}
