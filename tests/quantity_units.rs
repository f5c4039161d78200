//! Factors of units against published ones, and every spelling that a unit is read by.
//!
//! NIST SP 811 (2008), appendix B.8, prints seven significant digits or an exact factor (bold);
//! the rows below were recalled from memory and agree with the definitions behind them. The
//! tolerance of a row is half a unit in the last printed digit; an exact factor has 4e−16, two
//! roundings of a double.

use shiftgauge::quantity::Measure::{self, *};
use shiftgauge::quantity::{GAS_CONSTANT_J_PER_MOL_K, all_units, parse, parse_unit};

/// Relative error allowed for a factor printed to seven digits, and for an exact one.
const SEVEN_DIGITS: f64 = 5e-7;
const EXACT: f64 = 4e-16;

#[test]
#[rustfmt::skip]
fn factors_agree_with_published_ones() {
    let rows: [(&str, Measure, f64, f64, &str); 56] = [
        ("atm", Pressure, 101_325.0, EXACT, "SP 811, atmosphere, standard"),
        ("at", Pressure, 9.806_65e4, EXACT, "SP 811, atmosphere, technical"),
        ("kgf/cm2", Pressure, 9.806_65e4, EXACT, "SP 811, kilogram-force per square centimetre"),
        ("bar", Pressure, 1e5, EXACT, "SP 811, bar"),
        ("mbar", Pressure, 100.0, EXACT, "SP 811, millibar"),
        ("Torr", Pressure, 133.3224, SEVEN_DIGITS, "SP 811, torr"),
        ("mmHg", Pressure, 133.3224, SEVEN_DIGITS, "SP 811, millimetre of mercury, conventional"),
        ("inHg", Pressure, 3386.389, SEVEN_DIGITS, "SP 811, inch of mercury, conventional"),
        ("inH2O", Pressure, 249.0889, SEVEN_DIGITS, "SP 811, inch of water, conventional"),
        ("mmH2O", Pressure, 9.806_65, EXACT, "SP 811, millimetre of water, conventional"),
        ("psi", Pressure, 6894.757, SEVEN_DIGITS, "SP 811, pound-force per square inch"),
        ("kPa", Pressure, 1e3, EXACT, "SI Brochure, prefixes"),
        ("MPa", Pressure, 1e6, EXACT, "SI Brochure, prefixes"),
        ("hPa", Pressure, 100.0, EXACT, "SI Brochure, prefixes"),
        ("mPa", Pressure, 1e-3, EXACT, "SI Brochure, prefixes"),
        ("K", TemperatureDifference, 1.0, EXACT, "SI Brochure"),
        ("°C", TemperatureDifference, 1.0, EXACT, "SI Brochure, 2.3.1"),
        ("°F", TemperatureDifference, 0.555_555_6, SEVEN_DIGITS, "SP 811, degree Fahrenheit (interval)"),
        ("°R", TemperatureDifference, 0.555_555_6, SEVEN_DIGITS, "SP 811, degree Rankine (interval)"),
        ("L", Volume, 1e-3, EXACT, "SI Brochure, table 8"),
        ("mL", Volume, 1e-6, EXACT, "SI Brochure, table 8"),
        ("ft3", Volume, 2.831_685e-2, SEVEN_DIGITS, "SP 811, cubic foot"),
        ("US gal", Volume, 3.785_412e-3, SEVEN_DIGITS, "SP 811, gallon (US)"),
        ("ft", Length, 0.3048, EXACT, "SP 811, foot"),
        ("lb", Mass, 0.453_592_37, EXACT, "SP 811, pound (avoirdupois), note 22"),
        ("t", Mass, 1e3, EXACT, "SI Brochure, table 8"),
        ("g", Mass, 1e-3, EXACT, "SI Brochure"),
        ("mg", Mass, 1e-6, EXACT, "SI Brochure"),
        ("lb/h", MassRate, 1.259_979e-4, SEVEN_DIGITS, "SP 811, pound per hour"),
        ("lb/min", MassRate, 7.559_873e-3, SEVEN_DIGITS, "SP 811, pound per minute"),
        ("t/d", MassRate, 1.0 / 86.4, EXACT, "SI Brochure, table 8"),
        ("kg/h", MassRate, 1.0 / 3600.0, EXACT, "SI Brochure, table 8"),
        ("lbmol", Amount, 453.592_37, EXACT, "by the pound: 1 lb of a substance of 1 g/mol"),
        ("kmol", Amount, 1e3, EXACT, "SI Brochure, prefixes"),
        ("Nm3", Amount, 1e3 / 22.413_969_54, 5e-10, "CODATA 2018, molar volume at 273.15 K and 101.325 kPa"),
        ("Sm3", Amount, 1e3 / 22.413_969_54 * (273.15 / 288.15), 5e-10, "as Nm3, by Gay-Lussac's law"),
        ("scf", Amount, 453.592_37 / 379.48, 3e-5, "379.48 scf to the pound-mole, common practice, no source"),
        ("MMscf", Amount, 453.592_37e6 / 379.48, 3e-5, "as scf"),
        ("scfm", AmountRate, 453.592_37 / 379.48 / 60.0, 3e-5, "as scf"),
        ("Nm3/h", AmountRate, 1e3 / 22.413_969_54 / 3600.0, 5e-10, "as Nm3"),
        ("cal/mol", MolarEnergy, 4.184, EXACT, "SP 811, calorie (thermochemical)"),
        ("kcal/mol", MolarEnergy, 4184.0, EXACT, "SP 811, kilocalorie (thermochemical)"),
        ("Btu/lbmol", MolarEnergy, 2.326, 4e-15, "the IT Btu is defined by 1 Btu/lb = 2.326 J/g, SP 811"),
        ("kJ/kmol", MolarEnergy, 1.0, EXACT, "SI Brochure, prefixes"),
        ("Btu/mol", MolarEnergy, 1055.056, SEVEN_DIGITS, "SP 811, British thermal unit IT"),
        ("Btu/(lbmol·°F)", MolarHeatCapacity, 4.1868, 4e-15, "1 Btu/(lb °F) = 4.1868 J/(g K), SP 811"),
        ("cal/(mol·K)", MolarHeatCapacity, 4.184, EXACT, "SP 811"),
        ("mol/L", Concentration, 1e3, EXACT, "SI Brochure, table 8"),
        ("mmol/L", Concentration, 1.0, EXACT, "SI Brochure, table 8"),
        ("g/L", MassConcentration, 1.0, EXACT, "SI Brochure, table 8"),
        ("lb/ft3", MassConcentration, 16.018_46, SEVEN_DIGITS, "SP 811, pound per cubic foot"),
        ("mg/Nm3", MassPerAmount, 22.413_969_54e-9, 5e-10, "as Nm3"),
        ("%", Fraction, 1e-2, EXACT, "ISO 80000-1"),
        ("‰", Fraction, 1e-3, EXACT, "ISO 80000-1"),
        ("ppm", Fraction, 1e-6, EXACT, "parts per million"),
        ("ppb", Fraction, 1e-9, EXACT, "parts per billion, 10⁹"),
    ];
    for (symbol, measure, factor, tolerance, source) in rows {
        let (unit, _) = parse_unit(symbol, &[measure]).unwrap();
        let error = (unit.difference_to_si(1.0) / factor - 1.0).abs();
        assert!(error <= tolerance, "{symbol} is off by {error:e} from {factor} ({source})");
    }
}

