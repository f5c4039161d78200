//! The page's examples, run natively: each is judged as its story says.

use std::fs;
use std::path::Path;

use serde_json::Value as Json;
use shiftgauge::case::{self, Value};

/// (file, verdict, least and greatest shortfall in K, species that forms on the way to rest)
const EXAMPLES: [(&str, &str, f64, f64, &str); 4] = [
    ("low-temperature-shift.json", "forward", 1.0, 40.0, "H2(g)"),
    ("chlorine-recovery.json", "forward", 1.0, 60.0, "Cl2(g)"),
    ("ammonia-converter.json", "forward", 1.0, 40.0, "NH3(g)"),
    ("lime-kiln.json", "forward", 10.0, 90.0, "CO2(g)"),
];

/// The example of a solution, which is judged by its saturation.
const SOLUTION: &str = "scrubber-sump.json";

fn folder() -> std::path::PathBuf {
    Path::new(env!("CARGO_MANIFEST_DIR")).join("www/examples")
}

fn check(file: &str) -> Json {
    let text = fs::read_to_string(folder().join(file)).unwrap();
    let case: Value = serde_json::from_str(&text).unwrap();
    serde_json::to_value(case::check(&case)).unwrap()
}

#[test]
fn every_example_is_judged_as_its_story_says() {
    for (file, verdict, least_k, greatest_k, forms) in EXAMPLES {
        let answer = check(file);
        assert_eq!(answer["ok"], true, "{file}: {answer}");
        let reaction = &answer["report"]["reactions"][0];
        assert_eq!(reaction["verdict"], verdict, "{file}");
        let shortfall = reaction["shortfall_k"].as_f64().unwrap();
        assert!((least_k..greatest_k).contains(&shortfall), "{file}: {shortfall} K");
        let species = answer["report"]["species"].as_array().unwrap();
        let formed = species.iter().find(|row| row["species"] == forms).unwrap();
        assert!(formed["change_mol"].as_f64().unwrap() > 0.0, "{file}");
    }
}

#[test]
fn the_sump_is_above_saturation_with_gypsum_and_its_charges_agree() {
    let answer = check(SOLUTION);
    assert_eq!(answer["ok"], true, "{answer}");
    let report = &answer["report"];
    assert_eq!(report["reactions"][0]["verdict"], "reverse", "gypsum settles");
    let index = report["saturation"][0]["saturation_index"].as_f64().unwrap();
    assert!((0.2..0.6).contains(&index), "{index}");
    let charges = &report["charge_balance"];
    let [plus, difference] =
        ["positive_eq_per_kg", "difference"].map(|name| charges[name].as_f64().unwrap());
    assert!(difference.abs() < 0.02 * plus, "{charges}");
}

#[test]
fn every_example_is_marked_as_invented_and_none_is_left_out() {
    let mut files: Vec<String> = fs::read_dir(folder())
        .unwrap()
        .map(|entry| entry.unwrap().file_name().to_string_lossy().into_owned())
        .collect();
    files.sort();
    let mut listed: Vec<&str> = EXAMPLES.iter().map(|row| row.0).chain([SOLUTION]).collect();
    listed.sort_unstable();
    assert_eq!(files, listed);
    for file in files {
        let text = fs::read_to_string(folder().join(&file)).unwrap();
        let case: Json = serde_json::from_str(&text).unwrap();
        for field in ["title", "note"] {
            let words = case[field].as_str().unwrap().to_lowercase();
            assert!(words.contains("invented"), "{file}: {field}");
        }
    }
}
