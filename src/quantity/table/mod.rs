//! The one table of units, in a few files; every row says where its factor comes from.

mod amount;
mod composition;
mod energy;
mod rate;
mod state;

use super::unit::Unit;

/// The SI itself: definitions, prefixes and the units accepted with it.
const SI: &str = "SI Brochure, 9th edition (2019)";
/// Conversion factors of non-SI units, exact unless the row says otherwise.
const SP811: &str = "NIST SP 811 (2008), appendix B.8";
/// Fractions, ppm and pH as physical chemistry names them.
const ISO80000: &str = "ISO 80000-9:2019";

/// Every unit this version knows, in the order they are offered.
///
/// ```
/// use shiftgauge::quantity::all_units;
/// let bar = all_units().find(|unit| unit.symbol == "bar").unwrap();
/// assert_eq!(bar.to_si(1.0), 1e5);
/// ```
pub fn all_units() -> impl Iterator<Item = &'static Unit> {
    [
        state::UNITS,
        composition::UNITS,
        amount::UNITS,
        rate::UNITS,
        energy::MOLAR_ENERGY,
        energy::MOLAR_HEAT_CAPACITY,
    ]
    .into_iter()
    .flatten()
}
