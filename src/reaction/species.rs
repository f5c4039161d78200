//! Species as written: a formula, a phase, and a polymorph's or an isomer's name.

use std::fmt;

use crate::problem::Outcome;
use crate::problem::Problem;
use crate::problem::ReactionCode;

use super::formula::Formula;
use super::formula_text;
use super::limits;
use super::nearest::nearest;
use super::phase::Phase;
use super::place::{Place, opening_of_last};

/// A species as written: `SO2(g)`, `SO4^2-(aq)`, `C(s, graphite)`, `C2H6O(g, ethanol)`.
///
/// The phase may be left out. The form, which is the name of a polymorph or an isomer, stands
/// after a comma inside the phase's parentheses and is kept as typed; which forms there are is the
/// library's business.
#[derive(Debug, Clone, PartialEq, Eq, Hash)]
pub struct Species {
    /// What it is made of.
    pub formula: Formula,
    /// The phase it is in, where one is written.
    pub phase: Option<Phase>,
    /// Its form, where one is written; only together with a phase.
    pub form: Option<String>,
}

impl Species {
    /// The species as it is shown, saved and compared: formula, phase and form.
    #[must_use]
    pub fn text(&self) -> String {
        self.to_string()
    }
}

impl fmt::Display for Species {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        f.write_str(self.formula.text())?;
        match (self.phase, &self.form) {
            (Some(phase), Some(form)) => write!(f, "({}, {form})", phase.symbol()),
            (Some(phase), None) => write!(f, "({})", phase.symbol()),
            (None, _) => Ok(()),
        }
    }
}

/// Reads a species; space around it and before its phase is ignored.
///
/// # Errors
/// The first mistake in the formula and the first in the phase or form, with their places.
///
/// ```
/// use shiftgauge::reaction::{Phase, parse_species};
/// let carbon = parse_species("C (s,graphite)").unwrap();
/// assert_eq!(carbon.text(), "C(s, graphite)");
/// assert_eq!(carbon.phase, Some(Phase::Solid));
/// assert_eq!(parse_species("SO₄²⁻(aq)").unwrap().text(), "SO4^2-(aq)");
/// ```
pub fn parse_species(text: &str) -> Outcome<Species> {
    read(Place::whole(text).trimmed())
}

/// Reads a species from a place without space around it.
pub(super) fn read(place: Place<'_>) -> Outcome<Species> {
    let (body, inside) = split_phase(place);
    let formula = formula_text::read(body);
    let phase = inside.map(read_phase).transpose();
    match (formula, phase) {
        (Ok(formula), Ok(phase)) => {
            let (phase, form) = phase.map_or((None, None), |(phase, form)| (Some(phase), form));
            Ok(Species { formula, phase, form })
        }
        (formula, phase) => Err(formula.err().into_iter().chain(phase.err()).collect()),
    }
}

/// The formula, and what stands in the parentheses of a phase where there are some.
///
/// Parentheses at the end hold a phase when they begin with a small letter, hold a comma, or hold
/// a phase's symbol in capitals; otherwise they are a group or a charge.
fn split_phase(place: Place<'_>) -> (Place<'_>, Option<Place<'_>>) {
    let text = place.text();
    let open = opening_of_last(text).filter(|&open| text[open..].starts_with('('));
    let Some(open) = open.filter(|_| text.ends_with(')')) else { return (place, None) };
    let inside = place.part(open + 1..text.len() - 1);
    if !is_phase(inside.text()) {
        return (place, None);
    }
    (place.part(0..open).trimmed(), Some(inside.trimmed()))
}

/// Whether the text in parentheses after a formula is meant as a phase.
pub(super) fn is_phase(inside: &str) -> bool {
    let inside = inside.trim();
    let small = inside.chars().next().is_some_and(char::is_lowercase);
    let symbol = ["g", "l", "s", "aq", "cr"].contains(&inside.to_ascii_lowercase().as_str());
    small || symbol || inside.contains(',')
}

fn read_phase(inside: Place<'_>) -> Result<(Phase, Option<String>), Problem> {
    let text = inside.text();
    let (symbol, form) = match text.find(',') {
        Some(comma) => (inside.part(0..comma).trimmed(), Some(inside.from(comma + 1).trimmed())),
        None => (inside, None),
    };
    let Some(phase) = Phase::from_symbol(symbol.text()) else {
        return Err(match meant(symbol.text(), form.map(Place::text)) {
            Some(suggestion) => {
                symbol.problem(ReactionCode::PhaseUnknownLike).with("suggestion", suggestion)
            }
            None => symbol.problem(ReactionCode::PhaseUnknown),
        });
    };
    Ok((phase, form.map(read_form).transpose()?))
}

fn read_form(form: Place<'_>) -> Result<String, Problem> {
    let words: Vec<&str> = form.text().split_whitespace().collect();
    let name = words.join(" ");
    if name.is_empty() {
        return Err(form.problem(ReactionCode::FormEmpty));
    }
    let allowed = |c: char| c.is_alphanumeric() || matches!(c, '-' | '\'' | '′' | ',' | '.' | ' ');
    if !name.chars().all(allowed) || name.chars().count() > limits::FORM_CHARACTERS {
        let limit = limits::FORM_CHARACTERS.to_string();
        return Err(form.problem(ReactionCode::FormBad).with("limit", limit));
    }
    Ok(name)
}

/// The phase that another word for it means, with the form where one stands there.
fn meant(word: &str, form: Option<&str>) -> Option<String> {
    const WORDS: [(&str, Phase); 22] = [
        ("g", Phase::Gas),
        ("gas", Phase::Gas),
        ("gaseous", Phase::Gas),
        ("v", Phase::Gas),
        ("vap", Phase::Gas),
        ("vapour", Phase::Gas),
        ("vapor", Phase::Gas),
        ("steam", Phase::Gas),
        ("l", Phase::Liquid),
        ("liq", Phase::Liquid),
        ("liquid", Phase::Liquid),
        ("s", Phase::Solid),
        ("c", Phase::Solid),
        ("cr", Phase::Solid),
        ("sol", Phase::Solid),
        ("solid", Phase::Solid),
        ("crystal", Phase::Solid),
        ("aq", Phase::Aqueous),
        ("aqua", Phase::Aqueous),
        ("aqueous", Phase::Aqueous),
        ("dissolved", Phase::Aqueous),
        ("ao", Phase::Aqueous),
    ];
    let known = nearest(word, WORDS.iter().map(|row| row.0))?;
    let phase = WORDS.iter().find(|row| row.0 == known)?.1;
    Some(match form {
        Some(form) if !form.is_empty() => format!("({}, {form})", phase.symbol()),
        _ => format!("({})", phase.symbol()),
    })
}
