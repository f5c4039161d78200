//! Notes and lines of the working: data too, said by the same catalogue as problems.

use super::sentence_code::{NoteCode, StepCode, WhyCode};

/// How much a note matters.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum Level {
    /// Something not stated was taken.
    Assumption,
    /// Something was turned into something else.
    Conversion,
    /// The result is weaker than it looks.
    Warning,
    /// What the user must keep in mind.
    Caution,
}

impl Level {
    /// The level's name at the border.
    #[must_use]
    pub fn as_str(self) -> &'static str {
        match self {
            Level::Assumption => "assumption",
            Level::Conversion => "conversion",
            Level::Warning => "warning",
            Level::Caution => "caution",
        }
    }
}

/// Something worth knowing beside a result: a code and its arguments.
#[derive(Debug, Clone, PartialEq, Eq)]
pub struct Remark<C = NoteCode> {
    /// Which remark.
    pub code: C,
    /// What its sentence is filled in with.
    pub arguments: Vec<(&'static str, String)>,
}

/// A line of the working.
pub type Step = Remark<StepCode>;

/// Why a nudge does what it does.
pub type Why = Remark<WhyCode>;

impl<C> Remark<C> {
    /// Starts a remark without arguments.
    pub fn new(code: C) -> Self {
        Self { code, arguments: Vec::new() }
    }

    /// Adds an argument that the sentence names in braces.
    #[must_use]
    pub fn with(mut self, name: &'static str, value: impl Into<String>) -> Self {
        self.arguments.push((name, value.into()));
        self
    }
}
