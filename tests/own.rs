//! A user's own species and constants: K from them by hand, beside the library's, and in a case.

use serde_json::{Value as Json, json};
use shiftgauge::case::{self, Value};
use shiftgauge::library::{self, Book, FIGURES_AGREE_J_PER_MOL, OwnFigures, OwnHeat, Record};
use shiftgauge::reaction::{Phase, parse_species};

use crate::library::kelvin;

const R: f64 = 8.314_462_618_153_24;

fn figures(species: &str, enthalpy: f64, entropy: f64, heat: Vec<OwnHeat>) -> OwnFigures {
    OwnFigures {
        species: parse_species(species).unwrap(),
        names: vec!["ours".to_owned()],
        cas: String::new(),
        enthalpy_j_per_mol: Some(enthalpy),
        gibbs_j_per_mol: None,
        entropy_j_per_mol_k: Some(entropy),
        heat,
        u_gibbs_j_per_mol: 250.0,
        source: "Our laboratory".to_owned(),
    }
}

fn constant_heat(low_k: f64, high_k: f64, heat: f64) -> OwnHeat {
    OwnHeat {
        low_k,
        high_k,
        terms: [0.0, 0.0, heat, 0.0, 0.0, 0.0, 0.0],
        transition_j_per_mol: 0.0,
    }
}

#[test]
fn figures_of_a_user_give_the_integrals_of_their_heat_capacity() {
    // Cp = 30 + 0.02 T below a transition of 1200 J/mol at 600 K, and 50 above it.
    let mut low = constant_heat(250.0, 600.0, 30.0);
    low.terms[3] = 0.02;
    let high = OwnHeat { transition_j_per_mol: 1200.0, ..constant_heat(600.0, 1500.0, 50.0) };
    let record = Record::own(figures("XeO3(s)", 402_000.0, 95.0, vec![low, high])).unwrap();
    let (t0, t) = (298.15_f64, 800.0_f64);
    let rise = 30.0 * (600.0 - t0) + 0.01 * (600.0 * 600.0 - t0 * t0) + 1200.0 + 50.0 * 200.0;
    let gained = 30.0 * (600.0 / t0).ln() + 0.02 * (600.0 - t0) + 2.0 + 50.0 * (t / 600.0f64).ln();
    let at = record.properties(kelvin(t));
    assert!((at.enthalpy_j_per_mol - 402_000.0 - rise).abs() < 1e-6, "{at:?}");
    assert!((at.entropy_j_per_mol_k - 95.0 - gained).abs() < 1e-10, "{at:?}");
    let below = 30.0 * (260.0 - t0) + 0.01 * (260.0 * 260.0 - t0 * t0);
    assert!((record.properties(kelvin(260.0)).enthalpy_j_per_mol - 402_000.0 - below).abs() < 1e-6);
    let [passed] = record.transitions()[..] else { panic!("{:?}", record.transitions()) };
    assert!((passed.enthalpy_j_per_mol - 1200.0).abs() < 1e-6 && passed.temperature_k == 600.0);
    let g = |t: f64| record.gibbs_over_rt(kelvin(t));
    assert!((g(600.0 - 1e-7) - g(600.0)).abs() < 1e-6, "G° steps at a transition");
    assert_eq!((record.range_k, record.id.as_ref()), ((250.0, 1500.0), "XeO3.s"));
}

#[test]
fn two_of_three_figures_give_the_third_for_every_record_of_the_tables() {
    let mut used = 0;
    for known in library::all() {
        let Some(gibbs) = known.formation_gibbs_j_per_mol() else { continue };
        let heat = vec![constant_heat(290.0, 310.0, 40.0)];
        let mut given = figures(
            &known.label(),
            known.formation_enthalpy_j_per_mol,
            known.standard_entropy_j_per_mol_k,
            heat,
        );
        given.entropy_j_per_mol_k = None;
        given.gibbs_j_per_mol = Some(gibbs);
        if known.standard_entropy_j_per_mol_k > 0.0 || known.phase == Phase::Aqueous {
            let from_enthalpy = Record::own(given.clone()).unwrap();
            let apart =
                from_enthalpy.standard_entropy_j_per_mol_k - known.standard_entropy_j_per_mol_k;
            assert!(apart.abs() < 1e-8, "{}: S° is {apart} off", known.id);
        }
        given.entropy_j_per_mol_k = Some(known.standard_entropy_j_per_mol_k);
        given.enthalpy_j_per_mol = None;
        let from_gibbs = Record::own(given.clone());
        if let Ok(from_gibbs) = from_gibbs {
            let apart =
                from_gibbs.formation_enthalpy_j_per_mol - known.formation_enthalpy_j_per_mol;
            assert!(apart.abs() < 1e-6, "{}: ΔfH° is {apart} off", known.id);
        }
        used += 1;
    }
    assert!(used > 180, "{used}");
    // Water by the CRC table: ΔfH° −285.8, S° 70.0, ΔfG° −237.1, rounded as it is.
    let mut water = figures("H2O(l)", -285_800.0, 70.0, vec![constant_heat(290.0, 310.0, 75.3)]);
    water.gibbs_j_per_mol = Some(-237_100.0);
    let follows = Record::own(water).unwrap().formation_gibbs_j_per_mol().unwrap();
    assert!((follows + 237_100.0).abs() < 100.0 && 100.0 < FIGURES_AGREE_J_PER_MOL, "{follows}");
}

