//! The walls: how far a reaction can run each way before a species is used up.

use super::system::System;
use crate::numeric::difference_of_products;

/// A way a reaction can run.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub(super) enum Way {
    Forward,
    Reverse,
}

impl Way {
    /// The sign of ν of the species that this way uses up.
    #[inline(always)]
    pub fn used_up(self) -> f64 {
        match self {
            Way::Forward => -1.0,
            Way::Reverse => 1.0,
        }
    }
}

/// The end of one way: the state where the first species is used up.
#[derive(Debug, Clone, Copy)]
pub(super) struct Wall {
    pub way: Way,
    /// ν and the amount of a species that is used up first.
    nu: f64,
    amount: f64,
    /// How far it is: n/|ν| of that species.
    pub distance: f64,
}

impl Wall {
    /// Finds the wall this way; `None` when only ample phases, or nothing, would be used up.
    ///
    /// Which of two species goes first is decided exactly, by n_i |ν_j| − n_j |ν_i|.
    pub fn find(system: &System, amounts: &[f64], way: Way) -> Option<Wall> {
        let sign = way.used_up();
        let mut wall: Option<Wall> = None;
        for ((&kind, &nu), &amount) in system.kinds.iter().zip(&system.nu).zip(amounts) {
            if nu * sign <= 0.0 || kind.is_ample() {
                continue;
            }
            let distance = amount / nu.abs();
            let nearer = match wall {
                None => true,
                Some(other) => {
                    let margin = 4.0 * f64::EPSILON * other.distance;
                    distance < other.distance - margin
                        || distance <= other.distance + margin
                            && difference(amount, other.nu.abs(), other.amount, nu.abs()) < 0.0
                }
            };
            if nearer {
                wall = Some(Wall { way, nu, amount, distance });
            }
        }
        wall
    }

    /// The amount of a species at this wall, to one or two roundings; exactly zero for every
    /// species that is used up there.
    #[inline(always)]
    pub fn amount_of(&self, nu: f64, amount: f64) -> f64 {
        let change = nu.abs() * self.distance;
        if nu * self.nu < 0.0 {
            return amount + change;
        }
        // One rounding is left when `change` has none.
        let exact = is_power_of_two(nu) && is_power_of_two(self.nu) && change > SMALLEST_EXACT;
        if exact || amount > 8.0 * change {
            return amount - change;
        }
        difference(amount, self.nu.abs(), self.amount, nu.abs()) / self.nu.abs()
    }

    /// How the amount of a species changes with the distance from this wall.
    #[inline(always)]
    pub fn slope_of(&self, nu: f64) -> f64 {
        match self.way {
            Way::Forward => -nu,
            Way::Reverse => nu,
        }
    }
}

/// Above this a power of two between 1e-3 and 1e3 multiplies and divides without rounding.
const SMALLEST_EXACT: f64 = 1e-300;

#[inline(always)]
fn is_power_of_two(nu: f64) -> bool {
    nu.to_bits() << 12 == 0
}

/// a |ν_b| − b |ν_a| to one rounding, at any size of the amounts.
#[inline(always)]
fn difference(a: f64, b_nu: f64, b: f64, a_nu: f64) -> f64 {
    let largest = a.max(b);
    if largest == 0.0 {
        return 0.0;
    }
    if largest > 1e-250 && largest < 1e280 {
        return difference_of_products(a, b_nu, b, a_nu);
    }
    // Powers of two leave every bit where it is.
    let up = f64::from_bits((1023 + 600) << 52);
    let down = f64::from_bits((1023 - 600) << 52);
    let (before, after) = if largest > 1.0 { (down, up) } else { (up, down) };
    difference_of_products(a * before, b_nu, b * before, a_nu) * after
}
