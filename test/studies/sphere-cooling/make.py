"""Spheres between two temperatures, read at the centre: heat conduction by finite volumes and a stiff ODE solver of scipy, the coefficient known. Invented."""
import os, sys
import numpy as np
from scipy.integrate import solve_ivp
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(6)
rho_s, c_s, lam_s, lam, mu, rho, cp, n = 2500.0, 840.0, 1.1, 0.0262, 1.85e-5, 1.18, 1007.0, 400
rows, trials = [], {}


def centre(h, R, t):
    """Share of the difference left at the centre: n shells, second order, extrapolated from n and 2n."""
    def shells(n):
        r = np.linspace(0, R, n + 1)
        v, a, mid = np.diff(r ** 3) / 3, r ** 2, (r[1:] + r[:-1]) / 2
        g = lam_s * a[1:-1] / np.diff(mid)
        out = a[-1] / (1 / h + (R - mid[-1]) / lam_s)
        A = np.zeros((n, n))
        for k in range(n - 1):
            A[k, k] -= g[k]; A[k, k + 1] += g[k]; A[k + 1, k + 1] -= g[k]; A[k + 1, k] += g[k]
        A[-1, -1] -= out
        A /= (v * rho_s * c_s)[:, None]
        from scipy.linalg import expm
        T = expm(A * t) @ np.ones(n)
        return T[0] + (T[0] - T[1]) / 8  # parabola through the two innermost centres, at r = 0
    a, b = shells(100), shells(200)
    return b + (b - a) / 3


for i in range(8):
    d, u, T, t = [0.020, 0.030][i % 2], round(1.0 * 1.4 ** i, 3), 22.0, 120.0
    Re, Pr = rho * u * d / mu, cp * mu / lam
    h = (2 + 0.5 * Re ** 0.52 * Pr ** (1 / 3)) * lam / d * np.exp(0.03 * rng.standard_normal())
    theta = centre(h, d / 2, t)
    rows.append([f"B{i + 1}", u, d * 1e3, 90.0, T + (90 - T) * theta, t])
    trials[f"B{i + 1}"] = {"coefficient": h, "Nu": h * d / lam, "Re": Re}
table(here, "trials.csv", ["run", "u [m/s]", "d [mm]", "T0 [degC]", "T1 [degC]", "t [s]"], rows)
col = lambda n: np.array([v[n] for v in trials.values()])
expected(here, trials=trials, law=law(["C", "a"], col("Nu"), [col("Re")]), tolerance={"coefficient": 2e-4, "Nu": 2e-4, "law": 1e-3})
