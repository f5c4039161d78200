"""The state of rest of one reaction to sixty digits and more, for the doubles of each problem.

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
    """kinds: a string of g (gas), p (pure), a (ample), s (solute); one letter a species."""

    def __init__(self, title, kinds, nu, amounts, ln_k, pressure=None, volume=None, kelvin=500.0):
        self.title, self.kinds, self.nu, self.amounts = title, kinds, nu, amounts
        self.ln_k, self.pressure, self.volume, self.kelvin = ln_k, pressure, volume, kelvin
        self.exact = [Fraction(n) for n in amounts]
        self.exact_nu = [Fraction(n) for n in nu]
        self.mixed = [i for i, k in enumerate(kinds) if k in "gs" and nu[i] != 0]
        self.by_fraction = pressure is not None and "g" in kinds
        self.delta = sum((self.exact_nu[i] for i in self.mixed), Fraction(0))

    def unit(self):
        """What turns an amount or an amount fraction into an activity."""
        if self.pressure is not None:
            return Fraction(self.pressure) / STANDARD_PRESSURE
        if "s" in self.kinds:
            return 1 / (Fraction(self.volume) * STANDARD_CONCENTRATION)
        return GAS_CONSTANT * Fraction(self.kelvin) / (Fraction(self.volume) * STANDARD_PRESSURE)

    def limit(self, sign):
        """The distance to where the first species with this sign of nu is used up, or None."""
        found = [
            n / abs(v)
            for k, v, n in zip(self.kinds, self.exact_nu, self.exact)
            if v * sign > 0 and k != "a"
        ]
        return min(found) if found else None

    def constant(self):
        """Whether Q is the same at every extent."""
        if not self.mixed:
            return True
        if not self.by_fraction:
            return False
        gases = [i for i, k in enumerate(self.kinds) if k == "g"]
        inert = sum(self.exact[i] for i in gases if self.nu[i] == 0)
        if inert or len({v > 0 for v in (self.nu[i] for i in self.mixed)}) > 1:
            return False
        return len({self.exact[i] / abs(self.exact_nu[i]) for i in self.mixed}) == 1

    def constant_affinity(self):
        """ln K - ln Q for gas made in the proportion of nu."""
        if not self.mixed:
            return number(self.ln_k)
        ln_q = number(self.delta) * mp.log(number(self.unit()))
        for i in self.mixed:
            share = self.exact_nu[i] / self.delta
            ln_q += number(self.exact_nu[i]) * mp.log(number(share))
        return number(self.ln_k) - ln_q


class Seen:
    """A problem seen from one limit: amounts there, and how they change with the distance."""

    def __init__(self, problem, way):
        self.problem, self.way = problem, way
        distance = problem.limit(-way)
        self.at_limit, self.slope = [], []
        for k, v, n in zip(problem.kinds, problem.exact_nu, problem.exact):
            still = k == "a"
            self.at_limit.append(n if still else n + way * v * distance)
            self.slope.append(Fraction(0) if still else -way * v)
        self.r = [number(x) for x in self.at_limit]
        self.w = [number(x) for x in self.slope]
        self.nu = [number(v) for v in problem.exact_nu]
        self.ln_unit = number(problem.delta) * mp.log(number(problem.unit()))
        self.ln_k = number(problem.ln_k)

    def amounts(self, d):
        return [r + w * d for r, w in zip(self.r, self.w)]

    def affinity(self, d):
        n = self.amounts(d)
        ln_q = self.ln_unit + sum(self.nu[i] * mp.log(n[i]) for i in self.problem.mixed)
        if self.problem.by_fraction:
            total = sum(x for x, k in zip(n, self.problem.kinds) if k == "g")
            ln_q -= number(self.problem.delta) * mp.log(total)
        return self.ln_k - ln_q

    def rising(self, u):
        """The affinity with the sign that makes it rise with u = ln d."""
        return self.way * self.affinity(mp.exp(u))

    def hard(self):
        """Whether only pure phases are used up at the limit."""
        return all(self.at_limit[i] != 0 for i in self.problem.mixed)


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
    if problem.by_fraction:
        total = sum(x for x, k in zip(n, problem.kinds) if k == "g")
        slope -= number(problem.delta) ** 2 / total
    worst_input = max(abs(seen.ln_k), abs(number(problem.delta)))
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
        if problem.by_fraction and problem.constant_affinity() * way <= 0:
            return stay("has no limit")
        high = mpf(8000)
    seen = Seen(problem, way)
    if seen.hard():
        at_limit = way * seen.affinity(mpf(0))
        # Where a few roundings of the inputs change the outcome, both are right.
        room = 8 * EPSILON * max(1.0, abs(problem.ln_k), abs(float(problem.delta)))
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
    hold = f"P={problem.pressure!r}" if problem.pressure is not None else f"V={problem.volume!r}"
    logs = [
        "-" if n == 0 or k == "a" else mp.nstr(mp.log(n), 22, strip_zeros=False)
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
