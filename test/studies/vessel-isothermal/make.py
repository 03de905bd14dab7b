"""A vessel warmed by condensing steam, then the inner side by resistances of a flat wall: one ODE by scipy. Invented."""
import os, sys
import numpy as np
from scipy.integrate import solve_ivp
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(32)
V, rho, c, A, Tj, hj, sw, lw = 0.060, 990.0, 4180.0, 0.8, 110.0, 6000.0, 0.004, 16.0
Di, Dv, mu, lam = 0.12, 0.40, 8e-4, 0.61
rows, trials = [], {}
for i in range(9):
    N = round(60 * 1.25 ** i, 1)
    Re, Pr = rho * N / 60 * Di ** 2 / mu, c * mu / lam
    h = 0.36 * Re ** (2 / 3) * Pr ** (1 / 3) * lam / Dv * np.exp(0.02 * rng.standard_normal())
    U = 1 / (1 / h + sw / lw + 1 / hj)
    s = solve_ivp(lambda _, T: U * A * (Tj - T) / (V * rho * c), (0, 300), [20.0], rtol=1e-12, atol=1e-12, method="DOP853")
    rows.append([f"I{i + 1}", N, 20.0, s.y[0, -1], 300.0])
    trials[f"I{i + 1}"] = {"overall_coefficient": U, "coefficient": h, "Nu": h * Dv / lam, "Re": Re}
table(here, "trials.csv", ["run", "N [rpm]", "T0 [degC]", "T1 [degC]", "t [s]"], rows)
col = lambda n: np.array([v[n] for v in trials.values()])
expected(here, trials=trials, law=law(["C", "a"], col("Nu"), [col("Re")]), tolerance={"overall_coefficient": 1e-7, "coefficient": 1e-7, "Nu": 1e-7, "law": 1e-5})
