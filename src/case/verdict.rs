//! The verdict and its uncertainty as the report tells them.

use super::answer::reacting;
use super::inputs::slot;
use super::judgement::{Judgement, Named};
use super::judgement_report::{BandReport, BetterRow, BudgetRow, JudgementReport};
use super::run::{Findings, ReadingFindings};
use super::shown;
use crate::advice::{Band, Budget, Direction, Interval, Verdict, tolerance_needed};
use crate::problem::words::{self, Language};
use crate::problem::{Remark, VerdictCode};
use crate::quantity::{difference_unit, show_number};

/// Rows of `better` at the most; more would be no advice.
const BETTER_ROWS: usize = 3;
/// An input with less than this share of the variance is not worth improving.
const WORTH_SHARE: f64 = 0.05;

pub(super) fn report(found: &Findings) -> JudgementReport {
    let Some(reading) = &found.reading else {
        return JudgementReport { why: say(Remark::new(VerdictCode::NoReading)), ..empty() };
    };
    let judgement = &reading.judgement;
    let (verdict, leaning) = match judgement.verdict {
        Verdict::Moves(direction) => ("forward or reverse", Some(direction)),
        Verdict::AtRest(leaning) => ("at rest", leaning),
        Verdict::Spent(direction) => ("at rest", Some(direction)),
        Verdict::CannotTell(leaning) => ("cannot tell", leaning),
    };
    let verdict = match judgement.verdict {
        Verdict::Moves(direction) => direction.word(),
        _ => verdict,
    };
    let u = |budget: &Option<Budget>| budget.as_ref().map(|budget| budget.u);
    let ends = |interval: Option<Interval>| interval.map(|ends| [ends.low, ends.high]);
    let linear = [&judgement.affinity, &judgement.approach];
    JudgementReport {
        verdict: Some(verdict),
        leaning: leaning.map(Direction::word),
        why: why(found, reading),
        u_ln_q: u(&judgement.ln_q),
        u_affinity_over_rt: u(&judgement.affinity),
        u_gibbs_j_per_mol: u(&judgement.gibbs),
        u_approach_k: u(&judgement.approach),
        affinity_interval_over_rt: ends(judgement.affinity_interval),
        approach_interval_k: ends(judgement.approach_interval),
        band: Some(match judgement.band {
            Band::Temperature { half_width_k } => BandReport::Temperature { half_width_k },
            Band::Conversion { half_width } => BandReport::Conversion { half_width },
        }),
        missing_conversion: judgement.now.missing_conversion,
        u_missing_conversion: u(&judgement.missing),
        missing_conversion_interval: ends(judgement.missing_interval),
        budget: budget_rows(judgement),
        linear: linear.into_iter().flatten().all(|budget| budget.is_linear),
        better: better(found, judgement),
    }
}

fn empty() -> JudgementReport {
    JudgementReport {
        verdict: None,
        leaning: None,
        why: String::new(),
        u_ln_q: None,
        u_affinity_over_rt: None,
        u_gibbs_j_per_mol: None,
        u_approach_k: None,
        affinity_interval_over_rt: None,
        approach_interval_k: None,
        band: None,
        missing_conversion: None,
        u_missing_conversion: None,
        missing_conversion_interval: None,
        budget: Vec::new(),
        linear: true,
        better: Vec::new(),
    }
}

fn say(sentence: Remark<VerdictCode>) -> String {
    words::verdict(&sentence, Language::En)
}

fn name(input: &Named) -> String {
    words::input(&input.name, Language::En)
}

fn budget_rows(judgement: &Judgement) -> Vec<BudgetRow> {
    let Some(budget) = &judgement.affinity else { return Vec::new() };
    let variance = budget.u * budget.u;
    let mut rows = Vec::with_capacity(judgement.inputs.len());
    for (i, (input, share)) in judgement.inputs.iter().zip(&budget.shares).enumerate() {
        let own = share.change * share.change + 2.0 * share.bend * share.bend;
        let approach = judgement.approach.as_ref().and_then(|budget| budget.shares.get(i));
        let row = BudgetRow {
            input: input.field.clone(),
            name: name(input),
            share_of_variance: if variance > 0.0 { own / variance } else { 0.0 },
            affinity_over_rt: share.change,
            approach_k: approach.map(|share| share.change),
        };
        let place = rows
            .iter()
            .position(|other: &BudgetRow| other.share_of_variance < row.share_of_variance);
        rows.insert(place.unwrap_or(rows.len()), row);
    }
    rows
}

