//! What the numbers mean for the plant: the verdict, the temperature approach, the valley.

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
mod valley;
mod verdict;
mod wanted;
mod why;

pub use approach::{Approach, NoApproach, approach};
pub use knob::{Knob, Knobs, Plant};
pub use nudge::{Nudge, nudge, nudges};
pub use reason::Reason;
pub use sweep::{SWEEP_LINES_MAX, SWEEP_POINTS_MAX, Sweep, SweepRequest, sweep};
pub use target::{Goal, Setting, Target, TargetOutcome, target};
pub use valley::{Curve, Energy, Stretch, Valley, valley};
pub use verdict::{Direction, Verdict, judge};
pub use wanted::Wanted;
pub use why::{Wording, why};
