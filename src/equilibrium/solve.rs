//! The zero of the affinity between one wall and a point that is known to lie beyond it.

use super::outcome::Workspace;
use super::side::{Point, Term};
use super::state::State;
use super::system::System;
use super::walls::Wall;
use crate::numeric::{growth, step_in_power};

/// The most steps; the usual number is three or four.
const STEPS_AT_MOST: u32 = 100;
/// Steps after which bisection is mixed in.
const STEPS_ALONE: u32 = 12;
/// Below this the next step changes nothing: its error is of third order.
const STEP_ENOUGH: f64 = 1e-6;
/// A value this small is rounding, and where the affinity hardly changes with d it stays so over a
/// wide range of d; this many such values end the search.
const QUIET: f64 = 4.0 * f64::EPSILON;
const QUIET_ENOUGH: u32 = 3;
/// The smallest and largest distance that a double can work with here (2^-1000 and 2^1000), and
/// the logarithm of the smallest.
const FLOOR: f64 = f64::from_bits((1023 - 1000) << 52);
const CEILING: f64 = f64::from_bits((1023 + 1000) << 52);
const LN_FLOOR: f64 = -693.147_180_559_945_3;

/// The affinity seen from one wall: h as a function of the distance d, rising in ln d.
pub(super) trait Seen: Sized {
    /// Sets up the terms, in the room that the workspace has for them, and the constants.
    fn new(
        system: &System,
        state: &State,
        ln_k: f64,
        wall: &Wall,
        workspace: &mut Workspace,
    ) -> Self;
    /// Gives the room back.
    fn into_terms(self) -> Vec<Term>;
    /// h at a distance.
    fn value(&self, d: f64) -> f64;
    /// h and its derivatives at a distance.
    fn point(&self, d: f64) -> Point;
    /// λ: the sum of w over the species that are used up at this wall and leave their mixture. h
    /// goes as λ ln d there, or to a finite value when λ is zero and whole phases are used up.
    fn order(&self) -> f64;
    /// h − λ ln d as d goes to zero.
    fn intercept(&self) -> f64;
    /// The distance at which the amounts have changed by themselves.
    fn reach(&self) -> f64;
}

/// Where the affinity vanishes.
#[derive(Debug, Clone, Copy)]
pub(super) enum Zero {
    /// At this distance from the wall.
    At { distance: f64 },
    /// So near to the wall that only the logarithm of the distance is known.
    Trace { ln_distance: f64 },
    /// Beyond any distance that a double holds.
    Nowhere,
}

/// Finds the zero of h in (0, `high`), from a start and h there.
///
/// `high` is infinite where there is no other wall. `order` is the side's λ, zero where h is finite
/// at the wall (and has been found negative there). Gives the zero, the slope of h in ln d next to
/// it, and the steps taken.
#[inline(never)]
pub(super) fn solve<S: Seen>(
    side: &S,
    order: f64,
    start: f64,
    first: Point,
    high: f64,
) -> (Zero, f64, u32) {
    let (mut low, mut high) = (0.0, high);
    let (mut d, mut point) = (start, first);
    let mut quiet = 0;
    for steps in 1..=STEPS_AT_MOST {
        quiet += u32::from(point.value.abs() <= QUIET);
        if point.value == 0.0 || quiet == QUIET_ENOUGH {
            return (Zero::At { distance: d }, point.slope, steps);
        }
        if point.value > 0.0 {
            high = d;
        } else {
            low = d;
        }
        let step = step_in_power(point.value, point.slope, point.curvature);
        let far = steps == 1 && order > 0.0 && step.is_none_or(|step| step < -1.0);
        let turn = steps > STEPS_ALONE && steps % 2 == 1;
        let mut next = match step {
            Some(step) if step.abs() < STEP_ENOUGH => {
                return (Zero::At { distance: d * growth(step) }, point.slope, steps);
            }
            Some(step) if !far && !turn => d * growth(step.clamp(-600.0, 600.0)),
            _ => 0.0,
        };
        if !(next > low && next < high && next < CEILING) {
            if far {
                // h = λ u + c is exact as d goes to zero, and its zero is not too near the wall
                // where h is convex.
                let ln_distance = -side.intercept() / order;
                if ln_distance < LN_FLOOR {
                    return (Zero::Trace { ln_distance }, point.slope, steps);
                }
                next = libm::exp(ln_distance.min(700.0));
            }
            if !(next > low && next < high) {
                next = between(low, high, d);
            }
        }
        if next < FLOOR {
            let ln_distance = if order > 0.0 { -side.intercept() / order } else { LN_FLOOR };
            return (Zero::Trace { ln_distance: ln_distance.min(LN_FLOOR) }, point.slope, steps);
        }
        if next > CEILING {
            return (Zero::Nowhere, point.slope, steps);
        }
        if high <= low * (1.0 + 2.0 * f64::EPSILON) {
            return (Zero::At { distance: next }, point.slope, steps);
        }
        d = next;
        point = side.point(d);
    }
    (Zero::At { distance: d }, point.slope, STEPS_AT_MOST)
}

/// The middle of a bracket in ln d; a long step towards an end that is not known.
fn between(low: f64, high: f64, d: f64) -> f64 {
    const LONG: f64 = 16_777_216.0; // 2^24
    if low == 0.0 {
        d / LONG
    } else if high == f64::INFINITY {
        d * LONG
    } else {
        low.sqrt() * high.sqrt()
    }
}
