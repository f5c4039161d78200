"""What small changes do to the state of rest, to forty digits and more.

Writes nudges_answers.tsv, which tests/nudges_reference.rs reads. Needs Python 3.9 or later and
mpmath.

    python3 tests/reference/nudges.py            writes the answers anew
    python3 tests/reference/nudges.py --check    compares them with the file, fails on a difference

The method is its own: every derivative is a central difference of two states of rest, each solved
at 90 digits by rest.py, with a step of 1e-22 of the knob; no formula for a derivative is used. K(T)
is ln K - (dH/R)(1/T - 1/T0) of the doubles given. A finite step is added to the knob as doubles
add, since that is what is asked of the program.
"""

import random
import sys
from fractions import Fraction
from pathlib import Path

from mpmath import libmp, mp, mpf

from rest import GAS_CONSTANT, Problem, number, solve
from solution import SolutionProblem

ANSWERS = Path(__file__).with_name("nudges_answers.tsv")
STEP = Fraction(1, 10**22)


def exact(x):
    """An mpf as a fraction."""
    over, under = libmp.to_rational(x._mpf_)
    return Fraction(int(over), int(under))


class Plant:
    """A problem with dH in J/mol, whose knobs can be turned; with charges, Davies' coefficients, and
    with the water among the species its activity."""

    def __init__(self, title, kinds, nu, amounts, ln_k, enthalpy, kelvin, charges=(), **held):
        self.title, self.kinds, self.nu, self.amounts = title, kinds, nu, amounts
        self.ln_k, self.enthalpy, self.kelvin = ln_k, enthalpy, kelvin
        self.charges, self.held = list(charges), held
        self.now = self.rest(None, None)

    def rest(self, knob, value):
        """Outcome, extent and amounts at rest with one knob set; an inert stands at the end."""
        kinds, nu, charges = self.kinds, list(self.nu), list(self.charges)
        amounts = [Fraction(n) for n in self.amounts]
        kelvin, ln_k = Fraction(self.kelvin), Fraction(self.ln_k)
        held = {name: Fraction(x) for name, x in self.held.items()}
        if knob == "temperature":
            kelvin = Fraction(value)
            distance = 1 / kelvin - 1 / Fraction(self.kelvin)
            ln_k -= Fraction(self.enthalpy) / GAS_CONSTANT * distance
        elif knob in ("pressure", "volume"):
            held[knob] = Fraction(value)
        elif knob == "dilution":
            held["water" if "water" in held else "volume"] *= Fraction(value)
        elif knob in ("inert at pressure", "inert at volume"):
            kinds, nu, charges = kinds + "g", nu + [0.0], charges and charges + [0]
            amounts.append(Fraction(value))
            gas = sum(exact(n) for n, k in zip(self.now[2], self.kinds) if k == "g")
            energy = gas * GAS_CONSTANT * Fraction(self.kelvin)
            if knob == "inert at pressure" and "volume" in held:
                held["pressure"] = energy / held.pop("volume")
            elif knob == "inert at volume" and "pressure" in held:
                held["volume"] = energy / held.pop("pressure")
        elif knob is not None:
            amounts[int(knob.split()[1])] = Fraction(value)
        held["kelvin"] = kelvin
        if charges or "w" in kinds:
            model, charges = ("davies", charges) if charges else ("ideal", [0] * len(nu))
            problem = SolutionProblem("", kinds, nu, charges, amounts, ln_k, model, **held)
        else:
            problem = Problem("", kinds, nu, amounts, ln_k, **held)
        outcomes, at_rest, _ = solve(problem)
        i = next(i for i, k in enumerate(kinds) if nu[i] != 0 and k not in "aw")
        extent = (at_rest[i] - number(amounts[i])) / number(nu[i])
        return outcomes[0], extent, at_rest

    def knobs(self):
        """Each knob with its value and a step, as doubles."""
        gas = sum(n for n, k in zip(self.amounts, self.kinds) if k == "g")
        yield "temperature", self.kelvin, 5.0
        if "g" in self.kinds:
            name = "pressure" if "pressure" in self.held else "volume"
            yield name, self.held[name], 0.05 * self.held[name]
            yield "inert at pressure", 0.0, 0.05 * gas
            yield "inert at volume", 0.0, 0.05 * gas
        if "s" in self.kinds:
            yield "dilution", 1.0, 0.1
        everything = sum(self.amounts)
        for i, (kind, n) in enumerate(zip(self.kinds, self.amounts)):
            if kind in "gsl":
                yield f"amount {i}", n, 0.01 * everything
                if self.nu[i] > 0 and n > 0:
                    yield f"amount {i}", n, -0.1 * n

    def rows(self):
        for knob, value, step in self.knobs():
            scale = Fraction(value) if value else Fraction(step)
            up = self.rest(knob, Fraction(value) + STEP * scale)
            if value:
                down = self.rest(knob, Fraction(value) - STEP * scale)
                slope = (up[1] - down[1]) / number(2 * STEP * scale)
            else:
                # Below no inert at all there is no state of rest: a difference from one side.
                two = self.rest(knob, 2 * STEP * scale)
                slope = (4 * up[1] - two[1] - 3 * self.now[1]) / number(2 * STEP * scale)
            outcome, extent, _ = self.rest(knob, value + step)
            yield knob, step, slope, outcome, extent - self.now[1]

    def text(self):
        show = lambda values: ",".join(repr(float(v)) for v in values)
        hold = ";".join(f"{name}={x!r}" for name, x in self.held.items())
        charges = ",".join(map(str, self.charges)) or "-"
        start = [self.title, self.kinds, charges, show(self.nu), repr(self.kelvin), hold]
        start += [show(self.amounts), repr(self.ln_k), repr(self.enthalpy), self.now[0]]
        for knob, step, slope, outcome, change in self.rows():
            # A difference below 1e-44 is what is left of rounding: it is zero.
            clean = [mpf(0) if abs(x) < mpf(10) ** -44 else x for x in (slope, change)]
            numbers = [mp.nstr(x, 22, strip_zeros=False) for x in clean]
            yield "\t".join(start + [knob, repr(step), numbers[0], outcome, numbers[1]])


