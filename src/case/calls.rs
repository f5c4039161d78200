//! The calls of the engine: stateless, plain data in and out.

use serde::Serialize;

use super::constant_of::k_report;
use super::participants::participants;
use super::refusal::Answer;
use super::report::{KReport, Report, TermReport};
use super::run::{self, at_field, delta_nu_gas};
use super::value::Value;
use crate::constant::Constant;
use crate::library::{self, Book, Combination, Known, Temperature};
use crate::problem::Outcome;
use crate::quantity::{self, Measure};
use crate::reaction::{self, parse_equation};

/// The answer of `check`.
#[derive(Debug, Clone, Serialize)]
pub struct Checked {
    ok: bool,
    /// The report.
    pub report: Report,
}

/// Judges a case; see [`super::check`].
#[must_use]
pub fn check(case: &Value) -> Answer<Checked> {
    run::check(case).map(|report| Checked { ok: true, report }).into()
}

/// The answer of `balance`.
#[derive(Debug, Clone, Serialize)]
pub struct Balanced {
    ok: bool,
    /// The balanced equation.
    pub equation: String,
    /// Its species with their stoichiometric numbers.
    pub terms: Vec<BalancedTerm>,
    /// Whether the text was already balanced.
    pub already_balanced: bool,
}

/// A species of a balanced equation.
#[derive(Debug, Clone, Serialize)]
pub struct BalancedTerm {
    /// The species as written.
    pub species: String,
    /// Its phase, if it was written.
    pub phase: Option<&'static str>,
    /// Its stoichiometric number, negative on the left.
    pub nu: f64,
}

/// Balances an equation with the smallest whole numbers.
#[must_use]
pub fn balance(equation: &str) -> Answer<Balanced> {
    let balanced = reaction::balance(equation).map_err(|found| at_field(found, "equation"));
    balanced
        .map(|balanced| Balanced {
            ok: true,
            equation: balanced.equation.text(),
            terms: balanced
                .equation
                .terms
                .iter()
                .map(|term| BalancedTerm {
                    species: term.species.text(),
                    phase: term.species.phase.map(reaction::Phase::symbol),
                    nu: term.nu.to_f64(),
                })
                .collect(),
            already_balanced: balanced.already_balanced,
        })
        .into()
}

/// The answer of `constant`.
#[derive(Debug, Clone, Serialize)]
pub struct ConstantAnswer {
    ok: bool,
    /// K and all its forms.
    pub constant: ConstantReport,
}

/// K of a reaction at one temperature, from the library.
#[derive(Debug, Clone, Serialize)]
pub struct ConstantReport {
    /// The equation as understood, phases written out.
    pub equation: String,
    /// Its species with their stoichiometric numbers.
    pub terms: Vec<TermReport>,
    /// The temperature.
    pub temperature_k: f64,
    /// K and what goes with it, as fields of their own.
    #[serde(flatten)]
    pub constant: KReport,
    /// The range of temperature that all records cover.
    pub range_k: Option<[f64; 2]>,
    /// How far outside it the temperature lies, if it does.
    pub extrapolated_by_k: Option<f64>,
}

/// Gives K of a reaction at a temperature, both as text.
#[must_use]
pub fn constant(equation: &str, temperature: &str) -> Answer<ConstantAnswer> {
    constant_report(equation, temperature)
        .map(|constant| ConstantAnswer { ok: true, constant })
        .into()
}

fn constant_report(equation: &str, temperature: &str) -> Outcome<ConstantReport> {
    let at_equation = |found| at_field(found, "reaction");
    let parsed = parse_equation(equation).map_err(at_equation);
    let kelvin = quantity::parse(temperature, &[Measure::Temperature])
        .and_then(|quantity| Temperature::new(quantity.value_si))
        .map_err(|found| at_field(found, "temperature"));
    let (parsed, at_temperature) = match (parsed, kelvin) {
        (Ok(parsed), Ok(kelvin)) => (parsed, kelvin),
        (parsed, kelvin) => {
            let mut problems = parsed.err().unwrap_or_default();
            problems.extend(kelvin.err().unwrap_or_default());
            return Err(problems);
        }
    };
    let found = participants(&parsed, &[], &Book::default(), true, Some(at_temperature));
    let found = found.map_err(at_equation)?;
    let rows = found.list.iter();
    let rows = rows.filter_map(|one| one.record.clone().map(|record| (record, one.nu)));
    let rows: Vec<(Known, f64)> = rows.collect();
    let constant = Constant::Library(Combination::new(&rows).map_err(at_equation)?);
    let at = constant.at(at_temperature);
    Ok(ConstantReport {
        equation: found.equation.text(),
        terms: TermReport::list(&found.list),
        temperature_k: at_temperature.kelvin(),
        constant: k_report(&at, delta_nu_gas(&found.list), at_temperature.kelvin(), None),
        range_k: constant.range_k().map(Into::into),
        extrapolated_by_k: at.extrapolated_by_k,
    })
}

/// The answer of `version`.
#[derive(Debug, Clone, Serialize)]
pub struct Version {
    ok: bool,
    /// The program's version.
    pub program: &'static str,
    /// The case format that it writes.
    pub format: &'static str,
    /// How many species the library knows.
    pub species: usize,
}

/// Gives the versions of the program and its tables.
#[must_use]
pub fn version() -> Version {
    Version {
        ok: true,
        program: env!("CARGO_PKG_VERSION"),
        format: super::read::FORMAT,
        species: library::count(),
    }
}
