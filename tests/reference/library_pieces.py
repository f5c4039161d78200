"""Pieces of Cp/R as powers of T from T^-2 to T^4, their integrals, and fits of them to tables."""

from functools import lru_cache
from math import log

import numpy as np

from library_sources import R_EXACT, T0, boiling, janaf, melting

POWERS = (-2, -1, 0, 1, 2, 3, 4)
# From few terms to many: a fit takes the first that meets the limits.
BASES = ((0,), (0, 1), (-2, 0, 1), (-2, 0, 1, 2), (-2, -1, 0, 1, 2), (-2, -1, 0, 1, 2, 3), POWERS)
CP_LIMIT, H_LIMIT, S_LIMIT = 0.0005, 0.004, 0.004  # of Cp; kJ/mol; J/(mol K)
# A piece whose limits were found by itself is cut again unless it is as good as this.
GOOD_CP, GOOD_H_AND_S, GOOD_SWING = 0.0025, 0.01, 0.018
HIGHEST_K = 3000.0  # where fits end: hotter than any plant


def h_term(power, t):
    """The integral of T^power, without its constant."""
    return log(t) if power == -1 else t ** (power + 1) / (power + 1)


def s_term(power, t):
    """The integral of T^power / T, without its constant."""
    return log(t) if power == 0 else t**power / power


class Piece:
    """One range: seven coefficients of Cp/R and the constants of H/R and S/R."""

    def __init__(self, low, high, coefficients, source):
        self.low, self.high, self.source = low, high, source
        self.a = [float(value) for value in coefficients]
        self.b_h = self.b_s = 0.0
        self.alone = False

    def cp(self, t):
        return R_EXACT * sum(a * t**p for a, p in zip(self.a, POWERS))

    def h(self, t):
        """kJ/mol."""
        return R_EXACT * (sum(a * h_term(p, t) for a, p in zip(self.a, POWERS)) + self.b_h) / 1000

    def s(self, t):
        return R_EXACT * (sum(a * s_term(p, t) for a, p in zip(self.a, POWERS)) + self.b_s)

    def anchor(self, t, h, s):
        """Sets the constants so that H(t) is h kJ/mol and S(t) is s J/(mol K)."""
        self.b_h += (h - self.h(t)) * 1000 / R_EXACT
        self.b_s += (s - self.s(t)) / R_EXACT
        # A piece alone needs no more digits than its figures have; pieces that meet, none that a joint
        # would show: 4e-7 J/mol of H and 4e-10 J/(mol K) of S.
        self.b_h = round(self.b_h, 5 if self.alone else 7)
        self.b_s = round(self.b_s, 6 if self.alone else 10)


def written(value):
    return float(f"{value:.10g}")


def constant_piece(low, high, heat_capacity, source):
    """The one piece of a species whose Cp is constant."""
    powers = [0, 0, float(f"{heat_capacity / R_EXACT:.7g}"), 0, 0, 0, 0]
    piece = Piece(low, high, powers, source)
    piece.alone = True
    return piece


def join(pieces, h298, s298, transitions=(), start_k=T0):
    """Anchors the piece that holds `start_k`, 298.15 K as a rule, then joins the others to it.

    H and S meet at a joint. At a transition they jump by its enthalpy, in kJ/mol, and by that
    enthalpy over T, so that G is continuous.
    """
    jumps = dict(transitions)
    start = next(i for i, piece in enumerate(pieces) if piece.low <= start_k <= piece.high)
    pieces[start].anchor(start_k, h298, s298)
    for lower, upper in zip(pieces[start:], pieces[start + 1 :]):
        t, jump = upper.low, jumps.get(upper.low, 0.0)
        upper.anchor(t, lower.h(t) + jump, lower.s(t) + 1000 * jump / t)
    for upper, lower in list(zip(pieces[1 : start + 1], pieces[:start]))[::-1]:
        lower.anchor(upper.low, upper.h(upper.low), upper.s(upper.low))
    return pieces