#[test]
fn a_book_stands_before_the_tables() {
    let heat = || vec![constant_heat(273.15, 1000.0, 50.0)];
    let own = Record::own(figures("SO3(g)", -395_000.0, 256.8, heat())).unwrap();
    let new = Record::own(figures("SO3(g, trimer unit)", -400_000.0, 200.0, heat())).unwrap();
    let book = Book::new(vec![own, new]);
    let ids = |found: Vec<library::Known>| {
        found.iter().map(|one| (one.id.to_string(), one.is_own())).collect::<Vec<_>>()
    };
    let found = ids(book.find("SO3", Some(Phase::Gas), None));
    assert_eq!(found, [("SO3.g".to_owned(), true), ("SO3.g.trimer unit".to_owned(), true)]);
    assert_eq!(ids(book.find("SO2", Some(Phase::Gas), None)), [("SO2.g".to_owned(), false)]);
    let searched = book.search("sulfur trioxide", 8);
    assert!(searched.iter().all(|one| one.record.id != "SO3.g"), "the tables' is hidden");
    assert_eq!(book.search("ours", 8).len(), 2);
}

fn ask(case: &Json) -> Json {
    let value: Value = serde_json::from_value(case.clone()).unwrap();
    serde_json::to_value(case::check(&value)).unwrap()
}

fn case_with(constant: Json, book: Json) -> Json {
    json!({
        "format": "shiftgauge 1",
        "reactions": [{ "equation": "SO2 + 1/2 O2 = SO3", "constant": constant }],
        "temperature": "700 K",
        "pressure": "1 bar",
        "reading": { "gas": { "basis": "wet", "entries": [
            { "species": "SO2", "value": "2 %" }, { "species": "O2", "value": "6 %" },
            { "species": "SO3", "value": "8 %" }, { "species": "N2", "value": "remainder" }
        ] } },
        "book": book
    })
}

#[test]
fn a_case_uses_the_users_own_species_and_says_what_that_changes() {
    let library = ask(&case_with(json!({ "from": "library" }), Json::Null));
    let so3 = library::find("SO3", Some(Phase::Gas), None)[0];
    let at = so3.properties(kelvin(700.0));
    // Our SO3 is the library's at 298.15 K but for 1 kJ/mol; its Cp is 50 J/(mol K) throughout.
    let enthalpy = so3.formation_enthalpy_j_per_mol + 1000.0;
    let entropy = so3.standard_entropy_j_per_mol_k;
    let g =
        enthalpy + 50.0 * (700.0 - 298.15) - 700.0 * (entropy + 50.0 * (700.0f64 / 298.15).ln());
    let book = json!({ "species": [{
        "species": "SO3(g)", "names": "our trioxide", "source": "Invented works, test bench",
        "enthalpy": format!("{} ± 0.6 kJ/mol", enthalpy / 1000.0),
        "entropy": format!("{entropy} ± 0.4 J/(mol K)"),
        "heat_capacity": [{ "from": "273.15 K", "to": "1000 K", "terms": { "1": "50" } }]
    }] });
    let own = ask(&case_with(json!({ "from": "library" }), book));
    assert_eq!(own["ok"], true, "{own}");
    let ln_k = |answer: &Json| answer["report"]["reactions"][0]["ln_k"].as_f64().unwrap();
    let expected = -(g - at.gibbs_j_per_mol) / (R * 700.0);
    assert!((ln_k(&own) - ln_k(&library) - expected).abs() < 1e-9, "{}", ln_k(&own));
    let records = own["report"]["reactions"][0]["source"]["records"].as_array().unwrap();
    let ours = records.iter().find(|row| row["own"] == true).unwrap();
    assert_eq!((&ours["species"], &ours["u_from"]), (&json!("SO3(g)"), &json!("own")));
    // u = √(300² + (298.15 × 0.2)²) J/mol.
    let u = (300.0f64.powi(2) + (298.15f64 * 0.2).powi(2)).sqrt();
    assert!((ours["u_gibbs_j_per_mol"].as_f64().unwrap() - u).abs() < 1e-9);
    let notes = own["report"]["notes"].as_array().unwrap();
    let note = notes.iter().find(|note| note["code"] == "own-record").unwrap();
    let text = note["text"].as_str().unwrap();
    assert!(text.contains("Invented works") && text.contains("library's record log10 K"), "{text}");
}

