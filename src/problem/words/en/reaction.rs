//! Sentences: formulas and equations.

use crate::problem::ReactionCode as C;

pub(super) fn template(code: C) -> (&'static str, &'static str) {
    match code {
        C::Empty => ("No equation is written.", "Write one such as CO + H2O = CO2 + H2."),
    }
}
