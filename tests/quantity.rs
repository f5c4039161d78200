//! Quantities as people type them: what is read, what is refused and where, what is shown.

use shiftgauge::problem::Outcome;
use shiftgauge::problem::QuantityCode;
use shiftgauge::problem::words;
use shiftgauge::quantity::Measure::{self, *};
use shiftgauge::quantity::PressureReference as Reference;
use shiftgauge::quantity::{FractionBasis, Quantity, parse, read_number, show_like};

/// The codes of an outcome with the text that each span selects.
fn faults<T: std::fmt::Debug>(text: &str, outcome: Outcome<T>) -> Vec<String> {
    let units: Vec<u16> = text.encode_utf16().collect();
    let describe = |problem: shiftgauge::problem::Problem| {
        let span =
            problem.span.map(|span| String::from_utf16(&units[span.start..span.end]).unwrap());
        format!("{} @{}", problem.code.as_str(), span.unwrap_or_default().trim())
    };
    outcome.expect_err(text).into_iter().map(describe).collect()
}

fn read(text: &str, measure: Measure) -> Quantity {
    parse(text, &[measure]).unwrap_or_else(|problems| panic!("{text}: {problems:?}"))
}

#[test]
fn a_number_is_read_however_it_is_typed() {
    let rows: [(&str, f64); 44] = [
        ("0", 0.0),
        ("-0", 0.0),
        ("4.3", 4.3),
        ("4,3", 4.3),
        ("+4.3", 4.3),
        ("-4.3", -4.3),
        ("−4.3", -4.3),
        ("– 4.3", -4.3),
        (".5", 0.5),
        (",5", 0.5),
        ("5.", 5.0),
        ("  12 ", 12.0),
        ("007", 7.0),
        ("1.2e-3", 1.2e-3),
        ("1.2E+3", 1200.0),
        ("1,2e−3", 1.2e-3),
        ("1.2×10^-3", 1.2e-3),
        ("1.2 × 10^-3", 1.2e-3),
        ("1.2·10^-3", 1.2e-3),
        ("1.2*10^-3", 1.2e-3),
        ("1.2x10^-3", 1.2e-3),
        ("1.2×10**-3", 1.2e-3),
        ("1.2×10^(-3)", 1.2e-3),
        ("1.2×10⁻³", 1.2e-3),
        ("1.2×10³", 1200.0),
        ("10⁻³", 1e-3),
        ("10^4", 1e4),
        ("-10^4", -1e4),
        ("1 234", 1234.0),
        ("1 234 567", 1_234_567.0),
        ("1\u{a0}234,5", 1234.5),
        ("1\u{2009}234.5", 1234.5),
        ("1\u{202f}234.5", 1234.5),
        ("1'234.5", 1234.5),
        ("1’234’567,5", 1_234_567.5),
        ("1.234,5", 1234.5),
        ("1,234.5", 1234.5),
        ("1,234.567", 1234.567),
        ("1.234.567", 1_234_567.0),
        ("1,234,567", 1_234_567.0),
        ("1.234", 1.234),
        ("0,234", 0.234),
        ("1234,567", 1234.567),
        ("8.314 462 618 153 24", 8.314_462_618_153_24),
    ];
    for (text, value) in rows {
        let read = read_number(text).unwrap_or_else(|problems| panic!("{text}: {problems:?}"));
        assert_eq!(read.value.to_bits(), value.to_bits(), "{text} was read as {}", read.value);
    }
    let more: [(&str, f64); 4] =
        [("12,34", 12.34), ("1,2345", 1.2345), ("1e-310", 1e-310), ("0e999999999", 0.0)];
    for (text, value) in more {
        assert_eq!(read_number(text).unwrap().value, value, "{text}");
    }
}

