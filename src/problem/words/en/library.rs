//! Sentences: species.

use crate::problem::LibraryCode as C;

pub(super) fn template(code: C) -> (&'static str, &'static str) {
    match code {
        C::Unknown => {
            ("The library has no species {found}.", "Check the formula, or give K yourself.")
        }
        C::UnknownNear => (
            "The library has no species {found}; near it is {near}.",
            "Write the one that is meant, or give K yourself.",
        ),
        C::PhaseUnknown => (
            "The library has no {found}; it has {known}.",
            "Write the phase or form that the library has, or give K yourself.",
        ),
        C::Several => {
            ("{found} may be any of {known}.", "Write the phase, and the form where there are two.")
        }
        C::Temperature => (
            "Properties are given between {low} K and {high} K, not at {found} K.",
            "Check the temperature and its unit.",
        ),
        C::Coefficient => (
            "The stoichiometric number of {species} is {found}; it may be up to {limit}.",
            "Divide the whole equation by a common factor.",
        ),
    }
}
