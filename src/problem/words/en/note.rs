//! Sentences: what is worth knowing beside a result.

use crate::problem::Level::{self, Assumption, Caution, Conversion, Warning};
use crate::problem::NoteCode as C;

pub(in crate::problem::words) fn template(code: C) -> (Level, &'static str) {
    match code {
        C::PhaseAssumed => (Assumption, "{species} is taken in this phase, which was not written."),
        C::FormAssumed => (Assumption, "{species} is taken as {form}."),
        C::NotInAnalysis => (Assumption, "{species} is not in the reading and is taken as absent."),
        C::PhaseTakenAsPresent => {
            (Assumption, "{species} is not in the reading and is taken as present in ample amount.")
        }
        C::ClosedByRemainder => {
            (Conversion, "{species} is the remainder: {per_cent} % of the gas as analysed.")
        }
        C::ClosedByLargest => (
            Conversion,
            "The fractions do not quite add up; {species}, the largest, is changed by {per_cent} % to close them.",
        ),
        C::DryTakenAsFree => (
            Assumption,
            "No water is stated beside the dry analysis: the gas is taken as free of water.",
        ),
        C::WaterAdded => (
            Conversion,
            "The wet gas is {per_cent} % water; the dry fractions are reduced accordingly.",
        ),
        C::TakenAtBound => (
            Warning,
            "{field} is a bound: the numbers shown are those at the bound, and the verdict must hold for everything below it.",
        ),
        C::GaugeToAbsolute => {
            (Conversion, "{gauge} gauge and {atmosphere} of atmosphere make {absolute} absolute.")
        }
        C::StandardAtmosphere => (Assumption, "The atmosphere is taken as 101.325 kPa."),
        C::Balanced => (
            Conversion,
            "The equation was written without coefficients and was balanced: {equation}.",
        ),
        C::Extrapolated => (
            Warning,
            "The temperature is {by_k} K outside the range of the data; constant heat capacities carry them on.",
        ),
        C::KFromBook => (
            Assumption,
            "K is the one that your book keeps for this reaction. Its source: {source}.",
        ),
        C::OwnRecord => {
            (Assumption, "{species} is your own record. Its source: {source}.{difference}")
        }
        C::MeasuredUsed => (
            Conversion,
            "K rests on measured equilibria; the species' own records alone would give log10 K = {log10_k}, {difference} from it.",
        ),
        C::LineExtended => (
            Warning,
            "The temperature is {by_k} K outside the points of K; the straight line is drawn on.",
        ),
        C::KNotCarried => (
            Warning,
            "K is stated {by_k} K away from this temperature and no enthalpy is given, so it is used unchanged.",
        ),
        C::ApproachTaken => (
            Conversion,
            "With the set approach the state at rest is that of K at {temperature}; K, ΔG and the direction are those at the temperature itself, and the band lies around the set approach.",
        ),
        C::NotLinear => (
            Warning,
            "Within the tolerances the result does not change in proportion to the inputs, so that an interval of twice the standard uncertainty is a rough one.",
        ),
        C::NoTolerance => (
            Assumption,
            "No tolerance is stated for {names}; the verdict takes each of these values as exact.",
        ),
        C::ConversionBand => (
            Assumption,
            "The heat of reaction is too small for a temperature approach to mean anything; the band is on the missing conversion.",
        ),
        C::IdealGas => (
            Warning,
            "The gas is taken as ideal; at {pressure} that can matter. No real-gas correction is made.",
        ),
        C::FormulaExtended => {
            (Warning, "The temperature is {by_k} K outside the range of the formula of K.")
        }
        C::PointsBend => (
            Warning,
            "The points of K bend away from a straight line of ln K against 1/T, so ΔH° is not constant; the line is a compromise and its ΔH° a mean.",
        ),
        C::KFromReading => (
            Assumption,
            "K is taken from this reading, which is said to be at equilibrium; the reading therefore judges nothing. Carry this K to other readings.",
        ),
        C::FoundFromFeed => (
            Conversion,
            "By the balance of the elements with the feed, {species} is {per_cent} % of the wet gas.",
        ),
        C::FeedDoesNotClose => {
            (Warning, "The feed and the reading do not agree: an element differs by {per_cent} %.")
        }
        C::LostNotRestored => {
            (Warning, "{species} was lost from the sample; the reading is judged without it.")
        }
        C::CondensesInSample => (
            Warning,
            "{species} does not pass a cooled sample line, so that a dry analysis does not show it; mark it as lost and enter the feed to have it restored.",
        ),
        C::MissingFound => (
            Assumption,
            "{species} is found from K as if the reading were at equilibrium: {value}, with a standard uncertainty of {u_per_cent} % of it. The reading therefore judges nothing.",
        ),
        C::MissingSeveral => {
            (Warning, "{others} more amounts of {species} would do as well; this is the smallest.")
        }
        C::OneKilogramOfWater => (
            Assumption,
            "Neither the volume nor the water of the solution is stated: the amounts are for one kilogram of water.",
        ),
        C::ByDensityOfWater => (
            Conversion,
            "Volumes of solution are turned into water by the density of water; the room that the solutes take is neglected.",
        ),
        C::IdealSolution => (
            Warning,
            "The solution is taken as ideal; at an ionic strength of {strength} mol/kg activity coefficients matter. Choose the Davies model.",
        ),
        C::BeyondModel => (
            Warning,
            "The ionic strength, {strength} mol/kg, is beyond the {limit} mol/kg to which the model of the solution is trusted.",
        ),
        C::ChargesUnequal => (
            Warning,
            "The charges of the solution do not balance: {positive} against {negative} equivalents per kilogram of water. An ion is missing or misread.",
        ),
        C::IdealLiquid => {
            (Warning, "The liquid is taken as an ideal mixture: a = x. Many liquids are not.")
        }
        C::NoCommonBasis => (
            Assumption,
            "The gas is given in fractions, so that the amounts at rest are those of one mole of gas beside the liquid; Q and the verdict do not depend on it.",
        ),
        C::PressedPhases => (
            Warning,
            "Solids and liquids are taken with the activity they have at 1 bar; at {pressure} that of a dense liquid is higher, by up to about 10 % in 100 bar.",
        ),
        C::WaterCondenses => (
            Warning,
            "{when} the partial pressure of water, {partial}, is above its saturation pressure of {saturation}: part of it would be liquid, which is not worked out here.",
        ),
        C::PressureTakenAbsolute => (
            Assumption,
            "The pressure is taken as absolute; write (g) after the unit for a gauge reading.",
        ),
        C::TStarExtrapolated => (
            Warning,
            "T* lies {by_k} K outside the range of the data of K, and is worth as much as the line drawn on.",
        ),
        C::NoReading => (
            Assumption,
            "No reading is given, so there is K but no Q, no verdict and no state at rest.",
        ),
        C::Hazards => (
            Caution,
            "Known for harm: {list}. The list is short and not complete; the safety data sheets and the site's procedures hold.",
        ),
        C::Equilibrium => (
            Caution,
            "Equilibrium says where the reaction stops, not how fast. Advice for a qualified person; not an interlock, relief or safety calculation. Site procedures, local codes and licensed practice come first.",
        ),
    }
}
