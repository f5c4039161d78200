//! Reading the terms of an equation, as they are written.

use crate::numeric::Rational;
use crate::problem::Outcome;
use crate::problem::Problem;
use crate::problem::ReactionCode;
use crate::problem::Span;

use super::limits;
use super::place::Place;
use super::species::{self, Species};
use super::split;

/// A term as written.
pub(super) struct Written {
    pub(super) species: Species,
    /// The coefficient, where one is written.
    pub(super) coefficient: Option<Rational>,
    pub(super) left: bool,
    pub(super) span: Span,
}

/// Reads all terms of an equation, or finds every mistake in its text.
pub(super) fn read(text: &str) -> Outcome<Vec<Written>> {
    let whole = Place::whole(text);
    let length = text.chars().count();
    if length > limits::EQUATION_CHARACTERS {
        let problem = Problem::new(ReactionCode::EquationTooLong)
            .with("found", length.to_string())
            .with("limit", limits::EQUATION_CHARACTERS.to_string());
        return Err(problem.into());
    }
    if text.trim().is_empty() {
        return Err(whole.problem(ReactionCode::Empty).into());
    }
    let arrows = split::arrows(text);
    let mut problems = Vec::new();
    match arrows.as_slice() {
        [] => problems.push(whole.trimmed().problem(ReactionCode::NoArrow)),
        [_] => {}
        [_, more @ ..] => {
            let again = more.iter().map(|arrow| whole.part(arrow.clone()));
            problems.extend(again.map(|arrow| arrow.problem(ReactionCode::ManyArrows)));
        }
    }
    let mut terms = Vec::new();
    let mut start = 0;
    for (index, end) in arrows.iter().map(|arrow| arrow.start).chain([text.len()]).enumerate() {
        match read_side(whole.part(start..end), index == 0) {
            Ok(side) => terms.extend(side),
            Err(found) => problems.extend(found),
        }
        start = arrows.get(index).map_or(end, |arrow| arrow.end);
    }
    if terms.len() > limits::SPECIES {
        let problem = Problem::new(ReactionCode::TooManySpecies)
            .with("found", terms.len().to_string())
            .with("limit", limits::SPECIES.to_string());
        problems.push(problem);
    }
    if problems.is_empty() { Ok(terms) } else { Err(problems) }
}

fn read_side(side: Place<'_>, left: bool) -> Outcome<Vec<Written>> {
    if side.text().trim().is_empty() {
        let code = if left { ReactionCode::LeftEmpty } else { ReactionCode::RightEmpty };
        return Err(side.problem(code).into());
    }
    let mut terms = Vec::new();
    let mut problems = Vec::new();
    for term in split::terms(side) {
        match read_term(term.trimmed(), left) {
            Ok(term) => terms.push(term),
            Err(found) => problems.extend(found),
        }
    }
    if problems.is_empty() { Ok(terms) } else { Err(problems) }
}

fn read_term(term: Place<'_>, left: bool) -> Outcome<Written> {
    if term.text().is_empty() {
        return Err(term.problem(ReactionCode::TermEmpty).into());
    }
    let (number, rest) = split_coefficient(term);
    let coefficient = number.map(read_coefficient).transpose();
    let body = rest.trimmed();
    if number.is_some() && body.text().is_empty() {
        return Err(term.problem(ReactionCode::CoefficientAlone).into());
    }
    match (coefficient, species::read(body)) {
        (Ok(coefficient), Ok(species)) => {
            Ok(Written { species, coefficient, left, span: term.span() })
        }
        (coefficient, species) => {
            let species = species.err().unwrap_or_default();
            Err(coefficient.err().into_iter().chain(species).collect())
        }
    }
}

/// The coefficient's text where there is one, and what follows it (and a sign of times after it).
fn split_coefficient(term: Place<'_>) -> (Option<Place<'_>>, Place<'_>) {
    let text = term.text();
    let numeric = |c: char| Rational::is_written_with(c) || c == ' ';
    if let Some(inside) = text.strip_prefix('(') {
        let is_number = |text: &str| !text.trim().is_empty() && text.chars().all(numeric);
        if let Some(close) = inside.find(')').filter(|&close| is_number(&inside[..close])) {
            return (Some(term.part(1..close + 1).trimmed()), term.from(close + 2));
        }
    }
    let end = text.len() - text.trim_start_matches(numeric).len();
    let number = term.part(0..end).trimmed();
    if number.text().is_empty() {
        return (None, term);
    }
    let rest = term.from(end).trimmed();
    let times = rest.text().chars().next().filter(|c| matches!(c, '*' | '·' | '×'));
    (Some(number), rest.from(times.map_or(0, char::len_utf8)))
}

fn read_coefficient(number: Place<'_>) -> Result<Rational, Problem> {
    use crate::numeric::RationalError as E;
    match number.text().parse::<Rational>() {
        Ok(value) if value.is_zero() => Err(number.problem(ReactionCode::CoefficientZero)),
        Ok(value) if is_within_limits(value) => Ok(value),
        Ok(_) | Err(E::Overflow) => Err(number
            .problem(ReactionCode::CoefficientTooLarge)
            .with("limit", limits::COEFFICIENT.to_string())),
        Err(_) => Err(number.problem(ReactionCode::CoefficientBad)),
    }
}

/// Whether a coefficient is one that the program works with.
pub(super) fn is_within_limits(coefficient: Rational) -> bool {
    let limit = Rational::from(limits::COEFFICIENT);
    coefficient.magnitude() <= limit && coefficient.denominator() <= limit.numerator()
}
