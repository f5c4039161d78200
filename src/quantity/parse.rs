//! The grammar of a quantity: `[<] number [± tolerance] unit`.

use super::constants::ZERO_CELSIUS_K;
use super::limits::limit;
use super::measure::Measure;
use super::number::{Number, scan, shortened};
use super::pieces::{self, Pieces};
use super::preset::{Preset, classes_of, preset};
use super::read_unit::unit_at;
use super::show::range_text;
use super::unit::{FractionBasis, PressureReference, Unit};
use super::value::{Quantity, Tolerance};
use crate::problem::Outcome;
use crate::problem::Problem;
use crate::problem::QuantityCode;
use crate::problem::Span;
use std::ops::Range;

/// Reads a quantity of one of the allowed measures.
///
/// `± x` (or `+/- x`) is a 95 % half-width in the value's own unit, taken as a difference: u = x/2.
/// `± x rel` or `± x % rel` is per cent of the value as typed. The unit may stand before the sign
/// too (`215 °C ± 2 °C`), or after parentheses (`(215 ± 2) °C`). `< 5 ppm` is a bound. A number
/// without a unit is read only where a plain number, a ratio or a fraction is allowed.
///
/// # Errors
/// Every problem of the text at once: a number that is none, or two (`1,234`); a unit that is
/// missing, unknown or of another measure; a tolerance below zero or in another measure; a value
/// outside its range in [`LIMITS`](super::LIMITS).
///
/// ```
/// use shiftgauge::quantity::{Measure, PressureReference, parse};
/// let pressure = parse("0.32 ± 0.02 bar(g)", &[Measure::Pressure]).unwrap();
/// assert_eq!(pressure.value_si, 32_000.0);
/// assert_eq!(pressure.standard_uncertainty_si, Some(1_000.0));
/// assert_eq!(pressure.pressure_reference, PressureReference::Gauge);
/// let problems = parse("215 kPa", &[Measure::Temperature]).unwrap_err();
/// assert_eq!(problems[0].code.as_str(), "unit-mismatch");
/// ```
pub fn parse(text: &str, allowed: &[Measure]) -> Outcome<Quantity> {
    if text.trim().is_empty() {
        return Err(Problem::new(QuantityCode::Empty).into());
    }
    let mut problems = Vec::new();
    let pieces = pieces::split(text, &mut problems);
    let class = pieces.preset.as_ref().and_then(|place| {
        let class = preset(&text[place.clone()]);
        if class.is_none() {
            problems.push(unknown_class(&text[place.clone()]).span(Span::of(text, place.clone())));
        }
        class
    });
    // A class that is not known has said enough; without its number the class is not read.
    if !problems.is_empty() && text[pieces.head.clone()].trim().is_empty() {
        return Err(problems);
    }
    let mut keep = |outcome: Result<Number, Problem>| match outcome {
        Ok(number) => Some(number),
        Err(problem) => {
            problems.push(problem);
            None
        }
    };
    let (number, number_end) = scan(&text[..pieces.head.end], pieces.head.start);
    let number_range = pieces.head.start..number_end;
    let value = keep(number);
    let mut tail = None;
    if let Some(range) = &pieces.tail {
        if text[range.clone()].trim().is_empty() {
            if pieces.preset.is_none() {
                let problem = Problem::new(QuantityCode::ToleranceMissing);
                problems.push(problem.span(Span::of(text, range.clone())));
            }
        } else {
            let start = trimmed(text, range.clone()).start;
            let (number, end) = scan(&text[..range.end], start);
            let (is_relative, unit_start) = relative_mark(text, end..range.end);
            tail = keep(number).map(|number| Tail {
                number,
                range: start..end,
                is_relative,
                unit: trimmed(text, unit_start..range.end),
            });
        }
    }
    let own_unit = find_unit(text, &pieces, number_end, tail.as_ref(), allowed, &mut problems);
    let (Some(value), Some((unit, pressure_reference))) = (value, own_unit) else {
        return Err(problems);
    };
    let mut quantity = Quantity {
        value_si: unit.to_si(value.value),
        standard_uncertainty_si: None,
        is_bound: pieces.bound.is_some(),
        measure: unit.measure,
        unit,
        pressure_reference,
        fraction_basis: unit.fraction_basis,
        written: value.written,
        tolerance: None,
    };
    if let Some(tail) = &tail {
        let half_width = tolerance(text, value.value, &mut quantity, tail, &mut problems);
        quantity.standard_uncertainty_si = half_width.map(|half_width| half_width / 2.0);
    }
    if let (Some(class), Some(place)) = (class, &pieces.preset) {
        match uncertainty_of_class(class, &quantity) {
            Ok(u) => {
                quantity.standard_uncertainty_si = Some(u);
                quantity.tolerance = Some(Tolerance::Preset(class));
            }
            Err(problem) => problems.push(problem.span(Span::of(text, place.clone()))),
        }
    }
    if let Some(bound) = &pieces.bound {
        problems.extend(check_bound(text, bound, &pieces, quantity.measure));
    }
    problems.extend(check_range(text, number_range, &quantity));
    if problems.is_empty() { Ok(quantity) } else { Err(problems) }
}

