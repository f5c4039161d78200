//! Laws that every state of rest keeps, on thousands of problems drawn at random.

use shiftgauge::equilibrium::{
    Affinity, Hold, Kind, Rest, RestOutcome, State, System, affinity, quotient, rest,
};

/// Numbers that look random and are the same in every run: Marsaglia's xorshift.
pub struct Draws(u64);

impl Draws {
    pub fn new(seed: u64) -> Draws {
        Draws(seed.wrapping_mul(0x9E37_79B9_7F4A_7C15) | 1)
    }

    fn next(&mut self) -> u64 {
        self.0 ^= self.0 << 13;
        self.0 ^= self.0 >> 7;
        self.0 ^= self.0 << 17;
        self.0
    }

    pub fn unit(&mut self) -> f64 {
        (self.next() >> 11) as f64 / (1u64 << 53) as f64
    }

    pub fn between(&mut self, low: f64, high: f64) -> f64 {
        low + (high - low) * self.unit()
    }

    pub fn below(&mut self, count: usize) -> usize {
        (self.next() % count as u64) as usize
    }

    pub fn pick<T: Copy>(&mut self, choices: &[T]) -> T {
        choices[self.below(choices.len())]
    }

    fn power_of_ten(&mut self, low: f64, high: f64) -> f64 {
        10f64.powf(self.between(low, high))
    }
}

#[derive(Debug, Clone)]
struct Case {
    kinds: Vec<Kind>,
    nu: Vec<f64>,
    kelvin: f64,
    hold: Hold,
    amounts: Vec<f64>,
    ln_k: f64,
}

impl Case {
    fn solve(&self) -> Rest {
        let state =
            State { temperature_k: self.kelvin, hold: self.hold, amounts_mol: &self.amounts };
        let system = System::new(&self.kinds, &self.nu).unwrap();
        rest(&system, &state, self.ln_k).unwrap_or_else(|found| panic!("{found:?}: {self:?}"))
    }

    fn map_amounts(&self, change: impl Fn(usize, f64) -> f64) -> Case {
        let amounts = self.amounts.iter().enumerate().map(|(i, &n)| change(i, n)).collect();
        Case { amounts, ..self.clone() }
    }
}

/// A problem of the plant's size: amounts of 1e-6 to 10 mol, K of 1e-9 to 1e9.
fn usual(draws: &mut Draws) -> Case {
    let family = draws.below(8);
    let kinds: &[Kind] = match family {
        0 | 1 => &[Kind::Solute, Kind::Solute, Kind::Pure],
        2 => &[Kind::Liquid, Kind::Liquid, Kind::Liquid, Kind::Pure, Kind::Ample],
        3 => &[Kind::Gas, Kind::Gas, Kind::Solute, Kind::Solute, Kind::Pure, Kind::Ample],
        4 => &[Kind::Gas, Kind::Gas, Kind::Liquid, Kind::Liquid, Kind::Pure],
        _ => &[Kind::Gas, Kind::Gas, Kind::Gas, Kind::Pure, Kind::Ample],
    };
    let count = 2 + draws.below(5);
    let kinds: Vec<Kind> = (0..count).map(|_| draws.pick(kinds)).collect();
    let mut nu: Vec<f64> = (0..count)
        .map(|_| draws.pick(&[-2.0, -1.0, -1.0, -0.5, 0.0, 0.5, 1.0, 1.0, 3.0, 0.7]))
        .collect();
    (nu[0], nu[1]) = (-1.0, 1.0);
    let amounts = (0..count)
        .map(|_| if draws.below(8) == 0 { 0.0 } else { draws.power_of_ten(-6.0, 1.0) })
        .collect();
    let pressure_pa = draws.power_of_ten(3.0, 7.0);
    let volume_m3 = draws.power_of_ten(-4.0, 1.0);
    let water_kg = draws.power_of_ten(-3.0, 3.0);
    let hold = match (family, draws.below(2) == 0) {
        (1, _) => Hold::Solvent { water_kg },
        (3, true) => Hold::VolumeAndSolvent { volume_m3, water_kg },
        (3, false) => Hold::PressureAndSolvent { pressure_pa, water_kg },
        (0, _) | (_, true) => Hold::Volume { volume_m3 },
        (_, false) => Hold::Pressure { pressure_pa },
    };
    Case {
        kinds,
        nu,
        kelvin: draws.between(250.0, 1800.0),
        hold,
        amounts,
        ln_k: draws.between(-20.0, 20.0),
    }
}

