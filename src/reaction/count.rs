//! Counts in a formula: their digits, and the point that may be a decimal one.

use crate::numeric::Rational;

/// The molecules that a point may join to a formula without being taken for a decimal point.
const SOLVENTS: [&str; 5] = ["H2O2", "H2O", "D2O", "T2O", "NH3"];

/// The plain digit for a digit on the line or below it.
pub(super) fn plain_digit(character: char) -> Option<char> {
    character.is_ascii_digit().then_some(character).or(subscript_digit(character))
}

/// The plain digit for one written below the line.
pub(super) fn subscript_digit(character: char) -> Option<char> {
    let place = "₀₁₂₃₄₅₆₇₈₉".chars().position(|c| c == character)?;
    char::from_digit(u32::try_from(place).ok()?, 10)
}

/// Whether what stands after a point is a number and a solvent's formula up to the end, a bracket
/// or a next point, so that the point adds it and is no decimal point.
pub(super) fn is_addition(after: &str) -> bool {
    let plain: String = after.chars().map(|c| plain_digit(c).unwrap_or(c)).collect();
    let formula = plain.trim_start_matches(|c| Rational::is_written_with(c) || c == ' ');
    SOLVENTS.iter().any(|solvent| {
        let rest = formula.strip_prefix(solvent);
        rest.is_some_and(|rest| match rest.trim_start().chars().next() {
            None => true,
            Some(next) => matches!(next, ')' | ']' | '}' | '.' | '·' | '*'),
        })
    })
}

/// A count as it is kept: with decimals where they end, as a fraction where they do not.
pub(super) fn decimal_text(count: Rational) -> String {
    let mut scale = 1_i128;
    let mut places = 0_usize;
    while scale % count.denominator() != 0 {
        if places == 6 {
            return count.to_string();
        }
        scale *= 10;
        places += 1;
    }
    let scaled = count.numerator().saturating_mul(scale / count.denominator());
    match places {
        0 => scaled.to_string(),
        _ => format!("{}.{:0places$}", scaled / scale, scaled % scale),
    }
}
