//! Liquids, solutions and several mixtures at once: textbook behaviour, measured values, mistakes.

use shiftgauge::equilibrium::{Affinity, Hold, Kind, RestOutcome, State, System, affinity, rest};
use shiftgauge::mixture::{Ion, SolutionModel};
use shiftgauge::problem::{Problem, words};

const LN_10: f64 = std::f64::consts::LN_10;
const ONE_BAR: Hold = Hold::Pressure { pressure_pa: 1e5 };
const ONE_KG: Hold = Hold::Solvent { water_kg: 1.0 };
const AT_25_C: f64 = 298.15;

fn state(hold: Hold, amounts_mol: &[f64]) -> State<'_> {
    State { temperature_k: AT_25_C, hold, amounts_mol }
}

/// K = x²/(1 − x)² for equal amounts: with K = 4 two thirds are turned, without any hold mattering.
#[test]
fn an_ester_forms_to_two_thirds_with_k_of_four() {
    let system = System::new(&[Kind::Liquid; 4], &[-1.0, -1.0, 1.0, 1.0]).unwrap();
    for hold in [ONE_BAR, Hold::Volume { volume_m3: 3.0 }, ONE_KG] {
        let end = rest(&system, &state(hold, &[1.0, 1.0, 0.0, 0.0]), 4f64.ln()).unwrap();
        assert_eq!(end.summary.outcome, RestOutcome::Rest);
        assert!((end.amounts_mol[2] - 2.0 / 3.0).abs() < 1e-15, "{:?}", end.amounts_mol);
    }
}

/// An inert liquid thins a dimer's monomers, so more of it falls apart; a gas beside does nothing.
#[test]
fn only_an_inert_of_the_same_mixture_matters() {
    let kinds = [Kind::Liquid, Kind::Liquid, Kind::Liquid, Kind::Gas];
    let system = System::new(&kinds, &[-1.0, 2.0, 0.0, 0.0]).unwrap();
    let formed = |liquid: f64, gas: f64| {
        let amounts = [1.0, 0.0, liquid, gas];
        rest(&system, &state(ONE_BAR, &amounts), -1.0).unwrap().amounts_mol[1]
    };
    assert!(formed(5.0, 0.0) > formed(0.0, 0.0));
    assert_eq!(formed(5.0, 7.0), formed(5.0, 0.0));
}

/// Source: CO2(g) = CO2(aq), log10 K = −1.47 mol/(kg bar) at 25 °C, Plummer and Busenberg (1982).
/// Under pure CO2 at 2 bar, plenty of it: m = 2 · 10^−1.47, in any mass of water.
#[test]
fn a_gas_dissolves_by_henrys_law() {
    let system = System::new(&[Kind::Gas, Kind::Solute], &[-1.0, 1.0]).unwrap();
    for water_kg in [0.3, 1.0, 20.0] {
        let hold = Hold::PressureAndSolvent { pressure_pa: 2e5, water_kg };
        let end = rest(&system, &state(hold, &[5.0, 0.0]), -1.47 * LN_10).unwrap();
        let molality = end.amounts_mol[1] / water_kg;
        assert!((molality / (2.0 * libm::exp(-1.47 * LN_10)) - 1.0).abs() < 1e-14, "{molality}");
    }
    // With too little of it the gas goes as a whole.
    let hold = Hold::PressureAndSolvent { pressure_pa: 2e5, water_kg: 1000.0 };
    let end = rest(&system, &state(hold, &[5.0, 0.0]), -1.47 * LN_10).unwrap();
    assert_eq!(end.summary.outcome, RestOutcome::PhaseExhausted);
    assert_eq!(end.amounts_mol, [0.0, 5.0]);
    assert!(end.summary.affinity.finite().unwrap() > 0.0);
}

/// A pure liquid under its own vapour at held pressure boils away, or the vapour condenses, as a
/// whole; at the boiling pressure any extent is at rest.
#[test]
fn a_boiling_liquid_has_no_state_of_rest_between_its_limits() {
    let system = System::new(&[Kind::Liquid, Kind::Gas], &[-1.0, 1.0]).unwrap();
    let end = |ln_k| rest(&system, &state(ONE_BAR, &[1.0, 0.5]), ln_k).unwrap();
    assert_eq!(end(0.1).amounts_mol, [0.0, 1.5]);
    assert_eq!(end(-0.1).amounts_mol, [1.5, 0.0]);
    assert_eq!(end(0.1).summary.outcome, RestOutcome::RanToItsLimit);
    assert_eq!(end(0.0).summary.outcome, RestOutcome::AnyExtentIsAtRest);
}