/// So many times the volume and the water.
fn more_room(hold: Hold, times: f64) -> Hold {
    match hold {
        Hold::Pressure { .. } => hold,
        Hold::Volume { volume_m3 } => Hold::Volume { volume_m3: volume_m3 * times },
        Hold::Solvent { water_kg } => Hold::Solvent { water_kg: water_kg * times },
        Hold::PressureAndSolvent { pressure_pa, water_kg } => {
            Hold::PressureAndSolvent { pressure_pa, water_kg: water_kg * times }
        }
        Hold::VolumeAndSolvent { volume_m3, water_kg } => {
            Hold::VolumeAndSolvent { volume_m3: volume_m3 * times, water_kg: water_kg * times }
        }
    }
}

/// Whether two states are the same to a share of each amount that the condition allows.
fn same(case: &Case, first: &Rest, second: &Rest, second_amounts: &[f64], why: &str) {
    assert_eq!(first.summary.outcome, second.summary.outcome, "{why}: {case:?}");
    let allowed = 1e-12 + 64.0 * f64::EPSILON * first.summary.condition * (1.0 + case.ln_k.abs());
    for (species, (&one, &two)) in first.amounts_mol.iter().zip(second_amounts).enumerate() {
        let apart = (one - two).abs();
        assert!(
            apart <= allowed * one.abs().max(two.abs()),
            "{why}: species {species}, {one:?} and {two:?}, allowed {allowed:.1e}: {case:?}"
        );
    }
}

fn each_usual(seed: u64, mut law: impl FnMut(&Case, &Rest)) {
    let mut draws = Draws::new(seed);
    for _ in 0..4000 {
        let case = usual(&mut draws);
        let end = case.solve();
        law(&case, &end);
    }
}

#[test]
fn rest_is_stationary() {
    let mut at_rest = 0;
    each_usual(1, |case, end| {
        if end.summary.outcome != RestOutcome::Rest {
            return;
        }
        at_rest += 1;
        let state =
            State { temperature_k: case.kelvin, hold: case.hold, amounts_mol: &end.amounts_mol };
        let system = System::new(&case.kinds, &case.nu).unwrap();
        let left = affinity(&system, &state, case.ln_k).unwrap();
        let Affinity::Finite(left) = left else { panic!("{left:?} at rest: {case:?}") };
        // Rounding each amount once changes ln Q by up to Σ|ν| units of 1e-16.
        assert!(left.abs() < 1e-13, "A/RT = {left:e}: {case:?}");
        assert!(end.summary.residual < 1e-13, "residual {:e}", end.summary.residual);
    });
    assert!(at_rest > 1500, "only {at_rest} of 4000 were at rest");
}

#[test]
fn an_affinity_that_is_left_has_the_sign_of_the_way_that_is_closed() {
    let mut exhausted = 0;
    each_usual(2, |case, end| {
        if end.summary.outcome != RestOutcome::PhaseExhausted {
            return;
        }
        exhausted += 1;
        let left = end.summary.affinity.finite().unwrap();
        let used_up = case.nu.iter().zip(&case.kinds).enumerate().any(|(i, (nu, kind))| {
            let phase = case.kinds.iter().zip(&end.amounts_mol).filter(|(other, _)| *other == kind);
            let gone = *kind == Kind::Pure || phase.map(|(_, amount)| amount).sum::<f64>() == 0.0;
            nu * left < 0.0 && gone && end.amounts_mol[i] == 0.0
        });
        assert!(used_up, "A/RT = {left:e} and no phase is used up: {case:?}");
    });
    assert!(exhausted > 200, "only {exhausted} of 4000");
}

#[test]
fn a_reaction_written_backwards_comes_to_the_same_rest() {
    each_usual(3, |case, end| {
        let nu = case.nu.iter().map(|nu| -nu).collect();
        let back = Case { nu, ln_k: -case.ln_k, ..case.clone() }.solve();
        same(case, end, &back, &back.amounts_mol, "backwards");
    });
}

