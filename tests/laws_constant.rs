//! What K must obey whatever its source: reverse, multiple, sum, forms and the choice of basis.

use serde_json::{Value as Json, json};
use shiftgauge::case::{self, Value};

const REACTIONS: [&str; 8] = [
    "2 SO2(g) + O2(g) = 2 SO3(g)",
    "CO(g) + H2O(g) = CO2(g) + H2(g)",
    "CH4(g) + H2O(g) = CO(g) + 3 H2(g)",
    "N2(g) + 3 H2(g) = 2 NH3(g)",
    "4 HCl(g) + O2(g) = 2 Cl2(g) + 2 H2O(g)",
    "2 CO(g) = C(s, graphite) + CO2(g)",
    "CaCO3(s) = CaO(s) + CO2(g)",
    "N2O4(g) = 2 NO2(g)",
];

const TEMPERATURES: [&str; 5] = ["300 K", "500 K", "700 K", "1000 K", "1400 K"];

fn constant(equation: &str, temperature: &str) -> Json {
    let answer = serde_json::to_value(case::constant(equation, temperature)).unwrap();
    assert_eq!(answer["ok"], true, "{equation} at {temperature}: {answer}");
    answer["constant"].clone()
}

fn ln_k(equation: &str, temperature: &str) -> f64 {
    constant(equation, temperature)["ln_k"].as_f64().unwrap()
}

fn near(found: f64, expected: f64, what: &str) {
    let allowed = 1e-12 * (1.0 + expected.abs());
    assert!((found - expected).abs() <= allowed, "{what}: {found} is not {expected}");
}

#[test]
fn the_reverse_reaction_has_the_reciprocal_k() {
    for equation in REACTIONS {
        let (left, right) = equation.split_once(" = ").unwrap();
        for temperature in TEMPERATURES {
            let reverse = ln_k(&format!("{right} = {left}"), temperature);
            near(reverse, -ln_k(equation, temperature), equation);
        }
    }
}

#[test]
fn a_multiple_of_a_reaction_has_that_power_of_k() {
    for temperature in TEMPERATURES {
        let whole = ln_k("2 SO2(g) + O2(g) = 2 SO3(g)", temperature);
        near(ln_k("SO2(g) + 1/2 O2(g) = SO3(g)", temperature), whole / 2.0, temperature);
        near(ln_k("6 SO2(g) + 3 O2(g) = 6 SO3(g)", temperature), whole * 3.0, temperature);
    }
}

#[test]
fn k_of_a_sum_of_reactions_is_the_product() {
    for temperature in TEMPERATURES {
        let reforming = ln_k("CH4(g) + H2O(g) = CO(g) + 3 H2(g)", temperature);
        let shift = ln_k("CO(g) + H2O(g) = CO2(g) + H2(g)", temperature);
        let both = ln_k("CH4(g) + 2 H2O(g) = CO2(g) + 4 H2(g)", temperature);
        near(both, reforming + shift, temperature);
    }
}

#[test]
fn the_order_of_species_does_not_matter() {
    for temperature in TEMPERATURES {
        let one = ln_k("CO(g) + H2O(g) = CO2(g) + H2(g)", temperature);
        near(ln_k("H2O(g) + CO(g) = H2(g) + CO2(g)", temperature), one, temperature);
    }
}

#[test]
fn gibbs_enthalpy_and_entropy_agree_with_k() {
    for equation in REACTIONS {
        for temperature in TEMPERATURES {
            let found = constant(equation, temperature);
            let of = |name: &str| found[name].as_f64().unwrap();
            let (t, gibbs) = (of("temperature_k"), of("gibbs_standard_j_per_mol"));
            let rt = 8.314_462_618_153_24 * t;
            near(gibbs, -rt * of("ln_k"), equation);
            let (enthalpy, entropy) =
                (of("enthalpy_standard_j_per_mol"), of("entropy_standard_j_per_mol_k"));
            // H and T S are each some hundred kJ/mol, so their difference is good to 1e-9 kJ.
            assert!((enthalpy - t * entropy - gibbs).abs() < 1e-6, "{equation} at {temperature}");
        }
    }
}

