"""Which species the library holds, and where each one's figures come from."""

from dataclasses import dataclass


@dataclass
class Species:
    formula: str
    phase: str
    names: str
    cas: str
    how: tuple  # ("tm4513", file) | ("janaf", table, limits) | ("given", H, S, pieces) ...
    form: str = ""
    element: bool = False  # the reference state of its element: H°298 is zero
    janaf: str = ""  # the JANAF table that it is compared with
    floor: float = 0.0  # kJ/mol; the class of u(ΔfG°) where no better is known
    apart: str = ""  # why a second source may differ by more than the limit
    blunt: tuple = ()  # where a lambda peak of Cp is passed over; H and S still hold
    crc: bool = False  # ΔfH° and S° from the CRC table, with JANAF's Cp
    low: float = 0.0  # a lower limit below the table's first row, for a short, smooth reach

    @property
    def id(self):
        return ".".join(part for part in (self.formula, self.phase, self.form) if part)


def gas(formula, file, names, cas, janaf="", **more):
    return Species(formula, "g", names, cas, ("tm4513", file), janaf=janaf, **more)


def fitted(formula, phase, names, cas, table, limits, **more):
    return Species(formula, phase, names, cas, ("janaf", table, limits), janaf=table, **more)


SPECIES = [
    gas("H2", "H2", "hydrogen", "1333-74-0", "H-050", element=True),
    gas("O2", "O2", "oxygen", "7782-44-7", "O-029", element=True),
    gas("N2", "N2", "nitrogen", "7727-37-9", "N-023", element=True),
    gas("Cl2", "Cl2", "chlorine", "7782-50-5", "Cl-073", element=True),
    gas("Ar", "Ar", "argon", "7440-37-1", "Ar-001", element=True),
    gas("He", "He", "helium", "7440-59-7", "He-001", element=True),
    gas("CO", "C_O", "carbon monoxide", "630-08-0", "C-093"),
    gas("CO2", "C_O2", "carbon dioxide", "124-38-9", "C-095"),
    gas("H2O", "H2_O", "water vapour;steam;water vapor", "7732-18-5", "H-064"),
    gas("CH4", "C_H4", "methane", "74-82-8", "C-067",
        apart="TM-4513 revised methane: the Gibbs function is 1.0 J/(mol K) higher at 2000 K"),
    gas("C2H6", "C2_H6", "ethane", "74-84-0"),
    gas("C3H8", "C3_H8", "propane", "74-98-6"),
    gas("C2H4", "C2_H4", "ethylene;ethene", "74-85-1", "C-128"),
    gas("CH3OH", "C_H4_O", "methanol vapour;methanol;methyl alcohol", "67-56-1"),
    gas("CH2O", "C_H2_O", "formaldehyde;methanal", "50-00-0", "C-061",
        apart="JANAF keeps an older enthalpy of formation, -115.90 kJ/mol"),
    gas("HCOOH", "C_H2_O2", "formic acid vapour;formic acid", "64-18-6", floor=0.5),
    gas("C2H5OH", "C2_H6_O", "ethanol vapour;ethanol;ethyl alcohol", "64-17-5"),
    Species("CH3OCH3", "g", "dimethyl ether;methoxymethane", "115-10-6", ("poling",)),
    gas("SO2", "O2_S", "sulfur dioxide;sulphur dioxide", "7446-09-5", "O-034"),
    gas("SO3", "O3_S", "sulfur trioxide;sulphur trioxide", "7446-11-9", "O-058", floor=0.4),
    gas("SO", "O_S", "sulfur monoxide;sulphur monoxide", "13827-32-2", "O-010", floor=0.7),
    gas("H2SO4", "H2_O4_S", "sulfuric acid vapour;sulphuric acid vapour", "7664-93-9", "H-076",
        floor=2.0),
    gas("S2", "S2", "disulfur;sulfur vapour", "23550-45-0", "S-012"),
    fitted("S6", "g", "hexasulfur", "13798-23-7", "S-019", (298.15, 600, 1000, 1500), floor=2.0),
    gas("S8", "S8", "octasulfur", "10544-50-0", "S-021", floor=1.0),
    gas("H2S", "H2_S", "hydrogen sulfide;hydrogen sulphide", "7783-06-4", "H-080"),
    gas("COS", "C_O_S", "carbonyl sulfide;carbonyl sulphide", "463-58-1", "C-094", floor=0.5,
        apart="the CRC table keeps the older -142.0 kJ/mol; half the difference is the u here"),
    gas("CS2", "C_S2", "carbon disulfide;carbon disulphide", "75-15-0", "C-099", floor=0.4),
    gas("NH3", "H3_N", "ammonia", "7664-41-7", "H-083"),
    gas("NO", "N_O", "nitric oxide;nitrogen monoxide", "10102-43-9", "N-005"),
    gas("NO2", "N_O2", "nitrogen dioxide", "10102-44-0", "N-007",
        apart="TM-4513 revised NO2: the Gibbs function is 0.7 J/(mol K) higher at 2000 K"),
    gas("N2O", "N2_O", "nitrous oxide;dinitrogen monoxide", "10024-97-2", "N-026"),
    gas("N2O3", "N2_O3", "dinitrogen trioxide", "10544-73-7", "N-028",
        apart="JANAF's table of N2O3 rests on an older structure"),
    gas("N2O4", "N2_O4", "dinitrogen tetroxide", "10544-72-6", "N-032",
        apart="JANAF keeps an older enthalpy of formation, 9.08 kJ/mol"),
    gas("HNO3", "H_N_O3", "nitric acid vapour;nitric acid", "7697-37-2", "H-030",
        apart="TM-4513 revised HNO3: the Gibbs function is 1.6 J/(mol K) higher at 2000 K"),
    gas("HCl", "H_Cl", "hydrogen chloride", "7647-01-0", "Cl-026"),
    gas("COCl2", "C_Cl2_O", "phosgene;carbonyl chloride", "75-44-5", "C-025"),
    gas("NOCl", "Cl_N_O", "nitrosyl chloride", "2696-92-6", "Cl-051"),
    gas("HCN", "C_H_N", "hydrogen cyanide", "74-90-8", "C-052",
        apart="JANAF and TM-4513 keep an older enthalpy of formation, near 135 kJ/mol"),
    fitted("C", "s", "graphite;carbon", "7782-42-5", "C-002", (200, 400, 1000, 3000),
           form="graphite", element=True),
    fitted("S", "s", "rhombic sulfur;rhombic sulphur;sulfur;sulphur", "7704-34-9", "S-002",
           (200, 298.15, 368.3), form="rhombic", element=True),
    fitted("S", "s", "monoclinic sulfur;monoclinic sulphur", "7704-34-9", "S-003",
           (250, 298.15, 388.36), form="monoclinic", floor=0.02),
    fitted("S", "l", "liquid sulfur;liquid sulphur;molten sulfur", "7704-34-9", "S-004",
           (298.15, 400, 432.02, 450, 600, 1000), floor=0.05, blunt=(432.02,)),
    fitted("H2O", "l", "water;liquid water", "7732-18-5", "H-063", (280, 360, 500),
           low=273.15),
    Species("CH3OH", "l", "liquid methanol", "67-56-1", ("methanol",)),
    fitted("H2SO4", "l", "sulfuric acid;sulphuric acid;oil of vitriol", "7664-93-9", "H-075",
           (283.456, 600), floor=1.0),
    # The lime family takes ΔfH° and S° from one table, the CRC's, as its members share reactions.
    fitted("CaO", "s", "lime;quicklime;calcium oxide;burnt lime", "1305-78-8", "Ca-027",
           (200, 500, 2500), crc=True),
    fitted("Ca(OH)2", "s", "slaked lime;hydrated lime;calcium hydroxide", "1305-62-0", "Ca-020",
           (200, 500, 1000), crc=True, floor=0.5),
    Species("CaCO3", "s", "calcite;limestone;calcium carbonate", "471-34-1", ("calcite",),
            form="calcite", floor=0.7),
    Species("CaSO4", "s", "anhydrite;calcium sulfate;calcium sulphate", "7778-18-9",
            ("perry", 298.15), form="anhydrite", floor=2.0),
    fitted("MgO", "s", "magnesia;magnesium oxide;periclase", "1309-48-4", "Mg-008",
           (200, 500, 2500)),
    fitted("Mg(OH)2", "s", "magnesium hydroxide;brucite", "1309-42-8", "H-057", (200, 500, 1000),
           floor=1.0),
    fitted("MgCO3", "s", "magnesium carbonate;magnesite", "546-93-0", "C-079", (200, 500, 1000),
           floor=1.0,
           apart="the CRC table keeps the older -1095.8 kJ/mol; half the difference is the u here"),
    fitted("NH4Cl", "s", "ammonium chloride;sal ammoniac", "12125-02-9", "Cl-029",
           (298.15, 457.7, 800), floor=0.5,
           apart="the CRC table has an older Cp, 84.1; JANAF's curve holds to its transition"),
    fitted("Fe", "s", "iron", "7439-89-6", "Fe-003", (200, 800, 1000, 1042, 1100, 1184, 1665, 1809),
           element=True, blunt=(1042,)),
    fitted("Fe0.947O", "s", "wustite;wüstite", "17125-56-3", "Fe-001", (298.15, 1600), floor=1.0),
    fitted("Fe2O3", "s", "hematite;haematite;iron(III) oxide;ferric oxide", "1309-37-1", "Fe-030",
           (200, 500, 950, 1050, 1700), floor=1.0),
    fitted("Fe3O4", "s", "magnetite;iron(II,III) oxide", "1317-61-9", "Fe-032",
           (200, 500, 900, 1800), floor=1.0,
           apart="the CRC table keeps older figures; half the difference is the u here"),
]

