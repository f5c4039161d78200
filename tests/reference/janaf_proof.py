"""Makes the reactions that hold the library against the NIST-JANAF tables, or checks them.

python3 tests/reference/janaf_proof.py            fails if the committed rows differ
python3 tests/reference/janaf_proof.py --write    makes tests/published/janaf_proof.tsv anew

Every species that both know is formed from its elements, and a seeded generator balances reactions
between a few of them. log10 K comes from the tables' ΔfG° between their rows, by the cubic through the
four nearest ones, at temperatures that no fit has seen. A row at which a species or, where elements do
not cancel, a reference state passes a transition within those four rows is left out.
"""

import random
import sys
from fractions import Fraction
from functools import lru_cache
from math import gcd, log
from pathlib import Path

import library_sources as published
from library_dissolved import ELEMENTS
from library_figures import SPECIES, built
from library_solution import atoms_and_charge
from library_sources import R_EXACT

TABLE = Path(__file__).resolve().parents[1] / "published" / "janaf_proof.tsv"
# Between the rows of every table, which stand at 250, 298.15, 300, 350 and whole hundreds of kelvin.
TEMPERATURES = (430, 575, 725, 925, 1175, 1425, 1775)
SEED, BALANCED, MOST_COEFFICIENT = 20_261_201, 600, 8
GASES = {"H", "O", "N", "F", "Cl", "C"}  # elements whose reference state passes no transition here


@lru_cache(maxsize=None)
def gibbs_rows(code):
    """ΔfG° in kJ/mol at the whole hundreds of kelvin, and where the table passes a transition."""
    rows, transitions = {}, []
    path = published.folder("janaf") / "data" / f"{code}.txt"
    for line in path.read_text().splitlines()[2:]:
        cells = line.split("\t")
        t = published.number(cells[0])
        gibbs = published.number(cells[6]) if len(cells) > 6 else None
        if "<-->" in line and t is not None:
            transitions.append(t)
        elif t is not None and gibbs is not None and t % 100 == 0:
            rows[t] = gibbs
    return rows, transitions


