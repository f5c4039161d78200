"""The dissolved species of the library, and where their figures come from.

The standard state is the ideal solution of 1 mol/kg. ΔfG° and S° of the hydrogen ion are zero at
every temperature, so its ΔfH° and C°p are zero too, and every ion's entropy of formation counts
the hydrogen that balances its charge.

How a species gets its figures:
("codata", H, uH, S, uS)  key values with their 95 % half-widths, recalled from memory
("ion",)                  ΔfG° and S° of the CRC table of aqueous ions; ΔfH° follows from them
("recalled", G, S)        ΔfG° and S° of the NBS tables, or of the source named after them, recalled
                          from memory; ΔfH° follows
("henry", gas)            a gas of the library and Henry's constant of Sander's compilation
("formed", parts, log10 K, ΔrH)  species of the library and a measured equilibrium that forms it
                          from them, recalled from memory

C°p is constant: that of the CRC table, else of CP_RECALLED, else for "henry" and "formed" the sum
of the parts' (ΔrH° is then constant), else zero. Where it is published the range is 0 to 100 °C,
where it is not 15 to 35 °C.
"""

from library_species import Species


def ion(formula, names, cas, how=("ion",), **more):
    return Species(formula, "aq", names, cas, how, **more)


def molecule(formula, names, cas, how, **more):
    return Species(formula, "aq", names, cas, how, **more)


