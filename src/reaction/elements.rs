//! The elements: symbols, names and standard atomic weights.

use std::cmp::Ordering;
use std::fmt;
use std::hash::{Hash, Hasher};

use super::element_table::{ELEMENTS, ISOTOPES};

/// A standard atomic weight, which in g/mol is the molar mass of the element's atoms.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Weight {
    /// The single value to calculate with, in g/mol.
    pub g_per_mol: f64,
    /// The standard's uncertainty of that value for any normal material, in g/mol.
    pub within: f64,
    /// The standard's interval, in g/mol, where normal materials differ.
    pub interval: Option<(f64, f64)>,
}

/// One element, or one of the isotopes D and T of hydrogen, which are conserved by themselves.
///
/// ```
/// use shiftgauge::reaction::Element;
/// let sulfur = Element::of("S").unwrap();
/// assert_eq!((sulfur.number, sulfur.name), (16, "sulfur"));
/// assert_eq!(sulfur.weight.unwrap().g_per_mol, 32.06);
/// assert!(Element::of("Tc").unwrap().weight.is_none());
/// ```
#[derive(Debug)]
pub struct Element {
    /// The atomic number.
    pub number: u8,
    /// The symbol as IUPAC writes it.
    pub symbol: &'static str,
    /// The English name as IUPAC spells it.
    pub name: &'static str,
    /// The standard atomic weight; none for an element with no characteristic isotopic
    /// composition on Earth.
    pub weight: Option<Weight>,
}

impl Element {
    /// The element of this symbol, capitals as written.
    #[must_use]
    pub fn of(symbol: &str) -> Option<&'static Element> {
        Element::all().find(|element| element.symbol == symbol)
    }

    /// All elements by atomic number, then D and T.
    pub fn all() -> impl Iterator<Item = &'static Element> {
        ELEMENTS.iter().chain(&ISOTOPES)
    }

    /// How far down a suggestion this element is put: a plant meets the first ones most.
    pub(super) fn rarity(&self) -> u32 {
        const COMMON: [&str; 40] = [
            "H", "O", "C", "N", "S", "Cl", "Na", "Ca", "Fe", "Mg", "K", "Al", "Si", "P", "F", "Cu",
            "Zn", "Ni", "Br", "I", "Mn", "Cr", "Ba", "Pb", "Co", "Ti", "Ag", "Hg", "V", "Li", "B",
            "Sn", "Mo", "W", "Pt", "As", "He", "Ar", "Sr", "Cd",
        ];
        let place = COMMON.iter().position(|symbol| *symbol == self.symbol);
        place.and_then(|place| u32::try_from(place).ok()).unwrap_or(40 + u32::from(self.number))
    }
}

impl PartialEq for Element {
    fn eq(&self, other: &Element) -> bool {
        self.symbol == other.symbol
    }
}

impl Eq for Element {}

impl Hash for Element {
    fn hash<H: Hasher>(&self, state: &mut H) {
        self.symbol.hash(state);
    }
}

impl PartialOrd for Element {
    fn partial_cmp(&self, other: &Element) -> Option<Ordering> {
        Some(self.cmp(other))
    }
}

impl Ord for Element {
    /// By atomic number, then D before T after hydrogen.
    fn cmp(&self, other: &Element) -> Ordering {
        let key = |element: &Element| (element.number, element.symbol != "H", element.symbol);
        key(self).cmp(&key(other))
    }
}

impl fmt::Display for Element {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        f.write_str(self.symbol)
    }
}
