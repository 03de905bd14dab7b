"""Vapour taken up along a wetted wall: the balance integrated by scipy. Invented."""
import os, sys
import numpy as np
from scipy.integrate import solve_ivp
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(10)
d, L, D, nu, cs = 0.026, 1.2, 2.6e-5, 1.55e-5, 1.05
rows, trials = [], {}
for i in range(9):
    u, cin = round(2.2 * 1.22 ** i, 4), [0.0, 0.1, 0.2][i % 3]
    Re, Sc = u * d / nu, nu / D
    k = 0.023 * Re ** 0.83 * Sc ** 0.44 * D / d * np.exp(0.02 * rng.standard_normal())
    s = solve_ivp(lambda x, c: 4 * k / (u * d) * (cs - c), (0, L), [cin], rtol=1e-12, atol=1e-14, method="DOP853")
    rows.append([f"L{i + 1}", u * np.pi / 4 * d ** 2 * 3.6e6, cin, s.y[0, -1]])
    trials[f"L{i + 1}"] = {"coefficient": k, "Sh": k * d / D, "Re": Re}
table(here, "trials.csv", ["run", "Q [L/h]", "c_in [mol/m3]", "c_out [mol/m3]"], rows)
col = lambda n: np.array([v[n] for v in trials.values()])
expected(here, trials=trials, law=law(["C", "a"], col("Sh"), [col("Re")]), tolerance={"coefficient": 1e-8, "Sh": 1e-8, "law": 1e-6})
