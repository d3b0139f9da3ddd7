"""Growth rates of the full (X, Y, Z) problem on finite elements by sparse shift-invert.

Lagrange elements of equal length on Gauss-Lobatto nodes, whose quadrature makes the mass matrix diagonal, and
`scipy.sparse.linalg.eigsh`. The matrix is a polynomial in kx and ky; its sparse coefficients are made once.
"""
import os

for name in ("OMP_NUM_THREADS", "OPENBLAS_NUM_THREADS", "MKL_NUM_THREADS"):
    os.environ[name] = "1"

import numpy as np
import scipy.sparse as sp
from numpy.polynomial import legendre
from scipy.sparse.linalg import LinearOperator, eigsh, splu


def gauss_lobatto(degree):
    """Nodes on [-1, 1], weights and differentiation matrix of Lagrange interpolation through them."""
    top = np.zeros(degree + 1)
    top[-1] = 1.0
    inner = legendre.legroots(legendre.legder(top))
    x = np.concatenate(([-1.0], inner, [1.0]))
    last = legendre.legval(x, top)
    weights = 2.0 / (degree * (degree + 1) * last**2)
    gap = x[:, None] - x[None, :]
    np.fill_diagonal(gap, 1.0)
    derivative = last[:, None] / last[None, :] / gap
    np.fill_diagonal(derivative, 0.0)
    np.fill_diagonal(derivative, -derivative.sum(axis=1))
    return x, weights, derivative


def fastest_pointwise(state, kx):
    """Square of the growth rate that nothing exceeds at this kx: short waves across the field."""
    stiff, magnetic2, g = state["stiff"], 2 * state["magnetic"], state["g"]
    tension = magnetic2 * kx**2
    buoyancy = tension - g * state["slope"]
    a = stiff + magnetic2
    b = stiff * tension + buoyancy * a - g**2
    c = tension * (buoyancy * stiff - g**2)
    squared = (-b + np.sqrt(np.maximum(b * b - 4 * a * c, 0.0))) / (2 * a)
    return max(float(squared.max()), 0.0)


class FiniteElements:
    degree = 4

    def __init__(self, model, elements, parity):
        p = self.degree
        x, weights, derivative = gauss_lobatto(p)
        h = model.lid / elements
        nodes = elements * p + 1
        z = (np.arange(elements)[:, None] * h + (x[None, :] + 1) * h / 2)
        s = {key: value.reshape(z.shape) for key, value in model.state(z.ravel()).items()}
        # D_z = Z' - slope/2 Z at the quadrature points of each element
        rows = np.arange(elements * (p + 1))
        index = (np.arange(elements)[:, None] * p + np.arange(p + 1)[None, :]).ravel()
        gather = sp.csr_matrix((np.ones(rows.size), (rows, index)), shape=(rows.size, nodes))
        slope_z = sp.block_diag([derivative * 2 / h] * elements, format="csr") @ gather \
            - sp.diags(s["slope"].ravel() / 2) @ gather
        w = np.tile(weights * h / 2, elements)
        mass = gather.T @ w
        stiff, magnetic2, g = s["stiff"].ravel(), 2 * s["magnetic"].ravel(), s["g"].ravel()
        both = stiff + magnetic2

        def form(left, value, right):
            return left.T @ sp.diags(w * value) @ right

        cross = form(slope_z, g, gather)
        vertical = (form(slope_z, both, slope_z) - cross - cross.T
                    - form(gather, g * s["slope"].ravel(), gather))
        along = form(gather, stiff, slope_z) - form(gather, g, gather)
        across = form(gather, both, slope_z) - form(gather, g, gather)
        one_g, one_m, one_b = (form(gather, q, gather) for q in (stiff, magnetic2, both))
        none = sp.csr_matrix((nodes, nodes))
        first = 1 if parity == "mirror" else 0
        free = np.zeros(3 * nodes, dtype=bool)
        free.reshape(nodes, 3)[:, :2] = True
        free.reshape(nodes, 3)[first:-1, 2] = True
        # node by node (X, Y, Z), so that the matrix is a band
        order = (np.arange(3 * nodes).reshape(3, nodes).T).ravel()[free]
        scale = sp.diags(1.0 / np.sqrt(np.tile(mass, 3)[order]))

        def assemble(blocks):
            return (scale @ sp.bmat(blocks, format="csr")[order][:, order] @ scale).tocsc()

        full = {
            (0, 0): assemble([[none, none, none], [none, none, none], [none, none, vertical]]),
            (1, 0): assemble([[none, none, along], [none, none, none], [along.T, none, none]]),
            (0, 1): assemble([[none, none, none], [none, none, across], [none, across.T, none]]),
            (2, 0): assemble([[one_g, none, none], [none, one_m, none], [none, none, one_m]]),
            (1, 1): assemble([[none, one_g, none], [one_g, none, none], [none, none, none]]),
            (0, 2): assemble([[none, none, none], [none, one_b, none], [none, none, none]]),
        }
        with_x_and_z = np.flatnonzero(order // nodes != 1)
        flat = {key: full[key][with_x_and_z][:, with_x_and_z].tocsc() for key in ((0, 0), (1, 0), (2, 0))}
        self.terms = {False: self.aligned(flat), True: self.aligned(full)}
        self.state = {key: value.ravel() for key, value in s.items()}

    @staticmethod
    def aligned(terms):
        """The same pattern for every term, so that a sum is a sum of arrays."""
        pattern = sum(abs(t) for t in terms.values()) + sp.identity(next(iter(terms.values())).shape[0])
        pattern = pattern.tocsc()
        pattern.sort_indices()
        rows, columns = pattern.indices, np.repeat(np.arange(pattern.shape[1]), np.diff(pattern.indptr))
        data = {key: np.asarray(t[rows, columns]).ravel() for key, t in terms.items()}
        return pattern, data

    def growth_rate(self, kx, ky=0.0):
        return self.lowest(kx, ky, False)

    def mode(self, kx, ky=0.0):
        """Growth rate and displacement of the fastest mode."""
        return self.lowest(kx, ky, True)

    def lowest(self, kx, ky, with_vector):
        pattern, data = self.terms[ky != 0]
        values = sum(kx**i * ky**j * d for (i, j), d in data.items())
        matrix = sp.csc_matrix((values, pattern.indices, pattern.indptr), shape=pattern.shape)
        shift = -1.0001 * fastest_pointwise(self.state, kx)
        n = matrix.shape[0]
        shifted = matrix - shift * sp.identity(n, format="csc")
        inverse = splu(shifted, permc_spec="NATURAL", options=dict(SymmetricMode=True), diag_pivot_thresh=0.0)
        result = eigsh(matrix, k=1, sigma=shift, which="LM", tol=1e-9, v0=np.ones(n), ncv=12,
                       OPinv=LinearOperator((n, n), inverse.solve), return_eigenvectors=with_vector)
        value = float(np.sqrt(max(-result[0][0] if with_vector else -result[0], 0.0)))
        return (value, result[1][:, 0]) if with_vector else value


def of_degree(p):
    return type(f"Degree{p}", (FiniteElements,), {"degree": p})


if __name__ == "__main__":
    from race import main

    counts = sorted({int(round(4 * 1.15**i)) for i in range(60)})
    main({f"sparse eigsh, elements of degree {p}": of_degree(p) for p in (2, 4, 6, 8)}, counts)
