"""An annulus: hydraulic diameter, section, velocity and flow from what is given, by hand. Invented."""
import os, sys
import numpy as np
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(25)
d, do, mu, lam, rho = 0.040, 0.025, 8e-4, 0.6, 996.0
dh, S = d - do, np.pi / 4 * (d ** 2 - do ** 2)
rows, trials = [], {}
for i in range(8):
    m = round(0.1 * 1.3 ** i, 4)
    u = m / rho / S
    Re = rho * u * dh / mu
    h = 0.02 * Re ** 0.8 * lam / dh * np.exp(0.02 * rng.standard_normal())
    rows.append([f"X{i + 1}", m * 60, h])
    trials[f"X{i + 1}"] = {"coefficient": h, "Nu": h * dh / lam, "Re": Re, "velocity": u, "hydraulic_diameter": dh, "cross_section": S}
table(here, "trials.csv", ["run", "m [kg/min]", "h [W/(m^2 K)]"], rows)
col = lambda n: np.array([v[n] for v in trials.values()])
expected(here, trials=trials, law=law(["C", "a"], col("Nu"), [col("Re")]), tolerance={"law": 1e-6})
