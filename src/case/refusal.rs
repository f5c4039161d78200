//! A refusal: the problems as the border carries them, with their sentences.

use std::collections::BTreeMap;

use serde::Serialize;

use crate::problem::Problem;
use crate::problem::words::{Language, say};

/// An answer that could not be given, and why: every problem at once.
#[derive(Debug, Clone, Serialize)]
pub struct Refusal {
    /// Always false.
    pub ok: bool,
    /// The problems; never empty.
    pub problems: Vec<ProblemReport>,
}

/// A problem with its sentences.
#[derive(Debug, Clone, Serialize)]
pub struct ProblemReport {
    /// Which mistake it is.
    pub code: &'static str,
    /// The path of the field.
    pub field: String,
    /// The place in the field's text, in UTF-16 units.
    pub span: Option<SpanReport>,
    /// What the sentences were filled in with.
    pub arguments: BTreeMap<&'static str, String>,
    /// What was found and what is allowed.
    pub message: String,
    /// One thing to try.
    pub hint: String,
}

/// A place in a text.
#[derive(Debug, Clone, Copy, Serialize)]
pub struct SpanReport {
    /// Where it starts.
    pub start: usize,
    /// Where it ends, excluded.
    pub end: usize,
}

impl Refusal {
    /// Says the problems in words.
    #[must_use]
    pub fn new(problems: Vec<Problem>) -> Self {
        let problems = problems.into_iter().map(|problem| {
            let sentence = say(&problem, Language::En);
            // One by one: collecting would sort them first, with code of its own.
            let mut arguments = BTreeMap::new();
            for (name, text) in problem.arguments {
                arguments.insert(name, text);
            }
            ProblemReport {
                code: problem.code.as_str(),
                span: problem.span.map(|span| SpanReport { start: span.start, end: span.end }),
                arguments,
                message: sentence.message,
                hint: sentence.hint,
                field: problem.field,
            }
        });
        Self { ok: false, problems: problems.collect() }
    }
}

/// What a call gives: what was asked for, or a refusal.
#[derive(Debug, Clone, Serialize)]
#[serde(untagged)]
pub enum Answer<T> {
    /// What was asked for; it says `ok: true` itself.
    Given(T),
    /// Why it could not be given.
    Refused(Refusal),
}

impl<T> From<Result<T, Vec<Problem>>> for Answer<T> {
    fn from(outcome: Result<T, Vec<Problem>>) -> Self {
        match outcome {
            Ok(given) => Answer::Given(given),
            Err(problems) => Answer::Refused(Refusal::new(problems)),
        }
    }
}
