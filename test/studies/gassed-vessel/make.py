"""A gassed vessel: gas at normal condition to the actual one, power from the power number, gassed power after Hughmark 1980, by hand. Invented."""
import os, sys
import numpy as np
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(26)
Np, rho, Di, Dv, V, g = 5.0, 998.0, 0.10, 0.30, 0.021, 9.80665
T, p = 303.15, 1.1e5
rows, trials = [], {}
for i in range(9):
    N, q = round(5 * 1.12 ** i, 3), [20.0, 40.0, 60.0][i % 3]
    Q = q / 6e4 * (T / 273.15) * (101325 / p)
    P0 = Np * rho * N ** 3 * Di ** 5
    share = 0.10 * (Q / (N * V)) ** -0.25 * (N ** 2 * Di ** 4 / (g * Di / 5 * V ** (2 / 3))) ** -0.2
    P, ug = P0 * min(1, share), Q / (np.pi / 4 * Dv ** 2)
    k = 0.026 * (P / V) ** 0.4 * ug ** 0.5 * np.exp(0.02 * rng.standard_normal())
    rows.append([f"Z{i + 1}", N * 60, q, k])
    trials[f"Z{i + 1}"] = {"volumetric_coefficient": k, "power_per_volume": P / V, "gas_velocity": ug, "power_ungassed": P0}
table(here, "trials.csv", ["run", "N [rpm]", "Q_G [NL/min (0 degC, 1.01325 bar)]", "kLa [1/s]"], rows)
col = lambda n: np.array([v[n] for v in trials.values()])
expected(here, trials=trials, law=law(["C", "a", "b"], col("volumetric_coefficient"), [col("power_per_volume"), col("gas_velocity")]), tolerance={"law": 1e-6})
