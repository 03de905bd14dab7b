"""Logged curves of invented trials, made by independent means, and the coefficients they were made with.

Spheres cooling in air: exact series of the temperature at the centre (scipy brentq roots of zeta/tan zeta = 1 - Bi) for low Bi here lumped;
kLa: dissolved oxygen convolved with the probe's first-order lag (analytic solution of both first-order steps).
Run with: python3 make.py  (writes cooling.csv, gassing.csv, truth.json)
"""
import json
import math
import sys

import numpy as np
import scipy

rng = np.random.default_rng(20261201)
rho, c, d = 8900.0, 385.0, 0.02
truth = {"python": sys.version.split()[0], "numpy": np.__version__, "scipy": scipy.__version__, "spheres": {}, "kla": {}}
rows = ["trial,t,T"]
for k, (v, h) in enumerate([(2.0, 41.0), (3.1, 53.0), (4.7, 67.0), (7.2, 87.5), (11.0, 113.0), (16.5, 145.0)]):
    name = f"S{k + 1}"
    truth["spheres"][name] = {"velocity": v, "h": h}
    rate = h * 6 / (rho * c * d)
    for t in np.arange(0, 240.1, 4.0):
        T = 21.0 + 60.0 * math.exp(-rate * t) + 0.05 * rng.standard_normal()
        rows.append(f"{name},{t:.0f},{T:.3f}")
open("cooling.csv", "w").write("\n".join(rows) + "\n")

rows = ["trial,t,c"]
for k, (n, kla) in enumerate([(300, 0.045), (400, 0.071), (500, 0.10), (650, 0.147), (800, 0.20), (1000, 0.285)]):
    name = f"G{k + 1}"
    truth["kla"][name] = {"rotation_speed": n, "kla": kla}
    tau = 6.0
    for t in np.arange(0, 120.1, 1.0):
        # c* (1 - exp(-k t)) through a lag of tau: analytic.
        y = 8.2 * (1 - (math.exp(-kla * t) - kla * tau * math.exp(-t / tau)) / (1 - kla * tau)) + 0.01 * rng.standard_normal()
        rows.append(f"{name},{t:.0f},{y:.4f}")
open("gassing.csv", "w").write("\n".join(rows) + "\n")
json.dump(truth, open("truth.json", "w"), indent=1)
