//! The affinity as a function of the distance d from one wall.
//!
//! Every amount is n_i = r_i + w_i d, with r_i its amount at the wall and w_i = ∓ν_i. For a root
//! that is nearer to this wall than to the other, no amount is formed by a subtraction that loses
//! digits, so traces are as accurate as the rest.
//!
//! With the sign that makes it rise with d,
//! h(d) = Σ w_i ln a_i ∓ ln K, and in u = ln d
//! dh/du = Σ (d/n_i)(w_i − D y_i)² over the whole mixture, inert species too,
//! where D = Σ w_i where activities follow fractions and D = 0 otherwise.
//! This file sees the one mixture that reacts; `several` sees any number of them.
//! The bracket is formed as w_i R/n_t − D r_i/n_t with R = Σ r_i, because d drops out of it.

use super::outcome::Workspace;
use super::solve::Seen;
use super::state::State;
use super::system::{Kind, System};
use super::walls::{Wall, Way};
use crate::numeric::{LN_2_TAIL, Scaled, split, two_product, two_sum};

/// A reacting species of a mixture, seen from one wall.
#[derive(Debug, Clone, Copy)]
pub(super) struct Term {
    /// The amount at the wall, scaled.
    pub at_wall: f64,
    /// w: the change of the amount with the distance.
    pub slope: f64,
    /// w times the system's multiple, where that is whole.
    pub power: i32,
    /// The place of its mixture among those that react.
    pub part: u32,
}

/// The affinity seen from one wall. Amounts are scaled by 2^`shift`.
#[derive(Debug)]
pub(super) struct Side {
    terms: Vec<Term>,
    /// R and the amount of inert species in it; 1 and 0 where fractions do not matter.
    total: f64,
    inert: f64,
    /// D, and D times the multiple.
    total_slope: f64,
    total_power: i32,
    /// The whole powers that do not change with d.
    fixed: Scaled,
    /// ± ln K with the logarithms that the slow path needs.
    target: f64,
    multiple: f64,
    /// One over the multiple, exact because that is a power of two; 1 where there is none.
    per_multiple: f64,
    /// The power of two that amounts are scaled by.
    shift: i32,
}

/// h and its first two derivatives in ln d.
#[derive(Debug, Clone, Copy)]
pub(super) struct Point {
    pub value: f64,
    pub slope: f64,
    pub curvature: f64,
}

impl Side {
    /// h where some ν is no multiple of an eighth: a logarithm for each mantissa, and the powers of
    /// two added with their rounding errors. The scaling is taken off first, since Σν and the ν
    /// may not add up to the last digit.
    #[inline(never)]
    fn by_logarithms(&self, amount: impl Fn(&Term) -> f64, total: f64) -> f64 {
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
        if self.total_slope != 0.0 {
            add(total, -self.total_slope);
        }
        let ln_2 = std::f64::consts::LN_2;
        let (large, large_error) = two_product(twos, ln_2);
        (large - self.target) + (large_error + twos * LN_2_TAIL + twos_error * ln_2 + small)
    }
}

impl Seen for Side {
    fn new(
        system: &System,
        state: &State,
        ln_k: f64,
        wall: &Wall,
        workspace: &mut Workspace,
    ) -> Side {
        let sign = match wall.way {
            Way::Forward => -1,
            Way::Reverse => 1,
        };
        let mut terms = std::mem::take(&mut workspace.terms);
        let (scaled, shift) = (&workspace.scaled, workspace.shift);
        terms.clear();
        let mut total = 0.0;
        for mixed in &system.mixed {
            let at_wall = wall.amount_of(mixed.nu, scaled[mixed.species]);
            total += at_wall;
            let slope = wall.slope_of(mixed.nu);
            terms.push(Term { at_wall, slope, power: sign * mixed.power, part: 0 });
        }
        let by_fraction = state.by_fraction(system.mixture);
        let mut still = 0.0;
        if by_fraction {
            still = inert(system, system.mixture, scaled);
            total += still;
        } else {
            total = 1.0;
        }
        let signed = f64::from(sign);
        let (delta, delta_power) = if by_fraction {
            (signed * system.delta_nu, sign * system.delta_power)
        } else {
            (0.0, 0)
        };
        let mut side = Side {
            terms,
            total,
            inert: still,
            total_slope: delta,
            total_power: -delta_power,
            fixed: Scaled::ONE,
            target: signed * ln_k,
            multiple: system.multiple,
            per_multiple: if system.multiple > 0.0 { 1.0 / system.multiple } else { 1.0 },
            shift,
        };
        if system.multiple > 0.0 {
            let power = sign * system.delta_power;
            side.fixed = state.activity_unit(system.mixture, power);
            // Fractions do not see how amounts are scaled.
            if !by_fraction {
                side.fixed = side.fixed.times_two_to(-i64::from(shift) * i64::from(power));
            }
            side.target *= system.multiple;
        } else {
            let unit = state.activity_unit(system.mixture, 1);
            side.target -= signed * system.delta_nu * unit.ln_less(0.0);
        }
        side
    }

