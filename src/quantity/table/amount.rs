//! Amounts of substance and masses.

use super::super::constants as c;
use super::super::measure::Measure::{Amount, Mass};
use super::super::unit::Unit;
use super::{SI, SP811};

/// The avoirdupois pound, kg, exact; with it the pound-mole is exact too.
pub(super) const POUND_KG: f64 = 0.453_592_37;
pub(super) const POUND_MOLE_MOL: f64 = 453.592_37;

/// p V of one cubic metre at normal conditions over R T: mol.
pub(super) const NORMAL_CUBIC_METRE: (f64, f64) =
    (c::NORMAL_PRESSURE_PA, c::GAS_CONSTANT_J_PER_MOL_K * c::NORMAL_TEMPERATURE_K);
/// The same at 15 °C.
pub(super) const STANDARD_CUBIC_METRE: (f64, f64) = (
    c::STANDARD_ATMOSPHERE_PA,
    c::GAS_CONSTANT_J_PER_MOL_K * c::STANDARD_CUBIC_METRE_TEMPERATURE_K,
);
/// The same for a cubic foot at 60 °F and 14.696 psi.
pub(super) const STANDARD_CUBIC_FOOT: (f64, f64) = (
    c::STANDARD_CUBIC_FOOT_PRESSURE_PA * 0.028_316_846_592,
    c::GAS_CONSTANT_J_PER_MOL_K * c::STANDARD_CUBIC_FOOT_TEMPERATURE_K,
);

pub(super) const NORMAL_GAS: &str = "ideal gas at 0 °C and 101.325 kPa (DIN 1343), by R";
pub(super) const ISO13443_GAS: &str = "ideal gas at 15 °C and 101.325 kPa (ISO 13443), by R";
pub(super) const US_GAS: &str =
    "ideal gas at 60 °F and 14.696 psi (common practice, no source), by R";

const fn times(factor: (f64, f64), count: f64) -> (f64, f64) {
    (factor.0 * count, factor.1)
}

pub(super) const THOUSAND_CUBIC_FEET: (f64, f64) = times(STANDARD_CUBIC_FOOT, 1e3);
pub(super) const MILLION_CUBIC_FEET: (f64, f64) = times(STANDARD_CUBIC_FOOT, 1e6);

#[rustfmt::skip]
pub(in super::super) static UNITS: &[Unit] = &[
    Unit::row(Amount, "mol", &["gmol"], (1.0, 1.0), SI),
    Unit::row(Amount, "mmol", &[], (1.0, 1e3), SI),
    Unit::row(Amount, "kmol", &["KMOL", "kgmol"], (1e3, 1.0), SI),
    Unit::row(Amount, "lbmol", &["LBMOL"], (POUND_MOLE_MOL, 1.0), SP811),
    Unit::row(Amount, "Nm³", &["NM3", "m3(n)"], NORMAL_CUBIC_METRE, NORMAL_GAS).by_convention(),
    Unit::row(Amount, "Sm³", &["SM3"], STANDARD_CUBIC_METRE, ISO13443_GAS).by_convention(),
    Unit::row(Amount, "scf", &["SCF"], STANDARD_CUBIC_FOOT, US_GAS).by_convention(),
    Unit::row(Amount, "Mscf", &["MSCF"], THOUSAND_CUBIC_FEET, US_GAS).by_convention(),
    Unit::row(Amount, "MMscf", &["MMSCF"], MILLION_CUBIC_FEET, US_GAS).by_convention(),

    Unit::row(Mass, "kg", &[], (1.0, 1.0), SI),
    Unit::row(Mass, "g", &[], (1.0, 1e3), SI),
    Unit::row(Mass, "mg", &[], (1.0, 1e6), SI),
    Unit::row(Mass, "t", &["tonne", "tonnes"], (1e3, 1.0), SI),
    Unit::row(Mass, "lb", &["lbs", "lbm"], (POUND_KG, 1.0), SP811),
];
