//! A gas reading to amounts of each species in the wet gas.

use super::closing::{Closing, close};
use super::element_balance::{ElementBalance, Feed, Sought, balance};
use super::gas_form::{Form, common_basis, form_of, refuse_repeats};
use super::reading::{Around, Basis, GasReading, Water};
use super::water::water_fraction;
use crate::problem::{MixtureCode, Outcome, Problem};
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
    /// What the feed says of this gas, where there is one.
    pub balance: Option<ElementBalance>,
}

/// Turns a gas reading into amounts of each species in the wet gas.
///
/// Fractions (by amount, also mg/Nm3 through the molar mass, and partial pressures over the total
/// pressure) give one mole of wet gas; amounts and flows give themselves. A dry analysis is made
/// wet by y_i = y_i,dry (1 − y_w). Behind a feed the elements tie the two gases together, and what
/// the sample lost, the steam, and argon counted as oxygen follow from them.
///
/// # Errors
/// All problems of the block at once: kinds that do not go together, fractions that do not add up,
/// a negative remainder, a species twice, water named in a dry analysis, a water content that is no
/// fraction.
pub fn gas_mixture(
    reading: &GasReading,
    around: Around,
    feed: Option<&Feed>,
) -> Outcome<GasMixture> {
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
        Basis::Dry(Water::FromFeed) if feed.is_none() => {
            Err(Problem::new(MixtureCode::WaterNeedsFeed).at("water"))
        }
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
        add_water(&mut amounts_mol, water_species.clone(), fraction, basis);
    }
    let mut sought = Vec::new();
    if matches!(reading.basis, Basis::Dry(Water::FromFeed)) {
        sought.push(Sought { species: water_species, within: None });
    }
    if feed.is_some() {
        let lost = reading.lost.iter().cloned();
        sought.extend(lost.map(|species| Sought { species, within: None }));
    }
    take_out_what_is_counted_within(reading, &mut amounts_mol, feed, &mut sought)?;
    let balance = feed.map(|feed| balance(feed, &amounts_mol, &sought)).transpose()?;
    if let Some(balance) = &balance {
        let names = amounts_mol.iter().map(|(species, _)| species.clone());
        let names = names.chain(sought.into_iter().map(|sought| sought.species));
        // One mole of gas again, or the amounts as they were measured.
        let per = if basis == AmountBasis::OneMole { balance.reading_mol } else { balance.scale };
        amounts_mol = names.zip(balance.amounts_mol.iter().map(|amount| amount / per)).collect();
    }
    let total_mol = amounts_mol.iter().map(|(_, amount)| amount).sum();
    let added_water_fraction = water;
    Ok(GasMixture { amounts_mol, total_mol, basis, added_water_fraction, closing, balance })
}

/// Makes a dry analysis wet: y = y(dry) (1 − y_w), or adds the water to amounts.
fn add_water(
    amounts_mol: &mut Vec<(Species, f64)>,
    water_species: Species,
    fraction: f64,
    basis: AmountBasis,
) {
    let dry_mol: f64 = amounts_mol.iter().map(|(_, amount)| amount).sum();
    let water_mol = if basis == AmountBasis::OneMole {
        amounts_mol.iter_mut().for_each(|(_, amount)| *amount *= 1.0 - fraction);
        fraction
    } else {
        dry_mol * fraction / (1.0 - fraction)
    };
    amounts_mol.push((water_species, water_mol));
}

/// Argon over nitrogen in dry air: 0.934 % and 78.084 %. Source: ISO 2533:1975, table 1.
const ARGON_PER_NITROGEN_IN_AIR: f64 = 0.934 / 78.084;

/// An analyser that counts one species with another: with a feed that has it the balance finds how
/// much; without one argon is taken to come with the nitrogen, as in air.
fn take_out_what_is_counted_within(
    reading: &GasReading,
    amounts_mol: &mut Vec<(Species, f64)>,
    feed: Option<&Feed>,
    sought: &mut Vec<Sought>,
) -> Outcome<()> {
    for (i, entry) in reading.entries.iter().enumerate() {
        let Some(counted) = &entry.includes else { continue };
        let in_feed = feed.is_some_and(|feed| {
            feed.amounts_mol.iter().any(|(species, _)| species.same_substance(counted))
        });
        if in_feed {
            sought.push(Sought { species: counted.clone(), within: Some(i) });
            continue;
        }
        let nitrogen = amounts_mol.iter().find(|(species, _)| species.formula.text() == "N2");
        let Some((_, nitrogen_mol)) = nitrogen.filter(|_| counted.formula.text() == "Ar") else {
            let problem = Problem::new(MixtureCode::CountedWithUnknown)
                .with("counted", counted.formula.text())
                .with("species", entry.species.formula.text());
            return Err(problem.at(&entry.field).into());
        };
        let argon_mol = nitrogen_mol * ARGON_PER_NITROGEN_IN_AIR;
        if argon_mol > amounts_mol[i].1 {
            let problem = Problem::new(MixtureCode::CountedMoreThanAll)
                .with("counted", counted.formula.text())
                .with("species", entry.species.formula.text());
            return Err(problem.at(&entry.field).into());
        }
        amounts_mol[i].1 -= argon_mol;
        amounts_mol.push((counted.clone(), argon_mol));
    }
    Ok(())
}
