//! The bytes of a record, and which bytes are none.

use super::samples::*;
use fieldstop::profile::{Crc, Editor, EquipmentName, InUse, Kind, Record};
use fieldstop::setup::{Camera, Eyepiece, Observer, Site, Telescope};
use fieldstop::units::Q16;
use fieldstop::{Cause, Error};
use proptest::prelude::*;

const NO_RECORD: Error = Error::new(Cause::NoRecord, 1);
const KINDS: [Kind; 6] =
    [Kind::Telescope, Kind::Eyepiece, Kind::Amplifier, Kind::Camera, Kind::Observer, Kind::Site];

/// By the definition, a bit at a time.
fn crc(bytes: &[u8]) -> u32 {
    let mut rest = u32::MAX;
    for byte in bytes {
        for bit in 0..8 {
            let out = (rest ^ u32::from(byte >> bit)) & 1;
            rest = rest >> 1 ^ if out == 1 { 0xEDB8_8320 } else { 0 };
        }
    }
    !rest
}

/// With the right checksum again.
fn sealed(mut bytes: Vec<u8>) -> Vec<u8> {
    let at = bytes.len() - 4;
    let sum = crc(&bytes[..at]);
    bytes[at..].copy_from_slice(&sum.to_le_bytes());
    bytes
}

#[test]
fn checksum_has_its_check_value() {
    let mut sum = Crc::new();
    sum.add(b"123456789");
    assert_eq!((sum.value(), crc(b"123456789")), (0xCBF4_3926, 0xCBF4_3926));
    let bytes = record(MOST);
    let mut sum = Crc::new();
    sum.add(&bytes);
    // What is over itself: the residue of the polynomial, inverted (IEEE Std 802.3).
    assert_eq!(sum.value(), 0x2144_DF1C);
}

#[test]
fn what_is_put_in_comes_out() {
    let bytes = record(MOST);
    assert_eq!(bytes.len(), Record::MOST);
    let record = Record::check(&bytes).unwrap();
    assert_eq!((record.version(), record.sequence()), (1, 0));
    for (kind, most) in KINDS.into_iter().zip(MOST) {
        assert_eq!((record.count(kind), kind.most(), record.name(kind, most)), (most, most, None));
    }
    for n in 0..16 {
        assert_eq!(record.eyepiece(n), Some(eyepiece(n)));
        assert_eq!(record.name(Kind::Eyepiece, n).unwrap().bytes(), format!("Eyepiece {n:03}").as_bytes());
    }
    for n in 0..4 {
        assert_eq!(record.telescope(n).unwrap().aperture_um, 187_500 - u32::from(n));
        assert_eq!(record.camera(n), Some(camera(n)));
        assert_eq!(record.observer(n), Some(observer(n)));
        assert_eq!(record.site(n), Some(site(n)));
    }
    assert_eq!(record.amplifier(7), Some(Q16(4 << 16)));
    assert_eq!((record.amplifier(8), record.telescope(4), record.site(255)), (None, None, None));
    assert_eq!(record.name(Kind::Amplifier, 0).unwrap().bytes(), b"");
    let in_use = record.in_use();
    assert_eq!((in_use.telescope, in_use.eyepiece, in_use.site), (3, 15, 3));
}

#[test]
fn shortest_record_is_as_the_page_says() {
    let mut expected = Vec::from(*b"fdsp\x01\0\x1c\0\0\0\0\0\0\0\0\0\0\0\xff\xff\xff\xff\xff\xff");
    expected.extend(crc(&expected).to_le_bytes());
    assert_eq!(record([0; 6]), expected);
    let mut short = [0; 27];
    assert_eq!(Editor::empty(&mut short).err(), Some(Error::new(Cause::NoRoom, 1)));
    assert_eq!(short, [0; 27]);
}

