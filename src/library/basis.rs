//! What a reaction rests on: records and measured equilibria, common species cancelled.

use super::known::Known;
use super::measured::Measured;
use super::measured::measured;
use super::record::Record;

/// Where a sum of stoichiometric numbers is zero but for the rounding of a few of them.
const CANCELLED: f64 = 1e-12;
/// More ties than any reaction goes through; the tables hold no circle, so this is never reached.
const TIES_AT_MOST: usize = 256;

/// Records and measured equilibria whose sum is a reaction.
#[derive(Debug, Clone, PartialEq)]
pub(super) struct Basis {
    pub(super) records: Vec<(Known, f64)>,
    pub(super) measured: Vec<(&'static Measured, f64)>,
}

impl Basis {
    /// The reaction's own species, with nothing put in their place.
    pub(super) fn of_species(terms: &[(Known, f64)]) -> Basis {
        let mut basis = Basis { records: Vec::new(), measured: Vec::new() };
        for (record, nu) in terms {
            basis.add(record.clone(), *nu);
        }
        basis
    }

    /// The reaction with every tied species replaced: ν G(tied) = (ν/ν_t) (ΔG of the equilibrium −
    /// Σ ν_j G_j over its other species).
    pub(super) fn of_equilibria(terms: &[(Known, f64)]) -> Basis {
        let mut basis = Basis::of_species(terms);
        for _ in 0..TIES_AT_MOST {
            let Some((place, tie)) = basis.next_tie() else { break };
            let (_, nu) = basis.records.remove(place);
            let share = nu / tie.nu(tie.tied);
            for (record, other) in tie.terms.iter().filter(|(record, _)| record.id != tie.tied) {
                basis.add(Known::Table(record), -share * other);
            }
            match basis.measured.iter_mut().find(|(known, _)| known.tied == tie.tied) {
                Some((_, times)) => *times += share,
                None => basis.measured.push((tie, share)),
            }
        }
        basis.measured.retain(|(_, times)| times.abs() > CANCELLED);
        basis
    }

    /// A species that a measured equilibrium stands in for. A user's own record is not replaced.
    fn next_tie(&self) -> Option<(usize, &'static Measured)> {
        self.records.iter().enumerate().find_map(|(place, (record, _))| {
            let Known::Table(record) = record else { return None };
            let tie = measured(&record.id)?;
            let others = || self.records.iter().map(|(other, _)| -> &Record { other });
            tie.ties(others()).then_some((place, tie))
        })
    }

    fn add(&mut self, record: Known, nu: f64) {
        match self.records.iter().position(|(known, _)| known.id == record.id) {
            Some(place) => {
                let sum = self.records[place].1 + nu;
                if sum.abs() <= CANCELLED * (1.0 + nu.abs()) {
                    self.records.remove(place);
                } else {
                    self.records[place].1 = sum;
                }
            }
            None => self.records.push((record, nu)),
        }
    }
}
