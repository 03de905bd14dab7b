"""A power-law liquid in a stirred vessel: apparent viscosity by the shear constant (Metzner and Otto 1957). Invented."""
import os, sys
import numpy as np
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(24)
K, n, ks, rho, lam, cp, Di, Dv = 2.5, 0.6, 11.5, 1050.0, 0.55, 3900.0, 0.12, 0.40
rows, trials = [], {}
for i in range(9):
    N = round(60 * 1.3 ** i, 2)
    mu = K * (ks * N / 60) ** (n - 1)
    Re, Pr = rho * N / 60 * Di ** 2 / mu, cp * mu / lam
    h = 0.36 * Re ** (2 / 3) * Pr ** (1 / 3) * lam / Dv * np.exp(0.02 * rng.standard_normal())
    rows.append([f"N{i + 1}", N, h])
    trials[f"N{i + 1}"] = {"coefficient": h, "Nu": h * Dv / lam, "Re": Re, "Pr": Pr, "viscosity": mu}
table(here, "trials.csv", ["run", "N [rpm]", "h [W/(m^2 K)]"], rows)
col = lambda n: np.array([v[n] for v in trials.values()])
expected(here, trials=trials, law=law(["C", "a"], col("Nu") / col("Pr") ** (1 / 3), [col("Re")]), notes=["apparent"], tolerance={"law": 1e-6})
