//! The saturation pressure of water, for dew points.

/// Critical temperature of water, K (IAPWS, measured).
const CRITICAL_TEMPERATURE_K: f64 = 647.096;
/// Critical pressure of water, Pa (IAPWS, measured).
const CRITICAL_PRESSURE_PA: f64 = 22.064e6;
/// Triple point of water, K; below it the dew is frost, and this equation does not hold.
const TRIPLE_POINT_K: f64 = 273.16;

/// Gives the saturation pressure of liquid water in pascal, or nothing outside 273.16 to
/// 647.096 K.
///
/// ln(p/p_c) = (T_c/T)(a₁τ + a₂τ^1.5 + a₃τ³ + a₄τ^3.5 + a₅τ⁴ + a₆τ^7.5), τ = 1 − T/T_c.
/// Source: W. Wagner and A. Pruss, J. Phys. Chem. Ref. Data 22 (1993) 783 (IAPWS SR1-86(1992));
/// its stated uncertainty is 0.1 % or better.
///
/// ```
/// use shiftgauge::mixture::water_saturation_pressure_pa;
/// let at_boiling_point = water_saturation_pressure_pa(373.124).unwrap();
/// assert!((at_boiling_point / 101_325.0 - 1.0).abs() < 1e-3);
/// assert_eq!(water_saturation_pressure_pa(260.0), None);
/// ```
#[must_use]
pub fn water_saturation_pressure_pa(temperature_k: f64) -> Option<f64> {
    if !(TRIPLE_POINT_K..=CRITICAL_TEMPERATURE_K).contains(&temperature_k) {
        return None;
    }
    let tau = 1.0 - temperature_k / CRITICAL_TEMPERATURE_K;
    let root = libm::sqrt(tau);
    let (tau3, tau4) = (tau * tau * tau, tau * tau * tau * tau);
    let sum = -7.859_517_83 * tau + 1.844_082_59 * tau * root - 11.786_649_7 * tau3
        + 22.680_741_1 * tau3 * root
        - 15.961_871_9 * tau4
        + 1.801_225_02 * tau4 * tau3 * root;
    Some(CRITICAL_PRESSURE_PA * libm::exp(CRITICAL_TEMPERATURE_K / temperature_k * sum))
}
