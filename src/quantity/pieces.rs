//! Where the parts of a quantity stand in its text, before any of them is read.

use super::number::{shortened, skip_space};
use crate::problem::Problem;
use crate::problem::QuantityCode;
use crate::problem::Span;
use std::ops::Range;

/// Byte ranges of the parts: `[<] [pH] [(] head [± tail [)]] after`.
///
/// The head is a number and perhaps its unit; so is the tail; `after` is what follows a closing
/// parenthesis: `(215 ± 2) °C`.
pub(super) struct Pieces {
    /// Where `<` stands.
    pub bound: Option<Range<usize>>,
    /// Where `pH` stands before the number.
    pub ph: Option<Range<usize>>,
    /// The number and perhaps its unit.
    pub head: Range<usize>,
    /// What follows the plus-minus sign.
    pub tail: Option<Range<usize>>,
    /// What follows the closing parenthesis.
    pub after: Option<Range<usize>>,
    /// An instrument's preset, taken out of the other parts.
    pub preset: Option<Range<usize>>,
}

const PLUS_MINUS: [&str; 5] = ["±", "+/-", "+/−", "+-", "+−"];
const AT_MOST: [&str; 3] = ["<=", "≤", "<"];
const AT_LEAST: [&str; 3] = [">=", "≥", ">"];

/// Splits a text that is not blank; mistakes of its outline go to `problems`.
pub(super) fn split(text: &str, problems: &mut Vec<Problem>) -> Pieces {
    let end = text.trim_end().len();
    let mut at = skip_space(text, 0);
    let mut bound = None;
    if let Some(mark) = starts_with_any(&text[at..], &AT_MOST) {
        bound = Some(at..at + mark.len());
        at = skip_space(text, at + mark.len());
    } else if let Some(mark) = starts_with_any(&text[at..], &AT_LEAST) {
        let problem = Problem::new(QuantityCode::BoundAbove).with("found", mark);
        problems.push(problem.span(Span::of(text, at..at + mark.len())));
        at = skip_space(text, at + mark.len());
    }
    let ph = ph_length(&text[at..]).map(|length| at..at + length);
    if let Some(range) = &ph {
        at = skip_space(text, range.end);
        if text[at..].starts_with(['=', ':']) {
            at = skip_space(text, at + 1);
        }
    }
    let at = at.min(end);
    let (main, preset) = match preset_start(&text[at..end]) {
        Some(start) => (at..at + start, Some(at + start..end)),
        None => (at..end, None),
    };
    let mut pieces = Pieces { bound, ph, head: main.clone(), tail: None, after: None, preset };
    if text[main.clone()].starts_with('(') {
        match closing(&text[main.clone()]) {
            Some(close) => {
                pieces.after = Some(main.start + close + 1..main.end);
                pieces.head =
                    skip_space(text, main.start + 1).min(main.start + close)..main.start + close;
            }
            None => {
                let problem = Problem::new(QuantityCode::Parenthesis);
                problems.push(problem.span(Span::of(text, main.start..main.start + 1)));
                pieces.head = skip_space(text, main.start + 1).min(main.end)..main.end;
            }
        }
    }
    let inside = pieces.head.clone();
    if let Some(sign) = find_plus_minus(text, inside.clone()) {
        pieces.head = inside.start..sign.start;
        pieces.tail = Some(sign.end..inside.end);
    }
    let rest = pieces.tail.clone().map_or(inside.end, |tail| tail.start)..main.end;
    if let Some(again) = find_plus_minus(text, rest) {
        let found = shortened(text[again.start..main.end].trim());
        let problem = Problem::new(QuantityCode::ToleranceTwice).with("found", found);
        problems.push(problem.span(Span::of(text, again.clone())));
        if let Some(tail) = &mut pieces.tail {
            tail.end = tail.end.min(again.start);
        }
        if let Some(after) = &mut pieces.after {
            after.end = after.end.min(again.start).max(after.start);
        }
    }
    pieces
}

fn starts_with_any<'a>(text: &str, marks: &[&'a str]) -> Option<&'a str> {
    marks.iter().copied().find(|mark| text.starts_with(mark))
}

fn ph_length(text: &str) -> Option<usize> {
    let is_ph = text.get(..2)?.eq_ignore_ascii_case("ph");
    let continues = text[2..].starts_with(char::is_alphabetic);
    (is_ph && !continues).then_some(2)
}

/// The parenthesis that closes the one at the start, over those of `bar(g)`.
fn closing(text: &str) -> Option<usize> {
    let mut depth = 0usize;
    for (at, character) in text.char_indices() {
        match character {
            '(' => depth += 1,
            ')' => depth = depth.saturating_sub(1),
            _ => continue,
        }
        if depth == 0 {
            return Some(at);
        }
    }
    None
}

fn find_plus_minus(text: &str, range: Range<usize>) -> Option<Range<usize>> {
    let part = &text[range.clone()];
    let found = PLUS_MINUS.iter().filter_map(|mark| part.find(mark).map(|at| (at, mark.len())));
    let (at, length) = found.min_by_key(|(at, length)| (*at, usize::MAX - length))?;
    Some(range.start + at..range.start + at + length)
}

/// Where `type K class 2`, `Pt100 class B` or `class 1.0` starts.
fn preset_start(text: &str) -> Option<usize> {
    let lower = text.to_ascii_lowercase();
    let words = ["type ", "pt100", "pt500", "pt1000", "class "];
    let starts_word = |at: &usize| !lower[..*at].ends_with(char::is_alphanumeric);
    words.iter().filter_map(|word| lower.find(word)).filter(starts_word).min()
}
