//! The state where the reaction stops.

use super::limits::{AMOUNT_MAX_MOL, check_ln_k};
use super::nonideal;
use super::outcome::{Rest, RestOutcome, Summary, Workspace};
use super::quotient::{Affinity, constant_affinity, constant_quotient, ideal};
use super::several::Several;
use super::side::{Point, Side};
use super::solve::{Seen, Zero, solve};
use super::state::State;
use super::system::System;
use super::walls::{Wall, Way};
use crate::numeric::{split, times_power_of_two};
use crate::problem::Outcome;

/// The state of rest that is reached from a state, at its temperature and with its pressure or
/// volume held.
///
/// The amounts minimise G (or A at constant volume) along ξ: ln K = Σ ν_i ln a_i, or a pure phase
/// is used up first. For ideal mixtures there is one such state. With activity coefficients there is
/// one unless the solution would fall into two by its model (not with charges up to two and ions of
/// usual size, nor up to three by Davies' equation below 100 °C); then the one is taken whose
/// Σ ν_i ln γ_i is met first on the way from that of the start.
///
/// It is sought in the logarithm of
/// the distance from the nearer limit of ξ, so that traces are as good as main components: on 848
/// problems with K from 1e-300 to 1e300 no ln n is wrong by more than 1e-12, or by eight times the
/// change that one unit in the last place of some input makes, if that is more.
///
/// Where pressure is held and there is no gas at first, the gas that forms has y_i = ν_i/Δν.
///
/// # Errors
/// As [`State::check`], and `ln-k-out-of-range` unless |ln K| ≤ [`super::LN_K_MAX`].
///
/// ```
/// use shiftgauge::equilibrium::{Hold, Kind, RestOutcome, State, System, rest};
/// // A = B with K = 3: three quarters are B.
/// let system = System::new(&[Kind::Gas; 2], &[-1.0, 1.0]).unwrap();
/// let hold = Hold::Pressure { pressure_pa: 100_000.0 };
/// let state = State { temperature_k: 500.0, hold, amounts_mol: &[1.0, 0.0] };
/// let end = rest(&system, &state, 3f64.ln()).unwrap();
/// assert_eq!(end.summary.outcome, RestOutcome::Rest);
/// assert!((end.amounts_mol[1] - 0.75).abs() < 1e-15);
/// ```
pub fn rest(system: &System, state: &State, ln_k: f64) -> Outcome<Rest> {
    let mut workspace = Workspace::default();
    let summary = rest_into(system, state, ln_k, &mut workspace)?;
    let ln_amounts =
        (0..system.kinds.len()).map(|species| workspace.ln_amount(system, species)).collect();
    Ok(Rest { summary, amounts_mol: workspace.amounts_mol, ln_amounts })
}

/// As [`rest`], leaving the amounts in a workspace that is used again.
///
/// # Errors
/// As [`rest`]; the workspace then holds what it held before.
pub fn rest_into(
    system: &System,
    state: &State,
    ln_k: f64,
    workspace: &mut Workspace,
) -> Outcome<Summary> {
    check_ln_k(ln_k)?;
    state.check(system)?;
    if system.plain {
        return Ok(Search::begin(system, state, ln_k, workspace).run());
    }
    Ok(nonideal::rest(system, state, ln_k, workspace))
}

/// The state of rest with γ = 1 and the solvent left out, for a state that has been checked.
pub(super) fn ideal_rest(
    system: &System,
    state: &State,
    ln_k: f64,
    workspace: &mut Workspace,
) -> Summary {
    Search::begin(system, state, ln_k, workspace).run()
}

/// One search.
struct Search<'a> {
    system: &'a System,
    state: &'a State<'a>,
    ln_k: f64,
    workspace: &'a mut Workspace,
    forward: Option<Wall>,
    reverse: Option<Wall>,
}

