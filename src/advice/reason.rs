//! Why a nudge does what it does: the mechanism, as data.

use super::border::border;
use super::held::{is_ample, is_pure};
use super::knob::{Knob, Knobs};
use super::local::Local;
use super::verdict::Direction;
use crate::equilibrium::Kind;
use crate::equilibrium::RestOutcome;
use crate::problem::WhyCode;
use crate::problem::WhyCode as C;

/// Why, with the figures that its sentence names.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Reason {
    /// Which mechanism.
    pub code: WhyCode,
    /// The place of the species that it is about.
    pub species: Option<usize>,
    /// ΔH° in J/mol.
    pub enthalpy_j_per_mol: Option<f64>,
    /// How many mol of the mixture the left and the right side hold, as the equation is written.
    pub sides: Option<(f64, f64)>,
    /// The fraction of the species in its mixture at rest.
    pub fraction: Option<f64>,
    /// The fraction above which adding it acts the other way.
    pub turning_fraction: Option<f64>,
    /// The setting of a knob from which a used-up phase is left over.
    pub border: Option<(Knob, f64)>,
}

impl Reason {
    fn new(code: WhyCode) -> Reason {
        Reason {
            code,
            species: None,
            enthalpy_j_per_mol: None,
            sides: None,
            fraction: None,
            turning_fraction: None,
            border: None,
        }
    }

    fn of(code: WhyCode, species: usize) -> Reason {
        Reason { species: Some(species), ..Reason::new(code) }
    }
}

/// A change of ln K or ln Q by one step that is too small to speak of.
const HARDLY: f64 = 1e-4;
/// A drive that is this small a share of its parts is their rounding.
const BALANCED: f64 = 1e-9;

/// What a nudge has found so far.
pub(super) struct Turned {
    pub knob: Knob,
    pub step: f64,
    pub idle: bool,
    pub unknown: bool,
    pub outcome: Option<RestOutcome>,
    pub direction: Option<Direction>,
    pub local: Option<Direction>,
}

/// The reason, and what must be said beside it.
pub(super) fn reason(
    knobs: &mut Knobs,
    local: &Local,
    turned: &Turned,
) -> (Reason, Option<Reason>) {
    let before = *knobs.now();
    let alone = |reason| (reason, None);
    if before.outcome == RestOutcome::HasNoLimit {
        return alone(Reason::new(C::NoLimit));
    }
    if turned.unknown {
        return alone(Reason::new(C::HeatUnknown));
    }
    let mechanism = || mechanism(knobs, local, turned);
    if turned.idle {
        return alone(mechanism());
    }
    match turned.outcome {
        None => return alone(Reason::new(C::OutOfRange)),
        Some(RestOutcome::HasNoLimit) => return alone(Reason::new(C::NoLimit)),
        Some(RestOutcome::AnyExtentIsAtRest) => return alone(Reason::new(C::AnyExtent)),
        Some(_) => {}
    }
    let moved = turned.direction.is_some();
    let forward = before.affinity.finite().is_some_and(|over_rt| over_rt > 0.0);
    match before.outcome {
        RestOutcome::NothingCanMove => alone(match turned.knob {
            Knob::Amount(species) if moved => Reason::of(C::Opens, species),
            _ => Reason::new(C::NothingCanMove),
        }),
        RestOutcome::AnyExtentIsAtRest => alone(Reason::new(C::AnyExtent)),
        RestOutcome::PhaseExhausted | RestOutcome::RanToItsLimit => {
            let Some(species) = spent(local, forward, turned.knob) else {
                return alone(mechanism());
            };
            if turned.knob == Knob::Amount(species) && moved && turned.step > 0.0 {
                return alone(Reason::of(C::Needed, species));
            }
            let code = match before.outcome {
                RestOutcome::PhaseExhausted => C::UsedUp,
                _ => C::RanToLimit,
            };
            let mut used_up = Reason::of(code, species);
            let first = moved.then(mechanism);
            if let Some(at) = border(knobs, local, turned.knob) {
                used_up.border = Some((turned.knob, at));
                if code == C::UsedUp {
                    used_up.code = C::UsedUpUntil;
                }
            }
            match first {
                Some(first) => (first, Some(used_up)),
                None => alone(used_up),
            }
        }
        _ => {
            let crossing = match (turned.local, turned.direction) {
                (Some(Direction::Forward), Some(Direction::Reverse)) => Some(C::CrossesReverse),
                (Some(Direction::Reverse), Some(Direction::Forward)) => Some(C::CrossesForward),
                _ => None,
            };
            (mechanism(), crossing.map(Reason::new))
        }
    }
}

/// The species that is used up and stops the reaction this way; of two, the one that is not added.
fn spent(local: &Local, forward: bool, knob: Knob) -> Option<usize> {
    let used_up = if forward { -1.0 } else { 1.0 };
    let gone = |species: &usize| {
        local.system.nu()[*species] * used_up > 0.0
            && !is_ample(local.system.kinds()[*species])
            && local.amounts_mol[*species] == 0.0
    };
    let mut all = (0..local.amounts_mol.len()).filter(gone);
    let first = all.next()?;
    if knob == Knob::Amount(first) { all.next().or(Some(first)) } else { Some(first) }
}