# ΔfG° and S° of the CRC table go back to the NBS tables of 1982 and carry 0.1 kJ/mol of rounding.
DISSOLVED = [
    ion("H^+", "hydrogen ion;proton", "12408-02-5", element=True),
    ion("OH^-", "hydroxide ion;hydroxide", "14280-30-9", ("codata", -230.015, 0.040, -10.90, 0.20)),
    ion("Li^+", "lithium ion", "17341-24-1", ("codata", -278.47, 0.08, 12.24, 0.15)),
    ion("Na^+", "sodium ion", "17341-25-2", ("codata", -240.34, 0.06, 58.45, 0.15)),
    ion("K^+", "potassium ion", "24203-36-9", ("codata", -252.14, 0.08, 101.20, 0.20)),
    ion("NH4^+", "ammonium ion;ammonium", "14798-03-9",
        ("formed", {"NH3.aq": 1, "H^+.aq": 1}, 9.245, -52.21, "bates"), floor=0.05),
    ion("Ag^+", "silver ion", "14701-21-4", ("codata", 105.79, 0.08, 73.45, 0.40)),
    ion("Mg^2+", "magnesium ion", "22537-22-0", ("codata", -467.0, 0.6, -137.0, 4.0)),
    ion("Ca^2+", "calcium ion", "14127-61-8", ("codata", -543.0, 1.0, -56.2, 1.0),
        apart="CODATA's S° is 3.1 J/(mol K) lower, and calcite's solubility bears it out"),
    ion("Sr^2+", "strontium ion", "22537-39-9", floor=1.0),
    ion("Ba^2+", "barium ion", "22541-12-4", floor=1.0),
    ion("Mn^2+", "manganese(II) ion", "16397-91-4", floor=1.0),
    ion("Fe^2+", "iron(II) ion;ferrous ion", "15438-31-0", ("recalled", -90.53, -101.6, "parker"),
        floor=0.5, apart="the CRC table keeps the older iron, 11.6 kJ/mol higher"),
    ion("Fe^3+", "iron(III) ion;ferric ion", "20074-52-6", ("recalled", -16.28, -278.4, "parker"),
        floor=1.0, apart="the CRC table keeps the older iron, 11.6 kJ/mol higher"),
    ion("Ni^2+", "nickel(II) ion", "14701-22-5", floor=2.0),
    ion("Cu^2+", "copper(II) ion;cupric ion", "15158-11-9", ("codata", 64.9, 1.0, -98.0, 4.0),
        apart="CODATA's S° is 1.6 J/(mol K) higher, inside its own 4"),
    ion("Zn^2+", "zinc ion", "23713-49-7", ("codata", -153.39, 0.20, -109.8, 0.5),
        apart="CODATA's S° is 2.3 J/(mol K) higher"),
    ion("Pb^2+", "lead(II) ion", "14280-50-3", ("codata", 0.92, 0.25, 18.5, 1.0),
        apart="CODATA has 0.9 kJ/mol and 18.5 J/(mol K) where the CRC table has -1.7 and 10.5"),
    ion("Al^3+", "aluminium ion;aluminum ion", "22537-23-1",
        ("formed", {"Al(OH)3.s.gibbsite": 1, "H^+.aq": 3, "H2O.l": -3}, 7.74, -105.0, "palmer"),
        floor=1.0, apart="the CRC table's ΔfG° is 2.7 kJ/mol higher, CODATA's 3.9 lower"),
    ion("Al(OH)4^-", "aluminate ion;tetrahydroxoaluminate ion", "14485-39-3", floor=1.5),
    ion("F^-", "fluoride ion;fluoride", "16984-48-8", ("codata", -335.35, 0.65, -13.8, 0.8),
        apart="CODATA lowered fluoride and HF together by 2.7 kJ/mol"),
    ion("Cl^-", "chloride ion;chloride", "16887-00-6", ("codata", -167.080, 0.10, 56.60, 0.20)),
    ion("Br^-", "bromide ion;bromide", "24959-67-9", ("codata", -121.41, 0.15, 82.55, 0.20)),
    ion("I^-", "iodide ion;iodide", "20461-54-5", ("codata", -56.78, 0.05, 106.45, 0.30),
        apart="CODATA lowered iodide by 1.6 kJ/mol and 4.9 J/(mol K)"),
    ion("ClO^-", "hypochlorite ion;hypochlorite", "14380-61-1", floor=0.5),
    ion("NO2^-", "nitrite ion;nitrite", "14797-65-0", floor=0.7),
    ion("NO3^-", "nitrate ion;nitrate", "14797-55-8", ("codata", -206.85, 0.40, 146.70, 0.40)),
    ion("HS^-", "hydrogen sulfide ion;hydrosulfide ion;bisulfide ion", "15035-72-0",
        ("codata", -16.3, 1.5, 67.0, 5.0),
        apart="CODATA's S° is 4.2 J/(mol K) higher, inside its own 5"),
    ion("SO3^2-", "sulfite ion;sulphite ion", "14265-45-3",
        ("formed", {"HSO3^-.aq": 1, "H^+.aq": -1}, -7.172, -3.65, "goldberg"), floor=0.4),
    ion("HSO3^-", "hydrogen sulfite ion;bisulfite ion;hydrogen sulphite ion", "15181-46-1",
        ("formed", {"SO2.aq": 1, "H2O.l": 1, "H^+.aq": -1}, -1.857, -17.80, "goldberg"), floor=0.4),
    ion("SO4^2-", "sulfate ion;sulphate ion", "14808-79-8", ("codata", -909.34, 0.40, 18.50, 0.40),
        apart="CODATA's S° is 1.6 J/(mol K) lower"),
    ion("HSO4^-", "hydrogen sulfate ion;bisulfate ion;hydrogen sulphate ion", "14996-02-2",
        ("codata", -886.9, 1.0, 131.7, 3.0)),
    ion("S2O3^2-", "thiosulfate ion;thiosulphate ion", "14383-50-7", floor=2.0),
    ion("CO3^2-", "carbonate ion;carbonate", "3812-32-6", ("codata", -675.23, 0.25, -50.0, 1.0),
        apart="CODATA's S° is 6.9 J/(mol K) higher, and calcite's solubility bears it out"),
    ion("HCO3^-", "hydrogen carbonate ion;bicarbonate ion;bicarbonate", "71-52-3",
        ("codata", -689.93, 0.20, 98.4, 0.5),
        apart="CODATA's S° is 7.2 J/(mol K) higher, and the pKa of CO2 bears it out"),
    ion("H2PO4^-", "dihydrogen phosphate ion", "14066-20-7", floor=1.5),
    ion("HPO4^2-", "hydrogen phosphate ion", "14066-19-4", floor=1.5),
    ion("PO4^3-", "phosphate ion", "14265-44-2", floor=1.5),
    ion("CH3COO^-", "acetate ion;acetate", "71-50-1", floor=0.5),
    ion("HCOO^-", "formate ion;formate", "71-47-6", floor=0.5),
    ion("CrO4^2-", "chromate ion", "13907-45-4", floor=3.0),
    ion("Cr2O7^2-", "dichromate ion", "13907-47-6", floor=5.0),
    molecule("CO2", "dissolved carbon dioxide;carbonic acid;H2CO3", "124-38-9",
             ("codata", -413.26, 0.20, 119.36, 0.60)),
    molecule("H2S", "dissolved hydrogen sulfide;dissolved hydrogen sulphide", "7783-06-4",
             ("codata", -38.6, 1.5, 126.0, 5.0)),
    molecule("SO2", "dissolved sulfur dioxide;dissolved sulphur dioxide;sulfurous acid;H2SO3",
             "7446-09-5", ("recalled", -300.676, 161.9), floor=0.3),
    molecule("NH3", "dissolved ammonia;ammonia water;ammonium hydroxide;NH4OH", "7664-41-7",
             ("formed", {"NH3.g": 1}, 1.778, -34.2, "clegg"), floor=0.1),
    molecule("HF", "dissolved hydrogen fluoride;hydrofluoric acid", "7664-39-3",
             ("formed", {"F^-.aq": 1, "H^+.aq": 1}, 3.17, 12.6, "broene"), floor=0.1),
    molecule("CH3COOH", "dissolved acetic acid", "64-19-7", ("recalled", -396.46, 178.7), floor=0.5),
    molecule("HCOOH", "dissolved formic acid", "64-18-6", ("recalled", -372.3, 163.0), floor=0.5),
    molecule("H3PO4", "phosphoric acid;orthophosphoric acid", "7664-38-2",
             ("recalled", -1142.54, 158.2), floor=1.5),
    molecule("HOCl", "hypochlorous acid;HClO", "7790-92-3", ("recalled", -79.9, 142.0), floor=0.5),
    molecule("Cl2", "dissolved chlorine;chlorine water", "7782-50-5", ("recalled", 6.94, 121.0),
             floor=0.3),
    molecule("CH4", "dissolved methane", "74-82-8",
             ("formed", {"CH4.g": 1}, -2.855, -13.8, "wilhelm"), floor=0.1),
    molecule("O2", "dissolved oxygen", "7782-44-7", ("henry", "O2.g"), floor=0.1),
    molecule("N2", "dissolved nitrogen", "7727-37-9", ("henry", "N2.g"), floor=0.1),
    molecule("H2", "dissolved hydrogen", "1333-74-0", ("henry", "H2.g"), floor=0.1),
    molecule("CO", "dissolved carbon monoxide", "630-08-0", ("henry", "CO.g"), floor=0.1),
]