#[test]
fn a_multiple_of_a_reaction_comes_to_the_same_rest() {
    each_usual(4, |case, end| {
        for times in [2.0, 0.5, 3.0, 0.1] {
            let nu = case.nu.iter().map(|nu| times * nu).collect();
            let multiple = Case { nu, ln_k: times * case.ln_k, ..case.clone() };
            // A tenth of ν and of ln K are rounded; gas in exact proportion may then not be.
            let rounded = times == 0.1 && end.summary.outcome != RestOutcome::Rest;
            if !rounded {
                let multiple = multiple.solve();
                same(case, end, &multiple, &multiple.amounts_mol, "multiple");
            }
        }
    });
}

#[test]
fn more_of_everything_at_the_same_pressure_is_more_of_the_same() {
    each_usual(5, |case, end| {
        for times in [3.0, 1e-9, 1e40] {
            let hold = more_room(case.hold, times);
            let more = Case { hold, ..case.map_amounts(|_, n| n * times) }.solve();
            let back: Vec<f64> = more.amounts_mol.iter().map(|n| n / times).collect();
            same(case, end, &more, &back, "scaled");
        }
    });
}

#[test]
fn the_order_of_the_species_does_not_matter() {
    each_usual(6, |case, end| {
        let turned = Case {
            kinds: case.kinds.iter().rev().copied().collect(),
            nu: case.nu.iter().rev().copied().collect(),
            amounts: case.amounts.iter().rev().copied().collect(),
            ..case.clone()
        };
        let turned = turned.solve();
        let back: Vec<f64> = turned.amounts_mol.iter().rev().copied().collect();
        same(case, end, &turned, &back, "turned round");
    });
}

#[test]
fn every_amount_changes_by_nu_times_the_extent() {
    each_usual(7, |case, end| {
        let extent = end.summary.extent_mol;
        for (species, &kind) in case.kinds.iter().enumerate() {
            let expected = case.amounts[species] + case.nu[species] * extent;
            let size = case.amounts[species] + (case.nu[species] * extent).abs();
            let found = end.amounts_mol[species];
            if kind == Kind::Ample {
                assert_eq!(found, case.amounts[species]);
            } else {
                let reach = end.summary.extent_max_mol.unwrap_or(0.0)
                    - end.summary.extent_min_mol.unwrap_or(0.0);
                let size = size + (case.nu[species] * reach).abs();
                assert!((found - expected).abs() <= 4.0 * f64::EPSILON * size, "{case:?}");
            }
        }
    });
}

#[test]
fn a_state_at_rest_stays_there() {
    each_usual(8, |case, end| {
        let again = case.map_amounts(|species, _| end.amounts_mol[species]).solve();
        let still = [RestOutcome::Rest, RestOutcome::PhaseExhausted, RestOutcome::RanToItsLimit];
        if still.contains(&end.summary.outcome) {
            // The rounding of each amount moves rest a little where it is hard to tell.
            let allowed = 1e-13 + 1e-14 * end.summary.condition;
            for (&one, &two) in end.amounts_mol.iter().zip(&again.amounts_mol) {
                assert!((one - two).abs() <= allowed * one.max(two), "{one} {two}: {case:?}");
            }
        }
    });
}

