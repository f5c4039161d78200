//! What a reading states, one block a phase, still as the instruments give it.

use crate::quantity::Quantity;
use crate::reaction::Species;

/// One line of a block: a species and what is stated of it.
#[derive(Debug, Clone)]
pub struct Entry {
    /// The species, its phase left out or that of the block.
    pub species: Species,
    /// What is stated.
    pub stated: Stated,
    /// Another species that the instrument counts with this one.
    pub includes: Option<Species>,
    /// The path of the entry's value, for problems.
    pub field: String,
}

/// What is stated of a species.
#[derive(Debug, Clone)]
pub enum Stated {
    /// A number with its unit.
    Quantity(Quantity),
    /// What is missing from one.
    Remainder,
    /// Found from K and the others: a fraction of the gas as analysed, or an amount like those of the
    /// other lines.
    Missing {
        /// The value that is tried.
        value: f64,
    },
    /// A pure phase that is there, in ample amount.
    Present,
    /// A pure phase that is not there.
    Absent,
}

/// How the water of a dry analysis is known.
#[derive(Debug, Clone)]
pub enum Water {
    /// Nothing is stated: the gas is taken as free of water.
    None,
    /// Found from the feed by the balance of the elements.
    FromFeed,
    /// The fraction of water in the wet gas.
    Fraction(Quantity),
    /// Water for each unit of dry gas, by amount.
    PerDry(Quantity),
    /// The dew point, at a pressure of its own or at that of the case.
    DewPoint {
        /// The dew point.
        temperature: Quantity,
        /// The pressure where the dew point was read, if not the case's.
        pressure: Option<Quantity>,
    },
}

/// What a gas analysis refers to.
#[derive(Debug, Clone)]
pub enum Basis {
    /// The gas as it is in the bed.
    Wet,
    /// The gas without its water, which is stated apart.
    Dry(Water),
}

/// The gas block.
#[derive(Debug, Clone)]
pub struct GasReading {
    /// What the analysis refers to.
    pub basis: Basis,
    /// Its lines.
    pub entries: Vec<Entry>,
    /// What the sample lost when it was cooled.
    pub lost: Vec<Species>,
    /// The entry that takes what is missing from one, whatever that is; without it the entry
    /// stated as remainder does, else the largest, if the sum is one within tolerance.
    pub closed_by: Option<usize>,
}

/// What a gas analysis is laid beside.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Around {
    /// The absolute pressure of the gas, where it is known.
    pub pressure_pa: Option<f64>,
    /// The atmosphere that gauge readings count from.
    pub atmosphere_pa: f64,
}
