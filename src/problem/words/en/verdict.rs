//! Sentences: the verdict, what its inputs are called, and what would settle it.

use crate::problem::{InputCode, VerdictCode};

pub(in crate::problem::words) fn input(code: InputCode) -> &'static str {
    use InputCode as C;
    match code {
        C::Temperature => "the temperature",
        C::Pressure => "the pressure",
        C::Atmosphere => "the atmosphere",
        C::Volume => "the volume",
        C::Gas => "{species} in the gas",
        C::Water => "the water",
        C::DewPoint => "the dew point",
        C::DewPointPressure => "the pressure at the dew point",
        C::Feed => "{species} in the feed",
        C::FeedWater => "the water in the feed",
        C::Liquid => "{species} in the liquid",
        C::Solution => "{species} in the solution",
        C::SolutionVolume => "the volume of the solution",
        C::SolutionWater => "the water of the solution",
        C::Pure => "the amount of {species}",
        C::K => "the value of K",
        C::KAt => "the temperature of K",
        C::KEnthalpy => "the enthalpy of reaction",
        C::KHeatCapacity => "the change of heat capacity",
        C::KScatter => "the scatter of the points of K",
        C::KFormula => "the formula of K",
        C::Data => "the data of {species}",
        C::Measured => "the measured constant of {equation}",
    }
}

pub(in crate::problem::words) fn verdict(code: VerdictCode) -> &'static str {
    use VerdictCode as C;
    match code {
        C::NoReading => "No reading is given, so there is only K.",
        C::Moves => "The mixture moves {way}.",
        C::MovesShort => "The mixture moves {way}; it is {by_k} K short of equilibrium.",
        C::MovesPast => "The mixture moves {way}; it is {by_k} K past equilibrium.",
        C::AtRest => "Q equals K: nothing moves.",
        C::InBand => {
            "At rest: T − T* = {approach} K lies with its tolerance inside the band of ± {band} K."
        }
        C::InApproachBand => {
            "At rest as far as the set approach goes: T − T* = {approach} K lies with its tolerance within ± {band} K of {set} K."
        }
        C::InConversionBand => {
            "At rest: the missing conversion, {missing} %, lies with its tolerance inside the band of ± {band} %."
        }
        C::Spent => "The affinity points {way}, but there is no {species} to use up.",
        C::BothAbsent => {
            "Species are absent from both sides ({left}; {right}), so Q is undetermined."
        }
        C::CannotTell => {
            "The tolerances allow both ways: A/RT = {affinity} ± {half_width}, and the reading leans {way}."
        }
        C::CannotTellOpen => {
            "Within its bounds the reading allows both ways; at the bounds it leans {way}."
        }
        C::Better => "{name}: to ± {needed} instead of ± {stated} would settle it.",
        C::BetterNotAlone => "{name}: even an exact value would not settle it alone.",
        C::BetterData => "{name}: a better known value would help; no reading can replace it.",
        C::BetterBound => "{name}: a value instead of a bound.",
    }
}