def plants():
    """Reactions of the trade with invented states, and draws."""
    draw = random.Random(20191103)
    rounded = lambda x: float(f"{x:.6g}")
    reactions = [
        ("ammonia", "gggg", [-1.0, -3.0, 2.0, 0.0], -105e3),
        ("cracking of ammonia", "gggg", [1.0, 3.0, -2.0, 0.0], 105e3),
        ("shift", "ggggg", [-1.0, -1.0, 1.0, 1.0, 0.0], -38e3),
        ("reforming", "ggggg", [-1.0, -1.0, 1.0, 3.0, 0.0], 225e3),
        ("oxidation with a half", "gggg", [-1.0, -0.5, 1.0, 0.0], -99e3),
        ("no inert", "gg", [-1.0, 2.0], 57e3),
        ("gas over solids", "ppgg", [-1.0, 1.0, 1.0, 0.0], 170e3),
        ("carbon", "gpgg", [-2.0, 1.0, 1.0, 0.0], -171e3),
        ("ample solid", "agg", [-1.0, 1.0, 0.0], 60e3),
        ("acid", "sss", [-1.0, 1.0, 1.0], 4e3),
        ("pairing", "sss", [-2.0, 1.0, 0.0], -20e3),
        ("odd numbers", "ggg", [-0.7, 1.3, 0.3], 12e3),
        ("ester", "llll", [-1.0, -1.0, 1.0, 1.0], -5e3),
        ("pairs in a liquid", "lll", [-2.0, 1.0, 0.0], -30e3),
        ("acid by molality", "sss", [-1.0, 1.0, 1.0], 4e3),
        ("dissolving gas", "gsg", [-1.0, 1.0, 0.0], -20e3),
        ("gas that reacts with water", "gwssg", [-1.0, -1.0, 1.0, 1.0, 0.0], -10e3),
        ("gas beside a liquid", "gllg", [-1.0, -1.0, 1.0, 0.0], -60e3),
    ]
    for title, kinds, nu, enthalpy in reactions:
        for turn in range(5):
            amounts = [rounded(10 ** draw.uniform(-2, 1)) for _ in kinds]
            kelvin = rounded(draw.uniform(300, 1200))
            ln_k = rounded(draw.uniform(-6, 6))
            held = {"pressure": rounded(10 ** draw.uniform(4, 7))}
            wet = "w" in kinds or "g" in kinds and "s" in kinds or "molality" in title
            if turn % 2 or kinds.strip("s") == "":
                held = {"volume": rounded(10 ** draw.uniform(-3, 0))}
            if wet:
                kelvin = rounded(draw.uniform(280, 400))
                held = held if "g" in kinds else {}
                held["water"] = rounded(10 ** draw.uniform(-1, 1))
            yield Plant(title, kinds, nu, amounts, ln_k, enthalpy, kelvin, **held)
    brine = ("acid in brine", "sssss", [-1.0, 1.0, 1.0, 0.0, 0.0])
    for salt in (0.01, 0.3):
        amounts = [0.05, 1e-4, 2e-3, salt, salt]
        charges = [0, 1, -1, 1, -1]
        yield Plant(*brine, amounts, -10.95, -0.4e3, 298.15, charges, water=1.0)
    salt = ("salt with its water", "pssw", [-1.0, 1.0, 1.0, 2.0])
    yield Plant(*salt, [1.0, 1e-3, 2e-3, 0.0], -10.5, -0.5e3, 310.0, [0, 2, -2, 0], water=2.0)
    extreme = dict(kinds="ggg", nu=[-1.0, 1.0, 0.0], enthalpy=-40e3, kelvin=600.0)
    for ln_k in (-60.0, -30.0, 30.0, 60.0):
        amounts = [1.0, 0.5, 2.0]
        yield Plant("far to one side", amounts=amounts, ln_k=ln_k, pressure=3e5, **extreme)


def main():
    lines = [
        "# title, kinds, z, nu, T/K, hold, n/mol, ln K, dH/(J/mol), outcome, "
        "knob, step, dxi/dknob, outcome after, change of xi"
    ]
    for plant in plants():
        if plant.now[0] in ("rest", "phase exhausted"):
            lines += plant.text()
    text = "\n".join(lines) + "\n"
    if "--check" in sys.argv:
        same = ANSWERS.read_text(encoding="utf-8") == text
        print(f"{len(lines) - 1} answers", "agree" if same else "DIFFER")
        sys.exit(0 if same else 1)
    ANSWERS.write_text(text, encoding="utf-8")
    print(f"{len(lines) - 1} answers written")


if __name__ == "__main__":
    main()
