//! The case, walked by hand: every mistake in it is found in one go.

use std::rc::Rc;

use super::node::{Node, Reader};
use super::question::{Held, KSource, LiquidReading, Question, ReactionQuestion};
use super::read_book::read_book;
use super::read_constant::{read_formula, read_points, read_stated};
use super::read_reading::{read_gas, read_liquid, read_pure, read_solution};
use super::value::Value;
use crate::advice::Band;
use crate::mixture::{Entry, GasReading, SolutionModel, SolutionReading, absolute_pressure_pa};
use crate::problem::{CaseCode, Outcome, Problem};
use crate::quantity::{Measure, PressureReference, Quantity, STANDARD_ATMOSPHERE_PA};
use crate::reaction::{Balanced, Phase, balance};

/// The first words of every case of this format.
pub(super) const FORMAT: &str = "shiftgauge 1";

const CASE_FIELDS: [&str; 15] = [
    "format",
    "title",
    "note",
    "reactions",
    "temperature",
    "pressure",
    "atmosphere",
    "hold",
    "heat",
    "volume",
    "band",
    "reading",
    "feed",
    "models",
    "book",
];

/// Reads a case.
///
/// # Errors
/// Every problem of its shape, words, numbers, units and formulas at once.
pub(super) fn read(case: &Value) -> Outcome<Question> {
    let root = Node::root(case);
    let mut reader = Reader::default();
    if !reader.object(&root, &CASE_FIELDS) {
        return Err(root.problem(CaseCode::NotAnObject).into());
    }
    read_format(&mut reader, &root.field("format"));
    for name in ["title", "note"] {
        reader.text(&root.field(name));
    }
    let solution_model = read_models(&mut reader, &root).unwrap_or_default();
    let reaction = read_reaction(&mut reader, &root.field("reactions"));
    let book = Rc::new(read_book(&mut reader, &root.field("book")));
    let temperature = reader.needed_quantity(&root.field("temperature"), &[Measure::Temperature]);
    let atmosphere = read_atmosphere(&mut reader, &root.field("atmosphere"));
    let atmosphere_pa = atmosphere.map_or(STANDARD_ATMOSPHERE_PA, |stated| stated.value_si);
    let pressure_node = root.field("pressure");
    let pressure = reader.quantity(&pressure_node, &[Measure::Pressure]);
    if let Some(pressure) = &pressure {
        let absolute = absolute_pressure_pa(pressure, atmosphere_pa);
        reader.keep(&pressure_node, absolute.map_err(Vec::from));
    }
    let words = [("pressure", Held::Pressure), ("volume", Held::Volume)];
    let hold = reader.choice(&root.field("hold"), &words);
    let volume = reader.quantity(&root.field("volume"), &[Measure::Volume]);
    let reading = root.field("reading");
    let Reading { gas, liquid, solution, pure } = read_blocks(&mut reader, &reading);
    let feed = read_feed(&mut reader, &root.field("feed"));
    let band = read_band(&mut reader, &root.field("band"));
    let (Some(reaction), Some(temperature), Some(hold)) = (reaction, temperature, hold) else {
        return Err(reader.problems);
    };
    if !reader.problems.is_empty() {
        return Err(reader.problems);
    }
    Ok(Question {
        reaction,
        temperature,
        pressure,
        atmosphere,
        hold,
        volume,
        band,
        gas,
        feed,
        liquid,
        solution,
        solution_model,
        pure,
        book,
    })
}

fn read_format(reader: &mut Reader, node: &Node) {
    match reader.needed_text(node) {
        Some(FORMAT) | None => {}
        Some(other) => {
            let problem = Problem::new(CaseCode::Format).with("found", other);
            reader.problems.push(problem.at(&node.path));
        }
    }
}

/// The models; what the format has and this version does not do yet is refused, none is ignored.
fn read_models(reader: &mut Reader, root: &Node) -> Option<SolutionModel> {
    let heat = root.field("heat");
    let words = [("isothermal", false), ("adiabatic", true)];
    if reader.choice(&heat, &words) == Some(true) {
        reader.not_yet(&heat, "an adiabatic rest");
    }
    let models = root.field("models");
    if !reader.object(&models, &["gas", "liquid", "solution"]) {
        return None;
    }
    let gas = models.field("gas");
    let words = [("ideal", false), ("SRK", true), ("PR", true)];
    if reader.choice(&gas, &words) == Some(true) {
        reader.not_yet(&gas, "a real gas");
    }
    reader.choice(&models.field("liquid"), &[("ideal", ())]);
    let words = [
        ("ideal", SolutionModel::Ideal),
        ("Davies", SolutionModel::Davies),
        ("Debye-Hückel", SolutionModel::DebyeHueckel),
    ];
    reader.choice(&models.field("solution"), &words)
}

