//! Species compared and carried between phases.

use super::equation::{Equation, Term};
use super::phase::Phase;
use super::species::Species;

impl Species {
    /// The same species in this phase; its form is kept.
    #[must_use]
    pub fn in_phase(&self, phase: Phase) -> Species {
        Species { phase: Some(phase), ..self.clone() }
    }

    /// Whether both stand for one substance, whatever their phases: the same atoms and charge, and
    /// no two different forms.
    ///
    /// ```
    /// use shiftgauge::reaction::parse_species;
    /// let of = |text| parse_species(text).unwrap();
    /// assert!(of("H2O").same_substance(&of("H2O(l)")));
    /// assert!(!of("C2H6O(g, ethanol)").same_substance(&of("C2H6O(g, dimethyl ether)")));
    /// ```
    #[must_use]
    pub fn same_substance(&self, other: &Species) -> bool {
        let forms_agree = match (&self.form, &other.form) {
            (Some(one), Some(two)) => one == two,
            _ => true,
        };
        forms_agree
            && self.formula.charge() == other.formula.charge()
            && self.formula.has_same_atoms(&other.formula)
    }
}

impl Equation {
    /// The same equation with every species replaced, in the order of the terms.
    #[must_use]
    pub fn renamed(&self, mut name: impl FnMut(&Species) -> Species) -> Equation {
        let terms = self.terms.iter();
        let terms = terms.map(|term| Term { species: name(&term.species), ..term.clone() });
        Equation { terms: terms.collect(), netted: self.netted.clone() }
    }
}
