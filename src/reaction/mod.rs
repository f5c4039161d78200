//! Elements, formulas, species, equations, balancing.

mod balance;
mod charge;
mod conserve;
mod count;
mod element_table;
mod elements;
mod equation;
mod equation_text;
mod formula;
mod formula_reader;
mod formula_text;
mod limits;
mod naming;
mod nearest;
mod phase;
mod place;
mod repair;
mod solve;
mod species;
mod split;

pub use balance::{Balanced, balance, parse_equation};
pub use elements::{Element, Weight};
pub use equation::{Equation, Term};
pub use formula::{Formula, parse_formula};
pub use nearest::nearest;
pub use phase::Phase;
pub use species::{Species, parse_species};