/// A temperature difference, or a share of missing conversion.
fn read_band(reader: &mut Reader, node: &Node) -> Option<Band> {
    let measures = [Measure::TemperatureDifference, Measure::Fraction];
    let stated = reader.quantity(node, &measures)?;
    if stated.value_si < 0.0 {
        reader.problems.push(node.problem(CaseCode::BandNegative));
        return None;
    }
    Some(match stated.measure {
        Measure::Fraction => Band::Conversion { half_width: stated.value_si },
        _ => Band::Temperature { half_width_k: stated.value_si },
    })
}

fn read_atmosphere(reader: &mut Reader, node: &Node) -> Option<Quantity> {
    let atmosphere: Quantity = reader.quantity(node, &[Measure::Pressure])?;
    if atmosphere.pressure_reference == PressureReference::Gauge {
        reader.problems.push(node.problem(CaseCode::GaugeAtmosphere));
        return None;
    }
    Some(atmosphere)
}

/// The blocks of a reading.
#[derive(Default)]
struct Reading {
    gas: Option<GasReading>,
    liquid: Option<LiquidReading>,
    solution: Option<SolutionReading>,
    pure: Vec<Entry>,
}

fn read_blocks(reader: &mut Reader, reading: &Node) -> Reading {
    if !reader.object(reading, &["gas", "liquid", "solution", "solids"]) {
        return Reading::default();
    }
    let gas = read_gas(reader, &reading.field("gas"));
    let mut pure = read_pure(reader, &reading.field("solids"), Phase::Solid);
    let entries = read_liquid(reader, &reading.field("liquid"));
    // One liquid alone is a phase of its own.
    let liquid = if entries.len() > 1 {
        Some(LiquidReading { entries, closed_by: None })
    } else {
        pure.extend(entries);
        None
    };
    let solution = read_solution(reader, &reading.field("solution"));
    Reading { gas, liquid, solution, pure }
}

/// The gas that goes in.
fn read_feed(reader: &mut Reader, node: &Node) -> Option<GasReading> {
    if !reader.object(node, &["gas", "liquid", "solution", "solids"]) {
        return None;
    }
    for name in ["liquid", "solution", "solids"] {
        let block = node.field(name);
        if !block.is_null() {
            reader.not_yet(&block, "a feed that is not a gas");
        }
    }
    read_gas(reader, &node.field("gas"))
}

fn read_reaction(reader: &mut Reader, list: &Node) -> Option<ReactionQuestion> {
    if list.is_null() {
        reader.problems.push(list.problem(CaseCode::Missing));
        return None;
    }
    let items = reader.items(list);
    let Some(first) = items.first() else {
        if matches!(list.value, Value::List(_)) {
            reader.problems.push(list.problem(CaseCode::Missing));
        }
        return None;
    };
    if let Some(second) = items.get(1) {
        reader.not_yet(second, "more than one reaction");
    }
    if !reader.object(first, &["equation", "constant"]) {
        if first.is_null() {
            reader.problems.push(first.problem(CaseCode::Missing));
        }
        return None;
    }
    let equation = read_equation(reader, &first.field("equation"), true);
    let constant = first.field("constant");
    let source = read_source(reader, &constant, false);
    let constant_for = read_equation(reader, &constant.field("for"), false);
    let constant_for = constant_for.map(|balanced| balanced.equation);
    let approach = constant.field("approach");
    let approach = reader.quantity(&approach, &[Measure::TemperatureDifference]);
    let approach_k = approach.map(|approach| approach.value_si);
    let Balanced { equation, already_balanced } = equation?;
    let source = source?;
    Some(ReactionQuestion { equation, already_balanced, source, constant_for, approach_k })
}

/// Where K comes from; of what is kept in a book, only what stands on its own.
pub(super) fn read_source(reader: &mut Reader, constant: &Node, is_kept: bool) -> Option<KSource> {
    reader.object(constant, &CONSTANT_FIELDS);
    let words = [
        ("library", 0),
        ("species", 1),
        ("book", 2),
        ("reading", 3),
        ("value", 4),
        ("points", 5),
        ("formula", 6),
    ];
    let allowed = if is_kept { &words[4..] } else { &words[..] };
    match reader.choice(&constant.field("from"), allowed)? {
        0 => Some(KSource::Library { measured: true }),
        1 => Some(KSource::Library { measured: false }),
        2 => Some(KSource::Book),
        3 => {
            let enthalpy = constant.field("enthalpy");
            Some(KSource::Reading(reader.quantity(&enthalpy, &[Measure::MolarEnergy])))
        }
        4 => read_stated(reader, constant).map(|stated| KSource::Value(Box::new(stated))),
        5 => read_points(reader, constant).map(KSource::Points),
        _ => read_formula(reader, constant).map(KSource::Formula),
    }
}

const CONSTANT_FIELDS: [&str; 13] = [
    "from",
    "value",
    "kind",
    "pressure_unit",
    "at",
    "enthalpy",
    "heat_capacity",
    "for",
    "approach",
    "points",
    "terms",
    "range",
    "tolerance",
];

fn read_equation(reader: &mut Reader, node: &Node, needed: bool) -> Option<Balanced> {
    let text = if needed { reader.needed_text(node) } else { reader.text(node) }?;
    reader.keep(node, balance(text))
}
