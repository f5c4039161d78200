//! K as a user states it: one value, points, or a formula.

use super::node::{Node, Reader};
use super::question::{KindOfK, StatedFormula, StatedK};
use crate::constant::{FormulaTerm, PRESSURE_UNITS};
use crate::problem::{CaseCode, Problem};
use crate::quantity::{Measure, Quantity};

/// What the numbers are, the same for one value and for all points.
#[derive(Debug, Clone, Copy)]
struct Kind {
    kind: KindOfK,
    pressure_unit: Option<&'static str>,
}

/// Reads one stated value with its temperature and enthalpy.
pub(super) fn read_stated(reader: &mut Reader, node: &Node) -> Option<StatedK> {
    let kind = read_kind(reader, node);
    let value = read_value(reader, &node.field("value"), kind.map(|kind| kind.kind));
    let at = reader.quantity(&node.field("at"), &[Measure::Temperature]);
    let enthalpy = reader.quantity(&node.field("enthalpy"), &[Measure::MolarEnergy]);
    let heat_node = node.field("heat_capacity");
    let heat_capacity = reader.quantity(&heat_node, &[Measure::MolarHeatCapacity]);
    if enthalpy.is_none() && heat_capacity.is_some() {
        reader.problems.push(heat_node.problem(CaseCode::HeatCapacityAlone));
    }
    let Kind { kind, pressure_unit } = kind?;
    Some(StatedK { value: value?, kind, pressure_unit, at, enthalpy, heat_capacity })
}

/// Reads points: pairs of a temperature and a value.
pub(super) fn read_points(reader: &mut Reader, node: &Node) -> Option<Vec<StatedK>> {
    let kind = read_kind(reader, node);
    let list = node.field("points");
    if list.is_null() {
        reader.problems.push(list.problem(CaseCode::Missing));
    }
    let mut points = Vec::new();
    for item in reader.items(&list) {
        let pair = reader.items(&item);
        let [temperature, value] = &pair[..] else {
            reader.problems.push(item.problem(CaseCode::NotAPair));
            continue;
        };
        let at = reader.needed_quantity(temperature, &[Measure::Temperature]);
        let value = read_value(reader, value, kind.map(|kind| kind.kind));
        if let (Some(Kind { kind, pressure_unit }), Some(value), Some(at)) = (kind, value, at) {
            let (enthalpy, heat_capacity) = (None, None);
            let at = Some(at);
            points.push(StatedK { value, kind, pressure_unit, at, enthalpy, heat_capacity });
        }
    }
    kind.map(|_| points)
}

/// Reads a formula: its terms, what they give, and the range they were made for.
pub(super) fn read_formula(reader: &mut Reader, node: &Node) -> Option<StatedFormula> {
    let words = [("ln K", false), ("log10 K", true)];
    let is_log10 = reader.choice(&node.field("kind"), &words);
    let pressure_unit = read_pressure_unit(reader, &node.field("pressure_unit"));
    let terms_node = node.field("terms");
    let names = FormulaTerm::ALL.map(|(name, _)| name);
    let mut terms = Vec::new();
    if reader.object(&terms_node, &names) {
        for (name, term) in FormulaTerm::ALL {
            let number = reader.quantity(&terms_node.field(name), &[Measure::Number]);
            terms.extend(number.map(|number| (number.value_si, term)));
        }
    }
    if terms.is_empty() && reader.problems.is_empty() {
        reader.problems.push(terms_node.problem(CaseCode::FormulaWithoutTerms));
    }
    let range_k = read_range(reader, &node.field("range"));
    let tolerance = reader.quantity(&node.field("tolerance"), &[Measure::Number]);
    let tolerance = tolerance.map(|tolerance| tolerance.value_si.abs());
    Some(StatedFormula { terms, is_log10: is_log10?, pressure_unit, range_k, tolerance })
}

/// Two temperatures, the lower first.
fn read_range(reader: &mut Reader, node: &Node) -> Option<(f64, f64)> {
    let items = reader.items(node);
    let [low, high] = &items[..] else {
        if !node.is_null() {
            reader.problems.push(node.problem(CaseCode::NotARange));
        }
        return None;
    };
    let low = reader.needed_quantity(low, &[Measure::Temperature])?.value_si;
    let high = reader.needed_quantity(high, &[Measure::Temperature])?.value_si;
    if low >= high {
        reader.problems.push(node.problem(CaseCode::NotARange));
        return None;
    }
    Some((low, high))
}

fn read_pressure_unit(reader: &mut Reader, node: &Node) -> Option<&'static str> {
    let units = PRESSURE_UNITS.map(|unit| (unit.symbol, unit.symbol));
    if node.is_null() { None } else { reader.choice(node, &units) }
}

fn read_kind(reader: &mut Reader, node: &Node) -> Option<Kind> {
    let words = [
        ("K", KindOfK::K),
        ("Kp", KindOfK::Kp),
        ("Kc", KindOfK::Kc),
        ("Kx", KindOfK::Kx),
        ("log10 K", KindOfK::Log10K),
        ("ln K", KindOfK::LnK),
        ("pK", KindOfK::PK),
        ("gibbs", KindOfK::Gibbs),
    ];
    let kind = reader.choice(&node.field("kind"), &words);
    let unit_node = node.field("pressure_unit");
    let pressure_unit = read_pressure_unit(reader, &unit_node);
    if kind == Some(KindOfK::Kp) && unit_node.is_null() {
        reader.problems.push(unit_node.problem(CaseCode::KpNeedsUnit));
    }
    Some(Kind { kind: kind?, pressure_unit })
}

fn read_value(reader: &mut Reader, node: &Node, kind: Option<KindOfK>) -> Option<Quantity> {
    let measure = if kind == Some(KindOfK::Gibbs) { Measure::MolarEnergy } else { Measure::Number };
    let value = reader.needed_quantity(node, &[measure])?;
    let is_k = matches!(kind, Some(KindOfK::K | KindOfK::Kp | KindOfK::Kc | KindOfK::Kx));
    if is_k && value.value_si <= 0.0 {
        let found = format!("{}", value.value_si);
        let problem = Problem::new(CaseCode::KNotPositive).with("found", found);
        reader.problems.push(problem.at(&node.path));
        return None;
    }
    Some(value)
}
