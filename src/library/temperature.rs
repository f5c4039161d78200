//! A temperature that every property can be evaluated at, with its logarithm.

use crate::problem::LibraryCode;
use crate::problem::Outcome;
use crate::problem::Problem;

/// The lowest and the highest temperature, in K, that a property is given for.
///
/// The limits are wide: they keep extrapolation finite and are no statement about validity, which
/// [`Reach`](super::Reach) makes for each species.
pub const TEMPERATURE_LIMITS_K: (f64, f64) = (1.0, 20_000.0);

/// A finite temperature within [`TEMPERATURE_LIMITS_K`], with ln(T/K) and 1/T worked out once.
///
/// ```
/// use shiftgauge::library::Temperature;
/// let t = Temperature::new(700.0).unwrap();
/// assert_eq!(t.kelvin(), 700.0);
/// assert!(Temperature::new(0.0).is_err() && Temperature::new(f64::NAN).is_err());
/// ```
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Temperature {
    kelvin: f64,
    ln: f64,
    reciprocal: f64,
}

impl Temperature {
    /// The standard reference temperature, 298.15 K (25 °C), exact.
    #[must_use]
    pub fn standard() -> Self {
        Self::of(298.15)
    }

    /// Takes a temperature in K.
    ///
    /// # Errors
    /// `species-temperature` unless 1 K ≤ T ≤ 20,000 K.
    pub fn new(kelvin: f64) -> Outcome<Self> {
        let (low, high) = TEMPERATURE_LIMITS_K;
        if kelvin >= low && kelvin <= high {
            return Ok(Self::of(kelvin));
        }
        Err(Problem::new(LibraryCode::Temperature)
            .with("found", format!("{kelvin}"))
            .with("low", format!("{low}"))
            .with("high", format!("{high}"))
            .into())
    }

    fn of(kelvin: f64) -> Self {
        Self { kelvin, ln: libm::log(kelvin), reciprocal: 1.0 / kelvin }
    }

    /// T in K.
    #[must_use]
    pub fn kelvin(self) -> f64 {
        self.kelvin
    }

    /// ln(T/K).
    #[must_use]
    pub fn ln_kelvin(self) -> f64 {
        self.ln
    }

    /// 1/T in 1/K.
    #[must_use]
    pub fn reciprocal(self) -> f64 {
        self.reciprocal
    }
}
