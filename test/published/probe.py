"""Reference values of the probe family: closed forms with mpmath at 50 digits, sweeps fitted by scipy, sums by both.

The sweeps are made with numpy's noise and fitted by scipy.optimize.curve_fit, which is told the true noise and window.

Shares no code with functions/: run `python3 test/published/probe.py > test/published/probe.json` to make them again.
Inputs are drawn from a seeded generator over the ranges of the trade and rounded to doubles first.
"""
import json
import random

import numpy as np
from mpmath import log, matrix, mp, mpf, pi, sqrt
from scipy.optimize import curve_fit
from scipy.stats import chi2, norm

mp.dps = 50
random.seed(20260202)

# CODATA 2022
e = mpf("1.602176634e-19")
m_e = mpf("9.1093837139e-31")
u = mpf("1.66053906892e-27")


def between(low, high):
    """Log-uniform, as the double that the test will use."""
    return low * (high / low) ** random.random()


def row(inputs, value):
    return {"inputs": inputs, "value": mp.nstr(value, 25)}


tables = {name: [] for name in ["density", "depth", "orbitalCurrent", "orbitalDensity"]}
for _ in range(60):
    I, area, T = between(1e-9, 1), between(1e-9, 1e-2), between(0.1, 200)
    mass, Z, ratio, gamma = between(1, 240), random.randint(1, 4), between(0.3, 1), between(0.001, 0.3)
    M = mpf(mass) * u
    u_B = sqrt(Z * e * mpf(T) / M)
    tables["density"].append(row([I, area, T, mass, Z, ratio, gamma], mpf(I) / (mpf(ratio) * e * mpf(area) * u_B * (1 + mpf(gamma)))))
    tables["depth"].append(row([mass, Z, ratio], log(sqrt(M / (2 * pi * m_e * Z))) - log(mpf(ratio))))
    V, n, radius, length = between(1, 1e3), between(1e13, 1e17), between(1e-6, 1e-3), between(1e-3, 0.1)
    # Chen's form: area 2πrl, current A n e (√2/π)(eV/M)^(1/2).
    per_density = 2 * pi * mpf(radius) * mpf(length) * e * sqrt(mpf(2)) / pi * sqrt(Z * e * mpf(V) / M)
    tables["orbitalCurrent"].append(row([V, n, radius, length, mass, Z], mpf(n) * per_density))
    tables["orbitalDensity"].append(row([I, V, radius, length, mass, Z], mpf(I) / per_density))

rng = np.random.default_rng(20260203)
E, M_E, U = float(e), float(m_e), float(u)
tables["sweeps"] = []
for _ in range(15):
    T, V_p, n, mass, area = rng.uniform(1, 8), rng.uniform(5, 40), 10 ** rng.uniform(15, 18), rng.choice([4.0026, 39.948, 131.29]), 1e-5
    saturation = 0.25 * area * E * n * np.sqrt(8 * E * T / (np.pi * M_E))
    ions = area * E * n * np.exp(-0.5) * np.sqrt(E * T / (mass * U))
    start, step, count = round(V_p - 18 * T, 2), round(0.12 * T, 3), 200
    V = start + step * np.arange(count)
    exact = saturation * np.exp(np.minimum(0, V - V_p) / T) - ions * (V < V_p)
    sigma = np.hypot(3e-4 * saturation, 5e-3 * exact)
    I = np.array([float(f"{each:.6g}") for each in exact + sigma * rng.standard_normal(count)])
    use = V < V_p - 0.5 * T

    def model(V, V_f, T, ions, slope):
        return ions * (np.exp((V - V_f) / T) - 1) + slope * (V - V_f)

    V_f = V_p - T * np.log(saturation / ions)
    found, covariance = curve_fit(model, V[use], I[use], p0=[V_f, T, ions, 0], sigma=sigma[use], absolute_sigma=True)
    errors = np.sqrt(np.diag(covariance))
    tables["sweeps"].append({"start": start, "step": step, "I": I.tolist(), "fit": found[:3].tolist(), "errors": errors[:3].tolist()})

# scipy.stats
tables["chiSquare"] = [[x * nu, nu, float(chi2.sf(x * nu, nu))] for nu in (1, 2, 5, 12, 30) for x in (0.2, 0.7, 1, 1.5, 2.5)]
tables["normal"] = [[z, float(norm.sf(z))] for z in (-3, -1, 0, 0.5, 1.96, 3.1, 5)]

# mpmath: (XᵀWX)⁻¹ and (XᵀWX)⁻¹XᵀWy
tables["leastSquares"] = []
for _ in range(6):
    rows = [[1.0, x := 20 * random.random(), float(mp.exp(-x / 3))] for _ in range(12)]
    y, w = [random.gauss(0, 1) for _ in rows], [between(0.1, 10) for _ in rows]
    normal, right = matrix(3, 3), matrix(3, 1)
    for row_, y_, w_ in zip(rows, y, w):
        for j in range(3):
            right[j] += mpf(w_) * mpf(row_[j]) * mpf(y_)
            for k in range(3):
                normal[j, k] += mpf(w_) * mpf(row_[j]) * mpf(row_[k])
    inverse = normal**-1
    solution = inverse * right
    tables["leastSquares"].append(
        {"rows": rows, "y": y, "w": w, "solution": [float(s) for s in solution], "covariance": [float(inverse[j, k]) for j in range(3) for k in range(3)]}
    )
print(json.dumps(tables, indent=1))
