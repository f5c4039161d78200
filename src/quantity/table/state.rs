//! Temperature, pressure, volume and length.

use super::super::measure::Measure::{
    Length, Pressure, Temperature, TemperatureDifference, Volume,
};
use super::super::unit::Unit;
use super::{SI, SP811};

/// One pound-force in newtons over one square inch in square metres, each exact.
const POUND_FORCE_N: f64 = 4.448_221_615_260_5;
const SQUARE_INCH_M2: f64 = 0.000_645_16;
/// Conventional mercury: 13 595.1 kg/m³ × 9.80665 m/s² × 1 mm, exact by convention.
const MERCURY_MILLIMETRE_PA: f64 = 133.322_387_415;
const CUBIC_FOOT_M3: f64 = 0.028_316_846_592;

#[rustfmt::skip]
pub(in super::super) static UNITS: &[Unit] = &[
    Unit::row(Temperature, "°C", &["C", "degC", "deg C", "celsius"], (1.0, 1.0), SI).with_zero(273.15),
    Unit::row(Temperature, "K", &["kelvin"], (1.0, 1.0), SI),
    Unit::row(Temperature, "°F", &["F", "degF", "deg F", "fahrenheit"], (5.0, 9.0), SP811).with_zero(459.67),
    Unit::row(Temperature, "°R", &["R", "degR", "deg R", "rankine"], (5.0, 9.0), SP811),

    Unit::row(TemperatureDifference, "K", &["kelvin"], (1.0, 1.0), SI),
    Unit::row(TemperatureDifference, "°C", &["C", "degC", "deg C"], (1.0, 1.0), SI),
    Unit::row(TemperatureDifference, "°F", &["F", "degF", "deg F"], (5.0, 9.0), SP811),
    Unit::row(TemperatureDifference, "°R", &["R", "degR", "deg R"], (5.0, 9.0), SP811),

    Unit::row(Pressure, "bar", &[], (1e5, 1.0), SI),
    Unit::row(Pressure, "mbar", &["millibar"], (100.0, 1.0), SI),
    Unit::row(Pressure, "Pa", &["N/m2"], (1.0, 1.0), SI),
    Unit::row(Pressure, "hPa", &[], (100.0, 1.0), SI),
    Unit::row(Pressure, "kPa", &[], (1e3, 1.0), SI),
    Unit::row(Pressure, "MPa", &["N/mm2"], (1e6, 1.0), SI),
    Unit::row(Pressure, "mPa", &[], (1.0, 1e3), SI),
    Unit::row(Pressure, "atm", &[], (101_325.0, 1.0), SP811),
    Unit::row(Pressure, "Torr", &[], (101_325.0, 760.0), SP811),
    Unit::row(Pressure, "mmHg", &["mm Hg"], (MERCURY_MILLIMETRE_PA, 1.0), SP811),
    Unit::row(Pressure, "inHg", &["in Hg", "\"Hg"], (MERCURY_MILLIMETRE_PA * 254.0, 10.0), SP811),
    Unit::row(Pressure, "mmH₂O", &["mmWC", "mmWG", "mmWS"], (9.806_65, 1.0), SP811),
    Unit::row(Pressure, "inH₂O", &["inWC", "inWG", "\"WC"], (249.088_91, 1.0), SP811),
    Unit::row(Pressure, "psi", &["lbf/in2", "lb/in2"], (POUND_FORCE_N, SQUARE_INCH_M2), SP811),
    Unit::row(Pressure, "kgf/cm²", &["at", "kg/cm2", "KG/CM2", "kp/cm2"], (98_066.5, 1.0), SP811),

    Unit::row(Volume, "m³", &["cum"], (1.0, 1.0), SI),
    Unit::row(Volume, "L", &["l", "dm3", "litre", "liter"], (1.0, 1e3), SI),
    Unit::row(Volume, "mL", &["ml", "cm3", "cc"], (1.0, 1e6), SI),
    Unit::row(Volume, "ft³", &["cuft", "cu ft"], (CUBIC_FOOT_M3, 1.0), SP811),
    Unit::row(Volume, "US gal", &["gal(US)"], (0.003_785_411_784, 1.0), SP811),

    Unit::row(Length, "m", &[], (1.0, 1.0), SI),
    Unit::row(Length, "km", &[], (1e3, 1.0), SI),
    Unit::row(Length, "ft", &[], (0.3048, 1.0), SP811),
];
