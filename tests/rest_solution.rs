//! Rest with activity coefficients against answers in extended precision.
//!
//! Source: tests/reference/solution.py, an independent solution at 90 digits for the same doubles,
//! with the activity of water integrated numerically. Tolerance of ln n: 1e-12 (the Debye-Hückel
//! parameters come from about thirty roundings, and the effective ln K is closed in to one unit in
//! its last place).

use shiftgauge::equilibrium::{
    Affinity, Hold, Kind, RestOutcome, State, System, activities, affinity, quotient, rest,
};
use shiftgauge::mixture::{Ion, SolutionModel};

const ANSWERS: &str = include_str!("reference/solution_answers.tsv");
const TOLERANCE: f64 = 1e-12;

fn numbers(text: &str) -> Vec<f64> {
    text.split(',').map(|number| number.parse().unwrap()).collect()
}

fn hold(text: &str) -> Hold {
    let held = |letter: &str| -> Option<f64> {
        let mut parts = text.split(';').filter_map(|part| part.split_once('='));
        parts.find(|(name, _)| *name == letter).map(|(_, number)| number.parse().unwrap())
    };
    let water_kg = held("W").unwrap();
    match (held("P"), held("V")) {
        (Some(pressure_pa), _) => Hold::PressureAndSolvent { pressure_pa, water_kg },
        (None, Some(volume_m3)) => Hold::VolumeAndSolvent { volume_m3, water_kg },
        (None, None) => Hold::Solvent { water_kg },
    }
}

#[test]
fn every_amount_at_rest_agrees_with_the_true_affinity() {
    let (mut rows, mut worst, mut steps) = (0, 0.0_f64, 0);
    let mut wrong = Vec::new();
    for line in ANSWERS.lines().filter(|line| !line.starts_with('#')) {
        rows += 1;
        let fields: Vec<&str> = line.split('\t').collect();
        let [_, model, kinds, nu, charges, sizes, kelvin, held, amounts, ln_k, outcome, logs, i] =
            fields[..]
        else {
            panic!("{} fields in: {line}", fields.len())
        };
        let kind = |letter| match letter {
            'g' => Kind::Gas,
            'p' => Kind::Pure,
            'a' => Kind::Ample,
            's' => Kind::Solute,
            'w' => Kind::Solvent,
            _ => panic!("no kind {letter}"),
        };
        let model = match model {
            "ideal" => SolutionModel::Ideal,
            "davies" => SolutionModel::Davies,
            "debye-hueckel" => SolutionModel::DebyeHueckel,
            _ => panic!("no model {model}"),
        };
        let kinds: Vec<Kind> = kinds.chars().map(kind).collect();
        let ions = charges.split(',').zip(numbers(sizes));
        let ions = ions.map(|(z, size_pm)| Ion { charge: z.parse().unwrap(), size_pm });
        let system = System::new(&kinds, &numbers(nu)).unwrap();
        let system = system.with_solution(model, &ions.collect::<Vec<Ion>>()).unwrap();
        let amounts = numbers(amounts);
        let temperature_k = kelvin.parse().unwrap();
        let state = State { temperature_k, hold: hold(held), amounts_mol: &amounts };
        let ln_k: f64 = ln_k.parse().unwrap();
        let end = rest(&system, &state, ln_k).unwrap();
        steps = steps.max(end.summary.iterations);
        if end.summary.outcome.as_str() != outcome {
            wrong.push(format!("{} instead of {outcome}: {line}", end.summary.outcome.as_str()));
            continue;
        }
        for (species, expected) in logs.split(',').enumerate() {
            let Ok(expected) = expected.parse::<f64>() else { continue };
            let off = (end.ln_amounts[species].unwrap() - expected).abs();
            worst = worst.max(off);
            if off > TOLERANCE {
                wrong.push(format!("species {species} off by {off:.1e}: {line}"));
            }
        }
        let at_rest = State { amounts_mol: &end.amounts_mol, ..state };
        let strength = activities(&system, &at_rest).unwrap().solution.unwrap();
        let expected: f64 = i.parse().unwrap();
        let off = (strength.ionic_strength_mol_per_kg / expected - 1.0).abs();
        if off > TOLERANCE {
            wrong.push(format!("ionic strength off by {off:.1e}: {line}"));
        }
        let left = affinity(&system, &at_rest, ln_k).unwrap();
        match (end.summary.outcome, left) {
            (RestOutcome::Rest, Affinity::Finite(left)) if left.abs() < 1e-10 => {}
            (RestOutcome::PhaseExhausted, Affinity::Finite(left)) => {
                let told = end.summary.affinity.finite().unwrap();
                assert!((left - told).abs() < 1e-10, "{left} and {told}: {line}");
            }
            other => wrong.push(format!("{other:?} is left: {line}")),
        }
        assert!(quotient(&system, &at_rest).is_ok());
    }
    println!("{rows} rows, ln n off by {worst:.1e} at worst, up to {steps} steps");
    assert!(rows >= 40, "only {rows} rows");
    assert!(wrong.is_empty(), "{} of {rows}:\n{}", wrong.len(), wrong.join("\n"));
}

/// Q put together from the activities of `activities` is that of `quotient`.
#[test]
fn activities_and_quotient_agree() {
    let kinds = [Kind::Gas, Kind::Solvent, Kind::Solute, Kind::Solute, Kind::Gas, Kind::Pure];
    let nu = [-1.0, -1.0, 1.0, 1.0, 0.0, 0.5];
    let ions = [0, 0, 1, -1, 0, 0].map(Ion::new);
    for model in [SolutionModel::Ideal, SolutionModel::Davies, SolutionModel::DebyeHueckel] {
        let system = System::new(&kinds, &nu).unwrap().with_solution(model, &ions).unwrap();
        for hold in [
            Hold::PressureAndSolvent { pressure_pa: 3e5, water_kg: 2.0 },
            Hold::VolumeAndSolvent { volume_m3: 0.3, water_kg: 0.7 },
        ] {
            let amounts = [0.4, 9.0, 0.13, 0.21, 2.0, 1.0];
            let state = State { temperature_k: 310.0, hold, amounts_mol: &amounts };
            let found = activities(&system, &state).unwrap();
            let each = found.ln_activities.iter().zip(nu);
            let ln_q: f64 = each.map(|(ln_a, nu)| nu * ln_a.unwrap()).sum();
            let expected = affinity(&system, &state, 0.0).unwrap().finite().unwrap();
            assert!(
                (ln_q + expected).abs() < 1e-14,
                "{ln_q} and {expected} by {model:?}, {hold:?}"
            );
        }
    }
}