fn unknown_class(text: &str) -> Problem {
    let found = shortened(text.trim());
    match classes_of(text) {
        Some((instrument, classes)) => Problem::new(QuantityCode::PresetClass)
            .with("found", found)
            .with("instrument", instrument)
            .with("classes", classes),
        None => Problem::new(QuantityCode::PresetUnknown).with("found", found),
    }
}

/// The standard uncertainty of a reading by its instrument's class: limit/√3, as every value within
/// the limits is as likely. Source: JCGM 100:2008, 4.3.7.
fn uncertainty_of_class(class: &Preset, quantity: &Quantity) -> Result<f64, Problem> {
    if quantity.measure != Measure::Temperature {
        return Err(Problem::new(QuantityCode::PresetNotHere)
            .with("found", class.text())
            .with("measure", quantity.measure.name()));
    }
    let celsius = quantity.value_si - ZERO_CELSIUS_K;
    let (low, high) = class.range_celsius;
    // A temperature typed in another unit may miss the end by its rounding.
    if celsius < low - 1e-9 || celsius > high + 1e-9 {
        return Err(Problem::new(QuantityCode::PresetRange)
            .with("found", class.text())
            .with("low", format!("{low}"))
            .with("high", format!("{high}")));
    }
    Ok(class.limit_k(celsius) / 3f64.sqrt())
}

/// A tolerance as read: its number, whether it is relative, and where its unit stands.
struct Tail {
    number: Number,
    range: Range<usize>,
    is_relative: bool,
    unit: Range<usize>,
}

fn trimmed(text: &str, range: Range<usize>) -> Range<usize> {
    let part = &text[range.clone()];
    let start = range.start + part.len() - part.trim_start().len();
    start..(range.start + part.trim_end().len()).max(start)
}

/// Reads `rel`, `rel.` or `% rel`; gives the byte after it.
fn relative_mark(text: &str, range: Range<usize>) -> (bool, usize) {
    let part = text[range.clone()].trim_start();
    let part = part.strip_prefix('%').map_or(part, str::trim_start);
    match part.strip_prefix("rel") {
        Some(rest) if !rest.starts_with(char::is_alphanumeric) => {
            let rest = rest.strip_prefix('.').unwrap_or(rest);
            (true, range.end - rest.len())
        }
        _ => (false, range.start),
    }
}

/// The unit of the value: after its number, else after the tolerance, else after the parenthesis.
fn find_unit(
    text: &str,
    pieces: &Pieces,
    number_end: usize,
    tail: Option<&Tail>,
    allowed: &[Measure],
    problems: &mut Vec<Problem>,
) -> Option<(&'static Unit, PressureReference)> {
    let own = trimmed(text, number_end..pieces.head.end.max(number_end));
    let nowhere = own.end..own.end;
    let tail_unit = tail.map_or(nowhere.clone(), |tail| tail.unit.clone());
    let after = pieces.after.clone().map_or(nowhere.clone(), |after| trimmed(text, after));
    let written = |place: &Range<usize>| !place.is_empty();
    // a unit after the tolerance is the tolerance's where the value has its own
    let is_relative = tail.is_some_and(|tail| tail.is_relative);
    let tail_has_own = written(&own) && !is_relative;
    let spare_tail = Some(tail_unit.clone()).filter(|_| !tail_has_own);
    let places = [pieces.ph.clone(), Some(own), spare_tail, Some(after)];
    let mut places = places.into_iter().flatten().filter(written);
    let Some(place) = places.next() else {
        // a number that is missing or a preset that is not known has said enough
        let missing = unit_at(text, nowhere, allowed);
        let is_first = problems.is_empty();
        return missing.map_err(|problem| problems.extend(is_first.then_some(problem))).ok();
    };
    let spare = places.next();
    if let Some(spare) = spare {
        let problem = Problem::new(QuantityCode::UnitTwice)
            .with("found", shortened(&text[spare.clone()]))
            .with("first", shortened(&text[place.clone()]));
        problems.push(problem.span(Span::of(text, spare)));
    }
    unit_at(text, place, allowed).map_err(|problem| problems.push(problem)).ok()
}

