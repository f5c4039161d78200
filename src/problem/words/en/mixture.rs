//! Sentences: readings as a whole.

use crate::problem::MixtureCode as C;

pub(super) fn template(code: C) -> (&'static str, &'static str) {
    match code {
        C::Empty => ("The reading has no entries.", "Enter at least one species."),
    }
}
