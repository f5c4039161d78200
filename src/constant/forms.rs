//! The numbers people call K, and the standard state behind each.

use crate::quantity::{GAS_CONSTANT_J_PER_MOL_K, STANDARD_PRESSURE_PA};

/// One molar concentration, the standard one, in SI: 1 mol/L.
const STANDARD_CONCENTRATION_MOL_PER_M3: f64 = 1000.0;

/// A unit that Kp is written in.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct PressureUnit {
    /// The unit's symbol.
    pub symbol: &'static str,
    /// Its size in pascal, exact.
    pub pascal: f64,
}

/// The pressure units that tables give Kp in; the first is the standard pressure itself.
/// Sources: SI brochure (2019) for bar and kPa; the standard atmosphere is 101,325 Pa exactly.
pub const PRESSURE_UNITS: [PressureUnit; 6] = [
    PressureUnit { symbol: "bar", pascal: 1e5 },
    PressureUnit { symbol: "atm", pascal: 101_325.0 },
    PressureUnit { symbol: "Pa", pascal: 1.0 },
    PressureUnit { symbol: "kPa", pascal: 1e3 },
    PressureUnit { symbol: "MPa", pascal: 1e6 },
    PressureUnit { symbol: "Torr", pascal: 101_325.0 / 760.0 },
];

/// What a number called K is a product of.
#[derive(Debug, Clone, Copy, PartialEq)]
pub enum Form {
    /// Activities: the equilibrium constant itself, without a unit, for p° = 1 bar.
    K,
    /// Partial pressures as bare numbers in a unit.
    Kp(PressureUnit),
    /// Concentrations of the gases in mol/L.
    Kc,
    /// Amount fractions of the gases at this total pressure.
    Kx {
        /// The total pressure.
        pressure_pa: f64,
    },
}

impl Form {
    /// ln of the factor from K to this form, for a change `delta_nu_gas` in the number of gas
    /// molecules.
    ///
    /// Kp = K (p°/u)^Δν, Kc = K (p°/(R T c°))^Δν, Kx = K (p°/P)^Δν. Only the gases of the
    /// reaction count; condensed species keep their activities. Temperature in K.
    #[must_use]
    pub fn ln_factor(self, delta_nu_gas: f64, temperature_k: f64) -> f64 {
        let ratio = match self {
            Form::K => return 0.0,
            Form::Kp(unit) => STANDARD_PRESSURE_PA / unit.pascal,
            Form::Kc => {
                STANDARD_PRESSURE_PA
                    / (GAS_CONSTANT_J_PER_MOL_K * temperature_k * STANDARD_CONCENTRATION_MOL_PER_M3)
            }
            Form::Kx { pressure_pa } => STANDARD_PRESSURE_PA / pressure_pa,
        };
        if delta_nu_gas == 0.0 { 0.0 } else { delta_nu_gas * libm::log(ratio) }
    }

    /// The form's name.
    #[must_use]
    pub fn name(self) -> &'static str {
        match self {
            Form::K => "K",
            Form::Kp(_) => "Kp",
            Form::Kc => "Kc",
            Form::Kx { .. } => "Kx",
        }
    }

    /// The unit the number would carry: `1`, `bar^-2`, `(mol/L)^0.5`.
    #[must_use]
    pub fn unit(self, delta_nu_gas: f64) -> String {
        let base = match self {
            Form::K | Form::Kx { .. } => return "1".to_owned(),
            Form::Kp(unit) => unit.symbol,
            Form::Kc => "(mol/L)",
        };
        if delta_nu_gas == 0.0 {
            "1".to_owned()
        } else if delta_nu_gas == 1.0 {
            base.trim_matches(['(', ')']).to_owned()
        } else {
            format!("{base}^{delta_nu_gas}")
        }
    }
}

/// One form of K with its number.
#[derive(Debug, Clone, PartialEq)]
pub struct FormValue {
    /// `K`, `Kp`, `Kc` or `Kx`.
    pub name: &'static str,
    /// The unit the number would carry.
    pub unit: String,
    /// Its decimal logarithm.
    pub log10: f64,
    /// The number, where a double holds it to full precision.
    pub value: Option<f64>,
}

/// All forms of one K: K, Kp in bar, atm and kPa, Kc, and Kx where a pressure is known.
///
/// ```
/// use shiftgauge::constant::all_forms;
/// // N2O4 = 2 NO2 near 25 °C: Kp in atm is smaller than in bar by 1.01325.
/// let forms = all_forms(-1.9, 1.0, 298.15, Some(2e5));
/// let of = |unit: &str| forms.iter().find(|f| f.name == "Kp" && f.unit == unit).unwrap();
/// let ratio = of("bar").value.unwrap() / of("atm").value.unwrap();
/// assert!((ratio - 1.01325).abs() < 1e-12);
/// ```
#[must_use]
pub fn all_forms(
    ln_k: f64,
    delta_nu_gas: f64,
    temperature_k: f64,
    pressure_pa: Option<f64>,
) -> Vec<FormValue> {
    let [bar, atm, _, kpa, ..] = PRESSURE_UNITS;
    let mut forms = vec![Form::K, Form::Kp(bar), Form::Kp(atm), Form::Kp(kpa), Form::Kc];
    forms.extend(pressure_pa.map(|pressure_pa| Form::Kx { pressure_pa }));
    forms
        .into_iter()
        .map(|form| {
            let ln = ln_k + form.ln_factor(delta_nu_gas, temperature_k);
            let value = libm::exp(ln);
            FormValue {
                name: form.name(),
                unit: form.unit(delta_nu_gas),
                log10: ln / std::f64::consts::LN_10,
                value: value.is_normal().then_some(value),
            }
        })
        .collect()
}
