//! The affinity seen from one wall where several mixtures react: gas and solution, gas and liquid.
//!
//! As in `side`, with one total for each mixture whose activities follow fractions:
//! dh/du = Σ over mixtures Σ over their species (d/n_i)(w_i − D y_i)²,
//! with D = Σ w_i of that mixture (D = 0 where activities follow amounts). A mixture that is used up
//! as a whole keeps its composition y_i = w_i/D on the way, as a pure phase does.

use super::outcome::Workspace;
use super::quotient::{Affinity, Factors, in_proportion_throughout};
use super::side::{Point, Term, inert};
use super::solve::Seen;
use super::state::State;
use super::system::System;
use super::walls::{Wall, Way};
use crate::numeric::{LN_2_TAIL, Scaled, split, two_product, two_sum};

/// Gas, and solution or liquid: a liquid mixture and a solution do not go together.
const PARTS_AT_MOST: usize = 3;

/// The total of one mixture; R = 1 and D = 0 where activities follow amounts.
#[derive(Debug, Clone, Copy)]
struct Total {
    at_wall: f64,
    inert: f64,
    slope: f64,
    power: i32,
}

impl Total {
    const NONE: Total = Total { at_wall: 1.0, inert: 0.0, slope: 0.0, power: 0 };

    /// Whether the mixture is used up as a whole at this wall.
    fn vanishes(&self) -> bool {
        self.at_wall == 0.0
    }

    fn at(&self, d: f64) -> f64 {
        self.at_wall + self.slope * d
    }
}

/// The affinity seen from one wall. Amounts are scaled by 2^`shift`.
#[derive(Debug)]
pub(super) struct Several {
    terms: Vec<Term>,
    totals: [Total; PARTS_AT_MOST],
    fixed: Scaled,
    target: f64,
    multiple: f64,
    shift: i32,
}

impl Several {
    fn total_of(&self, term: &Term) -> &Total {
        &self.totals[term.part as usize]
    }

    fn by_product(&self, amount: impl Fn(&Term) -> f64, total: impl Fn(&Total) -> f64) -> f64 {
        let mut product = self.fixed;
        for term in &self.terms {
            product = product.times(amount(term), term.power);
        }
        for part in &self.totals {
            if part.power != 0 {
                product = product.times(total(part), -part.power);
            }
        }
        product.ln_less(self.target) / self.multiple
    }

    /// As in `side`: a logarithm for each mantissa, and the powers of two apart.
    fn by_logarithms(&self, amount: impl Fn(&Term) -> f64, total: impl Fn(&Total) -> f64) -> f64 {
        let (mut twos, mut twos_error, mut small) = (0.0, 0.0, 0.0);
        let mut add = |x: f64, power: f64| {
            let (mantissa, exponent) = split(x);
            small += power * libm::log(mantissa);
            let (product, product_error) = two_product(power, f64::from(exponent - self.shift));
            let (sum, sum_error) = two_sum(twos, product);
            twos = sum;
            twos_error += sum_error + product_error;
        };
        for term in &self.terms {
            add(amount(term), term.slope);
        }
        for part in self.totals.iter().filter(|part| part.slope != 0.0) {
            add(total(part), -part.slope);
        }
        let ln_2 = std::f64::consts::LN_2;
        let (large, large_error) = two_product(twos, ln_2);
        (large - self.target) + (large_error + twos * LN_2_TAIL + twos_error * ln_2 + small)
    }

    fn sum(&self, amount: impl Fn(&Term) -> f64, total: impl Fn(&Total) -> f64) -> f64 {
        if self.multiple > 0.0 {
            self.by_product(amount, total)
        } else {
            self.by_logarithms(amount, total)
        }
    }
}

impl Seen for Several {
    fn new(
        system: &System,
        state: &State,
        ln_k: f64,
        wall: &Wall,
        workspace: &mut Workspace,
    ) -> Several {
        let sign = match wall.way {
            Way::Forward => -1,
            Way::Reverse => 1,
        };
        let signed = f64::from(sign);
        let mut terms = std::mem::take(&mut workspace.terms);
        let (scaled, shift) = (&workspace.scaled, workspace.shift);
        terms.clear();
        let mut sums = [0.0; PARTS_AT_MOST];
        for mixed in &system.mixed {
            let at_wall = wall.amount_of(mixed.nu, scaled[mixed.species]);
            sums[mixed.part] += at_wall;
            let (slope, power) = (wall.slope_of(mixed.nu), sign * mixed.power);
            terms.push(Term { at_wall, slope, power, part: mixed.part as u32 });
        }
        let mut totals = [Total::NONE; PARTS_AT_MOST];
        let mut fixed = Scaled::ONE;
        let mut target = signed * ln_k * if system.multiple > 0.0 { system.multiple } else { 1.0 };
        for ((part, total), sum) in system.parts.iter().zip(&mut totals).zip(sums) {
            let power = sign * part.delta_power;
            let by_fraction = state.by_fraction(part.kind);
            if by_fraction {
                let inert = inert(system, part.kind, scaled);
                let slope = signed * part.delta_nu;
                *total = Total { at_wall: sum + inert, inert, slope, power };
            }
            if system.multiple > 0.0 {
                fixed = fixed.and(state.activity_unit(part.kind, power));
                // Fractions do not see how amounts are scaled.
                if !by_fraction {
                    fixed = fixed.times_two_to(-i64::from(shift) * i64::from(power));
                }
            } else {
                let unit = state.activity_unit(part.kind, 1);
                target -= signed * part.delta_nu * unit.ln_less(0.0);
            }
        }
        Several { terms, totals, fixed, target, multiple: system.multiple, shift }
    }

