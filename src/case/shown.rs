//! Numbers in sentences, each with its unit; zeros that say nothing are left out.

use crate::quantity::{ZERO_CELSIUS_K, show_log10, show_number};

/// A plain number to six significant digits.
pub(super) fn number(value: f64) -> String {
    significant(value, 6)
}

/// A plain number to this many significant digits at the most.
pub(super) fn significant(value: f64, digits: usize) -> String {
    let text = show_number(value, digits);
    let is_plain = text.contains('.') && !text.contains('×');
    if is_plain { text.trim_end_matches('0').trim_end_matches('.').to_owned() } else { text }
}

/// A number known as a logarithm, such as K or Q, to five significant digits.
pub(super) fn exponential(ln: f64) -> String {
    show_log10(ln / std::f64::consts::LN_10, 5)
}

/// A temperature in kelvin to a hundredth, without its unit.
pub(super) fn kelvin(kelvin: f64) -> String {
    significant(kelvin, hundredths(kelvin))
}

/// A temperature in both units that a plant reads.
pub(super) fn temperature(kelvin: f64) -> String {
    let celsius = kelvin - ZERO_CELSIUS_K;
    format!("{} °C ({} K)", significant(celsius, hundredths(celsius)), self::kelvin(kelvin))
}

/// A difference of temperatures to a hundredth of a kelvin, at least three digits, with its sign.
pub(super) fn kelvins(difference_k: f64) -> String {
    show_number(difference_k, hundredths(difference_k).max(3))
}

/// The significant digits that end with the hundredths.
fn hundredths(value: f64) -> usize {
    let whole = libm::floor(libm::log10(value.abs().max(0.1)));
    (3.0 + whole).clamp(2.0, 8.0) as usize
}

/// A pressure in bar.
pub(super) fn pressure(pascal: f64) -> String {
    format!("{} bar", significant(pascal / 1e5, 6))
}

/// An energy in kJ/mol, without its unit.
pub(super) fn kilojoule(joule: f64) -> String {
    significant(joule / 1e3, 6)
}
