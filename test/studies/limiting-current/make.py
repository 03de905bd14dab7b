"""Plateau currents of a disk, the constant of Faraday as scipy has it. Invented."""
import os, sys
import numpy as np
from scipy.constants import physical_constants
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

F = physical_constants["Faraday constant"][0]
rng = np.random.default_rng(15)
D, nu, d, c = 7.0e-10, 1.0e-6, 0.010, 10.0
A = np.pi / 4 * d ** 2
rows, trials = [], {}
for i in range(9):
    N = round(200 * 1.3 ** i, 1)
    w = 2 * np.pi * N / 60
    Re = w * (d / 2) ** 2 / nu
    k = 0.62 * D ** (2 / 3) * nu ** (-1 / 6) * w ** 0.5 * np.exp(0.02 * rng.standard_normal())
    rows.append([f"E{i + 1}", N, k * F * A * c * 1e3])
    trials[f"E{i + 1}"] = {"coefficient": k, "Re": Re}
table(here, "trials.csv", ["run", "N [1/min]", "I [mA]"], rows)
w = np.array([r[1] / 60 for r in rows])
expected(here, trials={k: {"mass_transfer_coefficient": v["coefficient"]} for k, v in trials.items()},
         law=law(["C", "a"], np.array([v["coefficient"] for v in trials.values()]), [w]), tolerance={"law": 1e-6})
