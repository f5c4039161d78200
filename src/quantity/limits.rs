//! The one table of allowed ranges: checks, messages and tests read it.

use super::measure::Measure;
use super::unit::PressureReference;

/// The allowed range of a measure, in SI, with a name and a reason.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Limit {
    /// What the range belongs to.
    pub measure: Measure,
    /// Set for gauge pressure, which has a range of its own.
    pub is_gauge: bool,
    /// The name in messages, without an article.
    pub name: &'static str,
    /// The lower end, SI.
    pub minimum_si: f64,
    /// Whether the lower end itself is allowed.
    pub includes_minimum: bool,
    /// The upper end, SI, which is allowed.
    pub maximum_si: f64,
    /// Why, as the end of a sentence.
    pub reason: &'static str,
}

impl Limit {
    /// Whether a value in SI is finite and inside the range.
    #[must_use]
    pub fn contains(&self, value_si: f64) -> bool {
        let above = if self.includes_minimum {
            value_si >= self.minimum_si
        } else {
            value_si > self.minimum_si
        };
        above && value_si <= self.maximum_si
    }
}

const fn above(measure: Measure, name: &'static str, maximum_si: f64, why: &'static str) -> Limit {
    Limit { includes_minimum: false, ..from(measure, name, 0.0, maximum_si, why) }
}

const fn from(
    measure: Measure,
    name: &'static str,
    minimum_si: f64,
    maximum_si: f64,
    reason: &'static str,
) -> Limit {
    Limit { measure, is_gauge: false, name, minimum_si, includes_minimum: true, maximum_si, reason }
}

const NOT_NEGATIVE: &str = "it cannot be negative, and more than this is no plant";

/// Every range, one for each measure and one for gauge pressure.
#[rustfmt::skip]
pub static LIMITS: [Limit; 20] = [
    above(Measure::Temperature, "temperature", 20_000.0, "0 K cannot be reached, and species data end at or below 20 000 K"),
    from(Measure::TemperatureDifference, "temperature difference", -20_000.0, 20_000.0, "temperatures end at 20 000 K"),
    above(Measure::Pressure, "absolute pressure", 1e9, "there is no pressure below vacuum, and 1 GPa is beyond any gas model here"),
    Limit { is_gauge: true, ..from(Measure::Pressure, "gauge pressure", -1.2e5, 1e9, "vacuum is at most one atmosphere below zero, and 1 GPa is beyond any gas model here") },
    from(Measure::Fraction, "fraction", 0.0, 1.0, "a part is between nothing and the whole"),
    from(Measure::Ratio, "ratio", 0.0, 1e6, "it cannot be negative, and above a million the other part is a trace"),
    from(Measure::Amount, "amount of substance", 0.0, 1e15, NOT_NEGATIVE),
    from(Measure::AmountRate, "amount per time", 0.0, 1e12, NOT_NEGATIVE),
    from(Measure::Mass, "mass", 0.0, 1e15, NOT_NEGATIVE),
    from(Measure::MassRate, "mass per time", 0.0, 1e12, NOT_NEGATIVE),
    above(Measure::Volume, "volume", 1e12, "nothing fits into no volume, and more than this is no plant"),
    from(Measure::Length, "length", -12_000.0, 100_000.0, "a height above sea level lies between the deepest mine and the edge of the atmosphere"),
    from(Measure::MolarEnergy, "energy per amount", -1e9, 1e9, "chemical bonds hold less than 1 GJ/mol"),
    from(Measure::MolarHeatCapacity, "molar heat capacity", -1e6, 1e6, "molecules and changes of reaction stay far below 1 MJ/(mol·K)"),
    from(Measure::Concentration, "amount per volume", 0.0, 1e6, "it cannot be negative, and no liquid holds 1000 mol/L"),
    from(Measure::Molality, "amount per mass of solvent", 0.0, 1e4, "it cannot be negative, and above 10 000 mol/kg the solvent is a trace"),
    from(Measure::MassConcentration, "mass per volume", 0.0, 1e5, "it cannot be negative, and no substance holds 100 000 kg/m³"),
    from(Measure::MassPerAmount, "mass per amount of gas", 0.0, 10.0, "it cannot be negative, and no gas weighs 10 kg/mol"),
    from(Measure::Ph, "pH", -2.0, 16.0, "strong acids and bases in water end there"),
    from(Measure::Number, "number", f64::MIN, f64::MAX, "it must fit in a double"),
];

/// The range of a measure; gauge pressure has its own.
///
/// ```
/// use shiftgauge::quantity::{Measure, PressureReference, limit};
/// let temperature = limit(Measure::Temperature, PressureReference::Unstated);
/// assert!(!temperature.contains(0.0) && temperature.contains(20_000.0));
/// ```
#[must_use]
pub fn limit(measure: Measure, reference: PressureReference) -> &'static Limit {
    let gauge = measure == Measure::Pressure && reference == PressureReference::Gauge;
    let found = LIMITS.iter().find(|row| row.measure == measure && row.is_gauge == gauge);
    found.unwrap_or(&LIMITS[LIMITS.len() - 1])
}
