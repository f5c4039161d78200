//! Finding a species while its name is being typed.

use std::borrow::Cow;

use super::book::Book;
use super::known::Known;
use super::table;
use super::temperature::Temperature;
use super::usual::likely;
use crate::reaction::Phase;
use crate::reaction::Species;
use crate::reaction::nearest;
use crate::reaction::parse_formula;
use crate::reaction::parse_species;

/// By what a record was found; the better ways come first.
#[derive(Debug, Clone, Copy, PartialEq, Eq, PartialOrd, Ord)]
pub enum FoundBy {
    /// Its formula is spelled so.
    Formula,
    /// Its formula has the same atoms and charge in another order.
    Atoms,
    /// A name, the CAS number, or the formula but for capitals is the text.
    Name,
    /// Its formula begins so.
    FormulaStart,
    /// A name, or the CAS number, begins so.
    NameStart,
    /// A later word of a name begins so.
    Word,
    /// A name holds the text.
    Within,
    /// A name or the formula is a slip or two away.
    Near,
}

impl FoundBy {
    /// All ways, the best first.
    pub const ALL: [FoundBy; 8] = [
        FoundBy::Formula,
        FoundBy::Atoms,
        FoundBy::Name,
        FoundBy::FormulaStart,
        FoundBy::NameStart,
        FoundBy::Word,
        FoundBy::Within,
        FoundBy::Near,
    ];
}

/// A record that was found.
#[derive(Debug, Clone, PartialEq)]
pub struct Found {
    /// The record.
    pub record: Known,
    /// By what.
    pub by: FoundBy,
}

/// Fewer letters are not looked for inside names.
const LETTERS_WITHIN: usize = 3;
/// Fewer letters are not taken for a slip.
const LETTERS_NEAR: usize = 4;

/// A way to find, and whether a name is found so.
type Way<'a> = (FoundBy, &'a dyn Fn(&str) -> bool);

/// What was typed.
struct Typed<'a> {
    text: &'a str,
    species: Option<Species>,
    /// Its atoms in Hill's order, with the charge.
    hill: String,
}

/// What a record is found by.
struct Card<'a> {
    formula: &'a str,
    phase: Phase,
    form: &'a str,
    names: Cow<'a, str>,
    cas: &'a str,
    /// The atoms in Hill's order, with the charge.
    hill: Cow<'a, str>,
}

impl Book {
    /// The records that a text may mean, the likeliest first, at most so many: by formula (with its
    /// phase and form if they are written), atoms in any order, name, CAS number, their beginnings,
    /// words inside names; where nothing fits, near misses. In each group dissolved species are last
    /// and the user's own first.
    ///
    /// ```
    /// use shiftgauge::library::Book;
    /// let first = |text| Book::default().search(text, 8)[0].record.id.to_string();
    /// assert_eq!(first("NH3"), "NH3.g");
    /// assert_eq!(first("H3N"), "NH3.g"); // atoms in any order
    /// assert_eq!(first("7664-41-7"), "NH3.g"); // CAS number
    /// assert_eq!(first("quickl"), "CaO.s");
    /// assert_eq!(first("amonia"), "NH3.g"); // a slip
    /// ```
    #[must_use]
    pub fn search(&self, text: &str, most: usize) -> Vec<Found> {
        let text = text.trim();
        if text.is_empty() {
            return Vec::new();
        }
        let species = parse_species(text).ok();
        let hill = species.as_ref().map(|species| species.formula.hill()).unwrap_or_default();
        let typed = Typed { text, species, hill };
        let mut groups: Vec<Vec<Place>> = vec![Vec::new(); FoundBy::ALL.len()];
        self.each_card(|place, card| {
            if let Some((by, letters)) = typed.rank(card) {
                groups[by as usize].push(Place { letters, ..place });
            }
        });
        if groups.iter().all(Vec::is_empty) {
            groups[FoundBy::Near as usize] = self.near(text);
        }
        let ordered = FoundBy::ALL.into_iter().zip(groups).flat_map(|(by, mut group)| {
            // Short names before long ones; what is dissolved, and hot vapours, last.
            group.sort_by_cached_key(|place| (self.is_unusual(*place), place.letters));
            group.into_iter().map(move |place| (by, place))
        });
        let record =
            |(by, place): (FoundBy, Place)| Some(Found { record: self.record(place)?, by });
        ordered.take(most).filter_map(record).collect()
    }

    fn record(&self, place: Place) -> Option<Known> {
        match place.own {
            Some(own) => Some(self.own()[own].clone()),
            None => Some(Known::Table(table::entries()[place.entry].record()?)),
        }
    }