#[test]
fn the_forms_of_k_differ_by_the_pressure_units_alone() {
    // (form, unit, log10 of its factor for one more gas molecule): a standard atmosphere is
    // 1.01325 bar by definition, and a bar is 100 kPa.
    let rows = [("bar", 0.0), ("atm", -1.01325_f64.log10()), ("kPa", 2.0)];
    for (equation, delta_nu) in [
        ("2 SO2(g) + O2(g) = 2 SO3(g)", -1.0),
        ("N2O4(g) = 2 NO2(g)", 1.0),
        ("CH4(g) + H2O(g) = CO(g) + 3 H2(g)", 2.0),
    ] {
        let found = constant(equation, "700 K");
        let log10_k = found["log10_k"].as_f64().unwrap();
        for (unit, factor) in rows {
            let form = found["forms"].as_array().unwrap().iter().find(|form| {
                form["name"] == "Kp" && form["unit"].as_str().unwrap().starts_with(unit)
            });
            let log10 = form.unwrap_or_else(|| panic!("{equation} in {unit}"))["log10"].clone();
            near(log10.as_f64().unwrap(), log10_k + delta_nu * factor, equation);
        }
    }
}

/// A case that asks for K of the SO2 oxidation from a stated number.
fn stated(constant: &Json, pressure: &str) -> Json {
    let case = json!({
        "format": "shiftgauge 1",
        "reactions": [{ "equation": "2 SO2(g) + O2(g) = 2 SO3(g)", "constant": constant }],
        "temperature": "700 K",
        "pressure": pressure
    });
    let value: Value = serde_json::from_value(case).unwrap();
    let answer = serde_json::to_value(case::check(&value)).unwrap();
    assert_eq!(answer["ok"], true, "{answer}");
    answer["report"]["reactions"][0].clone()
}

#[test]
fn every_form_of_k_read_back_gives_the_same_k() {
    let library = ln_k("2 SO2(g) + O2(g) = 2 SO3(g)", "700 K");
    let from_library = stated(&json!({ "from": "library" }), "3 bar");
    let mut read = 0;
    for form in from_library["forms"].as_array().unwrap() {
        let (name, value) = (&form["name"], form["value"].as_f64().unwrap());
        let unit = form["unit"].as_str().unwrap().split('^').next().unwrap();
        let unit = if name == "Kp" { json!(unit) } else { Json::Null };
        let constant = json!({
            "from": "value", "kind": name, "value": format!("{value:e}"), "pressure_unit": unit
        });
        near(stated(&constant, "3 bar")["ln_k"].as_f64().unwrap(), library, &format!("{form}"));
        read += 1;
    }
    assert_eq!(read, 6, "K, three Kp, Kc and Kx");
    let log10 = library / std::f64::consts::LN_10;
    let gibbs = -library * 8.314_462_618_153_24 * 700.0;
    for (kind, text) in [
        ("ln K", format!("{library:?}")),
        ("log10 K", format!("{log10:?}")),
        ("pK", format!("{:?}", -log10)),
        ("gibbs", format!("{gibbs:?} J/mol")),
    ] {
        let constant = json!({ "from": "value", "kind": kind, "value": text });
        near(stated(&constant, "3 bar")["ln_k"].as_f64().unwrap(), library, kind);
    }
}

#[test]
fn a_number_for_another_multiple_or_the_reverse_is_converted() {
    let library = ln_k("2 SO2(g) + O2(g) = 2 SO3(g)", "700 K");
    // Kp in atm of the half reaction and of its reverse, which carry atm^-1/2 and atm^1/2.
    let half = library / 2.0 - 0.5 * (1.0_f64 / 1.01325).ln();
    for (equation, ln) in [("SO2 + 1/2 O2 = SO3", half), ("SO3(g) = SO2(g) + 1/2 O2(g)", -half)] {
        let constant = json!({
            "from": "value", "kind": "Kp", "pressure_unit": "atm",
            "value": format!("{:e}", ln.exp()), "for": equation
        });
        near(stated(&constant, "3 bar")["ln_k"].as_f64().unwrap(), library, equation);
    }
}

