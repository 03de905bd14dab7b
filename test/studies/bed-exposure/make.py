"""Water through a bed of soluble spheres: the balance along the bed integrated by scipy. Invented."""
import os, sys
import numpy as np
from scipy.integrate import solve_ivp
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(12)
dp, eps, Z, Dv, D, nu, cs = 0.004, 0.40, 0.12, 0.050, 1.0e-9, 0.9e-6, 3.4
a = 6 * (1 - eps) / dp
rows, trials = [], {}
for i in range(9):
    u = round(0.004 * 1.35 ** i, 6)
    Re = u * dp / nu
    k = 1.5 * Re ** 0.45 * (nu / D) ** (1 / 3) * D / dp * np.exp(0.02 * rng.standard_normal())
    s = solve_ivp(lambda x, c: k * a / u * (cs - c), (0, Z), [0.0], rtol=1e-12, atol=1e-14, method="DOP853")
    rows.append([f"K{i + 1}", u * np.pi / 4 * Dv ** 2 * 6e4, s.y[0, -1]])
    trials[f"K{i + 1}"] = {"coefficient": k, "Sh": k * dp / D, "Re": Re, "specific_area": a, "velocity": u}
table(here, "trials.csv", ["run", "Q [L/min]", "c_out [g/L]"], rows)
col = lambda n: np.array([v[n] for v in trials.values()])
expected(here, trials=trials, law=law(["C", "a"], col("Sh"), [col("Re")]), tolerance={"coefficient": 1e-8, "Sh": 1e-8, "law": 1e-6})
