"""Builds the figures of one species from its sources: ΔfH°298, S°298 and the pieces of Cp."""

from functools import lru_cache
from math import log, sqrt

import library_sources as published
from library_condensed import CONDENSED
from library_condensed_ambient import AMBIENT
from library_condensed_elements import ELEMENTS
from library_condensed_hydrates import HYDRATES
from library_condensed_minerals import MINERALS
from library_condensed_oxides import OXIDES
from library_condensed_salts import SALTS
from library_dissolved import DISSOLVED
from library_dissolved_complexes import COMPLEXES, SALTS_BY_SOLUBILITY
from library_dissolved_more import BASES, IONS, MOLECULES, TIED
from library_gases import GASES
from library_gases_carbon import ORGANIC
from library_gases_halides import HALIDES
from library_gases_janaf import TABULATED
from library_gases_metals import METALS
from library_gases_nonmetals import NONMETALS
from library_liquids import LIQUIDS
from library_organic_hydrocarbons import HYDROCARBONS
from library_organic_hydrocarbons_more import HYDROCARBONS_MORE
from library_organic_others import OTHERS
from library_organic_others_more import OTHERS_MORE
from library_organic_oxygenates import OXYGENATES
from library_organic_oxygenates_more import OXYGENATES_MORE
from library_pieces import (Piece, constant_piece, fit, fit_heat_capacity, join, limits_of,
                            written)
from library_solution import build_dissolved, formation_entropy, formed, kopp
from library_sources import R_EXACT, T0
from library_species import ATCT_LIMIT, KEY_VALUES
from library_vibrations import VIBRATING, vibrating_heat_capacity

INORGANIC_GASES = GASES + NONMETALS + HALIDES + METALS + TABULATED + VIBRATING
ORGANIC_GASES = (ORGANIC + HYDROCARBONS + HYDROCARBONS_MORE + OXYGENATES + OXYGENATES_MORE + OTHERS
                 + OTHERS_MORE)
PURE = CONDENSED + ELEMENTS + OXIDES + SALTS + MINERALS + AMBIENT + HYDRATES + LIQUIDS
AQUEOUS = DISSOLVED + IONS + MOLECULES + BASES + TIED + COMPLEXES + SALTS_BY_SOLUBILITY
SPECIES = INORGANIC_GASES + ORGANIC_GASES + PURE + AQUEOUS


def species_of(ident):
    return next(species for species in SPECIES if species.id == ident)


@lru_cache(maxsize=None)
def built(ident):
    return build(species_of(ident))


def recalled_pieces(pieces, source):
    """Pieces of Cp = a + b T + c/T² in J/(mol K)."""
    found = []
    for low, high, (a, b, c) in ((low, high, (*terms, 0, 0)[:3]) for low, high, terms in pieces):
        powers = [c / R_EXACT, 0, a / R_EXACT, b / R_EXACT, 0, 0, 0]
        found.append(Piece(low, high, [written(v) for v in powers], source))
    return found


