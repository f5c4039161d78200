//! The valley where liquids, solutions and several mixtures react.

use shiftgauge::advice::{Stretch, valley};
use shiftgauge::equilibrium::{Affinity, Hold, Kind, State, System, affinity, rest};
use shiftgauge::mixture::{Ion, SolutionModel};

/// What it is, kinds, ν, hold, ln K.
type Row<'a> = (&'a str, &'a [Kind], [f64; 5], Hold, f64);

#[test]
fn the_slope_of_the_valley_is_minus_the_affinity_and_its_floor_is_rest() {
    use Kind::{Ample, Gas, Liquid, Solute, Solvent};
    let both = Hold::PressureAndSolvent { pressure_pa: 1.5e5, water_kg: 1.3 };
    let gas_volume = Hold::VolumeAndSolvent { volume_m3: 0.05, water_kg: 1.3 };
    let water = Hold::Solvent { water_kg: 0.8 };
    let pressure = Hold::Pressure { pressure_pa: 2e5 };
    let ester = [Liquid; 5];
    let absorbed = [Gas, Solvent, Solute, Solute, Gas];
    let dissolved = [Ample, Solute, Solute, Solute, Solute];
    let boiling = [Liquid, Gas, Gas, Liquid, Ample];
    let rows: [Row; 6] = [
        ("ester", &ester, [-1.0, -1.0, 1.0, 1.0, 0.0], pressure, 1.4),
        ("absorbed", &absorbed, [-1.0, -1.0, 1.0, 1.0, 0.0], both, -3.0),
        ("absorbed from a volume", &absorbed, [-1.0, -1.0, 1.0, 1.0, 0.0], gas_volume, -3.0),
        ("acid", &dissolved, [0.0, -1.0, 1.0, 1.0, 0.0], water, -4.0),
        ("salt", &dissolved, [-1.0, 1.0, 1.0, 0.0, 0.0], water, -1.0),
        ("boiling", &boiling, [-1.0, 1.0, 0.0, 0.0, 0.0], pressure, -0.5),
    ];
    for (name, kinds, nu, hold, ln_k) in rows {
        for model in [SolutionModel::Ideal, SolutionModel::Davies] {
            let ions = [0, 1, -1, 2, -2].map(Ion::new);
            let system = System::new(kinds, &nu).unwrap().with_solution(model, &ions).unwrap();
            let amounts_mol = &[0.4, 0.3, 0.1, 0.2, 0.7];
            let state = State { temperature_k: 310.0, hold, amounts_mol };
            let end = rest(&system, &state, ln_k).unwrap().summary;
            let from_mol = end.extent_min_mol.unwrap();
            let to_mol = end.extent_max_mol.unwrap_or(1.0);
            let stretch = Stretch { from_mol, to_mol, rest_mol: end.extent_mol };
            let curve = valley(&system, &state, ln_k, stretch).unwrap().whole;
            let floor = curve.energy_over_rt.iter().position(|energy| *energy == 0.0).unwrap();
            assert_eq!(curve.extent_mol[floor], end.extent_mol, "{name} by {model:?}");
            let width = to_mol - from_mol;
            let points = curve.extent_mol.iter().zip(&curve.energy_over_rt);
            let points: Vec<(&f64, &f64)> = points.collect();
            for pair in points.windows(2) {
                let (low, high) = (pair[0].0, pair[1].0);
                // Next to the walls the slope changes too fast to be taken from two points.
                if low - from_mol < 0.1 * width || to_mol - high < 0.1 * width {
                    continue;
                }
                if high - low < 1e-3 * width {
                    continue;
                }
                let slope = (pair[1].1 - pair[0].1) / (high - low);
                let middle = 0.5 * (low + high);
                let amounts: Vec<f64> =
                    amounts_mol.iter().zip(nu).map(|(n, nu)| (n + nu * middle).max(0.0)).collect();
                let there = State { amounts_mol: &amounts, ..state };
                let found = affinity(&system, &there, ln_k).unwrap();
                let Affinity::Finite(over_rt) = found else { panic!("{found:?}") };
                assert!((slope + over_rt).abs() < 3e-3, "{name} by {model:?}: {slope} {over_rt}");
            }
        }
    }
}
