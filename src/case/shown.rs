//! Numbers in sentences, each with its unit.

use crate::quantity::show_number;

/// A plain number to six significant digits.
pub(super) fn number(value: f64) -> String {
    show_number(value, 6)
}

/// A number known as a logarithm, such as K or Q, to five significant digits.
pub(super) fn exponential(ln: f64) -> String {
    crate::quantity::show_log10(ln / std::f64::consts::LN_10, 5)
}

/// An absolute temperature in both units that a plant reads.
pub(super) fn temperature(kelvin: f64) -> String {
    let celsius = kelvin - crate::quantity::ZERO_CELSIUS_K;
    format!(
        "{} °C ({} K)",
        show_number(celsius, digits(celsius)),
        show_number(kelvin, digits(kelvin))
    )
}

/// Two places after the point, whatever stands before it.
fn digits(value: f64) -> usize {
    let whole = libm::floor(libm::log10(value.abs().max(0.1)));
    (3.0 + whole).clamp(2.0, 8.0) as usize
}

/// A difference of temperatures in kelvin, with its sign.
pub(super) fn kelvins(difference_k: f64) -> String {
    show_number(difference_k, digits(difference_k).max(3))
}

/// A pressure in bar.
pub(super) fn pressure(pascal: f64) -> String {
    format!("{} bar", show_number(pascal / 1e5, 6))
}

/// An energy in kJ/mol, without its unit.
pub(super) fn kilojoule(joule: f64) -> String {
    show_number(joule / 1e3, 6)
}
