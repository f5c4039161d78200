//! The temperature at which this analysis would be at equilibrium.

use crate::constant::Constant;
use crate::library::Temperature;
use crate::numeric::{RootOutcome, root_between};
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;

/// T* and the approach.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Approach {
    /// T*, where K(T*) = Q.
    pub t_star_k: f64,
    /// T − T*.
    pub approach_k: f64,
    /// sign(ΔH°)·(T − T*): positive when the bed falls short.
    pub shortfall_k: f64,
    /// How many other temperatures in the range have K = Q as well; this one is the nearest.
    pub others: usize,
}

/// Why there is no T*.
#[derive(Debug, Clone, Copy, PartialEq)]
pub enum NoApproach {
    /// Q is zero, infinite or undetermined.
    QuotientOpen,
    /// Nothing says how K changes with temperature.
    TemperatureUnknown,
    /// K does not reach Q between these temperatures.
    OutOfReach {
        /// The lower end of the search.
        from_k: f64,
        /// The upper end of the search.
        to_k: f64,
    },
}

/// Where nothing bounds the data of a stated K, T* is looked for between these temperatures: the
/// span of industrial reactors with room on both sides. Common practice, no source.
const SEARCH_K: (f64, f64) = (150.0, 3000.0);

/// Finds T*, where K(T*) = Q at the measured composition and pressure, nearest to the temperature.
///
/// ln K is sampled at 97 points evenly spaced in 1/T over the range of the data, and each change of
/// sign is closed in on to 1e-9 K. Where ln K comes near ln Q and turns away again between samples,
/// its turning point (where ΔH° = 0) is found first, so that two roots beside it are seen as well.
///
/// # Errors
/// The reason why there is none.
pub fn approach(
    constant: &Constant,
    ln_q: Option<f64>,
    temperature_k: f64,
) -> Result<Approach, NoApproach> {
    let ln_q = ln_q.ok_or(NoApproach::QuotientOpen)?;
    if !constant.knows_temperature() {
        return Err(NoApproach::TemperatureUnknown);
    }
    let (low, high) = match (constant, constant.range_k()) {
        (Constant::Library(_), Some(range)) => range,
        // A line or a formula is drawn on as far as a plant goes; the report marks what lies outside.
        (_, range) => {
            range.map_or(SEARCH_K, |(low, high)| (low.min(SEARCH_K.0), high.max(SEARCH_K.1)))
        }
    };
    let (from_k, to_k) = (low.min(temperature_k), high.max(temperature_k));
    // Outside the limits of a temperature there is no K and so no change of sign.
    let distance = |t: f64| Temperature::new(t).map_or(f64::NAN, |t| constant.ln_k(t) - ln_q);
    let found = roots(distance, from_k, to_k);
    let away = |t: &f64| (t - temperature_k).abs();
    let Some(&t_star_k) = found.iter().min_by(|a, b| away(a).total_cmp(&away(b))) else {
        return Err(NoApproach::OutOfReach { from_k, to_k });
    };
    let approach_k = temperature_k - t_star_k;
    // sign(ΔH°)·(T − T*) has the sign of ln K(T) − ln K(T*), whatever ΔH° does in between.
    let short = distance(temperature_k) > 0.0;
    let shortfall_k = if short { approach_k.abs() } else { -approach_k.abs() };
    Ok(Approach { t_star_k, approach_k, shortfall_k, others: found.len() - 1 })
}

/// T* once more after a small change of K or Q, by Newton's method from where it was: ln K(T) is so
/// nearly straight in 1/T that three steps are usual. None where it does not settle nearby.
#[must_use]
pub fn follow(constant: &Constant, ln_q: f64, from_k: f64) -> Option<f64> {
    const STEPS_AT_MOST: u32 = 12;
    let mut per_k = 1.0 / from_k;
    for _ in 0..STEPS_AT_MOST {
        let at = constant.at(Temperature::new(1.0 / per_k).ok()?);
        // d ln K/d(1/T) = −ΔH°/R.
        let slope = -at.enthalpy_j_per_mol? / GAS_CONSTANT_J_PER_MOL_K;
        let step = (ln_q - at.ln_k) / slope;
        if !step.is_finite() || step.abs() > 0.3 * per_k {
            return None;
        }
        per_k += step;
        if step.abs() <= 1e-11 * per_k {
            return Some(1.0 / per_k);
        }
    }
    None
}

fn roots(distance: impl Fn(f64) -> f64, from_k: f64, to_k: f64) -> Vec<f64> {
    const SAMPLES: u32 = 96;
    let (first, last) = (1.0 / from_k, 1.0 / to_k);
    let point = |i: u32| match i {
        0 => from_k,
        SAMPLES => to_k,
        _ => 1.0 / (first + (last - first) * f64::from(i) / f64::from(SAMPLES)),
    };
    let mut found = Vec::new();
    let mut left = (point(0), distance(point(0)));
    let mut before: Option<(f64, f64)> = None;
    if left.1 == 0.0 {
        found.push(left.0);
    }
    for i in 1..=SAMPLES {
        let right = (point(i), distance(point(i)));
        if right.1 == 0.0 {
            found.push(right.0);
        } else if left.1 != 0.0 && (left.1 > 0.0) != (right.1 > 0.0) {
            let root = root_between(&distance, left.0, right.0, 1e-9);
            if root.outcome == RootOutcome::Found {
                found.push(root.x);
            }
        }
        // A turning point on this side of zero between the last three samples may reach across it.
        if let Some(before) = before.filter(|before: &(f64, f64)| turns(before.1, left.1, right.1))
        {
            let turning = turning_point(&distance, before.0, right.0);
            if (turning.1 > 0.0) != (left.1 > 0.0) && turning.1 != 0.0 {
                for end in [before, right] {
                    let root = root_between(&distance, end.0, turning.0, 1e-9);
                    if root.outcome == RootOutcome::Found {
                        found.push(root.x);
                    }
                }
            }
        }
        before = Some(left);
        left = right;
    }
    found
}

/// Whether the middle of three values of one sign is the nearest to zero.
fn turns(a: f64, b: f64, c: f64) -> bool {
    let one_sign = (a > 0.0) == (b > 0.0) && (b > 0.0) == (c > 0.0);
    one_sign && b.abs() < a.abs() && b.abs() < c.abs()
}

/// The place between two others where a function that has one sign at both comes nearest to zero, by
/// golden section, and its value there.
fn turning_point(distance: &impl Fn(f64) -> f64, from_k: f64, to_k: f64) -> (f64, f64) {
    const GOLDEN: f64 = 0.618_033_988_749_894_9;
    let (mut a, mut b) = (from_k, to_k);
    let sign = if distance(from_k) > 0.0 { 1.0 } else { -1.0 };
    for _ in 0..80 {
        let (c, d) = (b - GOLDEN * (b - a), a + GOLDEN * (b - a));
        if sign * distance(c) < sign * distance(d) { b = d } else { a = c }
    }
    let middle = 0.5 * (a + b);
    (middle, distance(middle))
}
