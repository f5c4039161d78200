"""Gases of which only ΔfH°, S° and Cp at 298.15 K are tabled: Cp at other T from the frequencies."""

from math import exp

from library_sources import R_EXACT
from library_species import CLASSES, Species

CM_K = 1.438776877  # hc/k in cm K, exact within its digits
MOLECULE, VAPOUR, RADICAL = CLASSES["molecule"], CLASSES["vapour"], CLASSES["radical"]

# Fundamental frequencies in 1/cm, each with its degeneracy, recalled from memory (Nakamoto's and
# Shimanouchi's tables). They are borne out by Cp at 298.15 K of the CRC table, where it has one.
FREQUENCIES = {
    "7783-81-5": ((667, 1), (533, 2), (626, 3), (186, 3), (202, 3), (143, 3)),  # UF6
    "7646-78-8": ((369, 1), (95, 2), (408, 3), (126, 3)),  # SnCl4
    "7789-67-5": ((222, 1), (59, 2), (284, 3), (88, 3)),  # SnBr4
    "10038-98-9": ((396, 1), (125, 2), (459, 3), (171, 3)),  # GeCl4
    "13450-92-5": ((235, 1), (75, 2), (332, 3), (111, 3)),  # GeBr4
    "7782-65-2": ((2106, 1), (931, 2), (2114, 3), (819, 3)),  # GeH4
    "7784-34-1": ((416, 1), (192, 1), (393, 2), (152, 2)),  # AsCl3
    "7784-35-2": ((740, 1), (336, 1), (702, 2), (262, 2)),  # AsF3
    "7784-42-1": ((2116, 1), (906, 1), (2123, 2), (1003, 2)),  # AsH3
    "7803-52-3": ((1891, 1), (782, 1), (1894, 2), (831, 2)),  # SbH3
    "7783-07-5": ((2345, 1), (1034, 1), (2358, 1)),  # H2Se
    "7783-79-1": ((708, 1), (662, 2), (780, 3), (437, 3), (405, 3), (262, 3)),  # SeF6
    "7727-18-6": ((1035, 1), (408, 1), (165, 1), (504, 2), (249, 2), (129, 2)),  # VOCl3
    "14977-61-8": ((991, 1), (465, 1), (356, 1), (140, 1), (216, 1), (1002, 1), (230, 1), (500, 1),
                   (257, 1)),  # CrO2Cl2
    "7719-09-7": ((1251, 1), (492, 1), (344, 1), (194, 1), (455, 1), (284, 1)),  # SOCl2
}


def vibrating_heat_capacity(cas, t):
    """Cp in J/(mol K) of rigid, non-linear molecules whose vibrations are harmonic."""
    total = 4.0
    for wave_number, times in FREQUENCIES[cas]:
        x = CM_K * wave_number / t
        total += times * x**2 * exp(-x) / (1 - exp(-x)) ** 2
    return R_EXACT * total


def vibrating(formula, names, cas, **more):
    return Species(formula, "g", names, cas, ("vibrations",), **more)


def atomic(formula, names, cas, high, **more):
    """An atom whose first excited level lies so high that Cp is 5/2 R up to `high`."""
    return Species(formula, "g", names, cas, ("constant", 298.15, high), **more)


VIBRATING = [
    vibrating("UF6", "uranium hexafluoride vapour", "7783-81-5", floor=VAPOUR),
    vibrating("SnCl4", "tin tetrachloride vapour;stannic chloride vapour;tin(IV) chloride vapour",
              "7646-78-8", floor=VAPOUR),
    vibrating("SnBr4", "tin tetrabromide vapour;stannic bromide vapour;tin(IV) bromide vapour",
              "7789-67-5", floor=VAPOUR),
    vibrating("GeCl4", "germanium tetrachloride vapour", "10038-98-9", floor=VAPOUR),
    vibrating("GeBr4", "germanium tetrabromide vapour", "13450-92-5", floor=VAPOUR),
    vibrating("GeH4", "germane;germanium tetrahydride", "7782-65-2", floor=VAPOUR),
    vibrating("AsCl3", "arsenic trichloride vapour;arsenic(III) chloride vapour", "7784-34-1",
              floor=VAPOUR),
    vibrating("AsF3", "arsenic trifluoride vapour;arsenic(III) fluoride vapour", "7784-35-2",
              floor=VAPOUR),
    vibrating("AsH3", "arsine;arsenic trihydride", "7784-42-1", floor=VAPOUR),
    vibrating("SbH3", "stibine;antimony trihydride", "7803-52-3", floor=VAPOUR),
    vibrating("H2Se", "hydrogen selenide", "7783-07-5", floor=VAPOUR),
    vibrating("SeF6", "selenium hexafluoride", "7783-79-1", floor=VAPOUR,
              apart="Yaws has 315.4 J/(mol K), 1.5 above the CRC table"),
    vibrating("VOCl3", "vanadium oxytrichloride vapour;vanadyl chloride vapour", "7727-18-6",
              floor=VAPOUR),
    vibrating("CrO2Cl2", "chromyl chloride vapour", "14977-61-8", floor=VAPOUR),
    vibrating("SOCl2", "thionyl chloride vapour", "7719-09-7", floor=MOLECULE),
    atomic("Cd", "cadmium vapour", "7440-43-9", 3000, floor=RADICAL),
    atomic("Ag", "silver vapour", "7440-22-4", 3000, floor=RADICAL),
    atomic("Au", "gold vapour", "7440-57-5", 1500, floor=RADICAL),
    atomic("Sb", "antimony vapour;atomic antimony", "7440-36-0", 1500, floor=RADICAL),
    atomic("Bi", "bismuth vapour;atomic bismuth", "7440-69-9", 1500, floor=RADICAL),
]
