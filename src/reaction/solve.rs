//! The one set of smallest whole numbers that balances an equation, or why there is none.

use std::cmp::Ordering;

use crate::numeric::Rational;
use crate::numeric::RationalError;
use crate::numeric::null_space;
use crate::numeric::smallest_whole;
use crate::problem::Outcome;
use crate::problem::Problem;
use crate::problem::ReactionCode;

use super::balance::{Column, equation, too_large};
use super::conserve::{Conserved, conserved, row};

/// How many of several independent reactions are shown.
const SHOWN: usize = 4;

/// Finds the stoichiometric numbers of all species, each on the side where it is written.
///
/// A species written on both sides is first left out, as an inert or a catalyst is; only if that
/// cannot be balanced may it stand on either side.
pub(super) fn solve(columns: &[Column]) -> Outcome<Vec<Rational>> {
    let on_one_side = |column: &Column| column.left.is_some();
    if columns.iter().all(on_one_side) {
        return attempt(columns, &vec![true; columns.len()]);
    }
    let without: Vec<bool> = columns.iter().map(on_one_side).collect();
    attempt(columns, &without).or_else(|_| attempt(columns, &vec![true; columns.len()]))
}

/// Balances the species that are `used`; the others get zero.
fn attempt(columns: &[Column], used: &[bool]) -> Outcome<Vec<Rational>> {
    let lonely = on_one_side_only(columns, used);
    if !lonely.is_empty() {
        return Err(lonely);
    }
    let basis = match reactions(columns, used, |_| true) {
        Ok(basis) => basis,
        Err(_) => return Err(too_large().into()),
    };
    match basis.as_slice() {
        [] => Err(no_reaction(columns, used).into()),
        [only] => oriented(columns, used, only),
        several => {
            let shown: Vec<String> = several
                .iter()
                .take(SHOWN)
                .map(|numbers| equation(columns, &forward(numbers), Vec::new()).text())
                .collect();
            Err(Problem::new(ReactionCode::SeveralWays)
                .with("number", several.len().to_string())
                .with("reactions", shown.join("; "))
                .into())
        }
    }
}

/// A basis of all reactions that conserve what the filter lets through.
fn reactions(
    columns: &[Column],
    used: &[bool],
    keep: impl Fn(&Conserved) -> bool,
) -> Result<Vec<Vec<Rational>>, RationalError> {
    let mut rows: Vec<Vec<Rational>> =
        conserved(columns).into_iter().filter(keep).map(|what| row(columns, what)).collect();
    for index in (0..columns.len()).filter(|&index| !used[index]) {
        let mut absent = vec![Rational::ZERO; columns.len()];
        absent[index] = Rational::ONE;
        rows.push(absent);
    }
    let basis = null_space(&rows, columns.len())?;
    basis.iter().map(|vector| smallest_whole(vector)).collect()
}

/// The elements that stand on one side only.
fn on_one_side_only(columns: &[Column], used: &[bool]) -> Vec<Problem> {
    let mut problems = Vec::new();
    for quantity in conserved(columns) {
        let Conserved::Atoms(element) = quantity else { continue };
        let held = row(columns, quantity);
        let holders: Vec<&Column> = columns
            .iter()
            .zip(used)
            .zip(&held)
            .filter(|((_, used), count)| **used && !count.is_zero())
            .map(|((column, _), _)| column)
            .collect();
        let Some(first) = holders.first() else { continue };
        let Some(left) = first.left else { continue };
        if holders.iter().any(|holder| holder.left != Some(left)) {
            continue;
        }
        let code = if left { ReactionCode::ElementLeft } else { ReactionCode::ElementRight };
        let found: Vec<String> = holders.iter().map(|holder| holder.species.text()).collect();
        problems.push(
            Problem::new(code)
                .with("element", element.symbol)
                .with("name", element.name)
                .with("found", found.join(", "))
                .span(first.span),
        );
    }
    problems
}

/// Why no reaction at all is possible.
fn no_reaction(columns: &[Column], used: &[bool]) -> Problem {
    let atoms_only = reactions(columns, used, |what| *what != Conserved::Charge);
    match atoms_only.as_deref() {
        Ok([_, ..]) => Problem::new(ReactionCode::ChargeLeftOver),
        _ => Problem::new(ReactionCode::NoCombination),
    }
}

/// The only reaction, the way round that it is written, or the species that stand in its way.
fn oriented(columns: &[Column], used: &[bool], only: &[Rational]) -> Outcome<Vec<Rational>> {
    let reverse: Vec<Rational> = only.iter().map(|nu| nu.negated()).collect();
    let misplaced = |numbers: &[Rational]| {
        let wrong = |(column, nu): &(&Column, &Rational)| is_misplaced(column, **nu);
        columns.iter().zip(numbers).filter(wrong).count()
    };
    let first_stays = |numbers: &[Rational]| {
        columns
            .iter()
            .zip(numbers)
            .find(|(_, nu)| !nu.is_zero())
            .is_some_and(|(c, nu)| !is_misplaced(c, *nu))
    };
    let better = match misplaced(&reverse).cmp(&misplaced(only)) {
        Ordering::Less => true,
        Ordering::Equal => first_stays(&reverse),
        Ordering::Greater => false,
    };
    let numbers = if better { &reverse[..] } else { only };
    let suggestion = equation(columns, numbers, Vec::new()).text();
    let mut problems = Vec::new();
    for ((column, used), nu) in columns.iter().zip(used).zip(numbers) {
        let code = if is_misplaced(column, *nu) {
            ReactionCode::WrongSide
        } else if nu.is_zero() && *used && column.left.is_some() {
            ReactionCode::TakesNoPart
        } else {
            continue;
        };
        problems.push(
            Problem::new(code)
                .with("found", column.species.text())
                .with("suggestion", suggestion.clone())
                .span(column.span),
        );
    }
    if problems.is_empty() { Ok(numbers.to_vec()) } else { Err(problems) }
}

fn is_misplaced(column: &Column, nu: Rational) -> bool {
    !nu.is_zero() && column.left.is_some_and(|left| left != nu.is_negative())
}

/// A reaction the way round that puts its first species on the left.
fn forward(numbers: &[Rational]) -> Vec<Rational> {
    let reversed = numbers.iter().find(|nu| !nu.is_zero()).is_some_and(|nu| !nu.is_negative());
    numbers.iter().map(|nu| if reversed { nu.negated() } else { *nu }).collect()
}
