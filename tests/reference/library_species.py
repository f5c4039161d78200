"""Which species the library holds, and where each one's figures come from."""

from dataclasses import dataclass


@dataclass
class Species:
    formula: str
    phase: str
    names: str
    cas: str
    how: tuple  # the kind of source and its details; library_figures.py builds each kind
    form: str = ""
    element: bool = False  # the reference state of its element: H°298 is zero
    janaf: str = ""  # the JANAF table that it is compared with
    floor: float = 0.0  # kJ/mol; the class of u(ΔfG°) where no better is known
    apart: str = ""  # why a second source may differ by more than the limit
    outliers: tuple = ()  # second sources that stand alone and do not count in u
    recalled_gibbs: float | None = None  # ΔfG° remembered with ΔfH° and S°, which it must fit
    blunt: tuple = ()  # where a lambda peak of Cp is passed over; H and S still hold
    crc: bool = False  # ΔfH° and S° from the CRC table, with JANAF's Cp
    low: float = 0.0  # a lower limit below the table's first row, for a short, smooth reach

    @property
    def is_melt(self):
        """Whether it is fitted from its melting point on; H and S at 298.15 K are then carried down."""
        is_fit = self.phase == "l" and self.how[0] == "janaf"
        return is_fit and (self.how[2] is None or self.how[2][0] > 298.15)

    @property
    def id(self):
        return ".".join(part for part in (self.formula, self.phase, self.form) if part)


def gas(formula, file, names, cas, janaf="", **more):
    return Species(formula, "g", names, cas, ("tm4513", file), janaf=janaf, **more)


def fitted(formula, phase, names, cas, table, limits, **more):
    return Species(formula, phase, names, cas, ("janaf", table, limits), janaf=table, **more)


def janaf_fit(formula, phase, names, cas, table, kind, **more):
    """A species fitted to its JANAF table over pieces that are found by themselves: a gas to 3000 K,
    a solid up to its melting, a melt from there to its boiling."""
    more.setdefault("floor", CLASSES[kind])
    return Species(formula, phase, names, cas, ("janaf", table, None), janaf=table, **more)


def trc(formula, names, cas, **more):
    return Species(formula, "g", names, cas, ("trc",), **more)


def organic(formula, names, cas, form="", kind="trc", **more):
    """An organic gas with Cp of the TRC tables (or of Poling's) and ΔfH° of the CRC table or Yaws'."""
    more.setdefault("floor", CLASSES["organic"])
    return Species(formula, "g", names, cas, (kind,), form=form, **more)


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

# u(ΔfG°298) in kJ/mol of a species that no second source knows, by class: judged once, before any
# comparison with the tables that the proof uses, and never moved afterwards to fit it.
CLASSES = {
    "molecule": 2.0,  # a closed-shell gas of H, C, N, O, S, P and the halogens, measured
    "organic": 1.5,  # an organic gas or liquid with a measured heat of combustion
    "radical": 5.0,  # a radical or an atom that no assessed network holds
    "vapour": 8.0,  # a metal's oxide, halide, sulfide or hydroxide as a hot vapour
    "estimate": 15.0,  # a figure that its own source calls an estimate
    "salt": 1.5,  # a common oxide, hydroxide, halide, sulfate, carbonate or nitrate
    "mineral": 3.0,  # a sulfide, carbide, nitride, silicate, phosphate or spinel
    "rare": 8.0,  # a condensed species measured seldom or indirectly
    "ion": 1.0,  # a dissolved ion of the CRC table
    "complex": 2.0,  # a dissolved complex or an ion of a rarer element
    "dissolved": 1.0,  # a dissolved molecule by Henry's constant or a published ΔfG°
}
