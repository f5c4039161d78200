//! The valley: the energy that falls until the mixture is at rest, drawn against the extent.

use crate::equilibrium::{Affinity, Kind, State, System, affinity, ln_q_correction};
use crate::quantity::{
    GAS_CONSTANT_J_PER_MOL_K, STANDARD_CONCENTRATION_MOL_PER_M3, STANDARD_PRESSURE_PA,
};

/// Which energy is lowest at rest.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum Energy {
    /// At constant temperature and pressure: the Gibbs energy.
    Gibbs,
    /// At constant temperature and volume: the Helmholtz energy.
    Helmholtz,
}

/// Points of the energy above its value at rest, over RT, against the extent.
#[derive(Debug, Clone, PartialEq)]
pub struct Curve {
    /// Extents in mol, rising; zero is now.
    pub extent_mol: Vec<f64>,
    /// The energy over RT, in mol.
    pub energy_over_rt: Vec<f64>,
}

/// The energy along the reaction.
#[derive(Debug, Clone, PartialEq)]
pub struct Valley {
    /// Which energy it is.
    pub energy: Energy,
    /// From one limit of the extent to the other.
    pub whole: Curve,
    /// A closer look at the stretch between now and rest, where that is a small part of the whole.
    pub near: Option<Curve>,
}

/// Where the curve is drawn between, and the two points that matter on it.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Stretch {
    /// The least extent drawn.
    pub from_mol: f64,
    /// The greatest extent drawn.
    pub to_mol: f64,
    /// The extent at rest.
    pub rest_mol: f64,
}

/// Points of the whole curve; the walls are vertical, so a third of them crowd at the ends.
const POINTS: u16 = 120;
/// Points of the closer look; even, for Simpson's rule.
const NEAR_POINTS: u16 = 48;
/// A closer look is worth it when now and rest are nearer than this share of the whole.
const NEAR_SHARE: f64 = 0.12;

/// Draws the valley between two extents; nothing if they are not apart.
///
/// The energy over RT is Σ n_i ln a_i − ξ ln K over what follows fractions (a gas at constant
/// pressure, a liquid mixture) and Σ n_i (ln a_i − 1) − ξ ln K over what follows amounts (a gas at
/// constant volume, solutes); pure phases have ln a = 0. Activity coefficients and the activity of the
/// solvent add ∫ Σ ν_i ln γ_i dξ. Up to a constant the slope is −A/RT. The closer look integrates the affinity instead, so
/// that nothing cancels when now is nearly at rest.
#[must_use]
pub fn valley(system: &System, state: &State, ln_k: f64, stretch: Stretch) -> Option<Valley> {
    let Stretch { from_mol, to_mol, rest_mol } = stretch;
    let width = to_mol - from_mol;
    if !(width > 0.0 && width.is_finite()) {
        return None;
    }
    let energy = match state.hold.volume_m3() {
        Some(_) => Energy::Helmholtz,
        None => Energy::Gibbs,
    };
    let at = |extent: f64| energy_over_rt(system, state, ln_k, extent);
    let place = |i: u16| match i {
        0 => from_mol,
        POINTS => to_mol,
        _ => from_mol + width * crowded(f64::from(i) / f64::from(POINTS)),
    };
    let mut extent_mol: Vec<f64> = (0..=POINTS).map(place).collect();
    for extra in [0.0, rest_mol] {
        if extra > from_mol && extra < to_mol {
            let next = extent_mol.partition_point(|extent| *extent < extra);
            extent_mol.insert(next, extra);
        }
    }
    extent_mol.dedup();
    let mut values: Vec<f64> = extent_mol.iter().map(|extent| at(*extent)).collect();
    let mut lowest = values.iter().copied().fold(at(rest_mol), f64::min);
    if system.is_corrected() {
        add_corrections(system, state, &extent_mol, &mut values)?;
        lowest = values.iter().copied().fold(f64::INFINITY, f64::min);
    }
    let energy_over_rt: Vec<f64> = values.iter().map(|value| value - lowest).collect();
    if !energy_over_rt.iter().all(|value| value.is_finite()) {
        return None;
    }
    let whole = Curve { extent_mol, energy_over_rt };
    let near = near(system, state, ln_k, stretch);
    Some(Valley { energy, whole, near })
}

/// Adds the integral of what activity coefficients add to ln Q, by Simpson's rule from point to
/// point: it is smooth where the energy is not.
fn add_corrections(
    system: &System,
    state: &State,
    extent_mol: &[f64],
    values: &mut [f64],
) -> Option<()> {
    let at = |extent: f64| {
        let amounts = moved(system, state, extent);
        ln_q_correction(system, &State { amounts_mol: &amounts, ..*state }).ok()
    };
    let mut sum = 0.0;
    let mut left = at(*extent_mol.first()?)?;
    for (place, pair) in extent_mol.windows(2).enumerate() {
        let (middle, right) = (at(0.5 * (pair[0] + pair[1]))?, at(pair[1])?);
        sum += (pair[1] - pair[0]) / 6.0 * (left + 4.0 * middle + right);
        values[place + 1] += sum;
        left = right;
    }
    Some(())
}

