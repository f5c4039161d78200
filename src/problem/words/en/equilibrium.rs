//! Sentences: the bare calls.

use crate::problem::EquilibriumCode as C;

pub(super) fn template(code: C) -> (&'static str, &'static str) {
    match code {
        C::Shape => ("{found}", "{hint}"),
    }
}