def fit(code, limits, source, blunt=()):
    """Fits the pieces between `limits` to a JANAF table; gives pieces, transitions, worst errors."""
    rows = janaf(code)
    pieces, transitions, worst = [], [], []
    for index, (low, high) in enumerate(zip(limits, limits[1:])):
        inside = within(rows, low, high)
        if index and jump(rows, low) is not None:
            transitions.append((low, jump(rows, low)))
        for basis in BASES:
            if len(basis) > max(1, len(inside) + 2):
                break
            piece = Piece(low, high, constrained(inside, basis, blunt), source)
            errors = compare(piece, inside, blunt)
            if errors[0] < CP_LIMIT and errors[1] < H_LIMIT and errors[2] < S_LIMIT:
                break
        pieces.append(piece)
        worst.append((low, high, *errors, swing(piece, inside, blunt)))
    return pieces, transitions, worst


@lru_cache(maxsize=None)
def limits_of(code, phase):
    """Limits of the pieces of a fit, found by themselves: at transitions, else as few as will do.

    A gas goes from 298.15 to 3000 K, a solid from 200 or 298.15 K to its melting, a melt from there to
    its boiling. A range that no basis fits within the limits is cut in the middle of its rows.
    """
    rows = janaf(code)
    temperatures = sorted({row[0] for row in rows})
    low, high = T0, HIGHEST_K
    if phase == "s":
        low = 200.0 if 200.0 in temperatures else T0
        high = melting(code) or high
    elif phase == "l":
        low, high = melting(code) or T0, boiling(code) or high
    top = max(t for t in temperatures if t <= high)
    found = good_pieces(code, low, top)
    if low < T0 and (len(found) < 2 or found[-1] <= T0):
        found = good_pieces(code, T0, top)
    if len(found) < 2:
        raise SystemExit(f"no piece fits {code} at {T0} K")
    return tuple(found)


def good_pieces(code, low, top):
    """The limits from `low` up to where the fits are good; a lambda peak ends the range before it."""
    rows = janaf(code)
    cuts = [t for t in sorted({row[0] for row in rows}) if jump(rows, t) is not None]
    ends = [low, *(t for t in cuts if low < t < top), top]
    limits = [low]
    for one, two in zip(ends, ends[1:]):
        upper = cut_until_good(code, one, two)
        limits += upper
        if upper[-1:] != [two]:
            break
    return limits


