//! Which setting of a knob gives a wanted number at rest.

use serde::Serialize;

use super::ask::{Asked, AskedKnob, AskedNumber};
use super::node::{Node, Reader};
use super::refusal::Answer;
use super::shown;
use super::value::Value;
use crate::advice::{self, Goal, Knob, Knobs, TargetOutcome};
use crate::problem::words::{self, Language};
use crate::problem::{CaseCode, Outcome, Problem, Remark, TargetCode};

/// The answer of `target`.
#[derive(Debug, Clone, Serialize)]
pub struct Targeted {
    ok: bool,
    /// The settings.
    pub target: TargetReport,
}

/// The settings that reach a goal.
#[derive(Debug, Clone, Serialize)]
pub struct TargetReport {
    /// `none`, `one` or `several`.
    pub outcome: &'static str,
    /// The settings, from one end of the range to the other.
    pub settings: Vec<SettingReport>,
    /// Where none reaches the goal, the setting that comes nearest.
    pub nearest: Option<SettingReport>,
    /// The knob's first value.
    pub from_si: f64,
    /// The knob's last value.
    pub to_si: f64,
    /// The unit of the settings.
    pub unit: &'static str,
    /// The answer in a sentence or two.
    pub why: String,
}

/// One setting.
#[derive(Debug, Clone, Serialize)]
pub struct SettingReport {
    /// The setting.
    pub value_si: f64,
    /// The same, as a text with its unit.
    pub text: String,
    /// The number that is reached.
    pub reached: f64,
}

/// Looks for the settings of one knob that reach a goal:
/// `{ knob, from, to, reach: { what, species }, value }`.
#[must_use]
pub fn target(case: &Value, goal: &Value) -> Answer<Targeted> {
    targeted(case, goal).map(|target| Targeted { ok: true, target }).into()
}

fn targeted(case: &Value, goal: &Value) -> Outcome<TargetReport> {
    let asked = Asked::new(case)?;
    let root = Node::root(goal);
    let mut reader = Reader::default();
    if !reader.object(&root, &["knob", "from", "to", "reach", "value"]) {
        return Err(root.problem(CaseCode::NotAnObject).into());
    }
    let knob = AskedKnob::read(&asked, &mut reader, &root.field("knob"));
    let mut end = |name: &str| knob.as_ref()?.number(&asked, &mut reader, &root.field(name));
    let (from, to) = (end("from"), end("to"));
    let reach = AskedNumber::read(&asked, &mut reader, &root.field("reach"));
    let value_node = root.field("value");
    let measure = reach.as_ref().map(AskedNumber::measure);
    let value = measure.and_then(|measure| reader.needed_quantity(&value_node, &[measure]));
    if let (Some(from), Some(to)) = (from, to) {
        if from == to {
            reader.problems.push(Problem::new(CaseCode::NotARange).at("to"));
        }
    }
    let (Some(knob), Some(from), Some(to), Some(reach), Some(value), true) =
        (knob, from, to, reach, value, reader.problems.is_empty())
    else {
        return Err(reader.problems);
    };
    let Some(plant) = asked.plant() else { return Err(reader.problems) };
    let mut knobs = Knobs::new(plant)?;
    let found = advice::target(
        &mut knobs,
        &Goal {
            knob: knob.knob,
            from: from * knob.per_number,
            to: to * knob.per_number,
            reach: reach.wanted,
            value: reach.asked(value.value_si),
        },
    );
    let report = |setting: &advice::Setting| SettingReport {
        value_si: setting.value / knob.per_number,
        text: text(&knob, setting.value / knob.per_number),
        reached: reach.told(setting.reached),
    };
    let settings: Vec<SettingReport> = found.settings.iter().map(report).collect();
    let nearest = found.nearest.as_ref().map(report);
    let mut sentences = vec![sentence(&found.outcome, &settings, nearest.as_ref(), &reach)];
    if let Some(jump) = found.jumps.first() {
        let at = text(&knob, jump / knob.per_number);
        sentences.push(say(Remark::new(TargetCode::Jumps).with("at", at)));
    }
    if !found.known_throughout {
        sentences.push(say(Remark::new(TargetCode::NotThroughout)));
    }
    Ok(TargetReport {
        outcome: found.outcome.as_str(),
        settings,
        nearest,
        from_si: from,
        to_si: to,
        unit: knob.unit(),
        why: sentences.join(" "),
    })
}

fn say(sentence: Remark<TargetCode>) -> String {
    words::target(&sentence, Language::En)
}

fn sentence(
    outcome: &TargetOutcome,
    settings: &[SettingReport],
    nearest: Option<&SettingReport>,
    reach: &AskedNumber,
) -> String {
    let list: Vec<&str> = settings.iter().map(|setting| setting.text.as_str()).collect();
    let remark = match (outcome, nearest) {
        (TargetOutcome::One, _) => Remark::new(TargetCode::One).with("setting", list.join(", ")),
        (TargetOutcome::Several, _) => {
            Remark::new(TargetCode::Several).with("settings", list.join(", "))
        }
        (TargetOutcome::None, Some(nearest)) => {
            let reached = match reach.what.as_str() {
                "conversion" | "fraction" => {
                    format!("{} %", shown::significant(nearest.reached * 100.0, 5))
                }
                _ => shown::number(nearest.reached),
            };
            Remark::new(TargetCode::Nearest)
                .with("setting", nearest.text.as_str())
                .with("reached", reached)
        }
        (TargetOutcome::None, None) => Remark::new(TargetCode::Nowhere),
    };
    say(remark)
}

/// A setting with its unit.
fn text(knob: &AskedKnob, value: f64) -> String {
    match knob.knob {
        Knob::Temperature => shown::temperature(value),
        Knob::Pressure => shown::pressure(value),
        Knob::Volume => format!("{} m³", shown::number(value)),
        _ => format!("{} mol/mol", shown::number(value)),
    }
}
