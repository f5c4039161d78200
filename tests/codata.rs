//! ΔfH° and S° at 298.15 K against the CODATA key values.

use shiftgauge::library::{self, Temperature};

#[test]
fn the_key_values_are_met_within_their_own_uncertainty() {
    let table = include_str!("published/codata.tsv");
    let rows = table.lines().filter(|line| !line.starts_with('#')).skip(1);
    let mut wrong = Vec::new();
    let mut compared = 0;
    for row in rows {
        let cells: Vec<&str> = row.split('\t').collect();
        let number = |i: usize| cells[i].parse::<f64>().unwrap();
        let record = library::all().find(|record| record.id == cells[0]);
        let record = record.unwrap_or_else(|| panic!("no species {}", cells[0]));
        let at = record.properties(Temperature::standard());
        let (enthalpy, entropy) = (at.enthalpy_j_per_mol / 1e3, at.entropy_j_per_mol_k);
        // A published figure stands for all that rounds to it; an element's zero is exact, but for
        // the rounding of the polynomials.
        let enthalpy_off = (enthalpy - number(1)).abs();
        let entropy_off = (entropy - number(3)).abs();
        if enthalpy_off > number(2) + 1e-6 || entropy_off > number(4) {
            wrong.push(format!("{row}: ΔfH° {enthalpy:.4}, S° {entropy:.4}"));
        }
        compared += 1;
    }
    assert_eq!(compared, table.lines().filter(|line| !line.starts_with('#')).count() - 1);
    assert!(wrong.is_empty(), "{}", wrong.join("\n"));
    assert!(compared >= 17);
}
