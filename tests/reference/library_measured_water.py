"""pKw of liquid water: the equation of IAPWS R11-07, and the short form that follows it.

The equation (Bandura and Lvov, Journal of Physical and Chemical Reference Data 35 (2006) 15) and its
figures are recalled from memory; they give pKw = 13.995 at 25 °C, 14.946 at 0 °C and 12.25 at 100 °C, as
the release does. The density is Kell's (Journal of Chemical and Engineering Data 20 (1975) 97).
"""

from math import exp, log10

import numpy as np

MOLAL_OF_FRACTION = 2 * log10(18.015268 / 1000)


def density_g_per_cm3(t):
    """Kell's density of water at 1 atm; 0 to 150 °C."""
    c = t - 273.15
    above = (999.83952 + 16.945176 * c - 7.9870401e-3 * c**2 - 46.170461e-6 * c**3
             + 105.56302e-9 * c**4 - 280.54253e-12 * c**5)
    return above / (1 + 16.879850e-3 * c) / 1000


def pkw(t):
    rho = density_g_per_cm3(t)
    q = rho * exp(-0.864671 + 8659.19 / t - 22786.2 / t**2 * rho ** (2 / 3))
    of_gas = 0.61415 + 48251.33 / t - 67707.93 / t**2 + 10102100 / t**3
    clusters = log10(1 + q) - q / (1 + q) * rho * (0.642044 - 56.8534 / t - 0.375754 * rho)
    return -2 * 6 * clusters + of_gas + MOLAL_OF_FRACTION


def short_form():
    """A, B, C, D, E of log10 Kw = A + B T + C/T + D log10 T + E/T² over 0 to 100 °C, within 0.001."""
    kelvins = np.linspace(273.15, 373.15, 101)
    columns = np.array([[1, t, 1 / t, log10(t), 1 / t**2] for t in kelvins])
    scale = np.abs(columns).max(axis=0)
    wanted = np.array([-pkw(t) for t in kelvins])
    found = np.linalg.lstsq(columns / scale, wanted, rcond=None)[0] / scale
    rounded = tuple(float(f"{value:.12g}") for value in found)
    worst = np.abs(columns @ np.array(rounded) - wanted).max()
    assert worst < 0.001, f"the short form leaves the equation by {worst:.4f}"
    return rounded


WATER = short_form()
