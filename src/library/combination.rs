//! A reaction's species summed once, so that K at any T is one short polynomial.

use super::basis::Basis;
use super::known::Known;
use super::measured::Measured;
use super::polynomial::Piece;
use super::polynomial::Polynomial;
use super::polynomial::holding;
use super::temperature::Temperature;
use crate::numeric::sort_short;
use crate::problem::LibraryCode;
use crate::problem::Outcome;
use crate::problem::Problem;
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;

/// The largest stoichiometric number that a combination takes, either sign.
pub const STOICHIOMETRIC_LIMIT: f64 = 1e6;

/// The standard changes of a reaction at one temperature, p° = 1 bar.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Change {
    /// ln K = −Δ_rG°/RT.
    pub ln_k: f64,
    /// Δ_rG° in J/mol.
    pub gibbs_j_per_mol: f64,
    /// Δ_rH° in J/mol.
    pub enthalpy_j_per_mol: f64,
    /// Δ_rS° in J/(mol K).
    pub entropy_j_per_mol_k: f64,
    /// Δ_rC°p in J/(mol K).
    pub heat_capacity_j_per_mol_k: f64,
}

/// Records with their stoichiometric numbers ν, products positive.
///
/// A species that a [`Measured`] equilibrium ties is replaced by it, so that the reaction rests on
/// measured constants as far as they reach and on records for the rest; what stands on both sides
/// cancels exactly, its uncertainty too. [`Combination::of_species`] leaves that out.
///
/// The sums Σ ν·(coefficient) are made once for every stretch of temperature on which no species
/// changes its piece, the extrapolated ends included; then ln K costs one bisection of a few
/// numbers and one polynomial, however many species take part.
///
/// ```
/// use shiftgauge::library::{self, Combination, Temperature};
/// let gas = |formula| library::one(formula, Some(shiftgauge::reaction::Phase::Gas), None).unwrap();
/// // SO2 + 1/2 O2 = SO3: log10 K = 2.456 at 700 K in the JANAF tables.
/// let terms = [(gas("SO2"), -1.0), (gas("O2"), -0.5), (gas("SO3"), 1.0)];
/// let reaction = Combination::new(&terms).unwrap();
/// let ln_k = reaction.ln_k(Temperature::new(700.0).unwrap());
/// assert!((ln_k / 2.302585 - 2.456).abs() < 0.01);
/// ```
#[derive(Debug, Clone, PartialEq)]
pub struct Combination {
    terms: Vec<(Known, f64)>,
    basis: Basis,
    pieces: Vec<Piece>,
}

impl Combination {
    /// Sums the species of a reaction, with measured equilibria where there are some; no terms at
    /// all is the empty reaction, K = 1.
    ///
    /// # Errors
    /// `species-coefficient` for each ν that is not finite or beyond [`STOICHIOMETRIC_LIMIT`].
    pub fn new(terms: &[(impl Into<Known> + Clone, f64)]) -> Outcome<Self> {
        Self::on(terms, Basis::of_equilibria)
    }

    /// Sums the species of a reaction from their own records alone.
    ///
    /// # Errors
    /// As [`Combination::new`].
    pub fn of_species(terms: &[(impl Into<Known> + Clone, f64)]) -> Outcome<Self> {
        Self::on(terms, Basis::of_species)
    }

    fn on(
        terms: &[(impl Into<Known> + Clone, f64)],
        basis: fn(&[(Known, f64)]) -> Basis,
    ) -> Outcome<Self> {
        let terms: Vec<(Known, f64)> =
            terms.iter().map(|(record, nu)| (record.clone().into(), *nu)).collect();
        let bad: Vec<Problem> = terms
            .iter()
            .filter(|(_, nu)| nu.is_nan() || nu.abs() > STOICHIOMETRIC_LIMIT)
            .map(|(record, nu)| {
                Problem::new(LibraryCode::Coefficient)
                    .with("species", record.label())
                    .with("found", format!("{nu}"))
                    .with("limit", format!("{STOICHIOMETRIC_LIMIT}"))
            })
            .collect();
        if !bad.is_empty() {
            return Err(bad);
        }
        let basis = basis(&terms);
        let pieces = summed(&basis);
        Ok(Self { terms, basis, pieces })
    }

    /// The records with their stoichiometric numbers, as given.
    #[must_use]
    pub fn terms(&self) -> &[(Known, f64)] {
        &self.terms
    }

