//! Notes beside the report, and the sentence of the verdict.

use super::blocks::Block;
use super::constant_remarks::constant_remarks;
use super::inputs::without_tolerance;
use super::missing::Missing;
use super::participants::Participant;
use super::report::NoteReport;
use super::run::{Findings, ReadingFindings};
use super::setting::Basis;
use super::shown;
use crate::advice::NoApproach;
use crate::equilibrium::activities;
use crate::library;
use crate::mixture::{SolutionModel, water_saturation_pressure_pa};
use crate::problem::words::{Language, input, note};
use crate::problem::{NoteCode, Remark};
use crate::quantity::{PressureReference, STANDARD_PRESSURE_PA};
use crate::reaction::Phase;

/// Above this pressure the ideal gas is marked: a few per cent in activities of common gases.
/// Common practice, no source.
const IDEAL_GAS_MARK_PA: f64 = 10e5;

/// All notes: what was assumed and converted, what weakens the result, and the caution.
pub(super) fn notes(found: &Findings) -> Vec<NoteReport> {
    let mut remarks = equation_remarks(found);
    remarks.extend(found.remarks.iter().cloned());
    remarks.extend(pressure_remarks(found));
    remarks.extend(constant_remarks(found));
    if found.reading.is_none() {
        remarks.push(Remark::new(NoteCode::NoReading));
    }
    if let (Some(missing), Some(reading)) = (&found.missing, &found.reading) {
        remarks.extend(missing_remarks(missing, reading));
    }
    if let Some(reading) = &found.reading {
        remarks.extend(liquid_remarks(found, reading));
        remarks.extend(tolerance_remarks(found, reading));
    }
    remarks.extend(hazards(found));
    remarks.push(Remark::new(NoteCode::Equilibrium));
    let say = |remark: &Remark| {
        let (level, text) = note(remark, Language::En);
        NoteReport { level: level.as_str(), code: remark.code.as_str(), text }
    };
    remarks.iter().map(say).collect()
}

fn missing_remarks(missing: &Missing, reading: &ReadingFindings) -> Vec<Remark> {
    let u_ln = missing.u_ln_value(reading);
    let value = if reading.setting.is_by_fraction() {
        format!("{} %", shown::significant(missing.value * 100.0, 5))
    } else {
        format!("{} mol", shown::significant(missing.value, 5))
    };
    let species = missing.species.as_str();
    let found = Remark::new(NoteCode::MissingFound).with("species", species).with("value", value);
    let mut remarks = vec![found.with("u_per_cent", shown::significant(u_ln * 100.0, 2))];
    if missing.others > 0 {
        let several = Remark::new(NoteCode::MissingSeveral).with("species", species);
        remarks.push(several.with("others", missing.others.to_string()));
    }
    remarks
}

/// An ideal solution is marked from this ionic strength on: coefficients are then below 0.9.
/// From the limiting law of Debye and Hückel, log10 γ = −0.509 √I.
const IDEAL_SOLUTION_MARK_MOL_PER_KG: f64 = 0.01;
/// Charges that differ by more than this share of their mean are said. Common practice, no source.
const CHARGES_AGREE: f64 = 0.05;

fn has_gas(found: &Findings) -> bool {
    found.participants.iter().any(|one| one.phase == Phase::Gas)
}

/// Above this pressure the activity of solids and liquids is marked: V ΔP/RT is 0.01 to 0.05 there.
/// Common practice, no source.
const PRESSED_MARK_PA: f64 = 20e5;

