//! A plant with its knobs: the state of rest with some of them set to a value.

use super::held::{amount_of, diluted, volume_of_gas, with_pressure, with_volume};
use crate::constant::Constant;
use crate::equilibrium::Hold;
use crate::equilibrium::Kind;
use crate::equilibrium::State;
use crate::equilibrium::Summary;
use crate::equilibrium::System;
use crate::equilibrium::Workspace;
use crate::equilibrium::{affinity, rest_into};
use crate::library::{TEMPERATURE_LIMITS_K, Temperature};
use crate::mixture::Ion;
use crate::problem::Outcome;
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;

/// One reaction in one state, with where its K comes from.
#[derive(Debug, Clone, Copy)]
pub struct Plant<'a> {
    /// The reaction among its species.
    pub system: &'a System,
    /// The state now: temperature, hold and present amounts.
    pub state: State<'a>,
    /// Where K comes from.
    pub constant: &'a Constant,
    /// K is taken at T − this; zero without a stated approach.
    pub approach_k: f64,
}

/// What can be changed about a plant.
#[derive(Debug, Clone, Copy, PartialEq, Eq, Hash)]
pub enum Knob {
    /// The temperature in K.
    Temperature,
    /// The absolute pressure in Pa, which is then held.
    Pressure,
    /// The volume of the gas in m3, which is then held.
    Volume,
    /// The present amount in mol of the species at this place, before it comes to rest.
    Amount(usize),
    /// An inert gas added, in mol. Where volume is held, the pressure that rest has without it is
    /// held instead.
    InertAtPressure,
    /// An inert gas added, in mol. Where pressure is held, the volume that rest takes without it
    /// is held instead.
    InertAtVolume,
    /// Water added to a solution: the solvent there is over the solvent there was, 1 at first.
    Dilution,
}

/// A plant set up for turning its knobs; nothing is allocated in [`Knobs::rest`].
///
/// ```
/// use shiftgauge::advice::{Knob, Knobs, Plant};
/// use shiftgauge::constant::{Constant, StatedConstant};
/// use shiftgauge::equilibrium::{Hold, Kind, State, System};
/// // N2O4 = 2 NO2 with K = 1
/// let system = System::new(&[Kind::Gas; 2], &[-1.0, 2.0]).unwrap();
/// let hold = Hold::Pressure { pressure_pa: 100_000.0 };
/// let state = State { temperature_k: 330.0, hold, amounts_mol: &[1.0, 0.0] };
/// let constant = Constant::Stated(StatedConstant {
///     ln_k: 0.0, u_ln_k: None, at_k: None, enthalpy_j_per_mol: Some(57_000.0),
///     u_enthalpy_j_per_mol: None, heat_capacity_j_per_mol_k: None,
/// });
/// let plant = Plant { system: &system, state, constant: &constant, approach_k: 0.0 };
/// let mut knobs = Knobs::new(plant).unwrap();
/// let low = knobs.rest(&[(Knob::Pressure, 50_000.0)]).unwrap().extent_mol;
/// assert!(low > knobs.now().extent_mol);
/// ```
#[derive(Debug, Clone)]
pub struct Knobs<'a> {
    plant: Plant<'a>,
    /// The system with one inert gas more at the end, where there is gas.
    wide: System,
    has_gas: bool,
    has_solute: bool,
    now: Summary,
    now_mol: Vec<f64>,
    /// ΔH° where K is taken, and d ln K/dT = ΔH°/RT² there.
    heat: Option<(f64, f64)>,
    turned_mol: Vec<f64>,
    workspace: Workspace,
    /// The last temperature that K was wanted for, and ln K.
    last_k: (f64, f64),
}

