"""Reads the published figures out of the packages' data files; nothing of the packages is run."""

import csv
import importlib.util
import json
from functools import lru_cache
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
    return number(row[f"Cp{phase}"]) if row else None


def atct(cas, phase):
    """ΔfH° and its 95 % half-width in kJ/mol, from version 1.112 of the ATcT, or None."""
    if phase == "s":
        return None
    row = one(f"Reactions/ATcT 1.112 ({phase}).tsv", cas)
    if row is None:
        return None
    return float(row[f"Hf{phase}"]) / 1000, float(row["uncertainty"]) / 1000


def perry(cas):
    """Cp of a solid in J/(mol K): constant, per K, times K², and its range."""
    data = json.loads((folder("chemicals") / "Heat Capacity/Perrys Table 2-151.json").read_text())
    row = data[cas]["c"]
    calorie = 4.184
    return [row[key] * calorie for key in ("Const", "Lin", "Quadinv")], row["Tmin"], row["Tmax"]


def poling_gas(cas):
    """Cp/R of an ideal gas as a polynomial in T, and its range."""
    row = one("Heat Capacity/PolingDatabank.tsv", cas)
    cells = list(row.values())
    numbers = [float(cell) for cell in cells[2:9]]
    return numbers[2:], numbers[0], numbers[1]


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
