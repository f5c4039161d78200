//! One reaction as a multiple of another.

use crate::numeric::Rational;
use crate::reaction::Equation;

/// Gives the factor r with `this` = r × `other`, or nothing where there is none.
///
/// K(this) = K(other)^r; the reverse reaction has r = −1. Phases that only one of the two writes
/// out are not compared, so that `SO2 + ½ O2 = SO3` is half of `2 SO2(g) + O2(g) = 2 SO3(g)`.
#[must_use]
pub fn multiple_of(this: &Equation, other: &Equation) -> Option<Rational> {
    if this.terms.len() != other.terms.len() {
        return None;
    }
    let mut factor: Option<Rational> = None;
    for term in &this.terms {
        let twin = other.terms.iter().find(|twin| {
            let phases = (term.species.phase, twin.species.phase);
            let phases_agree = match phases {
                (Some(one), Some(two)) => one == two,
                _ => true,
            };
            phases_agree && twin.species.same_substance(&term.species)
        })?;
        let ratio = term.nu.checked_div(twin.nu)?;
        match factor {
            Some(known) if known != ratio => return None,
            _ => factor = Some(ratio),
        }
    }
    factor
}
