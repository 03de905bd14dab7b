"""Water warmed by a wall at constant temperature: the energy balance along the tube integrated by scipy, the coefficient known; properties by the iapws package at the mean temperature. Invented."""
import os, sys
import numpy as np
from iapws import IAPWS97
from scipy.integrate import solve_ivp
from scipy.optimize import brentq
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(2)
d, L, Tw = 0.020, 2.0, 80.0
rows, trials = [], {}
for i in range(12):
    m, Tin = round(0.06 * 1.22 ** i, 5), [15.0, 22.0, 31.0][i % 3]

    def outlet(mean):
        """The outlet for properties at an assumed mean temperature."""
        w = IAPWS97(T=mean + 273.15, P=0.101325)
        Re, Pr = 4 * m / (np.pi * d * w.mu), w.cp * 1e3 * w.mu / w.k
        h = 0.023 * Re ** 0.8 * Pr ** 0.4 * w.k / d * f
        s = solve_ivp(lambda x, T: h * np.pi * d * (Tw - T) / (m * w.cp * 1e3), (0, L), [Tin], rtol=1e-12, atol=1e-12, method="DOP853")
        return s.y[0, -1], h, Re, Pr, h * d / w.k
    f = np.exp(0.03 * rng.standard_normal())
    mean = brentq(lambda t: (Tin + outlet(t)[0]) / 2 - t, Tin + 0.1, Tw - 1, xtol=1e-11)
    Tout, h, Re, Pr, Nu = outlet(mean)
    rows.append([f"W{i + 1}", m * 3600, Tin, Tout])
    trials[f"W{i + 1}"] = {"coefficient": h, "Nu": Nu, "Re": Re, "Pr": Pr}
table(here, "trials.csv", ["run", "m [kg/h]", "T_in [degC]", "T_out [degC]"], rows)
col = lambda n: np.array([v[n] for v in trials.values()])
tolerance = {k: 1e-7 for k in ["coefficient", "Nu", "Re", "Pr"]}
expected(here, trials=trials, law=law(["C", "a", "b"], col("Nu"), [col("Re"), col("Pr")]), tolerance={**tolerance, "law": 1e-5})
