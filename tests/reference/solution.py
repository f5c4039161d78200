"""The state of rest with activity coefficients in the solution, to fifty digits and more.

Writes solution_answers.tsv, which tests/rest_solution.rs reads. Needs Python 3.9 or later and mpmath.

    python3 tests/reference/solution.py            writes the answers anew
    python3 tests/reference/solution.py --check    compares them with the file, and fails on a difference

The affinity with activity coefficients is closed in on directly, by the bisection and secants of
rest.py; all amounts are invented. The Debye-Hueckel parameters are computed here from the same
published equations: density of saturated water, IAPWS SR1-86(1992); permittivity, IAPWS R8-97.
The activity of water is integrated numerically from the activity coefficients (Gibbs and Duhem).
"""

import sys
from fractions import Fraction
from pathlib import Path

from mpmath import mp, mpf

from rest import Problem, number, solve

ANSWERS = Path(__file__).with_name("solution_answers.tsv")
WATER_MOLAR_MASS = mpf("0.018015268")
CORRELATION = """0.978224486826 1 0.25, -0.957771379375 1 1, 0.237511794148 1 2.5,
0.714692244396 2 1.5, -0.298217036956 3 1.5, -0.108863472196 3 2.5, 0.0949327488264 4 2,
-0.00980469816509 5 2, 0.0000165167634970 6 5, 0.0000937359795772 7 0.5, -1.23179218720e-10 10 10"""
DENSITY = "1.99274064 1, 1.09965342 2, -0.510839303 5, -1.75493479 16, -45.5170352 43, -674694.450 110"


def table(text):
    """Rows of numbers."""
    return [[mpf(x) for x in row.split()] for row in text.split(",")]


def parameters(kelvin):
    """A for natural logarithms and B in 1/pm."""
    critical = mpf("647.096")
    tau = 1 - kelvin / critical
    density = 322 * (1 + sum(b * tau ** (thirds / 3) for b, thirds in table(DENSITY)))
    avogadro, charge = mpf("6.02214076e23"), mpf("1.602176634e-19")
    boltzmann, vacuum = mpf("8.31446261815324") / avogadro, mpf("8.8541878128e-12")
    amount, ratio = density / WATER_MOLAR_MASS, density / 322
    g = 1 + sum(n * ratio**i * (critical / kelvin) ** j for n, i, j in table(CORRELATION))
    g += mpf("0.00196096504426") * ratio * (kelvin / 228 - 1) ** mpf("-1.2")
    a = avogadro * mpf("6.138e-30") ** 2 * amount * g / (vacuum * boltzmann * kelvin)
    b = avogadro * mpf("1.636e-40") * amount / (3 * vacuum)
    root = mp.sqrt(9 + 2 * a + 18 * b + a**2 + 10 * a * b + 9 * b**2)
    permittivity = (1 + a + 5 * b + root) / (4 - 4 * b)
    thermal = vacuum * permittivity * boltzmann * kelvin
    strong = charge**3 * mp.sqrt(2 * avogadro * density) / (8 * mp.pi * thermal ** mpf("1.5"))
    return strong, charge * mp.sqrt(2 * avogadro * density / thermal) / mpf(10) ** 12


class SolutionProblem(Problem):
    """A problem with charges, sizes in pm and a model: ideal, davies or debye-hueckel."""

    def __init__(self, title, kinds, nu, charges, amounts, ln_k, model, sizes=None, **held):
        super().__init__(title, kinds, nu, amounts, ln_k, **held)
        self.charges, self.model = charges, model
        self.sizes = sizes or [400.0] * len(nu)
        self.strong, self.inverse = parameters(number(Fraction(self.kelvin)))
        self.kilograms = number(self.water)

    def damping(self, size, strength):
        """f in ln gamma = -z^2 f."""
        root = mp.sqrt(strength)
        if self.model == "davies":
            return self.strong * (root / (1 + root) - mpf(3) / 10 * strength)
        if self.model == "debye-hueckel":
            return self.strong * root / (1 + self.inverse * number(size) * root)
        return mpf(0)

    def mean_change(self, size, strength):
        """The integral of t df along the dilution t m, by parts; t = s^2 makes it smooth."""
        inside = mp.quad(lambda s: 2 * s * self.damping(size, strength * s * s), [0, 1])
        return self.damping(size, strength) - inside

    def correction(self, amounts):
        solutes = [i for i, k in enumerate(self.kinds) if k == "s"]
        m = {i: amounts[i] / self.kilograms for i in solutes}
        strength = sum(m[i] * self.charges[i] ** 2 for i in solutes) / 2
        total = -sum(
            number(self.exact_nu[i]) * self.charges[i] ** 2 * self.damping(self.sizes[i], strength)
            for i in solutes
        )
        water = sum(number(v) for v, k in zip(self.exact_nu, self.kinds) if k == "w")
        if water:
            charged = {}
            for i in solutes:
                charged[self.sizes[i]] = charged.get(self.sizes[i], 0) + m[i] * self.charges[i] ** 2
            if self.model == "davies":
                charged = {400.0: sum(charged.values())}
            excess = sum(q * self.mean_change(size, strength) for size, q in charged.items() if q)
            total -= water * WATER_MOLAR_MASS * (sum(m.values()) - excess)
        return total

    def strength_at(self, amounts):
        """The ionic strength in mol/kg."""
        each = zip(self.kinds, self.charges, amounts)
        return sum(z * z * n for k, z, n in each if k == "s") / self.kilograms / 2


