//! What the room refuses to go beyond, each with its reason.

/// The longest equation, in characters: several times the longest in practice, and short enough
/// to be read at every key press.
pub(super) const EQUATION_CHARACTERS: usize = 2_000;

/// The longest formula, in characters.
pub(super) const FORMULA_CHARACTERS: usize = 200;

/// The longest name of a polymorph or an isomer, in characters.
pub(super) const FORM_CHARACTERS: usize = 80;

/// The most species in one equation: keeps the exact elimination at a few milliseconds.
pub(super) const SPECIES: usize = 40;

/// The largest count of one atom or group in a formula, and the largest denominator of one (six
/// decimals): beyond it lies a slip of the finger.
pub(super) const COUNT: i32 = 1_000_000;

/// The largest coefficient and the largest denominator of one, typed or found by balancing.
pub(super) const COEFFICIENT: i32 = 1_000_000_000;

/// The largest charge of one species.
pub(super) const CHARGE: i32 = 50;
