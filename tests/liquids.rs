//! Liquid mixtures and solutions through whole cases, each worked out by hand in its comment.

use serde_json::{Value as Json, json};
use shiftgauge::case::{self, Value};

fn ask(case: Json) -> Json {
    let value: Value = serde_json::from_value(case).unwrap();
    serde_json::to_value(case::check(&value)).unwrap()
}

fn report(case: Json) -> Json {
    let answer = ask(case);
    assert_eq!(answer["ok"], true, "{answer}");
    answer["report"].clone()
}

fn number(json: &Json) -> f64 {
    json.as_f64().unwrap_or_else(|| panic!("{json} is no number"))
}

fn near(found: &Json, expected: f64, within: f64, what: &str) {
    let found = number(found);
    assert!((found - expected).abs() <= within, "{what}: {found} is not {expected}");
}

fn rows(entries: &[(&str, &str)]) -> Json {
    entries.iter().map(|(species, value)| json!({ "species": species, "value": value })).collect()
}

fn ester(entries: &[(&str, &str)]) -> Json {
    json!({
        "format": "shiftgauge 1",
        "reactions": [{
            "equation": "CH3COOH(l) + C2H5OH(l) = CH3COOC2H5(l) + H2O(l)",
            "constant": { "from": "value", "kind": "K", "value": "4" }
        }],
        "temperature": "350 K",
        "reading": { "liquid": { "entries": rows(entries) } }
    })
}

fn species<'r>(report: &'r Json, name: &str) -> &'r Json {
    let rows = report["species"].as_array().unwrap();
    rows.iter().find(|row| row["species"] == name).unwrap_or_else(|| panic!("no {name}"))
}

#[test]
fn an_ester_comes_to_rest_in_one_liquid() {
    // One mole of each: (2/3)²/(1/3)² = 4. No pressure is asked for.
    let found = report(ester(&[("CH3COOH", "1 mol"), ("C2H5OH", "1 mol")]));
    near(&found["reactions"][0]["extent_mol"], 2.0 / 3.0, 1e-12, "ξ");
    near(&species(&found, "H2O(l)")["rest_fraction"], 1.0 / 3.0, 1e-12, "water");
    // A third liquid takes no part; Δν = 0, so that it changes nothing.
    let found = report(ester(&[("CH3COOH", "1 mol"), ("C2H5OH", "1 mol"), ("C6H6", "3 mol")]));
    near(&found["reactions"][0]["extent_mol"], 2.0 / 3.0, 1e-12, "ξ beside benzene");
}

#[test]
fn a_liquid_is_read_by_amount_and_by_mass() {
    // 60.052 g of acid and 46.068 g of alcohol are a mole of each: 56.588 wt % and 43.412 wt %.
    let by_mass = report(ester(&[("CH3COOH", "56.588 wt %"), ("C2H5OH", "43.412 wt %")]));
    near(&species(&by_mass, "CH3COOH(l)")["now_fraction"], 0.5, 1e-5, "acid");
    let by_amount = report(ester(&[("CH3COOH", "50 mol %"), ("C2H5OH", "remainder")]));
    near(&species(&by_amount, "CH3COOH(l)")["rest_fraction"], 1.0 / 6.0, 1e-12, "acid at rest");
    assert_eq!(by_amount["basis"], "one mole of liquid");
    let refused = ask(ester(&[("CH3COOH", "50 %"), ("C2H5OH", "remainder")]));
    assert_eq!(refused["problems"][0]["code"], "fraction-of-what", "{refused}");
}

fn gypsum(model: &str) -> Json {
    json!({
        "format": "shiftgauge 1",
        "reactions": [{
            "equation": "CaSO4·2H2O(s) = Ca^2+ + SO4^2- + 2 H2O(l)",
            "constant": { "from": "value", "kind": "log10 K", "value": "-4.58" }
        }],
        "temperature": "25 °C",
        "reading": {
            "solution": { "water": "1 kg", "entries": rows(&[
                ("Ca^2+", "15 mmol/kg"), ("SO4^2-", "15 mmol/kg")
            ]) },
            "solids": { "entries": rows(&[("CaSO4·2H2O", "present")]) }
        },
        "models": { "solution": model }
    })
}

