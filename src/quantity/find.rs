//! From the text of a unit to its row, or to what may have been meant.

use super::measure::Measure;
use super::symbol;
use super::table::all_units;
use super::unit::{PressureReference, Unit};
use std::collections::{BTreeMap, BTreeSet};
use std::sync::OnceLock;

/// A unit as found, with the reference of a pressure.
pub(super) type Found = (&'static Unit, PressureReference);

/// Why no unit was found.
pub(super) enum Fault {
    /// It is a unit of another measure.
    OtherMeasure(&'static Unit),
    /// It is none, but these are near.
    Near(Vec<String>),
    /// It is none.
    Unknown,
}

/// What may follow a pressure unit, longest first so that none hides another.
const REFERENCES: [(&str, PressureReference); 10] = [
    ("(absolute)", PressureReference::Absolute),
    ("absolute", PressureReference::Absolute),
    ("(gauge)", PressureReference::Gauge),
    ("gauge", PressureReference::Gauge),
    ("(abs)", PressureReference::Absolute),
    ("abs", PressureReference::Absolute),
    ("(g)", PressureReference::Gauge),
    ("(a)", PressureReference::Absolute),
    ("g", PressureReference::Gauge),
    ("a", PressureReference::Absolute),
];

struct Index {
    exact: BTreeMap<String, Vec<&'static Unit>>,
    any_case: BTreeMap<String, Vec<(String, &'static Unit)>>,
    /// Every name in small letters, by its length.
    names: BTreeMap<usize, Vec<(Vec<char>, &'static Unit)>>,
}

fn index() -> &'static Index {
    static INDEX: OnceLock<Index> = OnceLock::new();
    INDEX.get_or_init(|| {
        let mut index =
            Index { exact: BTreeMap::new(), any_case: BTreeMap::new(), names: BTreeMap::new() };
        for unit in all_units() {
            for name in [&unit.symbol].into_iter().chain(unit.aliases) {
                for key in symbol::keys(name) {
                    let lower = key.to_lowercase();
                    let letters: Vec<char> = lower.chars().collect();
                    index.names.entry(letters.len()).or_default().push((letters, unit));
                    index.any_case.entry(lower).or_default().push((key.clone(), unit));
                    index.exact.entry(key).or_default().push(unit);
                }
            }
        }
        index
    })
}

/// Finds a unit of one of the allowed measures, trying them in the caller's order.
pub(super) fn find(text: &str, allowed: &[Measure]) -> Result<Found, Fault> {
    let keys = symbol::keys(text);
    let exact = |key: &str| index().exact.get(key).cloned().unwrap_or_default();
    let mut found = matching(&keys, exact);
    if found.is_empty() {
        found = matching(&keys, forgiving_case);
    }
    for measure in allowed {
        if let Some(hit) = found.iter().find(|(unit, _)| unit.measure == *measure) {
            return Ok(*hit);
        }
    }
    match found.first() {
        Some((unit, _)) => Err(Fault::OtherMeasure(unit)),
        None => {
            let near = suggestions(&keys, allowed);
            Err(if near.is_empty() { Fault::Unknown } else { Fault::Near(near) })
        }
    }
}

fn matching(keys: &[String], look_up: impl Fn(&str) -> Vec<&'static Unit>) -> Vec<Found> {
    for key in keys {
        let units = look_up(key);
        if !units.is_empty() {
            return units.into_iter().map(|unit| (unit, PressureReference::Unstated)).collect();
        }
    }
    let Some(key) = keys.first() else { return Vec::new() };
    for (ending, reference) in REFERENCES {
        let Some(start) = key.len().checked_sub(ending.len()) else { continue };
        if !key.get(start..).is_some_and(|end| end.eq_ignore_ascii_case(ending)) {
            continue;
        }
        let pressures = look_up(&key[..start]).into_iter();
        let pressure = pressures.filter(|unit| unit.measure == Measure::Pressure);
        let found: Vec<Found> = pressure.map(|unit| (unit, reference)).collect();
        if !found.is_empty() {
            return found;
        }
    }
    Vec::new()
}

/// Letters of the wrong case are read where they can mean one thing only: never where an m or M
/// differs (a factor of up to 10⁹), nor `Cal`, which older books use for 1000 cal.
fn forgiving_case(key: &str) -> Vec<&'static Unit> {
    let Some(rows) = index().any_case.get(&key.to_lowercase()) else { return Vec::new() };
    let symbols: BTreeSet<&str> = rows.iter().map(|(_, unit)| unit.symbol).collect();
    let is_safe = |name: &str| {
        let mut pairs = name.chars().zip(key.chars());
        pairs.all(|(a, b)| a == b || !matches!((a, b), ('m', 'M') | ('M', 'm')))
    };
    if symbols.len() > 1 || key.starts_with("Cal") {
        return Vec::new();
    }
    rows.iter().filter(|(name, _)| is_safe(name)).map(|(_, unit)| *unit).collect()
}

/// Units that differ in letter case only, else by one letter; the allowed measures first.
fn suggestions(keys: &[String], allowed: &[Measure]) -> Vec<String> {
    const MOST: usize = 3;
    let lower: Vec<String> = keys.iter().map(|key| key.to_lowercase()).collect();
    let mut near: Vec<&'static Unit> = Vec::new();
    for key in &lower {
        let rows = index().any_case.get(key).into_iter().flatten();
        near.extend(rows.map(|(_, unit)| *unit));
    }
    if near.is_empty() {
        let typed: Vec<char> = lower.first().map_or(Vec::new(), |key| key.chars().collect());
        let lengths = typed.len().saturating_sub(1)..=typed.len() + 1;
        let names = index().names.range(lengths).flat_map(|(_, names)| names);
        near.extend(names.filter(|(name, _)| is_one_edit_away(&typed, name)).map(|row| row.1));
    }
    let (wanted, others): (Vec<&Unit>, Vec<&Unit>) =
        near.into_iter().partition(|unit| allowed.contains(&unit.measure));
    let mut symbols: Vec<String> = Vec::new();
    for unit in wanted.into_iter().chain(others) {
        if !symbols.iter().any(|symbol| symbol == unit.symbol) {
            symbols.push(unit.symbol.to_owned());
        }
    }
    symbols.truncate(MOST);
    symbols
}

/// Whether one letter put in, left out, changed or swapped with its neighbour makes them equal;
/// words of one or two letters are all near each other and do not count.
fn is_one_edit_away(typed: &[char], name: &[char]) -> bool {
    if typed.len() < 3 || name.len() < 3 {
        return false;
    }
    let same_start = typed.iter().zip(name).take_while(|(a, b)| a == b).count();
    let (a, b) = (&typed[same_start..], &name[same_start..]);
    let swapped =
        a.len() == b.len() && a.len() >= 2 && a[0] == b[1] && a[1] == b[0] && a[2..] == b[2..];
    let changed = !a.is_empty() && !b.is_empty() && a[1..] == b[1..];
    let left_out = !b.is_empty() && a == &b[1..];
    let put_in = !a.is_empty() && &a[1..] == b;
    swapped || changed || left_out || put_in
}
