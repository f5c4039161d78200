//! What a chart shows and a target reaches: one number of a state of rest.

use super::held::{amount_of, is_pure};
use super::knob::{Knob, Knobs};
use crate::equilibrium::Kind;
use crate::equilibrium::RestOutcome;

/// One number of a state of rest.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum Wanted {
    /// The amount fraction of a species in its mixture: n_i/n_t of the gas, an inert added
    /// included, or of its liquid. A pure phase and a solute have none.
    Fraction(usize),
    /// How much of a species that is present is used up on the way to rest, as a share of it:
    /// (n_present − n_rest)/n_present, negative where it is made. Without any present there is
    /// none.
    Conversion(usize),
    /// The amount of a species in mol.
    Amount(usize),
    /// ln K at the temperature, less the approach.
    LnK,
    /// ξ from the present amounts to rest, in mol.
    Extent,
}

impl Wanted {
    /// The number, with some knobs set. `None` where there is no such state or number: outside the
    /// limits of what can be worked with, where rest has no limit or any extent is at rest.
    pub fn of(self, knobs: &mut Knobs, settings: &[(Knob, f64)]) -> Option<f64> {
        if self == Wanted::LnK {
            let mut temperature_k = knobs.plant().state.temperature_k;
            for &(knob, value) in settings {
                if knob == Knob::Temperature {
                    temperature_k = value;
                }
            }
            return knobs.ln_k(temperature_k);
        }
        let summary = knobs.rest(settings)?;
        let nowhere = [RestOutcome::HasNoLimit, RestOutcome::AnyExtentIsAtRest];
        if nowhere.contains(&summary.outcome) {
            return None;
        }
        let found = match self {
            Wanted::LnK => return None,
            Wanted::Extent => summary.extent_mol,
            Wanted::Amount(species) => *of_plant(knobs, species)?,
            Wanted::Fraction(species) => {
                let kinds = knobs.plant().system.kinds();
                let kind = *kinds.get(species)?;
                if is_pure(kind) || kind == Kind::Solute {
                    return None;
                }
                let amounts = knobs.amounts_mol();
                let mut total = amount_of(kinds, kind, amounts);
                if kind == Kind::Gas {
                    total += amounts.get(kinds.len()).copied().unwrap_or(0.0);
                }
                amounts[species] / total
            }
            Wanted::Conversion(species) => {
                let rest = *of_plant(knobs, species)?;
                let present = *knobs.started_mol().get(species)?;
                let nu = *knobs.plant().system.nu().get(species)?;
                // Near nothing converted the difference of two amounts would lose digits.
                let used = -nu * summary.extent_mol;
                if used.abs() < 0.5 * present { used / present } else { (present - rest) / present }
            }
        };
        found.is_finite().then_some(found)
    }
}

/// The amount at rest of one of the plant's own species.
fn of_plant<'k>(knobs: &'k Knobs, species: usize) -> Option<&'k f64> {
    let known = knobs.plant().system.kinds().len();
    knobs.amounts_mol().get(species).filter(|_| species < known)
}
