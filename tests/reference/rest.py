"""The state of rest of one ideal reaction to sixty digits and more, for the doubles of each problem.

Writes rest_answers.tsv, which tests/rest.rs reads. Needs Python 3.9 or later and mpmath.

    python3 tests/reference/rest.py            writes the answers anew
    python3 tests/reference/rest.py --check    compares them with the file, and fails on a difference

The method is its own: amounts at the limits of the extent as exact fractions of the doubles given,
and plain bisection with secant steps on the affinity at 90 digits. K, T, P and V are the doubles
read exactly. The condition of an answer is the worst |d ln n_i / d ln x| over x = P, V, T and over
ln K, by differentiating the equation of rest; amounts are left out of it, which is the stricter
test, since a solver that forms differences of amounts without rounding does not feel them.
"""

import math
import random
import sys
from fractions import Fraction
from pathlib import Path

from mpmath import mp, mpf

mp.dps = 90
ANSWERS = Path(__file__).with_name("rest_answers.tsv")
GAS_CONSTANT = Fraction("8.31446261815324")
STANDARD_PRESSURE = Fraction(100000)
STANDARD_CONCENTRATION = Fraction(1000)
EPSILON = 2.0**-52


def number(x):
    """A fraction or double as an mpf."""
    x = Fraction(x)
    return mpf(x.numerator) / mpf(x.denominator)


class Problem:
    """kinds: a string of g (gas), p (pure), a (ample), s (solute), l (liquid mixture), w (the water
    of the solution); one letter a species. The hold is a pressure or a volume, and a mass of water beside it or alone."""

    def __init__(
        self, title, kinds, nu, amounts, ln_k, pressure=None, volume=None, water=None, kelvin=500.0
    ):
        self.title, self.kinds, self.nu, self.amounts = title, kinds, nu, amounts
        self.ln_k, self.kelvin = ln_k, kelvin
        self.pressure, self.volume, self.water = pressure, volume, water
        self.exact = [Fraction(n) for n in amounts]
        self.exact_nu = [Fraction(n) for n in nu]
        self.mixed = [i for i, k in enumerate(kinds) if k in "gsl" and nu[i] != 0]
        self.mixtures = sorted({kinds[i] for i in self.mixed})
        self.delta = {
            letter: sum((self.exact_nu[i] for i in self.of(letter)), Fraction(0))
            for letter in self.mixtures
        }

    def of(self, letter):
        """The reacting species of one mixture."""
        return [i for i in self.mixed if self.kinds[i] == letter]

    def by_fraction(self, letter):
        """Whether the activities of a mixture follow amount fractions."""
        return letter == "l" or letter == "g" and self.pressure is not None

    def unit(self, letter):
        """What turns an amount or an amount fraction into an activity."""
        if letter == "l":
            return Fraction(1)
        if letter == "s" and self.water is not None:
            return 1 / Fraction(self.water)
        if letter == "s":
            return 1 / (Fraction(self.volume) * STANDARD_CONCENTRATION)
        if self.pressure is not None:
            return Fraction(self.pressure) / STANDARD_PRESSURE
        return GAS_CONSTANT * Fraction(self.kelvin) / (Fraction(self.volume) * STANDARD_PRESSURE)

    def limit(self, sign):
        """The distance to where the first species with this sign of nu is used up, or None."""
        found = [
            n / abs(v)
            for k, v, n in zip(self.kinds, self.exact_nu, self.exact)
            if v * sign > 0 and k not in "aw"
        ]
        return min(found) if found else None

    def correction(self, amounts):
        """What activity coefficients add to ln Q: nothing in ideal mixtures."""
        return mpf(0)

    def steady(self, letter):
        """Whether a mixture keeps its composition at every extent."""
        if not self.by_fraction(letter):
            return False
        inert = sum(n for n, v, k in zip(self.exact, self.nu, self.kinds) if k == letter and v == 0)
        if inert or len({self.nu[i] > 0 for i in self.of(letter)}) > 1:
            return False
        return len({self.exact[i] / abs(self.exact_nu[i]) for i in self.of(letter)}) == 1

    def constant(self):
        """Whether Q is the same at every extent."""
        return all(self.steady(letter) for letter in self.mixtures)

    def constant_affinity(self):
        """ln K - ln Q for mixtures made in the proportion of nu."""
        ln_q = mpf(0)
        for letter in self.mixtures:
            delta = self.delta[letter]
            ln_q += number(delta) * mp.log(number(self.unit(letter)))
            for i in self.of(letter):
                ln_q += number(self.exact_nu[i]) * mp.log(number(self.exact_nu[i] / delta))
        return number(self.ln_k) - ln_q


