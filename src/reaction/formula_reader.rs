//! The walk through a formula's atoms, groups, counts and additions.

use crate::numeric::Rational;
use crate::problem::Problem;
use crate::problem::ReactionCode;

use super::count::{decimal_text, is_addition, plain_digit};
use super::elements::Element;
use super::limits;
use super::place::{Place, closes, opens};
use super::repair;

type Atoms = Vec<(&'static Element, Rational)>;

/// A group being read: the whole formula, or what stands in a pair of brackets.
struct Group {
    opened: Option<(char, usize)>,
    /// What the parts before the last `·` sum to.
    earlier: Atoms,
    /// The part being read, and what it is multiplied by.
    part: Atoms,
    multiple: Rational,
}

impl Group {
    fn new(opened: Option<(char, usize)>) -> Group {
        Group { opened, earlier: Vec::new(), part: Vec::new(), multiple: Rational::ONE }
    }
}

struct Reader<'a> {
    place: Place<'a>,
    text: &'a str,
    at: usize,
    /// The formula in the spelling it is kept in.
    written: String,
    /// Never empty: the whole formula, then the brackets open at this point.
    groups: Vec<Group>,
}

/// The bracket that closes a group.
pub(super) fn partner(opened: char) -> char {
    match opened {
        '(' => ')',
        '[' => ']',
        _ => '}',
    }
}

fn is_dot(character: char) -> bool {
    matches!(character, '·' | '•' | '∙' | '⋅' | '‧' | '*' | '.')
}

/// Adds a multiple of some atoms; none where a count leaves its limit.
fn add_atoms(sum: &mut Atoms, atoms: &Atoms, multiple: Rational) -> Option<()> {
    for (element, count) in atoms {
        let more = count.times(multiple).ok()?;
        let place = sum.iter().position(|(known, _)| known == element);
        let total = match place {
            Some(place) => sum[place].1.plus(more).ok()?,
            None => more,
        };
        if total > Rational::from(limits::COUNT) {
            return None;
        }
        match place {
            Some(place) => sum[place].1 = total,
            None => sum.push((element, total)),
        }
    }
    Some(())
}

/// Reads a formula without its charge: its kept spelling, and its atoms.
pub(super) fn read_body(place: Place<'_>) -> Result<(String, Atoms), Problem> {
    let text = place.text();
    let mut reader =
        Reader { place, text, at: 0, written: String::new(), groups: vec![Group::new(None)] };
    while let Some(character) = reader.peek() {
        reader.step(character)?;
    }
    let atoms = reader.close_group(text.len())?;
    Ok((reader.written, atoms))
}

