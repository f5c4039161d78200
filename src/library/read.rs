//! Records out of the lines of the tables.

use std::borrow::Cow;

use super::polynomial::Piece;
use super::polynomial::Polynomial;
use super::polynomial::with_ends;
use super::record::Record;
use super::record::UncertaintyKind;
use super::temperature::TEMPERATURE_LIMITS_K;
use crate::reaction::Phase;

impl Record {
    /// Reads a line of the species table and its lines of the heat table; none if one is broken.
    pub(super) fn read(
        line: &'static str,
        heat: impl Iterator<Item = &'static str>,
    ) -> Option<Record> {
        let cells: Vec<&'static str> = line.split('\t').collect();
        let [id, formula, phase, form, names, cas, _hill, enthalpy, entropy, u, kind, sources] =
            cells[..]
        else {
            return None;
        };
        let (range_k, pieces) = read_pieces(heat.map(|line| line.split('\t').skip(1)))?;
        Some(Record {
            id: id.into(),
            formula: formula.into(),
            phase: Phase::from_symbol(phase)?,
            form: Some(form).filter(|text| !text.is_empty()).map(Cow::Borrowed),
            names: names.split(';').map(Cow::Borrowed).collect(),
            cas: cas.into(),
            formation_enthalpy_j_per_mol: 1000.0 * number(enthalpy)?,
            standard_entropy_j_per_mol_k: number(entropy)?,
            u_gibbs_j_per_mol: 1000.0 * number(u)?,
            u_kind: UncertaintyKind::WORDS.iter().find(|(word, _)| *word == kind)?.1,
            sources: sources.split(';').map(Cow::Borrowed).collect(),
            range_k,
            pieces,
        })
    }
}

/// The range and the pieces of a species, with one of constant heat capacity at either end; a line
/// is its two limits, seven coefficients and two constants.
pub(super) fn read_pieces<'a>(
    lines: impl Iterator<Item = impl Iterator<Item = &'a str>>,
) -> Option<((f64, f64), Vec<Piece>)> {
    let mut pieces: Vec<Piece> = Vec::with_capacity(4);
    let mut end_k = None;
    for mut cells in lines {
        let mut figures = [0.0; 11];
        for figure in &mut figures {
            *figure = number(cells.next()?)?;
        }
        let [low, high, a @ .., b_enthalpy, b_entropy] = figures;
        let in_order =
            low > TEMPERATURE_LIMITS_K.0 && high >= low && end_k.is_none_or(|k| k == low);
        if !in_order {
            return None;
        }
        end_k = Some(high);
        let polynomial = Polynomial { a, b_enthalpy, b_entropy };
        pieces.push(Piece { from_k: low, polynomial });
    }
    let (low_k, high_k) = (pieces.first()?.from_k, end_k?);
    Some(((low_k, high_k), with_ends(pieces, high_k)?))
}

pub(super) fn number(cell: &str) -> Option<f64> {
    cell.parse().ok().filter(|value: &f64| value.is_finite())
}
