//! The setting from which a phase that is used up at rest is left over.

use super::knob::{Knob, Knobs};
use super::local::Local;
use crate::equilibrium::Affinity;
use crate::equilibrium::Kind;

/// Steps of the search in T; a curve as smooth as ln K(T) needs three to six.
const STEPS_AT_MOST: u32 = 30;
/// Where the search in T ends, in K.
const ENOUGH_K: f64 = 1e-9;

/// Where the affinity that is left at the limit of ξ vanishes as this knob is turned.
///
/// With A = A/RT left at present: P' = P exp(A/Δν), V' = V exp(−A/Δν), and for the relative solvent
/// exp(−A/Δν); for T Newton's steps on ln K(T) − ln Q. `None` for other knobs, and where there is
/// no such setting within reach.
pub(super) fn border(knobs: &mut Knobs, local: &Local, knob: Knob) -> Option<f64> {
    let Affinity::Finite(left) = knobs.now().affinity else { return None };
    let value = knobs.value(knob)?;
    // Activity coefficients change with temperature and with dilution.
    if local.system.is_corrected() && matches!(knob, Knob::Temperature | Knob::Dilution) {
        return None;
    }
    let found = match knob {
        Knob::Pressure => value * libm::exp(left / local.delta_nu(Kind::Gas)),
        Knob::Volume => value * libm::exp(-left / local.delta_nu(Kind::Gas)),
        Knob::Dilution => value * libm::exp(-left / local.delta_nu(Kind::Solute)),
        Knob::Temperature => temperature_k(knobs, local, left)?,
        _ => return None,
    };
    // Beyond a factor of a million no plant goes, and outside the data nobody knows.
    let ratio = found / value;
    let known = match (knob, knobs.plant().constant.range_k()) {
        (Knob::Temperature, Some((low, high))) => {
            let at = found - knobs.plant().approach_k;
            (low..=high).contains(&at)
        }
        _ => true,
    };
    (known && ratio > 1e-6 && ratio < 1e6).then_some(found)
}

fn temperature_k(knobs: &mut Knobs, local: &Local, left: f64) -> Option<f64> {
    let spread = local.hold.volume_m3().map_or(0.0, |_| local.delta_nu(Kind::Gas));
    let now_k = local.temperature_k;
    let ln_k_now = knobs.ln_k(now_k)?;
    let mut slope = local.drive(Knob::Temperature)?;
    let (mut at_k, mut value) = (now_k, left);
    for _ in 0..STEPS_AT_MOST {
        // Steps in 1/T, in which ln K is nearly straight, of at most a factor of two.
        let reciprocal = 1.0 / at_k + value / (slope * at_k * at_k);
        let next_k = (1.0 / reciprocal.max(0.5 / at_k)).max(0.5 * at_k);
        let ln_k = knobs.ln_k(next_k)?;
        let next = left + (ln_k - ln_k_now) - spread * libm::log(next_k / now_k);
        if !next.is_finite() {
            return None;
        }
        if (next_k - at_k).abs() <= ENOUGH_K || next == 0.0 {
            return Some(next_k);
        }
        slope = (next - value) / (next_k - at_k);
        (at_k, value) = (next_k, next);
    }
    None
}
