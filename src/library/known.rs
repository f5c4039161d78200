//! A record that a reaction rests on: one of the tables, or one of the user's own.

use std::ops::Deref;
use std::sync::Arc;

use super::record::Record;

/// A record of the tables, which lives as long as the program, or a user's own, which is shared.
///
/// ```
/// use shiftgauge::library::{self, Known};
/// let known: Known = library::find("SO2", None, None)[0].into();
/// assert_eq!(known.cas, "7446-09-5");
/// ```
#[derive(Debug, Clone)]
pub enum Known {
    /// One of the tables.
    Table(&'static Record),
    /// One that a user made.
    Own(Arc<Record>),
}

impl Deref for Known {
    type Target = Record;

    fn deref(&self) -> &Record {
        match self {
            Known::Table(record) => record,
            Known::Own(record) => record,
        }
    }
}

impl PartialEq for Known {
    fn eq(&self, other: &Known) -> bool {
        **self == **other
    }
}

impl From<&'static Record> for Known {
    fn from(record: &'static Record) -> Known {
        Known::Table(record)
    }
}

impl From<Record> for Known {
    fn from(record: Record) -> Known {
        Known::Own(Arc::new(record))
    }
}
