//! Where K comes from, as the case asks for it.

use super::answer::quotient_word;
use super::participants::Participant;
use super::question::{KSource, KindOfK, OwnConstant, Question, StatedFormula, StatedK};
use super::report::{FormReport, KReport};
use super::run::{EQUATION, at_field};
use crate::constant::{
    Constant, ConstantAt, Form, FormValue, FormulaConstant, FormulaTerm, PRESSURE_UNITS, Point,
    StatedConstant, all_forms, line_through,
};
use crate::equilibrium::Quotient;
use crate::library::{Combination, Known, Temperature};
use crate::problem::{CaseCode, NoteCode, Outcome, Problem, Remark};
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;
use crate::reaction::Equation;
use std::f64::consts::LN_10;

/// What a number of K is read beside: the temperature it is taken at unless it has its own, and the
/// pressure that a Kx needs.
#[derive(Debug, Clone, Copy)]
pub(super) struct Beside {
    pub temperature_k: f64,
    pub pressure_pa: Option<f64>,
}

/// The constant of the reaction as written; none where the reading itself is to give it.
///
/// # Errors
/// A number that belongs to another reaction; a Kx without a pressure.
pub(super) fn constant_of(
    question: &Question,
    equation: &Equation,
    participants: &[Participant],
    delta_nu_gas: f64,
) -> Outcome<Option<Constant>> {
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
    let temperature_k = question.temperature.value_si;
    let beside = Beside { temperature_k, pressure_pa: question.pressure_pa() };
    // A number belongs to the other equation, whose Δν is ours over the factor.
    let own_delta_nu = delta_nu_gas / factor;
    Ok(Some(match &question.reaction.source {
        KSource::Library { measured } => {
            let rows = participants.iter().filter_map(|participant| {
                participant.record.clone().map(|record| (record, participant.nu))
            });
            let rows: Vec<(Known, f64)> = rows.collect();
            let combination =
                if *measured { Combination::new(&rows) } else { Combination::of_species(&rows) };
            Constant::Library(combination.map_err(|found| at_field(found, EQUATION))?)
        }
        KSource::Points(stated) => {
            let points: Outcome<Vec<Point>> = stated
                .iter()
                .map(|one| {
                    let one = stated_constant(one, beside, own_delta_nu)?.times(factor);
                    Ok(Point {
                        temperature_k: one.at_k.unwrap_or(temperature_k),
                        ln_k: one.ln_k,
                        u_ln_k: one.u_ln_k,
                    })
                })
                .collect();
            let line = line_through(&points?);
            let line = line.map_err(|found| at_field(found, "reactions[0].constant.points"))?;
            Constant::Points(line)
        }
        KSource::Value(stated) => {
            Constant::Stated(stated_constant(stated, beside, own_delta_nu)?.times(factor))
        }
        KSource::Formula(stated) => {
            Constant::Formula(formula_constant(stated, own_delta_nu, factor))
        }
        // A book's constant has been put in its place before this.
        KSource::Reading(_) | KSource::Book => return Ok(None),
    }))
}

/// Puts the constant that the user's book keeps for this reaction, a multiple or the reverse of it, in
/// the place of the mention of the book, and says so.
///
/// # Errors
/// The book keeps none.
pub(super) fn take_from_book(
    question: &mut Question,
    equation: &Equation,
    participants: &[Participant],
) -> Outcome<Remark> {
    let is_this = |kept: &&OwnConstant| {
        equation.multiple_of(&with_phases(&kept.equation, participants)).is_some()
    };
    let Some(kept) = question.book.constants.iter().find(is_this) else {
        let problem = Problem::new(CaseCode::NotInBook).with("equation", equation.text());
        return Err(problem.at(FROM).into());
    };
    question.reaction.source = kept.constant.clone();
    question.reaction.constant_for = Some(kept.equation.clone());
    Ok(Remark::new(NoteCode::KFromBook).with("source", kept.source.as_str()))
}

