//! The text of a unit brought to one form, so that a table can find it.

/// Brings look-alike characters together and drops spaces and carets: `kgf / cm²` becomes
/// `kgf/cm2`, `Nm^3` becomes `Nm3`, `lb-mol` becomes `lbmol`.
fn plain(ascii_like: &str) -> String {
    ascii_like.chars().filter(|c| !c.is_whitespace() && *c != '^').collect()
}

/// The two ways a text may be looked up: as it stands, and as numerator over sorted denominators.
pub(super) fn keys(text: &str) -> Vec<String> {
    let text = joined_moles(ascii_like(text));
    let plain = plain(&text);
    match compound(&text) {
        Some(compound) if compound != plain => vec![plain, compound],
        _ => vec![plain],
    }
}

/// `J/(mol·K)`, `J/mol K`, `J/mol-K`, `J mol⁻¹ K⁻¹` and `J/K/mol` are all `J/K/mol`; a text without
/// a denominator, or with two numerators, is no compound.
fn compound(text: &str) -> Option<String> {
    let text = trade_rate(text);
    let mut numerator: Option<String> = None;
    let mut denominators: Vec<String> = Vec::new();
    let mut below = false;
    let mut token = String::new();
    for character in text.chars().filter(|c| *c != '^').chain([' ']) {
        let minus_in_exponent = character == '-' && token.is_empty();
        if minus_in_exponent {
            return None;
        }
        if !(character.is_whitespace() || "/·()*".contains(character)) {
            token.push(character);
            continue;
        }
        for part in split_hyphens(&token) {
            let (name, inverted) = without_inverse(&part);
            if below || inverted {
                let name = standard_name(&name, true);
                let after = denominators.iter().position(|other| *other > name);
                denominators.insert(after.unwrap_or(denominators.len()), name);
            } else if numerator.is_none() {
                numerator = Some(standard_name(&name, false));
            } else {
                return None;
            }
        }
        token.clear();
        below |= character == '/';
    }
    if denominators.is_empty() {
        return None;
    }
    Some(format!("{}/{}", numerator?, denominators.join("/")))
}

/// `mol-K` is two factors; the hyphen of `mol-1` is an exponent's minus.
fn split_hyphens(token: &str) -> Vec<String> {
    let mut parts: Vec<String> = Vec::new();
    for piece in token.split('-') {
        match parts.last_mut() {
            Some(last) if piece.starts_with(|c: char| c.is_ascii_digit()) => {
                last.push('-');
                last.push_str(piece);
            }
            _ if piece.is_empty() => {}
            _ => parts.push(piece.to_owned()),
        }
    }
    parts
}

/// `mol-1` is `mol` below the line, `m-3` is `m3` below the line.
fn without_inverse(token: &str) -> (String, bool) {
    match token.split_once('-') {
        Some((name, "1")) => (name.to_owned(), true),
        Some((name, power)) => (format!("{name}{power}"), true),
        None => (token.to_owned(), false),
    }
}

fn standard_name(name: &str, below: bool) -> String {
    let standard = match name {
        "mole" | "moles" | "mols" | "gmol" | "MOL" if below => "mol",
        "kgmol" | "kmole" => "kmol",
        "lbmole" | "lbmoles" | "LBMOL" => "lbmol",
        "l" | "dm3" | "liter" | "litre" if below => "L",
        "hr" | "hour" | "H" | "HR" if below => "h",
        "sec" if below => "s",
        "day" | "D" if below => "d",
        "MIN" if below => "min",
        "°C" | "degC" | "C" if below => "K",
        "F" | "degF" | "°R" | "R" | "degR" if below => "°F",
        "lbs" | "lbm" => "lb",
        "tonne" => "t",
        other => other,
    };
    standard.to_owned()
}

/// `lb-mol`, `lb mol` and `kg-mol` are one word.
fn joined_moles(text: String) -> String {
    if !text.contains("mol") {
        return text;
    }
    let mut joined = text;
    for pair in ["lb-mol", "lb mol", "lb·mol", "lb.mol", "kg-mol", "g-mol"] {
        if joined.contains(pair) {
            joined = joined.replace(pair, &pair.replace(|c: char| !c.is_ascii_alphabetic(), ""));
        }
    }
    joined
}

/// The trade writes `scfh`, `MMscfd` for `scf/h`, `MMscf/d`.
fn trade_rate(text: &str) -> String {
    for (ending, rate) in [("scfh", "h"), ("scfm", "min"), ("scfd", "d")] {
        let start = text.len().saturating_sub(ending.len());
        if text.get(start..).is_some_and(|end| end.eq_ignore_ascii_case(ending)) {
            return format!("{}/{rate}", &text[..text.len() - 1]);
        }
    }
    text.to_owned()
}

fn ascii_like(text: &str) -> String {
    let mut plain = String::with_capacity(text.len());
    for character in text.trim().chars() {
        match character {
            '²' | '₂' => plain.push('2'),
            '³' => plain.push('3'),
            '¹' => plain.push('1'),
            '⁻' | '−' | '‐' | '‑' | '–' => plain.push('-'),
            'µ' | 'μ' => plain.push('u'),
            'º' | '˚' => plain.push('°'),
            '℃' => plain.push_str("°C"),
            '℉' => plain.push_str("°F"),
            '\u{212a}' => plain.push('K'),
            '⋅' | '∙' | '•' | '×' => plain.push('·'),
            '％' => plain.push('%'),
            '⁄' | '∕' => plain.push('/'),
            other => plain.push(other),
        }
    }
    plain
}
