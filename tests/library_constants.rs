//! K from the library against published tables and measurements.

use std::collections::HashMap;

use crate::library::{combination, kelvin, rows};
use shiftgauge::library::Temperature;
use shiftgauge::quantity::GAS_CONSTANT_J_PER_MOL_K;

const LN_10: f64 = std::f64::consts::LN_10;
/// What three-digit logs of a table cost a reaction once the enthalpies of formation agree.
const EXPLAINED_WITHIN: f64 = 0.02;

#[test]
fn reactions_agree_with_the_log_kf_columns_of_janaf() {
    let mut published: HashMap<(&str, u64), (f64, f64)> = HashMap::new();
    for row in rows(include_str!("published/janaf_log_kf.tsv")) {
        let figures = (row[2].parse().unwrap(), row[3].parse().unwrap());
        published.insert((row[0], row[1].parse::<f64>().unwrap().to_bits()), figures);
    }
    let (mut used, mut wrong, mut apart) = (0, Vec::new(), Vec::new());
    let table = rows(include_str!("published/janaf_reactions.tsv"));
    for row in &table {
        let (reaction, _) = combination(row[0]);
        let tolerance: f64 = row[2].parse().unwrap();
        assert!(row[3].len() > 5, "{} has no reason", row[0]);
        // Δ_rH° of the library less that of JANAF, both at 298.15 K.
        let shift_j_per_mol: f64 = reaction
            .terms()
            .iter()
            .map(|(record, nu)| {
                let janaf = published[&(&*record.id, 298.15_f64.to_bits())].1;
                nu * (record.formation_enthalpy_j_per_mol - 1000.0 * janaf)
            })
            .sum();
        let mut worst = (0.0_f64, 0.0_f64);
        for t in row[1].split_whitespace().map(|t| t.parse::<f64>().unwrap()) {
            let expected: f64 = reaction
                .terms()
                .iter()
                .map(|(record, nu)| nu * published[&(&*record.id, t.to_bits())].0)
                .sum();
            let difference = reaction.ln_k(kelvin(t)) / LN_10 - expected;
            let left = difference + shift_j_per_mol / (GAS_CONSTANT_J_PER_MOL_K * t * LN_10);
            used += 1;
            apart.push((difference.abs(), left.abs()));
            worst = (worst.0.max(difference.abs()), worst.1.max(left.abs()));
        }
        if worst.0 > tolerance || worst.1 > EXPLAINED_WITHIN {
            wrong.push(format!(
                "{}: {:.4}, {:.4} unexplained ({tolerance})",
                row[0], worst.0, worst.1
            ));
        }
        println!("{:60} {:8.4} {:8.4}  {}", row[0], worst.0, worst.1, row[3]);
    }
    let asked: usize = table.iter().map(|row| row[1].split_whitespace().count()).sum();
    assert_eq!(used, asked, "a row was skipped");
    assert!(table.len() >= 20, "only {} reactions", table.len());
    for (name, pick) in [("all", 0), ("with JANAF's enthalpies", 1)] {
        let mut sorted: Vec<f64> =
            apart.iter().map(|pair| if pick == 0 { pair.0 } else { pair.1 }).collect();
        sorted.sort_by(f64::total_cmp);
        let part = |share: f64| sorted[((sorted.len() - 1) as f64 * share) as usize];
        println!(
            "|Δ log10 K|, {used} points, {name}: median {:.4}, 90 % {:.4}, worst {:.4}",
            part(0.5),
            part(0.9),
            part(1.0)
        );
    }
    assert!(wrong.is_empty(), "{}", wrong.join("\n"));
}

