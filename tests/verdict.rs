//! The verdict: band, interval, bounds, and that it does not depend on how the equation is scaled.

use serde_json::{Value as Json, json};
use shiftgauge::case::{self, Value};

fn report(case: &Json) -> Json {
    let value: Value = serde_json::from_value(case.clone()).unwrap();
    let answer = serde_json::to_value(case::check(&value)).unwrap();
    assert_eq!(answer["ok"], true, "{answer}");
    answer["report"].clone()
}

fn reaction(case: &Json) -> Json {
    report(case)["reactions"][0].clone()
}

/// ln K = 5 at 500 K and ΔH° = −41.57 kJ/mol, so that ln K falls by 0.02 for each kelvin; the reading
/// has ln Q = 5 − `affinity`, set by the CO.
fn shift(affinity: f64, tolerance_of_co: &str) -> Json {
    // y(CO2) y(H2)/(y(CO) y(H2O)) with 0.2, 0.5 and 0.25.
    let co = 0.2 * 0.5 / 0.25 / (5.0 - affinity).exp();
    json!({
        "format": "shiftgauge 1",
        "reactions": [{ "equation": "CO + H2O(g) = CO2 + H2", "constant": {
            "from": "value", "kind": "ln K", "value": "5", "at": "500 K", "enthalpy": "-41.57231309 kJ/mol"
        } }],
        "temperature": "500 K",
        "pressure": "20 bar",
        "reading": { "gas": { "basis": "wet", "entries": [
            { "species": "CO", "value": format!("{co}{tolerance_of_co}") },
            { "species": "H2O", "value": "25 %" },
            { "species": "CO2", "value": "20 %" },
            { "species": "H2", "value": "50 %" },
            { "species": "N2", "value": "remainder" }
        ] } }
    })
}

#[test]
fn the_verdict_follows_band_and_interval() {
    // A = 0.02 for each kelvin of approach. A relative tolerance of 2 % of CO is 1 % in u: 0.01 in A,
    // half a kelvin in T*.
    let rows = [
        // affinity, tolerance, verdict, leaning
        (0.0, "", "at rest", Json::Null),
        (0.10, " ± 2 % rel", "at rest", json!("forward")),
        (-0.10, " ± 2 % rel", "at rest", json!("reverse")),
        (0.19, " ± 2 % rel", "forward", json!("forward")),
        (0.40, " ± 2 % rel", "forward", json!("forward")),
        (-0.40, " ± 2 % rel", "reverse", json!("reverse")),
        (0.40, " ± 50 % rel", "cannot tell", json!("forward")),
        (-0.10, " ± 40 % rel", "cannot tell", json!("reverse")),
    ];
    for (affinity, tolerance, verdict, leaning) in rows {
        let found = reaction(&shift(affinity, tolerance));
        let title = format!("A = {affinity}{tolerance}: {found}");
        assert_eq!(found["verdict"], verdict, "{title}");
        assert_eq!(found["leaning"], leaning, "{title}");
        let better = found["better"].as_array().unwrap();
        assert_eq!(better.is_empty(), verdict != "cannot tell", "{title}");
    }
}

#[test]
fn what_to_measure_better_would_settle_it() {
    let mut case = shift(0.40, " ± 50 % rel");
    let found = reaction(&case);
    let text = found["better"][0]["text"].as_str().unwrap();
    // "CO in the gas: to ± 0.0012 instead of ± 0.0020 would settle it."
    let needed: f64 = text.split("± ").nth(1).unwrap().split(' ').next().unwrap().parse().unwrap();
    let co = case["reading"]["gas"]["entries"][0]["value"].as_str().unwrap().to_owned();
    let value = co.split(' ').next().unwrap().to_owned();
    case["reading"]["gas"]["entries"][0]["value"] = json!(format!("{value} ± {}", needed * 0.95));
    assert_eq!(reaction(&case)["verdict"], "forward", "{text}");
    case["reading"]["gas"]["entries"][0]["value"] = json!(format!("{value} ± {}", needed * 1.1));
    assert_eq!(reaction(&case)["verdict"], "cannot tell", "{text}");
}

