//! Formulas and species: what is read, and what each mistake gets.

use shiftgauge::problem::words::{Language, say};
use shiftgauge::problem::{Problem, Span};
use shiftgauge::reaction::{parse_formula, parse_species};

fn atoms(text: &str) -> String {
    let formula = match parse_formula(text) {
        Ok(formula) => formula,
        Err(problems) => panic!("{text}: {problems:?}"),
    };
    let counts: Vec<String> =
        formula.atoms().iter().map(|(element, count)| format!("{element}{count}")).collect();
    match formula.charge() {
        0 => counts.join(" "),
        charge => format!("{} {charge:+}", counts.join(" ")),
    }
}

#[test]
fn formulas_are_read_to_exact_atoms() {
    let rows = [
        ("H2O", "H2 O1"),
        ("H₂O", "H2 O1"),
        ("CH3COOH", "H4 C2 O2"),
        ("Co", "Co1"),
        ("CO", "C1 O1"),
        ("Ca(OH)2", "H2 O2 Ca1"),
        ("Ca₃(PO₄)₂", "O8 P2 Ca3"),
        ("K4[Fe(CN)6]", "C6 N6 K4 Fe1"),
        ("{[Co(NH3)6]2}3", "H108 N36 Co6"),
        ("Fe0.947O", "O1 Fe947/1000"),
        ("Fe0,947O", "O1 Fe947/1000"),
        ("Fe₀.₉₄₇O", "O1 Fe947/1000"),
        ("TiO1.95", "O39/20 Ti1"),
        ("Fe1.05O", "O1 Fe21/20"),
        ("D2O", "D2 O1"),
        ("HDO", "H1 D1 O1"),
        ("T2", "T2"),
        ("C60", "C60"),
        ("C1H4", "H4 C1"),
        ("CuSO4·5H2O", "H10 O9 S1 Cu1"),
        ("CuSO4.5H2O", "H10 O9 S1 Cu1"),
        ("CuSO4*5H2O", "H10 O9 S1 Cu1"),
        ("CuSO₄ · 5 H₂O", "H10 O9 S1 Cu1"),
        ("CaSO4·0.5H2O", "H1 O9/2 S1 Ca1"),
        ("CaSO4.0.5H2O", "H1 O9/2 S1 Ca1"),
        ("CaSO4·½H2O", "H1 O9/2 S1 Ca1"),
        ("CaSO4·1/2H2O", "H1 O9/2 S1 Ca1"),
        ("MgCl2.6H2O", "H12 O6 Mg1 Cl2"),
        ("CaCl2.8NH3", "H24 N8 Cl2 Ca1"),
        ("BF3.NH3", "H3 B1 N1 F3"),
        ("KAl(SO4)2·12H2O", "H24 O20 Al1 S2 K1"),
        ("MgCO3·Mg(OH)2·3H2O", "H8 C1 O8 Mg2"),
        ("[CuSO4·5H2O]2", "H20 O18 S2 Cu2"),
    ];
    for (text, expected) in rows {
        assert_eq!(atoms(text), expected, "{text}");
    }
}

#[test]
fn charges_are_read_as_iupac_writes_them() {
    let rows = [
        ("H+", "H1 +1"),
        ("H⁺", "H1 +1"),
        ("H^+", "H1 +1"),
        ("H(+)", "H1 +1"),
        ("OH-", "H1 O1 -1"),
        ("OH−", "H1 O1 -1"),
        ("SO4^2-", "O4 S1 -2"),
        ("SO4(2-)", "O4 S1 -2"),
        ("SO4^(2-)", "O4 S1 -2"),
        ("SO₄²⁻", "O4 S1 -2"),
        ("SO₄2-", "O4 S1 -2"),
        ("SO4--", "O4 S1 -2"),
        ("Ca++", "Ca1 +2"),
        ("Hg2^2+", "Hg2 +2"),
        ("O2^-", "O2 -1"),
        ("O₂-", "O2 -1"),
        ("NO3-", "N1 O3 -1"),
        ("NH4+", "H4 N1 +1"),
        ("[Fe(CN)6]^4-", "C6 N6 Fe1 -4"),
        ("[Fe(CN)6]⁴⁻", "C6 N6 Fe1 -4"),
        ("P3O10^5-", "O10 P3 -5"),
    ];
    for (text, expected) in rows {
        assert_eq!(atoms(text), expected, "{text}");
    }
}

