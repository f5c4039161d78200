//! Elements, formulas, species, equations, balancing.

mod phase;

pub use phase::Phase;
