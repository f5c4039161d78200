//! A reason made ready to be said.

use super::knob::Knob;
use super::reason::Reason;
use crate::problem::Why;
use crate::quantity::show_number;

/// How the one who asks writes species and settings.
#[derive(Clone, Copy)]
pub struct Wording<'a> {
    /// The name of each species, in the plant's order.
    pub species: &'a [String],
    /// A setting of a knob with its unit, in words of the page.
    pub setting: &'a dyn Fn(Knob, f64) -> String,
}

/// Fills in the figures of a reason: ΔH° in kJ/mol to four digits, fractions in per cent to as many
/// as tell them apart.
#[must_use]
pub fn why(reason: &Reason, wording: &Wording) -> Why {
    let figure = |value: f64| figure(value, 4);
    let mut why = Why::new(reason.code);
    if let Some(name) = reason.species.and_then(|species| wording.species.get(species)) {
        why = why.with("species", name.as_str());
    }
    if let Some(enthalpy) = reason.enthalpy_j_per_mol {
        why = why.with("enthalpy", figure(enthalpy / 1e3));
    }
    if let Some((from, to)) = reason.sides {
        why = why.with("from", figure(from)).with("to", figure(to));
    }
    if let Some(turning) = reason.turning_fraction {
        let per_cent = |share: f64, digits| format!("{} %", self::figure(100.0 * share, digits));
        let fraction = reason.fraction.unwrap_or(turning);
        let apart = |digits: &usize| per_cent(turning, *digits) != per_cent(fraction, *digits);
        let digits = (3..15).find(apart).unwrap_or(3);
        why = why.with("turning", per_cent(turning, digits));
        why = why.with("fraction", per_cent(fraction, digits));
    }
    if let Some((knob, value)) = reason.border {
        why = why.with("border", (wording.setting)(knob, value));
    }
    why
}

/// A number without zeros that say nothing.
fn figure(value: f64, digits: usize) -> String {
    let text = show_number(value, digits);
    let plain = text.contains('.') && !text.contains('×');
    if plain { text.trim_end_matches('0').trim_end_matches('.').to_owned() } else { text }
}
