//! Tolerances carried to the verdict, against 100,000 draws of the inputs (JCGM 101:2008), which
//! `tests/reference/monte_carlo.py` makes by arithmetic of its own.

use serde_json::Value as Json;
use shiftgauge::case::{self, Value};

const CASES: &str = include_str!("reference/monte_carlo_cases.json");
const ANSWERS: &str = include_str!("reference/monte_carlo.tsv");

fn reaction(case: &Json) -> Json {
    let value: Value = serde_json::from_value(case.clone()).unwrap();
    let answer = serde_json::to_value(case::check(&value)).unwrap();
    assert_eq!(answer["ok"], true, "{answer}");
    answer["report"]["reactions"][0].clone()
}

#[test]
fn standard_uncertainties_are_those_of_a_hundred_thousand_draws() {
    let cases: Vec<Json> = serde_json::from_str(CASES).unwrap();
    let mut lines = ANSWERS.lines();
    let names: Vec<&str> = lines.next().unwrap().split('\t').skip(1).collect();
    let mut compared = 0;
    for (case, line) in cases.iter().zip(lines) {
        let mut cells = line.split('\t');
        assert_eq!(case["name"], cells.next().unwrap());
        let found = reaction(&case["case"]);
        assert_eq!(found["linear"], case["linear"], "{}: {found}", case["name"]);
        for (name, cell) in names.iter().zip(cells).filter(|(_, cell)| !cell.is_empty()) {
            let (ours, theirs) = (found[name].as_f64().unwrap(), cell.parse::<f64>().unwrap());
            println!(
                "{:10} {name:22} {ours:.5} {theirs:.5} {:+.4}",
                case["name"],
                ours / theirs - 1.0
            );
            // Where the figures do not change in proportion, the report says so and promises less.
            if case["linear"] == true {
                assert!((ours / theirs - 1.0).abs() < 0.05, "{line}: {name} is {ours}");
                compared += 1;
            }
        }
    }
    assert_eq!(compared, 12);
}
