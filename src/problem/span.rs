//! A place in a field's text, counted as JavaScript counts.

use std::ops::Range;

/// A place in a text in UTF-16 code units, end excluded, so that a page can select it.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub struct Span {
    /// Where it starts.
    pub start: usize,
    /// Where it ends (the first unit after it).
    pub end: usize,
}

impl Span {
    /// Turns a range of bytes of `text` into UTF-16 units; a range that is not on character
    /// borders, or past the end, is widened to the nearest ones.
    #[must_use]
    pub fn of(text: &str, bytes: Range<usize>) -> Self {
        let start = units_before(text, bytes.start);
        let mut end_byte = bytes.end.min(text.len());
        while !text.is_char_boundary(end_byte) {
            end_byte += 1;
        }
        Self { start, end: units_before(text, end_byte).max(start) }
    }
}

fn units_before(text: &str, byte: usize) -> usize {
    let mut byte = byte.min(text.len());
    while !text.is_char_boundary(byte) {
        byte -= 1;
    }
    text[..byte].encode_utf16().count()
}
