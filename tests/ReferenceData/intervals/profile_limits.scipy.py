"""95 % profile likelihood limits and Wald limits of Casson and Quemada, by SciPy. Writes profile-limits.scipy.csv beside itself.

Curves: three of ../weighted-fits/readings.csv. Error model: variance (0.01 stress)^2 + (0.0003 Pa)^2 at the fitted stress, sizes known, or
known up to a scale estimated from the residuals. The weights are held at the fitted stresses of the free fit. A limit is the largest or
smallest value of the quantity among all parameters whose weighted sum of squares lies z^2 (t^2 s^2) above the least one: found by SLSQP,
then Lagrange's equations are solved to the last digits. Gradients by complex step.
"""
import csv, os
import numpy as np
from scipy import stats
from scipy.optimize import least_squares, minimize, root

HERE = os.path.dirname(os.path.abspath(__file__))
RELATIVE, FLOOR = 0.01, 0.0003


def casson(g, p):
    return (np.exp(p[0] / 2) + np.exp(p[1] / 2) * np.sqrt(g)) ** 2


def quemada(g, p):
    s = np.sqrt(g / np.exp(p[1]))
    r = 1 / (1 + np.exp(-p[2]))
    return g * np.exp(p[0]) * ((1 + s) / (r + s)) ** 2


def slopes(f, p):
    h = 1e-30
    return np.array([np.imag(f(p.astype(complex) + 1j * h * np.eye(len(p))[k])) / h for k in range(len(p))])


def free_fit(law, start, g, y):
    p = np.array(start, float)
    sigma = np.sqrt((RELATIVE * y) ** 2 + FLOOR ** 2)
    for _ in range(100):
        p = least_squares(lambda q: (law(g, q) - y) / sigma, p, method="lm", xtol=1e-15, ftol=1e-15, gtol=1e-15).x
        sigma = np.sqrt((RELATIVE * law(g, p)) ** 2 + FLOOR ** 2)
    for _ in range(30):
        sigma = np.sqrt((RELATIVE * law(g, p)) ** 2 + FLOOR ** 2)
        J = slopes(lambda q: law(g, q), p).T / sigma[:, None]
        p = p + np.linalg.lstsq(J, (y - law(g, p)) / sigma, rcond=None)[0]
    sigma = np.sqrt((RELATIVE * law(g, p)) ** 2 + FLOOR ** 2)
    J = slopes(lambda q: law(g, q), p).T / sigma[:, None]
    return p, sigma, np.linalg.inv(J.T @ J)


def limit(h, S, p0, V, rise, sign):
    """Extreme of h where S has risen by `rise`."""
    target = S(p0) + rise
    L = np.linalg.cholesky(V)  # coordinates in which S is nearly round
    at = lambda u: p0 + L @ u
    # S of a complex argument keeps its analytic form, so that complex steps work.
    start = sign * L.T @ slopes(h, p0)
    start *= np.sqrt(rise) / np.linalg.norm(start)
    best = minimize(lambda u: -sign * h(at(u)), start, jac=lambda u: -sign * slopes(lambda q: h(q), at(u)) @ L, method="SLSQP",
                    constraints=[{"type": "eq", "fun": lambda u: S(at(u)) - target, "jac": lambda u: slopes(S, at(u)) @ L}], options={"ftol": 1e-14, "maxiter": 1000})
    u = best.x
    mu = (slopes(h, at(u)) @ slopes(S, at(u))) / (slopes(S, at(u)) @ slopes(S, at(u)))
    eqs = lambda v: np.append((slopes(h, at(v[:-1])) - v[-1] * slopes(S, at(v[:-1]))) @ L, S(at(v[:-1])) - target)
    end = root(eqs, np.append(u, mu), method="hybr", tol=1e-14)
    assert np.max(np.abs(eqs(end.x))) < 1e-9, (best.message, end.message, eqs(end.x))
    assert abs(h(at(end.x[:-1])) - h(at(u))) < 1e-4
    return h(at(end.x[:-1]))


curves = {}
with open(f"{HERE}/../weighted-fits/readings.csv") as f:
    for row in csv.DictReader(f):
        curves.setdefault((row["sample"], row["loading"]), []).append((float(row["shear_rate_per_s"]), float(row["shear_stress_Pa"])))

LAWS = {
    "Casson": (casson, [np.log(0.004), np.log(0.0035)], ["yield stress", "Casson viscosity"]),
    "Quemada": (quemada, [np.log(0.003), np.log(2.0), -1.0], ["high-shear viscosity", "critical rate", "ratio"]),
}
natural = lambda name, x: 1 / (1 + np.exp(-x)) if name == "ratio" else np.exp(x)
with open(f"{HERE}/profile-limits.scipy.csv", "w", newline="") as out:
    w = csv.writer(out, lineterminator="\n")
    w.writerow(["sample", "loading", "law", "scale", "quantity", "estimate", "profile_lower", "profile_upper", "wald_lower", "wald_upper"])
    for (sample, loading), rows in list(curves.items())[:3]:
        g, y = np.array(rows).T
        for name, (law, start, names) in LAWS.items():
            p, sigma, V = free_fit(law, start, g, y)
            S = lambda q: np.sum(((y - law(g, q)) / sigma) ** 2)
            df = len(y) - len(p)
            quantities = [(n, (lambda q, k=k: q[k])) for k, n in enumerate(names)]
            quantities += [(f"viscosity at {rate} 1/s", (lambda q, rate=rate: np.log(law(np.array([rate]), q)[0] / rate))) for rate in (1.0, 10.0, 100.0)]
            for scale in ("known", "estimated"):
                unit = 1 if scale == "known" else S(p) / df
                quantile = stats.norm.ppf(0.975) if scale == "known" else stats.t.ppf(0.975, df)
                for quantity, h in quantities:
                    G = slopes(h, p)
                    half = quantile * np.sqrt(unit * G @ V @ G)
                    values = [h(p), limit(h, S, p, V, quantile ** 2 * unit, -1), limit(h, S, p, V, quantile ** 2 * unit, 1), h(p) - half, h(p) + half]
                    w.writerow([sample, loading, name, scale, quantity] + [f"{natural(quantity, v):.12g}" for v in values])
