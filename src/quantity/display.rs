//! Which unit a number is shown in.

use super::measure::Measure;
use super::table::all_units;
use super::unit::{FractionBasis, Unit};

/// The system of units that results are shown in.
#[derive(Debug, Clone, Copy, PartialEq, Eq, Default)]
pub enum Units {
    /// The unit that was typed; metric where nothing was.
    #[default]
    AsTyped,
    /// Coherent SI units: K, Pa, mol.
    Si,
    /// Metric units of the plant: °C, bar, kmol.
    Metric,
    /// Customary units of the United States: °F, psi, lbmol.
    Us,
}

impl Units {
    /// Every system, in the order they are listed to the user.
    pub const ALL: [Units; 4] = [Units::AsTyped, Units::Si, Units::Metric, Units::Us];

    /// The name at the border: `as typed`, `SI`, `metric` or `US`.
    #[must_use]
    pub fn as_str(self) -> &'static str {
        match self {
            Units::AsTyped => "as typed",
            Units::Si => "SI",
            Units::Metric => "metric",
            Units::Us => "US",
        }
    }

    /// Reads the name at the border; anything else is no system.
    #[must_use]
    pub fn from_name(name: &str) -> Option<Units> {
        Units::ALL.into_iter().find(|units| units.as_str() == name)
    }
}

/// The unit that a measure is shown in.
///
/// A fraction typed in a unit keeps that unit in the metric and US systems, so that `ppm` stays
/// `ppm` and `wt %` never turns into another kind of per cent.
///
/// ```
/// use shiftgauge::quantity::{Measure, Units, display_unit};
/// assert_eq!(display_unit(Measure::Pressure, Units::Us, None).symbol, "psi");
/// ```
#[must_use]
pub fn display_unit(
    measure: Measure,
    units: Units,
    typed_unit: Option<&'static Unit>,
) -> &'static Unit {
    let typed = typed_unit.filter(|unit| unit.measure == measure);
    let keeps = units == Units::AsTyped || (measure == Measure::Fraction && units != Units::Si);
    if let Some(unit) = typed.filter(|_| keeps) {
        return unit;
    }
    let [si, metric, us] =
        symbols(measure, typed.map_or(FractionBasis::Unstated, |unit| unit.fraction_basis));
    let symbol = match units {
        Units::Si => si,
        Units::Metric | Units::AsTyped => metric,
        Units::Us => us,
    };
    named(measure, symbol)
}

/// The unit that shows a difference of two values in a unit: itself, but for temperatures without
/// the offset.
#[must_use]
pub fn difference_unit(unit: &'static Unit) -> &'static Unit {
    match unit.measure {
        Measure::Temperature => named(Measure::TemperatureDifference, unit.symbol),
        _ => unit,
    }
}

fn named(measure: Measure, symbol: &str) -> &'static Unit {
    // a test holds that every symbol below is in the table
    let found = all_units().find(|unit| unit.measure == measure && unit.symbol == symbol);
    found.unwrap_or(&PLAIN)
}

static PLAIN: Unit = Unit::row(Measure::Number, "", &[], (1.0, 1.0), "a plain number");

/// SI, metric, US.
fn symbols(measure: Measure, basis: FractionBasis) -> [&'static str; 3] {
    match measure {
        Measure::Temperature => ["K", "°C", "°F"],
        Measure::TemperatureDifference => ["K", "K", "°F"],
        Measure::Pressure => ["Pa", "bar", "psi"],
        Measure::Fraction => match basis {
            FractionBasis::Amount => ["mol/mol", "mol %", "mol %"],
            FractionBasis::Mass => ["kg/kg", "wt %", "wt %"],
            FractionBasis::Volume => ["", "vol %", "vol %"],
            FractionBasis::Unstated => ["", "%", "%"],
        },
        Measure::Ratio | Measure::Number => [""; 3],
        Measure::Amount => ["mol", "kmol", "lbmol"],
        Measure::AmountRate => ["mol/s", "kmol/h", "lbmol/h"],
        Measure::Mass => ["kg", "kg", "lb"],
        Measure::MassRate => ["kg/s", "kg/h", "lb/h"],
        Measure::Volume => ["m³", "m³", "ft³"],
        Measure::Length => ["m", "m", "ft"],
        Measure::MolarEnergy => ["J/mol", "kJ/mol", "Btu/lbmol"],
        Measure::MolarHeatCapacity => ["J/(mol·K)", "J/(mol·K)", "Btu/(lbmol·°F)"],
        Measure::Concentration => ["mol/m³", "mol/L", "mol/L"],
        Measure::Molality => ["mol/kg"; 3],
        Measure::MassConcentration => ["kg/m³", "g/L", "g/L"],
        Measure::MassPerAmount => ["kg/mol", "mg/Nm³", "mg/Nm³"],
        Measure::Ph => ["pH"; 3],
    }
}
