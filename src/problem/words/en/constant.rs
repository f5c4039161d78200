//! Sentences: where K comes from.

use crate::problem::ConstantCode as C;

pub(super) fn template(code: C) -> (&'static str, &'static str) {
    match code {
        C::NotANumber => ("{found} is not a value of K.", "Write a positive number."),
    }
}
