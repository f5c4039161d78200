//! The one entry that is not read but found from K and the others.

use super::participants::Participant;
use super::question::{KSource, Question};
use super::run::{Laid, ReadingFindings, lay};
use crate::equilibrium::{State, affinity};
use crate::mixture::{Entry, Stated};
use crate::numeric::{RootOutcome, root_between};
use crate::problem::{CaseCode, Outcome, Problem};

/// The entry found from K.
#[derive(Debug, Clone)]
pub(super) struct Missing {
    /// Its name.
    pub species: String,
    /// Its value: a fraction of the gas as analysed, or an amount like those of its block.
    pub value: f64,
    /// How many other values would do as well; this is the smallest.
    pub others: usize,
    /// ∂(A/RT)/∂ ln value.
    pub slope: f64,
}

impl Missing {
    /// The standard uncertainty of the logarithm of the value: the affinity is zero at the value
    /// found, so u(ln value) = u(A/RT)/|∂A/∂ ln value|.
    pub fn u_ln_value(&self, reading: &ReadingFindings) -> f64 {
        let u = reading.judgement.affinity.as_ref().map_or(0.0, |budget| budget.u);
        if self.slope == 0.0 { 0.0 } else { u / self.slope.abs() }
    }
}

/// The entry that is missing, where there is one.
fn entry(question: &mut Question) -> Option<&mut Entry> {
    let gas = question.gas.iter_mut().flat_map(|gas| &mut gas.entries);
    let liquid = question.liquid.iter_mut().flat_map(|liquid| &mut liquid.entries);
    let solution = question.solution.iter_mut().flat_map(|solution| &mut solution.entries);
    gas.chain(liquid).chain(solution).find(|entry| matches!(entry.stated, Stated::Missing { .. }))
}

/// The smallest value looked for, as a share of the largest: 1e-30.
const LN_SMALLEST: f64 = -69.0;
/// Values tried, evenly in ln; the affinity has one turning point at the most (that of a reactant
/// whose fraction goes beyond ν/Δν).
const SAMPLES: u32 = 140;

/// Finds the missing entry and puts it into the case; none where nothing is missing.
///
/// # Errors
/// A missing species that takes no part in the reaction, or K taken from the same reading; no value
/// that brings the reading to equilibrium.
pub(super) fn find_missing(
    question: &mut Question,
    reacting: &[Participant],
    ln_k: Option<f64>,
) -> Outcome<Option<Missing>> {
    let Some(found) = entry(question) else { return Ok(None) };
    let (species, field) = (found.species.clone(), found.field.clone());
    let takes_part = reacting.iter().any(|one| one.species.same_substance(&species));
    let begin = |code| Problem::new(code).with("species", species.formula.text()).at(&field);
    if !takes_part {
        return Err(begin(CaseCode::MissingTakesNoPart).into());
    }
    let Some(ln_k) = ln_k.filter(|_| !matches!(question.reaction.source, KSource::Reading(_)))
    else {
        return Err(begin(CaseCode::MissingWithoutK).into());
    };
    // The other entries must stand by themselves before one is sought.
    let laid = lay(question, reacting)?;
    let largest = if laid.setting.is_by_fraction() {
        1.0
    } else {
        1e6 * laid.amounts_mol.iter().sum::<f64>()
    };
    let mut at = |ln_value: f64| -> Option<f64> {
        let value = libm::exp(ln_value);
        entry(question)?.stated = Stated::Missing { value };
        let laid = lay(question, reacting).ok()?;
        let temperature_k = question.temperature.value_si;
        let Laid { setting, system, amounts_mol, .. } = &laid;
        let state = State { temperature_k, hold: setting.hold, amounts_mol };
        affinity(system, &state, ln_k).ok()?.finite()
    };
    let ln_largest = libm::log(largest);
    let mut roots: Vec<f64> = Vec::new();
    let mut before: Option<(f64, f64)> = None;
    for i in 0..=SAMPLES {
        let ln_value = ln_largest + LN_SMALLEST * (1.0 - f64::from(i) / f64::from(SAMPLES));
        let Some(over_rt) = at(ln_value) else { continue };
        if let Some((ln_before, value_before)) = before {
            if (value_before > 0.0) != (over_rt > 0.0) {
                let function = |x: f64| at(x).unwrap_or(f64::NAN);
                let root = root_between(function, ln_before, ln_value, 1e-13);
                if root.outcome == RootOutcome::Found {
                    roots.push(root.x);
                }
            }
        }
        before = Some((ln_value, over_rt));
    }
    let Some(&ln_value) = roots.first() else {
        return Err(begin(CaseCode::MissingNotFound).into());
    };
    let small = 1e-5;
    let slope = match (at(ln_value + small), at(ln_value - small)) {
        (Some(up), Some(down)) => (up - down) / (2.0 * small),
        _ => 0.0,
    };
    at(ln_value);
    let value = libm::exp(ln_value);
    Ok(Some(Missing { species: species.text(), value, others: roots.len() - 1, slope }))
}
