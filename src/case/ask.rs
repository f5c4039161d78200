//! What a sweep and a target ask of a case: a knob, its values, and the number of rest that matters.

use super::node::{Node, Reader};
use super::run::{Findings, ReadingFindings, find};
use super::value::Value;
use super::{amounts, read};
use crate::advice::{Knob, Plant, Wanted};
use crate::equilibrium::Kind;
use crate::mixture::absolute_pressure_pa;
use crate::problem::{CaseCode, Outcome, Problem};
use crate::quantity::{Measure, Quantity};
use crate::reaction::{Species, parse_species};

/// A case with a reading, ready to be asked.
pub(super) struct Asked {
    pub found: Findings,
}

impl Asked {
    /// Reads and judges the case.
    ///
    /// # Errors
    /// Its problems, or that it has no reading.
    pub fn new(case: &Value) -> Outcome<Asked> {
        let found = find(read::read(case)?)?;
        if found.reading.is_none() {
            return Err(Problem::new(CaseCode::ReadingNeeded).at("reading").into());
        }
        Ok(Asked { found })
    }

    /// The reading.
    pub fn reading(&self) -> Option<&ReadingFindings> {
        self.found.reading.as_ref()
    }

    /// The plant that the knobs belong to.
    pub fn plant(&self) -> Option<Plant<'_>> {
        let reading = self.reading()?;
        let temperature_k = self.found.question.temperature.value_si;
        Some(Plant {
            system: &reading.system,
            state: reading.state(temperature_k, &reading.amounts_mol),
            constant: &self.found.constant,
            approach_k: self.found.question.reaction.approach_k.unwrap_or(0.0),
        })
    }

    /// The place of a species among the participants.
    fn place(&self, reader: &mut Reader, node: &Node, text: &str) -> Option<usize> {
        let species = reader.keep(node, parse_species(text))?;
        let fits = |one: &Species| {
            species.same_substance(one) && (species.phase.is_none() || species.phase == one.phase)
        };
        let place = self.found.participants.iter().position(|one| fits(&one.species));
        if place.is_none() {
            let problem = Problem::new(CaseCode::SpeciesNotHere).with("species", species.text());
            reader.problems.push(problem.at(&node.path));
        }
        place
    }
}

/// A knob as asked for, with what its numbers mean.
#[derive(Debug, Clone)]
pub(super) struct AskedKnob {
    pub knob: Knob,
    /// Its name as asked.
    pub name: String,
    /// What one of its numbers is in the knob's own unit: for an amount, a ratio to the other gas.
    pub per_number: f64,
}

impl AskedKnob {
    /// Reads `temperature`, `pressure`, `volume` or `amount of NAME`.
    pub fn read(asked: &Asked, reader: &mut Reader, node: &Node) -> Option<AskedKnob> {
        let text = reader.needed_text(node)?;
        let plain = |knob| Some((knob, 1.0));
        let found = match text {
            "temperature" => plain(Knob::Temperature),
            "pressure" => plain(Knob::Pressure),
            "volume" => plain(Knob::Volume),
            _ => match text.strip_prefix("amount of ") {
                Some(name) => {
                    let place = asked.place(reader, node, name)?;
                    Some((Knob::Amount(place), asked.others_mol(place)))
                }
                None => None,
            },
        };
        let Some((knob, per_number)) = found else {
            let problem = Problem::new(CaseCode::UnknownWord).with("found", text);
            let allowed = "temperature, pressure, volume, amount of a species";
            reader.problems.push(problem.with("allowed", allowed).at(&node.path));
            return None;
        };
        let has_gas = asked.reading()?.system.kinds().contains(&Kind::Gas);
        if matches!(knob, Knob::Pressure | Knob::Volume) && !has_gas {
            let problem = Problem::new(CaseCode::KnobNotHere).with("knob", text);
            reader.problems.push(problem.at(&node.path));
            return None;
        }
        Some(AskedKnob { knob, name: text.to_owned(), per_number })
    }

    /// Reads one of its numbers, in SI.
    pub fn number(&self, asked: &Asked, reader: &mut Reader, node: &Node) -> Option<f64> {
        let measure = match self.knob {
            Knob::Temperature => Measure::Temperature,
            Knob::Pressure => Measure::Pressure,
            Knob::Volume => Measure::Volume,
            _ => Measure::Ratio,
        };
        let quantity: Quantity = reader.needed_quantity(node, &[measure])?;
        if self.knob == Knob::Pressure {
            let absolute = absolute_pressure_pa(&quantity, asked.found.question.atmosphere_pa());
            return reader.keep(node, absolute.map_err(Vec::from));
        }
        Some(quantity.value_si)
    }

