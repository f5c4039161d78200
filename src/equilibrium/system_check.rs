//! The mistakes that a system can be given.

use super::limits::{CHARGE_MAX, ION_SIZE_MAX_PM, ION_SIZE_MIN_PM};
use super::limits::{NU_MAX, NU_MIN, SPECIES_MAX};
use super::system::Kind;
use crate::mixture::Ion;
use crate::problem::EquilibriumCode;
use crate::problem::Problem;

/// Everything that keeps a reaction among these kinds from being worked with.
pub(super) fn check_reaction(kinds: &[Kind], nu: &[f64]) -> Vec<Problem> {
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
    if kinds.contains(&Kind::Liquid) && kinds.iter().any(|kind| in_water(*kind)) {
        problems.push(Problem::new(EquilibriumCode::LiquidWithSolutes).at("species"));
    }
    problems
}

fn in_water(kind: Kind) -> bool {
    matches!(kind, Kind::Solute | Kind::Solvent)
}

/// Everything that keeps these ions from being those of the species.
pub(super) fn check_ions(kinds: &[Kind], ions: &[Ion]) -> Vec<Problem> {
    let mut problems = Vec::new();
    if kinds.len() != ions.len() {
        problems.push(
            Problem::new(EquilibriumCode::LengthsDiffer)
                .with("what", "ions")
                .with("found", ions.len().to_string())
                .with("expected", kinds.len().to_string())
                .at("ions"),
        );
    }
    for (place, (ion, kind)) in ions.iter().zip(kinds).enumerate() {
        if *kind != Kind::Solute {
            continue;
        }
        if ion.charge.unsigned_abs() > CHARGE_MAX.unsigned_abs() {
            problems.push(
                Problem::new(EquilibriumCode::ChargeOutOfRange)
                    .with("found", ion.charge.to_string())
                    .with("most", CHARGE_MAX.to_string())
                    .at(&format!("ions[{place}].charge")),
            );
        }
        if !(ION_SIZE_MIN_PM..=ION_SIZE_MAX_PM).contains(&ion.size_pm) {
            problems.push(
                Problem::new(EquilibriumCode::IonSizeOutOfRange)
                    .with("found", format!("{:?}", ion.size_pm))
                    .with("least", format!("{ION_SIZE_MIN_PM:?}"))
                    .with("most", format!("{ION_SIZE_MAX_PM:?}"))
                    .at(&format!("ions[{place}].size_pm")),
            );
        }
    }
    problems
}
