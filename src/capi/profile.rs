//! C exports of `profile`.

use super::{fieldstop_status, give};
use crate::profile::{
    Editor, Equipment, EquipmentName, InUse, Kind, Newer, Record, SlotPair, Storage, load, save,
};
use crate::setup::{Camera, Eyepiece, Observer, Site, Telescope};
use crate::status::{Cause, Error};
use crate::units::Q16;
use core::ffi::c_void;
use core::slice;

/// Kind of entry: telescopes, up to 4 in a record.
pub const FIELDSTOP_KIND_TELESCOPE: u8 = 0;
/// Kind of entry: eyepieces, up to 16 in a record.
pub const FIELDSTOP_KIND_EYEPIECE: u8 = 1;
/// Kind of entry: Barlows and reducers, up to 8 in a record.
pub const FIELDSTOP_KIND_AMPLIFIER: u8 = 2;
/// Kind of entry: cameras, up to 4 in a record.
pub const FIELDSTOP_KIND_CAMERA: u8 = 3;
/// Kind of entry: observers, up to 4 in a record.
pub const FIELDSTOP_KIND_OBSERVER: u8 = 4;
/// Kind of entry: sites, up to 4 in a record.
pub const FIELDSTOP_KIND_SITE: u8 = 5;
/// In use: none of that kind.
pub const FIELDSTOP_NONE_IN_USE: u8 = 255;
/// Bytes of a record without entries.
pub const FIELDSTOP_RECORD_LEAST: u16 = 28;
/// Bytes of the longest record.
pub const FIELDSTOP_RECORD_MOST: u16 = 976;
/// Saving: refuse where there is a good record of a newer version.
pub const FIELDSTOP_KEEP_NEWER: u8 = 0;
/// Saving: save over a good record of a newer version.
pub const FIELDSTOP_REPLACE_NEWER: u8 = 1;

// The literals that cbindgen can read are those of the Rust constants.
const _: () = {
    assert!(FIELDSTOP_KIND_TELESCOPE == Kind::Telescope as u8);
    assert!(FIELDSTOP_KIND_EYEPIECE == Kind::Eyepiece as u8);
    assert!(FIELDSTOP_KIND_AMPLIFIER == Kind::Amplifier as u8);
    assert!(FIELDSTOP_KIND_CAMERA == Kind::Camera as u8);
    assert!(FIELDSTOP_KIND_OBSERVER == Kind::Observer as u8);
    assert!(FIELDSTOP_KIND_SITE == Kind::Site as u8);
    assert!(FIELDSTOP_NONE_IN_USE == InUse::NONE);
    assert!(
        FIELDSTOP_RECORD_LEAST as usize == Record::LEAST && FIELDSTOP_RECORD_MOST as usize == Record::MOST
    );
    assert!(FIELDSTOP_KEEP_NEWER == Newer::Keep as u8 && FIELDSTOP_REPLACE_NEWER == Newer::Replace as u8);
};

/// Reads storage: fills `bytes` with the `length` bytes from `offset` on, and gives 0; anything else says that they
/// could not be read.
///
/// Any part of a slot may be asked for, up to all of a record. Bytes that the part itself reports as damaged (flash
/// with an error-correcting code, after a torn write) are given as zeros, with 0.
pub type fieldstop_read = Option<
    unsafe extern "C" fn(context: *mut c_void, offset: u32, bytes: *mut u8, length: u16) -> fieldstop_status,
>;

/// Writes storage: `length` bytes from `offset` on, and gives 0; anything else says that they could not be written.
///
/// `length` is a multiple of the slot pair's write_bytes and at most 32; a write never crosses a multiple of 32 bytes from
/// the slot's start. It must have ended when the function returns.
pub type fieldstop_write = Option<
    unsafe extern "C" fn(
        context: *mut c_void,
        offset: u32,
        bytes: *const u8,
        length: u16,
    ) -> fieldstop_status,
>;

/// Erases storage: the `length` bytes of a slot from `offset` on, and gives 0; anything else says that they could not be
/// erased.
pub type fieldstop_erase =
    Option<unsafe extern "C" fn(context: *mut c_void, offset: u32, length: u32) -> fieldstop_status>;

