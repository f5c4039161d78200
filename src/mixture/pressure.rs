//! Gauge and absolute.

use crate::problem::{MixtureCode, Problem};
use crate::quantity::{PressureReference, Quantity};

/// Gives the absolute pressure in pascal: a gauge reading plus the atmosphere, anything else as it
/// is written.
///
/// # Errors
/// A gauge reading so far below zero that nothing is left of the atmosphere.
pub fn absolute_pressure_pa(pressure: &Quantity, atmosphere_pa: f64) -> Result<f64, Problem> {
    if pressure.pressure_reference != PressureReference::Gauge {
        return Ok(pressure.value_si);
    }
    let absolute_pa = pressure.value_si + atmosphere_pa;
    if absolute_pa > 0.0 { Ok(absolute_pa) } else { Err(Problem::new(MixtureCode::VacuumTooDeep)) }
}
