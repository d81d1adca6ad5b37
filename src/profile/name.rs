use crate::status::{Cause, Error};

/// What the owner calls a piece of equipment: up to 12 bytes in the characters of the owner's display.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct EquipmentName {
    /// Bytes of the name, and zeros behind it; all 12 may be taken.
    pub text: [u8; 12],
}

impl EquipmentName {
    /// A name of these bytes.
    ///
    /// # Errors
    ///
    /// [`Cause::NoRoom`]: more than 12 bytes. [`Cause::OutOfRange`]: a zero byte among them.
    pub fn new(bytes: &[u8]) -> Result<EquipmentName, Error> {
        let mut name = EquipmentName::default();
        let Some(room) = name.text.get_mut(..bytes.len()) else {
            return Err(Error::new(Cause::NoRoom, 1));
        };
        for (to, from) in room.iter_mut().zip(bytes) {
            if *from == 0 {
                return Err(Error::new(Cause::OutOfRange, 1));
            }
            *to = *from;
        }
        Ok(name)
    }

    /// The bytes before the first zero.
    pub fn bytes(&self) -> &[u8] {
        self.text.split(|byte| *byte == 0).next().unwrap_or_default()
    }

    /// Zeros only behind the name.
    ///
    /// # Errors
    ///
    /// [`Cause::OutOfRange`]: another byte behind a zero (1).
    pub fn check(&self) -> Result<(), Error> {
        let mut ended = false;
        for byte in self.text {
            if ended && byte != 0 {
                return Err(Error::new(Cause::OutOfRange, 1));
            }
            ended |= byte == 0;
        }
        Ok(())
    }
}
