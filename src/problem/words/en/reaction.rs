//! Sentences: formulas and equations.

use crate::problem::ReactionCode as C;

pub(super) fn template(code: C) -> (&'static str, &'static str) {
    match code {
        C::Empty => ("No equation is written.", "Write one such as CO + H2O = CO2 + H2."),
        C::EquationTooLong => (
            "The equation has {found} characters; {limit} are read.",
            "Write each reaction as an equation of its own.",
        ),
        C::TooManySpecies => (
            "The equation has {found} species; {limit} are taken.",
            "Write each reaction as an equation of its own.",
        ),
        C::NoArrow => (
            "“{found}” has no sign between its left and its right side.",
            "Put = between what reacts and what forms, as in CO + H2O = CO2 + H2.",
        ),
        C::ManyArrows => (
            "A second {found} stands here; one sign divides an equation.",
            "Write each step as an equation of its own, and formulas without bonds, such as C2H4.",
        ),
        C::LeftEmpty => {
            ("Nothing stands on the left of the equation.", "Write what reacts before the = sign.")
        }
        C::RightEmpty => {
            ("Nothing stands on the right of the equation.", "Write what forms after the = sign.")
        }
        C::TermEmpty => (
            "A plus sign has no species on one side of it.",
            "Write the species, or take the plus sign out.",
        ),
        C::CoefficientBad => (
            "“{found}” is no coefficient; whole numbers, decimals and fractions are.",
            "Write it as 2, 0.5 or 1/2.",
        ),
        C::CoefficientZero => (
            "The coefficient is zero, so the species takes no part.",
            "Leave the species out, or correct its coefficient.",
        ),
        C::CoefficientTooLarge => (
            "The coefficient {found} is out of range; up to {limit}, or parts as small, are taken.",
            "Check its digits.",
        ),
        C::CoefficientAlone => (
            "The number {found} has no formula after it.",
            "Write the formula after the number, and a charge with ^, as in Ca^2+.",
        ),
        C::FormulaEmpty => ("A formula is missing here.", "Write one such as SO2 or H2O(g)."),
        C::FormulaTooLong => (
            "The formula is too long; up to {limit} characters are read.",
            "Write the sum of its atoms, such as C6H12O6.",
        ),
        C::FormulaCharacter => (
            "“{found}” has no meaning at this place in a formula.",
            "Write symbols, counts, brackets, · before water of crystallisation, and ^ before a charge.",
        ),
        C::FormulaSpace => (
            "A space stands inside “{found}”.",
            "Put + between two species, or take the space out.",
        ),
        C::FormulaCapitals => (
            "“{found}” is no formula: no element has the symbol {symbol}, and capitals matter.",
            "Write {suggestion}.",
        ),
        C::Bracket => (
            "The bracket {found} has no partner of its kind.",
            "Close each bracket that opens, as in Ca(OH)2.",
        ),
        C::PartEmpty => (
            "No atoms stand before a dot, in a pair of brackets or at the end of “{found}”.",
            "Write the atoms, as in CuSO4·5H2O.",
        ),
        C::CountZero => (
            "The count {found} is zero or begins with a zero.",
            "Write the letter O for oxygen, or correct the count.",
        ),
        C::ZeroForLetter => {
            ("“{found}” has a zero where the letter O seems to be meant.", "Write {suggestion}.")
        }
        C::CountTooLarge => (
            "The count {found} is out of range; up to {limit}, or parts as small, are taken.",
            "Check its digits.",
        ),
        C::ElementUnknown => (
            "No element has the symbol {symbol}.",
            "Check the symbol and its capitals; {near} may be meant.",
        ),
        C::Electron => (
            "“{found}” is an electron: an electrode reaction needs a potential, which this program does not work with.",
            "Add the other half reaction, so that the electrons cancel.",
        ),
        C::ChargeBad => (
            "“{found}” is no charge.",
            "Write a number and a sign after ^, as in SO4^2-, or a sign alone, as in H+.",
        ),
        C::ChargeOrder => (
            "The charge of “{found}” has its sign before its number; IUPAC puts the number first.",
            "Write {suggestion}.",
        ),
        C::ChargeAmbiguous => (
            "“{found}” can be read as {first} or as {second}.",
            "Write the one that is meant, with ^ before the charge.",
        ),
        C::ChargeTooLarge => (
            "The charge of “{found}” is out of range; up to {limit} is taken.",
            "Check the number before the sign.",
        ),
        C::PhaseUnknown => (
            "“{found}” is no phase; (g), (l), (s) and (aq) are.",
            "Write a name after the phase, as in C(s, graphite).",
        ),
        C::PhaseUnknownLike => {
            ("“{found}” is no phase; (g), (l), (s) and (aq) are.", "Write {suggestion}.")
        }
        C::FormEmpty => (
            "The name after the comma is missing.",
            "Write it, as in C(s, graphite), or take the comma out.",
        ),
        C::FormBad => (
            "“{found}” is no name of a form; letters, digits, spaces and - , . ' are taken, up to {limit}.",
            "Write a name such as graphite or alpha-quartz.",
        ),
        C::NothingHappens => (
            "Both sides are the same, so nothing reacts.",
            "Write the phases where one changes, as in H2O(l) = H2O(g).",
        ),
        C::ElementLeft => (
            "{element} ({name}) stands on the left only, in {found}, so nothing can balance it.",
            "Add what holds {element} on the right, or correct the formula.",
        ),
        C::ElementRight => (
            "{element} ({name}) stands on the right only, in {found}, so nothing can balance it.",
            "Add what holds {element} on the left, or correct the formula.",
        ),
        C::ChargeLeftOver => (
            "The atoms can be balanced but the charge cannot.",
            "Check the charges, and add the ions that carry the rest, such as H+ or OH-.",
        ),
        C::NoCombination => (
            "No coefficients balance every element at once.",
            "Check the formulas, and add the species that is missing, such as H2O or O2.",
        ),
        C::SeveralWays => (
            "The species balance in more than one way: {number} independent reactions go on among them: {reactions}.",
            "Write each reaction as an equation of its own, or give the coefficients.",
        ),
        C::TakesNoPart => (
            "{found} takes no part: only without it does the equation balance.",
            "Write {suggestion}.",
        ),
        C::WrongSide => {
            ("{found} stands on the wrong side for the equation to balance.", "Write {suggestion}.")
        }
        C::Unbalanced => (
            "The coefficients do not balance; left and right of the sign: {found}.",
            "Write {suggestion}.",
        ),
        C::UnbalancedOpen => (
            "The coefficients do not balance; left and right of the sign: {found}.",
            "Correct the coefficients; more than one set balances, so none is suggested.",
        ),
        C::TooLargeToBalance => (
            "The equation needs numbers that are out of range; coefficients up to {limit} are found.",
            "Round the counts in the formulas, or write fewer species.",
        ),
    }
}
