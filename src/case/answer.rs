//! The report, written from the findings.

use super::constant_of::form_reports;
use super::report::{
    Conversion, Limit, ReactionReport, RecordReport, Report, RestReport, SourceReport,
    SpeciesReport, TermReport, ValleyReport,
};
use super::run::{Findings, ReadingFindings};
use super::{notes, steps};
use crate::advice::{self, Direction, Energy, Stretch, Verdict};
use crate::constant::Constant;
use crate::equilibrium::{Affinity, Kind, Quotient};
use crate::mixture::{AmountBasis, Held};
use crate::quantity::{GAS_CONSTANT_J_PER_MOL_K, STANDARD_PRESSURE_PA};
use crate::reaction::Phase;

/// Writes the report.
pub(super) fn report(found: &Findings) -> Report {
    let reading = found.reading.as_ref();
    let temperature_k = found.question.temperature.value_si;
    let pressure_pa =
        reading.map_or(found.question.pressure_pa, |reading| reading.setting.pressure_pa);
    Report {
        temperature_k,
        pressure_pa,
        volume_m3: reading.and_then(|reading| reading.setting.volume_m3),
        ionic_strength_mol_per_kg: None,
        reactions: vec![reaction(found, pressure_pa)],
        basis_mol: reading.map_or(0.0, |reading| reading.setting.gas_mol),
        basis: reading.map_or("none", |reading| basis_name(reading.setting.basis)),
        species: reading.map_or_else(Vec::new, |reading| species(found, reading)),
        rest: reading.map(|reading| rest(found, reading)),
        conversions: reading.map_or_else(Vec::new, |reading| conversions(found, reading)),
        valley: reading.and_then(|reading| valley(found, reading)),
        steps: steps::steps(found),
        notes: notes::notes(found),
    }
}

pub(super) fn basis_name(basis: AmountBasis) -> &'static str {
    match basis {
        AmountBasis::OneMole => "one mole of wet gas",
        AmountBasis::Amounts => "the amounts given",
        AmountBasis::Flows => "the flow of one second",
    }
}

fn reaction(found: &Findings, pressure_pa: Option<f64>) -> ReactionReport {
    let reading = found.reading.as_ref();
    let at = &found.at;
    let temperature_k = found.question.temperature.value_si;
    let rt = GAS_CONSTANT_J_PER_MOL_K * temperature_k;
    let affinity = reading.and_then(|reading| match reading.affinity {
        Affinity::Finite(over_rt) => Some(over_rt),
        _ => None,
    });
    let approach = reading.and_then(|reading| reading.approach.ok());
    let rest = reading.map(|reading| &reading.rest.summary);
    let (verdict, leaning) = reading.map_or((None, None), |reading| words(reading.verdict));
    ReactionReport {
        equation: found.equation.text(),
        terms: TermReport::list(&found.participants),
        delta_nu_gas: found.delta_nu_gas,
        ln_k: at.ln_k,
        log10_k: at.ln_k / std::f64::consts::LN_10,
        u_ln_k: at.u_ln_k,
        forms: form_reports(at.ln_k, found.delta_nu_gas, found.k_temperature.kelvin(), pressure_pa),
        gibbs_standard_j_per_mol: at.gibbs_j_per_mol,
        enthalpy_standard_j_per_mol: at.enthalpy_j_per_mol,
        entropy_standard_j_per_mol_k: at.entropy_j_per_mol_k,
        heat_capacity_j_per_mol_k: at.heat_capacity_j_per_mol_k,
        q: reading.map_or("undetermined", |reading| quotient_word(reading.quotient)),
        ln_q: reading.and_then(|reading| ln_q(reading.quotient)),
        u_ln_q: None,
        affinity_over_rt: affinity,
        u_affinity_over_rt: None,
        gibbs_j_per_mol: affinity.map(|over_rt| -over_rt * rt),
        u_gibbs_j_per_mol: None,
        verdict,
        leaning,
        why: notes::why(found),
        t_star_k: approach.map(|approach| approach.t_star_k),
        approach_k: approach.map(|approach| approach.approach_k),
        u_approach_k: None,
        shortfall_k: approach.map(|approach| approach.shortfall_k),
        approach_note: reading.and_then(notes::approach_note),
        extent_mol: rest.map(|rest| rest.extent_mol),
        extent_min_mol: rest.and_then(|rest| rest.extent_min_mol),
        extent_max_mol: rest.and_then(|rest| rest.extent_max_mol),
        budget: Vec::new(),
        source: source(found),
    }
}

