//! A reaction's species summed once, so that K at any T is one short polynomial.

use super::polynomial::Piece;
use super::polynomial::Polynomial;
use super::polynomial::holding;
use super::record::Reach;
use super::record::Record;
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
    terms: Vec<(&'static Record, f64)>,
    pieces: Vec<Piece>,
}

impl Combination {
    /// Sums the species of a reaction; no terms at all is the empty reaction, K = 1.
    ///
    /// # Errors
    /// `species-coefficient` for each ν that is not finite or beyond [`STOICHIOMETRIC_LIMIT`].
    pub fn new(terms: &[(&'static Record, f64)]) -> Outcome<Self> {
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
        let starts = terms.iter().flat_map(|(record, _)| &record.pieces).map(|piece| piece.from_k);
        let mut starts: Vec<f64> = starts.collect();
        sort_short(&mut starts, |before, item| before > item);
        starts.dedup();
        let piece = |from_k: f64| {
            let mut polynomial = Polynomial::default();
            for (record, nu) in terms {
                if let Some(part) = holding(&record.pieces, from_k) {
                    polynomial.add(*nu, part);
                }
            }
            Piece { from_k, polynomial }
        };
        Ok(Self { terms: terms.to_vec(), pieces: starts.into_iter().map(piece).collect() })
    }

    /// The records with their stoichiometric numbers, as given.
    #[must_use]
    pub fn terms(&self) -> &[(&'static Record, f64)] {
        &self.terms
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

    /// For each term, whether T is inside its record's range.
    pub fn reaches(&self, at: Temperature) -> impl Iterator<Item = (&'static Record, Reach)> + '_ {
        self.terms.iter().map(move |(record, _)| (*record, record.reach(at)))
    }

    /// The temperatures in K inside every record's range, if there are any; none without terms.
    #[must_use]
    pub fn range_k(&self) -> Option<(f64, f64)> {
        let ranges = || self.terms.iter().map(|(record, _)| record.range_k);
        let low = ranges().map(|range| range.0).reduce(f64::max)?;
        let high = ranges().map(|range| range.1).reduce(f64::min)?;
        (low <= high).then_some((low, high))
    }

    /// The standard uncertainty of Δ_rG° in J/mol: √Σ(ν u)², the records taken as independent.
    ///
    /// Records that share a source are not independent, so this is a fair size and no more.
    #[must_use]
    pub fn u_gibbs_j_per_mol(&self) -> f64 {
        let squares = self.terms.iter().map(|(record, nu)| nu * record.u_gibbs_j_per_mol);
        squares.map(|part| part * part).sum::<f64>().sqrt()
    }
}
