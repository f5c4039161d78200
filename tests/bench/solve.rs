//! Times the core natively: one line a work, its name and the nanoseconds of one turn.

#![allow(clippy::expect_used, reason = "a benchmark that cannot read its case has nothing to do")]

use std::time::Instant;

use shiftgauge::case::{self, Value};

/// Rounds of each work; the median is printed.
const ROUNDS: usize = 9;

fn time(name: &str, count: u32, mut work: impl FnMut(u32) -> Option<f64>) {
    work(count / 10);
    let mut rounds: Vec<f64> = (0..ROUNDS)
        .map(|_| {
            let start = Instant::now();
            let sum = work(count);
            let nanoseconds = start.elapsed().as_secs_f64() * 1e9 / f64::from(count);
            assert!(sum.is_some_and(f64::is_finite), "{name} gave no number");
            nanoseconds
        })
        .collect();
    rounds.sort_by(f64::total_cmp);
    println!("{name}\t{:.1}", rounds[ROUNDS / 2]);
}

fn main() {
    for work in case::WORKS {
        time(work, 100_000, |count| case::batch(work, count));
    }
    let path = concat!(env!("CARGO_MANIFEST_DIR"), "/www/examples/low-temperature-shift.json");
    let text = std::fs::read_to_string(path).expect("the example is there");
    let question: Value = serde_json::from_str(&text).expect("the example is JSON");
    time("check", 500, |count| case::batch_check(&question, count));
}
