//! The blocks of a reading, each turned into amounts, and where each participant stands in them.

use super::participants::Participant;
use super::question::Question;
use super::reading_remarks::lost_for_good;
use crate::mixture::{
    Entry, Feed, GasMixture, Held, Ion, LiquidMixture, Solution, SolutionLaw, SolutionModel,
    SolutionReading, Stated, gas_mixture, ion_size_pm, ionic_strength_mol_per_kg, liquid_mixture,
    pure_phases, solution,
};
use crate::problem::{NoteCode, Outcome, Problem, Remark};
use crate::quantity::Measure;
use crate::reaction::{Phase, Species};

/// Where a participant stands.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub(super) enum Block {
    /// In the gas.
    Gas,
    /// In the one liquid mixture.
    Liquid,
    /// Dissolved in water.
    Solution,
    /// It is the water of the solution.
    Solvent,
    /// A phase of its own.
    Pure,
}

/// All blocks of a reading.
#[derive(Debug, Clone, Default)]
pub(super) struct Blocks {
    pub feed: Option<Feed>,
    pub gas: Option<GasMixture>,
    pub liquid: Option<LiquidMixture>,
    pub solution: Option<Solution>,
    pub pure: Vec<(Species, Held)>,
}

impl Blocks {
    /// Turns each block into amounts.
    ///
    /// # Errors
    /// All problems of all blocks at once.
    pub fn new(question: &Question, reacting: &[Participant]) -> Outcome<Blocks> {
        let mut problems = Vec::new();
        let mut keep = |outcome: Outcome<GasMixture>, block: &str| match outcome {
            Ok(gas) => Some(gas),
            Err(found) => {
                problems.extend(found.into_iter().map(|problem| in_block(problem, block)));
                None
            }
        };
        let around = question.around();
        let feed = question.feed.as_ref().and_then(|feed| {
            let gas = keep(gas_mixture(feed, around, None), "feed.gas")?;
            Some(feed_of(gas, reacting))
        });
        let gas = question
            .gas
            .as_ref()
            .and_then(|reading| keep(gas_mixture(reading, around, feed.as_ref()), "reading.gas"));
        let liquid = question.liquid.as_ref().map(|liquid| {
            liquid_mixture(&liquid.entries, liquid.closed_by)
                .map_err(|found| at_block(found, "reading.liquid"))
        });
        let temperature_k = question.temperature.value_si;
        let dissolved = question
            .solution
            .as_ref()
            .map(|dissolved| dissolved_in_water(question, dissolved, temperature_k));
        // With the volume known as well, even fractions stand for amounts.
        let measured = gas.as_ref().map(|gas| gas.basis).filter(|_| question.volume.is_none());
        let pure = pure_phases(&question.pure, measured);
        let mut take = |found: Vec<Problem>| problems.extend(found);
        let pure = pure.unwrap_or_else(|found| {
            take(found);
            Vec::new()
        });
        let liquid = liquid.transpose().unwrap_or_else(|found| {
            take(found);
            None
        });
        let dissolved = dissolved.transpose().unwrap_or_else(|found| {
            take(found);
            None
        });
        if let (Some(reading), None) = (&question.gas, &feed) {
            take(lost_for_good(reading, reacting));
        }
        if !problems.is_empty() {
            return Err(problems);
        }
        let pure = question.pure.iter().map(|entry| entry.species.clone()).zip(pure).collect();
        Ok(Blocks { feed, gas, liquid, solution: dissolved, pure })
    }

    /// Where a species of the reaction stands and how much of it there is; what had to be assumed
    /// is remarked.
    pub fn place(&self, participant: &Participant, remarks: &mut Vec<Remark>) -> (Block, Held) {
        let species = &participant.species;
        let mixed = |rows: Option<&Vec<(Species, f64)>>| {
            let row = rows?.iter().find(|(name, _)| name.same_substance(species))?;
            Some(Held::Mol(row.1))
        };
        let pure = || {
            let here = |name: &Species| name.phase == Some(participant.phase);
            let row = self.pure.iter().find(|(name, _)| here(name) && name.same_substance(species));
            row.map(|(_, held)| *held)
        };
        let (block, found) = match participant.phase {
            Phase::Gas => (Block::Gas, mixed(self.gas.as_ref().map(|gas| &gas.amounts_mol))),
            Phase::Aqueous => {
                let rows = self.solution.as_ref().map(|solution| &solution.amounts_mol);
                (Block::Solution, mixed(rows))
            }
            Phase::Liquid if self.liquid.is_some() => {
                let rows = self.liquid.as_ref().map(|liquid| &liquid.amounts_mol);
                (Block::Liquid, mixed(rows))
            }
            Phase::Liquid if self.solution.is_some() && is_water(species) && pure().is_none() => {
                return (Block::Solvent, Held::Ample);
            }
            Phase::Liquid | Phase::Solid => (Block::Pure, pure()),
        };
        let held = found.unwrap_or_else(|| {
            let (code, held) = match block {
                Block::Pure => (NoteCode::PhaseTakenAsPresent, Held::Ample),
                _ => (NoteCode::NotInAnalysis, Held::Mol(0.0)),
            };
            remarks.push(Remark::new(code).with("species", species.text()));
            held
        });
        (block, held)
    }