def build(species):
    """The figures of one species: ΔfH°298, S°298, pieces, source ids, worst errors of a fit."""
    how, cas, phase = species.how, species.cas, species.phase
    if phase == "aq" or how[0] == "measured":
        return build_dissolved(species, built)
    sources, worst, transitions, tied, molten = [], [], (), False, None
    if how[0] == "tm4513":
        h, s, pieces = gas_pieces(how[1])
        sources.append("tm4513")
    elif how[0] == "janaf":
        row = next(row for row in published.janaf(how[1]) if row[0] == T0)
        h, s = row[4], row[2]
        limits = how[2] or limits_of(how[1], phase)
        pieces, transitions, worst = fit(how[1], limits, "janaf", species.blunt)
        pieces[0].low = species.low or pieces[0].low
        if species.crc:
            h, s = published.crc(cas, phase)
            sources.append("crc")
        sources.append("janaf")
    elif how[0] == "poling":
        h, s, from_tables = organic_figures(cas)
        powers, low, high = published.poling_gas(cas)
        pieces = [Piece(min(low, T0), high, [0, 0, *powers], "poling")]
        sources += [*from_tables, "poling"]
    elif how[0] == "trc":
        h, _, from_tables = organic_figures(cas, False)
        s = round(published.trc_entropy(cas, T0), 2)
        high = min(published.trc(cas)[1], 1500)
        pieces = trc_pieces(cas, T0, high)
        sources += [*from_tables, "trc"]
    elif how[0] == "vibrations":
        h, s = published.crc(cas, phase)
        coefficients, apart = fit_heat_capacity(lambda t: vibrating_heat_capacity(cas, t), T0, 1500)
        assert apart < 2e-3, f"the fit of {species.id} leaves its vibrations by {apart:.2%}"
        known = published.crc_heat_capacity(cas, phase)
        assert known is None or abs(vibrating_heat_capacity(cas, T0) / known - 1) < 0.02, species.id
        pieces = [Piece(T0, 1500, coefficients, "vibrations")]
        sources += ["crc", "vibrations"]
    elif how[0] == "perry":
        h, s = published.crc(cas, phase)
        (const, linear, inverse, square), _, high = published.perry(cas)
        a = [inverse / R_EXACT, 0, const / R_EXACT, linear / R_EXACT, square / R_EXACT, 0, 0]
        pieces = [Piece(how[1], high, [written(v) for v in a], "perry")]
        sources += ["crc", "perry"]
    elif how[0] in ("constant", "constant_gibbs"):
        h, s = published.crc(cas, phase)
        if how[0] == "constant_gibbs":
            g = published.crc_gibbs(cas, phase)
            h = round(g + T0 * formation_entropy(species.formula, s), 2)
        pieces = [constant_piece(how[1], how[2], published.crc_heat_capacity(cas, phase), "crc")]
        sources.append("crc")
    elif how[0] == "kopp":
        h, s = published.crc(cas, phase)
        pieces = [constant_piece(288.15, 310, kopp(species.formula), "kopp")]
        sources += ["crc", "kopp"]
    elif how[0] == "recalled":
        # ΔfH° and S°, Cp, their source, that of Cp if it is another, and transitions.
        h, s, sources = how[1], how[2], list(how[4:6])
        pieces = recalled_pieces(how[3], sources[-1])
        transitions = how[6] if len(how) > 6 else ()
    elif how[0] == "recalled_cp":
        h, s = published.crc(cas, phase)
        pieces = recalled_pieces(how[1], how[2])
        transitions = how[3] if len(how) > 3 else ()
        sources += ["crc", how[2]]
    elif how[0] == "formed":
        h, s = formed(how[1:4], built)
        pieces = [constant_piece(288.15, 400, published.crc_heat_capacity(cas, phase), "crc")]
        sources += [how[4], "crc"]
    elif how[0] == "calcite":
        h, s = published.crc(cas, phase)
        coefficients, apart = fit_heat_capacity(calcite_heat_capacity, T0, 1200)
        assert apart < 1e-4, f"the fit leaves the formula by {apart:.2%}"
        pieces = [Piece(T0, 1200, coefficients, "jacobs")]
        perry_figures, low, high = published.perry(cas)
        for t in range(300, 1033, 20):
            perry = perry_figures[0] + perry_figures[1] * t + perry_figures[2] / t**2
            worst_cp = max(abs(pieces[0].cp(t) / perry - 1), 0)
            assert worst_cp < 0.03, f"calcite at {t} K leaves Perry's Cp by {worst_cp:.1%}"
        sources += ["crc", "jacobs"]
    elif how[0] == "methanol":
        # The liquid is tied to the vapour by its vapour pressure, the vapour taken as ideal.
        vapour = built("CH3OH.g")
        _, s = published.crc(cas, phase)
        h = round(vapour["h"] - vaporization(cas) - T0 * (vapour["s"] - s) / 1000, 2)
        pieces = liquid_pieces(cas, phase)
        sources += ["crc", "poling", pieces[0].source]
        tied = True
    elif how[0] == "vapour":
        # ΔfH° is measured on the liquid; S° is what makes the vapour pressure right.
        vapour, at_crc = built(how[1]), published.crc(cas, phase)
        liquid = published.atct(cas, phase)
        if liquid:
            h, from_table = round(liquid[0], 2), "atct"
        else:
            # The enthalpy of vaporization of one table is kept, whatever the vapour's own became.
            of_vapour = published.crc(cas, "g")[0]
            shift = vapour["h"] - of_vapour if of_vapour is not None else 0.0
            h, from_table = round(at_crc[0] + shift, 2), "crc"
        s = round(vapour["s"] - 1000 * (vapour["h"] - h - vaporization(cas)) / T0, 2)
        pieces = liquid_pieces(cas, phase)
        sources += [from_table, "poling", pieces[0].source]
        tied = True
    elif how[0] == "melted":
        # From the solid at the melting point by the enthalpy of fusion.
        _, ident, fusion, cp, high = how
        solid = built(ident)["pieces"][-1]
        low = solid.high
        molten = solid.h(low) + fusion, solid.s(low) + 1000 * fusion / low
        pieces = [constant_piece(low, high, cp, "kelley")]
        sources.append("kelley")
    elif how[0] == "boiling":
        # Tied below 1 bar, where the vapour is nearly ideal: its pressure and the slope of that.
        _, ident, anchor_k, cp, low, high = how
        vapour = next(p for p in built(ident)["pieces"] if p.high >= anchor_k)
        lost = vaporization_enthalpy(cas, anchor_k)
        down_cp = round(cp / R_EXACT, 6) * R_EXACT
        pressure = log(published.antoine_pa(cas, anchor_k) / 1e5)
        h = round(vapour.h(anchor_k) - lost + down_cp * (T0 - anchor_k) / 1000, 2)
        s = vapour.s(anchor_k) - R_EXACT * pressure - 1000 * lost / anchor_k
        s = round(s + down_cp * log(T0 / anchor_k), 2)
        pieces = [constant_piece(low, high, cp, "handbook")]
        sources += ["poling", "handbook"]
        tied = True
    if species.element:
        h = 0.0
    better = None if "ATcT" in species.outliers else published.atct(cas, phase)
    if better and not species.element and abs(better[0] - h) > ATCT_LIMIT and not tied:
        h = round(better[0], 3)
        sources.append("atct")
    if species.id in KEY_VALUES:
        h, s = KEY_VALUES[species.id]
        sources.append("codata")
    if species.is_melt and pieces[0].low > T0:
        molten = melt_figures(how[1], pieces[0].low)
    if molten:
        h, s = carried_down(pieces, transitions, *molten)
    else:
        join(pieces, h, s, transitions)
    return {"h": h, "s": s, "pieces": pieces, "sources": list(dict.fromkeys(sources)),
            "worst": worst, "transitions": list(transitions)}


