//! The relative permittivity of water, and the Debye-Hückel parameters that follow from it.

use super::density::water_density_kg_per_m3;
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;

/// Critical temperature of water, K, and its critical density, mol/m3 (IAPWS).
const CRITICAL_TEMPERATURE_K: f64 = 647.096;
const CRITICAL_DENSITY_MOL_PER_M3: f64 = 322.0 / WATER_MOLAR_MASS_KG_PER_MOL;
/// Molar mass of water, kg/mol (IAPWS).
pub(super) const WATER_MOLAR_MASS_KG_PER_MOL: f64 = 0.018_015_268;
/// The Avogadro constant, 1/mol, and the elementary charge, C; exact in the SI.
const AVOGADRO_PER_MOL: f64 = 6.022_140_76e23;
const ELEMENTARY_CHARGE_C: f64 = 1.602_176_634e-19;
const BOLTZMANN_J_PER_K: f64 = GAS_CONSTANT_J_PER_MOL_K / AVOGADRO_PER_MOL;
/// The permittivity of vacuum, F/m (CODATA 2018).
const VACUUM_PERMITTIVITY_F_PER_M: f64 = 8.854_187_812_8e-12;
/// The mean polarisability of the water molecule, C² m²/J, and its dipole moment, C m, as the
/// release takes them.
const POLARISABILITY: f64 = 1.636e-40;
const DIPOLE_MOMENT_C_M: f64 = 6.138e-30;

/// N, i, j of the terms N (ρ/ρ_c)^i (T_c/T)^j of the correlation factor.
const CORRELATION: [(f64, f64, f64); 11] = [
    (0.978_224_486_826, 1.0, 0.25),
    (-0.957_771_379_375, 1.0, 1.0),
    (0.237_511_794_148, 1.0, 2.5),
    (0.714_692_244_396, 2.0, 1.5),
    (-0.298_217_036_956, 3.0, 1.5),
    (-0.108_863_472_196, 3.0, 2.5),
    (0.949_327_488_264e-1, 4.0, 2.0),
    (-0.980_469_816_509e-2, 5.0, 2.0),
    (0.165_167_634_970e-4, 6.0, 5.0),
    (0.937_359_795_772e-4, 7.0, 0.5),
    (-0.123_179_218_720e-9, 10.0, 10.0),
];

/// Gives the relative permittivity (static dielectric constant) of liquid water at its saturation
/// pressure, or nothing outside 273.15 to 623.15 K.
///
/// Harris and Alder's equation with the correlation factor g(ρ, T) of IAPWS R8-97:
/// ε = (1 + A + 5B + √(9 + 2A + 18B + A² + 10AB + 9B²))/(4 − 4B), A = N_A μ² ρ g/(ε₀ k T),
/// B = N_A α ρ/(3 ε₀).
/// Source: D. P. Fernández, A. R. H. Goodwin, E. W. Lemmon, J. M. H. Levelt Sengers and
/// R. C. Williams, J. Phys. Chem. Ref. Data 26 (1997) 1125, coefficients from memory; checked
/// against C. G. Malmberg and A. A. Maryott, J. Res. NBS 56 (1956) 1.
///
/// ```
/// use shiftgauge::mixture::water_permittivity;
/// let at_25_c = water_permittivity(298.15).unwrap();
/// assert!((at_25_c - 78.4).abs() < 0.1);
/// ```
#[must_use]
pub fn water_permittivity(temperature_k: f64) -> Option<f64> {
    if temperature_k > 623.15 {
        return None;
    }
    let density_mol_per_m3 = water_density_kg_per_m3(temperature_k)? / WATER_MOLAR_MASS_KG_PER_MOL;
    let ln_density = libm::log(density_mol_per_m3 / CRITICAL_DENSITY_MOL_PER_M3);
    let ln_inverse = libm::log(CRITICAL_TEMPERATURE_K / temperature_k);
    let terms = CORRELATION.iter();
    let series: f64 = terms.map(|(n, i, j)| n * libm::exp(i * ln_density + j * ln_inverse)).sum();
    let last =
        0.196_096_504_426e-2 * libm::exp(ln_density) / libm::pow(temperature_k / 228.0 - 1.0, 1.2);
    let correlation = 1.0 + series + last;
    let a =
        AVOGADRO_PER_MOL * DIPOLE_MOMENT_C_M * DIPOLE_MOMENT_C_M * density_mol_per_m3 * correlation
            / (VACUUM_PERMITTIVITY_F_PER_M * BOLTZMANN_J_PER_K * temperature_k);
    let b = AVOGADRO_PER_MOL * POLARISABILITY * density_mol_per_m3
        / (3.0 * VACUUM_PERMITTIVITY_F_PER_M);
    let root = libm::sqrt(9.0 + 2.0 * a + 18.0 * b + a * a + 10.0 * a * b + 9.0 * b * b);
    Some((1.0 + a + 5.0 * b + root) / (4.0 - 4.0 * b))
}

/// The parameters of Debye and Hückel's law for water.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct DebyeHueckel {
    /// A for decimal logarithms, (kg/mol)^½: log₁₀ γ = −A z² √I in the limit of small I.
    pub a_log10: f64,
    /// A for natural logarithms, (kg/mol)^½.
    pub a_ln: f64,
    /// B in 1/m (kg/mol)^½: one over the radius of the ion cloud is B √I.
    pub b_per_m: f64,
}

/// Gives the Debye-Hückel parameters of water at its saturation pressure, or nothing outside
/// 273.15 to 623.15 K.
///
/// A (natural) = e³ √(2 N_A ρ)/(8π (ε₀ ε k T)^{3/2}), B = e √(2 N_A ρ/(ε₀ ε k T)), with the density
/// of [`water_density_kg_per_m3`] and ε of [`water_permittivity`].
///
/// ```
/// use shiftgauge::mixture::debye_hueckel;
/// let at_25_c = debye_hueckel(298.15).unwrap();
/// assert!((at_25_c.a_log10 - 0.5095).abs() < 0.001);
/// assert!((at_25_c.b_per_m - 3.286e9).abs() < 0.005e9);
/// ```
#[must_use]
pub fn debye_hueckel(temperature_k: f64) -> Option<DebyeHueckel> {
    let density = water_density_kg_per_m3(temperature_k)?;
    let thermal = VACUUM_PERMITTIVITY_F_PER_M
        * water_permittivity(temperature_k)?
        * BOLTZMANN_J_PER_K
        * temperature_k;
    let e = ELEMENTARY_CHARGE_C;
    let b_per_m = e * libm::sqrt(2.0 * AVOGADRO_PER_MOL * density / thermal);
    let a_ln = e * e * b_per_m / (8.0 * std::f64::consts::PI * thermal);
    Some(DebyeHueckel { a_log10: a_ln / std::f64::consts::LN_10, a_ln, b_per_m })
}
