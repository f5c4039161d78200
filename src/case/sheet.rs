//! The sheet of one species: its figures, where they come from, and its curves against T.

use std::borrow::Cow;

use serde::Serialize;

use super::refusal::Answer;
use super::species::{Asked, MeasuredReport, SpeciesMatch, measured_of, one, species_match};
use super::value::Value;
use crate::library::{Found, FoundBy, Known, Reach, TEMPERATURE_LIMITS_K, Temperature, find};
use crate::problem::Outcome;
use crate::reaction::parse_formula;

/// The answer of `sheet`.
#[derive(Debug, Clone, Serialize)]
pub struct SheetAnswer {
    ok: bool,
    /// The sheet.
    pub sheet: SheetReport,
}

/// What is known of one species.
#[derive(Debug, Clone, Serialize)]
pub struct SheetReport {
    /// Its names, figures, sources and range.
    #[serde(flatten)]
    pub species: SpeciesMatch,
    /// The molar mass; null where an element has no standard weight.
    pub molar_mass_kg_per_mol: Option<f64>,
    /// ΔfG° at 298.15 K; null where the library lacks an element's reference state.
    pub gibbs_of_formation_j_per_mol: Option<f64>,
    /// C°p at 298.15 K.
    pub heat_capacity_j_per_mol_k: f64,
    /// Where one range of the data meets the next.
    pub joints_k: Vec<f64>,
    /// The transitions inside the range.
    pub transitions: Vec<TransitionReport>,
    /// The library's record of the same species, where this one is the user's own.
    pub instead_of: Option<InsteadOf>,
    /// The curves.
    pub curve: CurveOfSpecies,
    /// The figures at the temperature that was asked about, or at 298.15 K.
    pub at: PointOfSpecies,
    /// The measured equilibrium in full.
    pub equilibrium: Option<MeasuredReport>,
}

/// A transition.
#[derive(Debug, Clone, Copy, Serialize)]
pub struct TransitionReport {
    /// Where it is passed.
    pub temperature_k: f64,
    /// Its enthalpy.
    pub enthalpy_j_per_mol: f64,
}

/// How a user's own record differs from the library's.
#[derive(Debug, Clone, Serialize)]
pub struct InsteadOf {
    /// ΔfH° of the library less that of the record, at 298.15 K.
    pub enthalpy_j_per_mol: f64,
    /// S° of the library less that of the record, at 298.15 K.
    pub entropy_j_per_mol_k: f64,
    /// G° of the library less that of the record, at the temperature of `at`.
    pub gibbs_j_per_mol: f64,
    /// The standard uncertainty of the library's ΔfG°.
    pub u_gibbs_j_per_mol: f64,
    /// The library's sources.
    pub sources: Vec<Cow<'static, str>>,
}

/// Properties at one temperature; H° counts from the elements at 298.15 K.
#[derive(Debug, Clone, Copy, Serialize)]
pub struct PointOfSpecies {
    /// The temperature.
    pub temperature_k: f64,
    /// C°p.
    pub heat_capacity_j_per_mol_k: f64,
    /// H°.
    pub enthalpy_j_per_mol: f64,
    /// S°.
    pub entropy_j_per_mol_k: f64,
    /// G° = H° − T S°.
    pub gibbs_j_per_mol: f64,
    /// How far outside the range it is; null inside.
    pub outside_by_k: Option<f64>,
}

/// Properties over the range and a little beyond, column by column.
#[derive(Debug, Clone, Serialize)]
pub struct CurveOfSpecies {
    /// Temperatures, rising.
    pub temperature_k: Vec<f64>,
    /// C°p.
    pub heat_capacity_j_per_mol_k: Vec<f64>,
    /// H°.
    pub enthalpy_j_per_mol: Vec<f64>,
    /// S°.
    pub entropy_j_per_mol_k: Vec<f64>,
    /// G°.
    pub gibbs_j_per_mol: Vec<f64>,
}

/// So many points a curve has; beside them stand both ends of the range, both sides of every joint and
/// the wanted temperature.
const POINTS: u32 = 96;
/// The curves are carried beyond the range by this share of it, to show what extrapolation does.
const BEYOND: f64 = 0.08;
/// Either side of a joint, relative to its temperature.
const BESIDE: f64 = 1e-9;

/// Gives the sheet of one species; `asked` as in [`super::species`].
#[must_use]
pub fn sheet(species: &str, asked: &Value) -> Answer<SheetAnswer> {
    sheet_of(species, asked).map(|sheet| SheetAnswer { ok: true, sheet }).into()
}