# 95 % half-widths of the CODATA key values (Cox, Wagman and Medvedev, 1989), kJ/mol, recalled
# from memory: they serve as u where a value kept here is a key value without an ATcT figure.
CODATA = {"SO2.g": 0.20, "S2.g": 0.30, "H2S.g": 0.50, "CaO.s": 0.90, "MgO.s": 0.30}

# ΔfH° in kJ/mol and S° in J/(mol K) of CODATA, taken in place of the assessed set's: TM-4513's
# disulfur has 128.40 and 228.31, while JANAF agrees with the key values to 0.002 J/(mol K).
KEY_VALUES = {"S2.g": (128.60, 228.167)}

# Below this difference the enthalpy of the assessed set is kept; above it ATcT's is taken, kJ/mol.
ATCT_LIMIT = 0.15

# Largest difference from a second source that needs no reason: ΔfH° in kJ/mol, S° in J/(mol K).
SECOND_LIMITS = (1.5, 1.5)

SOURCES = {
    "tm4513": "McBride, Gordon and Reno, Coefficients for Calculating Thermodynamic and Transport "
    "Properties of Individual Species, NASA Technical Memorandum 4513, 1993. Cp/R and S/R as "
    "published; H set so that ΔfH°298 in J/mol is as published, whatever R it was made with; "
    "the upper piece joined to the lower so that H and S are continuous.",
    "janaf": "Chase, NIST-JANAF Thermochemical Tables, 4th edition, Journal of Physical and Chemical "
    "Reference Data Monograph 9, 1998. Cp fitted piece by piece; H and S exact at 298.15 K "
    "and at the ends of the pieces.",
    "atct": "Ruscic and Bross, Active Thermochemical Tables, version 1.112. Its ΔfH°298 replaces the "
    "older one where they differ by more than 0.15 kJ/mol, and its uncertainty is used (95 % "
    "half-width, halved).",
    "crc": "CRC Handbook of Chemistry and Physics, Standard Thermodynamic Properties of Chemical "
    "Substances.",
    "poling": "Poling, Prausnitz and O'Connell, The Properties of Gases and Liquids, 5th edition, "
    "McGraw-Hill, 2001: Cp of ideal gases; Antoine constants.",
    "zabransky": "Zábranský, Růžička, Majer and Domalski, Heat Capacity of Liquids, Journal of Physical "
    "and Chemical Reference Data Monograph 6, 1996.",
    "perry": "Perry's Chemical Engineers' Handbook, table 2-151, Heat Capacities of Inorganic "
    "Compounds.",
    "jacobs": "Jacobs, Kerrick and Krupka, The high-temperature heat capacity of natural calcite, "
    "Physics and Chemistry of Minerals 7 (1981) 55: Cp = -184.79 + 0.32322 T - 3688200/T^2 - "
    "1.2974e-4 T^2 + 3883.5/T^0.5 J/(mol K), to 1200 K. Recalled from memory; it gives 83.47 "
    "at 298.15 K (CRC table 83.5) and agrees with Perry's table 2-151 within its 3 %. Written "
    "here in powers of T.",
    "codata": "Cox, Wagman and Medvedev, CODATA Key Values for Thermodynamics, Hemisphere, 1989: 95 % "
    "half-widths, recalled from memory; u is half of them.",
}
