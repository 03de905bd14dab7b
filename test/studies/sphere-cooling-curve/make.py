"""Steel-like spheres cooling in an air stream, logged at the centre: exact series simulated, one exponential fitted by scipy, Bi from its first root. Invented."""
import os, sys
import numpy as np
from scipy.optimize import brentq, curve_fit
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(11)
rho_s, c_s, lam_s, lam, mu, rho, cp = 7800.0, 470.0, 15.0, 0.0262, 1.85e-5, 1.18, 1007.0
roots = lambda Bi: [brentq(lambda z: 1 - z / np.tan(z) - Bi, (n * np.pi) + 1e-9, (n + 1) * np.pi - 1e-9, xtol=1e-14) for n in range(60)]
rows, logs, trials = [], {}, {}
for i in range(12):
    d = [0.020, 0.030, 0.040][i % 3]
    u = round(2.0 * 1.28 ** i, 3)
    Re = rho * u * d / mu
    Pr = cp * mu / lam
    h = (2 + 0.52 * Re ** 0.52 * Pr ** (1 / 3)) * lam / d * np.exp(0.03 * rng.standard_normal())
    R, a, T = d / 2, lam_s / (rho_s * c_s), 21.0 + 0.3 * i
    t = np.arange(0, 301, 5.0)
    Bi = h * R / lam_s
    T1 = np.zeros_like(t)
    for z in roots(Bi):
        T1 += 4 * (np.sin(z) - z * np.cos(z)) / (2 * z - np.sin(2 * z)) * np.exp(-z * z * a * t / R ** 2)
    log = np.round(T + (95 - T) * T1 + 0.05 * rng.standard_normal(len(t)), 3)
    name = f"S{i + 1}"
    rows.append([name, f"logs/{name}.csv", u, d * 1e3, T])
    table(here, f"logs/{name}.csv", ["t [s]", "T [degC]"], [[tt, v] for tt, v in zip(t, log)])
    # independent reduction: the window 60 to 300 s
    inside = t >= 60
    (B, r), cov = curve_fit(lambda x, B, r: B * np.exp(-r * (x - 60)), t[inside], log[inside] - T, p0=[60, 5e-3], xtol=1e-14, ftol=1e-14)
    zeta = np.sqrt(r * R * R / a)
    hh = (1 - zeta / np.tan(zeta)) * lam_s / R
    trials[name] = {"coefficient": hh, "Nu": hh * d / lam, "Re": Re, "u_rate": float(np.sqrt(cov[1, 1]))}
table(here, "trials.csv", ["run", "log", "u [m/s]", "d [mm]", "T air [degC]"], rows)
y = np.array([v["Nu"] for v in trials.values()]); x = np.array([v["Re"] for v in trials.values()])
with_rates = {k: {a: b for a, b in v.items() if a != "u_rate"} for k, v in trials.items()}
expected(here, series=12, trials=with_rates, law=law(["C", "a"], y, [x]), tolerance={"coefficient": 1e-6, "Nu": 1e-6, "Re": 1e-12, "law": 1e-6})
