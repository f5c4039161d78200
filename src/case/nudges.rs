//! The nudges as the report tells them.

use serde::Serialize;

use super::run::{Findings, ReadingFindings};
use super::shown;
use crate::advice::{self, Direction, Knob, Nudge, Plant, Wording};
use crate::problem::words::{self, Language};
use crate::problem::{Remark, TurnCode};

/// One small change of one knob and what it does to rest.
#[derive(Debug, Clone, Serialize)]
pub struct NudgeReport {
    /// `temperature`, `pressure`, `volume`, `add`, `remove`, `inert at constant pressure`,
    /// `inert at constant volume` or `dilution`.
    pub knob: &'static str,
    /// What is added or taken away.
    pub species: Option<String>,
    /// What is done, in words.
    pub name: String,
    /// The step, in the unit; negative where something is taken away.
    pub step: f64,
    /// `K`, `Pa`, `m3`, `mol`, or `1` for water in parts of what there is.
    pub unit: &'static str,
    /// Which way rest moves.
    pub direction: &'static str,
    /// Which way a very small step of the same kind would move it; another way than `direction`
    /// where the step crosses a turning point.
    pub local_direction: &'static str,
    /// The extent at rest after the step, less that before it.
    pub extent_change_mol: Option<f64>,
    /// The same as a share of the whole range of the extent before it.
    pub conversion_change: Option<f64>,
    /// The slope of the extent at rest, in mol per unit.
    pub derivative: Option<f64>,
    /// The amounts at rest after the step.
    pub change: Vec<ChangeReport>,
    /// Why, in one sentence, or two where one is not the whole truth.
    pub why: String,
}

/// A species at rest after a step.
#[derive(Debug, Clone, Serialize)]
pub struct ChangeReport {
    /// The species with its phase.
    pub species: String,
    /// Its amount at rest after the step.
    pub rest_mol: f64,
    /// Less its amount at rest before it.
    pub change_mol: f64,
}

/// All nudges of a reading; none where they cannot be asked for.
pub(super) fn nudges(found: &Findings, reading: &ReadingFindings) -> Vec<NudgeReport> {
    let plant = Plant {
        system: &reading.system,
        state: reading.state(found.question.temperature.value_si, &reading.amounts_mol),
        constant: &found.constant,
        approach_k: found.question.reaction.approach_k.unwrap_or(0.0),
    };
    let names: Vec<String> = found.participants.iter().map(|one| one.species.text()).collect();
    let setting = |knob: Knob, value: f64| match knob {
        Knob::Temperature => shown::temperature(value),
        Knob::Pressure => shown::pressure(value),
        Knob::Volume => format!("{} m³", shown::number(value)),
        Knob::Dilution => format!("{} times the water", shown::significant(value, 4)),
        _ => format!("{} mol", shown::significant(value, 4)),
    };
    let wording = Wording { species: &names, setting: &setting };
    let range = &reading.rest.summary;
    let range = range.extent_max_mol.zip(range.extent_min_mol).map(|(max, min)| max - min);
    let nudges = advice::nudges(plant).unwrap_or_default();
    nudges.iter().map(|nudge| report(nudge, &names, &wording, range)).collect()
}

fn report(
    nudge: &Nudge,
    names: &[String],
    wording: &Wording,
    range_mol: Option<f64>,
) -> NudgeReport {
    let way = |direction: Option<Direction>| direction.map_or("none", Direction::word);
    let say = |reason| words::why(&advice::why(reason, wording), Language::En);
    let mut why = say(&nudge.reason);
    if let Some(aside) = &nudge.aside {
        why = format!("{why} {}", say(aside));
    }
    let rows = names.iter().zip(nudge.rest_mol.iter().zip(&nudge.change_mol));
    let species = nudge.species().and_then(|species| names.get(species)).cloned();
    NudgeReport {
        knob: nudge.name(),
        name: turn(nudge, species.as_deref(), wording),
        species,
        step: nudge.step,
        unit: match nudge.knob {
            Knob::Temperature => "K",
            Knob::Pressure => "Pa",
            Knob::Volume => "m3",
            Knob::Dilution => "1",
            _ => "mol",
        },
        direction: way(nudge.direction),
        local_direction: way(nudge.local),
        extent_change_mol: nudge.extent_change_mol,
        conversion_change: nudge
            .extent_change_mol
            .zip(range_mol.filter(|range| *range > 0.0))
            .map(|(change, range)| change / range),
        derivative: nudge.derivative,
        change: rows
            .map(|(species, (rest_mol, change_mol))| ChangeReport {
                species: species.clone(),
                rest_mol: *rest_mol,
                change_mol: *change_mol,
            })
            .collect(),
        why,
    }
}

/// What is done, in words.
fn turn(nudge: &Nudge, species: Option<&str>, wording: &Wording) -> String {
    let share = || {
        let per_cent = 100.0 * (nudge.step / nudge.value).abs();
        let after = (wording.setting)(nudge.knob, nudge.value + nudge.step);
        format!("{} % to {after}", shown::significant(per_cent, 2))
    };
    let mol = || format!("{} mol", shown::significant(nudge.step.abs(), 3));
    let (code, step) = match nudge.knob {
        Knob::Temperature => (TurnCode::Temperature, format!("{} K", shown::number(nudge.step))),
        Knob::Pressure => (TurnCode::Pressure, share()),
        Knob::Volume => (TurnCode::Volume, share()),
        Knob::Dilution => {
            let per_cent = shown::significant(100.0 * nudge.step, 2);
            (TurnCode::Water, format!("{per_cent} %"))
        }
        Knob::InertAtPressure => (TurnCode::InertAtPressure, mol()),
        Knob::InertAtVolume => (TurnCode::InertAtVolume, mol()),
        Knob::Amount(_) if nudge.step < 0.0 => (TurnCode::Remove, mol()),
        Knob::Amount(_) => (TurnCode::Add, mol()),
    };
    let turn = Remark::new(code).with("step", step).with("species", species.unwrap_or_default());
    words::turn(&turn, Language::En)
}
