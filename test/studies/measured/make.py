"""Coefficients as given, in kcal/(h m2 K); water properties by the iapws package. Invented."""
import os, sys
import numpy as np
from iapws import IAPWS97
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(1)
rows, trials = [], {}
for i in range(10):
    d, u, T = 0.021, round(0.3 * 1.35 ** i, 4), [18.0, 41.0, 66.0][i % 3]
    w = IAPWS97(T=T + 273.15, P=0.3)
    Re, Pr = w.rho * u * d / w.mu, w.cp * 1e3 * w.mu / w.k
    h = 0.024 * Re ** 0.8 * Pr ** 0.4 * w.k / d * np.exp(0.02 * rng.standard_normal())
    kcal = round(h * 3600 / 4186.8, 1)
    h = kcal * 4186.8 / 3600
    rows.append([f"M{i + 1}", u, T, kcal])
    trials[f"M{i + 1}"] = {"coefficient": h, "Nu": h * d / w.k, "Re": Re, "Pr": Pr}
table(here, "trials.csv", ["run", "u [m/s]", "T [degC]", "h [kcal/(h m2 degC)]"], rows)
col = lambda n: np.array([v[n] for v in trials.values()])
expected(here, trials=trials, law=law(["C", "a", "b"], col("Nu"), [col("Re"), col("Pr")]), tolerance={"Nu": 1e-7, "Re": 1e-7, "Pr": 1e-7, "coefficient": 1e-9, "law": 1e-6})