/// The functions of a storage, none of them null but perhaps the last.
struct Callbacks {
    read: fieldstop_read,
    write: fieldstop_write,
    erase: fieldstop_erase,
    context: *mut c_void,
}

const FAILED: Error = Error::new(Cause::Storage, 0);

fn told(status: fieldstop_status) -> Result<(), Error> {
    if status == 0 { Ok(()) } else { Err(FAILED) }
}

impl Storage for Callbacks {
    fn read(&mut self, offset: u32, bytes: &mut [u8]) -> Result<(), Error> {
        let read = self.read.ok_or(FAILED)?;
        let length = u16::try_from(bytes.len()).map_err(|_| FAILED)?;
        // SAFETY: so many bytes are there; the caller's promise about the function.
        told(unsafe { read(self.context, offset, bytes.as_mut_ptr(), length) })
    }

    fn write(&mut self, offset: u32, bytes: &[u8]) -> Result<(), Error> {
        let write = self.write.ok_or(FAILED)?;
        let length = u16::try_from(bytes.len()).map_err(|_| FAILED)?;
        // SAFETY: likewise.
        told(unsafe { write(self.context, offset, bytes.as_ptr(), length) })
    }

    fn erase(&mut self, offset: u32, length: u32) -> Result<bool, Error> {
        let Some(erase) = self.erase else { return Ok(false) };
        // SAFETY: the caller's promise about the function.
        told(unsafe { erase(self.context, offset, length) })?;
        Ok(true)
    }
}

const fn null(position: u8) -> Error {
    Error::new(Cause::NullPointer, position)
}

/// # Safety
/// `bytes` is null or goes to so many bytes that nobody writes while the borrow lives.
#[inline(always)]
unsafe fn bytes<'a>(bytes: *const u8, length: u16, position: u8) -> Result<&'a [u8], Error> {
    if bytes.is_null() {
        return Err(null(position));
    }
    // SAFETY: not null, and the caller's promise.
    Ok(unsafe { slice::from_raw_parts(bytes, length.into()) })
}

/// # Safety
/// `bytes` is null or goes to so many bytes that nobody else reads or writes while the borrow lives.
#[inline(always)]
unsafe fn bytes_mut<'a>(bytes: *mut u8, length: u16, position: u8) -> Result<&'a mut [u8], Error> {
    if bytes.is_null() {
        return Err(null(position));
    }
    // SAFETY: not null, and the caller's promise.
    Ok(unsafe { slice::from_raw_parts_mut(bytes, length.into()) })
}

#[inline(always)]
fn status_of(result: Result<(), Error>) -> fieldstop_status {
    match result {
        Ok(()) => 0,
        Err(error) => error.status(),
    }
}

/// # Safety
/// As the functions that call it say.
#[inline(always)]
unsafe fn get<T: Equipment>(record: *const u8, length: u16, index: u8, out: *mut T) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    unsafe {
        if record.is_null() {
            return null(1).status();
        }
        give(out, 4, || {
            let entry: T = Record::outline(bytes(record, length, 1)?)?
                .get(index)
                .ok_or(Error::new(Cause::OutOfRange, 3))?;
            entry.check().map_err(|_| Error::new(Cause::NoRecord, 1))?;
            Ok(entry)
        })
    }
}

/// # Safety
/// As the functions that call it say.
#[inline(always)]
unsafe fn put<T: Equipment>(
    record: *mut u8,
    capacity: u16,
    index: u8,
    equipment: *const T,
    name: *const EquipmentName,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    let given = unsafe { (bytes_mut(record, capacity, 1), equipment.as_ref(), name.as_ref()) };
    let (record, equipment, name) = match given {
        (Err(error), _, _) => return error.status(),
        (_, None, _) => return null(4).status(),
        (_, _, None) => return null(5).status(),
        (Ok(record), Some(equipment), Some(name)) => (record, equipment, name),
    };
    let result = Editor::reopen(record).and_then(|mut editor| {
        // Counted from the index on, which is the third here.
        let shifted = |error: Error| Error::new(error.cause(), error.argument().wrapping_add(2));
        editor.put(index, equipment, name).map_err(shifted)
    });
    status_of(result)
}