#[test]
fn a_number_that_is_none_or_two_is_refused_at_its_place() {
    let rows = [
        ("", "quantity-empty @"),
        (" \t", "quantity-empty @"),
        ("abc", "number-not-read @abc"),
        ("-", "number-not-read @-"),
        (".", "number-not-read @."),
        ("NaN", "number-not-read @NaN"),
        ("∞", "number-not-read @∞"),
        ("٣", "number-not-read @٣"),
        ("1,234", "number-ambiguous @1,234"),
        ("-12,345", "number-ambiguous @-12,345"),
        ("123,456e3", "number-ambiguous @123,456e3"),
        ("1.2.3", "number-shape @1.2.3"),
        ("1,23.5", "number-shape @1,23.5"),
        ("1.234.5", "number-shape @1.234.5"),
        ("1 23", "number-shape @1 23"),
        ("0 123", "number-shape @0 123"),
        ("1 234'567", "number-shape @1 234'567"),
        ("1,234.567,8", "number-shape @1,234.567,8"),
        ("5,", "number-shape @5,"),
        ("27.4 28.1", "number-shape @27.4 28.1"),
        ("1.2×10", "number-power @1.2×10"),
        ("1e400", "number-too-large @1e400"),
        ("-1e99999999999", "number-too-large @-1e99999999999"),
        ("1e-400", "number-too-small @1e-400"),
        ("𝕏 5", "number-not-read @𝕏 5"),
        ("5 𝕏", "number-tail @𝕏"),
        ("1e", "number-tail @e"),
        ("5³", "number-tail @³"),
    ];
    for (text, expected) in rows {
        assert_eq!(faults(text, read_number(text)), [expected], "{text:?}");
    }
}

#[test]
fn two_readings_of_a_number_are_both_named() {
    let problems = read_number("1,234").unwrap_err();
    let sentence = words::say(&problems[0], words::Language::En);
    assert_eq!(sentence.message, "“1,234” can be read as 1.234 or as 1234.");
}

#[test]
fn a_quantity_comes_out_in_si_with_half_its_tolerance() {
    let rows: [(&str, Measure, f64, Option<f64>); 33] = [
        ("215 °C", Temperature, 488.15, None),
        ("215 ± 2 °C", Temperature, 488.15, Some(1.0)),
        ("215 °C ± 2 °C", Temperature, 488.15, Some(1.0)),
        ("215 °C ± 2", Temperature, 488.15, Some(1.0)),
        ("215 °C ± 2 K", Temperature, 488.15, Some(1.0)),
        ("215 °C ± 3.6 °F", Temperature, 488.15, Some(1.0)),
        ("(215 ± 2) °C", Temperature, 488.15, Some(1.0)),
        ("(215 °C ± 2 °C)", Temperature, 488.15, Some(1.0)),
        ("( 215 ± 2 )°C", Temperature, 488.15, Some(1.0)),
        ("215±2degC", Temperature, 488.15, Some(1.0)),
        ("215 +/- 2 C", Temperature, 488.15, Some(1.0)),
        ("215 ± 1 % rel °C", Temperature, 488.15, Some(1.075)),
        ("-40 °F", Temperature, 233.15, None),
        ("419 ± 3.6 °F", Temperature, 488.15, Some(1.0)),
        ("10 K", TemperatureDifference, 10.0, None),
        ("18 °F", TemperatureDifference, 10.0, None),
        ("-10 °C", TemperatureDifference, -10.0, None),
        ("27.4 ± 0.2 bar(g)", Pressure, 2.74e6, Some(1e4)),
        ("27.4 bar(g) ± 0.2 bar", Pressure, 2.74e6, Some(1e4)),
        ("27.4 bar(g) ± 0.2 bar(g)", Pressure, 2.74e6, Some(1e4)),
        ("(27.4 bar(g) ± 200 mbar)", Pressure, 2.74e6, Some(1e4)),
        ("27.4 ± 2 rel bar", Pressure, 2.74e6, Some(27_400.0)),
        ("27.4 bar ± 2 % rel", Pressure, 2.74e6, Some(27_400.0)),
        ("27.4 bar ± 2 %rel.", Pressure, 2.74e6, Some(27_400.0)),
        ("-0.2 ± 2 rel bar(g)", Pressure, -2e4, Some(200.0)),
        ("0,42 ± 0,02 %", Fraction, 0.0042, Some(0.0001)),
        ("0.42 ± 0 %", Fraction, 0.0042, Some(0.0)),
        ("0.42 % ± 50 ppm", Fraction, 0.0042, Some(2.5e-5)),
        ("0.30 ± 0.02", Ratio, 0.3, Some(0.01)),
        ("48.2", Number, 48.2, None),
        ("pH 7.2 ± 0.1", Ph, 7.2, Some(0.05)),
        ("7.2 pH", Ph, 7.2, None),
        ("pH = 7,2", Ph, 7.2, None),
    ];
    for (text, measure, value, uncertainty) in rows {
        let quantity = read(text, measure);
        let near = |a: f64, b: f64| (a - b).abs() <= 1e-12 * b.abs();
        assert!(near(quantity.value_si, value), "{text}: {quantity:?}");
        assert_eq!(quantity.standard_uncertainty_si.is_some(), uncertainty.is_some(), "{text}");
        let u = quantity.standard_uncertainty_si.unwrap_or(0.0);
        assert!(near(u, uncertainty.unwrap_or(0.0)), "{text}: u = {u}");
        assert!(!quantity.is_bound && quantity.measure == measure, "{text}");
    }
}

