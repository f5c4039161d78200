//! The two primitives on bare numbers, for scripts and tests, with every mistake reported.

use super::outcome::RestOutcome;
use super::quotient::{Affinity, affinity};
use super::rest::rest;
use super::state::{Hold, State};
use super::system::{Kind, System};
use crate::problem::EquilibriumCode;
use crate::problem::Outcome;
use crate::problem::Problem;
use crate::reaction::Phase;
use serde::Serialize;

/// A species of a bare problem. Its name is free: nothing is looked up.
#[derive(Debug, Clone, PartialEq)]
pub struct BareSpecies {
    /// Any name.
    pub name: String,
    /// The phase: each liquid or solid is its own pure phase.
    pub phase: Phase,
    /// Amount in mol.
    pub amount_mol: f64,
}

/// A reaction of a bare problem.
#[derive(Debug, Clone, PartialEq)]
pub struct BareReaction {
    /// One stoichiometric number for each species.
    pub nu: Vec<f64>,
    /// ln K at the problem's temperature.
    pub ln_k: f64,
}

/// A problem in bare numbers. Balance is not checked, because names are free.
#[derive(Debug, Clone, PartialEq)]
pub struct BareProblem {
    /// The species.
    pub species: Vec<BareSpecies>,
    /// The reactions; rest is found for one.
    pub reactions: Vec<BareReaction>,
    /// Temperature in K.
    pub temperature_k: f64,
    /// Pressure or volume.
    pub hold: Hold,
}

/// A species at rest.
#[derive(Debug, Clone, PartialEq, Serialize)]
pub struct BareSpeciesAtRest {
    /// The name that was given.
    pub name: String,
    /// Amount in mol.
    pub amount_mol: f64,
    /// ln(n/mol), also of traces below any double; none when absent.
    pub ln_amount: Option<f64>,
    /// Whether it takes part and none of it is left.
    pub exhausted: bool,
}

/// The state of rest of a bare problem.
#[derive(Debug, Clone, PartialEq, Serialize)]
pub struct BareRest {
    /// The species, in the order of the problem.
    pub species: Vec<BareSpeciesAtRest>,
    /// ξ of each reaction in mol.
    pub extents_mol: Vec<f64>,
    /// How it ended; read it before any number.
    pub outcome: RestOutcome,
    /// Steps of the solver.
    pub iterations: u32,
    /// |A/RT| that is left at rest.
    pub residual: f64,
}

impl BareProblem {
    fn amounts(&self) -> Vec<f64> {
        self.species.iter().map(|species| species.amount_mol).collect()
    }

    /// The systems of the reactions, or every mistake in the problem at once.
    fn systems(&self) -> Outcome<Vec<System>> {
        let kinds: Vec<Kind> = self.species.iter().map(|species| kind(species.phase)).collect();
        let (mut systems, mut problems) = (Vec::new(), Vec::new());
        if self.reactions.is_empty() {
            problems.push(Problem::new(EquilibriumCode::NoReaction).at("reactions"));
        }
        for (place, reaction) in self.reactions.iter().enumerate() {
            let at = |problem: Problem| {
                // What is wrong with the species is the same for every reaction.
                if problem.field == "species" {
                    problem
                } else {
                    problem.at(&format!("reactions[{place}]"))
                }
            };
            match System::new(&kinds, &reaction.nu) {
                Ok(system) => systems.push(system),
                Err(found) => problems.extend(found.into_iter().map(at)),
            }
            if let Err(found) = super::limits::check_ln_k(reaction.ln_k) {
                problems.extend(found.into_iter().map(at));
            }
        }
        // The state is checked against any system of these kinds.
        if let Ok(plain) = System::new(&kinds, &vec![1.0; kinds.len()]) {
            let amounts = self.amounts();
            if let Err(found) = self.state(&amounts).check(&plain) {
                problems.extend(found.into_iter().map(|problem| self.place(problem)));
            }
        }
        let mut once: Vec<Problem> = Vec::new();
        for problem in problems {
            if !once.contains(&problem) {
                once.push(problem);
            }
        }
        if once.is_empty() { Ok(systems) } else { Err(once) }
    }

