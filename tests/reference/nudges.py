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

ANSWERS = Path(__file__).with_name("nudges_answers.tsv")
STEP = Fraction(1, 10**22)


def exact(x):
    """An mpf as a fraction."""
    over, under = libmp.to_rational(x._mpf_)
    return Fraction(int(over), int(under))


class Plant:
    """A problem with dH in J/mol, whose knobs can be turned."""

    def __init__(self, title, kinds, nu, amounts, ln_k, enthalpy, kelvin, pressure, volume):
        self.title, self.kinds, self.nu, self.amounts = title, kinds, nu, amounts
        self.ln_k, self.enthalpy, self.kelvin = ln_k, enthalpy, kelvin
        self.pressure, self.volume = pressure, volume
        self.now = self.rest(None, None)

    def rest(self, knob, value):
        """Outcome, extent and amounts at rest with one knob set; an inert stands at the end."""
        kinds, nu = self.kinds, list(self.nu)
        amounts = [Fraction(n) for n in self.amounts]
        kelvin, ln_k = Fraction(self.kelvin), Fraction(self.ln_k)
        pressure = None if self.pressure is None else Fraction(self.pressure)
        volume = None if self.volume is None else Fraction(self.volume)
        if knob == "temperature":
            kelvin = Fraction(value)
            distance = 1 / kelvin - 1 / Fraction(self.kelvin)
            ln_k -= Fraction(self.enthalpy) / GAS_CONSTANT * distance
        elif knob == "pressure":
            pressure = Fraction(value)
        elif knob == "volume":
            volume = Fraction(value)
        elif knob == "dilution":
            volume *= Fraction(value)
        elif knob in ("inert at pressure", "inert at volume"):
            kinds, nu = kinds + "g", nu + [0.0]
            amounts.append(Fraction(value))
            gas = sum(exact(n) for n, k in zip(self.now[2], self.kinds) if k == "g")
            energy = gas * GAS_CONSTANT * Fraction(self.kelvin)
            if knob == "inert at pressure" and pressure is None:
                pressure, volume = energy / volume, None
            elif knob == "inert at volume" and volume is None:
                pressure, volume = None, energy / pressure
        elif knob is not None:
            amounts[int(knob.split()[1])] = Fraction(value)
        problem = Problem("", kinds, nu, amounts, ln_k, pressure, volume, kelvin)
        outcomes, at_rest, _ = solve(problem)
        i = next(i for i, k in enumerate(kinds) if nu[i] != 0 and k != "a")
        extent = (at_rest[i] - number(amounts[i])) / number(nu[i])
        return outcomes[0], extent, at_rest

    def knobs(self):
        """Each knob with its value and a step, as doubles."""
        gas = sum(n for n, k in zip(self.amounts, self.kinds) if k == "g")
        yield "temperature", self.kelvin, 5.0
        if "g" in self.kinds:
            if self.pressure is not None:
                yield "pressure", self.pressure, 0.05 * self.pressure
            else:
                yield "volume", self.volume, 0.05 * self.volume
            yield "inert at pressure", 0.0, 0.05 * gas
            yield "inert at volume", 0.0, 0.05 * gas
        if "s" in self.kinds:
            yield "dilution", 1.0, 0.1
        everything = sum(self.amounts)
        for i, (kind, n) in enumerate(zip(self.kinds, self.amounts)):
            if kind in "gs":
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
        hold = f"P={self.pressure!r}" if self.pressure is not None else f"V={self.volume!r}"
        start = [self.title, self.kinds, show(self.nu), repr(self.kelvin), hold]
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
    ]
    for title, kinds, nu, enthalpy in reactions:
        for turn in range(5):
            amounts = [rounded(10 ** draw.uniform(-2, 1)) for _ in kinds]
            kelvin = rounded(draw.uniform(300, 1200))
            ln_k = rounded(draw.uniform(-6, 6))
            pressure, volume = rounded(10 ** draw.uniform(4, 7)), None
            if "s" in kinds or turn % 2:
                pressure, volume = None, rounded(10 ** draw.uniform(-3, 0))
            yield Plant(title, kinds, nu, amounts, ln_k, enthalpy, kelvin, pressure, volume)
    extreme = dict(kinds="ggg", nu=[-1.0, 1.0, 0.0], enthalpy=-40e3, kelvin=600.0)
    for ln_k in (-60.0, -30.0, 30.0, 60.0):
        amounts = [1.0, 0.5, 2.0]
        yield Plant(
            "far to one side", amounts=amounts, ln_k=ln_k, pressure=3e5, volume=None, **extreme
        )


def main():
    lines = [
        "# title, kinds, nu, T/K, hold, n/mol, ln K, dH/(J/mol), outcome, "
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