/// Makes a record without entries of the buffer's first 28 bytes, and gives 0.
///
/// After this and each function that puts something in, the record in the buffer is whole, with its checksum.
/// capacity: the buffer's bytes; one of FIELDSTOP_RECORD_MOST takes every record.
/// Statuses: null pointer; no room (2): under 28 bytes.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_record_begin(record: *mut u8, capacity: u16) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    let buffer = unsafe { bytes_mut(record, capacity, 1) };
    let begun = |buffer| Editor::empty(buffer).map(|_| ()).map_err(|error| Error::new(error.cause(), 2));
    status_of(buffer.and_then(begun))
}

/// Gives 0 for a good record at the front of these bytes: its checksum is right and its equipment passes the checks.
///
/// length: bytes that may be read; more may follow the record.
/// Statuses: null pointer; no record (1): damaged, cut short, or none; newer record (1): whole, but of a version that
/// this library cannot read.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_record_check(record: *const u8, length: u16) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    status_of(unsafe { bytes(record, length, 1) }.and_then(|bytes| Record::check(bytes).map(|_| ())))
}

/// Gives the record's own length in bytes, out of its header.
///
/// length: bytes that may be read; more may follow the record.
/// Statuses: null pointer; no record, newer record (1). The checksum is not looked at: see fieldstop_record_check.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_record_get_length(
    record: *const u8,
    length: u16,
    out: *mut u16,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    unsafe {
        if record.is_null() {
            return null(1).status();
        }
        // At most FIELDSTOP_RECORD_MOST.
        give(out, 3, || Ok(Record::outline(bytes(record, length, 1)?)?.bytes().len() as u16))
    }
}

/// Gives how many entries of a kind there are.
///
/// length: bytes that may be read; more may follow the record. kind: one of the FIELDSTOP_KIND_ constants.
/// Statuses: null pointer; no record, newer record (1); out of range (3). The checksum is not looked at: see
/// fieldstop_record_check.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_record_get_count(
    record: *const u8,
    length: u16,
    kind: u8,
    out: *mut u8,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    unsafe {
        if record.is_null() {
            return null(1).status();
        }
        give(out, 4, || {
            let record = Record::outline(bytes(record, length, 1)?)?;
            let kind = Kind::from_number(kind).ok_or(Error::new(Cause::OutOfRange, 3))?;
            Ok(record.count(kind))
        })
    }
}

/// Gives the name of an entry.
///
/// length: bytes that may be read; more may follow the record. kind: one of the FIELDSTOP_KIND_ constants. index: from
/// 0, under the number of entries.
/// Statuses: null pointer; no record, newer record (1); out of range (3, 4). The checksum is not looked at: see
/// fieldstop_record_check.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_record_get_name(
    record: *const u8,
    length: u16,
    kind: u8,
    index: u8,
    name: *mut EquipmentName,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    unsafe {
        if record.is_null() {
            return null(1).status();
        }
        give(name, 5, || {
            let record = Record::outline(bytes(record, length, 1)?)?;
            let kind = Kind::from_number(kind).ok_or(Error::new(Cause::OutOfRange, 3))?;
            record.name(kind, index).ok_or(Error::new(Cause::OutOfRange, 4))
        })
    }
}

/// Gives which entries are in use.
///
/// length: bytes that may be read; more may follow the record.
/// Statuses: null pointer; no record, newer record (1). The checksum is not looked at: see fieldstop_record_check.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_record_get_in_use(
    record: *const u8,
    length: u16,
    used: *mut InUse,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    unsafe {
        if record.is_null() {
            return null(1).status();
        }
        give(used, 3, || Ok(Record::outline(bytes(record, length, 1)?)?.in_use()))
    }
}

/// Gives a telescope, of a record.
///
/// length: bytes that may be read; more may follow the record. index: from 0, under the number of entries.
/// Statuses: null pointer; no record, newer record (1); out of range (3). The checksum is not looked at: see
/// fieldstop_record_check.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_record_get_telescope(
    record: *const u8,
    length: u16,
    index: u8,
    telescope: *mut Telescope,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    unsafe { get(record, length, index, telescope) }
}

