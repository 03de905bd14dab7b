"""Pellets dissolving in a vessel whose concentration rises: size and mass integrated by scipy, the coefficient known; one trial lost everything. Invented."""
import os, sys
import numpy as np
from scipy.integrate import solve_ivp
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(14)
rho, cs, V, n, D, nu, d0, Di = 1300.0, 3.2, 0.060, 400, 1.0e-9, 0.9e-6, 0.005, 0.12
m0 = n * rho * np.pi / 6 * d0 ** 3
rows, trials, refused = [], {}, {}
for i in range(10):
    N, t = round(120 * 1.15 ** i, 1), 500.0
    Re = N / 60 * Di ** 2 / nu
    k = 0.02 * Re ** 0.75 * (nu / D) ** (1 / 3) * D / d0 * np.exp(0.02 * rng.standard_normal())

    def shrink(_, y):
        """y = diameter: the liquid holds what the pellets have lost."""
        lost = m0 * (1 - (y / d0) ** 3)
        return -2 * k / rho * (cs - lost / V)
    s = solve_ivp(shrink, (0, t), [d0], rtol=1e-12, atol=1e-15, method="DOP853")
    lost = m0 * (1 - (s.y[0, -1] / d0) ** 3)
    name = f"D{i + 1}"
    if name == "D7":
        lost = m0
        refused[name] = "100 % of the mass is lost"
    else:
        trials[name] = {"coefficient": k, "Sh": k * d0 / D, "Re": Re, "Sc": nu / D}
    rows.append([name, N, m0 * 1e3, lost * 1e3, t])
table(here, "trials.csv", ["run", "N [rpm]", "m0 [g]", "lost [g]", "t [s]"], rows)
col = lambda n: np.array([v[n] for v in trials.values()])
sc = (nu / D) ** (1 / 3)
one = law(["C", "a"], col("Sh") / sc, [col("Re")])
expected(here, trials=trials, refused=refused, law=one, tolerance={"coefficient": 1e-8, "Sh": 1e-8, "law": 1e-6})
