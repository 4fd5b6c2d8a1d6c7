"""Vogel-Fulcher-Tammann through five rows of an oil by least squares in the logarithm. usage: vft_least_squares.py OUT.csv (numpy, scipy)

Rows: 32 mm2/s at 40 degC and 5.4 at 100 degC by ASTM D341 (astm-d341.csv, simple form), density 1000 kg/m3, each known to 0.4 % (k = 2).
Influence: change of ln(viscosity) per change of the logarithm of one row, by refitting with that row raised by 1e-5."""
import csv, sys
import numpy as np
from scipy.optimize import least_squares

t = np.array([20, 25, 37, 60, 80.0]) + 273.15
y = np.log(np.array([86.2778573777, 65.4201497379, 36.4678697471, 15.1858928278, 8.53321469154]) * 1e-3)


def fit(y):
    return least_squares(lambda p: p[0] + p[1] / (t - p[2]) - y, [-9.4, 830, 173.0], x_scale=[1, 100, 100], xtol=1e-15, ftol=1e-15, gtol=1e-15).x


def at(p, x):
    return p[0] + p[1] / (x + 273.15 - p[2])


p = fit(y)
with open(sys.argv[1], "w") as out:
    w = csv.writer(out, lineterminator="\n")
    w.writerow(["t_degC", "viscosity_mPa_s", "per_K", *[f"influence_{int(a - 273.15)}" for a in t], "basis"])
    for x in (22, 30, 50, 70):
        influence = []
        for i in range(len(t)):
            up, down = y.copy(), y.copy()
            up[i] += 1e-5
            down[i] -= 1e-5
            influence.append(f"{(at(fit(up), x) - at(fit(down), x)) / 2e-5:.5f}")
        w.writerow([x, f"{1e3 * np.exp(at(p, x)):.9f}", f"{p[1] / (x + 273.15 - p[2]) ** 2:.10f}", *influence, "computed (scipy least_squares)"])
