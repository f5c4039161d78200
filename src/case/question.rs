//! A case with all its texts read: what the run needs, in the rooms' own types.

use std::rc::Rc;

use crate::advice::Band;
use crate::constant::FormulaTerm;
use crate::library::Book;
use crate::mixture::{
    Around, Entry, GasReading, SolutionModel, SolutionReading, absolute_pressure_pa,
};
use crate::quantity::{Quantity, STANDARD_ATMOSPHERE_PA};
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

/// A formula in T as a user states it.
#[derive(Debug, Clone)]
pub(super) struct StatedFormula {
    /// The coefficients as written, of ln K or of log10 K.
    pub terms: Vec<(f64, FormulaTerm)>,
    /// Whether they are of log10 K.
    pub is_log10: bool,
    /// The unit of the Kp that they give; none where they give K itself.
    pub pressure_unit: Option<&'static str>,
    pub range_k: Option<(f64, f64)>,
    /// The 95 % half-width of what the formula gives.
    pub tolerance: Option<f64>,
}

/// Where K comes from.
#[derive(Debug, Clone)]
pub(super) enum KSource {
    /// The library; whether measured equilibria may stand in for species' own records.
    Library {
        measured: bool,
    },
    /// The constant of this reaction in the user's own book.
    Book,
    Value(Box<StatedK>),
    /// Numbers at several temperatures, which stand in `at` of each.
    Points(Vec<StatedK>),
    /// A formula in T.
    Formula(StatedFormula),
    /// The reading itself, taken as at equilibrium, with an enthalpy where one is stated.
    Reading(Option<Quantity>),
}

/// A reaction's K that a user keeps.
#[derive(Debug, Clone)]
pub(super) struct OwnConstant {
    /// The equation that it belongs to.
    pub equation: Equation,
    /// A value, points or a formula.
    pub constant: KSource,
    /// Where it comes from, in words.
    pub source: String,
}

/// What a user keeps of their own.
#[derive(Debug, Clone, Default)]
pub(super) struct OwnBook {
    /// The library with their own species before the tables'.
    pub library: Book,
    pub constants: Vec<OwnConstant>,
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
    pub atmosphere: Option<Quantity>,
    pub hold: Held,
    pub volume: Option<Quantity>,
    /// How near to rest counts as at rest, where the case says.
    pub band: Option<Band>,
    pub gas: Option<GasReading>,
    /// The gas that went in.
    pub feed: Option<GasReading>,
    /// A liquid of several components.
    pub liquid: Option<LiquidReading>,
    /// A solution in water.
    pub solution: Option<SolutionReading>,
    /// How activities in the solution are found.
    pub solution_model: SolutionModel,
    /// The solids and the liquid, each its own phase.
    pub pure: Vec<Entry>,
    /// The user's own species and constants.
    pub book: Rc<OwnBook>,
}

/// A liquid mixture as read.
#[derive(Debug, Clone)]
pub(super) struct LiquidReading {
    pub entries: Vec<Entry>,
    /// The entry that takes what is missing from one, once that is known.
    pub closed_by: Option<usize>,
}

impl Question {
    /// Whether anything is read.
    pub fn has_reading(&self) -> bool {
        self.gas.is_some()
            || self.liquid.is_some()
            || self.solution.is_some()
            || !self.pure.is_empty()
    }

    /// The atmosphere: as stated, else the standard one.
    pub fn atmosphere_pa(&self) -> f64 {
        self.atmosphere.map_or(STANDARD_ATMOSPHERE_PA, |atmosphere| atmosphere.value_si)
    }

    /// The absolute pressure, where one is stated (and anything is left of it).
    pub fn pressure_pa(&self) -> Option<f64> {
        absolute_pressure_pa(self.pressure.as_ref()?, self.atmosphere_pa()).ok()
    }

    /// The volume, where one is stated.
    pub fn volume_m3(&self) -> Option<f64> {
        self.volume.map(|volume| volume.value_si)
    }

    /// What a gas analysis is laid beside.
    pub fn around(&self) -> Around {
        Around { pressure_pa: self.pressure_pa(), atmosphere_pa: self.atmosphere_pa() }
    }
}
