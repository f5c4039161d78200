//! The tables as text: found by bisection, read only when a species is asked for.

use std::sync::OnceLock;

use super::record::Record;

const SPECIES: &str = include_str!("tables/species.tsv");
const HEAT: &str = include_str!("tables/heat.tsv");
const MEASURED: &str = include_str!("tables/measured.tsv");
const SOURCES: &str = include_str!("tables/sources.tsv");

/// About the length of a short line: room for as many entries is made at once.
const SHORTEST_LINE: usize = 80;

/// A line of the species table, with its id and formula cut out and the record once it is read.
pub(super) struct Entry {
    pub(super) id: &'static str,
    pub(super) formula: &'static str,
    pub(super) line: &'static str,
    // Boxed, so that an entry that nobody asks for stays small.
    record: OnceLock<Option<Box<Record>>>,
    cells: OnceLock<Option<[&'static str; 5]>>,
}

impl Entry {
    /// The record, read from the tables at the first call.
    pub(super) fn record(&'static self) -> Option<&'static Record> {
        let read = || Record::read(self.line, rows(HEAT, self.id)).map(Box::new);
        self.record.get_or_init(read).as_deref()
    }

    /// The phase, the form, the names, the CAS number and the atoms in Hill's order, as they stand;
    /// kept, for the finder asks again at every letter.
    pub(super) fn cells(&self) -> Option<[&'static str; 5]> {
        let read = || self.line.split('\t').skip(2).take(5).collect::<Vec<_>>().try_into().ok();
        *self.cells.get_or_init(read)
    }
}

/// Every line of the species table, sorted by id; made at the first call, with nothing parsed.
pub(super) fn entries() -> &'static [Entry] {
    static ENTRIES: OnceLock<Vec<Entry>> = OnceLock::new();
    ENTRIES.get_or_init(|| {
        let mut entries = Vec::with_capacity(SPECIES.len() / SHORTEST_LINE);
        entries.extend(SPECIES.lines().skip(1).filter_map(|line| {
            let (id, rest) = line.split_once('\t')?;
            let (formula, _) = rest.split_once('\t')?;
            let (record, cells) = (OnceLock::new(), OnceLock::new());
            Some(Entry { id, formula, line, record, cells })
        }));
        entries
    })
}

/// The record of an id.
pub(super) fn record(id: &str) -> Option<&'static Record> {
    let place = entries().binary_search_by(|entry| entry.id.cmp(id)).ok()?;
    entries()[place].record()
}

/// The lines of the measured equilibrium that a species is tied by.
pub(super) fn measured(id: &str) -> impl Iterator<Item = &'static str> + Clone + use<> {
    rows(MEASURED, id)
}

/// The ids of the tied species, each once.
pub(super) fn tied() -> impl Iterator<Item = &'static str> {
    let mut last = "";
    MEASURED.lines().skip(1).map(first_cell).filter(move |id| {
        let new = *id != last;
        last = id;
        new
    })
}

/// The entries of a formula: those whose id starts with it and a dot.
pub(super) fn entries_of(formula: &str) -> impl Iterator<Item = &'static Entry> {
    let start = entries().partition_point(|entry| entry.id < formula);
    // Ids of longer formulas with a bracket or a sign may stand between "X" and "X.".
    let owned = formula.to_owned();
    entries()[start..]
        .iter()
        .take_while({
            let stem = owned.clone();
            move |entry| entry.id.starts_with(&stem)
        })
        .filter(move |entry| entry.formula == owned)
}

/// The citation of a source id.
///
/// ```
/// assert!(shiftgauge::library::citation("janaf").unwrap().contains("Monograph 9"));
/// assert_eq!(shiftgauge::library::citation("no such source"), None);
/// ```
#[must_use]
pub fn citation(source: &str) -> Option<&'static str> {
    let line = rows(SOURCES, source).next()?;
    line.split_once('\t').map(|(_, text)| text)
}

/// The lines of a table, sorted by its first cell, whose first cell is `id`.
fn rows(table: &'static str, id: &str) -> impl Iterator<Item = &'static str> + Clone + use<> {
    let first = first_not_before(table, id);
    let id = id.to_owned();
    table[first..].lines().take_while(move |line| first_cell(line) == id)
}

/// Where the first line starts whose first cell is not before `id`; the head is passed over.
fn first_not_before(table: &str, id: &str) -> usize {
    let bytes = table.as_bytes();
    let line_end = |from: usize| {
        bytes[from..].iter().position(|b| *b == b'\n').map_or(bytes.len(), |length| from + length)
    };
    let (mut low, mut high) = ((line_end(0) + 1).min(bytes.len()), bytes.len());
    while low < high {
        let middle = low + (high - low) / 2;
        let back = bytes[low..middle].iter().rposition(|b| *b == b'\n');
        let start = back.map_or(low, |length| low + length + 1);
        let end = line_end(start);
        if first_cell(&table[start..end]) < id {
            low = (end + 1).min(bytes.len());
        } else {
            high = start;
        }
    }
    low
}

fn first_cell(line: &str) -> &str {
    line.split_once('\t').map_or(line, |(cell, _)| cell)
}
