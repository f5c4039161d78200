//! The elements with their standard atomic weights.
//!
//! Source: T. Prohaska et al., "Standard atomic weights of the elements 2021 (IUPAC Technical
//! Report)", Pure Appl. Chem. 94 (2022) 573, doi:10.1515/pac-2019-0603; evaluated from
//! measurements. Where the standard gives an interval because normal materials differ, the single
//! value is its abridged value, and the interval stands beside it.

use super::elements::{Element, Weight};

const fn single(
    number: u8,
    symbol: &'static str,
    name: &'static str,
    g_per_mol: f64,
    within: f64,
) -> Element {
    Element { number, symbol, name, weight: Some(Weight { g_per_mol, within, interval: None }) }
}

const fn spread(
    number: u8,
    symbol: &'static str,
    name: &'static str,
    g_per_mol: f64,
    within: f64,
    interval: (f64, f64),
) -> Element {
    let weight = Weight { g_per_mol, within, interval: Some(interval) };
    Element { number, symbol, name, weight: Some(weight) }
}

const fn none(number: u8, symbol: &'static str, name: &'static str) -> Element {
    Element { number, symbol, name, weight: None }
}

/// All 118 elements by atomic number.
pub(super) static ELEMENTS: [Element; 118] = [
    spread(1, "H", "hydrogen", 1.0080, 0.0002, (1.00784, 1.00811)),
    single(2, "He", "helium", 4.002602, 0.000002),
    spread(3, "Li", "lithium", 6.94, 0.06, (6.938, 6.997)),
    single(4, "Be", "beryllium", 9.0121831, 0.0000005),
    spread(5, "B", "boron", 10.81, 0.02, (10.806, 10.821)),
    spread(6, "C", "carbon", 12.011, 0.002, (12.0096, 12.0116)),
    spread(7, "N", "nitrogen", 14.007, 0.001, (14.00643, 14.00728)),
    spread(8, "O", "oxygen", 15.999, 0.001, (15.99903, 15.99977)),
    single(9, "F", "fluorine", 18.998403162, 0.000000005),
    single(10, "Ne", "neon", 20.1797, 0.0006),
    single(11, "Na", "sodium", 22.98976928, 0.00000002),
    spread(12, "Mg", "magnesium", 24.305, 0.002, (24.304, 24.307)),
    single(13, "Al", "aluminium", 26.9815384, 0.0000003),
    spread(14, "Si", "silicon", 28.085, 0.001, (28.084, 28.086)),
    single(15, "P", "phosphorus", 30.973761998, 0.000000005),
    spread(16, "S", "sulfur", 32.06, 0.02, (32.059, 32.076)),
    spread(17, "Cl", "chlorine", 35.45, 0.01, (35.446, 35.457)),
    spread(18, "Ar", "argon", 39.95, 0.16, (39.792, 39.963)),
    single(19, "K", "potassium", 39.0983, 0.0001),
    single(20, "Ca", "calcium", 40.078, 0.004),
    single(21, "Sc", "scandium", 44.955907, 0.000004),
    single(22, "Ti", "titanium", 47.867, 0.001),
    single(23, "V", "vanadium", 50.9415, 0.0001),
    single(24, "Cr", "chromium", 51.9961, 0.0006),
    single(25, "Mn", "manganese", 54.938043, 0.000002),
    single(26, "Fe", "iron", 55.845, 0.002),
    single(27, "Co", "cobalt", 58.933194, 0.000003),
    single(28, "Ni", "nickel", 58.6934, 0.0004),
    single(29, "Cu", "copper", 63.546, 0.003),
    single(30, "Zn", "zinc", 65.38, 0.02),
    single(31, "Ga", "gallium", 69.723, 0.001),
    single(32, "Ge", "germanium", 72.630, 0.008),
    single(33, "As", "arsenic", 74.921595, 0.000006),
    single(34, "Se", "selenium", 78.971, 0.008),
    spread(35, "Br", "bromine", 79.904, 0.003, (79.901, 79.907)),
    single(36, "Kr", "krypton", 83.798, 0.002),
    single(37, "Rb", "rubidium", 85.4678, 0.0003),
    single(38, "Sr", "strontium", 87.62, 0.01),
    single(39, "Y", "yttrium", 88.905838, 0.000002),
    single(40, "Zr", "zirconium", 91.224, 0.002),
    single(41, "Nb", "niobium", 92.90637, 0.00001),
    single(42, "Mo", "molybdenum", 95.95, 0.01),
    none(43, "Tc", "technetium"),
    single(44, "Ru", "ruthenium", 101.07, 0.02),
    single(45, "Rh", "rhodium", 102.90549, 0.00002),
    single(46, "Pd", "palladium", 106.42, 0.01),
    single(47, "Ag", "silver", 107.8682, 0.0002),
    single(48, "Cd", "cadmium", 112.414, 0.004),
    single(49, "In", "indium", 114.818, 0.001),
    single(50, "Sn", "tin", 118.710, 0.007),
    single(51, "Sb", "antimony", 121.760, 0.001),
    single(52, "Te", "tellurium", 127.60, 0.03),
    single(53, "I", "iodine", 126.90447, 0.00003),
    single(54, "Xe", "xenon", 131.293, 0.006),
    single(55, "Cs", "caesium", 132.90545196, 0.00000006),
    single(56, "Ba", "barium", 137.327, 0.007),
    single(57, "La", "lanthanum", 138.90547, 0.00007),
    single(58, "Ce", "cerium", 140.116, 0.001),
    single(59, "Pr", "praseodymium", 140.90766, 0.00001),
    single(60, "Nd", "neodymium", 144.242, 0.003),
    none(61, "Pm", "promethium"),
    single(62, "Sm", "samarium", 150.36, 0.02),
    single(63, "Eu", "europium", 151.964, 0.001),
    single(64, "Gd", "gadolinium", 157.25, 0.03),
    single(65, "Tb", "terbium", 158.925354, 0.000007),
    single(66, "Dy", "dysprosium", 162.500, 0.001),
    single(67, "Ho", "holmium", 164.930329, 0.000005),
    single(68, "Er", "erbium", 167.259, 0.003),
    single(69, "Tm", "thulium", 168.934219, 0.000005),
    single(70, "Yb", "ytterbium", 173.045, 0.010),
    single(71, "Lu", "lutetium", 174.9668, 0.0001),
    single(72, "Hf", "hafnium", 178.486, 0.006),
    single(73, "Ta", "tantalum", 180.94788, 0.00002),
    single(74, "W", "tungsten", 183.84, 0.01),
    single(75, "Re", "rhenium", 186.207, 0.001),
    single(76, "Os", "osmium", 190.23, 0.03),
    single(77, "Ir", "iridium", 192.217, 0.002),
    single(78, "Pt", "platinum", 195.084, 0.009),
    single(79, "Au", "gold", 196.966570, 0.000004),
    single(80, "Hg", "mercury", 200.592, 0.003),
    spread(81, "Tl", "thallium", 204.38, 0.01, (204.382, 204.385)),
    spread(82, "Pb", "lead", 207.2, 1.1, (206.14, 207.94)),
    single(83, "Bi", "bismuth", 208.98040, 0.00001),
    none(84, "Po", "polonium"),
    none(85, "At", "astatine"),
    none(86, "Rn", "radon"),
    none(87, "Fr", "francium"),
    none(88, "Ra", "radium"),
    none(89, "Ac", "actinium"),
    single(90, "Th", "thorium", 232.0377, 0.0004),
    single(91, "Pa", "protactinium", 231.03588, 0.00001),
    single(92, "U", "uranium", 238.02891, 0.00003),
    none(93, "Np", "neptunium"),
    none(94, "Pu", "plutonium"),
    none(95, "Am", "americium"),
    none(96, "Cm", "curium"),
    none(97, "Bk", "berkelium"),
    none(98, "Cf", "californium"),
    none(99, "Es", "einsteinium"),
    none(100, "Fm", "fermium"),
    none(101, "Md", "mendelevium"),
    none(102, "No", "nobelium"),
    none(103, "Lr", "lawrencium"),
    none(104, "Rf", "rutherfordium"),
    none(105, "Db", "dubnium"),
    none(106, "Sg", "seaborgium"),
    none(107, "Bh", "bohrium"),
    none(108, "Hs", "hassium"),
    none(109, "Mt", "meitnerium"),
    none(110, "Ds", "darmstadtium"),
    none(111, "Rg", "roentgenium"),
    none(112, "Cn", "copernicium"),
    none(113, "Nh", "nihonium"),
    none(114, "Fl", "flerovium"),
    none(115, "Mc", "moscovium"),
    none(116, "Lv", "livermorium"),
    none(117, "Ts", "tennessine"),
    none(118, "Og", "oganesson"),
];

/// The isotopes of hydrogen that have a symbol of their own; the weight is the mass of the atom.
///
/// Source: M. Wang et al., "The AME 2020 atomic mass evaluation (II)", Chinese Phys. C 45 (2021)
/// 030003, doi:10.1088/1674-1137/abddaf; measured.
pub(super) static ISOTOPES: [Element; 2] = [
    single(1, "D", "deuterium", 2.014_101_777_84, 0.000_000_000_02),
    single(1, "T", "tritium", 3.016_049_281_32, 0.000_000_000_08),
];
