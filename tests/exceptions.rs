//! Cases where the plain rule gives a wrong answer: absent phases, phases that nobody knows, a K whose
//! temperature is not said, roots that hide between samples.

use serde_json::{Value as Json, json};
use shiftgauge::case::{self, Value};

fn ask(case: &Json) -> Json {
    let value: Value = serde_json::from_value(case.clone()).unwrap();
    serde_json::to_value(case::check(&value)).unwrap()
}

fn report(case: &Json) -> Json {
    let answer = ask(case);
    assert_eq!(answer["ok"], true, "{case}\n{answer}");
    answer["report"].clone()
}

fn rows(entries: &[(&str, &str)]) -> Json {
    entries.iter().map(|(species, value)| json!({ "species": species, "value": value })).collect()
}

fn case(equation: &str, constant: Json, temperature: &str, reading: Json) -> Json {
    json!({
        "format": "shiftgauge 1",
        "reactions": [{ "equation": equation, "constant": constant }],
        "temperature": temperature,
        "pressure": "1 bar(a)",
        "reading": reading
    })
}

fn gas(entries: &[(&str, &str)], solids: &[(&str, &str)]) -> Json {
    json!({ "gas": { "basis": "wet", "entries": rows(entries) }, "solids": { "entries": rows(solids) } })
}

#[test]
fn what_is_absent_cannot_be_used_up() {
    let library = || json!({ "from": "library" });
    let cases = [
        // The gas would take carbon up, but there is none: no carbon is laid down either.
        (
            "2 CO = C + CO2",
            "900 °C",
            gas(&[("CO", "10 %"), ("CO2", "10 %"), ("N2", "remainder")], &[("C", "absent")]),
            "reverse",
        ),
        (
            "CaCO3 = CaO + CO2",
            "900 °C",
            gas(
                &[("CO2", "10 %"), ("N2", "remainder")],
                &[("CaCO3", "absent"), ("CaO", "present")],
            ),
            "forward",
        ),
        (
            "NH4Cl = NH3 + HCl",
            "350 °C",
            gas(&[("NH3", "50 %"), ("HCl", "50 %")], &[("NH4Cl", "absent")]),
            "forward",
        ),
        // Calcite and no gas above it, and no lime: nothing but the reverse points anywhere.
        (
            "CaCO3 = CaO + CO2",
            "850 °C",
            json!({ "solids": { "entries": rows(&[("CaCO3", "30 mol"), ("CaO", "0 mol")]) } }),
            "reverse",
        ),
    ];
    for (equation, temperature, reading, leaning) in cases {
        let found = report(&case(equation, library(), temperature, reading));
        let reaction = &found["reactions"][0];
        assert_eq!(reaction["verdict"], "at rest", "{equation}: {reaction}");
        assert_eq!(reaction["leaning"], leaning, "{equation}");
        assert!(reaction["why"].as_str().unwrap().contains("to use up"), "{equation}");
    }
}

#[test]
fn a_stated_k_belongs_to_the_temperature_of_the_case() {
    let mut shift = case(
        "CO + H2O(g) = CO2 + H2",
        json!({ "from": "value", "kind": "K", "value": "7.3", "enthalpy": "-38 kJ/mol" }),
        "450 °C",
        gas(&[("CO", "5 %"), ("H2O", "25 %"), ("CO2", "16 %"), ("H2", "remainder")], &[]),
    );
    let without = report(&shift);
    shift["reactions"][0]["constant"]["at"] = json!("450 °C");
    let with = report(&shift);
    let t_star = |found: &Json| found["reactions"][0]["t_star_k"].as_f64().unwrap();
    assert!((t_star(&without) - t_star(&with)).abs() < 1e-9);
    // ln Q = ln(0.16 × 0.54/(0.05 × 0.25)); 1/T* = 1/T − R (ln Q − ln K)/ΔH.
    let ln_q = (0.16f64 * 0.54 / (0.05 * 0.25)).ln();
    let expected = 1.0 / (1.0 / 723.15 + 8.314_462_618_153_24 * (ln_q - 7.3f64.ln()) / 38_000.0);
    assert!((t_star(&with) - expected).abs() < 1e-6, "{} {expected}", t_star(&with));
}

