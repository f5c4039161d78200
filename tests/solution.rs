//! Water and ions in it, against published values and against the laws they keep.

use shiftgauge::mixture::{
    Ion, SolutionLaw, SolutionModel, charge_balance, debye_hueckel, ion_size_pm,
    ionic_strength_mol_per_kg, water_density_kg_per_m3, water_permittivity,
};

/// Temperature in °C, value.
type Row = (f64, f64);

fn compare(rows: &[Row], tolerance: f64, of: impl Fn(f64) -> f64, what: &str) {
    for (celsius, expected) in rows {
        let found = of(celsius + 273.15);
        assert!(
            (found - expected).abs() <= tolerance,
            "{what} at {celsius} °C: {found} instead of {expected} within {tolerance}"
        );
    }
}

/// Source: IAPWS-95, saturated liquid, kg/m3, from memory; 0.02 % allowed: these were remembered to
/// five digits, and the equation's own uncertainty is smaller.
#[test]
fn the_density_of_water_is_that_of_the_steam_tables() {
    let rows = [
        (0.0, 999.79),
        (25.0, 997.00),
        (50.0, 988.00),
        (75.0, 974.84),
        (100.0, 958.35),
        (150.0, 917.01),
        (200.0, 864.66),
    ];
    compare(&rows, 0.2, |t| water_density_kg_per_m3(t).unwrap(), "density");
}

/// Source: C. G. Malmberg and A. A. Maryott, J. Res. NBS 56 (1956) 1, by their equation
/// ε = 87.740 − 0.40008 t + 9.398e−4 t² − 1.410e−6 t³. 0.2 allowed: later measurements, on which
/// R8-97 rests, are higher by up to 0.15.
#[test]
fn the_permittivity_of_water_is_the_one_measured() {
    let rows = [(0.0, 87.740), (25.0, 78.304), (50.0, 69.910), (75.0, 62.425), (100.0, 55.720)];
    compare(&rows, 0.2, |t| water_permittivity(t).unwrap(), "permittivity");
}

/// Source: 0.5091 at 25 °C, R. A. Robinson and R. H. Stokes, Electrolyte Solutions (2nd ed., 1959).
/// The others from A_φ = 0.3764, 0.3915, 0.4103, 0.4606 of D. G. Archer and P. Wang, J. Phys. Chem.
/// Ref. Data 19 (1990) 371, from memory, times 3/ln 10; 0.002 allowed for the memory.
#[test]
fn the_debye_hueckel_slope_is_the_published_one() {
    let a = |t| debye_hueckel(t).unwrap().a_log10;
    compare(&[(25.0, 0.5091)], 0.002, a, "A");
    compare(&[(0.0, 0.4904), (25.0, 0.5101), (50.0, 0.5346), (100.0, 0.6001)], 0.002, a, "A");
    // The same book: B = 0.3286 per ångström at 25 °C.
    compare(&[(25.0, 3.286e9)], 0.01e9, |t| debye_hueckel(t).unwrap().b_per_m, "B");
}

/// Source: R. A. Robinson and R. H. Stokes, Electrolyte Solutions (2nd ed., 1959), appendix 8.10;
/// 0.778 confirmed, the rest from memory. 0.01 for Davies' equation where it is meant to hold.
#[test]
fn mean_coefficients_of_salts_are_the_measured_ones() {
    let rows = [
        ("NaCl", SolutionModel::Davies, "Na", "Cl", 0.1, 0.778, 0.01),
        ("NaCl", SolutionModel::Davies, "Na", "Cl", 0.2, 0.735, 0.015),
        ("NaCl", SolutionModel::Davies, "Na", "Cl", 0.01, 0.902, 0.005),
        ("KCl", SolutionModel::Davies, "K", "Cl", 0.1, 0.770, 0.015),
        ("NaCl", SolutionModel::DebyeHueckel, "Na", "Cl", 0.01, 0.902, 0.005),
        ("NaCl", SolutionModel::DebyeHueckel, "Na", "Cl", 0.1, 0.778, 0.02),
        ("HCl", SolutionModel::DebyeHueckel, "H", "Cl", 0.1, 0.796, 0.01),
        ("KCl", SolutionModel::DebyeHueckel, "K", "Cl", 0.1, 0.770, 0.02),
    ];
    for (salt, model, cation, anion, molality, expected, tolerance) in rows {
        let law = SolutionLaw::new(model, 298.15).unwrap();
        let ion = |name, charge| Ion { charge, size_pm: ion_size_pm(name, charge).unwrap() };
        let mean = 0.5
            * (law.ln_coefficient(ion(cation, 1), molality)
                + law.ln_coefficient(ion(anion, -1), molality));
        let found = mean.exp();
        assert!(
            (found - expected).abs() < tolerance,
            "{salt} {molality} mol/kg by {model:?}: {found} instead of {expected}"
        );
    }
}

/// Source: J. Kielland, J. Am. Chem. Soc. 59 (1937) 1675, table of coefficients at 25 °C, from
/// memory; 0.015 allowed, since he used A = 0.5085 on the volume scale.
#[test]
fn single_coefficients_are_those_of_the_table_of_sizes() {
    let rows = [
        ("H", 1, 0.1, 0.83),
        ("Na", 1, 0.1, 0.775),
        ("K", 1, 0.1, 0.755),
        ("Cl", -1, 0.01, 0.899),
        ("Ca", 2, 0.1, 0.405),
        ("SO4", -2, 0.1, 0.355),
        ("Al", 3, 0.1, 0.18),
        ("Al", 3, 0.01, 0.445),
    ];
    let law = SolutionLaw::new(SolutionModel::DebyeHueckel, 298.15).unwrap();
    for (name, charge, strength, expected) in rows {
        let ion = Ion { charge, size_pm: ion_size_pm(name, charge).unwrap() };
        let found = law.ln_coefficient(ion, strength).exp();
        assert!((found - expected).abs() < 0.015, "{name} at {strength}: {found}, not {expected}");
    }
}

