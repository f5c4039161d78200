//! The one form that every heat capacity here is written in, and its integrals.

use super::temperature::Temperature;

/// C°p/R as powers of T from T⁻² to T⁴, with the constants of H°/R and S°/R.
///
/// ```text
/// Cp/R = a₋₂T⁻² + a₋₁T⁻¹ + a₀ + a₁T + a₂T² + a₃T³ + a₄T⁴
/// H/RT = −a₋₂T⁻² + a₋₁ ln T/T + a₀ + a₁T/2 + a₂T²/3 + a₃T³/4 + a₄T⁴/5 + b_H/T
/// S/R  = −a₋₂T⁻²/2 − a₋₁T⁻¹ + a₀ ln T + a₁T + a₂T²/2 + a₃T³/3 + a₄T⁴/4 + b_S
/// ```
///
/// All four results are linear in the nine numbers, so a reaction is one polynomial too.
#[derive(Debug, Clone, Copy, PartialEq, Default)]
pub(super) struct Polynomial {
    /// a₋₂ … a₄, for T in K.
    pub(super) a: [f64; 7],
    /// b_H in K.
    pub(super) b_enthalpy: f64,
    /// b_S, a number.
    pub(super) b_entropy: f64,
}

impl Polynomial {
    /// C°p/R.
    pub(super) fn heat_capacity(&self, at: Temperature) -> f64 {
        let (t, x, a) = (at.kelvin(), at.reciprocal(), &self.a);
        x * (a[0] * x + a[1]) + a[2] + t * (a[3] + t * (a[4] + t * (a[5] + t * a[6])))
    }

    /// H°/RT.
    pub(super) fn enthalpy(&self, at: Temperature) -> f64 {
        let (t, x, a) = (at.kelvin(), at.reciprocal(), &self.a);
        let rising = t * (a[3] / 2.0 + t * (a[4] / 3.0 + t * (a[5] / 4.0 + t * (a[6] / 5.0))));
        x * (a[1] * at.ln_kelvin() - a[0] * x + self.b_enthalpy) + a[2] + rising
    }

    /// S°/R.
    pub(super) fn entropy(&self, at: Temperature) -> f64 {
        let (t, x, a) = (at.kelvin(), at.reciprocal(), &self.a);
        let rising = t * (a[3] + t * (a[4] / 2.0 + t * (a[5] / 3.0 + t * (a[6] / 4.0))));
        -x * (a[1] + 0.5 * a[0] * x) + a[2] * at.ln_kelvin() + rising + self.b_entropy
    }

    /// G°/RT = H°/RT − S°/R, with the two sums joined term by term.
    pub(super) fn gibbs(&self, at: Temperature) -> f64 {
        let (t, x, a) = (at.kelvin(), at.reciprocal(), &self.a);
        let rising = t
            * (a[3] * (1.0 / 2.0)
                + t * (a[4] * (1.0 / 6.0) + t * (a[5] * (1.0 / 12.0) + t * (a[6] * (1.0 / 20.0)))));
        let falling = x * (self.b_enthalpy + a[1] * (at.ln_kelvin() + 1.0) - 0.5 * a[0] * x);
        falling + a[2] * (1.0 - at.ln_kelvin()) - self.b_entropy - rising
    }

    /// The polynomial of constant heat capacity that meets this one in C°p, H° and S° at `end`.
    pub(super) fn continued_from(&self, end: Temperature) -> Polynomial {
        let cp = self.heat_capacity(end);
        Polynomial {
            a: [0.0, 0.0, cp, 0.0, 0.0, 0.0, 0.0],
            b_enthalpy: (self.enthalpy(end) - cp) * end.kelvin(),
            b_entropy: self.entropy(end) - cp * end.ln_kelvin(),
        }
    }

    /// Sets the two constants so that H°/RT and S°/R at a temperature are these.
    pub(super) fn meet(&mut self, at: Temperature, enthalpy: f64, entropy: f64) {
        self.b_enthalpy += (enthalpy - self.enthalpy(at)) * at.kelvin();
        self.b_entropy += entropy - self.entropy(at);
    }

    /// Adds `nu` times another polynomial.
    pub(super) fn add(&mut self, nu: f64, other: &Polynomial) {
        for (sum, term) in self.a.iter_mut().zip(&other.a) {
            *sum += nu * term;
        }
        self.b_enthalpy += nu * other.b_enthalpy;
        self.b_entropy += nu * other.b_entropy;
    }
}

/// A polynomial and the temperature in K from which it holds, up to where the next one starts.
#[derive(Debug, Clone, Copy, PartialEq)]
pub(super) struct Piece {
    pub(super) from_k: f64,
    pub(super) polynomial: Polynomial,
}

/// The polynomial that holds at T: that of the last piece that starts at or below T.
pub(super) fn holding(pieces: &[Piece], kelvin: f64) -> Option<&Polynomial> {
    let after = pieces.partition_point(|piece| piece.from_k <= kelvin);
    pieces.get(after.saturating_sub(1)).map(|piece| &piece.polynomial)
}

/// Pieces up to a highest temperature, with one of constant heat capacity put at either end.
pub(super) fn with_ends(mut pieces: Vec<Piece>, high_k: f64) -> Option<Vec<Piece>> {
    let (first, last) = (*pieces.first()?, *pieces.last()?);
    let below = first.polynomial.continued_from(Temperature::new(first.from_k).ok()?);
    let above = last.polynomial.continued_from(Temperature::new(high_k).ok()?);
    pieces.insert(0, Piece { from_k: 0.0, polynomial: below });
    pieces.push(Piece { from_k: high_k, polynomial: above });
    Some(pieces)
}
