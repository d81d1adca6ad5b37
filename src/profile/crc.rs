use crate::stored::stored;

stored! {
    /// The remainders of 0 to 15 times x^32 by the polynomial, reflected.
    static OF_NIBBLE: [u32; 16] = nibbles();
}

/// CRC-32 of IEEE 802.3: polynomial 0x04C11DB7, reflected 0xEDB88320, all ones at the start and inverted at the end.
///
/// Of the digits "123456789" it is 0xCBF43926. Source: IEEE Std 802.3, frame check sequence.
///
/// ```
/// let mut crc = fieldstop::profile::Crc::new();
/// crc.add(b"12345");
/// crc.add(b"6789");
/// assert_eq!(crc.value(), 0xCBF4_3926);
/// ```
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub struct Crc(u32);

impl Crc {
    /// Of no bytes.
    pub const fn new() -> Crc {
        Crc(u32::MAX)
    }

    /// Takes more bytes in.
    pub fn add(&mut self, bytes: &[u8]) {
        for byte in bytes {
            self.0 ^= u32::from(*byte);
            for _ in 0..2 {
                self.0 = self.0 >> 4 ^ OF_NIBBLE.checked(self.0 as usize & 15).unwrap_or(0);
            }
        }
    }

    /// Of all bytes so far.
    pub const fn value(self) -> u32 {
        !self.0
    }
}

impl Default for Crc {
    fn default() -> Crc {
        Crc::new()
    }
}

const fn nibbles() -> [u32; 16] {
    let mut table = [0; 16];
    let mut nibble = 0;
    while nibble < 16 {
        let mut rest = nibble as u32;
        let mut bit = 0;
        while bit < 4 {
            rest = if rest & 1 == 1 { rest >> 1 ^ 0xEDB8_8320 } else { rest >> 1 };
            bit += 1;
        }
        table[nibble] = rest;
        nibble += 1;
    }
    table
}
