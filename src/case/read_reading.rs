//! The blocks of a reading, read into entries.

use super::node::{Node, Reader};
use crate::mixture::{Basis, Entry, GasReading, SolutionReading, Stated, Water};
use crate::problem::{CaseCode, Problem};
use crate::quantity::{self, Measure};
use crate::reaction::{Phase, Species, parse_species};

const GAS_MEASURES: [Measure; 6] = [
    Measure::Fraction,
    Measure::Number,
    Measure::Pressure,
    Measure::Amount,
    Measure::AmountRate,
    Measure::MassPerAmount,
];

const LIQUID_MEASURES: [Measure; 5] =
    [Measure::Fraction, Measure::Amount, Measure::AmountRate, Measure::Mass, Measure::MassRate];

const SOLUTE_MEASURES: [Measure; 6] = [
    Measure::Concentration,
    Measure::Molality,
    Measure::MassConcentration,
    Measure::Ph,
    Measure::Amount,
    Measure::Mass,
];

const PURE_MEASURES: [Measure; 4] =
    [Measure::Amount, Measure::AmountRate, Measure::Mass, Measure::MassRate];

/// Reads the gas block; nothing if it is null or has a problem (which is then filed).
pub(super) fn read_gas(reader: &mut Reader, node: &Node) -> Option<GasReading> {
    if !reader.object(node, &["basis", "water", "entries", "lost"]) {
        return None;
    }
    let water_node = node.field("water");
    let dry = reader.choice(&node.field("basis"), &[("wet", false), ("dry", true)]);
    let water = read_water(reader, &water_node);
    if dry == Some(false) && !water_node.is_null() {
        reader.problems.push(water_node.problem(CaseCode::WaterBesideWet));
    }
    let mut entries = Vec::new();
    for item in reader.items(&node.field("entries")) {
        let entry = read_entry(reader, &item, Phase::Gas, read_gas_value);
        entries.extend(entry);
    }
    let lost = read_lost(reader, &node.field("lost"));
    let basis = if dry? { Basis::Dry(water?) } else { Basis::Wet };
    Some(GasReading { basis, entries, lost, closed_by: None })
}

/// The species that the sample lost when it was cooled.
fn read_lost(reader: &mut Reader, node: &Node) -> Vec<Species> {
    let mut lost = Vec::new();
    for item in reader.items(node) {
        let Some(text) = reader.needed_text(&item) else { continue };
        let species = reader.keep(&item, parse_species(text));
        lost.extend(species.and_then(|species| in_block(reader, &item, species, Phase::Gas)));
    }
    lost
}

fn read_water(reader: &mut Reader, node: &Node) -> Option<Water> {
    if node.is_null() {
        return Some(Water::None);
    }
    if let super::value::Value::Text(text) = node.value {
        if text == "from_feed" {
            return Some(Water::FromFeed);
        }
        let allowed = "fraction, per_dry, dew_point (an object) or from_feed";
        let problem = Problem::new(CaseCode::UnknownWord).with("found", text.as_str());
        reader.problems.push(problem.with("allowed", allowed).at(&node.path));
        return None;
    }
    if !reader.object(node, &["fraction", "per_dry", "dew_point", "pressure"]) {
        return None;
    }
    let (fraction, per_dry) = (node.field("fraction"), node.field("per_dry"));
    let dew_point = node.field("dew_point");
    let stated = [&fraction, &per_dry, &dew_point];
    if stated.iter().filter(|node| !node.is_null()).count() != 1 {
        reader.problems.push(node.problem(CaseCode::WaterNotOneWay));
        return None;
    }
    let numbers = [Measure::Fraction, Measure::Number];
    if !fraction.is_null() {
        return reader.quantity(&fraction, &numbers[..1]).map(Water::Fraction);
    }
    if !per_dry.is_null() {
        return reader.quantity(&per_dry, &numbers[1..]).map(Water::PerDry);
    }
    let temperature = reader.quantity(&dew_point, &[Measure::Temperature]);
    let pressure = reader.quantity(&node.field("pressure"), &[Measure::Pressure]);
    Some(Water::DewPoint { temperature: temperature?, pressure })
}

