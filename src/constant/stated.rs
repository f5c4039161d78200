//! K as a number that somebody states, with its temperature and enthalpy where they say them.

use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;

/// A stated K of a reaction as written, already turned into ln K.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct StatedConstant {
    /// ln K at the stated temperature.
    pub ln_k: f64,
    /// Its standard uncertainty, where one was stated.
    pub u_ln_k: Option<f64>,
    /// The temperature it was stated for; without one it is taken at the temperature asked for.
    pub at_k: Option<f64>,
    /// ΔH° at that temperature.
    pub enthalpy_j_per_mol: Option<f64>,
    /// The standard uncertainty of ΔH°, where one was stated.
    pub u_enthalpy_j_per_mol: Option<f64>,
    /// ΔCp°, taken as constant.
    pub heat_capacity_j_per_mol_k: Option<f64>,
}

/// A stated K carried to another temperature.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Carried {
    /// ln K there.
    pub ln_k: f64,
    /// ΔH° there.
    pub enthalpy_j_per_mol: Option<f64>,
    /// By how many kelvin it was carried without an enthalpy, as if K did not change.
    pub unfounded_k: Option<f64>,
}

impl StatedConstant {
    /// The constant of the reaction times a factor: ln K, ΔH° and ΔCp° go with it.
    #[must_use]
    pub fn times(self, factor: f64) -> StatedConstant {
        StatedConstant {
            ln_k: self.ln_k * factor,
            u_ln_k: self.u_ln_k.map(|u| u * factor.abs()),
            at_k: self.at_k,
            enthalpy_j_per_mol: self.enthalpy_j_per_mol.map(|enthalpy| enthalpy * factor),
            u_enthalpy_j_per_mol: self.u_enthalpy_j_per_mol.map(|u| u * factor.abs()),
            heat_capacity_j_per_mol_k: self.heat_capacity_j_per_mol_k.map(|heat| heat * factor),
        }
    }

    /// Standard uncertainty of ln K at `temperature_k`, where any was stated: that of the value, and
    /// that of ΔH° over the distance, u(ΔH)/R · |1/T − 1/T₀|.
    #[must_use]
    pub fn u_ln_k_at(&self, temperature_k: f64) -> Option<f64> {
        let at_k = self.at_k.unwrap_or(temperature_k);
        let reciprocal = (at_k - temperature_k) / (temperature_k * at_k);
        let carrying = self.u_enthalpy_j_per_mol.filter(|_| reciprocal != 0.0);
        let carrying = carrying.map(|u| u / GAS_CONSTANT_J_PER_MOL_K * reciprocal);
        match (self.u_ln_k, carrying) {
            (None, None) => None,
            (u, carrying) => Some(libm::hypot(u.unwrap_or(0.0), carrying.unwrap_or(0.0))),
        }
    }

    /// Carries ln K from the stated temperature T₀ to `temperature_k`.
    ///
    /// ln K(T) = ln K(T₀) − (ΔH₀/R)(1/T − 1/T₀) + (ΔCp/R)(T₀/T − 1 + ln(T/T₀)), which is
    /// d ln K/dT = ΔH°/RT² integrated with a constant ΔCp°. Without an enthalpy K is left as it is
    /// and the distance is reported.
    ///
    /// ```
    /// use shiftgauge::constant::StatedConstant;
    /// let k = StatedConstant {
    ///     ln_k: 2.0,
    ///     u_ln_k: None,
    ///     at_k: Some(700.0),
    ///     enthalpy_j_per_mol: Some(-98_000.0),
    ///     u_enthalpy_j_per_mol: None,
    ///     heat_capacity_j_per_mol_k: None,
    /// };
    /// assert!(k.carried_to(750.0).ln_k < 2.0);
    /// ```
    #[must_use]
    pub fn carried_to(&self, temperature_k: f64) -> Carried {
        let at_k = self.at_k.unwrap_or(temperature_k);
        let distance = (temperature_k - at_k).abs();
        let Some(enthalpy) = self.enthalpy_j_per_mol else {
            let unfounded_k = (distance > 0.0).then_some(distance);
            return Carried { ln_k: self.ln_k, enthalpy_j_per_mol: None, unfounded_k };
        };
        let heat_capacity = self.heat_capacity_j_per_mol_k.unwrap_or(0.0);
        // (at_k − T)/(T at_k), not a difference of reciprocals, so that nothing cancels near T₀.
        let reciprocal = (at_k - temperature_k) / (temperature_k * at_k);
        let bend = (at_k - temperature_k) / temperature_k + libm::log(temperature_k / at_k);
        let ln_k =
            self.ln_k + (heat_capacity * bend - enthalpy * reciprocal) / GAS_CONSTANT_J_PER_MOL_K;
        let there = enthalpy + heat_capacity * (temperature_k - at_k);
        Carried { ln_k, enthalpy_j_per_mol: Some(there), unfounded_k: None }
    }
}
