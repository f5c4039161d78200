//! Quantities as they are shown: digits, units, systems of units; and the tables behind them.

use shiftgauge::quantity::Measure::{self, *};
use shiftgauge::quantity::PressureReference as Reference;
use shiftgauge::quantity::{LIMITS, limit};
use shiftgauge::quantity::{
    Quantity, Units, all_units, difference_unit, display_unit, parse, parse_unit, show, show_in,
    show_log10, show_number, show_pair, show_with_uncertainty,
};

fn read(text: &str, measure: Measure) -> Quantity {
    parse(text, &[measure]).unwrap_or_else(|problems| panic!("{text}: {problems:?}"))
}

#[test]
fn a_number_is_shown_with_the_digits_asked_for() {
    let rows = [
        (0.0, 3, "0"),
        (-0.0, 3, "0"),
        (1.0, 1, "1"),
        (1.0, 4, "1.000"),
        (-215.04, 4, "−215.0"),
        (999.96, 4, "1000"),
        (0.000_123_4, 2, "0.00012"),
        (0.000_012_34, 3, "1.23×10⁻⁵"),
        (2_841_325.0, 4, "2\u{202f}841\u{202f}000"),
        (12_345.678, 7, "12\u{202f}345.68"),
        (1e7, 3, "1.00×10⁷"),
        (0.1, 17, "0.1"),
        (f64::MAX, 3, "1.80×10³⁰⁸"),
        (f64::NAN, 3, "no value"),
        (f64::INFINITY, 3, "no value"),
        (5.0, 0, "5"),
    ];
    for (value, digits, expected) in rows {
        assert_eq!(show_number(value, digits), expected, "{value} to {digits}");
    }
    let powers = [(2.0, 3, "100"), (-400.5, 3, "3.16×10⁻⁴⁰¹"), (399.9999, 3, "1.00×10⁴⁰⁰")];
    for (log10_value, digits, expected) in powers {
        assert_eq!(show_log10(log10_value, digits), expected, "10^{log10_value}");
    }
}

#[test]
fn two_different_numbers_never_look_the_same() {
    let (percent, _) = parse_unit("%", &[Fraction]).unwrap();
    let rows = [
        (0.9999999, 1.0, "99.99999 %", "100.0000 %"),
        (0.5, 0.25, "50.0 %", "25.0 %"),
        (0.5, 0.5, "50.0 %", "50.0 %"),
    ];
    for (a, b, shown_a, shown_b) in rows {
        assert_eq!(show_pair(a, b, percent, 3), (shown_a.to_owned(), shown_b.to_owned()));
    }
}

#[test]
#[rustfmt::skip]
fn a_quantity_is_shown_as_it_was_typed_and_in_other_systems() {
    let rows: [(&str, Measure, &str, &str, &str, &str); 16] = [
        ("215 ± 2 °C", Temperature, "215 ± 2 °C", "488.1 ± 2.0 K", "215 ± 2 °C", "419.0 ± 3.6 °F"),
        ("215,0 C", Temperature, "215.0 °C", "488.1 K", "215.0 °C", "419.0 °F"),
        ("27.4 barg", Pressure, "27.4 bar(g)", "2\u{202f}740\u{202f}000 Pa(g)", "27.4 bar(g)", "397 psi(g)"),
        ("27.4 bar ± 2 rel", Pressure, "27.4 bar ± 2 % rel", "2\u{202f}740\u{202f}000 ± 55\u{202f}000 Pa", "27.4 bar ± 2 % rel", "397.4 ± 7.9 psi"),
        ("27.4 bar ± 20 mbar", Pressure, "27.4 bar ± 20 mbar", "2\u{202f}740\u{202f}000 ± 2000 Pa", "27.4 bar ± 20 mbar", "397.40 ± 0.29 psi"),
        ("< 5 ppm", Fraction, "< 5 ppm", "< 5×10⁻⁶", "< 5 ppm", "< 5 ppm"),
        ("0,420 ± 0,020 %", Fraction, "0.420 ± 0.020 %", "0.00420 ± 0.00020", "0.420 ± 0.020 %", "0.420 ± 0.020 %"),
        ("4.5 wt%", Fraction, "4.5 wt %", "0.045 kg/kg", "4.5 wt %", "4.5 wt %"),
        ("pH 7.20 ± 0.05", Ph, "pH 7.20 ± 0.05", "pH 7.20 ± 0.05", "pH 7.20 ± 0.05", "pH 7.20 ± 0.05"),
        ("-98.9 kJ/mol", MolarEnergy, "−98.9 kJ/mol", "−98\u{202f}900 J/mol", "−98.9 kJ/mol", "−42\u{202f}520 Btu/lbmol"),
        ("1.2e-3 mol/L", Concentration, "1.2×10⁻³ mol/L", "1.2 mol/m³", "1.2×10⁻³ mol/L", "1.2×10⁻³ mol/L"),
        ("48.2", Number, "48.2", "48.2", "48.2", "48.2"),
        ("0.30 ± 0.02", Ratio, "0.30 ± 0.02", "0.30 ± 0.02", "0.30 ± 0.02", "0.30 ± 0.02"),
        ("10 K", TemperatureDifference, "10 K", "10 K", "10 K", "18 °F"),
        ("12 000 Nm3/h", AmountRate, "12\u{202f}000 Nm³/h", "148.72 mol/s", "535.38 kmol/h", "1180.31 lbmol/h"),
        ("0 °C", Temperature, "0 °C", "273 K", "0 °C", "32 °F"),
    ];
    for (text, measure, typed, si, metric, us) in rows {
        let quantity = read(text, measure);
        let shown = Units::ALL.map(|units| show_in(&quantity, units));
        assert_eq!(shown, [typed, si, metric, us], "{text}");
        for again in shown {
            let back = read(&again, measure);
            assert_eq!(back.is_bound, quantity.is_bound, "{again}");
            assert_eq!(back.pressure_reference, quantity.pressure_reference, "{again}");
            let apart = (back.value_si - quantity.value_si).abs();
            assert!(apart <= 2e-3 * quantity.value_si.abs(), "{text} came back as {again}");
        }
    }
}

