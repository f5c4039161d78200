//! The reading laid on the participants: amounts, pressure and volume.

use super::participants::Participant;
use super::question::{self, Question};
use super::reading_remarks::{lost_for_good, remarks_of};
use crate::equilibrium::Hold;
use crate::mixture::{
    AmountBasis, Closing, ElementBalance, Feed, GasMixture, Held, gas_mixture, pure_phases,
};
use crate::problem::{CaseCode, NoteCode, Outcome, Problem, Remark};
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;
use crate::reaction::{Phase, Species};

/// A stated pressure and the one that amounts make in a stated volume are the same within this
/// share: the digits of a gauge. Common practice, no source.
const PRESSURE_AGREEMENT: f64 = 0.002;

/// The state as read.
#[derive(Debug, Clone)]
pub(super) struct Setting {
    pub participants: Vec<Participant>,
    /// What is held of each participant.
    pub held: Vec<Held>,
    pub hold: Hold,
    pub pressure_pa: Option<f64>,
    pub volume_m3: Option<f64>,
    pub basis: AmountBasis,
    pub gas_mol: f64,
    /// The fraction of water that was added to a dry analysis.
    pub added_water_fraction: Option<f64>,
    /// The gas that went in.
    pub feed: Option<Feed>,
    /// What the feed says of the gas behind it.
    pub balance: Option<ElementBalance>,
    /// How the fractions of the gas were closed.
    pub closing: Option<Closing>,
    pub remarks: Vec<Remark>,
}

impl Setting {
    /// Whether the gas was given in fractions.
    pub fn is_by_fraction(&self) -> bool {
        self.basis == AmountBasis::OneMole
    }

    /// Amounts as the engine sees them; an ample phase has a nominal one.
    pub fn amounts_mol(&self) -> Vec<f64> {
        let amount = |held: &Held| match held {
            Held::Mol(amount) => *amount,
            Held::Ample => 1.0,
        };
        self.held.iter().map(amount).collect()
    }
}

/// Lays the reading on the participants; the inerts of the reading join them at the end.
///
/// # Errors
/// All problems of the gas and of the pure phases at once, then those of pressure and volume.
pub(super) fn setting(question: &Question, mut participants: Vec<Participant>) -> Outcome<Setting> {
    let mut problems = Vec::new();
    let feed = match &question.feed {
        None => None,
        Some(feed) => match gas_mixture(feed, question.around(), None) {
            Ok(gas) => Some(feed_of(gas, &participants)),
            Err(found) => {
                problems.extend(found.into_iter().map(|problem| in_block(problem, "feed.gas")));
                None
            }
        },
    };
    let gas = match &question.gas {
        None => None,
        Some(reading) => match gas_mixture(reading, question.around(), feed.as_ref()) {
            Ok(gas) => Some(gas),
            Err(found) => {
                problems.extend(found.into_iter().map(|problem| in_block(problem, "reading.gas")));
                None
            }
        },
    };
    let gas_basis = gas.as_ref().map(|gas| gas.basis);
    // With the volume known as well, even fractions stand for amounts.
    let measured = if question.volume_m3().is_some() { None } else { gas_basis };
    let pure = pure_phases(&question.pure, measured).unwrap_or_else(|found| {
        problems.extend(found);
        Vec::new()
    });
    if !problems.is_empty() {
        return Err(problems);
    }
    if let (Some(reading), None) = (&question.gas, &feed) {
        problems.extend(lost_for_good(reading, &participants));
        if !problems.is_empty() {
            return Err(problems);
        }
    }
    let mut remarks = remarks_of(question, &participants, gas.as_ref());
    let pure: Vec<(&Species, Held)> =
        question.pure.iter().map(|entry| &entry.species).zip(pure).collect();
    let mut held = held_of(&participants, gas.as_ref(), &pure, &mut remarks);
    add_inerts(&mut participants, &mut held, gas.as_ref(), &pure);
    let any_gas = participants.iter().any(|participant| participant.phase == Phase::Gas);
    let basis = gas_basis.unwrap_or(AmountBasis::Amounts);
    let mut setting = Setting {
        participants,
        held,
        hold: Hold::Pressure { pressure_pa: question.pressure_pa().unwrap_or(1e5) },
        pressure_pa: question.pressure_pa(),
        volume_m3: None,
        basis,
        gas_mol: gas.as_ref().map_or(0.0, |gas| gas.total_mol),
        added_water_fraction: gas.as_ref().and_then(|gas| gas.added_water_fraction),
        feed,
        balance: gas.as_ref().and_then(|gas| gas.balance.clone()),
        closing: gas.map(|gas| gas.closing),
        remarks,
    };
    if any_gas {
        set_pressure_and_volume(question, &mut setting)?;
    }
    Ok(setting)
}

/// The feed; an element of a reacting liquid or solid need not balance in the gas.
fn feed_of(gas: GasMixture, participants: &[Participant]) -> Feed {
    let condensed = participants.iter().filter(|participant| participant.phase != Phase::Gas);
    let open_elements = condensed
        .flat_map(|participant| participant.species.formula.atoms())
        .map(|(element, _)| element.symbol)
        .collect();
    Feed { amounts_mol: gas.amounts_mol, basis: gas.basis, closing: gas.closing, open_elements }
}

