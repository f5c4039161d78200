"""Builds the figures of a dissolved species, and checks those recalled from memory."""

import re
from functools import lru_cache
from math import log, log10, sqrt

import library_sources as published
from library_dissolved import (BLIND_RANGE_K, CP_RECALLED, ELEMENTS, GIBBS_LIMIT, GIBBS_LIMIT_APART,
                               HENRY_APART, HENRY_COMPARED, HENRY_LIMIT, KNOWN_RANGE_K,
                               OTHER_ELEMENTS, RECALLED_ENTROPIES)
from library_measured import MEASURED
from library_pieces import constant_piece, join
from library_sources import R_EXACT, T0

RT_LN_10 = R_EXACT * T0 * log(10) / 1000  # kJ/mol


def atoms_and_charge(formula):
    """The atoms of a formula such as Al(OH)4^-, and its charge."""
    body, _, charge = formula.partition("^")
    atoms = {}
    for part in body.split("·"):
        times, rest = re.fullmatch(r"([\d.]*)(.*)", part).groups()
        rest = re.sub(r"\((\w+)\)(\d*)", lambda m: m[1] * int(m[2] or 1), rest)
        for symbol, number in re.findall(r"([A-Z][a-z]?)([\d.]*)", rest):
            atoms[symbol] = atoms.get(symbol, 0) + float(number or 1) * float(times or 1)
    size = int(charge[:-1] or 1) if charge else 0
    return atoms, -size if charge.endswith("-") else size


def hill(formula):
    """The atoms in Hill's order (carbon, hydrogen, then by the alphabet) and the charge, as one text."""
    atoms, charge = atoms_and_charge(formula)
    first = [symbol for symbol in ("C", "H") if "C" in atoms and symbol in atoms]
    order = first + sorted(symbol for symbol in atoms if symbol not in first)
    text = "".join(f"{symbol}{'' if atoms[symbol] == 1 else f'{atoms[symbol]:.6g}'}" for symbol in order)
    return text if charge == 0 else f"{text}^{charge:+d}"


@lru_cache(maxsize=None)
def element_entropy(symbol):
    """S° of one mole of atoms of an element in its reference state."""
    if symbol in RECALLED_ENTROPIES:
        return RECALLED_ENTROPIES[symbol]
    if symbol in OTHER_ELEMENTS:
        return published.crc(OTHER_ELEMENTS[symbol], "s")[1]
    table, atoms = ELEMENTS[symbol]
    return next(row[2] for row in published.janaf(table) if row[0] == T0) / atoms


def formation_entropy(formula, s):
    """ΔfS° in kJ/(mol K), counted against the hydrogen ion."""
    atoms, charge = atoms_and_charge(formula)
    elements = sum(number * element_entropy(symbol) for symbol, number in atoms.items())
    return (s - elements + charge * element_entropy("H")) / 1000


def formation_gibbs(species, made):
    """ΔfG° at 298.15 K in kJ/mol."""
    return made["h"] - T0 * formation_entropy(species.formula, made["s"])


# J/(mol K) for each atom, by Kopp's rule.
KOPP = {"C": 7.5, "H": 9.6, "B": 11.3, "Si": 15.9, "O": 16.7, "F": 20.9, "P": 22.6, "S": 22.6}
KOPP_OTHERS = 25.9


def kopp(formula):
    """Cp of a solid near room temperature from its elements."""
    atoms, _ = atoms_and_charge(formula)
    return round(sum(count * KOPP.get(symbol, KOPP_OTHERS) for symbol, count in atoms.items()), 1)


