//! The amounts of the report: each species now and at rest, conversions, and the valley.

use super::report::{Conversion, Limit, RestReport, SpeciesReport, ValleyReport};
use super::run::{Findings, ReadingFindings};
use crate::advice::{self, Energy, Stretch};
use crate::equilibrium::{Hold, Kind};
use crate::mixture::Held;
use crate::quantity::{GAS_CONSTANT_J_PER_MOL_K, STANDARD_PRESSURE_PA};
use crate::reaction::Phase;

/// Amount fraction and ln activity of a species in a list of amounts.
struct Shares<'a> {
    kinds: &'a [Kind],
    gas_mol: f64,
    ln_pressure: f64,
}

impl Shares<'_> {
    fn fraction(&self, i: usize, amount_mol: f64) -> Option<f64> {
        match self.kinds[i] {
            Kind::Gas if self.gas_mol > 0.0 => Some(amount_mol / self.gas_mol),
            Kind::Gas | Kind::Solute | Kind::Liquid => None,
            Kind::Pure | Kind::Ample | Kind::Solvent => None,
        }
    }

    fn ln_activity(&self, i: usize, ln_mol: Option<f64>) -> Option<f64> {
        match self.kinds[i] {
            Kind::Gas if self.gas_mol > 0.0 => {
                Some(ln_mol? - libm::log(self.gas_mol) + self.ln_pressure)
            }
            Kind::Pure | Kind::Ample | Kind::Solvent => Some(0.0),
            Kind::Gas | Kind::Solute | Kind::Liquid => None,
        }
    }
}

fn gas_total(kinds: &[Kind], amounts_mol: &[f64]) -> f64 {
    let gases = kinds.iter().zip(amounts_mol).filter(|(kind, _)| **kind == Kind::Gas);
    gases.map(|(_, amount)| amount).sum()
}

/// The pressure at rest: held, or what the gas then makes in its volume.
fn rest_pressure_pa(found: &Findings, reading: &ReadingFindings) -> Option<f64> {
    match reading.setting.hold {
        Hold::Pressure { .. } | Hold::PressureAndSolvent { .. } | Hold::Solvent { .. } => {
            reading.setting.pressure_pa
        }
        Hold::Volume { volume_m3 } | Hold::VolumeAndSolvent { volume_m3, .. } => {
            let gas_mol = gas_total(reading.system.kinds(), &reading.rest.amounts_mol);
            let rt = GAS_CONSTANT_J_PER_MOL_K * found.question.temperature.value_si;
            (gas_mol > 0.0).then(|| gas_mol * rt / volume_m3)
        }
    }
}

pub(super) fn species(found: &Findings, reading: &ReadingFindings) -> Vec<SpeciesReport> {
    let kinds = reading.system.kinds();
    let shares = |amounts_mol: &[f64], pressure_pa: Option<f64>| Shares {
        kinds,
        gas_mol: gas_total(kinds, amounts_mol),
        ln_pressure: pressure_pa.map_or(0.0, |p| libm::log(p / STANDARD_PRESSURE_PA)),
    };
    let now = shares(&reading.amounts_mol, reading.setting.pressure_pa);
    let then = shares(&reading.rest.amounts_mol, rest_pressure_pa(found, reading));
    found
        .participants
        .iter()
        .enumerate()
        .map(|(i, participant)| {
            let (now_mol, rest_mol) = (reading.amounts_mol[i], reading.rest.amounts_mol[i]);
            let known = reading.setting.held[i] != Held::Ample;
            let now_fraction = now.fraction(i, now_mol);
            let ln_now = (now_mol > 0.0).then(|| libm::log(now_mol));
            let rest_ln_mol = reading.rest.ln_amounts[i];
            let pressure_pa = reading.setting.pressure_pa;
            SpeciesReport {
                species: participant.species.text(),
                phase: participant.phase.symbol(),
                nu: participant.nu,
                now_mol: known.then_some(now_mol),
                rest_mol: known.then_some(rest_mol),
                rest_ln_mol: rest_ln_mol.filter(|_| known),
                change_mol: Some(participant.nu * reading.rest.summary.extent_mol),
                now_fraction,
                rest_fraction: then.fraction(i, rest_mol),
                now_ln_activity: now.ln_activity(i, ln_now),
                rest_ln_activity: then.ln_activity(i, rest_ln_mol),
                activity_coefficient: 1.0,
                partial_pressure_pa: (participant.phase == Phase::Gas)
                    .then(|| Some(now_fraction? * pressure_pa?))
                    .flatten(),
                exhausted: known && rest_ln_mol.is_none(),
            }
        })
        .collect()
}

