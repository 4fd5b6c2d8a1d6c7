"""Invented torques of empty gaps (N.m) and what SciPy says of them. Run: python3 blank_runs.py"""
import csv
import numpy as np
from scipy import stats

random = np.random.default_rng(4)
SPEEDS = [0.5, 2.0, 8.0]


def run(zeros, noises, drift=0.0):
    rows, time = [], 0
    for speed, zero, noise in zip(SPEEDS, zeros, noises):
        for _ in range(8):
            time += 10
            rows.append((speed, time, round(zero + drift * time + noise * random.standard_normal(), 12)))
    return rows


RUNS = {
    "plain": run([2e-9] * 3, [4e-9] * 3),
    "zero": run([-5e-9, 0, 9e-9], [4e-9] * 3),
    "noise": run([0] * 3, [1e-9, 4e-9, 12e-9]),
    "drift": run([0] * 3, [2e-9] * 3, 1e-10),
}


def line(groups):
    """Common slope over groups with means of their own, and its two-sided p."""
    time = np.concatenate([[t for _, t, _ in g] for g in groups]).astype(float)
    torque = np.concatenate([[y for _, _, y in g] for g in groups])
    design = np.column_stack([np.repeat(np.eye(len(groups)), [len(g) for g in groups], axis=0), time])
    coefficients, *_ = np.linalg.lstsq(design, torque * 1e9, rcond=None)
    residual = torque * 1e9 - design @ coefficients
    df = len(torque) - design.shape[1]
    error = np.sqrt(residual @ residual / df * np.linalg.inv(design.T @ design)[-1, -1])
    return coefficients[-1] * 1e-9 * (time.max() - time.min()), 2 * stats.t.sf(abs(coefficients[-1] / error), df)


with open("torques.csv", "w", newline="") as file:
    writer = csv.writer(file, lineterminator="\n")
    writer.writerow(["run", "speed", "time", "torque"])
    for name, rows in RUNS.items():
        writer.writerows([name, *row] for row in rows)

with open("expected.csv", "w", newline="") as file:
    writer = csv.writer(file, lineterminator="\n")
    writer.writerow(["run", "mean", "deviation", "p_zero", "p_noise", "change", "p_change", "change_by_speed", "p_change_by_speed"])
    for name, rows in RUNS.items():
        groups = [[r for r in rows if r[0] == speed] for speed in SPEEDS]
        values = [np.array([y for _, _, y in g]) * 1e9 for g in groups]
        everything = np.concatenate(values)
        numbers = [everything.mean() * 1e-9, everything.std(ddof=1) * 1e-9, stats.f_oneway(*values).pvalue, stats.bartlett(*values).pvalue, *line([rows]), *line(groups)]
        writer.writerow([name, *(repr(float(x)) for x in numbers)])
