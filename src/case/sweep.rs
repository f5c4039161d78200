//! The numbers of a chart: rest over one knob, for several settings of another.

use serde::Serialize;

use super::ask::{Asked, AskedKnob, AskedNumber};
use super::node::{Node, Reader};
use super::refusal::Answer;
use super::value::Value;
use crate::advice::{self, Knob, Knobs, SWEEP_LINES_MAX, SWEEP_POINTS_MAX, SweepRequest};
use crate::library::Temperature;
use crate::problem::{CaseCode, Outcome, Problem};

/// The answer of `sweep`.
#[derive(Debug, Clone, Serialize)]
pub struct Swept {
    ok: bool,
    /// What is drawn.
    pub sweep: SweepReport,
}

/// What is drawn.
#[derive(Debug, Clone, Serialize)]
pub struct SweepReport {
    /// The knob along x.
    pub x: AxisReport,
    /// One line for each setting of the other knob.
    pub lines: Vec<LineReport>,
    /// The number along y.
    pub show: ShowReport,
    /// The temperatures that the data of K cover, where they have a range.
    pub data_range_k: Option<[f64; 2]>,
    /// The standard uncertainty of ln K at each x, where ln K is shown along the temperature; null where
    /// none is known, and empty for what else is shown.
    pub u_ln_k: Vec<Option<f64>>,
    /// Where the plant stands: its setting of x, and the number at rest there.
    pub now: NowReport,
}

/// The knob along x.
#[derive(Debug, Clone, Serialize)]
pub struct AxisReport {
    /// Its name.
    pub knob: String,
    /// The unit of its values.
    pub unit: &'static str,
    /// Its values.
    pub values: Vec<f64>,
}

/// One line of the chart.
#[derive(Debug, Clone, Serialize)]
pub struct LineReport {
    /// The setting as it was asked for; empty where there is one line only.
    pub name: String,
    /// The setting.
    pub value_si: Option<f64>,
    /// The number at each x; null where there is none.
    pub y: Vec<Option<f64>>,
}

/// The number along y.
#[derive(Debug, Clone, Serialize)]
pub struct ShowReport {
    /// `conversion`, `fraction`, `amount`, `extent` or `ln_k`.
    pub what: String,
    /// The species that it is of.
    pub species: Option<String>,
}

/// Where the plant stands.
#[derive(Debug, Clone, Copy, Serialize)]
pub struct NowReport {
    /// The setting of x.
    pub x: Option<f64>,
    /// The number at rest.
    pub y: Option<f64>,
}

/// Works out a chart of a case.
#[must_use]
pub fn sweep(case: &Value, request: &Value) -> Answer<Swept> {
    swept(case, request).map(|sweep| Swept { ok: true, sweep }).into()
}

/// The other knob with its settings and their names.
type Lines = (AskedKnob, Vec<f64>, Vec<String>);

fn swept(case: &Value, request: &Value) -> Outcome<SweepReport> {
    let asked = Asked::new(case)?;
    let root = Node::root(request);
    let mut reader = Reader::default();
    if !reader.object(&root, &["x", "lines", "show"]) {
        return Err(root.problem(CaseCode::NotAnObject).into());
    }
    let x = read_x(&asked, &mut reader, &root.field("x"));
    let lines_node = root.field("lines");
    let lines = match lines_node.is_null() {
        true => None,
        false => read_lines(&asked, &mut reader, &lines_node),
    };
    let show = AskedNumber::read(&asked, &mut reader, &root.field("show"));
    let (Some((knob, from, to, count)), Some(show), true) = (x, show, reader.problems.is_empty())
    else {
        return Err(reader.problems);
    };
    let Some(plant) = asked.plant() else { return Err(reader.problems) };
    let mut knobs = Knobs::new(plant)?;
    let scaled: Option<Vec<f64>> = lines
        .as_ref()
        .map(|(knob, values, _)| values.iter().map(|value| value * knob.per_number).collect());
    let lines_knob: Option<(Knob, &[f64])> =
        lines.as_ref().zip(scaled.as_ref()).map(|((knob, ..), values)| (knob.knob, &values[..]));
    let drawn = advice::sweep(
        &mut knobs,
        &SweepRequest {
            x: knob.knob,
            from: from * knob.per_number,
            to: to * knob.per_number,
            count,
            lines: lines_knob,
            show: show.wanted,
        },
    );
    let told = |line: Vec<Option<f64>>| line.into_iter().map(|y| y.map(|y| show.told(y))).collect();
    let name = |i: usize| lines.as_ref().and_then(|(_, _, names)| names.get(i).cloned());
    let value = |i: usize| lines.as_ref().and_then(|(_, values, _)| values.get(i).copied());
    let drawn_lines = drawn.lines.into_iter().enumerate().map(|(i, line)| LineReport {
        name: name(i).unwrap_or_default(),
        value_si: value(i),
        y: told(line),
    });
    let constant = &asked.found.constant;
    let u_of = |t: &f64| Temperature::new(*t).ok().and_then(|at| constant.at(at).u_ln_k);
    let shows_k = show.what == "ln_k" && knob.name == "temperature";
    Ok(SweepReport {
        u_ln_k: if shows_k { drawn.x.iter().map(u_of).collect() } else { Vec::new() },
        lines: drawn_lines.collect(),
        x: AxisReport {
            unit: knob.unit(),
            values: drawn.x.iter().map(|x| x / knob.per_number).collect(),
            knob: knob.name.clone(),
        },
        data_range_k: asked.found.constant.range_k().map(Into::into),
        now: NowReport {
            x: knob.now(&asked),
            y: show.wanted.of(&mut knobs, &[]).map(|y| show.told(y)),
        },
        show: ShowReport { what: show.what, species: show.species },
    })
}

fn read_x(asked: &Asked, reader: &mut Reader, node: &Node) -> Option<(AskedKnob, f64, f64, usize)> {
    if !reader.object(node, &["knob", "from", "to", "count"]) {
        reader.problems.push(node.problem(CaseCode::Missing));
        return None;
    }
    let knob = AskedKnob::read(asked, reader, &node.field("knob"))?;
    let from = knob.number(asked, reader, &node.field("from"));
    let to = knob.number(asked, reader, &node.field("to"));
    let count_node = node.field("count");
    let count = reader.needed_number(&count_node)?;
    if !(2.0..=SWEEP_POINTS_MAX as f64).contains(&count) {
        let problem = Problem::new(CaseCode::SweepCount).with("found", format!("{count}"));
        let problem = problem.with("most", SWEEP_POINTS_MAX.to_string());
        reader.problems.push(problem.at(&count_node.path));
        return None;
    }
    Some((knob, from?, to?, count as usize))
}

fn read_lines(asked: &Asked, reader: &mut Reader, node: &Node) -> Option<Lines> {
    if !reader.object(node, &["knob", "values"]) {
        return None;
    }
    let knob = AskedKnob::read(asked, reader, &node.field("knob"))?;
    let values_node = node.field("values");
    let items = reader.items(&values_node);
    if items.is_empty() || items.len() > SWEEP_LINES_MAX {
        let problem = Problem::new(CaseCode::SweepLines).with("found", items.len().to_string());
        let problem = problem.with("most", SWEEP_LINES_MAX.to_string());
        reader.problems.push(problem.at(&values_node.path));
        return None;
    }
    let (mut values, mut names) = (Vec::new(), Vec::new());
    for item in &items {
        values.extend(knob.number(asked, reader, item));
        names.extend(reader.text(item).map(str::to_owned));
    }
    (values.len() == items.len()).then_some((knob, values, names))
}
