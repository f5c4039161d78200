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
/// assert!((5.0 * growth(step) - 3.0).abs() < 1e-2);
/// ```
#[inline(always)]
#[must_use]
pub fn step_in_power(value: f64, slope: f64, curvature: f64) -> Option<f64> {
    let newton = value / slope;
    let power = curvature / slope;
    let bend = power * newton;
    if bend > -2.0 && bend < 0.5 {
        // ln(1 − z) = −z (6 − z)/(6 − 4 z), off by less than 5 %, and by z⁴/36 near zero.
        return Some(-newton * (6.0 - bend) / (6.0 - 4.0 * bend));
    }
    // A bend that is no number fails here too.
    if bend < 1.0 - 4.0 * f64::EPSILON { Some(libm::log(1.0 - bend) / power) } else { None }
}

/// exp(x) for a step that will be corrected: off by up to 5 % where |x| < 2, by rounding near zero
/// and above.
#[inline(always)]
#[must_use]
pub fn growth(x: f64) -> f64 {
    if x.abs() < 2.0 {
        let half = 0.5 * x;
        let square = x * x * (1.0 / 12.0);
        (1.0 + half + square) / (1.0 - half + square)
    } else {
        libm::exp(x)
    }
}
