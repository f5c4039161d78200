//! Laws that every nudge keeps, on plants drawn at random.

use crate::laws_rest::Draws;
use crate::nudges::{Row, at, mirrored, sentence, within};
use shiftgauge::advice::{Direction, Knob, Knobs, Nudge, nudge, nudges};
use shiftgauge::advice::{Goal, SweepRequest, Wanted, sweep, target};
use shiftgauge::equilibrium::{Hold, RestOutcome};

/// A reaction of the plant's size with at least one species of each side.
fn drawn(draws: &mut Draws) -> Row {
    let kinds = draws.pick(&[
        "gg", "ggg", "gggg", "ggggg", "gpg", "ppgg", "agg", "ss", "sss", "ssss", "ll", "llll",
        "lpl", "gsg", "gssp",
    ]);
    let mut nu: Vec<f64> =
        kinds.chars().map(|_| draws.pick(&[-3.0, -1.0, -0.5, 0.0, 0.5, 1.0, 2.0])).collect();
    (nu[0], nu[1]) = (-1.0, 1.0);
    let amounts: Vec<f64> = kinds.chars().map(|_| draws.between(0.05, 3.0)).collect();
    let hold = if kinds.starts_with('s') || draws.below(2) == 0 {
        within(draws.between(0.001, 1.0))
    } else {
        at(draws.between(0.2, 200.0))
    };
    let hold = match hold {
        hold if !kinds.contains('g') || !kinds.contains('s') => hold,
        Hold::Pressure { pressure_pa } => Hold::PressureAndSolvent { pressure_pa, water_kg: 3.0 },
        _ => Hold::VolumeAndSolvent { volume_m3: draws.between(0.001, 1.0), water_kg: 3.0 },
    };
    let row = Row::new(kinds, &nu, hold, &amounts, draws.between(-8.0, 8.0));
    Row { kelvin: draws.between(300.0, 1200.0), ..row.heat(draws.between(-200.0, 200.0)) }
}

fn each(seed: u64, mut law: impl FnMut(&Row, &mut Draws)) {
    let mut draws = Draws::new(seed);
    for _ in 0..1500 {
        let row = drawn(&mut draws);
        law(&row, &mut draws);
    }
}

fn all(row: &Row) -> Vec<Nudge> {
    row.with(|plant| nudges(plant).unwrap())
}

fn turned(way: Option<Direction>) -> Option<Direction> {
    way.map(|way| match way {
        Direction::Forward => Direction::Reverse,
        Direction::Reverse => Direction::Forward,
    })
}

/// Whether two numbers agree to a share, or are both next to nothing beside `size`.
fn close(a: f64, b: f64, share: f64, size: f64) -> bool {
    (a - b).abs() <= share * a.abs().max(b.abs()) + 1e-12 * size
}

#[test]
fn a_slope_is_that_of_two_rests_close_by() {
    let mut compared = 0;
    each(11, |row, _| {
        row.with(|plant| {
            let mut knobs = Knobs::new(plant).unwrap();
            if knobs.now().outcome != RestOutcome::Rest || knobs.now().condition > 30.0 {
                return;
            }
            let every = [Knob::Temperature, Knob::Pressure, Knob::Volume, Knob::Dilution];
            let amounts = (0..row.nu.len()).map(Knob::Amount);
            for knob in every.into_iter().chain(amounts) {
                let held = match knob {
                    Knob::Pressure => row.hold.pressure_pa().is_some(),
                    Knob::Volume => row.hold.volume_m3().is_some(),
                    _ => true,
                };
                let Some(value) = knobs.value(knob).filter(|_| held) else { continue };
                let found = nudge(&mut knobs, knob, 1e-3 * value);
                let step = 3e-5 * value;
                let mut extent = |value: f64| knobs.rest(&[(knob, value)]).unwrap().extent_mol;
                // Four points: the error of the difference is of fourth order in the step.
                let near = (extent(value + step) - extent(value - step)) / (2.0 * step);
                let far = (extent(value + 2.0 * step) - extent(value - 2.0 * step)) / (4.0 * step);
                let difference = (4.0 * near - far) / 3.0;
                let slope = found.derivative.unwrap();
                let wrong = (difference - slope).abs() * value;
                // The rounding of an extent over the step, and its fourth-order error.
                let rounding = 16.0 * f64::EPSILON / 3e-5 * knobs.now().extent_mol.abs();
                assert!(
                    wrong < 1e-9 * (1.0 + (slope * value).abs()) + rounding,
                    "{knob:?}: {difference:e} and {slope:e} in {row:?}"
                );
                compared += 1;
            }
        });
    });
    assert!(compared > 3000, "only {compared} slopes were compared");
}

#[test]
fn the_reverse_equation_moves_the_other_way() {
    each(12, |row, _| {
        let reverse = mirrored(row.clone());
        let back = all(&reverse);
        for found in all(row).iter().filter(|found| found.step > 0.0) {
            let same = |other: &&Nudge| other.knob == found.knob && other.step > 0.0;
            let other = back.iter().find(same).unwrap();
            assert_eq!(other.direction, turned(found.direction), "{found:?} {other:?} {row:?}");
            assert_eq!(other.local, turned(found.local), "{found:?} {other:?} {row:?}");
            if let (Some(one), Some(two)) = (found.extent_change_mol, other.extent_change_mol) {
                assert!(close(one, -two, 1e-7, 1.0), "{one} {two}: {row:?}");
            }
        }
    });
}

