//! What a unit is: a symbol, the names it is read by, and its exact relation to the SI.

use super::measure::Measure;

/// Whether a pressure was written as gauge or absolute.
#[derive(Debug, Clone, Copy, PartialEq, Eq, Hash, Default)]
pub enum PressureReference {
    /// Neither was written.
    #[default]
    Unstated,
    /// `bar(g)`, `barg`, `psig`: above the local atmosphere.
    Gauge,
    /// `bar(a)`, `bara`, `psia`: above vacuum.
    Absolute,
}

impl PressureReference {
    /// What stands after the unit: `(g)`, `(a)` or nothing.
    #[must_use]
    pub fn suffix(self) -> &'static str {
        match self {
            PressureReference::Unstated => "",
            PressureReference::Gauge => "(g)",
            PressureReference::Absolute => "(a)",
        }
    }
}

/// What a fraction is a part of.
#[derive(Debug, Clone, Copy, PartialEq, Eq, Hash, Default)]
pub enum FractionBasis {
    /// Not written: a bare `%`, `ppm` or number.
    #[default]
    Unstated,
    /// `mol %`: of the amount of substance.
    Amount,
    /// `vol %`, `ppmv`: of the volume.
    Volume,
    /// `wt %`: of the mass.
    Mass,
}

/// One unit: `value_si = (value + zero_offset) × numerator / denominator`.
///
/// The factor is kept as a quotient of two numbers that are themselves exact, or as near as a
/// double gets, so that `0.42 %` is 0.42/100 and not 0.42 × 0.01.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Unit {
    /// The symbol as shown; empty for a plain number.
    pub symbol: &'static str,
    /// Other ways to write it.
    pub aliases: &'static [&'static str],
    /// What it measures.
    pub measure: Measure,
    /// The factor to SI, over `denominator`.
    pub numerator: f64,
    /// See `numerator`.
    pub denominator: f64,
    /// Added to the value before the factor: 273.15 for °C, 459.67 for °F, otherwise 0.
    pub zero_offset: f64,
    /// What a fraction is a part of; `Unstated` for everything else.
    pub fraction_basis: FractionBasis,
    /// Whether the factor is exact by definition; otherwise it rests on the convention in `source`.
    pub is_exact: bool,
    /// Where the factor is published.
    pub source: &'static str,
}

impl Unit {
    /// A value in this unit, in SI.
    ///
    /// ```
    /// use shiftgauge::quantity::{Measure, parse_unit};
    /// let (fahrenheit, _) = parse_unit("degF", &[Measure::Temperature]).unwrap();
    /// assert!((fahrenheit.to_si(212.0) - 373.15).abs() < 1e-12);
    /// ```
    #[must_use]
    pub fn to_si(&self, value: f64) -> f64 {
        self.difference_to_si(value + self.zero_offset)
    }

    /// An SI value in this unit.
    #[must_use]
    pub fn from_si(&self, value_si: f64) -> f64 {
        self.difference_from_si(value_si) - self.zero_offset
    }

    /// A difference of two values in this unit (such as a tolerance), in SI: no offset.
    #[must_use]
    pub fn difference_to_si(&self, difference: f64) -> f64 {
        // an intermediate product may overflow where the result does not
        if difference.abs() > 1e290 {
            return difference / self.denominator * self.numerator;
        }
        difference * self.numerator / self.denominator
    }

    /// An SI difference in this unit.
    #[must_use]
    pub fn difference_from_si(&self, difference_si: f64) -> f64 {
        if difference_si.abs() > 1e290 {
            return difference_si / self.numerator * self.denominator;
        }
        difference_si * self.denominator / self.numerator
    }

    /// A table row; the `with_…` functions fill in what is rare.
    pub(super) const fn row(
        measure: Measure,
        symbol: &'static str,
        aliases: &'static [&'static str],
        factor: (f64, f64),
        source: &'static str,
    ) -> Unit {
        // kJ/kmol is 1000/1000: without the reduction it would round twice for nothing
        let factor = if factor.0 == factor.1 { (1.0, 1.0) } else { factor };
        Unit {
            symbol,
            aliases,
            measure,
            numerator: factor.0,
            denominator: factor.1,
            zero_offset: 0.0,
            fraction_basis: FractionBasis::Unstated,
            is_exact: true,
            source,
        }
    }

    pub(super) const fn with_zero(mut self, zero_offset: f64) -> Unit {
        self.zero_offset = zero_offset;
        self
    }

    pub(super) const fn with_basis(mut self, basis: FractionBasis) -> Unit {
        self.fraction_basis = basis;
        self
    }

    pub(super) const fn by_convention(mut self) -> Unit {
        self.is_exact = false;
        self
    }
}
