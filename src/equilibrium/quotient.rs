//! The reaction quotient and the affinity, with names for their open ends.

use super::nonideal;
use super::several;
use super::side::inert;
use super::state::State;
use super::system::{Mixed, Part, System};
use crate::numeric::{LN_2_TAIL, Scaled, difference_of_products, split, two_product};
use crate::problem::Outcome;
use serde::Serialize;

/// The reaction quotient Q = Π a_i^ν_i, or the name of its open end.
#[derive(Debug, Clone, Copy, PartialEq, Serialize)]
#[serde(tag = "q", content = "ln_q", rename_all = "kebab-case")]
pub enum Quotient {
    /// ln Q.
    Finite(f64),
    /// A product is absent: Q = 0.
    Zero,
    /// A reactant is absent: 1/Q = 0.
    Infinite,
    /// Something is absent on both sides: Q has no value.
    Undetermined,
}

/// The affinity over R T, ln K − ln Q, or the name of its open end.
///
/// It is positive when the reaction tends forward. At the border it is
/// `{ "affinity": "finite", "over_rt": 1.5 }`, or `"open-forward"`, `"open-reverse"` and
/// `"undetermined"` alone.
#[derive(Debug, Clone, Copy, PartialEq, Serialize)]
#[serde(tag = "affinity", content = "over_rt", rename_all = "kebab-case")]
pub enum Affinity {
    /// A/RT = ln K − ln Q.
    Finite(f64),
    /// A product is absent, so some of it must form, whatever K is.
    OpenForward,
    /// A reactant is absent, so some of it must form, whatever K is.
    OpenReverse,
    /// Something is absent on both sides.
    Undetermined,
}

impl Affinity {
    /// The number, where there is one.
    #[must_use]
    pub fn finite(self) -> Option<f64> {
        match self {
            Affinity::Finite(value) => Some(value),
            _ => None,
        }
    }
}

/// The reaction quotient of a state.
///
/// A pure phase counts with activity 1 whether it is present or not; the affinity then says
/// whether it would form. Where pressure is held and there is no gas at all, but gases stand on one
/// side of the reaction only, Q is that of the gas that would form, with y_i = ν_i/Δν.
///
/// # Errors
/// As [`State::check`].
///
/// ```
/// use shiftgauge::equilibrium::{Hold, Kind, Quotient, State, System, quotient};
/// // N2O4 = 2 NO2 at 2 bar, half and half: Q = 0.5² · 2 / 0.5 = 1
/// let system = System::new(&[Kind::Gas; 2], &[-1.0, 2.0]).unwrap();
/// let hold = Hold::Pressure { pressure_pa: 200_000.0 };
/// let state = State { temperature_k: 300.0, hold, amounts_mol: &[0.5, 0.5] };
/// assert_eq!(quotient(&system, &state), Ok(Quotient::Finite(0.0)));
/// let state = State { amounts_mol: &[0.5, 0.0], ..state };
/// assert_eq!(quotient(&system, &state), Ok(Quotient::Zero));
/// ```
pub fn quotient(system: &System, state: &State) -> Outcome<Quotient> {
    state.check(system)?;
    Ok(match less(system, state, 0.0) {
        Affinity::Finite(value) => Quotient::Finite(if value == 0.0 { 0.0 } else { -value }),
        Affinity::OpenForward => Quotient::Zero,
        Affinity::OpenReverse => Quotient::Infinite,
        Affinity::Undetermined => Quotient::Undetermined,
    })
}

/// The affinity of a state over R T: ln K − ln Q.
///
/// The difference is formed before it is rounded, so it is good to a few units of 1e-16 near rest,
/// plus the rounding of ln K itself.
///
/// # Errors
/// As [`State::check`], and `ln-k-out-of-range` unless |ln K| ≤ [`super::LN_K_MAX`].
///
/// ```
/// use shiftgauge::equilibrium::{Affinity, Hold, Kind, State, System, affinity};
/// let system = System::new(&[Kind::Gas; 2], &[-1.0, 2.0]).unwrap();
/// let hold = Hold::Pressure { pressure_pa: 200_000.0 };
/// let state = State { temperature_k: 300.0, hold, amounts_mol: &[0.5, 0.5] };
/// assert_eq!(affinity(&system, &state, 0.75), Ok(Affinity::Finite(0.75)));
/// ```
pub fn affinity(system: &System, state: &State, ln_k: f64) -> Outcome<Affinity> {
    super::limits::check_ln_k(ln_k)?;
    state.check(system)?;
    Ok(less(system, state, ln_k))
}

/// ln K − ln Q of a state that has been checked.
pub(super) fn less(system: &System, state: &State, ln_k: f64) -> Affinity {
    if system.plain {
        return ideal(system, state, ln_k);
    }
    match ideal(system, state, ln_k) {
        Affinity::Finite(value) => {
            Affinity::Finite(value - nonideal::correction(system, state, state.amounts_mol))
        }
        open => open,
    }
}

