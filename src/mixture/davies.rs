//! Activity coefficients of solutes in water, and the activity of the water that goes with them.
//!
//! Both laws have ln γ_i = −z_i² f(I). The water follows from Gibbs and Duhem's equation along the
//! dilution of the solution from what it is to pure water:
//! ln a_w = −M_w (Σ m_i − Σ m_i z_i² J(I)), with J(I) = (1/I) ∫₀ᴵ I' f'(I') dI'.

use super::dielectric::{WATER_MOLAR_MASS_KG_PER_MOL, debye_hueckel};
use crate::problem::MixtureCode;
use crate::problem::Outcome;
use crate::problem::Problem;

/// How the activities of solutes follow from their molalities.
#[derive(Debug, Clone, Copy, PartialEq, Eq, Default)]
pub enum SolutionModel {
    /// γ = 1.
    #[default]
    Ideal,
    /// log₁₀ γ = −A z² (√I/(1 + √I) − 0.3 I), for I up to 0.5 mol/kg. C. W. Davies, Ion
    /// Association (Butterworths, 1962).
    Davies,
    /// log₁₀ γ = −A z² √I/(1 + B å √I) with the size å of each ion, for I up to 0.1 mol/kg.
    /// P. Debye and E. Hückel, Phys. Z. 24 (1923) 185.
    DebyeHueckel,
}

impl SolutionModel {
    /// The ionic strength in mol/kg up to which the model is usually trusted; none for `Ideal`.
    #[must_use]
    pub fn limit_mol_per_kg(self) -> Option<f64> {
        match self {
            SolutionModel::Ideal => None,
            SolutionModel::Davies => Some(0.5),
            SolutionModel::DebyeHueckel => Some(0.1),
        }
    }
}

/// What a model needs to know of a solute.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Ion {
    /// z: the charge in elementary charges, zero for a neutral molecule.
    pub charge: i32,
    /// å: the distance of closest approach in picometres; only `DebyeHueckel` looks at it.
    pub size_pm: f64,
}

impl Ion {
    /// A neutral solute: γ = 1 in every model (no salting out is taken in).
    pub const NEUTRAL: Ion = Ion { charge: 0, size_pm: Ion::USUAL_SIZE_PM };
    /// The size of an ion whose own is not known: the middle of Kielland's sizes for ions of
    /// charge one.
    pub const USUAL_SIZE_PM: f64 = 400.0;

    /// An ion of the usual size.
    #[must_use]
    pub fn new(charge: i32) -> Ion {
        Ion { charge, ..Ion::NEUTRAL }
    }

    fn charge_squared(self) -> f64 {
        f64::from(self.charge) * f64::from(self.charge)
    }
}

/// The lowest and highest temperature of a model, K.
pub const SOLUTION_RANGE_K: (f64, f64) = (273.15, 473.15);

/// Above this ionic strength (mol/kg) the coefficients keep the value that they have there: no
/// model means anything so far out, and the numbers stay finite.
pub const IONIC_STRENGTH_HELD_MOL_PER_KG: f64 = 10.0;

/// Above this sum of molalities (mol/kg) the activity of water keeps the value it has there.
const MOLALITY_HELD_MOL_PER_KG: f64 = 1000.0;

/// One model at one temperature.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct SolutionLaw {
    model: SolutionModel,
    a_ln: f64,
    b_per_pm: f64,
}

impl SolutionLaw {
    /// Sets a model up at a temperature.
    ///
    /// # Errors
    /// `temperature-outside-solution` outside [`SOLUTION_RANGE_K`], except for `Ideal`.
    pub fn new(model: SolutionModel, temperature_k: f64) -> Outcome<SolutionLaw> {
        if model == SolutionModel::Ideal {
            return Ok(SolutionLaw { model, a_ln: 0.0, b_per_pm: 0.0 });
        }
        let (low, high) = SOLUTION_RANGE_K;
        let inside = (low..=high).contains(&temperature_k);
        match debye_hueckel(temperature_k) {
            Some(found) if inside => {
                Ok(SolutionLaw { model, a_ln: found.a_ln, b_per_pm: found.b_per_m * 1e-12 })
            }
            _ => Err(Problem::new(MixtureCode::TemperatureOutsideSolution)
                .with("found", format!("{:.2}", temperature_k - 273.15))
                .with("low", format!("{:.0}", low - 273.15))
                .with("high", format!("{:.0}", high - 273.15))
                .at("temperature_k")
                .into()),
        }
    }

    /// f(I) of an ion: ln γ = −z² f.
    fn damping(&self, ion: Ion, ionic_strength: f64) -> f64 {
        let i = ionic_strength.min(IONIC_STRENGTH_HELD_MOL_PER_KG);
        let root = libm::sqrt(i);
        match self.model {
            SolutionModel::Ideal => 0.0,
            SolutionModel::Davies => self.a_ln * (root / (1.0 + root) - 0.3 * i),
            SolutionModel::DebyeHueckel => {
                self.a_ln * root / (1.0 + self.b_per_pm * ion.size_pm * root)
            }
        }
    }

