//! The two primitives on bare numbers, for scripts and tests.

use serde::Serialize;

use super::node::{Node, Reader};
use super::refusal::Answer;
use super::value::Value;
use crate::equilibrium::{self, Affinity, BareProblem, BareReaction, BareRest, BareSpecies, Hold};
use crate::problem::Outcome;
use crate::reaction::Phase;

/// The answer of `affinities`.
#[derive(Debug, Clone, Serialize)]
pub struct AffinitiesAnswer {
    ok: bool,
    /// One for each reaction.
    pub affinities: Vec<AffinityReport>,
}

/// The affinity of one reaction.
#[derive(Debug, Clone, Serialize)]
pub struct AffinityReport {
    /// A/RT = ln K − ln Q; null where Q is not finite.
    pub affinity_over_rt: Option<f64>,
    /// `finite`, `zero`, `infinite` or `undetermined`.
    pub q: &'static str,
}

/// Gives ln K − ln Q of each reaction of a problem in bare numbers.
#[must_use]
pub fn affinities(problem: &Value) -> Answer<AffinitiesAnswer> {
    let found = read(problem).and_then(|problem| equilibrium::affinities(&problem));
    found
        .map(|affinities| {
            let affinities = affinities.into_iter().map(affinity_report).collect();
            AffinitiesAnswer { ok: true, affinities }
        })
        .into()
}

fn affinity_report(affinity: Affinity) -> AffinityReport {
    let q = match affinity {
        Affinity::Finite(_) => "finite",
        Affinity::OpenForward => "zero",
        Affinity::OpenReverse => "infinite",
        Affinity::Undetermined => "undetermined",
    };
    AffinityReport { affinity_over_rt: affinity.finite(), q }
}

/// The answer of `rest`.
#[derive(Debug, Clone, Serialize)]
pub struct RestAnswer {
    ok: bool,
    /// The amounts at rest, the extents, the outcome and how it was reached.
    #[serde(flatten)]
    pub rest: BareRest,
}

/// Gives the state of rest of a problem in bare numbers.
#[must_use]
pub fn rest(problem: &Value) -> Answer<RestAnswer> {
    let found = read(problem).and_then(|problem| equilibrium::rest_of(&problem));
    found.map(|rest| RestAnswer { ok: true, rest }).into()
}

/// Reads a problem in bare numbers; its ranges are judged where it is solved.
fn read(problem: &Value) -> Outcome<BareProblem> {
    let root = Node::root(problem);
    let mut reader = Reader::default();
    let fields = ["species", "reactions", "temperature_k", "hold", "pressure_pa", "volume_m3"];
    if !reader.object(&root, &fields) {
        return Err(root.problem(crate::problem::CaseCode::NotAnObject).into());
    }
    let species = reader.items(&root.field("species"));
    let species: Vec<BareSpecies> =
        species.iter().filter_map(|node| read_species(&mut reader, node)).collect();
    let reactions = reader.items(&root.field("reactions"));
    let reactions: Vec<BareReaction> =
        reactions.iter().filter_map(|node| read_reaction(&mut reader, node)).collect();
    let temperature_k = reader.needed_number(&root.field("temperature_k"));
    let volume = reader.choice(&root.field("hold"), &[("pressure", false), ("volume", true)]);
    let hold = if volume == Some(true) {
        let volume_m3 = reader.needed_number(&root.field("volume_m3"));
        volume_m3.map(|volume_m3| Hold::Volume { volume_m3 })
    } else {
        let pressure_pa = reader.needed_number(&root.field("pressure_pa"));
        pressure_pa.map(|pressure_pa| Hold::Pressure { pressure_pa })
    };
    match (temperature_k, hold) {
        (Some(temperature_k), Some(hold)) if reader.problems.is_empty() => {
            Ok(BareProblem { species, reactions, temperature_k, hold })
        }
        _ => Err(reader.problems),
    }
}

fn read_species(reader: &mut Reader, node: &Node) -> Option<BareSpecies> {
    if !reader.object(node, &["name", "phase", "amount_mol"]) {
        return None;
    }
    let name = reader.needed_text(&node.field("name"));
    let phases = [Phase::Gas, Phase::Liquid, Phase::Solid, Phase::Aqueous];
    let words = phases.map(|phase| (phase.symbol(), phase));
    let phase = reader.choice(&node.field("phase"), &words);
    let amount_mol = reader.needed_number(&node.field("amount_mol"));
    Some(BareSpecies { name: name?.to_owned(), phase: phase?, amount_mol: amount_mol? })
}

fn read_reaction(reader: &mut Reader, node: &Node) -> Option<BareReaction> {
    if !reader.object(node, &["nu", "ln_k"]) {
        return None;
    }
    let numbers = reader.items(&node.field("nu"));
    let nu = numbers.iter().filter_map(|node| reader.needed_number(node)).collect();
    let ln_k = reader.needed_number(&node.field("ln_k"));
    Some(BareReaction { nu, ln_k: ln_k? })
}
