//! Which way the mixture moves, as far as the tolerances allow to say.

use super::tolerance::Interval;
use crate::equilibrium::Affinity;
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;

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
    /// Nothing that matters is left to move; it leans this way.
    AtRest(Option<Direction>),
    /// The affinity points this way, but what the reaction would use up is not there.
    Spent(Direction),
    /// The tolerances allow both ways, or species of both sides are absent; it leans this way.
    CannotTell(Option<Direction>),
}

/// How near to rest counts as at rest.
#[derive(Debug, Clone, Copy, PartialEq)]
pub enum Band {
    /// |T − T*| up to this many kelvin.
    Temperature {
        /// The half-width.
        half_width_k: f64,
    },
    /// The missing conversion up to this share.
    Conversion {
        /// The half-width.
        half_width: f64,
    },
}

/// The band of a case that states none: 10 K. Common practice, no source.
pub const DEFAULT_BAND: Band = Band::Temperature { half_width_k: 10.0 };

/// The band where a temperature means nothing and none is stated: 1 % of missing conversion.
pub const DEFAULT_CONVERSION_BAND: Band = Band::Conversion { half_width: 0.01 };

/// A change of one activity by this share is what an analysis does not see.
const UNSEEN_CHANGE: f64 = 0.01;

/// Whether T* says something: moving T by the band must change ln K by more than a change of 1 % in
/// the activity of each reactant does, |Δ_rH°| Δt/(R T²) > 0.01 · ½ Σ|ν|. This does not depend on
/// how the equation is scaled.
///
/// ```
/// use shiftgauge::advice::temperature_says_something;
/// assert!(temperature_says_something(-40_000.0, 10.0, 500.0, 4.0)); // a shift reaction
/// assert!(!temperature_says_something(-200.0, 10.0, 350.0, 4.0)); // an exchange of like groups
/// ```
#[must_use]
pub fn temperature_says_something(
    enthalpy_j_per_mol: f64,
    half_width_k: f64,
    temperature_k: f64,
    sum_of_nu: f64,
) -> bool {
    let rt_squared = GAS_CONSTANT_J_PER_MOL_K * temperature_k * temperature_k;
    enthalpy_j_per_mol.abs() * half_width_k / rt_squared > UNSEEN_CHANGE * 0.5 * sum_of_nu
}

/// An affinity below this, over RT, is rounding: it moves T* by less than a microkelvin.
const ROUNDING_OVER_RT: f64 = 1e-10;

/// What the verdict rests on.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Evidence {
    /// A/RT of the values as read.
    pub affinity: Affinity,
    /// Its 95 % interval, where Q is finite or opens one way.
    pub affinity_interval: Option<Interval>,
    /// The 95 % interval of what the band is about: the approach, or the missing conversion.
    pub band_interval: Option<Interval>,
    /// The band.
    pub band: Band,
    /// Whether nothing that the forward reaction uses up is there.
    pub forward_is_blocked: bool,
    /// Whether nothing that the reverse reaction uses up is there.
    pub reverse_is_blocked: bool,
}

/// Judges a reaction.
///
/// `at rest` when the interval of the approach (or of the missing conversion) lies inside the band,
/// or when the affinity is zero to rounding; otherwise forward or reverse when the interval of the
/// affinity excludes zero; otherwise it cannot be told.
#[must_use]
pub fn judge(evidence: &Evidence) -> Verdict {
    let leaning = match evidence.affinity {
        Affinity::Finite(over_rt) if over_rt.abs() <= ROUNDING_OVER_RT => None,
        Affinity::Finite(over_rt) if over_rt < 0.0 => Some(Direction::Reverse),
        Affinity::Finite(_) | Affinity::OpenForward => Some(Direction::Forward),
        Affinity::OpenReverse => Some(Direction::Reverse),
        Affinity::Undetermined => return Verdict::CannotTell(None),
    };
    let half_width = match evidence.band {
        Band::Temperature { half_width_k } => half_width_k,
        Band::Conversion { half_width } => half_width,
    };
    let is_blocked = |direction| match direction {
        Direction::Forward => evidence.forward_is_blocked,
        Direction::Reverse => evidence.reverse_is_blocked,
    };
    if let Some(direction) = leaning.filter(|direction| is_blocked(*direction)) {
        return Verdict::Spent(direction);
    }
    if evidence.band_interval.is_some_and(|interval| interval.within(half_width)) {
        return Verdict::AtRest(leaning);
    }
    let Some(interval) = evidence.affinity_interval else {
        return leaning.map_or(Verdict::AtRest(None), Verdict::Moves);
    };
    match leaning {
        _ if interval.is_positive() => Verdict::Moves(Direction::Forward),
        _ if interval.is_negative() => Verdict::Moves(Direction::Reverse),
        None if interval.within(ROUNDING_OVER_RT) => Verdict::AtRest(None),
        leaning => Verdict::CannotTell(leaning),
    }
}