/// The dissociation quotient in molalities, as −log10, in a salt solution.
fn apparent_pk(kinds: &[Kind], nu: &[f64], charges: &[i32], start: &[f64], pk: f64) -> f64 {
    let ions: Vec<Ion> = charges.iter().map(|charge| Ion::new(*charge)).collect();
    let system = System::new(kinds, nu).unwrap();
    let system = system.with_solution(SolutionModel::Davies, &ions).unwrap();
    let end = rest(&system, &state(ONE_KG, start), -pk * LN_10).unwrap();
    let each = end.ln_amounts.iter().zip(nu).zip(kinds);
    let solutes = each.filter(|((_, nu), kind)| **kind == Kind::Solute && **nu != 0.0);
    -solutes.map(|((ln_amount, nu), _)| nu * ln_amount.unwrap()).sum::<f64>() / LN_10
}

/// Sources, at 25 °C in 0.1 mol/kg sodium chloride: pKw 13.78, C. F. Baes and R. E. Mesmer, The
/// Hydrolysis of Cations (1976); acetic acid 4.54, H. S. Harned and F. C. Hickey, J. Am. Chem. Soc.
/// 59 (1937) 1284; both from memory, 0.03 allowed.
#[test]
fn dissociation_in_a_salt_solution_has_the_measured_apparent_constant() {
    use Kind::{Solute, Solvent};
    let water = apparent_pk(
        &[Solvent, Solute, Solute, Solute, Solute],
        &[-1.0, 1.0, 1.0, 0.0, 0.0],
        &[0, 1, -1, 1, -1],
        &[0.0, 0.0, 0.0, 0.1, 0.1],
        13.995,
    );
    assert!((water - 13.78).abs() < 0.03, "{water}");
    let acid = apparent_pk(
        &[Solute; 5],
        &[-1.0, 1.0, 1.0, 0.0, 0.0],
        &[0, 1, -1, 1, -1],
        &[0.01, 0.0, 0.0, 0.1, 0.1],
        4.756,
    );
    assert!((acid - 4.54).abs() < 0.03, "{acid}");
}

/// Source: S. Popoff and E. W. Neuman, J. Phys. Chem. 34 (1930) 1853, from memory: silver chloride
/// dissolves to 1.278e-5 mol/L in water and 1.427e-5 in 0.01 mol/L potassium nitrate. 1.5 % allowed
/// for the ratio: Davies' equation is good to about 1 % there.
#[test]
fn a_sparingly_soluble_salt_dissolves_more_in_a_salt_solution() {
    let kinds = [Kind::Ample, Kind::Solute, Kind::Solute, Kind::Solute, Kind::Solute];
    let ions = [0, 1, -1, 1, -1].map(Ion::new);
    let system = System::new(&kinds, &[-1.0, 1.0, 1.0, 0.0, 0.0]).unwrap();
    let system = system.with_solution(SolutionModel::Davies, &ions).unwrap();
    let dissolved = |salt: f64| {
        let end = rest(&system, &state(ONE_KG, &[0.0, 0.0, 0.0, salt, salt]), -9.75 * LN_10);
        end.unwrap().amounts_mol[1]
    };
    let ratio = dissolved(0.01) / dissolved(0.0);
    assert!((ratio / (1.427 / 1.278) - 1.0).abs() < 0.015, "{ratio}");
}

/// Steam over a brine: the water's activity is below one, so it takes less steam to be at rest.
#[test]
fn a_brine_has_a_lower_vapour_pressure_than_water() {
    let kinds = [Kind::Solvent, Kind::Gas, Kind::Gas, Kind::Solute, Kind::Solute];
    let ions = [0, 0, 0, 1, -1].map(Ion::new);
    let system = System::new(&kinds, &[-1.0, 1.0, 0.0, 0.0, 0.0]).unwrap();
    let system = system.with_solution(SolutionModel::Davies, &ions).unwrap();
    let hold = Hold::PressureAndSolvent { pressure_pa: 1e5, water_kg: 1.0 };
    let at = |salt: f64| {
        let amounts = [0.0, 0.0, 1.0, salt, salt];
        let end = rest(&system, &state(hold, &amounts), 0.03f64.ln()).unwrap();
        let left = state(hold, &end.amounts_mol);
        let left = affinity(&system, &left, 0.03f64.ln()).unwrap();
        assert!(matches!(left, Affinity::Finite(left) if left.abs() < 1e-14), "{left:?}");
        end.amounts_mol[1] / (end.amounts_mol[1] + 1.0)
    };
    assert!((at(0.0) - 0.03).abs() < 1e-15);
    // Raoult's share for 1 mol of ions in 55.5 mol of water, less what the charges do to it.
    let lowering = 1.0 - at(0.5) / 0.03;
    assert!((lowering - 0.0164).abs() < 0.001, "{lowering}");
}

