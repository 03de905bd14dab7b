"""A film between two stirred liquids: steady rates through three resistances, each by its own flux balance solved as linear equations; permeability by temperature. Invented."""
import os, sys
import numpy as np
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(17)
s, A, ka, kb, cs = 50e-6, 0.005, 4e-5, 3e-5, 20.0
rows, trials = [], {}
for i in range(9):
    T = 283.15 + 5 * i
    perm = 2.0e-4 * np.exp(-5400 / T) * np.exp(0.02 * rng.standard_normal())
    # unknown: flux, concentration in the fluid at both faces of the film
    flux = np.linalg.solve(np.array([[1, ka, 0], [1, -perm / s, perm / s], [1, 0, -kb]]), np.array([ka * cs, 0, 0]))[0]
    rows.append([f"F{i + 1}", T - 273.15, flux * A * 3600 * 1e3])
    trials[f"F{i + 1}"] = {"permeability": perm, "layer_coefficient": perm / s}
table(here, "trials.csv", ["run", "T [degC]", "rate [mmol/h]"], rows)
T = np.array([r[1] + 273.15 for r in rows])
y = np.log([v["permeability"] for v in trials.values()])
X = np.column_stack([np.ones_like(T), -1 / T])
b, *_ = np.linalg.lstsq(X, y, rcond=None)
r = y - X @ b
se = np.sqrt(np.diag(np.linalg.inv(X.T @ X)) * (r @ r) / (len(y) - 2))
expected(here, trials=trials, law={"values": {"P0": float(np.exp(b[0])), "E": float(b[1])}, "standard_errors": {"E": float(se[1])}}, tolerance={"law": 1e-5})
