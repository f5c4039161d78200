"""The same work as a plain script: K, Q and rest of the shift with SciPy's brentq.

One line a work: its name and the nanoseconds of one turn. K comes from van 't Hoff's line, which is
less than the library does.
"""

from math import exp, log
from time import perf_counter

from scipy.optimize import brentq

AMOUNTS = [0.003, 0.23, 0.15, 0.58, 0.035]
NU = [-1, -1, 1, 1, 0]


def ln_k(t):
    return 4577.8 / t - 4.33


def ln_q(amounts):
    total = sum(amounts)
    return sum(v * log(n / total * 25.0) for n, v in zip(amounts, NU) if v)


def rest(amounts, k):
    low = -min(amounts[2], amounts[3]) * (1 - 1e-12)
    high = min(amounts[0], amounts[1]) * (1 - 1e-12)
    return brentq(
        lambda x: ln_q([n + v * x for n, v in zip(amounts, NU)]) - k, low, high, xtol=1e-15
    )


def turn(work, i):
    t = 480.0 + i % 64
    amounts = [0.003 + 1e-5 * (i % 128), *AMOUNTS[1:]]
    if work == "K":
        return exp(ln_k(t))
    if work == "Q":
        return ln_q(amounts)
    if work == "rest":
        return rest(amounts, 5.0)
    return ln_k(t) - ln_q(amounts) + rest(amounts, ln_k(t))


for work in ("K, Q and rest", "rest", "K", "Q"):
    count, rounds = (3000 if "rest" in work else 30000), []
    for _ in range(5):
        start = perf_counter()
        for i in range(count):
            turn(work, i)
        rounds.append((perf_counter() - start) / count * 1e9)
    print(f"{work}\t{sorted(rounds)[2]:.1f}", flush=True)
