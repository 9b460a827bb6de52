"""Reference values of the edge family, from the equations of its sources, with mpmath at 50 digits.

Shares no code with functions/: run `python3 test/published/edge.py > test/published/edge.json` to make them again.
Inputs are drawn from a seeded generator over the ranges of the trade and rounded to doubles first.
"""
import json
import random

from mpmath import exp, mp, mpf, pi, sqrt

mp.dps = 50
random.seed(20260112)

# CODATA 2022
e = mpf("1.602176634e-19")
m_e = mpf("9.1093837139e-31")
k_B = mpf("1.380649e-23")
eps0 = mpf("8.8541878188e-12")
u = mpf("1.66053906892e-27")


def between(low, high):
    """Log-uniform, as the double that the test will use."""
    return low * (high / low) ** random.random()


def row(inputs, value):
    return {"inputs": inputs, "value": mp.nstr(value, 25)}


tables = {name: [] for name in ["debye", "debyeWithIons", "plasma", "path", "bohm", "collisional", "decay", "slab", "cylinder", "drop", "toEdge"]}
for _ in range(60):
    n, T, Ti, mass, Z = between(1e13, 1e21), between(0.1, 200), between(0.01, 50), between(1, 240), random.randint(1, 4)
    M = mpf(mass) * u
    debye = sqrt(eps0 * mpf(T) / (e * mpf(n)))
    tables["debye"].append(row([n, T], debye))
    tables["debyeWithIons"].append(row([n, T, Ti], 1 / sqrt(1 / debye**2 + e * mpf(n) / (eps0 * mpf(Ti)))))
    tables["plasma"].append(row([n, mass, Z], sqrt(mpf(n) * (Z * e) ** 2 / (eps0 * M)) / (2 * pi)))
    p, sigma, Tg = between(1e-3, 1e3), between(1e-20, 1e-17), between(77, 2000)
    tables["path"].append(row([p, sigma, Tg], k_B * mpf(Tg) / (mpf(p) * mpf(sigma))))
    gamma = 1 + 2 * random.random()
    tables["bohm"].append(row([T, mass, Z, Ti, gamma], sqrt(e * (Z * mpf(T) + mpf(gamma) * mpf(Ti)) / M)))
    u_B = sqrt(e * Z * mpf(T) / M)
    path = between(1e-6, 1)
    tables["collisional"].append(row([T, mass, Z, n, path], u_B / sqrt(1 + pi * debye / (2 * mpf(path)))))
    u_0 = float(u_B) * between(1.05, 20)
    tables["decay"].append(row([n, T, mass, Z, u_0], debye / sqrt(1 - (u_B / mpf(u_0)) ** 2)))
    size = between(1e-3, 2)
    tables["slab"].append(row([size, path], mpf("0.86") / sqrt(3 + mpf(size) / (2 * mpf(path)))))
    tables["cylinder"].append(row([size, path], mpf("0.80") / sqrt(4 + mpf(size) / mpf(path))))
    ratio = between(0.05, 0.9)
    tables["drop"].append(row([T, ratio], -mpf(T) * mp.log(mpf(ratio))))
    wall, plasma = -between(10, 1000), between(5, 60)
    cool = between(0.5, 10)  # so that the terms do not cancel
    tables["toEdge"].append(row([wall, plasma, cool, ratio], mpf(wall) - mpf(plasma) - mpf(cool) * mp.log(mpf(ratio))))
print(json.dumps(tables, indent=1))
