//! Readings to amounts: wet from dry, fractions to moles, gauge to absolute.

mod closing;
mod condensed;
mod element_balance;
mod gas;
mod gas_form;
mod pressure;
mod reading;
mod saturation;
mod water;

pub use closing::Closing;
pub use condensed::{Held, pure_phases};
pub use element_balance::{ElementBalance, ElementRow, Feed};
pub use gas::{AmountBasis, GasMixture, gas_mixture};
pub use pressure::absolute_pressure_pa;
pub use reading::{Around, Basis, Entry, GasReading, Stated, Water};
pub use saturation::water_saturation_pressure_pa;
