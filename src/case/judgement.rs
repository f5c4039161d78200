//! The verdict with its tolerances: each input is moved by its standard uncertainty and the case
//! run again.

use super::asker::{Asker, Shift};
use super::inputs::{Input, Place, bounds, inputs, slot, with};
use super::question::{KSource, Question};
use super::run::Ground;
use crate::advice::{
    Band, Budget, DEFAULT_BAND, DEFAULT_CONVERSION_BAND, End, Evidence, Figure, Interval, Judged,
    Moved, Verdict, budget, judge, temperature_says_something,
};
use crate::constant::Constant;
use crate::equilibrium::{Affinity, Workspace};
use crate::mixture::Closing;
use crate::problem::{InputCode, Remark};

/// What the tolerances make of a reading.
#[derive(Debug, Clone)]
pub(super) struct Judgement {
    pub verdict: Verdict,
    pub band: Band,
    /// Whether the band was chosen because a temperature says nothing here.
    pub band_is_conversion_by_need: bool,
    pub now: Judged,
    /// The inputs with a tolerance, in the order of the budgets' shares.
    pub inputs: Vec<Named>,
    /// The inputs that are bounds.
    pub bounds: Vec<Input>,
    pub affinity: Option<Budget>,
    pub ln_q: Option<Budget>,
    pub gibbs: Option<Budget>,
    pub approach: Option<Budget>,
    pub missing: Option<Budget>,
    pub affinity_interval: Option<Interval>,
    pub approach_interval: Option<Interval>,
    pub missing_interval: Option<Interval>,
}

/// An input of the budget.
#[derive(Debug, Clone)]
pub(super) struct Named {
    /// The field's path; empty for data that stand in no field.
    pub field: String,
    pub name: Remark<InputCode>,
    /// Its place in the case; none for data.
    pub place: Option<Place>,
}

