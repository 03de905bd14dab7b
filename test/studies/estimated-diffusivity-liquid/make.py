"""A solute in another liquid, no fluid by name: Wilke and Chang by hand. Invented."""
import os, sys
import numpy as np
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(22)
d, V, M, phi, mu, rho = 0.012, 96.0, 46.07, 1.5, 1.1e-3, 789.0
rows, trials = [], {}
for i in range(8):
    T, u = 293.15 + i, round(0.2 * 1.3 ** i, 4)
    D = 7.4e-8 * np.sqrt(phi * M) * T / (mu * 1e3 * V ** 0.6) * 1e-4
    Re, Sc = rho * u * d / mu, mu / rho / D
    k = 0.0149 * Re ** 0.88 * Sc ** (1 / 3) * D / d * np.exp(0.02 * rng.standard_normal())
    rows.append([f"W{i + 1}", u, T - 273.15, k * 1e6])
    trials[f"W{i + 1}"] = {"coefficient": k, "Sh": k * d / D, "Re": Re, "Sc": Sc, "diffusivity": D}
table(here, "trials.csv", ["run", "u [m/s]", "T [degC]", "k [um/s]"], rows)
col = lambda n: np.array([v[n] for v in trials.values()])
expected(here, trials=trials, law=law(["C", "a"], col("Sh") / col("Sc") ** (1 / 3), [col("Re")]), tolerance={"law": 1e-6})
