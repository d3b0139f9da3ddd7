"""Growth rates of the full (X, Y, Z) problem on Chebyshev points by dense eigenvalues.

Two forms of the same problem. `Collocation` is what one writes first: the equations at the points,
`scipy.linalg.eig`. `Weak` is what a careful user writes next: the energy form with Clenshaw-Curtis weights,
symmetric, so that `scipy.linalg.eigh` may be asked for the lowest eigenvalue alone. Variables carry the square
root of the density.
"""
import os

for name in ("OMP_NUM_THREADS", "OPENBLAS_NUM_THREADS", "MKL_NUM_THREADS"):
    os.environ[name] = "1"

import numpy as np
from scipy.linalg import eig, eigh


def chebyshev(points, length):
    """Points on [0, length], ascending, differentiation (Trefethen 2000) and Clenshaw-Curtis weights."""
    n = points - 1
    theta = np.pi * np.arange(points) / n
    x = np.cos(theta)
    c = np.ones(points)
    c[0] = c[-1] = 2.0
    c *= (-1.0) ** np.arange(points)
    # differences of cosines through sines: no cancellation
    half = theta / 2
    difference = -2.0 * np.sin(half[:, None] + half) * np.sin(half[:, None] - half)
    np.fill_diagonal(difference, 1.0)
    matrix = np.outer(c, 1.0 / c) / difference
    np.fill_diagonal(matrix, 0.0)
    np.fill_diagonal(matrix, -matrix.sum(axis=1))
    k = np.arange(1, n // 2 + 1)
    factor = np.where(2 * k == n, 1.0, 2.0)
    weights = (2.0 / n) * (1.0 - (np.cos(2 * np.outer(theta, k)) * factor / (4 * k**2 - 1)).sum(axis=1))
    weights[[0, -1]] /= 2.0
    return (1 - x) * length / 2, -matrix * 2 / length, weights * length / 2


class Weak:
    """Symmetric form; what does not depend on the wave is made once, before `growth_rate` is asked."""

    def __init__(self, model, points, parity):
        z, derivative, weights = chebyshev(points, model.lid)
        s = model.state(z)
        self.stiff, self.magnetic2 = s["stiff"], 2 * s["magnetic"]
        root = np.sqrt(weights)
        self.g = s["g"]
        # divergence of the vertical part, acting on sqrt(weight rho) Z, lid and mirror taken out by columns
        first = 1 if parity == "mirror" else 0
        full = (root[:, None] * derivative / root[None, :]) - np.diag(s["slope"] / 2)
        self.columns = slice(first, points - 1)
        self.slope_z = full[:, self.columns]
        self.both = self.stiff + self.magnetic2
        gz = np.zeros_like(full)
        np.fill_diagonal(gz, self.g)
        self.gz = gz[:, self.columns]
        cross = self.slope_z.T @ self.gz
        self.vertical = (self.slope_z.T @ (self.both[:, None] * self.slope_z) - cross - cross.T
                         - np.diag((self.g * s["slope"])[self.columns]))
        self.along = self.stiff[:, None] * self.slope_z - self.gz
        self.across = self.both[:, None] * self.slope_z - self.gz
        self.points = points

    def matrix(self, kx, ky):
        n, m = self.points, self.vertical.shape[0]
        blocks = 1 if ky == 0 else 2
        a = np.zeros((blocks * n + m, blocks * n + m))
        i = np.arange(n)
        a[i, i] = kx**2 * self.stiff
        a[:n, blocks * n:] = kx * self.along
        if ky != 0:
            a[i, n + i] = kx * ky * self.stiff
            a[n + i, n + i] = ky**2 * self.both + kx**2 * self.magnetic2
            a[n:2 * n, 2 * n:] = ky * self.across
        a[blocks * n:, blocks * n:] = self.vertical
        j = np.arange(blocks * n, blocks * n + m)
        a[j, j] += kx**2 * self.magnetic2[self.columns]
        return a

    def growth_rate(self, kx, ky=0.0):
        lowest = eigh(self.matrix(kx, ky), lower=False, eigvals_only=True, subset_by_index=[0, 0],
                      overwrite_a=True, check_finite=False)[0]
        return float(np.sqrt(max(-lowest, 0.0)))

    def mode(self, kx, ky=0.0):
        """Growth rate and displacement of the fastest mode."""
        values, vectors = eigh(self.matrix(kx, ky), lower=False, subset_by_index=[0, 0], overwrite_a=True,
                               check_finite=False)
        return float(np.sqrt(max(-values[0], 0.0))), vectors[:, 0]


class Collocation:
    """The equations at the points; rows of the boundary conditions make the right-hand matrix singular."""

    def __init__(self, model, points, parity):
        z, self.derivative, _ = chebyshev(points, model.lid)
        s = model.state(z)
        self.stiff, self.magnetic2 = s["stiff"], 2 * s["magnetic"]
        self.g, self.slope = s["g"], s["slope"]
        self.mirror = parity == "mirror"
        self.points = points

    def matrices(self, kx, ky):
        n = self.points
        vertical = self.derivative - np.diag(self.slope / 2)
        fall = self.derivative + np.diag(self.slope / 2)
        both, g = self.stiff + self.magnetic2, self.g
        # total pressure perturbation from each displacement
        pressure = [kx * np.diag(self.stiff), ky * np.diag(both), both[:, None] * vertical - np.diag(g)]
        gas = [kx * np.diag(self.stiff), ky * np.diag(self.stiff),
               self.stiff[:, None] * vertical - np.diag(g)]
        divergence = [kx * np.eye(n), ky * np.eye(n), vertical]
        row_x = [-kx * q for q in gas]
        row_y = [-ky * q for q in pressure]
        row_y[1] -= kx**2 * np.diag(self.magnetic2)
        row_z = [g[:, None] * d + fall @ q for d, q in zip(divergence, pressure)]
        row_z[2] += np.diag(g * self.slope - kx**2 * self.magnetic2)
        keep = [0, 2] if ky == 0 else [0, 1, 2]
        rows = [row_x, row_y, row_z]
        a = np.block([[rows[i][j] for j in keep] for i in keep])
        b = np.eye(a.shape[0])
        start = a.shape[0] - n
        for node, rigid in ((0, self.mirror), (n - 1, True)):
            a[start + node] = 0.0
            b[start + node] = 0.0
            if rigid:
                a[start + node, start + node] = 1.0
            else:
                a[start + node] = np.hstack([pressure[j][node] for j in keep])
        return a, b

    def growth_rates(self, kx, ky=0.0):
        a, b = self.matrices(kx, ky)
        values = eig(a, b, right=False, overwrite_a=True, overwrite_b=True, check_finite=False)
        good = values[np.isfinite(values) & (np.abs(values) < 1e6 * np.abs(a).max())]
        real = good.real[(np.abs(good.imag) <= 1e-6 * np.abs(good.real)) & (good.real > 0)]
        return np.sqrt(np.sort(real)[::-1])

    def growth_rate(self, kx, ky=0.0):
        rates = self.growth_rates(kx, ky)
        return float(rates[0]) if rates.size else 0.0

    def mode(self, kx, ky=0.0):
        """Growth rate and displacement of the fastest mode."""
        values, vectors = eig(*self.matrices(kx, ky), overwrite_a=True, overwrite_b=True, check_finite=False)
        usable = np.isfinite(values) & (np.abs(values.imag) <= 1e-6 * np.abs(values.real))
        best = np.argmax(np.where(usable, values.real, -np.inf))
        return float(np.sqrt(max(values.real[best], 0.0))), vectors[:, best].real


if __name__ == "__main__":
    from race import main

    main({"dense eig, Chebyshev collocation": Collocation, "dense eigh, Chebyshev weak form": Weak},
         range(8, 200, 2))
