//! The kinds of species, and one reaction among them.

use super::system_check::{check_ions, check_reaction};
use crate::mixture::Ion;
use crate::mixture::SolutionModel;
use crate::problem::Outcome;

/// What decides the activity of a species.
#[derive(Debug, Clone, Copy, PartialEq, Eq, Hash)]
pub enum Kind {
    /// In the one ideal gas mixture: a = p/p°, with p° = 1 bar.
    Gas,
    /// A liquid or solid that is its own pure phase: a = 1, and it can be used up.
    Pure,
    /// A pure phase that is present in an unknown, ample amount: a = 1, and it is never used up.
    /// The number given as its amount is handed back as it came.
    Ample,
    /// In the one solution in water: a = γ m/m° with m° = 1 mol/kg where the mass of water is held,
    /// otherwise a = c/c° with c° = 1 mol/L.
    Solute,
    /// In the one ideal liquid mixture: a = x = n/n_liquid, inert liquids counted.
    Liquid,
    /// The water that the solutes are dissolved in: ample, its mass is the one held, and its
    /// activity follows from the solutes by Gibbs and Duhem's equation (ln a = −M_w Σ m where
    /// γ = 1). Where the volume of the solution is held instead, a = 1. The number given as its
    /// amount is handed back as it came.
    Solvent,
}

impl Kind {
    /// Whether the activity depends on the amount.
    #[inline(always)]
    pub(super) fn is_mixed(self) -> bool {
        matches!(self, Kind::Gas | Kind::Solute | Kind::Liquid)
    }

    /// Whether there is so much of it that a reaction never uses it up.
    #[inline(always)]
    pub(super) fn is_ample(self) -> bool {
        matches!(self, Kind::Ample | Kind::Solvent)
    }
}

/// A reacting species whose activity depends on its amount.
#[derive(Debug, Clone, Copy)]
pub(super) struct Mixed {
    /// Its place among all species.
    pub species: usize,
    /// Its stoichiometric number.
    pub nu: f64,
    /// ν times the system's `multiple`, when that is whole for every species.
    pub power: i32,
    /// The place of its mixture among those that react.
    pub part: usize,
}

/// A mixture with reacting species.
#[derive(Debug, Clone, Copy)]
pub(super) struct Part {
    /// `Gas`, `Solute` or `Liquid`.
    pub kind: Kind,
    /// The sum of ν over its species, and that times the system's `multiple`.
    pub delta_nu: f64,
    pub delta_power: i32,
}

/// One reaction among species of known kinds; it can be used with many states and constants.
///
/// Stoichiometric numbers are negative for reactants, positive for products and zero for species
/// that take no part.
///
/// ```
/// use shiftgauge::equilibrium::{Kind, System};
/// // CO + H2O = CO2 + H2 with nitrogen
/// let system = System::new(&[Kind::Gas; 5], &[-1.0, -1.0, 1.0, 1.0, 0.0]).unwrap();
/// assert_eq!(system.delta_nu(), 0.0);
/// ```
#[derive(Debug, Clone)]
pub struct System {
    pub(super) kinds: Vec<Kind>,
    pub(super) nu: Vec<f64>,
    pub(super) mixed: Vec<Mixed>,
    /// The mixtures that react, in order of their first species.
    pub(super) parts: Vec<Part>,
    /// The mixture that reacts, where there is one only (`Gas` where there is none).
    pub(super) mixture: Kind,
    /// The sum of ν over all mixed species.
    pub(super) delta_nu: f64,
    /// The factor that makes every ν whole; zero when none of 1, 2, 4 and 8 does.
    pub(super) multiple: f64,
    pub(super) delta_power: i32,
    /// What is known of each species as a solute; empty where nothing was said.
    pub(super) ions: Vec<Ion>,
    pub(super) model: SolutionModel,
    /// The sum of ν over the solvent.
    pub(super) solvent_nu: f64,
    /// One mixture at most, and every activity is a fraction, a pressure or a concentration.
    pub(super) plain: bool,
}

/// The most that the whole powers of one quotient may add to.
const POWERS_AT_MOST: f64 = 200.0;

