//! A number called K turned into every other form.

use serde::Serialize;

use super::constant_of::{Beside, k_report, stated_constant};
use super::node::{Node, Reader};
use super::participants::participants;
use super::question::StatedK;
use super::read_constant::read_stated;
use super::refusal::Answer;
use super::report::{FormReport, TermReport};
use super::run::{at_field, delta_nu_gas};
use super::value::Value;
use crate::constant::Constant;
use crate::library::{Book, Temperature};
use crate::mixture::absolute_pressure_pa;
use crate::problem::{CaseCode, Outcome};
use crate::quantity::{Measure, STANDARD_ATMOSPHERE_PA};
use crate::reaction::balance;

/// The answer of `convert`.
#[derive(Debug, Clone, Serialize)]
pub struct Converted {
    ok: bool,
    /// The equation that the number belongs to, phases written out.
    pub equation: String,
    /// Its species with their stoichiometric numbers.
    pub terms: Vec<TermReport>,
    /// The change in the number of gas molecules.
    pub delta_nu_gas: f64,
    /// The temperature.
    pub temperature_k: f64,
    /// ln K, p° = 1 bar.
    pub ln_k: f64,
    /// pK = −log10 K.
    pub pk: f64,
    /// ΔG° = −RT ln K.
    pub gibbs_j_per_mol: f64,
    /// K, Kp in bar, atm and kPa, Kc, and Kx where a pressure is given.
    pub forms: Vec<FormReport>,
}

/// Turns a number of any kind into every other: an object with `equation`, `value`, `kind`,
/// `pressure_unit`, `temperature` and, for Kx, `pressure`.
#[must_use]
pub fn convert(number: &Value) -> Answer<Converted> {
    converted(number).into()
}

fn converted(number: &Value) -> Outcome<Converted> {
    let root = Node::root(number);
    let mut reader = Reader::default();
    let names = ["equation", "value", "kind", "pressure_unit", "temperature", "pressure"];
    if !reader.object(&root, &names) {
        return Err(root.problem(CaseCode::NotAnObject).into());
    }
    let equation_node = root.field("equation");
    let equation = reader.needed_text(&equation_node);
    let equation = equation.and_then(|text| reader.keep(&equation_node, balance(text)));
    let stated = read_stated(&mut reader, &root);
    let temperature_node = root.field("temperature");
    let temperature = reader.needed_quantity(&temperature_node, &[Measure::Temperature]);
    let temperature = temperature.and_then(|temperature| {
        reader.keep(&temperature_node, Temperature::new(temperature.value_si))
    });
    let pressure_node = root.field("pressure");
    let pressure = reader.quantity(&pressure_node, &[Measure::Pressure]);
    let pressure_pa = pressure.and_then(|pressure| {
        let absolute = absolute_pressure_pa(&pressure, STANDARD_ATMOSPHERE_PA);
        reader.keep(&pressure_node, absolute.map_err(Vec::from))
    });
    let (Some(equation), Some(stated), Some(temperature)) = (equation, stated, temperature) else {
        return Err(reader.problems);
    };
    if !reader.problems.is_empty() {
        return Err(reader.problems);
    }
    let found = participants(&equation.equation, &[], &Book::default(), false, None);
    let found = found.map_err(|problems| at_field(problems, "equation"))?;
    let delta_nu_gas = delta_nu_gas(&found.list);
    let temperature_k = temperature.kelvin();
    let stated = StatedK { at: None, enthalpy: None, heat_capacity: None, ..stated };
    let constant = stated_constant(&stated, Beside { temperature_k, pressure_pa }, delta_nu_gas)?;
    let at = Constant::Stated(constant).at(temperature);
    let report = k_report(&at, delta_nu_gas, temperature_k, pressure_pa);
    Ok(Converted {
        ok: true,
        equation: found.equation.text(),
        terms: TermReport::list(&found.list),
        delta_nu_gas,
        temperature_k,
        ln_k: at.ln_k,
        pk: -report.log10_k,
        gibbs_j_per_mol: at.gibbs_j_per_mol,
        forms: report.forms,
    })
}
