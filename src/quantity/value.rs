//! A quantity as read.

use super::measure::Measure;
use super::number::Written;
use super::preset::Preset;
use super::unit::{FractionBasis, PressureReference, Unit};

/// How a tolerance was written, so that it can be shown back.
#[derive(Debug, Clone, Copy, PartialEq)]
pub enum Tolerance {
    /// In the value's own unit: `215 ± 2 °C`.
    OwnUnit(Written),
    /// In another unit of the same measure: `27.4 bar ± 20 mbar`.
    OtherUnit(Written, &'static Unit),
    /// In per cent of the value: `0.42 ± 2 % rel`.
    Relative(Written),
    /// By the class of the instrument: `450 °C ± type K class 2`.
    Preset(&'static Preset),
}

/// A number with its unit, in SI, with what is needed to show it as it was typed.
///
/// All numbers are finite. Gauge pressure stays gauge here: the atmosphere is added where it is
/// known.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Quantity {
    /// The value in the SI unit of its measure; for a bound, the bound.
    pub value_si: f64,
    /// The standard uncertainty in SI: half of the stated 95 % half-width, or the limit of a class
    /// over √3; none if none was stated.
    pub standard_uncertainty_si: Option<f64>,
    /// Whether `< x` was written: the value lies between zero and x.
    pub is_bound: bool,
    /// What it measures: one of the measures that were allowed.
    pub measure: Measure,
    /// The unit as typed.
    pub unit: &'static Unit,
    /// Gauge or absolute, where a pressure said so.
    pub pressure_reference: PressureReference,
    /// What a fraction is a part of, where it said so.
    pub fraction_basis: FractionBasis,
    /// How the number was written.
    pub written: Written,
    /// How the tolerance was written.
    pub tolerance: Option<Tolerance>,
}