/// Anything at all: wild kinds, powers, sizes, zeros, and numbers that are not allowed.
fn wild(draws: &mut Draws) -> Case {
    let count = draws.below(7);
    let families: [&[Kind]; 7] = [
        &[Kind::Gas, Kind::Pure, Kind::Ample],
        &[Kind::Gas],
        &[Kind::Solute, Kind::Pure],
        &[Kind::Gas, Kind::Pure, Kind::Ample, Kind::Solute],
        &[Kind::Liquid, Kind::Pure],
        &[Kind::Gas, Kind::Gas, Kind::Liquid, Kind::Liquid, Kind::Ample],
        &[Kind::Gas, Kind::Gas, Kind::Solute, Kind::Solute, Kind::Solvent, Kind::Liquid],
    ];
    let family = families[draws.below(10).min(6)];
    let family = if draws.below(3) > 0 { families[draws.below(6)] } else { family };
    let kinds = (0..count).map(|_| draws.pick(family)).collect();
    let whole = draws.below(2) == 0;
    let number = |draws: &mut Draws| match draws.below(400) {
        0 => draws.pick(&[f64::NAN, f64::INFINITY, -1.0, 1e308, -0.0, f64::NEG_INFINITY]),
        1..60 => 0.0,
        60..90 => draws.pick(&[5e-324, 1e-310, f64::MIN_POSITIVE, 1e300, 1.0, 1.0 + f64::EPSILON]),
        90..200 => draws.power_of_ten(-323.0, 300.0),
        200..300 => f64::from(draws.below(4) as u8),
        _ => draws.power_of_ten(-3.0, 2.0),
    };
    let nu = (0..count)
        .map(|_| match draws.below(60) {
            0 => draws.pick(&[f64::NAN, 1e-3, -1e3, 1e4, -1e-9, 997.0]),
            _ if whole => draws.below(7) as f64 - 3.0,
            _ => draws.between(-3.0, 3.0),
        })
        .collect();
    let held = match draws.below(30) {
        0 => number(draws),
        1 => draws.power_of_ten(-300.0, 300.0),
        _ => draws.power_of_ten(-4.0, 7.0),
    };
    let ln_k = match draws.below(10) {
        0 => draws.pick(&[0.0, 1e5, -1e5, 1e-320, f64::NAN, 690.0, -1e6]),
        1..4 => draws.between(-700.0, 700.0),
        _ => draws.between(-30.0, 30.0),
    };
    let water_kg = if draws.below(30) == 0 { number(draws) } else { draws.power_of_ten(-3.0, 3.0) };
    let hold = match draws.below(8) {
        0..3 => Hold::Pressure { pressure_pa: held },
        3..5 => Hold::Volume { volume_m3: held },
        5 => Hold::Solvent { water_kg },
        6 => Hold::PressureAndSolvent { pressure_pa: held, water_kg },
        _ => Hold::VolumeAndSolvent { volume_m3: held, water_kg },
    };
    let kelvin = if draws.below(50) == 0 { number(draws) } else { draws.between(200.0, 2000.0) };
    let amounts = (0..count).map(|_| number(draws)).collect();
    Case { kinds, nu, kelvin, hold, amounts, ln_k }
}

#[test]
fn no_input_panics_or_gives_a_number_that_is_not_finite() {
    let mut draws = Draws::new(9);
    let (mut solved, mut steps) = (0, 0);
    let mut seen = std::collections::BTreeMap::<String, usize>::new();
    for _ in 0..200_000 {
        let case = wild(&mut draws);
        let state =
            State { temperature_k: case.kelvin, hold: case.hold, amounts_mol: &case.amounts };
        let Ok(system) = System::new(&case.kinds, &case.nu) else { continue };
        let end = match rest(&system, &state, case.ln_k) {
            Ok(end) => end,
            Err(problems) => {
                assert!(!problems.is_empty());
                continue;
            }
        };
        solved += 1;
        let summary = end.summary;
        *seen.entry(format!("{:?}", summary.outcome)).or_default() += 1;
        assert!(quotient(&system, &state).is_ok());
        let limits = [summary.extent_min_mol, summary.extent_max_mol];
        let others = [summary.extent_mol, summary.residual, summary.condition];
        let affinity = summary.affinity.finite();
        let logs = end.ln_amounts.iter().flatten();
        let all = logs.chain(limits.iter().flatten()).chain(&others).chain(&affinity);
        for number in all.chain(&end.amounts_mol) {
            assert!(number.is_finite(), "{summary:?} {case:?}");
        }
        assert!(end.amounts_mol.iter().all(|&amount| amount >= 0.0), "{summary:?} {case:?}");
        assert!(summary.residual < 1e-9, "{summary:?} {case:?}");
        // With the activity of the solvent, rest is found many times over.
        let most = if system.is_corrected() { 1000 } else { 60 };
        assert!(summary.iterations <= most, "{summary:?} {case:?}");
        steps = steps.max(summary.iterations);
    }
    println!("{solved} solved in up to {steps} steps: {seen:?}");
    assert!(solved > 80_000, "only {solved} of 200000 could be solved");
    assert_eq!(seen.len(), 6, "{seen:?}");
}
