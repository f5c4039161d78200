//! The amounts of the report: each species now and at rest, conversions, and the valley.

use super::blocks::Block;
use super::participants::Participant;
use super::report_amounts::{
    BalanceReport, ChargeReport, Conversion, ElementReport, Limit, RestReport, RestoredReport,
    SaturationReport, SpeciesReport, ValleyReport,
};
use super::run::{Findings, ReadingFindings};
use super::setting::Setting;
use crate::advice::{self, Energy, Stretch};
use crate::equilibrium::{Activities, Hold, Kind, activities};
use crate::mixture::Held;
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;
use crate::reaction::Phase;

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
    let extent_mol = reading.rest.summary.extent_mol;
    let temperature_k = found.question.temperature.value_si;
    let at = |amounts_mol: &[f64]| {
        let state = reading.state(temperature_k, amounts_mol);
        activities(&reading.system, &state).ok()
    };
    let (now, then) = (reading.activities.as_ref(), at(&reading.rest.amounts_mol));
    let ln_activity = |activities: Option<&Activities>, i: usize| activities?.ln_activities[i];
    let water_kg = reading.setting.hold.water_kg();
    let pressure_pa = reading.setting.pressure_pa;
    found
        .participants
        .iter()
        .enumerate()
        .map(|(i, participant)| {
            let (now_mol, rest_mol) = (reading.amounts_mol[i], reading.rest.amounts_mol[i]);
            let known = reading.setting.held[i] != Held::Ample;
            let ends = known && reading.has_rest();
            let now_fraction = fraction(kinds, &reading.amounts_mol, i);
            let rest_ln_mol = reading.rest.ln_amounts[i];
            let molality =
                |amount: f64| Some(amount / water_kg.filter(|_| kinds[i] == Kind::Solute)?);
            // A trace below any double has no amount, but a logarithm.
            let trace = rest_ln_mol.filter(|_| rest_mol == 0.0).and_then(|ln_mol| {
                let more = libm::log(1e-290);
                let mut amounts = reading.rest.amounts_mol.clone();
                amounts[i] = 1e-290;
                Some(at(&amounts)?.ln_activities[i]? - more + ln_mol)
            });
            SpeciesReport {
                species: participant.species.text(),
                phase: participant.phase.symbol(),
                nu: participant.nu,
                now_mol: known.then_some(now_mol),
                rest_mol: ends.then_some(rest_mol),
                rest_ln_mol: rest_ln_mol.filter(|_| ends),
                change_mol: reading.has_rest().then_some(participant.nu * extent_mol),
                now_fraction,
                rest_fraction: fraction(kinds, &reading.rest.amounts_mol, i)
                    .filter(|_| reading.has_rest()),
                now_mol_per_kg: molality(now_mol),
                rest_mol_per_kg: molality(rest_mol).filter(|_| reading.has_rest()),
                now_ln_activity: ln_activity(now, i),
                rest_ln_activity: ln_activity(then.as_ref(), i)
                    .or(trace)
                    .filter(|_| reading.has_rest()),
                activity_coefficient: now.map_or(1.0, |now| libm::exp(now.ln_coefficients[i])),
                partial_pressure_pa: (participant.phase == Phase::Gas)
                    .then(|| Some(now_fraction? * pressure_pa?))
                    .flatten(),
                exhausted: ends && rest_ln_mol.is_none(),
            }
        })
        .collect()
}

/// The amount fraction of a gas or of a component of the liquid.
fn fraction(kinds: &[Kind], amounts_mol: &[f64], i: usize) -> Option<f64> {
    if !matches!(kinds[i], Kind::Gas | Kind::Liquid) {
        return None;
    }
    let same = kinds.iter().zip(amounts_mol).filter(|(kind, _)| **kind == kinds[i]);
    let total: f64 = same.map(|(_, amount)| amount).sum();
    (total > 0.0).then(|| amounts_mol[i] / total)
}

