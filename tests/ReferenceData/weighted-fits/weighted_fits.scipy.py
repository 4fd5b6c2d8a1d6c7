"""Weighted fits of Casson and Quemada to readings.csv, by SciPy. Writes weighted-fits.scipy.csv beside itself.

Variance of a reading (0.01 stress)^2 + (0.0003 Pa)^2 at the fitted stress, iterated to its fixed point.
Scaled parameters: logarithms; Quemada's ratio r on the logit scale. Gradients by complex step.
response: change of the scaled estimates when 1 Pa is added to every reading, (J'WJ)^-1 J'W 1.
"""
import csv, os
import numpy as np
from scipy import stats
from scipy.optimize import least_squares

HERE = os.path.dirname(os.path.abspath(__file__))
RELATIVE, FLOOR = 0.01, 0.0003


def casson(g, p):
    return (np.exp(p[0] / 2) + np.exp(p[1] / 2) * np.sqrt(g)) ** 2


def quemada(g, p):
    s = np.sqrt(g / np.exp(p[1]))
    r = 1 / (1 + np.exp(-p[2]))
    return g * np.exp(p[0]) * ((1 + s) / (r + s)) ** 2


LAWS = {"Casson": (casson, [np.log(0.004), np.log(0.0035)]), "Quemada": (quemada, [np.log(0.003), np.log(2.0), -1.0])}


def gradient(f, g, p):
    h = 1e-30
    return np.array([np.imag(f(g, p.astype(complex) + 1j * h * np.eye(len(p))[k])) / h for k in range(len(p))]).T


def fit(law, start, g, y):
    p = np.array(start, float)
    sigma = np.sqrt((RELATIVE * y) ** 2 + FLOOR ** 2)
    for _ in range(100):
        r = least_squares(lambda q: (law(g, q) - y) / sigma, p, jac=lambda q: gradient(law, g, q) / sigma[:, None], method="lm", xtol=1e-15, ftol=1e-15, gtol=1e-15)
        step, p = np.max(np.abs(r.x - p)), r.x
        sigma = np.sqrt((RELATIVE * law(g, p)) ** 2 + FLOOR ** 2)
        if step < 1e-13:
            break
    for _ in range(30):  # least_squares stops where the sum of squares is flat; solve J'W r = 0 itself to the last digits
        sigma = np.sqrt((RELATIVE * law(g, p)) ** 2 + FLOOR ** 2)
        J = gradient(law, g, p) / sigma[:, None]
        p = p + np.linalg.lstsq(J, (y - law(g, p)) / sigma, rcond=None)[0]
    sigma = np.sqrt((RELATIVE * law(g, p)) ** 2 + FLOOR ** 2)
    J = gradient(law, g, p) / sigma[:, None]
    V = np.linalg.inv(J.T @ J)
    res = (y - law(g, p)) / sigma
    return p, V, V @ (J.T @ (1 / sigma)), res


curves = {}
with open(f"{HERE}/readings.csv") as f:
    for row in csv.DictReader(f):
        curves.setdefault((row["sample"], row["loading"]), []).append((float(row["shear_rate_per_s"]), float(row["shear_stress_Pa"])))
with open(f"{HERE}/weighted-fits.scipy.csv", "w", newline="") as f:
    w = csv.writer(f, lineterminator="\n")
    w.writerow(["sample", "loading", "law", "quantity", "index", "value"])
    for (sample, loading), points in curves.items():
        g, y = np.array(points).T
        for name, (law, start) in LAWS.items():
            p, V, response, res = fit(law, start, g, y)
            df = len(g) - len(p)
            rows = [("scaled", i, x) for i, x in enumerate(p)] + [("covariance", i, x) for i, x in enumerate(V.flat)]
            rows += [("response", i, x) for i, x in enumerate(response)] + [("residual", i, x) for i, x in enumerate(res)]
            rows += [("chi_square", 0, res @ res), ("probability", 0, stats.chi2.sf(res @ res, df))]
            w.writerows([sample, loading, name, q, i, f"{x:.15g}"] for q, i, x in rows)
