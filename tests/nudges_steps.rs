//! Figures of nudges: steps, borders, what a used-up phase does, and their sentences.

use crate::nudges::{Row, acid, ammonia, at, carbon, lime, sentence, within};
use shiftgauge::advice::{Direction, Knob, Knobs, nudges};
use shiftgauge::equilibrium::RestOutcome;

#[test]
fn a_phase_that_is_used_up_is_left_over_beyond_the_border() {
    // Lime with inert gas, all CaCO3 gone: y(CO2) = 0.3/1.3, K = e at 700 K.
    let row = lime(&[0.2, 1.0, 0.1, 1.0], 1.0);
    let share: f64 = 0.3 / 1.3;
    let border = |knob| row.nudge(knob, 1e-3).reason.border.unwrap();
    let (knob, pressure_pa) = border(Knob::Pressure);
    let expected = 1e5 * 1f64.exp() / share;
    assert!(
        knob == Knob::Pressure && (pressure_pa / expected - 1.0).abs() < 1e-13,
        "{pressure_pa}"
    );
    let (knob, kelvin) = border(Knob::Temperature);
    // ln K(T) = 1 − (ΔH/R)(1/T − 1/700) = ln 0.3/1.3
    let reciprocal = 1.0 / 700.0 + (1.0 - share.ln()) * 8.314_462_618_153_24 / 170e3;
    assert!(knob == Knob::Temperature && (kelvin * reciprocal - 1.0).abs() < 1e-11, "{kelvin}");
    for (knob, border, past) in
        [(Knob::Pressure, pressure_pa, 1e-6), (Knob::Temperature, kelvin, -1e-6)]
    {
        let value = row.with(|plant| Knobs::new(plant).unwrap().value(knob).unwrap());
        let (before, after) = (border * (1.0 - past), border * (1.0 + past));
        assert_eq!(row.nudge(knob, before - value).direction, None, "{knob:?}");
        assert_eq!(row.nudge(knob, after - value).direction, Some(Direction::Reverse), "{knob:?}");
    }
}

#[test]
fn what_is_added_to_a_used_up_phase_reacts_in_full() {
    let found = lime(&[0.2, 1.0, 0.1, 1.0], 1.0).nudge(Knob::Amount(0), 0.01);
    assert_eq!(found.derivative, Some(1.0));
    let moved = found.extent_change_mol.unwrap();
    assert!((moved - 0.01).abs() < 1e-15, "{moved}");
    assert_eq!(found.rest_mol[0], 0.0);
    let back = carbon(&[1.0, 0.0, 1.0], -3.0).nudge(Knob::Amount(1), 0.01);
    assert_eq!(back.derivative, Some(-1.0));
    assert!((back.extent_change_mol.unwrap() + 0.01).abs() < 1e-15);
}

#[test]
fn the_usual_nudges_fit_the_state() {
    let names = |row: Row| {
        let all = row.with(|plant| nudges(plant).unwrap());
        all.iter()
            .map(|nudge| match nudge.species() {
                Some(species) => format!("{} {species}", nudge.name()),
                None => nudge.name().to_owned(),
            })
            .collect::<Vec<_>>()
            .join(", ")
    };
    let rows = [
        (
            ammonia(at(200.0), &[1.0, 3.0, 0.1, 0.3]),
            "temperature, pressure, add 0, add 1, add 2, remove 2, inert at constant pressure, inert at constant volume",
        ),
        (
            ammonia(within(0.01), &[1.0, 3.0, 0.0, 0.3]),
            "temperature, volume, add 0, add 1, add 2, remove 2, inert at constant pressure, inert at constant volume",
        ),
        (acid(), "temperature, dilution, add 0, add 1, add 2, remove 1, remove 2"),
        (Row::new("pp", &[-1.0, 1.0], at(1.0), &[1.0, 0.0], -1.0), "temperature, add 0, add 1"),
    ];
    for (row, expected) in rows {
        assert_eq!(names(row.clone()), expected, "{row:?}");
    }
}

#[test]
fn the_usual_steps_are_shares_of_what_is_there() {
    let row = ammonia(at(200.0), &[1.0, 3.0, 0.0, 0.0]);
    let steps: Vec<f64> =
        row.with(|plant| nudges(plant).unwrap()).iter().map(|nudge| nudge.step).collect();
    let ammonia_at_rest = row.with(|plant| Knobs::new(plant).unwrap().now_mol()[2]);
    let expected = [5.0, 1e6, 0.04, 0.04, 0.04, -0.1 * ammonia_at_rest, 0.2, 0.2];
    for (step, expected) in steps.iter().zip(expected) {
        assert!((step / expected - 1.0).abs() < 1e-14, "{steps:?}");
    }
    assert_eq!(steps.len(), expected.len());
}

#[test]
fn a_product_that_is_not_there_yet_is_taken_from_rest() {
    let row = ammonia(at(200.0), &[1.0, 3.0, 0.0, 0.0]);
    let rest = row.with(|plant| Knobs::new(plant).unwrap().now_mol().to_vec());
    let found = row.nudge(Knob::Amount(2), -0.1 * rest[2]);
    let from_rest = Row { amounts: rest.clone(), ..row }.nudge(Knob::Amount(2), -0.1 * rest[2]);
    assert_eq!(
        (found.direction, found.outcome),
        (Some(Direction::Forward), Some(RestOutcome::Rest))
    );
    assert!((found.value / rest[2] - 1.0).abs() < 1e-14);
    let (one, two) = (found.extent_change_mol.unwrap(), from_rest.extent_change_mol.unwrap());
    assert!((one / two - 1.0).abs() < 1e-9, "{one} {two}");
}

#[test]
fn the_sentences_name_the_mechanism_and_its_figures() {
    let rich = ammonia(at(200.0), &[6.0, 2.0, 0.1, 0.0]);
    let close = Row { ln_k: (16.0_f64 / 27.0).ln(), ..ammonia(at(1.0), &[2.002, 1.5, 0.5, 0.0]) };
    let spent = lime(&[0.2, 1.0, 0.1, 1.0], 1.0);
    let rows = [
        (
            rich.nudge(Knob::Temperature, 5.0),
            "The forward reaction gives off heat (ΔH° = −105 kJ/mol), so K falls as the temperature rises: hotter moves the mixture back.",
        ),
        (
            rich.nudge(Knob::Pressure, 1e6),
            "The forward reaction turns 4 mol of gas into 2 mol: less gas, so a higher pressure moves the mixture forward.",
        ),
        (
            rich.nudge(Knob::Amount(0), 0.08),
            "S0 is a reactant, yet at constant pressure more of it also thins the other reactants. Above a fraction of 50 % that weighs more, and it stands at 76.2 % at rest, so the mixture moves back.",
        ),
        (
            close.nudge(Knob::Amount(0), 0.04),
            "S0 is a reactant, yet at constant pressure more of it also thins the other reactants. Above a fraction of 50 % that weighs more, and it stands at 50.02 % at rest, so the mixture moves back.",
        ),
        (
            spent.nudge(Knob::Pressure, 5e3),
            "S0 is used up at rest, so a small change moves nothing; the border beyond which some of it is left lies at Pressure 1177922.",
        ),
    ];
    for (found, expected) in rows {
        assert_eq!(sentence(&found), expected, "{found:?}");
    }
}
