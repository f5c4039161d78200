//! The codes of all problems, one enum for each room that finds them.

/// Declares one room's codes with their names at the border, and puts them into [`Code`]; codes
/// `in Beside` are of sentences and stay out of it.
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

        codes!(@wrap $group $variant);
    };
    (@wrap $group:ident Beside) => {};
    (@wrap $group:ident $variant:ident) => {
        impl From<$group> for Code {
            fn from(code: $group) -> Code { Code::$variant(code) }
        }
    };
}

pub(super) use codes;

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
        PresetClass = "preset-class",
        PresetNotHere = "preset-not-here",
        PresetRange = "preset-range",
    }
}

codes! {
    /// Mistakes in a formula or an equation.
    ReactionCode in Reaction {
        Empty = "equation-empty",
        EquationTooLong = "equation-too-long",
        TooManySpecies = "equation-too-many-species",
        NoArrow = "equation-without-sign",
        ManyArrows = "equation-many-signs",
        LeftEmpty = "equation-left-empty",
        RightEmpty = "equation-right-empty",
        TermEmpty = "term-empty",
        CoefficientBad = "coefficient-not-a-number",
        CoefficientZero = "coefficient-zero",
        CoefficientTooLarge = "coefficient-too-large",
        CoefficientAlone = "coefficient-alone",
        FormulaEmpty = "formula-empty",
        FormulaTooLong = "formula-too-long",
        FormulaCharacter = "formula-character",
        FormulaSpace = "formula-space",
        FormulaCapitals = "formula-capitals",
        Bracket = "formula-bracket",
        PartEmpty = "formula-part-empty",
        CountZero = "count-zero",
        ZeroForLetter = "count-zero-for-letter",
        CountTooLarge = "count-too-large",
        ElementUnknown = "element-unknown",
        Electron = "electron",
        ChargeBad = "charge-not-a-charge",
        ChargeOrder = "charge-order",
        ChargeAmbiguous = "charge-ambiguous",
        ChargeTooLarge = "charge-too-large",
        PhaseUnknown = "phase-unknown",
        PhaseUnknownLike = "phase-unknown-like",
        FormEmpty = "form-empty",
        FormBad = "form-not-a-name",
        NothingHappens = "balance-nothing-happens",
        ElementLeft = "balance-element-left-only",
        ElementRight = "balance-element-right-only",
        ChargeLeftOver = "balance-charge",
        NoCombination = "balance-impossible",
        SeveralWays = "balance-several-ways",
        TakesNoPart = "balance-takes-no-part",
        WrongSide = "balance-wrong-side",
        Unbalanced = "balance-unequal",
        UnbalancedOpen = "balance-unequal-several-ways",
        TooLargeToBalance = "balance-too-large",
    }
}

codes! {
    /// A species that the library does not hold, or holds in several ways.
    LibraryCode in Library {
        Unknown = "species-unknown",
        UnknownNear = "species-unknown-near",
        PhaseUnknown = "species-phase-unknown",
        Several = "species-several",
        Temperature = "species-temperature",
        Coefficient = "species-coefficient",
        OwnTooFew = "own-figures-too-few",
        OwnDisagree = "own-figures-disagree",
        OwnElement = "own-element-unknown",
        OwnEntropy = "own-entropy-not-positive",
        OwnHeatMissing = "own-heat-missing",
        OwnHeat = "own-heat-not-positive",
        OwnRange = "own-range",
        OwnGap = "own-range-gap",
        OwnJump = "own-heat-steps",
        OwnStandard = "own-range-without-standard",
    }
}

codes! {
    /// Mistakes in where K comes from.
    ConstantCode in Constant {
        PointsTooFew = "points-too-few",
    }
}