#[test]
fn fixed_points_of_temperature_agree_in_every_scale() {
    // SP 811, appendix B.8 and B.9: t/°F = 1.8 t/°C + 32, T/K = t/°C + 273.15, T/°R = 1.8 T/K
    let rows = [
        ("0 °C", 273.15),
        ("32 °F", 273.15),
        ("491.67 °R", 273.15),
        ("100 °C", 373.15),
        ("212 °F", 373.15),
        ("671.67 degR", 373.15),
        ("-40 °C", 233.15),
        ("-40 °F", 233.15),
        ("60 °F", 288.705_555_555_555_6),
        ("300 K", 300.0),
    ];
    for (text, temperature_k) in rows {
        let read = parse(text, &[Temperature]).unwrap().value_si;
        assert!((read - temperature_k).abs() <= 1e-13 * temperature_k, "{text} is {read} K");
    }
}

#[test]
fn the_gas_constant_is_the_product_of_its_defining_constants() {
    // SI Brochure, 9th edition: k = 1.380649e-23 J/K and N_A = 6.02214076e23 1/mol, both exact
    let product = 1.380_649 * 6.022_140_76;
    assert!((GAS_CONSTANT_J_PER_MOL_K / product - 1.0).abs() <= 4e-16);
}

#[test]
fn a_unit_is_read_in_each_of_its_spellings() {
    let rows: [(&str, Measure, &[&str]); 27] = [
        ("°C", Temperature, &["C", "degC", "deg C", "℃", "º C", "celsius", "c", "DEGC"]),
        ("°F", Temperature, &["F", "degF", "℉", "f"]),
        ("K", Temperature, &["\u{212a}", "k", "kelvin"]),
        ("kPa", Pressure, &["kpa", "KPA", "k Pa"]),
        ("Pa", Pressure, &["N/m2", "N/m²", "N m-2", "pa"]),
        ("kgf/cm²", Pressure, &["kgf/cm2", "kgf / cm^2", "at", "kg/cm2", "KG/CM2"]),
        ("mmH₂O", Pressure, &["mmH2O", "mm H2O", "mmWC"]),
        ("mol %", Fraction, &["mol%", "mol-%", "mole%", "% mol", "MOL%"]),
        ("vol %", Fraction, &["vol%", "VOL %", "% v/v"]),
        ("ppm", Fraction, &["PPM"]),
        ("lbmol", Amount, &["lb-mol", "lb mol", "LBMOL"]),
        ("kmol", Amount, &["KMOL", "kgmol", "kg-mol"]),
        ("Nm³", Amount, &["Nm3", "Nm^3", "NM3", "nm³"]),
        ("Nm³/h", AmountRate, &["Nm3/h", "Nm3/hr", "Nm³ / h", "NM3/H", "Nm3 h-1", "Nm3·h⁻¹"]),
        ("scf/min", AmountRate, &["scfm", "SCFM", "scf/min"]),
        ("MMscf/d", AmountRate, &["MMscfd", "MMSCFD", "MMscf/day"]),
        ("Mscf/h", AmountRate, &["Mscfh", "MSCFH"]),
        ("lbmol/h", AmountRate, &["lb-mol/hr", "lbmol/hr", "LBMOL/HR", "lbmol/h"]),
        ("kg/h", MassRate, &["kg/hr", "KG/H", "kg h⁻¹"]),
        ("J/(mol·K)", MolarHeatCapacity, &["J/mol/K", "J/mol-K", "J/(mol K)", "J/K/mol"]),
        ("J/(mol·K)", MolarHeatCapacity, &["J mol-1 K-1", "J·mol⁻¹·K⁻¹", "J/mol K", "J/(mol*°C)"]),
        ("Btu/(lbmol·°F)", MolarHeatCapacity, &["BTU/lb-mol/F", "Btu/(lbmol °R)", "Btu/lbmol-F"]),
        ("kJ/mol", MolarEnergy, &["kJ mol-1", "kJ/gmol", "kJ·mol^-1", "kJ/mole"]),
        ("mol/L", Concentration, &["mol/l", "mol/dm3", "M", "mol L-1", "kmol/m3"]),
        ("mol/m³", Concentration, &["mol/m3", "mol/m^3", "mol m-3"]),
        ("mg/Nm³", MassPerAmount, &["mg/Nm3", "mg/NM3", "mg Nm-3"]),
        ("µmol/mol", Fraction, &["umol/mol", "μmol/mol"]),
    ];
    for (symbol, measure, spellings) in rows {
        for spelling in spellings {
            let found = parse_unit(spelling, &[measure]).map(|(unit, _)| unit.symbol);
            assert_eq!(found.as_ref().ok(), Some(&symbol), "{spelling}: {found:?}");
        }
    }
}

