//! Equations: how they divide, what is read, and what each mistake gets.

use shiftgauge::problem::words::{Language, say};
use shiftgauge::problem::{Problem, ReactionCode, Span};
use shiftgauge::reaction::{balance, parse_equation};

#[test]
fn equations_are_read_to_one_spelling() {
    let rows = [
        // Signs between the sides.
        ("CO + H2O = CO2 + H2", "CO + H2O = CO2 + H2"),
        ("CO + H2O ⇌ CO2 + H2", "CO + H2O = CO2 + H2"),
        ("CO + H2O → CO2 + H2", "CO + H2O = CO2 + H2"),
        ("CO + H2O ⟶ CO2 + H2", "CO + H2O = CO2 + H2"),
        ("CO + H2O -> CO2 + H2", "CO + H2O = CO2 + H2"),
        ("CO + H2O --> CO2 + H2", "CO + H2O = CO2 + H2"),
        ("CO + H2O <-> CO2 + H2", "CO + H2O = CO2 + H2"),
        ("CO + H2O <=> CO2 + H2", "CO + H2O = CO2 + H2"),
        ("CO + H2O => CO2 + H2", "CO + H2O = CO2 + H2"),
        // Without spaces, and with uneven ones.
        ("CO+H2O=CO2+H2", "CO + H2O = CO2 + H2"),
        ("CO+H2O->CO2+H2", "CO + H2O = CO2 + H2"),
        ("CO +H2O= CO2+ H2", "CO + H2O = CO2 + H2"),
        ("CO+2H2=CH3OH", "CO + 2 H2 = CH3OH"),
        ("CO+2 H2=CH3OH", "CO + 2 H2 = CH3OH"),
        ("H2+½O2=H2O", "H2 + 1/2 O2 = H2O"),
        // The plus of a charge and the plus between species.
        ("H+ + OH- = H2O", "H^+ + OH^- = H2O"),
        ("H++OH-=H2O", "H^+ + OH^- = H2O"),
        ("H+(aq)+OH-(aq)=H2O(l)", "H^+(aq) + OH^-(aq) = H2O(l)"),
        ("H+ (aq) + OH- (aq) = H2O (l)", "H^+(aq) + OH^-(aq) = H2O(l)"),
        ("H⁺+OH⁻=H2O", "H^+ + OH^- = H2O"),
        ("H(+)+OH(-)=H2O", "H^+ + OH^- = H2O"),
        ("Na+ + Cl- = NaCl(s)", "Na^+ + Cl^- = NaCl(s)"),
        ("Na+(aq)+Cl-(aq)=NaCl(s)", "Na^+(aq) + Cl^-(aq) = NaCl(s)"),
        ("H2O=H++OH-", "H2O = H^+ + OH^-"),
        ("H2O = OH- + H+", "H2O = OH^- + H^+"),
        ("H+ + OH-->H2O", "H^+ + OH^- = H2O"),
        ("Ca^2++SO4^2-=CaSO4(s)", "Ca^2+ + SO4^2- = CaSO4(s)"),
        ("Ca^2+ + 2OH- = Ca(OH)2", "Ca^2+ + 2 OH^- = Ca(OH)2"),
        ("Ca+++SO4--=CaSO4", "Ca^2+ + SO4^2- = CaSO4"),
        ("Ag⁺ + Cl⁻ = AgCl", "Ag^+ + Cl^- = AgCl"),
        ("NH4++(CH3)2NH=NH3+(CH3)2NH2^+", "NH4^+ + (CH3)2NH = NH3 + (CH3)2NH2^+"),
        // Coefficients.
        ("SO2 + 0.5 O2 = SO3", "SO2 + 1/2 O2 = SO3"),
        ("SO2 + 0,5 O2 = SO3", "SO2 + 1/2 O2 = SO3"),
        ("SO2 + .5 O2 = SO3", "SO2 + 1/2 O2 = SO3"),
        ("SO2 + ½ O2 = SO3", "SO2 + 1/2 O2 = SO3"),
        ("SO2 + 1/2O2 = SO3", "SO2 + 1/2 O2 = SO3"),
        ("SO2 + (1/2) O2 = SO3", "SO2 + 1/2 O2 = SO3"),
        ("NH3 + 1 1/4 O2 = NO + 1½ H2O", "NH3 + 5/4 O2 = NO + 3/2 H2O"),
        ("2*H2 + O2 = 2·H2O", "2 H2 + O2 = 2 H2O"),
        ("4 NH3 + 5 O2 = 4 NO + 6 H2O", "4 NH3 + 5 O2 = 4 NO + 6 H2O"),
        ("2CuSO4·5H2O = 2CuSO4 + 10H2O", "2 CuSO4·5H2O = 2 CuSO4 + 10 H2O"),
        ("6 H2 + 3 O2 = 6 H2O", "6 H2 + 3 O2 = 6 H2O"),
        // Phases and forms tell species apart.
        ("H2O(l) = H2O(g)", "H2O(l) = H2O(g)"),
        ("C(s, diamond) = C(s, graphite)", "C(s, diamond) = C(s, graphite)"),
        ("CaCO3(s, calcite)=CaO(s)+CO2(g)", "CaCO3(s, calcite) = CaO(s) + CO2(g)"),
        // Written twice, or on both sides.
        ("H2 + H2 + O2 = H2O + H2O", "2 H2 + O2 = 2 H2O"),
        ("CO + H2O + N2 = CO2 + H2 + N2", "CO + H2O = CO2 + H2"),
        ("CO + 3 H2O = CO2 + H2 + 2 H2O", "CO + H2O = CO2 + H2"),
        ("CO + 2 H2O + H2 = CO2 + 2 H2 + H2O", "CO + H2O = H2 + CO2"),
    ];
    for (text, expected) in rows {
        let equation = parse_equation(text).unwrap_or_else(|found| panic!("{text}: {found:?}"));
        assert_eq!(equation.text(), expected, "{text}");
    }
}

