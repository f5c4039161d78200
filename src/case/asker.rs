//! A case asked again with its numbers moved.

use super::constant_of::{constant_of, k_temperature};
use super::inputs::Place;
use super::question::Question;
use super::run::Ground;
use super::setting::setting;
use crate::advice::{Judged, follow};
use crate::constant::Constant;
use crate::equilibrium::{State, Summary, Workspace, affinity, rest_into};
use crate::library::Temperature;
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;

/// Asks a case again with its numbers moved.
pub(super) struct Asker<'a> {
    pub ground: &'a Ground<'a>,
    pub t_star_k: Option<f64>,
    pub workspace: Workspace,
}

/// A change of K's data.
#[derive(Debug, Clone, Copy, Default)]
pub(super) struct Shift {
    /// Of Δ_rG°, the same at all temperatures.
    pub gibbs_j_per_mol: f64,
    /// Of ln K, in standard uncertainties of a line or a stated value.
    pub times_u: f64,
}

impl Shift {
    fn of_ln_k(self, constant: &Constant, temperature: Temperature) -> f64 {
        let rt = GAS_CONSTANT_J_PER_MOL_K * temperature.kelvin();
        let line = match self.times_u {
            0.0 => 0.0,
            times => times * constant.at(temperature).u_ln_k.unwrap_or(0.0),
        };
        line - self.gibbs_j_per_mol / rt
    }
}

impl Asker<'_> {
    pub fn ask(&mut self, question: &Question, place: Place) -> Option<Judged> {
        let ground = self.ground;
        if place.is_of_k() {
            let delta_nu_gas = ground.delta_nu_gas;
            let moved = constant_of(question, ground.equation, ground.reacting, delta_nu_gas);
            return self.with_constant(question, &moved.ok()??, Shift::default());
        }
        self.with_constant(question, ground.constant, Shift::default())
    }

    pub fn with_constant(
        &mut self,
        question: &Question,
        constant: &Constant,
        shift: Shift,
    ) -> Option<Judged> {
        let at = |temperature| constant.ln_k(temperature) + shift.of_ln_k(constant, temperature);
        let ln_k = at(Temperature::new(question.temperature.value_si).ok()?);
        let rest_ln_k = at(k_temperature(question).ok()?);
        let setting = setting(question, self.ground.reacting.to_vec()).ok()?;
        let amounts_mol = setting.amounts_mol();
        let temperature_k = question.temperature.value_si;
        let state = State { temperature_k, hold: setting.hold, amounts_mol: &amounts_mol };
        let system = self.ground.system;
        let affinity = affinity(system, &state, ln_k).ok()?;
        let summary = rest_into(system, &state, rest_ln_k, &mut self.workspace).ok()?;
        let ln_q = affinity.finite().map(|over_rt| ln_k - over_rt);
        let approach_k = ln_q.zip(self.t_star_k).and_then(|(ln_q, from_k)| {
            let from = Temperature::new(from_k).ok()?;
            let ln_q = ln_q - shift.of_ln_k(constant, from);
            follow(constant, ln_q, from_k).map(|t_star_k| temperature_k - t_star_k)
        });
        let missing_conversion = missing_conversion(&summary);
        Some(Judged { affinity, ln_q, approach_k, missing_conversion, temperature_k })
    }
}

/// The extent to rest as a share of the whole range of the extent.
pub(super) fn missing_conversion(summary: &Summary) -> Option<f64> {
    let range = summary.extent_max_mol? - summary.extent_min_mol?;
    (range > 0.0).then(|| summary.extent_mol / range)
}
