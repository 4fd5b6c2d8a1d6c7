"""The fits of weighted-fits.scipy.csv for readings correlated by rho^|i - j|, by NumPy and SciPy. Writes correlated-fits.scipy.csv beside itself.

covariance: (J'WJ)^-1 J'W^1/2 R W^1/2 J (J'WJ)^-1; expected: tr(M R), M = I - H; effective_df: tr(M R)^2 / tr(M R M R).
probability: exact tail of the weighted sum of chi-squares of the eigenvalues of M R M, by numerical inversion (Imhof 1961, Biometrika 48:419-426).
minus_two_log: of the multivariate normal at the generalized least-squares minimum, one linear step from the fit, known sizes of the errors.
"""
import csv, os
import numpy as np
from scipy import stats
from scipy.integrate import quad

HERE = os.path.dirname(os.path.abspath(__file__))
RELATIVE, FLOOR = 0.01, 0.0003


def casson(g, p):
    return (np.exp(p[0] / 2) + np.exp(p[1] / 2) * np.sqrt(g)) ** 2


def quemada(g, p):
    s = np.sqrt(g / np.exp(p[1]))
    r = 1 / (1 + np.exp(-p[2]))
    return g * np.exp(p[0]) * ((1 + s) / (r + s)) ** 2


LAWS = {"Casson": casson, "Quemada": quemada}


def gradient(f, g, p):
    h = 1e-30
    return np.array([np.imag(f(g, p.astype(complex) + 1j * h * np.eye(len(p))[k])) / h for k in range(len(p))]).T


def tail(eigenvalues, x):
    lam = eigenvalues[eigenvalues > 1e-12]
    theta = lambda u: 0.5 * np.sum(np.arctan(lam * u)) - 0.5 * x * u
    size = lambda u: np.prod((1 + (lam * u) ** 2) ** 0.25)
    whole = 0.0
    edges = np.linspace(0, 200, 801)
    for a, b in zip(edges[:-1], edges[1:]):
        whole += quad(lambda u: np.sin(theta(u)) / (u * size(u)), a + (1e-15 if a == 0 else 0), b, epsabs=1e-13, epsrel=1e-12)[0]
    return 0.5 + whole / np.pi


readings, estimates = {}, {}
with open(f"{HERE}/readings.csv") as f:
    for row in csv.DictReader(f):
        readings.setdefault((row["sample"], row["loading"]), []).append((float(row["shear_rate_per_s"]), float(row["shear_stress_Pa"])))
with open(f"{HERE}/weighted-fits.scipy.csv") as f:
    for row in csv.DictReader(f):
        if row["quantity"] == "scaled":
            estimates.setdefault((row["sample"], row["loading"], row["law"]), []).append(float(row["value"]))
with open(f"{HERE}/correlated-fits.scipy.csv", "w", newline="") as f:
    w = csv.writer(f, lineterminator="\n")
    w.writerow(["sample", "loading", "law", "rho", "quantity", "index", "value"])
    for (sample, loading, law), p in estimates.items():
        p = np.array(p)
        g, y = np.array(readings[sample, loading]).T
        n = len(g)
        stress = LAWS[law](g, p)
        sigma = np.sqrt((RELATIVE * stress) ** 2 + FLOOR ** 2)
        X = gradient(LAWS[law], g, p) / sigma[:, None]
        e = (y - stress) / sigma
        inverse = np.linalg.inv(X.T @ X)
        M = np.eye(n) - X @ inverse @ X.T
        for rho in (0.3, 0.6):
            R = rho ** np.abs(np.subtract.outer(np.arange(n), np.arange(n)))
            V = inverse @ X.T @ R @ X @ inverse
            MR = M @ R
            Ri = np.linalg.inv(R)
            b = np.linalg.solve(X.T @ Ri @ X, X.T @ Ri @ e)
            d = sigma * (e - X @ b)
            log = stats.multivariate_normal(np.zeros(n), sigma[:, None] * R * sigma).logpdf(d)
            rows = [("covariance", i, x) for i, x in enumerate(V.flat)]
            rows += [("expected", 0, np.trace(MR)), ("effective_df", 0, np.trace(MR) ** 2 / np.trace(MR @ MR))]
            rows += [("probability", 0, tail(np.linalg.eigvalsh(M @ R @ M), e @ e)), ("minus_two_log", 0, -2 * log)]
            w.writerows([sample, loading, law, rho, q, i, f"{x:.12g}"] for q, i, x in rows)
