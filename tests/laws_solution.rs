//! Laws that rest keeps with activity coefficients, on thousands of solutions drawn at random.

use crate::laws_rest::Draws;
use shiftgauge::equilibrium::{
    Affinity, Hold, Kind, Rest, RestOutcome, State, System, activities, affinity, quotient, rest,
};
use shiftgauge::mixture::{Ion, SolutionModel};

#[derive(Debug, Clone)]
struct Case {
    kinds: Vec<Kind>,
    nu: Vec<f64>,
    ions: Vec<Ion>,
    model: SolutionModel,
    kelvin: f64,
    hold: Hold,
    amounts: Vec<f64>,
    ln_k: f64,
}

impl Case {
    fn system(&self) -> System {
        System::new(&self.kinds, &self.nu).unwrap().with_solution(self.model, &self.ions).unwrap()
    }

    fn state<'a>(&self, amounts_mol: &'a [f64]) -> State<'a> {
        State { temperature_k: self.kelvin, hold: self.hold, amounts_mol }
    }

    fn solve(&self) -> Rest {
        let found = rest(&self.system(), &self.state(&self.amounts), self.ln_k);
        found.unwrap_or_else(|found| panic!("{found:?}: {self:?}"))
    }
}

const MODELS: [SolutionModel; 3] =
    [SolutionModel::Ideal, SolutionModel::Davies, SolutionModel::DebyeHueckel];

/// A kilogram or so of water with up to about 1 mol/kg in it; charges up to two.
fn usual(draws: &mut Draws) -> Case {
    let kinds = [
        Kind::Solute,
        Kind::Solute,
        Kind::Solute,
        Kind::Solute,
        Kind::Gas,
        Kind::Pure,
        Kind::Ample,
        Kind::Solvent,
    ];
    let count = 3 + draws.below(5);
    let mut kinds: Vec<Kind> = (0..count).map(|_| draws.pick(&kinds)).collect();
    (kinds[0], kinds[1]) = (Kind::Solute, Kind::Solute);
    let mut nu: Vec<f64> =
        (0..count).map(|_| draws.pick(&[-2.0, -1.0, -1.0, 0.0, 0.0, 1.0, 1.0, 2.0, 0.5])).collect();
    (nu[0], nu[1]) = (-1.0, 1.0);
    let ions = (0..count)
        .map(|_| Ion {
            charge: draws.pick(&[-2, -1, -1, 0, 1, 1, 2]),
            size_pm: draws.between(250.0, 900.0),
        })
        .collect();
    let water_kg = draws.between(0.5, 2.0);
    let hold = if draws.below(2) == 0 {
        Hold::PressureAndSolvent { pressure_pa: draws.between(0.5e5, 5e5), water_kg }
    } else {
        Hold::VolumeAndSolvent { volume_m3: draws.between(1e-3, 0.1), water_kg }
    };
    let amounts = (0..count)
        .map(|_| if draws.below(8) == 0 { 0.0 } else { libm::exp(draws.between(-14.0, -1.0)) })
        .collect();
    Case {
        kinds,
        nu,
        ions,
        model: draws.pick(&MODELS),
        kelvin: draws.between(274.0, 373.0),
        hold,
        amounts,
        ln_k: draws.between(-20.0, 20.0),
    }
}

fn each_usual(seed: u64, mut law: impl FnMut(&Case, &Rest)) {
    let mut draws = Draws::new(seed);
    for _ in 0..2000 {
        let case = usual(&mut draws);
        let end = case.solve();
        law(&case, &end);
    }
}

/// Whether two states are the same; the condition of the ideal state stands for the true one.
fn same(case: &Case, first: &Rest, second: &Rest, second_amounts: &[f64], why: &str) {
    assert_eq!(first.summary.outcome, second.summary.outcome, "{why}: {case:?}");
    let allowed = 1e-11 + 1e-13 * first.summary.condition;
    for (species, (&one, &two)) in first.amounts_mol.iter().zip(second_amounts).enumerate() {
        assert!(
            (one - two).abs() <= allowed * one.abs().max(two.abs()),
            "{why}: species {species}, {one:?} and {two:?}: {case:?}"
        );
    }
}

#[test]
fn the_true_affinity_vanishes_at_rest() {
    let (mut at_rest, mut worst) = (0, 0.0_f64);
    each_usual(21, |case, end| {
        if end.summary.outcome != RestOutcome::Rest {
            return;
        }
        at_rest += 1;
        let left = affinity(&case.system(), &case.state(&end.amounts_mol), case.ln_k).unwrap();
        let Affinity::Finite(left) = left else { panic!("{left:?} at rest: {case:?}") };
        worst = worst.max(left.abs()).max(end.summary.residual);
        assert!(left.abs() < 1e-10, "A/RT = {left:e}: {case:?}");
        assert!(end.summary.residual < 1e-10, "residual {:e}", end.summary.residual);
    });
    println!("{at_rest} at rest, A/RT at most {worst:.1e}");
    assert!(at_rest > 800, "only {at_rest} of 2000 were at rest");
}

