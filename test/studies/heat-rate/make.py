"""A heated cylinder in an air stream, radiation and a loss taken off. Invented."""
import os, sys
import numpy as np
from scipy.constants import Stefan_Boltzmann as sb
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(8)
D, L, e, Gl, Ta, lam, nu = 0.0127, 0.25, 0.6, 0.05, 299.15, 0.0281, 1.8e-5
A = np.pi * D * L
rows, trials = [], {}
for i in range(10):
    u, Tw = round(2 * 1.3 ** i, 3), 373.15 + 3 * (i % 4)
    Re = u * D / nu
    h = 0.6 * Re ** 0.5 * lam / D * np.exp(0.02 * rng.standard_normal())
    Q = h * A * (Tw - Ta) + e * sb * A * (Tw ** 4 - Ta ** 4) + Gl * (Tw - Ta)
    rows.append([f"C{i + 1}", u, Q, Tw - 273.15])
    trials[f"C{i + 1}"] = {"coefficient": h, "Nu": h * D / lam, "Re": Re, "radiation_loss": e * sb * A * (Tw ** 4 - Ta ** 4)}
table(here, "trials.csv", ["run", "u [m/s]", "P_el [W]", "T_w [degC]"], rows)
col = lambda n: np.array([v[n] for v in trials.values()])
expected(here, trials=trials, law=law(["C", "a"], col("Nu"), [col("Re")]), tolerance={"law": 1e-6})