/// The saturation index of a solid that dissolves: log10(Q/K) of its dissolving, for one of it.
pub(super) fn saturation(found: &Findings, reading: &ReadingFindings) -> Vec<SaturationReport> {
    let reacting = || found.participants.iter().zip(&reading.setting.blocks);
    let solids = reacting().filter(|(one, block)| {
        one.nu != 0.0 && one.phase == Phase::Solid && **block == Block::Pure
    });
    let dissolves = reacting()
        .filter(|(one, _)| one.nu != 0.0)
        .all(|(_, block)| matches!(block, Block::Pure | Block::Solution | Block::Solvent))
        && reacting().any(|(one, block)| one.nu != 0.0 && *block == Block::Solution);
    let Some(over_rt) = reading.affinity.finite().filter(|_| dissolves) else { return Vec::new() };
    let solids: Vec<&Participant> = solids.map(|(one, _)| one).collect();
    match solids[..] {
        [solid] => vec![SaturationReport {
            species: solid.species.text(),
            // ν is negative where the solid dissolves as written: A/RT = ln K − ln Q.
            saturation_index: over_rt / solid.nu / std::f64::consts::LN_10,
        }],
        _ => Vec::new(),
    }
}

/// The charges on both sides of a solution.
pub(super) fn charges(reading: &ReadingFindings) -> Option<ChargeReport> {
    let solution = reading.activities.as_ref()?.solution?;
    let balance = solution.charge_balance;
    Some(ChargeReport {
        positive_eq_per_kg: balance.positive_eq_per_kg,
        negative_eq_per_kg: balance.negative_eq_per_kg,
        difference: balance.positive_eq_per_kg - balance.negative_eq_per_kg,
    })
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
            let fed = fed(reading, participant).filter(|fed| *fed > 0.0);
            Conversion {
                species: participant.species.text(),
                feed_to_now: fed.map(|fed| 1.0 - now.unwrap_or(0.0) / fed),
                now_to_rest: now.filter(|_| reading.has_rest()).map(|now| used / now),
                feed_to_rest: fed
                    .filter(|_| reading.has_rest())
                    .map(|fed| 1.0 - (now.unwrap_or(0.0) - used) / fed),
            }
        })
        .collect()
}

/// How much of a species went in, on the basis of the reading.
pub(super) fn fed(reading: &ReadingFindings, participant: &Participant) -> Option<f64> {
    let Setting { feed, balance, gas_mol, .. } = &reading.setting;
    let (feed, balance) = (feed.as_ref()?, balance.as_ref()?);
    if participant.phase != Phase::Gas {
        return None;
    }
    let row = feed.amounts_mol.iter().find(|(name, _)| name.same_substance(&participant.species));
    Some(row.map_or(0.0, |(_, amount)| *amount) * gas_mol / balance.reading_mol)
}

/// What the feed says of the gas behind it.
pub(super) fn balance(reading: &ReadingFindings) -> Option<BalanceReport> {
    let balance = reading.setting.balance.as_ref()?;
    Some(BalanceReport {
        contraction: 1.0 - balance.reading_mol / balance.feed_mol,
        closes_within: balance.closes_within,
        elements: balance
            .elements
            .iter()
            .map(|row| ElementReport {
                element: row.element,
                feed_mol: row.feed_mol,
                reading_mol: row.reading_mol,
            })
            .collect(),
        restored: balance
            .restored
            .iter()
            .map(|(species, fraction)| RestoredReport {
                species: species.text(),
                fraction: *fraction,
            })
            .collect(),
    })
}

pub(super) fn valley(found: &Findings, reading: &ReadingFindings) -> Option<ValleyReport> {
    let rest = &reading.rest.summary;
    // Where only ample phases limit a side, the drawing ends a little beyond what is of interest.
    let beyond = 2.0 * rest.extent_mol.abs() + 0.1 * reading.setting.gas_mol;
    let from_mol = rest.extent_min_mol.unwrap_or(-beyond);
    let to_mol = rest.extent_max_mol.unwrap_or(beyond);
    let state = reading.state(found.question.temperature.value_si, &reading.amounts_mol);
    let stretch = Stretch { from_mol, to_mol, rest_mol: rest.extent_mol };
    let drawn =
        advice::valley(&reading.system, &state, found.constant.ln_k(found.k_temperature), stretch)?;
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
