//! Sentences: the shape of a case.

use crate::problem::CaseCode as C;

pub(super) fn template(code: C) -> (&'static str, &'static str) {
    match code {
        C::Format => (
            "The file says it is {found}; this version reads shiftgauge 1.",
            "Save the case again.",
        ),
    }
}
