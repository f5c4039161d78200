//! The water of a dry analysis.

use super::pressure::absolute_pressure_pa;
use super::reading::{Around, Water};
use super::saturation::water_saturation_pressure_pa;
use crate::problem::{MixtureCode, Problem};

/// The fraction of water in the wet gas, from any of the ways it is stated.
///
/// From r per dry gas: y = r/(1 + r). From a dew point: y = p_sat(T_dew)/P.
pub(super) fn water_fraction(water: &Water, around: Around) -> Result<Option<f64>, Problem> {
    let (fraction, field) = match water {
        Water::None | Water::FromFeed => return Ok(None),
        Water::Fraction(quantity) => (quantity.value_si, "water.fraction"),
        Water::PerDry(quantity) => {
            let ratio = quantity.value_si;
            (ratio / (1.0 + ratio), "water.per_dry")
        }
        Water::DewPoint { temperature, pressure } => {
            let field = "water.dew_point";
            let Some(saturation_pa) = water_saturation_pressure_pa(temperature.value_si) else {
                return Err(Problem::new(MixtureCode::DewPointRange).at(field));
            };
            let own = pressure.as_ref().map(|own| absolute_pressure_pa(own, around.atmosphere_pa));
            let own = own.transpose().map_err(|problem| problem.at("water.pressure"))?;
            let Some(total_pa) = own.or(around.pressure_pa) else {
                return Err(Problem::new(MixtureCode::DewPointNeedsPressure).at(field));
            };
            (saturation_pa / total_pa, field)
        }
    };
    if (0.0..1.0).contains(&fraction) {
        Ok(Some(fraction))
    } else {
        let found = format!("{:.4}", fraction * 100.0);
        Err(Problem::new(MixtureCode::WaterFraction).with("found", found).at(field))
    }
}
