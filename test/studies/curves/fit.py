"""Least squares of the same curves by scipy.optimize.curve_fit, one curve at a time, and power laws of the results by numpy least squares on logarithms.

Run with: python3 fit.py > fit.json
"""
import csv
import json
import math
import sys

import numpy as np
import scipy
from scipy.optimize import curve_fit

truth = json.load(open("truth.json"))


def curves(file, value):
    found = {}
    for row in csv.DictReader(open(file)):
        t, y = found.setdefault(row["trial"], ([], []))
        t.append(float(row["t"]))
        y.append(float(row[value]))
    return {name: (np.array(t), np.array(y)) for name, (t, y) in found.items()}


def law(x, y):
    design = np.column_stack([np.ones(len(x)), np.log(x)])
    theta, *_ = np.linalg.lstsq(design, np.log(y), rcond=None)
    return [math.exp(theta[0]), theta[1]]


out = {"python": sys.version.split()[0], "numpy": np.__version__, "scipy": scipy.__version__, "h": {}, "kla": {}}
rho, c, d = 8900.0, 385.0, 0.02
for name, (t, T) in curves("cooling.csv", "T").items():
    (b, k), _ = curve_fit(lambda t, b, k: 21.0 + b * np.exp(-k * t), t, T, p0=[60, 0.01], xtol=1e-14, ftol=1e-14)
    out["h"][name] = k * rho * c * d / 6
tau = 6.0
for name, (t, y) in curves("gassing.csv", "c").items():
    model = lambda t, s, d0, k: s - d0 * (np.exp(-k * t) - k * tau * np.exp(-t / tau)) / (1 - k * tau)
    (s, d0, k), _ = curve_fit(model, t, y, p0=[8, 8, 0.08], xtol=1e-14, ftol=1e-14)
    out["kla"][name] = k
out["law_h"] = law([truth["spheres"][n]["velocity"] for n in out["h"]], list(out["h"].values()))
out["law_kla"] = law([truth["kla"][n]["rotation_speed"] / 60 for n in out["kla"]], list(out["kla"].values()))
print(json.dumps(out, indent=1))
