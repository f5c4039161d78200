//! Records by what they are called.

use super::record::Record;
use super::table;
use crate::problem::LibraryCode;
use crate::problem::Outcome;
use crate::problem::Problem;
use crate::reaction::Formula;
use crate::reaction::Phase;

/// Every record whose formula is spelled so, in the phase and the form if they are given.
///
/// The order is that of the table (by id). An unknown formula gives an empty list.
#[must_use]
pub fn find(formula: &str, phase: Option<Phase>, form: Option<&str>) -> Vec<&'static Record> {
    table::entries_of(formula)
        .filter_map(table::Entry::record)
        .filter(|record| phase.is_none_or(|wanted| record.phase == wanted))
        .filter(|record| form.is_none() || record.form.as_deref() == form)
        .collect()
}

/// Every record with this name or CAS number; capital letters and space around it do not matter.
#[must_use]
pub fn named(text: &str) -> Vec<&'static Record> {
    let wanted = text.trim().to_ascii_lowercase();
    let is_named = |entry: &&'static table::Entry| {
        let mut cells = entry.line.split('\t').skip(4);
        let names = cells.next().unwrap_or_default();
        cells.next() == Some(wanted.as_str())
            || names.split(';').any(|name| name.eq_ignore_ascii_case(&wanted))
    };
    if wanted.is_empty() {
        return Vec::new();
    }
    table::entries().iter().filter(is_named).filter_map(table::Entry::record).collect()
}

/// Every record, in the order of the table.
pub fn all() -> impl Iterator<Item = &'static Record> {
    table::entries().iter().filter_map(table::Entry::record)
}

/// Every formula, once each, without reading any record: candidates for a near miss.
pub fn formulas() -> impl Iterator<Item = &'static str> {
    let mut last = "";
    table::entries().iter().map(|entry| entry.formula).filter(move |formula| {
        let new = *formula != last;
        last = formula;
        new
    })
}

/// The one record that a formula, a phase and a form name.
///
/// # Errors
/// `species-unknown` if no record has the formula, `species-phase-unknown` if none has it in that
/// phase and form, `species-several` if more than one fits.
pub fn one(formula: &str, phase: Option<Phase>, form: Option<&str>) -> Outcome<&'static Record> {
    let found = find(formula, phase, form);
    if let [record] = found[..] {
        return Ok(record);
    }
    let labels = |records: &[&'static Record]| {
        records.iter().map(|record| record.label()).collect::<Vec<_>>().join(", ")
    };
    let phase_text = phase.map_or(String::new(), |phase| format!("({})", phase.symbol()));
    let form_text = form.map_or(String::new(), |form| format!(" {form}"));
    let wanted = format!("{formula}{phase_text}{form_text}");
    let problem = match (found.is_empty(), find(formula, None, None)) {
        (false, _) => Problem::new(LibraryCode::Several).with("known", labels(&found)),
        (true, known) if known.is_empty() => Problem::new(LibraryCode::Unknown),
        (true, known) => Problem::new(LibraryCode::PhaseUnknown).with("known", labels(&known)),
    };
    Err(problem.with("found", wanted).into())
}

/// How many records there are, without reading any.
#[must_use]
pub fn count() -> usize {
    table::entries().len()
}

/// Every record made of the same atoms with the same charge, however its formula is spelled: isomers
/// are among them.
pub(super) fn of_atoms(formula: &Formula) -> impl Iterator<Item = &'static Record> {
    let wanted = formula.hill();
    let same =
        move |entry: &&'static table::Entry| entry.cells().is_some_and(|[.., hill]| hill == wanted);
    table::entries().iter().filter(same).filter_map(table::Entry::record)
}
