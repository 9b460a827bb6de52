"""Reference values of the RF family, from the equations of its sources, with mpmath at 50 digits.

Shares no code with functions/: run `python3 test/published/rf.py > test/published/rf.json` to make them again.
Inputs are drawn from a seeded generator over the ranges of the trade and rounded to doubles first.
"""
import json
import random

from mpmath import besseli, cos, log, mp, mpf, pi, quad, sin, sqrt

mp.dps = 50
random.seed(20260113)

# CODATA 2022
e = mpf("1.602176634e-19")
eps0 = mpf("8.8541878188e-12")
u = mpf("1.66053906892e-27")


def between(low, high):
    """Log-uniform, as the double that the test will use."""
    return low * (high / low) ** random.random()


def row(inputs, value):
    return {"inputs": inputs, "value": mp.nstr(value, 25)}


def log_i0(x):
    """ln I0 at any size; far out by the asymptotic series, whose next terms are below 50 digits at x = 1e6."""
    if x < 1:
        return mp.log1p(mp.nsum(lambda k: (x / 2) ** (2 * k) / mp.factorial(k) ** 2, [1, 40], method="direct"))
    if x < 1e6:
        return log(besseli(0, x))
    total = term = mpf(1)
    for k in range(1, 12):
        term *= mpf(2 * k - 1) ** 2 / (8 * k * x)
        total += term
    return x - log(2 * pi * x) / 2 + log(total)


def mean_field(phase):
    """Mean field where the electron edge passes at this phase, over E0/pi: the time average of cos(wt) - cos(phase)."""
    return sin(phase) - phase * cos(phase)


def collisionless():
    """J s^2/(eps0 sqrt(2e/M) V^1.5) from dx = s0 (u/u_B) sin(phase) dphase with ions falling through the mean potential.

    In units of T_e and the Debye length with H = 1: u/u_B = sqrt(2 Phi/T_e), so d sqrt(2 Phi)/dphase = mean_field sin.
    """
    speed = lambda phase: quad(lambda p: mean_field(p) * sin(p), [0, phase])
    width = quad(lambda p: speed(p) * sin(p), [0, pi])  # over H s0, s0 = sqrt(pi H) Debye lengths
    voltage = speed(pi) ** 2 / 2
    return pi * width**2 / (sqrt(2) * voltage ** mpf(1.5))


def collisional():
    """J s^2.5/(eps0 sqrt(2e lambda/M) V^1.5), ions at sqrt(2 e lambda E/(pi M)); all other units cancel."""
    speed = lambda p: sqrt(mean_field(p) / pi)
    width = quad(lambda p: speed(p) * sin(p) / sqrt(pi), [0, 1, 2, pi])
    voltage = quad(lambda p: mean_field(p) / pi * speed(p) * sin(p) / sqrt(pi), [0, 1, 2, pi])
    return width ** mpf(2.5) / voltage ** mpf(1.5)


def fundamental():
    """Amplitude at the drive frequency over the mean of the collisionless sheath's voltage."""
    speed = lambda p: p / 2 - sin(2 * p) / 4 - sin(2 * p) / 8 + p * cos(2 * p) / 4
    voltage = lambda at: quad(lambda p: (cos(at) - cos(p)) * speed(p) * sin(p), [at, pi])
    return 2 * quad(lambda at: voltage(at) * cos(at), [0, pi]) / quad(voltage, [0, pi])


tables = {name: [] for name in ["logBesselI0", "shift", "spread", "child", "childCollisional", "width", "resistance"]}
for k in range(200):
    x = 10 ** (-8 + 16 * k / 199)
    tables["logBesselI0"].append(row([x], log_i0(mpf(x))))
for x in [1, 19.999999999999996, 20, 20.000000000000004, 713, 715, 1e-150, 1e300]:
    tables["logBesselI0"].append(row([x], log_i0(mpf(x))))
for _ in range(100):
    T, V = between(0.1, 100), between(1e-3, 1e5)
    tables["shift"].append(row([V, T], -mpf(T) * log_i0(mpf(V) / mpf(T))))
for _ in range(60):
    mass, Z, V, T, n = between(1, 240), random.randint(1, 4), between(10, 1e4), between(0.5, 20), between(1e14, 1e19)
    s, path, f, V_rf = between(1e-4, 3e-2), between(1e-5, 1e-2), between(1e5, 1e8), between(1, 1e4)
    M = mpf(mass) * u
    spread = 8 * Z * mpf(V_rf) / (3 * 2 * pi * mpf(f) * mpf(s)) * sqrt(2 * Z * e * mpf(V) / M)
    tables["spread"].append(row([V, V_rf, s, f, mass, Z], min(spread, 2 * Z * mpf(V_rf))))
    perveance = eps0 * sqrt(2 * Z * e / M) * mpf(V) ** mpf(1.5)
    tables["child"].append(row([V, s, mass, Z], mpf(200) / 243 * perveance / mpf(s) ** 2))
    debye = sqrt(eps0 * mpf(T) / (e * mpf(n)))
    tables["width"].append(row([V, n, T], sqrt(mpf(50) / 27) * sqrt(mpf(2)) / 3 * debye * (2 * mpf(V) / mpf(T)) ** mpf(0.75)))
    tables["resistance"].append(row([n, T, mass, Z], mpf(T) / (e * mpf(n) * sqrt(Z * e * mpf(T) / M))))
    tables["childCollisional"].append([V, s, mass, Z, path, perveance * sqrt(mpf(path)) / mpf(s) ** mpf(2.5)])

mp.dps = 30
coefficient = collisional()
mp.dps = 20
coefficients = {"collisionless": mp.nstr(collisionless(), 17), "fundamental": mp.nstr(fundamental(), 17)}
mp.dps = 50
coefficients["collisional"] = mp.nstr(coefficient, 25)
tables["childCollisional"] = [row(inputs, coefficient * rest) for *inputs, rest in tables["childCollisional"]]
print(json.dumps({"coefficients": coefficients, "tables": tables}, indent=1))
