//! An error is data: a code, its arguments, the field and the place in its text.
//!
//! A [`Problem`] says what was found, where, and (through the catalogue of sentences in
//! [`words`]) what is allowed and one thing to try. Rooms below create problems without knowing
//! which field the text came from; the caller that knows adds it with [`Problem::at`].

mod code;
mod remark;
mod sentence_code;
mod span;
pub mod words;

pub use code::{
    CaseCode, Code, ConstantCode, EquilibriumCode, LibraryCode, MixtureCode, QuantityCode,
    ReactionCode,
};
pub use remark::{Level, Remark, Step, Why};
pub use sentence_code::{
    InputCode, NoteCode, StepCode, TargetCode, TurnCode, VerdictCode, WhyCode,
};
pub use span::Span;

/// One mistake in what the user gave: a code, its arguments, the field and the span in its text.
///
/// ```
/// use shiftgauge::problem::{Problem, QuantityCode, Span};
/// let problem = Problem::new(QuantityCode::Empty).span(Span::of("é x", 2..3)).at("temperature");
/// assert_eq!(problem.field, "temperature");
/// assert_eq!(problem.span, Some(Span { start: 1, end: 2 }));
/// ```
#[derive(Debug, Clone, PartialEq, Eq)]
pub struct Problem {
    /// Which mistake it is; one code a mistake.
    pub code: Code,
    /// What the sentence is filled in with: what was found, what is allowed.
    pub arguments: Vec<(&'static str, String)>,
    /// The path of the field in the case, such as `reading.gas.entries[2].value`.
    pub field: String,
    /// The place in the field's text, where one is known.
    pub span: Option<Span>,
}

/// What a room gives back: the thing, or every problem found with it (never an empty list).
pub type Outcome<T> = Result<T, Vec<Problem>>;

impl Problem {
    /// Starts a problem of this code, with no arguments, field or span yet.
    pub fn new(code: impl Into<Code>) -> Self {
        Self::of(code.into())
    }

    #[cold]
    #[inline(never)]
    fn of(code: Code) -> Self {
        Self { code, arguments: Vec::new(), field: String::new(), span: None }
    }

    /// Adds an argument that the sentence of this code names in braces.
    #[must_use]
    pub fn with(self, name: &'static str, value: impl Into<String>) -> Self {
        self.with_text(name, value.into())
    }

    // Problems are made at hundreds of places: kept apart, each place is a short call.
    #[cold]
    #[inline(never)]
    fn with_text(mut self, name: &'static str, value: String) -> Self {
        self.arguments.push((name, value));
        self
    }

    /// Sets the place in the field's text.
    #[must_use]
    pub fn span(mut self, span: Span) -> Self {
        self.span = Some(span);
        self
    }

    /// Sets the field, or puts its parent's path before the one already there.
    #[must_use]
    #[inline(never)]
    pub fn at(mut self, field: &str) -> Self {
        self.field = match (field.is_empty(), self.field.as_str()) {
            (true, _) => self.field,
            (false, "") => field.to_owned(),
            (false, inner) if inner.starts_with('[') => format!("{field}{inner}"),
            (false, inner) => format!("{field}.{inner}"),
        };
        self
    }
}

impl From<Problem> for Vec<Problem> {
    fn from(problem: Problem) -> Self {
        vec![problem]
    }
}
