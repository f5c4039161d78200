//! A state: temperature, what is held, and the amounts.

use super::limits::AMOUNT_MAX_MOL;
use super::system::System;
use crate::numeric::{Scaled, split};
use crate::problem::EquilibriumCode;
use crate::problem::Outcome;
use crate::problem::Problem;
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;
use crate::quantity::STANDARD_CONCENTRATION_MOL_PER_M3;
use crate::quantity::STANDARD_PRESSURE_PA;

/// What is held while the reaction runs, beside the temperature.
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
    /// `solutes-hold-pressure`.
    pub fn check(&self, system: &System) -> Outcome<()> {
        let held = match self.hold {
            Hold::Pressure { pressure_pa } => pressure_pa,
            Hold::Volume { volume_m3 } => volume_m3,
        };
        let positive = |x: f64| x > 0.0 && x < f64::INFINITY;
        // The usual case costs one pass and no allocation.
        if positive(self.temperature_k)
            && positive(held)
            && self.amounts_mol.len() == system.kinds.len()
            && self.amounts_mol.iter().all(|amount| (0.0..=AMOUNT_MAX_MOL).contains(amount))
            && !(system.has_solute && matches!(self.hold, Hold::Pressure { .. }))
        {
            return Ok(());
        }
        Err(self.problems(system))
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
        let (held, field, code) = match self.hold {
            Hold::Pressure { pressure_pa } => {
                (pressure_pa, "pressure_pa", EquilibriumCode::PressureNotPositive)
            }
            Hold::Volume { volume_m3 } => {
                (volume_m3, "volume_m3", EquilibriumCode::VolumeNotPositive)
            }
        };
        let temperature = EquilibriumCode::TemperatureNotPositive;
        for (value, field, code) in
            [(self.temperature_k, "temperature_k", temperature), (held, field, code)]
        {
            if !value.is_finite() {
                problems.push(Problem::new(EquilibriumCode::NotFinite).at(field));
            } else if value <= 0.0 {
                problems.push(Problem::new(code).with("found", format!("{value:?}")).at(field));
            }
        }
        if system.has_solute && matches!(self.hold, Hold::Pressure { .. }) {
            problems.push(Problem::new(EquilibriumCode::SolutesHoldPressure).at("hold"));
        }
        problems
    }

    /// What turns an amount (holding volume) or an amount fraction (holding pressure) into an
    /// activity, to a whole power: (P/p°)^power, (R T/(V p°))^power or (1/(V c°))^power.
    pub(super) fn activity_unit(&self, system: &System, power: i32) -> Scaled {
        match self.hold {
            _ if power == 0 => Scaled::ONE,
            Hold::Pressure { pressure_pa } => {
                Scaled::ONE.times(pressure_pa, power).times(STANDARD_PRESSURE_PA, -power)
            }
            Hold::Volume { volume_m3 } if system.has_solute => Scaled::ONE
                .times(volume_m3, -power)
                .times(STANDARD_CONCENTRATION_MOL_PER_M3, -power),
            Hold::Volume { volume_m3 } => Scaled::ONE
                .times(self.temperature_k, power)
                .times(GAS_CONSTANT_J_PER_MOL_K, power)
                .times(volume_m3, -power)
                .times(STANDARD_PRESSURE_PA, -power),
        }
    }

    /// ln(P/p°) to within ln 2; zero where the pressure is not held.
    pub(super) fn rough_ln_pressure(&self) -> f64 {
        match self.hold {
            Hold::Pressure { pressure_pa } => {
                f64::from(split(pressure_pa / STANDARD_PRESSURE_PA).1) * std::f64::consts::LN_2
            }
            Hold::Volume { .. } => 0.0,
        }
    }

    /// Whether activities follow amount fractions: a gas whose pressure is held.
    pub(super) fn by_fraction(&self, system: &System) -> bool {
        system.has_gas && matches!(self.hold, Hold::Pressure { .. })
    }
}
