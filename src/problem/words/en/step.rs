//! Sentences: the lines of the working.

use crate::problem::StepCode as C;

pub(in crate::problem::words) fn template(code: C) -> &'static str {
    match code {
        C::SpeciesGibbs => {
            "{species}, ν = {times}: H° = {enthalpy} kJ/mol, S° = {entropy} J/(mol K), G° = H° − T S° = {gibbs} kJ/mol at {temperature_k} K"
        }
        C::MeasuredK => {
            "Measured, and counted {times} times: {equation}: log10 K = {log10_k} at {temperature_k} K"
        }
        C::MeasuredGibbs => {
            "ΔG° = Σ −RT ln K of the measured equilibria + Σ ν G° of what is left = {gibbs} kJ/mol; ΔH° = {enthalpy} kJ/mol, ΔS° = {entropy} J/(mol K) at {temperature_k} K"
        }
        C::ReactionGibbs => {
            "ΔG° = Σ ν G° = {gibbs} kJ/mol; ΔH° = {enthalpy} kJ/mol, ΔS° = {entropy} J/(mol K) at {temperature_k} K"
        }
        C::StatedK => {
            "As stated: {stated}; for the reaction as written and p° = 1 bar, ln K = {ln_k} at {temperature_k} K"
        }
        C::Line => {
            "A straight line of ln K against 1/T through {points} points: ΔH° = {enthalpy} kJ/mol, no point further from it than {residual} in ln K; ln K = {ln_k} at {temperature_k} K"
        }
        C::Formula => {
            "By the formula, for the reaction as written and p° = 1 bar: ln K = {terms} = {ln_k} at {temperature_k} K"
        }
        C::KOfReading => {
            "K = Q of this reading, taken as at equilibrium: ln K = {ln_k} at {temperature_k} K"
        }
        C::K => {
            "K = exp(−ΔG°/RT) = exp({ln_k}) = {k}, with R = 8.314462618 J/(mol K), T = {temperature_k} K, p° = 1 bar"
        }
        C::Absolute => "P = {gauge} + {atmosphere} = {absolute} absolute",
        C::WetGas => "y = y(dry) × (1 − y(H2O)) with y(H2O) = {water}",
        C::Activity => {
            "a({species}) = y P/p° = {fraction} × {pressure_bar} bar / 1 bar = {activity}"
        }
        C::IonicStrength => "Ionic strength I = ½ Σ m z² = {strength} mol/kg",
        C::SoluteActivity => "a({species}) = γ m/m° = {coefficient} × {molality} = {activity}",
        C::LiquidActivity => "a({species}) = x = {activity}",
        C::SolventActivity => {
            "a({species}) = {activity}, the water of the solution, from its solutes"
        }
        C::Quotient => "Q = {formula} = {q}, ln Q = {ln_q}",
        C::OpenQuotient => "Q = {formula} is {q}",
        C::Gibbs => "ΔG = RT ln(Q/K) = {rt} kJ/mol × ({ln_q} − {ln_k}) = {gibbs} kJ/mol",
        C::TStar => "K(T*) = Q at T* = {t_star}; T − T* = {approach} K",

        C::Rest => {
            "At rest, holding {held}: ξ = {extent} mol on {basis} ({outcome}, {iterations} steps)"
        }
        C::RestCheck => "Check: ln Q at rest = {ln_q}, ln K = {ln_k}",
    }
}
