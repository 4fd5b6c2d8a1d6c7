"""Critical Reynolds number of Taylor vortices. usage: taylor_couette.py OUT.csv (numpy, scipy)

Axisymmetric stationary onset, inner cylinder turning, outer at rest; linear stability by Chebyshev collocation on the gap,
Reynolds number = speed * inner radius * gap / kinematic viscosity, least over the axial wavenumber."""
import csv, sys
import numpy as np
from scipy.linalg import eig
from scipy.optimize import minimize_scalar


def chebyshev(order):
    x = np.cos(np.pi * np.arange(order + 1) / order)
    c = np.hstack([2, np.ones(order - 1), 2]) * (-1) ** np.arange(order + 1)
    spread = np.tile(x, (order + 1, 1)).T
    d = np.outer(c, 1 / c) / (spread - spread.T + np.eye(order + 1))
    return d - np.diag(d.sum(axis=1)), x


def critical(ratio, order=48):
    d, x = chebyshev(order)
    size = order + 1
    inner = ratio / (1 - ratio)
    r = inner + (x + 1) / 2
    d = 2 * d
    one = np.eye(size)
    laplace = d @ (d + np.diag(1 / r))
    a = -ratio / (1 + ratio)
    b = ratio / ((1 - ratio) * (1 - ratio**2))
    flow = a * r + b / r

    def least(k):
        lk = laplace - k * k * one
        left = np.zeros((2 * size, 2 * size))
        right = np.zeros_like(left)
        left[:size, :size] = lk @ lk
        right[:size, size:] = 2 * k * k * np.diag(flow / r)
        left[size:, size:] = lk
        right[size:, :size] = 2 * a * one
        for i in (0, order):
            for row, at in ((i, i), (size + i, size + i)):
                left[row] = 0
                right[row] = 0
                left[row, at] = 1
        for i, j in ((1, 0), (order - 1, order)):
            left[i] = 0
            right[i] = 0
            left[i, :size] = d[j]
        w = eig(left, right, right=False)
        w = w[np.isfinite(w)]
        w = w.real[(abs(w.imag) < 1e-6 * abs(w)) & (w.real > 1) & (w.real < 1e5)]
        return w.min()

    return minimize_scalar(least, bounds=(2.5, 4.0), method="bounded", options=dict(xatol=1e-4)).fun


with open(sys.argv[1], "w") as out:
    w = csv.writer(out, lineterminator="\n")
    w.writerow(["radius_ratio", "critical_reynolds", "basis"])
    for ratio in (0.5, 0.55, 0.6, 0.65, 0.7, 0.725, 0.75, 0.775, 0.8, 0.825, 0.85, 0.875, 0.9, 0.91, 1 / 1.0847, 0.935, 0.95, 0.9625, 0.975, 0.985, 0.9925):
        w.writerow([f"{ratio:.12g}", f"{critical(ratio):.5f}", "computed (numpy/scipy collocation)"])
