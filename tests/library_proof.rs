//! The whole library against the NIST-JANAF tables, at temperatures that no fit has seen.

use std::collections::BTreeMap;

use crate::library::{kelvin, record, rows};
use shiftgauge::library::{Combination, Known};
use shiftgauge::quantity::GAS_CONSTANT_J_PER_MOL_K;

const LN_10: f64 = std::f64::consts::LN_10;
/// The cubic between JANAF's rows and its ΔfG° to 0.001 kJ/mol leave this in log10 K.
const READ_WITHIN: f64 = 0.003;

/// One reaction at one temperature.
struct Point {
    terms: String,
    temperature_k: f64,
    /// log10 K of the library less that of the tables.
    off: f64,
    /// The library's standard uncertainty of log10 K.
    u: f64,
    /// Whether the Active Thermochemical Tables replaced an enthalpy of formation in it.
    is_replaced: bool,
}

fn points(kind: &str) -> Vec<Point> {
    let mut found = Vec::new();
    for row in rows(include_str!("published/janaf_proof.tsv")) {
        if row[0] != kind {
            continue;
        }
        let words: Vec<&str> = row[1].split(' ').collect();
        let terms: Vec<(Known, f64)> = words
            .chunks(2)
            .map(|pair| (record(&pair[1].replace('_', " ")).into(), pair[0].parse().unwrap()))
            .collect();
        let is_atct = |(known, _): &(Known, f64)| known.sources.iter().any(|id| id == "atct");
        let is_replaced = terms.iter().any(is_atct);
        let reaction = Combination::of_species(&terms).unwrap();
        let figures: Vec<f64> = row[2].split(' ').map(|text| text.parse().unwrap()).collect();
        for pair in figures.chunks(2) {
            let [temperature_k, log10_k] = *pair else { panic!("{row:?}") };
            let at = kelvin(temperature_k);
            assert_eq!(reaction.extrapolated_by_k(at), None, "{} at {temperature_k} K", row[1]);
            found.push(Point {
                terms: row[1].to_owned(),
                temperature_k,
                is_replaced,
                off: reaction.ln_k(at) / LN_10 - log10_k,
                u: reaction.u_gibbs_j_per_mol()
                    / (GAS_CONSTANT_J_PER_MOL_K * temperature_k * LN_10),
            });
        }
    }
    found
}

fn part(sorted: &[f64], share: f64) -> f64 {
    sorted[((sorted.len() - 1) as f64 * share).round() as usize]
}

/// Prints how |Δ log10 K| and Δ/u are spread; gives the share within two u and what is outside.
fn spread<'a>(kind: &str, points: &'a [Point]) -> (f64, Vec<&'a Point>) {
    let mut off: Vec<f64> = points.iter().map(|point| point.off.abs()).collect();
    let over_u = |point: &Point| (point.off.abs() - READ_WITHIN).max(0.0) / point.u.max(1e-12);
    let mut times: Vec<f64> = points.iter().map(over_u).collect();
    off.sort_by(f64::total_cmp);
    times.sort_by(f64::total_cmp);
    println!("{kind}: {} points", points.len());
    for share in [0.25, 0.5, 0.75, 0.9, 0.95, 0.99, 1.0] {
        let (delta, times) = (part(&off, share), part(&times, share));
        println!("  {:5.1} %: |Δ log10 K| {delta:8.4}, |Δ|/u {times:7.3}", 100.0 * share);
    }
    let outside: Vec<&Point> = points.iter().filter(|point| over_u(point) > 2.0).collect();
    let share = 1.0 - outside.len() as f64 / points.len() as f64;
    println!("  within 2 u: {:.2} %", 100.0 * share);
    (share, outside)
}

/// How a listed species differs from the tables.
enum Difference {
    /// The tables contradict themselves.
    Void,
    /// ΔfG° less that of the tables, in J/mol, by temperature.
    Gibbs(Vec<(f64, f64)>),
}

