//! Mathematics without chemistry.
