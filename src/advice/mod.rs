//! What the numbers mean for the plant: the verdict, the temperature approach, the valley, nudges.

mod approach;
mod border;
mod held;
mod knob;
mod local;
mod moved;
mod nudge;
mod reason;
mod search;
mod sweep;
mod target;
mod tolerance;
mod valley;
mod verdict;
mod wanted;
mod why;

pub use approach::{Approach, NoApproach, approach, follow};
pub use knob::{Knob, Knobs, Plant};
pub use nudge::{Nudge, nudge, nudges};
pub use reason::Reason;
pub use sweep::{SWEEP_LINES_MAX, SWEEP_POINTS_MAX, Sweep, SweepRequest, sweep};
pub use target::{Goal, Setting, Target, TargetOutcome, target};
pub use tolerance::{
    Budget, End, Figure, Interval, Judged, Moved, Share, budget, tolerance_needed,
};
pub use valley::{Curve, Energy, Stretch, Valley, valley};
pub use verdict::{
    Band, DEFAULT_BAND, DEFAULT_CONVERSION_BAND, Direction, Evidence, Verdict, judge,
    temperature_says_something,
};
pub use wanted::Wanted;
pub use why::{Wording, why};
