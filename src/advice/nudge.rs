//! One small change of one knob, and what it does to rest.

use super::held::{amount_of, is_ample, is_pure};
use super::knob::{Knob, Knobs, Plant};
use super::local::Local;
use super::moved::{difference, extent_change, hold_for, is_idle, slope};
use super::reason::{Reason, Turned, reason};
use super::verdict::Direction;
use crate::equilibrium::Kind;
use crate::equilibrium::RestOutcome;
use crate::problem::Outcome;

/// A step of the temperature, in K.
const STEP_K: f64 = 5.0;
/// A step of the pressure or the volume, of what it is.
const STEP_SHARE: f64 = 0.05;
/// A species added, of its phase.
const STEP_SPECIES: f64 = 0.01;
/// An inert gas added, of the gas.
const STEP_INERT: f64 = 0.05;
/// Water added to a solution, of what there is.
const STEP_DILUTION: f64 = 0.10;
/// A product taken away, of its amount.
const STEP_REMOVED: f64 = 0.10;

/// What one step of one knob does to rest.
///
/// All amounts belong to the basis of the plant's present amounts. Where there is no rest to
/// compare with, before or after, `extent_change_mol` is `None` and the reason says why.
#[derive(Debug, Clone, PartialEq)]
pub struct Nudge {
    /// The knob.
    pub knob: Knob,
    /// Where it stands, in the knob's unit. For a product taken away of which none is present, its
    /// amount at rest.
    pub value: f64,
    /// The step, in the same unit; negative where something is taken away.
    pub step: f64,
    /// How rest is after the step; `None` where the step leads outside what can be worked with, or
    /// nothing tells how K changes.
    pub outcome: Option<RestOutcome>,
    /// Which way rest moves; `None` where it does not, or is not known.
    pub direction: Option<Direction>,
    /// Which way a very small step of the same sign would move it; where this is another way than
    /// `direction`, both are to be said.
    pub local: Option<Direction>,
    /// ξ at rest after the step less ξ at rest before it.
    pub extent_change_mol: Option<f64>,
    /// dξ/d(knob) at rest, in mol per unit of the knob; for the relative solvent of a dilution, in
    /// mol. `None` where rest has no such slope.
    pub derivative: Option<f64>,
    /// Amounts at rest after the step, one for each species of the plant; empty if not known.
    pub rest_mol: Vec<f64>,
    /// Their change from rest before the step, with what was added or taken away; empty if not
    /// known.
    pub change_mol: Vec<f64>,
    /// Why.
    pub reason: Reason,
    /// What must be said beside it: a crossing, a phase that is used up.
    pub aside: Option<Reason>,
}

impl Nudge {
    /// The name of what is done, at the border.
    #[must_use]
    pub fn name(&self) -> &'static str {
        match self.knob {
            Knob::Temperature => "temperature",
            Knob::Pressure => "pressure",
            Knob::Volume => "volume",
            Knob::Amount(_) if self.step < 0.0 => "remove",
            Knob::Amount(_) => "add",
            Knob::InertAtPressure => "inert at constant pressure",
            Knob::InertAtVolume => "inert at constant volume",
            Knob::Dilution => "dilution",
        }
    }

    /// The place of the species that is added or taken away.
    #[must_use]
    pub fn species(&self) -> Option<usize> {
        match self.knob {
            Knob::Amount(species) => Some(species),
            _ => None,
        }
    }
}

