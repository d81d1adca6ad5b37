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
    // Bit by bit: a table of nibbles takes less time, but storage is slower than either, and a table takes more flash.
    pub fn add(&mut self, bytes: &[u8]) {
        for byte in bytes {
            self.0 ^= u32::from(*byte);
            for _ in 0..8 {
                let out = self.0 & 1;
                self.0 = self.0 >> 1 ^ (0xEDB8_8320 & out.wrapping_neg());
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
