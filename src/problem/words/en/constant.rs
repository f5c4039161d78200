//! Sentences: where K comes from.

use crate::problem::ConstantCode as C;

pub(super) fn template(code: C) -> (&'static str, &'static str) {
    match code {
        C::PointsTooFew => (
            "K from points needs two or more, at different temperatures.",
            "Add a point at another temperature, or give K as one value.",
        ),
    }
}
