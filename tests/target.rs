//! Which settings reach a wanted number: none, one or several, and what comes nearest.

use crate::nudges::{Row, at};
use shiftgauge::advice::{Goal, Knob, Knobs, Target, TargetOutcome, Wanted, target};
use shiftgauge::quantity::GAS_CONSTANT_J_PER_MOL_K as R;

fn find(row: &Row, goal: &Goal) -> Target {
    row.with(|plant| target(&mut Knobs::new(plant).unwrap(), goal))
}

/// N2O4 = 2 NO2 with K = 1 at 330 K.
fn dioxide() -> Row {
    let row = Row::new("gg", &[-1.0, 2.0], at(1.0), &[1.0, 0.0], 0.0).heat(57.0);
    Row { kelvin: 330.0, ..row }
}

/// The temperature at which α of N2O4 is split at a pressure in bar: K = 4 α² P/(1 − α²).
fn temperature_for(alpha: f64, pressure_bar: f64) -> f64 {
    let ln_k = (4.0 * alpha * alpha * pressure_bar / (1.0 - alpha * alpha)).ln();
    1.0 / (1.0 / 330.0 - ln_k * R / 57e3)
}

/// N2 + 3 H2 = 2 NH3 at a pressure.
fn ammonia() -> Row {
    Row::new("ggg", &[-1.0, -3.0, 2.0], at(100.0), &[1.0, 3.0, 0.0], -9.0).heat(-105.0)
}

fn of_nitrogen(value: f64) -> Goal {
    Goal { knob: Knob::Amount(0), from: 0.1, to: 9.0, reach: Wanted::Amount(2), value }
}

/// CaCO3 = CaO + CO2 with or without an inert gas, K = 1 at 1200 K.
fn lime(inert: f64) -> Row {
    let row = Row::new("ppgg", &[-1.0, 1.0, 1.0, 0.0], at(1.0), &[1.0, 0.5, 0.0, inert], 0.0);
    Row { kelvin: 1200.0, ..row.heat(170.0) }
}

#[test]
fn one_setting_is_found_to_rounding() {
    let row = dioxide();
    for alpha in [0.02, 0.3, 0.5, 0.98, 0.999] {
        let goal = Goal {
            knob: Knob::Temperature,
            from: 200.0,
            to: 900.0,
            reach: Wanted::Conversion(0),
            value: alpha,
        };
        let found = find(&row, &goal);
        assert_eq!(found.outcome, TargetOutcome::One, "{alpha}: {found:?}");
        let (setting, expected) = (found.settings[0], temperature_for(alpha, 1.0));
        assert!((setting.value / expected - 1.0).abs() < 1e-11, "{alpha}: {setting:?} {expected}");
        assert!((setting.reached - alpha).abs() < 1e-12 && setting.until.is_none());
        assert!(found.nearest.is_none() && found.jumps.is_empty() && found.known_throughout);
        assert!(found.ends.0.unwrap() < alpha && found.ends.1.unwrap() > alpha);
    }
}

#[test]
fn a_wide_range_of_pressure_is_searched_by_decades() {
    for alpha in [0.9999, 0.5, 0.01] {
        let goal = Goal {
            knob: Knob::Pressure,
            from: 1.0,
            to: 1e9,
            reach: Wanted::Conversion(0),
            value: alpha,
        };
        let found = find(&dioxide(), &goal);
        let expected = 1e5 * (1.0 - alpha * alpha) / (4.0 * alpha * alpha);
        assert_eq!(found.outcome, TargetOutcome::One, "{alpha}");
        assert!((found.settings[0].value / expected - 1.0).abs() < 1e-10, "{alpha}: {found:?}");
    }
}

#[test]
fn a_maximum_is_passed_twice_and_the_order_is_that_of_the_range() {
    let row = ammonia();
    let most = find(&row, &of_nitrogen(9.0)).nearest.unwrap();
    for below in [0.05, 1e-3, 1e-6, 1e-8] {
        let goal = of_nitrogen(most.reached * (1.0 - below));
        let found = find(&row, &goal);
        assert_eq!(found.outcome, TargetOutcome::Several, "{below}: {found:?}");
        let [one, two] = [found.settings[0], found.settings[1]];
        assert_eq!(found.settings.len(), 2, "{below}");
        assert!(one.value < most.value && most.value < two.value, "{below}: {found:?}");
        for setting in [one, two] {
            assert!((setting.reached / goal.value - 1.0).abs() < 1e-12, "{below}: {found:?}");
        }
        let backwards = find(&row, &Goal { from: 9.0, to: 0.1, ..goal });
        let [first, second] = [backwards.settings[0], backwards.settings[1]];
        assert!((first.value - two.value).abs() < 1e-6 && (second.value - one.value).abs() < 1e-6);
    }
}