/// Source: osmotic coefficient of NaCl 0.1 mol/kg at 25 °C, 0.9324, Robinson and Stokes, from
/// memory; 0.006 allowed, the same share as Davies' γ is off by there.
#[test]
fn the_water_of_a_salt_solution_has_the_measured_osmotic_coefficient() {
    let law = SolutionLaw::new(SolutionModel::Davies, 298.15).unwrap();
    let solutes = [(Ion::new(1), 0.1), (Ion::new(-1), 0.1)];
    let osmotic = -law.ln_water(solutes.into_iter()) / (0.018_015 * 0.2);
    assert!((osmotic - 0.9324).abs() < 0.006, "{osmotic}");
}

/// −(1/M_w) ∂ ln a_w/∂m_j = 1 + Σ m_i ∂ ln γ_i/∂m_j for each solute j.
#[test]
fn water_and_solutes_keep_the_equation_of_gibbs_and_duhem() {
    let sizes = [400.0; 4];
    let charges = [1, -1, 2, -2];
    let start = [0.13, 0.21, 0.05, 0.01];
    let neutral = (Ion::NEUTRAL, 0.3);
    for model in [SolutionModel::Ideal, SolutionModel::Davies, SolutionModel::DebyeHueckel] {
        let law = SolutionLaw::new(model, 320.0).unwrap();
        let solutes = |m: [f64; 4]| {
            let ions = charges.iter().zip(sizes).zip(m);
            let ions = ions.map(|((charge, size_pm), m)| (Ion { charge: *charge, size_pm }, m));
            ions.chain([neutral]).collect::<Vec<(Ion, f64)>>()
        };
        let water = |m| law.ln_water(solutes(m).into_iter());
        let coefficients = |m| {
            let strength = ionic_strength_mol_per_kg(solutes(m).into_iter());
            charges.map(|charge| law.ln_coefficient(Ion::new(charge), strength))
        };
        for moved in 0..4 {
            let step = 1e-5;
            let (mut less, mut more) = (start, start);
            less[moved] -= step;
            more[moved] += step;
            let left = -(water(more) - water(less)) / (2.0 * step) / 0.018_015_268;
            let (low, high) = (coefficients(less), coefficients(more));
            let slopes = low.iter().zip(high).map(|(low, high)| (high - low) / (2.0 * step));
            let right: f64 = 1.0 + slopes.zip(start).map(|(slope, m)| slope * m).sum::<f64>();
            assert!((left - right).abs() < 1e-6, "{model:?}, solute {moved}: {left} and {right}");
        }
    }
}

/// With sizes of their own the equation holds along the dilution: d/dt at t m.
#[test]
fn water_keeps_the_equation_along_the_dilution_for_ions_of_different_size() {
    let law = SolutionLaw::new(SolutionModel::DebyeHueckel, 298.15).unwrap();
    let ions =
        [Ion { charge: 1, size_pm: 900.0 }, Ion { charge: -2, size_pm: 300.0 }, Ion::NEUTRAL];
    let m = [0.04, 0.02, 0.1];
    let at = |t: f64| ions.into_iter().zip(m.map(|m| m * t));
    let step = 1e-5;
    let water = law.ln_water(at(1.0 + step)) - law.ln_water(at(1.0 - step));
    let left = -water / (2.0 * step) / 0.018_015_268;
    let mut right = m.iter().sum::<f64>();
    for (ion, m) in at(1.0) {
        let high = law.ln_coefficient(ion, ionic_strength_mol_per_kg(at(1.0 + step)));
        let low = law.ln_coefficient(ion, ionic_strength_mol_per_kg(at(1.0 - step)));
        right += m * (high - low) / (2.0 * step);
    }
    assert!((left / right - 1.0).abs() < 1e-7, "{left} and {right}");
}

#[test]
fn no_solution_gives_a_number_that_is_not_finite() {
    for model in [SolutionModel::Ideal, SolutionModel::Davies, SolutionModel::DebyeHueckel] {
        for kelvin in [273.15, 298.15, 373.15, 473.15] {
            let law = SolutionLaw::new(model, kelvin).unwrap();
            for m in [0.0, 5e-324, 1e-12, 1e-7, 1e-3, 0.5, 20.0, 1e9, 1e300, f64::MAX] {
                let solutes = [(Ion::new(9), m), (Ion::new(-1), m), (Ion::NEUTRAL, m)];
                let strength = ionic_strength_mol_per_kg(solutes.into_iter());
                let water = law.ln_water(solutes.into_iter());
                let coefficient = law.ln_coefficient(Ion::new(9), strength);
                assert!(strength.is_finite() && water.is_finite() && coefficient.is_finite());
            }
        }
        let outside = SolutionLaw::new(model, 600.0);
        assert_eq!(outside.is_ok(), model == SolutionModel::Ideal);
    }
}

#[test]
fn charges_are_added_up_on_both_sides() {
    let solutes = [(Ion::new(2), 0.1), (Ion::new(-1), 0.15), (Ion::NEUTRAL, 3.0)];
    let found = charge_balance(solutes.into_iter());
    assert_eq!((found.positive_eq_per_kg, found.negative_eq_per_kg), (0.2, 0.15));
    assert!((found.difference_eq_per_kg - 0.05).abs() < 1e-15);
}
