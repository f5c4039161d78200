//! The reading laid on the participants: amounts, pressure and volume.

use super::blocks::{Block, Blocks};
use super::participants::Participant;
use super::question::{self, Question};
use super::reading_remarks::remarks_of;
use crate::equilibrium::{Hold, Kind};
use crate::mixture::{AmountBasis, Closing, ElementBalance, Feed, Held};
use crate::problem::{CaseCode, Outcome, Problem, Remark};
use crate::quantity::{GAS_CONSTANT_J_PER_MOL_K, STANDARD_PRESSURE_PA};
use crate::reaction::Phase;

/// A stated pressure and the one that amounts make in a stated volume are the same within this
/// share: the digits of a gauge. Common practice, no source.
const PRESSURE_AGREEMENT: f64 = 0.002;

/// What the amounts of a report stand for.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub(super) enum Basis {
    OneMoleOfGas,
    OneMoleOfLiquid,
    Amounts,
    Flows,
    OneKilogramOfWater,
    Solution,
}

/// The state as read.
#[derive(Debug, Clone)]
pub(super) struct Setting {
    pub participants: Vec<Participant>,
    /// Where each participant stands.
    pub blocks: Vec<Block>,
    /// What is held of each participant.
    pub held: Vec<Held>,
    pub hold: Hold,
    pub pressure_pa: Option<f64>,
    pub volume_m3: Option<f64>,
    pub basis: Basis,
    pub gas_mol: f64,
    /// The fraction of water that was added to a dry analysis.
    pub added_water_fraction: Option<f64>,
    /// The gas that went in.
    pub feed: Option<Feed>,
    /// What the feed says of the gas behind it.
    pub balance: Option<ElementBalance>,
    /// How the fractions of the gas were closed.
    pub closing: Option<Closing>,
    /// How the fractions of the liquid were closed.
    pub liquid_closing: Option<Closing>,
    pub remarks: Vec<Remark>,
}

impl Setting {
    /// Whether the gas, or the liquid where there is no gas, was given in fractions.
    pub fn is_by_fraction(&self) -> bool {
        matches!(self.basis, Basis::OneMoleOfGas | Basis::OneMoleOfLiquid)
    }

    /// Amounts as the engine sees them; an ample phase has a nominal one.
    pub fn amounts_mol(&self) -> Vec<f64> {
        let amount = |held: &Held| match held {
            Held::Mol(amount) => *amount,
            Held::Ample => 1.0,
        };
        self.held.iter().map(amount).collect()
    }

    /// The kinds of the participants, as the engine knows them.
    pub fn kinds(&self) -> Vec<Kind> {
        let kind = |(block, held): (&Block, &Held)| match (block, held) {
            (Block::Gas, _) => Kind::Gas,
            (Block::Liquid, _) => Kind::Liquid,
            (Block::Solution, _) => Kind::Solute,
            (Block::Solvent, _) => Kind::Solvent,
            (Block::Pure, Held::Ample) => Kind::Ample,
            (Block::Pure, Held::Mol(_)) => Kind::Pure,
        };
        self.blocks.iter().zip(&self.held).map(kind).collect()
    }

    /// The total of what the basis counts.
    pub fn basis_mol(&self) -> f64 {
        let counted = match self.basis {
            Basis::OneMoleOfLiquid => Block::Liquid,
            Basis::OneKilogramOfWater | Basis::Solution => Block::Solution,
            _ if self.gas_mol > 0.0 => return self.gas_mol,
            _ => Block::Liquid,
        };
        let rows = self.blocks.iter().zip(&self.held).filter(|(block, _)| **block == counted);
        let amount = |(_, held): (&Block, &Held)| match held {
            Held::Mol(amount) => *amount,
            Held::Ample => 0.0,
        };
        rows.map(amount).sum()
    }
}

