//! K from a formula in T, as papers and handbooks print it.

use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;
use std::f64::consts::LN_10;

/// What a term of the formula multiplies; T in kelvin.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum FormulaTerm {
    /// A plain number.
    One,
    /// 1/T.
    PerT,
    /// ln T.
    LnT,
    /// log10 T.
    Log10T,
    /// T.
    T,
    /// T².
    TSquared,
    /// 1/T².
    PerTSquared,
}

impl FormulaTerm {
    /// Every term with its name in a case.
    pub const ALL: [(&'static str, FormulaTerm); 7] = [
        ("1", FormulaTerm::One),
        ("1/T", FormulaTerm::PerT),
        ("ln T", FormulaTerm::LnT),
        ("log10 T", FormulaTerm::Log10T),
        ("T", FormulaTerm::T),
        ("T^2", FormulaTerm::TSquared),
        ("1/T^2", FormulaTerm::PerTSquared),
    ];

    /// The term at T, T times its first derivative, and T² times its second.
    fn at(self, t: f64) -> [f64; 3] {
        match self {
            FormulaTerm::One => [1.0, 0.0, 0.0],
            FormulaTerm::PerT => [1.0 / t, -1.0 / t, 2.0 / t],
            FormulaTerm::LnT => [libm::log(t), 1.0, -1.0],
            FormulaTerm::Log10T => [libm::log10(t), 1.0 / LN_10, -1.0 / LN_10],
            FormulaTerm::T => [t, t, 0.0],
            FormulaTerm::TSquared => [t * t, 2.0 * t * t, 2.0 * t * t],
            FormulaTerm::PerTSquared => [1.0 / (t * t), -2.0 / (t * t), 6.0 / (t * t)],
        }
    }
}

/// ln K = Σ c·f(T), with the range of temperature it was made for.
#[derive(Debug, Clone, PartialEq)]
pub struct FormulaConstant {
    /// The coefficients, already those of ln K with p° = 1 bar and of the reaction as written.
    pub terms: Vec<(f64, FormulaTerm)>,
    /// The range, where one is stated.
    pub range_k: Option<(f64, f64)>,
    /// Standard uncertainty of ln K, where one is stated.
    pub u_ln_k: Option<f64>,
}

/// ln K of a formula and what follows from its slope and its bend.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct FormulaAt {
    /// ln K.
    pub ln_k: f64,
    /// ΔH° = R T² d ln K/dT.
    pub enthalpy_j_per_mol: f64,
    /// ΔCp° = dΔH°/dT.
    pub heat_capacity_j_per_mol_k: f64,
}

impl FormulaConstant {
    /// ln K at T, with ΔH° = R T² d ln K/dT and ΔCp° = dΔH°/dT.
    ///
    /// ```
    /// use shiftgauge::constant::{FormulaConstant, FormulaTerm};
    /// // Moe, Chemical Engineering Progress 58 (1962) 33, for the shift reaction.
    /// let terms = vec![(4577.8, FormulaTerm::PerT), (-4.33, FormulaTerm::One)];
    /// let shift = FormulaConstant { terms, range_k: None, u_ln_k: None };
    /// let at = shift.at(700.0);
    /// assert!((at.ln_k / 10f64.ln() - 0.960).abs() < 0.001);
    /// assert!((at.enthalpy_j_per_mol + 4577.8 * 8.314_462_618).abs() < 1e-4);
    /// ```
    #[must_use]
    pub fn at(&self, temperature_k: f64) -> FormulaAt {
        let (mut value, mut slope, mut bend) = (0.0, 0.0, 0.0);
        for (coefficient, term) in &self.terms {
            let [f, first, second] = term.at(temperature_k);
            value += coefficient * f;
            slope += coefficient * first;
            bend += coefficient * second;
        }
        // ΔH = R T (T f'), ΔCp = R (2 T f' + T² f'').
        FormulaAt {
            ln_k: value,
            enthalpy_j_per_mol: GAS_CONSTANT_J_PER_MOL_K * temperature_k * slope,
            heat_capacity_j_per_mol_k: GAS_CONSTANT_J_PER_MOL_K * (2.0 * slope + bend),
        }
    }
}