#[test]
fn constants_agree_with_those_measured_and_tabulated() {
    let log_atm_per_bar = 1.01325_f64.log10();
    let (mut used, mut wrong) = (0, Vec::new());
    let table = rows(include_str!("published/constants.tsv"));
    for row in &table {
        let (reaction, delta_nu_gas) = combination(row[0]);
        let [t, value, tolerance] = [1, 3, 4].map(|column| row[column].parse::<f64>().unwrap());
        let log_k = |t: f64| reaction.ln_k(kelvin(t)) / LN_10;
        let found = match row[2] {
            "log10 K" => log_k(t),
            "log10 Kp atm" => log_k(t) - delta_nu_gas * log_atm_per_bar,
            "K at 1 atm" => {
                assert_eq!(delta_nu_gas, 1.0);
                let (mut low, mut high) = (t - 200.0, t + 200.0);
                for _ in 0..60 {
                    let middle = 0.5 * (low + high);
                    let above = log_k(middle) > log_atm_per_bar;
                    (low, high) = if above { (low, middle) } else { (middle, high) };
                }
                low
            }
            other => panic!("{other} is no kind"),
        };
        used += 1;
        println!("{:45} {t:8.2} K {:13} {value:9.4} found {found:9.4}", row[0], row[2]);
        if (found - value).abs() > tolerance {
            wrong.push(format!(
                "{} at {t} K: {found:.4}, not {value} ± {tolerance}; {}",
                row[0], row[5]
            ));
        }
    }
    assert_eq!(used, table.len(), "a row was skipped");
    assert!(wrong.is_empty(), "{}", wrong.join("\n"));
}

#[test]
fn a_sum_of_species_is_the_sum_of_their_properties() {
    for text in ["-2 SO2.g -1 O2.g 2 SO3.g", "-3 Fe.s -4 H2O.g 1 Fe3O4.s 4 H2.g"] {
        let (reaction, _) = combination(text);
        for t in [5.0, 250.0, 299.0, 600.0, 1000.0, 1184.0, 1700.0, 4000.0] {
            let at = kelvin(t);
            let each: f64 =
                reaction.terms().iter().map(|(record, nu)| nu * record.gibbs_over_rt(at)).sum();
            let scale = 1e-13 * (1.0 + 1e6 / (8.3 * t));
            let change = reaction.change(at);
            let apart = (reaction.ln_k(at) + each).abs();
            assert!(apart < scale, "{text} at {t}: {each}, apart by {apart:e}");
            assert_eq!(change.ln_k, reaction.ln_k(at));
            let gibbs = change.enthalpy_j_per_mol - t * change.entropy_j_per_mol_k;
            assert!(
                (gibbs - change.gibbs_j_per_mol).abs() < 1e-6 * (1.0 + t / 1000.0),
                "{text} at {t}"
            );
            assert_eq!(change.enthalpy_j_per_mol, reaction.enthalpy_j_per_mol(at));
        }
    }
    let (empty, _) = combination("");
    assert_eq!(empty.ln_k(Temperature::standard()), 0.0);
    assert_eq!(empty.range_k(), None);
}

#[test]
fn van_t_hoff_holds_between_neighbouring_temperatures() {
    let (reaction, _) = combination("-1 CO.g -1 H2O.g 1 CO2.g 1 H2.g");
    for t in [400.0, 650.0, 950.0, 1400.0] {
        let slope = (reaction.ln_k(kelvin(t + 0.1)) - reaction.ln_k(kelvin(t - 0.1))) / 0.2;
        let expected = reaction.enthalpy_j_per_mol(kelvin(t)) / (GAS_CONSTANT_J_PER_MOL_K * t * t);
        assert!((slope / expected - 1.0).abs() < 1e-5, "at {t} K: {slope}, {expected}");
    }
}

#[test]
fn uncertainty_of_a_reaction_grows_with_its_numbers() {
    let (once, _) = combination("-1 SO2.g -0.5 O2.g 1 SO3.g");
    let (twice, _) = combination("-2 SO2.g -1 O2.g 2 SO3.g");
    let (u1, u2) = (once.u_gibbs_j_per_mol(), twice.u_gibbs_j_per_mol());
    assert!(u1 > 50.0 && (u2 - 2.0 * u1).abs() < 1e-9, "{u1}, {u2}");
    assert_eq!(once.range_k(), Some((298.15, 5000.0)));
    assert_eq!(once.extrapolated_by_k(kelvin(700.0)), None);
    assert_eq!(once.extrapolated_by_k(kelvin(288.15)), Some(10.0));
}
