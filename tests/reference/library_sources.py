"""Reads the published figures out of the packages' data files; nothing of the packages is run."""

import csv
import importlib.util
import json
from functools import lru_cache
from math import exp, log
from pathlib import Path

R_EXACT = 8.31446261815324  # J/(mol K), exact: the product of k and N_A in the SI
R_TM4513 = 8.314510  # J/(mol K), the value TM-4513 was made with
T0 = 298.15


@lru_cache(maxsize=None)
def folder(package):
    spec = importlib.util.find_spec(package)
    if spec is None:
        raise SystemExit(f"{package} is not installed: pip install -r tests/reference/requirements.txt")
    return Path(list(spec.submodule_search_locations)[0])


@lru_cache(maxsize=None)
def tm4513(name):
    """The 7-coefficient set of one gas: limits, coefficients, ΔfH°298 in kJ/mol."""
    data = json.loads((folder("pyromat") / "data" / "ig2" / f"{name}.hpd").read_text())
    return data["Tlim"], data["C"], data.get("ho", 0.0) * R_TM4513 / 1000, data["atoms"]


@lru_cache(maxsize=None)
def janaf(code):
    """The rows of one JANAF table as (T, Cp, S, H−H(298), ΔfH, log Kf), None where blank.

    A row at a transition has no ΔfH and no log Kf.
    """
    rows = []
    for line in (folder("janaf") / "data" / f"{code}.txt").read_text().splitlines()[2:]:
        cells = line.split("\t")
        try:
            t, cp, s, _, h = (float(cell) for cell in cells[:5])
        except ValueError:
            continue
        formation = [number(cell) for cell in cells[5:8]] + [None] * 3
        if formation[1] is None:
            formation = [None] * 3
        rows.append((t, cp, s, h, formation[0], formation[2]))
    return rows


@lru_cache(maxsize=None)
def melting(code):
    """Where a JANAF table marks the change between crystal and liquid, in K, or None."""
    for line in (folder("janaf") / "data" / f"{code}.txt").read_text().splitlines()[2:]:
        left, sign, right = line.partition("<-->")
        if sign and right.strip().upper().startswith("LIQUID") and "GLASS" not in left.upper():
            return float(line.split("\t")[0])
    return None


@lru_cache(maxsize=None)
def boiling(code):
    """Where a JANAF table marks the change between liquid and gas, in K, or None."""
    for line in (folder("janaf") / "data" / f"{code}.txt").read_text().splitlines()[2:]:
        left, sign, right = line.partition("<-->")
        if "LIQUID" in left.upper() and "GAS" in right.upper():
            return float(line.split("\t")[0])
    return None


def number(text):
    try:
        return float(text)
    except ValueError:
        return None


def janaf_at(code, temperature):
    rows = [row for row in janaf(code) if row[0] == temperature and row[5] is not None]
    if len(rows) != 1:
        raise SystemExit(f"JANAF {code} has {len(rows)} rows with log Kf at {temperature} K")
    return rows[0]


@lru_cache(maxsize=None)
def table(relative):
    with open(folder("chemicals") / relative, encoding="utf-8") as file:
        return list(csv.DictReader(file, delimiter="\t"))


def one(relative, cas, key="CAS"):
    rows = [row for row in table(relative) if row[key] == cas]
    return rows[0] if rows else None


def crc(cas, phase):
    """ΔfH° in kJ/mol and S° in J/(mol K) of the CRC table, None where it has none."""
    row = one("Heat Capacity/CRC Standard Thermodynamic Properties of Chemical Substances.tsv", cas)
    if row is None:
        return None, None
    h, s = number(row[f"Hf{phase}"]), number(row[f"S0{phase}"])
    return (None if h is None else h / 1000), s


def crc_heat_capacity(cas, phase):
    row = one("Heat Capacity/CRC Standard Thermodynamic Properties of Chemical Substances.tsv", cas)
    return number(row[f"Cp{phase}"]) if row and phase != "aq" else None


def crc_gibbs(cas, phase):
    """ΔfG° in kJ/mol of the CRC table, None where it has none."""
    row = one("Heat Capacity/CRC Standard Thermodynamic Properties of Chemical Substances.tsv", cas)
    g = number(row[f"Gf{phase}"]) if row and phase != "aq" else None
    return None if g is None else g / 1000


def atct(cas, phase):
    """ΔfH° and its 95 % half-width in kJ/mol, from version 1.112 of the ATcT, or None."""
    if phase not in ("g", "l"):
        return None
    row = one(f"Reactions/ATcT 1.112 ({phase}).tsv", cas)
    if row is None:
        return None
    return float(row[f"Hf{phase}"]) / 1000, float(row["uncertainty"]) / 1000


def perry(cas):
    """Cp of a solid in J/(mol K): constant, per K, times K², per K², and its range."""
    data = json.loads((folder("chemicals") / "Heat Capacity/Perrys Table 2-151.json").read_text())
    row = data[cas]["c"]
    calorie = 4.184
    return [row[key] * calorie for key in ("Const", "Lin", "Quadinv", "Quad")], row["Tmin"], row["Tmax"]


