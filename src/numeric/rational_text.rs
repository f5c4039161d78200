//! Reading exact fractions from text.

use std::str::FromStr;

use super::rational::{Rational, RationalError};

/// The fractions that have a character of their own.
const VULGAR: [(char, i64, i64); 18] = [
    ('½', 1, 2),
    ('⅓', 1, 3),
    ('⅔', 2, 3),
    ('¼', 1, 4),
    ('¾', 3, 4),
    ('⅕', 1, 5),
    ('⅖', 2, 5),
    ('⅗', 3, 5),
    ('⅘', 4, 5),
    ('⅙', 1, 6),
    ('⅚', 5, 6),
    ('⅐', 1, 7),
    ('⅛', 1, 8),
    ('⅜', 3, 8),
    ('⅝', 5, 8),
    ('⅞', 7, 8),
    ('⅑', 1, 9),
    ('⅒', 1, 10),
];

impl Rational {
    /// Whether a character can be part of an unsigned number as it is read (a space may be, too,
    /// between a whole number and a fraction).
    #[must_use]
    pub fn is_written_with(character: char) -> bool {
        character.is_ascii_digit()
            || matches!(character, '.' | ',' | '/' | '⁄')
            || VULGAR.iter().any(|row| row.0 == character)
    }
}

impl FromStr for Rational {
    type Err = RationalError;

    fn from_str(text: &str) -> Result<Rational, RationalError> {
        let text = text.trim();
        let (negative, digits) = match text.strip_prefix(['-', '−']) {
            Some(rest) => (true, rest.trim_start()),
            None => (false, text.strip_prefix('+').unwrap_or(text).trim_start()),
        };
        let magnitude = unsigned(digits)?;
        Ok(if negative { magnitude.negated() } else { magnitude })
    }
}

fn unsigned(text: &str) -> Result<Rational, RationalError> {
    if let Some((top, bottom)) = text.split_once(['/', '⁄']) {
        let (whole, top) = match top.trim_end().rsplit_once(char::is_whitespace) {
            Some((whole, top)) => (whole_number(whole.trim_end())?, top),
            None => (0, top.trim_end()),
        };
        let part = Rational::new(whole_number(top)?, whole_number(bottom.trim_start())?)?;
        return Rational::new(whole, 1)?.plus(part);
    }
    let last = text.chars().next_back().and_then(|last| VULGAR.iter().find(|row| row.0 == last));
    if let Some((character, top, bottom)) = last {
        let before = text.trim_end_matches(*character).trim_end();
        let whole = if before.is_empty() { 0 } else { whole_number(before)? };
        let part = Rational::whole(*top).over(Rational::whole(*bottom))?;
        return Rational::new(whole, 1)?.plus(part);
    }
    match text.split_once(['.', ',']) {
        Some((whole, decimals)) => decimal(whole, decimals),
        None => Rational::new(whole_number(text)?, 1),
    }
}

fn decimal(whole: &str, decimals: &str) -> Result<Rational, RationalError> {
    let whole = if whole.is_empty() { 0 } else { whole_number(whole)? };
    let part = whole_number(decimals)?;
    let places = u32::try_from(decimals.len()).map_err(|_| RationalError::Overflow)?;
    let scale = 10_i128.checked_pow(places).ok_or(RationalError::Overflow)?;
    Rational::new(whole, 1)?.plus(Rational::new(part, scale)?)
}

fn whole_number(text: &str) -> Result<i128, RationalError> {
    if text.is_empty() || !text.bytes().all(|byte| byte.is_ascii_digit()) {
        return Err(RationalError::NotANumber);
    }
    text.parse().map_err(|_| RationalError::Overflow)
}
