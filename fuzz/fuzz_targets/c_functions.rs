//! Every C function on arbitrary bytes: the first two choose it, the others are its arguments and what these point to.
//! Where a status is given nothing may have been written, and never through a pointer to const.
#![no_main]

use fieldstop::Cause;
use libfuzzer_sys::fuzz_target;
use std::alloc::{Layout, alloc, dealloc};
use std::ffi::{c_char, c_void};
use std::slice;

include!(concat!(env!("OUT_DIR"), "/calls.rs"));

fuzz_target!(|bytes: &[u8]| {
    let mut input =
        Input { bytes, blocks: Vec::new(), texts: Vec::new(), pointers: Vec::new(), nulls: false };
    let choice: u16 = input.take(1);
    CALLS[choice as usize % CALLS.len()](&mut input);
});

/// Memory that an argument points to: of exactly its size, so that the sanitizer sees a step over its end.
struct Block {
    start: *mut u8,
    layout: Layout,
    before: Vec<u8>,
    constant: bool,
}

impl Block {
    fn now(&self) -> &[u8] {
        unsafe { slice::from_raw_parts(self.start, self.before.len()) }
    }
}

impl Drop for Block {
    fn drop(&mut self) {
        unsafe { dealloc(self.start, self.layout) }
    }
}

/// Zeros follow when the bytes are at their end.
struct Input<'a> {
    bytes: &'a [u8],
    blocks: Vec<Block>,
    /// Each with the zero byte at its end.
    texts: Vec<Vec<u8>>,
    pointers: Vec<*const c_char>,
    nulls: bool,
}

/// As many as the longest table of labels has, or more.
const TEXTS: usize = 32;

impl Input<'_> {
    /// A number, or a pointer to `count` of what it points to.
    fn take<T: Take>(&mut self, count: usize) -> T {
        T::take(self, count)
    }

    fn byte(&mut self) -> u8 {
        let Some((first, rest)) = self.bytes.split_first() else { return 0 };
        self.bytes = rest;
        *first
    }

    fn pointer<T>(&mut self, count: usize, constant: bool) -> *mut T {
        if self.byte() % 16 == 15 {
            self.nulls = true;
            return std::ptr::null_mut();
        }
        self.block(count, constant)
    }

    fn list<T>(&mut self, count: usize) -> *const T {
        self.block(count, true)
    }

    fn block<T>(&mut self, count: usize, constant: bool) -> *mut T {
        let size = count * size_of::<T>();
        let layout = Layout::from_size_align(size.max(1), align_of::<T>()).unwrap();
        let (given, rest) = self.bytes.split_at(size.min(self.bytes.len()));
        self.bytes = rest;
        let mut before = given.to_vec();
        before.resize(size, 0);
        let start = unsafe { alloc(layout) };
        unsafe { start.copy_from_nonoverlapping(before.as_ptr(), size) };
        self.blocks.push(Block { start, layout, before, constant });
        start.cast()
    }

    fn texts(&mut self) -> *const *const c_char {
        if self.byte() % 16 == 15 {
            self.nulls = true;
            return std::ptr::null();
        }
        for _ in 0..TEXTS {
            self.text();
        }
        self.pointers = self.texts.iter().map(|text| text.as_ptr().cast()).collect();
        self.pointers.as_ptr()
    }

    /// A text with the zero byte at its end.
    fn text(&mut self) -> *const c_char {
        let length = self.byte() % 40;
        let text: Vec<u8> = (0..length).map(|_| self.byte()).filter(|byte| *byte != 0).chain([0]).collect();
        self.texts.push(text);
        self.texts.last().unwrap().as_ptr().cast()
    }

    fn check(&self, status: u16) {
        if self.nulls {
            assert_eq!(status as u8, Cause::NullPointer as u8);
        }
        for block in &self.blocks {
            if status != 0 || block.constant {
                assert_eq!(block.now(), block.before, "written with status {status:#06x}");
            }
        }
        assert!(status == 0 || Cause::from_number(status as u8).is_some(), "{status:#06x}");
    }
}

trait Take {
    fn take(input: &mut Input, count: usize) -> Self;
}

macro_rules! take_numbers {
    ($($t:ty)*) => {$(
        impl Take for $t {
            fn take(input: &mut Input, _: usize) -> Self {
                <$t>::from_le_bytes(std::array::from_fn(|_| input.byte()))
            }
        }
    )*};
}
take_numbers!(u8 i8 u16 i16 u32 i32 f32 f64);

impl<T> Take for *mut T {
    fn take(input: &mut Input, count: usize) -> Self {
        input.pointer(count, false)
    }
}

impl<T> Take for *const T {
    fn take(input: &mut Input, count: usize) -> Self {
        input.pointer(count, true)
    }
}

/// The functions of a storage: blank, and deaf to what is written. The target `record` has one that works.
impl Take for Option<unsafe extern "C" fn(*mut c_void, u32, *mut u8, u16) -> u16> {
    fn take(_: &mut Input, _: usize) -> Self {
        unsafe extern "C" fn read(_: *mut c_void, _: u32, bytes: *mut u8, length: u16) -> u16 {
            unsafe { bytes.write_bytes(0xFF, length.into()) };
            0
        }
        Some(read)
    }
}

impl Take for Option<unsafe extern "C" fn(*mut c_void, u32, *const u8, u16) -> u16> {
    fn take(input: &mut Input, _: usize) -> Self {
        unsafe extern "C" fn write(_: *mut c_void, _: u32, _: *const u8, _: u16) -> u16 {
            0
        }
        if input.byte() % 16 == 15 {
            input.nulls = true;
            return None;
        }
        Some(write)
    }
}

impl Take for Option<unsafe extern "C" fn(*mut c_void, u32, u32) -> u16> {
    fn take(input: &mut Input, _: usize) -> Self {
        unsafe extern "C" fn erase(_: *mut c_void, _: u32, _: u32) -> u16 {
            0
        }
        if input.byte() % 2 == 0 { Some(erase) } else { None }
    }
}