#[test]
fn a_spelling_that_could_be_two_units_is_asked_back() {
    let rows = [
        ("MPA", Pressure, "MPa or mPa"),
        ("mpa", Pressure, "MPa or mPa"),
        ("MBAR", Pressure, "mbar"),
        ("Mol", Amount, "mol"),
        ("MG", Mass, "mg"),
        ("mmscf", Amount, "MMscf"),
        ("torrr", Pressure, "Torr"),
        ("kjmol", MolarEnergy, "kJ/mol or kmol"),
    ];
    for (text, measure, near) in rows {
        let problem = parse_unit(text, &[measure]).unwrap_err().remove(0);
        let named = problem.arguments.iter().find(|(name, _)| *name == "near");
        assert_eq!(named.map(|(_, value)| value.as_str()), Some(near), "{text}: {problem:?}");
    }
}

#[test]
fn no_spelling_names_two_units_of_one_measure() {
    let mut count = 0;
    for unit in all_units() {
        for name in [&unit.symbol].into_iter().chain(unit.aliases) {
            let (found, _) = parse_unit(name, &[unit.measure]).unwrap();
            assert_eq!(found, unit, "{name} of {:?}", unit.measure);
            count += 1;
        }
        assert!(unit.numerator > 0.0 && unit.denominator > 0.0 && !unit.source.is_empty());
    }
    assert!(count > 250, "only {count} spellings were tried");
}
