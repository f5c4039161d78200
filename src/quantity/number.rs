//! The one number parser: a text, or the head of a text, to a finite `f64`.

use super::grouping;
use crate::problem::Outcome;
use crate::problem::Problem;
use crate::problem::QuantityCode;
use crate::problem::Span;

/// How a number was written, so that it can be shown back with the same digits.
#[derive(Debug, Clone, Copy, PartialEq, Eq, Default)]
pub struct Written {
    /// Digits after the decimal mark.
    pub decimals: usize,
    /// Digits from the first that is not zero to the last; 0 for zero itself.
    pub significant: usize,
    /// The power of ten, where one was written.
    pub exponent: Option<i32>,
}

/// A number as read.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Number {
    /// Its value, finite, rounded to the nearest `f64`.
    pub value: f64,
    /// How it was written.
    pub written: Written,
}

/// Reads a text that is one number and nothing else.
///
/// The decimal mark is a point or a comma. Thousands may be grouped by a space (also a no-break or
/// thin one), an apostrophe, or the other mark. `1.2e-3`, `1.2×10^-3`, `1.2·10⁻³`, `1.2*10^-3` and
/// `10⁻³` are powers of ten; a minus may be a hyphen or a typographic one.
///
/// # Errors
/// A problem when the text is empty, is no number, can be read as two numbers (`1,234`), is too
/// large for a double (above about 1.8×10³⁰⁸) or rounds to zero without being zero.
///
/// ```
/// use shiftgauge::quantity::read_number;
/// assert_eq!(read_number("−1 234,5×10⁻³").unwrap().value, -1.2345);
/// assert_eq!(read_number("1,234").unwrap_err()[0].code.as_str(), "number-ambiguous");
/// ```
pub fn read_number(text: &str) -> Outcome<Number> {
    if text.trim().is_empty() {
        return Err(Problem::new(QuantityCode::Empty).into());
    }
    let start = text.len() - text.trim_start().len();
    let (number, end) = scan(text, start);
    let number = number?;
    let rest = text[end..].trim();
    if rest.is_empty() {
        return Ok(number);
    }
    let range = end..text.trim_end().len();
    let problem = Problem::new(QuantityCode::NumberTail).with("found", shortened(rest));
    Err(problem.span(Span::of(text, range)).into())
}

/// Reads the number that starts at byte `start`; gives it with the byte after it, which is known
/// for most mistakes too, so that the rest of the text can still be checked.
pub(super) fn scan(text: &str, start: usize) -> (Result<Number, Problem>, usize) {
    let mut at = start;
    let negative = match sign(&text[at..]) {
        Some((negative, length)) => {
            at = skip_space(text, at + length);
            negative
        }
        None => false,
    };
    let body_start = at;
    at += grouping::body_length(&text[at..]);
    let body = &text[body_start..at];
    if !body.contains(|c: char| c.is_ascii_digit()) {
        let found = text[start..].trim();
        let span = Span::of(text, start..start + text[start..].trim_end().len());
        let problem = Problem::new(QuantityCode::NotANumber).with("found", shortened(found));
        return (Err(problem.span(span)), text.len());
    }
    let (exponent, bare_power) = match power(text, at, body) {
        Power::None => (None, false),
        Power::Of { exponent, end, bare } => {
            at = end;
            (Some(exponent), bare)
        }
        Power::Broken { end } => {
            let found = text[start..end].to_owned();
            let problem = Problem::new(QuantityCode::NumberPower).with("found", found);
            return (Err(problem.span(Span::of(text, start..end))), end);
        }
    };
    let body = if bare_power { "1" } else { body };
    let whole = &text[start..at];
    let span = Span::of(text, start..at);
    let split = match grouping::split(body) {
        Ok(split) => split,
        Err(grouping::Fault::Shape) => {
            let problem = Problem::new(QuantityCode::NumberShape).with("found", shortened(whole));
            return (Err(problem.span(span)), at);
        }
        Err(grouping::Fault::Ambiguous { decimal, thousands }) => {
            let problem = Problem::new(QuantityCode::NumberAmbiguous)
                .with("found", shortened(whole))
                .with("decimal", decimal)
                .with("thousands", thousands);
            return (Err(problem.span(span)), at);
        }
    };
    (assemble(negative, &split, exponent, whole).map_err(|problem| problem.span(span)), at)
}

