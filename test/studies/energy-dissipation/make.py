"""Particles in a stirred vessel by energy dissipation: power number to power per mass, by hand. Invented."""
import os, sys
import numpy as np
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(27)
Np, rho, mu, Di, V, dp, D = 1.3, 998.0, 9.5e-4, 0.12, 0.060, 0.0012, 8e-10
rows, trials = [], {}
for i in range(8):
    N = round(150 * 1.2 ** i, 2)
    e = Np * (N / 60) ** 3 * Di ** 5 / V
    Re, Sc = e ** (1 / 3) * dp ** (4 / 3) / (mu / rho), mu / rho / D
    k = (2 + 0.5 * Re ** 0.6 * Sc ** (1 / 3)) * D / dp * np.exp(0.02 * rng.standard_normal())
    rows.append([f"J{i + 1}", N, k * 1e6])
    trials[f"J{i + 1}"] = {"coefficient": k, "Sh": k * dp / D, "Re": Re, "Sc": Sc, "power_per_mass": e}
table(here, "trials.csv", ["run", "N [rpm]", "k [um/s]"], rows)
from scipy.optimize import least_squares
col = lambda n: np.array([v[n] for v in trials.values()])
fit = least_squares(lambda t: np.log(col("Sh")) - np.log(2 + t[0] * col("Re") ** t[1] * col("Sc") ** (1 / 3)), [0.5, 0.6], xtol=1e-15, ftol=1e-15, gtol=1e-15)
s2 = 2 * fit.cost / (len(rows) - 2)
se = np.sqrt(np.diag(np.linalg.inv(fit.jac.T @ fit.jac)) * s2)
expected(here, trials=trials, law={"values": dict(zip("Ca", map(float, fit.x))), "standard_errors": dict(zip("Ca", map(float, se))), "residual_sd": float(np.sqrt(s2))},
         tolerance={"law": 1e-5})