/// Judges a reading with all its tolerances.
pub(super) fn judgement(
    question: &Question,
    ground: &Ground,
    now: Judged,
    is_found_from_k: bool,
) -> Judgement {
    let mut work = question.clone();
    fix_closing(&mut work, ground);
    let t_star_k = now.approach_k.map(|approach_k| now.temperature_k - approach_k);
    let mut asker = Asker { ground, t_star_k, workspace: Workspace::default() };
    let (mut named, mut moves) = (Vec::new(), Vec::new());
    for Input { place, field, name, u_si } in inputs(&mut work) {
        let Some(value_si) = slot(&mut work, place).map(|quantity| quantity.value_si) else {
            continue;
        };
        let mut to = |value_si| with(&mut work, place, value_si, |moved| asker.ask(moved, place));
        moves.push(Moved { up: to(value_si + u_si), down: to(value_si - u_si) });
        named.push(Named { field, name, place: Some(place) });
    }
    for (name, shift) in data_shifts(ground.constant) {
        let mut to = |shift| asker.with_constant(&work, ground.constant, shift);
        let down = Shift { gibbs_j_per_mol: -shift.gibbs_j_per_mol, times_u: -shift.times_u };
        moves.push(Moved { up: to(shift), down: to(down) });
        named.push(Named { field: String::new(), name, place: None });
    }
    let of = |figure| budget(figure, &now, &moves);
    let affinity = of(Figure::Affinity);
    let approach = of(Figure::Approach);
    let missing = of(Figure::MissingConversion);
    let bounds = bounds(&mut work);
    let ends = ends(&mut work, &mut asker, &bounds, &now);
    let u = |budget: &Option<Budget>| budget.as_ref().map_or(0.0, |budget| budget.u);
    // An input that can be moved neither way leaves the uncertainty unknown, which is not zero.
    let unknown = affinity.is_none() && now.affinity.finite().is_some();
    let affinity_interval = if unknown {
        Some(Interval { low: None, high: None })
    } else {
        affinity_interval(&now, &ends, u(&affinity))
    };
    let set_approach_k = question.reaction.approach_k.unwrap_or(0.0);
    let forward_of_approach = if ground.enthalpy_j_per_mol() > 0.0 { 1.0 } else { -1.0 };
    let approach_interval = approach.as_ref().zip(now.approach_k).map(|(budget, approach_k)| {
        let start = Interval::around(approach_k, budget.u);
        ends.iter().fold(start, |interval, end| {
            let end = match (end.affinity, end.approach_k) {
                (Affinity::Finite(_), Some(approach_k)) => End::At(approach_k),
                (Affinity::OpenForward, _) if forward_of_approach > 0.0 => End::OpenAbove,
                (Affinity::OpenForward, _) => End::OpenBelow,
                (Affinity::OpenReverse, _) if forward_of_approach > 0.0 => End::OpenBelow,
                (Affinity::OpenReverse, _) => End::OpenAbove,
                _ => End::OpenBothWays,
            };
            interval.reaching(end, budget.u)
        })
    });
    let missing_interval = missing.as_ref().zip(now.missing_conversion).map(|(budget, share)| {
        let start = Interval::around(share, budget.u);
        ends.iter().fold(start, |interval, end| {
            let end = end.missing_conversion.map_or(End::OpenBothWays, End::At);
            interval.reaching(end, budget.u)
        })
    });
    let (band, by_need) = band(question, ground, &now);
    let shifted = |interval: Interval| Interval {
        low: interval.low.map(|low| low - set_approach_k),
        high: interval.high.map(|high| high - set_approach_k),
    };
    let band_interval = match band {
        Band::Temperature { .. } => approach_interval.map(shifted),
        Band::Conversion { .. } => missing_interval,
    };
    let of_itself = is_found_from_k || matches!(question.reaction.source, KSource::Reading(_));
    let verdict = judge(&Evidence {
        affinity: now.affinity,
        affinity_interval,
        band_interval,
        band,
        forward_is_blocked: ground.rest.extent_max_mol == Some(0.0),
        reverse_is_blocked: ground.rest.extent_min_mol == Some(0.0),
    });
    // A reading that K is taken from is at equilibrium because it is said to be.
    let verdict = if of_itself { Verdict::AtRest(None) } else { verdict };
    Judgement {
        verdict,
        band,
        band_is_conversion_by_need: by_need,
        now,
        inputs: named,
        bounds,
        ln_q: of(Figure::LnQ),
        gibbs: of(Figure::Gibbs),
        affinity,
        approach,
        missing,
        affinity_interval,
        approach_interval,
        missing_interval,
    }
}

/// The entry that closes the fractions stays the same while the others are moved.
fn fix_closing(work: &mut Question, ground: &Ground) {
    let entry = |closing: Option<&Closing>| match closing {
        Some(Closing::ByRemainder { entry, .. } | Closing::ByLargest { entry, .. }) => Some(*entry),
        Some(Closing::Exact { entry }) => *entry,
        Some(Closing::NotNeeded) | None => None,
    };
    let setting = ground.setting;
    if let Some(gas) = &mut work.gas {
        gas.closed_by = entry(setting.closing.as_ref());
    }
    if let Some(feed) = &mut work.feed {
        feed.closed_by = entry(setting.feed.as_ref().map(|feed| &feed.closing));
    }
    if let Some(liquid) = &mut work.liquid {
        liquid.closed_by = entry(setting.liquid_closing.as_ref());
    }
}

