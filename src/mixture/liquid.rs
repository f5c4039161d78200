//! A liquid mixture to amounts: fractions by amount or by mass, amounts, masses.

use super::closing::{Closing, close};
use super::gas::AmountBasis;
use super::gas_form::no_molar_mass;
use super::reading::{Entry, Stated};
use crate::problem::{MixtureCode, Outcome, Problem};
use crate::quantity::{FractionBasis, Measure, Quantity};
use crate::reaction::Species;

/// One liquid of several components.
#[derive(Debug, Clone)]
pub struct LiquidMixture {
    /// The species and their amounts, in the order entered.
    pub amounts_mol: Vec<(Species, f64)>,
    /// What the amounts stand for.
    pub basis: AmountBasis,
    /// How the fractions were brought to a sum of one.
    pub closing: Closing,
}

/// The kinds of statement that can stand together.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
enum Form {
    AmountFraction,
    MassFraction,
    Amount,
    Flow,
}

/// Turns the lines of a liquid mixture into amounts.
///
/// `mol %` and `wt %` give one mole of liquid (from mass fractions n_i = w_i/M_i, scaled to one
/// mole); amounts and masses, or flows of them, give themselves.
///
/// # Errors
/// All problems of the block at once: a fraction that does not say of what, kinds that do not go
/// together, fractions that do not add up, a species twice, a species without a molar mass.
pub fn liquid_mixture(entries: &[Entry], closed_by: Option<usize>) -> Outcome<LiquidMixture> {
    let mut problems = Vec::new();
    let mut forms = Vec::with_capacity(entries.len());
    for (i, entry) in entries.iter().enumerate() {
        if entries[..i].iter().any(|earlier| earlier.species.same_substance(&entry.species)) {
            let name = entry.species.text();
            let problem = Problem::new(MixtureCode::SpeciesTwice).with("species", name);
            problems.push(problem.at(&entry.field));
        }
        match form_of(entry) {
            Ok(form) => forms.push(form),
            Err(problem) => problems.push(problem.at(&entry.field)),
        }
    }
    if !problems.is_empty() {
        return Err(problems);
    }
    let first = forms.iter().flatten().map(|(form, _)| *form).next();
    for (entry, stated) in entries.iter().zip(&forms) {
        let apart = match (stated, first) {
            (Some((form, _)), Some(first)) => *form != first,
            (None, Some(Form::Amount | Form::Flow)) => {
                problems.push(Problem::new(MixtureCode::RemainderOfAmounts).at(&entry.field));
                false
            }
            _ => false,
        };
        if apart {
            problems.push(Problem::new(MixtureCode::MixedForms).at(&entry.field));
        }
    }
    let form = first.unwrap_or(Form::AmountFraction);
    let mut values: Vec<f64> =
        forms.iter().map(|stated| stated.map_or(0.0, |(_, value)| value)).collect();
    if !problems.is_empty() {
        return Err(problems);
    }
    let closing = match form {
        Form::AmountFraction | Form::MassFraction => close(entries, closed_by, &mut values)?,
        Form::Amount | Form::Flow => Closing::NotNeeded,
    };
    if form == Form::MassFraction {
        for (entry, value) in entries.iter().zip(&mut values) {
            *value /= molar_mass(entry).map_err(|problem| problem.at(&entry.field))?;
        }
        let total: f64 = values.iter().sum();
        values.iter_mut().for_each(|value| *value /= total);
    }
    let species = entries.iter().map(|entry| entry.species.clone());
    Ok(LiquidMixture {
        amounts_mol: species.zip(values).collect(),
        basis: match form {
            Form::Amount => AmountBasis::Amounts,
            Form::Flow => AmountBasis::Flows,
            Form::AmountFraction | Form::MassFraction => AmountBasis::OneMole,
        },
        closing,
    })
}

fn molar_mass(entry: &Entry) -> Result<f64, Problem> {
    let molar_mass = entry.species.formula.molar_mass_kg_per_mol();
    molar_mass.ok_or_else(|| no_molar_mass(&entry.species))
}

/// What a line states; none for the remainder and for what is found from K.
fn form_of(entry: &Entry) -> Result<Option<(Form, f64)>, Problem> {
    let quantity: &Quantity = match &entry.stated {
        Stated::Quantity(quantity) => quantity,
        Stated::Remainder => return Ok(None),
        Stated::Missing { value } => return Ok(Some((Form::AmountFraction, *value))),
        Stated::Present | Stated::Absent => {
            return Err(Problem::new(MixtureCode::PresenceInMixture));
        }
    };
    let value = quantity.value_si;
    Ok(Some(match (quantity.measure, quantity.fraction_basis) {
        (Measure::Fraction, FractionBasis::Amount) => (Form::AmountFraction, value),
        (Measure::Fraction, FractionBasis::Mass) => (Form::MassFraction, value),
        (Measure::Fraction, _) => return Err(Problem::new(MixtureCode::FractionOfWhat)),
        (Measure::Amount, _) => (Form::Amount, value),
        (Measure::AmountRate, _) => (Form::Flow, value),
        (Measure::Mass, _) => (Form::Amount, value / molar_mass(entry)?),
        _ => (Form::Flow, value / molar_mass(entry)?),
    }))
}
