//! What is said of a reading: how it was closed and made wet, and what a cooled sample does not show.

use super::blocks::Blocks;
use super::participants::Participant;
use super::question::Question;
use crate::mixture::{Basis, Closing, GasReading, Water};
use crate::problem::{CaseCode, NoteCode, Problem, Remark};
use crate::reaction::{Phase, Species};

/// Elements that differ by more than this share between the feed and the gas behind it are said.
/// Common practice, no source.
const BALANCE_CLOSES: f64 = 0.03;

pub(super) fn remarks_of(
    question: &Question,
    participants: &[Participant],
    laid: &Blocks,
) -> Vec<Remark> {
    let mut remarks = Vec::new();
    if let Some(solution) = &laid.solution {
        if !solution.is_stated {
            remarks.push(Remark::new(NoteCode::OneKilogramOfWater));
        }
        if solution.by_density {
            remarks.push(Remark::new(NoteCode::ByDensityOfWater));
        }
    }
    let (Some(gas), Some(reading)) = (&laid.gas, &question.gas) else { return remarks };
    let name = |entry: usize| reading.entries[entry].species.formula.text();
    let per_cent = |fraction: f64| format!("{:.3}", fraction * 100.0);
    match &gas.closing {
        Closing::ByRemainder { entry, fraction } => {
            let remark = Remark::new(NoteCode::ClosedByRemainder).with("species", name(*entry));
            remarks.push(remark.with("per_cent", per_cent(*fraction)));
        }
        Closing::ByLargest { entry, difference } => {
            let remark = Remark::new(NoteCode::ClosedByLargest).with("species", name(*entry));
            remarks.push(remark.with("per_cent", per_cent(*difference)));
        }
        Closing::Exact { .. } | Closing::NotNeeded => {}
    }
    match (&reading.basis, gas.added_water_fraction) {
        (Basis::Dry(Water::None), None) => remarks.push(Remark::new(NoteCode::DryTakenAsFree)),
        (_, Some(fraction)) => {
            remarks.push(Remark::new(NoteCode::WaterAdded).with("per_cent", per_cent(fraction)));
        }
        _ => {}
    }
    if let Some(balance) = &gas.balance {
        for (species, fraction) in &balance.restored {
            let remark = Remark::new(NoteCode::FoundFromFeed);
            let remark = remark.with("species", species.formula.text());
            remarks.push(remark.with("per_cent", per_cent(*fraction)));
        }
        if balance.closes_within > BALANCE_CLOSES {
            let remark = Remark::new(NoteCode::FeedDoesNotClose);
            remarks.push(remark.with("per_cent", format!("{:.1}", 100.0 * balance.closes_within)));
        }
    } else {
        for lost in &reading.lost {
            let remark = Remark::new(NoteCode::LostNotRestored);
            remarks.push(remark.with("species", lost.formula.text()));
        }
    }
    remarks.extend(unseen(reading, participants));
    remarks
}

/// Without a feed nothing tells how much of a lost species there was; where it reacts, Q hangs on it.
pub(super) fn lost_for_good(reading: &GasReading, participants: &[Participant]) -> Vec<Problem> {
    let reacts = |lost: &&Species| {
        participants.iter().any(|participant| {
            participant.phase == Phase::Gas && participant.species.same_substance(lost)
        })
    };
    let problem = |lost: &Species| {
        let problem = Problem::new(CaseCode::LostNeedsFeed);
        problem.with("species", lost.formula.text()).at("reading.gas.lost")
    };
    reading.lost.iter().filter(reacts).map(problem).collect()
}

/// Gases of a reaction that a dry analysis cannot show, because they stay behind when the sample is
/// cooled. Common practice, no source.
const STAYS_BEHIND: [&str; 7] = ["SO3", "H2SO4", "S2", "S6", "S8", "HNO3", "NH4Cl"];

fn unseen(reading: &GasReading, participants: &[Participant]) -> Vec<Remark> {
    if matches!(reading.basis, Basis::Wet) {
        return Vec::new();
    }
    let named = |species: &Species| {
        let entries = reading.entries.iter().map(|entry| &entry.species);
        entries.chain(&reading.lost).any(|name| name.same_substance(species))
    };
    participants
        .iter()
        .filter(|one| one.phase == Phase::Gas && !named(&one.species))
        .map(|one| one.species.formula.text())
        .filter(|formula| STAYS_BEHIND.contains(formula))
        .map(|formula| Remark::new(NoteCode::CondensesInSample).with("species", formula))
        .collect()
}