    /// The records that K rests on, and how many of each: those of the reaction, or where measured
    /// equilibria stand in for some, what is left.
    #[must_use]
    pub fn records(&self) -> &[(Known, f64)] {
        &self.basis.records
    }

    /// The measured equilibria that K rests on, and how many times each.
    #[must_use]
    pub fn measured(&self) -> &[(&'static Measured, f64)] {
        &self.basis.measured
    }

    /// ln K at T.
    #[must_use]
    pub fn ln_k(&self, at: Temperature) -> f64 {
        holding(&self.pieces, at.kelvin()).map_or(0.0, |sum| -sum.gibbs(at))
    }

    /// Δ_rH° at T in J/mol.
    #[must_use]
    pub fn enthalpy_j_per_mol(&self, at: Temperature) -> f64 {
        let rt = GAS_CONSTANT_J_PER_MOL_K * at.kelvin();
        holding(&self.pieces, at.kelvin()).map_or(0.0, |sum| rt * sum.enthalpy(at))
    }

    /// ln K and the standard changes at T.
    #[must_use]
    pub fn change(&self, at: Temperature) -> Change {
        let sum = holding(&self.pieces, at.kelvin()).copied().unwrap_or_default();
        let gibbs_over_rt = sum.gibbs(at);
        let rt = GAS_CONSTANT_J_PER_MOL_K * at.kelvin();
        Change {
            ln_k: -gibbs_over_rt,
            gibbs_j_per_mol: rt * gibbs_over_rt,
            enthalpy_j_per_mol: rt * sum.enthalpy(at),
            entropy_j_per_mol_k: GAS_CONSTANT_J_PER_MOL_K * sum.entropy(at),
            heat_capacity_j_per_mol_k: GAS_CONSTANT_J_PER_MOL_K * sum.heat_capacity(at),
        }
    }

    /// How far T lies outside the data that K rests on, in K; none inside.
    #[must_use]
    pub fn extrapolated_by_k(&self, at: Temperature) -> Option<f64> {
        let outside =
            self.ranges_k().map(|(low, high)| (low - at.kelvin()).max(at.kelvin() - high));
        outside.reduce(f64::max).filter(|by_k| *by_k > 0.0)
    }

    /// The temperatures in K inside every range that K rests on, if there are any; none without
    /// terms.
    #[must_use]
    pub fn range_k(&self) -> Option<(f64, f64)> {
        let low = self.ranges_k().map(|range| range.0).reduce(f64::max)?;
        let high = self.ranges_k().map(|range| range.1).reduce(f64::min)?;
        (low <= high).then_some((low, high))
    }

    fn ranges_k(&self) -> impl Iterator<Item = (f64, f64)> + '_ {
        let of_records = self.basis.records.iter().map(|(record, _)| record.range_k);
        of_records.chain(self.basis.measured.iter().map(|(known, _)| known.range_k))
    }

    /// The standard uncertainty of Δ_rG° in J/mol: √Σ(ν u)² over records and measured equilibria,
    /// taken as independent.
    ///
    /// Records that share a source are not independent, so this is a fair size and no more.
    #[must_use]
    pub fn u_gibbs_j_per_mol(&self) -> f64 {
        let records = self.basis.records.iter().map(|(record, nu)| nu * record.u_gibbs_j_per_mol);
        let measured = self.basis.measured.iter();
        let measured = measured.map(|(known, times)| times * known.u_gibbs_j_per_mol());
        records.chain(measured).map(|part| part * part).sum::<f64>().sqrt()
    }
}

/// One polynomial for every stretch of temperature on which nothing changes its piece.
fn summed(basis: &Basis) -> Vec<Piece> {
    let of_records = basis.records.iter().map(|(record, nu)| (&record.pieces, *nu));
    let of_measured = basis.measured.iter().map(|(known, times)| (&known.pieces, *times));
    let parts: Vec<(&Vec<Piece>, f64)> = of_records.chain(of_measured).collect();
    let starts = parts.iter().flat_map(|(pieces, _)| *pieces).map(|piece| piece.from_k);
    let mut starts: Vec<f64> = starts.collect();
    sort_short(&mut starts, |before, item| before > item);
    starts.dedup();
    let piece = |from_k: f64| {
        let mut polynomial = Polynomial::default();
        for (pieces, times) in &parts {
            if let Some(part) = holding(pieces, from_k) {
                polynomial.add(*times, part);
            }
        }
        Piece { from_k, polynomial }
    };
    starts.into_iter().map(piece).collect()
}
