//! Sentences: species.

use crate::problem::LibraryCode as C;

pub(super) fn template(code: C) -> (&'static str, &'static str) {
    match code {
        C::Unknown => {
            ("The library has no species {found}.", "Check the formula, or give K yourself.")
        }
    }
}