/// Gives an eyepiece, of a record.
///
/// length: bytes that may be read; more may follow the record. index: from 0, under the number of entries.
/// Statuses: null pointer; no record, newer record (1); out of range (3). The checksum is not looked at: see
/// fieldstop_record_check.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_record_get_eyepiece(
    record: *const u8,
    length: u16,
    index: u8,
    eyepiece: *mut Eyepiece,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    unsafe { get(record, length, index, eyepiece) }
}

/// Gives what a Barlow or reducer multiplies the focal length by, Q16.16, of a record.
///
/// length: bytes that may be read; more may follow the record. index: from 0, under the number of entries.
/// Statuses: null pointer; no record, newer record (1); out of range (3). The checksum is not looked at: see
/// fieldstop_record_check.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_record_get_amplifier(
    record: *const u8,
    length: u16,
    index: u8,
    amplification_q16: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers; a Q16 is laid out as its number.
    unsafe { get(record, length, index, amplification_q16.cast::<Q16>()) }
}

/// Gives a camera, of a record.
///
/// length: bytes that may be read; more may follow the record. index: from 0, under the number of entries.
/// Statuses: null pointer; no record, newer record (1); out of range (3). The checksum is not looked at: see
/// fieldstop_record_check.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_record_get_camera(
    record: *const u8,
    length: u16,
    index: u8,
    camera: *mut Camera,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    unsafe { get(record, length, index, camera) }
}

/// Gives an observer, of a record.
///
/// length: bytes that may be read; more may follow the record. index: from 0, under the number of entries.
/// Statuses: null pointer; no record, newer record (1); out of range (3). The checksum is not looked at: see
/// fieldstop_record_check.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_record_get_observer(
    record: *const u8,
    length: u16,
    index: u8,
    observer: *mut Observer,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    unsafe { get(record, length, index, observer) }
}

/// Gives a site, of a record.
///
/// length: bytes that may be read; more may follow the record. index: from 0, under the number of entries.
/// Statuses: null pointer; no record, newer record (1); out of range (3). The checksum is not looked at: see
/// fieldstop_record_check.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_record_get_site(
    record: *const u8,
    length: u16,
    index: u8,
    site: *mut Site,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    unsafe { get(record, length, index, site) }
}

/// Puts a telescope and its name into a record, and gives 0: in place of the one of that index, or one more where the
/// index is their number.
///
/// capacity: the buffer's bytes. On any status but 0 nothing is changed.
/// Statuses: null pointer; no record, newer record (1); out of range (3): a greater index, or no more of them in a
/// record; zero or out of range (4): fieldstop_telescope_check names the member; out of range (5): a name with bytes behind a zero; no room (2).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_record_put_telescope(
    record: *mut u8,
    capacity: u16,
    index: u8,
    telescope: *const Telescope,
    name: *const EquipmentName,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    unsafe { put(record, capacity, index, telescope, name) }
}

/// Puts an eyepiece and its name into a record, and gives 0: in place of the one of that index, or one more where the
/// index is their number.
///
/// capacity: the buffer's bytes. On any status but 0 nothing is changed.
/// Statuses: null pointer; no record, newer record (1); out of range (3): a greater index, or no more of them in a
/// record; zero or out of range (4): fieldstop_eyepiece_check names the member; out of range (5): a name with bytes behind a zero; no room (2).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_record_put_eyepiece(
    record: *mut u8,
    capacity: u16,
    index: u8,
    eyepiece: *const Eyepiece,
    name: *const EquipmentName,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    unsafe { put(record, capacity, index, eyepiece, name) }
}

/// Puts a Barlow or reducer and its name into a record, and gives 0: in place of the one of that index, or one more where
/// the index is their number.
///
/// amplification_q16: what it multiplies the focal length by, not 0. capacity: the buffer's bytes. On any status but 0 nothing is changed.
/// Statuses: null pointer; no record, newer record (1); out of range (3): a greater index, or no more of them in a
/// record; zero (4); out of range (5): a name with bytes behind a zero; no room (2).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_record_put_amplifier(
    record: *mut u8,
    capacity: u16,
    index: u8,
    amplification_q16: u32,
    name: *const EquipmentName,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    unsafe { put(record, capacity, index, &Q16(amplification_q16), name) }
}

