//! The elements' reference states, which figures of formation are counted from.

use std::sync::OnceLock;

use super::record::Record;
use super::record::UncertaintyKind;
use super::table;
use crate::reaction::Formula;
use crate::reaction::parse_formula;

/// S°(298.15 K) in J/(mol K) of the elements that a formula is made of, each in its reference state;
/// an ion's electrons count as half hydrogen gas each, as they do where the hydrogen ion is zero.
///
/// # Errors
/// The symbol of an element whose reference state the library lacks.
pub(super) fn elements_entropy_j_per_mol_k(formula: &Formula) -> Result<f64, &'static str> {
    let mut sum = 0.0;
    for (element, count) in formula.atoms() {
        sum += count.to_f64() * atom_entropy(element.symbol).ok_or(element.symbol)?;
    }
    let hydrogen = if formula.charge() == 0 { 0.0 } else { atom_entropy("H").ok_or("H")? };
    Ok(sum - f64::from(formula.charge()) * hydrogen)
}

/// S° of one mole of atoms.
fn atom_entropy(symbol: &str) -> Option<f64> {
    states().iter().find(|(known, _)| *known == symbol).map(|(_, entropy)| *entropy)
}

/// The symbol and S° per mole of atoms of each reference state.
fn states() -> &'static [(&'static str, f64)] {
    static STATES: OnceLock<Vec<(&'static str, f64)>> = OnceLock::new();
    STATES.get_or_init(|| {
        let records = table::entries().iter().filter(|entry| entry.line.contains("\telement\t"));
        let records = records.filter_map(table::Entry::record);
        records
            .filter(|record| record.u_kind == UncertaintyKind::Element)
            .filter_map(state)
            .collect()
    })
}

fn state(record: &'static Record) -> Option<(&'static str, f64)> {
    let formula = parse_formula(&record.formula).ok()?;
    let [(element, count)] = formula.atoms() else { return None };
    let is_neutral = formula.charge() == 0;
    is_neutral.then_some((element.symbol, record.standard_entropy_j_per_mol_k / count.to_f64()))
}
