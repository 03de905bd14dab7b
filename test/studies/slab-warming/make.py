"""Slabs warmed from both sides, read at the surface: conduction by finite volumes and a matrix exponential, the coefficient known. Invented."""
import os, sys
import numpy as np
from scipy.linalg import expm
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(31)
rho_s, c_s, lam_s, lam, nu = 1180.0, 1470.0, 0.19, 0.0277, 1.7e-5
rows, trials = [], {}


def surface(h, H, t, n):
    """Share of the difference left at the surface of half a slab of n cells."""
    dx = H / n
    g, out = lam_s / dx, 1 / (1 / h + dx / 2 / lam_s)
    A = np.diag([-g] + [-2 * g] * (n - 2) + [-(g + out)]) + np.diag([g] * (n - 1), 1) + np.diag([g] * (n - 1), -1)
    T = expm(A / (dx * rho_s * c_s) * t) @ np.ones(n)
    return T[-1] * (2 * lam_s / dx) / (2 * lam_s / dx + h)  # flux from the last centre to the surface is that into the air


for i in range(8):
    s, u, T, t, L = 0.010, round(1.5 * 1.35 ** i, 3), 60.0, 240.0, 0.1
    Re = u * L / nu
    h = 0.6 * Re ** 0.5 * lam / L * np.exp(0.02 * rng.standard_normal())
    a, b = surface(h, s / 2, t, 100), surface(h, s / 2, t, 200)
    theta = b + (b - a) / 3
    rows.append([f"S{i + 1}", u, 20.0, T + (20 - T) * theta, t])
    trials[f"S{i + 1}"] = {"coefficient": h, "Nu": h * L / lam, "Re": Re}
table(here, "trials.csv", ["run", "u [m/s]", "T0 [degC]", "T1 [degC]", "t [s]"], rows)
col = lambda n: np.array([v[n] for v in trials.values()])
expected(here, trials=trials, law=law(["C", "a"], col("Nu"), [col("Re")]), tolerance={"coefficient": 5e-4, "Nu": 5e-4, "law": 3e-3})