#[test]
fn what_stands_on_both_sides_is_named() {
    let equation = parse_equation("CO + 3 H2O + Ar = CO2 + H2 + 2 H2O + Ar").unwrap();
    let netted: Vec<String> = equation.netted.iter().map(|species| species.text()).collect();
    assert_eq!(netted, ["H2O", "Ar"]);
}

#[test]
fn terms_are_signed_and_know_their_place() {
    let equation = parse_equation(" 2 SO₂ + O2 = 2 SO3").unwrap();
    let terms: Vec<(String, String, usize, usize)> = equation
        .terms
        .iter()
        .map(|t| (t.species.text(), t.nu.to_string(), t.span.start, t.span.end))
        .collect();
    let row = |name: &str, nu: &str, start, end| (name.to_owned(), nu.to_owned(), start, end);
    assert_eq!(terms, [row("SO2", "-2", 1, 6), row("O2", "-1", 9, 11), row("SO3", "2", 14, 19)]);
}

#[test]
fn each_mistake_has_its_code() {
    let rows: [(&str, &[&str]); 33] = [
        ("", &["equation-empty"]),
        ("  ", &["equation-empty"]),
        ("CO + H2O", &["equation-without-sign"]),
        ("H2 <- H", &["equation-without-sign", "formula-space"]),
        ("A = B = C", &["equation-many-signs", "element-unknown"]),
        ("CH2=CH2 + H2 = C2H6", &["equation-many-signs"]),
        ("= CO2", &["equation-left-empty"]),
        ("CO2 =", &["equation-right-empty"]),
        ("=", &["equation-left-empty", "equation-right-empty"]),
        ("CO + = CO2", &["term-empty"]),
        ("+ CO = CO2", &["term-empty"]),
        ("CO + + O2 = CO2", &["term-empty"]),
        ("0 CO + O2 = CO2", &["coefficient-zero"]),
        ("1/0 CO + O2 = CO2", &["coefficient-not-a-number"]),
        ("1..5 CO + O2 = CO2", &["coefficient-not-a-number"]),
        ("2 2 CO + O2 = CO2", &["coefficient-not-a-number"]),
        ("99999999999 CO + O2 = CO2", &["coefficient-too-large"]),
        ("0.00000000001 CO + O2 = CO2", &["coefficient-too-large"]),
        ("2 + O2 = CO2", &["coefficient-alone"]),
        ("Ca+2 + SO4^2- = CaSO4", &["coefficient-alone"]),
        ("Ca2+ + SO42- = CaSO4", &["charge-ambiguous", "charge-ambiguous"]),
        ("H2 - O2 = H2O", &["formula-space"]),
        ("H2 O2 = H2O", &["formula-space"]),
        ("co + CL2 = COCl2", &["formula-capitals", "formula-capitals"]),
        ("Fe^3+ + e- = Fe^2+", &["electron"]),
        ("2 H+ + 2e- = H2", &["electron"]),
        ("Ca(OH + H2O)2 = CaO", &["formula-space"]),
        ("Ca(OH + H2O = CaO", &["formula-bracket"]),
        ("C(graphite) + O2 = CO2", &["phase-unknown"]),
        ("H2O(gas) = H2O(liq)", &["phase-unknown-like", "phase-unknown-like"]),
        ("x CL2(gas) = Cl2", &["element-unknown", "phase-unknown-like"]),
        ("H2O = H2O", &["balance-nothing-happens"]),
        ("2 CO + O2 = O2 + 2 CO", &["balance-nothing-happens"]),
    ];
    for (text, expected) in rows {
        let problems = parse_equation(text).expect_err(text);
        let codes: Vec<&str> = problems.iter().map(|p| p.code.as_str()).collect();
        assert_eq!(codes, expected, "{text}: {problems:?}");
        for problem in &problems {
            let sentence = say(problem, Language::En);
            let whole = format!("{}{}", sentence.message, sentence.hint);
            assert!(!whole.contains(['{', '}']), "{text}: {sentence:?}");
            assert!(problem.span.is_some(), "{text}: {problem:?}");
        }
    }
}

#[test]
fn the_place_of_a_mistake_is_the_term_it_is_in() {
    let problems = balance("H₂ + CL2 = HCl + Ma").unwrap_err();
    let spans: Vec<Option<Span>> = problems.iter().map(|problem| problem.span).collect();
    let span = |start, end| Some(Span { start, end });
    assert_eq!(spans, [span(5, 8), span(17, 19)]);
}

#[test]
fn an_equation_has_its_limits() {
    let many = (1..=41).map(|count| format!("C{count}")).collect::<Vec<_>>().join(" + ");
    let rows = [
        (format!("{many} = C"), "equation-too-many-species"),
        (format!("{} = CO", " ".repeat(2000)), "equation-too-long"),
    ];
    for (text, code) in rows {
        let problems = parse_equation(&text).unwrap_err();
        assert!(problems.iter().any(|p| p.code.as_str() == code), "{code}: {problems:?}");
    }
}

#[test]
fn every_code_of_the_room_has_its_sentences() {
    let mut seen = std::collections::HashSet::new();
    for &code in ReactionCode::ALL {
        let sentence = say(&Problem::new(code), Language::En);
        assert!(seen.insert(code.as_str()), "two codes are called {}", code.as_str());
        assert!(!sentence.message.is_empty() && sentence.hint.ends_with('.'), "{code:?}");
    }
}
