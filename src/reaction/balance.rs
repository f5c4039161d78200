//! Balancing: the stoichiometric numbers that conserve every element and charge.

use crate::numeric::Rational;
use crate::numeric::RationalError;
use crate::problem::Outcome;
use crate::problem::Problem;
use crate::problem::ReactionCode;
use crate::problem::Span;

use super::conserve;
use super::equation::{Equation, Term};
use super::equation_text::{self, Written, is_within_limits};
use super::limits;
use super::solve::solve;
use super::species::Species;

/// An equation that balances, and whether it did so as it was written.
#[derive(Debug, Clone, PartialEq, Eq)]
pub struct Balanced {
    /// The balanced equation.
    pub equation: Equation,
    /// Whether the text was balanced as written, a coefficient left out being one.
    pub already_balanced: bool,
}

/// A species of an equation, summed over the places where it is written.
pub(super) struct Column {
    pub(super) species: Species,
    /// The stoichiometric number as written, a coefficient left out being one.
    pub(super) nu: Rational,
    /// The side it is written on; none when it is on both.
    pub(super) left: Option<bool>,
    pub(super) span: Span,
}

/// Reads an equation; see [`balance`] for how, which also tells whether it was balanced as
/// written.
///
/// # Errors
/// As for [`balance`].
///
/// ```
/// use shiftgauge::reaction::parse_equation;
/// let shift = parse_equation("CO+H2O ⇌ CO2+H2").unwrap();
/// assert_eq!(shift.text(), "CO + H2O = CO2 + H2");
/// let ammonia = parse_equation("N2(g) + H2(g) -> NH3(g)").unwrap();
/// assert_eq!(ammonia.text(), "N2(g) + 3 H2(g) = 2 NH3(g)");
/// ```
pub fn parse_equation(text: &str) -> Outcome<Equation> {
    balance(text).map(|balanced| balanced.equation)
}

/// Reads an equation and balances it where all its coefficients are left out.
///
/// - The sides stand apart by `=`, `⇌`, `→`, `->`, `<->`, `<=>` or their like, which all mean the
///   same. The left side's stoichiometric numbers are negative.
/// - Coefficients are whole, decimal (`0.5`, `0,5`) or fractions (`1/2`, `½`, `1 1/2`). Where at
///   least one is written the others are one, and the equation must balance as it stands.
/// - Where none is written, and ones do not balance, the smallest whole numbers are found that
///   conserve every element (D and T apart from H) and the charge, with each species on the side
///   where it is written. Arithmetic is exact.
/// - A species written twice on one side is summed; one on both sides counts by the difference,
///   and is named in [`Equation::netted`].
///
/// # Errors
/// Every mistake in the text at once; or, where the text can be read, why it cannot be balanced:
/// an element on one side only, no combination, more than one, a species that would take no part
/// or would change sides, or given coefficients that do not balance (with those that do).
///
/// ```
/// use shiftgauge::reaction::balance;
/// let given = balance("SO2(g) + 1/2 O2(g) = SO3(g)").unwrap();
/// assert!(given.already_balanced);
/// let found = balance("MnO4^- + Fe^2+ + H+ = Mn^2+ + Fe^3+ + H2O").unwrap();
/// assert_eq!(found.equation.text(), "MnO4^- + 5 Fe^2+ + 8 H^+ = Mn^2+ + 5 Fe^3+ + 4 H2O");
/// assert!(balance("2 H2 + O2 = H2O").is_err());
/// ```
pub fn balance(text: &str) -> Outcome<Balanced> {
    let written = equation_text::read(text)?;
    balance_terms(written).map_err(|mut problems| {
        for problem in problems.iter_mut().filter(|problem| problem.span.is_none()) {
            problem.span = Some(Span::of(text, 0..text.len()));
        }
        problems
    })
}

/// Balances terms; a problem with the equation as a whole has no span.
fn balance_terms(written: Vec<Written>) -> Outcome<Balanced> {
    let given = written.iter().any(|term| term.coefficient.is_some());
    let columns = sum(written).map_err(|_| too_large())?;
    let netted: Vec<Species> = columns
        .iter()
        .filter(|column| column.left.is_none())
        .map(|column| column.species.clone())
        .collect();
    let as_written: Vec<Rational> = columns.iter().map(|column| column.nu).collect();
    let excess = conserve::excess(&columns).map_err(|_| too_large())?;
    let (numbers, already_balanced) = if as_written.iter().all(|nu| nu.is_zero()) {
        return Err(Problem::new(ReactionCode::NothingHappens).into());
    } else if excess.is_empty() {
        (as_written, true)
    } else {
        match (solve(&columns), given) {
            (Ok(numbers), false) => (numbers, false),
            (Ok(numbers), true) => {
                let suggestion = equation(&columns, &numbers, Vec::new()).text();
                let problem = unbalanced(ReactionCode::Unbalanced, &excess);
                return Err(problem.with("suggestion", suggestion).into());
            }
            (Err(problems), true) if is_open(&problems) => {
                return Err(unbalanced(ReactionCode::UnbalancedOpen, &excess).into());
            }
            (Err(problems), _) => return Err(problems),
        }
    };
    if !numbers.iter().all(|nu| is_within_limits(*nu)) {
        return Err(too_large().into());
    }
    Ok(Balanced { equation: equation(&columns, &numbers, netted), already_balanced })
}

/// One column for each species, in the order of the text.
fn sum(written: Vec<Written>) -> Result<Vec<Column>, RationalError> {
    let mut columns: Vec<Column> = Vec::new();
    for term in written {
        let magnitude = term.coefficient.unwrap_or(Rational::ONE);
        let nu = if term.left { magnitude.negated() } else { magnitude };
        match columns.iter_mut().find(|column| column.species == term.species) {
            Some(column) => {
                column.nu = column.nu.plus(nu)?;
                column.left = column.left.filter(|left| *left == term.left);
            }
            None => columns.push(Column {
                species: term.species,
                nu,
                left: Some(term.left),
                span: term.span,
            }),
        }
    }
    Ok(columns)
}

/// The equation of these columns with these stoichiometric numbers.
pub(super) fn equation(columns: &[Column], numbers: &[Rational], netted: Vec<Species>) -> Equation {
    let terms = columns.iter().zip(numbers).map(|(column, &nu)| Term {
        species: column.species.clone(),
        nu,
        span: column.span,
    });
    Equation::new(terms.collect(), netted)
}

fn is_open(problems: &[Problem]) -> bool {
    problems.iter().any(|problem| problem.code == ReactionCode::SeveralWays.into())
}

fn unbalanced(code: ReactionCode, excess: &[String]) -> Problem {
    Problem::new(code).with("found", excess.join("; "))
}

pub(super) fn too_large() -> Problem {
    Problem::new(ReactionCode::TooLargeToBalance).with("limit", limits::COEFFICIENT.to_string())
}
