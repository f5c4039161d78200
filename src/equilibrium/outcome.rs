//! What a state of rest is told by: its outcome, its summary, its amounts.

use super::quotient::Affinity;
use super::side::Term;
use super::system::System;
use super::walls::Way;
use serde::{Serialize, Serializer};

/// How the search for rest ended; read it before any number.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum RestOutcome {
    /// The affinity is zero.
    Rest,
    /// A phase is used up, pure or a mixture that goes as a whole; the affinity keeps its sign.
    PhaseExhausted,
    /// Q does not depend on the extent and is not K: something is used up, a pure phase or the gas.
    RanToItsLimit,
    /// Q does not depend on the extent and is K (to the rounding of the inputs).
    AnyExtentIsAtRest,
    /// A reactant and a product are absent.
    NothingCanMove,
    /// Nothing that is known in amount is used up, and Q never reaches K (or only at an amount
    /// above [`super::AMOUNT_MAX_MOL`]): the amounts are those of the start. This needs an ample
    /// phase, or a reaction written with one side only.
    HasNoLimit,
}

impl RestOutcome {
    /// The outcome's name at the border.
    #[must_use]
    pub fn as_str(self) -> &'static str {
        match self {
            RestOutcome::Rest => "rest",
            RestOutcome::PhaseExhausted => "phase exhausted",
            RestOutcome::RanToItsLimit => "ran to its limit",
            RestOutcome::AnyExtentIsAtRest => "any extent is at rest",
            RestOutcome::NothingCanMove => "nothing can move",
            RestOutcome::HasNoLimit => "has no limit",
        }
    }
}

impl Serialize for RestOutcome {
    fn serialize<S: Serializer>(&self, serializer: S) -> Result<S::Ok, S::Error> {
        serializer.serialize_str(self.as_str())
    }
}

/// What is known of a state of rest beside its amounts.
#[derive(Debug, Clone, Copy, PartialEq, Serialize)]
pub struct Summary {
    /// How the search ended.
    pub outcome: RestOutcome,
    /// ξ from the start to rest, in mol: n_i = n_i,start + ν_i ξ. Zero where any extent is at rest.
    pub extent_mol: f64,
    /// The lowest extent, where the first product is used up; none without such a product.
    pub extent_min_mol: Option<f64>,
    /// The highest extent, where the first reactant is used up; none without such a reactant.
    pub extent_max_mol: Option<f64>,
    /// A/RT in the final state: about zero at rest, with its sign where a phase is exhausted.
    pub affinity: Affinity,
    /// What is left of A/RT that the outcome does not explain: |A/RT| at rest, zero otherwise.
    pub residual: f64,
    /// Steps of the solver.
    pub iterations: u32,
    /// The largest |∂ ln n_i/∂ ln K| at rest: how many per cent an amount changes when K changes
    /// by one per cent. Zero where the outcome is not rest.
    pub condition: f64,
}

/// The state of rest: its summary and its amounts.
#[derive(Debug, Clone, PartialEq)]
pub struct Rest {
    /// Outcome, extent, residual.
    pub summary: Summary,
    /// Amounts in mol; zero for what is used up, or below 5e-324.
    pub amounts_mol: Vec<f64>,
    /// ln(n/mol), also of traces below any double; none for what is absent and for ample phases.
    pub ln_amounts: Vec<Option<f64>>,
}

/// Room for one calculation, to be used again so that nothing is allocated in a loop.
#[derive(Debug, Default, Clone)]
pub struct Workspace {
    pub(super) amounts_mol: Vec<f64>,
    /// The amounts times 2^`shift`.
    pub(super) scaled: Vec<f64>,
    pub(super) terms: Vec<Term>,
    pub(super) shift: i32,
    /// ln of the scaled distance from the wall, where no double holds the distance.
    pub(super) trace: Option<(Way, f64)>,
}

impl Workspace {
    /// The amounts in mol of the last state of rest.
    #[must_use]
    pub fn amounts_mol(&self) -> &[f64] {
        &self.amounts_mol
    }

    /// ln(n/mol) of one species in the last state of rest of this system; none if it is absent or
    /// ample.
    #[must_use]
    pub fn ln_amount(&self, system: &System, species: usize) -> Option<f64> {
        let (&kind, &nu) = (system.kinds.get(species)?, system.nu.get(species)?);
        let &amount = self.amounts_mol.get(species)?;
        if kind.is_ample() {
            return None;
        }
        if amount > 1e-290 || amount > 0.0 && nu == 0.0 {
            return Some(libm::log(amount));
        }
        let unshift = f64::from(self.shift) * std::f64::consts::LN_2;
        match (self.scaled.get(species), self.trace) {
            (Some(&scaled), _) if scaled > 0.0 && nu != 0.0 => Some(libm::log(scaled) - unshift),
            (_, Some((way, ln_distance))) if nu * way.used_up() > 0.0 => {
                Some(libm::log(nu.abs()) + ln_distance - unshift)
            }
            _ => None,
        }
    }
}
