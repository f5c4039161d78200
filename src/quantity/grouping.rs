//! The digits of a number: which mark is the decimal one, and which only group thousands.

/// The digits of a number with the grouping taken out.
pub(super) struct Split {
    /// Digits before the decimal mark; may be empty (`.5`).
    pub integer: String,
    /// Digits after the decimal mark; may be empty.
    pub fraction: String,
}

impl Split {
    pub fn integer_or_zero(&self) -> &str {
        if self.integer.is_empty() { "0" } else { &self.integer }
    }

    /// Digits from the first that is not zero.
    pub fn significant(&self) -> usize {
        let digits = self.integer.bytes().chain(self.fraction.bytes());
        digits.skip_while(|digit| *digit == b'0').count()
    }
}

/// Why digits and marks are not one number.
pub(super) enum Fault {
    /// Groups of the wrong length, or more than one decimal mark.
    Shape,
    /// One comma before three digits: a decimal comma or a group of thousands.
    Ambiguous { decimal: String, thousands: String },
}

fn is_space(character: char) -> bool {
    // space, no-break, figure, thin, narrow no-break
    matches!(character, ' ' | '\u{a0}' | '\u{2007}' | '\u{2009}' | '\u{202f}')
}

fn is_apostrophe(character: char) -> bool {
    matches!(character, '\'' | '’')
}

/// The bytes of digits, marks, and single spaces or apostrophes between digits, from the start.
pub(super) fn body_length(text: &str) -> usize {
    let mut length = 0;
    let mut after_digit = false;
    let mut characters = text.char_indices().peekable();
    while let Some((at, character)) = characters.next() {
        let before_digit = characters.peek().is_some_and(|(_, next)| next.is_ascii_digit());
        let between = after_digit && before_digit;
        let belongs = character.is_ascii_digit()
            || matches!(character, '.' | ',')
            || (between && (is_space(character) || is_apostrophe(character)));
        if !belongs {
            break;
        }
        after_digit = character.is_ascii_digit();
        length = at + character.len_utf8();
    }
    length
}

/// Tells the decimal mark from grouping.
///
/// With both marks the last one is decimal; one mark twice or more only groups; a single point is
/// decimal; a single comma is decimal unless it stands where it could group thousands as well.
pub(super) fn split(body: &str) -> Result<Split, Fault> {
    let is_mark = |character: char| !character.is_ascii_digit();
    let groups: Vec<&str> = body.split(is_mark).collect();
    let marks: Vec<char> = body.chars().filter(|c| is_mark(*c)).map(plain_mark).collect();
    let points = marks.iter().filter(|mark| **mark == '.').count();
    let commas = marks.iter().filter(|mark| **mark == ',').count();
    let last = marks.iter().rposition(|mark| matches!(mark, '.' | ','));
    let decimal = match (points, commas) {
        (0, 0) => None,
        (1, 0) | (0, 1) => last,
        (_, 0) | (0, _) => None,
        _ => {
            let is_single = |at: usize| (if marks[at] == '.' { points } else { commas }) == 1;
            Some(last.filter(|at| is_single(*at)).ok_or(Fault::Shape)?)
        }
    };
    let cut = decimal.unwrap_or(marks.len());
    let (whole, parts) = groups.split_at(cut + 1);
    let fraction_marks = marks.get(cut + 1..).unwrap_or_default();
    let fits = is_grouped(whole, &marks[..cut])
        && is_fraction(parts, fraction_marks)
        && groups.iter().any(|group| !group.is_empty())
        && !(body.ends_with(','));
    if !fits {
        return Err(Fault::Shape);
    }
    let split = Split { integer: whole.concat(), fraction: parts.concat() };
    let could_group = !split.integer.starts_with('0') && (1..=3).contains(&split.integer.len());
    if body.contains(',') && marks.len() == 1 && could_group && split.fraction.len() == 3 {
        return Err(Fault::Ambiguous {
            decimal: format!("{}.{}", split.integer, split.fraction),
            thousands: format!("{}{}", split.integer, split.fraction),
        });
    }
    Ok(split)
}

fn plain_mark(character: char) -> char {
    match character {
        _ if is_space(character) => ' ',
        _ if is_apostrophe(character) => '\'',
        _ => character,
    }
}

/// One run of digits, or groups of three by one and the same mark.
fn is_grouped(groups: &[&str], marks: &[char]) -> bool {
    let [first, rest @ ..] = groups else { return false };
    if rest.is_empty() {
        return true;
    }
    (1..=3).contains(&first.len())
        && !first.starts_with('0')
        && rest.iter().all(|group| group.len() == 3)
        && marks.windows(2).all(|pair| pair[0] == pair[1])
}

/// One run of digits, or groups of three by spaces, the last of one to three.
fn is_fraction(groups: &[&str], marks: &[char]) -> bool {
    let [most @ .., last] = groups else { return true };
    most.is_empty()
        || (most.iter().all(|group| group.len() == 3)
            && (1..=3).contains(&last.len())
            && marks.iter().all(|mark| *mark == ' '))
}