#[test]
fn a_saturation_index_is_the_logarithm_of_q_over_k() {
    // Ideal: log10(0.015²) = −3.6478; water has ln a = −0.018015 × 0.030, which takes 2 × 0.000235
    // off: SI = −3.6478 − 0.0005 + 4.58 = 0.9317.
    let found = report(gypsum("ideal"));
    near(&found["saturation"][0]["saturation_index"], 0.9317, 1e-4, "ideal");
    // Davies: I = 0.06, √I = 0.24495, √I/(1 + √I) − 0.3 I = 0.17876; log10 γ = −0.5091 × 4 × 0.17876
    // = −0.3640 for both ions (A from the dielectric constant of water, within 0.001 of 0.5091).
    let found = report(gypsum("Davies"));
    near(&found["saturation"][0]["saturation_index"], 0.9317 - 0.7280, 2e-3, "Davies");
    near(&found["ionic_strength_mol_per_kg"], 0.06, 1e-12, "I");
    let calcium = species(&found, "Ca^2+(aq)");
    near(&calcium["activity_coefficient"], 10f64.powf(-0.3640), 1e-3, "γ");
    // At rest the index is zero: what settles brings γ² m² to K.
    let at_rest = number(&calcium["rest_ln_activity"]);
    let sulfate = number(&species(&found, "SO4^2-(aq)")["rest_ln_activity"]);
    let water = number(&species(&found, "H2O(l)")["rest_ln_activity"]);
    let log10_q = (at_rest + sulfate + 2.0 * water) / std::f64::consts::LN_10;
    assert!((log10_q + 4.58).abs() < 1e-9, "{log10_q}");
    assert_eq!(found["reactions"][0]["verdict"], "reverse");
}

#[test]
fn a_ph_tells_an_activity() {
    let case = |model: &str| {
        json!({
            "format": "shiftgauge 1",
            "reactions": [{
                "equation": "CH3COOH(aq) = CH3COO^- + H^+",
                "constant": { "from": "value", "kind": "pK", "value": "4.756" }
            }],
            "temperature": "25 °C",
            "reading": { "solution": { "entries": rows(&[
                ("CH3COOH", "0.05 mol/kg"), ("CH3COO^-", "0.05 mol/kg"), ("H^+", "pH 4.756"),
                ("Na^+", "0.05 mol/kg")
            ]) } },
            "models": { "solution": model }
        })
    };
    // Ideal: a(H+) is K, so a buffer of equal parts is at rest.
    let found = report(case("ideal"));
    near(&found["reactions"][0]["affinity_over_rt"], 0.0, 1e-9, "ideal");
    // Davies: the pH is an activity already, so only the acetate's γ is left:
    // log10 γ = −0.5091 (0.22361/1.22361 − 0.015) = −0.0854 at I = 0.05.
    let found = report(case("Davies"));
    let affinity = number(&found["reactions"][0]["affinity_over_rt"]);
    assert!((affinity - 0.0854 * std::f64::consts::LN_10).abs() < 1e-3, "{affinity}");
    let hydrogen = species(&found, "H^+(aq)");
    near(&hydrogen["now_ln_activity"], -4.756 * std::f64::consts::LN_10, 1e-9, "pH");
}

#[test]
fn concentrations_go_through_the_density_of_water() {
    // 1 mol/L at 25 °C is 1/0.99705 mol/kg.
    let found = report(json!({
        "format": "shiftgauge 1",
        "reactions": [{ "equation": "NH3(aq) + H2O(l) = NH4^+ + OH^-", "constant": { "from": "library" } }],
        "temperature": "25 °C",
        "reading": { "solution": { "volume": "2 m3", "entries": rows(&[("NH3", "0.1 mol/L")]) } }
    }));
    near(&species(&found, "NH3(aq)")["now_mol_per_kg"], 0.1 / 0.99705, 1e-5, "NH3");
    near(&species(&found, "NH3(aq)")["now_mol"], 200.0, 1e-9, "amount in 2 m³");
    // pKb = 14.00 − 9.245 = 4.75: x²/(0.1003 − x) = 1.77e-5, so x = 1.32e-3 mol/kg.
    near(&species(&found, "OH^-(aq)")["rest_mol_per_kg"], 1.32e-3, 3e-5, "OH-");
}

#[test]
fn a_missing_solute_is_found() {
    let mut case = gypsum("ideal");
    case["reading"]["solution"]["entries"][1]["value"] = json!("missing");
    let found = report(case);
    // m = 10^−4.58/0.015/a_w², a_w = 1 − 0.0003.
    near(&found["missing"]["value"], 10f64.powf(-4.58) / 0.015, 2e-6, "sulfate");
}

#[test]
fn a_gas_stands_over_its_solution() {
    // CO2(g) = CO2(aq), K = 0.0339 mol/kg/bar: 2 bar over 1 kg of water holds 0.0678 mol.
    let found = report(json!({
        "format": "shiftgauge 1",
        "reactions": [{
            "equation": "CO2(g) = CO2(aq)", "constant": { "from": "value", "kind": "K", "value": "0.0339" }
        }],
        "temperature": "25 °C",
        "pressure": "2 bar",
        "reading": {
            "gas": { "basis": "wet", "entries": rows(&[("CO2", "10 mol")]) },
            "solution": { "water": "1 kg", "entries": rows(&[("CO2", "0 mol/kg")]) }
        }
    }));
    // Ideal solution: ln a_w does not enter; m = K p/p° exactly.
    near(&species(&found, "CO2(aq)")["rest_mol"], 0.0678, 1e-12, "dissolved");
}
