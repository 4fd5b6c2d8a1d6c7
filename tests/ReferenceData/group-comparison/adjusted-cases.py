"""Exact cases for the group comparison: invented data from fixed seeds, and what adjusted.py and scipy.stats say of them.

adjusted-cases.py DIR    writes adjusted-data.csv and adjusted-expected.scipy.csv into DIR (python 3.11, numpy 1.24, scipy 1.10)
"""
import csv, sys
import numpy as np
from scipy import stats
from adjusted import adjusted

CASES = [  # name, people a group, distance in hematocrit, sd of hematocrit within groups, u(H), slope, scatter, effect
    ("equal groups", 24, 24, 0.05, 0.030, 0.008, 6.0, 0.10, 0.0),
    ("no error of hematocrit", 24, 24, 0.05, 0.030, 0.0, 6.0, 0.10, 0.05),
    ("unequal groups", 40, 15, -0.03, 0.035, 0.010, 4.0, 0.15, 0.1),
    ("large error", 60, 60, 0.08, 0.030, 0.015, 6.0, 0.10, 0.0),
    ("groups alike in hematocrit", 30, 30, 0.0, 0.030, 0.006, 6.0, 0.08, 0.2),
]

if __name__ == "__main__":
    out = sys.argv[1]
    with open(f"{out}/adjusted-data.csv", "w", newline="") as f, open(f"{out}/adjusted-expected.scipy.csv", "w", newline="") as h:
        data, expected = csv.writer(f, lineterminator="\n"), csv.writer(h, lineterminator="\n")
        data.writerow(["case", "group", "hematocrit_L_per_L", "ln_value"])
        expected.writerow(["case", "hematocrit_u", "difference", "standard_error", "degrees_of_freedom", "slope", "p", "welch_t", "welch_p"])
        for k, (name, nA, nB, dH, sdH, u, b, sd, effect) in enumerate(CASES):
            rng = np.random.default_rng([20261201, k])
            g = np.repeat([0, 1], [nA, nB])
            H = 0.43 + dH * g + rng.normal(0, sdH, nA + nB)
            y = np.round(-4.4 + effect * g + b * (H - 0.43) + rng.normal(0, sd, nA + nB), 6)
            X = np.round(H + rng.normal(0, u, nA + nB), 4)
            data.writerows([name, a, f"{x:.4f}", f"{z:.6f}"] for a, x, z in zip(g, X, y))
            d, se, df, slope = adjusted(g, X, y, u)
            w = stats.ttest_ind(y[g == 1], y[g == 0], equal_var=False)
            expected.writerow([name, u] + [f"{v:.15g}" for v in (d, se, df, slope, 2 * stats.t.sf(abs(d / se), df), w.statistic, w.pvalue)])
