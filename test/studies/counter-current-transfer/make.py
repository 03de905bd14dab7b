"""A solute absorbed from gas into solute-free liquid: both balances of the column as a boundary value problem of scipy. Invented."""
import os, sys
import numpy as np
from scipy.integrate import solve_bvp
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(13)
Z, m, a = 1.5, 0.01, 150.0
rows, trials = [], {}
for i in range(9):
    ug, ul, cin = round(0.25 * 1.18 ** i, 4), round(0.004 + 0.001 * (i % 3), 4), 0.8
    K = 3.0 * ug ** 0.7 * np.exp(0.02 * rng.standard_normal())
    # gas up from z = 0, liquid down from z = Z: ug dcg/dz = -K (cg - m cl); ul dcl/dz = -K (cg - m cl)
    slope = lambda z, y: np.array([-K * (y[0] - m * y[1]) / ug, -K * (y[0] - m * y[1]) / ul])
    s = solve_bvp(slope, lambda p, q: np.array([p[0] - cin, q[1]]), np.linspace(0, Z, 400), np.array([np.full(400, 0.3), np.full(400, 1.0)]), tol=1e-11, max_nodes=400000)
    rows.append([f"A{i + 1}", ug, ul * 1e3, cin, s.y[0, -1]])
    trials[f"A{i + 1}"] = {"volumetric_coefficient": K, "capacity_ratio": m * ug / ul}
table(here, "trials.csv", ["run", "u_G [m/s]", "u_L [mm/s]", "c_in [mol/m3]", "c_out [mol/m3]"], rows)
expected(here, trials=trials, law=law(["C", "a"], np.array([v["volumetric_coefficient"] for v in trials.values()]), [np.array([r[1] for r in rows])]),
         tolerance={"volumetric_coefficient": 1e-7, "law": 1e-6})
