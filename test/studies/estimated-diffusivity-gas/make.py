"""A vapour in air by Fuller, Schettler and Giddings, by hand. Invented."""
import os, sys
import numpy as np
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(23)
d, p, Ma, Mb, va, vb, nu = 0.02, 1.2, 18.015, 28.96, 13.1, 19.7, 1.5e-5
rows, trials = [], {}
for i in range(8):
    T, u = 293.15 + 4 * i, round(1.0 * 1.25 ** i, 4)
    D = 0.00143 * T ** 1.75 / (p * np.sqrt(2 / (1 / Ma + 1 / Mb)) * (va ** (1 / 3) + vb ** (1 / 3)) ** 2) * 1e-4
    Re = u * d / nu
    k = 0.6 * Re ** 0.5 * D / d * np.exp(0.02 * rng.standard_normal())
    rows.append([f"A{i + 1}", u, T - 273.15, k])
    trials[f"A{i + 1}"] = {"coefficient": k, "Sh": k * d / D, "Re": Re, "diffusivity": D}
table(here, "trials.csv", ["run", "u [m/s]", "T [degC]", "k [m/s]"], rows)
col = lambda n: np.array([v[n] for v in trials.values()])
expected(here, trials=trials, law=law(["C", "a"], col("Sh"), [col("Re")]), tolerance={"law": 1e-6})
