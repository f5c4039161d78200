//! Solids and liquids, each its own pure phase, to amounts.

use super::gas::AmountBasis;
use super::gas_form::no_molar_mass;
use super::reading::{Entry, Stated};
use crate::problem::{MixtureCode, Outcome, Problem};
use crate::quantity::Measure;

/// How much there is of a pure phase.
#[derive(Debug, Clone, Copy, PartialEq)]
pub enum Held {
    /// So many moles (or mol each second, beside flows).
    Mol(f64),
    /// It is there, in ample amount: it cannot be used up.
    Ample,
}

/// Turns the entries of pure phases into what is held of each, in order; `gas` is what the gas
/// amounts stand for, where there is a gas.
///
/// # Errors
/// A species twice, a fraction of a pure phase, an amount beside a gas given in fractions (the two
/// have no common measure), a flow beside amounts.
pub fn pure_phases(entries: &[Entry], gas: Option<AmountBasis>) -> Outcome<Vec<Held>> {
    let mut problems = Vec::new();
    let mut held = Vec::with_capacity(entries.len());
    let mut first = None;
    for (i, entry) in entries.iter().enumerate() {
        if entries[..i].iter().any(|earlier| earlier.species.same_substance(&entry.species)) {
            let name = entry.species.text();
            let problem = Problem::new(MixtureCode::SpeciesTwice).with("species", name);
            problems.push(problem.at(&entry.field));
        }
        if let Stated::Quantity(quantity) = &entry.stated {
            let flow = matches!(quantity.measure, Measure::AmountRate | Measure::MassRate);
            if *first.get_or_insert(flow) != flow {
                problems.push(Problem::new(MixtureCode::MixedForms).at(&entry.field));
                continue;
            }
        }
        match held_of(entry, gas) {
            Ok(amount) => held.push(amount),
            Err(problem) => problems.push(problem.at(&entry.field)),
        }
    }
    if problems.is_empty() { Ok(held) } else { Err(problems) }
}

fn held_of(entry: &Entry, gas: Option<AmountBasis>) -> Result<Held, Problem> {
    let quantity = match &entry.stated {
        Stated::Present => return Ok(Held::Ample),
        Stated::Absent => return Ok(Held::Mol(0.0)),
        Stated::Remainder | Stated::Missing { .. } => {
            return Err(Problem::new(MixtureCode::RemainderOfPurePhase));
        }
        Stated::Quantity(quantity) => quantity,
    };
    let (flow, mass) = match quantity.measure {
        Measure::Amount => (false, false),
        Measure::AmountRate => (true, false),
        Measure::Mass => (false, true),
        Measure::MassRate => (true, true),
        _ => return Err(Problem::new(MixtureCode::FractionOfPurePhase)),
    };
    match gas {
        Some(AmountBasis::OneMole) => return Err(Problem::new(MixtureCode::NoCommonMeasure)),
        Some(AmountBasis::Amounts) if flow => return Err(Problem::new(MixtureCode::MixedForms)),
        Some(AmountBasis::Flows) if !flow => return Err(Problem::new(MixtureCode::MixedForms)),
        _ => {}
    }
    if !mass {
        return Ok(Held::Mol(quantity.value_si));
    }
    let molar_mass = entry.species.formula.molar_mass_kg_per_mol();
    let molar_mass = molar_mass.ok_or_else(|| no_molar_mass(&entry.species))?;
    Ok(Held::Mol(quantity.value_si / molar_mass))
}
