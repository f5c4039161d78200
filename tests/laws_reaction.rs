//! Laws that hold for every formula and equation, on seeded random input.

use shiftgauge::problem::words::{Language, say};
use shiftgauge::problem::{Outcome, Problem};
use shiftgauge::reaction::{Equation, balance, nearest, parse_equation, parse_species};

/// A xorshift generator, so that every run sees the same input.
struct Random(u64);

impl Random {
    fn below(&mut self, limit: usize) -> usize {
        self.0 ^= self.0 << 13;
        self.0 ^= self.0 >> 7;
        self.0 ^= self.0 << 17;
        usize::try_from(self.0 >> 11).unwrap() % limit
    }

    fn pick<'a, T: ?Sized>(&mut self, from: &[&'a T]) -> &'a T {
        from[self.below(from.len())]
    }
}

const PIECES: [&str; 64] = [
    "H",
    "O",
    "C",
    "N",
    "S",
    "Cl",
    "Na",
    "Fe",
    "Ca",
    "D",
    "e",
    "2",
    "3",
    "10",
    "0",
    "0.5",
    "1/2",
    "½",
    ",",
    ".",
    "·",
    "*",
    "(",
    ")",
    "[",
    "]",
    "{",
    "}",
    "+",
    "-",
    "^",
    "2-",
    "^2-",
    "²⁻",
    "⁺",
    "₂",
    " ",
    "  ",
    "=",
    "->",
    "-->",
    "⇌",
    "<=>",
    "→",
    "(g)",
    "(s)",
    "(l)",
    "(aq)",
    "(s, graphite)",
    "(gas)",
    "(2-)",
    "H2O",
    "CO2",
    "SO4",
    "OH-",
    "H+",
    "𝛼",
    "é",
    "\u{0}",
    "\t",
    "/",
    "Ma",
    "999999",
    "99999999999999999999999999999999999999999",
];

const EXAMPLES: [&str; 16] = [
    "2 SO2(g) + O2(g) = 2 SO3(g)",
    "N2(g)+3H2(g)<=>2NH3(g)",
    "CO + H2O = CO2 + H2",
    "CH4 + H2O = CO + H2",
    "CaCO3(s, calcite) = CaO(s) + CO2(g)",
    "CuSO4·5H2O(s) = CuSO4(s) + H2O(g)",
    "MnO4^- + Fe^2+ + H+ = Mn^2+ + Fe^3+ + H2O",
    "H+(aq)+OH-(aq)=H2O(l)",
    "H2 + D2 = HD",
    "Fe0.947O + O2 = Fe2O3",
    "C(s, graphite) + CO2 = 2 CO",
    "SO2 + ½ O2 = SO3",
    "K4[Fe(CN)6] + H2SO4 + H2O = K2SO4 + FeSO4 + (NH4)2SO4 + CO",
    "FeTiO3 + C + Cl2 = TiCl4 + FeCl3 + CO",
    "Al + OH- + H2O = Al(OH)4^- + H2",
    "Ca5(PO4)3F + H2SO4 + H2O = H3PO4 + CaSO4·2H2O + HF",
];

/// Text made of likely pieces, or an example with some of its characters changed.
fn random_text(random: &mut Random) -> String {
    if random.below(2) == 0 {
        return (0..random.below(14)).map(|_| random.pick(&PIECES)).collect();
    }
    let mut characters: Vec<char> = random.pick(&EXAMPLES).chars().collect();
    for _ in 0..=random.below(4) {
        let at = random.below(characters.len().max(1));
        match random.below(4) {
            0 if at < characters.len() => drop(characters.remove(at)),
            1 if at + 1 < characters.len() => characters.swap(at, at + 1),
            _ => {
                let piece: Vec<char> = random.pick(&PIECES).chars().collect();
                characters.splice(at..at, piece);
            }
        }
    }
    characters.into_iter().collect()
}

fn check_problems<T>(text: &str, outcome: &Outcome<T>) {
    let Err(problems) = outcome else { return };
    assert!(!problems.is_empty(), "{text:?}: no problem and no result");
    let units = text.encode_utf16().count();
    for problem in problems {
        check_problem(text, units, problem);
    }
}

fn check_problem(text: &str, units: usize, problem: &Problem) {
    let span = problem.span.unwrap_or_else(|| panic!("{text:?}: {problem:?} has no span"));
    assert!(span.start <= span.end && span.end <= units, "{text:?}: {problem:?}");
    let sentence = say(problem, Language::En);
    assert!(sentence.hint.ends_with('.'), "{text:?}: {sentence:?}");
    let holes = sentence.message.contains('{') || sentence.hint.contains('{');
    assert!(!holes || text.contains('{'), "{text:?}: {sentence:?}");
}

/// Terms without their spans, which depend on the spelling.
fn terms(equation: &Equation) -> Vec<(String, String)> {
    equation.terms.iter().map(|term| (term.species.text(), term.nu.to_string())).collect()
}

fn sorted_terms(equation: &Equation) -> Vec<(String, String)> {
    let mut all = terms(equation);
    all.sort();
    all
}

