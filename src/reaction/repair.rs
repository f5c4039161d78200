//! What a formula that cannot be read is likely to stand for.

use super::elements::Element;
use crate::numeric::sort_short;

/// The likeliest spellings, at most two, of a formula whose letters have the wrong size or whose
/// O is typed as a zero: `co2` gives `CO2` and `Co2`, `CL2` gives `Cl2`, `C02` gives `CO2`.
///
/// Every letter is taken as one of an element's symbol, whichever size it has; common elements
/// come before rare ones.
pub(super) fn spellings(text: &str) -> Vec<String> {
    let letters: Vec<char> = text.chars().collect();
    let mut best: Vec<Vec<(u32, String)>> = vec![Vec::new(); letters.len() + 1];
    best[0].push((0, String::new()));
    for at in 0..letters.len() {
        let reached = std::mem::take(&mut best[at]);
        let mut go = |to: usize, cost: u32, piece: &str| {
            let longer = reached.iter().map(|(sum, text)| (sum + cost, format!("{text}{piece}")));
            best[to].extend(longer);
            sort_short(&mut best[to], |before, item| before > item);
            best[to].dedup();
            best[to].truncate(2);
        };
        if is_letter_o(&letters, at) {
            go(at + 1, 1, "O");
        } else if !letters[at].is_ascii_alphabetic() {
            go(at + 1, 0, &letters[at].to_string());
        } else {
            for length in 1..=2 {
                let symbol = letters.get(at..at + length).and_then(symbol);
                if let Some(element) = symbol.as_deref().and_then(Element::of) {
                    go(at + length, element.rarity(), element.symbol);
                }
            }
        }
    }
    best.pop().unwrap_or_default().into_iter().map(|(_, text)| text).collect()
}

/// Whether the zero at this place can be no count: it begins a number after an atom or a group,
/// and no decimals follow.
fn is_letter_o(letters: &[char], at: usize) -> bool {
    let before = at.checked_sub(1).and_then(|before| letters.get(before));
    let counts = before.is_some_and(|c| c.is_ascii_alphabetic() || matches!(c, ')' | ']' | '}'));
    let decimals = matches!(letters.get(at + 1), Some('.' | ','));
    letters[at] == '0' && counts && !decimals
}

fn symbol(letters: &[char]) -> Option<String> {
    let all = letters.iter().all(char::is_ascii_alphabetic);
    let mut symbol: String = letters.iter().collect::<String>().to_ascii_lowercase();
    symbol.get_mut(0..1)?.make_ascii_uppercase();
    all.then_some(symbol)
}

/// The symbols that a wrong one may stand for: those with its first letter, common ones first.
pub(super) fn symbols_like(wrong: &str) -> Vec<String> {
    let first = wrong.chars().next().map(|c| c.to_ascii_uppercase());
    let mut like: Vec<&Element> =
        Element::all().filter(|element| element.symbol.chars().next() == first).collect();
    let rank = |element: &Element| (element.symbol.len() != wrong.len(), element.rarity());
    sort_short(&mut like, |before, item| rank(before) > rank(item));
    like.iter().take(3).map(|element| element.symbol.to_owned()).collect()
}

/// Joins suggestions: `A`, `A or B`, `A, B or C`.
pub(super) fn one_of(words: &[String]) -> String {
    match words {
        [] => String::new(),
        [only] => only.clone(),
        [first @ .., last] => format!("{} or {last}", first.join(", ")),
    }
}

/// The formula meant where a zero inside a count stands for O, as in `Fe203` or `H20`.
///
/// Only counts no such atom has are taken for a slip: hydrogen by itself twenty times, and a
/// hundred or more of an element that is not one of C, H, N and O in a long formula.
pub(super) fn letter_for_zero(text: &str) -> Option<String> {
    if text == "H20" {
        return Some("H2O".to_owned());
    }
    let bytes = text.as_bytes();
    let digit = |at: usize| bytes.get(at).is_some_and(u8::is_ascii_digit);
    for at in 1..bytes.len() {
        let letter = bytes[at - 1].is_ascii_alphabetic();
        let count = bytes.get(at..at + 3).unwrap_or(b"");
        let inside = matches!(count, [b'1'..=b'9', b'0', b'1'..=b'9']);
        if !letter || !inside || digit(at + 3) || matches!(bytes.get(at + 3), Some(b'.' | b',')) {
            continue;
        }
        let start = text[..at].rfind(|c: char| c.is_ascii_uppercase()).unwrap_or(0);
        let symbol = &text[start..at];
        let alone = start == 0 && at + 3 == bytes.len() && !matches!(symbol, "C" | "H");
        if alone || !matches!(symbol, "C" | "H" | "N" | "O") {
            return Some(format!("{}O{}", &text[..=at], &text[at + 2..]));
        }
    }
    None
}