/// As [`less`], with γ = 1 and the solvent left out.
#[inline(always)]
pub(super) fn ideal(system: &System, state: &State, ln_k: f64) -> Affinity {
    if system.parts.len() > 1 {
        return several::less(system, state, ln_k);
    }
    let amounts = state.amounts_mol;
    if constant_quotient(system, state, amounts) {
        return Affinity::Finite(constant_affinity(system, state, ln_k));
    }
    let absent = |sign: f64| {
        system.mixed.iter().any(|mixed| mixed.nu * sign > 0.0 && amounts[mixed.species] == 0.0)
    };
    match (absent(-1.0), absent(1.0)) {
        (true, true) => return Affinity::Undetermined,
        (true, false) => return Affinity::OpenReverse,
        (false, true) => return Affinity::OpenForward,
        (false, false) => {}
    }
    let mut factors = Factors::with_unit(system, state);
    for mixed in &system.mixed {
        factors.put(amounts[mixed.species], mixed.nu, mixed.power);
    }
    if state.by_fraction(system.mixture) && system.delta_nu != 0.0 {
        let total: f64 = system.mixed.iter().map(|mixed| amounts[mixed.species]).sum();
        let total = total + inert(system, system.mixture, amounts);
        factors.put(total, -system.delta_nu, -system.delta_power);
    }
    Affinity::Finite(factors.ln_k_less(ln_k))
}

/// Whether Q is the same at every extent: nothing but pure phases reacts, or pressure is held and
/// all the gas there is reacts on one side in exact proportion (or there is no gas yet).
pub(super) fn constant_quotient(system: &System, state: &State, amounts: &[f64]) -> bool {
    if system.parts.len() > 1 {
        return several::constant_quotient(system, state, amounts);
    }
    let Some(first) = system.mixed.first() else { return true };
    if !state.by_fraction(system.mixture) || inert(system, system.mixture, amounts) > 0.0 {
        return false;
    }
    system.mixed.iter().all(|mixed| alike(first, mixed, amounts))
}

/// Whether one of several mixtures keeps its composition whatever the extent: it follows fractions,
/// nothing in it is inert, and it reacts on one side in exact proportion (or there is none yet).
pub(super) fn in_proportion_throughout(
    system: &System,
    state: &State,
    amounts: &[f64],
    place: usize,
) -> bool {
    let part = &system.parts[place];
    if !state.by_fraction(part.kind) || inert(system, part.kind, amounts) > 0.0 {
        return false;
    }
    let mut here = system.mixed.iter().filter(|mixed| mixed.part == place);
    let Some(first) = here.next() else { return true };
    here.all(|mixed| alike(first, mixed, amounts))
}

/// Whether two species react on the same side and are there in exact proportion.
#[inline(always)]
fn alike(first: &Mixed, mixed: &Mixed, amounts: &[f64]) -> bool {
    let (amount, other) = (amounts[first.species], amounts[mixed.species]);
    let far = other > FAR * amount || amount > FAR * other;
    mixed.nu * first.nu > 0.0 && !far && in_proportion(amount, first.nu, other, mixed.nu)
}

/// Above the largest ratio of two stoichiometric numbers.
const FAR: f64 = 1e7;

/// Whether a/|ν_a| = b/|ν_b| exactly, for amounts of like size.
fn in_proportion(a: f64, a_nu: f64, b: f64, b_nu: f64) -> bool {
    if a == 0.0 || b == 0.0 {
        return a == b;
    }
    // The exponents leave, so that no product is out of range.
    let ((a_part, a_twos), (b_part, b_twos)) = (split(a), split(b));
    let apart = f64::from_bits(((1023 + i64::from(b_twos - a_twos)) as u64) << 52);
    difference_of_products(a_part, b_nu, b_part * apart, a_nu) == 0.0
}

/// ln K − ln Q where Q is the same at every extent, for y_i = ν_i/Δν.
pub(super) fn constant_affinity(system: &System, state: &State, ln_k: f64) -> f64 {
    if system.parts.len() > 1 {
        return several::constant_affinity(system, state, ln_k);
    }
    if system.mixed.is_empty() {
        return ln_k;
    }
    let mut factors = Factors::with_unit(system, state);
    for mixed in &system.mixed {
        factors.put(mixed.nu.abs(), mixed.nu, mixed.power);
    }
    factors.put(system.delta_nu.abs(), -system.delta_nu, -system.delta_power);
    factors.ln_k_less(ln_k)
}

/// The factors of Q, as whole powers where they are, otherwise as logarithms.
pub(super) struct Factors {
    multiple: f64,
    product: Scaled,
    twos: f64,
    small: f64,
}

impl Factors {
    pub fn new(system: &System) -> Factors {
        Factors { multiple: system.multiple, product: Scaled::ONE, twos: 0.0, small: 0.0 }
    }

    /// With the unit of activity of the one mixture that reacts.
    fn with_unit(system: &System, state: &State) -> Factors {
        let mut factors = Factors::new(system);
        if system.multiple > 0.0 {
            factors.product = state.activity_unit(system.mixture, system.delta_power);
        } else {
            let unit = state.activity_unit(system.mixture, 1);
            factors.small = system.delta_nu * unit.ln_less(0.0);
        }
        factors
    }

    /// Puts in the unit of activity of a mixture.
    pub fn unit(&mut self, state: &State, part: &Part) {
        if self.multiple > 0.0 {
            self.product = self.product.and(state.activity_unit(part.kind, part.delta_power));
        } else {
            self.small += part.delta_nu * state.activity_unit(part.kind, 1).ln_less(0.0);
        }
    }

    pub fn put(&mut self, x: f64, nu: f64, power: i32) {
        if self.multiple > 0.0 {
            self.product = self.product.times(x, power);
        } else {
            let (mantissa, exponent) = split(x);
            self.small += nu * libm::log(mantissa);
            self.twos += nu * f64::from(exponent);
        }
    }

    pub fn ln_k_less(&self, ln_k: f64) -> f64 {
        if self.multiple > 0.0 {
            return -self.product.ln_less(ln_k * self.multiple) / self.multiple;
        }
        let (large, error) = two_product(self.twos, std::f64::consts::LN_2);
        (ln_k - large) - (error + self.twos * LN_2_TAIL + self.small)
    }
}
