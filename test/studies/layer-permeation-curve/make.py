"""What has come through a film, logged: diffusion by finite volumes; the straight part by least squares. Invented."""
import os, sys
import numpy as np
from scipy.linalg import expm
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(18)
A, cs, n = 0.005, 20.0, 120
rows, log, trials = [], [], {}
for i in range(6):
    s, D, K = (30 + 10 * i) * 1e-6, 1.0e-12 * np.exp(0.03 * rng.standard_normal()), 0.5
    dx = s / n
    M = np.zeros((n + 2, n + 2))  # shells, then what has come through, then one
    for k in range(n):
        left, right = (D / dx / dx, D / dx / dx)
        if k > 0: M[k, k - 1] += left; M[k, k] -= left
        else: M[k, n + 1] += 2 * left * K * cs; M[k, k] -= 2 * left
        if k < n - 1: M[k, k + 1] += right; M[k, k] -= right
        else: M[k, k] -= 2 * right; M[n, k] += 2 * D / dx * A
    y0 = np.zeros(n + 2); y0[n + 1] = 1
    t = np.linspace(0, 24000, 121)
    step = expm(M * 200)
    q, y = [0.0], y0
    for _ in t[1:]:
        y = step @ y
        q.append(y[n])
    q = np.array(q) * 0.1  # kg, at 100 g/mol
    name = f"Q{i + 1}"
    rows.append([name, s * 1e6])
    log += [[name, tt, v * 1e6] for tt, v in zip(t, q)]
    inside = (t >= 6000) & (t <= 20000)
    slope, cut = np.polyfit(t[inside], q[inside], 1)
    trials[name] = {"mass_rate": slope, "lag_time": -cut / slope, "permeability": slope / A / (cs * 0.1) * s}
table(here, "trials.csv", ["run", "s [um]"], rows)
table(here, "through.csv", ["run", "t [s]", "m [mg]"], log)

s = np.array([r[1] * 1e-6 for r in rows])
keep = {k: {a: b for a, b in v.items() if a in ("permeability", "mass_rate", "lag_time")} for k, v in trials.items()}
expected(here, series=6, trials=keep, law=law(["C", "a"], np.array([v["permeability"] for v in trials.values()]), [s]), tolerance={"permeability": 1e-8, "lag_time": 1e-8, "law": 1e-4})
