"""Reference values of the layer family, from the equations of its sources, with mpmath at 50 digits and more.

Shares no code with functions/: run `python3 test/published/layer.py > test/published/layer.json` to make them again.
Inputs are drawn from a seeded generator over the ranges of the trade and rounded to doubles first. Distances in the
nonlinear sheath are tanh-sinh quadratures of the first integral as it stands on paper; it loses 40 digits to
cancellation near the edge, so it is taken at 100.
"""
import json
import random

from mpmath import exp, findroot, log, mp, mpf, pi, quad, sqrt

mp.dps = 50
random.seed(20260131)

# CODATA 2022
e = mpf("1.602176634e-19")
eps0 = mpf("8.8541878188e-12")
u = mpf("1.66053906892e-27")


def between(low, high):
    """Log-uniform, as the double that the test will use."""
    return low * (high / low) ** random.random()


def row(inputs, value):
    return {"inputs": inputs, "value": mp.nstr(value, 25)}


def debye(n, T):
    return sqrt(eps0 * mpf(T) / (e * mpf(n)))


def net_charge(eta, mu):
    with mp.workdps(100):
        return 1 / sqrt(1 + 2 * eta / mu**2) - exp(-eta)


def field(eta, mu):
    with mp.workdps(100):
        return sqrt(2 * (mu**2 * (sqrt(1 + 2 * eta / mu**2) - 1) + exp(-eta) - 1))


def distance(low, high, mu):
    """The integral of d eta over the field, in the logarithm of eta, cut so that each piece is smooth."""
    a, b = log(mpf(low)), log(mpf(high))
    pieces = int((b - a) / 2) + 2
    return quad(lambda v: exp(v) / field(exp(v), mu), [a + (b - a) * k / pieces for k in range(pieces + 1)])


end = findroot(lambda eta: net_charge(eta, mpf(1)) - mpf("0.01"), mpf("0.113"))

names = "field charge child matrix collisional full wallField potential current collisionalCurrent width collisionalWidth"
tables = {name: [] for name in (names + " transit capacitance pulsed impact").split()}

for mu in [1.0, 1 + 1e-12, 1 + 1e-7, 1.001, 1.2, 1.3160740129524924, 2.0, 3.0, 100.0]:
    for eta in [1e-10, 3e-8, 1e-5, 0.003, 0.08, 0.4, 1.0, 1.99, 2.01, 5.0, 30.0, 37.9, 38.1, 300.0, 1e5]:
        tables["field"].append(row([eta, mu], field(mpf(eta), mpf(mu))))
        tables["charge"].append(row([eta, mu], net_charge(mpf(eta), mpf(mu))))

for _ in range(60):
    V, n, T = between(1, 1e5), between(1e13, 1e20), between(0.3, 60)
    mass, Z, s, path, J = between(1, 240), random.randint(1, 4), between(1e-5, 0.1), between(1e-6, 0.1), between(0.01, 1e4)
    M = mpf(mass) * u
    v, lam, eta = mpf(V), debye(n, T), mpf(V) / mpf(T)
    free, mobile = mpf(4) / 9 * eps0 * sqrt(2 * Z * e / M), mpf(2) / 3 * (mpf(5) / 3) ** 1.5 * eps0 * sqrt(2 * Z * e * mpf(path) / (pi * M))
    child = sqrt(mpf(2)) / 3 * lam * (2 * eta) ** mpf(0.75)
    tables["child"].append(row([V, n, T], child))
    tables["matrix"].append(row([V, n, T], lam * sqrt(2 * eta)))
    drift = mpf(2) / 3 * (mpf(5) / 3) ** 1.5 * eps0 / (e * mpf(n)) * sqrt(2 * mpf(path) / (pi * mpf(T))) * v ** 1.5
    tables["collisional"].append(row([V, n, T, path], drift ** (mpf(2) / 5)))
    tables["current"].append(row([V, s, mass, Z], free * v**1.5 / mpf(s) ** 2))
    tables["collisionalCurrent"].append(row([V, s, mass, Z, path], mobile * v**1.5 / mpf(s) ** 2.5))
    tables["width"].append(row([V, J, mass, Z], sqrt(free * v**1.5 / mpf(J))))
    tables["collisionalWidth"].append(row([V, J, mass, Z, path], (mobile * v**1.5 / mpf(J)) ** (mpf(2) / 5)))
    tables["transit"].append(row([V, s, mass, Z], 3 * mpf(s) * sqrt(M / (2 * Z * e * v))))
    t = between(1e-9, 1e-3)
    omega = sqrt(Z * e**2 * mpf(n) / (eps0 * M))
    matrix = lam * sqrt(2 * eta)
    grown = matrix * (1 + mpf(2) / 3 * omega * mpf(t)) ** (mpf(1) / 3)
    tables["pulsed"].append(row([V, n, T, mass, Z, t], max(matrix, min(grown, child))))

for k in range(61):
    n, T = between(1e13, 1e20), between(0.3, 60)
    ratio = 0.12 * (1e5 / 0.12) ** (k / 60)
    V = ratio * T
    eta = mpf(V) / mpf(T)
    tables["full"].append(row([V, n, T], debye(n, T) * distance(end, eta, mpf(1))))
    for mu in [1.0, 1 + 1e-6, 1 + 2 * random.random(), 3.0]:
        scale = mpf(T) / debye(n, T)
        tables["wallField"].append(row([V, n, T, mu], scale * field(eta, mpf(mu))))
        slope = eps0 / debye(n, T) * net_charge(eta, mpf(mu)) / field(eta, mpf(mu))
        tables["capacitance"].append(row([V, n, T, mu], slope))
        # A drop somewhere between the wall and far out in the edge's tail, and its distance rounded to a double: the
        # drop there follows to second order, and the rest is beyond 25 digits.
        drop = eta * mpf(10) ** (-7 * random.random() ** 2)
        x = debye(n, T) * distance(drop, eta, mpf(mu))
        moved = mpf(float(x)) - x
        drop -= moved / debye(n, T) * field(drop, mpf(mu)) - (moved / debye(n, T)) ** 2 / 2 * net_charge(drop, mpf(mu))
        tables["potential"].append(row([float(x), V, n, T, mu], -mpf(T) * drop))

for a in [0.01, 0.7, 3.0, 40.0]:
    for low, high in [(0, 0.02), (0.5, 0.52), (0.98, 1)]:
        density = quad(lambda E: a / 2 / sqrt(1 - E) * exp(-a * (1 - sqrt(1 - E))), [mpf(low), mpf(high)]) / (mpf(high) - mpf(low))
        tables["impact"].append(row([a, low, high], density))

print(json.dumps({"end": mp.nstr(end, 25), **tables}, indent=1))
