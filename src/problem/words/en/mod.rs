//! English: for each code, what was found and allowed, and one thing to try.

mod case;
mod constant;
mod equilibrium;
mod library;
mod mixture;
mod note;
mod quantity;
mod reaction;
mod step;
mod target;
mod verdict;
mod why;

pub(super) use note::template as note;
pub(super) use step::template as step;
pub(super) use target::template as target;
pub(super) use verdict::{input, verdict};
pub(super) use why::template as why;
pub(super) use why::turn;

use super::super::Code;

/// The message and the hint of a code, with `{name}` where an argument goes.
pub(super) fn template(code: Code) -> (&'static str, &'static str) {
    match code {
        Code::Quantity(code) => quantity::template(code),
        Code::Reaction(code) => reaction::template(code),
        Code::Library(code) => library::template(code),
        Code::Constant(code) => constant::template(code),
        Code::Mixture(code) => mixture::template(code),
        Code::Equilibrium(code) => equilibrium::template(code),
        Code::Case(code) => case::template(code),
    }
}