def organic_figures(cas, entropy_too=True):
    """ΔfH° and S° of an organic gas from the CRC table, else from Yaws', and which were used."""
    figures, used = [], []
    pairs = list(zip(published.crc(cas, "g"), published.yaws(cas)))
    for crc, yaws in pairs if entropy_too else pairs[:1]:
        figures.append(yaws if crc is None else crc)
        used.append("yaws" if crc is None else "crc")
    better = published.atct(cas, "g")
    if figures[0] is None and better:
        figures[0], used[0] = better[0], "atct"
    return figures[0], figures[-1], list(dict.fromkeys(used))


def melt_figures(code, low):
    """H against the elements at 298.15 K, and S, of a melt of the JANAF tables where it begins."""
    rows = published.janaf(code)
    standard = next(row for row in rows if row[0] == T0)
    _, _, s, h, *_ = [row for row in rows if row[0] == low][-1]
    return standard[4] + h, s


def carried_down(pieces, transitions, h_low, s_low):
    """Anchors a melt at its melting point; gives its H and S at 298.15 K by constant Cp from there."""
    low, cp = pieces[0].low, pieces[0].cp(pieces[0].low)
    down_h, down_s = cp * (low - T0) / 1000, cp * log(low / T0)
    h, s = round(h_low - down_h, 3), round(s_low - down_s, 3)
    # The table's figures are the rounded ones, and the pieces are those that lead to them.
    join(pieces, h + down_h, s + down_s, transitions, low)
    return h, s