    /// ln γ of a solute at an ionic strength in mol/kg.
    ///
    /// ```
    /// use shiftgauge::mixture::{Ion, SolutionLaw, SolutionModel};
    /// // Sodium chloride, 0.1 mol/kg at 25 °C; measured: 0.778 (Robinson and Stokes).
    /// let law = SolutionLaw::new(SolutionModel::Davies, 298.15).unwrap();
    /// assert!((law.ln_coefficient(Ion::new(1), 0.1).exp() - 0.778).abs() < 0.01);
    /// ```
    #[must_use]
    pub fn ln_coefficient(&self, ion: Ion, ionic_strength: f64) -> f64 {
        if ion.charge == 0 {
            0.0
        } else {
            -ion.charge_squared() * self.damping(ion, ionic_strength)
        }
    }

    /// J(I) of an ion: the mean of I f'(I) from pure water to I.
    fn mean_change(&self, ion: Ion, ionic_strength: f64) -> f64 {
        // Beyond the held value f' is zero and the integral grows no more.
        let i = ionic_strength.min(IONIC_STRENGTH_HELD_MOL_PER_KG);
        if i <= 0.0 {
            return 0.0;
        }
        let root = libm::sqrt(i);
        let integral = match self.model {
            SolutionModel::Ideal => 0.0,
            SolutionModel::Davies => self.a_ln * (cloud(root) - 0.15 * i * i),
            SolutionModel::DebyeHueckel => {
                let b = self.b_per_pm * ion.size_pm;
                self.a_ln * cloud(b * root) / (b * b * b)
            }
        };
        integral / ionic_strength
    }

    /// ln a of the water, from each solute and its molality in mol/kg.
    ///
    /// ln a_w = −M_w (Σ m_i − Σ m_i z_i² J_i(I)). For `Ideal` and `Davies` this is Gibbs and Duhem's
    /// equation whichever way the solution was made; for `DebyeHueckel` with sizes that differ it
    /// holds along the dilution only, because that law with sizes of its own for each ion is not
    /// the derivative of any Gibbs energy.
    #[must_use]
    pub fn ln_water<I>(&self, solutes: I) -> f64
    where
        I: Iterator<Item = (Ion, f64)> + Clone,
    {
        let ionic_strength = ionic_strength_mol_per_kg(solutes.clone());
        let (mut sum, mut less) = (0.0, 0.0);
        for (ion, molality) in solutes {
            let molality = molality.min(MOLALITY_HELD_MOL_PER_KG);
            sum += molality;
            if ion.charge != 0 {
                less += molality * ion.charge_squared() * self.mean_change(ion, ionic_strength);
            }
        }
        -WATER_MOLAR_MASS_KG_PER_MOL * (sum - less).min(MOLALITY_HELD_MOL_PER_KG)
    }
}

/// ∫₀ I' d(√I'/(1 + √I')) = s − 2 ln(1 + s) + s/(1 + s), s = √I; s³/3 as s goes to zero.
fn cloud(s: f64) -> f64 {
    if s < 1e-3 {
        return s * s * s * (1.0 / 3.0 - s * (0.5 - 0.6 * s));
    }
    s - 2.0 * libm::log1p(s) + s / (1.0 + s)
}

/// I = ½ Σ m_i z_i² in mol/kg, over every solute, those that take no part too.
///
/// ```
/// use shiftgauge::mixture::{Ion, ionic_strength_mol_per_kg};
/// // 0.1 mol/kg of sodium sulfate
/// let solutes = [(Ion::new(1), 0.2), (Ion::new(-2), 0.1)];
/// assert!((ionic_strength_mol_per_kg(solutes.into_iter()) - 0.3).abs() < 1e-15);
/// ```
#[must_use]
pub fn ionic_strength_mol_per_kg(solutes: impl Iterator<Item = (Ion, f64)>) -> f64 {
    // Held where nothing can overflow.
    let half = |(ion, molality): (Ion, f64)| ion.charge_squared() * 0.5 * molality.min(1e290);
    solutes.map(half).sum()
}

/// The charges of a solution per kilogram of water.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct ChargeBalance {
    /// Σ z m over cations, equivalents per kg.
    pub positive_eq_per_kg: f64,
    /// Σ |z| m over anions, equivalents per kg.
    pub negative_eq_per_kg: f64,
    /// Positive less negative.
    pub difference_eq_per_kg: f64,
}

/// Adds up the charges of a solution, from each solute and its molality in mol/kg.
#[must_use]
pub fn charge_balance(solutes: impl Iterator<Item = (Ion, f64)>) -> ChargeBalance {
    let (mut positive, mut negative) = (0.0, 0.0);
    for (ion, molality) in solutes {
        let equivalents = f64::from(ion.charge) * molality;
        if equivalents > 0.0 {
            positive += equivalents;
        } else {
            negative -= equivalents;
        }
    }
    ChargeBalance {
        positive_eq_per_kg: positive,
        negative_eq_per_kg: negative,
        difference_eq_per_kg: positive - negative,
    }
}