    /// How far down a record belongs among equals: 0, 1 for a vapour that room temperature knows as a
    /// solid or a liquid only, 2 for what is dissolved.
    fn is_unusual(&self, place: Place) -> u8 {
        match place.phase {
            Phase::Aqueous => 2,
            Phase::Liquid | Phase::Solid => 0,
            Phase::Gas => {
                let Some(record) = self.record(place) else { return 0 };
                let all = self.find(&record.formula, None, record.form.as_deref());
                u8::from(!likely(all, Temperature::standard()).contains(&record))
            }
        }
    }

    /// Shows every record's card: the user's own, then those of the tables that none stands for.
    fn each_card(&self, mut see: impl FnMut(Place, &Card)) {
        for (own, record) in self.own().iter().enumerate() {
            let card = Card {
                formula: &record.formula,
                phase: record.phase,
                form: record.form.as_deref().unwrap_or_default(),
                names: Cow::Owned(record.names.join(";")),
                cas: &record.cas,
                hill: parse_formula(&record.formula)
                    .map_or(Cow::Borrowed(""), |known| known.hill().into()),
            };
            see(Place { own: Some(own), entry: 0, phase: record.phase, letters: 0 }, &card);
        }
        for (entry, line) in table::entries().iter().enumerate() {
            let Some([phase, form, names, cas, hill]) = line.cells() else { continue };
            let Some(phase) = Phase::from_symbol(phase) else { continue };
            if !self.own().is_empty() && line.record().is_none_or(|record| self.replaces(record)) {
                continue;
            }
            let (names, hill) = (Cow::Borrowed(names), Cow::Borrowed(hill));
            let card = Card { formula: line.formula, phase, form, names, cas, hill };
            see(Place { own: None, entry, phase, letters: 0 }, &card);
        }
    }

    /// The records whose name or formula is nearest to a text, where it is near at all.
    fn near(&self, text: &str) -> Vec<Place> {
        if text.chars().count() < LETTERS_NEAR {
            return Vec::new();
        }
        let names = self.own().iter().flat_map(|record| {
            record.names.iter().map(AsRef::as_ref).chain([record.formula.as_ref()])
        });
        let lines =
            table::entries().iter().filter_map(|line| Some((line.formula, line.cells()?[2])));
        let known = lines.flat_map(|(formula, names)| names.split(';').chain([formula]));
        let Some(best) = nearest(text, names.chain(known)) else { return Vec::new() };
        let mut places = Vec::new();
        self.each_card(|place, card| {
            if card.formula == best || card.names.split(';').any(|name| name == best) {
                places.push(place);
            }
        });
        places
    }
}

/// Where a record is: among the user's own, or in the table.
#[derive(Debug, Clone, Copy)]
struct Place {
    own: Option<usize>,
    entry: usize,
    phase: Phase,
    /// How long the word is that the text was found in.
    letters: usize,
}

impl Typed<'_> {
    /// By what a record is found, if it is, and how long the word is that it was found in; never by
    /// [`FoundBy::Near`].
    fn rank(&self, card: &Card) -> Option<(FoundBy, usize)> {
        if let Some(species) = &self.species {
            let form = species.form.as_deref();
            let fits = species.phase.is_none_or(|phase| phase == card.phase)
                && form.is_none_or(|form| form == card.form);
            if fits && species.formula.text() == card.formula {
                return Some((FoundBy::Formula, card.form.len()));
            }
            if fits && self.hill == card.hill {
                return Some((FoundBy::Atoms, card.form.len()));
            }
        }
        let is_text = |word: &str| word.eq_ignore_ascii_case(self.text);
        if card.names.split(';').any(is_text) || is_text(card.cas) || is_text(card.formula) {
            return Some((FoundBy::Name, 0));
        }
        if self.text.chars().count() < 2 {
            return None;
        }
        if card.formula.starts_with(self.text) {
            return Some((FoundBy::FormulaStart, card.formula.len()));
        }
        let shortest = |fits: &dyn Fn(&str) -> bool| {
            card.names.split(';').filter(|name| fits(name)).map(str::len).min()
        };
        if starts(card.cas, self.text) {
            return Some((FoundBy::NameStart, 0));
        }
        let later = |name: &str| name.split([' ', '-', '(']).any(|word| starts(word, self.text));
        let ways: [Way; 3] = [
            (FoundBy::NameStart, &|name| starts(name, self.text)),
            (FoundBy::Word, &later),
            (FoundBy::Within, &|name| holds(name, self.text)),
        ];
        ways.into_iter().find_map(|(by, fits)| Some((by, shortest(fits)?)))
    }
}

fn starts(word: &str, text: &str) -> bool {
    word.get(..text.len()).is_some_and(|start| start.eq_ignore_ascii_case(text))
}

/// Whether a name holds a text of some letters, but for capitals.
fn holds(name: &str, text: &str) -> bool {
    let long = text.chars().count() >= LETTERS_WITHIN;
    long && name.char_indices().any(|(place, _)| starts(&name[place..], text))
}
