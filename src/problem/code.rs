//! The codes of all problems, one enum for each room that finds them.

/// Declares one room's codes with their names at the border, and puts them into [`Code`].
macro_rules! codes {
    ($(#[$doc:meta])* $group:ident in $variant:ident { $($name:ident = $text:literal),+ $(,)? }) => {
        $(#[$doc])*
        #[derive(Debug, Clone, Copy, PartialEq, Eq, Hash)]
        #[allow(missing_docs, reason = "the sentence in words/ says what each code means")]
        pub enum $group { $($name),+ }

        impl $group {
            /// Every code of this group, for tests and for the documentation.
            pub const ALL: &'static [$group] = &[$($group::$name),+];

            /// The code's name at the border.
            #[must_use]
            pub fn as_str(self) -> &'static str {
                match self { $($group::$name => $text),+ }
            }
        }

        impl From<$group> for Code {
            fn from(code: $group) -> Code { Code::$variant(code) }
        }
    };
}

codes! {
    /// Mistakes in a number, a unit or a tolerance.
    QuantityCode in Quantity {
        Empty = "quantity-empty",
        NotANumber = "number-not-read",
        NumberShape = "number-shape",
        NumberAmbiguous = "number-ambiguous",
        NumberPower = "number-power",
        NumberTail = "number-tail",
        NumberTooLarge = "number-too-large",
        NumberTooSmall = "number-too-small",
        UnitMissing = "unit-missing",
        UnitUnknown = "unit-unknown",
        UnitNear = "unit-near",
        UnitMismatch = "unit-mismatch",
        UnitNotWanted = "unit-not-wanted",
        PhMissing = "ph-missing",
        UnitTwice = "unit-twice",
        OutOfRange = "quantity-out-of-range",
        FractionOverOne = "fraction-over-one",
        FractionPercent = "fraction-percent",
        PressureBelowVacuum = "pressure-below-vacuum",
        ToleranceMissing = "tolerance-missing",
        ToleranceNegative = "tolerance-negative",
        ToleranceUnit = "tolerance-unit",
        TolerancePercent = "tolerance-percent",
        ToleranceTwice = "tolerance-twice",
        BoundAbove = "bound-above",
        BoundTolerance = "bound-tolerance",
        BoundNotHere = "bound-not-here",
        Parenthesis = "parenthesis-open",
        PresetUnknown = "preset-unknown",
    }
}

codes! {
    /// Mistakes in a formula or an equation.
    ReactionCode in Reaction {
        Empty = "equation-empty",
    }
}

codes! {
    /// A species that the library does not hold, or holds in several ways.
    LibraryCode in Library {
        Unknown = "species-unknown",
    }
}

codes! {
    /// Mistakes in where K comes from.
    ConstantCode in Constant {
        NotANumber = "constant-not-a-number",
    }
}

codes! {
    /// Mistakes in a reading that only show when its entries are put together.
    MixtureCode in Mixture {
        Empty = "reading-empty",
    }
}

codes! {
    /// What the bare calls cannot work with.
    EquilibriumCode in Equilibrium {
        Shape = "problem-shape",
    }
}

codes! {
    /// Mistakes in the shape of a case: a missing field, a wrong kind, a word that is not known.
    CaseCode in Case {
        Format = "case-format",
    }
}

/// Which mistake it is; the room that finds it, and the mistake.
#[derive(Debug, Clone, Copy, PartialEq, Eq, Hash)]
pub enum Code {
    /// A number, a unit or a tolerance.
    Quantity(QuantityCode),
    /// A formula or an equation.
    Reaction(ReactionCode),
    /// What the library holds.
    Library(LibraryCode),
    /// Where K comes from.
    Constant(ConstantCode),
    /// A reading as a whole.
    Mixture(MixtureCode),
    /// The bare calls.
    Equilibrium(EquilibriumCode),
    /// The shape of a case.
    Case(CaseCode),
}

impl Code {
    /// The code's name at the border.
    #[must_use]
    pub fn as_str(self) -> &'static str {
        match self {
            Code::Quantity(code) => code.as_str(),
            Code::Reaction(code) => code.as_str(),
            Code::Library(code) => code.as_str(),
            Code::Constant(code) => code.as_str(),
            Code::Mixture(code) => code.as_str(),
            Code::Equilibrium(code) => code.as_str(),
            Code::Case(code) => code.as_str(),
        }
    }
}
