//! Rest of one reaction against answers in extended precision.
//!
//! Source: tests/reference/rest.py, an independent solution at 90 digits for the same doubles.
//! Tolerance of ln n: 1e-12, or 8 units in the last place of the input that matters most (its
//! condition stands in the table), whichever is more. Amounts are taken as exact.

use shiftgauge::equilibrium::{Hold, Kind, Rest, State, System, rest};
use std::collections::BTreeMap;

const ANSWERS: &str = include_str!("reference/rest_answers.tsv");
const AT_LEAST: f64 = 1e-12;

struct Row {
    title: String,
    system: System,
    kelvin: f64,
    hold: Hold,
    amounts: Vec<f64>,
    ln_k: f64,
    outcomes: Vec<String>,
    ln_amounts: Vec<Option<f64>>,
    conditions: Vec<f64>,
}

fn numbers(text: &str) -> Vec<f64> {
    text.split(',').map(|number| number.parse().unwrap()).collect()
}

fn read(line: &str) -> Row {
    let fields: Vec<&str> = line.split('\t').collect();
    let [title, kinds, nu, kelvin, hold, amounts, ln_k, outcomes, ln_amounts, conditions] =
        fields[..]
    else {
        panic!("{} fields in: {line}", fields.len())
    };
    let kind = |letter| match letter {
        'g' => Kind::Gas,
        'p' => Kind::Pure,
        'a' => Kind::Ample,
        's' => Kind::Solute,
        'l' => Kind::Liquid,
        _ => panic!("no kind {letter}"),
    };
    let kinds: Vec<Kind> = kinds.chars().map(kind).collect();
    let held = |letter: &str| -> Option<f64> {
        let mut parts = hold.split(';').filter_map(|part| part.split_once('='));
        parts.find(|(name, _)| *name == letter).map(|(_, number)| number.parse().unwrap())
    };
    let hold = match (held("P"), held("V"), held("W")) {
        (Some(pressure_pa), None, None) => Hold::Pressure { pressure_pa },
        (None, Some(volume_m3), None) => Hold::Volume { volume_m3 },
        (None, None, Some(water_kg)) => Hold::Solvent { water_kg },
        (Some(pressure_pa), None, Some(water_kg)) => {
            Hold::PressureAndSolvent { pressure_pa, water_kg }
        }
        (None, Some(volume_m3), Some(water_kg)) => Hold::VolumeAndSolvent { volume_m3, water_kg },
        _ => panic!("no hold {hold}"),
    };
    Row {
        title: title.to_owned(),
        system: System::new(&kinds, &numbers(nu)).unwrap(),
        kelvin: kelvin.parse().unwrap(),
        hold,
        amounts: numbers(amounts),
        ln_k: ln_k.parse().unwrap(),
        outcomes: outcomes.split('|').map(str::to_owned).collect(),
        ln_amounts: ln_amounts.split(',').map(|text| text.parse().ok()).collect(),
        conditions: numbers(conditions),
    }
}

fn solved(row: &Row) -> Rest {
    let state = State { temperature_k: row.kelvin, hold: row.hold, amounts_mol: &row.amounts };
    rest(&row.system, &state, row.ln_k).unwrap()
}

fn outcome_text(end: &Rest) -> String {
    serde_json::to_value(end.summary.outcome).unwrap().as_str().unwrap().to_owned()
}

#[derive(Default)]
struct Errors {
    rows: usize,
    iterations: u32,
    errors: Vec<f64>,
    worst_share: f64,
    worst_residual: f64,
}

#[test]
fn every_amount_at_rest_agrees_with_ninety_digits() {
    let mut classes: BTreeMap<String, Errors> = BTreeMap::new();
    let mut wrong = Vec::new();
    let lines: Vec<&str> = ANSWERS.lines().filter(|line| !line.starts_with('#')).collect();
    for (place, line) in lines.iter().enumerate() {
        let row = read(line);
        let end = solved(&row);
        let class = classes.entry(row.title.clone()).or_default();
        class.rows += 1;
        class.iterations = class.iterations.max(end.summary.iterations);
        class.worst_residual = class.worst_residual.max(end.summary.residual);
        let outcome = outcome_text(&end);
        if !row.outcomes.contains(&outcome) {
            wrong.push(format!(
                "row {}: {outcome} instead of {:?}: {line}",
                place + 2,
                row.outcomes
            ));
            continue;
        }
        // Where rounding decides between two outcomes, so does it about what is left of a trace.
        if row.outcomes.len() > 1 {
            continue;
        }
        for (species, expected) in row.ln_amounts.iter().enumerate() {
            let found = end.ln_amounts[species];
            let (Some(found), Some(expected)) = (found, *expected) else {
                if found != *expected {
                    wrong.push(format!(
                        "row {}, species {species}: {found:?} instead of {expected:?}: {line}",
                        place + 2
                    ));
                }
                continue;
            };
            let error = (found - expected).abs();
            let allowed = AT_LEAST.max(8.0 * f64::EPSILON * row.conditions[species]);
            class.errors.push(error);
            class.worst_share = class.worst_share.max(error / allowed);
            let amount = end.amounts_mol[species];
            let consistent =
                amount == 0.0 || amount < 1e-300 || (amount.ln() - found).abs() < 1e-12;
            if error > allowed || !consistent {
                wrong.push(format!(
                    "row {}, species {species}: ln n = {found:.17} instead of {expected:.17}, \
                     off by {error:.1e}, allowed {allowed:.1e}: {line}",
                    place + 2
                ));
            }
        }
    }
    println!("class, rows, |d ln n| median and worst, worst/allowed, residual, steps");
    for (title, class) in &mut classes {
        class.errors.sort_by(f64::total_cmp);
        let median = class.errors.get(class.errors.len() / 2).copied().unwrap_or(0.0);
        let worst = class.errors.last().copied().unwrap_or(0.0);
        println!(
            "{title:28} {:4} {median:9.1e} {worst:9.1e} {:7.3} {:9.1e} {:4}",
            class.rows, class.worst_share, class.worst_residual, class.iterations
        );
    }
    let rows: usize = classes.values().map(|class| class.rows).sum();
    assert_eq!(rows, lines.len(), "rows were skipped");
    assert!(rows >= 500, "only {rows} rows");
    assert!(wrong.is_empty(), "{} of {rows} rows:\n{}", wrong.len(), wrong.join("\n"));
}

#[test]
fn the_answers_hold_every_outcome() {
    let outcomes = [
        "rest",
        "phase exhausted",
        "ran to its limit",
        "any extent is at rest",
        "nothing can move",
        "has no limit",
    ];
    for outcome in outcomes {
        let count = ANSWERS.lines().filter(|line| line.split('\t').nth(7) == Some(outcome)).count();
        assert!(count >= 4, "{outcome}: {count} rows");
    }
}
