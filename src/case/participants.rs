//! Who takes part: the species of the reaction with their phases, then the inerts of the reading.

use super::question::Question;
use crate::library::{Book, Known, Reach, Temperature, likely};
use crate::mixture::{Basis, Water};
use crate::problem::{CaseCode, LibraryCode, NoteCode, Outcome, Problem, Remark};
use crate::reaction::{Equation, Phase, Species, Term, nearest, parse_species};

/// One species that takes part.
#[derive(Debug, Clone)]
pub(super) struct Participant {
    pub species: Species,
    pub phase: Phase,
    /// Its stoichiometric number; zero for an inert.
    pub nu: f64,
    /// What the library knows of it, where K comes from there.
    pub record: Option<Known>,
}

/// The participants of a reaction, and what had to be assumed.
#[derive(Debug, Clone)]
pub(super) struct Participants {
    pub list: Vec<Participant>,
    /// The equation with the phases written out.
    pub equation: Equation,
    pub remarks: Vec<Remark>,
}

/// Which species a reading names in which phase; empty where there is no reading.
pub(super) fn named_in(question: &Question) -> Vec<Species> {
    let gas = question.gas.iter().flat_map(|gas| &gas.entries);
    let liquid = question.liquid.iter().flat_map(|liquid| &liquid.entries);
    let solution = question.solution.iter().flat_map(|solution| &solution.entries);
    let all = gas.chain(liquid).chain(solution).chain(&question.pure);
    let mut named: Vec<Species> = all.map(|entry| entry.species.clone()).collect();
    let gases = question.gas.iter().chain(&question.feed);
    // Steam that a dry analysis states apart is named as well.
    if gases.into_iter().any(|gas| !matches!(gas.basis, Basis::Wet | Basis::Dry(Water::None))) {
        named.extend(parse_species("H2O(g)"));
    }
    named
}

/// Gives every species of the equation its phase and, if `from_library`, its record.
///
/// A phase that is not written is the one under which the reading names the species, else the only
/// one that the library has; where several are left, gas if all other species can be gases too.
/// Dissolved forms of the library count only beside an ion or a species written as dissolved.
///
/// # Errors
/// Every species that the library does not have, and every phase that stays unclear, each with its
/// place in the equation.
pub(super) fn participants(
    equation: &Equation,
    reading: &[Species],
    book: &Book,
    from_library: bool,
    temperature: Option<Temperature>,
) -> Outcome<Participants> {
    let mut list = Vec::with_capacity(equation.terms.len());
    let (mut remarks, mut problems) = (Vec::new(), Vec::new());
    let in_water = equation.terms.iter().any(is_dissolved);
    let likely_at = temperature.unwrap_or(Temperature::standard());
    let around = Around { reading, book, likely_at, in_water, from_library };
    let all_can_be_gas = equation.terms.iter().all(|term| around.can_be_gas(term));
    for term in &equation.terms {
        let (phase, assumed) = match around.phase_of(term, all_can_be_gas) {
            Ok(found) => found,
            Err(problem) => {
                problems.push(problem.span(term.span));
                continue;
            }
        };
        let species = term.species.in_phase(phase);
        if assumed {
            remarks.push(Remark::new(NoteCode::PhaseAssumed).with("species", species.text()));
        }
        let record = match around.record_of(&species, temperature, &mut remarks) {
            Ok(record) => record,
            Err(problem) => {
                problems.push(problem.span(term.span));
                continue;
            }
        };
        list.push(Participant { species, phase, nu: term.nu.to_f64(), record });
    }
    if !problems.is_empty() {
        return Err(problems);
    }
    // Terms and participants stand in the same order.
    let mut named = list.iter().map(|one| &one.species);
    let equation = equation.renamed(|species| named.next().unwrap_or(species).clone());
    Ok(Participants { list, equation, remarks })
}

fn is_dissolved(term: &Term) -> bool {
    term.species.formula.charge() != 0 || term.species.phase == Some(Phase::Aqueous)
}

/// What the species of an equation are looked for in.
struct Around<'a> {
    reading: &'a [Species],
    book: &'a Book,
    /// The temperature that a phase must be likely at where none is written.
    likely_at: Temperature,
    /// Whether the equation is one of a solution.
    in_water: bool,
    from_library: bool,
}