#[test]
fn gauge_and_absolute_are_told_apart_in_every_spelling() {
    let gauge = ["27 bar(g)", "27 barg", "27 bar g", "27 bar (g)", "27 bar gauge", "27 BARG"];
    let absolute = ["27 bar(a)", "27 bara", "27 bar a", "27 bar abs", "27 bar(abs)", "27 BARA"];
    let unstated = ["27 bar", "27 hPa", "27 kPa", "27 mmHg", "27 inHg", "27 kgf/cm2", "27 at"];
    let more_gauge = ["27 psig", "27 kPag", "27 MPa(g)", "27 kg/cm2(g)", "27 kgf/cm² g", "27 PSIG"];
    let rows = [
        (&gauge[..], Reference::Gauge),
        (&more_gauge[..], Reference::Gauge),
        (&absolute[..], Reference::Absolute),
        (&["27 psia", "27 kPa(a)", "27 ata", "27 mmHga"][..], Reference::Absolute),
        (&unstated[..], Reference::Unstated),
    ];
    for (texts, reference) in rows {
        for text in texts {
            assert_eq!(read(text, Pressure).pressure_reference, reference, "{text}");
        }
    }
}

#[test]
fn a_fraction_says_what_it_is_a_part_of() {
    let rows = [
        ("4.5 %", 0.045, FractionBasis::Unstated),
        ("0.045", 0.045, FractionBasis::Unstated),
        ("5 ppm", 5e-6, FractionBasis::Unstated),
        ("5 ppb", 5e-9, FractionBasis::Unstated),
        ("5 ‰", 5e-3, FractionBasis::Unstated),
        ("4.5 mol %", 0.045, FractionBasis::Amount),
        ("4.5 mol%", 0.045, FractionBasis::Amount),
        ("4.5 mole %", 0.045, FractionBasis::Amount),
        ("4.5 vol %", 0.045, FractionBasis::Volume),
        ("4.5 vol.%", 0.045, FractionBasis::Volume),
        ("5 ppmv", 5e-6, FractionBasis::Volume),
        ("4.5 wt%", 0.045, FractionBasis::Mass),
        ("4.5 % w/w", 0.045, FractionBasis::Mass),
        ("100 %", 1.0, FractionBasis::Unstated),
    ];
    for (text, value, basis) in rows {
        let quantity = read(text, Fraction);
        assert_eq!((quantity.value_si, quantity.fraction_basis), (value, basis), "{text}");
    }
}

#[test]
fn a_bound_is_read_where_nothing_is_the_least() {
    for text in ["< 5 ppm", "<5 ppm", "≤ 5 ppm", "<= 5ppm"] {
        let quantity = read(text, Fraction);
        assert!(quantity.is_bound && quantity.value_si == 5e-6, "{text}");
        assert_eq!(show_like(&quantity), "< 5 ppm");
    }
    assert!(read("< 0.1 mbar", Pressure).is_bound);
}

