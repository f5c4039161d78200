//! Sentences: numbers, units and tolerances.

use crate::problem::QuantityCode as C;

pub(super) fn template(code: C) -> (&'static str, &'static str) {
    match code {
        C::Empty => ("Nothing is written here.", "Write a number with its unit, such as 215 °C."),
        C::NotANumber => (
            "“{found}” does not start with a number.",
            "Begin with digits, such as 4.3, 4,3 or 1.2e-3.",
        ),
        C::NumberShape => (
            "“{found}” cannot be read as one number: it may have one decimal mark, and groups of three digits for thousands.",
            "Write it without grouping, such as 1234.5.",
        ),
        C::NumberAmbiguous => (
            "“{found}” can be read as {decimal} or as {thousands}.",
            "Write it with a decimal point, or without a comma if thousands are meant.",
        ),
        C::NumberPower => (
            "“{found}” has a power of ten without its exponent.",
            "Write the exponent, such as ×10^-3 or e-3.",
        ),
        C::NumberTail => (
            "“{found}” follows the number; only a number is read here.",
            "Leave the number alone in this place.",
        ),
        C::NumberTooLarge => {
            ("“{found}” is too large: numbers end at about 1.8×10³⁰⁸.", "Check the exponent.")
        }
        C::NumberTooSmall => (
            "“{found}” is too small to be told from zero: numbers end at about 5×10⁻³²⁴.",
            "Check the exponent, or write 0.",
        ),
        C::UnitMissing => (
            "A unit is missing: {measure} is needed, in {allowed}.",
            "Add the unit after the number, such as {example}.",
        ),
        C::UnitUnknown => (
            "“{found}” is no unit known here; {allowed} would be allowed.",
            "Check the spelling of the unit.",
        ),
        C::UnitNear => (
            "“{found}” is no unit known here; near it are {near}.",
            "Write the unit that is meant; small and capital letters differ.",
        ),
        C::UnitMismatch => (
            "“{found}” is {is}; {measure} is needed, such as {allowed}.",
            "Check that this number belongs in this place.",
        ),
        C::UnitNotWanted => (
            "“{found}” follows the number; a plain number is needed here, without a unit.",
            "Leave the number alone in this place.",
        ),
        C::PhMissing => (
            "“{found}” does not say that it is a pH.",
            "Write pH before the number, such as pH 7.2.",
        ),
        C::UnitTwice => {
            ("“{found}” is a second unit; {first} is already there.", "Write the unit once.")
        }
        C::OutOfRange => (
            "{found} is outside the range of {name}: {range}, as {reason}.",
            "Check the number and its unit.",
        ),
        C::FractionOverOne => (
            "{found} is more than the whole.",
            "Check the number and its unit; a fraction is at most 1, or 100 %.",
        ),
        C::FractionPercent => (
            "{found} without a unit is a fraction, and more than the whole.",
            "Write {number} % if per cent is meant.",
        ),
        C::PressureBelowVacuum => (
            "{found} is below vacuum, unless it is a gauge pressure.",
            "Write (g) after the unit if the gauge reads it.",
        ),
        C::ToleranceMissing => (
            "Nothing follows the plus-minus sign.",
            "Write the tolerance, such as ± 2, or take the sign out.",
        ),
        C::ToleranceNegative => (
            "The tolerance {found} is below zero.",
            "Write half the width of the interval, such as ± 2.",
        ),
        C::ToleranceUnit => (
            "The tolerance is in “{found}”, which does not fit a value in {unit}.",
            "Write the tolerance in the value's own unit, or as ± 2 % rel.",
        ),
        C::TolerancePercent => (
            "A tolerance in “{found}” on a value in {unit} does not say what it is a part of.",
            "Write ± 2 % rel for per cent of the value, otherwise use the value's own unit.",
        ),
        C::ToleranceTwice => ("“{found}” is a second tolerance.", "Write one tolerance."),
        C::BoundAbove => (
            "“{found}” says at least; only an upper bound is read, such as < 5 ppm.",
            "Write the value itself, or an upper bound.",
        ),
        C::BoundTolerance => ("An upper bound has no tolerance.", "Write either < x or x ± y."),
        C::BoundNotHere => (
            "An upper bound cannot stand for {measure}.",
            "Write the value, with a tolerance if it is not well known.",
        ),
        C::Parenthesis => (
            "A parenthesis is opened here and not closed.",
            "Close it before the unit, such as (215 ± 2) °C.",
        ),
        C::PresetUnknown => (
            "No instrument class is called {found}; known: type B, E, J, K, N, R, S or T and Pt100, each with its class.",
            "Write it like type K class 2 or Pt100 class B, or write a tolerance such as ± 2.",
        ),
        C::PresetClass => (
            "{instrument} has no such class as in {found}; there are {classes}.",
            "Choose one of these classes.",
        ),
        C::PresetNotHere => (
            "{found} is the class of a thermometer, and this is {measure}.",
            "Write a tolerance such as ± 2 % rel.",
        ),
        C::PresetRange => (
            "{found} holds from {low} °C to {high} °C.",
            "Choose another class, or write a tolerance such as ± 5 °C.",
        ),
    }
}