/// The verdict in one sentence.
fn why(found: &Findings, reading: &ReadingFindings) -> String {
    let judgement = &reading.judgement;
    let absent = |sign: f64| {
        let rows = reacting(found).zip(&reading.amounts_mol);
        let gone =
            rows.filter(|(participant, amount)| participant.nu * sign > 0.0 && **amount == 0.0);
        gone.map(|(participant, _)| participant.species.text()).collect::<Vec<_>>().join(", ")
    };
    let sentence = match judgement.verdict {
        Verdict::Moves(direction) => moves(reading, direction),
        Verdict::AtRest(_) => at_rest(judgement, found.question.reaction.approach_k),
        Verdict::Spent(direction) => {
            let sign = if direction == Direction::Forward { -1.0 } else { 1.0 };
            Remark::new(VerdictCode::Spent)
                .with("way", direction.word())
                .with("species", absent(sign))
        }
        Verdict::CannotTell(None) => Remark::new(VerdictCode::BothAbsent)
            .with("left", absent(-1.0))
            .with("right", absent(1.0)),
        Verdict::CannotTell(Some(direction)) => {
            let closed = judgement
                .affinity_interval
                .is_some_and(|interval| interval.low.is_some() && interval.high.is_some());
            match (&judgement.affinity, judgement.now.affinity.finite()) {
                (Some(budget), Some(affinity)) if closed && judgement.bounds.is_empty() => {
                    Remark::new(VerdictCode::CannotTell)
                        .with("affinity", show_number(affinity, 3))
                        .with("half_width", show_number(2.0 * budget.u, 2))
                        .with("way", direction.word())
                }
                _ => Remark::new(VerdictCode::CannotTellOpen).with("way", direction.word()),
            }
        }
    };
    say(sentence)
}

fn moves(reading: &ReadingFindings, direction: Direction) -> Remark<VerdictCode> {
    let way = match direction {
        Direction::Forward => "forward",
        Direction::Reverse => "in reverse",
    };
    let (code, by_k) = match reading.approach {
        Ok(approach) if approach.shortfall_k > 0.0 => {
            (VerdictCode::MovesShort, approach.shortfall_k)
        }
        Ok(approach) => (VerdictCode::MovesPast, -approach.shortfall_k),
        Err(_) => return Remark::new(VerdictCode::Moves).with("way", way),
    };
    Remark::new(code).with("way", way).with("by_k", shown::kelvins(by_k))
}

fn at_rest(judgement: &Judgement, set_approach_k: Option<f64>) -> Remark<VerdictCode> {
    let now = &judgement.now;
    let nothing = now.affinity.finite().is_some_and(|over_rt| over_rt.abs() < 1e-9);
    match (judgement.band, now.approach_k, now.missing_conversion) {
        _ if nothing => Remark::new(VerdictCode::AtRest),
        (Band::Temperature { half_width_k }, Some(approach_k), _) => {
            let code = match set_approach_k {
                Some(_) => VerdictCode::InApproachBand,
                None => VerdictCode::InBand,
            };
            Remark::new(code)
                .with("set", shown::kelvins(set_approach_k.unwrap_or(0.0)))
                .with("approach", shown::kelvins(approach_k))
                .with("band", shown::number(half_width_k))
        }
        (Band::Conversion { half_width }, _, Some(missing)) => {
            Remark::new(VerdictCode::InConversionBand)
                .with("missing", show_number(missing * 100.0, 2))
                .with("band", shown::number(half_width * 100.0))
        }
        _ => Remark::new(VerdictCode::AtRest),
    }
}

/// What to measure better, where the verdict cannot be told: the inputs with the largest shares.
fn better(found: &Findings, judgement: &Judgement) -> Vec<BetterRow> {
    if !matches!(judgement.verdict, Verdict::CannotTell(Some(_))) {
        return Vec::new();
    }
    let mut question = found.question.clone();
    let mut rows: Vec<BetterRow> = Vec::new();
    for bound in &judgement.bounds {
        let name = words::input(&bound.name, Language::En);
        let sentence = Remark::new(VerdictCode::BetterBound).with("name", name.as_str());
        rows.push(BetterRow { input: bound.field.clone(), text: say(sentence), name });
    }
    if !rows.is_empty() {
        // Until the bounds are values no tolerance settles anything.
        return rows;
    }
    let (Some(budget), Some(over_rt)) = (&judgement.affinity, judgement.now.affinity.finite())
    else {
        return rows;
    };
    let ranked = budget_rows(judgement);
    for row in ranked.into_iter().filter(|row| row.share_of_variance >= WORTH_SHARE) {
        if rows.len() == BETTER_ROWS {
            break;
        }
        let input = judgement.inputs.iter().position(|input| name(input) == row.name);
        let Some(input) = input else { continue };
        let text = needed(&mut question, judgement, budget, input, over_rt.abs());
        rows.push(BetterRow { input: row.input, name: row.name, text });
    }
    rows
}

/// How well one input would have to be known.
fn needed(
    question: &mut super::question::Question,
    judgement: &Judgement,
    budget: &Budget,
    input: usize,
    over_rt: f64,
) -> String {
    let named = &judgement.inputs[input];
    let begin = |code| Remark::new(code).with("name", name(named));
    let quantity = named.place.and_then(|place| slot(question, place).copied());
    let stated = quantity.and_then(|quantity| Some((quantity, quantity.standard_uncertainty_si?)));
    let sentence = match (stated, tolerance_needed(budget, input, over_rt)) {
        (None, _) => begin(VerdictCode::BetterData),
        (Some((quantity, u)), Some(factor)) => {
            let unit = quantity.unit;
            let half_width = |u: f64| {
                let number = show_number(unit.difference_from_si(2.0 * u), 2);
                format!("{number} {}", difference_unit(unit).symbol).trim_end().to_owned()
            };
            begin(VerdictCode::Better)
                .with("needed", half_width(u * factor))
                .with("stated", half_width(u))
        }
        (Some(_), None) => begin(VerdictCode::BetterNotAlone),
    };
    say(sentence)
}
