//! Formulas: which atoms, how many, and the charge.

use std::fmt;

use crate::numeric::Rational;
use crate::numeric::sort_short;
use crate::problem::Outcome;

use super::elements::Element;
use super::formula_text;
use super::place::Place;

/// A chemical formula with exact counts.
///
/// | part | written | kept as |
/// | --- | --- | --- |
/// | counts | `H2O`, `H₂O`, `Fe0.947O`, `Fe0,947O` | `H2O`, `Fe0.947O` |
/// | groups | `Ca(OH)2`, `K3[Fe(CN)6]` | as typed |
/// | additions | `CuSO4·5H2O`, also with `*` or `.` | with `·` |
/// | charges | `SO4^2-`, `SO4(2-)`, `SO₄²⁻`, `H+`, `NO3-` | `SO4^2-`, `H^+`, `NO3^-` |
/// | isotopes | `D2O`, `HTO` | as typed; D and T are conserved apart from H |
///
/// Where one spelling could mean two things:
/// - A bare sign is a charge of one, and the digits before it count atoms: `NO3-`. Where these
///   digits could well be the charge (`Ca2+`, `O2-`, `SO42-`, `[Fe(CN)6]4-`) both readings are
///   offered and neither is taken.
/// - A sign before its number (`SO4-2`, `Ca^+2`) is refused with the spelling IUPAC gives.
/// - A point between digits is a decimal point, unless what follows it up to the end or the next
///   point is a molecule of solvent (H2O, D2O, T2O, H2O2 or NH3) with or without a number:
///   `CuSO4.5H2O` holds five of water, `Fe0.947O` 0.947 of iron.
/// - A number before a formula is a coefficient of the equation and no part of the formula.
///
/// Two formulas are equal when they are spelled alike; [`Formula::has_same_atoms`] compares what
/// they are made of.
#[derive(Debug, Clone, PartialEq, Eq, Hash)]
pub struct Formula {
    text: String,
    atoms: Vec<(&'static Element, Rational)>,
    charge: i32,
}

/// Reads a formula; space around it is ignored.
///
/// # Errors
/// The first mistake in it, with its place and, where one is likely, the formula that was meant.
///
/// ```
/// use shiftgauge::reaction::parse_formula;
/// let gypsum = parse_formula("CaSO₄*2H2O").unwrap();
/// assert_eq!(gypsum.text(), "CaSO4·2H2O");
/// assert_eq!(gypsum.count("O").to_string(), "6");
/// assert!((gypsum.molar_mass_kg_per_mol().unwrap() - 0.172_164).abs() < 1e-6);
/// assert!(parse_formula("C02").is_err());
/// ```
pub fn parse_formula(text: &str) -> Outcome<Formula> {
    formula_text::read(Place::whole(text).trimmed()).map_err(Into::into)
}

impl Formula {
    /// Puts a formula together; atoms of one element must already be summed.
    pub(super) fn new(
        mut text: String,
        mut atoms: Vec<(&'static Element, Rational)>,
        charge: i32,
    ) -> Formula {
        sort_short(&mut atoms, |before, item| before.0 > item.0);
        let sign = if charge < 0 { '-' } else { '+' };
        match charge.unsigned_abs() {
            0 => {}
            1 => text.extend(['^', sign]),
            number => text.push_str(&format!("^{number}{sign}")),
        }
        Formula { text, atoms, charge }
    }

    /// The formula as it is shown, saved and compared: as typed, with plain digits, `·` and `^`.
    #[must_use]
    pub fn text(&self) -> &str {
        &self.text
    }

    /// The elements in it with their counts, by atomic number; every count is above zero.
    #[must_use]
    pub fn atoms(&self) -> &[(&'static Element, Rational)] {
        &self.atoms
    }

    /// How many atoms of the element of this symbol it holds; zero where there are none.
    #[must_use]
    pub fn count(&self, symbol: &str) -> Rational {
        let found = self.atoms.iter().find(|(element, _)| element.symbol == symbol);
        found.map_or(Rational::ZERO, |(_, count)| *count)
    }

    /// The charge in elementary charges.
    #[must_use]
    pub fn charge(&self) -> i32 {
        self.charge
    }

    /// The atoms in Hill's order (carbon and hydrogen first where there is carbon, the others by the
    /// alphabet) and the charge: one text for all spellings.
    ///
    /// ```
    /// use shiftgauge::reaction::parse_formula;
    /// assert_eq!(parse_formula("CH3COOH").unwrap().hill(), "C2H4O2");
    /// assert_eq!(parse_formula("NH4^+").unwrap().hill(), "H4N^+1");
    /// ```
    #[must_use]
    pub fn hill(&self) -> String {
        let has_carbon = self.count("C") != Rational::ZERO;
        let place = |symbol: &str| match symbol {
            "C" if has_carbon => 0,
            "H" if has_carbon => 1,
            _ => 2,
        };
        let mut atoms: Vec<(&str, f64)> =
            self.atoms.iter().map(|(element, count)| (element.symbol, count.to_f64())).collect();
        sort_short(&mut atoms, |before, item| {
            (place(before.0), before.0) > (place(item.0), item.0)
        });
        let mut text = String::new();
        for (symbol, count) in atoms {
            text.push_str(symbol);
            if count != 1.0 {
                text.push_str(&format!("{count}"));
            }
        }
        if self.charge != 0 {
            text.push_str(&format!("^{:+}", self.charge));
        }
        text
    }

    /// Whether the other has the same atoms and the same charge, however it is spelled.
    #[must_use]
    pub fn has_same_atoms(&self, other: &Formula) -> bool {
        self.charge == other.charge && self.atoms == other.atoms
    }

    /// The molar mass in kg/mol: the sum of counts times standard atomic weights.
    ///
    /// None where an element has no standard atomic weight. The mass of the electrons an ion has
    /// lost or gained (5.5e−7 kg/mol each) is left out, as the trade does.
    #[must_use]
    pub fn molar_mass_kg_per_mol(&self) -> Option<f64> {
        let mut sum_g_per_mol = 0.0;
        for (element, count) in &self.atoms {
            sum_g_per_mol += count.to_f64() * element.weight?.g_per_mol;
        }
        Some(sum_g_per_mol / 1000.0)
    }
}

impl fmt::Display for Formula {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        f.write_str(&self.text)
    }
}
