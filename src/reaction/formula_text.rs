//! Reading a formula.

use crate::problem::Problem;
use crate::problem::ReactionCode;

use super::charge;
use super::formula::Formula;
use super::formula_reader::{partner, read_body};
use super::limits;
use super::place::{Place, closes, opens};
use super::repair;

/// Reads a formula from a place without space around it and without a phase.
pub(super) fn read(place: Place<'_>) -> Result<Formula, Problem> {
    if place.text().chars().count() > limits::FORMULA_CHARACTERS {
        let limit = limits::FORMULA_CHARACTERS.to_string();
        return Err(place.problem(ReactionCode::FormulaTooLong).with("limit", limit));
    }
    if place.text().is_empty() {
        return Err(place.problem(ReactionCode::FormulaEmpty));
    }
    check_brackets(place)?;
    let (body, charge) = charge::split(place)?;
    match body.text() {
        "e" => return Err(place.problem(ReactionCode::Electron)),
        "" => return Err(place.problem(ReactionCode::FormulaEmpty)),
        _ => {}
    }
    let (text, atoms) = read_body(body).map_err(|problem| advise(problem, body))?;
    if let Some(likely) = repair::letter_for_zero(&text) {
        return Err(body.problem(ReactionCode::ZeroForLetter).with("suggestion", likely));
    }
    Ok(Formula::new(text, atoms, charge))
}

/// Puts the likely spelling of the whole formula into a problem that leaves it open.
fn advise(problem: Problem, body: Place<'_>) -> Problem {
    let code = problem.code;
    let zero = code == ReactionCode::CountZero.into();
    if !zero && code != ReactionCode::ElementUnknown.into() {
        return problem;
    }
    let text = body.text();
    let spellings = repair::spellings(text).into_iter();
    let mut likely: Vec<String> =
        spellings.map(|text| repair::letter_for_zero(&text).unwrap_or(text)).collect();
    likely.retain(|spelling| read_body(Place::whole(spelling)).is_ok());
    if likely.is_empty() {
        return problem;
    }
    let better = if zero { ReactionCode::ZeroForLetter } else { ReactionCode::FormulaCapitals };
    let symbol = problem.arguments.into_iter().find(|(name, _)| *name == "symbol");
    let symbol = symbol.map_or_else(String::new, |(_, value)| value);
    body.problem(better).with("symbol", symbol).with("suggestion", repair::one_of(&likely))
}

fn check_brackets(place: Place<'_>) -> Result<(), Problem> {
    let mut open: Vec<(char, usize)> = Vec::new();
    for (at, character) in place.text().char_indices() {
        if opens(character) {
            open.push((character, at));
        } else if closes(character) {
            let matches = open.pop().is_some_and(|(opened, _)| partner(opened) == character);
            if !matches {
                return Err(place.part(at..at + 1).problem(ReactionCode::Bracket));
            }
        }
    }
    match open.pop() {
        Some((_, at)) => Err(place.part(at..at + 1).problem(ReactionCode::Bracket)),
        None => Ok(()),
    }
}