/// The uncertainty of K's own data: one for each record of the library, or one of a line.
fn data_shifts(constant: &Constant) -> Vec<(Remark<InputCode>, Shift)> {
    match constant {
        Constant::Library(combination) => {
            let records = combination.records().iter().map(|(record, nu)| {
                let name = Remark::new(InputCode::Data).with("species", record.label());
                (name, nu * record.u_gibbs_j_per_mol)
            });
            let measured = combination.measured().iter().map(|(known, times)| {
                let name = Remark::new(InputCode::Measured).with("equation", known.equation());
                (name, times * known.u_gibbs_j_per_mol())
            });
            let rows = records.chain(measured).filter(|(_, gibbs)| *gibbs != 0.0);
            let shift = |gibbs_j_per_mol| Shift { gibbs_j_per_mol, times_u: 0.0 };
            rows.map(|(name, gibbs_j_per_mol)| (name, shift(gibbs_j_per_mol))).collect()
        }
        Constant::Points(line) if line.u_ln_k(line.range_k.0).is_some_and(|u| u > 0.0) => {
            let shift = Shift { gibbs_j_per_mol: 0.0, times_u: 1.0 };
            vec![(Remark::new(InputCode::KScatter), shift)]
        }
        Constant::Formula(formula) if formula.u_ln_k.is_some_and(|u| u > 0.0) => {
            let shift = Shift { gibbs_j_per_mol: 0.0, times_u: 1.0 };
            vec![(Remark::new(InputCode::KFormula), shift)]
        }
        // The tolerances of a stated value are inputs of their own.
        Constant::Points(_) | Constant::Stated(_) | Constant::Formula(_) => Vec::new(),
    }
}

/// What the case gives when the bounded values are zero: each alone, then all that raise the
/// affinity together, and all that lower it together.
fn ends(work: &mut Question, asker: &mut Asker, bounds: &[Input], now: &Judged) -> Vec<Judged> {
    let (mut raising, mut lowering) = (Vec::new(), Vec::new());
    let mut found = Vec::new();
    for &Input { place, .. } in bounds {
        let Some(end) = with(work, place, 0.0, |moved| asker.ask(moved, place)) else { continue };
        match (end.affinity, now.affinity) {
            (Affinity::Finite(there), Affinity::Finite(here)) if there < here => {
                lowering.push(place);
            }
            (Affinity::OpenReverse, _) => lowering.push(place),
            _ => raising.push(place),
        }
        found.push(end);
    }
    for together in [raising, lowering] {
        if together.len() > 1 {
            found.extend(all_zero(work, asker, &together));
        }
    }
    found
}

fn all_zero(work: &mut Question, asker: &mut Asker, places: &[Place]) -> Option<Judged> {
    match places {
        [] => None,
        [last] => with(work, *last, 0.0, |moved| asker.ask(moved, *last)),
        [first, others @ ..] => {
            let before = slot(work, *first)?.value_si;
            slot(work, *first)?.value_si = 0.0;
            let found = all_zero(work, asker, others);
            slot(work, *first)?.value_si = before;
            found
        }
    }
}

/// The interval of the affinity over all the bounds; none where Q is open and every bound agrees.
fn affinity_interval(now: &Judged, ends: &[Judged], u: f64) -> Option<Interval> {
    let Some(over_rt) = now.affinity.finite() else {
        let agrees = ends.iter().all(|end| end.affinity == now.affinity);
        return (!agrees).then_some(Interval { low: None, high: None });
    };
    let start = Interval::around(over_rt, u);
    let widen =
        |interval: Interval, end: &Judged| interval.reaching(End::of_affinity(end.affinity), u);
    Some(ends.iter().fold(start, widen))
}

/// The band of the case: as stated, else 10 K, else 1 % where a temperature says nothing.
fn band(question: &Question, ground: &Ground, now: &Judged) -> (Band, bool) {
    let band = question.band.unwrap_or(DEFAULT_BAND);
    let Band::Temperature { half_width_k } = band else { return (band, false) };
    let nu = ground.reacting.iter().map(|participant| participant.nu.abs());
    let says = temperature_says_something(
        ground.enthalpy_j_per_mol(),
        half_width_k,
        now.temperature_k,
        nu.sum(),
    );
    let knows = ground.constant.knows_temperature();
    if says || !knows || half_width_k == 0.0 {
        (band, false)
    } else {
        (DEFAULT_CONVERSION_BAND, true)
    }
}