fn assemble(
    negative: bool,
    split: &grouping::Split,
    exponent: Option<i32>,
    whole: &str,
) -> Result<Number, Problem> {
    let plain =
        format!("{}.{}e{}", split.integer_or_zero(), split.fraction, exponent.unwrap_or_default());
    let magnitude: f64 = plain.parse().unwrap_or(f64::INFINITY);
    let significant = split.significant();
    if !magnitude.is_finite() {
        return Err(Problem::new(QuantityCode::NumberTooLarge).with("found", shortened(whole)));
    }
    if magnitude == 0.0 && significant > 0 {
        return Err(Problem::new(QuantityCode::NumberTooSmall).with("found", shortened(whole)));
    }
    let value = if negative && magnitude > 0.0 { -magnitude } else { magnitude };
    let written = Written { decimals: split.fraction.len(), significant, exponent };
    Ok(Number { value, written })
}

enum Power {
    None,
    Of { exponent: i32, end: usize, bare: bool },
    Broken { end: usize },
}

/// Reads `e-3`, `×10^-3`, `× 10⁻³` after a body, or `^-3` after a body that is `10`.
fn power(text: &str, at: usize, body: &str) -> Power {
    if let Some(rest) = text[at..].strip_prefix(['e', 'E']) {
        return match signed_digits(rest) {
            Some((exponent, length)) => Power::Of { exponent, end: at + 1 + length, bare: false },
            None => Power::None,
        };
    }
    if body == "10" {
        if let Some((exponent, length)) = caret_power(&text[at..]) {
            return Power::Of { exponent, end: at + length, bare: true };
        }
    }
    let sign_at = skip_space(text, at);
    let Some(sign) = text[sign_at..].chars().next().filter(|c| "×·⋅*xX".contains(*c)) else {
        return Power::None;
    };
    let ten_at = skip_space(text, sign_at + sign.len_utf8());
    if !text[ten_at..].starts_with("10") {
        return Power::None;
    }
    let power_at = ten_at + 2;
    match caret_power(&text[power_at..]) {
        Some((exponent, length)) => Power::Of { exponent, end: power_at + length, bare: false },
        None if sign.is_alphabetic() => Power::None,
        None => Power::Broken { end: power_at },
    }
}

/// Reads `^-3`, `^(-3)`, `**-3` or superscripts; gives the exponent and the bytes used.
fn caret_power(text: &str) -> Option<(i32, usize)> {
    let mark = ["^", "**"].into_iter().find(|mark| text.starts_with(mark));
    if let Some(mark) = mark {
        let inner = &text[mark.len()..];
        if let Some(inside) = inner.strip_prefix('(') {
            let (exponent, length) = signed_digits(inside)?;
            return inside[length..]
                .starts_with(')')
                .then_some((exponent, mark.len() + length + 2));
        }
        let (exponent, length) = signed_digits(inner)?;
        return Some((exponent, mark.len() + length));
    }
    let mut plain = String::new();
    let mut length = 0;
    for character in text.chars() {
        let Some(digit) = from_superscript(character) else { break };
        plain.push(digit);
        length += character.len_utf8();
    }
    let (exponent, used) = signed_digits(&plain)?;
    (used == plain.len()).then_some((exponent, length))
}

fn from_superscript(character: char) -> Option<char> {
    let place = "⁰¹²³⁴⁵⁶⁷⁸⁹⁻⁺".chars().position(|superscript| superscript == character)?;
    "0123456789-+".chars().nth(place)
}

/// An optional sign and at least one digit; exponents beyond ±999999 stop there, far past any double.
fn signed_digits(text: &str) -> Option<(i32, usize)> {
    let (negative, start) = sign(text).unwrap_or((false, 0));
    let digits = text[start..].bytes().take_while(u8::is_ascii_digit).count();
    if digits == 0 {
        return None;
    }
    let magnitude = text[start..start + digits].parse::<i32>().unwrap_or(999_999).min(999_999);
    Some((if negative { -magnitude } else { magnitude }, start + digits))
}

/// A leading sign: whether it is a minus, and its length in bytes.
fn sign(text: &str) -> Option<(bool, usize)> {
    let first = text.chars().next()?;
    match first {
        '+' => Some((false, 1)),
        '-' | '−' | '–' => Some((true, first.len_utf8())),
        _ => None,
    }
}

/// The byte of the next character from `at` that is no white space.
pub(super) fn skip_space(text: &str, at: usize) -> usize {
    text.len() - text[at..].trim_start().len()
}

/// What was found, cut to a length that a message can carry.
pub(super) fn shortened(found: &str) -> String {
    const LONGEST: usize = 40;
    if found.chars().count() <= LONGEST {
        return found.to_owned();
    }
    found.chars().take(LONGEST - 1).chain(['…']).collect()
}
