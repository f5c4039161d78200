//! The working: formula, numbers put in, result, line by line.

use super::answer::{basis_name, ln_q, quotient_word, reacting};
use super::blocks::Block;
use super::participants::Participant;
use super::question::KSource;
use super::report::StepReport;
use super::run::{Findings, ReadingFindings};
use super::shown;
use crate::constant::{Constant, FormulaTerm};
use crate::equilibrium::{Hold, Quotient, RestOutcome};
use crate::library::Temperature;
use crate::problem::words::{Language, step};
use crate::problem::{Step, StepCode};
use crate::quantity::{GAS_CONSTANT_J_PER_MOL_K, PressureReference};
use crate::quantity::{show_like, show_number};
use crate::reaction::Phase;
use std::f64::consts::LN_10;

/// All lines, in the order in which one would work it out by hand.
pub(super) fn steps(found: &Findings) -> Vec<StepReport> {
    let mut lines = constant_lines(found);
    if let Some(reading) = &found.reading {
        lines.extend(reading_lines(found, reading));
        lines.extend(quotient_lines(found, reading));
        lines.extend(rest_lines(found, reading));
    }
    let say =
        |(about, line): &(&'static str, Step)| StepReport { text: step(line, Language::En), about };
    lines.iter().map(say).collect()
}

type Line = (&'static str, Step);

fn kelvin(found: &Findings) -> String {
    shown::kelvin(found.question.temperature.value_si)
}

fn constant_lines(found: &Findings) -> Vec<Line> {
    let at = &found.at;
    let mut lines = Vec::new();
    match &found.constant {
        Constant::Library(combination) => {
            let temperature = Temperature::new(found.question.temperature.value_si);
            let temperature = temperature.unwrap_or(found.k_temperature);
            for (known, times) in combination.measured() {
                lines.push((
                    "k",
                    Step::new(StepCode::MeasuredK)
                        .with("equation", known.equation())
                        .with("log10_k", shown::number(known.ln_k(temperature) / LN_10))
                        .with("times", shown::number(*times))
                        .with("temperature_k", kelvin(found)),
                ));
            }
            for (record, nu) in combination.records() {
                let of = record.properties(temperature);
                lines.push((
                    "k",
                    Step::new(StepCode::SpeciesGibbs)
                        .with("species", record.label())
                        .with("times", shown::number(*nu))
                        .with("enthalpy", shown::kilojoule(of.enthalpy_j_per_mol))
                        .with("entropy", shown::number(of.entropy_j_per_mol_k))
                        .with("gibbs", shown::kilojoule(of.gibbs_j_per_mol))
                        .with("temperature_k", kelvin(found)),
                ));
            }
            let optional = |value: Option<f64>| value.unwrap_or(0.0);
            lines.push((
                "k",
                Step::new(if combination.measured().is_empty() {
                    StepCode::ReactionGibbs
                } else {
                    StepCode::MeasuredGibbs
                })
                .with("gibbs", shown::kilojoule(at.gibbs_j_per_mol))
                .with("enthalpy", shown::kilojoule(optional(at.enthalpy_j_per_mol)))
                .with("entropy", shown::number(optional(at.entropy_j_per_mol_k)))
                .with("temperature_k", kelvin(found)),
            ));
        }
        Constant::Points(line) => lines.push((
            "k",
            Step::new(StepCode::Line)
                .with("points", line.points.len().to_string())
                .with("enthalpy", shown::kilojoule(line.enthalpy_j_per_mol))
                .with("residual", show_number(line.largest_residual, 2))
                .with("ln_k", shown::number(at.ln_k))
                .with("temperature_k", kelvin(found)),
        )),
        Constant::Formula(formula) => {
            let term = |(coefficient, term): &(f64, FormulaTerm)| {
                let name = FormulaTerm::ALL.into_iter().find(|(_, one)| one == term);
                let name = name.map_or("", |(name, _)| name);
                let number = shown::significant(*coefficient, 8);
                if *term == FormulaTerm::One { number } else { format!("{number} × {name}") }
            };
            let terms: Vec<String> = formula.terms.iter().map(term).collect();
            lines.push((
                "k",
                Step::new(StepCode::Formula)
                    .with("terms", terms.join(" + "))
                    .with("ln_k", shown::number(at.ln_k))
                    .with("temperature_k", kelvin(found)),
            ));
        }
        Constant::Stated(_) => lines.push(("k", stated_line(found))),
    }
    lines.push((
        "k",
        Step::new(StepCode::K)
            .with("ln_k", shown::number(at.ln_k))
            .with("k", shown::exponential(at.ln_k))
            .with("temperature_k", kelvin(found)),
    ));
    lines
}

fn stated_line(found: &Findings) -> Step {
    let step = match &found.question.reaction.source {
        KSource::Value(stated) => {
            Step::new(StepCode::StatedK).with("stated", show_like(&stated.value))
        }
        _ => Step::new(StepCode::KOfReading),
    };
    step.with("ln_k", shown::number(found.at.ln_k)).with("temperature_k", kelvin(found))
}

fn reading_lines(found: &Findings, reading: &ReadingFindings) -> Vec<Line> {
    let mut lines = Vec::new();
    let question = &found.question;
    if let (Some(typed), Some(absolute_pa)) = (&question.pressure, question.pressure_pa()) {
        if typed.pressure_reference == PressureReference::Gauge {
            let line = Step::new(StepCode::Absolute)
                .with("gauge", show_like(typed))
                .with("atmosphere", shown::pressure(question.atmosphere_pa()))
                .with("absolute", shown::pressure(absolute_pa));
            lines.push(("q", line));
        }
    }
    if let Some(water) = reading.setting.added_water_fraction {
        lines.push(("q", Step::new(StepCode::WetGas).with("water", shown::significant(water, 5))));
    }
    lines.extend(activity_lines(found, reading));
    lines
}

/// How each activity of the reacting species comes about.
fn activity_lines(found: &Findings, reading: &ReadingFindings) -> Vec<Line> {
    let mut lines = Vec::new();
    let Some(activities) = &reading.activities else { return lines };
    if let Some(solution) = &activities.solution {
        let line = Step::new(StepCode::IonicStrength)
            .with("strength", shown::significant(solution.ionic_strength_mol_per_kg, 5));
        lines.push(("q", line));
    }
    let rows = found.participants.iter().zip(&reading.setting.blocks).enumerate();
    for (i, (participant, block)) in rows {
        let (amount, ln_activity) = (reading.amounts_mol[i], activities.ln_activities[i]);
        let Some(ln_activity) = ln_activity.filter(|_| participant.nu != 0.0) else { continue };
        let digits = |value: f64| shown::significant(value, 5);
        let begin = |code| {
            Step::new(code)
                .with("species", participant.species.text())
                .with("activity", digits(libm::exp(ln_activity)))
        };
        let gamma = libm::exp(activities.ln_coefficients[i]);
        let line = match (block, reading.setting.pressure_pa) {
            (Block::Gas, Some(pressure_pa)) => begin(StepCode::Activity)
                .with("fraction", digits(amount / reading.setting.gas_mol))
                .with("pressure_bar", shown::significant(pressure_pa / 1e5, 6)),
            (Block::Liquid, _) => begin(StepCode::LiquidActivity),
            (Block::Solution, _) => {
                let water_kg = reading.setting.hold.water_kg().unwrap_or(1.0);
                begin(StepCode::SoluteActivity)
                    .with("coefficient", digits(gamma))
                    .with("molality", digits(amount / water_kg))
            }
            (Block::Solvent, _) => begin(StepCode::SolventActivity),
            (Block::Gas, None) | (Block::Pure, _) => continue,
        };
        lines.push(("q", line));
    }
    lines
}

/// Whether a liquid of the reaction has an activity of its own to show: in a mixture, or the water of
/// a solution.
fn is_mixed_liquid(found: &Findings, participant: &Participant) -> bool {
    let Some(reading) = &found.reading else { return false };
    let rows = found.participants.iter().zip(&reading.setting.blocks);
    let mixed = |block: &Block| matches!(block, Block::Liquid | Block::Solvent);
    rows.filter(|(_, block)| mixed(block)).any(|(one, _)| {
        one.phase == participant.phase && one.species.same_substance(&participant.species)
    })
}

/// Q as a product: `a(CO2) a(H2) / (a(CO) a(H2O))`; pure phases are left out, their a is 1.
fn quotient_formula(found: &Findings) -> String {
    let side = |sign: f64| -> Vec<String> {
        reacting(found)
            .filter(|participant| participant.nu * sign > 0.0)
            .filter(|participant| {
                matches!(participant.phase, Phase::Gas | Phase::Aqueous)
                    || is_mixed_liquid(found, participant)
            })
            .map(|participant| {
                let power = participant.nu.abs();
                let species = participant.species.formula.text();
                if power == 1.0 { format!("a({species})") } else { format!("a({species})^{power}") }
            })
            .collect()
    };
    let (above, below) = (side(1.0), side(-1.0));
    let product = |factors: &[String]| {
        if factors.is_empty() { "1".to_owned() } else { factors.join(" × ") }
    };
    match below.len() {
        0 => product(&above),
        1 => format!("{} / {}", product(&above), product(&below)),
        _ => format!("{} / ({})", product(&above), product(&below)),
    }
}

fn quotient_lines(found: &Findings, reading: &ReadingFindings) -> Vec<Line> {
    let formula = quotient_formula(found);
    let Quotient::Finite(ln_q) = reading.quotient else {
        let line = Step::new(StepCode::OpenQuotient)
            .with("formula", formula)
            .with("q", quotient_word(reading.quotient));
        return vec![("q", line)];
    };
    let rt = GAS_CONSTANT_J_PER_MOL_K * found.question.temperature.value_si;
    let ln_k = found.at.ln_k;
    let mut lines = vec![
        (
            "q",
            Step::new(StepCode::Quotient)
                .with("formula", formula)
                .with("q", shown::exponential(ln_q))
                .with("ln_q", shown::number(ln_q)),
        ),
        (
            "gibbs",
            Step::new(StepCode::Gibbs)
                .with("rt", shown::kilojoule(rt))
                .with("ln_q", shown::number(ln_q))
                .with("ln_k", shown::number(ln_k))
                .with("gibbs", shown::kilojoule(rt * (ln_q - ln_k))),
        ),
    ];
    if let Ok(approach) = reading.approach {
        lines.push((
            "t_star",
            Step::new(StepCode::TStar)
                .with("t_star", shown::temperature(approach.t_star_k))
                .with("approach", shown::kelvins(approach.approach_k)),
        ));
    }
    lines
}

fn rest_lines(found: &Findings, reading: &ReadingFindings) -> Vec<Line> {
    let rest = &reading.rest.summary;
    if rest.outcome == RestOutcome::HasNoLimit {
        // No state at rest was found, so there is none to work out or to check.
        return Vec::new();
    }
    let held = match reading.setting.hold {
        Hold::Pressure { .. } | Hold::PressureAndSolvent { .. } => "temperature and pressure",
        Hold::Volume { .. } | Hold::VolumeAndSolvent { .. } => "temperature and volume",
        Hold::Solvent { .. } => "temperature",
    };
    let mut lines = vec![(
        "rest",
        Step::new(StepCode::Rest)
            .with("held", held)
            .with("extent", shown::number(rest.extent_mol))
            .with("basis", basis_name(reading.setting.basis))
            .with("outcome", rest.outcome.as_str())
            .with("iterations", rest.iterations.to_string()),
    )];
    let state = reading.state(found.question.temperature.value_si, &reading.rest.amounts_mol);
    let at_rest = crate::equilibrium::quotient(&reading.system, &state);
    if let Some(ln_q) = at_rest.ok().and_then(ln_q) {
        let line = Step::new(StepCode::RestCheck)
            .with("ln_q", show_number(ln_q, 10))
            .with("ln_k", show_number(found.constant.ln_k(found.k_temperature), 10));
        lines.push(("rest", line));
    }
    lines
}