#[test]
fn the_first_allowed_measure_that_fits_is_taken() {
    let entry = [Fraction, Pressure, Amount, AmountRate, MassPerAmount];
    let rows = [
        ("19.6 ± 0.3 %", Fraction),
        ("0.2", Fraction),
        ("3 bar", Pressure),
        ("3 kmol", Amount),
        ("3 kmol/h", AmountRate),
        ("250 mg/Nm3", MassPerAmount),
    ];
    for (text, measure) in rows {
        assert_eq!(parse(text, &entry).unwrap().measure, measure, "{text}");
    }
    assert_eq!(parse("5 K", &[TemperatureDifference, Temperature]).unwrap().value_si, 5.0);
    assert_eq!(parse("5 °C", &[Temperature, TemperatureDifference]).unwrap().value_si, 278.15);
}

#[test]
#[rustfmt::skip]
fn a_mistake_has_its_own_code_and_place() {
    let rows: [(&str, Measure, &[&str]); 52] = [
        ("215", Temperature, &["unit-missing @215"]),
        ("215 kPa", Temperature, &["unit-mismatch @kPa"]),
        ("215 °C", Pressure, &["unit-mismatch @°C"]),
        ("215 °C", Number, &["unit-not-wanted @°C"]),
        ("215 foo", Number, &["unit-not-wanted @foo"]),
        ("3 furlong", Pressure, &["unit-unknown @furlong"]),
        ("3 MPA", Pressure, &["unit-near @MPA"]),
        ("3 barr", Pressure, &["unit-near @barr"]),
        ("3 Cal/mol", MolarEnergy, &["unit-near @Cal/mol"]),
        ("7.2", Ph, &["ph-missing @7.2"]),
        ("pH 7.2", Temperature, &["unit-mismatch @pH"]),
        ("pH 7.2 bar", Ph, &["unit-twice @bar"]),
        ("(215 °C ± 2) K", Temperature, &["unit-twice @K"]),
        ("27 bar ± 2 % rel bar", Pressure, &["unit-twice @bar"]),
        ("-300 °C", Temperature, &["quantity-out-of-range @-300"]),
        ("0 K", Temperature, &["quantity-out-of-range @0"]),
        ("20001 K", Temperature, &["quantity-out-of-range @20001"]),
        ("-0.2 bar", Pressure, &["pressure-below-vacuum @-0.2"]),
        ("0 bar(a)", Pressure, &["quantity-out-of-range @0"]),
        ("-1.3 bar(g)", Pressure, &["quantity-out-of-range @-1.3"]),
        ("1e300 kmol", Amount, &["quantity-out-of-range @1e300"]),
        ("-2 kmol", Amount, &["quantity-out-of-range @-2"]),
        ("101 %", Fraction, &["fraction-over-one @101"]),
        ("4.5", Fraction, &["fraction-percent @4.5"]),
        ("450", Fraction, &["fraction-over-one @450"]),
        ("-0.1 %", Fraction, &["quantity-out-of-range @-0.1"]),
        ("0 m3", Volume, &["quantity-out-of-range @0"]),
        ("215 ± °C", Temperature, &["number-not-read @°C"]),
        ("215 °C ±", Temperature, &["tolerance-missing @"]),
        ("215 ± -2 °C", Temperature, &["tolerance-negative @-2"]),
        ("215 °C ± 2 bar", Temperature, &["tolerance-unit @bar"]),
        ("4 wt % ± 0.1 mol %", Fraction, &["tolerance-unit @mol %"]),
        ("27 bar ± 2 %", Pressure, &["tolerance-percent @%"]),
        ("500 ppm ± 2 %", Fraction, &["tolerance-percent @%"]),
        ("27 ± 1 ± 2 bar", Pressure, &["tolerance-twice @±"]),
        ("(27 ± 1) bar ± 2", Pressure, &["tolerance-twice @±"]),
        ("> 5 ppm", Fraction, &["bound-above @>"]),
        ("< 5 ± 1 ppm", Fraction, &["bound-tolerance @<"]),
        ("< 215 °C", Temperature, &["bound-not-here @<"]),
        ("(215 ± 2 °C", Temperature, &["parenthesis-open @("]),
        ("215 °C ± type Q class 2", Temperature, &["preset-unknown @type Q class 2"]),
        ("215 °C type K class 4", Temperature, &["preset-class @type K class 4"]),
        ("215 ± Pt100 class B °C", Temperature, &["preset-unknown @Pt100 class B °C"]),
        ("1300 °C ± type K class 2", Temperature, &["preset-range @type K class 2"]),
        ("2 bar ± type K class 2", Pressure, &["preset-not-here @type K class 2"]),
        ("type K class 2", Temperature, &["number-not-read @"]),
        ("1,234 ± 2,345 bar", Pressure, &["number-ambiguous @1,234", "number-ambiguous @2,345"]),
        ("1.2.3 furlong", Pressure, &["number-shape @1.2.3", "unit-unknown @furlong"]),
        ("-300 ± -2 °C", Temperature, &["tolerance-negative @-2", "quantity-out-of-range @-300"]),
        ("hot", Temperature, &["number-not-read @hot"]),
        ("", Temperature, &["quantity-empty @"]),
        ("5 ± 1e308 kmol", Amount, &["number-too-large @1e308"]),
    ];
    for (text, measure, expected) in rows {
        assert_eq!(faults(text, parse(text, &[measure])), expected, "{text}");
    }
}

