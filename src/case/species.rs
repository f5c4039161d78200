//! Species looked for in the library, as the border carries them.

use std::borrow::Cow;

use serde::Serialize;

use super::node::{Node, Reader};
use super::read_book::read_book;
use super::refusal::Answer;
use super::value::Value;
use crate::library::{
    Book, Found, FoundBy, Known, Measured, Reach, Temperature, citation, likely, measured,
};
use crate::problem::{CaseCode, Outcome, Problem};
use crate::quantity::Measure;

/// The answer of `species`.
#[derive(Debug, Clone, Serialize)]
pub struct SpeciesAnswer {
    ok: bool,
    /// The matching species, the likeliest first; empty where there is none.
    pub species: Vec<SpeciesMatch>,
    /// What may have been meant, where nothing matches but something is near.
    pub near: Option<String>,
}

/// A species of the library, or of the user's own.
#[derive(Debug, Clone, Serialize)]
pub struct SpeciesMatch {
    /// The species with its phase, as an equation may name it.
    pub species: String,
    /// Its formula.
    pub formula: Cow<'static, str>,
    /// `g`, `l`, `s` or `aq`.
    pub phase: &'static str,
    /// Its polymorph or isomer, where the formula and the phase do not tell.
    pub form: Option<Cow<'static, str>>,
    /// Its names.
    pub names: Vec<Cow<'static, str>>,
    /// Its CAS number; empty where it has none.
    pub cas: Cow<'static, str>,
    /// By what it was found: `formula`, `atoms`, `name`, `start` or `near`.
    pub found_by: &'static str,
    /// Whether it is one of the user's own.
    pub own: bool,
    /// Whether its phase is likely at the temperature asked about, or at 25 °C: no melt where the solid
    /// is, no vapour below 0.1 Pa.
    pub likely: bool,
    /// The range of temperature.
    pub range_k: [f64; 2],
    /// How far the temperature asked about lies outside the range; null inside, or where none is asked
    /// about.
    pub outside_by_k: Option<f64>,
    /// The sources in full.
    pub sources: Vec<Cow<'static, str>>,
    /// ΔfH° at 298.15 K.
    pub enthalpy_of_formation_j_per_mol: f64,
    /// S° at 298.15 K.
    pub entropy_j_per_mol_k: f64,
    /// Standard uncertainty of ΔfG° at 298.15 K.
    pub u_gibbs_j_per_mol: f64,
    /// How it was got: `element`, `atct`, `codata`, `sources`, `class` or `own`.
    pub u_from: &'static str,
    /// The measured equilibrium that stands in for ΔfG° in solution, where there is one.
    pub measured: Option<MeasuredReport>,
}

/// An equilibrium that was measured directly.
#[derive(Debug, Clone, Serialize)]
pub struct MeasuredReport {
    /// The equilibrium.
    pub equation: String,
    /// log10 K at 298.15 K.
    pub log10_k: f64,
    /// Its standard uncertainty.
    pub u_log10_k: f64,
    /// The range of temperature that was measured.
    pub range_k: [f64; 2],
    /// Its source in full.
    pub source: &'static str,
}

impl MeasuredReport {
    /// A measured equilibrium as the border carries it.
    pub(super) fn of(known: &Measured) -> MeasuredReport {
        MeasuredReport {
            equation: known.equation(),
            log10_k: known.log10_k,
            u_log10_k: known.u_log10_k,
            range_k: known.range_k.into(),
            source: citation(known.source).unwrap_or_default(),
        }
    }
}

/// So many species are offered at most.
const OFFERED_AT_MOST: usize = 24;

/// What is asked about beside the text: a temperature, a book.
#[derive(Default)]
pub(super) struct Asked {
    pub temperature: Option<Temperature>,
    pub book: Book,
}

impl Asked {
    /// Reads `{ temperature, book }`; nothing at all asks about neither.
    pub fn read(value: &Value) -> Outcome<Asked> {
        let root = Node::root(value);
        let mut reader = Reader::default();
        reader.object(&root, &["temperature", "book"]);
        let node = root.field("temperature");
        let stated = reader.quantity(&node, &[Measure::Temperature]);
        let temperature =
            stated.and_then(|stated| reader.keep(&node, Temperature::new(stated.value_si)));
        let book = read_book(&mut reader, &root.field("book")).library;
        if reader.problems.is_empty() {
            Ok(Asked { temperature, book })
        } else {
            Err(reader.problems)
        }
    }
}

/// Finds the species that a text stands for: a formula in any order, a name, a CAS number, or the
/// beginning of one, a word inside, or a slip of the pen.
///
/// `asked` may be an object with `temperature` (a text; the answer says which species cover it) and
/// `book` (the user's own, found before the library's).
#[must_use]
pub fn species(text: &str, asked: &Value) -> Answer<SpeciesAnswer> {
    let answer = Asked::read(asked).map(|asked| {
        let found = asked.book.search(text, OFFERED_AT_MOST);
        let near = found.first().filter(|first| first.by == FoundBy::Near);
        SpeciesAnswer {
            ok: true,
            near: near.map(|first| first.record.formula.clone().into_owned()),
            species: found.iter().map(|one| species_match(one, &asked)).collect(),
        }
    });
    answer.into()
}

fn found_by(by: FoundBy) -> &'static str {
    match by {
        FoundBy::Formula => "formula",
        FoundBy::Atoms => "atoms",
        FoundBy::Name => "name",
        FoundBy::FormulaStart | FoundBy::NameStart | FoundBy::Word | FoundBy::Within => "start",
        FoundBy::Near => "near",
    }
}

/// A record as the border carries it.
pub(super) fn species_match(found: &Found, asked: &Asked) -> SpeciesMatch {
    let (record, temperature) = (&found.record, asked.temperature);
    let all = asked.book.find(&record.formula, None, record.form.as_deref());
    let likely_at = temperature.unwrap_or(Temperature::standard());
    let standard = record.properties(Temperature::standard());
    let outside = temperature.map(|at| record.reach(at));
    SpeciesMatch {
        species: record.label(),
        formula: record.formula.clone(),
        phase: record.phase.symbol(),
        form: record.form.clone(),
        names: record.names.clone(),
        cas: record.cas.clone(),
        found_by: found_by(found.by),
        own: record.is_own(),
        likely: likely(all, likely_at).contains(record),
        range_k: record.range_k.into(),
        outside_by_k: match outside {
            Some(Reach::Extrapolated { by_k }) => Some(by_k),
            Some(Reach::InRange) | None => None,
        },
        sources: record.citations().collect(),
        enthalpy_of_formation_j_per_mol: standard.enthalpy_j_per_mol,
        entropy_j_per_mol_k: standard.entropy_j_per_mol_k,
        u_gibbs_j_per_mol: record.u_gibbs_j_per_mol,
        u_from: record.u_kind.as_str(),
        measured: measured_of(record).map(MeasuredReport::of),
    }
}

/// The measured equilibrium of a record of the tables.
pub(super) fn measured_of(record: &Known) -> Option<&'static Measured> {
    if record.is_own() { None } else { measured(&record.id) }
}

/// The one record that a label names.
///
/// # Errors
/// No such species, or one that leaves several open.
pub(super) fn one(label: &str, book: &Book) -> Outcome<Known> {
    let found = book.search(label, 2);
    match &found[..] {
        [first, others @ ..]
            if first.by <= FoundBy::Name && others.iter().all(|other| other.by > first.by) =>
        {
            Ok(first.record.clone())
        }
        _ => Err(Problem::new(CaseCode::SheetSpecies).with("found", label).at("species").into()),
    }
}
