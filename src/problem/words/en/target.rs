//! Sentences: what a target found.

use crate::problem::TargetCode as C;

pub(in crate::problem::words) fn template(code: C) -> &'static str {
    match code {
        C::One => "One setting reaches it: {setting}.",
        C::Several => "Several settings reach it: {settings}.",
        C::Nearest => "No setting in this range reaches it; the nearest is {reached} at {setting}.",
        C::Nowhere => "No setting in this range has such a number at rest.",
        C::Jumps => "At {at} the number jumps across it, because a phase is used up or the gas is.",
        C::NotThroughout => "In parts of the range there is no such number at rest.",
    }
}
