//! The same work many times over, for the benchmarks: native and in WebAssembly.
//!
//! Only built with the feature `bench`. What is timed is the two primitives and K, on numbers that
//! change a little each time, so that nothing can be computed once and kept.

use std::hint::black_box;

use super::value::Value;
use crate::equilibrium::{Hold, Kind, State, System, Workspace, affinity, rest_into};
use crate::library::{self, Combination, Record, Temperature};
use crate::reaction::Phase;

/// The work that can be repeated, by name.
pub const WORKS: [&str; 4] = ["K, Q and rest", "rest", "K", "Q"];

/// Amounts in mol: four species of the water-gas shift and nitrogen; invented.
const AMOUNTS_MOL: [f64; 5] = [0.003, 0.23, 0.15, 0.58, 0.035];
const NU: [f64; 5] = [-1.0, -1.0, 1.0, 1.0, 0.0];

/// Repeats a work `count` times and gives the sum of its results; nothing for a name that is not
/// one of [`WORKS`].
#[must_use]
pub fn batch(work: &str, count: u32) -> Option<f64> {
    let species = ["CO", "H2O", "CO2", "H2"];
    let record = |formula: &&str| library::one(formula, Some(Phase::Gas), None).ok();
    let records: Vec<&'static Record> = species.iter().map(record).collect::<Option<_>>()?;
    let rows: Vec<_> = records.into_iter().zip(NU).collect();
    let reaction = Combination::new(&rows).ok()?;
    let system = System::new(&[Kind::Gas; 5], &NU).ok()?;
    let hold = Hold::Pressure { pressure_pa: 2.5e6 };
    let mut amounts_mol = AMOUNTS_MOL;
    let mut workspace = Workspace::default();
    let mut sum = 0.0;
    for turn in 0..count {
        let temperature_k = 480.0 + f64::from(turn % 64);
        amounts_mol[0] = 0.003 + 1e-5 * f64::from(turn % 128);
        let state = State { temperature_k, hold, amounts_mol: black_box(&amounts_mol) };
        let ln_k = || Temperature::new(black_box(temperature_k)).map(|t| reaction.ln_k(t)).ok();
        sum += match work {
            "K" => ln_k()?,
            "Q" => affinity(&system, &state, 5.0).ok()?.finite()?,
            "rest" => rest_into(&system, &state, 5.0, &mut workspace).ok()?.extent_mol,
            "K, Q and rest" => {
                let ln_k = ln_k()?;
                let affinity = affinity(&system, &state, ln_k).ok()?.finite()?;
                affinity + rest_into(&system, &state, ln_k, &mut workspace).ok()?.extent_mol
            }
            _ => return None,
        };
    }
    Some(sum)
}

/// Judges one case `count` times and gives the sum of its ln K; nothing where it is refused.
#[must_use]
pub fn batch_check(case: &Value, count: u32) -> Option<f64> {
    let mut sum = 0.0;
    for _ in 0..count {
        sum += super::run::check(black_box(case)).ok()?.reactions.first()?.constant.ln_k;
    }
    Some(sum)
}