    /// The unit of its numbers.
    pub fn unit(&self) -> &'static str {
        match self.knob {
            Knob::Temperature => "K",
            Knob::Pressure => "Pa",
            Knob::Volume => "m3",
            _ => "mol/mol",
        }
    }

    /// Where it stands now, in its own numbers.
    pub fn now(&self, asked: &Asked) -> Option<f64> {
        let reading = asked.reading()?;
        match self.knob {
            Knob::Temperature => Some(asked.found.question.temperature.value_si),
            Knob::Pressure => reading.setting.pressure_pa,
            Knob::Volume => reading.setting.volume_m3,
            Knob::Amount(place) => Some(reading.amounts_mol[place] / self.per_number),
            _ => None,
        }
    }
}

impl Asked {
    /// What else there is in the phase of a species.
    fn others_mol(&self, place: usize) -> f64 {
        let Some(reading) = self.reading() else { return 1.0 };
        let kinds = reading.system.kinds();
        let rows = kinds.iter().zip(&reading.amounts_mol).enumerate();
        let others = rows.filter(|(i, (kind, _))| *i != place && **kind == kinds[place]);
        let others: f64 = others.map(|(_, (_, amount))| amount).sum();
        if others > 0.0 { others } else { 1.0 }
    }
}

/// The number of rest that is wanted.
#[derive(Debug, Clone)]
pub(super) struct AskedNumber {
    pub wanted: Wanted,
    pub what: String,
    pub species: Option<String>,
    /// What was fed of a species over what is present, where a feed is given: a conversion is then
    /// from the feed.
    fed_per_now: Option<f64>,
}

impl AskedNumber {
    /// Reads `{ what, species }`.
    pub fn read(asked: &Asked, reader: &mut Reader, node: &Node) -> Option<AskedNumber> {
        if !reader.object(node, &["what", "species"]) {
            reader.problems.push(node.problem(CaseCode::Missing));
            return None;
        }
        let words = [("conversion", 0), ("fraction", 1), ("amount", 2), ("extent", 3), ("ln_k", 4)];
        let what_node = node.field("what");
        let what = reader.choice(&what_node, &words)?;
        let species_node = node.field("species");
        let place = if what < 3 {
            let text = reader.needed_text(&species_node)?;
            Some(asked.place(reader, &species_node, text)?)
        } else {
            None
        };
        let wanted = match (what, place) {
            (0, Some(place)) => Wanted::Conversion(place),
            (1, Some(place)) => Wanted::Fraction(place),
            (2, Some(place)) => Wanted::Amount(place),
            (3, _) => Wanted::Extent,
            _ => Wanted::LnK,
        };
        let name = words.iter().find(|(_, code)| *code == what).map_or("", |(name, _)| *name);
        let species = place.map(|place| asked.found.participants[place].species.text());
        let fed_per_now = match (wanted, asked.reading()) {
            (Wanted::Conversion(place), Some(reading)) => {
                let now = reading.amounts_mol[place];
                let fed = amounts::fed(reading, &asked.found.participants[place]);
                fed.filter(|fed| *fed > 0.0 && now > 0.0).map(|fed| fed / now)
            }
            _ => None,
        };
        Some(AskedNumber { wanted, what: name.to_owned(), species, fed_per_now })
    }

    /// A number as the knobs give it, as it is told: a conversion from the feed where there is one.
    pub fn told(&self, value: f64) -> f64 {
        self.fed_per_now.map_or(value, |fed| 1.0 - (1.0 - value) / fed)
    }

    /// The other way.
    pub fn asked(&self, told: f64) -> f64 {
        self.fed_per_now.map_or(told, |fed| 1.0 - (1.0 - told) * fed)
    }

    /// The measure of its numbers.
    pub fn measure(&self) -> Measure {
        match self.wanted {
            Wanted::Conversion(_) | Wanted::Fraction(_) => Measure::Fraction,
            Wanted::Amount(_) | Wanted::Extent => Measure::Amount,
            Wanted::LnK => Measure::Number,
        }
    }
}
