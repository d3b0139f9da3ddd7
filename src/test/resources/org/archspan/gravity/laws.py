"""Reference accelerations and potentials of the gravity laws, 50 digits of working precision, unit scales."""
from mpmath import mp, mpf, tanh, cosh, log, sqrt, exp

mp.dps = 50
LAWS = {
    "tanh": (lambda z: tanh(z), lambda z: log(cosh(z))),
    "disk-and-halo": (lambda z: z / sqrt(z * z + 1) + z / 8, lambda z: z * z / (sqrt(z * z + 1) + 1) + z * z / 16),
    "point-mass": (lambda z: z / (1 + z * z) ** mpf(1.5), lambda z: 1 - 1 / sqrt(1 + z * z)),
    "saturating": (lambda z: 1 - exp(-z) / 4 - 3 * exp(-z / 4) / 4,
                   lambda z: z - (1 - exp(-z)) / 4 - 3 * (1 - exp(-z / 4))),
}
print("# law, z, g, Phi; strengths and heights 1, halo gradient 1/8, near fraction 1/4, far height 4")
for name, (g, phi) in LAWS.items():
    for z in ["1e-12", "1e-5", "0.03125", "0.4375", "0.5", "0.5625", "1", "2", "8", "40", "1000", "1e8"]:
        x = mpf(float(z))
        print(name, z, mp.nstr(g(x), 20), mp.nstr(phi(x), 20), sep=", ")
