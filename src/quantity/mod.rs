//! Text to SI and back: numbers with a unit, a tolerance and the digits they were typed with.
//!
//! [`parse`] reads `27.4 ± 0.2 bar(g)`; [`show`], [`show_like`] and [`show_in`] write. Inside the
//! program every number is in SI; units live in this room only. Two tables hold what is allowed:
//! [`all_units`] and [`LIMITS`].

mod constants;
mod display;
mod find;
mod grouping;
mod layout;
mod limits;
mod measure;
mod number;
mod parse;
mod pieces;
mod preset;
mod read_unit;
mod show;
mod symbol;
mod table;
mod unit;
mod value;

pub use constants::{
    GAS_CONSTANT_J_PER_MOL_K, NORMAL_PRESSURE_PA, NORMAL_TEMPERATURE_K, STANDARD_ATMOSPHERE_PA,
    STANDARD_CONCENTRATION_MOL_PER_M3, STANDARD_CUBIC_FOOT_PRESSURE_PA,
    STANDARD_CUBIC_FOOT_TEMPERATURE_K, STANDARD_CUBIC_METRE_TEMPERATURE_K, STANDARD_PRESSURE_PA,
    ZERO_CELSIUS_K,
};
pub use display::{Units, difference_unit, display_unit};
pub use layout::{show_log10, show_number};
pub use limits::{LIMITS, Limit, limit};
pub use measure::Measure;
pub use number::{Number, Written, read_number};
pub use parse::parse;
pub use preset::{Preset, preset};
pub use read_unit::parse_unit;
pub use show::{show, show_in, show_like, show_pair, show_with_uncertainty};
pub use table::all_units;
pub use unit::{FractionBasis, PressureReference, Unit};
pub use value::{Quantity, Tolerance};
