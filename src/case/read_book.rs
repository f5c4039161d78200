//! A user's own book: species and constants that they keep, walked like the rest of a case.

use super::node::{Node, Reader};
use super::question::{OwnBook, OwnConstant};
use super::read::read_source;
use crate::library::{Book, OwnFigures, OwnHeat, Record, Temperature};
use crate::problem::{CaseCode, LibraryCode, Problem};
use crate::quantity::{Measure, Quantity};
use crate::reaction::{balance, parse_species};

/// The first words of every book of this format, where it is a file of its own.
pub(super) const BOOK_FORMAT: &str = "shiftgauge book 1";

/// The terms of C°p in J/(mol K), T in K, in the order of the powers.
const HEAT_TERMS: [&str; 7] = ["1/T^2", "1/T", "1", "T", "T^2", "T^3", "T^4"];

/// Reads a book; nothing at all is an empty one.
pub(super) fn read_book(reader: &mut Reader, node: &Node) -> OwnBook {
    if !reader.object(node, &["format", "title", "species", "constants"]) {
        return OwnBook::default();
    }
    let format = node.field("format");
    if let Some(found) = reader.text(&format).filter(|text| *text != BOOK_FORMAT) {
        let problem = Problem::new(CaseCode::BookFormat).with("found", found);
        reader.problems.push(problem.at(&format.path));
    }
    reader.text(&node.field("title"));
    let mut records: Vec<Record> = Vec::new();
    for item in reader.items(&node.field("species")) {
        let Some(record) = read_species(reader, &item) else { continue };
        if records.iter().any(|known| known.stands_for(&record)) {
            let problem = Problem::new(CaseCode::BookTwice).with("found", record.label());
            reader.problems.push(problem.at(&item.field("species").path));
        }
        records.push(record);
    }
    let mut constants = Vec::new();
    for item in reader.items(&node.field("constants")) {
        constants.extend(read_constant(reader, &item));
    }
    OwnBook { library: Book::new(records), constants }
}

fn read_species(reader: &mut Reader, node: &Node) -> Option<Record> {
    let names = [
        "species",
        "names",
        "cas",
        "enthalpy",
        "gibbs",
        "entropy",
        "heat_capacity",
        "source",
        "note",
    ];
    if !reader.object(node, &names) {
        return None;
    }
    let before = reader.problems.len();
    let species_node = node.field("species");
    let species = reader.needed_text(&species_node);
    let species = species.and_then(|text| reader.keep(&species_node, parse_species(text)));
    if species.as_ref().is_some_and(|species| species.phase.is_none()) {
        reader.problems.push(Problem::new(CaseCode::BookPhase).at(&species_node.path));
    }
    let text = |reader: &mut Reader, name: &str| {
        reader.text(&node.field(name)).unwrap_or_default().trim().to_owned()
    };
    let names = text(reader, "names");
    let names = names.split(';').map(str::trim).filter(|name| !name.is_empty());
    let names: Vec<String> = names.map(str::to_owned).collect();
    let cas = text(reader, "cas");
    let source = text(reader, "source");
    if source.is_empty() {
        reader.problems.push(Problem::new(CaseCode::BookSource).at(&node.field("source").path));
    }
    text(reader, "note");
    let enthalpy = reader.quantity(&node.field("enthalpy"), &[Measure::MolarEnergy]);
    let gibbs = reader.quantity(&node.field("gibbs"), &[Measure::MolarEnergy]);
    let entropy = reader.quantity(&node.field("entropy"), &[Measure::MolarHeatCapacity]);
    let items = reader.items(&node.field("heat_capacity"));
    let heat: Vec<OwnHeat> = items.iter().filter_map(|item| read_heat(reader, item)).collect();
    if reader.problems.len() > before {
        return None;
    }
    let value = |quantity: &Option<Quantity>| quantity.as_ref().map(|stated| stated.value_si);
    let made = Record::own(OwnFigures {
        species: species?,
        names,
        cas,
        enthalpy_j_per_mol: value(&enthalpy),
        gibbs_j_per_mol: value(&gibbs),
        entropy_j_per_mol_k: value(&entropy),
        heat,
        u_gibbs_j_per_mol: u_gibbs(enthalpy, gibbs, entropy),
        source,
    });
    match made {
        Ok(record) => Some(record),
        Err(problems) => {
            let placed = |problem: Problem| Problem {
                field: format!("{}.{}", node.path, problem.field),
                ..problem
            };
            reader.problems.extend(problems.into_iter().map(placed));
            None
        }
    }
}

/// u(ΔfG°) in J/mol from the tolerances: that of ΔfG° where it is stated, else of ΔfH° and T S°; zero
/// where none is.
fn u_gibbs(enthalpy: Option<Quantity>, gibbs: Option<Quantity>, entropy: Option<Quantity>) -> f64 {
    let u = |stated: Option<Quantity>| stated.and_then(|stated| stated.standard_uncertainty_si);
    u(gibbs).unwrap_or_else(|| {
        let of_entropy = Temperature::standard().kelvin() * u(entropy).unwrap_or(0.0);
        libm::hypot(u(enthalpy).unwrap_or(0.0), of_entropy)
    })
}

fn read_heat(reader: &mut Reader, node: &Node) -> Option<OwnHeat> {
    if !reader.object(node, &["from", "to", "terms", "transition"]) {
        return None;
    }
    let low = reader.needed_quantity(&node.field("from"), &[Measure::Temperature]);
    let high = reader.needed_quantity(&node.field("to"), &[Measure::Temperature]);
    let transition = reader.quantity(&node.field("transition"), &[Measure::MolarEnergy]);
    let terms_node = node.field("terms");
    let mut terms = [0.0; 7];
    let mut written = 0;
    if reader.object(&terms_node, &HEAT_TERMS) {
        for (term, name) in terms.iter_mut().zip(HEAT_TERMS) {
            if let Some(number) = reader.quantity(&terms_node.field(name), &[Measure::Number]) {
                *term = number.value_si;
                written += 1;
            }
        }
    }
    if written == 0 {
        reader.problems.push(Problem::new(LibraryCode::OwnHeatMissing).at(&terms_node.path));
    }
    Some(OwnHeat {
        low_k: low?.value_si,
        high_k: high?.value_si,
        terms,
        transition_j_per_mol: transition.map_or(0.0, |stated| stated.value_si),
    })
}

fn read_constant(reader: &mut Reader, node: &Node) -> Option<OwnConstant> {
    if !reader.object(node, &["equation", "constant", "source", "note"]) {
        return None;
    }
    let equation_node = node.field("equation");
    let equation = reader.needed_text(&equation_node);
    let equation = equation.and_then(|text| reader.keep(&equation_node, balance(text)));
    let source_node = node.field("source");
    let source = reader.text(&source_node).unwrap_or_default().trim().to_owned();
    if source.is_empty() {
        reader.problems.push(Problem::new(CaseCode::BookSource).at(&source_node.path));
    }
    reader.text(&node.field("note"));
    let constant = read_source(reader, &node.field("constant"), true)?;
    Some(OwnConstant { equation: equation?.equation, constant, source })
}
