//! Which sentence: notes beside a result, lines of the working, the verdict and its inputs.

use super::code::codes;

codes! {
    /// What is worth knowing beside a result.
    NoteCode in Beside {
        PhaseAssumed = "phase-assumed",
        FormAssumed = "form-assumed",
        NotInAnalysis = "not-in-analysis",
        PhaseTakenAsPresent = "phase-taken-as-present",
        ClosedByRemainder = "closed-by-remainder",
        ClosedByLargest = "closed-by-largest",
        DryTakenAsFree = "dry-taken-as-free",
        WaterAdded = "water-added",
        TakenAtBound = "taken-at-bound",
        GaugeToAbsolute = "gauge-to-absolute",
        StandardAtmosphere = "standard-atmosphere",
        Balanced = "balanced",
        Extrapolated = "extrapolated",
        LineExtended = "line-extended",
        KNotCarried = "k-not-carried",
        ApproachTaken = "approach-taken",
        NotLinear = "uncertainty-not-linear",
        NoTolerance = "no-tolerance",
        ConversionBand = "conversion-band",
        FormulaExtended = "formula-extended",
        PointsBend = "points-bend",
        KFromReading = "k-from-reading",
        KFromBook = "k-from-book",
        OwnRecord = "own-record",
        MeasuredUsed = "measured-used",
        FoundFromFeed = "found-from-feed",
        FeedDoesNotClose = "feed-does-not-close",
        LostNotRestored = "lost-not-restored",
        CondensesInSample = "condenses-in-sample",
        MissingFound = "missing-found",
        OneKilogramOfWater = "one-kilogram-of-water",
        ByDensityOfWater = "by-density-of-water",
        IdealSolution = "ideal-solution",
        BeyondModel = "beyond-model",
        ChargesUnequal = "charges-unequal",
        IdealLiquid = "ideal-liquid",
        NoCommonBasis = "no-common-basis",
        PressedPhases = "pressed-phases",
        WaterCondenses = "water-condenses",
        PressureTakenAbsolute = "pressure-taken-absolute",
        TStarExtrapolated = "t-star-extrapolated",
        MissingSeveral = "missing-several",
        IdealGas = "ideal-gas",
        NoReading = "no-reading",
        Hazards = "hazards",
        Equilibrium = "equilibrium-is-not-rate",
    }
}

codes! {
    /// A line of the working.
    StepCode in Beside {
        SpeciesGibbs = "species-gibbs",
        MeasuredK = "measured-k",
        MeasuredGibbs = "measured-gibbs",
        ReactionGibbs = "reaction-gibbs",
        StatedK = "stated-k",
        Line = "line",
        K = "k",
        Absolute = "absolute",
        WetGas = "wet-gas",
        Activity = "activity",
        Quotient = "quotient",
        OpenQuotient = "open-quotient",
        Gibbs = "gibbs",
        TStar = "t-star",
        Rest = "rest",
        RestCheck = "rest-check",
        Formula = "formula",
        KOfReading = "k-of-reading",
        IonicStrength = "ionic-strength",
        SoluteActivity = "solute-activity",
        LiquidActivity = "liquid-activity",
        SolventActivity = "solvent-activity",
    }
}

codes! {
    /// What an input of a case is called.
    InputCode in Beside {
        Temperature = "temperature",
        Pressure = "pressure",
        Atmosphere = "atmosphere",
        Volume = "volume",
        Gas = "gas",
        Water = "water",
        DewPoint = "dew-point",
        DewPointPressure = "dew-point-pressure",
        Pure = "pure",
        Liquid = "liquid",
        Solution = "solution",
        SolutionVolume = "solution-volume",
        SolutionWater = "solution-water",
        K = "k",
        KAt = "k-at",
        KEnthalpy = "k-enthalpy",
        KHeatCapacity = "k-heat-capacity",
        KScatter = "k-scatter",
        KFormula = "k-formula",
        Data = "data",
        Measured = "measured",
        Feed = "feed",
        FeedWater = "feed-water",
    }
}

codes! {
    /// The verdict in a sentence, and what would settle it.
    VerdictCode in Beside {
        NoReading = "no-reading",
        Moves = "moves",
        MovesShort = "moves-short",
        MovesPast = "moves-past",
        AtRest = "at-rest",
        InBand = "in-band",
        InApproachBand = "in-approach-band",
        InConversionBand = "in-conversion-band",
        Spent = "spent",
        BothAbsent = "both-absent",
        CannotTell = "cannot-tell",
        CannotTellOpen = "cannot-tell-open",
        Better = "better",
        BetterNotAlone = "better-not-alone",
        BetterData = "better-data",
        BetterBound = "better-bound",
    }
}

codes! {
    /// Why a nudge does what it does.
    WhyCode in Beside {
        HeatTaken = "heat-taken-up",
        HeatGiven = "heat-given-off",
        HeatNone = "heat-nearly-none",
        HeatBalanced = "heat-balanced-by-pressure",
        HeatUnknown = "heat-unknown",
        WarmVolumeForward = "warmed-volume-forward",
        WarmVolumeReverse = "warmed-volume-reverse",
        PressureForward = "pressure-forward",
        PressureReverse = "pressure-reverse",
        PressureNone = "pressure-cancels",
        VolumeForward = "volume-forward",
        VolumeReverse = "volume-reverse",
        VolumeNone = "volume-cancels",
        InertForward = "inert-forward",
        InertReverse = "inert-reverse",
        InertNone = "inert-cancels",
        InertInVolume = "inert-in-fixed-volume",
        DilutionForward = "dilution-forward",
        DilutionReverse = "dilution-reverse",
        DilutionNone = "dilution-cancels",
        ReactantAdded = "reactant-added",
        ReactantAddedBack = "reactant-added-moves-back",
        ReactantRemoved = "reactant-removed",
        ReactantRemovedForward = "reactant-removed-moves-forward",
        ProductAdded = "product-added",
        ProductAddedForward = "product-added-moves-forward",
        ProductRemoved = "product-removed",
        ProductRemovedBack = "product-removed-moves-back",
        ShareBalanced = "share-balanced",
        BystanderForward = "bystander-forward",
        BystanderReverse = "bystander-reverse",
        BystanderNone = "bystander-none",
        PureAdded = "pure-phase-added",
        PureRemoved = "pure-phase-removed",
        Needed = "used-up-phase-added",
        UsedUp = "phase-used-up",
        UsedUpUntil = "phase-used-up-until",
        CrossesForward = "crosses-forward",
        CrossesReverse = "crosses-reverse",
        Opens = "reaction-opens",
        NothingCanMove = "why-nothing-can-move",
        AnyExtent = "why-any-extent",
        RanToLimit = "why-ran-to-limit",
        NoLimit = "why-no-limit",
        OutOfRange = "step-out-of-range",
        CoefficientsForward = "coefficients-forward",
        CoefficientsReverse = "coefficients-reverse",
    }
}

codes! {
    /// What a nudge does.
    TurnCode in Beside {
        Temperature = "turn-temperature",
        Pressure = "turn-pressure",
        Volume = "turn-volume",
        Water = "turn-water",
        InertAtPressure = "turn-inert-at-pressure",
        InertAtVolume = "turn-inert-at-volume",
        Add = "turn-add",
        Remove = "turn-remove",
    }
}

codes! {
    /// What a target found.
    TargetCode in Beside {
        One = "target-one",
        Several = "target-several",
        Nearest = "target-nearest",
        Nowhere = "target-nowhere",
        Jumps = "target-jumps",
        NotThroughout = "target-not-throughout",
    }
}
