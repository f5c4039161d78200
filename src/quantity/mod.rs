//! Text to SI and back.

mod constants;

pub use constants::{
    GAS_CONSTANT_J_PER_MOL_K, STANDARD_CONCENTRATION_MOL_PER_M3, STANDARD_PRESSURE_PA,
};
