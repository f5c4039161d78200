//! The activity of every species of a state, for reports.

use super::nonideal::molalities;
use super::state::State;
use super::system::{Kind, System};
use crate::mixture::ChargeBalance;
use crate::mixture::SolutionLaw;
use crate::mixture::charge_balance;
use crate::mixture::ionic_strength_mol_per_kg;
use crate::problem::Outcome;
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;
use crate::quantity::STANDARD_CONCENTRATION_MOL_PER_M3;
use crate::quantity::STANDARD_PRESSURE_PA;

/// The activities of a state.
#[derive(Debug, Clone, PartialEq)]
pub struct Activities {
    /// ln a of each species; none where it is absent, or where the state holds nothing that its
    /// activity could be taken from (an inert gas beside a solution).
    pub ln_activities: Vec<Option<f64>>,
    /// ln γ of each species; zero for all but solutes.
    pub ln_coefficients: Vec<f64>,
    /// What is dissolved, where the mass of water is held.
    pub solution: Option<SolutionState>,
}

/// What is dissolved in the water of a state.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct SolutionState {
    /// I = ½ Σ m z² over every solute, mol/kg.
    pub ionic_strength_mol_per_kg: f64,
    /// The charges on both sides.
    pub charge_balance: ChargeBalance,
    /// ln a of the water.
    pub ln_water_activity: f64,
    /// I over the ionic strength to which the model is trusted; above 1 the numbers are a guess.
    /// None where γ = 1 is taken.
    pub share_of_limit: Option<f64>,
}

/// The activity of every species of a state, and what is dissolved.
///
/// # Errors
/// As [`State::check`].
///
/// ```
/// use shiftgauge::equilibrium::{Hold, Kind, State, System, activities};
/// // Acetic acid and ethanol, equal amounts: x = 0.5.
/// let system = System::new(&[Kind::Liquid; 4], &[-1.0, -1.0, 1.0, 1.0]).unwrap();
/// let hold = Hold::Pressure { pressure_pa: 1e5 };
/// let state = State { temperature_k: 350.0, hold, amounts_mol: &[2.0, 2.0, 0.0, 0.0] };
/// let found = activities(&system, &state).unwrap();
/// assert!((found.ln_activities[0].unwrap() - 0.5f64.ln()).abs() < 1e-15);
/// assert_eq!(found.ln_activities[2], None);
/// ```
pub fn activities(system: &System, state: &State) -> Outcome<Activities> {
    state.check(system)?;
    let law = SolutionLaw::new(system.model(), state.temperature_k).ok();
    let water_kg = state.hold.water_kg();
    let solution = water_kg.map(|water_kg| {
        let solutes = molalities(system, state.amounts_mol, water_kg);
        let ionic_strength = ionic_strength_mol_per_kg(solutes.clone());
        SolutionState {
            ionic_strength_mol_per_kg: ionic_strength,
            charge_balance: charge_balance(solutes.clone()),
            ln_water_activity: law.map_or(0.0, |law| law.ln_water(solutes)),
            share_of_limit: system.model().limit_mol_per_kg().map(|limit| ionic_strength / limit),
        }
    });
    let coefficient = |species: usize, kind: Kind| match (law, &solution) {
        (Some(law), Some(solution)) if kind == Kind::Solute => {
            law.ln_coefficient(system.ion(species), solution.ionic_strength_mol_per_kg)
        }
        _ => 0.0,
    };
    let ln_coefficients: Vec<f64> =
        system.kinds().iter().enumerate().map(|(i, kind)| coefficient(i, *kind)).collect();
    let units = [Kind::Gas, Kind::Liquid, Kind::Solute].map(|kind| ln_unit(kind, system, state));
    let each = system.kinds().iter().zip(state.amounts_mol).zip(&ln_coefficients);
    let ln_activities = each.map(|((kind, amount), ln_coefficient)| {
        let unit = match kind {
            Kind::Pure | Kind::Ample => return Some(0.0),
            Kind::Solvent => return Some(solution.map_or(0.0, |found| found.ln_water_activity)),
            Kind::Gas => units[0],
            Kind::Liquid => units[1],
            Kind::Solute => units[2],
        };
        if *amount > 0.0 { Some(libm::log(*amount) + unit? + ln_coefficient) } else { None }
    });
    Ok(Activities { ln_activities: ln_activities.collect(), ln_coefficients, solution })
}

/// ln(a/n) of a mixture, γ left out; none where nothing is held that it could be taken from.
fn ln_unit(mixture: Kind, system: &System, state: &State) -> Option<f64> {
    let total = || -> f64 {
        let each = system.kinds().iter().zip(state.amounts_mol);
        each.filter(|(kind, _)| **kind == mixture).map(|(_, amount)| amount).sum()
    };
    let hold = state.hold;
    match (mixture, hold.pressure_pa(), hold.volume_m3(), hold.water_kg()) {
        (Kind::Liquid, ..) => Some(-libm::log(total())),
        (Kind::Solute, _, _, Some(water_kg)) => Some(-libm::log(water_kg)),
        (Kind::Solute, _, Some(volume_m3), None) => {
            Some(-libm::log(volume_m3) - libm::log(STANDARD_CONCENTRATION_MOL_PER_M3))
        }
        (Kind::Gas, Some(pressure_pa), ..) => {
            Some(libm::log(pressure_pa / STANDARD_PRESSURE_PA) - libm::log(total()))
        }
        (Kind::Gas, None, Some(volume_m3), _) => {
            let rt = GAS_CONSTANT_J_PER_MOL_K * state.temperature_k;
            Some(libm::log(rt / STANDARD_PRESSURE_PA) - libm::log(volume_m3))
        }
        _ => None,
    }
}
