//! All native tests in one binary; one file an idea.
#![allow(
    clippy::unwrap_used,
    clippy::expect_used,
    clippy::panic,
    reason = "a test fails by panicking"
)]

mod balance;
mod bare;
mod check;
mod codata;
mod elements;
mod equation;
mod examples;
mod formula;
mod laws_case;
mod laws_constant;
mod laws_quantity;
mod laws_reaction;
mod laws_rest;
mod laws_solution;
mod library;
mod library_constants;
mod mistakes;
mod mixtures;
mod quantity;
mod quantity_show;
mod quantity_units;
mod rational;
mod rest;
mod rest_solution;
mod rooms;
mod saturation;
mod solution;
mod valley_mixtures;
