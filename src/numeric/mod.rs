//! Mathematics without chemistry.

mod null_space;
mod rational;
mod rational_text;

pub use null_space::{null_space, rank, smallest_whole};
pub use rational::{Rational, RationalError};
