"""A stirred vessel warmed by a jacket stream, with equipment that warms along and a loss: one ODE by scipy, the coefficient known. Invented."""
import os, sys
import numpy as np
from scipy.integrate import solve_ivp
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(7)
V, rho, c, Ce, Gl, Ta, A, mj, cj, Tj = 0.060, 990.0, 4180.0, 9000.0, 4.0, 20.0, 0.9, 0.5, 4190.0, 90.0
rows, trials = [], {}
for i in range(10):
    N = round(60 * 1.25 ** i, 1)
    U = 130 * (N / 60) ** 0.6 * np.exp(0.02 * rng.standard_normal())

    def warming(_, T):
        """The jacket stream leaves at T + (Tj - T) exp(-UA/(m c)): well-stirred contents, plug flow in the jacket."""
        return (mj * cj * (1 - np.exp(-U * A / (mj * cj))) * (Tj - T) - Gl * (T - Ta)) / (V * rho * c + Ce)
    t = 900.0
    s = solve_ivp(warming, (0, t), [20.0], rtol=1e-12, atol=1e-12, method="DOP853")
    rows.append([f"V{i + 1}", N, 20.0, s.y[0, -1], t / 60])
    trials[f"V{i + 1}"] = {"overall_coefficient": U}
table(here, "trials.csv", ["run", "N [rpm]", "T0 [degC]", "T1 [degC]", "t [min]"], rows)
N = np.array([r[1] / 60 for r in rows])
expected(here, trials=trials, law=law(["C", "a"], np.array([v["overall_coefficient"] for v in trials.values()]), [N]), tolerance={"overall_coefficient": 1e-7, "law": 1e-6})
