//! Measured equilibria: how they enter a reaction, and how exactly what they share cancels.

use crate::library::{combination, kelvin, record, rows};
use shiftgauge::library::{self, Combination, Known, OwnFigures, OwnHeat, Record, Temperature};
use shiftgauge::quantity::GAS_CONSTANT_J_PER_MOL_K;
use shiftgauge::reaction::parse_species;

const LN_10: f64 = std::f64::consts::LN_10;

#[test]
fn every_line_of_the_table_balances_and_gives_its_own_constant() {
    let table = rows(include_str!("../src/library/tables/measured.tsv"));
    assert_eq!(library::all_measured().count(), table.len());
    for known in library::all_measured() {
        assert!(known.terms.iter().any(|(one, nu)| one.id == known.tied && nu.abs() == 1.0));
        assert!(library::citation(known.source).is_some(), "{}", known.tied);
        let at_25 = known.ln_k(Temperature::standard()) / LN_10;
        assert!((at_25 - known.log10_k).abs() < 6e-4, "{}: {at_25}", known.tied);
        let (low, high) = known.range_k;
        assert!(low <= 298.15 && high >= 298.15, "{}", known.tied);
        let balanced = shiftgauge::reaction::balance(&known.equation());
        assert!(balanced.is_ok_and(|found| found.already_balanced), "{}", known.equation());
    }
}

#[test]
fn the_measured_reaction_itself_is_nothing_but_the_measurement() {
    for known in library::all_measured() {
        let terms: Vec<(&library::Record, f64)> = known.terms.clone();
        let reaction = Combination::new(&terms).unwrap();
        assert!(reaction.records().is_empty(), "{}: {:?}", known.tied, reaction.records());
        let [(only, times)] = reaction.measured() else { panic!("{}", known.tied) };
        assert_eq!((only.tied, times.abs()), (known.tied, 1.0));
        for t in [280.0, 298.15, 330.0, 500.0] {
            let apart = reaction.ln_k(kelvin(t)) - known.ln_k(kelvin(t));
            assert!(
                apart.abs() < 1e-9 * (1.0 + known.ln_k(kelvin(t)).abs()),
                "{} at {t}",
                known.tied
            );
        }
        let u = known.u_log10_k * GAS_CONSTANT_J_PER_MOL_K * 298.15 * LN_10;
        assert!((reaction.u_gibbs_j_per_mol() / u - 1.0).abs() < 1e-12, "{}", known.tied);
    }
}

#[test]
fn reactions_through_measured_equilibria_add_up() {
    // Calcite in acid: Ksp over both acid constants, and the gas by Henry's constant.
    let parts = ["CaCO3.s.calcite", "CO3^2-.aq", "HCO3^-.aq", "CO2.aq"];
    let (whole, _) = combination("-1 CaCO3.s.calcite -2 H^+.aq 1 Ca^2+.aq 1 CO2.g 1 H2O.l");
    for t in [280.0, 298.15, 340.0] {
        let [solubility, second, first, henry] =
            parts.map(|id| library::measured(id).unwrap().ln_k(kelvin(t)));
        let expected = solubility - second - first - henry;
        assert!((whole.ln_k(kelvin(t)) - expected).abs() < 1e-9, "at {t} K");
    }
    let ids: Vec<&str> = whole.measured().iter().map(|(known, _)| known.tied).collect();
    assert!(parts.iter().all(|id| ids.contains(id)) && ids.len() == 4, "{ids:?}");
    assert!(whole.records().is_empty(), "what is left cancels: {:?}", whole.records());
    let (twice, _) = combination("-2 CaCO3.s.calcite -4 H^+.aq 2 Ca^2+.aq 2 CO2.g 2 H2O.l");
    assert!((twice.u_gibbs_j_per_mol() - 2.0 * whole.u_gibbs_j_per_mol()).abs() < 1e-9);
}

#[test]
fn a_solid_is_tied_in_water_only() {
    let (kiln, _) = combination("-1 CaCO3.s.calcite 1 CaO.s 1 CO2.g");
    assert!(kiln.measured().is_empty());
    let (slaking, _) = combination("-1 CaO.s -1 H2O.l 1 Ca(OH)2.s");
    assert!(slaking.measured().is_empty(), "liquid water alone does not tie");
    let (dissolving, _) = combination("-1 Ca(OH)2.s 1 Ca^2+.aq 2 OH^-.aq");
    assert_eq!(dissolving.measured().len(), 2);
}

#[test]
fn a_record_of_ones_own_is_not_tied_but_cancels_with_the_tables() {
    let own = Record::own(OwnFigures {
        species: parse_species("HCO3^-(aq)").unwrap(),
        names: Vec::new(),
        cas: String::new(),
        enthalpy_j_per_mol: Some(-690_000.0),
        gibbs_j_per_mol: None,
        entropy_j_per_mol_k: Some(98.0),
        heat: vec![OwnHeat {
            low_k: 273.15,
            high_k: 373.15,
            terms: [0.0; 7],
            transition_j_per_mol: 0.0,
        }],
        u_gibbs_j_per_mol: 200.0,
        source: "Ours".to_owned(),
    });
    let own: Known = own.unwrap().into();
    let terms: Vec<(Known, f64)> = vec![
        (record("CO2.aq").into(), -1.0),
        (record("H2O.l").into(), -1.0),
        (record("H^+.aq").into(), 1.0),
        (own, 1.0),
    ];
    let reaction = Combination::new(&terms).unwrap();
    let tied: Vec<&str> = reaction.measured().iter().map(|(known, _)| known.tied).collect();
    assert_eq!(tied, ["CO2.aq"], "only the dissolved gas of the tables is tied");
    assert!(reaction.records().iter().any(|(known, _)| known.is_own()));
}
