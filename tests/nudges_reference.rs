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
    let held = |name: &str| {
        let of = |one: &str| one.strip_prefix(name)?.strip_prefix('=')?.parse::<f64>().ok();
        fields[5].split(';').find_map(of)
    };
    let hold = match (held("pressure"), held("volume"), held("water")) {
        (Some(pressure_pa), _, None) => Hold::Pressure { pressure_pa },
        (Some(pressure_pa), _, Some(water_kg)) => {
            Hold::PressureAndSolvent { pressure_pa, water_kg }
        }
        (None, Some(volume_m3), None) => Hold::Volume { volume_m3 },
        (None, Some(volume_m3), Some(water_kg)) => Hold::VolumeAndSolvent { volume_m3, water_kg },
        (None, None, water) => Hold::Solvent { water_kg: water.unwrap() },
    };
    let kinds: &'static str = Box::leak(fields[1].to_owned().into_boxed_str());
    let charges = fields[2].split(',').filter(|charge| *charge != "-");
    Row {
        kelvin: fields[4].parse().unwrap(),
        enthalpy: Some(fields[8].parse::<f64>().unwrap() / 1e3),
        charges: charges.map(|charge| charge.parse().unwrap()).collect(),
        ..Row::new(
            kinds,
            &numbers(fields[3]),
            hold,
            &numbers(fields[6]),
            fields[7].parse().unwrap(),
        )
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
    let (mut slopes, mut steps, mut differences) = (Vec::new(), Vec::new(), Vec::new());
    for line in ANSWERS.lines().filter(|line| !line.starts_with('#')) {
        let fields: Vec<&str> = line.split('\t').collect();
        let row = row_of(&fields);
        let number = |place: usize| fields[place].parse::<f64>().unwrap();
        let (knob, step, slope, change) = (knob_of(fields[10]), number(11), number(12), number(14));
        let (found, corrected) = row.with(|plant| {
            let found = nudge(&mut Knobs::new(plant).unwrap(), knob, step);
            (found, plant.system.is_corrected())
        });
        assert_eq!(found.outcome.map(RestOutcome::as_str), Some(fields[13]), "{line}");
        let (ours, moved) = (found.derivative.unwrap(), found.extent_change_mol.unwrap());
        // A slope carries the rounding of the amounts at rest, and where its parts nearly cancel as
        // many digits less; a step is the difference of two such states.
        let wrong = |a: f64, b: f64| ((a - b).abs() / b.abs().max(1e-300), line.to_owned());
        if corrected {
            differences.push(wrong(ours, slope));
        } else {
            slopes.push(wrong(ours, slope));
        }
        steps.push(wrong(moved, change));
        for (ours, exact) in [(ours, slope), (moved, change)] {
            assert!(exact != 0.0 || ours == 0.0, "{line}");
        }
    }
    // Slopes with activity coefficients are differences over 1e-5 of the knob.
    let limits = [
        ("slopes", slopes, 1e-13, 600),
        ("steps", steps, 1e-10, 600),
        ("differences", differences, 1e-7, 40),
    ];
    for (name, mut errors, allowed, least) in limits {
        errors.sort_by(|a, b| a.0.total_cmp(&b.0));
        let (count, worst) = (errors.len(), errors.last().unwrap());
        let (median, most) = (errors[count / 2].0, errors[count * 99 / 100].0);
        println!(
            "{name}: median {median:.1e}, 99 % below {most:.1e}, worst {:.1e} of {count}: {}",
            worst.0, worst.1
        );
        assert!(count > least && worst.0 < allowed, "{name}, {count}: {worst:?}");
    }
}
