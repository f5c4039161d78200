//! Equations: species with their stoichiometric numbers.

use std::fmt;

use crate::numeric::Rational;
use crate::problem::Span;

use super::species::Species;

/// One species of an equation with its stoichiometric number.
#[derive(Debug, Clone, PartialEq, Eq)]
pub struct Term {
    /// The species as written.
    pub species: Species,
    /// The stoichiometric number ν: below zero on the left, above zero on the right, never zero.
    pub nu: Rational,
    /// Where the species stands first in the text.
    pub span: Span,
}

/// A balanced equation, its left side first.
#[derive(Debug, Clone, PartialEq, Eq)]
pub struct Equation {
    /// The species that take part, each once, reactants before products.
    pub terms: Vec<Term>,
    /// The species that were written on both sides, of which only the difference counts; those
    /// with none left are in no term.
    pub netted: Vec<Species>,
}

impl Equation {
    /// Puts terms in order, reactants first; terms with ν = 0 are left out.
    pub(super) fn new(terms: Vec<Term>, netted: Vec<Species>) -> Equation {
        let taking_part = terms.into_iter().filter(|term| !term.nu.is_zero());
        let (left, right): (Vec<Term>, Vec<Term>) =
            taking_part.partition(|term| term.nu.is_negative());
        Equation { terms: left.into_iter().chain(right).collect(), netted }
    }

    /// The equation as it is shown and saved: `2 SO2(g) + O2(g) = 2 SO3(g)`.
    #[must_use]
    pub fn text(&self) -> String {
        self.to_string()
    }

    /// The stoichiometric number of a species; zero where it takes no part.
    #[must_use]
    pub fn nu(&self, species: &Species) -> Rational {
        let found = self.terms.iter().find(|term| term.species == *species);
        found.map_or(Rational::ZERO, |term| term.nu)
    }

    /// The factor that turns the other equation into this one: 2 where this one is twice the
    /// other, −1 where it is the reverse; none where it is no multiple of it.
    ///
    /// ```
    /// use shiftgauge::numeric::Rational;
    /// use shiftgauge::reaction::parse_equation;
    /// let one = parse_equation("SO2(g) + 1/2 O2(g) = SO3(g)").unwrap();
    /// let other = parse_equation("2 SO3(g) = 2 SO2(g) + O2(g)").unwrap();
    /// assert_eq!(other.multiple_of(&one), Some(Rational::from(-2)));
    /// ```
    #[must_use]
    pub fn multiple_of(&self, other: &Equation) -> Option<Rational> {
        let first = other.terms.first()?;
        let factor = self.nu(&first.species).over(first.nu).ok()?;
        let matches = |term: &Term| term.nu.times(factor) == Ok(self.nu(&term.species));
        let all = self.terms.len() == other.terms.len() && other.terms.iter().all(matches);
        (all && !factor.is_zero()).then_some(factor)
    }
}

impl fmt::Display for Equation {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        let mut joint = "";
        let mut left = true;
        for term in &self.terms {
            if left && !term.nu.is_negative() {
                left = false;
                joint = " = ";
            }
            f.write_str(joint)?;
            if term.nu.magnitude() != Rational::ONE {
                write!(f, "{} ", term.nu.magnitude())?;
            }
            write!(f, "{}", term.species)?;
            joint = " + ";
        }
        Ok(())
    }
}
