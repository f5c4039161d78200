//! Times the work natively and prints a line of JSON for each kind: `work`, `place`, `sum` and the
//! time of each batch in nanoseconds a turn. `./Trunkfile bench` sets it beside the others.
#![allow(clippy::unwrap_used, reason = "a benchmark fails by panicking")]

use std::hint::black_box;
use std::time::Instant;

use shiftgauge::bench::{Bench, Work};
use shiftgauge::case::{self, Value};

const BATCHES: usize = 7;

fn main() {
    let mut bench = Bench::new().unwrap();
    for (work, name) in Work::ALL {
        let sum = bench.run(work, 256).unwrap();
        print(name, Some(sum), 20_000, |count| {
            black_box(bench.run(black_box(work), count).unwrap());
        });
    }
    let text = include_str!("../mistakes/base.json");
    let question: Value = serde_json::from_str(text).unwrap();
    print("check of a case", None, 100, |count| {
        for _ in 0..count {
            black_box(case::check(black_box(&question)));
        }
    });
}

/// Runs a batch to warm up, then the batches that count.
fn print(work: &str, sum: Option<f64>, count: u32, mut batch: impl FnMut(u32)) {
    batch(count);
    let times: Vec<f64> = (0..BATCHES)
        .map(|_| {
            let start = Instant::now();
            batch(count);
            start.elapsed().as_nanos() as f64 / f64::from(count)
        })
        .collect();
    let sum = sum.map_or("null".to_owned(), |sum| format!("{sum:?}"));
    println!(r#"{{"place":"native","work":"{work}","sum":{sum},"ns":{times:?}}}"#);
}