#[test]
fn an_enthalpy_carries_a_stated_k_as_van_t_hoff_says() {
    let constant = json!({
        "from": "value", "kind": "K", "value": "1000", "at": "650 K", "enthalpy": "-198 kJ/mol"
    });
    let found = stated(&constant, "3 bar")["ln_k"].as_f64().unwrap();
    // ln K₂ = ln K₁ − (ΔH/R)(1/T₂ − 1/T₁), worked by hand:
    // 6.907755 + 23813.9 K × (1/700 − 1/650) = 6.907755 − 2.616915 = 4.290840.
    assert!((found - 4.290_840).abs() < 2e-5, "{found}");
}

/// log10 K at three temperatures evenly spaced in 1/T, as points of a case.
fn points(log10_k: [&str; 3], at: &str) -> Json {
    let [one, two, three] = log10_k;
    let case = json!({
        "format": "shiftgauge 1",
        "reactions": [{
            "equation": "2 SO2(g) + O2(g) = 2 SO3(g)",
            "constant": { "from": "points", "kind": "log10 K", "points": [
                ["1000 K", one], ["800 K", two], ["666.6666666666666 K", three]
            ] }
        }],
        "temperature": at
    });
    let value: Value = serde_json::from_value(case).unwrap();
    let answer = serde_json::to_value(case::check(&value)).unwrap();
    assert_eq!(answer["ok"], true, "{answer}");
    answer["report"]["reactions"][0].clone()
}

#[test]
fn points_give_the_straight_line_that_fits_them_best() {
    // log10 K = 10000/T − 9 at 1/T = 0.0010, 0.00125 and 0.0015: 1, 3.5 and 6. Moving them by +d, −2d
    // and +d leaves the line where it is, for these are orthogonal to a shift and to a tilt; then
    // s² = 6 d² with one degree of freedom and s/√3 at the middle (d = 0.01: 0.014142), widened by
    // half of Student's t for one degree of freedom, 12.706/2.
    let slope = 10_000.0 * std::f64::consts::LN_10;
    for (log10_k, u_log10_k) in
        [(["1", "3.5", "6"], 0.0), (["1.01", "3.48", "6.01"], 0.014_142_135_6 * 6.353)]
    {
        let found = points(log10_k, "800 K");
        let of = |name: &str| found[name].as_f64().unwrap();
        assert!((of("log10_k") - 3.5).abs() < 1e-11, "{found}");
        let enthalpy = -8.314_462_618_153_24 * slope;
        assert!((of("enthalpy_standard_j_per_mol") / enthalpy - 1.0).abs() < 1e-10);
        assert!((of("u_ln_k") / std::f64::consts::LN_10 - u_log10_k).abs() < 1e-9, "{found}");
    }
}

#[test]
fn stated_tolerances_weigh_the_points() {
    // Two points alone carry their tolerances on: at the first, u(log10 K) is the half of ± 0.02.
    let found = points(["1 ± 0.02", "3.5 ± 0.02", "6 ± 1000"], "1000 K");
    let u = found["u_ln_k"].as_f64().unwrap() / std::f64::consts::LN_10;
    assert!((u - 0.01).abs() < 1e-6, "{u}");
    let far = points(["1 ± 0.02", "3.5 ± 0.02", "6 ± 0.02"], "500 K");
    let extrapolated = far["source"]["extrapolated_by_k"].as_f64().unwrap();
    assert!((extrapolated - (2000.0 / 3.0 - 500.0)).abs() < 1e-9, "{extrapolated}");
}
