//! The run from a case to its report: each room is asked once, in the order of the rooms.

use super::asker::missing_conversion;
use super::blocks::ion;
use super::constant_of::{constant_of, constant_of_reading, k_temperature, take_from_book};
use super::judgement::{Judgement, judgement};
use super::missing::{Missing, find_missing};
use super::participants::{Participant, named_in, participants};
use super::question::{KSource, LiquidReading, Question};
use super::report::Report;
use super::setting::{Setting, setting};
use super::value::Value;
use super::{answer, read};
use crate::advice::{Approach, Judged, NoApproach, approach};
use crate::constant::{Constant, ConstantAt};
use crate::equilibrium::{
    Activities, Affinity, Quotient, Rest, RestOutcome, State, Summary, System, activities,
    affinity, quotient, rest,
};
use crate::library::Temperature;
use crate::mixture::{Entry, Ion};
use crate::problem::{CaseCode, Outcome, Problem, Remark};
use crate::reaction::{Equation, Phase};

/// All that was found out about a case, in the rooms' own types; the report is written from it.
pub(super) struct Findings {
    pub question: Question,
    /// The equation with its phases.
    pub equation: Equation,
    /// The species of the reaction, then the inerts of the reading.
    pub participants: Vec<Participant>,
    /// Where the K of the state at rest is taken: the reading's temperature, less a set approach.
    pub k_temperature: Temperature,
    /// K at the reading's temperature.
    pub at: ConstantAt,
    pub delta_nu_gas: f64,
    pub constant: Constant,
    pub reading: Option<ReadingFindings>,
    /// The entry that was found from K.
    pub missing: Option<Missing>,
    pub remarks: Vec<Remark>,
}

/// What stays as it is while the numbers of a case are moved.
pub(super) struct Ground<'a> {
    pub equation: &'a Equation,
    /// The species of the reaction.
    pub reacting: &'a [Participant],
    pub constant: &'a Constant,
    pub at: &'a ConstantAt,
    pub delta_nu_gas: f64,
    pub system: &'a System,
    pub setting: &'a Setting,
    /// What became of the mixture as read.
    pub rest: &'a Summary,
}

impl Ground<'_> {
    /// ΔH° where it is known, else zero.
    pub fn enthalpy_j_per_mol(&self) -> f64 {
        self.at.enthalpy_j_per_mol.unwrap_or(0.0)
    }
}

/// What a reading adds.
pub(super) struct ReadingFindings {
    pub setting: Setting,
    pub system: System,
    /// Amounts in mol as the engine sees them; an ample phase has a nominal one.
    pub amounts_mol: Vec<f64>,
    pub quotient: Quotient,
    /// The activities as read.
    pub activities: Option<Activities>,
    pub affinity: Affinity,
    pub rest: Rest,
    pub approach: Result<Approach, NoApproach>,
    pub judgement: Judgement,
}

