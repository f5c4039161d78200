//! Readings to amounts: wet from dry, fractions to moles, gauge to absolute.

mod closing;
mod condensed;
mod gas;
mod pressure;
mod reading;
mod saturation;
mod water;

pub use closing::Closing;
pub use condensed::{Held, pure_phases};
pub use gas::{AmountBasis, GasMixture, gas_mixture};
pub use pressure::absolute_pressure_pa;
pub use reading::{Around, Basis, Entry, GasReading, Stated, Water};
pub use saturation::water_saturation_pressure_pa;
