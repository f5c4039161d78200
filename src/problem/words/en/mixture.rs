//! Sentences: readings as a whole.

use crate::problem::MixtureCode as C;

pub(super) fn template(code: C) -> (&'static str, &'static str) {
    match code {
        C::Empty => (
            "The analysis has no lines.",
            "Enter at least one species with its value, or take the block out.",
        ),
        C::PresenceInGas => (
            "present and absent are for solids and liquids; a gas needs a number.",
            "Write a fraction, such as 4.5 %, or take the line out.",
        ),
        C::MassFractionInGas => (
            "wt % is a fraction by mass; a gas analysis is by amount.",
            "Write the value in mol %, vol % or ppm.",
        ),
        C::NoMolarMass => (
            "{species} has no molar mass, since one of its elements has no standard atomic weight.",
            "Give the amount in mol.",
        ),
        C::GaugePartialPressure => (
            "A partial pressure is absolute; this one is written as gauge.",
            "Write it with (a), or without (g).",
        ),
        C::PartialPressureInDry => (
            "A partial pressure belongs to the wet gas; this analysis is on the dry basis.",
            "Set the basis to wet and enter the water, or write a fraction.",
        ),
        C::PartialPressureNeedsTotal => (
            "A partial pressure needs the total pressure, which is not given.",
            "Enter the pressure, or write amounts.",
        ),
        C::SpeciesTwice => ("{species} is entered twice.", "Take one of the two lines out."),
        C::WaterInDry => (
            "A dry analysis has no water among its lines.",
            "State the water apart (steam to dry gas, fraction or dew point), or set the basis to wet.",
        ),
        C::SecondRemainder => {
            ("Two lines are the remainder; only one can be.", "Give one of them a number.")
        }
        C::RemainderOfAmounts => (
            "The remainder belongs to fractions; the other lines are amounts or flows.",
            "Write the amount of this species too.",
        ),
        C::RemainderNegative => (
            "The other lines already add up to {sum} %, so nothing is left for the remainder.",
            "Check the lines and their units.",
        ),
        C::FractionsDoNotAddUp => (
            "The fractions add up to {sum} %; they must come to 100 % within {tolerance} %.",
            "Enter what is missing, or write remainder for the main component.",
        ),
        C::MixedForms => (
            "Fractions, amounts and flows cannot be mixed in one reading.",
            "Write all lines in the same way as the first.",
        ),
        C::DewPointRange => (
            "A dew point of water lies between 0.01 °C and 373.9 °C.",
            "Check the dew point, or state the water as a fraction.",
        ),
        C::DewPointNeedsPressure => (
            "A dew point gives a water content only together with a pressure.",
            "Enter the pressure at which the dew point was read.",
        ),
        C::WaterFraction => (
            "The water comes to {found} % of the wet gas; it must be at least 0 % and below 100 %.",
            "Check the water and, for a dew point, the pressure.",
        ),
        C::RemainderOfPurePhase => (
            "A solid or liquid phase of its own cannot be a remainder.",
            "Write present, absent, an amount or a mass.",
        ),
        C::FractionOfPurePhase => (
            "A solid or liquid phase of its own is stated as an amount, a mass, present or absent.",
            "Write present if there is plenty of it.",
        ),
        C::NoCommonMeasure => (
            "The gas is given in fractions, so this amount has nothing to be compared with.",
            "Write present or absent, or give the gas in amounts too.",
        ),
        C::VacuumTooDeep => (
            "The gauge reading is below zero by more than the atmosphere; nothing would be left.",
            "Check the reading and the atmosphere, or write an absolute pressure with (a).",
        ),
        C::SecondMissing => {
            ("Only one line can be found from K.", "Enter a value here, or in the other line.")
        }
        C::PresenceInMixture => (
            "Present and absent are words for solids; this species is dissolved or mixed.",
            "Write how much of it there is.",
        ),
        C::FractionOfWhat => (
            "In a liquid a per cent says nothing without its kind: by amount or by mass.",
            "Write mol % or wt %.",
        ),
        C::VolumeAndWater => {
            ("The solution is stated by its volume and by its water as well.", "Keep one of them.")
        }
        C::NoLiquidWater => (
            "At this temperature there is no liquid water for a solution; 0 °C to 374 °C is allowed.",
            "Check the temperature.",
        ),
        C::RemainderOfSolution => (
            "A solution has no remainder: what is left is water.",
            "Write a value, or missing to find it from K.",
        ),
        C::PhOfAnother => (
            "A pH tells the activity of H+, not that of another species.",
            "Put it in a line of H+.",
        ),
        C::WaterNeedsFeed => (
            "The water is to be found from the feed, but no feed is given.",
            "Enter the feed, or state the water here.",
        ),
        C::FeedOpen => (
            "The elements of the feed do not fix the gas behind it: too few of them are measured on both sides.",
            "Add a species that passes unchanged, such as N2, to the feed and to the reading.",
        ),
        C::FeedContradicts => (
            "By the elements of the feed {species} would be {per_cent} % of the gas, which cannot be.",
            "Check the feed against the reading; one of them is off.",
        ),
        C::CountedWithUnknown => (
            "Nothing tells how much of {species} is {counted}: it is not in the feed, and only argon can be taken from the nitrogen of air.",
            "Enter {counted} in the feed, or N2 in this reading, or {counted} in a line of its own.",
        ),
        C::CountedMoreThanAll => (
            "The {counted} that comes with the nitrogen is more than all that was read as {species}.",
            "Take the mark off if the gas does not come from air, or check the reading.",
        ),
        C::TemperatureOutsideSolution => (
            "At {found} °C there is no model of the solution; it holds from {low} °C to {high} °C.",
            "Check the temperature, or take the solution as ideal.",
        ),
    }
}
