//! Constants that stay where the program is. On AVR program memory has addresses of its own and what is not marked is
//! copied into RAM at the start; everywhere else this is an ordinary constant.

/// A constant that can only be copied out. On AVR its own bytes must not be read as data, so it cannot be moved either.
#[repr(transparent)]
pub(crate) struct Stored<T>(T);

/// Declares constants of type [`Stored`], in program memory on AVR: each in a section of its own or of a group's, so
/// that the linker can leave it out.
macro_rules! stored {
    ($($(#[$attribute:meta])* $visible:vis static $name:ident: $type:ty = $value:expr;)*) => {$(
        $crate::stored::stored! { in $name; $(#[$attribute])* $visible static $name: $type = $value; }
    )*};
    (in $group:ident; $(#[$attribute:meta])* $visible:vis static $name:ident: $type:ty = $value:expr;) => {
        $(#[$attribute])*
        #[cfg_attr(
            target_arch = "avr",
            allow(unsafe_code),
            unsafe(link_section = concat!(".progmem.data.", module_path!(), ".", stringify!($group)))
        )]
        $visible static $name: $crate::stored::Stored<$type> = $crate::stored::Stored::new($value);
    };
}
pub(crate) use stored;

/// The address of a text with the zero byte that C wants at its end.
#[cfg(feature = "capi")]
macro_rules! stored_text {
    ($group:ident, $text:literal) => {{
        const TEXT: &[u8] = concat!($text, "\0").as_bytes();
        $crate::stored::stored! {
            in $group; static BYTES: [u8; TEXT.len()] = *TEXT.first_chunk().unwrap();
        }
        BYTES.address().cast::<core::ffi::c_char>()
    }};
}
#[cfg(feature = "capi")]
pub(crate) use stored_text;

impl<T: Copy> Stored<T> {
    pub(crate) const fn new(value: T) -> Stored<T> {
        Stored(value)
    }

    /// Where it is, for the C interface: on AVR an address in program memory.
    #[cfg(feature = "capi")]
    pub(crate) const fn address(&'static self) -> *const T {
        &raw const self.0
    }

    /// A copy.
    #[cfg(any(test, feature = "capi"))]
    #[inline(always)]
    pub(crate) fn get(&self) -> T {
        copy(&self.0)
    }
}

impl<T: Copy, const N: usize> Stored<[T; N]> {
    /// A copy of one entry.
    #[inline(always)]
    pub(crate) fn at(&self, index: usize) -> T {
        copy(&self.0[index])
    }

    /// A copy of one entry, if there is one.
    #[inline(always)]
    pub(crate) fn checked(&self, index: usize) -> Option<T> {
        self.0.get(index).map(copy)
    }

    /// One entry, where it is.
    #[allow(unsafe_code)]
    #[inline(always)]
    pub(crate) fn entry(&self, index: usize) -> &Stored<T> {
        let entry = &raw const self.0[index];
        // SAFETY: a `Stored<T>` is laid out as its T.
        unsafe { &*entry.cast() }
    }

    /// Copies of the entries.
    #[inline(always)]
    pub(crate) fn iter(&self) -> impl DoubleEndedIterator<Item = T> + ExactSizeIterator + '_ {
        self.0.iter().map(copy)
    }
}

// SAFETY: it is never written, and what is Copy has no inside that could be.
#[allow(unsafe_code)]
unsafe impl<T: Copy> Sync for Stored<T> {}

#[cfg(not(target_arch = "avr"))]
#[inline(always)]
fn copy<T: Copy>(from: &T) -> T {
    *from
}

/// The reader of program memory.
#[cfg(target_arch = "avr")]
#[allow(unsafe_code)]
#[inline(always)]
fn copy<T: Copy>(from: &T) -> T {
    use core::arch::asm;
    use core::mem::{MaybeUninit, size_of, transmute_copy};

    let mut from: *const u8 = core::ptr::from_ref(from).cast();
    // SAFETY: only `stored!` and the C interface make a `Stored`, and both in program memory: so many bytes are there.
    unsafe {
        if size_of::<T>() == 4 {
            let (lower, upper): (u16, u16);
            asm!(
                "lpm {lower:l}, Z+",
                "lpm {lower:h}, Z+",
                "lpm {upper:l}, Z+",
                "lpm {upper:h}, Z",
                lower = out(reg_pair) lower,
                upper = out(reg_pair) upper,
                inout("Z") from => _,
                options(pure, nomem, nostack, preserves_flags)
            );
            return transmute_copy(&(u32::from(upper) << 16 | u32::from(lower)));
        }
        let mut copy = MaybeUninit::<T>::uninit();
        let to: *mut u8 = copy.as_mut_ptr().cast();
        for at in 0..size_of::<T>() {
            let byte: u8;
            asm!(
                "lpm {byte}, Z+",
                byte = out(reg) byte,
                inout("Z") from,
                options(pure, nomem, nostack, preserves_flags)
            );
            to.add(at).write(byte);
        }
        copy.assume_init()
    }
}