/// Every usual nudge of a plant: +5 K; +5 % of the pressure or the volume of a gas, whichever is
/// held; +10 % water to a solution; 1 % of its phase of each reacting species; a tenth of each
/// product away; 5 % of the gas of an inert, at constant pressure and at constant volume.
///
/// The steps are common practice, no source.
///
/// # Errors
/// As [`Knobs::new`].
///
/// ```
/// use shiftgauge::advice::{Direction, Plant, nudges};
/// use shiftgauge::constant::{Constant, StatedConstant};
/// use shiftgauge::equilibrium::{Hold, Kind, State, System};
/// // N2O4 = 2 NO2 takes up heat and makes gas.
/// let system = System::new(&[Kind::Gas; 2], &[-1.0, 2.0]).unwrap();
/// let hold = Hold::Pressure { pressure_pa: 100_000.0 };
/// let state = State { temperature_k: 330.0, hold, amounts_mol: &[1.0, 0.0] };
/// let constant = Constant::Stated(StatedConstant {
///     ln_k: 0.0, u_ln_k: None, at_k: Some(330.0), enthalpy_j_per_mol: Some(57_000.0),
///     u_enthalpy_j_per_mol: None, heat_capacity_j_per_mol_k: None,
/// });
/// let plant = Plant { system: &system, state, constant: &constant, approach_k: 0.0 };
/// let found = nudges(plant).unwrap();
/// let way = |name| found.iter().find(|nudge| nudge.name() == name).unwrap().direction;
/// assert_eq!(way("temperature"), Some(Direction::Forward));
/// assert_eq!(way("pressure"), Some(Direction::Reverse));
/// assert_eq!(way("inert at constant volume"), None);
/// ```
pub fn nudges(plant: Plant) -> Outcome<Vec<Nudge>> {
    let mut knobs = Knobs::new(plant)?;
    let mut found = Vec::with_capacity(2 * plant.system.nu().len() + 5);
    found.push(nudge(&mut knobs, Knob::Temperature, STEP_K));
    let held = match plant.state.hold.pressure_pa() {
        Some(_) => Knob::Pressure,
        None => Knob::Volume,
    };
    if let Some(value) = knobs.value(held) {
        found.push(nudge(&mut knobs, held, STEP_SHARE * value));
    }
    if knobs.has(Knob::Dilution) {
        found.push(nudge(&mut knobs, Knob::Dilution, STEP_DILUTION));
    }
    let reacting = |sign: f64| {
        let each = plant.system.nu().iter().enumerate();
        each.filter(move |(_, nu)| **nu * sign > 0.0).map(|(species, _)| species)
    };
    // More of the solvent is dilution.
    let dissolves = |species: &usize| plant.system.kinds()[*species] == Kind::Solvent;
    for species in reacting(-1.0).chain(reacting(1.0)).filter(|species| !dissolves(species)) {
        let step = STEP_SPECIES * basis_mol(&knobs, species);
        found.push(nudge(&mut knobs, Knob::Amount(species), step));
    }
    for species in reacting(1.0) {
        let present = plant.state.amounts_mol[species];
        let amount = if present > 0.0 { present } else { knobs.now_mol()[species] };
        if amount > 0.0 && !is_ample(plant.system.kinds()[species]) {
            found.push(nudge(&mut knobs, Knob::Amount(species), -STEP_REMOVED * amount));
        }
    }
    if knobs.has(Knob::InertAtPressure) {
        let step = STEP_INERT * gas_mol(&knobs);
        found.push(nudge(&mut knobs, Knob::InertAtPressure, step));
        found.push(nudge(&mut knobs, Knob::InertAtVolume, step));
    }
    Ok(found)
}

/// What steps of a species are measured by: its phase, or where that is empty all there is.
fn basis_mol(knobs: &Knobs, species: usize) -> f64 {
    let Plant { system, state, .. } = knobs.plant();
    let own = match system.kinds()[species] {
        Kind::Gas => gas_mol(knobs),
        pure if is_pure(pure) => state.amounts_mol[species],
        other => amount_of(system.kinds(), other, state.amounts_mol),
    };
    if own > 0.0 { own } else { all_mol(knobs) }
}

/// The gas at present, or if there is none the gas at rest, or if there is none all there is.
fn gas_mol(knobs: &Knobs) -> f64 {
    let Plant { system, state, .. } = knobs.plant();
    let present = amount_of(system.kinds(), Kind::Gas, state.amounts_mol);
    let amount =
        if present > 0.0 { present } else { amount_of(system.kinds(), Kind::Gas, knobs.now_mol()) };
    if amount > 0.0 { amount } else { all_mol(knobs) }
}

fn all_mol(knobs: &Knobs) -> f64 {
    let Plant { system, state, .. } = knobs.plant();
    let each = system.kinds().iter().zip(state.amounts_mol);
    let sum: f64 = each.filter(|(kind, _)| !is_ample(**kind)).map(|(_, amount)| amount).sum();
    if sum > 0.0 { sum } else { 1.0 }
}

