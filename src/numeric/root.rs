//! A zero of a function between two bounds.

/// How the search for a zero ended.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum RootOutcome {
    /// A zero, or a change of sign, was closed in to the tolerance.
    Found,
    /// The function has the same sign at both bounds, so no zero is known to lie between.
    NoChangeOfSign,
    /// A bound, or the function at some point, is not a finite number.
    NotANumber,
    /// The cap on evaluations was reached; `x` is the best point so far.
    CapReached,
}

/// Where a search for a zero ended and how.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Root {
    /// The point with the smallest residual of the last bracket.
    pub x: f64,
    /// The function there.
    pub residual: f64,
    /// How the search ended; read it before `x`.
    pub outcome: RootOutcome,
    /// Evaluations of the function.
    pub evaluations: u32,
}

/// The cap on evaluations: bisection alone closes any bracket of doubles to one part in 1e16 in
/// about 1100, and the interpolation needs 10 to 20.
const EVALUATIONS_AT_MOST: u32 = 1200;

/// A zero of a continuous function between `low` and `high`, to `tolerance` in x (or to rounding,
/// if that is wider).
///
/// Inverse quadratic interpolation where it is safe, bisection elsewhere: T. R. Chandrupatla, Adv.
/// Eng. Softw. 28 (1997) 145. The bracket always holds a change of sign.
///
/// ```
/// use shiftgauge::numeric::{RootOutcome, root_between};
/// let root = root_between(|x| x * x - 2.0, 0.0, 2.0, 0.0);
/// assert_eq!(root.outcome, RootOutcome::Found);
/// assert!((root.x - 1.4142135623730951).abs() < 1e-15);
/// ```
pub fn root_between(
    mut function: impl FnMut(f64) -> f64,
    low: f64,
    high: f64,
    tolerance: f64,
) -> Root {
    // The newest point, the one across the zero, and the one before.
    let (mut newest, mut across) = (low, high);
    let (mut at_newest, mut at_across) = (function(newest), function(across));
    let mut evaluations = 2;
    let mut share: f64 = 0.5;
    let end = |x, residual, outcome, evaluations| Root { x, residual, outcome, evaluations };
    if ![low, high, at_newest, at_across].iter().all(|x| x.is_finite()) {
        return end(low, at_newest, RootOutcome::NotANumber, evaluations);
    }
    let best =
        |a: f64, fa: f64, b: f64, fb: f64| if fa.abs() <= fb.abs() { (a, fa) } else { (b, fb) };
    if at_newest != 0.0 && at_across != 0.0 && (at_newest > 0.0) == (at_across > 0.0) {
        let (x, residual) = best(newest, at_newest, across, at_across);
        return end(x, residual, RootOutcome::NoChangeOfSign, evaluations);
    }
    loop {
        let (x, residual) = best(newest, at_newest, across, at_across);
        let width = (across - newest).abs();
        let smallest = 2.0 * f64::EPSILON * x.abs() + 0.5 * tolerance.max(f64::MIN_POSITIVE);
        if residual == 0.0 || width <= 2.0 * smallest {
            return end(x, residual, RootOutcome::Found, evaluations);
        }
        if evaluations >= EVALUATIONS_AT_MOST {
            return end(x, residual, RootOutcome::CapReached, evaluations);
        }
        let nearest = (smallest / width).min(0.5);
        let point = newest + share.clamp(nearest, 1.0 - nearest) * (across - newest);
        let at_point = function(point);
        evaluations += 1;
        if !at_point.is_finite() {
            return end(x, residual, RootOutcome::NotANumber, evaluations);
        }
        let (before, at_before);
        if (at_point > 0.0) == (at_newest > 0.0) {
            (before, at_before) = (newest, at_newest);
        } else {
            (before, at_before) = (across, at_across);
            (across, at_across) = (newest, at_newest);
        }
        (newest, at_newest) = (point, at_point);
        share = interpolated(newest, across, before, at_newest, at_across, at_before);
    }
}

/// The share of the way from a to b where inverse quadratic interpolation has its zero, or a half
/// where the three points do not allow it.
fn interpolated(a: f64, b: f64, c: f64, at_a: f64, at_b: f64, at_c: f64) -> f64 {
    let xi = (a - b) / (c - b);
    let phi = (at_a - at_b) / (at_c - at_b);
    let safe = phi * phi < xi && (1.0 - phi) * (1.0 - phi) < 1.0 - xi;
    if !safe {
        return 0.5;
    }
    let share = at_a / (at_b - at_a) * (at_c / (at_b - at_c))
        + (c - a) / (b - a) * (at_a / (at_c - at_a)) * (at_b / (at_c - at_b));
    if share.is_finite() { share } else { 0.5 }
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn steep_flat_and_kinked_functions_end_at_their_zero() {
        type Row = (&'static str, fn(f64) -> f64, f64, f64, f64);
        let rows: [Row; 6] = [
            ("line", |x| 3.0 * x - 1.0, 0.0, 1.0, 1.0 / 3.0),
            ("ninth power", |x| libm::pow(x, 9.0) - 1e-9, 0.0, 10.0, 0.1),
            ("exponential", |x| libm::exp(x) - 1e-20, -700.0, 700.0, -46.051_701_859_880_914),
            ("step", |x| if x < 0.7 { -1.0 } else { 1.0 }, 0.0, 1.0, 0.7),
            ("zero at a bound", |x| x, 0.0, 5.0, 0.0),
            ("bounds the other way round", |x| 1.0 - x, 4.0, 0.5, 1.0),
        ];
        for (name, function, low, high, expected) in rows {
            let root = root_between(function, low, high, 0.0);
            assert_eq!(root.outcome, RootOutcome::Found, "{name}: {root:?}");
            let wrong = (root.x - expected).abs();
            assert!(wrong <= 1e-15 * (1.0 + 50.0 * expected.abs()), "{name}: {root:?}");
        }
    }

    #[test]
    fn what_is_not_found_has_a_name() {
        let same = root_between(|x| x * x + 1.0, -1.0, 1.0, 0.0);
        assert_eq!(same.outcome, RootOutcome::NoChangeOfSign);
        let none = root_between(|_| f64::NAN, -1.0, 1.0, 0.0);
        assert_eq!(none.outcome, RootOutcome::NotANumber);
    }
}