#[test]
fn a_multiple_of_the_equation_changes_nothing() {
    each(13, |row, draws| {
        let times = draws.pick(&[0.5, 2.0, 3.0, 4.0]);
        let nu: Vec<f64> = row.nu.iter().map(|nu| nu * times).collect();
        let enthalpy = row.enthalpy.map(|heat| heat * times);
        let multiple = Row { nu, ln_k: row.ln_k * times, enthalpy, ..row.clone() };
        for (one, two) in all(row).iter().zip(&all(&multiple)) {
            assert_eq!((one.knob, one.direction), (two.knob, two.direction), "{one:?} {two:?}");
            for (a, b) in one.change_mol.iter().zip(&two.change_mol) {
                assert!(close(*a, *b, 1e-7, 1.0), "{one:?} {two:?}: {row:?}");
            }
        }
    });
}

#[test]
fn the_size_of_the_plant_changes_nothing() {
    each(14, |row, draws| {
        let times = draws.pick(&[1e-6, 0.1, 7.0, 1e9]);
        let amounts = row.amounts.iter().map(|amount| amount * times).collect();
        let hold = match row.hold {
            Hold::Volume { volume_m3 } => within(volume_m3 * times),
            Hold::PressureAndSolvent { pressure_pa, water_kg } => {
                Hold::PressureAndSolvent { pressure_pa, water_kg: water_kg * times }
            }
            Hold::VolumeAndSolvent { volume_m3, water_kg } => {
                let volume_m3 = volume_m3 * times;
                Hold::VolumeAndSolvent { volume_m3, water_kg: water_kg * times }
            }
            hold => hold,
        };
        let large = Row { amounts, hold, ..row.clone() };
        for (one, two) in all(row).iter().zip(&all(&large)) {
            assert_eq!((one.knob, one.direction), (two.knob, two.direction), "{one:?} {two:?}");
            assert_eq!(one.reason.code, two.reason.code, "{row:?}");
            // A gas that grows a thousandfold out of an ample phase is next to having no limit, and
            // then hangs on the last digit of the pressure.
            if one.extent_change_mol.is_some_and(|change| change.abs() > 3e3) {
                continue;
            }
            let largest = one.rest_mol.iter().fold(1.0, |a: f64, b| a.max(*b));
            for (a, b) in one.change_mol.iter().zip(&two.change_mol) {
                assert!(close(*a, b / times, 1e-7, largest), "{one:?} {two:?}: {row:?}");
            }
        }
    });
}

#[test]
fn what_was_added_is_kept() {
    each(15, |row, _| {
        let now = row.with(|plant| Knobs::new(plant).unwrap().now_mol().to_vec());
        for found in all(row) {
            for (species, now) in now.iter().enumerate().take(found.rest_mol.len()) {
                let (after, change) = (found.rest_mol[species], found.change_mol[species]);
                assert!(close(after, now + change, 1e-9, 1.0), "{species} {found:?} {row:?}");
            }
        }
    });
}

#[test]
fn every_number_is_finite_whatever_the_state() {
    each(16, |row, draws| {
        let amount = [0.0, 1e-300, 1e-9, 1.0, 1.0, 3.0, 1e200, 1e300];
        let amounts = row.amounts.iter().map(|_| draws.pick(&amount)).collect();
        let ln_k = draws.pick(&[-1e5, -700.0, -40.0, 0.0, 1.0, 40.0, 700.0, 1e5]);
        let kelvin = draws.pick(&[1.0, 300.0, 700.0, 2e4]);
        let enthalpy = draws.pick(&[None, Some(0.0), Some(-1e4), Some(50.0)]);
        let wild = Row { amounts, ln_k, kelvin, enthalpy, ..row.clone() };
        for found in all(&wild) {
            let numbers =
                [Some(found.value), Some(found.step), found.extent_change_mol, found.derivative];
            let all =
                found.rest_mol.iter().chain(&found.change_mol).chain(numbers.iter().flatten());
            assert!(all.clone().all(|number| number.is_finite()), "{found:?} {wild:?}");
            assert!(found.rest_mol.iter().all(|amount| *amount >= 0.0), "{found:?} {wild:?}");
            assert!(!sentence(&found).contains(['{', '}']), "{found:?} {wild:?}");
        }
        let wanted = draws.pick(&[
            Wanted::Extent,
            Wanted::Fraction(0),
            Wanted::Conversion(1),
            Wanted::Amount(1),
        ]);
        let knobs =
            [Knob::Temperature, Knob::Pressure, Knob::Volume, Knob::Amount(0), Knob::Dilution];
        let (knob, other) = (draws.pick(&knobs), draws.pick(&knobs));
        let (from, to) = (draws.pick(&[0.0, 1e-3, 1.0, 1e300]), draws.pick(&[1.0, 900.0, 1e7]));
        wild.with(|plant| {
            let mut knobs = Knobs::new(plant).unwrap();
            let lines = Some((other, &[1.0, 1e3, -1.0, f64::NAN][..]));
            let request = SweepRequest { x: knob, from, to, count: 9, lines, show: wanted };
            let chart = sweep(&mut knobs, &request);
            let numbers = chart.lines.iter().flatten().flatten();
            assert!(chart.x.iter().chain(numbers).all(|number| number.is_finite()), "{chart:?}");
            let goal = Goal { knob, from, to, reach: wanted, value: draws.pick(&[0.0, 0.5, 1.0]) };
            let found = target(&mut knobs, &goal);
            let settings = found.settings.iter().chain(&found.nearest);
            let numbers =
                settings.flat_map(|one| [one.value, one.reached, one.until.unwrap_or(0.0)]);
            assert!(numbers.chain(found.jumps.iter().copied()).all(f64::is_finite), "{found:?}");
        });
    });
}