/// Maps 0..1 on itself so that points crowd at both ends, where the curve is steep.
fn crowded(share: f64) -> f64 {
    let smooth = share * share * (3.0 - 2.0 * share);
    smooth * smooth * (3.0 - 2.0 * smooth)
}

fn moved(system: &System, state: &State, extent_mol: f64) -> Vec<f64> {
    let amounts = state.amounts_mol.iter().zip(system.nu());
    amounts.map(|(amount, nu)| (amount + nu * extent_mol).max(0.0)).collect()
}

fn energy_over_rt(system: &System, state: &State, ln_k: f64, extent_mol: f64) -> f64 {
    let amounts = moved(system, state, extent_mol);
    let mixing: f64 = [Kind::Gas, Kind::Solute, Kind::Liquid]
        .into_iter()
        .map(|mixture| {
            let each = system.kinds().iter().zip(&amounts);
            let here = each.filter(|(kind, amount)| **kind == mixture && **amount > 0.0);
            let here: Vec<f64> = here.map(|(_, amount)| *amount).collect();
            let (ln_unit, minus) = unit(mixture, state, here.iter().sum());
            here.iter().map(|n| n * (libm::log(*n) + ln_unit - minus)).sum::<f64>()
        })
        .sum();
    mixing - extent_mol * ln_k
}

/// ln(a/n) of a species of a mixture, and what its total takes off: 1 where activities go by
/// amounts, 0 where they go by fractions.
fn unit(mixture: Kind, state: &State, total: f64) -> (f64, f64) {
    if total <= 0.0 {
        return (0.0, 0.0);
    }
    match (mixture, state.hold.pressure_pa(), state.hold.volume_m3(), state.hold.water_kg()) {
        (Kind::Liquid, ..) => (-libm::log(total), 0.0),
        (Kind::Solute, _, _, Some(water_kg)) => (-libm::log(water_kg), 1.0),
        (Kind::Solute, _, Some(volume_m3), None) => {
            (-libm::log(volume_m3 * STANDARD_CONCENTRATION_MOL_PER_M3), 1.0)
        }
        (Kind::Gas, Some(pressure_pa), ..) => {
            (libm::log(pressure_pa / STANDARD_PRESSURE_PA / total), 0.0)
        }
        (Kind::Gas, None, Some(volume_m3), _) => {
            let rt = GAS_CONSTANT_J_PER_MOL_K * state.temperature_k;
            (libm::log(rt / (volume_m3 * STANDARD_PRESSURE_PA)), 1.0)
        }
        _ => (0.0, 0.0),
    }
}

/// The closer look: minus the integral of the affinity from rest, by Simpson's rule.
fn near(system: &System, state: &State, ln_k: f64, stretch: Stretch) -> Option<Curve> {
    let Stretch { from_mol, to_mol, rest_mol } = stretch;
    if rest_mol == 0.0 || rest_mol.abs() > NEAR_SHARE * (to_mol - from_mol) {
        return None;
    }
    let reach = 2.2 * rest_mol.abs();
    let (low, high) = ((rest_mol - reach).max(from_mol), (rest_mol + reach).min(to_mol));
    let slope = |extent: f64| {
        let amounts = moved(system, state, extent);
        match affinity(system, &State { amounts_mol: &amounts, ..*state }, ln_k).ok()? {
            Affinity::Finite(over_rt) => Some(-over_rt),
            _ => None,
        }
    };
    let climb = |end: f64| -> Option<Curve> {
        let step = (end - rest_mol) / f64::from(NEAR_POINTS / 2);
        let mut curve = Curve { extent_mol: vec![rest_mol], energy_over_rt: vec![0.0] };
        let (mut sum, mut left) = (0.0, 0.0);
        for i in 1..=NEAR_POINTS / 2 {
            let extent = if i == NEAR_POINTS / 2 { end } else { rest_mol + step * f64::from(i) };
            let middle = slope(rest_mol + step * (f64::from(i) - 0.5))?;
            let Some(right) = slope(extent) else { break };
            sum += step / 6.0 * (left + 4.0 * middle + right);
            left = right;
            curve.extent_mol.push(extent);
            curve.energy_over_rt.push(sum);
        }
        Some(curve)
    };
    let (mut down, up) = (climb(low)?, climb(high)?);
    down.extent_mol.reverse();
    down.energy_over_rt.reverse();
    down.extent_mol.extend_from_slice(&up.extent_mol[1..]);
    down.energy_over_rt.extend_from_slice(&up.energy_over_rt[1..]);
    Some(down)
}
