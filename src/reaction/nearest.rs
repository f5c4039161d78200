//! The known word that a mistyped one is likely to stand for.

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
    let typed = folded(text.trim());
    if typed.is_empty() || typed.len() > LONGEST {
        return None;
    }
    let allowed = (typed.len() / 3).min(3);
    let mut best: Option<(usize, &str)> = None;
    for candidate in candidates {
        let known = folded(candidate);
        if known.len().abs_diff(typed.len()) > allowed {
            continue;
        }
        let slips = distance(&typed, &known);
        let nearer = match best {
            Some((least, _)) => slips < least,
            None => true,
        };
        if slips <= allowed && nearer {
            best = Some((slips, candidate));
        }
    }
    best.map(|(_, candidate)| candidate.to_owned())
}

fn folded(text: &str) -> Vec<char> {
    text.chars().map(|c| c.to_ascii_lowercase()).collect()
}

/// The optimal string alignment distance.
fn distance(left: &[char], right: &[char]) -> usize {
    let mut before_last: Vec<usize> = Vec::new();
    let mut last: Vec<usize> = (0..=right.len()).collect();
    for (row, &a) in left.iter().enumerate() {
        let mut now = vec![row + 1];
        for (column, &b) in right.iter().enumerate() {
            let mut least =
                (last[column] + usize::from(a != b)).min(last[column + 1] + 1).min(now[column] + 1);
            let swapped =
                row > 0 && column > 0 && a != b && a == right[column - 1] && left[row - 1] == b;
            if swapped {
                least = least.min(before_last[column - 1] + 1);
            }
            now.push(least);
        }
        before_last = std::mem::replace(&mut last, now);
    }
    last[right.len()]
}
