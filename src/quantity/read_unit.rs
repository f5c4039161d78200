//! A unit by itself, and the problems of units.

use super::find;
use super::measure::{Measure, any_of, examples_of, join_or};
use super::number::shortened;
use super::unit::{PressureReference, Unit};
use crate::problem::Outcome;
use crate::problem::Problem;
use crate::problem::QuantityCode;
use crate::problem::Span;
use std::ops::Range;

/// Reads a unit that stands alone, such as the `atm` in which Kp is a bare number.
///
/// # Errors
/// A problem when the text is empty and no plain number is allowed, is no unit, or is a unit of a
/// measure that is not allowed.
///
/// ```
/// use shiftgauge::quantity::{Measure, PressureReference, parse_unit};
/// let (unit, reference) = parse_unit("psig", &[Measure::Pressure]).unwrap();
/// assert_eq!((unit.symbol, reference), ("psi", PressureReference::Gauge));
/// let problems = parse_unit("MPA", &[Measure::Pressure]).unwrap_err();
/// assert_eq!(problems[0].code.as_str(), "unit-near");
/// ```
pub fn parse_unit(text: &str, allowed: &[Measure]) -> Outcome<(&'static Unit, PressureReference)> {
    let start = text.len() - text.trim_start().len();
    let end = text.trim_end().len().max(start);
    unit_at(text, start..end, allowed).map_err(Vec::from)
}

/// Reads the unit in a range of a text that has no white space at its ends; it may be empty.
pub(super) fn unit_at(
    text: &str,
    range: Range<usize>,
    allowed: &[Measure],
) -> Result<find::Found, Problem> {
    let name = &text[range.clone()];
    let problem = match find::find(name, allowed) {
        Ok(found) => return Ok(found),
        Err(_) if name.is_empty() => {
            // there is nothing to point at: point at the number
            let whole = text.len() - text.trim_start().len()..text.trim_end().len();
            let only_ph = allowed == [Measure::Ph];
            let code = if only_ph { QuantityCode::PhMissing } else { QuantityCode::UnitMissing };
            return Err(Problem::new(code)
                .with("found", shortened(text.trim()))
                .with("measure", any_of(allowed))
                .with("allowed", examples_of(allowed))
                .with("example", first_example(allowed))
                .span(Span::of(text, whole)));
        }
        Err(_) if allowed.iter().all(|measure| measure.examples().is_empty()) => {
            Problem::new(QuantityCode::UnitNotWanted)
        }
        Err(find::Fault::OtherMeasure(unit)) => Problem::new(QuantityCode::UnitMismatch)
            .with("is", unit.measure.name())
            .with("measure", any_of(allowed)),
        Err(find::Fault::Near(near)) => {
            Problem::new(QuantityCode::UnitNear).with("near", join_or(&near))
        }
        Err(find::Fault::Unknown) => Problem::new(QuantityCode::UnitUnknown),
    };
    let problem = problem.with("found", shortened(name)).with("allowed", examples_of(allowed));
    Err(problem.span(Span::of(text, range)))
}

fn first_example(allowed: &[Measure]) -> String {
    let first = allowed.iter().flat_map(|measure| measure.examples()).next();
    first.map_or_else(String::new, |example| (*example).to_owned())
}