#[test]
#[rustfmt::skip]
fn a_message_names_both_sides_and_what_is_allowed() {
    let say = |text: &str, measure: Measure| {
        let problems = parse(text, &[measure]).unwrap_err();
        words::say(&problems[0], words::Language::En).message
    };
    let rows = [
        (say("215 kPa", Temperature), "“kPa” is a pressure; a temperature is needed, such as °C, K or °F."),
        (say("215", Temperature), "A unit is missing: a temperature is needed, in °C, K or °F."),
        (say("3 MPA", Pressure), "“MPA” is no unit known here; near it are MPa or mPa."),
        (say("-300 °C", Temperature), "-300 °C is outside the range of temperature: above −273.15 °C and at most 19\u{202f}726.85 °C, as 0 K cannot be reached, and species data end at or below 20 000 K."),
    ];
    for (said, expected) in rows {
        assert_eq!(said, expected);
    }
}

#[test]
fn every_code_has_sentences_that_its_problems_fill() {
    let texts = [
        "",
        "x",
        "1.2.3 bar",
        "1,234 bar",
        "1×10 bar",
        "1e999 bar",
        "1e-999 bar",
        "5",
        "5 zzzz",
        "5 MPA",
        "5 K",
        "(5 bar) Pa",
        "0 bar",
        "-1 bar",
        "5 bar ±",
        "5 ± -1 bar",
        "5 bar ± 1 K",
        "5 bar ± 1 %",
        "5 ± 1 ± 1 bar",
        "> 5 bar",
        "< 5 ± 1 bar",
        "(5 bar",
        "5 bar class 1",
        "5 bar ± type K class 2",
    ];
    let mut seen = Vec::new();
    let outcomes = texts.map(|text| parse(text, &[Pressure]).map(|_| ()));
    let others = [
        read_number("5 x").map(|_| ()),
        parse("5 x", &[Number]).map(|_| ()),
        parse("7", &[Ph]).map(|_| ()),
        parse("5", &[Fraction]).map(|_| ()),
        parse("500", &[Fraction]).map(|_| ()),
        parse("< 5 K", &[Temperature]).map(|_| ()),
        parse("5 °C type K class 9", &[Temperature]).map(|_| ()),
        parse("1300 °C type K class 2", &[Temperature]).map(|_| ()),
    ];
    for problem in outcomes.into_iter().chain(others).filter_map(Result::err).flatten() {
        let sentence = words::say(&problem, words::Language::En);
        let both = format!("{} {}", sentence.message, sentence.hint);
        assert!(!both.contains(['{', '}']) && both.ends_with('.'), "{both}");
        seen.push(problem.code.as_str());
    }
    for code in QuantityCode::ALL {
        assert!(seen.contains(&code.as_str()), "no text above raises {}", code.as_str());
    }
}
