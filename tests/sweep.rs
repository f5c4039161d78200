//! Charts of rest over one knob: every point is the state of rest there, and where there is none
//! the chart has a gap.

use crate::nudges::{Row, at, within};
use shiftgauge::advice::{Knob, Knobs, Plant, Sweep, SweepRequest, Wanted, sweep};
use shiftgauge::equilibrium::Hold;
use shiftgauge::quantity::GAS_CONSTANT_J_PER_MOL_K;

/// N2O4 = 2 NO2: Kp = 0.143 atm at 25 °C (Verhoek and Daniels, J. Am. Chem. Soc. 53 (1931) 1250)
/// is K = 0.145; ΔH° about 57 kJ/mol.
fn dioxide(pressure_bar: f64) -> Row {
    let ln_k = (0.143_f64 * 1.01325).ln();
    let row = Row::new("gg", &[-1.0, 2.0], at(pressure_bar), &[1.0, 0.0], ln_k).heat(57.0);
    Row { kelvin: 298.15, ..row }
}

fn chart(row: &Row, request: &SweepRequest) -> Sweep {
    row.with(|plant| sweep(&mut Knobs::new(plant).unwrap(), request))
}

fn over_temperature<'a>(lines: Option<(Knob, &'a [f64])>, show: Wanted) -> SweepRequest<'a> {
    SweepRequest { x: Knob::Temperature, from: 273.15, to: 373.15, count: 41, lines, show }
}

#[test]
fn dissociation_follows_its_closed_form() {
    // α = √(K/(K + 4 P/p°))
    let pressures = [0.2e5, 1e5, 5e5];
    let row = dioxide(1.0);
    let found =
        chart(&row, &over_temperature(Some((Knob::Pressure, &pressures)), Wanted::Conversion(0)));
    for (line, pressure) in found.lines.iter().zip(pressures) {
        for (x, y) in found.x.iter().zip(line) {
            let ln_k = row.ln_k - 57e3 / GAS_CONSTANT_J_PER_MOL_K * (1.0 / x - 1.0 / 298.15);
            let expected = (ln_k.exp() / (ln_k.exp() + 4.0 * pressure / 1e5)).sqrt();
            assert!(
                (y.unwrap() - expected).abs() < 1e-13,
                "{x} K, {pressure} Pa: {y:?} {expected}"
            );
        }
    }
}

#[test]
fn lines_of_temperature_and_lines_over_temperature_are_the_same_numbers() {
    let row = dioxide(1.0);
    let temperatures = [280.0, 300.0, 340.0];
    let pressures = [1e5, 2e5, 3e5, 4e5];
    let show = Wanted::Fraction(1);
    let by_temperature = SweepRequest {
        x: Knob::Pressure,
        from: 1e5,
        to: 4e5,
        count: 4,
        lines: Some((Knob::Temperature, &temperatures)),
        show,
    };
    let one = chart(&row, &by_temperature);
    for (line, kelvin) in one.lines.iter().zip(temperatures) {
        let over = SweepRequest {
            x: Knob::Temperature,
            from: kelvin,
            to: kelvin + 1.0,
            count: 2,
            lines: Some((Knob::Pressure, &pressures)),
            show,
        };
        let other: Vec<_> = chart(&row, &over).lines.iter().map(|line| line[0]).collect();
        assert_eq!(*line, other, "{kelvin}");
    }
}

#[test]
fn every_number_is_that_of_the_rest_there() {
    let row = Row::new("gggg", &[-1.0, -3.0, 2.0, 0.0], at(150.0), &[1.0, 3.0, 0.1, 0.2], -9.0);
    let knobs = [
        (Knob::Temperature, 600.0, 800.0),
        (Knob::Pressure, 1e6, 3e7),
        (Knob::Volume, 1e-4, 1e-2),
        (Knob::Amount(0), 0.0, 9.0),
        (Knob::InertAtPressure, 0.0, 5.0),
        (Knob::InertAtVolume, 0.0, 5.0),
    ];
    for (x, from, to) in knobs {
        let of = |show| {
            let request = SweepRequest { x, from, to, count: 9, lines: None, show };
            chart(&row, &request).lines.remove(0)
        };
        let extents = of(Wanted::Extent);
        let (amounts, fractions) = (of(Wanted::Amount(2)), of(Wanted::Fraction(2)));
        let conversions = of(Wanted::Conversion(0));
        for place in 0..9 {
            let value = from + (to - from) * place as f64 / 8.0;
            let extent = extents[place].unwrap();
            let ammonia = 0.1 + 2.0 * extent;
            assert!((amounts[place].unwrap() - ammonia).abs() < 1e-13, "{x:?} {value}");
            let nitrogen = if x == Knob::Amount(0) { value } else { 1.0 };
            let inert =
                if matches!(x, Knob::InertAtPressure | Knob::InertAtVolume) { value } else { 0.0 };
            let total = nitrogen + 3.0 + 0.1 + 0.2 + inert - 2.0 * extent;
            assert!((fractions[place].unwrap() - ammonia / total).abs() < 1e-13, "{x:?} {value}");
            match conversions[place] {
                Some(conversion) => assert!((conversion - extent / nitrogen).abs() < 1e-13),
                None => assert_eq!(nitrogen, 0.0, "{x:?}"),
            }
        }
    }
}

