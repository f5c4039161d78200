//! Sweeps and targets of whole cases, against closed forms.

use serde_json::{Value as Json, json};
use shiftgauge::case::{self, Value};

fn value(json: &Json) -> Value {
    serde_json::from_value(json.clone()).unwrap()
}

fn swept(case: &Json, request: &Json) -> Json {
    serde_json::to_value(case::sweep(&value(case), &value(request))).unwrap()
}

fn targeted(case: &Json, goal: &Json) -> Json {
    serde_json::to_value(case::target(&value(case), &value(goal))).unwrap()
}

/// Pure N2O4 with K = 1: the degree of dissociation at P bar is √(K/(K + 4 P)).
fn dissociation() -> Json {
    json!({
        "format": "shiftgauge 1",
        "reactions": [{ "equation": "N2O4(g) = 2 NO2(g)",
            "constant": { "from": "value", "kind": "K", "value": "1", "at": "330 K", "enthalpy": "57 kJ/mol" } }],
        "temperature": "330 K",
        "pressure": "1 bar",
        "reading": { "gas": { "basis": "wet", "entries": [{ "species": "N2O4", "value": "100 %" }] } }
    })
}

fn degree(k: f64, pressure_bar: f64) -> f64 {
    (k / (k + 4.0 * pressure_bar)).sqrt()
}

fn near(found: &Json, expected: f64, what: &str) {
    let found = found.as_f64().unwrap_or_else(|| panic!("{what} is {found}"));
    assert!(
        (found - expected).abs() < 1e-9 * expected.abs().max(1.0),
        "{what}: {found}, {expected}"
    );
}

#[test]
fn a_sweep_is_rest_at_every_setting() {
    let request = json!({
        "x": { "knob": "pressure", "from": "0.5 bar", "to": "4.5 bar", "count": 5 },
        "lines": { "knob": "temperature", "values": ["330 K", "350 K"] },
        "show": { "what": "conversion", "species": "N2O4" }
    });
    let answer = swept(&dissociation(), &request);
    assert_eq!(answer["ok"], true, "{answer}");
    let sweep = &answer["sweep"];
    let k = |t: f64| (-57_000.0 / 8.314_462_618_153_24 * (1.0 / t - 1.0 / 330.0)).exp();
    for (line, t) in [(0, 330.0), (1, 350.0)] {
        for (at, pressure_bar) in [0.5, 1.5, 2.5, 3.5, 4.5].into_iter().enumerate() {
            near(&sweep["x"]["values"][at], pressure_bar * 1e5, "x");
            near(&sweep["lines"][line]["y"][at], degree(k(t), pressure_bar), "degree");
        }
    }
    near(&sweep["now"]["x"], 1e5, "now");
    near(&sweep["now"]["y"], degree(1.0, 1.0), "at rest now");
}

#[test]
fn a_target_finds_the_setting_or_says_why_not() {
    let goal = |to: &str, wanted: &str| {
        json!({ "knob": "pressure", "from": "0.1 bar", "to": to, "value": wanted,
            "reach": { "what": "conversion", "species": "N2O4" } })
    };
    // √(1/(1 + 4 P)) = 0.5 at P = 0.75 bar.
    let found = targeted(&dissociation(), &goal("10 bar", "50 %"));
    assert_eq!(found["target"]["outcome"], "one", "{found}");
    near(&found["target"]["settings"][0]["value_si"], 0.75e5, "pressure");
    assert!(found["target"]["why"].as_str().unwrap().contains("0.75 bar"), "{found}");
    // At 0.1 bar the degree is √(1/1.4), the most there is in this range.
    let found = targeted(&dissociation(), &goal("10 bar", "95 %"));
    assert_eq!(found["target"]["outcome"], "none", "{found}");
    near(&found["target"]["nearest"]["reached"], degree(1.0, 0.1), "nearest");
}

#[test]
fn a_conversion_is_counted_from_the_feed_where_there_is_one() {
    // 10 SO2 + 10 O2 + 80 N2 fed, 80 % converted in the reading (as in feed.rs). The temperature at
    // which rest is 80 % converted is then T* of the reading itself.
    let case = json!({
        "format": "shiftgauge 1",
        "reactions": [{ "equation": "2 SO2 + O2 = 2 SO3", "constant": { "from": "library" } }],
        "temperature": "560 °C",
        "pressure": "1.2 bar",
        "reading": { "gas": { "basis": "dry", "lost": ["SO3"], "entries": [
            { "species": "SO2", "value": "0.022727272727272728" }, { "species": "O2", "value": "0.06818181818181818" },
            { "species": "N2", "value": "remainder" }] } },
        "feed": { "gas": { "basis": "wet", "entries": [
            { "species": "SO2", "value": "10 %" }, { "species": "O2", "value": "10 %" }, { "species": "N2", "value": "80 %" }] } }
    });
    let report = serde_json::to_value(case::check(&value(&case))).unwrap();
    let t_star = report["report"]["reactions"][0]["t_star_k"].as_f64().unwrap();
    let goal = json!({ "knob": "temperature", "from": "400 °C", "to": "700 °C", "value": "80 %",
        "reach": { "what": "conversion", "species": "SO2" } });
    let found = targeted(&case, &goal);
    assert_eq!(found["target"]["outcome"], "one", "{found}");
    let setting = found["target"]["settings"][0]["value_si"].as_f64().unwrap();
    assert!((setting - t_star).abs() < 1e-4, "{setting}, T* = {t_star}");
    // An amount is turned as a ratio to the other gas; more oxygen reaches 95 %.
    let goal = json!({ "knob": "amount of O2", "from": "0.01", "to": "20", "value": "85 %",
        "reach": { "what": "conversion", "species": "SO2" } });
    let found = targeted(&case, &goal);
    assert_eq!(found["target"]["unit"], "mol/mol");
    assert_ne!(found["target"]["outcome"], "none", "{found}");
}

#[test]
fn what_cannot_be_asked_is_told_at_its_place() {
    let request = json!({
        "x": { "knob": "speed", "from": "1 bar", "to": "2 bar", "count": 1 },
        "lines": { "knob": "temperature", "values": [] },
        "show": { "what": "conversion", "species": "H2" }
    });
    let answer = swept(&dissociation(), &request);
    let places: Vec<(&str, &str)> = answer["problems"]
        .as_array()
        .unwrap()
        .iter()
        .map(|one| (one["code"].as_str().unwrap(), one["field"].as_str().unwrap()))
        .collect();
    let expected = [
        ("unknown-word", "x.knob"),
        ("sweep-lines", "lines.values"),
        ("species-not-here", "show.species"),
    ];
    assert_eq!(places, expected, "{answer}");
    let mut bare = dissociation();
    bare["reading"] = Json::Null;
    let answer = swept(&bare, &request);
    assert_eq!(answer["problems"][0]["code"], "reading-needed");
}
