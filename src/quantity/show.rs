//! Numbers with their units, for people; what is written here, `parse` reads back.

use super::display::{Units, difference_unit, display_unit};
use super::layout::{EXACT_DIGITS, show_fixed, show_number, show_power};
use super::limits::Limit;
use super::measure::Measure;
use super::number::Written;
use super::unit::Unit;
use super::value::{Quantity, Tolerance};

/// Writes an SI value in a unit with this many significant digits.
///
/// See [`show_number`] for the form; with 17 digits or more, reading it back gives the same number,
/// to the last bit in SI units and to about two in others.
///
/// ```
/// use shiftgauge::quantity::{Measure, parse_unit, show};
/// let (bar, _) = parse_unit("bar", &[Measure::Pressure]).unwrap();
/// assert_eq!(show(2_841_325.0, bar, 4), "28.41 bar");
/// ```
#[must_use]
pub fn show(value_si: f64, unit: &Unit, significant_digits: usize) -> String {
    with_symbol(&show_number(unit.from_si(value_si), significant_digits), unit, "")
}

/// Writes two SI values in a unit with the same number of significant digits, at least this many
/// and enough that two different numbers look different.
///
/// ```
/// use shiftgauge::quantity::{Measure, parse_unit, show_pair};
/// let (percent, _) = parse_unit("%", &[Measure::Fraction]).unwrap();
/// let pair = show_pair(0.9999999, 1.0, percent, 3);
/// assert_eq!(pair, ("99.99999 %".to_owned(), "100.0000 %".to_owned()));
/// ```
#[must_use]
pub fn show_pair(a_si: f64, b_si: f64, unit: &Unit, significant_digits: usize) -> (String, String) {
    let pair = |digits| (show(a_si, unit, digits), show(b_si, unit, digits));
    let enough = (significant_digits..EXACT_DIGITS).map(pair).find(|(a, b)| a != b);
    match enough {
        _ if a_si == b_si => pair(significant_digits),
        Some(texts) => texts,
        None => pair(EXACT_DIGITS),
    }
}

/// Writes an SI value with its tolerance: the 95 % half-width 2u to two significant digits, the
/// value to the same decimal place (JCGM 100, 7.2.6).
///
/// ```
/// use shiftgauge::quantity::{Measure, parse_unit, show_with_uncertainty};
/// let (celsius, _) = parse_unit("°C", &[Measure::Temperature]).unwrap();
/// assert_eq!(show_with_uncertainty(488.15, 1.0, celsius), "215.0 ± 2.0 °C");
/// ```
#[must_use]
pub fn show_with_uncertainty(
    value_si: f64,
    standard_uncertainty_si: f64,
    unit: &'static Unit,
) -> String {
    with_symbol(&with_half_width(value_si, standard_uncertainty_si, unit), unit, "")
}

/// Writes a quantity as it was typed: the same unit, digits, tolerance and bound.
///
/// ```
/// use shiftgauge::quantity::{Measure, parse, show_like};
/// let typed = parse("27,40 bar g +/- 2 rel", &[Measure::Pressure]).unwrap();
/// assert_eq!(show_like(&typed), "27.40 bar(g) ± 2 % rel");
/// ```
#[must_use]
pub fn show_like(quantity: &Quantity) -> String {
    let unit = quantity.unit;
    let number = as_written(unit.from_si(quantity.value_si), quantity.written);
    let half_width_si = quantity.standard_uncertainty_si.map(|u| 2.0 * u);
    let suffix = quantity.pressure_reference.suffix();
    let text = match (quantity.tolerance, half_width_si) {
        (Some(Tolerance::OwnUnit(written)), Some(width_si)) => {
            let width = as_written(unit.difference_from_si(width_si), written);
            with_symbol(&format!("{number} ± {width}"), unit, suffix)
        }
        (Some(Tolerance::OtherUnit(written, other)), Some(width_si)) => {
            let width = as_written(other.difference_from_si(width_si), written);
            format!("{} ± {width} {}", with_symbol(&number, unit, suffix), other.symbol)
        }
        (Some(Tolerance::Relative(written)), Some(width_si)) => {
            let value = unit.from_si(quantity.value_si).abs();
            let part = if value > 0.0 { unit.difference_from_si(width_si) / value } else { 0.0 };
            let width = as_written(part * 100.0, written);
            format!("{} ± {width} % rel", with_symbol(&number, unit, suffix))
        }
        (Some(Tolerance::Preset(class)), _) => {
            format!("{} ± {}", with_symbol(&number, unit, suffix), class.text())
        }
        _ => with_symbol(&number, unit, suffix),
    };
    if quantity.is_bound { format!("< {text}") } else { text }
}

