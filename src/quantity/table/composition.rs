//! Fractions, ratios, concentrations, pH and plain numbers.

use super::super::constants::{GAS_CONSTANT_J_PER_MOL_K, NORMAL_PRESSURE_PA, NORMAL_TEMPERATURE_K};
use super::super::measure::Measure::{
    Concentration, Fraction, MassConcentration, MassPerAmount, Molality, Number, Ph, Ratio,
};
use super::super::unit::FractionBasis::{Amount, Mass, Volume};
use super::super::unit::Unit;
use super::{ISO80000, SI, SP811};

/// RT over p of a normal cubic metre: its volume per amount is this quotient.
const NORMAL_RT_J_PER_MOL: f64 = GAS_CONSTANT_J_PER_MOL_K * NORMAL_TEMPERATURE_K;
const NORMAL_GAS: &str = "ideal gas at 0 °C and 101.325 kPa (DIN 1343), by R";

#[rustfmt::skip]
pub(in super::super) static UNITS: &[Unit] = &[
    Unit::row(Fraction, "%", &["percent", "per cent", "pct"], (1.0, 100.0), ISO80000),
    Unit::row(Fraction, "ppm", &["PPM"], (1.0, 1e6), ISO80000),
    Unit::row(Fraction, "ppb", &[], (1.0, 1e9), ISO80000),
    Unit::row(Fraction, "‰", &["per mille", "permille"], (1.0, 1e3), ISO80000),
    Unit::row(Fraction, "", &[], (1.0, 1.0), ISO80000),
    Unit::row(Fraction, "mol %", &["mol-%", "mole %", "% mol", "%(mol)", "MOL %", "mol.%"], (1.0, 100.0), ISO80000).with_basis(Amount),
    Unit::row(Fraction, "mol/mol", &[], (1.0, 1.0), ISO80000).with_basis(Amount),
    Unit::row(Fraction, "mmol/mol", &[], (1.0, 1e3), ISO80000).with_basis(Amount),
    Unit::row(Fraction, "µmol/mol", &["ppm(mol)", "mol ppm", "mol-ppm"], (1.0, 1e6), ISO80000).with_basis(Amount),
    Unit::row(Fraction, "vol %", &["vol-%", "% vol", "v%", "% v/v", "%(v/v)", "vol.%"], (1.0, 100.0), ISO80000).with_basis(Volume),
    Unit::row(Fraction, "ppmv", &["PPMV", "ppm(v)", "vppm", "ppm vol"], (1.0, 1e6), ISO80000).with_basis(Volume),
    Unit::row(Fraction, "ppbv", &["ppb(v)"], (1.0, 1e9), ISO80000).with_basis(Volume),
    Unit::row(Fraction, "wt %", &["wt-%", "% wt", "w%", "% w/w", "%(w/w)", "mass %", "mass-%", "% m/m", "wt.%"], (1.0, 100.0), ISO80000).with_basis(Mass),
    Unit::row(Fraction, "kg/kg", &["g/g"], (1.0, 1.0), ISO80000).with_basis(Mass),
    Unit::row(Fraction, "mg/kg", &["ppmw", "PPMW", "ppm(w)", "wt ppm"], (1.0, 1e6), ISO80000).with_basis(Mass),

    Unit::row(Ratio, "", &[], (1.0, 1.0), ISO80000),
    Unit::row(Ratio, "mol/mol", &["kmol/kmol", "Nm3/Nm3"], (1.0, 1.0), ISO80000),
    Unit::row(Ratio, "%", &["mol %"], (1.0, 100.0), ISO80000),

    Unit::row(Concentration, "mol/L", &["M", "kmol/m3"], (1e3, 1.0), SI),
    Unit::row(Concentration, "mmol/L", &["mM"], (1.0, 1.0), SI),
    Unit::row(Concentration, "µmol/L", &["uM"], (1.0, 1e3), SI),
    Unit::row(Concentration, "mol/m³", &[], (1.0, 1.0), SI),

    Unit::row(Molality, "mol/kg", &[], (1.0, 1.0), SI),
    Unit::row(Molality, "mmol/kg", &[], (1.0, 1e3), SI),
    Unit::row(Molality, "µmol/kg", &[], (1.0, 1e6), SI),

    Unit::row(MassConcentration, "g/L", &[], (1.0, 1.0), SI),
    Unit::row(MassConcentration, "mg/L", &[], (1.0, 1e3), SI),
    Unit::row(MassConcentration, "µg/L", &[], (1.0, 1e6), SI),
    Unit::row(MassConcentration, "kg/m³", &[], (1.0, 1.0), SI),
    Unit::row(MassConcentration, "g/m³", &[], (1.0, 1e3), SI),
    Unit::row(MassConcentration, "mg/m³", &[], (1.0, 1e6), SI),
    Unit::row(MassConcentration, "lb/ft³", &[], (0.453_592_37, 0.028_316_846_592), SP811),

    Unit::row(MassPerAmount, "mg/Nm³", &["mg/NM3"], (NORMAL_RT_J_PER_MOL, NORMAL_PRESSURE_PA * 1e6), NORMAL_GAS).by_convention(),
    Unit::row(MassPerAmount, "g/Nm³", &["g/NM3"], (NORMAL_RT_J_PER_MOL, NORMAL_PRESSURE_PA * 1e3), NORMAL_GAS).by_convention(),
    Unit::row(MassPerAmount, "kg/mol", &[], (1.0, 1.0), SI),
    Unit::row(MassPerAmount, "g/mol", &[], (1.0, 1e3), SI),

    Unit::row(Ph, "pH", &[], (1.0, 1.0), ISO80000),
    Unit::row(Number, "", &[], (1.0, 1.0), SI),
];
