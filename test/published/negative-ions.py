"""Reference values of the negative-ion family, from the equations of Boyd & Thompson 1959, with mpmath at 50 digits.

Shares no code with functions/: run `python3 test/published/negative-ions.py > test/published/negative-ions.json` to make
them again. Inputs are drawn from a seeded generator and rounded to doubles first. The edges are found by a scan of the
whole map for changes of sign and bisection to 50 digits, without using where its folds are; the folds by root finding on
its derivative.
"""
import json
import random

from mpmath import diff, exp, findroot, log, mp, mpf, pi, sqrt

mp.dps = 50
random.seed(20260114)

# CODATA 2022
e = mpf("1.602176634e-19")
m_e = mpf("9.1093837139e-31")
u = mpf("1.66053906892e-27")


def between(low, high):
    """Log-uniform, as the double that the test will use."""
    return low * (high / low) ** random.random()


def row(inputs, value):
    return {"inputs": inputs, "value": mp.nstr(value, 25)}


def log_body(t, gamma):
    """ln alpha_b of the body whose edge has ln alpha_s = t."""
    alpha = exp(t)
    return t + (1 + alpha) * (gamma - 1) / (2 * (1 + alpha * gamma))


def slope(t, gamma):
    """d ln alpha_b/d ln alpha_s: 1/slope is the condition of the edge."""
    alpha = exp(t)
    return 1 - alpha * (gamma - 1) ** 2 / (2 * (1 + alpha * gamma) ** 2)


def bisect(f, a, b):
    fa = f(a)
    for _ in range(170):
        middle = (a + b) / 2
        fm = f(middle)
        a, b, fa = (middle, b, fm) if (fm < 0) == (fa < 0) else (a, middle, fa)
    return (a + b) / 2


def folds(gamma):
    """ln alpha_s where the map turns back, by a scan of its slope: none or two."""
    f = lambda t: slope(t, gamma)
    grid = [-40 + mpf(80) * k / 8000 for k in range(8001)]
    return [bisect(f, a, b) for a, b in zip(grid, grid[1:]) if (f(a) < 0) != (f(b) < 0)]


def edges(alpha_b, gamma):
    """Every alpha_s, found between the points of a fine grid; a turning point between two points is looked at apart."""
    target = log(mpf(alpha_b))
    f = lambda t: log_body(t, mpf(gamma)) - target
    reach = abs(mpf(gamma) - 1) / min(mpf(1), mpf(gamma)) / 2 + 1
    grid = sorted([target - reach + 2 * reach * k / 400 for k in range(401)] + folds(mpf(gamma)))
    roots = [bisect(f, a, b) for a, b in zip(grid, grid[1:]) if (f(a) < 0) != (f(b) < 0)]
    return [{"alpha_s": mp.nstr(exp(t), 25), "slope": mp.nstr(slope(t, mpf(gamma)), 6)} for t in roots]


tables = {name: [] for name in ["bohm", "flux", "potential", "drop"]}
for _ in range(60):
    mass, Z, T, n = between(1, 240), random.randint(1, 4), between(0.5, 20), between(1e14, 1e19)
    alpha, gamma = between(1e-4, 50), between(1, 200)
    a, g = mpf(alpha), mpf(gamma)
    speed = sqrt(Z * e * mpf(T) * (1 + a) / (mpf(mass) * u * (1 + a * g)))
    tables["bohm"].append(row([T, mass, Z, alpha, gamma], speed))
    tables["flux"].append(row([n, T, mass, Z, alpha, gamma], mpf(n) * (1 + a) * speed / Z))
    mean = sqrt(8 * e * mpf(T) / (pi * m_e))
    tables["potential"].append(row([T, mass, Z, alpha, gamma], -mpf(T) * log(mean / (4 * (1 + a) * speed))))
    tables["drop"].append(row([alpha, gamma], log(exp((1 + a) / (2 * (1 + a * g))))))

cases = []
for _ in range(80):
    gamma = between(1.01, 300)
    cases.append((between(1e-6, 1e3), gamma))
for _ in range(10):
    cases.append((between(1e-2, 1e2), between(0.005, 0.99)))
# Between the folds, and as close to one as the distance says, on either side: there two edges nearly meet.
for gamma in [9.899, 9.9, 10.0, 12.0, 20.0, 50.0, 120.0, 0.08]:
    low, high = folds(mpf(gamma))
    top, bottom = log_body(low, mpf(gamma)), log_body(high, mpf(gamma))
    cases.append((float(exp((top + bottom) / 2)), gamma))
    for distance in [1e-2, 1e-4, 1e-6, 1e-9, 1e-12]:
        for turn in [top, bottom]:
            for sign in [-1, 1]:
                alpha_b = float(exp(turn) * (1 + sign * distance))
                cases.append((alpha_b, gamma))
edge_table = [{"alpha_b": alpha_b, "gamma": gamma, "edges": edges(alpha_b, gamma)} for alpha_b, gamma in cases]

fold_table = []
for gamma in [10.0, 20.0, 9.899, 100.0, 0.05]:
    low, high = folds(mpf(gamma))
    fold_table.append(
        {
            "gamma": gamma,
            "alpha_s": [mp.nstr(exp(t), 25) for t in (low, high)],
            "alpha_b": [mp.nstr(exp(log_body(t, mpf(gamma))), 25) for t in (low, high)],
        }
    )

# The cusp: slope and its derivative vanish together.
t, gamma = findroot(
    [lambda t, g: slope(t, g), lambda t, g: diff(lambda s: slope(s, g), t)], (mpf("-2.29"), mpf("9.9"))
)
cusp = {
    "gamma": mp.nstr(gamma, 25),
    "alpha_s": mp.nstr(exp(t), 25),
    "alpha_b": mp.nstr(exp(log_body(t, gamma)), 25),
}
print(json.dumps({"tables": tables, "edges": edge_table, "folds": fold_table, "cusp": cusp}, indent=1))