/// Writes a quantity in a system of units, no coarser than it was typed.
///
/// ```
/// use shiftgauge::quantity::{Measure, Units, parse, show_in};
/// let typed = parse("215 ± 2 °C", &[Measure::Temperature]).unwrap();
/// assert_eq!(show_in(&typed, Units::Us), "419.0 ± 3.6 °F");
/// ```
#[must_use]
pub fn show_in(quantity: &Quantity, units: Units) -> String {
    let unit = display_unit(quantity.measure, units, Some(quantity.unit));
    if unit == quantity.unit {
        return show_like(quantity);
    }
    let suffix = quantity.pressure_reference.suffix();
    let value = unit.from_si(quantity.value_si);
    let text = match quantity.standard_uncertainty_si {
        Some(u) if u > 0.0 => with_half_width(quantity.value_si, u, unit),
        _ => {
            let last_digit_si = quantity.unit.difference_to_si(last_digit(quantity.written));
            let place = libm::floor(libm::log10(unit.difference_from_si(last_digit_si)) + ROUNDING);
            to_place(value, place)
        }
    };
    let text = with_symbol(&text, unit, suffix);
    if quantity.is_bound { format!("< {text}") } else { text }
}

/// Keeps the logarithm of an exact power of ten from falling one place down.
const ROUNDING: f64 = 1e-9;

/// The worth of the last digit typed.
fn last_digit(written: Written) -> f64 {
    let exponent = f64::from(written.exponent.unwrap_or(0)) - written.decimals as f64;
    libm::exp10(exponent.clamp(-300.0, 300.0))
}

fn with_half_width(value_si: f64, standard_uncertainty_si: f64, unit: &'static Unit) -> String {
    let width = difference_unit(unit).difference_from_si(2.0 * standard_uncertainty_si);
    let value = unit.from_si(value_si);
    if !(width > 0.0 && width.is_finite()) {
        return format!("{} ± 0", show_number(value, 6));
    }
    // rounding first: 0.0996 to two digits is 0.10, one place up
    let rounded: f64 = format!("{width:.1e}").parse().unwrap_or(width);
    let place = libm::floor(libm::log10(rounded) + ROUNDING) - 1.0;
    format!("{} ± {}", to_place(value, place), to_place(width, place))
}

/// Writes a number down to the digit worth 10^place; far from the point by a power of ten.
fn to_place(value: f64, place: f64) -> String {
    let top = if value == 0.0 { place } else { libm::floor(libm::log10(value.abs())) };
    let digits = (top - place + 1.0).clamp(1.0, EXACT_DIGITS as f64) as usize;
    let is_readable = top >= -4.0 || top < place;
    if (-8.0..=0.0).contains(&place) && top < 7.0 && is_readable {
        return show_fixed(value, (-place) as usize);
    }
    show_number(value, digits)
}

fn as_written(value: f64, written: Written) -> String {
    match written.exponent {
        Some(_) if value != 0.0 => show_power(value, written.significant),
        // a double has no more than 17 digits to show
        None if value.abs() < 1e15 && written.decimals <= EXACT_DIGITS => {
            show_fixed(value, written.decimals)
        }
        _ => show_number(value, EXACT_DIGITS),
    }
}

fn with_symbol(number: &str, unit: &Unit, suffix: &str) -> String {
    match unit.measure {
        Measure::Ph => format!("pH {number}"),
        _ if unit.symbol.is_empty() => number.to_owned(),
        _ => format!("{number} {}{suffix}", unit.symbol),
    }
}

/// The allowed range in the user's unit, for a message.
pub(super) fn range_text(limit: &Limit, unit: &Unit) -> String {
    let low = if limit.includes_minimum { "at least" } else { "above" };
    let end = |value_si: f64| {
        let number = show_number(unit.from_si(value_si), 7);
        let is_plain = number.contains('.') && !number.contains('×');
        let number = if is_plain { number.trim_end_matches('0') } else { &number };
        with_symbol(number.trim_end_matches('.'), unit, "")
    };
    format!("{low} {} and at most {}", end(limit.minimum_si), end(limit.maximum_si))
}