codes! {
    /// Mistakes in a reading that only show when its entries are put together.
    MixtureCode in Mixture {
        Empty = "reading-empty",
        PresenceInGas = "presence-in-gas",
        MassFractionInGas = "mass-fraction-in-gas",
        NoMolarMass = "no-molar-mass",
        GaugePartialPressure = "gauge-partial-pressure",
        PartialPressureInDry = "partial-pressure-in-dry",
        PartialPressureNeedsTotal = "partial-pressure-needs-total",
        SpeciesTwice = "species-twice",
        WaterInDry = "water-in-dry",
        SecondRemainder = "second-remainder",
        RemainderOfAmounts = "remainder-of-amounts",
        RemainderNegative = "remainder-negative",
        FractionsDoNotAddUp = "fractions-do-not-add-up",
        MixedForms = "mixed-forms",
        DewPointRange = "dew-point-range",
        DewPointNeedsPressure = "dew-point-needs-pressure",
        WaterFraction = "water-fraction",
        RemainderOfPurePhase = "remainder-of-pure-phase",
        FractionOfPurePhase = "fraction-of-pure-phase",
        NoCommonMeasure = "no-common-measure",
        VacuumTooDeep = "vacuum-too-deep",
        WaterNeedsFeed = "water-needs-feed",
        FeedOpen = "feed-open",
        FeedContradicts = "feed-contradicts",
        CountedWithUnknown = "counted-with-unknown",
        CountedMoreThanAll = "counted-more-than-all",
        SecondMissing = "second-missing",
        PresenceInMixture = "presence-in-mixture",
        FractionOfWhat = "fraction-of-what",
        VolumeAndWater = "volume-and-water",
        NoLiquidWater = "no-liquid-water",
        RemainderOfSolution = "remainder-of-solution",
        PhOfAnother = "ph-of-another",
        TemperatureOutsideSolution = "temperature-outside-solution",
    }
}

codes! {
    /// What the bare calls cannot work with.
    EquilibriumCode in Equilibrium {
        Shape = "problem-shape",
        LengthsDiffer = "lengths-differ",
        TooManySpecies = "too-many-species",
        NotFinite = "number-not-finite",
        NuOutOfRange = "nu-out-of-range",
        NothingReacts = "nothing-reacts",
        AmountOutOfRange = "amount-out-of-range",
        LnKOutOfRange = "ln-k-out-of-range",
        TemperatureNotPositive = "temperature-not-positive",
        PressureNotPositive = "pressure-not-positive",
        VolumeNotPositive = "volume-not-positive",
        SolutesWithGas = "solutes-with-gas",
        SolutesHoldPressure = "solutes-hold-pressure",
        NoReaction = "no-reaction",
        ManyReactions = "many-reactions",
        LiquidWithSolutes = "liquid-with-solutes",
        GasHoldsSolvent = "gas-holds-solvent",
        WaterNotPositive = "water-not-positive",
        ModelNeedsWater = "model-needs-water",
        ChargeOutOfRange = "charge-out-of-range",
        IonSizeOutOfRange = "ion-size-out-of-range",
    }
}

codes! {
    /// Mistakes in the shape of a case: a missing field, a wrong kind, a word that is not known.
    CaseCode in Case {
        Format = "case-format",
        Missing = "field-missing",
        NotAText = "not-a-text",
        NotANumber = "not-a-number",
        NotAList = "not-a-list",
        NotAnObject = "not-an-object",
        UnknownField = "unknown-field",
        UnknownWord = "unknown-word",
        NotYet = "not-in-this-version",
        GaugeAtmosphere = "gauge-atmosphere",
        WaterBesideWet = "water-beside-wet",
        WaterNotOneWay = "water-not-one-way",
        PhaseOfAnotherBlock = "phase-of-another-block",
        KNotPositive = "k-not-positive",
        NotAPair = "not-a-pair",
        KpNeedsUnit = "kp-needs-unit",
        HeatCapacityAlone = "heat-capacity-alone",
        PhaseUnclear = "phase-unclear",
        ForIsAnotherReaction = "for-is-another-reaction",
        PressureNeeded = "pressure-needed",
        VolumeAndPressure = "volume-and-pressure",
        VolumeNeedsGas = "volume-needs-gas",
        FlowsInVolume = "flows-in-volume",
        ApproachTooLarge = "approach-too-large",
        BandNegative = "band-negative",
        FormulaWithoutTerms = "formula-without-terms",
        NotARange = "not-a-range",
        KFromOpenReading = "k-from-open-reading",
        KFromNoReading = "k-from-no-reading",
        LostNeedsFeed = "lost-needs-feed",
        PhaseNeeded = "phase-needed",
        LiquidsNeedReading = "liquids-need-reading",
        ReadingNeeded = "reading-needed",
        FeedWithoutReading = "feed-without-reading",
        SpeciesNotHere = "species-not-here",
        KnobNotHere = "knob-not-here",
        SweepCount = "sweep-count",
        SweepLines = "sweep-lines",
        MissingTakesNoPart = "missing-takes-no-part",
        MissingWithoutK = "missing-without-k",
        MissingNotFound = "missing-not-found",
        BookFormat = "book-format",
        BookTwice = "book-species-twice",
        BookPhase = "book-phase-needed",
        BookSource = "book-source-needed",
        NotInBook = "not-in-book",
        SheetSpecies = "sheet-species",
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
