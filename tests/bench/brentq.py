"""The same work as src/bench.rs as a short script writes it: K(T), Q, and SciPy's brentq in the extent.

Reads the library's own polynomials, so that all results can be compared; prints lines of JSON as
the other benchmarks do. Times are those of plain scalars, as such a script is usually written.
"""

import csv
import json
import math
import time
from pathlib import Path

from scipy.optimize import brentq

TABLE = Path(__file__).parents[2] / "src/library/tables/heat.tsv"
NU = {"CH4": -1, "H2O": -1, "CO": 1, "H2": 3, "N2": 0}
PRESSURE_PA = 2.5e6
STATES = 256
BATCHES = 3

PIECES = {}
for row in csv.DictReader(TABLE.open(), delimiter="\t"):
    figures = [float(figure) for figure in list(row.values())[1:12]]
    PIECES.setdefault(row["id"], []).append(figures)


def gibbs_over_rt(species, t):
    pieces = PIECES[species + ".g"]
    low, high, a2, a1, a, b, c, d, e, b_enthalpy, b_entropy = next(
        piece for piece in pieces if piece[0] <= t < piece[1]
    )
    ln_t = math.log(t)
    enthalpy = -a2 / t**2 + a1 * ln_t / t + a + b * t / 2 + c * t**2 / 3 + d * t**3 / 4
    enthalpy += e * t**4 / 5 + b_enthalpy / t
    entropy = -a2 / (2 * t**2) - a1 / t + a * ln_t + b * t + c * t**2 / 2 + d * t**3 / 3
    entropy += e * t**4 / 4 + b_entropy
    return enthalpy - entropy


def ln_k_of(t):
    return -sum(nu * gibbs_over_rt(species, t) for species, nu in NU.items() if nu)


def affinity(ln_k, amounts, extent):
    moved = {species: amounts[species] + nu * extent for species, nu in NU.items()}
    total = sum(moved.values())
    ln_q = 0.0
    for species, nu in NU.items():
        if nu:
            ln_q += nu * math.log(moved[species] / total * PRESSURE_PA / 1e5)
    return ln_k - ln_q


def rest(ln_k, amounts):
    low = max(-amounts[species] / nu for species, nu in NU.items() if nu > 0)
    high = min(-amounts[species] / nu for species, nu in NU.items() if nu < 0)
    edge = 1e-9 * (high - low)
    return brentq(lambda extent: affinity(ln_k, amounts, extent), low + edge, high - edge, xtol=1e-14)


def state(place):
    t = 900 + 300 * place / STATES
    steps = zip(NU, (3, 5, 7, 9, 11))
    return t, {species: 0.05 + place * step % 257 / 257 for species, step in steps}


def solve(t, amounts, _ln_k):
    ln_k = ln_k_of(t)
    return affinity(ln_k, amounts, 0.0) + rest(ln_k, amounts)


WORKS = {
    "K(T), Q and rest": solve,
    "rest": lambda t, amounts, ln_k: rest(ln_k, amounts),
    "K(T)": lambda t, amounts, ln_k: ln_k_of(t),
    "affinity": lambda t, amounts, ln_k: affinity(ln_k, amounts, 0.0),
}

states = [(t, amounts, ln_k_of(t)) for t, amounts in map(state, range(STATES))]
for name, work in WORKS.items():
    times = []
    for batch in range(BATCHES):
        start = time.perf_counter_ns()
        result = sum(work(*each) for each in states)
        times.append((time.perf_counter_ns() - start) / STATES)
    print(json.dumps({"place": "SciPy", "work": name, "sum": result, "ns": times}))