/// Where activity coefficients, or the activity of the water, move rest another way than the
/// mechanism of an ideal mixture says, they are the reason.
fn mechanism(knobs: &Knobs, local: &Local, turned: &Turned) -> Reason {
    let ideal = ideal_mechanism(knobs, local, turned);
    let turns_solution = match turned.knob {
        Knob::Temperature | Knob::Dilution => true,
        Knob::Amount(species) => local.system.kinds()[species] == Kind::Solute,
        _ => false,
    };
    let drive = local.drive(turned.knob).unwrap_or(0.0) * turned.step;
    let agrees = match turned.direction {
        Some(Direction::Forward) => drive > 0.0,
        Some(Direction::Reverse) => drive < 0.0,
        None => true,
    };
    if agrees || !turns_solution || !local.system.is_corrected() {
        return ideal;
    }
    Reason::new(match turned.direction {
        Some(Direction::Reverse) => C::CoefficientsReverse,
        _ => C::CoefficientsForward,
    })
}

fn ideal_mechanism(knobs: &Knobs, local: &Local, turned: &Turned) -> Reason {
    let three = |x: f64, codes: [WhyCode; 3]| match x {
        _ if x.abs() < 1e-12 => codes[1],
        x if x > 0.0 => codes[2],
        _ => codes[0],
    };
    let by_sides = |kind: Kind, codes: [WhyCode; 3]| {
        let side = |sign: f64| {
            let each = local.system.nu().iter().zip(local.system.kinds());
            let of_side = each.filter(|(nu, other)| **other == kind && **nu * sign > 0.0);
            of_side.map(|(nu, _)| nu.abs()).fold(0.0, |sum, nu| sum + nu)
        };
        let code = three(local.delta_nu(kind), codes);
        Reason { sides: Some((side(-1.0), side(1.0))), ..Reason::new(code) }
    };
    match turned.knob {
        Knob::Temperature => heat(knobs, local, turned.step),
        Knob::Pressure => {
            by_sides(Kind::Gas, [C::PressureForward, C::PressureNone, C::PressureReverse])
        }
        Knob::Volume => by_sides(Kind::Gas, [C::VolumeReverse, C::VolumeNone, C::VolumeForward]),
        Knob::InertAtPressure => {
            by_sides(Kind::Gas, [C::InertReverse, C::InertNone, C::InertForward])
        }
        Knob::InertAtVolume => Reason::new(C::InertInVolume),
        Knob::Dilution => {
            by_sides(Kind::Solute, [C::DilutionReverse, C::DilutionNone, C::DilutionForward])
        }
        Knob::Amount(species) => amount(local, species, turned.step),
    }
}

fn heat(knobs: &Knobs, local: &Local, step: f64) -> Reason {
    let (Some((enthalpy, per_k)), Some(drive)) = (knobs.heat(), local.drive(Knob::Temperature))
    else {
        return Reason::new(C::HeatUnknown);
    };
    let hardly = |per_k: f64| (per_k * step).abs() < HARDLY;
    let code = if hardly(drive) {
        if hardly(per_k) { C::HeatNone } else { C::HeatBalanced }
    } else if drive > 0.0 {
        if per_k > 0.0 && !hardly(per_k) { C::HeatTaken } else { C::WarmVolumeForward }
    } else if per_k < 0.0 && !hardly(per_k) {
        C::HeatGiven
    } else {
        C::WarmVolumeReverse
    };
    Reason { enthalpy_j_per_mol: Some(enthalpy), ..Reason::new(code) }
}

fn amount(local: &Local, species: usize, step: f64) -> Reason {
    let (nu, kind) = (local.system.nu()[species], local.system.kinds()[species]);
    let more = step >= 0.0;
    if is_pure(kind) {
        return Reason::of(if more { C::PureAdded } else { C::PureRemoved }, species);
    }
    let drive = local.drive(Knob::Amount(species)).filter(|drive| drive.is_finite());
    if nu == 0.0 {
        let drive = drive.unwrap_or(0.0);
        let code = match local.hold.volume_m3() {
            Some(_) if kind == Kind::Gas => C::InertInVolume,
            _ if drive > 0.0 => C::BystanderForward,
            _ if drive < 0.0 => C::BystanderReverse,
            _ => C::BystanderNone,
        };
        return Reason::of(code, species);
    }
    // The share of the drive that is left of what the species itself does.
    let own = nu.abs() / local.amounts_mol[species];
    let against = drive.filter(|_| own.is_finite());
    let against = against.map_or(1.0, |drive| -drive * nu.signum() / own);
    let codes = match (nu < 0.0, more) {
        (true, true) => [C::ReactantAdded, C::ReactantAddedBack],
        (true, false) => [C::ReactantRemoved, C::ReactantRemovedForward],
        (false, true) => [C::ProductAdded, C::ProductAddedForward],
        (false, false) => [C::ProductRemoved, C::ProductRemovedBack],
    };
    // Only a fraction above which its thinning of the others weighs more can turn it round.
    let turning = local.turning_fraction(species);
    let code = match against {
        share if turning.is_none() || share > BALANCED => codes[0],
        share if share < -BALANCED => codes[1],
        _ => C::ShareBalanced,
    };
    let turning = turning.filter(|_| code != codes[0]);
    let fraction = turning.and_then(|_| local.fraction(species));
    Reason { fraction, turning_fraction: turning, ..Reason::of(code, species) }
}
