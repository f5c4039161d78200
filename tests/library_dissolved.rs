//! Dissolved species: their conventions, their spellings, and equilibria measured in water.

use crate::library::{combination, kelvin, record, rows};
use shiftgauge::case;
use shiftgauge::library;
use shiftgauge::library::{Combination, Reach};
use shiftgauge::quantity::GAS_CONSTANT_J_PER_MOL_K;
use shiftgauge::reaction::{Phase, parse_species};

const LN_10: f64 = std::f64::consts::LN_10;

#[test]
fn equilibria_in_water_agree_with_those_measured() {
    let table = rows(include_str!("published/solution_constants.tsv"));
    let (mut used, mut wrong, mut at_25) = (0, Vec::new(), Vec::new());
    for row in &table {
        let (tied, _) = combination(row[0]);
        let alone = Combination::of_species(tied.terms()).unwrap();
        let [t, value, tolerance] = [1, 2, 3].map(|column| row[column].parse::<f64>().unwrap());
        assert!(row[4].len() > 3 && row[5].len() > 5, "{} has no reason or source", row[0]);
        let within = row[4].split_once("measured within ").map_or(tolerance, |(_, text)| {
            let figure = text.split([':', ' ']).next().unwrap();
            figure.parse().unwrap_or_else(|_| panic!("{text} is no width"))
        });
        let is_known_alone = !row[4].starts_with("measured");
        let log10 = |reaction: &Combination| reaction.ln_k(kelvin(t)) / LN_10;
        let u = tied.u_gibbs_j_per_mol() / (GAS_CONSTANT_J_PER_MOL_K * t * LN_10);
        used += 1;
        if t == 298.15 && !at_25.contains(&row[0]) {
            at_25.push(row[0]);
        }
        println!(
            "{:62} {t:7.2} K {value:8.3}, measured {:+.3} of {within}, u {u:.3}; records {:+.3}",
            row[0],
            log10(&tied) - value,
            log10(&alone) - value,
        );
        for (way, reaction, width) in [("measured", &tied, within), ("records", &alone, tolerance)]
        {
            let off = log10(reaction) - value;
            if off.abs() > width && (way == "measured" || is_known_alone) {
                wrong.push(format!("{} at {t} K by {way}: {off:+.4} off, {width} allowed", row[0]));
            }
        }
    }
    assert_eq!(used, table.len(), "a row was skipped");
    assert!(at_25.len() >= 60, "only {} constants at 25 °C", at_25.len());
    assert!(wrong.is_empty(), "{}", wrong.join("\n"));
}

#[test]
fn the_hydrogen_ion_is_the_zero_of_the_scale() {
    let proton = record("H^+.aq");
    assert_eq!((proton.u_gibbs_j_per_mol, proton.standard_entropy_j_per_mol_k), (0.0, 0.0));
    for t in [273.15, 298.15, 340.0, 373.15] {
        let at = proton.properties(kelvin(t));
        assert_eq!((at.gibbs_j_per_mol, at.enthalpy_j_per_mol), (0.0, 0.0), "{t}");
    }
}

#[test]
fn ions_written_in_any_spelling_find_their_record() {
    let spelled = [
        ("SO4^2-.aq", &["SO4^2-(aq)", "SO4(2-)(aq)", "SO₄²⁻(aq)", "SO4^{2-}(aq)", "SO4--(aq)"][..]),
        ("H^+.aq", &["H+(aq)", "H^+(aq)", "H⁺(aq)", "H(+)(aq)"][..]),
        ("NH4^+.aq", &["NH4^+(aq)", "NH4(+)(aq)", "NH₄⁺(aq)"][..]),
        ("Ca^2+.aq", &["Ca^2+(aq)", "Ca(2+)(aq)", "Ca²⁺(aq)", "Ca++(aq)"][..]),
        ("CH3COO^-.aq", &["CH3COO-(aq)", "CH3COO^−(aq)", "CH₃COO⁻(aq)"][..]),
        ("Al(OH)4^-.aq", &["Al(OH)4^-(aq)", "Al(OH)₄⁻(aq)"][..]),
        ("PO4^3-.aq", &["PO4^3-(aq)", "PO4(3-)(aq)", "PO₄³⁻(aq)"][..]),
        ("CaSO4·2H2O.s", &["CaSO4·2H2O(s)", "CaSO4*2H2O(s)", "CaSO₄·2H₂O(s)"][..]),
    ];
    for (id, spellings) in spelled {
        for text in spellings {
            let species = parse_species(text).unwrap_or_else(|found| panic!("{text}: {found:?}"));
            let found = library::find(species.formula.text(), species.phase, None);
            assert_eq!(found.iter().map(|one| one.id.clone()).collect::<Vec<_>>(), [id], "{text}");
        }
    }
}