    /// The species of the reading that the reaction does not name.
    pub fn inerts(&self, reacting: &[Participant]) -> Vec<(Participant, Block, Held)> {
        let mut found = Vec::new();
        let mut add = |species: &Species, phase: Phase, block: Block, held: Held| {
            let known = reacting
                .iter()
                .any(|one| one.phase == phase && one.species.same_substance(species));
            if !known {
                let species = species.clone();
                found.push((Participant { species, phase, nu: 0.0, record: None }, block, held));
            }
        };
        for (species, amount) in self.gas.iter().flat_map(|gas| &gas.amounts_mol) {
            add(species, Phase::Gas, Block::Gas, Held::Mol(*amount));
        }
        for (species, amount) in self.liquid.iter().flat_map(|liquid| &liquid.amounts_mol) {
            add(species, Phase::Liquid, Block::Liquid, Held::Mol(*amount));
        }
        for (species, amount) in self.solution.iter().flat_map(|solution| &solution.amounts_mol) {
            add(species, Phase::Aqueous, Block::Solution, Held::Mol(*amount));
        }
        for (species, held) in &self.pure {
            add(species, species.phase.unwrap_or(Phase::Solid), Block::Pure, *held);
        }
        found
    }
}

/// The solution; a pH tells an activity, so that the amount of H+ and the ionic strength are found
/// together.
fn dissolved_in_water(
    question: &Question,
    reading: &SolutionReading,
    temperature_k: f64,
) -> Outcome<Solution> {
    const ROUNDS_AT_MOST: u32 = 60;
    let mut found = solution(reading, temperature_k, 1.0)?;
    let by_ph = |entry: &Entry| match &entry.stated {
        Stated::Quantity(quantity) => quantity.measure == Measure::Ph,
        _ => false,
    };
    if question.solution_model == SolutionModel::Ideal || !reading.entries.iter().any(by_ph) {
        return Ok(found);
    }
    let law = SolutionLaw::new(question.solution_model, temperature_k)?;
    let mut before = 1.0;
    for _ in 0..ROUNDS_AT_MOST {
        let solutes = found.amounts_mol.iter();
        let solutes = solutes.map(|(species, amount)| (ion(species), amount / found.water_kg));
        let strength = ionic_strength_mol_per_kg(solutes);
        let hydrogen =
            Ion { charge: 1, size_pm: ion_size_pm("H", 1).unwrap_or(Ion::USUAL_SIZE_PM) };
        let coefficient = libm::exp(law.ln_coefficient(hydrogen, strength));
        found = solution(reading, temperature_k, coefficient)?;
        if (coefficient / before - 1.0).abs() < 1e-14 {
            break;
        }
        before = coefficient;
    }
    Ok(found)
}

/// What the models of a solution need to know of a species.
pub(super) fn ion(species: &Species) -> Ion {
    let charge = species.formula.charge();
    let plain = species.formula.text().split('^').next().unwrap_or_default();
    Ion { charge, size_pm: ion_size_pm(plain, charge).unwrap_or(Ion::USUAL_SIZE_PM) }
}

fn is_water(species: &Species) -> bool {
    species.formula.text() == "H2O"
}

/// The feed; an element of a reacting liquid or solid need not balance in the gas.
fn feed_of(gas: GasMixture, reacting: &[Participant]) -> Feed {
    let condensed = reacting.iter().filter(|participant| participant.phase != Phase::Gas);
    let open_elements = condensed
        .flat_map(|participant| participant.species.formula.atoms())
        .map(|(element, _)| element.symbol)
        .collect();
    Feed { amounts_mol: gas.amounts_mol, basis: gas.basis, closing: gas.closing, open_elements }
}

/// Puts a block's path before a field that is inside the block, and leaves a whole path as it is.
fn in_block(problem: Problem, block: &str) -> Problem {
    if problem.field.starts_with(block) || problem.field == "feed" {
        problem
    } else {
        problem.at(block)
    }
}

fn at_block(found: Vec<Problem>, block: &str) -> Vec<Problem> {
    found.into_iter().map(|problem| in_block(problem, block)).collect()
}