pub(super) fn rest(found: &Findings, reading: &ReadingFindings) -> RestReport {
    let pressure_pa = rest_pressure_pa(found, reading);
    let gas_mol = gas_total(reading.system.kinds(), &reading.rest.amounts_mol);
    let rt = GAS_CONSTANT_J_PER_MOL_K * found.question.temperature.value_si;
    RestReport {
        temperature_k: found.question.temperature.value_si,
        pressure_pa,
        volume_m3: pressure_pa.filter(|_| gas_mol > 0.0).map(|p| gas_mol * rt / p),
        outcome: reading.rest.summary.outcome.as_str(),
        iterations: reading.rest.summary.iterations,
        residual: reading.rest.summary.residual,
    }
}

pub(super) fn conversions(found: &Findings, reading: &ReadingFindings) -> Vec<Conversion> {
    let rows = found.participants.iter().zip(&reading.setting.held);
    rows.filter(|(participant, held)| participant.nu < 0.0 && **held != Held::Ample)
        .map(|(participant, held)| {
            let now = match held {
                Held::Mol(amount) if *amount > 0.0 => Some(*amount),
                _ => None,
            };
            let used = -participant.nu * reading.rest.summary.extent_mol;
            Conversion {
                species: participant.species.text(),
                feed_to_now: None,
                now_to_rest: now.map(|now| used / now),
                feed_to_rest: None,
            }
        })
        .collect()
}

pub(super) fn valley(found: &Findings, reading: &ReadingFindings) -> Option<ValleyReport> {
    let rest = &reading.rest.summary;
    // Where only ample phases limit a side, the drawing ends a little beyond what is of interest.
    let beyond = 2.0 * rest.extent_mol.abs() + 0.1 * reading.setting.gas_mol;
    let from_mol = rest.extent_min_mol.unwrap_or(-beyond);
    let to_mol = rest.extent_max_mol.unwrap_or(beyond);
    let state = reading.state(found.question.temperature.value_si, &reading.amounts_mol);
    let stretch = Stretch { from_mol, to_mol, rest_mol: rest.extent_mol };
    let drawn = advice::valley(&reading.system, &state, found.at.ln_k, stretch)?;
    let limits = [("min", rest.extent_min_mol, 1.0), ("max", rest.extent_max_mol, -1.0)];
    Some(ValleyReport {
        extent_now_mol: 0.0,
        extent_min_mol: from_mol,
        extent_max_mol: to_mol,
        limits: limits
            .into_iter()
            .filter_map(|(side, extent, sign)| {
                Some(Limit { side, species: used_up_at(reading, extent?, sign) })
            })
            .collect(),
        energy: match drawn.energy {
            Energy::Gibbs => "G",
            Energy::Helmholtz => "A",
        },
        extent_mol: drawn.whole.extent_mol,
        gibbs_over_rt: drawn.whole.energy_over_rt,
        near: drawn.near.map(Into::into),
    })
}

/// The species that are used up at one end of the extent, to rounding.
fn used_up_at(reading: &ReadingFindings, extent_mol: f64, sign: f64) -> Vec<String> {
    let rows = reading.setting.participants.iter().zip(&reading.setting.held);
    rows.filter_map(|(participant, held)| match held {
        Held::Mol(amount) if participant.nu * sign > 0.0 => {
            let left = amount + participant.nu * extent_mol;
            let small = 1e-12 * (amount + participant.nu.abs() * extent_mol.abs());
            (left <= small).then(|| participant.species.text())
        }
        _ => None,
    })
    .collect()
}
