//! Q, affinities and rest.
//!
//! Two questions are answered here, and every other number of the program is a loop over them:
//! how far a state is from rest ([`affinity`]: ln K − ln Q), and which state is at rest
//! ([`rest`]: the amounts once the reaction has stopped, at the same temperature and the same
//! pressure or volume). One reaction, ideal gases, ideal solutes and pure phases.
//!
//! | file | what it holds |
//! | --- | --- |
//! | `limits` | the ranges of numbers that are worked with |
//! | `system` | kinds of species and one reaction among them |
//! | `state` | temperature, hold, amounts |
//! | `quotient` | Q and the affinity, with names for their open ends |
//! | `walls` | how far the reaction can run each way |
//! | `side` | the affinity as a function of the distance from one wall |
//! | `solve` | the zero of that function |
//! | `rest` | which wall, which outcome, which amounts |
//! | `outcome` | what a state of rest is told by |
//! | `bare` | the two calls on bare numbers, with every mistake reported |

mod bare;
mod limits;
mod outcome;
mod quotient;
mod rest;
mod side;
mod solve;
mod state;
mod system;
mod walls;

pub use bare::{BareProblem, BareReaction, BareRest, BareSpecies, BareSpeciesAtRest};
pub use bare::{affinities, rest_of};
pub use limits::{AMOUNT_MAX_MOL, LN_K_MAX, NU_MAX, NU_MIN, SPECIES_MAX};
pub use outcome::{Rest, RestOutcome, Summary, Workspace};
pub use quotient::{Affinity, Quotient, affinity, quotient};
pub use rest::{rest, rest_into};
pub use state::{Hold, State};
pub use system::{Kind, System};
