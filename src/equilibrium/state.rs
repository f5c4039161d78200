//! A state: temperature, what is held, and the amounts.

use super::limits::AMOUNT_MAX_MOL;
use super::system::{Kind, System};
use crate::mixture::SolutionLaw;
use crate::mixture::SolutionModel;
use crate::numeric::{Scaled, split};
use crate::problem::EquilibriumCode;
use crate::problem::Outcome;
use crate::problem::Problem;
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;
use crate::quantity::STANDARD_CONCENTRATION_MOL_PER_M3;
use crate::quantity::STANDARD_PRESSURE_PA;

/// What is held while the reaction runs, beside the temperature.
///
/// The gas has a pressure or a volume of its own, the solution a mass of water or a volume. A liquid
/// mixture and pure phases do not look at it.
#[derive(Debug, Clone, Copy, PartialEq)]
pub enum Hold {
    /// The pressure: the gas takes the volume that it needs. a = y P/p°.
    Pressure {
        /// Absolute pressure in Pa.
        pressure_pa: f64,
    },
    /// The volume, of the gas (a = n R T/(V p°)) or of the solution (a = n/(V c°)).
    Volume {
        /// Volume in m3.
        volume_m3: f64,
    },
    /// The water of the solution, where no gas reacts: a = γ n/(w m°), m° = 1 mol/kg.
    Solvent {
        /// Mass of water in kg.
        water_kg: f64,
    },
    /// The pressure of the gas and the water of the solution.
    PressureAndSolvent {
        /// Absolute pressure in Pa.
        pressure_pa: f64,
        /// Mass of water in kg.
        water_kg: f64,
    },
    /// The volume of the gas and the water of the solution.
    VolumeAndSolvent {
        /// Volume of the gas in m3.
        volume_m3: f64,
        /// Mass of water in kg.
        water_kg: f64,
    },
}

impl Hold {
    /// The pressure that is held, in Pa.
    #[must_use]
    pub fn pressure_pa(self) -> Option<f64> {
        match self {
            Hold::Pressure { pressure_pa } | Hold::PressureAndSolvent { pressure_pa, .. } => {
                Some(pressure_pa)
            }
            _ => None,
        }
    }

    /// The volume that is held, in m3.
    #[must_use]
    pub fn volume_m3(self) -> Option<f64> {
        match self {
            Hold::Volume { volume_m3 } | Hold::VolumeAndSolvent { volume_m3, .. } => {
                Some(volume_m3)
            }
            _ => None,
        }
    }

    /// The mass of water that is held, in kg.
    #[must_use]
    pub fn water_kg(self) -> Option<f64> {
        match self {
            Hold::Solvent { water_kg }
            | Hold::PressureAndSolvent { water_kg, .. }
            | Hold::VolumeAndSolvent { water_kg, .. } => Some(water_kg),
            _ => None,
        }
    }
}

/// Temperature, what is held, and the amount of every species of a system.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct State<'a> {
    /// Temperature in K.
    pub temperature_k: f64,
    /// Pressure or volume.
    pub hold: Hold,
    /// Amounts in mol, in the order of the system's species.
    pub amounts_mol: &'a [f64],
}