/// Puts a camera and its name into a record, and gives 0: in place of the one of that index, or one more where the
/// index is their number.
///
/// capacity: the buffer's bytes. On any status but 0 nothing is changed.
/// Statuses: null pointer; no record, newer record (1); out of range (3): a greater index, or no more of them in a
/// record; zero or out of range (4): fieldstop_camera_check names the member; out of range (5): a name with bytes behind a zero; no room (2).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_record_put_camera(
    record: *mut u8,
    capacity: u16,
    index: u8,
    camera: *const Camera,
    name: *const EquipmentName,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    unsafe { put(record, capacity, index, camera, name) }
}

/// Puts an observer and its name into a record, and gives 0: in place of the one of that index, or one more where the
/// index is their number.
///
/// capacity: the buffer's bytes. On any status but 0 nothing is changed.
/// Statuses: null pointer; no record, newer record (1); out of range (3): a greater index, or no more of them in a
/// record; zero (4): fieldstop_observer_check names the member; out of range (5): a name with bytes behind a zero; no room (2).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_record_put_observer(
    record: *mut u8,
    capacity: u16,
    index: u8,
    observer: *const Observer,
    name: *const EquipmentName,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    unsafe { put(record, capacity, index, observer, name) }
}

/// Puts a site and its name into a record, and gives 0: in place of the one of that index, or one more where the
/// index is their number.
///
/// capacity: the buffer's bytes. On any status but 0 nothing is changed.
/// Statuses: null pointer; no record, newer record (1); out of range (3): a greater index, or no more of them in a
/// record; out of range (4): beyond a pole; out of range (5): a name with bytes behind a zero; no room (2).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_record_put_site(
    record: *mut u8,
    capacity: u16,
    index: u8,
    site: *const Site,
    name: *const EquipmentName,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    unsafe { put(record, capacity, index, site, name) }
}

/// Says which entries are in use, and gives 0.
///
/// capacity: the buffer's bytes. used: of each kind an index, or FIELDSTOP_NONE_IN_USE.
/// Statuses: null pointer; no record, newer record (1); out of range (3): no such entry.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_record_put_in_use(
    record: *mut u8,
    capacity: u16,
    used: *const InUse,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    let (record, used) = match unsafe { (bytes_mut(record, capacity, 1), used.as_ref()) } {
        (Err(error), _) => return error.status(),
        (_, None) => return null(3).status(),
        (Ok(record), Some(used)) => (record, used),
    };
    let result = Editor::reopen(record)
        .and_then(|mut editor| editor.put_in_use(used).map_err(|error| Error::new(error.cause(), 3)));
    status_of(result)
}

/// Takes an entry out of a record, and gives 0. Those behind it move up by one; what was in use stays so, but for the
/// entry itself.
///
/// capacity: the buffer's bytes. kind: one of the FIELDSTOP_KIND_ constants.
/// Statuses: null pointer; no record, newer record (1); out of range (3, 4).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_record_remove(
    record: *mut u8,
    capacity: u16,
    kind: u8,
    index: u8,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    let result = unsafe { bytes_mut(record, capacity, 1) }.and_then(Editor::reopen).and_then(|mut editor| {
        let kind = Kind::from_number(kind).ok_or(Error::new(Cause::OutOfRange, 3))?;
        editor.remove(kind, index).map_err(|error| Error::new(error.cause(), 4))
    });
    status_of(result)
}

/// Gives 0 for a slot pair that can be used; otherwise the cause, with the number of the first bad member, counted from 1, in
/// the place of the argument.
///
/// Members: first (1) and second (2) are multiples of write_bytes, the slots do not overlap nor end beyond 2^32; bytes
/// (3) is a multiple of write_bytes, at least 28; write_bytes (4) is 1, 2, 4, 8, 16 or 32.
/// Statuses: null pointer, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_slot_pair_check(places: *const SlotPair) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    status_of(unsafe { places.as_ref() }.ok_or(null(1)).and_then(SlotPair::check))
}

