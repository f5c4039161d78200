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
        C::TemperatureOutsideSolution => (
            "At {found} °C there is no model of the solution; it holds from {low} °C to {high} °C.",
            "Check the temperature, or take the solution as ideal.",
        ),
    }
}
