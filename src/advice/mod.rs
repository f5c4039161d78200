//! What the numbers mean for the plant.