def nodes(t):
    low = int(t // 100) * 100
    return [low - 100, low, low + 100, low + 200]


def holds(code, t):
    rows, transitions = gibbs_rows(code)
    four = nodes(t)
    return all(node in rows for node in four) and not any(
        four[0] <= passed <= four[-1] for passed in transitions)


def between(values, t):
    """The cubic through the values at the four nodes."""
    four, total = nodes(t), 0.0
    for i, value in enumerate(values):
        weight = 1.0
        for j, node in enumerate(four):
            if j != i:
                weight *= (t - node) / (four[i] - node)
        total += weight * value
    return total


def covers(species, t):
    pieces = built(species.id)["pieces"]
    return pieces[0].low <= t <= pieces[-1].high


def log10_k(terms, t):
    """log10 K of a reaction at T by JANAF, or None."""
    if not all(holds(species.janaf, t) and covers(species, t) for species, _ in terms):
        return None
    sums = [sum(nu * gibbs_rows(species.janaf)[0][node] for species, nu in terms) for node in nodes(t)]
    return -1000 * between(sums, t) / (R_EXACT * t * log(10))


@lru_cache(maxsize=None)
def element(symbol):
    """The record of an element's reference state and its atoms a molecule, if it has a JANAF table."""
    found = [one for one in SPECIES if one.element and one.janaf and set(atoms(one)) == {symbol}]
    return (found[0], atoms(found[0])[symbol]) if found else None


@lru_cache(maxsize=None)
def atoms_of(ident):
    return atoms_and_charge(next(one for one in SPECIES if one.id == ident).formula)[0]


def atoms(species):
    return atoms_of(species.id)


def formation(species):
    """The formation from the elements, or None where an element has no record."""
    terms = [(species, Fraction(1))]
    for symbol, count in atoms(species).items():
        known = element(symbol)
        if known is None:
            return None
        terms.append((known[0], -Fraction(count).limit_denominator(1000) / Fraction(known[1])))
    return terms


def balance(chosen):
    """Whole numbers that balance the species, if there is one way, in which all take part."""
    symbols = sorted({symbol for one in chosen for symbol in atoms(one)})
    rows = [[Fraction(atoms(one).get(symbol, 0)).limit_denominator(1000) for one in chosen]
            for symbol in symbols]
    pivots, row = [], 0
    for column in range(len(chosen)):
        pivot = next((i for i in range(row, len(rows)) if rows[i][column] != 0), None)
        if pivot is None:
            continue
        rows[row], rows[pivot] = rows[pivot], rows[row]
        rows[row] = [value / rows[row][column] for value in rows[row]]
        for i in range(len(rows)):
            if i != row and rows[i][column] != 0:
                rows[i] = [a - rows[i][column] * b for a, b in zip(rows[i], rows[row])]
        pivots.append(column)
        row += 1
    if len(pivots) != len(chosen) - 1:
        return None
    free = next(column for column in range(len(chosen)) if column not in pivots)
    numbers = [Fraction(0)] * len(chosen)
    numbers[free] = Fraction(1)
    for i, column in enumerate(pivots):
        numbers[column] = -rows[i][free]
    if 0 in numbers:
        return None
    scale = 1
    for number in numbers:
        scale = scale * number.denominator // gcd(scale, number.denominator)
    whole = [int(number * scale) for number in numbers]
    divisor = 0
    for number in whole:
        divisor = gcd(divisor, number)
    whole = [number // divisor for number in whole]
    return whole if max(abs(number) for number in whole) <= MOST_COEFFICIENT else None


def generated(shared):
    """Balanced reactions between species of two to four elements, each set of species once."""
    draw, found, seen = random.Random(SEED), [], set()
    by_element = {}
    for one in shared:
        for symbol in atoms(one):
            by_element.setdefault(symbol, []).append(one)
    symbols = sorted(symbol for symbol in by_element if len(by_element[symbol]) > 3)
    while len(found) < BALANCED:
        chosen_symbols = set(draw.sample(symbols, draw.randint(1, 2))) | set(draw.sample(sorted(GASES), 2))
        pool = [one for one in shared if set(atoms(one)) <= chosen_symbols]
        if len(pool) < 4:
            continue
        chosen = draw.sample(pool, min(len(pool), draw.randint(3, len(chosen_symbols) + 1)))
        key = frozenset(one.id for one in chosen)
        numbers = balance(chosen)
        if key in seen or numbers is None:
            continue
        seen.add(key)
        terms = [(one, Fraction(number)) for one, number in zip(chosen, numbers)]
        if any(log10_k(terms, t) is not None for t in TEMPERATURES):
            found.append(terms)
    return found


def lines():
    shared = sorted((one for one in SPECIES if one.janaf and one.phase != "aq"), key=lambda one: one.id)
    formed = [terms for terms in (formation(one) for one in shared if not one.element) if terms]
    text = [
        "# log10 K by the NIST-JANAF tables (4th edition, 1998), between their rows; made by",
        "# tests/reference/janaf_proof.py: every species that both know, formed from its elements, then",
        "# reactions balanced by a seeded generator.",
        "kind\tterms\ttemperature_k log10_k ...",
    ]
    for kind, reactions in (("formed", formed), ("balanced", generated(shared))):
        for terms in reactions:
            pairs = [(t, log10_k(terms, t)) for t in TEMPERATURES]
            pairs = " ".join(f"{t} {value:.4f}" for t, value in pairs if value is not None)
            if pairs:
                words = " ".join(f"{float(nu):.10g} {one.id.replace(' ', '_')}" for one, nu in terms)
                text.append(f"{kind}\t{words}\t{pairs}")
    return text


def main():
    made = lines()
    if "--write" in sys.argv:
        TABLE.write_text("\n".join(made) + "\n")
    same = TABLE.read_text().splitlines() == made
    print(f"{len(made) - 4} reactions, {'as committed' if same else 'OTHERS than committed'}")
    return 0 if same else 1


if __name__ == "__main__":
    sys.exit(main())
