"""Runs the solvers of one peer script over the shared cases and prints one JSON line for each."""
import json
import statistics
import sys
import time

import numpy as np

from base_states import tanh_gravity, thick_disk

ACCURACY = 1e-8
REFERENCE_POINTS = {"tanh": 80, "thick disk": 140}


def cases():
    """Model, parity, kx, ky: one wavelength near the fastest of each model, along and oblique."""
    tanh, thick = tanh_gravity(), thick_disk()
    wave = 2 * np.pi / 3000.0
    for parity in ("mirror", "flexing"):
        yield tanh, parity, 0.4, 0.0
        yield tanh, parity, 0.4, 1.0
        yield thick, parity, wave, 0.0
        yield thick, parity, wave, wave


def converged(model, parity, kx, ky):
    """Median over fine Chebyshev grids of the symmetric form, which removes the rounding of single ones."""
    from dense import Weak

    start = REFERENCE_POINTS[model.name]
    return statistics.median(Weak(model, n, parity).growth_rate(kx, ky) for n in range(start, start + 22, 2))


def smallest_grid(solver, grids, model, parity, kx, ky, truth):
    """First grid from which on three in a row reach the accuracy, so that a lucky crossing does not count."""
    grids = list(grids)
    good = []
    for size in grids:
        error = abs(solver(model, size, parity).growth_rate(kx, ky) / truth - 1)
        good = good + [size] if error <= ACCURACY else []
        if len(good) == 3:
            return good[0]
    return None


def milliseconds(call, least=0.7):
    """Median time of a warm call."""
    for _ in range(20):
        call()
    times, start = [], time.perf_counter()
    while time.perf_counter() - start < least or len(times) < 30:
        t = time.perf_counter()
        call()
        times.append(time.perf_counter() - t)
    return round(1e3 * statistics.median(times), 4)


def main(solvers, grids):
    only = sys.argv[1] if len(sys.argv) > 1 else ""
    for model, parity, kx, ky in cases():
        if only and only not in model.name:
            continue
        truth = converged(model, parity, kx, ky)
        for name, solver in solvers.items():
            size = smallest_grid(solver, grids, model, parity, kx, ky, truth)
            if size is None:
                print(json.dumps(dict(solver=name, model=model.name, parity=parity, kx=kx, ky=ky, grid=None)))
                continue
            ready = solver(model, size, parity)
            rate = ready.growth_rate(kx, ky)
            print(json.dumps({
                "solver": name, "model": model.name, "parity": parity, "kx": kx, "ky": ky, "grid": size,
                "growth-rate": rate, "converged": truth, "relative-error": abs(rate / truth - 1),
                "growth-per-Myr": truth / model.time,
                "milliseconds": milliseconds(lambda: ready.growth_rate(kx, ky)),
                "milliseconds-with-mode": milliseconds(lambda: ready.mode(kx, ky)),
                "milliseconds-from-scratch": milliseconds(
                    lambda: solver(model, size, parity).growth_rate(kx, ky))}), flush=True)
