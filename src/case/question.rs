//! A case with all its texts read: what the run needs, in the rooms' own types.

use crate::mixture::{Entry, GasReading};
use crate::quantity::Quantity;
use crate::reaction::Equation;

/// What is held while the mixture comes to rest.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub(super) enum Held {
    Pressure,
    Volume,
}

/// What a number given for K is.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub(super) enum KindOfK {
    K,
    Kp,
    Kc,
    Kx,
    Log10K,
    LnK,
    PK,
    Gibbs,
}

/// K as a user states it.
#[derive(Debug, Clone)]
pub(super) struct StatedK {
    pub value: Quantity,
    pub kind: KindOfK,
    pub pressure_unit: Option<&'static str>,
    pub at: Option<Quantity>,
    pub enthalpy: Option<Quantity>,
    pub heat_capacity: Option<Quantity>,
}

/// Where K comes from.
#[derive(Debug, Clone)]
pub(super) enum KSource {
    Library,
    Value(Box<StatedK>),
    /// Numbers at several temperatures, which stand in `at` of each.
    Points(Vec<StatedK>),
}

/// What is asked of one reaction.
#[derive(Debug, Clone)]
pub(super) struct ReactionQuestion {
    pub equation: Equation,
    /// Whether the equation was balanced as it was written.
    pub already_balanced: bool,
    pub source: KSource,
    /// The equation that a stated K belongs to, if not this one.
    pub constant_for: Option<Equation>,
    pub approach_k: Option<f64>,
}

/// One question, read.
#[derive(Debug, Clone)]
pub(super) struct Question {
    pub reaction: ReactionQuestion,
    pub temperature: Quantity,
    pub pressure: Option<Quantity>,
    pub pressure_pa: Option<f64>,
    pub atmosphere_pa: f64,
    pub atmosphere_stated: bool,
    pub hold: Held,
    pub volume_m3: Option<f64>,
    pub gas: Option<GasReading>,
    /// The solids and the liquid, each its own phase.
    pub pure: Vec<Entry>,
    /// Whether a tolerance was stated anywhere.
    pub tolerances: bool,
}