class Seen:
    """A problem seen from one limit: amounts there, and how they change with the distance."""

    def __init__(self, problem, way):
        self.problem, self.way = problem, way
        distance = problem.limit(-way)
        self.at_limit, self.slope = [], []
        for k, v, n in zip(problem.kinds, problem.exact_nu, problem.exact):
            still = k in "aw"
            self.at_limit.append(n if still else n + way * v * distance)
            self.slope.append(Fraction(0) if still else -way * v)
        self.r = [number(x) for x in self.at_limit]
        self.w = [number(x) for x in self.slope]
        self.nu = [number(v) for v in problem.exact_nu]
        self.ln_unit = sum(
            number(problem.delta[letter]) * mp.log(number(problem.unit(letter)))
            for letter in problem.mixtures
        )
        self.ln_k = number(problem.ln_k)

    def amounts(self, d):
        return [r + w * d for r, w in zip(self.r, self.w)]

    def whole(self, letter, amounts):
        """The amount of a mixture, inert species too."""
        return sum(x for x, k in zip(amounts, self.problem.kinds) if k == letter)

    def vanishes(self, letter):
        """Whether a mixture that follows fractions is used up as a whole at the limit."""
        return self.problem.by_fraction(letter) and self.whole(letter, self.at_limit) == 0

    def affinity(self, d):
        n = self.amounts(d)
        ln_q = self.ln_unit
        for letter in self.problem.mixtures:
            # A mixture that is used up as a whole has the same composition at every distance.
            here = self.amounts(mpf(1)) if self.vanishes(letter) else n
            ln_q += sum(self.nu[i] * mp.log(here[i]) for i in self.problem.of(letter))
            if self.problem.by_fraction(letter):
                total = mp.log(self.whole(letter, here))
                ln_q -= number(self.problem.delta[letter]) * total
        return self.ln_k - ln_q - self.problem.correction(n)

    def rising(self, u):
        """The affinity with the sign that makes it rise with u = ln d."""
        return self.way * self.affinity(mp.exp(u))

    def hard(self):
        """Whether only whole phases are used up at the limit."""
        kinds = self.problem.kinds
        open_ones = [i for i in self.problem.mixed if not self.vanishes(kinds[i])]
        return all(self.at_limit[i] != 0 for i in open_ones)


def zero(function, low, high):
    """The zero of a rising function, by secant steps kept inside a shrinking bracket."""
    at_low, at_high = function(low), function(high)
    assert at_low < 0 <= at_high, (at_low, at_high)
    for step in range(3000):
        width = high - low
        if width < mpf(10) ** -70:
            break
        point = (low + high) / 2
        if step % 3:
            secant = low - at_low * width / (at_high - at_low)
            # A little beyond the secant's zero, so that the bracket closes from both ends.
            nudge = width / 10**6 * (1 if step % 3 == 1 else -1)
            if low < secant + nudge < high:
                point = secant + nudge
        value = function(point)
        if value < 0:
            low, at_low = point, value
        else:
            high, at_high = point, value
    return (low + high) / 2


def conditions(problem, seen, d):
    """The worst relative change of each amount for a relative change of ln K, P, V or T."""
    n = seen.amounts(d)
    slope = sum(seen.nu[i] ** 2 / n[i] for i in problem.mixed)
    for letter in problem.mixtures:
        if problem.by_fraction(letter):
            slope -= number(problem.delta[letter]) ** 2 / seen.whole(letter, n)
    worst_input = max([abs(seen.ln_k)] + [abs(number(v)) for v in problem.delta.values()])
    return [abs(v) / x / slope * worst_input if x > 0 else mpf(0) for v, x in zip(seen.nu, n)]


