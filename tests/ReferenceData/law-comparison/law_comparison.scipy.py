"""Casson and Quemada compared on the curves of ../weighted-fits/readings.csv, by SciPy. Writes law-comparison.scipy.csv beside itself.

Fits as in ../weighted-fits/weighted_fits.scipy.py: weights at the fitted stress, at their fixed point.
-2 log likelihood: the sum of scipy.stats.norm.logpdf of the readings, with the variances at the fitted stress; scale known, or at its most likely value.
AICc with k = parameters of the law, plus one where the scale is estimated. Nested test of Casson (r = 0, a bound) within Quemada: half chi-square with one degree of
freedom, half with none; F from the likelihood ratio where the scale is estimated.
Residual correlation: sum of products of neighbors over sum of squares, from low rates to high; its probability by Imhof's integral with scipy.integrate.quad,
and once more by drawing 400,000 times (column "drawn", good to 0.001).
"""
import csv, os, sys
import numpy as np
from scipy import stats, linalg
from scipy.integrate import quad

HERE = os.path.dirname(os.path.abspath(__file__))
FITS = os.path.join(HERE, "..", "weighted-fits")
RELATIVE, FLOOR = 0.01, 0.0003


def casson(g, p):
    return (np.exp(p[0] / 2) + np.exp(p[1] / 2) * np.sqrt(g)) ** 2


def quemada(g, p):
    s = np.sqrt(g / np.exp(p[1]))
    r = 1 / (1 + np.exp(-p[2]))
    return g * np.exp(p[0]) * ((1 + s) / (r + s)) ** 2


def gradient(f, g, p):
    h = 1e-30
    return np.array([np.imag(f(g, p.astype(complex) + 1j * h * np.eye(len(p))[k])) / h for k in range(len(p))]).T


def refined(law, p, g, y):
    """The fixed point, from estimates of weighted-fits.scipy.csv that are already there to 11 digits."""
    for _ in range(5):
        sigma = np.sqrt((RELATIVE * law(g, p)) ** 2 + FLOOR ** 2)
        p = p + np.linalg.lstsq(gradient(law, g, p) / sigma[:, None], (y - law(g, p)) / sigma, rcond=None)[0]
    sigma = np.sqrt((RELATIVE * law(g, p)) ** 2 + FLOOR ** 2)
    return p, sigma, gradient(law, g, p) / sigma[:, None], (y - law(g, p)) / sigma


def correlation(J, e, rng):
    n = len(e)
    L = (np.eye(n, k=1) + np.eye(n, k=-1)) / 2
    N = linalg.null_space(J.T)
    a = np.linalg.eigvalsh(N.T @ L @ N)
    c = e @ L @ e / (e @ e)
    w = a - c
    f = lambda u: np.sin(np.sum(np.arctan(w * u)) / 2) / (u * np.prod((1 + (w * u) ** 2) ** 0.25))
    p = 0.5 + sum(quad(f, lo, hi, epsabs=1e-13, epsrel=1e-12, limit=2000)[0] for lo, hi in [(0, 1), (1, 10), (10, 100), (100, np.inf)]) / np.pi
    z = rng.standard_normal((400000, len(a))) ** 2
    return c, a.mean(), p, np.mean(z @ w > 0)


estimates = {}
with open(f"{FITS}/weighted-fits.scipy.csv") as f:
    for row in csv.DictReader(f):
        if row["quantity"] == "scaled":
            estimates.setdefault((row["sample"], row["loading"], row["law"]), []).append(float(row["value"]))
curves = {}
with open(f"{FITS}/readings.csv") as f:
    for row in csv.DictReader(f):
        curves.setdefault((row["sample"], row["loading"]), []).append((float(row["shear_rate_per_s"]), float(row["shear_stress_Pa"])))

rng = np.random.default_rng(20261201)
with open(f"{HERE}/law-comparison.scipy.csv", "w", newline="") as f:
    out = csv.writer(f, lineterminator="\n")
    out.writerow(["sample", "loading", "law", "quantity", "value"])
    for (sample, loading), points in curves.items():
        g, y = np.array(sorted(points)).T
        n = len(g)
        logs = {}
        for name, law in {"Casson": casson, "Quemada": quemada}.items():
            p, sigma, J, e = refined(law, np.array(estimates[sample, loading, name]), g, y)
            scale = np.sqrt(e @ e / n)
            known = -2 * np.sum(stats.norm.logpdf(y, law(g, p), sigma))
            estimated = -2 * np.sum(stats.norm.logpdf(y, law(g, p), sigma * scale))
            logs[name] = (known, estimated)
            k = len(p)
            c, expected, above, drawn = correlation(J, e, rng)
            rows = {"minus_twice_log known": known, "minus_twice_log estimated": estimated,
                    "aicc known": known + 2 * k + 2 * k * (k + 1) / (n - k - 1), "aicc estimated": estimated + 2 * (k + 1) + 2 * (k + 1) * (k + 2) / (n - k - 2),
                    "correlation": c, "correlation expected": expected, "correlation probability": above, "correlation probability drawn": drawn}
            out.writerows([sample, loading, name, q, f"{x:.15g}"] for q, x in rows.items())
        ratio = logs["Casson"][0] - logs["Quemada"][0]
        F = (np.exp((logs["Casson"][1] - logs["Quemada"][1]) / n) - 1) * (n - 3)
        for q, x in {"nested chi-square": ratio, "nested chi-square probability": stats.chi2.sf(ratio, 1) / 2, "nested F": F, "nested F probability": stats.f.sf(F, 1, n - 3) / 2}.items():
            out.writerow([sample, loading, "Casson in Quemada", q, f"{x:.15g}"])
