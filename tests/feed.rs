//! A feed beside the reading: what the elements tell. Each case is worked out by hand in its comment.

use serde_json::{Value as Json, json};
use shiftgauge::case::{self, Value};

fn report(case: Json) -> Json {
    let value: Value = serde_json::from_value(case).unwrap();
    let answer = serde_json::to_value(case::check(&value)).unwrap();
    assert_eq!(answer["ok"], true, "{answer}");
    answer["report"].clone()
}

fn entries(rows: &[(&str, &str)]) -> Json {
    rows.iter().map(|(species, value)| json!({ "species": species, "value": value })).collect()
}

fn near(found: &Json, expected: f64, what: &str) {
    let found = found.as_f64().unwrap_or_else(|| panic!("{what} is {found}"));
    assert!((found - expected).abs() < 1e-9, "{what}: {found} is not {expected}");
}

fn fraction<'r>(report: &'r Json, species: &str) -> &'r Json {
    let rows = report["species"].as_array().unwrap();
    &rows.iter().find(|row| row["species"] == species).unwrap()["now_fraction"]
}

fn converter(feed: Json, reading: Json) -> Json {
    json!({
        "format": "shiftgauge 1",
        "reactions": [{ "equation": "2 SO2 + O2 = 2 SO3", "constant": { "from": "library" } }],
        "temperature": "600 °C",
        "pressure": "1.2 bar",
        "reading": { "gas": { "basis": "dry", "lost": ["SO3"], "entries": reading } },
        "feed": { "gas": { "basis": "wet", "entries": feed } }
    })
}

#[test]
fn sulfur_trioxide_lost_from_the_sample_is_restored() {
    // 10 SO2 + 10 O2 + 80 N2, and 4 of extent: 2 SO2, 6 O2, 80 N2 and 8 SO3, 96 in all. The cooled
    // sample shows 2, 6 and 80 of 88.
    let found = report(converter(
        entries(&[("SO2", "10 %"), ("O2", "10 %"), ("N2", "80 %")]),
        entries(&[("SO2", "0.022727272727"), ("O2", "0.068181818182"), ("N2", "remainder")]),
    ));
    near(fraction(&found, "SO3(g)"), 8.0 / 96.0, "SO3");
    near(&found["balance"]["contraction"], 0.04, "contraction");
    near(&found["conversions"][0]["feed_to_now"], 0.8, "conversion of SO2");
    near(&found["conversions"][1]["feed_to_now"], 0.4, "conversion of O2");
    near(&found["balance"]["closes_within"], 0.0, "closing");
}

#[test]
fn argon_that_an_analyser_counts_as_oxygen_is_told_apart() {
    // The same with 1 of argon in the feed's 80 of nitrogen and argon; behind it 6 O2 and 1 Ar are
    // read as 7 of 88.
    let mut case = converter(
        entries(&[("SO2", "10 %"), ("O2", "10 %"), ("Ar", "1 %"), ("N2", "79 %")]),
        entries(&[("SO2", "0.022727272727"), ("O2", "0.079545454545"), ("N2", "remainder")]),
    );
    case["reading"]["gas"]["entries"][1]["includes"] = json!("Ar");
    let found = report(case.clone());
    near(fraction(&found, "Ar(g)"), 1.0 / 96.0, "argon");
    near(fraction(&found, "O2(g)"), 6.0 / 96.0, "oxygen");
    // Without the feed argon comes with the nitrogen of air: 0.934 to 78.084.
    case["feed"] = Json::Null;
    case["reading"]["gas"]["lost"] = json!([]);
    let found = report(case);
    let nitrogen = 1.0 - 0.022727272727 - 0.079545454545;
    near(fraction(&found, "Ar(g)"), nitrogen * 0.934 / 78.084, "argon of air");
}

#[test]
fn steam_behind_a_reformer_follows_from_its_feed() {
    // 1 CH4 + 3 H2O to 0.3 CO, 0.2 CO2, 0.5 CH4, 1.7 H2 and 2.3 H2O: 5 in all, 2.7 dry.
    let dry = |amount: f64| format!("{}", amount / 2.7);
    let case = json!({
        "format": "shiftgauge 1",
        "reactions": [{ "equation": "CH4 + H2O = CO + 3 H2", "constant": { "from": "library" } }],
        "temperature": "780 °C",
        "pressure": "20 bar",
        "reading": { "gas": { "basis": "dry", "water": "from_feed", "entries": entries(&[
            ("CO", &dry(0.3)), ("CO2", &dry(0.2)), ("CH4", &dry(0.5)), ("H2", &dry(1.7))
        ]) } },
        "feed": { "gas": { "basis": "wet", "entries": entries(&[("CH4", "25 %"), ("H2O", "75 %")]) } }
    });
    let found = report(case);
    near(fraction(&found, "H2O(g)"), 2.3 / 5.0, "steam");
    near(&found["balance"]["contraction"], -0.25, "the gas grows by a quarter");
    near(&found["conversions"][0]["feed_to_now"], 0.5, "conversion of methane");
}

#[test]
fn elements_of_a_reacting_solid_do_not_balance_in_the_gas() {
    // Lime takes CO2 up: nitrogen alone ties the gases. 50 CO2 + 50 N2 to 10 CO2 + 50 N2.
    let case = json!({
        "format": "shiftgauge 1",
        "reactions": [{ "equation": "CaO(s) + CO2(g) = CaCO3(s)", "constant": { "from": "library" } }],
        "temperature": "700 °C",
        "pressure": "1 bar",
        "reading": { "gas": { "basis": "wet", "entries": entries(&[("CO2", "0.166666666667"), ("N2", "remainder")]) },
            "solids": { "entries": entries(&[("CaO", "present"), ("CaCO3", "present")]) } },
        "feed": { "gas": { "basis": "wet", "entries": entries(&[("CO2", "50 %"), ("N2", "50 %")]) } }
    });
    let found = report(case);
    let rows = found["conversions"].as_array().unwrap();
    let carbon_dioxide = rows.iter().find(|row| row["species"] == "CO2(g)").unwrap();
    near(&carbon_dioxide["feed_to_now"], 0.8, "conversion of CO2");
    assert_eq!(found["balance"]["elements"].as_array().unwrap().len(), 1);
}

#[test]
fn a_feed_that_does_not_fit_is_said() {
    let found = report(converter(
        entries(&[("SO2", "10 %"), ("O2", "10 %"), ("N2", "80 %")]),
        entries(&[("SO2", "0.03"), ("O2", "0.10"), ("N2", "remainder")]),
    ));
    let notes = found["notes"].as_array().unwrap();
    assert!(notes.iter().any(|note| note["code"] == "feed-does-not-close"), "{notes:?}");
}
