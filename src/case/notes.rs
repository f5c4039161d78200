//! Notes beside the report, and the sentence of the verdict.

use super::report::NoteReport;
use super::run::{Findings, ReadingFindings};
use super::shown;
use crate::advice::{Direction, NoApproach, Verdict};
use crate::constant::Constant;
use crate::problem::words::{Language, note};
use crate::problem::{NoteCode, Remark};
use crate::quantity::PressureReference;

/// Above this pressure the ideal gas is marked: a few per cent in activities of common gases.
/// Common practice, no source.
const IDEAL_GAS_MARK_PA: f64 = 10e5;

/// All notes: what was assumed and converted, what weakens the result, and the caution.
pub(super) fn notes(found: &Findings) -> Vec<NoteReport> {
    let mut remarks = equation_remarks(found);
    remarks.extend(found.remarks.iter().cloned());
    remarks.extend(pressure_remarks(found));
    remarks.extend(constant_remarks(found));
    if found.reading.is_none() {
        remarks.push(Remark::new(NoteCode::NoReading));
    } else if found.question.tolerances {
        remarks.push(Remark::new(NoteCode::TolerancesNotCarried));
    }
    remarks.push(Remark::new(NoteCode::Equilibrium));
    let say = |remark: &Remark| {
        let (level, text) = note(remark, Language::En);
        NoteReport { level: level.as_str(), code: remark.code.as_str(), text }
    };
    remarks.iter().map(say).collect()
}

fn equation_remarks(found: &Findings) -> Vec<Remark> {
    if found.question.reaction.already_balanced {
        return Vec::new();
    }
    vec![Remark::new(NoteCode::Balanced).with("equation", found.equation.text())]
}

fn pressure_remarks(found: &Findings) -> Vec<Remark> {
    let mut remarks = Vec::new();
    let question = &found.question;
    if let (Some(typed), Some(absolute_pa)) = (&question.pressure, question.pressure_pa) {
        if typed.pressure_reference == PressureReference::Gauge {
            if !question.atmosphere_stated {
                remarks.push(Remark::new(NoteCode::StandardAtmosphere));
            }
            remarks.push(
                Remark::new(NoteCode::GaugeToAbsolute)
                    .with("gauge", shown::pressure(typed.value_si))
                    .with("atmosphere", shown::pressure(question.atmosphere_pa))
                    .with("absolute", shown::pressure(absolute_pa)),
            );
        }
    }
    let pressure_pa = found.reading.as_ref().and_then(|reading| reading.setting.pressure_pa);
    if let Some(pressure_pa) = pressure_pa.filter(|pressure_pa| *pressure_pa > IDEAL_GAS_MARK_PA) {
        let remark = Remark::new(NoteCode::IdealGas);
        remarks.push(remark.with("pressure", shown::pressure(pressure_pa)));
    }
    remarks
}

fn constant_remarks(found: &Findings) -> Vec<Remark> {
    let mut remarks = Vec::new();
    if found.question.reaction.approach_k.is_some() {
        let remark = Remark::new(NoteCode::ApproachTaken);
        remarks.push(remark.with("temperature", shown::temperature(found.k_temperature.kelvin())));
    }
    if let Some(by_k) = found.at.extrapolated_by_k {
        let code = match found.constant {
            Constant::Library(_) => NoteCode::Extrapolated,
            Constant::Points(_) => NoteCode::LineExtended,
            Constant::Stated(_) => NoteCode::KNotCarried,
        };
        remarks.push(Remark::new(code).with("by_k", shown::number(by_k)));
    }
    remarks
}

/// The verdict in one sentence.
pub(super) fn why(found: &Findings) -> String {
    let Some(reading) = &found.reading else {
        return "No reading is given, so there is only K.".to_owned();
    };
    let names = |sign: f64| {
        let rows = found.participants.iter().zip(&reading.amounts_mol);
        let gone =
            rows.filter(|(participant, amount)| participant.nu * sign > 0.0 && **amount == 0.0);
        gone.map(|(participant, _)| participant.species.text()).collect::<Vec<_>>().join(", ")
    };
    match reading.verdict {
        Verdict::Moves(Direction::Forward) => moving(reading, "forward"),
        Verdict::Moves(Direction::Reverse) => moving(reading, "in reverse"),
        Verdict::AtRest => "Q equals K: nothing moves.".to_owned(),
        Verdict::Spent(direction) => {
            let sign = if direction == Direction::Forward { -1.0 } else { 1.0 };
            let gone = names(sign);
            format!("The affinity points {}, but there is no {gone} to use up.", direction.word())
        }
        Verdict::CannotTell => format!(
            "Species are absent from both sides ({}; {}), so Q is undetermined.",
            names(-1.0),
            names(1.0)
        ),
    }
}

fn moving(reading: &ReadingFindings, word: &str) -> String {
    match reading.approach {
        Ok(approach) if approach.shortfall_k > 0.0 => {
            format!(
                "The mixture moves {word}; it is {} K short of equilibrium.",
                shown::kelvins(approach.shortfall_k)
            )
        }
        Ok(approach) => {
            format!(
                "The mixture moves {word}; it is {} K past equilibrium.",
                shown::kelvins(-approach.shortfall_k)
            )
        }
        Err(_) => format!("The mixture moves {word}."),
    }
}

/// Why there is no T*, or that it is not the only one.
pub(super) fn approach_note(reading: &ReadingFindings) -> Option<String> {
    match reading.approach {
        Ok(approach) if approach.others == 0 => None,
        Ok(approach) => Some(format!(
            "K equals Q at {} more temperatures in the range; this one is the nearest.",
            approach.others
        )),
        Err(NoApproach::QuotientOpen) => Some("Q is not a finite number, so no temperature makes K equal to it.".to_owned()),
        Err(NoApproach::TemperatureUnknown) => Some(
            "K was stated without an enthalpy of reaction, so its change with temperature is not known.".to_owned(),
        ),
        Err(NoApproach::OutOfReach { from_k, to_k }) => Some(format!(
            "K does not reach Q anywhere between {} and {}.",
            shown::temperature(from_k),
            shown::temperature(to_k)
        )),
    }
}
