//! Classes of temperature instruments, written in the place of a tolerance.

/// How the limit of a class follows from the temperature in °C.
#[derive(Debug, Clone, Copy, PartialEq)]
enum Rule {
    /// The larger of a fixed limit and a share of |t|.
    Larger(f64, f64),
    /// A fixed limit, and a share of what lies above a temperature more.
    Above(f64, f64, f64),
    /// A fixed limit and a share of |t|, added.
    Sum(f64, f64),
}

/// A class of an instrument: within its limit lies every reading, evenly for all that is known.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Preset {
    /// The instrument, such as `type K` or `Pt100`.
    pub instrument: &'static str,
    /// Its class, such as `2` or `AA`.
    pub class: &'static str,
    /// The temperatures that the class holds for, °C.
    pub range_celsius: (f64, f64),
    rule: Rule,
}

impl Preset {
    /// The limit at a temperature, in kelvin: no reading is wrong by more.
    ///
    /// ```
    /// use shiftgauge::quantity::preset;
    /// let k2 = preset("type K class 2").unwrap();
    /// assert_eq!(k2.limit_k(100.0), 2.5);
    /// assert_eq!(k2.limit_k(400.0), 3.0);
    /// ```
    #[must_use]
    pub fn limit_k(&self, celsius: f64) -> f64 {
        match self.rule {
            Rule::Larger(fixed, share) => fixed.max(share * celsius.abs()),
            Rule::Above(fixed, from, share) => fixed + share * (celsius - from).max(0.0),
            Rule::Sum(fixed, share) => fixed + share * celsius.abs(),
        }
    }

    /// As it is written: `type K class 2`.
    #[must_use]
    pub fn text(&self) -> String {
        format!("{} class {}", self.instrument, self.class)
    }
}

const fn row(
    instrument: &'static str,
    class: &'static str,
    range_celsius: (f64, f64),
    rule: Rule,
) -> Preset {
    Preset { instrument, class, range_celsius, rule }
}

use Rule::{Above, Larger, Sum};

/// Thermocouples: IEC 60584-1:2013, table 12 (tolerance classes). Resistance thermometers: IEC
/// 60751:2008, table 2, wire-wound. Both from memory.
#[rustfmt::skip]
static PRESETS: [Preset; 24] = [
    row("type B", "2", (600.0, 1700.0), Larger(0.0, 0.0025)),
    row("type B", "3", (600.0, 1700.0), Larger(4.0, 0.005)),
    row("type E", "1", (-40.0, 800.0), Larger(1.5, 0.004)),
    row("type E", "2", (-40.0, 900.0), Larger(2.5, 0.0075)),
    row("type E", "3", (-200.0, 40.0), Larger(2.5, 0.015)),
    row("type J", "1", (-40.0, 750.0), Larger(1.5, 0.004)),
    row("type J", "2", (-40.0, 750.0), Larger(2.5, 0.0075)),
    row("type K", "1", (-40.0, 1000.0), Larger(1.5, 0.004)),
    row("type K", "2", (-40.0, 1200.0), Larger(2.5, 0.0075)),
    row("type K", "3", (-200.0, 40.0), Larger(2.5, 0.015)),
    row("type N", "1", (-40.0, 1000.0), Larger(1.5, 0.004)),
    row("type N", "2", (-40.0, 1200.0), Larger(2.5, 0.0075)),
    row("type N", "3", (-200.0, 40.0), Larger(2.5, 0.015)),
    row("type R", "1", (0.0, 1600.0), Above(1.0, 1100.0, 0.003)),
    row("type R", "2", (0.0, 1600.0), Larger(1.5, 0.0025)),
    row("type S", "1", (0.0, 1600.0), Above(1.0, 1100.0, 0.003)),
    row("type S", "2", (0.0, 1600.0), Larger(1.5, 0.0025)),
    row("type T", "1", (-40.0, 350.0), Larger(0.5, 0.004)),
    row("type T", "2", (-40.0, 350.0), Larger(1.0, 0.0075)),
    row("type T", "3", (-200.0, 40.0), Larger(1.0, 0.015)),
    row("Pt100", "AA", (-50.0, 250.0), Sum(0.1, 0.0017)),
    row("Pt100", "A", (-100.0, 450.0), Sum(0.15, 0.002)),
    row("Pt100", "B", (-196.0, 600.0), Sum(0.3, 0.005)),
    row("Pt100", "C", (-196.0, 600.0), Sum(0.6, 0.01)),
];

/// The class that a text names; capitals, spaces and the word `thermocouple` do not matter.
#[must_use]
pub fn preset(text: &str) -> Option<&'static Preset> {
    let (instrument, class) = parts(text)?;
    let same = |row: &&Preset| {
        row.instrument.eq_ignore_ascii_case(&instrument) && row.class.eq_ignore_ascii_case(&class)
    };
    PRESETS.iter().find(same)
}

/// The classes that there are of the instrument a text names, where it is one that is known.
pub(super) fn classes_of(text: &str) -> Option<(&'static str, String)> {
    let (instrument, _) = parts(text)?;
    let rows = PRESETS.iter().filter(|row| row.instrument.eq_ignore_ascii_case(&instrument));
    let classes: Vec<&str> = rows.clone().map(|row| row.class).collect();
    let name = rows.map(|row| row.instrument).next()?;
    Some((name, classes.join(", ")))
}

/// Splits `type K class 2` or `Pt100 class B` into the instrument and the class.
fn parts(text: &str) -> Option<(String, String)> {
    let words = text.split_whitespace().filter(|word| !word.eq_ignore_ascii_case("thermocouple"));
    let words: Vec<&str> = words.collect();
    match words[..] {
        [kind, letter, class, name] if class.eq_ignore_ascii_case("class") => {
            Some((format!("{kind} {letter}"), name.to_owned()))
        }
        [instrument, class, name] if class.eq_ignore_ascii_case("class") => {
            Some((instrument.to_owned(), name.to_owned()))
        }
        _ => None,
    }
}
