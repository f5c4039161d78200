//! What the numbers mean for the plant: the verdict, the temperature approach, the valley.

mod approach;
mod tolerance;
mod valley;
mod verdict;

pub use approach::{Approach, NoApproach, approach, follow};
pub use tolerance::{
    Budget, End, Figure, Interval, Judged, Moved, Share, budget, tolerance_needed,
};
pub use valley::{Curve, Energy, Stretch, Valley, valley};
pub use verdict::{
    Band, DEFAULT_BAND, DEFAULT_CONVERSION_BAND, Direction, Evidence, Verdict, judge,
    temperature_says_something,
};
