//! How rest answers to an infinitely small turn of a knob.
//!
//! At rest A(ξ, k) = 0, so dξ/dk = (∂A/∂k)/S with S = −∂A/∂ξ > 0. With A/RT = ln K − Σ ν ln a, for
//! ideal mixtures,
//!
//! | turned | ∂(A/RT)/∂k, pressure held | volume held |
//! | --- | --- | --- |
//! | T | ΔH°/RT² | ΔH°/RT² − Δν/T = ΔU°/RT² |
//! | P | −Δν/P | |
//! | V | | Δν/V |
//! | n_j of a mixture | −ν_j/n_j + Δν/n_t | −ν_j/n_j |
//! | n_j of a pure phase | 0 | 0 |
//! | inert gas | Δν/n_t | 0 |
//! | solvent, relative | | Δν of the solutes |
//!
//! and S = Σ n_i (ν_i/n_i − Δν/n_t)² over all of a mixture whose activities follow fractions (an
//! inert of it too; this is Σ ν²/n − Δν²/n_t without its cancellation), Σ ν²/n where they follow
//! concentrations. With a stated approach ΔH°/RT² is taken where K is.
//!
//! Where activity coefficients or the activity of the water come in, slopes are taken as differences
//! of two states of rest instead (see [`super::nudge`]).
//!
//! Such statements are the theorems of moderation of I. Prigogine and R. Defay, Chemical
//! Thermodynamics, 1954, chapter 17 (from memory). The line for n_j at constant pressure is the one
//! that Le Chatelier's rule, said without care, gets wrong.

use super::held::{amount_of, diluted, is_pure};
use super::knob::Knob;
use crate::equilibrium::Hold;
use crate::equilibrium::Kind;
use crate::equilibrium::System;

/// Where two effects cancel to this share of one of them, what is left is rounding.
const ROUNDING: f64 = 1e-14;

fn cancelled(sum: f64, part: f64) -> f64 {
    if part.is_finite() && sum.abs() <= ROUNDING * part.abs() { 0.0 } else { sum }
}

/// A state of rest, to be differentiated.
#[derive(Debug, Clone, Copy)]
pub(super) struct Local<'a> {
    pub system: &'a System,
    pub hold: Hold,
    pub temperature_k: f64,
    /// d ln K/dT = ΔH°/RT², where it is known.
    pub ln_k_per_k: Option<f64>,
    /// Amounts at rest.
    pub amounts_mol: &'a [f64],
}

impl Local<'_> {
    /// Whether the activities of a kind follow amount fractions.
    fn by_fraction(&self, kind: Kind) -> bool {
        match kind {
            Kind::Gas => self.hold.pressure_pa().is_some(),
            Kind::Liquid => true,
            Kind::Solute | Kind::Solvent | Kind::Pure | Kind::Ample => false,
        }
    }

    /// Δν over the species of a kind.
    pub fn delta_nu(&self, kind: Kind) -> f64 {
        amount_of(self.system.kinds(), kind, self.system.nu())
    }

    /// Δν/n_t of a kind whose activities follow fractions, otherwise zero.
    fn dilution(&self, kind: Kind) -> f64 {
        let total = amount_of(self.system.kinds(), kind, self.amounts_mol);
        if self.by_fraction(kind) && total > 0.0 { self.delta_nu(kind) / total } else { 0.0 }
    }

    /// S = −∂(A/RT)/∂ξ in 1/mol.
    pub fn stiffness(&self) -> f64 {
        let mut sum = 0.0;
        let mut known: Option<(Kind, f64)> = None;
        let each = self.system.kinds().iter().zip(self.system.nu()).zip(self.amounts_mol);
        for ((&kind, &nu), &amount) in each {
            if is_pure(kind) || amount == 0.0 && nu == 0.0 {
                continue;
            }
            let dilution = match known {
                Some((of, dilution)) if of == kind => dilution,
                _ => self.dilution(kind),
            };
            known = Some((kind, dilution));
            let bracket = nu / amount - dilution;
            sum += amount * bracket * bracket;
        }
        sum
    }

    /// ∂(A/RT)/∂k at constant extent, per unit of the knob. `None` where ΔH° is not known.
    pub fn drive(&self, knob: Knob) -> Option<f64> {
        let gas = || self.delta_nu(Kind::Gas);
        Some(match knob {
            Knob::Temperature => {
                let spread = match self.hold.volume_m3() {
                    Some(_) => gas() / self.temperature_k,
                    None => 0.0,
                };
                let heat = self.ln_k_per_k?;
                cancelled(heat - spread, heat)
            }
            Knob::Pressure => self.hold.pressure_pa().map_or(0.0, |pascal| -gas() / pascal),
            Knob::Volume => self.hold.volume_m3().map_or(0.0, |volume| gas() / volume),
            Knob::Amount(species) => {
                let kind = *self.system.kinds().get(species)?;
                if is_pure(kind) {
                    return Some(0.0);
                }
                let (nu, amount) =
                    (*self.system.nu().get(species)?, *self.amounts_mol.get(species)?);
                let own = if nu == 0.0 { 0.0 } else { nu / amount };
                cancelled(self.dilution(kind) - own, own)
            }
            Knob::InertAtPressure => self.dilution(Kind::Gas),
            Knob::InertAtVolume => 0.0,
            Knob::Dilution => {
                diluted(self.hold, 1.0)?;
                self.delta_nu(Kind::Solute)
            }
        })
    }

    /// dξ/dk in mol per unit of the knob; `None` where it is no number.
    pub fn derivative(&self, knob: Knob) -> Option<f64> {
        let drive = self.drive(knob)?;
        if drive == 0.0 {
            return Some(0.0);
        }
        let found = drive / self.stiffness();
        found.is_finite().then_some(found)
    }

    /// The fraction of its mixture above which adding a species acts as diluting the others does:
    /// ν_j/Δν, where that lies between 0 and 1 and its activity follows its fraction.
    pub fn turning_fraction(&self, species: usize) -> Option<f64> {
        let kind = *self.system.kinds().get(species)?;
        let share = self.system.nu().get(species)? / self.delta_nu(kind);
        (self.by_fraction(kind) && share > 0.0 && share < 1.0).then_some(share)
    }

    /// The fraction of a species in its mixture.
    pub fn fraction(&self, species: usize) -> Option<f64> {
        let total =
            amount_of(self.system.kinds(), *self.system.kinds().get(species)?, self.amounts_mol);
        let share = self.amounts_mol.get(species)? / total;
        share.is_finite().then_some(share)
    }
}
