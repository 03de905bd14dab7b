"""Two streams in parallel flow, the duty weighted by what is stated of both: balances integrated by scipy, flows read wrong within their uncertainty. Invented."""
import os, sys
import numpy as np
from scipy.integrate import solve_ivp
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(33)
c, A, To, Ti = 4180.0, 0.5, 20.0, 80.0
rows, trials = [], {}
for i in range(9):
    m, mo = round(0.1 * 1.2 ** i, 5), 0.5
    U = 900 * (m / 0.2) ** 0.4 * np.exp(0.02 * rng.standard_normal())
    s = solve_ivp(lambda x, T: [-U * A * (T[0] - T[1]) / (m * c), U * A * (T[0] - T[1]) / (mo * c)], (0, 1), [Ti, To], rtol=1e-12, atol=1e-12, method="DOP853")
    out, oout = s.y[:, -1]
    mr, mor = m * 1.01, mo * 0.98  # as read
    own, other = mr * c * (Ti - out), mor * c * (oout - To)
    vo = (own * 0.01) ** 2 + (mr * c) ** 2 * 2 * 0.05 ** 2
    vt = (other * 0.02) ** 2 + (mor * c) ** 2 * 2 * 0.05 ** 2
    Q = (own / vo + other / vt) / (1 / vo + 1 / vt)
    d0, d1 = Ti - To, out - oout
    rows.append([f"P{i + 1}", mr, Ti, out, mor, To, oout])
    trials[f"P{i + 1}"] = {"overall_coefficient": Q / A / ((d0 - d1) / np.log(d0 / d1)), "heat_duty": Q}
table(here, "trials.csv", ["run", "m [kg/s]", "T_in [degC]", "T_out [degC]", "m_o [kg/s]", "T_o_in [degC]", "T_o_out [degC]"], rows)
m = np.array([r[1] for r in rows])
one = law(["C", "a"], np.array([v["overall_coefficient"] for v in trials.values()]), [m])
expected(here, trials=trials, law={"values": one["values"]}, tolerance={"law": 1e-6})
