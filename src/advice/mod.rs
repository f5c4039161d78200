//! What the numbers mean for the plant: the verdict, the temperature approach, the valley.

mod approach;
mod valley;
mod verdict;

pub use approach::{Approach, NoApproach, approach};
pub use valley::{Curve, Energy, Stretch, Valley, valley};
pub use verdict::{Direction, Verdict, judge};