#[test]
fn where_none_reaches_the_turning_point_comes_nearest() {
    // At constant pressure nitrogen helps until it is one half of the gas at rest.
    let found = find(&ammonia(), &of_nitrogen(9.0));
    assert_eq!(found.outcome, TargetOutcome::None);
    let nearest = found.nearest.unwrap();
    let fraction = Row { amounts: vec![nearest.value, 3.0, 0.0], ..ammonia() }.with(|plant| {
        let knobs = Knobs::new(plant).unwrap();
        knobs.now_mol()[0] / knobs.now_mol().iter().sum::<f64>()
    });
    // The top of a smooth curve is flat: its place is known to the root of the rounding.
    assert!((fraction - 0.5).abs() < 1e-7, "{fraction}");
    let low = find(&ammonia(), &of_nitrogen(-1.0)).nearest.unwrap();
    assert_eq!(low.value, 0.1, "the least ammonia is at the end with the least nitrogen");
}

#[test]
fn the_end_of_the_range_comes_nearest_where_the_curve_still_rises() {
    let goal = Goal {
        knob: Knob::Temperature,
        from: 250.0,
        to: 350.0,
        reach: Wanted::Conversion(0),
        value: 0.98,
    };
    let found = find(&dioxide(), &goal);
    let nearest = found.nearest.unwrap();
    assert_eq!((found.outcome, nearest.value), (TargetOutcome::None, 350.0));
    assert_eq!(found.ends.1, Some(nearest.reached));
}

#[test]
fn a_phase_that_is_used_up_keeps_the_number_over_a_stretch() {
    // With 1 mol of inert all CaCO3 is gone where K > y(CO2) = 1/2.
    let border = 1.0 / (1.0 / 1200.0 - 0.5f64.ln() * R / 170e3);
    let goal = Goal {
        knob: Knob::Temperature,
        from: 1000.0,
        to: 1400.0,
        reach: Wanted::Conversion(0),
        value: 1.0,
    };
    let found = find(&lime(1.0), &goal);
    assert_eq!(found.outcome, TargetOutcome::One, "{found:?}");
    let setting = found.settings[0];
    assert!((setting.value / border - 1.0).abs() < 1e-12, "{setting:?} {border}");
    assert_eq!((setting.until, setting.reached), (Some(1400.0), 1.0));
    let backwards = find(&lime(1.0), &Goal { from: 1400.0, to: 1000.0, ..goal });
    let setting = backwards.settings[0];
    assert_eq!((backwards.settings.len(), setting.value), (1, 1400.0));
    assert!((setting.until.unwrap() / border - 1.0).abs() < 1e-12);
}

#[test]
fn a_jump_is_no_setting() {
    // In pure CO2 at 1 bar lime splits all at once at 1200 K.
    for (from, to) in [(1000.0, 1390.0), (1001.0, 1399.0)] {
        let goal =
            Goal { knob: Knob::Temperature, from, to, reach: Wanted::Conversion(0), value: 0.5 };
        let found = find(&lime(0.0), &goal);
        assert_eq!(found.outcome, TargetOutcome::None, "{found:?}");
        assert_eq!(found.jumps.len(), 1, "{found:?}");
        assert!((found.jumps[0] / 1200.0 - 1.0).abs() < 1e-12, "{found:?}");
    }
}

#[test]
fn what_does_not_depend_on_the_knob_is_kept_all_along_or_never() {
    let row = Row::new("gggg", &[-1.0, -1.0, 1.0, 1.0], at(10.0), &[1.0, 1.0, 0.0, 0.0], 0.0);
    let goal = |value| Goal {
        knob: Knob::Pressure,
        from: 1e5,
        to: 5e5,
        reach: Wanted::Conversion(0),
        value,
    };
    let found = find(&row, &goal(0.5));
    assert_eq!(found.outcome, TargetOutcome::One);
    assert_eq!((found.settings[0].value, found.settings[0].until), (1e5, Some(5e5)));
    let found = find(&row, &goal(0.6));
    assert_eq!(found.outcome, TargetOutcome::None);
    assert!((found.nearest.unwrap().reached - 0.5).abs() < 1e-15);
}

#[test]
fn a_knob_that_is_not_there_reaches_nothing() {
    let goal =
        Goal { knob: Knob::Dilution, from: 1.0, to: 2.0, reach: Wanted::Conversion(0), value: 0.5 };
    let found = find(&dioxide(), &goal);
    assert_eq!((found.outcome, found.ends), (TargetOutcome::None, (None, None)));
    assert!(found.nearest.is_none() && !found.known_throughout);
}
