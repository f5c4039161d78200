//! The library as one user sees it: the tables, with their own records before them.

use super::find::find;
use super::find::of_atoms;
use super::known::Known;
use super::record::Record;
use crate::reaction::Formula;
use crate::reaction::Phase;
use crate::reaction::parse_formula;

/// A user's own records; one that stands for the same species as the tables' takes its place.
///
/// ```
/// use shiftgauge::library::Book;
/// let nothing_of_my_own = Book::default();
/// assert_eq!(nothing_of_my_own.find("SO2", None, None).len(), 3); // gas, liquid and dissolved
/// ```
#[derive(Debug, Clone, Default)]
pub struct Book {
    records: Vec<Known>,
}

impl Book {
    /// A book of these records.
    #[must_use]
    pub fn new(records: Vec<Record>) -> Book {
        Book { records: records.into_iter().map(Known::from).collect() }
    }

    /// The user's own records.
    #[must_use]
    pub fn own(&self) -> &[Known] {
        &self.records
    }

    /// Every record whose formula is spelled so, in the phase and the form if they are given: the
    /// user's own first, then those of the tables that none of these stands for.
    #[must_use]
    pub fn find(&self, formula: &str, phase: Option<Phase>, form: Option<&str>) -> Vec<Known> {
        let spelled = |record: &&Known| record.formula == formula;
        let own = self.records.iter().filter(spelled).cloned();
        let tables = find(formula, phase, form).into_iter().map(Known::Table);
        self.fitting(own.chain(tables), phase, form)
    }

    /// Every record that an equation may mean by a formula: those that spell it so, else those of the
    /// same atoms and charge in another order, such as C2H6O for ethanol and dimethyl ether.
    #[must_use]
    pub fn meant(&self, formula: &Formula, phase: Option<Phase>, form: Option<&str>) -> Vec<Known> {
        let spelled = self.find(formula.text(), phase, form);
        if !spelled.is_empty() || !self.find(formula.text(), None, None).is_empty() {
            return spelled;
        }
        let same = |record: &&Known| {
            parse_formula(&record.formula).is_ok_and(|known| known.has_same_atoms(formula))
        };
        let own = self.records.iter().filter(same).cloned();
        self.fitting(own.chain(of_atoms(formula).map(Known::Table)), phase, form)
    }

    fn fitting(
        &self,
        records: impl Iterator<Item = Known>,
        phase: Option<Phase>,
        form: Option<&str>,
    ) -> Vec<Known> {
        let fits = |record: &Known| {
            phase.is_none_or(|wanted| record.phase == wanted)
                && (form.is_none() || record.form.as_deref() == form)
                && (record.is_own() || !self.replaces(record))
        };
        records.filter(fits).collect()
    }

    /// Whether one of the user's own stands for this record.
    #[must_use]
    pub fn replaces(&self, record: &Record) -> bool {
        self.records.iter().any(|own| own.stands_for(record))
    }

    /// Every formula that is known, for near misses.
    pub fn formulas(&self) -> impl Iterator<Item = &str> + '_ {
        self.records
            .iter()
            .map(|record| &*record.formula)
            .chain(super::find::formulas().map(|formula| -> &str { formula }))
    }
}