impl State<'_> {
    /// Finds everything that keeps this state from being worked with, together with ln K.
    ///
    /// # Errors
    /// `lengths-differ`, `number-not-finite`, `amount-out-of-range` (0 to [`AMOUNT_MAX_MOL`]),
    /// `temperature-not-positive`, `pressure-not-positive`, `volume-not-positive`,
    /// `water-not-positive`, `solutes-hold-pressure`, `solutes-with-gas` (they need the mass of
    /// water), `gas-holds-solvent`, `model-needs-water`, `temperature-outside-solution`.
    pub fn check(&self, system: &System) -> Outcome<()> {
        let positive = |x: f64| x > 0.0 && x < f64::INFINITY;
        // The usual case costs one pass and no allocation.
        let held = match self.hold {
            Hold::Pressure { pressure_pa } if system.mixture != Kind::Solute => pressure_pa,
            Hold::Volume { volume_m3 } => volume_m3,
            Hold::Solvent { water_kg } if system.mixture == Kind::Solute => water_kg,
            _ => f64::NAN,
        };
        if system.plain
            && positive(self.temperature_k)
            && positive(held)
            && self.amounts_mol.len() == system.kinds.len()
            && self.amounts_mol.iter().all(|amount| (0.0..=AMOUNT_MAX_MOL).contains(amount))
        {
            return Ok(());
        }
        let problems = self.problems(system);
        if problems.is_empty() { Ok(()) } else { Err(problems) }
    }

    #[cold]
    fn problems(&self, system: &System) -> Vec<Problem> {
        let mut problems = Vec::new();
        if self.amounts_mol.len() != system.kinds.len() {
            problems.push(
                Problem::new(EquilibriumCode::LengthsDiffer)
                    .with("what", "amounts")
                    .with("found", self.amounts_mol.len().to_string())
                    .with("expected", system.kinds.len().to_string())
                    .at("amounts_mol"),
            );
        }
        for (place, &amount) in self.amounts_mol.iter().enumerate() {
            let field = format!("amounts_mol[{place}]");
            if !amount.is_finite() {
                problems.push(Problem::new(EquilibriumCode::NotFinite).at(&field));
            } else if !(0.0..=AMOUNT_MAX_MOL).contains(&amount) {
                problems.push(
                    Problem::new(EquilibriumCode::AmountOutOfRange)
                        .with("found", format!("{amount:?}"))
                        .with("most", format!("{AMOUNT_MAX_MOL:e}"))
                        .at(&field),
                );
            }
        }
        let numbers = [
            (Some(self.temperature_k), "temperature_k", EquilibriumCode::TemperatureNotPositive),
            (self.hold.pressure_pa(), "pressure_pa", EquilibriumCode::PressureNotPositive),
            (self.hold.volume_m3(), "volume_m3", EquilibriumCode::VolumeNotPositive),
            (self.hold.water_kg(), "water_kg", EquilibriumCode::WaterNotPositive),
        ];
        for (value, field, code) in numbers {
            let Some(value) = value else { continue };
            if !value.is_finite() {
                problems.push(Problem::new(EquilibriumCode::NotFinite).at(field));
            } else if value <= 0.0 {
                problems.push(Problem::new(code).with("found", format!("{value:?}")).at(field));
            }
        }
        let (gas, solute) = (system.reacts(Kind::Gas), system.reacts(Kind::Solute));
        match self.hold {
            Hold::Pressure { .. } | Hold::Volume { .. } if gas && solute => {
                problems.push(Problem::new(EquilibriumCode::SolutesWithGas).at("species"));
            }
            Hold::Pressure { .. } if solute => {
                problems.push(Problem::new(EquilibriumCode::SolutesHoldPressure).at("hold"));
            }
            Hold::Solvent { .. } if gas => {
                problems.push(Problem::new(EquilibriumCode::GasHoldsSolvent).at("hold"));
            }
            _ => {}
        }
        if system.model != SolutionModel::Ideal && (solute || system.solvent_nu != 0.0) {
            if self.hold.water_kg().is_none() {
                problems.push(Problem::new(EquilibriumCode::ModelNeedsWater).at("hold"));
            }
            if self.temperature_k > 0.0 && self.temperature_k < f64::INFINITY {
                let law = SolutionLaw::new(system.model, self.temperature_k);
                problems.extend(law.err().into_iter().flatten());
            }
        }
        problems
    }

    /// What turns an amount, or an amount fraction, of a mixture into an activity, to a whole power:
    /// (P/p°)^power, (R T/(V p°))^power, (1/(w m°))^power, (1/(V c°))^power, or 1 for a liquid.
    #[inline(always)]
    pub(super) fn activity_unit(&self, mixture: Kind, power: i32) -> Scaled {
        if power == 0 || mixture == Kind::Liquid {
            return Scaled::ONE;
        }
        match self.hold {
            Hold::Solvent { water_kg }
            | Hold::PressureAndSolvent { water_kg, .. }
            | Hold::VolumeAndSolvent { water_kg, .. }
                if mixture == Kind::Solute =>
            {
                Scaled::ONE.times(water_kg, -power)
            }
            Hold::Pressure { pressure_pa } | Hold::PressureAndSolvent { pressure_pa, .. } => {
                Scaled::ONE.times(pressure_pa, power).times(STANDARD_PRESSURE_PA, -power)
            }
            Hold::Volume { volume_m3 } if mixture == Kind::Solute => Scaled::ONE
                .times(volume_m3, -power)
                .times(STANDARD_CONCENTRATION_MOL_PER_M3, -power),
            Hold::Volume { volume_m3 } | Hold::VolumeAndSolvent { volume_m3, .. } => Scaled::ONE
                .times(self.temperature_k, power)
                .times(GAS_CONSTANT_J_PER_MOL_K, power)
                .times(volume_m3, -power)
                .times(STANDARD_PRESSURE_PA, -power),
            // A gas with the water alone held does not pass the check.
            Hold::Solvent { .. } => Scaled::ONE,
        }
    }

    /// ln(P/p°) to within ln 2; zero where the pressure is not held.
    pub(super) fn rough_ln_pressure(&self) -> f64 {
        match self.hold.pressure_pa() {
            Some(pressure_pa) => {
                f64::from(split(pressure_pa / STANDARD_PRESSURE_PA).1) * std::f64::consts::LN_2
            }
            None => 0.0,
        }
    }

    /// Whether the activities of a mixture follow amount fractions: a liquid, or a gas whose
    /// pressure is held.
    #[inline(always)]
    pub(super) fn by_fraction(&self, mixture: Kind) -> bool {
        match mixture {
            Kind::Liquid => true,
            Kind::Gas => self.hold.pressure_pa().is_some(),
            _ => false,
        }
    }
}
