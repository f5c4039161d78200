//! What a state holds: sums of amounts, a gas's volume or pressure, a solution diluted.

use crate::equilibrium::Hold;
use crate::equilibrium::Kind;
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;

/// The volume in m3 of an ideal gas at a pressure in Pa, or its pressure in a volume: n R T over
/// the other.
pub(super) fn volume_of_gas(gas_mol: f64, temperature_k: f64, pressure_pa: f64) -> f64 {
    gas_mol * GAS_CONSTANT_J_PER_MOL_K * temperature_k / pressure_pa
}

/// The same with another pressure of the gas held.
pub(super) fn with_pressure(hold: Hold, pressure_pa: f64) -> Hold {
    match hold.water_kg() {
        Some(water_kg) => Hold::PressureAndSolvent { pressure_pa, water_kg },
        None => Hold::Pressure { pressure_pa },
    }
}

/// The same with another volume of the gas held.
pub(super) fn with_volume(hold: Hold, volume_m3: f64) -> Hold {
    match hold.water_kg() {
        Some(water_kg) => Hold::VolumeAndSolvent { volume_m3, water_kg },
        None => Hold::Volume { volume_m3 },
    }
}

/// A solution with this many times the solvent; `None` where no solution is held.
pub(super) fn diluted(hold: Hold, times: f64) -> Option<Hold> {
    match hold {
        Hold::Solvent { water_kg } => Some(Hold::Solvent { water_kg: water_kg * times }),
        Hold::PressureAndSolvent { pressure_pa, water_kg } => {
            Some(Hold::PressureAndSolvent { pressure_pa, water_kg: water_kg * times })
        }
        Hold::VolumeAndSolvent { volume_m3, water_kg } => {
            Some(Hold::VolumeAndSolvent { volume_m3, water_kg: water_kg * times })
        }
        // The volume of such a solution is taken as that of its solvent.
        Hold::Volume { volume_m3 } => Some(Hold::Volume { volume_m3: volume_m3 * times }),
        Hold::Pressure { .. } => None,
    }
}

/// Whether a kind has an activity that its own amount does not change.
pub(super) fn is_pure(kind: Kind) -> bool {
    matches!(kind, Kind::Pure | Kind::Ample | Kind::Solvent)
}

/// Whether there is so much of a kind that a reaction never uses it up.
pub(super) fn is_ample(kind: Kind) -> bool {
    matches!(kind, Kind::Ample | Kind::Solvent)
}

/// The sum over all species of a kind.
pub(super) fn amount_of(kinds: &[Kind], kind: Kind, amounts_mol: &[f64]) -> f64 {
    let of_kind = kinds.iter().zip(amounts_mol).filter(|(other, _)| **other == kind);
    of_kind.fold(0.0, |sum, (_, amount)| sum + amount)
}
