//! The step of the solver for one extent.

/// The change of u = ln d that brings a rising function h to zero, from its value and its first two
/// derivatives in u.
///
/// h is taken as linear in the power d^p that makes its second derivative vanish, p = h''/h':
/// Δu = ln(1 − p h/h')/p. For p → 0 this is Newton's step in ln d, for p = 1 in d, for p = −1 in
/// 1/d; the error of a step is of third order as with Halley's. `None` where that line has no zero
/// at a positive d, or where an argument is not usable.
///
/// ```
/// use shiftgauge::numeric::{growth, step_in_power};
/// // h = d − 3 at d = 5: h' = h'' = d, and the step is exact.
/// let step = step_in_power(2.0, 5.0, 5.0).unwrap();
/// assert!((5.0 * growth(step) - 3.0).abs() < 1e-3);
/// ```
#[inline]
#[must_use]
pub fn step_in_power(value: f64, slope: f64, curvature: f64) -> Option<f64> {
    let newton = value / slope;
    let power = curvature / slope;
    let bend = power * newton;
    if bend.abs() < 0.125 {
        let series = 1.0 + bend * (0.5 + bend * (1.0 / 3.0 + bend * (0.25 + bend * 0.2)));
        return Some(-newton * series);
    }
    // A bend that is no number fails here too.
    if bend < 1.0 - 4.0 * f64::EPSILON { Some(libm::log(1.0 - bend) / power) } else { None }
}

/// exp(x) for a step that will be corrected: to 4e-5 below 0.5, to rounding near zero and above.
#[inline]
#[must_use]
pub fn growth(x: f64) -> f64 {
    if x.abs() < 0.5 {
        let half = 0.5 * x;
        let square = x * x * (1.0 / 12.0);
        (1.0 + half + square) / (1.0 - half + square)
    } else {
        libm::exp(x)
    }
}