impl<'a> Knobs<'a> {
    /// Sets up a plant and brings it to rest as it stands.
    ///
    /// # Errors
    /// As [`crate::equilibrium::rest`], and `species-temperature` where there is no K.
    pub fn new(plant: Plant<'a>) -> Outcome<Knobs<'a>> {
        let Plant { system, state, constant, approach_k } = plant;
        let k_at = Temperature::new(state.temperature_k - approach_k)?;
        let at = constant.at(k_at);
        let ln_k = at.ln_k;
        let per_k = k_at.reciprocal() * k_at.reciprocal() / GAS_CONSTANT_J_PER_MOL_K;
        let heat = at.enthalpy_j_per_mol.map(|enthalpy| (enthalpy, enthalpy * per_k));
        let mut workspace = Workspace::default();
        let now = rest_into(system, &state, ln_k, &mut workspace)?;
        let has_gas = system.kinds().contains(&Kind::Gas);
        let wide = if has_gas { with_inert(system)? } else { system.clone() };
        Ok(Knobs {
            plant,
            turned_mol: Vec::with_capacity(wide.kinds().len()),
            wide,
            has_gas,
            has_solute: system.kinds().contains(&Kind::Solute),
            now,
            now_mol: workspace.amounts_mol().to_vec(),
            heat,
            workspace,
            last_k: (state.temperature_k, ln_k),
        })
    }

    /// The plant as it was given.
    #[must_use]
    pub fn plant(&self) -> &Plant<'a> {
        &self.plant
    }

    /// Rest as the plant stands.
    #[must_use]
    pub fn now(&self) -> &Summary {
        &self.now
    }

    /// The amounts in mol of that rest.
    #[must_use]
    pub fn now_mol(&self) -> &[f64] {
        &self.now_mol
    }

    /// ΔH° in J/mol where K is taken, and d ln K/dT in 1/K there; none where nothing tells them.
    pub(super) fn heat(&self) -> Option<(f64, f64)> {
        self.heat
    }

    /// Whether a knob is there: pressure, volume and inert need a gas, dilution a solution.
    #[must_use]
    pub fn has(&self, knob: Knob) -> bool {
        match knob {
            Knob::Temperature => true,
            Knob::Pressure | Knob::Volume | Knob::InertAtPressure | Knob::InertAtVolume => {
                self.has_gas
            }
            Knob::Amount(species) => species < self.plant.state.amounts_mol.len(),
            Knob::Dilution => self.has_solute && diluted(self.plant.state.hold, 1.0).is_some(),
        }
    }

    /// Where a knob stands now; a pressure or volume that is not held is that of rest. `None` for
    /// a knob that is not there.
    #[must_use]
    pub fn value(&self, knob: Knob) -> Option<f64> {
        if !self.has(knob) {
            return None;
        }
        match knob {
            Knob::Temperature => Some(self.plant.state.temperature_k),
            Knob::Pressure => self.pressure_pa(),
            Knob::Volume => self.volume_m3(),
            Knob::Amount(species) => self.plant.state.amounts_mol.get(species).copied(),
            Knob::InertAtPressure | Knob::InertAtVolume => Some(0.0),
            Knob::Dilution => Some(1.0),
        }
    }

    /// The pressure that is held, or that the gas at rest has in the volume that is held.
    pub(super) fn pressure_pa(&self) -> Option<f64> {
        let hold = self.plant.state.hold;
        // n R T/V: the same formula with V in the place of P.
        hold.pressure_pa().or_else(|| self.gas_at_rest(hold.volume_m3()?))
    }

    /// The volume that is held, or that the gas at rest takes at the pressure that is held.
    pub(super) fn volume_m3(&self) -> Option<f64> {
        let hold = self.plant.state.hold;
        hold.volume_m3().or_else(|| self.gas_at_rest(hold.pressure_pa()?))
    }

    fn gas_at_rest(&self, held: f64) -> Option<f64> {
        let kinds = self.plant.system.kinds();
        let gas_mol = amount_of(kinds, Kind::Gas, &self.now_mol);
        let found = volume_of_gas(gas_mol, self.plant.state.temperature_k, held);
        (found > 0.0 && found.is_finite()).then_some(found)
    }

    /// ln K at a temperature of the plant, which is K's temperature plus the approach; `None`
    /// outside the limits of a temperature. The last one is remembered.
    pub fn ln_k(&mut self, temperature_k: f64) -> Option<f64> {
        if self.last_k.0 != temperature_k {
            let at = temperature_k - self.plant.approach_k;
            let (low, high) = TEMPERATURE_LIMITS_K;
            if !(low..=high).contains(&at) {
                return None;
            }
            let ln_k = self.plant.constant.ln_k(Temperature::new(at).ok()?);
            self.last_k = (temperature_k, ln_k);
        }
        Some(self.last_k.1)
    }