impl ReadingFindings {
    /// Whether the reaction comes to rest anywhere.
    pub fn has_rest(&self) -> bool {
        self.rest.summary.outcome != RestOutcome::HasNoLimit
    }

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

/// All that is found out about a question.
pub(super) fn find(mut question: Question) -> Outcome<Findings> {
    let reading = named_in(&question);
    let from_library = matches!(question.reaction.source, KSource::Library { .. });
    let mut found = participants(
        &question.reaction.equation,
        &reading,
        &question.book.library,
        from_library,
        Temperature::new(question.temperature.value_si).ok(),
    )
    .map_err(|problems| at_field(problems, EQUATION))?;
    if matches!(question.reaction.source, KSource::Book) {
        found.remarks.push(take_from_book(&mut question, &found.equation, &found.list)?);
    }
    let delta_nu_gas = delta_nu_gas(&found.list);
    let equation = found.equation;
    let constant = constant_of(&question, &equation, &found.list, delta_nu_gas)?;
    let k_temperature = k_temperature(&question)?;
    let temperature = Temperature::new(question.temperature.value_si)
        .map_err(|problems| at_field(problems, "temperature"))?;
    gather_liquids(&mut question, &found.list)?;
    let ln_k = constant.as_ref().map(|constant| constant.ln_k(temperature));
    let missing = find_missing(&mut question, &found.list, ln_k)?;
    let has_reading = question.has_reading();
    if question.feed.is_some() && !has_reading {
        return Err(Problem::new(CaseCode::FeedWithoutReading).at("feed").into());
    }
    let laid = if has_reading { Some(lay(&question, &found.list)?) } else { None };
    let constant = match constant {
        Some(constant) => constant,
        None => constant_of_reading(&question, laid.as_ref().map(|laid| laid.quotient))?,
    };
    let mut findings = Findings {
        at: constant.at(temperature),
        question,
        equation,
        participants: found.list,
        constant,
        k_temperature,
        delta_nu_gas,
        reading: None,
        missing,
        remarks: found.remarks,
    };
    if let Some(laid) = laid {
        let reading = judge_reading(&findings, laid)?;
        if matches!(findings.question.reaction.source, KSource::Reading(_)) {
            findings.at.u_ln_k = reading.judgement.ln_q.as_ref().map(|budget| budget.u);
        }
        findings.remarks.extend(reading.setting.remarks.iter().cloned());
        findings.participants.clone_from(&reading.setting.participants);
        findings.reading = Some(reading);
    }
    Ok(findings)
}

/// Where several liquids react they are one mixture, also when the reading has one line of it.
fn gather_liquids(question: &mut Question, reacting: &[Participant]) -> Outcome<()> {
    let liquids = reacting.iter().filter(|one| one.phase == Phase::Liquid).count();
    if liquids < 2 || question.liquid.is_some() || question.solution.is_some() {
        return Ok(());
    }
    if !question.has_reading() {
        return Ok(());
    }
    let is_liquid = |entry: &Entry| entry.species.phase == Some(Phase::Liquid);
    let entries: Vec<Entry> =
        question.pure.iter().filter(|entry| is_liquid(entry)).cloned().collect();
    if entries.is_empty() {
        return Err(Problem::new(CaseCode::LiquidsNeedReading).at("reading.liquid").into());
    }
    question.pure.retain(|entry| !is_liquid(entry));
    question.liquid = Some(LiquidReading { entries, closed_by: None });
    Ok(())
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

/// Puts what the engine says of a state at the field of the case that it comes from.
fn at_state(problems: Vec<Problem>) -> Vec<Problem> {
    let fields = [("temperature_k", "temperature"), ("pressure_pa", "pressure")];
    let place = |problem: Problem| match fields.iter().find(|(name, _)| problem.field == *name) {
        Some((_, field)) => Problem { field: (*field).to_owned(), ..problem },
        None => problem.at(EQUATION),
    };
    problems.into_iter().map(place).collect()
}

/// A reading laid on the reaction, before K is asked for.
pub(super) struct Laid {
    pub setting: Setting,
    pub system: System,
    pub amounts_mol: Vec<f64>,
    pub quotient: Quotient,
}

pub(super) fn lay(question: &Question, reacting: &[Participant]) -> Outcome<Laid> {
    let setting = setting(question, reacting.to_vec())?;
    let kinds = setting.kinds();
    let nu: Vec<f64> = setting.participants.iter().map(|participant| participant.nu).collect();
    let amounts_mol = setting.amounts_mol();
    let at_equation = |found| at_field(found, EQUATION);
    let ions: Vec<Ion> = setting.participants.iter().map(|one| ion(&one.species)).collect();
    let system = System::new(&kinds, &nu)
        .and_then(|system| system.with_solution(question.solution_model, &ions))
        .map_err(at_equation)?;
    let temperature_k = question.temperature.value_si;
    let state = State { temperature_k, hold: setting.hold, amounts_mol: &amounts_mol };
    let quotient = quotient(&system, &state).map_err(at_state)?;
    Ok(Laid { setting, system, amounts_mol, quotient })
}

fn judge_reading(found: &Findings, laid: Laid) -> Outcome<ReadingFindings> {
    let Findings { question, constant, .. } = found;
    let Laid { setting, system, amounts_mol, quotient } = laid;
    let ln_k = found.at.ln_k;
    let rest_ln_k = constant.ln_k(found.k_temperature);
    let temperature_k = question.temperature.value_si;
    let at_constant = |found| at_field(found, "reactions[0].constant");
    let state = State { temperature_k, hold: setting.hold, amounts_mol: &amounts_mol };
    let affinity = affinity(&system, &state, ln_k).map_err(at_constant)?;
    let rest = rest(&system, &state, rest_ln_k).map_err(at_constant)?;
    let activities = activities(&system, &state).ok();
    let ln_q = answer::ln_q(quotient);
    let approach = approach(constant, ln_q, temperature_k);
    let now = Judged {
        affinity,
        ln_q,
        approach_k: approach.ok().map(|approach| approach.approach_k),
        missing_conversion: missing_conversion(&rest.summary),
        temperature_k,
    };
    let ground = Ground {
        equation: &found.equation,
        reacting: &found.participants,
        constant,
        at: &found.at,
        delta_nu_gas: found.delta_nu_gas,
        system: &system,
        setting: &setting,
        rest: &rest.summary,
    };
    let judgement = judgement(question, &ground, now, found.missing.is_some());
    Ok(ReadingFindings {
        setting,
        system,
        quotient,
        activities,
        affinity,
        rest,
        approach,
        judgement,
        amounts_mol,
    })
}