#[test]
fn no_text_panics_and_what_is_shown_reads_the_same() {
    let mut random = Random(0x5DEE_CE66_D1CE_4E5B);
    let (mut read, mut refused) = (0, 0);
    for _ in 0..100_000 {
        let text = random_text(&mut random);
        let outcome = balance(&text);
        check_problems(&text, &outcome);
        match outcome {
            Ok(found) => {
                read += 1;
                let shown = found.equation.text();
                let again = balance(&shown).unwrap_or_else(|p| panic!("{text:?}: {shown}: {p:?}"));
                assert_eq!(terms(&again.equation), terms(&found.equation), "{text:?}: {shown}");
                assert!(again.already_balanced, "{text:?}: {shown}");
            }
            Err(_) => refused += 1,
        }
    }
    assert!(read > 2_000 && refused > 2_000, "{read} read, {refused} refused");
}

#[test]
fn a_species_shown_reads_as_the_same_species() {
    let mut random = Random(0x0123_4567_89AB_CDEF);
    let mut read = 0;
    for _ in 0..50_000 {
        let text: String = (0..1 + random.below(6)).map(|_| random.pick(&PIECES)).collect();
        let outcome = parse_species(&text);
        check_problems(&text, &outcome);
        if let Ok(species) = outcome {
            read += 1;
            let shown = species.text();
            assert_eq!(parse_species(&shown), Ok(species), "{text:?}: {shown}");
        }
    }
    assert!(read > 2_000, "only {read} were read");
}

#[test]
fn a_suggested_spelling_can_be_read() {
    let mut random = Random(0xFEED_F00D_DEAD_BEEF);
    let letters = ["c", "o", "h", "n", "a", "l", "C", "L", "N", "A", "S", "0", "2", "3", "(", ")"];
    let mut suggested = 0;
    for _ in 0..20_000 {
        let text: String = (0..1 + random.below(6)).map(|_| random.pick(&letters)).collect();
        for problem in parse_species(&text).err().unwrap_or_default() {
            let code = problem.code.as_str();
            if code != "formula-capitals" && code != "count-zero-for-letter" {
                continue;
            }
            let row = problem.arguments.iter().find(|(name, _)| *name == "suggestion").unwrap();
            for spelling in row.1.split(" or ") {
                suggested += 1;
                assert!(parse_species(spelling).is_ok(), "{text}: {spelling}");
            }
        }
    }
    assert!(suggested > 1_000, "only {suggested}");
}

#[test]
fn the_order_of_terms_and_of_sides_does_not_matter() {
    let mut random = Random(0x2545_F491_4F6C_DD1D);
    for text in EXAMPLES {
        let expected = parse_equation(text).unwrap();
        let (left, right): (Vec<_>, Vec<_>) =
            expected.terms.iter().partition(|term| term.nu.is_negative());
        let names = |terms: &[&shiftgauge::reaction::Term]| {
            terms.iter().map(|term| term.species.text()).collect::<Vec<_>>()
        };
        let (mut left, mut right) = (names(&left), names(&right));
        let whole = balance(&format!("{} = {}", left.join(" + "), right.join(" + "))).unwrap();
        for _ in 0..20 {
            for side in [&mut left, &mut right] {
                let (a, b) = (random.below(side.len()), random.below(side.len()));
                side.swap(a, b);
            }
            let (l, r) = (left.join(" + "), right.join(" + "));
            let shuffled = parse_equation(&format!("{l} = {r}")).unwrap();
            assert_eq!(sorted_terms(&shuffled), sorted_terms(&whole.equation), "{l} = {r}");
            let turned = parse_equation(&format!("{r} = {l}")).unwrap();
            let factor = turned.multiple_of(&whole.equation).map(|factor| factor.to_string());
            assert_eq!(factor.as_deref(), Some("-1"), "{r} = {l}");
        }
    }
}

/// Mass is conserved to rounding: each product and sum of the largest 16 terms is within 1 ulp.
#[test]
fn a_balanced_equation_conserves_mass() {
    for text in EXAMPLES {
        let equation = parse_equation(text).unwrap();
        let (mut sum_kg, mut size_kg) = (0.0, 0.0);
        for term in &equation.terms {
            let molar_mass_kg = term.species.formula.molar_mass_kg_per_mol().unwrap();
            sum_kg += term.nu.to_f64() * molar_mass_kg;
            size_kg += term.nu.to_f64().abs() * molar_mass_kg;
        }
        assert!(sum_kg.abs() <= 16.0 * f64::EPSILON * size_kg, "{text}: {sum_kg}");
    }
}

#[test]
fn the_nearest_word_is_near() {
    let words = ["methane", "methanol", "ethanol", "CO2", "CO", "graphite", "calcite"];
    let rows = [
        ("Methane", Some("methane")),
        ("methnaol", Some("methanol")),
        ("graphit", Some("graphite")),
        ("clacite", Some("calcite")),
        ("co2", Some("CO2")),
        ("co", Some("CO")),
        ("", None),
        ("xx", None),
        ("sulfur", None),
    ];
    for (text, expected) in rows {
        assert_eq!(nearest(text, words.into_iter()).as_deref(), expected, "{text}");
    }
    assert_eq!(nearest(&"a".repeat(10_000), words.into_iter()), None);
}