/// The formula as one of ln K for the reaction as written and p° = 1 bar.
fn formula_constant(stated: &StatedFormula, own_delta_nu: f64, factor: f64) -> FormulaConstant {
    let per_unit = if stated.is_log10 { LN_10 } else { 1.0 };
    let scale = |(coefficient, term): &(f64, FormulaTerm)| (coefficient * per_unit * factor, *term);
    let mut terms: Vec<(f64, FormulaTerm)> = stated.terms.iter().map(scale).collect();
    // Kp over K does not depend on the temperature, so any will do.
    let unit = kp(stated.pressure_unit).ln_factor(own_delta_nu, 1.0);
    if unit != 0.0 {
        terms.push((-unit * factor, FormulaTerm::One));
    }
    let u_ln_k = stated.tolerance.map(|tolerance| 0.5 * tolerance * per_unit * factor.abs());
    FormulaConstant { terms, range_k: stated.range_k, u_ln_k }
}

fn kp(symbol: Option<&'static str>) -> Form {
    let unit = PRESSURE_UNITS.into_iter().find(|unit| Some(unit.symbol) == symbol);
    unit.map_or(Form::K, Form::Kp)
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

/// A stated number as ln K of the equation that it belongs to; a logarithm with a pressure unit is
/// that of a Kp.
///
/// # Errors
/// `pressure-needed` for a Kx beside no pressure.
pub(super) fn stated_constant(
    stated: &StatedK,
    beside: Beside,
    delta_nu_gas: f64,
) -> Outcome<StatedConstant> {
    // A number without a temperature of its own belongs to that of the case.
    let temperature_k = stated.at.as_ref().map_or(beside.temperature_k, |at| at.value_si);
    let value = stated.value.value_si;
    let u = stated.value.standard_uncertainty_si;
    let form = match stated.kind {
        KindOfK::Kc => Form::Kc,
        KindOfK::Kx => match beside.pressure_pa {
            Some(pressure_pa) => Form::Kx { pressure_pa },
            None => return Err(Problem::new(CaseCode::PressureNeeded).at("pressure").into()),
        },
        KindOfK::K | KindOfK::Gibbs => Form::K,
        KindOfK::Kp | KindOfK::Log10K | KindOfK::LnK | KindOfK::PK => kp(stated.pressure_unit),
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
        at_k: Some(temperature_k),
        enthalpy_j_per_mol: stated.enthalpy.as_ref().map(|enthalpy| enthalpy.value_si),
        u_enthalpy_j_per_mol: stated.enthalpy.and_then(|enthalpy| enthalpy.standard_uncertainty_si),
        heat_capacity_j_per_mol_k: stated.heat_capacity.as_ref().map(|heat| heat.value_si),
    })
}

/// K of a reading that is taken to be at equilibrium: K = Q.
///
/// # Errors
/// No reading, or one whose Q is not finite.
pub(super) fn constant_of_reading(
    question: &Question,
    quotient: Option<Quotient>,
) -> Outcome<Constant> {
    let KSource::Reading(enthalpy) = &question.reaction.source else {
        return Err(Problem::new(CaseCode::KFromNoReading).at(FROM).into());
    };
    let ln_k = match quotient {
        Some(Quotient::Finite(ln_q)) => ln_q,
        Some(open) => {
            let problem = Problem::new(CaseCode::KFromOpenReading);
            return Err(problem.with("found", quotient_word(open)).at(FROM).into());
        }
        None => return Err(Problem::new(CaseCode::KFromNoReading).at(FROM).into()),
    };
    Ok(Constant::Stated(StatedConstant {
        ln_k,
        u_ln_k: None,
        at_k: Some(question.temperature.value_si),
        enthalpy_j_per_mol: enthalpy.map(|enthalpy| enthalpy.value_si),
        u_enthalpy_j_per_mol: enthalpy.and_then(|enthalpy| enthalpy.standard_uncertainty_si),
        heat_capacity_j_per_mol_k: None,
    }))
}

const FROM: &str = "reactions[0].constant.from";

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
