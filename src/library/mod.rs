//! What is known of each species: Δ_fH°, S°, C°p(T), where it holds, how well, and from where.
//!
//! The tables lie beside this file as tab-separated text: `species.tsv` (one line a species),
//! `heat.tsv` (one line a range of temperature) and `sources.tsv`. Nothing is parsed before it is
//! asked for. `tests/reference/library.py` made them from published data and checks them.
//!
//! Conventions: p° = 1 bar; H° of the elements in their reference states is zero at 298.15 K; the
//! reference state is one for all temperatures (rhombic sulfur, graphite, iron), so tables that
//! change it, as some do for sulfur above 882 K, agree for balanced reactions only.
//!
//! Dissolved species, `(aq)`: the standard state is the ideal solution of 1 mol/kg. Δ_fG°, S° and
//! C°p of the hydrogen ion are zero. Key values of CODATA come first; other ions have Δ_fG° and S°
//! of the CRC table, from which Δ_fH° follows; neutral molecules have Henry's constants with the
//! gas, or the NBS tables. Where a measured constant tells more than tables of single species do
//! (ammonium, sulfite, hydrogen fluoride, witherite), the record is formed by that constant, and
//! its sources say so. C°p is constant: the range is 0 to 100 °C where it is published and 15 to
//! 35 °C where it is not, and there it is zero or that of the reaction's other side. Carbonic acid
//! is CO2(aq), ammonium hydroxide NH3(aq), sulfurous acid SO2(aq): one molecule, one record. There
//! is no S^2-(aq), as no sound constant for it exists.
//!
//! NASA TM-4513 was made with R = 8.314510 J/(mol K). C°p/R and S°/R follow from spectra and do
//! not depend on R, so they are kept; H° is known in J/mol, so its constant is set anew for the
//! exact R. The rest differs by 6e−6 relative.
//!
//! ```
//! use shiftgauge::library;
//! use shiftgauge::reaction::Phase;
//! assert_eq!(library::find("S", Some(Phase::Solid), None).len(), 2); // rhombic and monoclinic
//! assert_eq!(library::named("quicklime")[0].formula, "CaO");
//! assert_eq!(library::find("SO4^2-", None, None)[0].id, "SO4^2-.aq");
//! ```

mod combination;
mod hazard;
mod polynomial;
mod record;
mod table;
mod temperature;

pub use combination::Change;
pub use combination::Combination;
pub use combination::STOICHIOMETRIC_LIMIT;
pub use hazard::hazards;
pub use record::Properties;
pub use record::Reach;
pub use record::Record;
pub use record::UncertaintyKind;
pub use table::citation;
pub use temperature::TEMPERATURE_LIMITS_K;
pub use temperature::Temperature;

use crate::problem::LibraryCode;
use crate::problem::Outcome;
use crate::problem::Problem;
use crate::reaction::Phase;

/// Every record whose formula is spelled so, in the phase and the form if they are given.
///
/// The order is that of the table (by id). An unknown formula gives an empty list.
#[must_use]
pub fn find(formula: &str, phase: Option<Phase>, form: Option<&str>) -> Vec<&'static Record> {
    table::entries_of(formula)
        .filter_map(table::Entry::record)
        .filter(|record| phase.is_none_or(|wanted| record.phase == wanted))
        .filter(|record| form.is_none() || record.form == form)
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

/// Records whose formula, or a word of whose name, begins with this text, at most so many: first those
/// whose formula does, then those whose name does, then those with a later word. Capital letters do
/// not matter in names. Fewer than two letters find nothing.
///
/// ```
/// use shiftgauge::library;
/// let found = library::beginning("ammo", 8);
/// assert!(found.iter().any(|record| record.formula == "NH3"));
/// ```
#[must_use]
pub fn beginning(text: &str, most: usize) -> Vec<&'static Record> {
    let wanted = text.trim();
    if wanted.chars().count() < 2 {
        return Vec::new();
    }
    let starts = |part: &str| {
        part.get(..wanted.len()).is_some_and(|start| start.eq_ignore_ascii_case(wanted))
    };
    let rank = |entry: &table::Entry| {
        let names = entry.line.split('\t').nth(4).unwrap_or_default();
        let later = |name: &str| name.split([' ', '-']).any(starts);
        if entry.formula.starts_with(wanted) {
            Some(0)
        } else if names.split(';').any(starts) {
            Some(1)
        } else {
            names.split(';').any(later).then_some(2)
        }
    };
    let ranked =
        |wanted: u8| table::entries().iter().filter(move |entry| rank(entry) == Some(wanted));
    let all = (0..3).flat_map(ranked).take(most);
    all.filter_map(table::Entry::record).collect()
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
