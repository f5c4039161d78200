//! The charge at the end of a formula.

use crate::problem::Problem;
use crate::problem::ReactionCode;

use super::limits;
use super::place::{Place, closes, opening_of_last};

/// Why the text of a charge is none.
enum Fault {
    /// The sign stands before the number, which IUPAC writes the other way round.
    Order { number: String, sign: char },
    /// It is no number and sign.
    Bad,
}

/// Takes the charge off the end of a formula: what is left, and the charge.
pub(super) fn split(place: Place<'_>) -> Result<(Place<'_>, i32), Problem> {
    let text = place.text();
    if let Some(caret) = text.find('^') {
        let written = text[caret + 1..].trim_matches(['(', ')', '{', '}']);
        return take(place, caret, written);
    }
    if let Some(open) = opening_of_last(text) {
        let inside = &text[open + 1..text.len() - 1];
        let only_charge = inside.chars().all(|c| sign(c).is_some() || c.is_ascii_digit());
        if inside.chars().any(|c| sign(c).is_some()) && only_charge {
            return take(place, open, inside);
        }
    }
    let body = text.trim_end_matches(|c| sign(c).is_some() || superscript_digit(c).is_some());
    let written = &text[body.len()..];
    if written.chars().any(is_superscript) {
        return take(place, body.len(), written);
    }
    match written.chars().count() {
        0 => split_sign_first(place),
        1 => split_bare_sign(place, body),
        _ => take(place, body.len(), written),
    }
}

/// `SO4-2`: nothing else ends in a sign and digits, so it is said how a charge is written.
fn split_sign_first(place: Place<'_>) -> Result<(Place<'_>, i32), Problem> {
    let text = place.text();
    let before = text.trim_end_matches(|c: char| c.is_ascii_digit());
    let signed = before.chars().next_back().and_then(sign).is_some();
    if !signed || before.len() == text.len() {
        return Ok((place, 0));
    }
    let body = before.trim_end_matches(|c| sign(c).is_some());
    take(place, body.len(), &text[body.len()..])
}

/// One plain sign: a charge of one, unless the digits before it may be meant as its number.
fn split_bare_sign<'a>(place: Place<'a>, body: &str) -> Result<(Place<'a>, i32), Problem> {
    let text = place.text();
    let written = &text[body.len()..];
    let stem = body.trim_end_matches(|c: char| c.is_ascii_digit());
    let digits = &body[stem.len()..];
    let before = stem.chars().next_back();
    if digits.is_empty() || matches!(before, Some('.' | ',')) {
        return take(place, body.len(), written);
    }
    if before.is_some_and(|c| super::count::subscript_digit(c).is_some()) {
        return take(place, stem.len(), &text[stem.len()..]);
    }
    if digits.len() == 1 && !is_single_unit(stem) {
        return take(place, body.len(), written);
    }
    let shorter = &body[..body.len() - 1];
    let sign = written.chars().next().and_then(sign).unwrap_or('+');
    Err(place
        .problem(ReactionCode::ChargeAmbiguous)
        .with("first", format!("{shorter}^{}{sign}", &body[shorter.len()..]))
        .with("second", format!("{body}^{sign}")))
}

/// Whether a text is one element's symbol or one group in brackets.
fn is_single_unit(text: &str) -> bool {
    let mut letters = text.chars();
    let symbol = letters.next().is_some_and(|c| c.is_ascii_uppercase())
        && letters.all(|c| c.is_ascii_lowercase());
    symbol || (text.ends_with(closes) && opening_of_last(text) == Some(0))
}

fn take<'a>(place: Place<'a>, at: usize, written: &str) -> Result<(Place<'a>, i32), Problem> {
    let body = place.part(0..at).trimmed();
    match charge(written) {
        Ok(charge) if charge.abs() <= limits::CHARGE => Ok((body, charge)),
        Ok(_) => Err(place
            .problem(ReactionCode::ChargeTooLarge)
            .with("limit", limits::CHARGE.to_string())),
        Err(Fault::Order { number, sign }) => {
            let number = if number == "1" { "" } else { &number };
            let suggestion = format!("{}^{number}{sign}", body.text());
            Err(place.problem(ReactionCode::ChargeOrder).with("suggestion", suggestion))
        }
        Err(Fault::Bad) => Err(place.from(at).problem(ReactionCode::ChargeBad)),
    }
}

/// `2-`, `+`, or signs one for each charge, `--`.
fn charge(written: &str) -> Result<i32, Fault> {
    let plain: Option<String> =
        written.trim().chars().map(|c| sign(c).or(superscript_digit(c)).or(digit(c))).collect();
    let plain = plain.ok_or(Fault::Bad)?;
    let digits = plain.trim_end_matches(['+', '-']);
    let signs = &plain[digits.len()..];
    let Some(first) = signs.chars().next() else {
        let number = plain.trim_start_matches(['+', '-']);
        return match (plain[..plain.len() - number.len()].chars().next(), number) {
            (Some(sign), number) if number.bytes().all(|b| b.is_ascii_digit()) => {
                Err(Fault::Order { number: number.to_owned(), sign })
            }
            _ => Err(Fault::Bad),
        };
    };
    let repeated = signs.len() > 1;
    let mixed = signs.chars().any(|sign| sign != first);
    if mixed || (repeated && !digits.is_empty()) || digits.starts_with(['0', '+', '-']) {
        return Err(Fault::Bad);
    }
    let number = match (repeated, digits) {
        (true, _) => i32::try_from(signs.len()).unwrap_or(i32::MAX),
        (false, "") => 1,
        (false, digits) if digits.bytes().all(|b| b.is_ascii_digit()) => {
            digits.parse().unwrap_or(i32::MAX)
        }
        _ => return Err(Fault::Bad),
    };
    Ok(if first == '-' { -number } else { number })
}

/// The plain sign that a character stands for.
pub(super) fn sign(character: char) -> Option<char> {
    match character {
        '+' | '⁺' | '＋' => Some('+'),
        '-' | '−' | '–' | '⁻' | '‐' | '‑' => Some('-'),
        _ => None,
    }
}

fn is_superscript(character: char) -> bool {
    matches!(character, '⁺' | '⁻') || superscript_digit(character).is_some()
}

fn superscript_digit(character: char) -> Option<char> {
    let place = "⁰¹²³⁴⁵⁶⁷⁸⁹".chars().position(|c| c == character)?;
    char::from_digit(u32::try_from(place).ok()?, 10)
}

fn digit(character: char) -> Option<char> {
    character.is_ascii_digit().then_some(character)
}