#[test]
fn a_phase_that_nobody_knows_is_asked_for() {
    let constant =
        json!({ "from": "value", "kind": "Kp", "pressure_unit": "atm", "value": "0.11" });
    let reading = gas(&[("NH3", "30 %"), ("H2S", "30 %"), ("N2", "remainder")], &[]);
    let answer = ask(&case("NH4HS = NH3 + H2S", constant.clone(), "25 °C", reading.clone()));
    assert_eq!(answer["problems"][0]["code"], "phase-needed", "{answer}");
    let found = report(&case("NH4HS(s) = NH3 + H2S", constant, "25 °C", reading));
    assert_eq!(found["reactions"][0]["delta_nu_gas"], 2.0);
}

#[test]
fn several_liquids_are_one_mixture_also_where_one_is_read() {
    let reading = json!({ "liquid": { "entries": rows(&[("CH3COOH", "1 mol")]) } });
    let constant = json!({ "from": "value", "kind": "K", "value": "4" });
    let equation = "CH3COOH(l) + C2H5OH(l) = CH3COOC2H5(l) + H2O(l)";
    let found = report(&case(equation, constant.clone(), "350 K", reading));
    assert_eq!(found["reactions"][0]["q"], "undetermined", "the others are absent, not ample");
    let reading = gas(&[("N2", "1 mol")], &[]);
    let answer = ask(&case(equation, constant, "350 K", reading));
    assert_eq!(answer["problems"][0]["code"], "liquids-need-reading", "{answer}");
}

#[test]
fn flows_and_amounts_of_solids_do_not_mix() {
    let reading =
        json!({ "solids": { "entries": rows(&[("CaCO3", "5 mol/h"), ("CaO", "3 mol")]) } });
    let answer = ask(&case("CaCO3 = CaO + CO2", json!({ "from": "library" }), "900 °C", reading));
    assert_eq!(answer["problems"][0]["code"], "mixed-forms", "{answer}");
}

#[test]
fn two_temperatures_of_equilibrium_between_two_samples_are_both_found() {
    // ln K turns at 700 K, 1e-4 above ln Q: ΔH° = 0 there and ΔCp° = −10 J/(mol K).
    let constant = json!({ "from": "value", "kind": "K", "value": "1.0001", "at": "700 K",
        "enthalpy": "0 J/mol", "heat_capacity": "-10 J/(mol K)" });
    let reading =
        gas(&[("CO", "0.24999"), ("H2O", "0.25"), ("CO2", "0.25"), ("H2", "remainder")], &[]);
    let found = report(&case("CO + H2O(g) = CO2 + H2", constant, "700 K", reading));
    let reaction = &found["reactions"][0];
    let t_star = reaction["t_star_k"].as_f64().unwrap_or_else(|| panic!("{reaction}"));
    assert!((t_star - 700.0).abs() < 6.0, "{t_star}");
    assert!(reaction["approach_note"].as_str().unwrap().contains("1 more"), "{reaction}");
}

#[test]
fn a_line_through_points_is_drawn_on_to_find_t_star_and_said_so() {
    let constant = json!({ "from": "points", "kind": "log10 K",
        "points": [["400 °C", "4.3"], ["430 °C", "3.75"], ["460 °C", "3.25"]] });
    let reading = gas(&[("SO2", "1 %"), ("O2", "6 %"), ("SO3", "5 %"), ("N2", "remainder")], &[]);
    let found = report(&case("2 SO2(g) + O2(g) = 2 SO3(g)", constant, "450 °C", reading));
    assert!(found["reactions"][0]["t_star_k"].as_f64().unwrap() > 733.15, "{found}");
    let notes = found["notes"].as_array().unwrap();
    assert!(notes.iter().any(|note| note["code"] == "t-star-extrapolated"), "{notes:?}");
}

