"""Shared by the scripts beside the studies: an independent way to laws and what is stored of it. All data are invented."""
import csv, json, os, platform, sys
import numpy as np, scipy


def power_law(y, columns):
    """ln y by least squares on 1 and ln x: constants, standard errors, residual standard deviation."""
    X = np.column_stack([np.ones(len(y))] + [np.log(c) for c in columns])
    b, *_ = np.linalg.lstsq(X, np.log(y), rcond=None)
    r = np.log(y) - X @ b
    s2 = r @ r / (len(y) - X.shape[1])
    se = np.sqrt(np.diag(np.linalg.inv(X.T @ X)) * s2)
    return b, se, np.sqrt(s2)


def law(names, y, columns):
    """As the program reports it: C on the natural scale, its standard error by the chain rule."""
    b, se, s = power_law(y, columns)
    values = dict(zip(names, [float(np.exp(b[0]))] + [float(v) for v in b[1:]]))
    errors = dict(zip(names, [float(np.exp(b[0]) * se[0])] + [float(v) for v in se[1:]]))
    return {"values": values, "standard_errors": errors, "residual_sd": float(s)}


def table(folder, name, header, rows):
    path = os.path.join(folder, name)
    os.makedirs(os.path.dirname(path), exist_ok=True)
    with open(path, "w", newline="") as f:
        w = csv.writer(f, lineterminator="\n")
        w.writerow(header)
        w.writerows(rows)


def expected(folder, **what):
    versions = {"python": platform.python_version(), "numpy": np.__version__, "scipy": scipy.__version__}
    if "iapws" in sys.modules:
        versions["iapws"] = sys.modules["iapws"].__version__
    with open(os.path.join(folder, "expected.json"), "w") as f:
        json.dump({"made_by": "make.py", "versions": versions, **what}, f, indent=1)
        f.write("\n")
