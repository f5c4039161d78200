//! Vapour pressures that follow from records of a liquid and its vapour.

use crate::library::{combination, kelvin, rows};

#[test]
fn liquids_boil_where_published_equations_say() {
    let table = rows(include_str!("published/vapour_pressures.tsv"));
    let (mut used, mut wrong) = (0, Vec::new());
    for row in &table {
        let [t, pressure, tolerance] = [2, 3, 4].map(|column| row[column].parse::<f64>().unwrap());
        assert!(row[5].len() > 5 && row[6].len() > 5, "{} has no reason or source", row[0]);
        let (boiling, _) = combination(&format!("-1 {} 1 {}", row[1], row[0]));
        let found = 100.0 * boiling.ln_k(kelvin(t)).exp();
        let off = 100.0 * (found / pressure - 1.0);
        used += 1;
        println!("{:12} {t:8.2} K {pressure:10.4} kPa found {found:10.4}, {off:+.2} %", row[0]);
        if off.abs() > tolerance {
            wrong.push(format!("{} at {t} K: {off:+.2} %, {tolerance} % allowed", row[0]));
        }
    }
    assert_eq!(used, table.len(), "a row was skipped");
    assert!(wrong.is_empty(), "{}", wrong.join("\n"));
}

#[test]
fn sulfur_boils_as_a_mixture_of_its_molecules() {
    // At 444.60 °C, the former fixed point of the temperature scale, the sum over S2 to S8 is 101.325
    // kPa. The molecules' u of 1 to 2 kJ/mol are 17 to 34 % each, so this is no sharp test.
    let t = 717.75;
    let molecules = [2, 3, 4, 5, 6, 7, 8];
    let pressure: f64 = molecules
        .iter()
        .map(|n| combination(&format!("-{n} S.l 1 S{n}.g")).0.ln_k(kelvin(t)).exp() * 100.0)
        .sum();
    println!("sulfur at {t} K: {pressure:.1} kPa");
    assert!((pressure / 101.325 - 1.0).abs() < 0.34, "{pressure}");
}
