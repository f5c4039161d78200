//! What one small change of one knob does to rest, in every case that has its own answer.

use shiftgauge::advice::{Direction, Knob, Knobs, Nudge, Plant, Wording, nudge, why};
use shiftgauge::constant::{Constant, StatedConstant};
use shiftgauge::equilibrium::{Hold, Kind, State, System};
use shiftgauge::mixture::{Ion, SolutionModel};
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
    /// With charges, Davies' activity coefficients.
    pub charges: Vec<i32>,
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
        let (enthalpy, charges) = (Some(-50.0), Vec::new());
        Row { kinds, nu, kelvin: 700.0, hold, amounts, ln_k, enthalpy, charges }
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
            'l' => Kind::Liquid,
            'w' => Kind::Solvent,
            _ => Kind::Solute,
        };
        let kinds: Vec<Kind> = self.kinds.chars().map(kind).collect();
        let mut system = System::new(&kinds, &self.nu).unwrap();
        if !self.charges.is_empty() {
            let ions: Vec<Ion> = self.charges.iter().map(|&charge| Ion::new(charge)).collect();
            system = system.with_solution(SolutionModel::Davies, &ions).unwrap();
        }
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

    pub fn nudge(&self, knob: Knob, step: f64) -> Nudge {
        self.with(|plant| nudge(&mut Knobs::new(plant).unwrap(), knob, step))
    }
}

