"""What tolerances do to the affinity, the approach and the missing conversion, by 100,000 draws.

python3 tests/reference/monte_carlo.py           fails if a committed answer differs by more than 2 %
python3 tests/reference/monte_carlo.py --write   makes monte_carlo.tsv anew

Each case is worked here by its own few lines of arithmetic, from the draws of its inputs, after
JCGM 101:2008; the program's propagation is compared with the standard deviations found.
"""

import json
import sys
from pathlib import Path

import numpy as np

HERE = Path(__file__).resolve().parent
ANSWERS = HERE / "monte_carlo.tsv"
CASES = HERE / "monte_carlo_cases.json"
DRAWS = 100_000
R = 8.31446261815324
ZERO_C = 273.15


class Draws:
    """Normal draws of the inputs: a value and its 95 % half-width."""

    def __init__(self, seed):
        self.of = np.random.default_rng(seed)

    def __call__(self, value, half_width=0.0):
        return value + half_width / 2 * self.of.standard_normal(DRAWS)

    def limits(self, value, half_width):
        """Evenly between two limits."""
        return value + half_width * (2 * self.of.random(DRAWS) - 1)


def van_t_hoff(ln_k0, t0, enthalpy, t):
    return ln_k0 - enthalpy / R * (1 / t - 1 / t0)


def t_star(ln_k0, t0, enthalpy, ln_q):
    return 1 / (1 / t0 - R * (ln_q - ln_k0) / enthalpy)


def rest_extent(nu, amounts, total, delta_nu, ln_k, ln_p):
    """The extent at rest by bisection over all draws at once."""
    low = np.max([-n / v for v, n in zip(nu, amounts) if v > 0], axis=0)
    high = np.min([n / -v for v, n in zip(nu, amounts) if v < 0], axis=0)
    reach = high - low
    a, b = low.copy(), high.copy()
    for _ in range(80):
        x = (a + b) / 2
        t = total + delta_nu * x
        ln_q = delta_nu * ln_p
        for v, n in zip(nu, amounts):
            ln_q = ln_q + v * (np.log(np.maximum(n + v * x, 1e-300)) - np.log(t))
        forward = ln_q < ln_k
        a = np.where(forward, x, a)
        b = np.where(forward, b, x)
    return x / reach


def shift(draw):
    """A dry analysis with steam per dry gas; K stated with its enthalpy."""
    t = draw(215, 2) + ZERO_C
    draw(27.4, 0.2)
    r = draw(0.30, 0.02)
    co, co2, n2 = draw(0.42, 0.02) / 100, draw(19.6, 0.3) / 100, draw(4.5, 0.2) / 100
    h2 = 1 - co - co2 - n2
    water = r / (1 + r)
    dry = 1 - water
    ln_k0, h = draw(5.15, 0.06), draw(-39_900, 800)
    ln_q = np.log(co2 * dry * h2 * dry / (co * dry * water))
    ln_k = van_t_hoff(ln_k0, 490.0, h, t)
    y = [co * dry, water, co2 * dry, h2 * dry]
    missing = rest_extent([-1, -1, 1, 1], y, 1.0, 0, ln_k, 0.0)
    return ln_k - ln_q, t - t_star(ln_k0, 490.0, h, ln_q), missing


def ammonia(draw):
    """Amounts with a gauge pressure and an atmosphere; K from the half reaction in atm."""
    t = draw(450, 3) + ZERO_C
    p = (draw(149, 1) + draw(1.01, 0.02)) * 1e5
    n2, h2, nh3, ar = draw(22, 0.4), draw(64, 1), draw(11, 0.5), draw(3, 0.3)
    total = n2 + h2 + nh3 + ar
    half_ln_kp, h = np.log(draw(0.0066, 0.0002)), draw(-52_000, 2_000)
    ln_k0 = 2 * half_ln_kp + 2 * np.log(1.01325)
    ln_q = 2 * np.log(nh3) - np.log(n2) - 3 * np.log(h2) + 2 * np.log(total) - 2 * np.log(p / 1e5)
    t0 = 723.15
    ln_k = van_t_hoff(ln_k0, t0, 2 * h, t)
    missing = rest_extent([-1, -3, 2], [n2, h2, nh3], total, -2, ln_k, np.log(p / 1e5))
    return ln_k - ln_q, t - t_star(ln_k0, t0, 2 * h, ln_q), missing


