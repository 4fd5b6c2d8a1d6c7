"""Curves fitted together, by SciPy. Writes readings.csv (invented) and joint-fits.scipy.csv beside itself.

loadings: Casson, three loadings, stress_l = exp(f_l) law, f_3 = -f_1 - f_2. Unknowns ln yield stress, ln Casson viscosity, f_1, f_2, f_3.
series: Quemada, four curves, critical rate shared. Unknowns ln critical rate, then of each curve ln high-shear viscosity and logit ratio.
dilution: Quemada with hematocrit, all shared. Unknowns logit k0 and logit kinf (both within 0 and 2 / highest H), ln critical rate, ln plasma viscosity.
Variance of a reading (relative stress)^2 + floor^2 at the fitted stress, iterated to its fixed point. Gradients by complex step.
rise: by how much chi-square rises over fits of each curve alone, the weights in both being those of the joint fit.
"""
import csv, os
import numpy as np
from scipy import stats
from scipy.optimize import least_squares

HERE = os.path.dirname(os.path.abspath(__file__))
RATES = np.array([300, 200, 130, 100, 50, 30, 20, 11, 5, 2.5, 1.2, 0.7])


def logistic(x):
    return 1 / (1 + np.exp(-x))


def casson(g, p):
    return (np.exp(p[0] / 2) + np.exp(p[1] / 2) * np.sqrt(g)) ** 2


def quemada(g, p):
    """ln high-shear viscosity, ln critical rate, logit ratio"""
    s = np.sqrt(g / np.exp(p[1]))
    return g * np.exp(p[0]) * ((1 + s) / (logistic(p[2]) + s)) ** 2


def diluted(g, h, highest, p):
    k0, kinf, s = 2 / highest * logistic(p[0]), 2 / highest * logistic(p[1]), np.sqrt(g / np.exp(p[2]))
    return g * np.exp(p[3]) * (1 - h / 2 * (k0 + kinf * s) / (1 + s)) ** -2


def make():
    random = np.random.Generator(np.random.PCG64(20261201))
    rows = []

    def add(case, curve, h, relative, floor, stress):
        noisy = stress * (1 + relative * random.standard_normal(len(RATES))) + floor * random.standard_normal(len(RATES))
        rows.extend([case, curve, h, relative, floor, f"{g:g}", f"{y:.7g}"] for g, y in zip(RATES, noisy))

    for l, f in enumerate([0.021, -0.034, 0.004]):
        add("loadings", l + 1, 0.45, 0.01, 0.0003, np.exp(f) * casson(RATES, np.log([0.005, 0.0034])))
    hs = [0.25, 0.35, 0.45, 0.55]
    for l, (h, e, r) in enumerate(zip(hs, [(0.01, 0.0003), (0.01, 0.0003), (0.015, 0.0003), (0.02, 0.0005)], [0.45, 0.33, 0.22, 0.15])):
        eta = 0.0012 * (1 - h * 1.75 / 2) ** -2
        add("series", l + 1, h, *e, quemada(RATES, np.array([np.log(eta), np.log(2.5), np.log(r / (1 - r))])))
    for l, h in enumerate(hs):
        x = np.array([np.log(3.2 / (2 / 0.55 - 3.2)), np.log(1.75 / (2 / 0.55 - 1.75)), np.log(2.5), np.log(0.0012)])
        add("dilution", l + 1, h, 0.01, 0.0003, diluted(RATES, h, 0.55, x))
    with open(f"{HERE}/readings.csv", "w", newline="") as f:
        w = csv.writer(f, lineterminator="\n")
        w.writerow(["case", "curve", "hematocrit", "relative", "floor_Pa", "shear_rate_per_s", "shear_stress_Pa"])
        w.writerows(rows)


def gradient(f, p):
    h = 1e-30
    return np.array([np.imag(f(p.astype(complex) + 1j * h * np.eye(len(p))[k])) / h for k in range(len(p))]).T