#[test]
fn the_scale_of_the_equation_does_not_matter() {
    let case = |equation: &str| {
        json!({
            "format": "shiftgauge 1",
            "reactions": [{ "equation": equation, "constant": { "from": "library" } }],
            "temperature": "600 ± 4 °C",
            "pressure": "1.2 ± 0.02 bar",
            "reading": { "gas": { "basis": "wet", "entries": [
                { "species": "SO2", "value": "2.6 ± 0.1 %" },
                { "species": "O2", "value": "8 ± 0.1 %" },
                { "species": "SO3", "value": "7 ± 0.3 %" },
                { "species": "N2", "value": "remainder" }
            ] } }
        })
    };
    let twice = reaction(&case("2 SO2 + O2 = 2 SO3"));
    let once = reaction(&case("SO2 + 1/2 O2 = SO3"));
    let back = reaction(&case("SO3 = SO2 + 1/2 O2"));
    assert_eq!(twice["verdict"], once["verdict"]);
    for name in ["t_star_k", "approach_k", "u_approach_k", "shortfall_k", "missing_conversion"] {
        let of = |found: &Json| found[name].as_f64().unwrap();
        assert!((of(&twice) / of(&once) - 1.0).abs() < 1e-9, "{name}");
        let sign = if name == "missing_conversion" { -1.0 } else { 1.0 };
        let mirrored = if name == "shortfall_k" { -1.0 } else { 1.0 };
        assert!((sign * mirrored * of(&back) / of(&once) - 1.0).abs() < 1e-9, "{name} reversed");
    }
    let of = |found: &Json| found["u_affinity_over_rt"].as_f64().unwrap();
    assert!((of(&twice) / of(&once) - 2.0).abs() < 1e-9);
}

#[test]
fn a_bound_counts_over_all_of_it() {
    let with = |species: &str, value: &str| {
        let mut case = shift(0.4, "");
        let rows = case["reading"]["gas"]["entries"].as_array_mut().unwrap();
        let row = rows.iter_mut().find(|row| row["species"] == species).unwrap();
        row["value"] = json!(value);
        reaction(&case)
    };
    // Less product than the bound: the affinity only grows, and at nothing it is open.
    let found = with("CO2", "< 20 %");
    assert_eq!(found["verdict"], "forward", "{found}");
    assert_eq!(found["affinity_interval_over_rt"][1], Json::Null, "{found}");
    // Less reactant: nothing can be told, and a value is wanted instead of the bound.
    let found = with("CO", "< 1 %");
    assert_eq!(found["verdict"], "cannot tell", "{found}");
    assert_eq!(found["affinity_interval_over_rt"][0], Json::Null, "{found}");
    assert!(found["better"][0]["text"].as_str().unwrap().contains("instead of a bound"), "{found}");
}

#[test]
fn where_a_temperature_says_nothing_the_band_is_on_conversion() {
    let mut case = shift(0.02, " ± 2 % rel");
    case["reactions"][0]["constant"]["enthalpy"] = json!("-500 J/mol");
    let found = reaction(&case);
    assert_eq!(found["band"]["kind"], "conversion", "{found}");
    assert_eq!(found["verdict"], "at rest", "{found}");
    assert!(found["missing_conversion"].as_f64().unwrap() < 0.01);
    // The same band stated by the user.
    let mut case = shift(0.10, " ± 2 % rel");
    case["band"] = json!("0.01 %");
    let found = reaction(&case);
    assert_eq!(
        (&found["band"]["kind"], &found["verdict"]),
        (&json!("conversion"), &json!("forward"))
    );
}

#[test]
fn a_slight_vacuum_has_a_tolerance_like_any_pressure() {
    let kiln = |pressure: &str| {
        reaction(&json!({
            "format": "shiftgauge 1",
            "reactions": [{ "equation": "CaCO3 = CaO + CO2", "constant": { "from": "library" } }],
            "temperature": "840 ± 10 °C",
            "pressure": pressure,
            "reading": {
                "gas": { "basis": "wet", "entries": [
                    { "species": "CO2", "value": "33 ± 1 %" }, { "species": "N2", "value": "remainder" }
                ] },
                "solids": { "entries": [
                    { "species": "CaCO3", "value": "present" }, { "species": "CaO", "value": "present" }
                ] }
            }
        }))
    };
    let u = |found: &Json| found["u_affinity_over_rt"].as_f64().unwrap();
    let (vacuum, none, gauge) = (kiln("-3 ± 1 mbar(g)"), kiln("-3 mbar(g)"), kiln("3 ± 1 mbar(g)"));
    assert!(u(&none) > 0.05 && u(&vacuum) > u(&none), "{vacuum}");
    assert!((u(&vacuum) / u(&gauge) - 1.0).abs() < 1e-3);
    let rows = vacuum["budget"].as_array().unwrap();
    assert!(rows.iter().any(|row| row["input"] == "pressure"), "{rows:?}");
}

#[test]
fn a_set_approach_is_the_middle_of_the_band() {
    // A reading that is 20 K short, in a plant where 20 K are usual: rest is that of K at T*.
    let mut case = shift(0.40, " ± 2 % rel");
    let approach = reaction(&case)["approach_k"].as_f64().unwrap();
    case["reactions"][0]["constant"]["approach"] = json!(format!("{approach} K"));
    let found = reaction(&case);
    assert_eq!(found["verdict"], "at rest", "{found}");
    // The affinity is that at T all the same; it is the state at rest that stands where the mixture is.
    assert!((found["affinity_over_rt"].as_f64().unwrap() - 0.40).abs() < 1e-9);
    assert!(found["extent_mol"].as_f64().unwrap().abs() < 1e-9);
}

