//! Where K comes from, as the case asks for it.

use super::participants::Participant;
use super::question::{KSource, KindOfK, Question, StatedK};
use super::report::{FormReport, KReport};
use super::run::{EQUATION, at_field};
use crate::constant::{
    Constant, ConstantAt, Form, FormValue, PRESSURE_UNITS, Point, StatedConstant, all_forms,
    line_through,
};
use crate::library::{Combination, Record, Temperature};
use crate::problem::{CaseCode, Outcome, Problem};
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;
use crate::reaction::Equation;
use std::f64::consts::LN_10;

/// The constant of the reaction as written.
///
/// # Errors
/// A number that belongs to another reaction; a Kx without a pressure.
pub(super) fn constant_of(
    question: &Question,
    equation: &Equation,
    participants: &[Participant],
    delta_nu_gas: f64,
) -> Outcome<Constant> {
    let factor = match &question.reaction.constant_for {
        None => 1.0,
        Some(other) => match equation.multiple_of(&with_phases(other, participants)) {
            Some(factor) => factor.to_f64(),
            None => {
                let problem = Problem::new(CaseCode::ForIsAnotherReaction);
                return Err(problem.at("reactions[0].constant.for").into());
            }
        },
    };
    match &question.reaction.source {
        KSource::Library => {
            let rows = participants.iter().filter_map(|participant| {
                participant.record.map(|record| (record, participant.nu))
            });
            let rows: Vec<(&Record, f64)> = rows.collect();
            let combination = Combination::new(&rows);
            Ok(Constant::Library(combination.map_err(|found| at_field(found, EQUATION))?))
        }
        KSource::Points(stated) => {
            let points: Outcome<Vec<Point>> = stated
                .iter()
                .map(|one| {
                    let one = stated_constant(question, one, delta_nu_gas / factor)?;
                    Ok(Point {
                        temperature_k: one.at_k.unwrap_or(question.temperature.value_si),
                        ln_k: one.ln_k * factor,
                        u_ln_k: one.u_ln_k.map(|u| u * factor.abs()),
                    })
                })
                .collect();
            let line = line_through(&points?);
            let line = line.map_err(|found| at_field(found, "reactions[0].constant.points"))?;
            Ok(Constant::Points(line))
        }
        KSource::Value(stated) => {
            // The number belongs to the other equation, whose Δν is ours over the factor.
            let stated = stated_constant(question, stated, delta_nu_gas / factor)?;
            Ok(Constant::Stated(StatedConstant {
                ln_k: stated.ln_k * factor,
                u_ln_k: stated.u_ln_k.map(|u| u * factor.abs()),
                at_k: stated.at_k,
                enthalpy_j_per_mol: stated.enthalpy_j_per_mol.map(|h| h * factor),
                u_enthalpy_j_per_mol: stated.u_enthalpy_j_per_mol.map(|u| u * factor.abs()),
                heat_capacity_j_per_mol_k: stated.heat_capacity_j_per_mol_k.map(|c| c * factor),
            }))
        }
    }
}

/// The equation of a stated number, its phases filled in from the reaction's own.
fn with_phases(other: &Equation, participants: &[Participant]) -> Equation {
    other.renamed(|species| {
        let twin = participants.iter().find(|one| one.species.same_substance(species));
        match (species.phase, twin) {
            (None, Some(twin)) => twin.species.clone(),
            _ => species.clone(),
        }
    })
}

fn stated_constant(
    question: &Question,
    stated: &StatedK,
    delta_nu_gas: f64,
) -> Outcome<StatedConstant> {
    let at_k = stated.at.as_ref().map(|at| at.value_si);
    let temperature_k = at_k.unwrap_or(question.temperature.value_si);
    let value = stated.value.value_si;
    let u = stated.value.standard_uncertainty_si;
    let form = match stated.kind {
        KindOfK::Kp => {
            let symbol = stated.pressure_unit.unwrap_or("bar");
            let unit = PRESSURE_UNITS.into_iter().find(|unit| unit.symbol == symbol);
            unit.map_or(Form::K, Form::Kp)
        }
        KindOfK::Kc => Form::Kc,
        KindOfK::Kx => match question.pressure_pa() {
            Some(pressure_pa) => Form::Kx { pressure_pa },
            None => return Err(Problem::new(CaseCode::PressureNeeded).at("pressure").into()),
        },
        _ => Form::K,
    };
    let rt = GAS_CONSTANT_J_PER_MOL_K * temperature_k;
    let (ln, u_ln) = match stated.kind {
        KindOfK::K | KindOfK::Kp | KindOfK::Kc | KindOfK::Kx => {
            (libm::log(value), u.map(|u| u / value))
        }
        KindOfK::Log10K => (value * LN_10, u.map(|u| u * LN_10)),
        KindOfK::PK => (-value * LN_10, u.map(|u| u * LN_10)),
        KindOfK::LnK => (value, u),
        KindOfK::Gibbs => (-value / rt, u.map(|u| u / rt)),
    };
    Ok(StatedConstant {
        ln_k: ln - form.ln_factor(delta_nu_gas, temperature_k),
        u_ln_k: u_ln,
        at_k,
        enthalpy_j_per_mol: stated.enthalpy.as_ref().map(|enthalpy| enthalpy.value_si),
        u_enthalpy_j_per_mol: stated.enthalpy.and_then(|enthalpy| enthalpy.standard_uncertainty_si),
        heat_capacity_j_per_mol_k: stated.heat_capacity.as_ref().map(|heat| heat.value_si),
    })
}

/// The temperature at which K is taken: T* = T − approach.
///
/// # Errors
/// A temperature outside the limits, before or after the approach.
pub(super) fn k_temperature(question: &Question) -> Outcome<Temperature> {
    let temperature_k = question.temperature.value_si;
    let stated = Temperature::new(temperature_k).map_err(|found| at_field(found, "temperature"))?;
    let Some(approach_k) = question.reaction.approach_k else { return Ok(stated) };
    Temperature::new(temperature_k - approach_k).map_err(|_| {
        let found = format!("{:.2}", temperature_k - approach_k);
        let problem = Problem::new(CaseCode::ApproachTooLarge).with("found", found);
        problem.at("reactions[0].constant.approach").into()
    })
}

/// K with all its forms as the border carries it; Kx where a pressure is known.
pub(super) fn k_report(
    at: &ConstantAt,
    delta_nu_gas: f64,
    temperature_k: f64,
    pressure_pa: Option<f64>,
) -> KReport {
    let forms = all_forms(at.ln_k, delta_nu_gas, temperature_k, pressure_pa).into_iter();
    let form = |form: FormValue| FormReport {
        name: form.name,
        unit: form.unit,
        log10: form.log10,
        value: form.value,
    };
    KReport {
        ln_k: at.ln_k,
        log10_k: at.ln_k / LN_10,
        u_ln_k: at.u_ln_k,
        forms: forms.map(form).collect(),
        gibbs_standard_j_per_mol: at.gibbs_j_per_mol,
        enthalpy_standard_j_per_mol: at.enthalpy_j_per_mol,
        entropy_standard_j_per_mol_k: at.entropy_j_per_mol_k,
        heat_capacity_j_per_mol_k: at.heat_capacity_j_per_mol_k,
    }
}