def fit(f, start, y, sd):
    """sd: deviations as a function of stress"""
    p = np.array(start, float)
    for _ in range(100):
        s = sd(f(p))
        r = least_squares(lambda q: (f(q) - y) / s, p, jac=lambda q: gradient(f, q) / s[:, None], method="lm", xtol=1e-15, ftol=1e-15, gtol=1e-15)
        step, p = np.max(np.abs(r.x - p)), r.x
        if step < 1e-13:
            break
    for _ in range(40):  # least_squares stops where the sum of squares is flat; solve J'W r = 0 itself to the last digits
        s = sd(f(p))
        p = p + np.linalg.lstsq(gradient(f, p) / s[:, None], (y - f(p)) / s, rcond=None)[0]
    s = sd(f(p))
    J = gradient(f, p) / s[:, None]
    return p, np.linalg.inv(J.T @ J), (y - f(p)) / s, s


make()
curves = {}
with open(f"{HERE}/readings.csv") as f:
    for row in csv.DictReader(f):
        curves.setdefault(row["case"], {}).setdefault(int(row["curve"]), []).append([float(row[c]) for c in ("hematocrit", "relative", "floor_Pa", "shear_rate_per_s", "shear_stress_Pa")])

CASES = {
    "loadings": (
        lambda p, hs: np.concatenate([np.exp(f) * casson(RATES, p[:2]) for f in (p[2], p[3], -p[2] - p[3])]),
        [np.log(0.005), np.log(0.0034), 0, 0], casson, [np.log(0.005), np.log(0.0034)],
        np.array([[1, 0, 0, 0], [0, 1, 0, 0], [0, 0, 1, 0], [0, 0, 0, 1], [0, 0, -1, -1]])),
    "series": (
        lambda p, hs: np.concatenate([quemada(RATES, [p[1 + 2 * l], p[0], p[2 + 2 * l]]) for l in range(4)]),
        [1.0, -6, -1, -6, -1, -6, -1, -6, -1], quemada, [-6, 1, -1], np.eye(9)),
    "dilution": (
        lambda p, hs: np.concatenate([diluted(RATES, h, max(hs), p) for h in hs]),
        [2.0, 0.0, 1.0, np.log(0.0012)], quemada, [-6, 1, -1], np.eye(4)),
}

with open(f"{HERE}/joint-fits.scipy.csv", "w", newline="") as out:
    w = csv.writer(out, lineterminator="\n")
    w.writerow(["case", "quantity", "index", "value"])
    for case, (model, start, law, alone_start, expand) in CASES.items():
        data = np.array([curves[case][l] for l in sorted(curves[case])])
        hs, y = data[:, 0, 0], data[:, :, 4].ravel()
        relative, floor = data[:, :, 1].ravel(), data[:, :, 2].ravel()
        p, V, res, s = fit(lambda q: model(q, hs), start, y, lambda t: np.sqrt((relative * t.real) ** 2 + floor ** 2))
        n, alone, free = len(RATES), 0.0, 0
        for l in range(len(hs)):
            own = slice(l * n, (l + 1) * n)
            q, _, r, _ = fit(lambda z: law(RATES, z), alone_start, y[own], lambda t: s[own])
            alone, free = alone + r @ r, free + len(q)
        chi, fewer, left = res @ res, free - len(p), len(y) - free
        rise = chi - alone
        F = rise / fewer / (alone / left)
        rows = [("scaled", i, x) for i, x in enumerate(expand @ p)] + [("covariance", i, x) for i, x in enumerate((expand @ V @ expand.T).flat)]
        rows += [("residual", i, x) for i, x in enumerate(res)]
        rows += [("chi_square", 0, chi), ("probability", 0, stats.chi2.sf(chi, len(y) - len(p))), ("rise", 0, rise), ("rise_df", 0, fewer)]
        rows += [("rise_probability", 0, stats.chi2.sf(rise, fewer)), ("F", 0, F), ("F_df", 0, left), ("F_probability", 0, stats.f.sf(F, fewer, left))]
        w.writerows([case, q, i, f"{x:.15g}"] for q, i, x in rows)