/// One step of one knob.
///
/// The step is positive for more and negative for less; sentences of pressure, volume, inert and
/// dilution speak of more. Taking away a species of which none is present starts from rest.
pub fn nudge(knobs: &mut Knobs, knob: Knob, step: f64) -> Nudge {
    let plant = *knobs.plant();
    let before = *knobs.now();
    let from_rest = match knob {
        Knob::Amount(species) if step < 0.0 => {
            plant.state.amounts_mol.get(species).is_some_and(|amount| *amount == 0.0)
        }
        _ => false,
    };
    let value = match knob {
        Knob::Amount(species) if from_rest => knobs.now_mol()[species],
        _ => knobs.value(knob).unwrap_or(0.0),
    };
    let now_mol = knobs.now_mol().to_vec();
    let local = Local {
        system: plant.system,
        hold: hold_for(knobs, knob),
        temperature_k: plant.state.temperature_k,
        ln_k_per_k: knobs.heat().map(|(_, per_k)| per_k),
        amounts_mol: &now_mol,
    };
    let idle = is_idle(&local, knob, step);
    // Where nothing can move K does not matter.
    let unknown = knob == Knob::Temperature
        && !plant.constant.knows_temperature()
        && before.outcome != RestOutcome::NothingCanMove;
    let no_rest = before.outcome == RestOutcome::HasNoLimit;
    let corrected = plant.system.is_corrected() && before.outcome == RestOutcome::Rest && !idle;
    let derivative = if unknown {
        None
    } else if corrected {
        difference(knobs, &local, knob, step)
    } else {
        slope(&local, knob, before.outcome, &before.affinity)
    };
    let after = if idle || unknown || no_rest {
        None
    } else if let (Knob::Amount(species), true) = (knob, from_rest) {
        knobs.rest_from_rest(species, value + step)
    } else {
        knobs.rest(&[(knob, value + step)])
    };
    let extent_change_mol = if unknown || no_rest {
        None
    } else if idle {
        Some(0.0)
    } else {
        after.and_then(|after| match (before.outcome, after.outcome) {
            (_, RestOutcome::HasNoLimit) => None,
            (RestOutcome::AnyExtentIsAtRest, RestOutcome::AnyExtentIsAtRest) => Some(0.0),
            (_, RestOutcome::AnyExtentIsAtRest) => None,
            _ => {
                let from = if from_rest { 0.0 } else { before.extent_mol };
                let plain = after.extent_mol - from;
                Some(extent_change(&local, knob, step, knobs.amounts_mol(), plain, derivative))
            }
        })
    };
    let way = |x: f64| match x {
        x if x > 0.0 => Some(Direction::Forward),
        x if x < 0.0 => Some(Direction::Reverse),
        _ => None,
    };
    let direction = extent_change_mol.and_then(way);
    let local_way = derivative.and_then(|slope| way(slope * step));
    let outcome = match extent_change_mol {
        Some(_) if idle => Some(before.outcome),
        _ => after.map(|after| after.outcome),
    };
    let turned = Turned { knob, step, idle, unknown, outcome, direction, local: local_way };
    let (reason, aside) = reason(knobs, &local, &turned);
    let (mut rest_mol, mut change_mol) = (Vec::new(), Vec::new());
    if let Some(extent) = extent_change_mol {
        let added = |species| if knob == Knob::Amount(species) { step } else { 0.0 };
        let each = plant.system.nu().iter().zip(plant.system.kinds()).enumerate();
        change_mol.extend(each.map(|(species, (nu, kind))| {
            let turnover = if is_ample(*kind) { 0.0 } else { nu * extent };
            added(species) + turnover
        }));
        if idle {
            rest_mol.extend(now_mol.iter().zip(&change_mol).map(|(now, change)| now + change));
        } else {
            rest_mol.extend_from_slice(&knobs.amounts_mol()[..now_mol.len()]);
        }
    }
    Nudge {
        knob,
        value,
        step,
        outcome,
        direction,
        local: local_way,
        extent_change_mol,
        derivative,
        rest_mol,
        change_mol,
        reason,
        aside,
    }
}
