//! Whole cases, from the typed reading to the answer, against figures worked out by hand.

use serde_json::{Value as Json, json};
use shiftgauge::case::{self, Value};

fn ask(case: Json) -> Json {
    let value: Value = serde_json::from_value(case).unwrap();
    serde_json::to_value(case::check(&value)).unwrap()
}

fn report(case: Json) -> Json {
    let answer = ask(case.clone());
    assert_eq!(answer["ok"], true, "{case}\n{answer}");
    answer["report"].clone()
}

/// A wet gas over one reaction; K is stated, so that each figure can be worked out by hand.
fn gas(equation: &str, k: &str, pressure: &str, entries: &[(&str, &str)]) -> Json {
    let entries: Vec<Json> = entries
        .iter()
        .map(|(species, value)| json!({ "species": species, "value": value }))
        .collect();
    json!({
        "format": "shiftgauge 1",
        "reactions": [{
            "equation": equation, "constant": { "from": "value", "kind": "K", "value": k }
        }],
        "temperature": "500 K",
        "pressure": pressure,
        "reading": { "gas": { "basis": "wet", "entries": entries } }
    })
}

fn number(json: &Json) -> f64 {
    json.as_f64().unwrap_or_else(|| panic!("{json} is no number"))
}

fn near(found: f64, expected: f64, what: &str) {
    let close = (found - expected).abs() <= 1e-9 * expected.abs().max(1e-3);
    assert!(close, "{what}: {found} is not {expected}");
}

fn species<'r>(report: &'r Json, name: &str) -> &'r Json {
    let rows = report["species"].as_array().unwrap();
    rows.iter().find(|row| row["species"] == name).unwrap_or_else(|| panic!("no {name}"))
}

#[test]
fn a_gas_is_judged_by_its_partial_pressures() {
    // N2O4 = 2 NO2 at 2 bar with y = 0.6 and 0.4: Q = (0.4 × 2)²/(0.6 × 2) = 0.533333.
    let case = gas("N2O4 = 2 NO2", "2", "2 bar", &[("N2O4", "60 %"), ("NO2", "40 %")]);
    let found = report(case);
    let reaction = &found["reactions"][0];
    near(number(&reaction["ln_q"]), (0.64f64 / 1.2).ln(), "ln Q");
    assert_eq!(reaction["verdict"], "forward");
    // At rest (n(NO2) = 0.4 + 2ξ, n(N2O4) = 0.6 − ξ, n = 1 + ξ): 2 (0.4 + 2ξ)² = 2 (0.6 − ξ)(1 + ξ),
    // so 5 ξ² + 2 ξ − 0.44 = 0 and ξ = (−2 + √12.8)/10.
    near(number(&reaction["extent_mol"]), (12.8f64.sqrt() - 2.0) / 10.0, "ξ");
}

#[test]
fn holding_the_volume_gives_another_rest_than_holding_the_pressure() {
    // The same gas at constant volume: a = n R T/(V p°) with R T/V = 2 bar for one mole:
    // (0.4 + 2ξ)² 2/(0.6 − ξ) = 2, so 4 ξ² + 2.6 ξ − 0.44 = 0 and ξ = (−2.6 + √13.8)/8.
    let mut case = gas("N2O4 = 2 NO2", "2", "2 bar", &[("N2O4", "60 %"), ("NO2", "40 %")]);
    case["hold"] = json!("volume");
    let found = report(case);
    let extent = (13.8f64.sqrt() - 2.6) / 8.0;
    near(number(&found["reactions"][0]["extent_mol"]), extent, "ξ");
    near(number(&found["rest"]["pressure_pa"]), 2e5 * (1.0 + extent), "pressure at rest");
    assert_eq!(found["valley"]["energy"], "A");
}

#[test]
fn a_dry_analysis_is_made_wet_in_each_way() {
    // 0.25 mol of steam to a mole of dry gas is a fifth of the wet gas. Water at 81.345 °C has a
    // vapour pressure of 0.5 bar (IAPWS-IF97, saturation line, from memory): half of 1 bar.
    let ways = [
        (json!({ "per_dry": "0.25" }), 0.2, 1e-12),
        (json!({ "fraction": "20 %" }), 0.2, 1e-12),
        (json!({ "dew_point": "81.345 °C", "pressure": "1 bar" }), 0.5, 1e-3),
    ];
    for (water, fraction, within) in ways {
        let mut case =
            gas("CO + H2O = CO2 + H2", "10", "5 bar", &[("CO", "40 %"), ("H2", "remainder")]);
        case["reading"]["gas"]["basis"] = json!("dry");
        case["reading"]["gas"]["water"] = water.clone();
        let found = report(case);
        let steam = number(&species(&found, "H2O(g)")["now_fraction"]);
        assert!((steam - fraction).abs() <= within, "{water}: {steam}");
        let carbon_monoxide = number(&species(&found, "CO(g)")["now_fraction"]);
        near(carbon_monoxide, 0.4 * (1.0 - steam), "CO in the wet gas");
    }
}

