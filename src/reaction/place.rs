//! A part of a longer text that knows where it stands in it.

use std::ops::Range;

use crate::problem::Problem;
use crate::problem::ReactionCode;
use crate::problem::Span;

/// A part of a text; problems found in it point into the whole text.
#[derive(Debug, Clone, Copy)]
pub(super) struct Place<'a> {
    source: &'a str,
    start: usize,
    end: usize,
}

impl<'a> Place<'a> {
    /// All of a text.
    pub(super) fn whole(source: &'a str) -> Self {
        Self { source, start: 0, end: source.len() }
    }

    /// The text of this part.
    pub(super) fn text(self) -> &'a str {
        self.source.get(self.start..self.end).unwrap_or("")
    }

    /// A part of this part, in bytes counted from its start; on character borders.
    pub(super) fn part(self, bytes: Range<usize>) -> Self {
        let start = (self.start + bytes.start).min(self.end);
        Self { start, end: (self.start + bytes.end).clamp(start, self.end), ..self }
    }

    /// This part from a byte on.
    pub(super) fn from(self, byte: usize) -> Self {
        self.part(byte..self.end - self.start)
    }

    /// This part without the space around it.
    pub(super) fn trimmed(self) -> Self {
        let text = self.text();
        let start = text.len() - text.trim_start().len();
        self.part(start..start.max(text.trim_end().len()))
    }

    /// Its place in the whole text.
    pub(super) fn span(self) -> Span {
        Span::of(self.source, self.start..self.end)
    }

    /// A problem with this part, which the sentence calls `{found}`.
    pub(super) fn problem(self, code: ReactionCode) -> Problem {
        Problem::new(code).with("found", self.text()).span(self.span())
    }
}

/// Whether a character opens a group.
pub(super) fn opens(character: char) -> bool {
    matches!(character, '(' | '[' | '{')
}

/// Whether a character closes a group.
pub(super) fn closes(character: char) -> bool {
    matches!(character, ')' | ']' | '}')
}

/// The byte of the bracket that opens what the last character of the text closes.
pub(super) fn opening_of_last(text: &str) -> Option<usize> {
    let mut depth = 0_usize;
    for (byte, character) in text.char_indices().rev() {
        if closes(character) {
            depth += 1;
        } else if opens(character) {
            depth = depth.checked_sub(1)?;
        }
        if depth == 0 {
            return opens(character).then_some(byte);
        }
    }
    None
}
