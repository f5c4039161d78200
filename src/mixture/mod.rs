//! Readings to amounts: wet from dry, fractions to moles, gauge to absolute.

mod closing;
mod condensed;
mod density;
mod element_balance;
mod gas;
mod gas_form;
mod liquid;
mod pressure;
mod reading;
mod saturation;
mod solution;
mod water;

pub use closing::Closing;
pub use condensed::{Held, pure_phases};
pub use density::water_density_kg_per_m3;
pub use element_balance::{ElementBalance, ElementRow, Feed};
pub use gas::{AmountBasis, GasMixture, gas_mixture};
pub use liquid::{LiquidMixture, liquid_mixture};
pub use pressure::absolute_pressure_pa;
pub use reading::{Around, Basis, Entry, GasReading, Stated, Water};
pub use saturation::water_saturation_pressure_pa;
pub use solution::{Solution, SolutionReading, solution};
