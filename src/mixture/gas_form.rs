//! What each line of a gas analysis states, and whether the lines go together.

use super::gas::AmountBasis;
use super::reading::{Entry, Stated};
use crate::problem::{MixtureCode, Outcome, Problem};
use crate::quantity::{FractionBasis, Measure, PressureReference, Quantity};
use crate::reaction::Species;

/// The kinds of statement that can stand together in one block.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub(super) enum Form {
    Fraction,
    Amount,
    Flow,
    Remainder,
    Missing,
}

impl Form {
    /// Whether it is neither the remainder nor found from K.
    fn is_measured(self) -> bool {
        !matches!(self, Form::Remainder | Form::Missing)
    }
}

pub(super) fn form_of(
    entry: &Entry,
    dry: bool,
    pressure_pa: Option<f64>,
) -> Result<(Form, f64), Problem> {
    let quantity = match &entry.stated {
        Stated::Quantity(quantity) => quantity,
        Stated::Remainder => return Ok((Form::Remainder, 0.0)),
        Stated::Missing { value } => return Ok((Form::Missing, *value)),
        Stated::Present | Stated::Absent => return Err(Problem::new(MixtureCode::PresenceInGas)),
    };
    match quantity.measure {
        Measure::Fraction if quantity.fraction_basis == FractionBasis::Mass => {
            Err(Problem::new(MixtureCode::MassFractionInGas))
        }
        Measure::Fraction | Measure::Number => Ok((Form::Fraction, quantity.value_si)),
        Measure::MassPerAmount => match entry.species.formula.molar_mass_kg_per_mol() {
            Some(molar_mass) => Ok((Form::Fraction, quantity.value_si / molar_mass)),
            None => Err(no_molar_mass(&entry.species)),
        },
        Measure::Pressure => partial_pressure(quantity, dry, pressure_pa),
        Measure::Amount => Ok((Form::Amount, quantity.value_si)),
        _ => Ok((Form::Flow, quantity.value_si)),
    }
}

pub(super) fn no_molar_mass(species: &Species) -> Problem {
    Problem::new(MixtureCode::NoMolarMass).with("species", species.text())
}

fn partial_pressure(
    quantity: &Quantity,
    dry: bool,
    pressure_pa: Option<f64>,
) -> Result<(Form, f64), Problem> {
    if quantity.pressure_reference == PressureReference::Gauge {
        return Err(Problem::new(MixtureCode::GaugePartialPressure));
    }
    if dry {
        return Err(Problem::new(MixtureCode::PartialPressureInDry));
    }
    match pressure_pa {
        Some(total) => Ok((Form::Fraction, quantity.value_si / total)),
        None => Err(Problem::new(MixtureCode::PartialPressureNeedsTotal)),
    }
}

/// A species may stand in one line only, and the water of a dry analysis, stated apart, in none.
pub(super) fn refuse_repeats(
    entries: &[Entry],
    apart: Option<&Species>,
    problems: &mut Vec<Problem>,
) {
    for (i, entry) in entries.iter().enumerate() {
        if entries[..i].iter().any(|earlier| earlier.species.same_substance(&entry.species)) {
            let problem =
                Problem::new(MixtureCode::SpeciesTwice).with("species", entry.species.text());
            problems.push(problem.at(&entry.field));
        }
        if apart.is_some_and(|apart| apart.same_substance(&entry.species)) {
            problems.push(Problem::new(MixtureCode::WaterInDry).at(&entry.field));
        }
    }
    let remainders = entries.iter().filter(|entry| matches!(entry.stated, Stated::Remainder));
    for entry in remainders.skip(1) {
        problems.push(Problem::new(MixtureCode::SecondRemainder).at(&entry.field));
    }
    let missing = entries.iter().filter(|entry| matches!(entry.stated, Stated::Missing { .. }));
    for entry in missing.skip(1) {
        problems.push(Problem::new(MixtureCode::SecondMissing).at(&entry.field));
    }
}

/// The basis all entries share; the first that does not go with the others is the problem.
pub(super) fn common_basis(entries: &[Entry], stated: &[(Form, f64)]) -> Outcome<AmountBasis> {
    let first = stated.iter().map(|(form, _)| *form).find(|form| form.is_measured());
    let mut problems = Vec::new();
    for (entry, (form, _)) in entries.iter().zip(stated) {
        let code = match (first, form) {
            (Some(Form::Amount | Form::Flow), Form::Remainder) => MixtureCode::RemainderOfAmounts,
            (Some(first), form) if first != *form && form.is_measured() => MixtureCode::MixedForms,
            _ => continue,
        };
        problems.push(Problem::new(code).at(&entry.field));
    }
    if !problems.is_empty() {
        return Err(problems);
    }
    Ok(match first {
        Some(Form::Amount) => AmountBasis::Amounts,
        Some(Form::Flow) => AmountBasis::Flows,
        _ => AmountBasis::OneMole,
    })
}
