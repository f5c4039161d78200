//! Notes on where K comes from.

use std::f64::consts::LN_10;

use super::question::KSource;
use super::run::Findings;
use super::shown;
use crate::constant::Constant;
use crate::library::{Combination, Known, Temperature, find};
use crate::problem::{NoteCode, Remark};

/// What was taken from elsewhere, carried beyond its range, or is the user's own.
pub(super) fn constant_remarks(found: &Findings) -> Vec<Remark> {
    let mut remarks = Vec::new();
    if found.question.reaction.approach_k.is_some() {
        let remark = Remark::new(NoteCode::ApproachTaken);
        remarks.push(remark.with("temperature", shown::temperature(found.k_temperature.kelvin())));
    }
    if matches!(&found.constant, Constant::Points(line) if line.bends) {
        remarks.push(Remark::new(NoteCode::PointsBend));
    }
    if let Constant::Library(combination) = &found.constant {
        remarks.extend(record_remarks(found, combination));
    }
    if matches!(found.question.reaction.source, KSource::Reading(_)) {
        remarks.push(Remark::new(NoteCode::KFromReading));
    }
    if let Some(by_k) = found.at.extrapolated_by_k {
        let code = match found.constant {
            Constant::Library(_) => NoteCode::Extrapolated,
            Constant::Points(_) => NoteCode::LineExtended,
            Constant::Formula(_) => NoteCode::FormulaExtended,
            Constant::Stated(_) => NoteCode::KNotCarried,
        };
        remarks.push(Remark::new(code).with("by_k", shown::number(by_k)));
    }
    remarks
}

/// Which records are the user's own, and what measured equilibria change.
fn record_remarks(found: &Findings, combination: &Combination) -> Vec<Remark> {
    let mut remarks = Vec::new();
    let temperature = Temperature::new(found.question.temperature.value_si);
    let temperature = temperature.unwrap_or(found.k_temperature);
    let at = found.at.ln_k;
    if !combination.measured().is_empty() {
        if let Ok(alone) = Combination::of_species(combination.terms()) {
            let log10 = |ln_k: f64| shown::number(ln_k / LN_10);
            let ln_k = alone.ln_k(temperature);
            let remark = Remark::new(NoteCode::MeasuredUsed).with("log10_k", log10(ln_k));
            remarks.push(remark.with("difference", log10(ln_k - at)));
        }
    }
    for (record, _) in combination.records().iter().filter(|(record, _)| record.is_own()) {
        let source = record.sources.first().map_or("", |source| &**source);
        let remark = Remark::new(NoteCode::OwnRecord).with("species", record.label());
        let remark = remark.with("source", source);
        remarks.push(remark.with("difference", without_own(combination, record, temperature)));
    }
    remarks
}

/// What K would be with the library's record in the place of the user's own; nothing where it has
/// none.
fn without_own(combination: &Combination, own: &Known, temperature: Temperature) -> String {
    let found = find(&own.formula, Some(own.phase), own.form.as_deref());
    let Some(table) = found.into_iter().find(|table| own.stands_for(table)) else {
        return String::new();
    };
    let swapped = combination.terms().iter().map(|(record, nu)| {
        let record = if record == own { Known::Table(table) } else { record.clone() };
        (record, *nu)
    });
    let swapped: Vec<(Known, f64)> = swapped.collect();
    let Ok(other) = Combination::of_species(&swapped) else { return String::new() };
    let ln_k = other.ln_k(temperature);
    format!(" With the library's record log10 K would be {}.", shown::number(ln_k / LN_10))
}
