//! The work that the benchmarks time, the same natively and inside WebAssembly.
//!
//! Only with the feature `bench`. The reaction is CH4(g) + H2O(g) = CO(g) + 3 H2(g) with nitrogen
//! beside it, at 25 bar, for 256 invented compositions from 900 K to 1200 K.

use crate::equilibrium::Hold;
use crate::equilibrium::Kind;
use crate::equilibrium::State;
use crate::equilibrium::System;
use crate::equilibrium::Workspace;
use crate::equilibrium::affinity;
use crate::equilibrium::rest_into;
use crate::library;
use crate::library::Combination;
use crate::library::Temperature;
use crate::problem::Outcome;
use crate::reaction::Phase;

/// Formulas and stoichiometric numbers; the last takes no part.
const SPECIES: [(&str, f64); 5] =
    [("CH4", -1.0), ("H2O", -1.0), ("CO", 1.0), ("H2", 3.0), ("N2", 0.0)];
const NU: [f64; 5] = [-1.0, -1.0, 1.0, 3.0, 0.0];
const PRESSURE_PA: f64 = 2.5e6;
const STATES: u32 = 256;

/// A kind of work, done once a state.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum Work {
    /// K(T) from the library's sums, Q, and the state of rest.
    Solve,
    /// The state of rest with K known.
    Rest,
    /// K(T) alone, its logarithm of T included.
    Constant,
    /// ln K − ln Q with K known.
    Affinity,
}

impl Work {
    /// Every kind, with its name in the table of results.
    pub const ALL: [(Work, &'static str); 4] = [
        (Work::Solve, "K(T), Q and rest"),
        (Work::Rest, "rest"),
        (Work::Constant, "K(T)"),
        (Work::Affinity, "affinity"),
    ];
}

/// What is made once and used by every batch.
#[derive(Debug)]
pub struct Bench {
    reaction: Combination,
    system: System,
    states: Vec<(f64, [f64; 5], f64)>,
    workspace: Workspace,
}

impl Bench {
    /// Reads the species and makes the states.
    ///
    /// # Errors
    /// Those of the library and of [`System::new`]; none with the tables as they are.
    pub fn new() -> Outcome<Bench> {
        let mut terms = Vec::new();
        for (formula, nu) in SPECIES {
            terms.push((library::one(formula, Some(Phase::Gas), None)?, nu));
        }
        let reaction = Combination::new(&terms)?;
        let mut states = Vec::new();
        for place in 0..STATES {
            let temperature_k = 900.0 + 300.0 * f64::from(place) / f64::from(STATES);
            // Multiples of five steps that have no common factor with 257: every mixture differs.
            let amount_mol = |step: u32| 0.05 + f64::from(place * step % 257) / 257.0;
            let amounts_mol = [3, 5, 7, 9, 11].map(amount_mol);
            let ln_k = reaction.ln_k(Temperature::new(temperature_k)?);
            states.push((temperature_k, amounts_mol, ln_k));
        }
        let system = System::new(&[Kind::Gas; 5], &NU)?;
        Ok(Bench { reaction, system, states, workspace: Workspace::default() })
    }

    /// Does the work `count` times, and adds up what it gave, so that none of it can be left out.
    ///
    /// # Errors
    /// Those of the calls; none with the states as they are.
    pub fn run(&mut self, work: Work, count: u32) -> Outcome<f64> {
        let hold = Hold::Pressure { pressure_pa: PRESSURE_PA };
        let mut sum = 0.0;
        for turn in 0..count {
            let (temperature_k, amounts_mol, ln_k) = &self.states[(turn % STATES) as usize];
            let state = State { temperature_k: *temperature_k, hold, amounts_mol };
            let constant = || Temperature::new(*temperature_k).map(|at| self.reaction.ln_k(at));
            let affinity_at = |ln_k| {
                affinity(&self.system, &state, ln_k).map(|found| found.finite().unwrap_or(0.0))
            };
            let mut rest_at = |ln_k| {
                rest_into(&self.system, &state, ln_k, &mut self.workspace).map(|end| end.extent_mol)
            };
            sum += match work {
                Work::Solve => {
                    let ln_k = constant()?;
                    affinity_at(ln_k)? + rest_at(ln_k)?
                }
                Work::Rest => rest_at(*ln_k)?,
                Work::Constant => constant()?,
                Work::Affinity => affinity_at(*ln_k)?,
            };
        }
        Ok(sum)
    }
}