pub fn sentence(nudge: &Nudge) -> String {
    let names: Vec<String> = (0..9).map(|place| format!("S{place}")).collect();
    let setting = |knob: Knob, value: f64| format!("{knob:?} {value:.0}");
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

/// N2 + 3 H2 = 2 NH3 with an inert: Δν = −2.
pub fn ammonia(hold: Hold, amounts: &[f64]) -> Row {
    Row::new("gggg", &[-1.0, -3.0, 2.0, 0.0], hold, amounts, -9.0).heat(-105.0)
}

/// The reverse of it: Δν = 2.
fn cracking(hold: Hold, amounts: &[f64]) -> Row {
    Row::new("gggg", &[1.0, 3.0, -2.0, 0.0], hold, amounts, 9.0).heat(105.0)
}

/// CO + H2O = CO2 + H2 with an inert: Δν = 0.
fn shift(hold: Hold) -> Row {
    Row::new("ggggg", &[-1.0, -1.0, 1.0, 1.0, 0.0], hold, &[1.0, 2.0, 0.5, 0.5, 1.0], 2.0)
        .heat(-38.0)
}

/// CaCO3(s) = CaO(s) + CO2 with an inert gas.
pub fn lime(amounts: &[f64], ln_k: f64) -> Row {
    Row::new("ppgg", &[-1.0, 1.0, 1.0, 0.0], at(1.0), amounts, ln_k).heat(170.0)
}

/// 2 CO = C(s) + CO2.
pub fn carbon(amounts: &[f64], ln_k: f64) -> Row {
    Row::new("gpg", &[-2.0, 1.0, 1.0], at(1.0), amounts, ln_k).heat(-170.0)
}

/// HA = H+ + A-.
pub fn acid() -> Row {
    Row::new("sss", &[-1.0, 1.0, 1.0], within(1e-3), &[0.1, 1e-3, 1e-3], -10.9).heat(0.4)
}

const T: Knob = Knob::Temperature;
const P: Knob = Knob::Pressure;
const V: Knob = Knob::Volume;
const INERT_P: Knob = Knob::InertAtPressure;
const INERT_V: Knob = Knob::InertAtVolume;
const WATER: Knob = Knob::Dilution;

fn add(species: usize) -> Knob {
    Knob::Amount(species)
}

/// What a row expects: the way of the step, the way of a very small one, and the reasons.
struct Expected(&'static str, Row, Knob, f64, Option<Direction>, Option<Direction>, Vec<WhyCode>);

#[rustfmt::skip]
fn gases() -> Vec<Expected> {
    let rich = &[6.0, 2.0, 0.1, 0.0];
    let usual = &[1.0, 3.0, 0.1, 0.3];
    // At rest with y(N2) = 1/2 at 1 bar: Q = (1/8)²/(1/2 (3/8)³) = 16/27.
    let half = |nitrogen: f64| Row {
        ln_k: (16.0_f64 / 27.0).ln(),
        ..ammonia(at(1.0), &[nitrogen, 1.5, 0.5])
    };
    let half = |nitrogen: f64| Row { kinds: "ggg", nu: vec![-1.0, -3.0, 2.0], ..half(nitrogen) };
    vec![
        Expected("hotter drives heat given off back", ammonia(at(200.0), usual), T, 5.0, R, R, vec![C::HeatGiven]),
        Expected("hotter drives heat taken up forward", cracking(at(200.0), usual), T, 5.0, F, F, vec![C::HeatTaken]),
        Expected("colder is the other way", ammonia(at(200.0), usual), T, -5.0, F, F, vec![C::HeatGiven]),
        Expected("no heat, no change", ammonia(at(200.0), usual).heat(0.0), T, 5.0, N, N, vec![C::HeatNone]),
        Expected("hardly any heat moves it by hardly anything", ammonia(at(200.0), usual).heat(1e-3), T, 5.0, F, F, vec![C::HeatNone]),
        Expected("fixed volume: less gas outweighs a little heat", ammonia(within(0.01), usual).heat(-1.0), T, 5.0, F, F, vec![C::WarmVolumeForward]),
        Expected("fixed volume: more gas outweighs a little heat", cracking(within(0.01), usual).heat(1.0), T, 5.0, R, R, vec![C::WarmVolumeReverse]),
        Expected("fixed volume: no heat at all, only pressure", ammonia(within(0.01), usual).heat(0.0), T, 5.0, F, F, vec![C::WarmVolumeForward]),
        Expected("fixed volume: much heat outweighs", ammonia(within(0.01), usual), T, 5.0, R, R, vec![C::HeatGiven]),
        Expected("fixed volume: ΔH° = Δν R T cancels, and past it pressure wins", cracking(within(0.01), usual).heat(2.0 * 8.314_462_618_153_24e-3 * 700.0), T, 5.0, R, N, vec![C::HeatBalanced]),
        Expected("pressure favours less gas", ammonia(at(200.0), usual), P, 1e6, F, F, vec![C::PressureForward]),
        Expected("pressure favours less gas, mirrored", cracking(at(200.0), usual), P, 1e6, R, R, vec![C::PressureReverse]),
        Expected("pressure leaves the shift alone", shift(at(20.0)), P, 1e5, N, N, vec![C::PressureNone]),
        Expected("volume favours more gas", ammonia(within(0.01), usual), V, 5e-4, R, R, vec![C::VolumeReverse]),
        Expected("volume favours more gas, mirrored", cracking(within(0.01), usual), V, 5e-4, F, F, vec![C::VolumeForward]),
        Expected("volume leaves the shift alone", shift(within(0.01)), V, 5e-4, N, N, vec![C::VolumeNone]),
        Expected("inert at constant pressure favours more gas", ammonia(at(200.0), usual), INERT_P, 0.2, R, R, vec![C::InertReverse]),
        Expected("the same where volume is held", ammonia(within(0.01), usual), INERT_P, 0.2, R, R, vec![C::InertReverse]),
        Expected("inert at constant pressure, mirrored", cracking(at(200.0), usual), INERT_P, 0.2, F, F, vec![C::InertForward]),
        Expected("inert leaves the shift alone", shift(at(20.0)), INERT_P, 0.2, N, N, vec![C::InertNone]),
        Expected("inert in a fixed volume does nothing", ammonia(at(200.0), usual), INERT_V, 0.2, N, N, vec![C::InertInVolume]),
        Expected("the same where volume is held", ammonia(within(0.01), usual), INERT_V, 0.2, N, N, vec![C::InertInVolume]),
        Expected("the inert of the reading acts like any inert", ammonia(at(200.0), usual), add(3), 0.2, R, R, vec![C::BystanderReverse]),
        Expected("the inert of the reading, mirrored", cracking(at(200.0), usual), add(3), 0.2, F, F, vec![C::BystanderForward]),
        Expected("the inert of the reading in a fixed volume", ammonia(within(0.01), usual), add(3), 0.2, N, N, vec![C::InertInVolume]),
        Expected("the inert of the reading beside the shift", shift(at(20.0)), add(4), 0.2, N, N, vec![C::BystanderNone]),
        Expected("a reactant drives forward", ammonia(at(200.0), usual), add(0), 0.04, F, F, vec![C::ReactantAdded]),
        Expected("a reactant taken away drives back", ammonia(at(200.0), usual), add(0), -0.04, R, R, vec![C::ReactantRemoved]),
        Expected("nitrogen above one half drives ammonia back", ammonia(at(200.0), rich), add(0), 0.08, R, R, vec![C::ReactantAddedBack]),
        Expected("and taken away forward", ammonia(at(200.0), rich), add(0), -0.08, F, F, vec![C::ReactantRemovedForward]),
        Expected("in a fixed volume it drives forward all the same", ammonia(within(0.01), rich), add(0), 0.08, F, F, vec![C::ReactantAdded]),
        Expected("hydrogen would need a fraction of 3/2", ammonia(at(200.0), &[0.2, 6.0, 0.1, 0.0]), add(1), 0.06, F, F, vec![C::ReactantAdded]),
        Expected("nitrogen at one half: no slope, and the step goes back", half(2.0), add(0), 0.02, R, N, vec![C::ShareBalanced]),
        Expected("nitrogen just below one half: forward, then back", half(1.998), add(0), 0.04, R, F, vec![C::ReactantAdded, C::CrossesReverse]),
        Expected("nitrogen just above one half, taken away: forward, then back", half(2.002), add(0), -0.04, R, F, vec![C::ReactantRemovedForward, C::CrossesReverse]),
        Expected("mirrored: nitrogen just below one half goes back, then forward", mirrored(half(1.998)), add(0), 0.04, F, R, vec![C::ProductAdded, C::CrossesForward]),
        Expected("a product drives back", ammonia(at(200.0), usual), add(2), 0.04, R, R, vec![C::ProductAdded]),
        Expected("a product taken away drives forward", ammonia(at(200.0), usual), add(2), -0.01, F, F, vec![C::ProductRemoved]),
        Expected("nitrogen above one half drives cracking forward", cracking(at(200.0), rich), add(0), 0.08, F, F, vec![C::ProductAddedForward]),
        Expected("and taken away back", cracking(at(200.0), rich), add(0), -0.6, R, R, vec![C::ProductRemovedBack]),
        Expected("without an enthalpy nothing tells", Row { enthalpy: None, ..shift(at(20.0)) }, T, 5.0, N, N, vec![C::HeatUnknown]),
        Expected("outside the limits of a temperature", shift(at(20.0)), T, 1e5, N, R, vec![C::OutOfRange]),
        Expected("a K of 1e300 still moves the right way", Row { ln_k: 690.0, ..shift(at(20.0)) }, T, 5.0, R, R, vec![C::HeatGiven]),
    ]
}

/// The same reaction written the other way round.
pub fn mirrored(row: Row) -> Row {
    let nu = row.nu.iter().map(|nu| -nu).collect();
    Row { nu, ln_k: -row.ln_k, enthalpy: row.enthalpy.map(|heat| -heat), ..row }
}

#[rustfmt::skip]
fn phases() -> Vec<Expected> {
    let some = &[2.0, 1.0, 0.1, 1.0];
    let spent = &[0.2, 1.0, 0.1, 1.0];
    let seen = &[2.0, 0.2, 1.5, 1.0];
    vec![
        Expected("more of a pure reactant that is there", lime(some, -1.0), add(0), 0.02, N, N, vec![C::PureAdded]),
        Expected("more of a pure product that is there", lime(some, -1.0), add(1), 0.02, N, N, vec![C::PureAdded]),
        Expected("less of a pure product of which some is left", lime(some, -1.0), add(1), -0.1, N, N, vec![C::PureRemoved]),
        Expected("less of a pure product than rest leaves", lime(seen, -0.554), add(1), -0.1, F, N, vec![C::PureRemoved]),
        Expected("the gas beside pure phases", lime(some, -1.0), add(2), 0.02, R, R, vec![C::ProductAdded]),
        Expected("an inert gas carries the product gas off", lime(some, -1.0), INERT_P, 0.1, F, F, vec![C::InertForward]),
        Expected("used up: warmer does nothing", lime(spent, 1.0), T, 5.0, N, N, vec![C::UsedUpUntil]),
        Expected("used up: a little pressure does nothing", lime(spent, 1.0), P, 5e3, N, N, vec![C::UsedUpUntil]),
        Expected("used up: much pressure goes past the border", lime(spent, 1.0), P, 2e6, R, N, vec![C::PressureReverse, C::UsedUpUntil]),
        Expected("used up: its gas does nothing", lime(spent, 1.0), add(2), 0.01, N, N, vec![C::UsedUp]),
        Expected("used up: a large amount of its gas drives back", Row { hold: at(4.0), ..lime(spent, 0.0) }, add(2), 5.0, R, N, vec![C::ProductAdded, C::UsedUp]),
        Expected("used up: more of it reacts", lime(spent, 1.0), add(0), 0.01, F, F, vec![C::Needed]),
        Expected("used up: more of the other solid does nothing", lime(spent, 1.0), add(1), 0.01, N, N, vec![C::PureAdded]),
        Expected("no carbon to burn: warmer does nothing", carbon(&[1.0, 0.0, 1.0], -3.0), T, 5.0, N, N, vec![C::UsedUpUntil]),
        Expected("no carbon to burn: carbon burns", carbon(&[1.0, 0.0, 1.0], -3.0), add(1), 0.01, R, R, vec![C::Needed]),
        Expected("two phases used up together: one alone does nothing", Row::new("ppgg", &[-1.0, -1.0, 1.0, 0.0], at(1.0), &[1.0; 4], 9.0), add(0), 0.01, N, N, vec![C::UsedUp]),
        Expected("an ample phase is ample", Row::new("aag", &[-1.0, 1.0, 1.0], within(0.1), &[1.0, 1.0, 0.1], 0.0), add(0), 0.01, N, N, vec![C::PureAdded]),
        Expected("a solid turning into another by itself", Row::new("pp", &[-1.0, 1.0], at(1.0), &[1.0, 1.0], 0.0), T, 5.0, R, N, vec![C::AnyExtent]),
        Expected("lime in pure CO2: nothing more to split", lime(&[1.0, 1.0, 1.0, 0.0], 1.0), T, 5.0, N, N, vec![C::RanToLimit]),
        Expected("lime in pure CO2: more of it splits", lime(&[1.0, 1.0, 1.0, 0.0], 1.0), add(0), 0.01, F, F, vec![C::Needed]),
        Expected("lime in pure CO2: nothing left to bind", lime(&[1.0, 2.0, 1.0, 0.0], -1.0), T, 5.0, N, N, vec![C::RanToLimit]),
        Expected("lime in pure CO2: an inert carries some off", lime(&[1.0, 2.0, 1.0, 0.0], -1.0), INERT_P, 0.05, F, N, vec![C::InertForward, C::RanToLimit]),
        Expected("ample lime under too little CO2 has no rest", Row::new("aag", &[-1.0, 1.0, 1.0], at(1.0), &[1.0, 1.0, 0.1], 1.0), T, 5.0, N, N, vec![C::NoLimit]),
        Expected("nothing to react with", shift_without(), T, 5.0, N, N, vec![C::NothingCanMove]),
        Expected("what is missing lets it run", shift_without(), add(1), 0.05, F, N, vec![C::Opens]),
        Expected("what is there already does not", shift_without(), add(0), 0.05, N, N, vec![C::NothingCanMove]),
    ]
}

/// The shift without steam and without hydrogen.
fn shift_without() -> Row {
    Row { amounts: vec![1.0, 0.0, 1.0, 0.0, 1.0], ..shift(at(20.0)) }
}

#[rustfmt::skip]
fn solutions() -> Vec<Expected> {
    let pairing = Row::new("ss", &[-2.0, 1.0], within(1e-3), &[0.1, 0.1], 2.0);
    let exchange = Row::new("ssss", &[-1.0, -1.0, 1.0, 1.0], within(1e-3), &[0.1; 4], 2.0);
    vec![
        Expected("water drives an acid apart", acid(), WATER, 0.1, F, F, vec![C::DilutionForward]),
        Expected("water drives pairs apart", pairing.clone(), WATER, 0.1, R, R, vec![C::DilutionReverse]),
        Expected("water leaves an exchange alone", exchange, WATER, 0.1, N, N, vec![C::DilutionNone]),
        Expected("an ion drives its acid back", acid(), add(1), 1e-3, R, R, vec![C::ProductAdded]),
    ]
}

#[rustfmt::skip]
fn mixtures() -> Vec<Expected> {
    let usual = &[1.0, 2.0, 0.3, 0.2];
    let ester = Row::new("llll", &[-1.0, -1.0, 1.0, 1.0], at(1.0), usual, 1.4);
    let pairs = |amounts| Row::new("lll", &[-2.0, 1.0, 0.0], at(1.0), amounts, 1.0);
    let molal = |ln_k| Row { hold: Hold::Solvent { water_kg: 1.0 }, ln_k, kelvin: 298.15, ..acid() };
    let over_pressure = Hold::PressureAndSolvent { pressure_pa: 2e5, water_kg: 10.0 };
    let over_volume = Hold::VolumeAndSolvent { volume_m3: 0.1, water_kg: 10.0 };
    let gas = |hold| Row { kelvin: 298.15, ..Row::new("gsg", &[-1.0, 1.0, 0.0], hold, &[1.0, 0.1, 3.0], -3.4).heat(-20.0) };
    // MX(s) = M(2+) + X(2−) beside a salt of no part in it; HA + B(−) = A(−) + HB by strength alone.
    let brine = Row { kelvin: 298.15, hold: Hold::Solvent { water_kg: 1.0 }, charges: vec![0, 2, -2, 1, -1], ..Row::new("pssss", &[-1.0, 1.0, 1.0, 0.0, 0.0], at(1.0), &[1.0, 0.01, 0.01, 0.1, 0.1], -10.0).heat(-2.0) };
    let even = |charges: [i32; 4]| Row { kelvin: 298.15, hold: Hold::Solvent { water_kg: 1.0 }, charges: charges.to_vec(), ..Row::new("ssss", &[-1.0, -1.0, 1.0, 1.0], at(1.0), &[0.02; 4], 0.0) };
    vec![
        Expected("more acid makes more ester", ester.clone(), add(0), 0.03, F, F, vec![C::ReactantAdded]),
        Expected("more water splits ester", ester.clone(), add(3), 0.03, R, R, vec![C::ProductAdded]),
        Expected("ester taken away is made again", ester, add(2), -0.03, F, F, vec![C::ProductRemoved]),
        Expected("an inert liquid splits pairs", pairs(&[1.0, 0.1, 1.0]), add(2), 0.02, R, R, vec![C::BystanderReverse]),
        Expected("water by mass drives an acid apart", molal(-10.9), WATER, 0.1, F, F, vec![C::DilutionForward]),
        Expected("pressure presses gas into water", gas(over_pressure), P, 1e4, F, F, vec![C::PressureForward]),
        Expected("more room for the gas draws it out", gas(over_volume), V, 5e-3, R, R, vec![C::VolumeReverse]),
        Expected("more water takes up more gas", gas(over_pressure), WATER, 0.1, F, F, vec![C::DilutionForward]),
        Expected("more water takes up more gas from a volume", gas(over_volume), WATER, 0.1, F, F, vec![C::DilutionForward]),
        Expected("an inert gas at constant pressure draws gas out", gas(over_pressure), INERT_P, 0.2, R, R, vec![C::InertReverse]),
        Expected("the same where volume is held", gas(over_volume), INERT_P, 0.2, R, R, vec![C::InertReverse]),
        Expected("an inert gas in a fixed volume does not", gas(over_pressure), INERT_V, 0.2, N, N, vec![C::InertInVolume]),
        Expected("more of a gas dissolves", gas(over_pressure), add(0), 0.04, F, F, vec![C::ReactantAdded]),
        Expected("hotter water holds less gas", gas(over_pressure), T, 5.0, R, R, vec![C::HeatGiven]),
        Expected("a brine dissolves more when diluted", brine.clone(), WATER, 0.1, F, F, vec![C::DilutionForward]),
        Expected("a salt of no part salts in", brine.clone(), add(3), 0.01, F, F, vec![C::CoefficientsForward]),
        Expected("its own ion drives it out", brine, add(1), 0.001, R, R, vec![C::ProductAdded]),
        Expected("dilution takes the shielding off the higher charges", even([1, -1, 2, -2]), WATER, 0.1, R, R, vec![C::CoefficientsReverse]),
        Expected("dilution takes the shielding off, mirrored", even([2, -2, 1, -1]), WATER, 0.1, F, F, vec![C::CoefficientsForward]),
    ]
}

fn judged(rows: Vec<Expected>) -> Vec<WhyCode> {
    let mut said = Vec::new();
    let mut wrong = String::new();
    for Expected(title, row, knob, step, direction, local, codes) in rows {
        let found = row.nudge(knob, step);
        let text = sentence(&found);
        let mut given = vec![found.reason.code];
        given.extend(found.aside.map(|aside| aside.code));
        if (found.direction, found.local, &given) != (direction, local, &codes) {
            wrong += &format!(
                "{title}: {:?}, locally {:?}, {given:?}: {found:?}\n",
                found.direction, found.local
            );
        }
        if text.contains(['{', '}']) || !text.ends_with('.') {
            wrong += &format!("{title}: {text}\n");
        }
        for (species, (after, change)) in found.rest_mol.iter().zip(&found.change_mol).enumerate() {
            assert!(*after >= 0.0 && change.is_finite(), "{title}: species {species}");
        }
        said.extend(given);
    }
    assert!(wrong.is_empty(), "\n{wrong}");
    said
}

#[test]
fn every_case_moves_the_right_way_for_its_own_reason() {
    let mut said = judged(gases());
    said.extend(judged(phases()));
    said.extend(judged(solutions()));
    said.extend(judged(mixtures()));
    let unsaid: Vec<_> = C::ALL.iter().filter(|code| !said.contains(code)).collect();
    assert!(unsaid.is_empty(), "no row says {unsaid:?}");
}
