//! Where an equation divides: the sign between its sides, and the plus signs between its species.

use std::ops::Range;

use super::charge::sign;
use super::place::{Place, closes, opens};
use super::species::is_phase;

/// The signs that divide the sides and all mean the same, longer ones first.
const ARROWS: [&str; 20] = [
    "<-->", "<==>", "<=>", "<->", "-->", "==>", "->", "=>", "==", "=", "⇌", "⇋", "⇄", "⇆", "→",
    "⟶", "↔", "⟷", "⇒", "⇔",
];

/// The places of all signs that divide sides.
///
/// In `OH-->`, where a dash touches the formula before it, that dash is the formula's charge.
pub(super) fn arrows(text: &str) -> Vec<Range<usize>> {
    let inside = in_brackets(text);
    let mut found = Vec::new();
    let mut at = 0;
    while let Some(character) = text[at..].chars().next() {
        let touches = text[..at].chars().next_back().is_some_and(|c| !c.is_whitespace());
        let arrow = ARROWS.iter().find(|arrow| {
            let charge_first = touches && **arrow == "-->";
            text[at..].starts_with(**arrow) && !charge_first
        });
        match arrow.filter(|_| !inside[at]) {
            Some(arrow) => {
                found.push(at..at + arrow.len());
                at += arrow.len();
            }
            None => at += character.len_utf8(),
        }
    }
    found
}

/// The terms of one side, between its plus signs.
///
/// A plus divides unless it is a charge: one that stands in brackets or after `^`, or one that
/// touches the formula before it with no species after it but an end, another plus or a phase.
/// Of several in a row the last may divide and the others are charges: `Na++Cl-`.
pub(super) fn terms(side: Place<'_>) -> Vec<Place<'_>> {
    let text = side.text();
    let inside = in_brackets(text);
    let mut terms = Vec::new();
    let mut start = 0;
    let mut at = 0;
    while let Some(character) = text[at..].chars().next() {
        if !is_plus(character) || inside[at] {
            at += character.len_utf8();
            continue;
        }
        let run: Vec<usize> = text[at..]
            .char_indices()
            .take_while(|(_, c)| is_plus(*c))
            .map(|(byte, _)| at + byte)
            .collect();
        let end = at + text[at..].len() - text[at..].trim_start_matches(is_plus).len();
        let touches = text[..at].chars().next_back().is_some_and(|c| !c.is_whitespace());
        let charges = match (touches, starts_term(&text[end..])) {
            (false, _) => 0,
            (true, true) if run.len() == 1 && after_caret(&text[..at]) => 1,
            (true, true) => run.len() - 1,
            (true, false) => run.len(),
        };
        for &plus in run.iter().skip(charges) {
            terms.push(side.part(start..plus));
            start = plus + text[plus..].chars().next().map_or(1, char::len_utf8);
        }
        at = end;
    }
    terms.push(side.from(start));
    terms
}

fn is_plus(character: char) -> bool {
    character != '⁺' && sign(character) == Some('+')
}

/// Whether a charge has begun: `^` with or without its number.
fn after_caret(before: &str) -> bool {
    before.trim_end_matches(|c: char| c.is_ascii_digit()).ends_with('^')
}

/// Whether a species, or its coefficient, begins after a plus.
fn starts_term(after: &str) -> bool {
    let after = after.trim_start();
    let Some(first) = after.chars().next() else { return false };
    if first == '(' {
        let inside = after[1..].split(')').next().unwrap_or("");
        return !is_phase(inside);
    }
    first.is_alphanumeric() || opens(first) || first == '.'
}

/// For each byte, whether it stands in a pair of brackets that both opens and closes.
fn in_brackets(text: &str) -> Vec<bool> {
    let mut change = vec![0_i32; text.len() + 1];
    let mut open = Vec::new();
    for (at, character) in text.char_indices() {
        if opens(character) {
            open.push(at);
        } else if closes(character) {
            if let Some(opened) = open.pop() {
                change[opened] += 1;
                change[at] -= 1;
            }
        }
    }
    let depths = change.iter().scan(0, |depth, change| {
        *depth += change;
        Some(*depth > 0)
    });
    depths.collect()
}
