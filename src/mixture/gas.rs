//! A gas reading to amounts of each species in the wet gas.

use super::closing::{Closing, close};
use super::reading::{Around, Basis, Entry, GasReading, Stated};
use super::water::water_fraction;
use crate::problem::{MixtureCode, Outcome, Problem};
use crate::quantity::{FractionBasis, Measure, PressureReference, Quantity};
use crate::reaction::{Species, parse_species};

/// What the amounts of a gas stand for.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum AmountBasis {
    /// One mole of wet gas: only fractions were given.
    OneMole,
    /// The amounts given, in mol.
    Amounts,
    /// The flows given, in mol each second.
    Flows,
}

/// The wet gas: each species with its amount.
#[derive(Debug, Clone)]
pub struct GasMixture {
    /// The species and their amounts, in the order entered; water from a dry analysis last.
    pub amounts_mol: Vec<(Species, f64)>,
    /// The sum of the amounts.
    pub total_mol: f64,
    /// What the amounts stand for.
    pub basis: AmountBasis,
    /// The fraction of water that was added to a dry analysis.
    pub added_water_fraction: Option<f64>,
    /// How the fractions were brought to a sum of one.
    pub closing: Closing,
    /// The fields whose value was a bound, taken at the bound.
    pub bounds: Vec<String>,
}

/// Turns a gas reading into amounts of each species in the wet gas.
///
/// Fractions (by amount, also mg/Nm3 through the molar mass, and partial pressures over the total
/// pressure) give one mole of wet gas; amounts and flows give themselves. A dry analysis is made
/// wet by y_i = y_i,dry (1 − y_w).
///
/// # Errors
/// All problems of the block at once: kinds that do not go together, fractions that do not add up,
/// a negative remainder, a species twice, water named in a dry analysis, a water content that is no
/// fraction.
pub fn gas_mixture(reading: &GasReading, around: Around) -> Outcome<GasMixture> {
    let water_species = parse_species("H2O(g)")?;
    let mut problems = Vec::new();
    if reading.entries.is_empty() {
        return Err(Problem::new(MixtureCode::Empty).at("entries").into());
    }
    let dry = matches!(reading.basis, Basis::Dry(_));
    let apart = dry.then_some(&water_species);
    refuse_repeats(&reading.entries, apart, &mut problems);
    let stated: Vec<Option<(Form, f64)>> = reading
        .entries
        .iter()
        .map(|entry| match form_of(entry, dry, around.pressure_pa) {
            Ok(stated) => Some(stated),
            Err(problem) => {
                problems.push(problem.at(&entry.field));
                None
            }
        })
        .collect();
    let water = match &reading.basis {
        Basis::Wet => Ok(None),
        Basis::Dry(water) => water_fraction(water, around),
    };
    let water = water.unwrap_or_else(|problem| {
        problems.push(problem);
        None
    });
    let stated: Vec<(Form, f64)> = stated.into_iter().flatten().collect();
    if !problems.is_empty() {
        return Err(problems);
    }
    let basis = common_basis(&reading.entries, &stated)?;
    let mut values: Vec<f64> = stated.iter().map(|(_, value)| *value).collect();
    let closing = if basis == AmountBasis::OneMole {
        close(&reading.entries, reading.closed_by, &mut values)?
    } else {
        Closing::NotNeeded
    };
    let mut amounts_mol: Vec<(Species, f64)> =
        reading.entries.iter().map(|entry| entry.species.clone()).zip(values).collect();
    if let Some(fraction) = water {
        let dry_mol: f64 = amounts_mol.iter().map(|(_, amount)| amount).sum();
        let water_mol = if basis == AmountBasis::OneMole {
            amounts_mol.iter_mut().for_each(|(_, amount)| *amount *= 1.0 - fraction);
            fraction
        } else {
            dry_mol * fraction / (1.0 - fraction)
        };
        amounts_mol.push((water_species, water_mol));
    }
    let total_mol = amounts_mol.iter().map(|(_, amount)| amount).sum();
    let bounds = reading.entries.iter().filter(|entry| is_bound(entry));
    let bounds = bounds.map(|entry| entry.field.clone()).collect();
    Ok(GasMixture { amounts_mol, total_mol, basis, added_water_fraction: water, closing, bounds })
}

fn is_bound(entry: &Entry) -> bool {
    matches!(&entry.stated, Stated::Quantity(quantity) if quantity.is_bound)
}

/// The kinds of statement that can stand together in one block.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
enum Form {
    Fraction,
    Amount,
    Flow,
    Remainder,
}

fn form_of(entry: &Entry, dry: bool, pressure_pa: Option<f64>) -> Result<(Form, f64), Problem> {
    let quantity = match &entry.stated {
        Stated::Quantity(quantity) => quantity,
        Stated::Remainder => return Ok((Form::Remainder, 0.0)),
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
fn refuse_repeats(entries: &[Entry], apart: Option<&Species>, problems: &mut Vec<Problem>) {
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
}

/// The basis all entries share; the first that does not go with the others is the problem.
fn common_basis(entries: &[Entry], stated: &[(Form, f64)]) -> Outcome<AmountBasis> {
    let first = stated.iter().map(|(form, _)| *form).find(|form| *form != Form::Remainder);
    let mut problems = Vec::new();
    for (entry, (form, _)) in entries.iter().zip(stated) {
        let code = match (first, form) {
            (Some(Form::Amount | Form::Flow), Form::Remainder) => MixtureCode::RemainderOfAmounts,
            (Some(first), form) if first != *form && *form != Form::Remainder => {
                MixtureCode::MixedForms
            }
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