/// Reads the last good record into the buffer, and gives its length in bytes.
///
/// places: the two slots, as fieldstop_slot_pair_check has them. capacity: the buffer's bytes; one of
/// FIELDSTOP_RECORD_MOST takes every record. context: given to read as it is, and
/// may be null.
/// Statuses: null pointer (1, 2, 4, 6); out of range (1): fieldstop_slot_pair_check names the member; no record: neither slot
/// has a good one; newer record: the last good one is of a version that this library cannot read; no room (5); storage:
/// read gave another number than 0, or not the same bytes twice, and only then the buffer's bytes may have changed.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_store_load(
    places: *const SlotPair,
    read: fieldstop_read,
    context: *mut c_void,
    record: *mut u8,
    capacity: u16,
    out: *mut u16,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    let slots = match unsafe { places.as_ref() } {
        None => return null(1).status(),
        Some(_) if read.is_none() => return null(2).status(),
        Some(_) if record.is_null() => return null(4).status(),
        Some(slots) => slots,
    };
    // SAFETY: likewise.
    unsafe {
        give(out, 6, || {
            let mut storage = Callbacks { read, write: None, erase: None, context };
            let buffer = bytes_mut(record, capacity, 4)?;
            match load(&mut storage, slots, buffer) {
                // At most FIELDSTOP_RECORD_MOST.
                Ok(record) => Ok(record.bytes().len() as u16),
                Err(error) => Err(at_position(error, 5)),
            }
        })
    }
}

/// Saves a record into the slot that does not have the last good one, and gives 0. Wherever the power fails, loading
/// gives the record before or this one, whole.
///
/// places: the two slots, as fieldstop_slot_pair_check has them. capacity: bytes that may be read; more may follow the record. read, write and erase must be those of one storage;
/// erase is null where bytes can be written over as they are (EEPROM, FRAM). context: given to them as it is, and may be
/// null. newer: FIELDSTOP_KEEP_NEWER or FIELDSTOP_REPLACE_NEWER.
/// Statuses: null pointer (1, 2, 3, 6); out of range (1): fieldstop_slot_pair_check names the member; no record, newer
/// record (6): what is to be saved is not good; out of range (8); no room (7): it is longer than a slot; newer record
/// (0): a slot has one, which newer says to keep; storage: a function gave another number than 0, or what was written
/// does not read the same. The last good record is still there then.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_store_save(
    places: *const SlotPair,
    read: fieldstop_read,
    write: fieldstop_write,
    erase: fieldstop_erase,
    context: *mut c_void,
    record: *const u8,
    capacity: u16,
    newer: u8,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    let (slots, record) = match unsafe { (places.as_ref(), bytes(record, capacity, 6)) } {
        (None, _) => return null(1).status(),
        _ if read.is_none() => return null(2).status(),
        _ if write.is_none() => return null(3).status(),
        (_, Err(error)) => return error.status(),
        (Some(slots), Ok(record)) => (slots, record),
    };
    if slots.check().is_err() {
        return Error::new(Cause::OutOfRange, 1).status();
    }
    let result = Record::check(record).map_err(|error| Error::new(error.cause(), 6)).and_then(|record| {
        let newer = match newer {
            FIELDSTOP_KEEP_NEWER => Newer::Keep,
            FIELDSTOP_REPLACE_NEWER => Newer::Replace,
            _ => return Err(Error::new(Cause::OutOfRange, 8)),
        };
        let mut storage = Callbacks { read, write, erase, context };
        save(&mut storage, slots, &record, newer).map_err(|error| at_position(error, 7))
    });
    status_of(result)
}

/// The slots stand first in C.
fn at_position(error: Error, room: u8) -> Error {
    match error.cause() {
        Cause::OutOfRange => Error::new(Cause::OutOfRange, 1),
        Cause::NoRoom => Error::new(Cause::NoRoom, room),
        _ => error,
    }
}