def trc_pieces(cas, low, high):
    """Cp of the TRC tables in powers of T within 0.2 %: one piece, or two where one will not do."""
    def formula(t):
        return published.trc_heat_capacity(cas, t)

    coefficients, worst = fit_heat_capacity(formula, low, high)
    if worst < 2e-3:
        return [Piece(low, high, coefficients, "trc")]
    middle = float(round(low + 0.35 * (high - low), -2))
    return trc_pieces(cas, low, middle) + trc_pieces(cas, middle, high)


def gas_pieces(file):
    """ΔfH°298, S°298 and the two pieces of a gas of TM-4513."""
    limits, coefficients, h, _ = published.tm4513(file)
    low = T0 if 298.15 < limits[0] <= 300 else limits[0]
    bounds = [low, *limits[1:]]
    pieces = []
    for a, b, c in zip(bounds, bounds[1:], coefficients):
        piece = Piece(a, b, [0, 0, *c[:5]], "tm4513")
        piece.b_s = c[6]
        pieces.append(piece)
    return round(h, 3), pieces[0].s(T0), pieces


def vaporization(cas):
    """ΔG of vaporization at 298.15 K in kJ/mol."""
    return -R_EXACT * T0 * log(published.antoine_pa(cas, T0) / 1e5) / 1000


def vaporization_enthalpy(cas, t):
    """The ideal vapour's enthalpy of vaporization in kJ/mol: R T² d ln P/dT of the Antoine equation."""
    low, high = (published.antoine_pa(cas, t + step) for step in (-0.01, 0.01))
    return R_EXACT * t**2 * log(high / low) / 0.02 / 1000


def boiling_k(cas):
    """Where the vapour pressure is one atmosphere, in whole kelvin."""
    return float(next(t for t in range(280, 700) if published.antoine_pa(cas, t) > 101_325))


def liquid_pieces(cas, phase):
    """Cp of a liquid by Zábranský's splines that hold 298.15 K onwards, else the CRC constant."""
    splines = published.zabransky(cas)
    joined = [row for row in splines if row[1] > T0 and row[0] < row[1]]
    if joined and any(low <= T0 <= high for low, high, _ in joined) and chained(joined):
        return [Piece(low, high, [0, 0, *(written(v) for v in powers), 0], "zabransky")
                for low, high, powers in joined]
    low, high = LIQUID_RANGE_K.get(cas) or (273.15, boiling_k(cas))
    return [constant_piece(low, high, published.crc_heat_capacity(cas, phase), "crc")]


def chained(rows):
    """Whether the pieces follow one another without gap or overlap."""
    return all(one[1] == two[0] for one, two in zip(rows, rows[1:]))


# Where one constant Cp serves for a liquid, its range: 273.15 K or the freezing point to about
# the normal boiling point.
LIQUID_RANGE_K = {
    "79-20-9": (273.15, 330), "107-31-3": (273.15, 305), "67-64-1": (273.15, 329),
    "67-63-0": (273.15, 355), "110-82-7": (280, 354), "100-41-4": (273.15, 409),
    "107-06-2": (273.15, 357), "64-17-5": (273.15, 352), "108-88-3": (273.15, 384),
    "62-53-3": (273.15, 450), "98-82-8": (273.15, 425),
}


def calcite_heat_capacity(t):
    """Jacobs, Kerrick and Krupka (1981), J/(mol K)."""
    return -184.79 + 0.32322 * t - 3_688_200 / t**2 - 1.2974e-4 * t**2 + 3883.5 / sqrt(t)
