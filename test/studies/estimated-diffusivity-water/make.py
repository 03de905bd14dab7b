"""A solute in water whose diffusivity is estimated after Hayduk and Laudie; viscosity by the iapws package. Invented."""
import os, sys
import numpy as np
from iapws import IAPWS97
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(21)
d, V = 0.012, 103.0
rows, trials = [], {}
for i in range(9):
    T, u = 15.0 + 5 * (i % 5), round(0.2 * 1.3 ** i, 4)
    w = IAPWS97(T=T + 273.15, P=0.101325)
    D = 13.26e-5 / ((w.mu * 1e3) ** 1.14 * V ** 0.589) * 1e-4
    Re, Sc = w.rho * u * d / w.mu, w.mu / w.rho / D
    k = 0.0149 * Re ** 0.88 * Sc ** (1 / 3) * D / d * np.exp(0.02 * rng.standard_normal())
    rows.append([f"H{i + 1}", u, T, k * 1e6])
    trials[f"H{i + 1}"] = {"coefficient": k, "Sh": k * d / D, "Re": Re, "Sc": Sc, "diffusivity": D}
table(here, "trials.csv", ["run", "u [m/s]", "T [degC]", "k [um/s]"], rows)
col = lambda n: np.array([v[n] for v in trials.values()])
expected(here, trials=trials, law=law(["C", "a"], col("Sh") / col("Sc") ** (1 / 3), [col("Re")]),
         notes=["estimate for a dilute solute"], tolerance={"Sh": 1e-6, "Re": 1e-6, "Sc": 1e-6, "diffusivity": 1e-6, "law": 1e-4})
