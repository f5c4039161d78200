//! A solution in water to amounts of its solutes.

use super::density::water_density_kg_per_m3;
use super::gas_form::no_molar_mass;
use super::reading::{Entry, Stated};
use crate::problem::{MixtureCode, Outcome, Problem};
use crate::quantity::{Measure, Quantity};
use crate::reaction::Species;

/// The solution block.
#[derive(Debug, Clone)]
pub struct SolutionReading {
    /// Its volume, where that is stated.
    pub volume: Option<Quantity>,
    /// The mass of its water, where that is stated.
    pub water: Option<Quantity>,
    /// Its lines.
    pub entries: Vec<Entry>,
}

/// The solutes with their amounts.
#[derive(Debug, Clone)]
pub struct Solution {
    /// The species and their amounts, in the order entered.
    pub amounts_mol: Vec<(Species, f64)>,
    /// The mass of water they are dissolved in.
    pub water_kg: f64,
    /// Whether the mass of water was stated, or followed from a stated volume.
    pub is_stated: bool,
    /// Whether a volume was turned into a mass of water by the density of water.
    pub by_density: bool,
}

/// Turns a solution into amounts of its solutes.
///
/// Inside all is by mass of water: n = m w for mol/kg, n = c V for mol/L, with V = w/ρ and ρ the
/// density of water at the temperature (the volume of the solutes is neglected: about a per cent
/// for 0.5 mol/kg of a salt). A pH is −lg of the activity of H+, so n = w 10^−pH/γ. Neither volume
/// nor water stated is one kilogram of water.
///
/// # Errors
/// All problems of the block at once: volume and water both stated, a pH of another species than
/// H+, a species twice, a kind that a solute cannot have, a species without a molar mass, a
/// temperature at which there is no liquid water.
pub fn solution(
    reading: &SolutionReading,
    temperature_k: f64,
    activity_coefficient_of_h: f64,
) -> Outcome<Solution> {
    let mut problems = Vec::new();
    if reading.entries.is_empty() {
        problems.push(Problem::new(MixtureCode::Empty).at("reading.solution.entries"));
    }
    if reading.volume.is_some() && reading.water.is_some() {
        problems.push(Problem::new(MixtureCode::VolumeAndWater).at("reading.solution.water"));
    }
    let Some(density) = water_density_kg_per_m3(temperature_k) else {
        problems.push(Problem::new(MixtureCode::NoLiquidWater).at("temperature"));
        return Err(problems);
    };
    let water_kg = match (&reading.water, &reading.volume) {
        (Some(water), _) => water.value_si,
        (None, Some(volume)) => volume.value_si * density,
        (None, None) => 1.0,
    };
    let mut amounts_mol = Vec::with_capacity(reading.entries.len());
    let mut by_density = reading.volume.is_some();
    for (i, entry) in reading.entries.iter().enumerate() {
        let earlier = &reading.entries[..i];
        if earlier.iter().any(|earlier| earlier.species.same_substance(&entry.species)) {
            let name = entry.species.text();
            let problem = Problem::new(MixtureCode::SpeciesTwice).with("species", name);
            problems.push(problem.at(&entry.field));
        }
        match molality(entry, density, water_kg, activity_coefficient_of_h) {
            Ok((molality, per_volume)) => {
                by_density |= per_volume;
                amounts_mol.push((entry.species.clone(), molality * water_kg));
            }
            Err(problem) => problems.push(problem.at(&entry.field)),
        }
    }
    if !problems.is_empty() {
        return Err(problems);
    }
    let is_stated = reading.volume.is_some() || reading.water.is_some();
    Ok(Solution { amounts_mol, water_kg, is_stated, by_density })
}

/// The molality that a line states, and whether it was stated by volume.
fn molality(
    entry: &Entry,
    density: f64,
    water_kg: f64,
    activity_coefficient_of_h: f64,
) -> Result<(f64, bool), Problem> {
    let quantity = match &entry.stated {
        Stated::Quantity(quantity) => quantity,
        Stated::Missing { value } => return Ok((*value, false)),
        Stated::Remainder => return Err(Problem::new(MixtureCode::RemainderOfSolution)),
        Stated::Present | Stated::Absent => {
            return Err(Problem::new(MixtureCode::PresenceInMixture));
        }
    };
    let value = quantity.value_si;
    let molar_mass = || {
        let molar_mass = entry.species.formula.molar_mass_kg_per_mol();
        molar_mass.ok_or_else(|| no_molar_mass(&entry.species))
    };
    match quantity.measure {
        Measure::Molality => Ok((value, false)),
        Measure::Concentration => Ok((value / density, true)),
        Measure::MassConcentration => Ok((value / molar_mass()? / density, true)),
        Measure::Ph if entry.species.formula.text() == "H^+" => {
            Ok((libm::pow(10.0, -value) / activity_coefficient_of_h, false))
        }
        Measure::Ph => Err(Problem::new(MixtureCode::PhOfAnother)),
        Measure::Amount => Ok((value / water_kg, false)),
        _ => Ok((value / molar_mass()? / water_kg, false)),
    }
}