#[test]
fn a_solid_is_taken_in_the_form_that_is_stable_at_the_temperature() {
    let form = |equation: &str, temperature: &str| {
        let found = report(&case(equation, json!({ "from": "library" }), temperature, Json::Null));
        found["notes"]
            .as_array()
            .unwrap()
            .iter()
            .find(|note| note["code"] == "form-assumed")
            .unwrap()["text"]
            .as_str()
            .unwrap()
            .to_owned()
    };
    let (sulfur, lead) = ("S(s) + O2 = SO2(g)", "Pb(l) + 1/2 O2 = PbO(s)");
    assert!(form(sulfur, "25 °C").contains("rhombic"));
    assert!(form(sulfur, "105 °C").contains("monoclinic"));
    assert!(form(lead, "400 °C").contains("red"));
    // The data of the red form end at 489 °C, and are not drawn on where the yellow one has its own.
    assert!(form(lead, "700 °C").contains("yellow"));
}

#[test]
fn above_its_boiling_point_a_substance_is_taken_as_a_gas_and_said_so() {
    let soda = |temperature: &str| {
        let equation = "2 NaHCO3(s) = Na2CO3(s) + CO2 + H2O";
        ask(&case(equation, json!({ "from": "library" }), temperature, Json::Null))
    };
    let found = soda("127 °C");
    assert_eq!(
        found["report"]["reactions"][0]["equation"],
        "2 NaHCO3(s) = Na2CO3(s) + CO2(g) + H2O(g)"
    );
    let notes = found["report"]["notes"].as_array().unwrap();
    assert!(notes.iter().any(|note| note["code"] == "phase-assumed"), "{notes:?}");
    assert_eq!(soda("90 °C")["problems"][0]["code"], "phase-unclear");
}

#[test]
fn steam_stated_apart_settles_the_phase_of_water() {
    let mut reforming = case(
        "C + H2O = CO + H2",
        json!({ "from": "library" }),
        "800 °C",
        json!({ "gas": { "basis": "dry", "water": { "per_dry": "0.6" }, "entries": rows(&[("CO", "30 %"), ("H2", "remainder")]) } }),
    );
    reforming["reading"]["solids"] = json!({ "entries": rows(&[("C", "present")]) });
    assert_eq!(report(&reforming)["reactions"][0]["equation"], "C(s) + H2O(g) = CO(g) + H2(g)");
}

#[test]
fn what_weakens_the_answer_is_said() {
    let codes = |case: &Json| -> Vec<String> {
        let notes = report(case)["notes"].clone();
        notes
            .as_array()
            .unwrap()
            .iter()
            .map(|note| note["code"].as_str().unwrap().to_owned())
            .collect()
    };
    let mut shift = case(
        "CO + H2O(g) = CO2 + H2",
        json!({ "from": "library" }),
        "200 °C",
        gas(&[("CO", "5 %"), ("H2O", "70 %"), ("CO2", "5 %"), ("H2", "remainder")], &[]),
    );
    shift["pressure"] = json!("30 bar");
    let found = codes(&shift);
    // 21 bar of steam against a saturation pressure of 15.5 bar at 200 °C (IAPWS-IF97, from memory).
    for code in ["water-condenses", "pressure-taken-absolute", "ideal-gas", "hazards"] {
        assert!(found.iter().any(|one| one == code), "{code}: {found:?}");
    }
    let mut evaporating = case(
        "H2O(l) = H2O(g)",
        json!({ "from": "library" }),
        "25 °C",
        gas(&[("H2O", "165 ppm"), ("N2", "remainder")], &[]),
    );
    evaporating["pressure"] = json!("200 bar(a)");
    assert!(codes(&evaporating).iter().any(|one| one == "pressed-phases"));
}