/// The participants with a stoichiometric number.
pub(super) fn reacting(
    found: &Findings,
) -> impl Iterator<Item = &super::participants::Participant> {
    found.participants.iter().filter(|participant| participant.nu != 0.0)
}

pub(super) fn ln_q(quotient: Quotient) -> Option<f64> {
    match quotient {
        Quotient::Finite(ln_q) => Some(ln_q),
        _ => None,
    }
}

pub(super) fn quotient_word(quotient: Quotient) -> &'static str {
    match quotient {
        Quotient::Finite(_) => "finite",
        Quotient::Zero => "zero",
        Quotient::Infinite => "infinite",
        Quotient::Undetermined => "undetermined",
    }
}

fn words(verdict: Verdict) -> (Option<&'static str>, Option<&'static str>) {
    match verdict {
        Verdict::Moves(direction) => (Some(direction.word()), Some(direction.word())),
        Verdict::AtRest => (Some("at rest"), None),
        Verdict::Spent(direction) => (Some("at rest"), Some(Direction::word(direction))),
        Verdict::CannotTell => (Some("cannot tell"), None),
    }
}

fn source(found: &Findings) -> SourceReport {
    let records = found.participants.iter().filter_map(|participant| {
        participant.record.map(|record| RecordReport {
            species: participant.species.text(),
            name: record.names.first().copied().unwrap_or_default().to_owned(),
            sources: record.citations().collect(),
            range_k: record.range_k.into(),
            u_gibbs_j_per_mol: record.u_gibbs_j_per_mol,
        })
    });
    let records: Vec<RecordReport> = records.collect();
    let text = match &found.constant {
        Constant::Library(_) => {
            format!("The library, from the records of {} species", records.len())
        }
        Constant::Stated(_) => "A value that was entered in the case".to_owned(),
    };
    SourceReport {
        text,
        range_k: found.constant.range_k().map(Into::into),
        extrapolated_by_k: found.at.extrapolated_by_k,
        records,
    }
}

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
            Kind::Gas | Kind::Solute => None,
            Kind::Pure | Kind::Ample => None,
        }
    }

    fn ln_activity(&self, i: usize, ln_mol: Option<f64>) -> Option<f64> {
        match self.kinds[i] {
            Kind::Gas if self.gas_mol > 0.0 => {
                Some(ln_mol? - libm::log(self.gas_mol) + self.ln_pressure)
            }
            Kind::Pure | Kind::Ample => Some(0.0),
            Kind::Gas | Kind::Solute => None,
        }
    }
}

fn gas_total(kinds: &[Kind], amounts_mol: &[f64]) -> f64 {
    let gases = kinds.iter().zip(amounts_mol).filter(|(kind, _)| **kind == Kind::Gas);
    gases.map(|(_, amount)| amount).sum()
}

/// The pressure at rest: held, or what the gas then makes in its volume.
fn rest_pressure_pa(found: &Findings, reading: &ReadingFindings) -> Option<f64> {
    use crate::equilibrium::Hold;
    match reading.setting.hold {
        Hold::Pressure { .. } => reading.setting.pressure_pa,
        Hold::Volume { volume_m3 } => {
            let gas_mol = gas_total(reading.system.kinds(), &reading.rest.amounts_mol);
            let rt = GAS_CONSTANT_J_PER_MOL_K * found.question.temperature.value_si;
            (gas_mol > 0.0).then(|| gas_mol * rt / volume_m3)
        }
    }
}

fn species(found: &Findings, reading: &ReadingFindings) -> Vec<SpeciesReport> {
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

fn rest(found: &Findings, reading: &ReadingFindings) -> RestReport {
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

fn conversions(found: &Findings, reading: &ReadingFindings) -> Vec<Conversion> {
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

fn valley(found: &Findings, reading: &ReadingFindings) -> Option<ValleyReport> {
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
