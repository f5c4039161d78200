//! Sentences: the shape of a case.

use crate::problem::CaseCode as C;

pub(super) fn template(code: C) -> (&'static str, &'static str) {
    match code {
        C::Format => (
            "The file says it is {found}; this version reads shiftgauge 1.",
            "Open a case that this program saved, or set format to shiftgauge 1.",
        ),
        C::Missing => ("Something is needed here.", "Fill this field in."),
        C::NotAText => (
            "A text is needed here, not {found}.",
            "Put the value with its unit in quotes, such as 215 °C.",
        ),
        C::NotANumber => (
            "A number is needed here, not {found}.",
            "Write the number itself, without quotes or unit.",
        ),
        C::NotAList => ("A list is needed here, not {found}.", "Put the items in square brackets."),
        C::NotAnObject => (
            "An object with named fields is needed here, not {found}.",
            "Put the fields in braces.",
        ),
        C::UnknownField => (
            "There is no field {found} here; known: {allowed}.",
            "Correct the name, or take the field out.",
        ),
        C::UnknownWord => {
            ("{found} is not known here; allowed: {allowed}.", "Choose one of these words.")
        }
        C::NotYet => (
            "This version does not handle {what}, and does not leave it out in silence.",
            "Take it out of the case to get an answer without it.",
        ),
        C::GaugeAtmosphere => {
            ("The atmosphere is an absolute pressure.", "Write it without (g), such as 1.013 bar.")
        }
        C::WaterBesideWet => (
            "The water of a wet analysis is one of its lines, so it cannot be stated apart as well.",
            "Set the basis to dry, or take the water out here.",
        ),
        C::WaterNotOneWay => (
            "The water is stated in exactly one way: fraction, per_dry or dew_point.",
            "Keep one of them.",
        ),
        C::PhaseOfAnotherBlock => (
            "A species with ({found}) stands in the block of ({allowed}).",
            "Move the line to its block, or leave the phase out.",
        ),
        C::KNotPositive => (
            "K is a positive number; {found} is not.",
            "Check the sign, or choose log10 K or ln K.",
        ),
        C::NotAPair => ("A point is a temperature and a value.", "Write both in square brackets."),
        C::KpNeedsUnit => (
            "A Kp means something only with the pressure unit that it was made with.",
            "Choose the unit, such as atm or bar.",
        ),
        C::HeatCapacityAlone => (
            "A change of heat capacity is of use only together with the enthalpy of reaction.",
            "Enter the enthalpy, or take the heat capacity out.",
        ),
        C::PhaseUnclear => (
            "{species} could be {allowed} here.",
            "Write the phase after the formula, such as {example}.",
        ),
        C::ForIsAnotherReaction => (
            "The equation of this number is not a multiple of the reaction.",
            "Write the reaction itself, a multiple of it or its reverse.",
        ),
        C::PressureNeeded => (
            "A reaction with gases needs the pressure.",
            "Enter it as gauge or absolute, such as 27.4 bar(g).",
        ),
        C::VolumeAndPressure => (
            "The amounts in this volume make {found} bar, but the pressure is given as {allowed} bar.",
            "Take out the volume or the pressure, or correct one of them.",
        ),
        C::VolumeNeedsGas => (
            "A volume is for a gas, and there is no gas in the reading.",
            "Enter the gas, or take the volume out.",
        ),
        C::FlowsInVolume => (
            "Flows pass through; a fixed volume holds amounts.",
            "Write amounts instead of flows, or hold the pressure.",
        ),
        C::ApproachTooLarge => (
            "With this approach K would be taken at {found} K, which is no temperature.",
            "Check the approach.",
        ),
        C::FormulaWithoutTerms => (
            "A formula of K needs at least one term with a number.",
            "Fill in a term, such as 1/T.",
        ),
        C::NotARange => (
            "A range is two temperatures, the lower first.",
            "Write both, such as 400 °C and 600 °C.",
        ),
        C::KFromOpenReading => (
            "K cannot be taken from this reading: a species is absent, so that Q is {found}.",
            "Enter every species of the reaction, or take K from the library.",
        ),
        C::KFromNoReading => (
            "K is to be taken from the reading, but there is none.",
            "Enter the reading, or take K from the library.",
        ),
        C::LostNeedsFeed => (
            "{species} was lost from the sample and takes part in the reaction; without a feed nothing tells how much there was.",
            "Enter the feed gas, or the measured {species}.",
        ),
        C::MissingTakesNoPart => (
            "{species} takes no part in the reaction, so K does not tell how much there is.",
            "Enter its value, or make it the remainder.",
        ),
        C::MissingWithoutK => (
            "{species} is to be found from K, but K is to be taken from this reading.",
            "Take K from elsewhere, or enter the value of {species}.",
        ),
        C::MissingNotFound => (
            "No amount of {species} brings this reading to equilibrium.",
            "Check the other lines, the temperature and the pressure.",
        ),
        C::PhaseNeeded => (
            "Neither the library nor the reading knows {species}, so its phase must be written.",
            "Write it after the formula, such as {example}, or (l), (s) or (aq).",
        ),
        C::LiquidsNeedReading => (
            "Several liquids react, and the reading does not say how they are mixed.",
            "Enter the liquid with its components.",
        ),
        C::FeedWithoutReading => (
            "A feed is given, but no reading of what came of it.",
            "To see how far the feed can go, enter it as the analysis.",
        ),
        C::ReadingNeeded => (
            "A chart and a target start from a reading, and there is none.",
            "Enter the reading, or what is fed.",
        ),
        C::SpeciesNotHere => (
            "{species} is neither in the reaction nor in the reading.",
            "Choose a species of the ledger.",
        ),
        C::KnobNotHere => {
            ("There is no gas, so the {knob} changes nothing here.", "Choose another knob.")
        }
        C::SweepCount => {
            ("{found} is no number of points; 2 to {most} are allowed.", "Take 200 points.")
        }
        C::SweepLines => (
            "{found} lines are asked for; 1 to {most} are allowed.",
            "Name a few settings of the other knob.",
        ),
        C::BookFormat => (
            "This is a book of the format {found}, which this version does not read.",
            "Open it with the version that wrote it.",
        ),
        C::BookTwice => (
            "The book holds {found} twice.",
            "Keep one of the two, or give the other a form of its own, such as C2H6O(g, ethanol).",
        ),
        C::BookPhase => (
            "A species of a book needs its phase.",
            "Write it after the formula: (g), (l), (s) or (aq).",
        ),
        C::BookSource => (
            "A book's entry says where its figures come from.",
            "Name the handbook, paper or measurement.",
        ),
        C::NotInBook => (
            "The book keeps no constant for {equation}.",
            "Add it to the book, or take K from the library.",
        ),
        C::SheetSpecies => ("{found} names no single species.", "Choose one of the list."),
        C::BandNegative => (
            "A band is a width and cannot be negative.",
            "Write it without its sign, such as 10 K.",
        ),
    }
}
