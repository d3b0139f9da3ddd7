"""Fastest wavelength and growth time of the thick disk under lids at 3, 5 and 8 kpc: are the scripts right?

Kim et al. (2000), ApJ 531, 873, state a wavelength of about 3 kpc and a growth time of about 30 Myr, nearly
equal for both midplane parities.
"""
import json

import numpy as np
from scipy.optimize import minimize_scalar

from base_states import thick_disk
from dense import Weak

for lid, points in ((3000.0, 80), (5000.0, 100), (8000.0, 140)):
    model = thick_disk(lid)
    for parity in ("mirror", "flexing"):
        solver = Weak(model, points, parity)
        peak = minimize_scalar(lambda wave: -solver.growth_rate(2 * np.pi / wave), bounds=(1000.0, 10000.0),
                               method="bounded", options=dict(xatol=1e-6))
        print(json.dumps({"lid-kpc": lid / 1e3, "parity": parity, "wavelength-kpc": round(peak.x / 1e3, 5),
                          "growth-rate-per-Myr": -peak.fun / model.time,
                          "growth-time-Myr": model.time / -peak.fun}))
