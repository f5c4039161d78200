//! From the text of a unit to its row, or to what may have been meant.

use super::measure::Measure;
use super::symbol;
use super::table::all_units;
use super::unit::{PressureReference, Unit};
use std::collections::BTreeMap;
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

/// Every name of every unit as it is written, under the name in small letters.
type Index = BTreeMap<String, Vec<(String, &'static Unit)>>;

fn index() -> &'static Index {
    static INDEX: OnceLock<Index> = OnceLock::new();
    INDEX.get_or_init(|| {
        let mut index = Index::new();
        for unit in all_units() {
            for name in [&unit.symbol].into_iter().chain(unit.aliases) {
                for key in symbol::keys(name) {
                    let lower = key.to_ascii_lowercase();
                    index.entry(lower).or_default().push((key, unit));
                }
            }
        }
        index
    })
}

/// The rows whose name differs from this one in the size of letters at most.
fn in_any_case(key: &str) -> &'static [(String, &'static Unit)] {
    index().get(&key.to_ascii_lowercase()).map_or(&[], Vec::as_slice)
}

/// Finds a unit of one of the allowed measures, trying them in the caller's order.
pub(super) fn find(text: &str, allowed: &[Measure]) -> Result<Found, Fault> {
    let keys = symbol::keys(text);
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

fn matching(keys: &[String], look_up: fn(&str) -> Vec<&'static Unit>) -> Vec<Found> {
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

fn exact(key: &str) -> Vec<&'static Unit> {
    in_any_case(key).iter().filter(|(name, _)| name == key).map(|(_, unit)| *unit).collect()
}

/// Letters of the wrong case are read where they can mean one thing only: never where an m or M
/// differs (a factor of up to 10⁹), nor `Cal`, which older books use for 1000 cal.
fn forgiving_case(key: &str) -> Vec<&'static Unit> {
    let rows = in_any_case(key);
    let Some((_, first)) = rows.first() else { return Vec::new() };
    let several = rows.iter().any(|(_, unit)| unit.symbol != first.symbol);
    let is_safe = |name: &str| {
        let mut pairs = name.chars().zip(key.chars());
        pairs.all(|(a, b)| a == b || !matches!((a, b), ('m', 'M') | ('M', 'm')))
    };
    if several || key.starts_with("Cal") {
        return Vec::new();
    }
    rows.iter().filter(|(name, _)| is_safe(name)).map(|(_, unit)| *unit).collect()
}

/// Units that differ in letter case only, else by one letter; the allowed measures first.
fn suggestions(keys: &[String], allowed: &[Measure]) -> Vec<String> {
    const MOST: usize = 3;
    let mut near: Vec<&'static Unit> = Vec::new();
    for key in keys {
        near.extend(in_any_case(key).iter().map(|(_, unit)| *unit));
    }
    if near.is_empty() {
        let typed = letters(keys.first().map_or("", String::as_str));
        for (name, rows) in index() {
            if is_one_edit_away(&typed, &letters(name)) {
                near.extend(rows.iter().map(|(_, unit)| *unit));
            }
        }
    }
    let mut symbols: Vec<String> = Vec::new();
    for wanted in [true, false] {
        for unit in near.iter().filter(|unit| allowed.contains(&unit.measure) == wanted) {
            if !symbols.iter().any(|symbol| symbol == unit.symbol) {
                symbols.push(unit.symbol.to_owned());
            }
        }
    }
    symbols.truncate(MOST);
    symbols
}

fn letters(text: &str) -> Vec<char> {
    text.chars().map(|c| c.to_ascii_lowercase()).collect()
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