def build_dissolved(species, built):
    """The figures of a dissolved species, or of a solid that is known by its solubility alone."""
    how, cp, source = species.how, None, None
    published_row = published.aqueous_ion(species.cas)
    if published_row and published_row[3] is not None:
        cp, source = published_row[3], "crc_ions"
    elif species.id in CP_RECALLED:
        cp, source = CP_RECALLED[species.id], "shock"
    low, high = KNOWN_RANGE_K if cp is not None else BLIND_RANGE_K
    if how[0] == "codata":
        h, _, s, _ = how[1:]
        sources = ["codata"]
    elif how[0] == "ion":
        _, g, s, _ = published_row
        h = g + T0 * formation_entropy(species.formula, s)
        sources = ["crc_ions"]
    elif how[0] == "recalled":
        g, s, *named = how[1:]
        h = g + T0 * formation_entropy(species.formula, s)
        sources = named or ["nbs"]
    elif how[0] == "measured":
        row = next(row for row in MEASURED if row.tied == species.id)
        parts = row.stoichiometry()
        share = -1 / parts.pop(species.id)
        parts = {ident: nu * share for ident, nu in parts.items()}
        h, s = formed((parts, -share * row.log10_k(T0), -share * row.enthalpy(T0)), built)
        if species.phase == "s":
            cp, source = published.crc_heat_capacity(species.cas, "s"), "crc"
            if cp is None:
                cp, source = kopp(species.formula), "kopp"
        else:
            cp = sum(nu * heat_capacity(built(ident)) for ident, nu in parts.items())
        low, high = row.low, row.high
        sources = [row.source, *([source] if source else [])]
    else:
        if how[0] == "henry":
            constant, slope = published.henry(species.cas)
            parts, log_k, change, sources = {how[1]: 1}, log10(constant), slope, ["sander"]
        else:
            parts, log_k, change = how[1:4]
            sources = [how[4]]
        h, s = formed((parts, log_k, change), built)
        if cp is None:
            cp = sum(nu * heat_capacity(built(ident)) for ident, nu in parts.items())
            source = sources[0]
    pieces = [constant_piece(low, high, cp or 0.0, source or sources[0])]
    h, s = round(h, 3), round(s, 3)
    join(pieces, h, s)
    return {"h": h, "s": s, "pieces": pieces, "sources": sources, "worst": [],
            "transitions": []}


def formed(equilibrium, built):
    """ΔfH° and S° of what forms from other species by an equilibrium: parts, log10 K, ΔrH."""
    parts, log_k, change = equilibrium
    made = {ident: built(ident) for ident in parts}
    h = sum(nu * made[ident]["h"] for ident, nu in parts.items()) + change
    s = sum(nu * made[ident]["s"] for ident, nu in parts.items())
    return round(h, 3), round(s + 1000 * (change + RT_LN_10 * log_k) / T0, 3)


def heat_capacity(made):
    return round(next(p for p in made["pieces"] if p.low <= T0 <= p.high).cp(T0), 2)


def uncertainty(species, made, made_u):
    """u of ΔfG°298 in kJ/mol and how it was got."""
    how = species.how
    if species.element:
        return 0.0, "element"
    if how[0] == "codata":
        return sqrt((how[2] / 2) ** 2 + (T0 * how[4] / 2000) ** 2), "codata"
    if how[0] == "ion":
        h = published.aqueous_ion(species.cas)[0]
        apart = abs(made["h"] - h) / 2 if h is not None else 0.0
        return (apart, "sources") if apart > species.floor else (species.floor, "class")
    if how[0] == "measured":
        # That of the equilibrium and of the other species, as if they were independent.
        row = next(row for row in MEASURED if row.tied == species.id)
        parts = row.stoichiometry()
        others = sum((nu * made_u(ident)) ** 2 for ident, nu in parts.items() if ident != species.id)
        return sqrt(others + (row.u * RT_LN_10) ** 2), "measured"
    return species.floor, "class"


def problems_of_dissolved(species, made, built):
    """A line for the report, and where a recalled figure leaves a published one."""
    found, g = [], formation_gibbs(species, made)
    line = f"    ΔfG° {g:.2f}, Cp {made['pieces'][0].cp(T0):.1f}"
    row = published.aqueous_ion(species.cas)
    if row:
        line += f"; ΔfG° from the CRC table's {g - row[1]:+.2f}"
        limit = GIBBS_LIMIT_APART if species.apart else GIBBS_LIMIT
        if abs(g - row[1]) > limit:
            found.append(f"{species.id}: ΔfG° leaves the CRC table's by {g - row[1]:.2f} kJ/mol")
    gas = f"{species.formula}.g"
    if species.formula in HENRY_COMPARED:
        base = built(gas)
        log_h = -(g_of(made) - g_of(base)) / RT_LN_10
        apart = min((log_h - log10(k) for k in published.henry_averages(species.cas)), key=abs)
        line += f"; Henry 10^{log_h:.3f} mol/(kg bar), Sander {apart:+.3f}"
        if abs(apart) > HENRY_LIMIT and species.formula not in HENRY_APART:
            found.append(f"{species.id}: Henry's constant leaves Sander's by {apart:.3f}")
    return line, found


def g_of(made):
    return made["h"] - T0 * made["s"] / 1000