type Row = (&'static str, &'static str, Result<System, Vec<Problem>>, Hold, f64);

#[test]
fn each_mistake_has_its_code_its_field_and_its_sentences() {
    use Kind::{Gas, Liquid, Pure, Solute, Solvent};
    let system = |kinds: &[Kind]| System::new(kinds, &[-1.0, 1.0]);
    let davies = |kinds: &[Kind], ions: &[Ion]| {
        system(kinds).and_then(|system| system.with_solution(SolutionModel::Davies, ions))
    };
    let ions = [1, -1].map(Ion::new);
    let thin = [Ion { charge: 1, size_pm: 0.0 }, Ion::new(-1)];
    let zero = Hold::Solvent { water_kg: 0.0 };
    let both = Hold::PressureAndSolvent { pressure_pa: 1e5, water_kg: f64::NAN };
    let volume = Hold::Volume { volume_m3: 1.0 };
    let t = AT_25_C;
    let rows: Vec<Row> = vec![
        ("liquid-with-solutes", "species", system(&[Liquid, Solute]), ONE_KG, t),
        ("liquid-with-solutes", "species", system(&[Liquid, Solvent]), ONE_KG, t),
        ("solutes-with-gas", "species", system(&[Gas, Solute]), ONE_BAR, t),
        ("solutes-with-gas", "species", system(&[Gas, Solute]), volume, t),
        ("gas-holds-solvent", "hold", system(&[Gas, Solute]), ONE_KG, t),
        ("gas-holds-solvent", "hold", system(&[Gas, Pure]), ONE_KG, t),
        ("solutes-hold-pressure", "hold", system(&[Solute, Pure]), ONE_BAR, t),
        ("water-not-positive", "water_kg", system(&[Solute, Solute]), zero, t),
        ("number-not-finite", "water_kg", system(&[Gas, Solute]), both, t),
        ("model-needs-water", "hold", davies(&[Solute, Solute], &ions), volume, t),
        (
            "temperature-outside-solution",
            "temperature_k",
            davies(&[Solute, Solute], &ions),
            ONE_KG,
            500.0,
        ),
        ("lengths-differ", "ions", davies(&[Solute, Solute], &ions[..1]), ONE_KG, t),
        (
            "charge-out-of-range",
            "ions[1].charge",
            davies(&[Solute, Solute], &[1, 10].map(Ion::new)),
            ONE_KG,
            t,
        ),
        ("ion-size-out-of-range", "ions[0].size_pm", davies(&[Solute, Solute], &thin), ONE_KG, t),
    ];
    for (code, field, system, hold, temperature_k) in rows {
        let state = State { temperature_k, hold, amounts_mol: &[1.0, 1.0] };
        let found = system.and_then(|system| rest(&system, &state, 0.0)).unwrap_err();
        let shown: Vec<_> =
            found.iter().map(|one| (one.code.as_str(), one.field.as_str())).collect();
        assert_eq!(shown, [(code, field)]);
        let said = words::say(&found[0], words::Language::En);
        assert!(!said.message.contains('{') && !said.hint.contains('{'), "{said:?}");
        assert!(said.message.ends_with('.') && said.hint.ends_with('.'), "{said:?}");
    }
}

/// A model, and inert solutes, do not stand in the way of a reaction that has no part in water.
#[test]
fn a_gas_reaction_beside_a_solution_needs_no_water() {
    let kinds = [Kind::Gas, Kind::Gas, Kind::Solute];
    let system = System::new(&kinds, &[-1.0, 1.0, 0.0]).unwrap();
    let ions = [0, 0, 1].map(Ion::new);
    let system = system.with_solution(SolutionModel::Davies, &ions).unwrap();
    assert!(!system.is_corrected());
    let end = rest(&system, &state(ONE_BAR, &[1.0, 0.0, 0.2]), 3f64.ln()).unwrap();
    assert!((end.amounts_mol[1] - 0.75).abs() < 1e-15);
}
