//! Numbers one after the other in bytes, the low byte first.

/// Takes numbers from the front; zeros follow at the end.
pub(super) struct Fields<'a>(pub(super) &'a [u8]);

impl Fields<'_> {
    pub(super) fn bytes<const N: usize>(&mut self) -> [u8; N] {
        match self.0.split_first_chunk() {
            Some((first, rest)) => {
                self.0 = rest;
                *first
            }
            None => [0; N],
        }
    }

    pub(super) fn u8(&mut self) -> u8 {
        let [byte] = self.bytes();
        byte
    }

    pub(super) fn u16(&mut self) -> u16 {
        u16::from_le_bytes(self.bytes())
    }

    pub(super) fn u32(&mut self) -> u32 {
        u32::from_le_bytes(self.bytes())
    }
}

/// Puts numbers to the front; what has no room is left out.
pub(super) struct FieldsMut<'a>(pub(super) &'a mut [u8]);

impl FieldsMut<'_> {
    pub(super) fn bytes<const N: usize>(&mut self, bytes: [u8; N]) {
        if let Some((first, rest)) = core::mem::take(&mut self.0).split_first_chunk_mut() {
            *first = bytes;
            self.0 = rest;
        }
    }

    pub(super) fn u8(&mut self, number: u8) {
        self.bytes([number]);
    }

    pub(super) fn u16(&mut self, number: u16) {
        self.bytes(number.to_le_bytes());
    }

    pub(super) fn u32(&mut self, number: u32) {
        self.bytes(number.to_le_bytes());
    }
}