impl<'a> Search<'a> {
    fn begin(
        system: &'a System,
        state: &'a State<'a>,
        ln_k: f64,
        workspace: &'a mut Workspace,
    ) -> Search<'a> {
        let amounts = state.amounts_mol;
        workspace.amounts_mol.clear();
        workspace.amounts_mol.extend_from_slice(amounts);
        workspace.trace = None;
        workspace.shift = shift(system, state);
        workspace.scaled.clear();
        let shift = workspace.shift;
        workspace.scaled.extend(amounts.iter().map(|&x| times_power_of_two(x, shift)));
        let forward = Wall::find(system, &workspace.scaled, Way::Forward);
        let reverse = Wall::find(system, &workspace.scaled, Way::Reverse);
        Search { system, state, ln_k, workspace, forward, reverse }
    }

    fn run(mut self) -> Summary {
        let closed = |wall: &Option<Wall>| wall.is_some_and(|wall| wall.distance == 0.0);
        if closed(&self.forward) && closed(&self.reverse) {
            return self.stay(RestOutcome::NothingCanMove);
        }
        if constant_quotient(self.system, self.state, self.state.amounts_mol) {
            return self.run_to_limit();
        }
        if self.system.parts.len() > 1 { self.search::<Several>() } else { self.search::<Side>() }
    }

    fn search<S: Seen>(&mut self) -> Summary {
        let far = match (self.forward, self.reverse) {
            (Some(forward), Some(reverse)) => return self.between::<S>(forward, reverse),
            (Some(wall), None) | (None, Some(wall)) => wall,
            (None, None) => return self.stay(RestOutcome::HasNoLimit),
        };
        self.with_one_wall::<S>(far)
    }

    /// Both walls are there: the sign of the affinity in the middle says which is nearer.
    fn between<S: Seen>(&mut self, forward: Wall, reverse: Wall) -> Summary {
        let middle = 0.5 * (forward.distance + reverse.distance);
        // A wrong guess costs setting up the other side.
        let tends_forward = self.ln_k > self.system.delta_nu * self.state.rough_ln_pressure();
        let (guess, other) = if tends_forward { (forward, reverse) } else { (reverse, forward) };
        let side: S = self.side(&guess);
        let point = side.point(middle);
        if point.value >= 0.0 {
            return self.near(&guess, side, middle, point, middle);
        }
        // The same point seen from the other wall.
        let point = Point {
            value: -point.value,
            slope: point.slope,
            curvature: 2.0 * point.slope - point.curvature,
        };
        self.workspace.terms = side.into_terms();
        let side: S = self.side(&other);
        self.near(&other, side, middle, point, middle)
    }

    /// There is no wall the other way.
    fn with_one_wall<S: Seen>(&mut self, wall: Wall) -> Summary {
        if self.system.parts.iter().all(|part| self.state.by_fraction(part.kind)) {
            let towards_wall = match wall.way {
                Way::Forward => 1.0,
                Way::Reverse => -1.0,
            };
            if constant_affinity(self.system, self.state, self.ln_k) * towards_wall <= 0.0 {
                return self.stay(RestOutcome::HasNoLimit);
            }
        }
        let side: S = self.side(&wall);
        let order = side.order();
        let start = if order > 0.0 {
            libm::exp((-side.intercept() / order).clamp(-690.0, 690.0))
        } else {
            side.reach().clamp(1e-299, 1e299)
        };
        let point = side.point(start);
        self.near(&wall, side, start, point, f64::INFINITY)
    }

    fn side<S: Seen>(&mut self, wall: &Wall) -> S {
        S::new(self.system, self.state, self.ln_k, wall, self.workspace)
    }

    fn near<S: Seen>(
        &mut self,
        wall: &Wall,
        side: S,
        start: f64,
        first: Point,
        high: f64,
    ) -> Summary {
        let summary = self.seen_from(wall, &side, start, first, high);
        self.workspace.terms = side.into_terms();
        summary
    }

    /// Rest is on this wall's side of `high`, or at the wall.
    fn seen_from<S: Seen>(
        &mut self,
        wall: &Wall,
        side: &S,
        start: f64,
        first: Point,
        high: f64,
    ) -> Summary {
        let order = side.order();
        let away = match wall.way {
            Way::Forward => 1.0,
            Way::Reverse => -1.0,
        };
        if order == 0.0 {
            let at_wall = side.intercept();
            if at_wall >= 0.0 {
                let outcome =
                    if at_wall == 0.0 { RestOutcome::Rest } else { RestOutcome::PhaseExhausted };
                self.move_to(wall, 0.0);
                let extent = away * wall.distance;
                return self.summary(outcome, extent, Affinity::Finite(away * at_wall + 0.0));
            }
        }
        let (zero, slope, iterations) = solve(side, order, start, first, high);
        let distance = match zero {
            Zero::Nowhere => {
                return Summary { iterations, ..self.stay(RestOutcome::HasNoLimit) };
            }
            Zero::At { distance } => distance,
            Zero::Trace { ln_distance } => {
                self.workspace.trace = Some((wall.way, ln_distance));
                0.0
            }
        };
        self.move_to(wall, distance);
        // With both walls no amount can pass the largest by more than the largest ratio of ν.
        if self.workspace.amounts_mol.iter().any(|&amount| amount > AMOUNT_MAX_MOL * 1e7) {
            return Summary { iterations, ..self.stay(RestOutcome::HasNoLimit) };
        }
        let (left, condition) = if distance > 0.0 {
            (side.value(distance), self.condition(distance, slope))
        } else {
            (0.0, if order > 0.0 { 1.0 / order } else { f64::MAX })
        };
        let extent = away * (wall.distance - distance);
        let summary = self.summary(RestOutcome::Rest, extent, Affinity::Finite(away * left + 0.0));
        Summary { residual: left.abs(), iterations, condition, ..summary }
    }

    /// The largest |ν_i| d/n_i over the slope of the affinity in ln d.
    fn condition(&self, distance: f64, slope: f64) -> f64 {
        // The largest |ν|/n, found without dividing.
        let (mut most, mut of) = (0.0, 1.0);
        let each = self.system.nu.iter().zip(&self.system.kinds).zip(&self.workspace.scaled);
        for ((&nu, &kind), &amount) in each {
            if !kind.is_ample() && amount > 0.0 && nu.abs() * of > most * amount {
                (most, of) = (nu.abs(), amount);
            }
        }
        let condition = most * (distance / of) / slope;
        if condition.is_finite() { condition } else { f64::MAX }
    }

    /// Q is the same everywhere.
    fn run_to_limit(&mut self) -> Summary {
        let affinity = constant_affinity(self.system, self.state, self.ln_k);
        let powers: f64 = self.system.mixed.iter().map(|mixed| mixed.nu.abs()).sum();
        let rounding = 4.0 * f64::EPSILON * powers.max(self.ln_k.abs()).max(1.0);
        if affinity.abs() <= rounding {
            return self.stay(RestOutcome::AnyExtentIsAtRest);
        }
        let (wall, away) = if affinity > 0.0 { (self.forward, 1.0) } else { (self.reverse, -1.0) };
        let Some(wall) = wall else { return self.stay(RestOutcome::HasNoLimit) };
        self.move_to(&wall, 0.0);
        let extent = away * wall.distance;
        self.summary(RestOutcome::RanToItsLimit, extent, Affinity::Finite(affinity))
    }

    /// Puts the amounts where they are at a distance from a wall.
    fn move_to(&mut self, wall: &Wall, distance: f64) {
        let Workspace { amounts_mol, scaled, shift, .. } = &mut *self.workspace;
        for (species, (&nu, &kind)) in self.system.nu.iter().zip(&self.system.kinds).enumerate() {
            if nu == 0.0 || kind.is_ample() {
                continue;
            }
            scaled[species] = wall.amount_of(nu, scaled[species]) + wall.slope_of(nu) * distance;
            amounts_mol[species] = times_power_of_two(scaled[species], -*shift);
        }
    }

    /// The amounts stay as they came.
    fn stay(&mut self, outcome: RestOutcome) -> Summary {
        self.workspace.amounts_mol.clear();
        self.workspace.amounts_mol.extend_from_slice(self.state.amounts_mol);
        let shift = self.workspace.shift;
        self.workspace.scaled.clear();
        let amounts = self.state.amounts_mol.iter();
        self.workspace.scaled.extend(amounts.map(|&x| times_power_of_two(x, shift)));
        let affinity = ideal(self.system, self.state, self.ln_k);
        self.summary(outcome, 0.0, affinity)
    }

    fn summary(&self, outcome: RestOutcome, scaled_extent: f64, affinity: Affinity) -> Summary {
        // Adding zero takes the sign off a zero.
        let unshift = |x: f64| times_power_of_two(x, -self.workspace.shift) + 0.0;
        Summary {
            outcome,
            extent_mol: unshift(scaled_extent),
            extent_min_mol: self.reverse.map(|wall| unshift(-wall.distance)),
            extent_max_mol: self.forward.map(|wall| unshift(wall.distance)),
            affinity,
            residual: 0.0,
            iterations: 0,
            condition: 0.0,
        }
    }
}

/// The power of two that amounts are multiplied by, so that the largest that matters is near 2^990
/// and traces of 1e-590 of it can still be worked with. Without a wall one way the distance may
/// become large, so nothing is scaled.
fn shift(system: &System, state: &State) -> i32 {
    let (mut largest, mut used_up, mut made) = (0.0_f64, false, false);
    for ((&kind, &nu), &amount) in system.kinds.iter().zip(&system.nu).zip(state.amounts_mol) {
        if !kind.is_ample() && (nu != 0.0 || state.by_fraction(kind) && system.reacts(kind)) {
            largest = largest.max(amount);
            used_up |= nu < 0.0;
            made |= nu > 0.0;
        }
    }
    if largest == 0.0 || !(used_up && made) { 0 } else { 990 - split(largest).1 }
}