#[test]
fn a_gauge_pressure_is_read_above_the_atmosphere() {
    for (pressure, atmosphere, expected) in [
        ("4 bar(g)", Json::Null, 501_325.0),
        ("4 bar(g)", json!("0.9 bar"), 490_000.0),
        ("58.015 psig", json!("1 atm"), 501_325.0),
        ("4 bar", json!("0.9 bar"), 400_000.0),
        ("4 bar(a)", json!("0.9 bar"), 400_000.0),
    ] {
        let mut case = gas("N2O4 = 2 NO2", "2", pressure, &[("N2O4", "60 %"), ("NO2", "40 %")]);
        case["atmosphere"] = atmosphere;
        let found = number(&report(case)["pressure_pa"]);
        assert!((found - expected).abs() < 1.0, "{pressure}: {found}");
    }
}

#[test]
fn every_form_of_a_gas_reading_says_the_same() {
    // Half and half of CO and H2 (molar masses 28.010 and 2.016 g/mol); a normal cubic metre holds
    // 44.615 mol.
    let rows = [
        ["50 %", "0.5"],
        ["500000 ppm", "50 vol %"],
        ["1 bar", "remainder"],
        ["3 mol", "0.003 kmol"],
        ["2 kmol/h", "2 kmol/h"],
        ["10 Nm3", "0.446150 kmol"],
        ["624.833 g/Nm3", "remainder"],
    ];
    for [one, other] in rows {
        let case = gas("CO + H2O = CO2 + H2", "10", "2 bar", &[("CO", one), ("H2", other)]);
        let found = number(&species(&report(case), "CO(g)")["now_fraction"]);
        assert!((found - 0.5).abs() < 1e-5, "{one} and {other}: {found}");
    }
}

#[test]
fn a_solid_is_used_up_and_the_reaction_stops_there() {
    // 2 CO = C + CO2 backwards: a tenth of a mole of carbon in a mole of CO2 with a large 1/K.
    let mut case = gas("2 CO = C + CO2", "1e-6", "1 bar", &[("CO2", "9 mol"), ("CO", "1 mol")]);
    case["reading"]["solids"] = json!({ "entries": [{ "species": "C", "value": "0.1 mol" }] });
    let found = report(case);
    assert_eq!(found["rest"]["outcome"], "phase exhausted");
    near(number(&found["reactions"][0]["extent_mol"]), -0.1, "ξ");
    let carbon = species(&found, "C(s)");
    assert_eq!((&carbon["exhausted"], &carbon["rest_mol"]), (&json!(true), &json!(0.0)));
}

#[test]
fn an_ample_solid_is_never_used_up() {
    // CaCO3 = CaO + CO2 with K = 0.25 at 1 bar: at rest a quarter of the gas is CO2. From one mole
    // of pure air, 1 mol of CO2 comes to 3 mol of air, so a third of a mole to one.
    let mut case = gas("CaCO3 = CaO + CO2", "0.25", "1 bar", &[("N2", "1 mol")]);
    case["reading"]["solids"] = json!({ "entries": [
        { "species": "CaCO3", "value": "present" }, { "species": "CaO", "value": "absent" }
    ] });
    let found = report(case);
    near(number(&found["reactions"][0]["extent_mol"]), 1.0 / 3.0, "ξ");
    assert_eq!(species(&found, "CaCO3(s)")["now_mol"], Json::Null);
    assert_eq!(found["reactions"][0]["q"], "zero");
    assert_eq!(found["reactions"][0]["verdict"], "forward");
}

#[test]
fn open_quotients_have_names_and_no_numbers() {
    let gases = |rows: &[(&str, &str)]| gas("N2O4 = 2 NO2", "2", "2 bar", rows);
    for (rows, q, verdict) in [
        (vec![("N2O4", "50 %"), ("N2", "50 %")], "zero", "forward"),
        (vec![("NO2", "50 %"), ("N2", "50 %")], "infinite", "reverse"),
        (vec![("N2", "100 %")], "undetermined", "cannot tell"),
    ] {
        let found = report(gases(&rows));
        let reaction = &found["reactions"][0];
        assert_eq!((&reaction["q"], &reaction["verdict"]), (&json!(q), &json!(verdict)));
        for name in ["ln_q", "affinity_over_rt", "gibbs_j_per_mol", "t_star_k"] {
            assert_eq!(reaction[name], Json::Null, "{q}: {name}");
        }
    }
}

