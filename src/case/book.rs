//! A user's book by itself: what it holds, or what is wrong with it.

use serde::Serialize;

use super::node::{Node, Reader};
use super::question::KSource;
use super::read_book::{BOOK_FORMAT, read_book};
use super::refusal::Answer;
use super::species::{Asked, SpeciesMatch, species_match};
use super::value::Value;
use crate::library::{Found, FoundBy};
use crate::problem::{CaseCode, Outcome};

/// The answer of `book`.
#[derive(Debug, Clone, Serialize)]
pub struct BookAnswer {
    ok: bool,
    /// The first words of a book's file.
    pub format: &'static str,
    /// The species that it holds.
    pub species: Vec<SpeciesMatch>,
    /// The constants that it holds.
    pub constants: Vec<KeptConstant>,
}

/// A constant that a book keeps.
#[derive(Debug, Clone, Serialize)]
pub struct KeptConstant {
    /// The equation that it belongs to.
    pub equation: String,
    /// `value`, `points` or `formula`.
    pub from: &'static str,
    /// Where it comes from.
    pub source: String,
}

/// Looks a book through, and gives what it holds; every mistake in it at once.
#[must_use]
pub fn book(book: &Value) -> Answer<BookAnswer> {
    look_through(book).into()
}

fn look_through(value: &Value) -> Outcome<BookAnswer> {
    let root = Node::root(value);
    let mut reader = Reader::default();
    if root.is_null() {
        return Err(root.problem(CaseCode::NotAnObject).into());
    }
    let book = read_book(&mut reader, &root);
    if !reader.problems.is_empty() {
        return Err(reader.problems);
    }
    let found = |record| Found { record, by: FoundBy::Formula };
    let own = book.library.own().iter().cloned();
    Ok(BookAnswer {
        ok: true,
        format: BOOK_FORMAT,
        species: own.map(|record| species_match(&found(record), &Asked::default())).collect(),
        constants: book
            .constants
            .into_iter()
            .map(|kept| KeptConstant {
                equation: kept.equation.text(),
                from: match kept.constant {
                    KSource::Points(_) => "points",
                    KSource::Formula(_) => "formula",
                    _ => "value",
                },
                source: kept.source,
            })
            .collect(),
    })
}
