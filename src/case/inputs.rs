//! The inputs of a case that carry a tolerance, and the case with one of them moved.

use super::question::{KSource, Question, StatedK};
use crate::mixture::{Basis, Entry, GasReading, Stated, Water};
use crate::problem::{InputCode, Remark};
use crate::quantity::{Measure, PressureReference, Quantity};

/// A number in a case.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub(super) enum Place {
    Temperature,
    Pressure,
    Atmosphere,
    Volume,
    Gas(Of, usize),
    Water(Of),
    WaterPressure(Of),
    Liquid(usize),
    Solution(usize),
    SolutionVolume,
    SolutionWater,
    Pure(usize),
    K(Part),
    Point(usize, Part),
}

/// Which gas.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub(super) enum Of {
    Reading,
    Feed,
}

/// A number of a stated K.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub(super) enum Part {
    Value,
    At,
    Enthalpy,
    HeatCapacity,
}

impl Place {
    /// Whether it is about K and not about the reading.
    pub fn is_of_k(self) -> bool {
        matches!(self, Place::K(_) | Place::Point(..))
    }
}

/// An input with a tolerance or a bound.
#[derive(Debug, Clone)]
pub(super) struct Input {
    pub place: Place,
    /// The field's path in the case.
    pub field: String,
    /// What a sentence calls it.
    pub name: Remark<InputCode>,
    /// Its standard uncertainty; zero for a bound.
    pub u_si: f64,
}

/// Every number of a case that may have a tolerance, in the order of the page.
fn places(question: &Question) -> Vec<Named> {
    let plain = Remark::new;
    let field = |name: &str| name.to_owned();
    let mut places = vec![
        (Place::Temperature, field("temperature"), plain(InputCode::Temperature)),
        (Place::Pressure, field("pressure"), plain(InputCode::Pressure)),
        (Place::Atmosphere, field("atmosphere"), plain(InputCode::Atmosphere)),
        (Place::Volume, field("volume"), plain(InputCode::Volume)),
    ];
    for (of, gas) in [(Of::Feed, &question.feed), (Of::Reading, &question.gas)] {
        if let Some(gas) = gas {
            places_of_gas(&mut places, of, gas);
        }
    }
    for (i, entry) in question.liquid.iter().flat_map(|liquid| &liquid.entries).enumerate() {
        let (field, name) = named(InputCode::Liquid, entry);
        places.push((Place::Liquid(i), field, name));
    }
    if let Some(solution) = &question.solution {
        for (i, entry) in solution.entries.iter().enumerate() {
            let (field, name) = named(InputCode::Solution, entry);
            places.push((Place::Solution(i), field, name));
        }
        let volume = field("reading.solution.volume");
        places.push((Place::SolutionVolume, volume, plain(InputCode::SolutionVolume)));
        let water = field("reading.solution.water");
        places.push((Place::SolutionWater, water, plain(InputCode::SolutionWater)));
    }
    for (i, entry) in question.pure.iter().enumerate() {
        let (field, name) = named(InputCode::Pure, entry);
        places.push((Place::Pure(i), field, name));
    }
    let of_k = |part: Part| match part {
        Part::Value => ("value", InputCode::K),
        Part::At => ("at", InputCode::KAt),
        Part::Enthalpy => ("enthalpy", InputCode::KEnthalpy),
        Part::HeatCapacity => ("heat_capacity", InputCode::KHeatCapacity),
    };
    match &question.reaction.source {
        KSource::Library { .. } | KSource::Formula(_) | KSource::Reading(_) | KSource::Book => {}
        KSource::Value(_) => {
            for part in [Part::Value, Part::At, Part::Enthalpy, Part::HeatCapacity] {
                let (name, code) = of_k(part);
                let field = format!("reactions[0].constant.{name}");
                places.push((Place::K(part), field, plain(code)));
            }
        }
        KSource::Points(points) => {
            // The tolerances of the values are in the line's own uncertainty.
            for i in 0..points.len() {
                let field = format!("reactions[0].constant.points[{i}][0]");
                places.push((Place::Point(i, Part::At), field, plain(InputCode::KAt)));
            }
        }
    }
    places
}

type Named = (Place, String, Remark<InputCode>);

fn named(code: InputCode, entry: &Entry) -> (String, Remark<InputCode>) {
    (entry.field.clone(), Remark::new(code).with("species", entry.species.formula.text()))
}

fn places_of_gas(places: &mut Vec<Named>, of: Of, gas: &GasReading) {
    let (block, code, water_code) = match of {
        Of::Reading => ("reading", InputCode::Gas, InputCode::Water),
        Of::Feed => ("feed", InputCode::Feed, InputCode::FeedWater),
    };
    for (i, entry) in gas.entries.iter().enumerate() {
        let (field, name) = named(code, entry);
        places.push((Place::Gas(of, i), field, name));
    }
    let (way, code) = match &gas.basis {
        Basis::Dry(Water::DewPoint { .. }) => ("dew_point", InputCode::DewPoint),
        Basis::Dry(Water::Fraction(_)) => ("fraction", water_code),
        Basis::Dry(Water::PerDry(_)) => ("per_dry", water_code),
        Basis::Dry(Water::None | Water::FromFeed) | Basis::Wet => return,
    };
    let water = format!("{block}.gas.water");
    places.push((Place::Water(of), format!("{water}.{way}"), Remark::new(code)));
    let pressure = Remark::new(InputCode::DewPointPressure);
    places.push((Place::WaterPressure(of), format!("{water}.pressure"), pressure));
}

