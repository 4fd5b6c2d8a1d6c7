"""Viscosity of water at 0.1 MPa by IAPWS SR6-08(2011), equation 7, and its temperature coefficient. 50-digit mpmath.  usage: water.py > water-coefficient.csv"""
import mpmath as mp
mp.mp.dps = 50; F = mp.mpf
A = (("280.68", "-1.9"), ("511.45", "-7.7"), ("61.131", "-19.6"), ("0.45903", "-40"))
def mu(T): return sum(F(a) * (F(T) / 300) ** F(b) for a, b in A)  # uPa s
print("T_K,viscosity_uPa_s,per_K,basis")
for T in ("253.15", "260", "273.15", "293.15", "298.15", "300", "310.15", "313.15", "333.15", "375", "383.15"):
    print(f"{T},{mp.nstr(mu(T), 14)},{mp.nstr(-mp.diff(lambda t: mp.log(mu(t)), F(T)), 12)},computed (mpmath numerical derivative)")