    fn state<'a>(&self, amounts_mol: &'a [f64]) -> State<'a> {
        State { temperature_k: self.temperature_k, hold: self.hold, amounts_mol }
    }

    /// Amounts are fields of the species here.
    fn place(&self, mut problem: Problem) -> Problem {
        if let Some(place) = problem.field.strip_prefix("amounts_mol") {
            problem.field = format!("species{place}.amount_mol");
        }
        problem
    }
}

fn kind(phase: Phase) -> Kind {
    match phase {
        Phase::Gas => Kind::Gas,
        Phase::Liquid | Phase::Solid => Kind::Pure,
        Phase::Aqueous => Kind::Solute,
    }
}

/// The affinity over R T of each reaction of a bare problem.
///
/// # Errors
/// As [`System::new`], [`State::check`] and [`affinity`]; `no-reaction` without any.
pub fn affinities(problem: &BareProblem) -> Outcome<Vec<Affinity>> {
    let systems = problem.systems()?;
    let amounts = problem.amounts();
    let state = problem.state(&amounts);
    let each = systems.iter().zip(&problem.reactions);
    each.map(|(system, reaction)| affinity(system, &state, reaction.ln_k)).collect()
}

/// The state of rest of a bare problem with one reaction.
///
/// # Errors
/// As [`affinities`]; `many-reactions` with more than one.
///
/// ```
/// use shiftgauge::equilibrium::{BareProblem, BareReaction, BareSpecies, Hold, rest_of};
/// use shiftgauge::reaction::Phase;
/// let species = |name: &str, phase, amount_mol| BareSpecies { name: name.into(), phase, amount_mol };
/// let problem = BareProblem {
///     species: vec![
///         species("lime stone", Phase::Solid, 2.0),
///         species("lime", Phase::Solid, 0.0),
///         species("CO2", Phase::Gas, 0.0),
///         species("air", Phase::Gas, 3.0),
///     ],
///     reactions: vec![BareReaction { nu: vec![-1.0, 1.0, 1.0, 0.0], ln_k: 0.25f64.ln() }],
///     temperature_k: 1100.0,
///     hold: Hold::Pressure { pressure_pa: 100_000.0 },
/// };
/// // A quarter of the gas is CO2: 1 mol with 3 mol of air.
/// let end = rest_of(&problem).unwrap();
/// assert!((end.species[2].amount_mol - 1.0).abs() < 1e-14);
/// ```
pub fn rest_of(problem: &BareProblem) -> Outcome<BareRest> {
    let many = problem.reactions.len() > 1;
    let mut problems = problem.systems().err().unwrap_or_default();
    if many {
        let found = problem.reactions.len().to_string();
        let many = Problem::new(EquilibriumCode::ManyReactions).with("found", found);
        problems.push(many.at("reactions"));
    }
    if !problems.is_empty() {
        return Err(problems);
    }
    let systems = problem.systems()?;
    let amounts = problem.amounts();
    let (Some(system), Some(reaction)) = (systems.first(), problem.reactions.first()) else {
        return Err(Problem::new(EquilibriumCode::NoReaction).at("reactions").into());
    };
    let end = rest(system, &problem.state(&amounts), reaction.ln_k)?;
    let species = problem.species.iter().enumerate().map(|(place, species)| BareSpeciesAtRest {
        name: species.name.clone(),
        amount_mol: end.amounts_mol[place],
        ln_amount: end.ln_amounts[place],
        exhausted: system.nu()[place] != 0.0 && end.ln_amounts[place].is_none(),
    });
    Ok(BareRest {
        species: species.collect(),
        extents_mol: vec![end.summary.extent_mol],
        outcome: end.summary.outcome,
        iterations: end.summary.iterations,
        residual: end.summary.residual,
    })
}
