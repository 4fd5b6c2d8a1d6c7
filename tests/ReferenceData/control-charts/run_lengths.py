"""Run lengths of control charts by integral equations and Markov chains, not by simulation.

Writes run-lengths.csv (mean number of checks to the first signal, limits known) and false-alarms.csv (share of charts of a
steady instrument with a signal among the next 52 checks, limits known or estimated by mean and s/c4 of n checks).

  EWMA: the density of the statistic is carried from check to check by Gauss-Legendre quadrature between the limits of each check
        (Crowder 1987, Technometrics 29:401-407, has the constant case); for a constant mean the tail is summed by one linear system.
  two of three: states are the last two checks (plain, above 2 sigma, below 2 sigma); Champ and Woodall 1987, Technometrics 29:393-399.
  estimated limits: quadrature over the errors of mean (normal) and scatter (chi-squared), which are independent for normal checks.
"""
import csv
import math
import os
import numpy as np
from numpy.polynomial.hermite_e import hermegauss
from numpy.polynomial.legendre import leggauss
from scipy.special import gammaln
from scipy.stats import chi2, norm

HERE = os.path.dirname(os.path.abspath(__file__))
NODES, WEIGHTS = leggauss(81)


def reach(lam, width, i, growing):
    grown = 1 - (1 - lam) ** (2 * i) if growing else 1
    return width * math.sqrt(lam / (2 - lam) * grown)


def kernel(lam, to, start, mean, sd):
    return norm.pdf((to[:, None] - (1 - lam) * start[None, :]) / lam, mean, sd) / lam


def ewma(lam, width, mean, growing=True, checks=None, sd=1.0, steady_after=None):
    """Survival after each check: mean(i) is the mean of check i = 1, 2, ..."""
    survival = [1.0]
    z, w, f = np.array([0.0]), np.array([1.0]), np.array([1.0])
    i = 0
    while True:
        i += 1
        h = reach(lam, width, i, growing)
        to = h * NODES
        f = kernel(lam, to, z, mean(i), sd) @ (w * f)
        z, w = to, h * WEIGHTS
        survival.append(float(w @ f))
        if checks is not None and i == checks:
            return survival, None
        if steady_after is not None and i == steady_after:
            # E of further checks = 1' (I - K)^-1 f, less the survivor already counted
            k = kernel(lam, z, z, mean(i + 1), sd) * w[None, :]
            return survival, float(w @ np.linalg.solve(np.eye(len(z)) - k, f)) - survival[-1]
        if steady_after is None and survival[-1] < 1e-13:
            return survival, 0.0


def mean_run(survival, tail):
    return sum(survival) + tail


def two_of_three(mean, sd=1.0, with_three=False, checks=None):
    """Survival of the rule 'two of three successive beyond two sigma on one side', with or without the three-sigma rule."""
    survival = [1.0]
    p = {("o", "o"): 1.0}
    i = 0
    while True:
        i += 1
        m = mean(i)
        up3, down3 = norm.sf(3, m, sd), norm.cdf(-3, m, sd)
        up, down = norm.sf(2, m, sd), norm.cdf(-2, m, sd)
        plain = 1 - up - down
        if with_three:
            up, down = up - up3, down - down3
        q = {}
        for (a, b), mass in p.items():
            q[(b, "o")] = q.get((b, "o"), 0) + mass * plain
            if "u" not in (a, b):
                q[(b, "u")] = q.get((b, "u"), 0) + mass * up
            if "d" not in (a, b):
                q[(b, "d")] = q.get((b, "d"), 0) + mass * down
        p = q
        survival.append(sum(p.values()))
        if checks is not None and i == checks:
            return survival
        if checks is None and survival[-1] < 1e-12:
            return survival


def shewhart(mean, sd=1.0, checks=None):
    survival = [1.0]
    i = 0
    while True:
        i += 1
        survival.append(survival[-1] * (norm.cdf(3, mean(i), sd) - norm.cdf(-3, mean(i), sd)))
        if checks is not None and i == checks or checks is None and survival[-1] < 1e-12:
            return survival


def c4(n):
    return math.sqrt(2 / (n - 1)) * math.exp(gammaln(n / 2) - gammaln((n - 1) / 2))


def over_estimates(n, of):
    """Mean over the errors of the estimated mean and scatter; of(mean of a standardised check, its sd)."""
    if n is None:
        return of(0.0, 1.0)
    a, wa = hermegauss(24)
    wa = wa / wa.sum()
    u, wu = leggauss(24)
    u, wu = (u + 1) / 2, wu / 2
    total = 0.0
    for ui, wi in zip(u, wu):
        ratio = math.sqrt(chi2.ppf(ui, n - 1) / (n - 1)) / c4(n)   # estimated over true scatter
        for ai, wj in zip(a, wa):
            total += wi * wj * of(-ai / math.sqrt(n) / ratio, 1 / ratio)
    return total


def constant(m):
    return lambda i: m


def drift(per_check):
    return lambda i: per_check * i


DESIGNS = [(0.4, 3.054), (0.25, 2.998), (0.2, 2.962), (0.1, 2.814), (0.05, 2.615)]
SHIFTS = [0, 0.25, 0.5, 0.75, 1, 1.5, 2, 2.5, 3, 4]
DRIFTS = [0.05, 0.1, 0.2, 0.46, 0.77]

rows = []
for lam, width in DESIGNS:
    for growing in (False, True):
        for shift in SHIFTS:
            s, tail = ewma(lam, width, constant(shift), growing, steady_after=500 if lam < 0.1 else 250)
            rows.append(["EWMA", lam, width, "growing" if growing else "constant", "step", shift, mean_run(s, tail)])
for d in DRIFTS:
    s, tail = ewma(0.2, 2.962, drift(d), True)
    rows.append(["EWMA", 0.2, 2.962, "growing", "drift", d, mean_run(s, tail)])
    rows.append(["beyond limits", "", 3, "constant", "drift", d, sum(shewhart(drift(d)))])
    rows.append(["two of three", "", 2, "constant", "drift", d, sum(two_of_three(drift(d)))])
for shift in (0, 0.5, 1, 1.5, 2, 3):
    p = norm.sf(3 - shift) + norm.cdf(-3 - shift)
    rows.append(["beyond limits", "", 3, "constant", "step", shift, 1 / p])
for shift in (0, 0.5, 1, 1.5, 2):
    rows.append(["two of three", "", 2, "constant", "step", shift, sum(two_of_three(constant(shift)))])
rows.append(["beyond limits or two of three", "", 3, "constant", "step", 0, sum(two_of_three(constant(0), with_three=True))])
with open(os.path.join(HERE, "run-lengths.csv"), "w", newline="") as f:
    out = csv.writer(f, lineterminator="\n")
    out.writerow(["rule", "lambda", "width", "limits", "change", "size", "mean_run_length"])
    out.writerows(rows)

CHECKS = 52
rows = []
for n in (20, 30, 50, 100, None):
    label = "known" if n is None else n
    rows.append(["beyond limits", label, 1 - over_estimates(n, lambda m, s: shewhart(constant(m), s, CHECKS)[-1])])
    rows.append(["two of three", label, 1 - over_estimates(n, lambda m, s: two_of_three(constant(m), s, checks=CHECKS)[-1])])
    rows.append(["EWMA", label, 1 - over_estimates(n, lambda m, s: ewma(0.2, 2.962, constant(m), True, CHECKS, s)[0][-1])])
with open(os.path.join(HERE, "false-alarms.csv"), "w", newline="") as f:
    out = csv.writer(f, lineterminator="\n")
    out.writerow(["rule", "baseline", "share_within_52"])
    out.writerows(rows)
