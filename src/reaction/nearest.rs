//! The known word that a mistyped one is likely to stand for.

use rapidfuzz::distance::osa::Args;
use rapidfuzz::distance::osa::BatchComparator;

/// The longest text that is compared, in characters: longer ones are no slip of one word.
const LONGEST: usize = 80;

/// The candidate nearest to a text: one that differs in capitals only, else the one at the least
/// distance, where one slip (a character put in, left out, replaced, or two neighbours swapped)
/// counts one and at most a third of the characters, and three at most, may be slips.
///
/// Of several equally near ones the first wins.
///
/// ```
/// use shiftgauge::reaction::nearest;
/// assert_eq!(nearest("methnaol", ["ethanol", "methanol"].into_iter()).as_deref(), Some("methanol"));
/// assert_eq!(nearest("co2", ["CO", "CO2"].into_iter()).as_deref(), Some("CO2"));
/// assert_eq!(nearest("xenon", ["CO", "CO2"].into_iter()), None);
/// ```
pub fn nearest<'a>(text: &str, candidates: impl Iterator<Item = &'a str>) -> Option<String> {
    let typed: Vec<char> = folded(text.trim()).collect();
    if typed.is_empty() || typed.len() > LONGEST {
        return None;
    }
    let mut allowed = (typed.len() / 3).min(3);
    let slips_to = BatchComparator::new(typed.iter().copied());
    let mut best: Option<&str> = None;
    for candidate in candidates {
        // No character has fewer bytes than one: a longer word in characters is longer in bytes.
        if candidate.len() + allowed < typed.len() {
            continue;
        }
        let cutoff = Args::default().score_cutoff(allowed);
        let Some(slips) = slips_to.distance_with_args(folded(candidate), &cutoff) else { continue };
        best = Some(candidate);
        if slips == 0 {
            break;
        }
        allowed = slips - 1;
    }
    best.map(ToOwned::to_owned)
}

fn folded(text: &str) -> impl DoubleEndedIterator<Item = char> + Clone {
    text.chars().map(|c| c.to_ascii_lowercase())
}
