//! Activity coefficients in the solution, and the activity of its water.
//!
//! A/RT = ln K − C(ξ) − ln Q_ideal(ξ), with C = Σ ν_i ln γ_i + ν_w ln a_w. For a number L in the
//! place of ln K − C the ideal state of rest has the extent ξ(L), which rises with L, so rest is the
//! zero of F(L) = ln K − C(ξ(L)) − L. It is bracketed from L = ln K − C(now) outwards.

use super::limits::LN_K_MAX;
use super::outcome::{RestOutcome, Summary, Workspace};
use super::quotient::{Affinity, less};
use super::rest::ideal_rest;
use super::state::State;
use super::system::{Kind, System};
use crate::mixture::Ion;
use crate::mixture::SolutionLaw;
use crate::mixture::SolutionModel;
use crate::mixture::ionic_strength_mol_per_kg;
use crate::numeric::root_between;
use crate::problem::Outcome;

/// Each solute and its molality, inert ones too.
pub(super) fn molalities(
    system: &System,
    amounts: &[f64],
    water_kg: f64,
) -> impl Iterator<Item = (Ion, f64)> + Clone {
    let each = system.kinds.iter().zip(amounts).enumerate();
    let solutes = each.filter(|(_, (kind, _))| **kind == Kind::Solute);
    solutes.map(move |(place, (_, amount))| (system.ion(place), molality(*amount, water_kg)))
}

/// Above any amount that means something, and small enough to be added up.
const MOLALITY_MOST: f64 = 1e290;

fn molality(amount_mol: f64, water_kg: f64) -> f64 {
    (amount_mol / water_kg).min(MOLALITY_MOST)
}

/// What activity coefficients and the water's activity add to ln Q of a state:
/// Σ ν_i ln γ_i + ν_w ln a_w.
///
/// Zero for an ideal system without its solvent in the reaction, and where no mass of water is held.
///
/// # Errors
/// As [`State::check`].
pub fn ln_q_correction(system: &System, state: &State) -> Outcome<f64> {
    state.check(system)?;
    Ok(correction(system, state, state.amounts_mol))
}

/// Σ ν_i ln γ_i + ν_w ln a_w of a state that has been checked; zero where no mass of water is held.
pub(super) fn correction(system: &System, state: &State, amounts: &[f64]) -> f64 {
    let Some(water_kg) = state.hold.water_kg() else { return 0.0 };
    match SolutionLaw::new(system.model, state.temperature_k) {
        Ok(law) => with_law(system, &law, amounts, water_kg),
        // Such a state does not pass the check, unless nothing in the solution reacts.
        Err(_) => 0.0,
    }
}

fn with_law(system: &System, law: &SolutionLaw, amounts: &[f64], water_kg: f64) -> f64 {
    let solutes = molalities(system, amounts, water_kg);
    let mut sum = 0.0;
    if system.model != SolutionModel::Ideal {
        let ionic_strength = ionic_strength_mol_per_kg(solutes.clone());
        let reacting =
            system.mixed.iter().filter(|mixed| system.kinds[mixed.species] == Kind::Solute);
        for mixed in reacting {
            sum += mixed.nu * law.ln_coefficient(system.ion(mixed.species), ionic_strength);
        }
    }
    if system.solvent_nu != 0.0 {
        sum += system.solvent_nu * law.ln_water(solutes);
    }
    sum
}

/// Steps outwards that double: from 1e-12 to beyond 1e5.
const WIDENINGS_AT_MOST: u32 = 60;

/// The largest ln K − C that is tried, without sign.
const EFFECTIVE_MAX: f64 = 2.0 * LN_K_MAX;

/// The state of rest of a system that is not plain, for a state that has been checked.
pub(super) fn rest(
    system: &System,
    state: &State,
    ln_k: f64,
    workspace: &mut Workspace,
) -> Summary {
    let law = SolutionLaw::new(system.model, state.temperature_k);
    let (Some(water_kg), Ok(law)) = (state.hold.water_kg(), law) else {
        return ideal_rest(system, state, ln_k, workspace);
    };
    let now = with_law(system, &law, state.amounts_mol, water_kg);
    let within = |effective: f64| effective.clamp(-EFFECTIVE_MAX, EFFECTIVE_MAX);
    let first = within(ln_k - now);
    let changes = system.reacts(Kind::Solute)
        && (system.model != SolutionModel::Ideal || system.solvent_nu != 0.0);
    let mut iterations = 0;
    let mut solve = |effective: f64| -> (Summary, f64) {
        let summary = ideal_rest(system, state, effective, workspace);
        iterations += summary.iterations;
        let there = match summary.outcome {
            RestOutcome::HasNoLimit if changes => far(system, &law, state, water_kg),
            _ => with_law(system, &law, workspace.amounts_mol(), water_kg),
        };
        (summary, (ln_k - there) - effective)
    };
    let effective = if changes { zero(|effective| solve(effective).1, first) } else { first };
    let (summary, left) = solve(effective);
    finish(system, state, ln_k, Summary { iterations, ..summary }, left)
}

/// The correction where the reacting solutes have become as concentrated as you like.
fn far(system: &System, law: &SolutionLaw, state: &State, water_kg: f64) -> f64 {
    let each = state.amounts_mol.iter().zip(&system.nu).zip(&system.kinds);
    let amounts = each.map(
        |((amount, nu), kind)| {
            if *kind == Kind::Solute && *nu != 0.0 { f64::MAX } else { *amount }
        },
    );
    with_law(system, law, &amounts.collect::<Vec<f64>>(), water_kg)
}

/// The zero of F that is met first on the way out from a number, or the last number of that way.
fn zero(mut f: impl FnMut(f64) -> f64, first: f64) -> f64 {
    let at_first = f(first);
    if at_first == 0.0 {
        return first;
    }
    let (mut near, mut step) = (first, at_first);
    for _ in 0..WIDENINGS_AT_MOST {
        let next = (near + step).clamp(-EFFECTIVE_MAX, EFFECTIVE_MAX);
        if next == near {
            return near;
        }
        if (f(next) > 0.0) != (at_first > 0.0) {
            return root_between(f, near, next, 1e-15).x;
        }
        (near, step) = (next, 2.0 * step);
    }
    near
}

/// Tells the ideal state of rest by the true affinity.
fn finish(system: &System, state: &State, ln_k: f64, ideal: Summary, left: f64) -> Summary {
    let add = |affinity: Affinity| match affinity {
        Affinity::Finite(value) => Affinity::Finite(value + left),
        open => open,
    };
    match ideal.outcome {
        RestOutcome::Rest => {
            let affinity = add(ideal.affinity);
            let residual = affinity.finite().map_or(0.0, f64::abs);
            Summary { affinity, residual, ..ideal }
        }
        RestOutcome::PhaseExhausted
        | RestOutcome::RanToItsLimit
        | RestOutcome::AnyExtentIsAtRest => Summary { affinity: add(ideal.affinity), ..ideal },
        RestOutcome::NothingCanMove | RestOutcome::HasNoLimit => {
            Summary { affinity: less(system, state, ln_k), ..ideal }
        }
    }
}
