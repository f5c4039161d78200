//! Sentences: the bare calls.

use crate::problem::EquilibriumCode as C;

pub(super) fn template(code: C) -> (&'static str, &'static str) {
    match code {
        C::Shape => ("{found}", "{hint}"),
        C::LengthsDiffer => (
            "{found} {what} are given for {expected} species; one for each species is needed.",
            "Give one number for each species, with 0 for a species that takes no part.",
        ),
        C::TooManySpecies => (
            "{found} species are given; at most {most} are allowed.",
            "Leave out the species that take no part, or join the inert gases into one.",
        ),
        C::NotFinite => (
            "The number is not finite; an ordinary number is needed.",
            "Look for a division by zero or an overflow where this number was made.",
        ),
        C::NuOutOfRange => (
            "The stoichiometric number {found} is out of range; 0, or {least} to {most} with \
             either sign, is allowed.",
            "Divide the whole reaction by a common factor, and ln K with it.",
        ),
        C::NothingReacts => (
            "Every stoichiometric number is zero; at least one must not be.",
            "Give the reactants negative numbers and the products positive ones.",
        ),
        C::AmountOutOfRange => (
            "The amount {found} mol is out of range; 0 to {most} mol is allowed.",
            "Give amounts, not changes: what is absent has the amount 0.",
        ),
        C::LnKOutOfRange => (
            "ln K is {found}; at most {most} with either sign is allowed.",
            "Check that this is the natural logarithm of K and not K itself.",
        ),
        C::TemperatureNotPositive => (
            "The temperature is {found} K; it must be above 0 K.",
            "Give the absolute temperature: 25 °C is 298.15 K.",
        ),
        C::PressureNotPositive => (
            "The pressure is {found} Pa; it must be above 0 Pa.",
            "Give the absolute pressure: add the atmosphere to a gauge reading.",
        ),
        C::VolumeNotPositive => (
            "The volume is {found} m3; it must be above 0 m3.",
            "Give the volume of the gas or of the solution in cubic metres: 1 L is 0.001 m3.",
        ),
        C::SolutesWithGas => (
            "Solutes and gases react together, and the water of the solution is not given.",
            "Give the mass of the water, or solve the gas and the solution as two problems.",
        ),
        C::SolutesHoldPressure => (
            "Solutes are given with a pressure held; a solution needs a volume or a mass of water.",
            "Hold the volume and give that of the solution, or give the mass of its water.",
        ),
        C::NoReaction => (
            "No reaction is given; one is needed.",
            "Give one reaction with a stoichiometric number for each species.",
        ),
        C::ManyReactions => (
            "{found} reactions are given; many reactions are not solved by this version.",
            "Solve for one reaction, the one that is fast on this catalyst.",
        ),
        C::LiquidWithSolutes => (
            "A liquid mixture and a solution in water are given together; a problem holds one.",
            "Leave out the solution, or give the liquid as pure phases.",
        ),
        C::GasHoldsSolvent => (
            "A gas reacts, and only the water of the solution is given.",
            "Give the pressure or the volume of the gas too.",
        ),
        C::WaterNotPositive => (
            "The mass of water is {found} kg; it must be above 0 kg.",
            "Give the mass of the water in the solution, not that of the solutes.",
        ),
        C::ModelNeedsWater => (
            "Activity coefficients go by moles per kilogram of water, and no mass of water is given.",
            "Give the mass of the water, or take the solution as ideal.",
        ),
        C::ChargeOutOfRange => (
            "The charge {found} is out of range; −{most} to +{most} is allowed.",
            "Give the charge of one ion, in elementary charges.",
        ),
        C::IonSizeOutOfRange => (
            "The size of an ion, {found} pm, is out of range; {least} to {most} pm is allowed.",
            "Give the distance of closest approach in picometres: 400 is usual.",
        ),
    }
}
