//! The density of liquid water.

/// Critical temperature of water, K (IAPWS, measured).
const CRITICAL_TEMPERATURE_K: f64 = 647.096;
/// Critical density of water, kg/m3 (IAPWS, measured).
const CRITICAL_DENSITY_KG_PER_M3: f64 = 322.0;
/// The freezing point at 1 atm; a hundredth of a kelvin below the triple point, where the equation
/// is still smooth.
const FREEZING_POINT_K: f64 = 273.15;

/// Gives the density of liquid water at its saturation pressure in kg/m3, or nothing outside
/// 273.15 to 647.096 K.
///
/// ρ/ρ_c = 1 + b₁τ^(1/3) + b₂τ^(2/3) + b₃τ^(5/3) + b₄τ^(16/3) + b₅τ^(43/3) + b₆τ^(110/3),
/// τ = 1 − T/T_c. At 1 bar the density is higher by less than 0.005 %, up to 100 °C.
/// Source: W. Wagner and A. Pruss, J. Phys. Chem. Ref. Data 22 (1993) 783 (IAPWS SR1-86(1992)),
/// coefficients from memory; checked against IAPWS-95 values to 0.01 %.
///
/// ```
/// use shiftgauge::mixture::water_density_kg_per_m3;
/// let at_25_c = water_density_kg_per_m3(298.15).unwrap();
/// assert!((at_25_c - 997.0).abs() < 0.1);
/// assert_eq!(water_density_kg_per_m3(250.0), None);
/// ```
#[must_use]
pub fn water_density_kg_per_m3(temperature_k: f64) -> Option<f64> {
    if !(FREEZING_POINT_K..=CRITICAL_TEMPERATURE_K).contains(&temperature_k) {
        return None;
    }
    let third = libm::cbrt(1.0 - temperature_k / CRITICAL_TEMPERATURE_K);
    let power = |thirds: i32| libm::pow(third, f64::from(thirds));
    let sum = 1.0 + 1.992_740_64 * power(1) + 1.099_653_42 * power(2)
        - 0.510_839_303 * power(5)
        - 1.754_934_79 * power(16)
        - 45.517_035_2 * power(43)
        - 6.746_944_50e5 * power(110);
    Some(CRITICAL_DENSITY_KG_PER_M3 * sum)
}
