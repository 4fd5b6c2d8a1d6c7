"""Check points of concentric cylinders, inner one driven. 50-digit mpmath.  usage: concentric_cylinders.py > concentric-cylinders.csv"""
import csv, sys
import mpmath as mp
mp.mp.dps = 50; F = mp.mpf; pi = mp.pi
w = csv.writer(sys.stdout, lineterminator="\n"); w.writerow(["group", "inputs", "quantity", "value", "unit", "basis"])
def n(v, d=14): return mp.nstr(v, d)
def add(g, inp, q, v, u=""): w.writerow([g, inp, q, n(v), u, "computed (mpmath)"])
for lab, Ri, Re, L, CL in (("ISO 3219 ratio 1.0847, R_i=12.5 mm", "0.0125", F("0.0125") * F("1.0847"), "0.0375", "1.10"), ("wide gap R_i=10 mm R_e=15 mm", "0.010", "0.015", "0.030", "1"), ("narrow gap R_i=20 mm R_e=20.5 mm", "0.020", "0.0205", "0.060", "1")):
    Ri, Re, L, CL = map(F, (Ri, Re, L, CL)); d = Re / Ri; k = Ri / Re
    for Om, eta in (("10", "0.004"), ("50", "0.0035")):
        Om, eta = F(Om), F(eta); t = f"{lab}; L={n(L)} m; speed={n(Om)} rad/s; eta={n(eta)} Pa s; C_L={n(CL)}"
        M = 4 * pi * eta * L * Om * Ri ** 2 * Re ** 2 / (Re ** 2 - Ri ** 2) * CL
        add("concentric cylinders", t, "torque with end factor", M, "N m")
        add("concentric cylinders", t, "shear rate at inner wall, Newtonian 2*Om*Re^2/(Re^2-Ri^2)", 2 * Om * Re ** 2 / (Re ** 2 - Ri ** 2), "1/s")
        add("concentric cylinders", t, "shear rate at outer wall, Newtonian 2*Om*Ri^2/(Re^2-Ri^2)", 2 * Om * Ri ** 2 / (Re ** 2 - Ri ** 2), "1/s")
        add("concentric cylinders", t, "narrow-gap shear rate Om*Ri/(Re-Ri)", Om * Ri / (Re - Ri), "1/s")
        add("concentric cylinders", t, "representative shear rate Om*(1+d^2)/(d^2-1)", Om * (1 + d * d) / (d * d - 1), "1/s")
        add("concentric cylinders", t, "stress at inner wall M/(2 pi L Ri^2 C_L)", M / (2 * pi * L * Ri ** 2 * CL), "Pa")
        add("concentric cylinders", t, "representative stress (1+d^2)/(2 d^2) * inner-wall stress", (1 + d * d) / (2 * d * d) * M / (2 * pi * L * Ri ** 2 * CL), "Pa")
    for nn in ("0.6", "0.8", "1.2"): add("concentric cylinders, power law", f"{lab}; speed=10 rad/s; n={nn}", "shear rate at inner wall (2 Om/n)/(1-k^(2/n))", 2 * F(10) / F(nn) / (1 - k ** (2 / F(nn))), "1/s")