/// What a high pressure does to condensed phases, and water beyond saturation, now and at rest.
fn condensed_remarks(found: &Findings) -> Vec<Remark> {
    let mut remarks = Vec::new();
    let Some(reading) = &found.reading else { return remarks };
    let reacts = |one: &Participant| one.nu != 0.0 && one.phase != Phase::Gas;
    let pressed = reading.setting.pressure_pa.filter(|pressure_pa| *pressure_pa > PRESSED_MARK_PA);
    if let Some(pressure_pa) = pressed.filter(|_| found.participants.iter().any(reacts)) {
        let remark = Remark::new(NoteCode::PressedPhases);
        remarks.push(remark.with("pressure", shown::pressure(pressure_pa)));
    }
    let water = |one: &Participant| one.phase == Phase::Gas && one.species.formula.text() == "H2O";
    let Some(place) = found.participants.iter().position(water) else { return remarks };
    let saturation = water_saturation_pressure_pa(found.question.temperature.value_si);
    let Some(saturation_pa) = saturation else { return remarks };
    let rest = reading.has_rest().then_some(&reading.rest.amounts_mol);
    let times = [("Now", Some(&reading.amounts_mol)), ("At rest", rest)];
    for (when, amounts_mol) in times {
        let ln_activity = amounts_mol.and_then(|amounts_mol| {
            let state = reading.state(found.question.temperature.value_si, amounts_mol);
            activities(&reading.system, &state).ok()?.ln_activities[place]
        });
        let partial_pa = ln_activity.map(|ln| libm::exp(ln) * STANDARD_PRESSURE_PA);
        if let Some(partial_pa) = partial_pa.filter(|partial_pa| *partial_pa > saturation_pa) {
            let remark = Remark::new(NoteCode::WaterCondenses).with("when", when);
            let remark = remark.with("partial", shown::pressure(partial_pa));
            remarks.push(remark.with("saturation", shown::pressure(saturation_pa)));
        }
    }
    remarks
}

/// The species that are known for harm, each once.
fn hazards(found: &Findings) -> Option<Remark> {
    let mut list: Vec<String> = Vec::new();
    for participant in &found.participants {
        let formula = participant.species.formula.text();
        let words: Vec<&str> = library::hazards(formula).collect();
        let line = format!("{formula} ({})", words.join(", "));
        let dissolved_ion = participant.phase == Phase::Aqueous;
        if !words.is_empty() && !dissolved_ion && !list.contains(&line) {
            list.push(line);
        }
    }
    let remark = Remark::new(NoteCode::Hazards).with("list", list.join("; "));
    (!list.is_empty()).then_some(remark)
}

/// What weakens a solution or a liquid mixture.
fn liquid_remarks(found: &Findings, reading: &ReadingFindings) -> Vec<Remark> {
    let mut remarks = Vec::new();
    let blocks = &reading.setting.blocks;
    let digits = |value: f64| shown::significant(value, 3);
    if blocks.contains(&Block::Liquid) {
        remarks.push(Remark::new(NoteCode::IdealLiquid));
    }
    let beside = blocks.iter().any(|block| matches!(block, Block::Liquid | Block::Solution));
    if beside && reading.setting.basis == Basis::OneMoleOfGas {
        remarks.push(Remark::new(NoteCode::NoCommonBasis));
    }
    let solution = reading.activities.as_ref().and_then(|activities| activities.solution);
    let Some(solution) = solution else { return remarks };
    let strength = solution.ionic_strength_mol_per_kg;
    let model = found.question.solution_model;
    if model == SolutionModel::Ideal && strength > IDEAL_SOLUTION_MARK_MOL_PER_KG {
        remarks.push(Remark::new(NoteCode::IdealSolution).with("strength", digits(strength)));
    }
    if let Some(limit) = model.limit_mol_per_kg().filter(|limit| strength > *limit) {
        let remark = Remark::new(NoteCode::BeyondModel).with("strength", digits(strength));
        remarks.push(remark.with("limit", digits(limit)));
    }
    let (positive, negative) =
        (solution.charge_balance.positive_eq_per_kg, solution.charge_balance.negative_eq_per_kg);
    if (positive - negative).abs() > 0.5 * CHARGES_AGREE * (positive + negative) {
        let remark = Remark::new(NoteCode::ChargesUnequal).with("positive", digits(positive));
        remarks.push(remark.with("negative", digits(negative)));
    }
    remarks
}