#[test]
fn a_reading_that_gives_k_judges_nothing() {
    let mut case = shift(0.4, " ± 2 % rel");
    case["reactions"][0]["constant"] = json!({ "from": "reading" });
    let found = reaction(&case);
    assert_eq!(found["ln_k"], found["ln_q"]);
    assert!((found["u_ln_k"].as_f64().unwrap() - 0.01).abs() < 1e-4, "{found}");
    assert_eq!(found["verdict"], "at rest");
}

#[test]
fn a_formula_and_points_give_the_k_that_they_were_made_from() {
    // log10 Kp(atm) = 4956/T − 4.678 for the half reaction (Bodenstein and Pohl), asked for the whole.
    let mut case = shift(0.0, "");
    case["reactions"][0] = json!({ "equation": "2 SO2 + O2 = 2 SO3", "constant": {
        "from": "formula", "kind": "log10 K", "pressure_unit": "atm", "for": "SO2 + 1/2 O2 = SO3",
        "terms": { "1/T": "4956", "1": "-4.678" }, "range": ["400 °C", "700 °C"], "tolerance": "0.06"
    } });
    case["reading"] = Json::Null;
    case["temperature"] = json!("800 K");
    let found = reaction(&case);
    // Kp = K (bar/atm)^Δν with Δν = −1: log10 K = 2 (4956/800 − 4.678) − log10 1.01325.
    let expected = 2.0 * (4956.0 / 800.0 - 4.678) - 1.01325f64.log10();
    assert!((found["log10_k"].as_f64().unwrap() - expected).abs() < 1e-12, "{found}");
    let u = 0.06 / 2.0 * 2.0 * std::f64::consts::LN_10;
    assert!((found["u_ln_k"].as_f64().unwrap() - u).abs() < 1e-12, "{found}");
    let enthalpy = -2.0 * 4956.0 * std::f64::consts::LN_10 * 8.314_462_618_153_24;
    let ours = found["enthalpy_standard_j_per_mol"].as_f64().unwrap();
    assert!((ours / enthalpy - 1.0).abs() < 1e-12);
    // Points that bend are said to bend.
    let points: Vec<Json> = [600.0, 700.0, 800.0, 900.0, 1000.0]
        .map(|t: f64| json!([format!("{t} K"), format!("{}", 5000.0 / t + 1e-6 * t * t)]))
        .to_vec();
    case["reactions"][0]["constant"] =
        json!({ "from": "points", "kind": "log10 K", "points": points });
    let whole = report(&case);
    assert_eq!(whole["reactions"][0]["source"]["fit"]["bends"], true);
    assert!(whole["notes"].as_array().unwrap().iter().any(|note| note["code"] == "points-bend"));
}

#[test]
fn every_form_of_a_number_of_k_leads_back() {
    let ask = |number: Json| {
        let value: Value = serde_json::from_value(number).unwrap();
        let answer = serde_json::to_value(case::convert(&value)).unwrap();
        assert_eq!(answer["ok"], true, "{answer}");
        answer
    };
    let base = json!({ "equation": "N2 + 3 H2 = 2 NH3", "temperature": "450 °C", "pressure": "200 bar",
        "value": "0.0000437", "kind": "Kp", "pressure_unit": "atm" });
    let first = ask(base.clone());
    for form in first["forms"].as_array().unwrap() {
        let mut number = base.clone();
        let unit = form["unit"].as_str().unwrap().split('^').next().unwrap();
        number["kind"] = form["name"].clone();
        number["pressure_unit"] = if form["name"] == "Kp" { json!(unit) } else { Json::Null };
        number["value"] = json!(form["value"].to_string());
        let again = ask(number);
        let apart = again["ln_k"].as_f64().unwrap() - first["ln_k"].as_f64().unwrap();
        assert!(apart.abs() < 1e-12, "{form}: {apart}");
    }
    // Kp in atm is K times (1.01325)^2 for Δν = −2, and pK and ΔG° are the same number again.
    let ln_k = first["ln_k"].as_f64().unwrap();
    assert!((ln_k - (0.0000437f64.ln() - 2.0 * 1.01325f64.ln())).abs() < 1e-12);
    let rt = 8.314_462_618_153_24 * 723.15;
    assert!((first["gibbs_j_per_mol"].as_f64().unwrap() + rt * ln_k).abs() < 1e-9 * rt);
}
