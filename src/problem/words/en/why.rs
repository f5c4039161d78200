//! Sentences: why a nudge moves rest, or does not.

use crate::problem::TurnCode;
use crate::problem::WhyCode as C;

/// What a nudge does, as the head of its line.
pub(in crate::problem::words) fn turn(code: TurnCode) -> &'static str {
    match code {
        TurnCode::Temperature => "Temperature up by {step}",
        TurnCode::Pressure => "Pressure up by {step}",
        TurnCode::Volume => "Volume up by {step}",
        TurnCode::Water => "Water added, {step} of what there is",
        TurnCode::InertAtPressure => "Inert gas added at constant pressure, {step}",
        TurnCode::InertAtVolume => "Inert gas added at constant volume, {step}",
        TurnCode::Add => "{species} added, {step}",
        TurnCode::Remove => "{species} taken away, {step}",
    }
}

pub(in crate::problem::words) fn template(code: C) -> &'static str {
    match code {
        C::HeatTaken => {
            "The forward reaction takes up heat (ΔH° = {enthalpy} kJ/mol), so K rises with temperature: hotter moves the mixture forward."
        }
        C::HeatGiven => {
            "The forward reaction gives off heat (ΔH° = {enthalpy} kJ/mol), so K falls as the temperature rises: hotter moves the mixture back."
        }
        C::HeatNone => {
            "The reaction takes up or gives off hardly any heat (ΔH° = {enthalpy} kJ/mol), so K hardly changes with temperature."
        }
        C::HeatBalanced => {
            "K changes with temperature (ΔH° = {enthalpy} kJ/mol), but in a fixed volume the pressure changes with it, and here the two cancel."
        }
        C::HeatUnknown => {
            "Nothing says how K changes with temperature: give K with its enthalpy, or at two temperatures."
        }
        C::WarmVolumeForward => {
            "In a fixed volume heating also raises the pressure, which favours the side with less gas. That outweighs what heat does to K (ΔH° = {enthalpy} kJ/mol) and moves the mixture forward."
        }
        C::WarmVolumeReverse => {
            "In a fixed volume heating also raises the pressure, which favours the side with less gas. That outweighs what heat does to K (ΔH° = {enthalpy} kJ/mol) and moves the mixture back."
        }
        C::PressureForward => {
            "The forward reaction turns {from} mol of gas into {to} mol: less gas, so a higher pressure moves the mixture forward."
        }
        C::PressureReverse => {
            "The forward reaction turns {from} mol of gas into {to} mol: more gas, so a higher pressure moves the mixture back."
        }
        C::PressureNone => {
            "Both sides hold the same amount of gas ({from} mol), so pressure cancels out of Q and moves nothing."
        }
        C::VolumeForward => {
            "The forward reaction turns {from} mol of gas into {to} mol: more gas, so a larger volume, which thins the gas, moves the mixture forward."
        }
        C::VolumeReverse => {
            "The forward reaction turns {from} mol of gas into {to} mol: less gas, so a larger volume, which thins the gas, moves the mixture back."
        }
        C::VolumeNone => {
            "Both sides hold the same amount of gas ({from} mol), so the volume cancels out of Q and moves nothing."
        }
        C::InertForward => {
            "At constant pressure an inert gas lowers the partial pressure of everything else, which favours the side with more gas: {from} mol becomes {to} mol, so the mixture moves forward."
        }
        C::InertReverse => {
            "At constant pressure an inert gas lowers the partial pressure of everything else, which favours the side with more gas: {from} mol becomes {to} mol, so the mixture moves back."
        }
        C::InertNone => {
            "An inert gas lowers all partial pressures alike, and both sides hold the same amount of gas ({from} mol), so this cancels out of Q and moves nothing."
        }
        C::InertInVolume => {
            "In a fixed volume more inert gas leaves every other partial pressure as it is, so in an ideal gas nothing moves; only the total pressure rises."
        }
        C::DilutionForward => {
            "More water thins all solutes; the forward reaction turns {from} mol of solutes into {to} mol, and dilution favours the side with more, so the solution moves forward."
        }
        C::DilutionReverse => {
            "More water thins all solutes; the forward reaction turns {from} mol of solutes into {to} mol, and dilution favours the side with more, so the solution moves back."
        }
        C::DilutionNone => {
            "Both sides hold the same amount of solutes ({from} mol), so the amount of water cancels out of Q and moves nothing."
        }
        C::ReactantAdded => {
            "{species} is a reactant: more of it lowers Q, and the mixture moves forward."
        }
        C::ReactantAddedBack => {
            "{species} is a reactant, yet at constant pressure more of it also thins the other reactants. Above a fraction of {turning} that weighs more, and it stands at {fraction} at rest, so the mixture moves back."
        }
        C::ReactantRemoved => {
            "{species} is a reactant: less of it raises Q, and the mixture moves back."
        }
        C::ReactantRemovedForward => {
            "{species} is a reactant, yet at constant pressure less of it also makes the other reactants denser. Above a fraction of {turning} that weighs more, and it stands at {fraction} at rest, so the mixture moves forward."
        }
        C::ProductAdded => {
            "{species} is a product: more of it raises Q, and the mixture moves back."
        }
        C::ProductAddedForward => {
            "{species} is a product, yet at constant pressure more of it also thins the other products. Above a fraction of {turning} that weighs more, and it stands at {fraction} at rest, so the mixture moves forward."
        }
        C::ProductRemoved => {
            "{species} is a product: less of it lowers Q, and the mixture moves forward."
        }
        C::ProductRemovedBack => {
            "{species} is a product, yet at constant pressure less of it also makes the other products denser. Above a fraction of {turning} that weighs more, and it stands at {fraction} at rest, so the mixture moves back."
        }
        C::ShareBalanced => {
            "{species} stands at the fraction where its own effect on Q and the thinning of the others cancel ({turning}), so a small change of it moves nothing."
        }
        C::BystanderForward => {
            "{species} takes no part, but more of it thins the others, which favours the side with more of them: the mixture moves forward."
        }
        C::BystanderReverse => {
            "{species} takes no part, but more of it thins the others, which favours the side with more of them: the mixture moves back."
        }
        C::BystanderNone => "{species} takes no part, and Q does not depend on it.",
        C::PureAdded => {
            "{species} is a phase of its own: its activity is the same however much of it there is, so more of it moves nothing."
        }
        C::PureRemoved => {
            "{species} is a phase of its own: its activity is the same as long as some of it is left, so taking some away moves nothing until it is gone."
        }
        C::Needed => {
            "{species} is used up at rest and the reaction would go on if there were more: what is added reacts."
        }
        C::UsedUp => {
            "{species} is used up at rest, so a small change moves nothing as long as it stays used up."
        }
        C::UsedUpUntil => {
            "{species} is used up at rest, so a small change moves nothing; the border beyond which some of it is left lies at {border}."
        }
        C::CrossesForward => {
            "A very small step would move the mixture back; this one goes past the turning point and moves it forward."
        }
        C::CrossesReverse => {
            "A very small step would move the mixture forward; this one goes past the turning point and moves it back."
        }
        C::Opens => "{species} was missing; with some of it there the reaction can run.",
        C::NothingCanMove => {
            "Something that each side needs is absent, so the reaction can run neither way."
        }
        C::AnyExtent => {
            "Q is K at every extent here, so rest is not one state: the smallest change that moves Q or K sends the reaction to one of its limits."
        }
        C::RanToLimit => {
            "Q does not change as the reaction runs, so it runs until {species} is used up, and a small change moves nothing."
        }
        C::NoLimit => {
            "Q does not reach K at any extent, and what would be used up is not known in amount: there is no state at rest to compare."
        }
        C::OutOfRange => "The step leads outside the range that can be worked with.",
        C::CoefficientsForward => {
            "This changes how the ions shield each other, or the activity of the water, and that decides here: the solution moves forward."
        }
        C::CoefficientsReverse => {
            "This changes how the ions shield each other, or the activity of the water, and that decides here: the solution moves back."
        }
    }
}