def poling_gas(cas):
    """Cp/R of an ideal gas as a polynomial in T, and its range."""
    row = one("Heat Capacity/PolingDatabank.tsv", cas)
    cells = list(row.values())
    numbers = [float(cell) for cell in cells[2:9]]
    return numbers[2:], numbers[0], numbers[1]


TRC = "Heat Capacity/TRC Thermodynamics of Organic Compounds in the Gas State.tsv"


@lru_cache(maxsize=None)
def trc(cas):
    """Lowest and highest T in K, a0 to a7, and the constant J of S°/R."""
    row = one(TRC, cas)
    return tuple(float(row[key]) for key in ("Tmin", "Tmax", *(f"a{i}" for i in range(8)), "J"))


def trc_rising(cas, t):
    """The part of Cp/R that grows with y = (T - a7)/(T + a6)."""
    a = trc(cas)[2:10]
    y = max((t - a[7]) / (t + a[6]), 0.0)
    return a[3] * y**2 + (a[4] * y**2 - a[5] / (t + a[6]) ** 2) * y**6


def trc_heat_capacity(cas, t):
    """Cp in J/(mol K): a0 + (a1/T²) exp(-a2/T) + a3 y² + (a4 - a5/(T - a7)²) y^8, times R."""
    a = trc(cas)[2:10]
    return R_EXACT * (a[0] + a[1] / t**2 * exp(-a[2] / t) + trc_rising(cas, t))


def trc_entropy(cas, t, steps=2000):
    """S° in J/(mol K): the integral of Cp/T with its constant J; Simpson's rule for the y part."""
    a, constant = trc(cas)[2:10], trc(cas)[10]
    width = (t - a[7]) / steps
    total = 0.0
    for i in range(steps + 1):
        at, weight = a[7] + i * width, 1 if i in (0, steps) else 4 if i % 2 else 2
        total += weight * trc_rising(cas, at) / at
    vibration = a[1] / a[2] ** 2 * (1 + a[2] / t) * exp(-a[2] / t)
    return R_EXACT * (constant + a[0] * log(t) + vibration + total * width / 3)


def yaws(cas):
    """ΔfH° in kJ/mol and S° in J/(mol K) of an ideal gas of Yaws' handbook, None where blank."""
    row = one("Reactions/Yaws Hf S0 (g).tsv", cas)
    if row is None:
        return None, None
    h, s = number(row["Hfg"]), number(row["S0g"])
    return (None if h is None else h / 1000), s


def aqueous_ion(cas):
    """ΔfH° and ΔfG° in kJ/mol, S° and Cp in J/(mol K) of the CRC table of aqueous ions."""
    row = one("Electrolytes/CRC Thermodynamic Properties of Aqueous Ions.tsv", cas)
    if row is None:
        return None
    figures = [number(row[key]) for key in ("Hf(aq)", "Gf(aq)", "S(aq)", "Cp(aq)")]
    return [None if f is None else f / scale for f, scale in zip(figures, (1000, 1000, 1, 1))]


WATER_MOL_PER_KG = 1000 / 18.01528


@lru_cache(maxsize=None)
def henry_fit(cas, file):
    """A and B of ln(H/Pa) = A + B/T, H the pressure over the amount fraction in water."""
    path = folder("thermo") / "Interaction Parameters" / f"Sander_henry_{file}.json"
    row = json.loads(path.read_text())["data"].get(f"{cas} 7732-18-5")
    return (row["A"], row["B"]) if row else None


def henry(cas):
    """Henry's constant in mol/(kg bar) at 298.15 K and the enthalpy of dissolution in kJ/mol."""
    a, b = henry_fit(cas, "T_dep")
    return WATER_MOL_PER_KG * 1e5 / exp(a + b / T0), R_EXACT * b / 1000


def henry_averages(cas):
    """The one or two averages of Henry's constant in mol/(kg bar) at 298.15 K."""
    fits = [henry_fit(cas, file) for file in ("T_dep", "const")]
    return [WATER_MOL_PER_KG * 1e5 / exp(fit[0] + fit[1] / T0) for fit in fits if fit]


def zabransky(cas):
    """Cp/R of a liquid at constant pressure: pieces of a cubic in T/100 K."""
    pieces = []
    for row in table("Heat Capacity/Zabransky.tsv"):
        if row["CASRN"] == cas and row["Data Type"] == "p":
            cubic = [float(row[f"A{i}-spline"]) for i in range(1, 5)]
            powers = [value / 100**i for i, value in enumerate(cubic)]
            pieces.append((float(row["Tmin"]), float(row["Tmax"]), powers))
    return sorted(pieces)


def antoine_pa(cas, temperature):
    """Vapour pressure in Pa by the Antoine constants of Poling, Prausnitz and O'Connell."""
    row = one("Vapor Pressure/Antoine Collection Poling.tsv", cas)
    a, b, c = (float(row[key]) for key in "ABC")
    return 10 ** (a - b / (temperature + c))