fn sheet_of(species: &str, asked: &Value) -> Outcome<SheetReport> {
    let asked = Asked::read(asked)?;
    let record = one(species, &asked.book)?;
    let at = asked.temperature.unwrap_or(Temperature::standard());
    let found = Found { record: record.clone(), by: FoundBy::Formula };
    let formula = parse_formula(&record.formula).ok();
    let standard = record.properties(Temperature::standard());
    Ok(SheetReport {
        species: species_match(&found, &asked),
        molar_mass_kg_per_mol: formula.as_ref().and_then(|known| known.molar_mass_kg_per_mol()),
        gibbs_of_formation_j_per_mol: record.formation_gibbs_j_per_mol(),
        heat_capacity_j_per_mol_k: standard.heat_capacity_j_per_mol_k,
        joints_k: record.joints_k(),
        transitions: record
            .transitions()
            .into_iter()
            .map(|one| TransitionReport {
                temperature_k: one.temperature_k,
                enthalpy_j_per_mol: one.enthalpy_j_per_mol,
            })
            .collect(),
        instead_of: instead_of(&record, at),
        curve: curve(&record, at),
        at: point(&record, at),
        equilibrium: measured_of(&record).map(MeasuredReport::of),
    })
}

/// The library's record of the same species, compared.
fn instead_of(record: &Known, at: Temperature) -> Option<InsteadOf> {
    let form = record.form.as_deref();
    let found = find(&record.formula, Some(record.phase), form);
    let table = found.into_iter().find(|table| record.is_own() && record.stands_for(table))?;
    let (own, other) = (point(record, at), table.properties(at));
    Some(InsteadOf {
        enthalpy_j_per_mol: table.formation_enthalpy_j_per_mol
            - record.formation_enthalpy_j_per_mol,
        entropy_j_per_mol_k: table.standard_entropy_j_per_mol_k
            - record.standard_entropy_j_per_mol_k,
        gibbs_j_per_mol: other.gibbs_j_per_mol - own.gibbs_j_per_mol,
        u_gibbs_j_per_mol: table.u_gibbs_j_per_mol,
        sources: table.citations().collect(),
    })
}

fn point(record: &Known, at: Temperature) -> PointOfSpecies {
    let of = record.properties(at);
    PointOfSpecies {
        temperature_k: at.kelvin(),
        heat_capacity_j_per_mol_k: of.heat_capacity_j_per_mol_k,
        enthalpy_j_per_mol: of.enthalpy_j_per_mol,
        entropy_j_per_mol_k: of.entropy_j_per_mol_k,
        gibbs_j_per_mol: of.gibbs_j_per_mol,
        outside_by_k: match of.reach {
            Reach::InRange => None,
            Reach::Extrapolated { by_k } => Some(by_k),
        },
    }
}

fn curve(record: &Known, at: Temperature) -> CurveOfSpecies {
    let (low, high) = record.range_k;
    let beyond = BEYOND * (high - low);
    let from = (low - beyond).max(TEMPERATURE_LIMITS_K.0).min(at.kelvin());
    let to = (high + beyond).min(TEMPERATURE_LIMITS_K.1).max(at.kelvin());
    let step = (to - from) / f64::from(POINTS - 1);
    let mut kelvins: Vec<f64> = (0..POINTS).map(|i| from + f64::from(i) * step).collect();
    kelvins.extend([low, high, at.kelvin()]);
    kelvins.extend(record.joints_k().iter().flat_map(|joint| [joint * (1.0 - BESIDE), *joint]));
    kelvins.sort_by(f64::total_cmp);
    let points: Vec<PointOfSpecies> = kelvins
        .into_iter()
        .filter_map(|kelvin| Temperature::new(kelvin).ok())
        .map(|at| point(record, at))
        .collect();
    let column = |of: fn(&PointOfSpecies) -> f64| points.iter().map(of).collect();
    CurveOfSpecies {
        temperature_k: column(|point| point.temperature_k),
        heat_capacity_j_per_mol_k: column(|point| point.heat_capacity_j_per_mol_k),
        enthalpy_j_per_mol: column(|point| point.enthalpy_j_per_mol),
        entropy_j_per_mol_k: column(|point| point.entropy_j_per_mol_k),
        gibbs_j_per_mol: column(|point| point.gibbs_j_per_mol),
    }
}
