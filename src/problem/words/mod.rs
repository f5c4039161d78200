//! The sentences: one catalogue for each language, filled in from a problem's arguments.

mod en;

use super::{InputCode, Level, Problem, Remark, Step, TargetCode, TurnCode, VerdictCode, Why};

/// The two sentences of a problem: what was found and what is allowed, and one thing to try.
#[derive(Debug, Clone, PartialEq, Eq)]
pub struct Sentence {
    /// What was found and what is allowed.
    pub message: String,
    /// One thing to try.
    pub hint: String,
}

/// A catalogue of sentences.
#[derive(Debug, Clone, Copy, PartialEq, Eq, Default)]
pub enum Language {
    /// English.
    #[default]
    En,
}

/// Says a problem in words: the catalogue's sentences with `{name}` replaced by the arguments.
///
/// ```
/// use shiftgauge::problem::{Problem, QuantityCode, words};
/// let sentence = words::say(&Problem::new(QuantityCode::Empty), words::Language::En);
/// assert!(!sentence.message.contains('{') && sentence.hint.ends_with('.'));
/// ```
#[must_use]
pub fn say(problem: &Problem, language: Language) -> Sentence {
    let (message, hint) = match language {
        Language::En => en::template(problem.code),
    };
    let arguments = &problem.arguments;
    Sentence { message: fill(message, arguments), hint: fill(hint, arguments) }
}

/// Says a note: how much it matters, and its sentence.
#[must_use]
pub fn note(remark: &Remark, language: Language) -> (Level, String) {
    let (level, template) = match language {
        Language::En => en::note(remark.code),
    };
    (level, fill(template, &remark.arguments))
}

/// Says a line of the working.
#[must_use]
pub fn step(step: &Step, language: Language) -> String {
    let template = match language {
        Language::En => en::step(step.code),
    };
    fill(template, &step.arguments)
}

/// Says what an input is called, in the middle of a sentence.
#[must_use]
pub fn input(name: &Remark<InputCode>, language: Language) -> String {
    let template = match language {
        Language::En => en::input(name.code),
    };
    fill(template, &name.arguments)
}

/// Says the verdict, or what would settle it.
#[must_use]
pub fn verdict(sentence: &Remark<VerdictCode>, language: Language) -> String {
    let template = match language {
        Language::En => en::verdict(sentence.code),
    };
    fill(template, &sentence.arguments)
}

/// Says why a nudge does what it does.
#[must_use]
pub fn why(why: &Why, language: Language) -> String {
    let template = match language {
        Language::En => en::why(why.code),
    };
    fill(template, &why.arguments)
}

/// Says what a nudge does.
#[must_use]
pub fn turn(turn: &Remark<TurnCode>, language: Language) -> String {
    let template = match language {
        Language::En => en::turn(turn.code),
    };
    fill(template, &turn.arguments)
}

/// Says what a target found.
#[must_use]
pub fn target(sentence: &Remark<TargetCode>, language: Language) -> String {
    let template = match language {
        Language::En => en::target(sentence.code),
    };
    fill(template, &sentence.arguments)
}

fn fill(template: &str, arguments: &[(&'static str, String)]) -> String {
    let mut text = String::with_capacity(template.len() + 32);
    let mut rest = template;
    while let Some(open) = rest.find('{') {
        let Some(length) = rest[open..].find('}') else { break };
        let name = &rest[open + 1..open + length];
        text.push_str(&rest[..open]);
        match arguments.iter().find(|(key, _)| *key == name) {
            Some((_, value)) => text.push_str(value),
            None => text.push_str(&rest[open..=open + length]),
        }
        rest = &rest[open + length + 1..];
    }
    text.push_str(rest);
    text
}