#[test]
fn the_temperature_of_equilibrium_makes_k_equal_to_q() {
    let mut case = gas(
        "CO + H2O = CO2 + H2",
        "1",
        "20 bar",
        &[("CO", "1 %"), ("H2O", "20 %"), ("CO2", "17 %"), ("H2", "remainder")],
    );
    case["reactions"][0]["constant"] = json!({ "from": "library" });
    let found = report(case);
    let reaction = &found["reactions"][0];
    let t_star = number(&reaction["t_star_k"]);
    let there = case::constant("CO(g) + H2O(g) = CO2(g) + H2(g)", &format!("{t_star:?} K"));
    let there = serde_json::to_value(there).unwrap();
    near(number(&there["constant"]["ln_k"]), number(&reaction["ln_q"]), "ln K(T*)");
    // An exothermic reaction that falls short has T* above T, so the shortfall is T* − T.
    near(number(&reaction["shortfall_k"]), t_star - 500.0, "shortfall");
    assert_eq!(reaction["verdict"], "forward");
}

#[test]
fn a_stated_k_without_an_enthalpy_has_no_temperature_of_equilibrium() {
    let found = report(gas("N2O4 = 2 NO2", "2", "2 bar", &[("N2O4", "60 %"), ("NO2", "40 %")]));
    assert_eq!(found["reactions"][0]["t_star_k"], Json::Null);
    let note = found["reactions"][0]["approach_note"].as_str().unwrap();
    assert!(note.contains("without an enthalpy"), "{note}");
}

#[test]
fn without_a_reading_there_is_k_and_nothing_else() {
    let found = report(json!({
        "format": "shiftgauge 1",
        "reactions": [{ "equation": "SO2 + O2 = SO3" }],
        "temperature": "700 K"
    }));
    assert_eq!(found["reactions"][0]["equation"], "2 SO2(g) + O2(g) = 2 SO3(g)");
    assert_eq!((&found["rest"], &found["valley"]), (&Json::Null, &Json::Null));
    assert_eq!(found["reactions"][0]["verdict"], Json::Null);
}

#[test]
fn the_valley_is_lowest_at_rest_and_falls_on_both_sides() {
    let cases = [
        gas("N2O4 = 2 NO2", "2", "2 bar", &[("N2O4", "60 %"), ("NO2", "40 %")]),
        gas("CO + H2O = CO2 + H2", "30", "9 bar", &[("CO", "40 %"), ("H2O", "remainder")]),
    ];
    for case in cases {
        let found = report(case);
        let rest = number(&found["reactions"][0]["extent_mol"]);
        let list = |name: &str| -> Vec<f64> {
            found["valley"][name].as_array().unwrap().iter().map(number).collect()
        };
        let (extents, energies) = (list("extent_mol"), list("gibbs_over_rt"));
        assert!(extents.len() > 100 && extents.len() == energies.len());
        let lowest = (0..energies.len()).min_by(|&a, &b| energies[a].total_cmp(&energies[b]));
        near(extents[lowest.unwrap()], rest, "the floor of the valley");
        for i in 1..extents.len() {
            let falls = energies[i] <= energies[i - 1] + 1e-12;
            let rises = energies[i] >= energies[i - 1] - 1e-12;
            assert!(if extents[i] <= rest { falls } else { rises }, "at ξ = {}", extents[i]);
        }
    }
}

#[test]
fn the_working_leads_to_the_numbers_of_the_answer() {
    let case = gas("N2O4 = 2 NO2", "2", "2 bar", &[("N2O4", "60 %"), ("NO2", "40 %")]);
    let found = report(case);
    let lines: Vec<&str> =
        found["steps"].as_array().unwrap().iter().map(|s| s["text"].as_str().unwrap()).collect();
    let any = |piece: &str| lines.iter().any(|line| line.contains(piece));
    assert!(any("Q = a(NO2)^2 / a(N2O4) = 0.53333"), "{lines:#?}");
    assert!(lines.iter().all(|line| !line.contains('{')), "{lines:#?}");
}

#[test]
fn without_a_limit_the_working_claims_no_state_at_rest() {
    // CaCO3 = CaO + CO2 with K = 2 at 1 bar over pure CO2, both solids in plenty: it never stops.
    let mut case = gas("CaCO3 = CaO + CO2", "2", "1 bar", &[("CO2", "1 mol")]);
    case["reading"]["solids"] = json!({ "entries": [
        { "species": "CaCO3", "value": "present" }, { "species": "CaO", "value": "present" }
    ] });
    let found = report(case);
    assert_eq!(found["rest"]["outcome"], "has no limit");
    assert_eq!(found["reactions"][0]["verdict"], "forward");
    let steps = found["steps"].as_array().unwrap();
    assert!(steps.iter().all(|step| step["about"] != "rest"), "{steps:#?}");
}
