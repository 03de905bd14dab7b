"""Water evaporating into an air stream: Stefan's film, diffusion and flow of the vapour integrated by scipy; saturation by the iapws package. Invented."""
import os, sys
import numpy as np
from iapws.iapws97 import _PSat_T
from scipy.constants import R
from scipy.integrate import quad
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(16)
P, M, A, L, nu, D, Tg, phi = 101325.0, 0.018015, 0.02, 0.1, 1.6e-5, 2.6e-5, 303.15, 0.35
rows, trials = [], {}
for i in range(9):
    u, Ts = round(0.8 * 1.3 ** i, 4), 291.15 + 0.5 * (i % 4)
    k = 0.66 * (u * L / nu) ** 0.5 * (nu / D) ** (1 / 3) * D / L * np.exp(0.02 * rng.standard_normal())
    ps, pb, Tf = _PSat_T(Ts) * 1e6, phi * _PSat_T(Tg) * 1e6, (Ts + Tg) / 2
    # N = -(D P/(R T)) dp/dz/(P - p) over a film of thickness D/k
    N = k / (R * Tf) * quad(lambda p: P / (P - p), pb, ps, epsrel=1e-13)[0]
    rows.append([f"Y{i + 1}", u, Ts - 273.15, N * A * M * 3600 * 1e3])
    trials[f"Y{i + 1}"] = {"coefficient": k, "Sh": k * L / D, "Re": u * L / nu}
table(here, "trials.csv", ["run", "u [m/s]", "T_s [degC]", "m_dot [g/h]"], rows)
col = lambda n: np.array([v[n] for v in trials.values()])
expected(here, trials=trials, law=law(["C", "a"], col("Sh"), [col("Re")]), tolerance={"coefficient": 1e-7, "Sh": 1e-7, "law": 1e-5})
