//! What one small change of one knob does to rest, in every case that has its own answer.

use shiftgauge::advice::{Direction, Knob, Knobs, Nudge, Plant, Wording, nudge, nudges, why};
use shiftgauge::constant::{Constant, StatedConstant};
use shiftgauge::equilibrium::{Hold, Kind, RestOutcome, State, System};
use shiftgauge::problem::words;
use shiftgauge::problem::{WhyCode, WhyCode as C};

/// A reaction in a state with a stated K, as one line of a table.
#[derive(Debug, Clone)]
pub struct Row {
    pub kinds: &'static str,
    pub nu: Vec<f64>,
    pub kelvin: f64,
    pub hold: Hold,
    pub amounts: Vec<f64>,
    pub ln_k: f64,
    /// ΔH° in kJ/mol.
    pub enthalpy: Option<f64>,
}

pub fn at(pressure_bar: f64) -> Hold {
    Hold::Pressure { pressure_pa: pressure_bar * 1e5 }
}

pub fn within(volume_m3: f64) -> Hold {
    Hold::Volume { volume_m3 }
}

impl Row {
    pub fn new(kinds: &'static str, nu: &[f64], hold: Hold, amounts: &[f64], ln_k: f64) -> Row {
        let (nu, amounts) = (nu.to_vec(), amounts.to_vec());
        Row { kinds, nu, kelvin: 700.0, hold, amounts, ln_k, enthalpy: Some(-50.0) }
    }

    pub fn heat(self, kilojoule: f64) -> Row {
        Row { enthalpy: Some(kilojoule), ..self }
    }

    /// Calls with the plant of this row.
    pub fn with<T>(&self, work: impl FnOnce(Plant) -> T) -> T {
        let kind = |letter| match letter {
            'g' => Kind::Gas,
            'p' => Kind::Pure,
            'a' => Kind::Ample,
            _ => Kind::Solute,
        };
        let kinds: Vec<Kind> = self.kinds.chars().map(kind).collect();
        let system = System::new(&kinds, &self.nu).unwrap();
        let constant = Constant::Stated(StatedConstant {
            ln_k: self.ln_k,
            u_ln_k: None,
            at_k: Some(self.kelvin),
            enthalpy_j_per_mol: self.enthalpy.map(|kilojoule| kilojoule * 1e3),
            u_enthalpy_j_per_mol: None,
            heat_capacity_j_per_mol_k: None,
        });
        let state =
            State { temperature_k: self.kelvin, hold: self.hold, amounts_mol: &self.amounts };
        work(Plant { system: &system, state, constant: &constant, approach_k: 0.0 })
    }

    fn nudge(&self, knob: Knob, step: f64) -> Nudge {
        self.with(|plant| nudge(&mut Knobs::new(plant).unwrap(), knob, step))
    }
}

fn sentence(nudge: &Nudge) -> String {
    let names: Vec<String> = (0..9).map(|place| format!("S{place}")).collect();
    let setting = |knob: Knob, value: f64| format!("{knob:?} {value}");
    let wording = Wording { species: &names, setting: &setting };
    let say = |reason| words::why(&why(reason, &wording), words::Language::En);
    let mut text = say(&nudge.reason);
    if let Some(aside) = &nudge.aside {
        text = format!("{text} {}", say(aside));
    }
    text
}

const F: Option<Direction> = Some(Direction::Forward);
const R: Option<Direction> = Some(Direction::Reverse);
const N: Option<Direction> = None;

/// N2 + 3 H2 = 2 NH3 with an inert.
fn ammonia(hold: Hold, amounts: &[f64]) -> Row {
    Row::new("gggg", &[-1.0, -3.0, 2.0, 0.0], hold, amounts, -9.0).heat(-105.0)
}

#[test]
fn smoke() {
    for found in ammonia(at(200.0), &[1.0, 3.0, 0.1, 0.3]).with(|plant| nudges(plant).unwrap()) {
        println!(
            "{} {:?} step {} {:?} {:?} {:?} d {:?}\n    {:?}\n    {}",
            found.name(),
            found.species(),
            found.step,
            found.outcome,
            found.direction,
            found.extent_change_mol,
            found.derivative,
            found.change_mol,
            sentence(&found)
        );
    }
    let _ = (F, R, N, C::Needed, RestOutcome::Rest, within(1.0));
    let _: WhyCode = C::Needed;
}