#[test]
fn a_small_conversion_keeps_its_digits() {
    let row = Row::new("gg", &[-1.0, 1.0], at(1.0), &[1.0, 0.0], -60.0);
    let request = SweepRequest {
        x: Knob::Pressure,
        from: 1e5,
        to: 2e5,
        count: 2,
        lines: None,
        show: Wanted::Conversion(0),
    };
    let found = chart(&row, &request).lines[0][0].unwrap();
    assert!((found / (-60f64).exp() - 1.0).abs() < 1e-13, "{found:e}");
}

#[test]
fn k_is_taken_at_the_temperature_less_the_approach() {
    let row = dioxide(1.0);
    let request = over_temperature(None, Wanted::LnK);
    let found = row.with(|plant| {
        sweep(&mut Knobs::new(Plant { approach_k: 15.0, ..plant }).unwrap(), &request)
    });
    for (x, y) in found.x.iter().zip(&found.lines[0]) {
        let ln_k = row.ln_k - 57e3 / GAS_CONSTANT_J_PER_MOL_K * (1.0 / (x - 15.0) - 1.0 / 298.15);
        assert!((y.unwrap() - ln_k).abs() < 1e-13, "{x}");
    }
}

#[test]
fn what_has_no_value_is_a_gap() {
    let gas = dioxide(1.0);
    let acid = Row::new("sss", &[-1.0, 1.0, 1.0], within(1e-3), &[0.1, 1e-3, 1e-3], -10.9);
    let lime = Row::new("ppg", &[-1.0, 1.0, 1.0], at(1.0), &[1.0, 1.0, 0.0], 0.0);
    let open = Row::new("aag", &[-1.0, 1.0, 1.0], at(1.0), &[1.0, 1.0, 0.1], 1.0);
    let (t, p) = (Knob::Temperature, Knob::Pressure);
    let rows = [
        ("dilution of a gas", &gas, Knob::Dilution, 1.0, 2.0, Wanted::Extent),
        ("pressure over a solution", &acid, p, 1e5, 2e5, Wanted::Extent),
        ("inert over a solution", &acid, Knob::InertAtPressure, 0.0, 1.0, Wanted::Extent),
        ("a species that is not there", &gas, Knob::Amount(7), 0.0, 1.0, Wanted::Extent),
        ("the amount of one that is not there", &gas, t, 300.0, 400.0, Wanted::Amount(2)),
        ("a share of one that is not there", &gas, t, 300.0, 400.0, Wanted::Fraction(9)),
        ("a conversion of what is absent", &gas, t, 300.0, 400.0, Wanted::Conversion(1)),
        ("a share of a pure phase", &lime, p, 1e5, 2e5, Wanted::Fraction(0)),
        ("a share of a solute", &acid, Knob::Dilution, 1.0, 2.0, Wanted::Fraction(0)),
        ("no pressure", &gas, p, -1e5, 0.0, Wanted::Extent),
        ("no volume", &gas, Knob::Volume, -1.0, 0.0, Wanted::Extent),
        ("less than nothing", &gas, Knob::Amount(0), -2.0, -1.0, Wanted::Extent),
        ("too cold and too hot", &gas, t, 0.5, 1e6, Wanted::LnK),
        ("no number", &gas, t, f64::NAN, f64::NAN, Wanted::LnK),
        ("no limit", &open, p, 1e5, 2e5, Wanted::Extent),
    ];
    for (title, row, x, from, to, show) in rows {
        let request = SweepRequest { x, from, to, count: 2, lines: None, show };
        assert_eq!(chart(row, &request).lines, [[None, None]], "{title}");
    }
    let request =
        SweepRequest { x: p, from: 0.5e5, to: 1.5e5, count: 3, lines: None, show: Wanted::Extent };
    assert_eq!(
        chart(&lime, &request).lines,
        [[Some(1.0), None, Some(0.0)]],
        "all of it splits below 1 bar, any extent is at rest at 1 bar, none above"
    );
}

#[test]
fn the_ends_are_exact_and_the_size_is_bounded() {
    let values = vec![1e5; 20];
    let row = dioxide(1.0);
    let request = SweepRequest {
        count: 10_000,
        ..over_temperature(Some((Knob::Pressure, &values)), Wanted::LnK)
    };
    let found = chart(&row, &request);
    assert_eq!((found.x.len(), found.lines.len()), (2000, 12));
    assert_eq!((found.x[0], found.x[1999]), (273.15, 373.15));
    assert!(found.lines.iter().all(|line| line.len() == 2000));
    let found = chart(&row, &SweepRequest { count: 0, ..request });
    assert_eq!(found.x, [273.15, 373.15]);
}

#[test]
fn a_volume_that_is_turned_is_held() {
    let row = dioxide(1.0);
    let volume = row.with(|plant| Knobs::new(plant).unwrap().value(Knob::Volume).unwrap());
    let request = SweepRequest {
        x: Knob::Volume,
        from: volume,
        to: 2.0 * volume,
        count: 2,
        lines: None,
        show: Wanted::Extent,
    };
    let found = chart(&row, &request).lines[0][1].unwrap();
    let held = Row { hold: Hold::Volume { volume_m3: 2.0 * volume }, ..row.clone() };
    let expected = held.with(|plant| Knobs::new(plant).unwrap().now().extent_mol);
    assert!((found - expected).abs() < 1e-14);
}