def converter(draw):
    """A feed; the outlet's SO3 is lost from the sample and restored by its sulfur, oxygen and
    nitrogen. Least squares in the relative differences, weights fixed by the feed."""
    t = draw(600, 3) + ZERO_C
    p = draw(1.2, 0.01)
    so2, o2 = draw(2.6, 0.1) / 100, draw(8.0, 0.1) / 100
    n2 = 1 - so2 - o2
    f_so2, f_o2 = draw(9.5, 0.1) / 100, draw(11.2, 0.1) / 100
    f_n2 = 1 - f_so2 - f_o2
    feed = np.array([f_so2, 2 * f_so2 + 2 * f_o2, 2 * f_n2])
    scale_column = np.array([so2, 2 * so2 + 2 * o2, 2 * n2]) / feed
    lost_column = np.array([np.ones(DRAWS), 3 * np.ones(DRAWS), np.zeros(DRAWS)]) / feed
    aa, ab, bb = (scale_column**2).sum(0), (scale_column * lost_column).sum(0), (lost_column**2).sum(0)
    ra, rb = scale_column.sum(0), lost_column.sum(0)
    det = aa * bb - ab * ab
    s, w = (ra * bb - rb * ab) / det, (aa * rb - ab * ra) / det
    total = s + w
    y = [s * so2 / total, s * o2 / total, w / total]
    ln_k0, h, t0 = draw(4.6, 0.1), draw(-196_000, 2_000), 873.15
    ln_q = 2 * np.log(y[2]) - 2 * np.log(y[0]) - np.log(y[1]) - np.log(p)
    ln_k = van_t_hoff(ln_k0, t0, h, t)
    missing = rest_extent([-2, -1, 2], y, 1.0, -1, ln_k, np.log(p))
    return ln_k - ln_q, t - t_star(ln_k0, t0, h, ln_q), missing


def trace(draw):
    """A trace of CO known to a third: here the change is not in proportion."""
    t = draw(215, 2) + ZERO_C
    co, co2, water = draw(0.15, 0.10) / 100, draw(15, 0.3) / 100, draw(23, 0.5) / 100
    good = co > 0
    h2 = 1 - co - co2 - water
    ln_k0, h = draw(5.15), draw(-39_900)
    ln_q = np.log(co2 * h2 / (np.where(good, co, np.nan) * water))
    ln_k = van_t_hoff(ln_k0, 490.0, h, t)
    approach = t - t_star(ln_k0, 490.0, h, ln_q)
    return (ln_k - ln_q)[good], approach[good], None


def dew_point(draw):
    """Water from a dew point at a pressure of its own; the equation of Wagner and Pruss."""
    t = draw(400, 4) + ZERO_C
    dew = draw(64, 0.8) + ZERO_C
    own = draw(1.10, 0.02) * 1e5
    tau = 1 - dew / 647.096
    a = [-7.85951783, 1.84408259, -11.7866497, 22.6807411, -15.9618719, 1.80122502]
    powers = [1, 1.5, 3, 3.5, 4, 7.5]
    ln_p = np.log(22.064e6) + 647.096 / dew * sum(c * tau**k for c, k in zip(a, powers))
    water = np.exp(ln_p) / own
    co, co2, n2 = draw(3.2, 0.1) / 100, draw(16.0, 0.3) / 100, draw(21, 0.4) / 100
    h2 = 1 - co - co2 - n2
    ln_k0, h, t0 = draw(2.0, 0.02), draw(-38_000, 400), 673.15
    dry = 1 - water
    ln_q = np.log(co2 * dry * h2 * dry / (co * dry * water))
    ln_k = van_t_hoff(ln_k0, t0, h, t)
    y = [co * dry, water, co2 * dry, h2 * dry]
    missing = rest_extent([-1, -1, 1, 1], y, 1.0, 0, ln_k, 0.0)
    return ln_k - ln_q, t - t_star(ln_k0, t0, h, ln_q), missing


WORKED = {
    "shift": shift,
    "ammonia": ammonia,
    "converter": converter,
    "trace": trace,
    "dew point": dew_point,
}


def answers():
    for seed, (name, work) in enumerate(WORKED.items(), start=20261201):
        affinity, approach, missing = work(Draws(seed))
        spread = [np.std(x) if x is not None else None for x in (affinity, approach, missing)]
        yield name, ["" if x is None else f"{x:.5g}" for x in spread]


def main():
    names = [case["name"] for case in json.loads(CASES.read_text())]
    if names != list(WORKED):
        sys.exit(f"{CASES.name} holds {names}, worked here: {list(WORKED)}")
    rows = [("name", ["u_affinity_over_rt", "u_approach_k", "u_missing_conversion"]), *answers()]
    text = "".join("\t".join([name, *cells]) + "\n" for name, cells in rows)
    if "--write" in sys.argv:
        ANSWERS.write_text(text)
        return
    for old, new in zip(ANSWERS.read_text().splitlines()[1:], text.splitlines()[1:], strict=True):
        for a, b in zip(old.split("\t")[1:], new.split("\t")[1:], strict=True):
            if a != b and abs(float(a) / float(b) - 1) > 0.02:
                sys.exit(f"{old} is not {new}")
    print(f"{len(WORKED)} cases, {DRAWS} draws each: the committed answers hold")


main()