    fn into_terms(self) -> Vec<Term> {
        self.terms
    }

    #[inline(never)]
    fn value(&self, d: f64) -> f64 {
        let total = self.total + self.total_slope * d;
        if self.multiple == 0.0 {
            return self.by_logarithms(|term| term.at_wall + term.slope * d, total);
        }
        let mut product = self.fixed;
        for term in &self.terms {
            product = product.times(term.at_wall + term.slope * d, term.power);
        }
        if self.total_power != 0 {
            product = product.times(total, self.total_power);
        }
        product.ln_less(self.target) * self.per_multiple
    }

    #[inline(never)]
    fn point(&self, d: f64) -> Point {
        let total = self.total + self.total_slope * d;
        let per_total = 1.0 / total;
        let wall_share = self.total * per_total;
        let total_bend = 2.0 * self.total_slope * d * per_total;
        let delta_per_total = self.total_slope * per_total;
        let mut product = self.fixed;
        let (mut slope, mut curvature) = (0.0, 0.0);
        for term in &self.terms {
            let amount = term.at_wall + term.slope * d;
            let reach = d / amount;
            let bracket = term.slope * wall_share - delta_per_total * term.at_wall;
            let part = reach * bracket * bracket;
            slope += part;
            curvature += part * (1.0 - term.slope * reach - total_bend);
            product = product.times(amount, term.power);
        }
        if self.total_power != 0 {
            product = product.times(total, self.total_power);
        }
        let part = (delta_per_total * d) * (delta_per_total * self.inert);
        slope += part;
        curvature += part * (1.0 - total_bend);
        let value = if self.multiple == 0.0 {
            self.by_logarithms(|term| term.at_wall + term.slope * d, total)
        } else {
            product.ln_less(self.target) * self.per_multiple
        };
        Point { value, slope, curvature }
    }

    fn order(&self) -> f64 {
        self.terms.iter().filter(|term| term.at_wall == 0.0).map(|term| term.slope).sum()
    }

    #[inline(never)]
    fn intercept(&self) -> f64 {
        let factor = |term: &Term| if term.at_wall == 0.0 { term.slope } else { term.at_wall };
        if self.multiple == 0.0 {
            return self.by_logarithms(factor, self.total);
        }
        let mut product = self.fixed;
        for term in &self.terms {
            product = product.times(factor(term), term.power);
        }
        if self.total_power != 0 {
            product = product.times(self.total, self.total_power);
        }
        product.ln_less(self.target) * self.per_multiple
    }

    fn reach(&self) -> f64 {
        let reach = self.terms.iter().map(|term| term.at_wall / term.slope);
        reach.fold(f64::MAX, f64::min)
    }
}

/// The amount of a mixture that takes no part.
pub(super) fn inert(system: &System, mixture: Kind, amounts: &[f64]) -> f64 {
    let mut sum = 0.0;
    for ((&kind, &nu), &amount) in system.kinds.iter().zip(&system.nu).zip(amounts) {
        if kind == mixture && nu == 0.0 {
            sum += amount;
        }
    }
    sum
}