def solve(problem):
    """Outcomes that are right, ln n of each species (None if absent or ample), conditions."""

    def stay(outcome):
        return [outcome], [number(n) for n in problem.exact], None

    forward, reverse = problem.limit(-1), problem.limit(1)
    if forward == 0 and reverse == 0:
        return stay("nothing can move")
    if problem.constant():
        affinity = problem.constant_affinity()
        size = max([1.0, abs(problem.ln_k), sum(abs(problem.nu[i]) for i in problem.mixed)])
        if abs(affinity) <= 4 * EPSILON * size:
            return stay("any extent is at rest")
        assert abs(affinity) > 100 * EPSILON * size, "on the edge of a rounding"
        way = 1 if affinity > 0 else -1
        if problem.limit(-way) is None:
            return stay("has no limit")
        return ["ran to its limit"], Seen(problem, way).amounts(mpf(0)), None
    if forward is not None and reverse is not None:
        middle = number(forward + reverse) / 2
        way = 1 if Seen(problem, 1).affinity(middle) > 0 else -1
        high = mp.log(middle)
    else:
        way = 1 if forward is not None else -1
        if all(map(problem.by_fraction, problem.mixtures)) and problem.constant_affinity() * way <= 0:
            return stay("has no limit")
        high = mpf(8000)
    seen = Seen(problem, way)
    if seen.hard():
        at_limit = way * seen.affinity(mpf(0))
        # Where a few roundings of the inputs change the outcome, both are right.
        delta = sum(abs(float(v)) for v in problem.delta.values())
        room = 8 * EPSILON * max(1.0, abs(problem.ln_k), delta)
        outcomes = ["phase exhausted" if at_limit > 0 else "rest"]
        if abs(at_limit) < room:
            outcomes = ["phase exhausted", "rest"]
        if at_limit >= 0:
            return outcomes, seen.amounts(mpf(0)), None
    else:
        outcomes = ["rest"]
    u = zero(seen.rising, mpf(-40000), high)
    d = mp.exp(u)
    assert abs(seen.rising(u)) < mpf(10) ** -50
    if max(seen.amounts(d)) > mpf(10) ** 300:
        return stay("has no limit")
    return outcomes, seen.amounts(d), conditions(problem, seen, d)


def row(problem):
    """One line of the table."""
    outcomes, amounts, condition = solve(problem)
    show = lambda values: ",".join(repr(float(v)) for v in values)
    held = [("P", problem.pressure), ("V", problem.volume), ("W", problem.water)]
    hold = ";".join(f"{letter}={x!r}" for letter, x in held if x is not None)
    logs = [
        "-" if n == 0 or k in "aw" else mp.nstr(mp.log(n), 22, strip_zeros=False)
        for n, k in zip(amounts, problem.kinds)
    ]
    condition = condition or [mpf(0)] * len(logs)
    return "\t".join(
        [problem.title, problem.kinds, show(problem.nu), repr(problem.kelvin), hold]
        + [show(problem.amounts), repr(problem.ln_k), "|".join(outcomes), ",".join(logs)]
        + [",".join(mp.nstr(c, 4) for c in condition)]
    )


def main():
    from rest_problems import problems

    lines = ["# title, kinds, nu, T/K, hold, n/mol, ln K, outcome, ln(n/mol), condition"]
    lines += [row(problem) for problem in problems(Problem, random.Random(20190520), math)]
    text = "\n".join(lines) + "\n"
    if "--check" in sys.argv:
        same = ANSWERS.read_text(encoding="utf-8") == text
        print(f"{len(lines) - 1} answers", "agree" if same else "DIFFER")
        sys.exit(0 if same else 1)
    ANSWERS.write_text(text, encoding="utf-8")
    print(f"{len(lines) - 1} answers written")


if __name__ == "__main__":
    main()