#[test]
fn an_uncertainty_is_shown_to_two_digits_and_the_value_to_the_same_place() {
    let (bar, _) = parse_unit("bar", &[Pressure]).unwrap();
    let (celsius, _) = parse_unit("°C", &[Temperature]).unwrap();
    let rows = [
        (show_with_uncertainty(2.74e6, 1e4, bar), "27.40 ± 0.20 bar"),
        (show_with_uncertainty(2.74e6, 4980.0, bar), "27.40 ± 0.10 bar"),
        (show_with_uncertainty(488.15, 60.0, celsius), "220 ± 120 °C"),
        (show_with_uncertainty(488.15, 0.0, celsius), "215.000 ± 0 °C"),
        (show_with_uncertainty(1e5, 1e-6, bar), "1.000000000000 ± 2.0×10⁻¹¹ bar"),
    ];
    for (shown, expected) in rows {
        assert_eq!(shown, expected);
    }
}

#[test]
fn every_system_names_a_unit_that_the_table_holds() {
    for measure in Measure::ALL {
        for units in Units::ALL {
            let unit = display_unit(measure, units, None);
            assert_eq!(unit.measure, measure, "{measure:?} in {units:?}");
            assert_eq!(Units::from_name(units.as_str()), Some(units));
        }
        let si = display_unit(measure, Units::Si, None);
        assert_eq!((si.to_si(1.0), si.from_si(1.0)), (1.0, 1.0), "{measure:?} in SI");
    }
    for unit in all_units().filter(|unit| unit.measure == Temperature) {
        assert_eq!(difference_unit(unit).zero_offset, 0.0, "{}", unit.symbol);
        assert_eq!(difference_unit(unit).symbol, unit.symbol);
    }
}

#[test]
fn every_measure_has_one_range_and_readable_examples() {
    for measure in Measure::ALL {
        let rows = LIMITS.iter().filter(|row| row.measure == measure).count();
        assert_eq!(rows, if measure == Pressure { 2 } else { 1 }, "{measure:?}");
        let row = limit(measure, Reference::Unstated);
        assert!(row.measure == measure && row.minimum_si < row.maximum_si, "{measure:?}");
        assert_eq!(row.contains(row.minimum_si), row.includes_minimum, "{measure:?}");
        assert!(row.contains(row.maximum_si) && !row.contains(f64::NAN), "{measure:?}");
        for example in measure.examples() {
            let text = if measure == Ph { (*example).to_owned() } else { format!("0.5 {example}") };
            assert_eq!(read(&text, measure).measure, measure, "{text}");
        }
    }
    assert_eq!(show(293.15, display_unit(Temperature, Units::Metric, None), 3), "20.0 °C");
}