#[test]
fn every_formula_of_the_library_is_spelled_as_the_reader_writes_it() {
    for record in library::all() {
        let species = parse_species(&record.label());
        let species = species.unwrap_or_else(|found| panic!("{}: {found:?}", record.label()));
        assert_eq!(species.formula.text(), record.formula, "{}", record.id);
        assert_eq!(species.phase, Some(record.phase), "{}", record.id);
        assert_eq!(species.form.as_deref(), record.form.as_deref(), "{}", record.id);
        let is_ion = species.formula.charge() != 0;
        assert!(!is_ion || record.phase == Phase::Aqueous, "{} is an ion", record.id);
    }
}

#[test]
fn dissolved_species_say_where_their_heat_capacity_ends() {
    let dissolved = || library::all().filter(|one| one.phase == Phase::Aqueous);
    assert!(dissolved().count() >= 40);
    for one in dissolved() {
        let tied = library::measured(&one.id).map(|known| known.range_k);
        let ranges = [Some((273.15, 373.15)), Some((288.15, 308.15)), tied];
        assert!(ranges.contains(&Some(one.range_k)), "{}", one.id);
        assert!(matches!(one.reach(kelvin(380.0)), Reach::Extrapolated { .. }), "{}", one.id);
        assert!(one.u_gibbs_j_per_mol > 0.0 || one.id == "H^+.aq", "{}", one.id);
    }
}

#[test]
fn a_reaction_of_ions_without_balanced_charge_would_show() {
    // Charge balances or the hydrogen that balances the ions' formation would be left over: the
    // same reaction by two ways, ammonia neutralised by acetic acid.
    let (direct, _) = combination("-1 NH3.aq -1 CH3COOH.aq 1 NH4^+.aq 1 CH3COO^-.aq");
    let (acid, _) = combination("-1 CH3COOH.aq 1 H^+.aq 1 CH3COO^-.aq");
    let (base, _) = combination("-1 NH4^+.aq 1 NH3.aq 1 H^+.aq");
    let ln_k = |reaction: &Combination| reaction.ln_k(kelvin(298.15));
    let apart = ln_k(&direct) - (ln_k(&acid) - ln_k(&base));
    assert!(apart.abs() < 1e-9, "{apart}");
}

#[test]
fn k_is_had_from_an_equation_of_ions_as_it_is_written() {
    for (equation, log10_k) in [
        ("H2O(l) = H+ + OH-", -13.995),
        ("CaCO3(s, calcite) = Ca^2+ + CO3^2-", -8.480),
        ("CaCO3 = Ca(2+) + CO3(2-)", -8.480),
        ("CaSO4·2H2O = Ca²⁺ + SO4²⁻ + 2 H2O(l)", -4.581),
        ("CH3COOH(aq) = H⁺ + CH3COO⁻", -4.756),
        ("NH4+ = NH3(aq) + H+", -9.245),
    ] {
        let answer = serde_json::to_value(case::constant(equation, "25 °C")).unwrap();
        let ln_k = answer["constant"]["ln_k"].as_f64();
        let found = ln_k.unwrap_or_else(|| panic!("{equation}: {answer}")) / LN_10;
        assert!((found - log10_k).abs() < 0.03, "{equation}: {found}, not {log10_k}");
    }
}
