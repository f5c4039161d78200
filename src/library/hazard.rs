//! What a species does to people and plant, in a word.

/// Formulas by hazard. Source: the harmonised classification of Regulation (EC) No 1272/2008, Annex
/// VI, and usual safety data sheets; from memory, shortened to one word each. A formula that is not
/// here is not thereby harmless.
const HAZARDS: [(&str, &[&str]); 4] = [
    (
        "toxic",
        &[
            "CO", "H2S", "SO2", "SO3", "Cl2", "HCl", "HF", "HBr", "Br2", "F2", "NH3", "NO", "NO2",
            "N2O4", "HCN", "COCl2", "COS", "CS2", "PH3", "AsH3", "CH3OH", "CH2O", "C6H6", "CCl4",
            "CHCl3", "CH3Cl", "C2H3Cl", "Hg", "H2SO4", "PCl3", "PCl5", "SiCl4", "TiCl4", "SO2Cl2",
            "SOCl2", "N2H4", "HNO3", "HOCl", "Ni(CO)4", "C6H5NH2", "C6H5OH", "CH3NH2", "C2H4O",
            "C2H4Cl2", "CH2CHCN", "CH2Cl2", "Fe(CO)5", "N2O3", "N2O5", "NOCl", "SiF4", "O3", "P4",
            "HNCO", "HgO", "PbO", "PbSO4", "I2", "HI",
        ],
    ),
    (
        "flammable",
        &[
            "CO",
            "H2",
            "H2S",
            "NH3",
            "HCN",
            "CS2",
            "COS",
            "PH3",
            "AsH3",
            "CH4",
            "C2H2",
            "C2H4",
            "C2H6",
            "C3H6",
            "C3H8",
            "C4H6",
            "C4H8",
            "C4H10",
            "C5H12",
            "C6H6",
            "C6H12",
            "C6H14",
            "C7H8",
            "C8H8",
            "C8H10",
            "CH3OH",
            "C2H5OH",
            "C3H7OH",
            "CH3OCH3",
            "CH2O",
            "CH3CHO",
            "CH3COOH",
            "HCOOH",
            "HCOOCH3",
            "CH3COOCH3",
            "CH3COOC2H5",
            "CH3COCH3",
            "CH3Cl",
            "C2H3Cl",
            "C2H4O",
            "SiH4",
            "SiHCl3",
            "N2H4",
            "CH3NH2",
            "C6H5NH2",
            "Mg",
            "Al",
            "Zn",
            "Na",
            "K",
            "S",
        ],
    ),
    (
        "corrosive",
        &[
            "SO3", "H2SO4", "Cl2", "HCl", "HF", "HBr", "Br2", "NH3", "NO2", "N2O4", "HNO3",
            "H3PO4", "NaOH", "KOH", "CaO", "Ca(OH)2", "HCOOH", "CH3COOH", "PCl3", "PCl5", "SiCl4",
            "TiCl4", "SO2Cl2", "SOCl2", "AlCl3", "FeCl3", "ZnCl2", "P4O10", "H2O2", "N2H4",
            "C6H5OH", "HOCl", "COCl2", "HI", "I2", "NOCl", "N2O5", "SiF4", "P4",
        ],
    ),
    (
        "oxidising",
        &[
            "O2", "Cl2", "F2", "NO2", "N2O4", "N2O", "HNO3", "H2O2", "HOCl", "SO3", "O3", "N2O5",
            "NH4NO3", "NaNO3",
        ],
    ),
];

/// The hazards of a formula, in a word each; none is known for most.
///
/// ```
/// use shiftgauge::library::hazards;
/// assert_eq!(hazards("CO").collect::<Vec<_>>(), ["toxic", "flammable"]);
/// assert_eq!(hazards("N2").count(), 0);
/// ```
pub fn hazards(formula: &str) -> impl Iterator<Item = &'static str> + '_ {
    let rows = HAZARDS.iter().filter(move |(_, formulas)| formulas.contains(&formula));
    rows.map(|(hazard, _)| *hazard)
}