#[test]
fn species_are_shown_in_one_spelling() {
    let rows = [
        ("SO2(g)", "SO2(g)"),
        (" SO2 (g) ", "SO2(g)"),
        ("SO₄²⁻(aq)", "SO4^2-(aq)"),
        ("H+ (aq)", "H^+(aq)"),
        ("H(+)(aq)", "H^+(aq)"),
        ("CuSO4*5H2O(s)", "CuSO4·5H2O(s)"),
        ("CaSO4.½H2O( s )", "CaSO4·0.5H2O(s)"),
        ("C(s,graphite)", "C(s, graphite)"),
        ("CaCO3(s, calcite)", "CaCO3(s, calcite)"),
        ("SiO2(s, α-quartz)", "SiO2(s, α-quartz)"),
        ("C2H6O(g,  dimethyl   ether)", "C2H6O(g, dimethyl ether)"),
        ("C2H4Cl2(l, 1,2-dichloroethane)", "C2H4Cl2(l, 1,2-dichloroethane)"),
        ("Ca(OH)2(s)", "Ca(OH)2(s)"),
        ("Ca(OH)2", "Ca(OH)2"),
        ("Fe0,950O(s)", "Fe0.95O(s)"),
        ("S(s)", "S(s)"),
    ];
    for (text, expected) in rows {
        let species = parse_species(text).unwrap_or_else(|found| panic!("{text}: {found:?}"));
        assert_eq!(species.text(), expected, "{text}");
    }
}

fn only(text: &str) -> Problem {
    let mut problems = parse_species(text).expect_err(text);
    assert_eq!(problems.len(), 1, "{text}: {problems:?}");
    problems.remove(0)
}

