//! Which settings of one knob reach a wanted number.

use super::knob::{Knob, Knobs};
use super::search::{lowest_between, sampled};
use super::wanted::Wanted;
use crate::numeric::{RootOutcome, root_between};

/// What is to be reached.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Goal {
    /// The knob to turn.
    pub knob: Knob,
    /// One end of its range.
    pub from: f64,
    /// The other end.
    pub to: f64,
    /// The number of rest that matters.
    pub reach: Wanted,
    /// What it is to be.
    pub value: f64,
}

/// How many settings reach it.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum TargetOutcome {
    /// None within the range.
    None,
    /// One.
    One,
    /// Several.
    Several,
}

impl TargetOutcome {
    /// The outcome's name at the border.
    #[must_use]
    pub fn as_str(self) -> &'static str {
        match self {
            TargetOutcome::None => "none",
            TargetOutcome::One => "one",
            TargetOutcome::Several => "several",
        }
    }
}

/// A setting of the knob and what comes of it.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Setting {
    /// The setting.
    pub value: f64,
    /// The number of rest there.
    pub reached: f64,
    /// Where the wanted number is kept over a whole stretch (a phase is used up all along it), its
    /// other end.
    pub until: Option<f64>,
}

/// The settings that reach a goal.
#[derive(Debug, Clone, PartialEq)]
pub struct Target {
    /// How many there are.
    pub outcome: TargetOutcome,
    /// The settings, in order from `Goal::from` to `Goal::to`.
    pub settings: Vec<Setting>,
    /// Where none reaches it: the setting that comes nearest.
    pub nearest: Option<Setting>,
    /// Settings at which the number jumps across what is wanted without taking it.
    pub jumps: Vec<f64>,
    /// The number at `Goal::from` and at `Goal::to`, where it has one.
    pub ends: (Option<f64>, Option<f64>),
    /// Whether the number exists all over the range (to the fineness of the search).
    pub known_throughout: bool,
}

/// Points at which the range is sampled.
const SAMPLES: usize = 200;
/// A number within this of what is wanted, relative to the range of numbers seen, is reached.
const REACHED: f64 = 1e-9;

/// Finds all settings of a knob between two ends for which a number of rest is what is wanted.
///
/// The number is sampled at 200 evenly spaced settings (evenly in the logarithm where the ends are
/// more than a factor of ten apart); each change of sign of number − wanted is closed in on to
/// rounding (Chandrupatla, see [`root_between`]), and between samples where it turns towards zero
/// the turning point is found by golden section, so that two settings on either side of a maximum
/// are both found, as is a maximum that just reaches. Two settings closer together than a
/// two-hundredth of the range with no turn visible between the samples around them are not seen.
///
/// ```
/// # use shiftgauge::advice::{Goal, Knob, Knobs, Plant, TargetOutcome, Wanted, target};
/// # use shiftgauge::constant::{Constant, StatedConstant};
/// # use shiftgauge::equilibrium::{Hold, Kind, State, System};
/// # let system = System::new(&[Kind::Gas; 2], &[-1.0, 2.0]).unwrap();
/// # let hold = Hold::Pressure { pressure_pa: 100_000.0 };
/// # let state = State { temperature_k: 330.0, hold, amounts_mol: &[1.0, 0.0] };
/// # let constant = Constant::Stated(StatedConstant {
/// #     ln_k: 0.0, u_ln_k: None, at_k: Some(330.0), enthalpy_j_per_mol: Some(57_000.0),
/// #     u_enthalpy_j_per_mol: None, heat_capacity_j_per_mol_k: None,
/// # });
/// # let plant = Plant { system: &system, state, constant: &constant, approach_k: 0.0 };
/// // N2O4 = 2 NO2 with K = 1: half of it is split at 3/4 bar, since K = 4 α² P/(1 − α²).
/// let goal = Goal {
///     knob: Knob::Pressure, from: 1e4, to: 1e6, reach: Wanted::Conversion(0), value: 0.5,
/// };
/// let found = target(&mut Knobs::new(plant).unwrap(), &goal);
/// assert_eq!(found.outcome, TargetOutcome::One);
/// assert!((found.settings[0].value - 75_000.0).abs() < 1e-6);
/// ```
pub fn target(knobs: &mut Knobs, goal: &Goal) -> Target {
    let Goal { knob, reach, value, .. } = *goal;
    let mut off = |at: f64| {
        let number = reach.of(knobs, &[(knob, at)])?;
        let off = number - value;
        // The same to rounding is the same, so that a level stretch has no zeros within it.
        Some(if off.abs() <= 4.0 * f64::EPSILON * value.abs() { 0.0 } else { off })
    };
    let points = sampled(&mut off, goal.from, goal.to, SAMPLES);
    let numbers = || points.iter().filter_map(|(_, off)| *off);
    let spread =
        numbers().fold(f64::NEG_INFINITY, f64::max) - numbers().fold(f64::INFINITY, f64::min);
    let enough = if spread.is_finite() { REACHED * spread.max(1e-3 * value.abs()) } else { 0.0 };
    let mut found = Found { settings: Vec::new(), jumps: Vec::new(), near: None };
    for (place, &(x, here)) in points.iter().enumerate() {
        let Some(here) = here else {
            // One sample without a number between two of different sign: any extent is at rest
            // there, and the number jumps.
            let before = place.checked_sub(1).map(|place| points[place]);
            if let (Some((low, Some(at_low))), Some(&(high, Some(at_high)))) =
                (before, points.get(place + 1))
            {
                if at_low * at_high < 0.0 {
                    found.root(&mut off, (low, at_low), (high, at_high), enough);
                }
            }
            continue;
        };
        found.look(x, here);
        let next = points.get(place + 1).and_then(|&(next_x, off)| Some((next_x, off?)));
        if here == 0.0 {
            let before = place.checked_sub(1).map(|place| points[place]);
            found.zero(&mut off, x, before, next);
        }
        // A turn towards zero around this sample.
        if place > 0 && here != 0.0 {
            if let (Some(before), Some((after_x, after))) = (points[place - 1].1, next) {
                let sign = here.signum();
                let turns = sign * before >= sign * here && sign * after > sign * here;
                if turns && before * here > 0.0 && after * here > 0.0 {
                    let before_x = points[place - 1].0;
                    let (at, least) =
                        lowest_between(|at| off(at).map(|off| sign * off), before_x, x, after_x);
                    found.look(at, sign * least);
                    if least <= 0.0 && least.abs() > enough {
                        found.root(&mut off, (before_x, before), (at, sign * least), enough);
                        found.root(&mut off, (at, sign * least), (after_x, after), enough);
                    } else if least.abs() <= enough {
                        found.reach(at, sign * least);
                    }
                }
            }
        }
        if let Some((next_x, after)) = next {
            if here * after < 0.0 {
                found.root(&mut off, (x, here), (next_x, after), enough);
            }
        }
    }
    found.close(goal, &points)
}