#[test]
fn a_reaction_written_backwards_comes_to_the_same_rest() {
    each_usual(22, |case, end| {
        let nu = case.nu.iter().map(|nu| -nu).collect();
        let back = Case { nu, ln_k: -case.ln_k, ..case.clone() }.solve();
        same(case, end, &back, &back.amounts_mol, "backwards");
    });
}

#[test]
fn a_multiple_of_a_reaction_comes_to_the_same_rest() {
    each_usual(23, |case, end| {
        for times in [2.0, 0.5] {
            let nu = case.nu.iter().map(|nu| times * nu).collect();
            let multiple = Case { nu, ln_k: times * case.ln_k, ..case.clone() }.solve();
            same(case, end, &multiple, &multiple.amounts_mol, "multiple");
        }
    });
}

#[test]
fn the_order_of_the_species_does_not_matter() {
    each_usual(24, |case, end| {
        let mut turned = case.clone();
        turned.kinds.reverse();
        turned.nu.reverse();
        turned.ions.reverse();
        turned.amounts.reverse();
        let turned = turned.solve();
        let back: Vec<f64> = turned.amounts_mol.iter().rev().copied().collect();
        same(case, end, &turned, &back, "turned round");
    });
}

/// Both laws have γ = 1 for what carries no charge.
#[test]
fn without_charges_the_solution_is_ideal() {
    each_usual(25, |case, _| {
        let ions = vec![Ion::NEUTRAL; case.kinds.len()];
        let neutral = Case { ions, ..case.clone() };
        let ideal = Case { model: SolutionModel::Ideal, ..neutral.clone() };
        let (neutral, ideal) = (neutral.solve(), ideal.solve());
        assert_eq!(neutral.amounts_mol, ideal.amounts_mol, "{case:?}");
    });
}

/// A salt that takes no part draws a dissociation into ions along, as long as Davies' γ falls.
#[test]
fn an_inert_salt_draws_a_weak_acid_apart() {
    let kinds = [Kind::Solute; 5];
    let ions = [0, 1, -1, 1, -1].map(Ion::new);
    let system = System::new(&kinds, &[-1.0, 1.0, 1.0, 0.0, 0.0]).unwrap();
    let system = system.with_solution(SolutionModel::Davies, &ions).unwrap();
    let hold = Hold::Solvent { water_kg: 1.0 };
    let mut last = 0.0;
    for salt in [0.0, 1e-4, 1e-3, 1e-2, 0.05, 0.1, 0.2] {
        let amounts_mol = &[0.1, 0.0, 0.0, salt, salt];
        let state = State { temperature_k: 298.15, hold, amounts_mol };
        let end = rest(&system, &state, -10.95).unwrap();
        assert!(end.amounts_mol[1] > last, "{} after {last} with {salt}", end.amounts_mol[1]);
        last = end.amounts_mol[1];
    }
}

/// Any charge, any amount, any size: numbers that are finite, or problems.
#[test]
fn no_solution_panics_or_gives_a_number_that_is_not_finite() {
    let mut draws = Draws::new(26);
    let mut outcomes = std::collections::BTreeMap::<&str, usize>::new();
    let (mut worst, mut steps) = (0.0_f64, 0);
    for _ in 0..40_000 {
        let mut case = usual(&mut draws);
        for ion in &mut case.ions {
            ion.charge = draws.below(21) as i32 - 10;
            ion.size_pm = draws.pick(&[10.0, 400.0, 1e4, 0.0, f64::NAN, 400.0, 400.0, 400.0]);
        }
        for amount in &mut case.amounts {
            if draws.below(3) == 0 {
                *amount = libm::exp(draws.between(-700.0, 650.0));
            }
        }
        case.ln_k = draws.between(-300.0, 300.0);
        case.kelvin = draws.between(250.0, 500.0);
        let system = System::new(&case.kinds, &case.nu).unwrap();
        let Ok(system) = system.with_solution(case.model, &case.ions) else { continue };
        let state = case.state(&case.amounts);
        let Ok(end) = rest(&system, &state, case.ln_k) else { continue };
        let summary = end.summary;
        *outcomes.entry(summary.outcome.as_str()).or_default() += 1;
        steps = steps.max(summary.iterations);
        let found = activities(&system, &state).unwrap();
        assert!(quotient(&system, &state).is_ok());
        let logs = end.ln_amounts.iter().chain(&found.ln_activities).flatten();
        let others = [summary.extent_mol, summary.residual, summary.condition];
        let affinity = summary.affinity.finite();
        for number in logs.chain(&end.amounts_mol).chain(&others).chain(&affinity) {
            assert!(number.is_finite(), "{summary:?} {case:?}");
        }
        if summary.outcome == RestOutcome::Rest {
            worst = worst.max(summary.residual);
        }
    }
    println!("{outcomes:?}, residual at most {worst:.1e}, up to {steps} steps");
    assert!(outcomes.values().sum::<usize>() > 3000, "{outcomes:?}");
    assert!(worst < 1e-8, "{worst:e}");
}