    fn into_terms(self) -> Vec<Term> {
        self.terms
    }

    fn value(&self, d: f64) -> f64 {
        self.sum(|term| term.at_wall + term.slope * d, |total| total.at(d))
    }

    fn point(&self, d: f64) -> Point {
        let (mut slope, mut curvature) = (0.0, 0.0);
        for term in &self.terms {
            let total = self.total_of(term);
            let per_total = 1.0 / total.at(d);
            let reach = d / (term.at_wall + term.slope * d);
            let bracket =
                term.slope * (total.at_wall * per_total) - (total.slope * per_total) * term.at_wall;
            let part = reach * bracket * bracket;
            slope += part;
            curvature += part * (1.0 - term.slope * reach - 2.0 * total.slope * d * per_total);
        }
        for total in &self.totals {
            let share = total.slope / total.at(d);
            let part = (share * d) * (share * total.inert);
            slope += part;
            curvature += part * (1.0 - 2.0 * share * d);
        }
        Point { value: self.value(d), slope, curvature }
    }

    fn order(&self) -> f64 {
        let gone = |term: &&Term| term.at_wall == 0.0 && !self.total_of(term).vanishes();
        self.terms.iter().filter(gone).map(|term| term.slope).sum()
    }

    fn intercept(&self) -> f64 {
        self.sum(
            |term| if term.at_wall == 0.0 { term.slope } else { term.at_wall },
            |total| if total.vanishes() { total.slope } else { total.at_wall },
        )
    }

    fn reach(&self) -> f64 {
        let there = self.terms.iter().filter(|term| term.at_wall > 0.0);
        there.map(|term| term.at_wall / term.slope.abs()).fold(f64::MAX, f64::min)
    }
}

/// ln K − ln Q. A mixture with the composition that the reaction makes or takes counts with that,
/// also where there is none of it.
pub(super) fn less(system: &System, state: &State, ln_k: f64) -> Affinity {
    let amounts = state.amounts_mol;
    let mut steady = [false; PARTS_AT_MOST];
    for (place, steady) in steady.iter_mut().enumerate().take(system.parts.len()) {
        *steady = in_proportion_throughout(system, state, amounts, place);
    }
    let absent = |sign: f64| {
        let mut open = system.mixed.iter().filter(|mixed| !steady[mixed.part]);
        open.any(|mixed| mixed.nu * sign > 0.0 && amounts[mixed.species] == 0.0)
    };
    match (absent(-1.0), absent(1.0)) {
        (true, true) => return Affinity::Undetermined,
        (true, false) => return Affinity::OpenReverse,
        (false, true) => return Affinity::OpenForward,
        (false, false) => {}
    }
    let mut factors = Factors::new(system);
    for mixed in &system.mixed {
        let amount = if steady[mixed.part] { mixed.nu.abs() } else { amounts[mixed.species] };
        factors.put(amount, mixed.nu, mixed.power);
    }
    for (place, part) in system.parts.iter().enumerate() {
        factors.unit(state, part);
        if !state.by_fraction(part.kind) || part.delta_nu == 0.0 {
            continue;
        }
        let total = if steady[place] {
            part.delta_nu.abs()
        } else {
            let here = system.mixed.iter().filter(|mixed| mixed.part == place);
            let total: f64 = here.map(|mixed| amounts[mixed.species]).sum();
            total + inert(system, part.kind, amounts)
        };
        factors.put(total, -part.delta_nu, -part.delta_power);
    }
    Affinity::Finite(factors.ln_k_less(ln_k))
}

/// Whether Q is the same at every extent: every mixture keeps its composition.
pub(super) fn constant_quotient(system: &System, state: &State, amounts: &[f64]) -> bool {
    let mut places = 0..system.parts.len();
    places.all(|place| in_proportion_throughout(system, state, amounts, place))
}

/// ln K − ln Q for mixtures that are made in the proportion of ν, each on one side of the reaction.
pub(super) fn constant_affinity(system: &System, state: &State, ln_k: f64) -> f64 {
    let mut factors = Factors::new(system);
    for mixed in &system.mixed {
        factors.put(mixed.nu.abs(), mixed.nu, mixed.power);
    }
    for part in &system.parts {
        factors.unit(state, part);
        factors.put(part.delta_nu.abs(), -part.delta_nu, -part.delta_power);
    }
    factors.ln_k_less(ln_k)
}
