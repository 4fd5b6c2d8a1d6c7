"""Michaelis-Menten on ../law-comparison/puromycin.csv in 40 digits, by mpmath. Writes puromycin.mpmath.csv beside itself; quantities as in puromycin.r.csv."""
import csv, os
import mpmath as mp

mp.mp.dps = 40
HERE = os.path.dirname(os.path.abspath(__file__))
with open(f"{HERE}/../law-comparison/puromycin.csv") as f:
    DATA = [(mp.mpf(row["conc"]), mp.mpf(row["rate"])) for row in csv.DictReader(f)]
DF = len(DATA) - 2


def fit(weights):
    v, k = mp.mpf(212), mp.mpf("0.064")
    for _ in range(200):
        a, b = mp.matrix(2, 2), mp.matrix(2, 1)
        for (c, y), w in zip(DATA, weights):
            slopes = [c / (k + c), -v * c / (k + c) ** 2]
            for i in range(2):
                b[i] += w * slopes[i] * (y - v * c / (k + c))
                for j in range(2):
                    a[i, j] += w * slopes[i] * slopes[j]
        step = mp.lu_solve(a, b)
        v, k = v + step[0], k + step[1]
    return v, k, sum(w * (y - v * c / (k + c)) ** 2 for (c, y), w in zip(DATA, weights)), a ** -1


def quantile(df, p):
    tail = lambda t: mp.betainc(mp.mpf(df) / 2, mp.mpf(1) / 2, 0, df / (df + t * t), regularized=True) / 2
    return mp.findroot(lambda t: tail(t) - (1 - p), 2.2)


def best_v(k):
    x = [c / (k + c) for c, _ in DATA]
    return sum(xi * y for xi, (_, y) in zip(x, DATA)) / sum(xi * xi for xi in x)


def least_at_k(k):
    v = best_v(k)
    return sum((y - v * c / (k + c)) ** 2 for c, y in DATA)


def least_at_v(v):
    slope = lambda k: sum((y - v * c / (k + c)) * v * c / (k + c) ** 2 for c, y in DATA)
    k = mp.findroot(slope, (mp.mpf("0.02"), mp.mpf("0.2")), solver="anderson", maxsteps=200)
    return sum((y - v * c / (k + c)) ** 2 for c, y in DATA)


v, k, rss, a = fit([mp.mpf(1)] * len(DATA))
s2 = rss / DF
t = quantile(DF, mp.mpf("0.975"))
se = [mp.sqrt(s2 * a[i, i]) for i in range(2)]
rows = [("Vm", v), ("K", k), ("se Vm", se[0]), ("se K", se[1]), ("correlation", a[0, 1] / mp.sqrt(a[0, 0] * a[1, 1])), ("residual sum of squares", rss), ("residual sd", mp.sqrt(s2)), ("df", DF)]
for name, x, s in (("Vm", v, se[0]), ("K", k, se[1])):
    rows += [(f"{name} Wald 95 % low", x - t * s), (f"{name} Wald 95 % high", x + t * s)]
for side, sign in (("low", -1), ("high", 1)):
    rows.append((f"Vm profile 95 % {side}", mp.findroot(lambda x: (least_at_v(x) - rss) / s2 - t * t, (v + sign * se[0], v + sign * 4 * se[0]), solver="anderson", maxsteps=200)))
    rows.append((f"K profile 95 % {side}", mp.findroot(lambda x: (least_at_k(x) - rss) / s2 - t * t, (k + sign * se[1], k + sign * 4 * se[1]), solver="anderson", maxsteps=200)))
c = mp.mpf("0.1")
g = [c / (k + c), -v * c / (k + c) ** 2]
rows += [("rate at concentration 0.1", v * c / (k + c)), ("delta-method se of rate at concentration 0.1", mp.sqrt(s2 * sum(g[i] * a[i, j] * g[j] for i in range(2) for j in range(2))))]
v, k, rss, a = fit([1 / y for _, y in DATA])
rows += [(f"weights 1/rate: {name}", x) for name, x in (("Vm", v), ("K", k), ("WSS", rss))]
for i, name in enumerate(("Vm", "K")):
    rows += [(f"weights 1/rate: se {name} scale estimated", mp.sqrt(rss / DF * a[i, i])), (f"weights 1/rate: se {name} scale known", mp.sqrt(a[i, i]))]
with open(f"{HERE}/puromycin.mpmath.csv", "w", newline="") as f:
    w = csv.writer(f, lineterminator="\n")
    w.writerow(["quantity", "value"])
    w.writerows((name, mp.nstr(mp.mpf(value), 17)) for name, value in rows)
