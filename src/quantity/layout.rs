//! Digits on the page: rounding to significant digits, superscripts, groups of three.

/// Digits from which the shortest text that reads back exactly is written instead of rounding.
pub(super) const EXACT_DIGITS: usize = 17;
/// Numbers from 10⁻⁴ up to below 10⁷ are written out, others with a power of ten.
const PLAIN_EXPONENTS: std::ops::RangeInclusive<i32> = -4..=6;

/// Writes a plain number with this many significant digits.
///
/// The minus is U+2212, five or more digits before the point are grouped by narrow no-break spaces
/// (ISO 80000-1), and very large or small numbers carry a power of ten. From 17 digits on it is the
/// shortest text that reads back as exactly this number. A number that is not finite is written as
/// `no value`. A number exactly halfway is rounded to the even digit (ISO 80000-1, annex B).
///
/// ```
/// use shiftgauge::quantity::show_number;
/// assert_eq!(show_number(-0.00001234, 3), "−1.23×10⁻⁵");
/// assert_eq!(show_number(28413.26, 6), "28\u{202f}413.3");
/// ```
#[must_use]
pub fn show_number(value: f64, significant_digits: usize) -> String {
    if !value.is_finite() {
        return "no value".to_owned();
    }
    if value == 0.0 {
        return "0".to_owned();
    }
    let scientific = if significant_digits >= EXACT_DIGITS {
        format!("{value:e}")
    } else {
        format!("{value:.*e}", significant_digits.max(1) - 1)
    };
    let (mantissa, exponent) = scientific.split_once('e').unwrap_or((&scientific, "0"));
    let exponent: i32 = exponent.parse().unwrap_or(0);
    let digits: String = mantissa.chars().filter(char::is_ascii_digit).collect();
    let sign = if value < 0.0 { "−" } else { "" };
    if PLAIN_EXPONENTS.contains(&exponent) {
        return format!("{sign}{}", placed(&digits, exponent));
    }
    format!("{sign}{}×10{}", placed(&digits, 0), superscript(exponent))
}

/// Writes 10 to the power of `log10_value` with this many significant digits, also where the number
/// itself does not fit in a double.
///
/// ```
/// use shiftgauge::quantity::show_log10;
/// assert_eq!(show_log10(400.5, 3), "3.16×10⁴⁰⁰");
/// assert_eq!(show_log10(2.0, 3), "100");
/// ```
#[must_use]
pub fn show_log10(log10_value: f64, significant_digits: usize) -> String {
    if !log10_value.is_finite() {
        return "no value".to_owned();
    }
    if log10_value.abs() < 300.0 {
        return show_number(libm::exp10(log10_value), significant_digits);
    }
    // beyond 15 significant digits of the logarithm there is nothing left for the mantissa
    if log10_value.abs() > 1e15 {
        return format!("10^{}", show_number(log10_value, significant_digits));
    }
    let whole = libm::floor(log10_value);
    let mantissa = show_fixed(libm::exp10(log10_value - whole), significant_digits.max(1) - 1);
    let (mantissa, whole) = match mantissa.strip_prefix("10") {
        Some(zeros) => (format!("1{}", zeros.trim_end_matches('.')), whole + 1.0),
        None => (mantissa, whole),
    };
    format!("{mantissa}×10{}", superscript_of(&format!("{whole:.0}")))
}

/// Writes a number with this many digits after the point.
pub(super) fn show_fixed(value: f64, decimals: usize) -> String {
    let text = format!("{:.decimals$}", value.abs());
    let (integer, fraction) = text.split_once('.').unwrap_or((&text, ""));
    let is_zero = !text.bytes().any(|byte| matches!(byte, b'1'..=b'9'));
    let sign = if value < 0.0 && !is_zero { "−" } else { "" };
    let point = if fraction.is_empty() { "" } else { "." };
    format!("{sign}{}{point}{fraction}", grouped(integer))
}

/// Writes a number as digits × 10^exponent with this many significant digits, whatever its size.
pub(super) fn show_power(value: f64, significant_digits: usize) -> String {
    let digits = significant_digits.clamp(1, EXACT_DIGITS);
    let scientific = format!("{:.*e}", digits - 1, value.abs());
    let (mantissa, exponent) = scientific.split_once('e').unwrap_or((&scientific, "0"));
    let sign = if value < 0.0 { "−" } else { "" };
    format!("{sign}{mantissa}×10{}", superscript_of(exponent))
}

/// Puts the point after the first digit moved by `exponent`.
fn placed(digits: &str, exponent: i32) -> String {
    let Ok(places) = usize::try_from(exponent) else {
        let zeros = "0".repeat(exponent.unsigned_abs() as usize - 1);
        return format!("0.{zeros}{digits}");
    };
    let whole = places + 1;
    if digits.len() <= whole {
        return grouped(&format!("{digits:0<whole$}"));
    }
    let (integer, fraction) = digits.split_at(whole);
    format!("{}.{fraction}", grouped(integer))
}

fn grouped(integer: &str) -> String {
    const UNGROUPED: usize = 4;
    if integer.len() <= UNGROUPED {
        return integer.to_owned();
    }
    let mut text = String::with_capacity(integer.len() * 2);
    for (place, digit) in integer.chars().enumerate() {
        if place > 0 && (integer.len() - place) % 3 == 0 {
            text.push('\u{202f}');
        }
        text.push(digit);
    }
    text
}

fn superscript(exponent: i32) -> String {
    superscript_of(&exponent.to_string())
}

fn superscript_of(text: &str) -> String {
    let raise = |character: char| match character {
        '-' => '⁻',
        digit => {
            let place = digit.to_digit(10).unwrap_or(0) as usize;
            ['⁰', '¹', '²', '³', '⁴', '⁵', '⁶', '⁷', '⁸', '⁹'][place]
        }
    };
    text.chars().map(raise).collect()
}
