//! What a state holds: sums of amounts, a gas's volume or pressure, a solution diluted.

use crate::equilibrium::Hold;
use crate::equilibrium::Kind;
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;

/// The volume in m3 of an ideal gas at a pressure in Pa, or its pressure in a volume: n R T over
/// the other.
pub(super) fn volume_of_gas(gas_mol: f64, temperature_k: f64, pressure_pa: f64) -> f64 {
    gas_mol * GAS_CONSTANT_J_PER_MOL_K * temperature_k / pressure_pa
}

/// A solution with this many times the solvent; `None` where no solution is held.
pub(super) fn diluted(hold: Hold, times: f64) -> Option<Hold> {
    match hold {
        // The volume of an ideal solution is that of its solvent.
        Hold::Volume { volume_m3 } => Some(Hold::Volume { volume_m3: volume_m3 * times }),
        _ => None,
    }
}

/// The sum over all species of a kind.
pub(super) fn amount_of(kinds: &[Kind], kind: Kind, amounts_mol: &[f64]) -> f64 {
    let of_kind = kinds.iter().zip(amounts_mol).filter(|(other, _)| **other == kind);
    of_kind.map(|(_, amount)| amount).sum()
}
