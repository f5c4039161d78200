//! How far rest moved: what is held meanwhile, what never moves it, the slope on either side of a limit, and the finite
//! difference without cancellation.

use super::held::{is_ample, with_pressure, with_volume};
use super::knob::{Knob, Knobs};
use super::local::Local;
use crate::equilibrium::Affinity;
use crate::equilibrium::Hold;
use crate::equilibrium::Kind;
use crate::equilibrium::RestOutcome;

/// Below this a Δν is the rounding of its sum.
const ROUNDING_NU: f64 = 1e-12;
/// A change of an amount below this share of it is rounding of the two solutions.
const ROUNDING_SHARE: f64 = 2e-13;

/// Whether a knob has no part in A at all, so that no step of it ever moves rest.
///
/// Pressure, volume and an inert where Δν = 0, an inert in a fixed volume, dilution where as many
/// solutes are made as used up, and more of a pure phase of which some is left.
pub(super) fn is_idle(local: &Local, knob: Knob, step: f64) -> bool {
    let even = |kind| local.delta_nu(kind).abs() < ROUNDING_NU;
    match knob {
        Knob::Temperature => false,
        Knob::Pressure | Knob::Volume | Knob::InertAtPressure => even(Kind::Gas),
        Knob::InertAtVolume => true,
        // Activity coefficients change with dilution whatever Δν is.
        Knob::Dilution => even(Kind::Solute) && !local.system.is_corrected(),
        Knob::Amount(species) => match local.system.kinds().get(species) {
            Some(Kind::Ample | Kind::Solvent) => true,
            Some(Kind::Pure) => step >= 0.0 && local.amounts_mol[species] > 0.0,
            _ => false,
        },
    }
}

/// dξ/dk of rest, also where a phase is used up: there only that phase moves it, by 1/|ν|.
///
/// `None` where there is no such slope: on the border of a phase's being used up, where any extent
/// is at rest, where nothing can move and something is added.
pub(super) fn slope(
    local: &Local,
    knob: Knob,
    outcome: RestOutcome,
    affinity: &Affinity,
) -> Option<f64> {
    let gone = |species: usize| {
        let nu = local.system.nu()[species];
        nu != 0.0 && local.amounts_mol[species] == 0.0 && !is_ample(local.system.kinds()[species])
    };
    let places = || 0..local.amounts_mol.len();
    match outcome {
        RestOutcome::Rest if places().any(gone) => None,
        RestOutcome::Rest => local.derivative(knob),
        RestOutcome::AnyExtentIsAtRest | RestOutcome::HasNoLimit => None,
        RestOutcome::NothingCanMove => match knob {
            Knob::Amount(_) => None,
            _ => Some(0.0),
        },
        RestOutcome::PhaseExhausted | RestOutcome::RanToItsLimit => {
            let Knob::Amount(species) = knob else { return Some(0.0) };
            let forward = affinity.finite()? > 0.0;
            let used_up = if forward { -1.0 } else { 1.0 };
            let limits =
                |species: usize| gone(species) && local.system.nu()[species] * used_up > 0.0;
            let alone = places().filter(|&place| limits(place)).count() == 1;
            let pure = local.system.kinds()[species] == Kind::Pure;
            match outcome {
                // Another gas than what Q is made of may leave the proportion in which it is fixed.
                RestOutcome::RanToItsLimit if !pure => None,
                // A mixture that goes as a whole goes in proportion.
                RestOutcome::PhaseExhausted if !pure && limits(species) && !alone => None,
                // Forward more of a reactant carries ξ up, reverse more of a product down.
                _ if limits(species) && alone => Some(-1.0 / local.system.nu()[species]),
                _ => Some(0.0),
            }
        }
    }
}

/// ξ after the step less ξ before it, from the scarcest species that both rests hold: its change
/// over ν keeps digits that the difference of two extents loses.
///
/// Where even that difference is rounding, the slope times the step is taken.
pub(super) fn extent_change(
    local: &Local,
    knob: Knob,
    step: f64,
    after_mol: &[f64],
    plain_mol: f64,
    derivative: Option<f64>,
) -> f64 {
    let nu = local.system.nu();
    let kinds = local.system.kinds();
    let mut scarcest: Option<(f64, f64)> = None;
    for species in 0..local.amounts_mol.len() {
        if nu[species] == 0.0 || is_ample(kinds[species]) || knob == Knob::Amount(species) {
            continue;
        }
        let (before, after) = (local.amounts_mol[species], after_mol[species]);
        let size = before.max(after) / nu[species].abs();
        if scarcest.is_none_or(|(known, _)| size < known) {
            scarcest = Some((size, (after - before) / nu[species]));
        }
    }
    let Some((size, change)) = scarcest else { return plain_mol };
    if change.abs() <= ROUNDING_SHARE * size {
        return derivative.map_or(change, |slope| slope * step) + 0.0;
    }
    // Adding zero takes the sign off a zero.
    change + 0.0
}

/// A step for a slope, relative to the knob, or for what is not there yet to its step.
const NEAR: f64 = 1e-5;

/// dξ/dk as a difference of two states of rest close by, good to about 1e-7: for solutions with
/// activity coefficients, which know no formula here.
pub(super) fn difference(knobs: &mut Knobs, local: &Local, knob: Knob, step: f64) -> Option<f64> {
    let value = knobs.value(knob)?;
    let now_mol = knobs.now().extent_mol;
    let near = NEAR * if value > 0.0 { value } else { step.abs() };
    let mut change = |by: f64| {
        let rest = knobs.rest(&[(knob, value + by)])?;
        let plain = rest.extent_mol - now_mol;
        let found = extent_change(local, knob, by, knobs.amounts_mol(), plain, None);
        (rest.outcome == RestOutcome::Rest).then_some(found)
    };
    if value > 0.0 {
        return Some((change(near)? - change(-near)?) / (2.0 * near));
    }
    // Below nothing there is no state: a difference from one side, of second order too.
    Some((4.0 * change(near)? - change(2.0 * near)?) / (2.0 * near))
}

/// What is held while this knob is turned.
pub(super) fn hold_for(knobs: &Knobs, knob: Knob) -> Hold {
    let hold = knobs.plant().state.hold;
    match knob {
        Knob::InertAtPressure if hold.volume_m3().is_some() => {
            knobs.pressure_pa().map_or(hold, |pressure_pa| with_pressure(hold, pressure_pa))
        }
        Knob::InertAtVolume if hold.pressure_pa().is_some() => {
            knobs.volume_m3().map_or(hold, |volume_m3| with_volume(hold, volume_m3))
        }
        _ => hold,
    }
}
