//! The classes of temperature instruments, against the figures of their standards (from memory).

use serde_json::{Value as Json, json};
use shiftgauge::case::{self, Value};
use shiftgauge::quantity::{Measure, parse, preset, show_like};

#[test]
fn limits_are_those_of_the_standards() {
    // (class, °C, limit in kelvin). IEC 60584-1:2013, table 12; IEC 60751:2008, table 2; from memory.
    let rows = [
        ("type K class 1", 375.0, 1.5),
        ("type K class 1", 1000.0, 4.0),
        ("type K class 2", 333.0, 2.5),
        ("type K class 2", 1200.0, 9.0),
        ("type K class 3", -200.0, 3.0),
        ("type N class 2", 400.0, 3.0),
        ("type J class 2", 750.0, 5.625),
        ("type E class 1", 800.0, 3.2),
        ("type T class 1", 100.0, 0.5),
        ("type T class 2", 200.0, 1.5),
        ("type S class 1", 1100.0, 1.0),
        ("type S class 1", 1600.0, 2.5),
        ("type R class 2", 600.0, 1.5),
        ("type R class 2", 1600.0, 4.0),
        ("type B class 2", 1000.0, 2.5),
        ("type B class 3", 800.0, 4.0),
        ("Pt100 class AA", 100.0, 0.27),
        ("Pt100 class A", 100.0, 0.35),
        ("Pt100 class B", 100.0, 0.8),
        ("Pt100 class B", -100.0, 0.8),
        ("Pt100 class C", 0.0, 0.6),
    ];
    for (name, celsius, limit_k) in rows {
        let found = preset(name).unwrap().limit_k(celsius);
        assert!((found - limit_k).abs() < 1e-12, "{name} at {celsius} °C: {found}");
    }
}

#[test]
fn a_class_stands_in_the_place_of_a_tolerance() {
    let u = 3.375 / 3f64.sqrt();
    for text in [
        "450 °C ± type K class 2",
        "450 °C type K class 2",
        "450 °C ±  TYPE k thermocouple Class 2",
        "723.15 K ± type K class 2",
        "842 °F type K class 2",
    ] {
        let read = parse(text, &[Measure::Temperature])
            .unwrap_or_else(|found| panic!("{text}: {found:?}"));
        let found = read.standard_uncertainty_si.unwrap();
        assert!((found - u).abs() < 1e-9, "{text}: {found}");
        let again = parse(&show_like(&read), &[Measure::Temperature]).unwrap();
        assert_eq!(again.tolerance, read.tolerance, "{text}");
    }
    let shown = show_like(&parse("450 °C pt100 class b", &[Measure::Temperature]).unwrap());
    assert_eq!(shown, "450 °C ± Pt100 class B");
}

#[test]
fn a_class_counts_in_the_verdict() {
    let case = json!({
        "format": "shiftgauge 1",
        "reactions": [{ "equation": "2 SO2 + O2 = 2 SO3", "constant": { "from": "library" } }],
        "temperature": "450 °C ± type K class 2",
        "pressure": "1.2 bar",
        "reading": { "gas": { "basis": "wet", "entries": [
            { "species": "SO2", "value": "0.5 %" }, { "species": "O2", "value": "6 %" },
            { "species": "SO3", "value": "9 %" }, { "species": "N2", "value": "remainder" }
        ] } }
    });
    let value: Value = serde_json::from_value(case).unwrap();
    let answer: Json = serde_json::to_value(case::check(&value)).unwrap();
    let rows = answer["report"]["reactions"][0]["budget"].as_array().unwrap();
    let row = rows.iter().find(|row| row["input"] == "temperature").unwrap();
    // T* does not move with T, so T − T* changes by u itself.
    assert!((row["approach_k"].as_f64().unwrap() - 3.375 / 3f64.sqrt()).abs() < 1e-9, "{row}");
}
