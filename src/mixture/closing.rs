//! Fractions that must add up to one.

use super::reading::{Entry, Stated};
use crate::problem::{MixtureCode, Outcome, Problem};

/// How far from one a sum of fractions may be when no tolerances say more: the rounding of an
/// analysis written to a tenth of a per cent in a handful of components. Common practice, no source.
const CLOSING_TOLERANCE: f64 = 0.003;

/// How the fractions of a block were brought to a sum of one.
#[derive(Debug, Clone, PartialEq)]
pub enum Closing {
    /// Amounts or flows: nothing to close.
    NotNeeded,
    /// They add up to one as written, to rounding.
    Exact {
        /// The place of the largest, which took the rounding; none without entries.
        entry: Option<usize>,
    },
    /// One entry was stated as the remainder and takes this fraction.
    ByRemainder {
        /// Its place among the entries.
        entry: usize,
        /// Its fraction.
        fraction: f64,
    },
    /// They nearly add up; the largest entry was changed by this much.
    ByLargest {
        /// Its place among the entries.
        entry: usize,
        /// What was added to its fraction.
        difference: f64,
    },
}

/// Brings fractions to a sum of one, in place; a species found from K is laid on top where nothing is
/// stated as the remainder. The others are closed
/// by the entry stated as remainder, or by the largest
/// where the sum is one within the tolerances (their half-widths added up, at least 0.3 %).
///
/// # Errors
/// A sum above one beside a remainder, or a sum that is not one within tolerance.
pub(super) fn close(
    entries: &[Entry],
    closed_by: Option<usize>,
    fractions: &mut [f64],
) -> Outcome<Closing> {
    let missing = entries.iter().position(|e| matches!(e.stated, Stated::Missing { .. }));
    let has_remainder = entries.iter().any(|e| matches!(e.stated, Stated::Remainder));
    if let Some(missing) = missing.filter(|_| !has_remainder) {
        // The others are an analysis of the gas without the missing species.
        let value = std::mem::take(&mut fractions[missing]);
        let closing = close_all(entries, closed_by, fractions)?;
        fractions.iter_mut().for_each(|fraction| *fraction *= 1.0 - value);
        fractions[missing] = value;
        return Ok(closing);
    }
    close_all(entries, closed_by, fractions)
}

fn close_all(
    entries: &[Entry],
    closed_by: Option<usize>,
    fractions: &mut [f64],
) -> Outcome<Closing> {
    if let Some(fraction) = closed_by.and_then(|entry| fractions.get_mut(entry)) {
        *fraction = 0.0;
    }
    let sum: f64 = fractions.iter().sum();
    let rest = 1.0 - sum;
    let per_cent = |fraction: f64| format!("{:.4}", fraction * 100.0);
    let remainder = || entries.iter().position(|e| matches!(e.stated, Stated::Remainder));
    if let Some(entry) = closed_by.or_else(remainder) {
        // A sum that exceeds one by rounding alone (0.1 + 0.9 …) leaves nothing for the remainder.
        if rest < -1e-12 {
            let problem = Problem::new(MixtureCode::RemainderNegative).with("sum", per_cent(sum));
            return Err(problem.at(&entries[entry].field).into());
        }
        fractions[entry] = rest.max(0.0);
        return Ok(Closing::ByRemainder { entry, fraction: fractions[entry] });
    }
    let stated: f64 = entries.iter().filter_map(half_width).sum();
    if rest.abs() > stated.max(CLOSING_TOLERANCE) {
        let problem = Problem::new(MixtureCode::FractionsDoNotAddUp)
            .with("sum", per_cent(sum))
            .with("tolerance", per_cent(stated.max(CLOSING_TOLERANCE)));
        return Err(problem.at("entries").into());
    }
    let largest = (0..fractions.len()).max_by(|&a, &b| fractions[a].total_cmp(&fractions[b]));
    match largest {
        Some(entry) if rest.abs() > 1e-12 => {
            fractions[entry] += rest;
            Ok(Closing::ByLargest { entry, difference: rest })
        }
        Some(entry) => {
            fractions[entry] += rest;
            Ok(Closing::Exact { entry: Some(entry) })
        }
        None => Ok(Closing::Exact { entry: None }),
    }
}

fn half_width(entry: &Entry) -> Option<f64> {
    match &entry.stated {
        Stated::Quantity(quantity) => quantity.standard_uncertainty_si.map(|u| 2.0 * u),
        _ => None,
    }
}