#[test]
fn order_of_entries_does_not_matter() {
    let counts = [2, 3, 2, 1, 1, 2];
    let in_order = record(counts);
    let mut buffer = [0xFF; 500];
    let mut editor = Editor::empty(&mut buffer).unwrap();
    for n in 0..2 {
        editor.put_site(n, &site(n), &name("Hill")).unwrap();
    }
    editor.put_observer(0, &observer(0), &name("Dark adapted")).unwrap();
    editor.put_camera(0, &camera(1), &name("Other")).unwrap();
    fill(&mut editor, [2, 3, 0, 0, 0, 0]).unwrap();
    fill(&mut editor, [0, 0, 2, 1, 1, 2]).unwrap();
    let in_use = Record::check(&in_order).unwrap().in_use();
    editor.put_in_use(&in_use).unwrap();
    assert_eq!(editor.record().unwrap().bytes(), in_order);
}

#[test]
fn removed_entries_are_gone_and_the_others_stay() {
    for kind in KINDS {
        for index in 0..2 {
            let mut buffer = record([2; 6]);
            let mut editor = Editor::open(&mut buffer).unwrap();
            editor.remove(kind, index).unwrap();
            assert_eq!(editor.remove(kind, 1), Err(Error::new(Cause::OutOfRange, 2)));
            let bytes = editor.record().unwrap().bytes().to_vec();
            let (now, before) = (Record::check(&bytes).unwrap(), record([2; 6]));
            let before = Record::check(&before).unwrap();
            for other in KINDS {
                if other == kind {
                    assert_eq!(now.count(other), 1);
                    assert_eq!(now.name(other, 0), before.name(other, 1 - index));
                } else {
                    assert_eq!((now.count(other), now.name(other, 1)), (2, before.name(other, 1)));
                }
            }
            if kind == Kind::Eyepiece {
                assert_eq!(now.eyepiece(0), before.eyepiece(1 - index));
                // The last was in use: it moved up, or is gone.
                assert_eq!(now.in_use().eyepiece, if index == 1 { InUse::NONE } else { 0 });
                assert_eq!(now.in_use().camera, 1);
            }
        }
    }
}

#[test]
fn refused_calls_change_nothing() {
    let good = record(MOST);
    let mut buffer = good.clone();
    let mut editor = Editor::open(&mut buffer).unwrap();
    let label = name("x");
    let bad_name = EquipmentName { text: *b"a\0b\0\0\0\0\0\0\0\0\0" };
    let refused = |cause, argument| Err(Error::new(cause, argument));
    assert_eq!(editor.put_eyepiece(16, &eyepiece(0), &label), refused(Cause::OutOfRange, 1));
    assert_eq!(editor.put_eyepiece(3, &Eyepiece::default(), &label), refused(Cause::Zero, 2));
    assert_eq!(editor.put_telescope(0, &Telescope::default(), &label), refused(Cause::Zero, 2));
    assert_eq!(editor.put_amplifier(0, Q16(0), &label), refused(Cause::Zero, 2));
    assert_eq!(editor.put_camera(0, &Camera::default(), &label), refused(Cause::Zero, 2));
    assert_eq!(editor.put_observer(0, &Observer::default(), &label), refused(Cause::Zero, 2));
    let beyond = Site { latitude_bam: (1 << 30) + 1, longitude_bam: 0 };
    assert_eq!(editor.put_site(0, &beyond, &label), refused(Cause::OutOfRange, 2));
    assert_eq!(editor.put_site(0, &site(0), &bad_name), refused(Cause::OutOfRange, 3));
    let none = InUse::default();
    assert_eq!(editor.put_in_use(&InUse { site: 4, ..none }), refused(Cause::OutOfRange, 1));
    assert_eq!(editor.remove(Kind::Site, 4), refused(Cause::OutOfRange, 2));
    assert_eq!(buffer, good);

    let good = record([1, 1, 0, 0, 0, 0]);
    let mut buffer = good.clone();
    buffer.resize(good.len() + 24, 7);
    let mut editor = Editor::open(&mut buffer).unwrap();
    assert_eq!(editor.put_eyepiece(2, &eyepiece(0), &label), refused(Cause::OutOfRange, 1));
    assert_eq!(editor.put_eyepiece(1, &eyepiece(0), &label), refused(Cause::NoRoom, 0));
    assert_eq!(&buffer[..good.len()], good);
    assert_eq!(buffer[good.len()..], [7; 24]);
    // One byte more, and it fits.
    buffer.push(7);
    Editor::open(&mut buffer).unwrap().put_eyepiece(1, &eyepiece(1), &label).unwrap();
    assert_eq!(Record::check(&buffer).unwrap().eyepiece(1), Some(eyepiece(1)));
}