type Differences<'a> = BTreeMap<&'a str, Difference>;

/// The difference of each listed species' own formation from the tables'.
fn own_differences(formed: &[Point], table: &[Vec<&'static str>]) -> Differences<'static> {
    let of = |row: &Vec<&'static str>| match row[1] {
        "void" => Difference::Void,
        "" => {
            let own = formed.iter().filter(|point| point.terms.split(' ').nth(1) == Some(row[0]));
            let gibbs = |point: &Point| {
                let rt = GAS_CONSTANT_J_PER_MOL_K * point.temperature_k;
                (point.temperature_k, -point.off * rt * LN_10)
            };
            Difference::Gibbs(own.map(gibbs).collect())
        }
        figure => Difference::Gibbs(vec![(298.15, 1000.0 * figure.parse::<f64>().unwrap())]),
    };
    table.iter().map(|row| (row[0], of(row))).collect()
}

/// What is left of a point once the listed species' own differences are taken from it, those at the
/// nearest temperature; none where the tables contradict themselves.
fn left(point: &Point, differences: &Differences) -> Option<f64> {
    let words: Vec<&str> = point.terms.split(' ').collect();
    let mut off = point.off;
    for pair in words.chunks(2) {
        match differences.get(pair[1]) {
            None => {}
            Some(Difference::Void) => return None,
            Some(Difference::Gibbs(own)) => {
                let apart = |row: &&(f64, f64)| ((row.0 - point.temperature_k).abs() * 1e3) as u64;
                let nearest = own.iter().min_by_key(apart).unwrap();
                let rt = GAS_CONSTANT_J_PER_MOL_K * point.temperature_k;
                off += pair[0].parse::<f64>().unwrap() * nearest.1 / (rt * LN_10);
            }
        }
    }
    Some(off)
}

#[test]
fn the_whole_library_agrees_with_janaf_within_its_own_uncertainty() {
    let table = rows(include_str!("published/janaf_differences.tsv"));
    assert!(table.iter().all(|row| row[2].len() > 10), "a species has no reason");
    let formed = points("formed");
    let balanced = points("balanced");
    let differences = own_differences(&formed, &table);
    let mut unexplained = Vec::new();
    for (kind, points, fewest) in [("formed", formed.as_slice(), 400), ("balanced", &balanced, 600)]
    {
        let (_, outside) = spread(kind, points);
        let mut reactions: Vec<&str> = points.iter().map(|point| point.terms.as_str()).collect();
        reactions.dedup();
        assert!(reactions.len() >= fewest, "{kind}: only {} reactions", reactions.len());
        for point in outside {
            let Some(left) = left(point, &differences) else { continue };
            if left.abs() > 2.0 * point.u + 2.0 * READ_WITHIN {
                unexplained.push(format!(
                    "{} at {} K: {:+.4}, {left:+.4} left, u {:.4}",
                    point.terms, point.temperature_k, point.off, point.u
                ));
            }
        }
        // Whose enthalpy a later assessment replaced is on record, whatever the tables say.
        let others: Vec<&Point> = points.iter().filter(|point| !point.is_replaced).collect();
        let inside = others.iter().filter(|one| one.off.abs() <= 2.0 * one.u + READ_WITHIN).count();
        let share = 100.0 * inside as f64 / others.len() as f64;
        println!(
            "  no enthalpy replaced by a later one: {}, {share:.2} % within 2 u",
            others.len()
        );
        assert!(share > 90.0, "{kind}: only {share:.1} % within two u");
    }
    assert!(unexplained.is_empty(), "{}", unexplained.join("\n"));
    let idle = |one: &&str| matches!(&differences[*one], Difference::Gibbs(own) if own.is_empty());
    let idle: Vec<&str> = differences.keys().copied().filter(idle).collect();
    assert!(idle.is_empty(), "no formation shows {idle:?}");
}