fn read_gas_value(reader: &mut Reader, node: &Node) -> Option<Stated> {
    match reader.needed_text(node)? {
        "remainder" => Some(Stated::Remainder),
        "missing" => Some(Stated::Missing { value: 0.0 }),
        text => reader.keep(node, quantity::parse(text, &GAS_MEASURES)).map(Stated::Quantity),
    }
}

/// Reads the solids.
pub(super) fn read_pure(reader: &mut Reader, node: &Node, phase: Phase) -> Vec<Entry> {
    read_entries(reader, node, phase, &PURE_MEASURES)
}

/// Reads the liquid: one line is a phase of its own, several are a mixture.
pub(super) fn read_liquid(reader: &mut Reader, node: &Node) -> Vec<Entry> {
    read_entries(reader, node, Phase::Liquid, &LIQUID_MEASURES)
}

/// Reads the solution: its lines, and its volume or the mass of its water.
pub(super) fn read_solution(reader: &mut Reader, node: &Node) -> Option<SolutionReading> {
    if !reader.object(node, &["entries", "volume", "water"]) {
        return None;
    }
    let volume = reader.quantity(&node.field("volume"), &[Measure::Volume]);
    let water = reader.quantity(&node.field("water"), &[Measure::Mass]);
    let mut entries = Vec::new();
    for item in reader.items(&node.field("entries")) {
        entries.extend(read_entry(reader, &item, Phase::Aqueous, |reader, node| {
            read_mixed_value(reader, node, &SOLUTE_MEASURES)
        }));
    }
    Some(SolutionReading { volume, water, entries })
}

fn read_entries(
    reader: &mut Reader,
    node: &Node,
    phase: Phase,
    measures: &[Measure],
) -> Vec<Entry> {
    if !reader.object(node, &["entries"]) {
        return Vec::new();
    }
    let mut entries = Vec::new();
    for item in reader.items(&node.field("entries")) {
        let value = |reader: &mut Reader, node: &Node| read_mixed_value(reader, node, measures);
        entries.extend(read_entry(reader, &item, phase, value));
    }
    entries
}

fn read_mixed_value(reader: &mut Reader, node: &Node, measures: &[Measure]) -> Option<Stated> {
    match reader.needed_text(node)? {
        "missing" => Some(Stated::Missing { value: 0.0 }),
        "present" => Some(Stated::Present),
        "absent" => Some(Stated::Absent),
        "remainder" => Some(Stated::Remainder),
        text => reader.keep(node, quantity::parse(text, measures)).map(Stated::Quantity),
    }
}

fn read_entry(
    reader: &mut Reader,
    item: &Node,
    phase: Phase,
    read_value: impl Fn(&mut Reader, &Node) -> Option<Stated>,
) -> Option<Entry> {
    if !reader.object(item, &["species", "value", "includes"]) {
        if item.is_null() {
            reader.problems.push(item.problem(CaseCode::Missing));
        }
        return None;
    }
    let name = item.field("species");
    let species = reader.needed_text(&name);
    let species = species.and_then(|text| reader.keep(&name, parse_species(text)));
    let species = species.and_then(|species| in_block(reader, &name, species, phase));
    let includes = item.field("includes");
    let counted = reader.text(&includes);
    let counted = counted.and_then(|text| reader.keep(&includes, parse_species(text)));
    let counted = counted.and_then(|counted| in_block(reader, &includes, counted, phase));
    let value = item.field("value");
    let stated = read_value(reader, &value);
    Some(Entry { species: species?, stated: stated?, includes: counted, field: value.path })
}

/// A species of a block carries the block's phase; another phase written on it is a mistake.
fn in_block(reader: &mut Reader, node: &Node, species: Species, phase: Phase) -> Option<Species> {
    match species.phase {
        Some(written) if written != phase => {
            let problem = Problem::new(CaseCode::PhaseOfAnotherBlock)
                .with("found", written.symbol())
                .with("allowed", phase.symbol());
            reader.problems.push(problem.at(&node.path));
            None
        }
        _ => Some(species.in_phase(phase)),
    }
}
