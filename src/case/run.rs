//! The run from a case to its report: each room is asked once, in the order of the rooms.

use super::constant_of::{constant_of, k_temperature};
use super::participants::{Participant, named_in, participants};
use super::question::Question;
use super::report::Report;
use super::setting::{Setting, setting};
use super::value::Value;
use super::{answer, read};
use crate::advice::{Approach, NoApproach, Verdict, approach, judge};
use crate::constant::{Constant, ConstantAt};
use crate::equilibrium::{Affinity, Kind, Quotient, Rest, State, System, affinity, quotient, rest};
use crate::library::Temperature;
use crate::mixture::Held;
use crate::problem::{Outcome, Problem, Remark};
use crate::reaction::{Equation, Phase};

/// All that was found out about a case, in the rooms' own types; the report is written from it.
pub(super) struct Findings {
    pub question: Question,
    /// The equation with its phases.
    pub equation: Equation,
    pub participants: Vec<Participant>,
    pub constant: Constant,
    /// Where K was taken: the reading's temperature, less a stated approach.
    pub k_temperature: Temperature,
    pub at: ConstantAt,
    pub delta_nu_gas: f64,
    pub reading: Option<ReadingFindings>,
    pub remarks: Vec<Remark>,
}

/// What a reading adds.
pub(super) struct ReadingFindings {
    pub setting: Setting,
    pub system: System,
    /// Amounts in mol as the engine sees them; an ample phase has a nominal one.
    pub amounts_mol: Vec<f64>,
    pub quotient: Quotient,
    pub affinity: Affinity,
    pub rest: Rest,
    pub verdict: Verdict,
    pub approach: Result<Approach, NoApproach>,
}

impl ReadingFindings {
    /// The state as read, or with other amounts.
    pub fn state<'a>(&self, temperature_k: f64, amounts_mol: &'a [f64]) -> State<'a> {
        State { temperature_k, hold: self.setting.hold, amounts_mol }
    }
}

/// Judges a case: reads it, finds K, Q, ΔG, the verdict and the state at rest.
///
/// # Errors
/// Every problem of the case that can be seen together; see the contract of the case file.
pub fn check(case: &Value) -> Outcome<Report> {
    let question = read::read(case)?;
    Ok(answer::report(&find(question)?))
}

fn find(question: Question) -> Outcome<Findings> {
    let reading = named_in(&question);
    let from_library = matches!(question.reaction.source, super::question::KSource::Library);
    let found = participants(&question.reaction.equation, &reading, from_library);
    let found = found.map_err(|problems| at_field(problems, EQUATION))?;
    let delta_nu_gas = delta_nu_gas(&found.list);
    let equation = found.equation;
    let constant = constant_of(&question, &equation, &found.list, delta_nu_gas)?;
    let k_temperature = k_temperature(&question)?;
    let at = constant.at(k_temperature);
    let mut remarks = found.remarks;
    let no_reading = question.gas.is_none() && question.pure.is_empty();
    let reading = if no_reading {
        None
    } else {
        let mut setting = setting(&question, found.list.clone())?;
        remarks.append(&mut setting.remarks);
        Some(judge_reading(&question, setting, &constant, at.ln_k)?)
    };
    let participants =
        reading.as_ref().map_or(found.list, |reading| reading.setting.participants.clone());
    Ok(Findings {
        question,
        equation,
        participants,
        constant,
        k_temperature,
        at,
        delta_nu_gas,
        reading,
        remarks,
    })
}

/// The field of the equation.
pub(super) const EQUATION: &str = "reactions[0].equation";

/// Puts a field's path on problems that do not know it.
pub(super) fn at_field(problems: Vec<Problem>, field: &str) -> Vec<Problem> {
    problems.into_iter().map(|problem| problem.at(field)).collect()
}

pub(super) fn delta_nu_gas(participants: &[Participant]) -> f64 {
    let gases = participants.iter().filter(|participant| participant.phase == Phase::Gas);
    gases.map(|participant| participant.nu).sum()
}

fn judge_reading(
    question: &Question,
    setting: Setting,
    constant: &Constant,
    ln_k: f64,
) -> Outcome<ReadingFindings> {
    let temperature_k = question.temperature.value_si;
    let held = setting.participants.iter().zip(&setting.held);
    let kinds: Vec<Kind> = held.map(|(participant, held)| kind(participant.phase, *held)).collect();
    let nu: Vec<f64> = setting.participants.iter().map(|participant| participant.nu).collect();
    let amounts_mol: Vec<f64> = setting
        .held
        .iter()
        .map(|held| match held {
            Held::Mol(amount) => *amount,
            Held::Ample => 1.0,
        })
        .collect();
    let at_equation = |found| at_field(found, EQUATION);
    let at_constant = |found| at_field(found, "reactions[0].constant");
    let system = System::new(&kinds, &nu).map_err(at_equation)?;
    let state = State { temperature_k, hold: setting.hold, amounts_mol: &amounts_mol };
    let quotient = quotient(&system, &state).map_err(at_equation)?;
    let affinity = affinity(&system, &state, ln_k).map_err(at_constant)?;
    let rest = rest(&system, &state, ln_k).map_err(at_constant)?;
    let verdict = judge(affinity, rest.summary.outcome);
    let ln_q = match quotient {
        Quotient::Finite(ln_q) => Some(ln_q),
        _ => None,
    };
    let approach = approach(constant, ln_q, temperature_k);
    Ok(ReadingFindings {
        setting,
        system,
        quotient,
        affinity,
        rest,
        verdict,
        approach,
        amounts_mol,
    })
}

fn kind(phase: Phase, held: Held) -> Kind {
    match (phase, held) {
        (Phase::Gas, _) => Kind::Gas,
        (Phase::Aqueous, _) => Kind::Solute,
        (_, Held::Ample) => Kind::Ample,
        (_, Held::Mol(_)) => Kind::Pure,
    }
}
