//! All native tests in one binary; one file an idea.
#![allow(
    clippy::unwrap_used,
    clippy::expect_used,
    clippy::panic,
    reason = "a test fails by panicking"
)]

mod ammonia;
mod asking;
mod balance;
mod bare;
mod check;
mod codata;
mod elements;
mod equation;
mod examples;
mod exceptions;
mod feed;
mod formula;
mod laws_case;
mod laws_constant;
mod laws_nudges;
mod laws_quantity;
mod laws_reaction;
mod laws_rest;
mod laws_solution;
mod library;
mod library_constants;
mod library_dissolved;
mod library_proof;
mod liquids;
mod measured;
mod mistakes;
mod mixtures;
mod nudges;
mod nudges_reference;
mod nudges_steps;
mod own;
mod quantity;
mod quantity_presets;
mod quantity_show;
mod quantity_units;
mod rational;
mod rest;
mod rest_solution;
mod rooms;
mod saturation;
mod search;
mod solution;
mod sweep;
mod target;
mod tolerance;
mod valley_mixtures;
mod vapour;
mod verdict;