struct Found {
    settings: Vec<(f64, f64, Option<f64>)>,
    jumps: Vec<f64>,
    near: Option<(f64, f64)>,
}

impl Found {
    /// Remembers what comes nearest.
    fn look(&mut self, x: f64, off: f64) {
        if self.near.is_none_or(|(_, known)| off.abs() < known.abs()) {
            self.near = Some((x, off));
        }
    }

    fn reach(&mut self, x: f64, off: f64) {
        self.settings.push((x, off, None));
    }

    /// A sample that is exactly what is wanted: alone, or part of a stretch.
    fn zero(
        &mut self,
        off: &mut impl FnMut(f64) -> Option<f64>,
        x: f64,
        before: Option<(f64, Option<f64>)>,
        next: Option<(f64, f64)>,
    ) {
        let edge = |off: &mut dyn FnMut(f64) -> Option<f64>, inside: f64, outside: f64| {
            let (mut inside, mut outside) = (inside, outside);
            for _ in 0..60 {
                let middle = 0.5 * (inside + outside);
                if off(middle) == Some(0.0) { inside = middle } else { outside = middle }
            }
            inside
        };
        let starts = before.is_none_or(|(_, off)| off != Some(0.0));
        if starts {
            let first = before.map_or(x, |(outside, _)| edge(off, x, outside));
            self.settings.push((first, 0.0, None));
        }
        let ends = next.is_none_or(|(_, off)| off != 0.0);
        if ends {
            let last = next.map_or(x, |(outside, _)| edge(off, x, outside));
            if let Some(setting) = self.settings.last_mut() {
                if setting.0 != last {
                    setting.2 = Some(last);
                }
            }
        }
    }

    /// Closes in on a change of sign, and tells a jump from a zero.
    fn root(
        &mut self,
        off: &mut impl FnMut(f64) -> Option<f64>,
        (low, at_low): (f64, f64),
        (high, at_high): (f64, f64),
        enough: f64,
    ) {
        if at_low * at_high > 0.0 {
            return;
        }
        // Where any extent is at rest the number has no value: exactly there it jumps.
        let root = root_between(|x| off(x).unwrap_or(0.0), low, high, 0.0);
        let end = off(root.x);
        match end {
            Some(end) if root.outcome == RootOutcome::Found && end.abs() <= enough => {
                self.look(root.x, end);
                self.reach(root.x, end);
            }
            _ => {
                if let Some(end) = end {
                    self.look(root.x, end);
                }
                self.jumps.push(root.x);
            }
        }
    }

    fn close(self, goal: &Goal, points: &[(f64, Option<f64>)]) -> Target {
        let setting = |(value, off, until)| Setting { value, reached: goal.value + off, until };
        let settings: Vec<Setting> = self.settings.into_iter().map(setting).collect();
        let outcome = match settings.len() {
            0 => TargetOutcome::None,
            1 => TargetOutcome::One,
            _ => TargetOutcome::Several,
        };
        let nearest = match outcome {
            TargetOutcome::None => self.near.map(|(x, off)| setting((x, off, None))),
            _ => None,
        };
        let end = |point: Option<&(f64, Option<f64>)>| {
            point.and_then(|(_, off)| *off).map(|off| goal.value + off)
        };
        Target {
            outcome,
            settings,
            nearest,
            jumps: self.jumps,
            ends: (end(points.first()), end(points.last())),
            known_throughout: points.iter().all(|(_, off)| off.is_some()),
        }
    }
}