    /// The state of rest with some knobs set and the others as they are; its amounts are then in
    /// [`Knobs::amounts_mol`].
    ///
    /// `None` where there is no such state: a knob that is not there, or a value outside the
    /// limits of a temperature, a pressure, a volume, an amount or ln K.
    pub fn rest(&mut self, settings: &[(Knob, f64)]) -> Option<Summary> {
        let (temperature_k, hold) = self.turn(settings)?;
        self.solve(temperature_k, hold)
    }

    /// A/RT of the present amounts with some knobs set; `None` as for [`Knobs::rest`], and where
    /// the affinity is no number.
    pub fn affinity_over_rt(&mut self, settings: &[(Knob, f64)]) -> Option<f64> {
        let (temperature_k, hold) = self.turn(settings)?;
        let ln_k = self.ln_k(temperature_k)?;
        let amounts_mol = &self.turned_mol;
        let state = State { temperature_k, hold, amounts_mol };
        affinity(&self.wide, &state, ln_k).ok()?.finite()
    }

    /// Puts the amounts into place, and gives the temperature and what is held.
    fn turn(&mut self, settings: &[(Knob, f64)]) -> Option<(f64, Hold)> {
        let State { mut temperature_k, mut hold, amounts_mol, .. } = self.plant.state;
        self.start_from(amounts_mol);
        for &(knob, value) in settings {
            if !(value.is_finite() && value >= 0.0 && self.has(knob)) {
                return None;
            }
            match knob {
                Knob::Temperature => temperature_k = value,
                Knob::Pressure => hold = with_pressure(hold, value),
                Knob::Volume => hold = with_volume(hold, value),
                Knob::Amount(species) => *self.turned_mol.get_mut(species)? = value,
                Knob::Dilution => hold = diluted(hold, value)?,
                Knob::InertAtPressure => {
                    *self.turned_mol.last_mut()? = value;
                    if hold.volume_m3().is_some() {
                        hold = with_pressure(hold, self.pressure_pa()?);
                    }
                }
                Knob::InertAtVolume => {
                    *self.turned_mol.last_mut()? = value;
                    if hold.pressure_pa().is_some() {
                        hold = with_volume(hold, self.volume_m3()?);
                    }
                }
            }
        }
        Some((temperature_k, hold))
    }

    /// Takes these amounts, one for each species of the plant, and no inert added.
    pub(super) fn start_from(&mut self, amounts_mol: &[f64]) {
        self.turned_mol.clear();
        self.turned_mol.extend_from_slice(amounts_mol);
        self.turned_mol.resize(self.wide.kinds().len(), 0.0);
    }

    /// Takes the amounts of rest as the plant stands, with one of them changed.
    pub(super) fn rest_from_rest(&mut self, species: usize, amount_mol: f64) -> Option<Summary> {
        let now_mol = std::mem::take(&mut self.now_mol);
        self.start_from(&now_mol);
        self.now_mol = now_mol;
        *self.turned_mol.get_mut(species)? = amount_mol;
        let State { temperature_k, hold, .. } = self.plant.state;
        self.solve(temperature_k, hold)
    }

    fn solve(&mut self, temperature_k: f64, hold: Hold) -> Option<Summary> {
        let ln_k = self.ln_k(temperature_k)?;
        let state = State { temperature_k, hold, amounts_mol: &self.turned_mol };
        rest_into(&self.wide, &state, ln_k, &mut self.workspace).ok()
    }

    /// The amounts in mol of the last [`Knobs::rest`], in the order of the plant's species, with
    /// the inert gas added as one more at the end where there is gas.
    #[must_use]
    pub fn amounts_mol(&self) -> &[f64] {
        self.workspace.amounts_mol()
    }

    /// The amounts in mol that the last [`Knobs::rest`] began with, in the same order.
    #[must_use]
    pub fn started_mol(&self) -> &[f64] {
        &self.turned_mol
    }
}

/// The system with one inert gas more at the end.
fn with_inert(system: &System) -> Outcome<System> {
    let (mut kinds, mut nu) = (system.kinds().to_vec(), system.nu().to_vec());
    kinds.push(Kind::Gas);
    nu.push(0.0);
    let ions: Vec<Ion> = (0..kinds.len()).map(|species| system.ion(species)).collect();
    System::new(&kinds, &nu)?.with_solution(system.model(), &ions)
}
