//! Derivatives of rest and finite steps against answers to twenty digits that were worked out
//! another way (tests/reference/nudges.py).

use crate::nudges::Row;
use shiftgauge::advice::{Knob, Knobs, nudge};
use shiftgauge::equilibrium::{Hold, RestOutcome};

const ANSWERS: &str = include_str!("reference/nudges_answers.tsv");

fn numbers(text: &str) -> Vec<f64> {
    text.split(',').map(|number| number.parse().unwrap()).collect()
}

fn row_of(fields: &[&str]) -> Row {
    let (held, value) = fields[4].split_once('=').unwrap();
    let value: f64 = value.parse().unwrap();
    let hold = match held {
        "P" => Hold::Pressure { pressure_pa: value },
        _ => Hold::Volume { volume_m3: value },
    };
    let kinds: &'static str = Box::leak(fields[1].to_owned().into_boxed_str());
    let (nu, amounts) = (numbers(fields[2]), numbers(fields[5]));
    Row {
        kelvin: fields[3].parse().unwrap(),
        enthalpy: Some(fields[7].parse::<f64>().unwrap() / 1e3),
        ..Row::new(kinds, &nu, hold, &amounts, fields[6].parse().unwrap())
    }
}

fn knob_of(text: &str) -> Knob {
    match text.split_once(' ') {
        Some(("amount", place)) => Knob::Amount(place.parse().unwrap()),
        Some(("inert", "at pressure")) => Knob::InertAtPressure,
        Some(("inert", "at volume")) => Knob::InertAtVolume,
        _ => match text {
            "temperature" => Knob::Temperature,
            "pressure" => Knob::Pressure,
            "volume" => Knob::Volume,
            _ => Knob::Dilution,
        },
    }
}

#[test]
fn derivatives_and_steps_agree_with_the_reference() {
    let (mut slopes, mut steps) = (Vec::new(), Vec::new());
    for line in ANSWERS.lines().filter(|line| !line.starts_with('#')) {
        let fields: Vec<&str> = line.split('\t').collect();
        let row = row_of(&fields);
        let (knob, step) = (knob_of(fields[9]), fields[10].parse::<f64>().unwrap());
        let (slope, change) =
            (fields[11].parse::<f64>().unwrap(), fields[13].parse::<f64>().unwrap());
        let found = row.with(|plant| nudge(&mut Knobs::new(plant).unwrap(), knob, step));
        assert_eq!(found.outcome.map(RestOutcome::as_str), Some(fields[12]), "{line}");
        let (ours, moved) = (found.derivative.unwrap(), found.extent_change_mol.unwrap());
        // A slope carries the rounding of the amounts at rest, each of them times the condition of
        // the state; where the parts of it nearly cancel, as many digits less. A step is the
        // difference of two such states.
        slopes.push(((ours - slope).abs() / slope.abs().max(1e-300), line.to_owned()));
        steps.push(((moved - change).abs() / change.abs().max(1e-300), line.to_owned()));
        if slope == 0.0 {
            assert_eq!(ours, 0.0, "{line}");
        }
        if change == 0.0 {
            assert_eq!(moved, 0.0, "{line}");
        }
    }
    for (name, mut errors, allowed) in [("slopes", slopes, 1e-13), ("steps", steps, 1e-11)] {
        errors.sort_by(|a, b| a.0.total_cmp(&b.0));
        let (count, worst) = (errors.len(), errors.last().unwrap());
        println!(
            "{name}: median {:.1e}, 99 % below {:.1e}, worst {:.1e} of {count}: {}",
            errors[count / 2].0,
            errors[count * 99 / 100].0,
            worst.0,
            worst.1
        );
        assert!(count > 400 && worst.0 < allowed, "{name}: {worst:?}");
    }
}