impl Reader<'_> {
    fn peek(&self) -> Option<char> {
        self.text[self.at..].chars().next()
    }

    fn step(&mut self, character: char) -> Result<(), Problem> {
        let start = self.at;
        if character.is_ascii_alphabetic() {
            let element = self.symbol()?;
            let count = self.count()?;
            return self.add(vec![(element, Rational::ONE)], count, start);
        }
        if opens(character) {
            self.at += 1;
            self.written.push(character);
            self.groups.push(Group::new(Some((character, start))));
            return Ok(());
        }
        if closes(character) {
            let opened = self.groups.last().and_then(|group| group.opened);
            let matching = opened.filter(|(opened, _)| partner(*opened) == character);
            let Some((_, at)) = matching else {
                return Err(self.here(start, ReactionCode::Bracket));
            };
            let atoms = self.close_group(start)?;
            self.at += 1;
            self.written.push(character);
            let count = self.count()?;
            return self.add(atoms, count, at);
        }
        if is_dot(character) {
            return self.dot();
        }
        if character.is_whitespace() {
            let rest = self.text[start..].trim_start();
            if rest.starts_with(is_dot) {
                self.at = self.text.len() - rest.len();
                return Ok(());
            }
            return Err(self.place.problem(ReactionCode::FormulaSpace));
        }
        Err(self.here(start, ReactionCode::FormulaCharacter))
    }

    /// A symbol: a capital and the small letters after it.
    fn symbol(&mut self) -> Result<&'static Element, Problem> {
        let start = self.at;
        let rest = &self.text[start..];
        let tail = rest.get(1..).unwrap_or("");
        let small = tail.len() - tail.trim_start_matches(|c: char| c.is_ascii_lowercase()).len();
        let symbol = &rest[..1 + small];
        let Some(element) = Element::of(symbol) else {
            let mut near = repair::symbols_like(symbol);
            if near.is_empty() {
                near = ["C", "H", "O"].map(str::to_owned).to_vec();
            }
            let place = self.place.part(start..start + symbol.len());
            return Err(place
                .problem(ReactionCode::ElementUnknown)
                .with("symbol", symbol)
                .with("near", repair::one_of(&near)));
        };
        self.at += symbol.len();
        self.written.push_str(symbol);
        Ok(element)
    }

    /// The count after an atom or a group; one where none is written.
    fn count(&mut self) -> Result<Rational, Problem> {
        let start = self.at;
        let digits = self.digits();
        if digits.is_empty() {
            return Ok(Rational::ONE);
        }
        let mut number = digits.clone();
        let rest = &self.text[self.at..];
        let decimals_follow = rest.chars().nth(1).is_some_and(|c| plain_digit(c).is_some());
        let point = rest.starts_with(',')
            || (rest.starts_with('.') && (digits == "0" || !is_addition(&rest[1..])));
        if point && decimals_follow {
            self.at += 1;
            number.push('.');
            number.push_str(&self.digits());
        } else if number.starts_with('0') {
            return Err(self.place.part(start..self.at).problem(ReactionCode::CountZero));
        }
        let count = self.checked_count(&number, start)?;
        if count != Rational::ONE {
            self.written.push_str(&decimal_text(count));
        }
        Ok(count)
    }

    fn checked_count(&self, number: &str, start: usize) -> Result<Rational, Problem> {
        let place = self.place.part(start..self.at);
        let limit = Rational::from(limits::COUNT);
        match number.parse::<Rational>() {
            Ok(count) if count.is_zero() => Err(place.problem(ReactionCode::CountZero)),
            Ok(count) if count <= limit && count.denominator() <= limit.numerator() => Ok(count),
            _ => Err(place.problem(ReactionCode::CountTooLarge).with("limit", limit.to_string())),
        }
    }

    fn digits(&mut self) -> String {
        let rest = &self.text[self.at..];
        let digits: String = rest.chars().map_while(plain_digit).collect();
        let bytes: usize = rest.chars().take(digits.len()).map(char::len_utf8).sum();
        self.at += bytes;
        digits
    }

    /// `·` and the number of what is added; space may stand around them.
    fn dot(&mut self) -> Result<(), Problem> {
        let start = self.at;
        self.end_part(start)?;
        let length = self.peek().map_or(0, char::len_utf8);
        let rest = self.text[start + length..].trim_start();
        let after = rest.trim_start_matches(Rational::is_written_with);
        let number = &rest[..rest.len() - after.len()];
        self.written.push('·');
        self.at = self.text.len() - after.trim_start().len();
        if number.is_empty() {
            return Ok(());
        }
        let multiple = self.checked_count(number, start)?;
        if multiple != Rational::ONE {
            self.written.push_str(&decimal_text(multiple));
        }
        if let Some(group) = self.groups.last_mut() {
            group.multiple = multiple;
        }
        Ok(())
    }

    /// Adds atoms to the part being read.
    fn add(&mut self, atoms: Atoms, count: Rational, start: usize) -> Result<(), Problem> {
        let summed = match self.groups.last_mut() {
            Some(group) => add_atoms(&mut group.part, &atoms, count),
            None => None,
        };
        summed.ok_or_else(|| {
            let place = self.place.part(start..self.at);
            let limit = limits::COUNT.to_string();
            place.problem(ReactionCode::CountTooLarge).with("limit", limit)
        })
    }

    /// Ends the part before a `·`, a closing bracket or the end.
    fn end_part(&mut self, end: usize) -> Result<(), Problem> {
        let Some(group) = self.groups.last_mut() else { return Ok(()) };
        let part = std::mem::take(&mut group.part);
        let multiple = std::mem::replace(&mut group.multiple, Rational::ONE);
        if part.is_empty() {
            let place = self.place.part(0..end.max(1)).trimmed();
            return Err(place.problem(ReactionCode::PartEmpty));
        }
        let summed = add_atoms(&mut group.earlier, &part, multiple);
        summed.ok_or_else(|| {
            let limit = limits::COUNT.to_string();
            self.place.problem(ReactionCode::CountTooLarge).with("limit", limit)
        })
    }

    fn close_group(&mut self, end: usize) -> Result<Atoms, Problem> {
        self.end_part(end)?;
        Ok(self.groups.pop().map(|group| group.earlier).unwrap_or_default())
    }

    /// A problem with the one character at a byte.
    fn here(&self, at: usize, code: ReactionCode) -> Problem {
        let length = self.text[at..].chars().next().map_or(0, char::len_utf8);
        self.place.part(at..at + length).problem(code)
    }
}
