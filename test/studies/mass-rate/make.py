"""A soluble plate weighed before and after, rates by mass and concentrations by amount. Invented."""
import os, sys
import numpy as np
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(9)
M, D, nu, L, A, cs = 0.12212, 9.0e-10, 0.95e-6, 0.05, 0.05 * 0.04, 28.0
rows, trials = [], {}
for i in range(9):
    u, t = round(0.05 * 1.35 ** i, 4), 1800.0
    Re = u * L / nu
    k = 0.66 * Re ** 0.5 * (nu / D) ** (1 / 3) * D / L * np.exp(0.02 * rng.standard_normal())
    cb = 0.1 * (i % 3)
    rows.append([f"P{i + 1}", u, k * A * (cs - cb) * M * t * 1e6, t / 60, cb])
    trials[f"P{i + 1}"] = {"coefficient": k, "Sh": k * L / D, "Re": Re}
table(here, "trials.csv", ["run", "u [m/s]", "loss [mg]", "t [min]", "c [mol/m3]"], rows)
col = lambda n: np.array([v[n] for v in trials.values()])
expected(here, trials=trials, law=law(["C", "a"], col("Sh"), [col("Re")]), tolerance={"law": 1e-6})
