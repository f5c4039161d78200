"""What an equilibrium measured in water is: log10 K over temperature, for p° = 1 bar and m° = 1 mol/kg."""

from dataclasses import dataclass
from math import log, log10

from library_sources import R_EXACT, T0

LN_10 = log(10)
BAR_PER_ATM = log10(1.01325)  # what log10 K of a dissolving gas loses from 1/atm to 1/bar


@dataclass
class Measured:
    tied: str
    terms: str
    powers: tuple  # a_-2 to a_4 of ΔCp/R
    b_h: float
    b_s: float
    low: float
    high: float
    u: float  # of log10 K at 298.15 K
    source: str
    apart: str = ""  # why the species' own records may lead elsewhere

    def log10_k(self, t):
        a = self.powers
        gibbs = (self.b_h / t + a[2] * (1 - log(t)) - self.b_s - a[3] * t / 2 - a[4] * t**2 / 6
                 - a[0] / t**2 / 2)
        return -gibbs / LN_10

    def enthalpy(self, t):
        """ΔrH° in kJ/mol."""
        a = self.powers
        over_r = -a[0] / t + a[2] * t + a[3] * t**2 / 2 + a[4] * t**3 / 3 + self.b_h
        return R_EXACT * over_r / 1000

    def stoichiometry(self):
        cells = self.terms.split()
        return {ident: float(nu) for nu, ident in zip(cells[::2], cells[1::2])}


def fit(tied, terms, coefficients, low, high, u, source, apart=""):
    """log10 K = A + B T + C/T + D log10 T + E/T² + F T², as the papers give it."""
    a, b, c, d, e, f = (*coefficients, 0, 0, 0, 0, 0, 0)[:6]
    powers = (2 * LN_10 * e, 0, d, 2 * LN_10 * b, 6 * LN_10 * f, 0, 0)
    return Measured(tied, terms, powers, -LN_10 * c, LN_10 * a + d, low, high, u, source, apart)


def at_25(tied, terms, log_k, enthalpy_kj, u, source, low=273.15, high=323.15, heat=0.0, apart=""):
    """log10 K and ΔrH° at 25 °C, with ΔrCp in J/(mol K) where one is known."""
    a0 = heat / R_EXACT
    b_h = 1000 * enthalpy_kj / R_EXACT - a0 * T0
    b_s = 1000 * enthalpy_kj / (R_EXACT * T0) + LN_10 * log_k - a0 * log(T0)
    return Measured(tied, terms, (0, 0, a0, 0, 0, 0, 0), b_h, b_s, low, high, u, source, apart)
