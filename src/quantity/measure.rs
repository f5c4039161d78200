//! What a number measures: the dimension a field asks for, with its name for messages.

/// What a quantity measures; its SI unit is named with each.
#[derive(Debug, Clone, Copy, PartialEq, Eq, Hash)]
pub enum Measure {
    /// A temperature, K (absolute).
    Temperature,
    /// A difference of temperatures, K.
    TemperatureDifference,
    /// A pressure, Pa: gauge, absolute or not stated.
    Pressure,
    /// A fraction from 0 to 1, by amount, volume or mass, or not stated.
    Fraction,
    /// A ratio, which may be above 1 (steam to dry gas), dimensionless.
    Ratio,
    /// An amount of substance, mol.
    Amount,
    /// An amount per time, mol/s.
    AmountRate,
    /// A mass, kg.
    Mass,
    /// A mass per time, kg/s.
    MassRate,
    /// A volume, m³.
    Volume,
    /// A height or length, m.
    Length,
    /// An energy per amount, J/mol.
    MolarEnergy,
    /// An energy per amount and temperature, J/(mol K): heat capacity or entropy.
    MolarHeatCapacity,
    /// An amount per volume of solution, mol/m³.
    Concentration,
    /// An amount per mass of solvent, mol/kg.
    Molality,
    /// A mass per volume, kg/m³.
    MassConcentration,
    /// A mass per amount of gas, kg/mol (such as mg/Nm³).
    MassPerAmount,
    /// The pH, a number on its own scale.
    Ph,
    /// A plain number.
    Number,
}

impl Measure {
    /// Every measure, in the order they are listed to the user.
    pub const ALL: [Measure; 19] = [
        Measure::Temperature,
        Measure::TemperatureDifference,
        Measure::Pressure,
        Measure::Fraction,
        Measure::Ratio,
        Measure::Amount,
        Measure::AmountRate,
        Measure::Mass,
        Measure::MassRate,
        Measure::Volume,
        Measure::Length,
        Measure::MolarEnergy,
        Measure::MolarHeatCapacity,
        Measure::Concentration,
        Measure::Molality,
        Measure::MassConcentration,
        Measure::MassPerAmount,
        Measure::Ph,
        Measure::Number,
    ];

    /// The name with its article, as a message says it: `a pressure`.
    #[must_use]
    pub fn name(self) -> &'static str {
        self.words().0
    }

    /// Units that a message offers, the most usual first; none for plain numbers.
    #[must_use]
    pub fn examples(self) -> &'static [&'static str] {
        self.words().1
    }

    /// Whether `< x` can be a reading of it, which then lies between nothing and x.
    #[must_use]
    pub fn starts_at_zero(self) -> bool {
        matches!(
            self,
            Measure::Pressure
                | Measure::Fraction
                | Measure::Ratio
                | Measure::Amount
                | Measure::AmountRate
                | Measure::Mass
                | Measure::MassRate
                | Measure::Concentration
                | Measure::Molality
                | Measure::MassConcentration
                | Measure::MassPerAmount
        )
    }

    fn words(self) -> (&'static str, &'static [&'static str]) {
        match self {
            Measure::Temperature => ("a temperature", &["°C", "K", "°F"]),
            Measure::TemperatureDifference => ("a temperature difference", &["K", "°C", "°F"]),
            Measure::Pressure => ("a pressure", &["bar", "kPa", "psi", "bar(g)"]),
            Measure::Fraction => ("a fraction", &["%", "ppm", "mol %", "wt %"]),
            Measure::Ratio => ("a ratio", &["mol/mol", "%"]),
            Measure::Amount => ("an amount of substance", &["mol", "kmol", "Nm³", "scf"]),
            Measure::AmountRate => ("an amount per time", &["kmol/h", "Nm³/h", "scf/h"]),
            Measure::Mass => ("a mass", &["kg", "g", "t", "lb"]),
            Measure::MassRate => ("a mass per time", &["kg/h", "t/h", "lb/h"]),
            Measure::Volume => ("a volume", &["m³", "L", "ft³"]),
            Measure::Length => ("a length", &["m", "ft"]),
            Measure::MolarEnergy => ("an energy per amount", &["kJ/mol", "kcal/mol", "Btu/lbmol"]),
            Measure::MolarHeatCapacity => {
                ("a molar heat capacity", &["J/(mol·K)", "cal/(mol·K)", "Btu/(lbmol·°F)"])
            }
            Measure::Concentration => ("an amount per volume", &["mol/L", "mmol/L", "mol/m³"]),
            Measure::Molality => ("an amount per mass of solvent", &["mol/kg", "mmol/kg"]),
            Measure::MassConcentration => ("a mass per volume", &["g/L", "mg/L", "kg/m³"]),
            Measure::MassPerAmount => ("a mass per amount of gas", &["mg/Nm³", "g/Nm³"]),
            Measure::Ph => ("a pH", &["pH 7.2"]),
            Measure::Number => ("a plain number", &[]),
        }
    }
}

/// Says several measures in one phrase: `a fraction, a pressure or an amount of substance`.
pub(super) fn any_of(measures: &[Measure]) -> String {
    let mut names: Vec<String> = Vec::new();
    for measure in measures {
        if !names.iter().any(|name| name == measure.name()) {
            names.push(measure.name().to_owned());
        }
    }
    join_or(&names)
}

/// A short list of units that these measures allow: `°C, K or °F`.
pub(super) fn examples_of(measures: &[Measure]) -> String {
    let each = match measures.len() {
        0..=1 => 3,
        2 => 2,
        _ => 1,
    };
    let mut names: Vec<String> = Vec::new();
    for measure in measures {
        for example in measure.examples().iter().take(each) {
            if !names.iter().any(|name| name == example) {
                names.push((*example).to_owned());
            }
        }
    }
    join_or(&names)
}

/// Joins with commas and a last `or`.
pub(super) fn join_or(names: &[String]) -> String {
    match names {
        [] => String::new(),
        [one] => one.clone(),
        [most @ .., last] => format!("{} or {last}", most.join(", ")),
    }
}