#[test]
fn a_case_takes_k_from_the_book_for_any_multiple_of_the_reaction() {
    let kept = |equation: &str, value: &str| {
        let constant = json!({ "from": "value", "kind": "log10 K", "value": value, "at": "700 K" });
        json!({ "constants": [{ "equation": equation, "constant": constant, "source": "Ours" }] })
    };
    for (equation, value) in [
        ("SO2(g) + 1/2 O2(g) = SO3(g)", "2.5"),
        ("2 SO2(g) + O2(g) = 2 SO3(g)", "5"),
        ("SO3 = SO2 + 0.5 O2", "-2.5"),
    ] {
        let mut case = case_with(json!({ "from": "book" }), kept(equation, value));
        case["reactions"][0]["equation"] = json!("SO2(g) + 1/2 O2(g) = SO3(g)");
        let answer = ask(&case);
        let log10_k = answer["report"]["reactions"][0]["log10_k"].as_f64();
        assert!((log10_k.unwrap() - 2.5).abs() < 1e-12, "{equation}: {answer}");
    }
}

#[test]
fn a_book_is_looked_through_by_itself() {
    let book = json!({
        "format": "shiftgauge book 1",
        "title": "Invented works",
        "species": [{
            "species": "SO3(g)", "source": "Ours", "gibbs": "-371 ± 1 kJ/mol",
            "entropy": "256.8 J/(mol K)",
            "heat_capacity": [{ "from": "25 °C", "to": "1000 K", "terms": { "1": "50" } }]
        }],
        "constants": [{
            "equation": "SO2 + 1/2 O2 = SO3", "source": "Ours",
            "constant": { "from": "points", "kind": "K", "points": [["400 °C", "420"], ["500 °C", "48"]] }
        }]
    });
    let value: Value = serde_json::from_value(book).unwrap();
    let answer = serde_json::to_value(case::book(&value)).unwrap();
    assert_eq!(answer["species"][0]["species"], "SO3(g)", "{answer}");
    assert_eq!(answer["species"][0]["u_gibbs_j_per_mol"], 500.0);
    assert_eq!(answer["constants"][0]["from"], "points");
    assert_eq!(answer["format"], "shiftgauge book 1");
}

#[test]
fn a_sheet_shows_the_library_beside_ones_own() {
    let heat = json!([{ "from": "250 K", "to": "900 K", "terms": { "1": "40", "T": "0.02" } }]);
    let asked = json!({ "temperature": "1000 K", "book": { "species": [{
        "species": "SO2(g)", "source": "Ours", "enthalpy": "-297 kJ/mol",
        "entropy": "248 J/(mol K)", "heat_capacity": heat
    }] } });
    let value: Value = serde_json::from_value(asked).unwrap();
    let answer = serde_json::to_value(case::sheet("SO2(g)", &value)).unwrap();
    let sheet = &answer["sheet"];
    assert_eq!(sheet["own"], true, "{answer}");
    assert_eq!(sheet["at"]["outside_by_k"], 100.0);
    let table = library::find("SO2", Some(Phase::Gas), None)[0];
    let apart = sheet["instead_of"]["enthalpy_j_per_mol"].as_f64().unwrap();
    assert!((apart - (table.formation_enthalpy_j_per_mol + 297_000.0)).abs() < 1e-9);
    let kelvins = sheet["curve"]["temperature_k"].as_array().unwrap();
    let rising = kelvins.windows(2).all(|two| two[0].as_f64() <= two[1].as_f64());
    assert!(rising && kelvins.len() >= 90);
    let plain = serde_json::to_value(case::sheet("SO2(g)", &Value::Null)).unwrap();
    assert_eq!(plain["sheet"]["instead_of"], Json::Null);
    assert_eq!(plain["sheet"]["own"], false);
}
