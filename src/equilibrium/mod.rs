//! Q, affinities and rest.
//!
//! Two questions are answered here, and every other number of the program is a loop over them:
//! how far a state is from rest ([`affinity`]: ln K − ln Q), and which state is at rest
//! ([`rest`]: the amounts once the reaction has stopped, at the same temperature and the same
//! pressure, volume or water). One reaction among an ideal gas, an ideal liquid mixture or a solution in
//! water (ideal or with activity coefficients), and pure phases.
//!
//! | file | what it holds |
//! | --- | --- |
//! | `limits` | the ranges of numbers that are worked with |
//! | `system` | kinds of species and one reaction among them |
//! | `system_check` | the mistakes that a system can be given |
//! | `state` | temperature, hold, amounts |
//! | `quotient` | Q and the affinity, with names for their open ends |
//! | `walls` | how far the reaction can run each way |
//! | `side` | the affinity as a function of the distance from one wall, for one mixture |
//! | `several` | the same for several mixtures at once |
//! | `nonideal` | activity coefficients and the activity of the solvent |
//! | `solve` | the zero of that function |
//! | `rest` | which wall, which outcome, which amounts |
//! | `outcome` | what a state of rest is told by |
//! | `activity` | the activity of every species, for reports |
//! | `bare` | the two calls on bare numbers, with every mistake reported |

mod activity;
mod bare;
mod limits;
mod nonideal;
mod outcome;
mod quotient;
mod rest;
mod several;
mod side;
mod solve;
mod state;
mod system;
mod system_check;
mod walls;

pub use activity::{Activities, SolutionState, activities};
pub use bare::{BareProblem, BareReaction, BareRest, BareSpecies, BareSpeciesAtRest};
pub use bare::{affinities, rest_of};
pub use limits::{AMOUNT_MAX_MOL, CHARGE_MAX, ION_SIZE_MAX_PM, ION_SIZE_MIN_PM};
pub use limits::{LN_K_MAX, NU_MAX, NU_MIN, SPECIES_MAX};
pub use nonideal::ln_q_correction;
pub use outcome::{Rest, RestOutcome, Summary, Workspace};
pub use quotient::{Affinity, Quotient, affinity, quotient};
pub use rest::{rest, rest_into};
pub use state::{Hold, State};
pub use system::{Kind, System};