/// What is worth knowing of the verdict's uncertainty.
fn tolerance_remarks(found: &Findings, reading: &ReadingFindings) -> Vec<Remark> {
    let judgement = &reading.judgement;
    let mut remarks = Vec::new();
    let names = without_tolerance(&found.question);
    if !names.is_empty() {
        let names = names.iter().map(|name| input(name, Language::En)).collect::<Vec<_>>();
        remarks.push(Remark::new(NoteCode::NoTolerance).with("names", names.join(", ")));
    }
    for bound in &judgement.bounds {
        let name = input(&bound.name, Language::En);
        remarks.push(Remark::new(NoteCode::TakenAtBound).with("field", name));
    }
    if let (Ok(approach), Some((low, high))) = (&reading.approach, found.constant.range_k()) {
        let by_k = (low - approach.t_star_k).max(approach.t_star_k - high);
        if by_k > 0.0 {
            let remark = Remark::new(NoteCode::TStarExtrapolated);
            remarks.push(remark.with("by_k", shown::number(by_k)));
        }
    }
    if judgement.band_is_conversion_by_need {
        remarks.push(Remark::new(NoteCode::ConversionBand));
    }
    let bent = [&judgement.affinity, &judgement.approach];
    if bent.into_iter().flatten().any(|budget| !budget.is_linear) {
        remarks.push(Remark::new(NoteCode::NotLinear));
    }
    remarks
}

fn equation_remarks(found: &Findings) -> Vec<Remark> {
    if found.question.reaction.already_balanced {
        return Vec::new();
    }
    vec![Remark::new(NoteCode::Balanced).with("equation", found.equation.text())]
}

fn pressure_remarks(found: &Findings) -> Vec<Remark> {
    let mut remarks = Vec::new();
    let question = &found.question;
    if let (Some(typed), Some(absolute_pa)) = (&question.pressure, question.pressure_pa()) {
        if typed.pressure_reference == PressureReference::Unstated && has_gas(found) {
            remarks.push(Remark::new(NoteCode::PressureTakenAbsolute));
        }
        if typed.pressure_reference == PressureReference::Gauge {
            if question.atmosphere.is_none() {
                remarks.push(Remark::new(NoteCode::StandardAtmosphere));
            }
            remarks.push(
                Remark::new(NoteCode::GaugeToAbsolute)
                    .with("gauge", shown::pressure(typed.value_si))
                    .with("atmosphere", shown::pressure(question.atmosphere_pa()))
                    .with("absolute", shown::pressure(absolute_pa)),
            );
        }
    }
    remarks.extend(condensed_remarks(found));
    let pressure_pa = found.reading.as_ref().and_then(|reading| reading.setting.pressure_pa);
    if let Some(pressure_pa) = pressure_pa.filter(|pressure_pa| *pressure_pa > IDEAL_GAS_MARK_PA) {
        let remark = Remark::new(NoteCode::IdealGas);
        remarks.push(remark.with("pressure", shown::pressure(pressure_pa)));
    }
    remarks
}

/// Why there is no T*, or that it is not the only one.
pub(super) fn approach_note(reading: &ReadingFindings) -> Option<String> {
    match reading.approach {
        Ok(approach) if approach.others == 0 => None,
        Ok(approach) => Some(format!(
            "K equals Q at {} more temperatures in the range; this one is the nearest.",
            approach.others
        )),
        Err(NoApproach::QuotientOpen) => Some("Q is not a finite number, so no temperature makes K equal to it.".to_owned()),
        Err(NoApproach::TemperatureUnknown) => Some(
            "K was stated without an enthalpy of reaction, so its change with temperature is not known.".to_owned(),
        ),
        Err(NoApproach::OutOfReach { from_k, to_k }) => Some(format!(
            "K does not reach Q anywhere between {} and {}.",
            shown::temperature(from_k),
            shown::temperature(to_k)
        )),
    }
}