def cut_until_good(code, low, high):
    """The upper limits of as few pieces as fit a stretch without a transition, as far as they do."""
    inside = sorted({row[0] for row in within(janaf(code), low, high)})
    _, _, worst = fit(code, (low, high), "janaf")
    _, _, cp, h, s, swings = worst[0]
    if cp < GOOD_CP and h < GOOD_H_AND_S and s < GOOD_H_AND_S and swings < GOOD_SWING:
        return [high]
    if len(inside) < 3:
        return []
    middle = inside[len(inside) // 2]
    lower = cut_until_good(code, low, middle)
    return lower + cut_until_good(code, middle, high) if lower[-1:] == [middle] else lower


def within(rows, low, high):
    """The rows of one piece: at a transition the side that belongs to it."""
    found = {}
    for t, cp, s, h, *_ in rows:
        if low <= t <= high and not (t == high and t in found):
            found[t] = (t, cp, s, h)
    if low not in found or high not in found:
        raise SystemExit(f"the table has no row at {low} or {high} K")
    return [found[t] for t in sorted(found)]


def jump(rows, t):
    """The enthalpy of a transition, or None where the table only passes through T."""
    at = [h for row_t, _, _, h, *_ in rows if row_t == t]
    return round(at[-1] - at[0], 6) if len(at) > 1 and at[-1] - at[0] > 0.0015 else None


def constrained(rows, basis, blunt=()):
    """Least squares of Cp, H and S with H and S exact at both ends and at 298.15 K."""
    start = next((row for row in rows if row[0] == T0), rows[0])
    scale = {p: 1 / 1000.0**p for p in basis}
    kept = [row for row in rows if row[0] not in blunt]
    cp = [[t**p * scale[p] for p in basis] for t, *_ in kept]
    h = [[(h_term(p, t) - h_term(p, start[0])) * scale[p] for p in basis] for t, *_ in rows]
    s = [[(s_term(p, t) - s_term(p, start[0])) * scale[p] for p in basis] for t, *_ in rows]
    wanted_cp = [row[1] / R_EXACT for row in kept]
    wanted_h = [(row[3] - start[3]) * 1000 / R_EXACT for row in rows]
    wanted_s = [(row[2] - start[2]) / R_EXACT for row in rows]
    weights_h, weights_s = 0.002, 1.0
    a = np.array(cp + [[v * weights_h for v in row] for row in h]
                 + [[v * weights_s for v in row] for row in s])
    b = np.array(wanted_cp + [v * weights_h for v in wanted_h] + [v * weights_s for v in wanted_s])
    exact = [i for i in (0, len(rows) - 1) if rows[i][0] != start[0]]
    if len(basis) < 2 + 2 * len(exact):
        solution = np.linalg.lstsq(a, b, rcond=None)[0]
    else:
        c = np.array([h[i] for i in exact] + [s[i] for i in exact])
        d = np.array([wanted_h[i] for i in exact] + [wanted_s[i] for i in exact])
        row_scale = np.abs(c).max(axis=1)
        c, d = c / row_scale[:, None], d / row_scale
        q, r = np.linalg.qr(c.T, mode="complete")
        rank = len(d)
        particular = np.linalg.solve(r[:rank].T, d)
        free = np.linalg.lstsq(a @ q[:, rank:], b - a @ q[:, :rank] @ particular, rcond=None)[0]
        solution = q @ np.concatenate([particular, free])
    by_power = {p: float(f"{value * scale[p]:.10g}") for p, value in zip(basis, solution)}
    return [by_power.get(p, 0.0) for p in POWERS]


def fit_heat_capacity(formula, low, high):
    """Coefficients of Cp/R that follow another formula of Cp, and the worst relative error."""
    grid = np.linspace(low, high, 200)
    scale = [1 / 1000.0**p for p in POWERS]
    matrix = np.array([[t**p * s for p, s in zip(POWERS, scale)] for t in grid])
    solution = np.linalg.lstsq(matrix, [formula(t) / R_EXACT for t in grid], rcond=None)[0]
    coefficients = [float(f"{value * s:.10g}") for value, s in zip(solution, scale)]
    piece = Piece(low, high, coefficients, "")
    worst = max(abs(piece.cp(t) / formula(t) - 1) for t in grid)
    return coefficients, worst


def swing(piece, rows, blunt=()):
    """How far Cp leaves, between neighbouring rows, what they span: relative to Cp."""
    worst = 0.0
    for (t1, c1, *_), (t2, c2, *_) in zip(rows, rows[1:]):
        if t1 in blunt or t2 in blunt:
            continue
        for step in range(1, 10):
            cp = piece.cp(t1 + (t2 - t1) * step / 10)
            worst = max(worst, (min(c1, c2) - cp) / c1, (cp - max(c1, c2)) / c1)
    return worst


def compare(piece, rows, blunt=()):
    """The worst relative error of Cp, and errors of H (kJ/mol) and S (J/(mol K)) within a piece."""
    t0, _, s0, h0 = next((row for row in rows if row[0] == T0), rows[0])
    h_start, s_start = piece.h(t0), piece.s(t0)
    cp = max(abs(piece.cp(t) / value - 1) for t, value, _, _ in rows if t not in blunt)
    h = max(abs(piece.h(t) - h_start - value + h0) for t, _, _, value in rows)
    s = max(abs(piece.s(t) - s_start - value + s0) for t, _, value, _ in rows)
    return cp, h, s
