"""Overall coefficients on the outer area; the wall's resistance integrated by scipy. Invented."""
import os, sys
import numpy as np
from scipy.integrate import quad
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(4)
di, do, lw, Rf, mu, lam, rho = 0.020, 0.025, 16.0, 1e-4, 6.5e-4, 0.63, 990.0
Rw = do / 2 / lw * quad(lambda r: 1 / r, di / 2, do / 2)[0]
rows, trials = [], {}
for i in range(9):
    u, ho = round(0.3 * 1.3 ** i, 4), 4000.0 + 500 * (i % 3)
    Re = rho * u * di / mu
    h = 0.03 * Re ** 0.8 * lam / di * np.exp(0.02 * rng.standard_normal())
    rows.append([f"U{i + 1}", u, 1 / (do / di / h + Rw + Rf + 1 / ho), ho])
    trials[f"U{i + 1}"] = {"coefficient": h, "Nu": h * di / lam, "Re": Re}
table(here, "trials.csv", ["run", "u [m/s]", "U [W/(m^2 K)]", "h_o [W/(m^2 K)]"], rows)
col = lambda n: np.array([v[n] for v in trials.values()])
expected(here, trials=trials, law=law(["C", "a"], col("Nu"), [col("Re")]), tolerance={"law": 1e-6})