#[test]
fn each_mistake_has_its_code_and_says_what_is_likely_meant() {
    let rows = [
        ("", "formula-empty", "SO2"),
        ("(g)", "formula-empty", "SO2"),
        ("C02", "count-zero-for-letter", "Write CO2."),
        ("H20", "count-zero-for-letter", "Write H2O."),
        ("H2S04", "count-zero-for-letter", "Write H2SO4."),
        ("Fe203", "count-zero-for-letter", "Write Fe2O3."),
        ("K2Cr207", "count-zero-for-letter", "Write K2Cr2O7."),
        ("Fe0", "count-zero-for-letter", "Write FeO."),
        ("H2O0", "count-zero-for-letter", "Write H2OO."),
        ("CuSO4·0H2O", "count-zero", "letter O"),
        ("C0.0O2", "count-zero", "letter O"),
        ("co2", "formula-capitals", "Write CO2 or Co2."),
        ("h2o", "formula-capitals", "Write H2O."),
        ("CL2", "formula-capitals", "Write Cl2."),
        ("NACL", "formula-capitals", "Write NaCl."),
        ("caco3", "formula-capitals", "Write CaCO3"),
        ("COCL2", "formula-capitals", "Write COCl2 or CoCl2."),
        ("Ma", "element-unknown", "Mg"),
        ("J2", "element-unknown", "C, H or O"),
        ("FeOx", "element-unknown", "Os"),
        ("Ca(OH2", "formula-bracket", "Ca(OH)2"),
        ("CaOH)2", "formula-bracket", "Ca(OH)2"),
        ("Ca(OH]2", "formula-bracket", "Ca(OH)2"),
        ("Ca()2", "formula-part-empty", "5H2O"),
        ("CuSO4·", "formula-part-empty", "5H2O"),
        ("·5H2O", "formula-part-empty", "5H2O"),
        ("CuSO4··H2O", "formula-part-empty", "5H2O"),
        ("CH4?", "formula-character", "symbols"),
        ("CH3-CH3", "formula-character", "symbols"),
        ("2H2O", "formula-character", "symbols"),
        ("H2 O", "formula-space", "+"),
        ("C9999999", "count-too-large", "digits"),
        ("C0.00000001", "count-too-large", "digits"),
        ("(((C999999)999999)999999)999999", "count-too-large", "digits"),
        ("Ca2+", "charge-ambiguous", "^"),
        ("O2-", "charge-ambiguous", "^"),
        ("SO42-", "charge-ambiguous", "^"),
        ("[Fe(CN)6]4-", "charge-ambiguous", "^"),
        ("SO4-2", "charge-order", "Write SO4^2-."),
        ("Ca^+2", "charge-order", "Write Ca^2+."),
        ("SO4(-2)", "charge-order", "Write SO4^2-."),
        ("Na^+1", "charge-order", "Write Na^+."),
        ("SO4^2", "charge-not-a-charge", "SO4^2-"),
        ("SO4^", "charge-not-a-charge", "SO4^2-"),
        ("SO4²", "charge-not-a-charge", "SO4^2-"),
        ("Na+-", "charge-not-a-charge", "SO4^2-"),
        ("Na^0+", "charge-not-a-charge", "SO4^2-"),
        ("Na^99+", "charge-too-large", "sign"),
        ("Na^99999999999999999999+", "charge-too-large", "sign"),
        ("e-", "electron", "half reaction"),
        ("e^-", "electron", "half reaction"),
        ("e⁻", "electron", "half reaction"),
        ("e(-)", "electron", "half reaction"),
        ("H2O(gas)", "phase-unknown-like", "Write (g)."),
        ("Fe(cr)", "phase-unknown-like", "Write (s)."),
        ("CaCO3(S)", "phase-unknown-like", "Write (s)."),
        ("H2O(liq)", "phase-unknown-like", "Write (l)."),
        ("CaCO3(cr, calcite)", "phase-unknown-like", "Write (s, calcite)."),
        ("C(graphite)", "phase-unknown", "C(s, graphite)"),
        ("C(s,)", "form-empty", "comma"),
        ("C(s, gra/phite)", "form-not-a-name", "graphite"),
    ];
    for (text, code, hint) in rows {
        let problem = only(text);
        assert_eq!(problem.code.as_str(), code, "{text}: {problem:?}");
        let sentence = say(&problem, Language::En);
        assert!(sentence.hint.contains(hint), "{text}: {sentence:?}");
        let filled = !sentence.message.contains('{') && !sentence.hint.contains('{');
        assert!(filled, "{text}: {sentence:?}");
    }
}

#[test]
fn spans_count_as_javascript_counts() {
    let rows =
        [("  CH4?", 5, 6), ("𝛼CH4", 0, 2), ("Ca(OH2", 2, 3), ("FeMa", 2, 4), ("H₂O(gas)", 4, 7)];
    for (text, start, end) in rows {
        assert_eq!(only(text).span, Some(Span { start, end }), "{text}");
    }
}

#[test]
fn a_formula_and_its_phase_can_both_be_wrong() {
    let codes: Vec<&str> =
        parse_species("CL2(gas)").unwrap_err().iter().map(|p| p.code.as_str()).collect();
    assert_eq!(codes, ["formula-capitals", "phase-unknown-like"]);
}

#[test]
fn a_formula_may_not_be_endless() {
    let problem = only(&"C".repeat(201));
    assert_eq!(problem.code.as_str(), "formula-too-long");
    assert!(parse_species(&"C".repeat(200)).is_ok());
}
