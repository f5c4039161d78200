//! The kinds of species, and one reaction among them.

use super::limits::{NU_MAX, NU_MIN, SPECIES_MAX};
use crate::problem::EquilibriumCode;
use crate::problem::Outcome;
use crate::problem::Problem;

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
    /// In the one ideal solution: a = c/c°, with c° = 1 mol/L.
    Solute,
}

impl Kind {
    /// Whether the activity depends on the amount.
    #[inline(always)]
    pub(super) fn is_mixed(self) -> bool {
        matches!(self, Kind::Gas | Kind::Solute)
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
    /// The sum of ν over gases, or over solutes.
    pub(super) delta_nu: f64,
    /// The factor that makes every ν whole; zero when none of 1, 2, 4 and 8 does.
    pub(super) multiple: f64,
    pub(super) delta_power: i32,
    pub(super) has_gas: bool,
    pub(super) has_solute: bool,
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
    /// [`SPECIES_MAX`]; `number-not-finite`; `nu-out-of-range` unless 0 or
    /// [`NU_MIN`] ≤ |ν| ≤ [`NU_MAX`]; `nothing-reacts` when every ν is zero; `solutes-with-gas`.
    pub fn new(kinds: &[Kind], nu: &[f64]) -> Outcome<System> {
        let problems = check(kinds, nu);
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
        let mixed = kinds
            .iter()
            .zip(nu)
            .enumerate()
            .filter(|(_, (kind, nu))| kind.is_mixed() && **nu != 0.0)
            .map(|(species, (_, &nu))| Mixed { species, nu, power: (nu * multiple) as i32 })
            .collect();
        Ok(System {
            kinds: kinds.to_vec(),
            nu: nu.to_vec(),
            mixed,
            delta_nu,
            multiple,
            delta_power: (delta_nu * multiple) as i32,
            has_gas: kinds.contains(&Kind::Gas),
            has_solute: kinds.contains(&Kind::Solute),
        })
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

    /// Δν: the sum of the stoichiometric numbers of the gases (or of the solutes).
    #[must_use]
    pub fn delta_nu(&self) -> f64 {
        self.delta_nu
    }
}

fn check(kinds: &[Kind], nu: &[f64]) -> Vec<Problem> {
    let mut problems = Vec::new();
    if kinds.len() != nu.len() {
        problems.push(
            Problem::new(EquilibriumCode::LengthsDiffer)
                .with("what", "stoichiometric numbers")
                .with("found", nu.len().to_string())
                .with("expected", kinds.len().to_string())
                .at("nu"),
        );
    }
    if kinds.len() > SPECIES_MAX {
        problems.push(
            Problem::new(EquilibriumCode::TooManySpecies)
                .with("found", kinds.len().to_string())
                .with("most", SPECIES_MAX.to_string())
                .at("species"),
        );
    }
    for (place, &nu) in nu.iter().enumerate() {
        let field = format!("nu[{place}]");
        if !nu.is_finite() {
            problems.push(Problem::new(EquilibriumCode::NotFinite).at(&field));
        } else if nu != 0.0 && !(NU_MIN..=NU_MAX).contains(&nu.abs()) {
            problems.push(
                Problem::new(EquilibriumCode::NuOutOfRange)
                    .with("found", format!("{nu:?}"))
                    .with("least", format!("{NU_MIN:?}"))
                    .with("most", format!("{NU_MAX:?}"))
                    .at(&field),
            );
        }
    }
    if nu.iter().all(|&nu| nu == 0.0) {
        problems.push(Problem::new(EquilibriumCode::NothingReacts).at("nu"));
    }
    if kinds.contains(&Kind::Gas) && kinds.contains(&Kind::Solute) {
        problems.push(Problem::new(EquilibriumCode::SolutesWithGas).at("species"));
    }
    problems
}
