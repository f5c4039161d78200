//! Which way the mixture moves.

use crate::equilibrium::{Affinity, RestOutcome};

/// A direction along the reaction as written.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum Direction {
    /// Towards the right-hand side.
    Forward,
    /// Towards the left-hand side.
    Reverse,
}

impl Direction {
    /// The word of the verdict.
    #[must_use]
    pub fn word(self) -> &'static str {
        match self {
            Direction::Forward => "forward",
            Direction::Reverse => "reverse",
        }
    }
}

/// The verdict on one reaction.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum Verdict {
    /// The mixture moves this way.
    Moves(Direction),
    /// The affinity is zero to rounding, or any extent is at rest.
    AtRest,
    /// The affinity points this way, but what the reaction would use up is not there.
    Spent(Direction),
    /// Species of both sides are absent, so that nothing decides.
    CannotTell,
}

/// An affinity below this, over RT, is rounding: it moves T* by less than a microkelvin.
const ROUNDING_OVER_RT: f64 = 1e-10;

/// Judges an affinity and what became of the mixture.
///
/// Stated tolerances are not part of this verdict: it rests on the values alone.
#[must_use]
pub fn judge(affinity: Affinity, outcome: RestOutcome) -> Verdict {
    let direction = match affinity {
        Affinity::Finite(over_rt) if over_rt.abs() <= ROUNDING_OVER_RT => return Verdict::AtRest,
        Affinity::Finite(over_rt) if over_rt < 0.0 => Direction::Reverse,
        Affinity::Finite(_) | Affinity::OpenForward => Direction::Forward,
        Affinity::OpenReverse => Direction::Reverse,
        Affinity::Undetermined => return Verdict::CannotTell,
    };
    if outcome == RestOutcome::NothingCanMove {
        Verdict::Spent(direction)
    } else {
        Verdict::Moves(direction)
    }
}
