//! All native tests in one binary; one file an idea.
#![allow(
    clippy::unwrap_used,
    clippy::expect_used,
    clippy::panic,
    reason = "a test fails by panicking"
)]

mod bare;
mod laws_rest;
mod rest;
mod rooms;
