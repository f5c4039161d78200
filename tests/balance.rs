//! Balancing: every row was worked out by hand or recounted atom by atom; the test recounts too.

use shiftgauge::numeric::Rational;
use shiftgauge::problem::words::{Language, say};
use shiftgauge::reaction::{Equation, balance};

fn balanced(text: &str) -> Equation {
    balance(text).unwrap_or_else(|found| panic!("{text}: {found:?}")).equation
}

/// Each element and the charge, summed with the stoichiometric numbers, must vanish.
fn recount(equation: &Equation, text: &str) {
    let mut symbols: Vec<&str> = Vec::new();
    for term in &equation.terms {
        symbols.extend(term.species.formula.atoms().iter().map(|(element, _)| element.symbol));
    }
    let sum = |held: &dyn Fn(&shiftgauge::reaction::Formula) -> Rational| {
        equation.terms.iter().fold(Rational::ZERO, |sum, term| {
            sum.plus(term.nu.times(held(&term.species.formula)).unwrap()).unwrap()
        })
    };
    for symbol in symbols {
        assert!(sum(&|formula| formula.count(symbol)).is_zero(), "{text}: {symbol}");
    }
    assert!(sum(&|formula| Rational::from(formula.charge())).is_zero(), "{text}: charge");
}

#[test]
fn equations_without_coefficients_are_balanced() {
    // Equation without coefficients, then the coefficients in the order of the text.
    let rows = [
        // Plants.
        ("SO2(g) + O2(g) = SO3(g)", "2 1 2"),
        ("N2(g) + H2(g) = NH3(g)", "1 3 2"),
        ("CO + H2 = CH3OH", "1 2 1"),
        ("CO2 + H2 = CH3OH + H2O", "1 3 1 1"),
        ("CH4 + H2O = CO + H2", "1 1 1 3"),
        ("CH4 + CO2 = CO + H2", "1 1 2 2"),
        ("CO + H2 = CH4 + H2O", "1 3 1 1"),
        ("CO = C(s, graphite) + CO2", "2 1 1"),
        ("NH3 + O2 = NO + H2O", "4 5 4 6"),
        ("NO + O2 = NO2", "2 1 2"),
        ("NO2 + H2O = HNO3 + NO", "3 1 2 1"),
        ("NO2 + NH3 = N2 + H2O", "6 8 7 12"),
        ("H2S + SO2 = S8 + H2O", "16 8 3 16"),
        ("H2S + O2 = SO2 + H2O", "2 3 2 2"),
        ("HCl + O2 = Cl2 + H2O", "4 1 2 2"),
        ("CO2 + NH3 = CO(NH2)2 + H2O", "1 2 1 1"),
        ("C8H18 + O2 = CO2 + H2O", "2 25 16 18"),
        ("C2H5OH + O2 = CO2 + H2O", "1 3 2 3"),
        ("C3H8 + H2O = CO2 + H2", "1 6 3 10"),
        ("CH3OH = CH3OCH3 + H2O", "2 1 1"),
        ("SiO2 + C = SiC + CO", "1 3 1 2"),
        ("TiCl4 + O2 = TiO2 + Cl2", "1 1 1 2"),
        ("FeTiO3 + C + Cl2 = TiCl4 + FeCl3 + CO", "2 6 7 2 2 6"),
        // Solids and ores.
        ("Fe2O3 + CO = Fe + CO2", "1 3 2 3"),
        ("Fe3O4 + H2 = Fe + H2O", "1 4 3 4"),
        ("FeS2 + O2 = Fe2O3 + SO2", "4 11 2 8"),
        ("Al + Fe3O4 = Al2O3 + Fe", "8 3 4 9"),
        ("Ca3(PO4)2 + SiO2 + C = CaSiO3 + P4 + CO", "2 6 10 6 1 10"),
        ("Ca5(PO4)3F + H2SO4 + H2O = H3PO4 + CaSO4·2H2O + HF", "1 5 10 3 5 1"),
        ("Fe0.947O + O2 = Fe2O3", "4000 841 1894"),
        ("CeO1.72 + O2 = CeO2", "50 7 50"),
        // Hydrates.
        ("CuSO4·5H2O(s) = CuSO4(s) + H2O(g)", "1 1 5"),
        ("CaSO4·0.5H2O + H2O = CaSO4·2H2O", "2 3 2"),
        ("Na2CO3·10H2O = Na2CO3·H2O + H2O", "1 1 9"),
        ("CaSO4·2H2O = CaSO4·½H2O + H2O", "2 2 3"),
        ("Na2CO3 + H2O + CO2 = NaHCO3", "1 1 1 2"),
        // Isotopes are conserved by themselves.
        ("H2 + D2 = HD", "1 1 2"),
        ("H2O + D2O = HDO", "1 1 2"),
        ("NH3 + D2O = ND3 + H2O", "2 3 2 3"),
        ("D2 + T2 = DT", "1 1 2"),
        // Ions, where the charge counts.
        ("MnO4^- + Fe^2+ + H+ = Mn^2+ + Fe^3+ + H2O", "1 5 8 1 5 4"),
        ("Cr2O7^2- + Fe^2+ + H+ = Cr^3+ + Fe^3+ + H2O", "1 6 14 2 6 7"),
        ("MnO4^- + C2O4^2- + H+ = Mn^2+ + CO2 + H2O", "2 5 16 2 10 8"),
        ("Cr2O7^2- + C2H5OH + H+ = Cr^3+ + CO2 + H2O", "2 1 16 4 2 11"),
        ("Al + OH- + H2O = Al(OH)4^- + H2", "2 2 6 2 3"),
        ("Zn + NO3- + OH- + H2O = Zn(OH)4^2- + NH3", "4 1 7 6 4 1"),
        ("ClO3- + I- + H+ = Cl- + I2 + H2O", "1 6 6 1 3 3"),
        ("IO3- + I- + H+ = I2 + H2O", "1 5 6 3 3"),
        ("Br2 + OH- = BrO3- + Br- + H2O", "3 6 1 5 3"),
        ("Ag+ + CrO4^2- = Ag2CrO4", "2 1 1"),
        ("S2O3^2- + I2 = S4O6^2- + I-", "2 1 1 2"),
        ("PO4^3- + Ca^2+ = Ca3(PO4)2", "2 3 1"),
        ("Fe^3+ + SO3^2- + H2O = Fe^2+ + SO4^2- + H+", "2 1 1 2 1 2"),
        ("Au + CN- + O2 + H2O = [Au(CN)2]^- + OH-", "4 8 1 2 4 4"),
        ("Cu + NO3- + H+ = Cu^2+ + NO + H2O", "3 2 8 3 2 4"),
        ("As2S3 + NO3- + H2O + H+ = H2AsO4^- + SO4^2- + NO", "3 28 4 4 6 9 28"),
        ("CrI3 + Cl2 + OH- = CrO4^2- + IO4- + Cl- + H2O", "2 27 64 2 6 54 32"),
        // Large coefficients.
        ("KMnO4 + HCl = KCl + MnCl2 + Cl2 + H2O", "2 16 2 2 5 8"),
        ("K2Cr2O7 + FeSO4 + H2SO4 = Cr2(SO4)3 + Fe2(SO4)3 + K2SO4 + H2O", "1 6 7 1 3 1 7"),
        ("K4[Fe(CN)6] + H2SO4 + H2O = K2SO4 + FeSO4 + (NH4)2SO4 + CO", "1 6 6 2 1 3 6"),
        ("Cu + HNO3 = Cu(NO3)2 + NO + H2O", "3 8 3 2 4"),
        ("P2I4 + P4 + H2O = PH4I + H3PO4", "10 13 128 40 32"),
        ("Pb(N3)2 + Cr(MnO4)2 = Cr2O3 + MnO2 + Pb3O4 + NO", "15 44 22 88 5 90"),
        (
            "K4[Fe(CN)6] + KMnO4 + H2SO4 = KHSO4 + Fe2(SO4)3 + MnSO4 + HNO3 + CO2 + H2O",
            "10 122 299 162 5 122 60 60 188",
        ),
        (
            "[Cr(N2H4CO)6]4[Cr(CN)6]3 + KMnO4 + H2SO4 = K2Cr2O7 + MnSO4 + CO2 + KNO3 + K2SO4 + H2O",
            "10 1176 1399 35 1176 420 660 223 1879",
        ),
        // Inerts, and catalysts on both sides.
        ("CH4 + O2 + N2 = CO2 + H2O + N2", "1 2 1 2"),
        ("C2H4 + H2O + H3PO4 = C2H5OH + H3PO4", "1 1 1"),
        ("Na + H2O = NaOH + H2 + H2O", "2 2 2 1"),
    ];
    assert!(rows.len() >= 60);
    for (text, expected) in rows {
        let equation = balanced(text);
        recount(&equation, text);
        let found: Vec<String> =
            equation.terms.iter().map(|term| term.nu.magnitude().to_string()).collect();
        assert_eq!(found.join(" "), expected, "{text}: {equation}");
    }
}

