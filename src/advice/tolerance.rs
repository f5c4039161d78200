//! What tolerances make of the affinity, T* and the missing conversion.

use crate::equilibrium::Affinity;
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;

/// What one evaluation of a case gives.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Judged {
    /// A/RT, or its open end.
    pub affinity: Affinity,
    /// ln Q, where Q is finite.
    pub ln_q: Option<f64>,
    /// T − T*, where there is a T*.
    pub approach_k: Option<f64>,
    /// The extent to rest as a share of the whole range of the extent.
    pub missing_conversion: Option<f64>,
    /// The temperature of the reading.
    pub temperature_k: f64,
}

/// One of the figures that a tolerance is carried to.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum Figure {
    /// A/RT.
    Affinity,
    /// ln Q.
    LnQ,
    /// ΔG = −A, in J/mol.
    Gibbs,
    /// T − T*, in kelvin.
    Approach,
    /// The missing conversion.
    MissingConversion,
}

impl Judged {
    /// One figure of it, where it is finite.
    #[must_use]
    pub fn figure(&self, figure: Figure) -> Option<f64> {
        match figure {
            Figure::Affinity => self.affinity.finite(),
            Figure::LnQ => self.ln_q,
            Figure::Gibbs => {
                let rt = GAS_CONSTANT_J_PER_MOL_K * self.temperature_k;
                self.affinity.finite().map(|over_rt| -over_rt * rt)
            }
            Figure::Approach => self.approach_k,
            Figure::MissingConversion => self.missing_conversion,
        }
    }
}

/// An input moved up and down by its standard uncertainty, and what the case then gives; none where
/// the moved case has no answer (a fraction below zero, a dew point above the pressure).
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Moved {
    /// With the input raised.
    pub up: Option<Judged>,
    /// With the input lowered.
    pub down: Option<Judged>,
}

/// What one input does to one figure.
#[derive(Debug, Clone, Copy, PartialEq, Default)]
pub struct Share {
    /// The change for +u: half of the difference between raised and lowered.
    pub change: f64,
    /// How far the middle of the two lies from the figure itself: zero where the figure is linear.
    pub bend: f64,
}

/// What all inputs together do to one figure.
#[derive(Debug, Clone, PartialEq)]
pub struct Budget {
    /// The standard uncertainty: √Σ(change² + 2 bend²).
    pub u: f64,
    /// One for each input, in their order.
    pub shares: Vec<Share>,
    /// Whether the bends hardly matter: with more than this the distribution is not normal, and an
    /// interval of ±2u is no longer one of 95 %.
    pub is_linear: bool,
}

/// The bends may be this share of the variance before a figure counts as not linear. For ln x, the
/// usual case, they are ½ (u/x)² of it, and u itself is then wrong by 5 % (100,000 draws).
const BEND_SHARE: f64 = 0.02;

/// Adds up what the inputs do to a figure; none if the figure is not finite, or if an input can be
/// moved neither way.
///
/// Each input is moved by ±u and the case run again: change = (f₊ − f₋)/2, bend = (f₊ + f₋)/2 − f,
/// u² = Σ (change² + 2 bend²), the inputs taken as independent. Where one way is closed the other
/// stands for both. Source: JCGM 100:2008, 5.1.2 and its note, which gives the second order:
/// ½ (∂²f/∂x²)² u⁴ = 2 bend² for a normal x.
#[must_use]
pub fn budget(figure: Figure, now: &Judged, moves: &[Moved]) -> Option<Budget> {
    let middle = now.figure(figure)?;
    let share = |moved: &Moved| {
        let at = |judged: Option<Judged>| judged.and_then(|judged| judged.figure(figure));
        match (at(moved.up), at(moved.down)) {
            (Some(up), Some(down)) => {
                Some(Share { change: (up - down) / 2.0, bend: (up + down) / 2.0 - middle })
            }
            // What happens on the closed side is not known; half the change is marked as bend.
            (Some(up), None) => Some(Share { change: up - middle, bend: (up - middle) / 2.0 }),
            (None, Some(down)) => {
                Some(Share { change: middle - down, bend: (down - middle) / 2.0 })
            }
            (None, None) => None,
        }
    };
    let shares: Vec<Share> = moves.iter().map(share).collect::<Option<_>>()?;
    let straight: f64 = shares.iter().map(|share| share.change * share.change).sum();
    let bent: f64 = shares.iter().map(|share| 2.0 * share.bend * share.bend).sum();
    let u = libm::sqrt(straight + bent);
    Some(Budget { u, shares, is_linear: bent <= BEND_SHARE * straight })
}

/// A 95 % interval; an end that is open is none.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Interval {
    /// The lower end; none where there is no lower bound.
    pub low: Option<f64>,
    /// The upper end; none where there is no upper bound.
    pub high: Option<f64>,
}

impl Interval {
    /// The value with twice its standard uncertainty to both sides.
    #[must_use]
    pub fn around(value: f64, u: f64) -> Interval {
        Interval { low: Some(value - 2.0 * u), high: Some(value + 2.0 * u) }
    }

    /// Whether all of it lies within `half_width` of zero.
    #[must_use]
    pub fn within(&self, half_width: f64) -> bool {
        match (self.low, self.high) {
            (Some(low), Some(high)) => low >= -half_width && high <= half_width,
            _ => false,
        }
    }

    /// Whether all of it lies above zero.
    #[must_use]
    pub fn is_positive(&self) -> bool {
        self.low.is_some_and(|low| low > 0.0)
    }

    /// Whether all of it lies below zero.
    #[must_use]
    pub fn is_negative(&self) -> bool {
        self.high.is_some_and(|high| high < 0.0)
    }

    /// Widened so far that it also holds what another evaluation gives, with the same u; an open
    /// end opens it.
    #[must_use]
    pub fn reaching(self, end: End, u: f64) -> Interval {
        let wide = |a: Option<f64>, b: f64, pick: fn(f64, f64) -> f64| a.map(|a| pick(a, b));
        match end {
            End::At(value) => Interval {
                low: wide(self.low, value - 2.0 * u, f64::min),
                high: wide(self.high, value + 2.0 * u, f64::max),
            },
            End::OpenAbove => Interval { high: None, ..self },
            End::OpenBelow => Interval { low: None, ..self },
            End::OpenBothWays => Interval { low: None, high: None },
        }
    }
}

/// Where a bound takes a figure when the bounded value goes to zero.
#[derive(Debug, Clone, Copy, PartialEq)]
pub enum End {
    /// To a finite value.
    At(f64),
    /// Beyond every value.
    OpenAbove,
    /// Below every value.
    OpenBelow,
    /// Nothing is known of it.
    OpenBothWays,
}

impl End {
    /// The end that an affinity stands for.
    #[must_use]
    pub fn of_affinity(affinity: Affinity) -> End {
        match affinity {
            Affinity::Finite(over_rt) => End::At(over_rt),
            Affinity::OpenForward => End::OpenAbove,
            Affinity::OpenReverse => End::OpenBelow,
            Affinity::Undetermined => End::OpenBothWays,
        }
    }
}

/// By what factor an input's tolerance must shrink so that ±2u of the whole is no more than
/// `needed`; none where the others alone are too much.
#[must_use]
pub fn tolerance_needed(budget: &Budget, input: usize, needed: f64) -> Option<f64> {
    let own = budget.shares.get(input)?.change;
    let others = budget.u * budget.u - own * own;
    let room = needed * needed / 4.0 - others.max(0.0);
    (room > 0.0 && own != 0.0).then(|| libm::sqrt(room) / own.abs())
}