#[test]
fn names_are_up_to_twelve_bytes_without_a_zero() {
    assert_eq!(name("twelve bytes").bytes(), b"twelve bytes");
    assert_eq!(EquipmentName::new(b"thirteen byte").err(), Some(Error::new(Cause::NoRoom, 1)));
    assert_eq!(EquipmentName::new(b"a\0").err(), Some(Error::new(Cause::OutOfRange, 1)));
}

#[test]
fn cut_records_and_other_lengths_are_none() {
    let good = record([1, 2, 1, 1, 1, 1]);
    for length in 0..good.len() {
        assert_eq!(Record::check(&good[..length]), Err(NO_RECORD), "{length}");
    }
    let mut longer = good.clone();
    longer.extend([1, 2, 3]);
    assert_eq!(Record::check(&longer).unwrap().bytes(), good);
    assert_eq!(Record::check(&[0xFF; 976]), Err(NO_RECORD));
    assert_eq!(Record::check(&[0; 976]), Err(NO_RECORD));
}

#[test]
fn each_flipped_bit_is_seen() {
    for counts in [[0; 6], [1, 2, 1, 1, 1, 1], MOST] {
        let mut bytes = record(counts);
        for bit in 0..bytes.len() * 8 {
            bytes[bit / 8] ^= 1 << (bit % 8);
            assert_eq!(Record::check(&bytes), Err(NO_RECORD), "bit {bit}");
            bytes[bit / 8] ^= 1 << (bit % 8);
        }
    }
}

/// Every pair of bits, which CRC-32 sees in anything shorter than 2^32 bits.
#[test]
fn each_two_flipped_bits_are_seen() {
    let mut bytes = record([0, 1, 0, 0, 0, 0]);
    for one in 0..bytes.len() * 8 {
        for other in 0..one {
            bytes[one / 8] ^= 1 << (one % 8);
            bytes[other / 8] ^= 1 << (other % 8);
            assert_eq!(Record::check(&bytes), Err(NO_RECORD), "bits {one} and {other}");
            bytes[one / 8] ^= 1 << (one % 8);
            bytes[other / 8] ^= 1 << (other % 8);
        }
    }
}

#[test]
fn bursts_of_erased_bytes_are_seen() {
    let good = record([1, 4, 2, 1, 1, 1]);
    for fill in [0xFF, 0] {
        for start in 0..good.len() {
            for end in start + 1..=good.len() {
                let mut bytes = good.clone();
                bytes[start..end].fill(fill);
                let expected = if bytes == good { Ok(()) } else { Err(NO_RECORD) };
                assert_eq!(Record::check(&bytes).map(|_| ()), expected, "{start}..{end}");
            }
        }
    }
}