impl System {
    /// Puts a system together.
    ///
    /// Both sides are usual; a reaction with one side only is allowed, because a solvent or an
    /// ample phase may have been left out of it.
    ///
    /// # Errors
    /// `lengths-differ` unless there are as many numbers as kinds; `too-many-species` above
    /// [`super::SPECIES_MAX`]; `number-not-finite`; `nu-out-of-range` unless 0 or
    /// [`super::NU_MIN`] ≤ |ν| ≤ [`super::NU_MAX`]; `nothing-reacts` when every ν is zero; `liquid-with-solutes`.
    pub fn new(kinds: &[Kind], nu: &[f64]) -> Outcome<System> {
        let problems = check_reaction(kinds, nu);
        if !problems.is_empty() {
            return Err(problems);
        }
        let mixed_nu = || kinds.iter().zip(nu).filter(|(kind, nu)| kind.is_mixed() && **nu != 0.0);
        let delta_nu: f64 = mixed_nu().map(|(_, nu)| nu).sum();
        let total: f64 = mixed_nu().map(|(_, nu)| nu.abs()).sum();
        let whole = |multiple: &f64| {
            mixed_nu().all(|(_, nu)| (nu * multiple) % 1.0 == 0.0)
                && total * multiple <= POWERS_AT_MOST
        };
        let multiple = [1.0, 2.0, 4.0, 8.0].into_iter().find(whole).unwrap_or(0.0);
        let mut parts: Vec<Part> = Vec::new();
        let mut mixed = Vec::new();
        for (species, (&kind, &nu)) in kinds.iter().zip(nu).enumerate() {
            if !kind.is_mixed() || nu == 0.0 {
                continue;
            }
            let known = parts.iter().position(|part| part.kind == kind);
            let part = known.unwrap_or_else(|| {
                parts.push(Part { kind, delta_nu: 0.0, delta_power: 0 });
                parts.len() - 1
            });
            parts[part].delta_nu += nu;
            mixed.push(Mixed { species, nu, power: (nu * multiple) as i32, part });
        }
        for part in &mut parts {
            part.delta_power = (part.delta_nu * multiple) as i32;
        }
        let solvents = kinds.iter().zip(nu).filter(|(kind, _)| **kind == Kind::Solvent);
        let solvent_nu: f64 = solvents.map(|(_, nu)| nu).sum();
        Ok(System {
            kinds: kinds.to_vec(),
            nu: nu.to_vec(),
            mixed,
            mixture: parts.first().map_or(Kind::Gas, |part| part.kind),
            plain: parts.len() < 2 && solvent_nu == 0.0,
            parts,
            delta_nu,
            multiple,
            delta_power: (delta_nu * multiple) as i32,
            ions: Vec::new(),
            model: SolutionModel::Ideal,
            solvent_nu,
        })
    }

    /// The same system with the charges of its solutes and a model of the solution.
    ///
    /// One ion for each species, in order; those of species that are no solutes are not looked at.
    /// Inert solutes count in the ionic strength. A model other than `Ideal` needs the mass of the
    /// water in the state's hold.
    ///
    /// # Errors
    /// `lengths-differ`; `charge-out-of-range` unless |z| ≤ [`super::CHARGE_MAX`];
    /// `ion-size-out-of-range` unless [`super::ION_SIZE_MIN_PM`] ≤ å ≤ [`super::ION_SIZE_MAX_PM`].
    ///
    /// ```
    /// use shiftgauge::equilibrium::{Kind, System};
    /// use shiftgauge::mixture::{Ion, SolutionModel};
    /// // CaSO4(s) = Ca^2+ + SO4^2- in a brine
    /// let kinds = [Kind::Ample, Kind::Solute, Kind::Solute, Kind::Solute, Kind::Solute];
    /// let system = System::new(&kinds, &[-1.0, 1.0, 1.0, 0.0, 0.0]).unwrap();
    /// let ions = [0, 2, -2, 1, -1].map(Ion::new);
    /// let system = system.with_solution(SolutionModel::Davies, &ions).unwrap();
    /// assert_eq!(system.model(), SolutionModel::Davies);
    /// ```
    pub fn with_solution(mut self, model: SolutionModel, ions: &[Ion]) -> Outcome<System> {
        let problems = check_ions(&self.kinds, ions);
        if !problems.is_empty() {
            return Err(problems);
        }
        self.ions = ions.to_vec();
        self.model = model;
        self.plain = self.parts.len() < 2 && !self.is_corrected();
        Ok(self)
    }

    /// The model of the solution; `Ideal` unless another was given.
    #[must_use]
    pub fn model(&self) -> SolutionModel {
        self.model
    }

    /// Whether activity coefficients or the activity of the solvent come into Q.
    #[must_use]
    pub fn is_corrected(&self) -> bool {
        self.solvent_nu != 0.0 || self.model != SolutionModel::Ideal && self.reacts(Kind::Solute)
    }

    /// What is known of a species as a solute; neutral where nothing was said.
    #[must_use]
    pub fn ion(&self, species: usize) -> Ion {
        self.ions.get(species).copied().unwrap_or(Ion::NEUTRAL)
    }

    /// The kinds of the species, in order.
    #[must_use]
    pub fn kinds(&self) -> &[Kind] {
        &self.kinds
    }

    /// The stoichiometric numbers of the species, in order.
    #[must_use]
    pub fn nu(&self) -> &[f64] {
        &self.nu
    }

    /// Δν: the sum of the stoichiometric numbers of the gases (where no gas reacts, of the solutes
    /// or of the liquid mixture).
    #[must_use]
    pub fn delta_nu(&self) -> f64 {
        let gas = self.parts.iter().find(|part| part.kind == Kind::Gas);
        gas.map_or(self.delta_nu, |gas| gas.delta_nu)
    }

    /// Whether species of this mixture react.
    #[inline(always)]
    pub(super) fn reacts(&self, kind: Kind) -> bool {
        self.parts.iter().any(|part| part.kind == kind)
    }
}