/// The inputs that carry a tolerance.
pub(super) fn inputs(question: &mut Question) -> Vec<Input> {
    let mut found = Vec::new();
    for (place, field, name) in places(question) {
        if closes(question, place) {
            continue;
        }
        let u_si = slot(question, place).and_then(|quantity| quantity.standard_uncertainty_si);
        if let Some(u_si) = u_si.filter(|u| *u > 0.0) {
            found.push(Input { place, field, name, u_si });
        }
    }
    found
}

/// Whether an entry closes the fractions, so that its own value does not count.
fn closes(question: &mut Question, place: Place) -> bool {
    match place {
        Place::Gas(of, i) => gas(question, of).is_some_and(|gas| gas.closed_by == Some(i)),
        Place::Liquid(i) => {
            question.liquid.as_ref().is_some_and(|liquid| liquid.closed_by == Some(i))
        }
        _ => false,
    }
}

/// What has neither a tolerance nor a bound, of the numbers of the reading.
pub(super) fn without_tolerance(question: &Question) -> Vec<Remark<InputCode>> {
    let mut copy = question.clone();
    let mut found = Vec::new();
    for (place, _, name) in places(question) {
        let of_reading = !place.is_of_k() && place != Place::Atmosphere;
        let bare = slot(&mut copy, place).is_some_and(|quantity| {
            quantity.standard_uncertainty_si.is_none() && !quantity.is_bound
        });
        if of_reading && bare {
            found.push(name);
        }
    }
    found
}

/// The bounds: each lies somewhere between nothing and the value written.
pub(super) fn bounds(question: &mut Question) -> Vec<Input> {
    let mut found = Vec::new();
    for (place, field, name) in places(question) {
        if slot(question, place).is_some_and(|quantity| quantity.is_bound) {
            found.push(Input { place, field, name, u_si: 0.0 });
        }
    }
    found
}

/// The number at a place, to be read or moved.
pub(super) fn slot(question: &mut Question, place: Place) -> Option<&mut Quantity> {
    match place {
        Place::Temperature => Some(&mut question.temperature),
        Place::Pressure => question.pressure.as_mut(),
        Place::Atmosphere => question.atmosphere.as_mut(),
        Place::Volume => question.volume.as_mut(),
        Place::Gas(of, i) => stated(gas(question, of)?.entries.get_mut(i)?),
        Place::Pure(i) => stated(question.pure.get_mut(i)?),
        Place::Liquid(i) => stated(question.liquid.as_mut()?.entries.get_mut(i)?),
        Place::Solution(i) => stated(question.solution.as_mut()?.entries.get_mut(i)?),
        Place::SolutionVolume => question.solution.as_mut()?.volume.as_mut(),
        Place::SolutionWater => question.solution.as_mut()?.water.as_mut(),
        Place::Water(of) | Place::WaterPressure(of) => water(gas(question, of)?, place),
        Place::K(part) => match &mut question.reaction.source {
            KSource::Value(stated) => part_of(stated, part),
            _ => None,
        },
        Place::Point(i, part) => match &mut question.reaction.source {
            KSource::Points(points) => part_of(points.get_mut(i)?, part),
            _ => None,
        },
    }
}

fn stated(entry: &mut Entry) -> Option<&mut Quantity> {
    match &mut entry.stated {
        Stated::Quantity(quantity) => Some(quantity),
        _ => None,
    }
}

fn gas(question: &mut Question, of: Of) -> Option<&mut GasReading> {
    match of {
        Of::Reading => question.gas.as_mut(),
        Of::Feed => question.feed.as_mut(),
    }
}

fn water(gas: &mut GasReading, place: Place) -> Option<&mut Quantity> {
    let Basis::Dry(water) = &mut gas.basis else { return None };
    match (water, place) {
        (Water::Fraction(quantity) | Water::PerDry(quantity), Place::Water(_)) => Some(quantity),
        (Water::DewPoint { temperature, .. }, Place::Water(_)) => Some(temperature),
        (Water::DewPoint { pressure, .. }, _) => pressure.as_mut(),
        _ => None,
    }
}

fn part_of(stated: &mut StatedK, part: Part) -> Option<&mut Quantity> {
    match part {
        Part::Value => Some(&mut stated.value),
        Part::At => stated.at.as_mut(),
        Part::Enthalpy => stated.enthalpy.as_mut(),
        Part::HeatCapacity => stated.heat_capacity.as_mut(),
    }
}

/// Does something with the case while one number in it is another, and puts the number back.
///
/// A fraction, an amount or a partial pressure does not go below zero, and no fraction above one.
pub(super) fn with<T>(
    question: &mut Question,
    place: Place,
    value_si: f64,
    ask: impl FnOnce(&Question) -> Option<T>,
) -> Option<T> {
    let quantity = slot(question, place)?;
    let before = quantity.value_si;
    // A gauge reading may be below zero; what is left of the atmosphere is seen when it is added.
    let gauge = quantity.pressure_reference == PressureReference::Gauge;
    let floor = if quantity.measure.starts_at_zero() && !gauge { 0.0 } else { f64::MIN };
    let ceiling = if quantity.measure == Measure::Fraction { 1.0 } else { f64::MAX };
    if !(floor..=ceiling).contains(&value_si) {
        return None;
    }
    quantity.value_si = value_si;
    let answer = ask(question);
    if let Some(quantity) = slot(question, place) {
        quantity.value_si = before;
    }
    answer
}
