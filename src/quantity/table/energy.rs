//! Energies per amount of substance, and the same per kelvin or degree Fahrenheit.

use super::super::measure::Measure::{MolarEnergy, MolarHeatCapacity};
use super::super::unit::Unit;
use super::amount::POUND_MOLE_MOL;
use super::{SI, SP811};

/// The thermochemical calorie, J, exact; the one that tables of species use.
const CALORIE_J: f64 = 4.184;
/// The British thermal unit of the International Table, J, exact: the usual one in steam tables.
const BTU_J: f64 = 1_055.055_852_62;

/// One row for each energy per mol, kmol and lbmol.
macro_rules! per_amount {
    ($( $name:literal $joules:expr, $source:expr );+ $(;)?) => {
        &[$(
            Unit::row(MolarEnergy, concat!($name, "/mol"), &[], ($joules, 1.0), $source),
            Unit::row(MolarEnergy, concat!($name, "/kmol"), &[], ($joules, 1e3), $source),
            Unit::row(MolarEnergy, concat!($name, "/lbmol"), &[], ($joules, POUND_MOLE_MOL), $source),
        )+]
    };
}

/// The same per kelvin (a kelvin is a degree Celsius here), and per degree Fahrenheit or Rankine.
macro_rules! per_amount_and_degree {
    ($( $name:literal $joules:expr, $source:expr );+ $(;)?) => {
        &[$(
            Unit::row(MolarHeatCapacity, concat!($name, "/(mol·K)"), &[], ($joules, 1.0), $source),
            Unit::row(MolarHeatCapacity, concat!($name, "/(kmol·K)"), &[], ($joules, 1e3), $source),
            Unit::row(MolarHeatCapacity, concat!($name, "/(lbmol·K)"), &[], ($joules, POUND_MOLE_MOL), $source),
            Unit::row(MolarHeatCapacity, concat!($name, "/(lbmol·°F)"), &[], ($joules * 9.0, POUND_MOLE_MOL * 5.0), $source),
        )+]
    };
}

#[rustfmt::skip]
pub(in super::super) static MOLAR_ENERGY: &[Unit] = per_amount![
    "J" 1.0, SI;
    "kJ" 1e3, SI;
    "MJ" 1e6, SI;
    "cal" CALORIE_J, SP811;
    "kcal" CALORIE_J * 1e3, SP811;
    "Btu" BTU_J, SP811;
];

#[rustfmt::skip]
pub(in super::super) static MOLAR_HEAT_CAPACITY: &[Unit] = per_amount_and_degree![
    "J" 1.0, SI;
    "kJ" 1e3, SI;
    "MJ" 1e6, SI;
    "cal" CALORIE_J, SP811;
    "kcal" CALORIE_J * 1e3, SP811;
    "Btu" BTU_J, SP811;
];