/// Lays the reading on the participants; the inerts of the reading join them at the end.
///
/// # Errors
/// All problems of all blocks at once, then those of pressure and volume.
pub(super) fn setting(question: &Question, mut participants: Vec<Participant>) -> Outcome<Setting> {
    let laid = Blocks::new(question, &participants)?;
    let mut remarks = remarks_of(question, &participants, &laid);
    let places = participants.iter().map(|participant| laid.place(participant, &mut remarks));
    let (mut blocks, mut held): (Vec<Block>, Vec<Held>) = places.unzip();
    for (inert, block, amount) in laid.inerts(&participants) {
        participants.push(inert);
        blocks.push(block);
        held.push(amount);
    }
    let any_gas = participants.iter().any(|participant| participant.phase == Phase::Gas);
    let gas_reacts = participants
        .iter()
        .any(|participant| participant.phase == Phase::Gas && participant.nu != 0.0);
    let water_kg = laid.solution.as_ref().map(|solution| solution.water_kg);
    let mut setting = Setting {
        participants,
        blocks,
        held,
        hold: match water_kg {
            Some(water_kg) => Hold::Solvent { water_kg },
            None => Hold::Pressure {
                pressure_pa: question.pressure_pa().unwrap_or(STANDARD_PRESSURE_PA),
            },
        },
        pressure_pa: question.pressure_pa(),
        volume_m3: None,
        basis: basis_of(&laid),
        gas_mol: laid.gas.as_ref().map_or(0.0, |gas| gas.total_mol),
        added_water_fraction: laid.gas.as_ref().and_then(|gas| gas.added_water_fraction),
        balance: laid.gas.as_ref().and_then(|gas| gas.balance.clone()),
        closing: laid.gas.map(|gas| gas.closing),
        liquid_closing: laid.liquid.map(|liquid| liquid.closing),
        feed: laid.feed,
        remarks,
    };
    if gas_reacts || any_gas && water_kg.is_none() {
        set_pressure_and_volume(question, &mut setting, water_kg)?;
    }
    Ok(setting)
}

fn basis_of(laid: &Blocks) -> Basis {
    match (&laid.gas, &laid.liquid, &laid.solution) {
        (Some(gas), ..) => match gas.basis {
            AmountBasis::OneMole => Basis::OneMoleOfGas,
            AmountBasis::Amounts => Basis::Amounts,
            AmountBasis::Flows => Basis::Flows,
        },
        (None, Some(liquid), _) => match liquid.basis {
            AmountBasis::OneMole => Basis::OneMoleOfLiquid,
            AmountBasis::Amounts => Basis::Amounts,
            AmountBasis::Flows => Basis::Flows,
        },
        (None, None, Some(solution)) if solution.is_stated => Basis::Solution,
        (None, None, Some(_)) => Basis::OneKilogramOfWater,
        (None, None, None) => Basis::Amounts,
    }
}

/// Finds the pressure and the volume, and what is held: P V = n R T ties them.
fn set_pressure_and_volume(
    question: &Question,
    setting: &mut Setting,
    water_kg: Option<f64>,
) -> Outcome<()> {
    let rt = GAS_CONSTANT_J_PER_MOL_K * question.temperature.value_si;
    let held_volume = question.hold == question::Held::Volume;
    if (held_volume || question.volume_m3().is_some()) && setting.basis == Basis::Flows {
        return Err(Problem::new(CaseCode::FlowsInVolume).at("hold").into());
    }
    if let Some(volume_m3) = question.volume_m3() {
        if setting.gas_mol <= 0.0 {
            return Err(Problem::new(CaseCode::VolumeNeedsGas).at("volume").into());
        }
        if setting.basis == Basis::OneMoleOfGas {
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
    setting.hold = match (setting.volume_m3, water_kg) {
        (Some(volume_m3), None) if held_volume => Hold::Volume { volume_m3 },
        (Some(volume_m3), Some(water_kg)) if held_volume => {
            Hold::VolumeAndSolvent { volume_m3, water_kg }
        }
        (None, _) if held_volume => {
            return Err(Problem::new(CaseCode::VolumeNeedsGas).at("hold").into());
        }
        (_, None) => Hold::Pressure { pressure_pa },
        (_, Some(water_kg)) => Hold::PressureAndSolvent { pressure_pa, water_kg },
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
    setting.basis = Basis::Amounts;
}