/// Where the checksum is right and the record is not.
#[test]
fn bad_members_are_refused() {
    let good = record([1; 6]);
    let refused = |at: usize, bytes: &[u8]| {
        let mut bad = good.clone();
        bad[at..at + bytes.len()].copy_from_slice(bytes);
        assert_ne!(bad, good);
        assert_eq!(Record::check(&sealed(bad)), Err(NO_RECORD), "{bytes:?} at {at}");
    };
    assert_eq!(Record::check(&sealed(good.clone())).unwrap().bytes(), good);
    refused(0, b"F");
    refused(4, &[0, 0]);
    refused(6, &[good.len() as u8 - 1]);
    for (at, most) in (12..18).zip(MOST) {
        refused(at, &[most + 1]);
        refused(at, &[0]);
        refused(at + 6, &[1]);
        refused(at + 6, &[254]);
    }
    let places = [24, 56, 81, 97, 118, 150];
    for place in places {
        refused(place, b"a\0b");
    }
    let [telescope, eyepiece, amplifier, camera, observer, site] = places.map(|place| place + 12);
    refused(telescope, &[0; 4]);
    refused(telescope + 4, &[0; 4]);
    refused(telescope + 8, &187_500u32.to_le_bytes());
    refused(telescope + 12, &[0; 4]);
    refused(telescope + 16, &65_537u32.to_le_bytes());
    refused(eyepiece, &[0; 4]);
    refused(eyepiece + 8, &648_000_000u32.to_le_bytes());
    refused(eyepiece + 12, &[2]);
    refused(amplifier, &[0; 4]);
    refused(camera, &[0; 4]);
    refused(camera + 4, &[0; 2]);
    refused(camera + 6, &[0; 2]);
    refused(camera + 8, &[0]);
    refused(camera + 4, &[1, 0, 1, 0, 2]);
    refused(observer + 16, &[0; 4]);
    refused(site, &0x4000_0001u32.to_le_bytes());
    refused(site, &0xBFFF_FFFFu32.to_le_bytes());
}

/// What an entry means is not known, but whether the record is whole.
#[test]
fn newer_versions_are_told() {
    let mut newer = record([1; 6]);
    newer[4..6].copy_from_slice(&2u16.to_le_bytes());
    assert_eq!(Record::check(&newer), Err(NO_RECORD));
    newer[12..24].fill(0x5A);
    let newer = sealed(newer);
    assert_eq!(Record::check(&newer), Err(Error::new(Cause::NewerRecord, 1)));
    let mut buffer = newer.clone();
    assert_eq!(Editor::open(&mut buffer).err(), Some(Error::new(Cause::NewerRecord, 1)));
    for bit in 0..newer.len() * 8 {
        let mut bytes = newer.clone();
        bytes[bit / 8] ^= 1 << (bit % 8);
        assert_eq!(Record::check(&bytes), Err(NO_RECORD), "bit {bit}");
    }
}

proptest! {
    #[test]
    fn pairs_of_bytes_are_seen(
        one in 0usize..344, other in 0usize..344, a in 1u8.., b in 1u8..,
    ) {
        let mut bytes = record([1, 8, 2, 0, 1, 1]);
        prop_assert_eq!(bytes.len(), 344);
        bytes[one] ^= a;
        bytes[other] ^= b;
        let same = one == other && a == b;
        prop_assert_eq!(Record::check(&bytes).is_ok(), same);
    }

    #[test]
    fn any_equipment_comes_back(
        focal_length_um in 1u32.., field_stop_um: u32, apparent_field_mas in 0u32..648_000_000, mapping in 0u8..2,
        latitude_bam in -(1i32 << 30)..=1 << 30, longitude_bam: u32, naked_eye_mmag: i32, text in "[ -~]{0,12}",
    ) {
        let mut buffer = [0; 200];
        let mut editor = Editor::empty(&mut buffer).unwrap();
        let eyepiece = Eyepiece { focal_length_um, field_stop_um, apparent_field_mas, mapping, padding: [0; 3] };
        let site = Site { latitude_bam, longitude_bam };
        let observer = Observer { naked_eye_mmag, ..observer(0) };
        editor.put_site(0, &site, &name(&text)).unwrap();
        editor.put_eyepiece(0, &Eyepiece { padding: [1, 2, 3], ..eyepiece }, &name(&text)).unwrap();
        editor.put_observer(0, &observer, &name(&text)).unwrap();
        let record = Record::check(&buffer).unwrap();
        prop_assert_eq!((record.eyepiece(0), record.site(0)), (Some(eyepiece), Some(site)));
        prop_assert_eq!(record.observer(0), Some(observer));
        prop_assert_eq!(record.name(Kind::Site, 0), Some(name(&text)));
    }
}
