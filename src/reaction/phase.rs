//! The phases a species can be written in.

/// The phase of a species as written after its formula.
#[derive(Debug, Clone, Copy, PartialEq, Eq, PartialOrd, Ord, Hash)]
pub enum Phase {
    /// `(g)`: in the gas mixture.
    Gas,
    /// `(l)`: a liquid.
    Liquid,
    /// `(s)`: a solid, each its own pure phase.
    Solid,
    /// `(aq)`: dissolved in water.
    Aqueous,
}

impl Phase {
    /// Every phase, in the order they are listed to the user.
    pub const ALL: [Phase; 4] = [Phase::Gas, Phase::Liquid, Phase::Solid, Phase::Aqueous];

    /// The symbol as written in parentheses: `g`, `l`, `s` or `aq`.
    #[must_use]
    pub fn symbol(self) -> &'static str {
        match self {
            Phase::Gas => "g",
            Phase::Liquid => "l",
            Phase::Solid => "s",
            Phase::Aqueous => "aq",
        }
    }

    /// Reads a symbol; anything else is no phase.
    #[must_use]
    pub fn from_symbol(symbol: &str) -> Option<Phase> {
        Phase::ALL.into_iter().find(|phase| phase.symbol() == symbol)
    }
}
