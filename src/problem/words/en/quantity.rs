//! Sentences: numbers, units and tolerances.

use crate::problem::QuantityCode as C;

pub(super) fn template(code: C) -> (&'static str, &'static str) {
    match code {
        C::Empty => ("Nothing is written here.", "Write a number with its unit, such as 215 °C."),
    }
}
