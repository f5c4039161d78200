//! K of a reaction at a temperature, where it comes from, and the numbers people call K.

mod forms;
mod formula;
mod points;
mod stated;

pub use forms::{Form, FormValue, PRESSURE_UNITS, PressureUnit, all_forms};
pub use formula::{FormulaAt, FormulaConstant, FormulaTerm};
pub use points::{Point, PointsLine, line_through};
pub use stated::{Carried, StatedConstant};

use crate::library::{Combination, Temperature};
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;

/// Where the K of a reaction comes from.
#[derive(Debug, Clone)]
pub enum Constant {
    /// From what the library knows of each species.
    Library(Combination),
    /// From a number that is stated.
    Stated(StatedConstant),
    /// From a straight line of ln K against 1/T through points.
    Points(PointsLine),
    /// From a formula in T.
    Formula(FormulaConstant),
}

/// K at one temperature, with what goes with it.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct ConstantAt {
    /// ln K, p° = 1 bar.
    pub ln_k: f64,
    /// Standard uncertainty of ln K, where one is known.
    pub u_ln_k: Option<f64>,
    /// ΔG° = −RT ln K.
    pub gibbs_j_per_mol: f64,
    /// ΔH°.
    pub enthalpy_j_per_mol: Option<f64>,
    /// ΔS° = (ΔH° − ΔG°)/T.
    pub entropy_j_per_mol_k: Option<f64>,
    /// ΔCp°.
    pub heat_capacity_j_per_mol_k: Option<f64>,
    /// How far the temperature lies outside the data, if it does.
    pub extrapolated_by_k: Option<f64>,
}

impl Constant {
    /// Gives K and what goes with it at a temperature.
    ///
    /// The library's uncertainty is that of ΔG° at 298.15 K carried to T: u(ln K) = u(ΔG°)/RT.
    #[must_use]
    pub fn at(&self, temperature: Temperature) -> ConstantAt {
        let temperature_k = temperature.kelvin();
        let rt = GAS_CONSTANT_J_PER_MOL_K * temperature_k;
        match self {
            Constant::Library(combination) => {
                let change = combination.change(temperature);
                let outside = combination.extrapolated_by_k(temperature);
                ConstantAt {
                    ln_k: change.ln_k,
                    // How well constant heat capacities carry on is not known.
                    u_ln_k: match outside {
                        None => Some(combination.u_gibbs_j_per_mol() / rt),
                        Some(_) => None,
                    },
                    gibbs_j_per_mol: change.gibbs_j_per_mol,
                    enthalpy_j_per_mol: Some(change.enthalpy_j_per_mol),
                    entropy_j_per_mol_k: Some(change.entropy_j_per_mol_k),
                    heat_capacity_j_per_mol_k: Some(change.heat_capacity_j_per_mol_k),
                    extrapolated_by_k: outside,
                }
            }
            Constant::Points(line) => {
                let ln_k = line.ln_k(temperature_k);
                let enthalpy = line.enthalpy_j_per_mol;
                let outside = (line.range_k.0 - temperature_k).max(temperature_k - line.range_k.1);
                ConstantAt {
                    ln_k,
                    u_ln_k: line.u_ln_k(temperature_k),
                    gibbs_j_per_mol: -rt * ln_k,
                    enthalpy_j_per_mol: Some(enthalpy),
                    entropy_j_per_mol_k: Some((enthalpy + rt * ln_k) / temperature_k),
                    heat_capacity_j_per_mol_k: None,
                    extrapolated_by_k: (outside > 0.0).then_some(outside),
                }
            }
            Constant::Formula(formula) => {
                let found = formula.at(temperature_k);
                let enthalpy = found.enthalpy_j_per_mol;
                let outside = formula
                    .range_k
                    .map_or(0.0, |(low, high)| (low - temperature_k).max(temperature_k - high));
                ConstantAt {
                    ln_k: found.ln_k,
                    u_ln_k: formula.u_ln_k,
                    gibbs_j_per_mol: -rt * found.ln_k,
                    enthalpy_j_per_mol: Some(enthalpy),
                    entropy_j_per_mol_k: Some((enthalpy + rt * found.ln_k) / temperature_k),
                    heat_capacity_j_per_mol_k: Some(found.heat_capacity_j_per_mol_k),
                    extrapolated_by_k: (outside > 0.0).then_some(outside),
                }
            }
            Constant::Stated(stated) => {
                let carried = stated.carried_to(temperature_k);
                let gibbs = -rt * carried.ln_k;
                ConstantAt {
                    ln_k: carried.ln_k,
                    u_ln_k: stated.u_ln_k_at(temperature_k),
                    gibbs_j_per_mol: gibbs,
                    enthalpy_j_per_mol: carried.enthalpy_j_per_mol,
                    entropy_j_per_mol_k: carried
                        .enthalpy_j_per_mol
                        .map(|enthalpy| (enthalpy - gibbs) / temperature_k),
                    heat_capacity_j_per_mol_k: stated.heat_capacity_j_per_mol_k,
                    extrapolated_by_k: carried.unfounded_k,
                }
            }
        }
    }

    /// ln K alone, for searches.
    #[must_use]
    pub fn ln_k(&self, temperature: Temperature) -> f64 {
        match self {
            Constant::Library(combination) => combination.ln_k(temperature),
            Constant::Stated(stated) => stated.carried_to(temperature.kelvin()).ln_k,
            Constant::Points(line) => line.ln_k(temperature.kelvin()),
            Constant::Formula(formula) => formula.at(temperature.kelvin()).ln_k,
        }
    }

    /// Whether K is known to change with temperature; without that there is no T*.
    #[must_use]
    pub fn knows_temperature(&self) -> bool {
        match self {
            Constant::Library(_) | Constant::Points(_) | Constant::Formula(_) => true,
            Constant::Stated(stated) => stated.enthalpy_j_per_mol.is_some(),
        }
    }

    /// The range of temperature that the data cover, where they have one.
    #[must_use]
    pub fn range_k(&self) -> Option<(f64, f64)> {
        match self {
            Constant::Library(combination) => combination.range_k(),
            Constant::Stated(_) => None,
            Constant::Points(line) => Some(line.range_k),
            Constant::Formula(formula) => formula.range_k,
        }
    }
}