#[test]
fn coefficients_as_written_are_kept_where_they_balance() {
    let rows = [
        ("CO + H2O = CO2 + H2", true),
        ("SO2 + 1/2 O2 = SO3", true),
        ("1 SO2 + 0,5 O2 = 1 SO3", true),
        ("2 SO2 + O2 = 2 SO3", true),
        ("4 SO2 + 2 O2 = 4 SO3", true),
        ("2 C + 1½ O2 = CO + CO2", true),
        ("4 NO + 4 NH3 + O2 = 4 N2 + 6 H2O", true),
        ("SO2 + O2 = SO3", false),
    ];
    for (text, already) in rows {
        assert_eq!(balance(text).unwrap().already_balanced, already, "{text}");
    }
    assert_eq!(balanced("4 SO2 + 2 O2 = 4 SO3").text(), "4 SO2 + 2 O2 = 4 SO3");
    assert_eq!(balanced("2 C + 1½ O2 = CO + CO2").text(), "2 C + 3/2 O2 = CO + CO2");
}

#[test]
fn what_does_not_balance_gets_the_reason() {
    // Equation, codes, and a part of the message and hint of the first.
    let rows: [(&str, &[&str], &str); 24] = [
        ("2 H2 + O2 = H2O", &["balance-unequal"], "H 4 ≠ 2; O 2 ≠ 1. Write 2 H2 + O2 = 2 H2O."),
        ("2 SO2 + O2 = SO3", &["balance-unequal"], "Write 2 SO2 + O2 = 2 SO3."),
        ("SO2 + 1/3 O2 = SO3", &["balance-unequal"], "O 8/3 ≠ 3. Write 2 SO2 + O2 = 2 SO3."),
        ("2 Fe^3+ + Sn^2+ = Fe^2+ + Sn^4+", &["balance-unequal"], "Fe 2 ≠ 1; charge 8 ≠ 6."),
        ("2 CO + H2 = CH4 + C2H6 + H2O", &["balance-unequal-several-ways"], "C 2 ≠ 3"),
        ("2 CO = CO2 + N2", &["balance-element-right-only"], "N (nitrogen)"),
        ("CO + H2O = CO2", &["balance-element-left-only"], "H (hydrogen)"),
        ("H2 + O2 + Ar = H2O", &["balance-element-left-only"], "in Ar"),
        (
            "NaCl = KBr",
            &[
                "balance-element-left-only",
                "balance-element-left-only",
                "balance-element-right-only",
                "balance-element-right-only",
            ],
            "Na (sodium) stands on the left only, in NaCl",
        ),
        ("H2O = D2O", &["balance-element-left-only", "balance-element-right-only"], "hydrogen"),
        ("H2 = C(s) + H2 + CO2", &["balance-element-right-only", "balance-element-right-only"], ""),
        ("Fe^2+ = Fe^3+", &["balance-charge"], "the charge cannot"),
        ("MnO4^- = Mn^2+ + O2", &["balance-charge"], "such as H+"),
        ("CO = CO2", &["balance-impossible"], "No coefficients"),
        ("H2O2 = H2O", &["balance-impossible"], "such as H2O or O2"),
        ("FeO = Fe2O3", &["balance-impossible"], ""),
        (
            "C + O2 = CO + CO2",
            &["balance-several-ways"],
            "2 independent reactions go on among them: 2 C + O2 = 2 CO; C + O2 = CO2.",
        ),
        ("KClO3 + HCl = KCl + H2O + Cl2 + ClO2", &["balance-several-ways"], "2 independent"),
        ("H2O2 + KMnO4 + H2SO4 = K2SO4 + MnSO4 + O2 + H2O", &["balance-several-ways"], "2 indep"),
        ("H2O(s) = H2O(l) + H2O(g)", &["balance-several-ways"], "H2O(s) = H2O(l)"),
        ("CO + CO2 = C + O2 + H2 + CH4", &["balance-element-right-only"], "H (hydrogen)"),
        ("CO + O2 + C = CO2", &["balance-several-ways"], ""),
        ("H2 + O2 = H2O + H2O2", &["balance-several-ways"], "2 H2 + O2 = 2 H2O"),
        ("NO + NH3 + O2 = N2 + H2O", &["balance-several-ways"], "4 NH3 + 5 O2"),
    ];
    for (text, codes, words) in rows {
        let problems = balance(text).expect_err(text);
        let found: Vec<&str> = problems.iter().map(|problem| problem.code.as_str()).collect();
        let sentence = say(&problems[0], Language::En);
        let whole = format!("{} {}", sentence.message, sentence.hint);
        assert_eq!(found, codes, "{text}: {whole}");
        assert!(whole.contains(words) && !whole.contains('{'), "{text}: {whole}");
    }
}

#[test]
fn a_species_in_the_way_is_named_with_what_balances_without_it() {
    let rows = [
        ("CO + H2 = CO2 + H2O", "balance-wrong-side", "H2"),
        ("SO3 + O2 = SO2", "balance-wrong-side", "O2"),
        ("C + O2 + FeCl2 = CO2 + FeCl3", "balance-takes-no-part", "FeCl2"),
    ];
    for (text, code, name) in rows {
        let problems = balance(text).expect_err(text);
        let first = say(&problems[0], Language::En);
        assert_eq!(problems[0].code.as_str(), code, "{text}: {problems:?} {first:?}");
        assert!(first.message.starts_with(name), "{text}: {first:?}");
    }
}

#[test]
fn numbers_beyond_the_limit_are_named() {
    let far = "C999983 + H999979 = C999961H999953";
    let codes: Vec<&str> = balance(far).unwrap_err().iter().map(|p| p.code.as_str()).collect();
    assert_eq!(codes, ["balance-too-large"]);
}