/// The half-width in SI; sets how it was written.
fn tolerance(
    text: &str,
    value: f64,
    quantity: &mut Quantity,
    tail: &Tail,
    problems: &mut Vec<Problem>,
) -> Option<f64> {
    let Tail { number: Number { value: width, written }, .. } = *tail;
    let mut fail = |code: QuantityCode, place: &Range<usize>| {
        let found = shortened(&text[place.clone()]);
        let problem = Problem::new(code).with("found", found).with("unit", quantity.unit.symbol);
        problems.push(problem.span(Span::of(text, place.clone())));
        None
    };
    if width < 0.0 {
        return fail(QuantityCode::ToleranceNegative, &tail.range);
    }
    let unit = quantity.unit;
    let half_width = if tail.is_relative {
        quantity.tolerance = Some(Tolerance::Relative(written));
        unit.difference_to_si(value.abs() * (width / 100.0))
    } else {
        let measures = [difference_measure(quantity.measure)];
        let other = match unit_at(text, tail.unit.clone(), &measures) {
            _ if tail.unit.is_empty() => None,
            Ok((other, _)) if is_other_part(unit, other) => {
                return fail(QuantityCode::ToleranceUnit, &tail.unit);
            }
            Ok((other, _)) if other.symbol != "%" || unit.symbol.ends_with('%') => Some(other),
            Ok((_, _)) => return fail(QuantityCode::TolerancePercent, &tail.unit),
            Err(_) if &text[tail.unit.clone()] == "%" => {
                return fail(QuantityCode::TolerancePercent, &tail.unit);
            }
            Err(_) => return fail(QuantityCode::ToleranceUnit, &tail.unit),
        };
        let other = other.filter(|other| other.symbol != unit.symbol);
        quantity.tolerance = Some(match other {
            Some(other) => Tolerance::OtherUnit(written, other),
            None => Tolerance::OwnUnit(written),
        });
        other.unwrap_or(unit).difference_to_si(width)
    };
    if half_width.is_finite() {
        Some(half_width)
    } else {
        fail(QuantityCode::NumberTooLarge, &tail.range)
    }
}

fn difference_measure(measure: Measure) -> Measure {
    match measure {
        Measure::Temperature => Measure::TemperatureDifference,
        other => other,
    }
}

/// Whether two fractions say that they are parts of different things.
fn is_other_part(unit: &Unit, other: &Unit) -> bool {
    let (a, b) = (unit.fraction_basis, other.fraction_basis);
    a != b && a != FractionBasis::Unstated && b != FractionBasis::Unstated
}

fn check_bound(
    text: &str,
    bound: &Range<usize>,
    pieces: &Pieces,
    measure: Measure,
) -> Option<Problem> {
    let span = Span::of(text, bound.clone());
    if pieces.tail.is_some() || pieces.preset.is_some() {
        return Some(Problem::new(QuantityCode::BoundTolerance).span(span));
    }
    let problem = Problem::new(QuantityCode::BoundNotHere).with("measure", measure.name());
    (!measure.starts_at_zero()).then_some(problem.span(span))
}

fn check_range(text: &str, number: Range<usize>, quantity: &Quantity) -> Option<Problem> {
    let limit = limit(quantity.measure, quantity.pressure_reference);
    if limit.contains(quantity.value_si) {
        return None;
    }
    let is_vacuum = quantity.measure == Measure::Pressure
        && quantity.pressure_reference == PressureReference::Unstated
        && quantity.value_si < 0.0;
    let is_over_one = quantity.measure == Measure::Fraction && quantity.value_si > 1.0;
    let is_percent = quantity.unit.symbol.is_empty()
        && quantity.fraction_basis == FractionBasis::Unstated
        && quantity.value_si <= 100.0;
    let code = match (is_vacuum, is_over_one) {
        (true, _) => QuantityCode::PressureBelowVacuum,
        (_, true) if is_percent => QuantityCode::FractionPercent,
        (_, true) => QuantityCode::FractionOverOne,
        _ => QuantityCode::OutOfRange,
    };
    let found = format!("{} {}", text[number.clone()].trim(), quantity.unit.symbol);
    let problem = Problem::new(code)
        .with("found", shortened(found.trim()))
        .with("number", shortened(text[number.clone()].trim()))
        .with("name", limit.name)
        .with("range", range_text(limit, quantity.unit))
        .with("reason", limit.reason);
    Some(problem.span(Span::of(text, number)))
}
