//! Constants of the SI and the conventional conditions that units rest on.

/// The molar gas constant R, J/(mol K).
///
/// Exact in the SI since 2019: the product of the Boltzmann constant 1.380649×10⁻²³ J/K and the
/// Avogadro constant 6.02214076×10²³ 1/mol (SI Brochure, 9th edition; CODATA 2018).
pub const GAS_CONSTANT_J_PER_MOL_K: f64 = 8.314_462_618_153_24;

/// The standard pressure p°, Pa, of every species: 1 bar, exact by convention (IUPAC, 1982).
pub const STANDARD_PRESSURE_PA: f64 = 1e5;

/// The standard concentration c° of solutes, mol/m³: 1 mol/L, exact by convention (IUPAC).
pub const STANDARD_CONCENTRATION_MOL_PER_M3: f64 = 1000.0;

/// The standard atmosphere, Pa: exact by convention (10th CGPM, 1954; NIST SP 811).
pub const STANDARD_ATMOSPHERE_PA: f64 = 101_325.0;

/// 0 °C in kelvin, exact by the definition of the Celsius scale (SI Brochure, 9th edition).
pub const ZERO_CELSIUS_K: f64 = 273.15;

/// The temperature of a normal cubic metre, K: 0 °C (DIN 1343; ISO 10780 calls it normal).
pub const NORMAL_TEMPERATURE_K: f64 = ZERO_CELSIUS_K;

/// The pressure of a normal cubic metre, Pa: one standard atmosphere (DIN 1343).
pub const NORMAL_PRESSURE_PA: f64 = STANDARD_ATMOSPHERE_PA;

/// The temperature of a standard cubic metre, K: 15 °C (ISO 13443).
pub const STANDARD_CUBIC_METRE_TEMPERATURE_K: f64 = 288.15;

/// The temperature of a standard cubic foot, K: 60 °F, common practice in the United States.
pub const STANDARD_CUBIC_FOOT_TEMPERATURE_K: f64 = (60.0 + 459.67) * 5.0 / 9.0;

/// The pressure of a standard cubic foot, Pa: 14.696 psi, common practice in the United States.
pub const STANDARD_CUBIC_FOOT_PRESSURE_PA: f64 = 14.696 * 4.448_221_615_260_5 / 0.000_645_16;