def problems():
    """Acids, salts, complexes, gases that dissolve and react; all numbers are invented."""
    room = {"kelvin": 298.15}

    def one(title, kinds, nu, charges, amounts, ln_k, sizes=None, **held):
        for model in ["davies", "debye-hueckel"]:
            held = {**room, **held}
            yield SolutionProblem(title, kinds, nu, charges, amounts, ln_k, model, sizes, **held)

    acid = ("weak acid", "sssss", [-1.0, 1.0, 1.0, 0.0, 0.0], [0, 1, -1, 1, -1])
    sizes = [400.0, 900.0, 450.0, 425.0, 300.0]
    for salt in [0.0, 1e-3, 0.1, 0.6]:
        yield from one(*acid, [0.1, 0.0, 0.0, salt, salt], -10.951, sizes, water=1.0)
    yield from one(*acid, [0.02, 1e-7, 0.05, 0.05, 0.0], -10.951, sizes, water=2.5)
    second = ("second dissociation", "sssss", [-1.0, 1.0, 1.0, 0.0, 0.0], [-2, 1, -3, 1, -1])
    yield from one(*second, [0.01, 1e-5, 1e-6, 0.3, 0.1], -26.2, water=1.0)
    salt = ("dissolving salt", "psswss", [-1.0, 1.0, 1.0, 2.0, 0.0, 0.0], [0, 2, -2, 0, 1, -1])
    for beside in [0.0, 0.05, 0.4]:
        feed = [1.0, 0.0, 0.0, 0.0, beside, beside]
        yield from one(*salt, feed, -10.548, [400.0, 600.0, 400.0, 400.0, 425.0, 300.0], water=1.0)
    yield from one(*salt, [0.001, 0.0, 0.0, 0.0, 0.02, 0.02], -10.548, water=1.0)
    yield from one(*salt, [0.0, 0.2, 0.1, 0.0, 0.02, 0.22], -10.548, water=1.0)
    trivalent = ("hydroxide", "asss", [-1.0, 1.0, 3.0, 0.0], [0, 3, -1, 1])
    yield from one(*trivalent, [0.0, 1e-9, 1e-3, 1e-3], -74.0, [400.0, 900.0, 350.0, 425.0], water=1.0)
    own = ("own dissociation", "wssss", [-1.0, 1.0, 1.0, 0.0, 0.0], [0, 1, -1, 1, -1])
    for kelvin, ln_k in [(298.15, -32.2), (353.15, -29.0), (423.15, -26.9)]:
        yield from one(*own, [0.0, 0.0, 0.0, 0.2, 0.2], ln_k, water=1.0, kelvin=kelvin)
    complex_ion = ("complex", "sssss", [-1.0, -4.0, 1.0, 0.0, 0.0], [2, 0, 2, 1, -1])
    yield from one(*complex_ion, [0.01, 0.2, 0.0, 0.1, 0.12], 29.0, water=1.0)
    gas = ("gas that dissolves and reacts", "gwssgs", [-1.0, -1.0, 1.0, 1.0, 0.0, 0.0], [0, 0, 1, -1, 0, 1])
    for feed in [[1.0, 0.0, 0.0, 0.0, 9.0, 0.0], [0.02, 0.0, 0.0, 0.3, 0.2, 0.3], [1e-3, 0, 1e-6, 0.5, 0, 0.5]]:
        feed = [float(n) for n in feed]
        yield from one(*gas, feed, -4.1, water=1.0, pressure=1.2e5)
        yield from one(*gas, feed, -4.1, water=1.0, volume=0.05)
    for water in [1.0, 20.0]:
        held = {**room, "water": water}
        feed = [0.0, 0.0, 0.0, 1.5, 1.5]
        yield SolutionProblem(own[0], *own[1:], feed, -32.2, "ideal", **held)
        feed = [5.0, 0.0, 0.0, 0.0, 2.0, 2.0]
        yield SolutionProblem(salt[0], *salt[1:], feed, 0.7, "ideal", **held)


def row(problem):
    """One line of the table."""
    show = lambda values: ",".join(repr(float(v)) for v in values)
    outcomes, amounts, _ = solve(problem)
    assert len(outcomes) == 1
    logs = [
        "-" if n == 0 or k in "aw" else mp.nstr(mp.log(n), 22, strip_zeros=False)
        for n, k in zip(amounts, problem.kinds)
    ]
    held = [("P", problem.pressure), ("V", problem.volume), ("W", problem.water)]
    hold = ";".join(f"{letter}={x!r}" for letter, x in held if x is not None)
    start = [problem.title, problem.model, problem.kinds, show(problem.nu)]
    start += [",".join(map(str, problem.charges)), show(problem.sizes), repr(problem.kelvin), hold]
    end = [outcomes[0], ",".join(logs), mp.nstr(problem.strength_at(amounts), 20)]
    return "\t".join(start + [show(problem.amounts), repr(problem.ln_k)] + end)


def main():
    header = "# title, model, kinds, nu, z, size/pm, T/K, hold, n/mol, ln K, outcome, ln(n/mol), I"
    lines = [header] + [row(problem) for problem in problems()]
    text = "\n".join(lines) + "\n"
    if "--check" in sys.argv:
        same = ANSWERS.read_text(encoding="utf-8") == text
        print(f"{len(lines) - 1} answers", "agree" if same else "DIFFER")
        sys.exit(0 if same else 1)
    ANSWERS.write_text(text, encoding="utf-8")
    print(f"{len(lines) - 1} answers written")


if __name__ == "__main__":
    main()
