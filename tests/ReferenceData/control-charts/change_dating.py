"""A step and a drift in an invented series of checks, dated by plain least squares for every moment looked at.

Writes series.csv (an invented series: 28 steady checks, then a drift) and change-dating.csv. Moments: middles of the gaps for a step;
eight moments in each gap for a drift. The interval takes moments by Suu^(-1/2) RSS^(-(n-2)/2) until they hold 95 % of the whole.
"""
import csv
import os
import numpy as np

HERE = os.path.dirname(os.path.abspath(__file__))
random = np.random.default_rng(20261201)
days = np.cumsum(np.concatenate([[0], random.choice([6.0, 7.0, 7.0, 8.0, 14.0], 39)]))
errors = np.round(0.004 + 0.005 * random.standard_normal(40) + 0.0003 * np.maximum(0, days - days[27] - 2), 6)
SIGNAL = 34

with open(os.path.join(HERE, "series.csv"), "w", newline="") as f:
    out = csv.writer(f, lineterminator="\n")
    out.writerow(["day", "error"])
    out.writerows(zip(days.tolist(), errors.tolist()))


def fitted(u):
    a = np.column_stack([np.ones_like(u), u])
    beta, *_ = np.linalg.lstsq(a, errors, rcond=None)
    rss = float(np.sum((errors - a @ beta) ** 2))
    suu = float(np.sum((u - u.mean()) ** 2))
    return beta[1], rss, suu


n = len(days)
rows = []
for shape in ("step", "drift"):
    moments = []
    for k in range(1, SIGNAL + 1):
        gap = days[k] - days[k - 1]
        if shape == "step":
            moments.append((days[k] - gap / 2, gap, *fitted((np.arange(n) >= k).astype(float))))
        else:
            for i in range(8):
                onset = days[k - 1] + gap * (i + 0.5) / 8
                moments.append((onset, gap / 8, *fitted(np.maximum(0, days - onset))))
    best = min(moments, key=lambda m: m[3])
    log_weight = np.array([-0.5 * np.log(m[4]) - (n - 2) / 2 * np.log(m[3]) for m in moments])
    mass = np.array([m[1] for m in moments]) * np.exp(log_weight - log_weight.max())
    held, ends = 0.0, []
    for j in np.argsort(-log_weight):
        if held >= 0.95 * mass.sum():
            break
        held += mass[j]
        ends += [moments[j][0] - moments[j][1] / 2, moments[j][0] + moments[j][1] / 2]
    unit = 1 if shape == "step" else 30.4375
    rows.append([shape, best[0], min(ends), max(ends), best[2] * unit, np.sqrt(best[3] / (n - 3) / best[4]) * unit, -n / 2 * np.log(best[3])])

with open(os.path.join(HERE, "change-dating.csv"), "w", newline="") as f:
    out = csv.writer(f, lineterminator="\n")
    out.writerow(["shape", "most_likely", "earliest", "latest", "size", "uncertainty", "log_likelihood"])
    out.writerows([[r[0]] + [float(v) for v in r[1:]] for r in rows])
