"""Base states of the two models that the peer scripts solve.

A state is a function of the height z that returns a dictionary of arrays:
  g         gravity, downward
  slope     d ln(rho)/dz
  gas       p/rho           (isothermal speed squared)
  magnetic  p_B/rho
  stiff     (gamma p + gamma_c_eff p_c)/rho, the resistance to compression
and a model adds its domain [0, lid] about the midplane and the unit of its numbers.
"""
from dataclasses import dataclass
from typing import Callable

import numpy as np
from scipy.special import erfcx

PARSEC = 3.0856775814913673e18  # cm, IAU 2015 B3
MEGAYEAR = 1e6 * 365.25 * 86400.0  # s
HYDROGEN_MASS = 1.00782503190 * 1.66053906892e-24  # g, AME 2020 and CODATA 2022


@dataclass(frozen=True)
class Model:
    name: str
    state: Callable
    lid: float
    length: float = 1.0  # units of the caller per unit of z
    time: float = 1.0


def tanh_gravity(lid=10.0, alpha=1.0, beta=1.0, gamma=1.0):
    """Gravity g0 tanh(z/H), H = (1 + alpha + beta) c^2/g0, units c = H = 1; cosmic rays diffuse at once."""
    total = 1.0 + alpha + beta

    def state(z):
        one = np.ones_like(z)
        return dict(g=total * np.tanh(z), slope=-np.tanh(z), gas=one, magnetic=alpha * one, stiff=gamma * one)

    return Model("tanh", state, lid)


# Near the Sun: hydrogen nuclei per cm^3 and scale in pc of each stratum (after Boulares & Cox 1990, as used
# by Kim et al. 2000, ApJ 531, 873), 1.27 m_H for each nucleus.
GAUSSIANS = [(0.6, 70.0), (0.3, 135.0), (0.07, 135.0)]
EXPONENTIALS = [(0.1, 400.0), (0.03, 900.0)]
# g = 8e-9 cm/s^2 [1 - 0.52 exp(-z/325 pc) - 0.48 exp(-z/900 pc)] (Martos & Cox 1998).
STRENGTH = 8e-9
DECAYS = [(1.0, np.inf), (-0.52, 325.0), (-0.48, 900.0)]


def thick_disk(lid_pc=5000.0, midplane_field=5e-6, gamma=1.0):
    """Thick multi-component disk near the Sun; the field is what the balance leaves over. Unit: pc, km/s."""
    kms = 1e5
    acceleration = STRENGTH * PARSEC / kms**2  # (km/s)^2/pc
    nucleus = 1.27 * HYDROGEN_MASS

    def nuclei(z):
        return (sum(n * np.exp(-0.5 * (z / h) ** 2) for n, h in GAUSSIANS)
                + sum(n * np.exp(-z / h) for n, h in EXPONENTIALS))

    def nuclei_slope(z):
        return (sum(-n * z / h**2 * np.exp(-0.5 * (z / h) ** 2) for n, h in GAUSSIANS)
                + sum(-n / h * np.exp(-z / h) for n, h in EXPONENTIALS))

    def gravity(z):
        return acceleration * sum(f * np.exp(-z / a) for f, a in DECAYS)

    def weight(z):
        """Integral of n g from z to infinity, (km/s)^2 cm^-3, in closed form."""
        total = np.zeros_like(z)
        for f, a in DECAYS:
            for n, h in GAUSSIANS:
                u = (z / h + h / a) / np.sqrt(2.0)
                total += f * n * h * np.sqrt(np.pi / 2) * erfcx(u) * np.exp(-0.5 * (z / h) ** 2 - z / a)
            for n, h in EXPONENTIALS:
                rate = 1.0 / h + 1.0 / a
                total += f * n / rate * np.exp(-z * rate)
        return acceleration * total

    zero = np.zeros(1)
    midplane_magnetic = midplane_field**2 / (8 * np.pi) / nucleus / kms**2
    sound2 = float((weight(zero)[0] - midplane_magnetic) / nuclei(zero)[0])

    def state(z):
        n = nuclei(z)
        magnetic = weight(z) / n - sound2
        if np.any(magnetic < 0):
            raise ValueError("the balance leaves no field at z = %g pc" % z[np.argmin(magnetic)])
        one = np.ones_like(z)
        return dict(g=gravity(z), slope=nuclei_slope(z) / n, gas=sound2 * one, magnetic=magnetic,
                    stiff=gamma * sound2 * one)

    return Model("thick disk", state, lid_pc, time=PARSEC / kms / MEGAYEAR)
