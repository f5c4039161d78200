//! The ranges of numbers that are worked with; wide enough for any plant, narrow enough that no
//! step of a calculation leaves the range of a double.

use crate::problem::EquilibriumCode;
use crate::problem::Outcome;
use crate::problem::Problem;

/// The smallest stoichiometric number other than zero, without sign.
pub const NU_MIN: f64 = 1e-3;

/// The largest stoichiometric number, without sign.
pub const NU_MAX: f64 = 1e3;

/// The largest amount of a species in mol; the smallest is zero.
pub const AMOUNT_MAX_MOL: f64 = 1e300;

/// The largest ln K, without sign: K from 1e−43429 to 1e43429.
pub const LN_K_MAX: f64 = 1e5;

/// The largest charge of a solute, without sign.
pub const CHARGE_MAX: i32 = 9;

/// The smallest size of an ion in pm.
pub const ION_SIZE_MIN_PM: f64 = 10.0;

/// The largest size of an ion in pm.
pub const ION_SIZE_MAX_PM: f64 = 10_000.0;

/// The most species of one problem.
pub const SPECIES_MAX: usize = 1000;

/// Finds whether ln K can be worked with.
///
/// # Errors
/// `number-not-finite`, or `ln-k-out-of-range` unless |ln K| ≤ [`LN_K_MAX`].
pub(super) fn check_ln_k(ln_k: f64) -> Outcome<()> {
    if ln_k.abs() <= LN_K_MAX {
        return Ok(());
    }
    let problem = if ln_k.is_finite() {
        Problem::new(EquilibriumCode::LnKOutOfRange)
            .with("found", format!("{ln_k:?}"))
            .with("most", format!("{LN_K_MAX:?}"))
    } else {
        Problem::new(EquilibriumCode::NotFinite)
    };
    Err(problem.at("ln_k").into())
}
