"""Reference values of the magnetised family, from the equations of its sources, with mpmath at 50 digits.

Shares no code with functions/: run `python3 test/published/magnetised.py > test/published/magnetised.json` to make them
again. Inputs are drawn from a seeded generator over the ranges of the trade and rounded to doubles first.
"""
import json
import random

from mpmath import asin, cos, log, mp, mpf, pi, sin, sqrt

mp.dps = 50
random.seed(20260119)

# CODATA 2022
e = mpf("1.602176634e-19")
m_e = mpf("9.1093837139e-31")
u = mpf("1.66053906892e-27")


def between(low, high):
    """Log-uniform, as the double that the test will use."""
    return low * (high / low) ** random.random()


def row(inputs, value):
    return {"inputs": inputs, "value": mp.nstr(value, 25)}


tables = {name: [] for name in ["gyroradius", "width", "drop", "grazing"]}
for _ in range(60):
    T, Ti, mass, Z, B = between(0.1, 2000), between(0.01, 500), between(1, 240), random.randint(1, 4), between(1e-4, 10)
    M = mpf(mass) * u
    # Grazing, anything between, and close to the normal, in turn.
    angle = random.choice([between(0.05, 5), 90 * random.random(), 90 - between(1e-6, 5)])
    theta = mpf(angle) * pi / 180
    tables["gyroradius"].append(row([T, B, mass, Z], sqrt(e * mpf(T) * M) / (Z * e * mpf(B))))
    u_B = sqrt(e * (Z * mpf(T) + mpf(Ti)) / M)
    tables["width"].append(row([T, mass, Z, B, angle, Ti], sqrt(6) * u_B * M / (Z * e * mpf(B)) * cos(theta)))
    tables["drop"].append(row([T, angle], -mpf(T) * log(sin(theta))))
    ratio = between(0.01, 3)
    tables["grazing"].append(row([mass, Z, ratio], asin(sqrt(2 * pi * m_e / M * (Z + mpf(ratio)))) * 180 / pi))
print(json.dumps(tables, indent=1))
