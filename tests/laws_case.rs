//! Whatever stands in a case, the answer is a report of finite numbers or problems with places.

use std::fs;

use serde_json::Value as Json;
use shiftgauge::case::{self, Value};

/// xorshift64: the same cases in every run.
struct Chance(u64);

impl Chance {
    fn next(&mut self) -> u64 {
        self.0 ^= self.0 << 13;
        self.0 ^= self.0 >> 7;
        self.0 ^= self.0 << 17;
        self.0
    }

    fn below(&mut self, end: usize) -> usize {
        usize::try_from(self.next() % end as u64).unwrap()
    }

    fn one_of<'a, T>(&mut self, things: &'a [T]) -> &'a T {
        &things[self.below(things.len())]
    }
}

const EQUATIONS: [&str; 14] = [
    "CO + H2O = CO2 + H2",
    "2 CO = C + CO2",
    "CaCO3 = CaO + CO2",
    "Ca(OH)2 = CaO + H2O(g)",
    "H2 + S = H2S",
    "N2 + 3 H2 = 2 NH3",
    "SO2 + ½ O2 = SO3",
    "2 NO2 = N2O4",
    "CO2 = CO2",
    "CH4 = C(s, graphite) + 2 H2",
    "4 HCl + O2 = 2 Cl2 + 2 H2O",
    "H2O(l) = H2O(g)",
    "8 S(s) = S8(g)",
    "FeO + CO = Fe + CO2",
];

const TEXTS: [&str; 44] = [
    "",
    " ",
    "0 %",
    "1e-300",
    "1e300 mol",
    "-1 %",
    "100 %",
    "50 %",
    "3 ppm",
    "< 5 ppm",
    "0.5",
    "remainder",
    "missing",
    "present",
    "absent",
    "1 bar",
    "2 bar(g)",
    "-0.9 bar(g)",
    "0 bar",
    "1e9 Pa",
    "300 K",
    "215 °C",
    "0 K",
    "19000 K",
    "1 K",
    "12 ± 3 %",
    "5 ± 2 % rel",
    "1,234 %",
    "1 mol",
    "0 mol",
    "2 kmol/h",
    "3 kg",
    "1e-320 mol",
    "7 mg/Nm3",
    "0.6",
    "10 m3",
    "1e-12 L",
    "-40 °C",
    "64 °C",
    "NaN",
    "inf %",
    "𝟐 %",
    "1 wt %",
    "± 2",
];

/// Puts something else in place of one leaf of the case.
fn disturb(case: &mut Json, chance: &mut Chance) {
    match case {
        Json::Object(fields) if !fields.is_empty() => {
            let names: Vec<String> = fields.keys().cloned().collect();
            let name = chance.one_of(&names).clone();
            if chance.below(40) == 0 {
                fields.remove(&name);
            } else if name == "equation" || name == "for" {
                fields[&name] = Json::from(*chance.one_of(&EQUATIONS));
            } else {
                disturb(&mut fields[&name], chance);
            }
        }
        Json::Array(items) if !items.is_empty() => {
            let place = chance.below(items.len());
            match chance.below(30) {
                0 => drop(items.remove(place)),
                1 => items.push(items[place].clone()),
                _ => disturb(&mut items[place], chance),
            }
        }
        leaf => {
            *leaf = match chance.below(60) {
                0 => Json::Null,
                1 => Json::from(17),
                2 => serde_json::json!({ "entries": [{ "species": "C", "value": "present" }] }),
                3 => Json::from(*chance.one_of(&["wet", "dry", "volume", "pressure", "Kp", "pK"])),
                _ => Json::from(*chance.one_of(&TEXTS)),
            };
        }
    }
}

/// Numbers that are not finite, as the debug form of an answer shows them; JSON would show null.
const NOT_FINITE: [&str; 12] = [
    ": NaN", "(NaN", "[NaN", ", NaN", ": inf", "(inf", "[inf", ", inf,", ", inf]", ": -inf",
    "(-inf", ", -inf",
];

#[test]
fn no_case_panics_or_gives_a_number_that_is_not_finite() {
    let folder = concat!(env!("CARGO_MANIFEST_DIR"), "/tests/mistakes/base.json");
    let base: Json = serde_json::from_str(&fs::read_to_string(folder).unwrap()).unwrap();
    let mut chance = Chance(0x5157_F7C4_6E01_2D9B);
    let (mut answered, mut refused) = (0, 0);
    for _ in 0..20_000 {
        let mut case = base.clone();
        for _ in 0..=chance.below(3) {
            disturb(&mut case, &mut chance);
        }
        let value: Value = serde_json::from_value(case.clone()).unwrap();
        match case::check(&value) {
            case::Answer::Given(checked) => {
                answered += 1;
                let shown = format!("{:?}", checked.report);
                let found = NOT_FINITE.iter().find(|piece| shown.contains(**piece));
                assert_eq!(found, None, "in the answer to\n{case}");
            }
            case::Answer::Refused(refusal) => {
                refused += 1;
                assert!(!refusal.problems.is_empty(), "{case}");
                for problem in &refusal.problems {
                    let said = format!("{}{}", problem.message, problem.hint);
                    assert!(!said.contains('{'), "{problem:?}");
                }
            }
        }
    }
    assert!(answered > 1_000 && refused > 1_000, "{answered} answered, {refused} refused");
}
