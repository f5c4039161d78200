//! What a reaction conserves: each element, and charge.

use crate::numeric::Rational;
use crate::numeric::RationalError;
use crate::numeric::sort_short;

use super::balance::Column;
use super::elements::Element;

/// A quantity that a reaction conserves.
#[derive(Debug, Clone, Copy, PartialEq, Eq, PartialOrd, Ord)]
pub(super) enum Conserved {
    /// The atoms of an element.
    Atoms(&'static Element),
    /// Charge.
    Charge,
}

/// Everything that these species contain: their elements by atomic number, then charge if any
/// is charged.
pub(super) fn conserved(columns: &[Column]) -> Vec<Conserved> {
    let mut all = Vec::new();
    for column in columns {
        let formula = &column.species.formula;
        let atoms = formula.atoms().iter().map(|(element, _)| Conserved::Atoms(element));
        for quantity in atoms.chain((formula.charge() != 0).then_some(Conserved::Charge)) {
            if !all.contains(&quantity) {
                all.push(quantity);
            }
        }
    }
    sort_short(&mut all, |before, item| before > item);
    all
}

/// How much of a conserved quantity each species holds.
pub(super) fn row(columns: &[Column], quantity: Conserved) -> Vec<Rational> {
    let held = |column: &Column| match quantity {
        Conserved::Atoms(element) => column.species.formula.count(element.symbol),
        Conserved::Charge => Rational::from(column.species.formula.charge()),
    };
    columns.iter().map(held).collect()
}

/// What is not conserved with the numbers as written, as `H 4 ≠ 2`, left and right.
pub(super) fn excess(columns: &[Column]) -> Result<Vec<String>, RationalError> {
    let mut found = Vec::new();
    for quantity in conserved(columns) {
        let (mut left, mut right) = (Rational::ZERO, Rational::ZERO);
        for (column, held) in columns.iter().zip(row(columns, quantity)) {
            let amount = held.times(column.nu.magnitude())?;
            let side = if column.nu.is_negative() { &mut left } else { &mut right };
            *side = side.plus(amount)?;
        }
        if left != right {
            found.push(match quantity {
                Conserved::Atoms(element) => format!("{element} {left} ≠ {right}"),
                Conserved::Charge => format!("charge {left} ≠ {right}"),
            });
        }
    }
    Ok(found)
}
