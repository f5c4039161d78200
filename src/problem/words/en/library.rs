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
        C::OwnTooFew => (
            "A record needs two of ΔfH°, S° and ΔfG° at 298.15 K.",
            "Give one more; ΔfH° and S° are the usual two.",
        ),
        C::OwnDisagree => (
            "ΔfG° is given as {found} kJ/mol, but ΔfH° and S° make it {follows} kJ/mol; they may differ \
             by {limit} kJ/mol.",
            "Check the three for sign and unit, or leave out the one that is known least.",
        ),
        C::OwnElement => (
            "ΔfG° cannot be turned into ΔfH°: the library has no reference state of {element}.",
            "Give ΔfH° and S° instead.",
        ),
        C::OwnEntropy => (
            "S° at 298.15 K comes to {found} J/(mol K); by the third law it is above zero for all but \
             dissolved species.",
            "Check S°, or ΔfH° and ΔfG°, for sign and unit.",
        ),
        C::OwnHeatMissing => (
            "A record needs C°p over a range of temperature.",
            "Give one value of C°p with its range if no more is known.",
        ),
        C::OwnHeat => (
            "C°p is {found} J/(mol K) at {temperature} K; it is above zero for all but dissolved species.",
            "Check the signs and powers of ten of the terms, or narrow the range.",
        ),
        C::OwnRange => (
            "A range of C°p goes from a lower to a higher temperature between 1 K and 20 000 K.",
            "Write the lower temperature first.",
        ),
        C::OwnGap => (
            "This range of C°p starts at {found} K, where the one before ends at {wanted} K.",
            "Let each range start where the one before it ends.",
        ),
        C::OwnJump => (
            "C°p goes from {below} to {above} J/(mol K) at {temperature} K without a transition; up to \
             {limit} % is allowed.",
            "Check the terms of both ranges, or give the enthalpy of the transition.",
        ),
        C::OwnStandard => (
            "The ranges of C°p do not hold 298.15 K, where ΔfH° and S° are given.",
            "Let the lowest range reach down to 298.15 K.",
        ),
    }
}
