//! The report, written from the findings.

use super::constant_of::k_report;
use super::report::{
    FitPoint, FitReport, MeasuredUse, ReactionReport, RecordReport, Report, SourceReport,
    TermReport,
};
use super::report_amounts::MissingReport;
use super::run::Findings;
use super::setting::Basis;
use super::species::MeasuredReport;
use super::{amounts, notes, nudges, steps, verdict};
use crate::constant::Constant;
use crate::equilibrium::{Affinity, Quotient, RestOutcome};
use crate::library::Combination;
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;

/// Writes the report.
pub(super) fn report(found: &Findings) -> Report {
    let reading = found.reading.as_ref();
    let temperature_k = found.question.temperature.value_si;
    let pressure_pa =
        reading.map_or(found.question.pressure_pa(), |reading| reading.setting.pressure_pa);
    let activities = reading.and_then(|reading| reading.activities.as_ref());
    let dissolved = activities.and_then(|activities| activities.solution);
    Report {
        temperature_k,
        pressure_pa,
        volume_m3: reading.and_then(|reading| reading.setting.volume_m3),
        ionic_strength_mol_per_kg: dissolved.map(|found| found.ionic_strength_mol_per_kg),
        charge_balance: reading.and_then(amounts::charges),
        water_activity: dissolved.map(|found| libm::exp(found.ln_water_activity)),
        saturation: reading.map_or_else(Vec::new, |reading| amounts::saturation(found, reading)),
        reactions: vec![reaction(found, pressure_pa)],
        basis_mol: reading.map_or(0.0, |reading| reading.setting.basis_mol()),
        basis: reading.map_or("none", |reading| basis_name(reading.setting.basis)),
        species: reading.map_or_else(Vec::new, |reading| amounts::species(found, reading)),
        rest: reading.map(|reading| amounts::rest(found, reading)),
        conversions: reading.map_or_else(Vec::new, |reading| amounts::conversions(found, reading)),
        missing: found.missing.as_ref().zip(reading).map(|(missing, reading)| MissingReport {
            species: missing.species.clone(),
            value: missing.value,
            is_fraction: reading.setting.is_by_fraction(),
            u_value: missing.value * missing.u_ln_value(reading),
        }),
        balance: reading.and_then(amounts::balance),
        valley: reading.and_then(|reading| amounts::valley(found, reading)),
        nudges: reading.map_or_else(Vec::new, |reading| nudges::nudges(found, reading)),
        steps: steps::steps(found),
        notes: notes::notes(found),
    }
}

pub(super) fn basis_name(basis: Basis) -> &'static str {
    match basis {
        Basis::OneMoleOfGas => "one mole of wet gas",
        Basis::OneMoleOfLiquid => "one mole of liquid",
        Basis::Amounts => "the amounts given",
        Basis::Flows => "the flow of one second",
        Basis::OneKilogramOfWater => "one kilogram of water",
        Basis::Solution => "the solution given",
    }
}

fn reaction(found: &Findings, pressure_pa: Option<f64>) -> ReactionReport {
    let reading = found.reading.as_ref();
    let temperature_k = found.question.temperature.value_si;
    let rt = GAS_CONSTANT_J_PER_MOL_K * temperature_k;
    let affinity = reading.and_then(|reading| match reading.affinity {
        Affinity::Finite(over_rt) => Some(over_rt),
        _ => None,
    });
    let approach = reading.and_then(|reading| reading.approach.ok());
    let rest = reading.map(|reading| &reading.rest.summary);
    ReactionReport {
        equation: found.equation.text(),
        terms: TermReport::list(&found.participants),
        delta_nu_gas: found.delta_nu_gas,
        constant: k_report(&found.at, found.delta_nu_gas, temperature_k, pressure_pa),
        q: reading.map_or("undetermined", |reading| quotient_word(reading.quotient)),
        ln_q: reading.and_then(|reading| ln_q(reading.quotient)),
        affinity_over_rt: affinity,
        gibbs_j_per_mol: affinity.map(|over_rt| -over_rt * rt),
        judgement: verdict::report(found),
        t_star_k: approach.map(|approach| approach.t_star_k),
        approach_k: approach.map(|approach| approach.approach_k),
        shortfall_k: approach.map(|approach| approach.shortfall_k),
        approach_note: reading.and_then(notes::approach_note),
        extent_mol: rest
            .filter(|rest| rest.outcome != RestOutcome::HasNoLimit)
            .map(|rest| rest.extent_mol),
        extent_min_mol: rest.and_then(|rest| rest.extent_min_mol),
        extent_max_mol: rest.and_then(|rest| rest.extent_max_mol),
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

fn source(found: &Findings) -> SourceReport {
    let combination = match &found.constant {
        Constant::Library(combination) => Some(combination),
        _ => None,
    };
    let records = combination.map_or(&[][..], Combination::records).iter();
    let records = records.map(|(record, nu)| RecordReport {
        species: record.label(),
        name: record.names.first().cloned().unwrap_or_default().into_owned(),
        nu: *nu,
        sources: record.citations().collect(),
        range_k: record.range_k.into(),
        u_gibbs_j_per_mol: record.u_gibbs_j_per_mol,
        u_from: record.u_kind.as_str(),
        own: record.is_own(),
    });
    let records: Vec<RecordReport> = records.collect();
    let measured = combination.map_or(&[][..], Combination::measured).iter();
    let measured: Vec<MeasuredUse> = measured
        .map(|(known, times)| MeasuredUse { times: *times, measured: MeasuredReport::of(known) })
        .collect();
    let text = match &found.constant {
        Constant::Library(_) if measured.is_empty() => {
            format!("The library, from the records of {} species", records.len())
        }
        Constant::Library(_) if records.is_empty() => {
            format!("The library, from equilibria that were measured: {}", measured.len())
        }
        Constant::Library(_) => format!(
            "The library, from equilibria that were measured ({}) and the records of {} species",
            measured.len(),
            records.len()
        ),
        Constant::Stated(_) => "A value that was entered in the case".to_owned(),
        Constant::Formula(formula) => {
            format!("A formula of {} terms that was entered in the case", formula.terms.len())
        }
        Constant::Points(line) => {
            format!(
                "A straight line through {} points that were entered in the case",
                line.points.len()
            )
        }
    };
    SourceReport {
        text,
        range_k: found.constant.range_k().map(Into::into),
        extrapolated_by_k: found.at.extrapolated_by_k,
        records,
        measured,
        fit: match &found.constant {
            Constant::Points(line) => Some(FitReport {
                points: line
                    .points
                    .iter()
                    .map(|point| FitPoint {
                        temperature_k: point.temperature_k,
                        ln_k: point.ln_k,
                        residual: point.ln_k - line.ln_k(point.temperature_k),
                    })
                    .collect(),
                enthalpy_j_per_mol: line.enthalpy_j_per_mol,
                u_enthalpy_j_per_mol: line.u_enthalpy_j_per_mol,
                bends: line.bends,
            }),
            _ => None,
        },
    }
}