/// Puts a block's path before a field that is inside the block, and leaves a whole path as it is.
fn in_block(problem: Problem, block: &str) -> Problem {
    if problem.field.starts_with(block) || problem.field == "feed" {
        problem
    } else {
        problem.at(block)
    }
}

fn held_of(
    participants: &[Participant],
    gas: Option<&GasMixture>,
    pure: &[(&Species, Held)],
    remarks: &mut Vec<Remark>,
) -> Vec<Held> {
    let mut held = Vec::with_capacity(participants.len());
    for participant in participants {
        let species = &participant.species;
        let (found, code) = if participant.phase == Phase::Gas {
            let row = gas.and_then(|gas| {
                gas.amounts_mol.iter().find(|(name, _)| name.same_substance(species))
            });
            (row.map(|(_, amount)| Held::Mol(*amount)), NoteCode::NotInAnalysis)
        } else if participant.phase == Phase::Aqueous {
            (None, NoteCode::NotInAnalysis)
        } else {
            let row = pure.iter().find(|(name, _)| {
                name.phase == Some(participant.phase) && name.same_substance(species)
            });
            (row.map(|(_, held)| *held), NoteCode::PhaseTakenAsPresent)
        };
        held.push(found.unwrap_or_else(|| {
            remarks.push(Remark::new(code).with("species", species.text()));
            if code == NoteCode::PhaseTakenAsPresent { Held::Ample } else { Held::Mol(0.0) }
        }));
    }
    held
}

/// The species of the reading that the reaction does not name.
fn add_inerts(
    participants: &mut Vec<Participant>,
    held: &mut Vec<Held>,
    gas: Option<&GasMixture>,
    pure: &[(&Species, Held)],
) {
    let gases = gas.iter().flat_map(|gas| &gas.amounts_mol);
    let gases = gases.map(|(species, amount)| (species, Held::Mol(*amount)));
    for (species, amount) in gases.chain(pure.iter().copied()) {
        let phase = species.phase.unwrap_or(Phase::Gas);
        let known = participants.iter().any(|participant| {
            participant.phase == phase && participant.species.same_substance(species)
        });
        if !known {
            let species = species.clone();
            participants.push(Participant { species, phase, nu: 0.0, record: None });
            held.push(amount);
        }
    }
}

/// Finds the pressure and the volume, and what is held: P V = n R T ties them.
fn set_pressure_and_volume(question: &Question, setting: &mut Setting) -> Outcome<()> {
    let rt = GAS_CONSTANT_J_PER_MOL_K * question.temperature.value_si;
    let held_volume = question.hold == question::Held::Volume;
    if (held_volume || question.volume_m3().is_some()) && setting.basis == AmountBasis::Flows {
        return Err(Problem::new(CaseCode::FlowsInVolume).at("hold").into());
    }
    if let Some(volume_m3) = question.volume_m3() {
        if setting.gas_mol <= 0.0 {
            return Err(Problem::new(CaseCode::VolumeNeedsGas).at("volume").into());
        }
        if setting.basis == AmountBasis::OneMole {
            let Some(pressure_pa) = setting.pressure_pa else { return Err(pressure_needed()) };
            scale_gas(setting, pressure_pa * volume_m3 / rt);
        }
        let made_pa = setting.gas_mol * rt / volume_m3;
        if let Some(stated_pa) = question.pressure_pa() {
            if (made_pa / stated_pa - 1.0).abs() > PRESSURE_AGREEMENT {
                return Err(Problem::new(CaseCode::VolumeAndPressure)
                    .with("found", format!("{:.5}", made_pa / 1e5))
                    .with("allowed", format!("{:.5}", stated_pa / 1e5))
                    .at("volume")
                    .into());
            }
        }
        setting.pressure_pa = Some(made_pa);
        setting.volume_m3 = Some(volume_m3);
    }
    let Some(pressure_pa) = setting.pressure_pa else { return Err(pressure_needed()) };
    if setting.gas_mol > 0.0 {
        setting.volume_m3 = Some(setting.gas_mol * rt / pressure_pa);
    }
    setting.hold = match setting.volume_m3 {
        Some(volume_m3) if held_volume => Hold::Volume { volume_m3 },
        None if held_volume => {
            return Err(Problem::new(CaseCode::VolumeNeedsGas).at("hold").into());
        }
        _ => Hold::Pressure { pressure_pa },
    };
    Ok(())
}

fn pressure_needed() -> Vec<Problem> {
    Problem::new(CaseCode::PressureNeeded).at("pressure").into()
}

/// Makes the gas, given in fractions of one mole, stand for this amount.
fn scale_gas(setting: &mut Setting, total_mol: f64) {
    let factor = total_mol / setting.gas_mol;
    for (participant, held) in setting.participants.iter().zip(&mut setting.held) {
        if let (Phase::Gas, Held::Mol(amount)) = (participant.phase, held) {
            *amount *= factor;
        }
    }
    setting.gas_mol = total_mol;
    setting.basis = AmountBasis::Amounts;
}
