//! The constants that join amounts, pressures and temperatures.

/// The molar gas constant R in J/(mol K): 8.314 462 618 153 24, exact.
///
/// R = N_A k with N_A = 6.022 140 76e23 /mol and k = 1.380 649e-23 J/K, both exact by the
/// definition of the SI (the SI Brochure, 9th edition, 2019; CODATA 2018 and later).
///
/// ```
/// let product = 6.022_140_76 * 1.380_649;
/// assert!((shiftgauge::quantity::GAS_CONSTANT_J_PER_MOL_K - product).abs() < 1e-15);
/// ```
pub const GAS_CONSTANT_J_PER_MOL_K: f64 = 8.314_462_618_153_24;

/// The standard pressure p° in Pa: 100 000, exact (IUPAC since 1982).
///
/// The activity of an ideal gas is its partial pressure divided by this.
pub const STANDARD_PRESSURE_PA: f64 = 100_000.0;

/// The standard concentration c° in mol/m3: 1000, which is 1 mol/L, exact (IUPAC).
///
/// The activity of an ideal solute is its concentration divided by this.
pub const STANDARD_CONCENTRATION_MOL_PER_M3: f64 = 1000.0;
