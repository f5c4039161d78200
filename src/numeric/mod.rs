//! Mathematics without chemistry.

mod exact;
mod null_space;
mod order;
mod rational;
mod rational_text;
mod root;
mod scaled;
mod step;

pub use exact::{difference_of_products, two_product, two_sum};
pub use null_space::{null_space, rank, smallest_whole};
pub use order::sort_short;
pub use rational::{Rational, RationalError};
pub use root::{Root, RootOutcome, root_between};
pub use scaled::{LN_2_TAIL, Scaled, split, times_power_of_two};
pub use step::{growth, step_in_power};