# C°p at 298.15 K in J/(mol K), recalled from memory, of species that the CRC table has none for
# and whose constants matter over a range of temperature.
CP_RECALLED = {
    "CO2.aq": 243.0, "HCO3^-.aq": -35.4, "CO3^2-.aq": -291.0, "Ca^2+.aq": -31.5,
    "Mg^2+.aq": -22.3, "NH3.aq": 74.9, "CH3COOH.aq": 169.7,
}
KNOWN_RANGE_K, BLIND_RANGE_K = (273.15, 373.15), (288.15, 308.15)

# ΔfG° of a key value may leave the CRC table's by this, kJ/mol, without and with a reason.
GIBBS_LIMIT, GIBBS_LIMIT_APART = 0.8, 12.0
# log10 of Henry's constant, in mol/(kg bar), may leave Sander's compilation by this. The
# compilation has two averages a gas, one at 298.15 K and one from fits over temperature; they
# differ from one another by up to 0.25, and the nearer one is taken.
HENRY_LIMIT = 0.06
HENRY_COMPARED = ("CO2", "H2S", "SO2", "NH3", "CH4", "Cl2", "O2", "N2", "H2", "CO", "HF")
HENRY_APART = {"HF": "dissociation is counted in the compilation", "Cl2": "hydrolysis, likewise"}

# The JANAF table of each element's reference state at 298.15 K, and how many atoms it has.
ELEMENTS = {
    "H": ("H-050", 2), "O": ("O-029", 2), "N": ("N-023", 2), "Cl": ("Cl-073", 2),
    "F": ("F-054", 2), "Br": ("Br-038", 2), "I": ("I-023", 2), "C": ("C-002", 1),
    "S": ("S-002", 1), "P": ("P-002", 1), "Li": ("Li-002", 1), "Na": ("Na-002", 1),
    "K": ("K-002", 1), "Mg": ("Mg-002", 1), "Ca": ("Ca-002", 1), "Sr": ("Sr-002", 1),
    "Ba": ("Ba-002", 1), "Mn": ("Mn-002", 1), "Fe": ("Fe-003", 1), "Ni": ("Ni-002", 1),
    "Cu": ("Cu-002", 1), "Zn": ("Zn-002", 1), "Pb": ("Pb-002", 1), "Al": ("Al-002", 1),
    "Cr": ("Cr-002", 1), "Si": ("Si-002", 1), "Ti": ("Ti-002", 1), "V": ("V-002", 1),
    "Hg": ("Hg-002", 1), "B": ("B-001", 1), "Be": ("Be-001", 1), "Co": ("Co-001", 1),
    "Cs": ("Cs-001", 1), "Ga": ("Ga-001", 1), "Hf": ("Hf-001", 1), "Mo": ("Mo-001", 1),
    "Nb": ("Nb-001", 1), "Rb": ("Rb-001", 1), "Ta": ("Ta-001", 1), "W": ("W-001", 1),
    "Zr": ("Zr-001", 1), "He": ("He-001", 1), "Ne": ("Ne-001", 1), "Ar": ("Ar-001", 1),
    "Kr": ("Kr-001", 1), "Xe": ("Xe-001", 1),
}
# Elements that JANAF has not: the CAS number of the reference state in the CRC table.
OTHER_ELEMENTS = {
    "As": "7440-38-2", "Au": "7440-57-5", "Bi": "7440-69-9", "Cd": "7440-43-9", "Ce": "7440-45-1",
    "Ge": "7440-56-4", "In": "7440-74-6", "La": "7439-91-0", "Pd": "7440-05-3", "Pt": "7440-06-4",
    "Re": "7440-15-5", "Rh": "7440-16-6", "Sb": "7440-36-0", "Sc": "7440-20-2", "Se": "7782-49-2",
    "Te": "13494-80-9", "Th": "7440-29-1", "Tl": "7440-28-0", "U": "7440-61-1",
    "Y": "7440-65-5",
}
# CODATA, recalled from memory: JANAF has no silver, and the CRC table's tin is the grey one.
RECALLED_ENTROPIES = {"Ag": 42.55, "Sn": 51.18}
