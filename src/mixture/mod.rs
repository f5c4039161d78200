//! Readings to amounts: wet from dry, fractions to moles, gauge to absolute; activities in solution.

mod closing;
mod condensed;
mod davies;
mod density;
mod dielectric;
mod element_balance;
mod gas;
mod gas_form;
mod ion_size;
mod liquid;
mod pressure;
mod reading;
mod saturation;
mod solution;
mod water;

pub use closing::Closing;
pub use condensed::{Held, pure_phases};
pub use davies::{ChargeBalance, Ion, SolutionLaw, SolutionModel};
pub use davies::{IONIC_STRENGTH_HELD_MOL_PER_KG, SOLUTION_RANGE_K};
pub use davies::{charge_balance, ionic_strength_mol_per_kg};
pub use density::water_density_kg_per_m3;
pub use dielectric::{DebyeHueckel, debye_hueckel, water_permittivity};
pub use element_balance::{ElementBalance, ElementRow, Feed};
pub use gas::{AmountBasis, GasMixture, gas_mixture};
pub use ion_size::ion_size_pm;
pub use liquid::{LiquidMixture, liquid_mixture};
pub use pressure::absolute_pressure_pa;
pub use reading::{Around, Basis, Entry, GasReading, Stated, Water};
pub use saturation::water_saturation_pressure_pa;
pub use solution::{Solution, SolutionReading, solution};