impl Around<'_> {
    /// The phases in which the library has this substance, or the reading names it.
    fn phases_known(&self, term: &Term) -> Vec<Phase> {
        let named = self.reading.iter().filter(|species| species.same_substance(&term.species));
        let mut found: Vec<Phase> = named.filter_map(|species| species.phase).collect();
        if found.is_empty() {
            let Species { formula, form, .. } = &term.species;
            let records = self.book.meant(formula, None, form.as_deref());
            let records = likely(records, self.likely_at);
            found.extend(records.iter().map(|record| record.phase));
            if !self.in_water && found.iter().any(|phase| *phase != Phase::Aqueous) {
                found.retain(|phase| *phase != Phase::Aqueous);
            }
        }
        Phase::ALL.into_iter().filter(|phase| found.contains(phase)).collect()
    }

    fn can_be_gas(&self, term: &Term) -> bool {
        match term.species.phase {
            Some(phase) => phase == Phase::Gas,
            None => self.phases_known(term).contains(&Phase::Gas),
        }
    }

    /// The phase of a term, and whether it had to be assumed.
    fn phase_of(&self, term: &Term, all_gas: bool) -> Result<(Phase, bool), Problem> {
        if let Some(phase) = term.species.phase {
            return Ok((phase, false));
        }
        match self.phases_known(term)[..] {
            // A species that nobody knows. Where K comes from the library, its absence there is told.
            [] if self.from_library => {
                let phase = if is_dissolved(term) { Phase::Aqueous } else { Phase::Gas };
                Ok((phase, true))
            }
            [] => Err(Problem::new(CaseCode::PhaseNeeded)
                .with("species", term.species.formula.text())
                .with("example", term.species.in_phase(Phase::Gas).text())),
            [only] => Ok((only, false)),
            ref several if all_gas && several.contains(&Phase::Gas) => Ok((Phase::Gas, true)),
            [Phase::Gas, Phase::Liquid] if self.boils(term) => Ok((Phase::Gas, true)),
            ref several => {
                let written = |phase: &Phase| term.species.in_phase(*phase).text();
                let allowed: Vec<String> = several.iter().map(written).collect();
                let example = allowed[0].clone();
                Err(Problem::new(CaseCode::PhaseUnclear)
                    .with("species", term.species.formula.text())
                    .with("allowed", allowed.join(" or "))
                    .with("example", example))
            }
        }
    }

    /// Whether the library's liquid lies above its boiling point at p°.
    fn boils(&self, term: &Term) -> bool {
        let Species { formula, form, .. } = &term.species;
        let lowest = |phase: Phase| {
            let records = self.book.meant(formula, Some(phase), form.as_deref());
            records.iter().map(|record| record.gibbs_over_rt(self.likely_at)).reduce(f64::min)
        };
        lowest(Phase::Gas).zip(lowest(Phase::Liquid)).is_some_and(|(gas, liquid)| gas < liquid)
    }

    /// The record of a species: of several polymorphs the stablest, with a remark.
    fn record_of(
        &self,
        species: &Species,
        temperature: Option<Temperature>,
        remarks: &mut Vec<Remark>,
    ) -> Result<Option<Known>, Problem> {
        if !self.from_library {
            return Ok(None);
        }
        let records = self.book.meant(&species.formula, species.phase, species.form.as_deref());
        match &records[..] {
            [] => Err(self.unknown(species)),
            [only] => Ok(Some(only.clone())),
            // Isomers do not turn into one another as polymorphs do: which one is meant is not guessed.
            several if species.phase != Some(Phase::Solid) => {
                let known: Vec<String> = several.iter().map(|record| record.label()).collect();
                let problem = Problem::new(LibraryCode::Several).with("found", species.text());
                Err(problem.with("known", known.join(", ")))
            }
            [first, others @ ..] => {
                let record = stablest(first, others, temperature);
                let form = record.form.as_ref().or(record.names.first());
                let remark = Remark::new(NoteCode::FormAssumed)
                    .with("species", species.text())
                    .with("form", form.map_or("", |form| &**form));
                remarks.push(remark);
                Ok(Some(record.clone()))
            }
        }
    }

    /// The problem of a species that the library does not have, with what it has instead.
    fn unknown(&self, species: &Species) -> Problem {
        let found = |code: LibraryCode| Problem::new(code).with("found", species.text());
        let others = self.book.meant(&species.formula, None, None);
        if !others.is_empty() {
            let known: Vec<String> = others.iter().map(|record| record.label()).collect();
            return found(LibraryCode::PhaseUnknown).with("known", known.join(", "));
        }
        match nearest(species.formula.text(), self.book.formulas()) {
            Some(near) => found(LibraryCode::UnknownNear).with("near", near),
            None => found(LibraryCode::Unknown),
        }
    }
}

/// The form with the lowest G° of those whose data reach the temperature, where that is known, else of
/// all; without a temperature the first.
fn stablest<'a>(
    first: &'a Known,
    others: &'a [Known],
    temperature: Option<Temperature>,
) -> &'a Known {
    let Some(at) = temperature else { return first };
    let place = |record: &Known| (record.reach(at) != Reach::InRange, record.gibbs_over_rt(at));
    let lower = |best: &'a Known, one: &'a Known| {
        let ((beyond, gibbs), (best_beyond, best_gibbs)) = (place(one), place(best));
        let is_lower = beyond.cmp(&best_beyond).then(gibbs.total_cmp(&best_gibbs)).is_lt();
        if is_lower { one } else { best }
    };
    others.iter().fold(first, lower)
}
