//! The saturation pressure of water against the industrial formulation.

use shiftgauge::mixture::water_saturation_pressure_pa;

/// (K, Pa): table 35 of IAPWS R7-97(2012), the check values of equation 30.
const PUBLISHED: [(f64, f64); 3] =
    [(300.0, 3_536.589_41), (500.0, 2_638_897.76), (600.0, 12_344_314.6)];

#[test]
fn it_agrees_with_the_industrial_formulation() {
    for (temperature_k, pressure_pa) in PUBLISHED {
        let found = water_saturation_pressure_pa(temperature_k).unwrap();
        // Two formulations, each good to 0.025 to 0.1 % by their own statements.
        assert!((found / pressure_pa - 1.0).abs() < 1e-3, "{temperature_k} K: {found} Pa");
    }
}

#[test]
fn it_meets_the_critical_point_and_ends_there() {
    let critical = water_saturation_pressure_pa(647.096).unwrap();
    assert!((critical - 22.064e6).abs() < 1.0, "{critical}");
    for outside in [273.15, 647.1, f64::NAN, -1.0, f64::INFINITY] {
        assert_eq!(water_saturation_pressure_pa(outside), None, "{outside}");
    }
}
