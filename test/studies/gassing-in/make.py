"""Oxygen after a step of the gas in a stirred tank, probe with a lag of 6 s, one long log in % of saturation; scipy fits the two first orders in series. Invented."""
import os, sys
import numpy as np
from scipy.optimize import curve_fit
here = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.dirname(here))
from common import expected, law, table

rng = np.random.default_rng(5)
tau, V = 6.0, 0.060
rows, log, trials = [], [], {}


def probe(t, A, c0, k):
    return A - (A - c0) * (np.exp(-k * t) - k * tau * np.exp(-t / tau)) / (1 - k * tau)


for i in range(12):
    P, ug = [20, 60, 180, 400][i % 4] * 1.0, [0.004, 0.008, 0.016][i // 4]
    k = 0.03 * (P / V / 1000) ** 0.5 * (ug / 0.01) ** 0.45 * np.exp(0.03 * rng.standard_normal())
    t = np.arange(0, 241, 2.0)
    c = np.round(probe(t, 100, 5, k) + 0.3 * rng.standard_normal(len(t)), 2)
    name = f"G{i + 1}"
    rows.append([name, P, ug * 1e3])
    log += [[name, tt, v] for tt, v in zip(t, c)]
    inside = t <= 200
    (A, c0, kk), _ = curve_fit(probe, t[inside], c[inside], p0=[100, 5, k], xtol=1e-15, ftol=1e-15, gtol=1e-15)
    trials[name] = {"volumetric_coefficient": kk, "power_per_volume": P / V, "gas_velocity": ug}
table(here, "trials.csv", ["run", "P [W]", "u_G [mm/s]"], rows)
table(here, "probe.csv", ["run", "t [s]", "DO [%]"], log)
col = lambda n: np.array([v[n] for v in trials.values()])
expected(here, series=12, trials=trials, law=law(["C", "a", "b"], col("volumetric_coefficient"), [col("power_per_volume"), col("gas_velocity")]),
         tolerance={"volumetric_coefficient": 1e-6, "law": 1e-6})
