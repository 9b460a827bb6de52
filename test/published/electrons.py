"""Reference values of the electron family, from the equations of its sources, with mpmath at 50 digits.

Shares no code with functions/: run `python3 test/published/electrons.py > test/published/electrons.json` to make them
again. Inputs are drawn from a seeded generator over the ranges of the trade and rounded to doubles first.

"eepf" holds functions that are exponential from one energy to the next, and so are their ends: what a table of them
says of its integrals is then known exactly, by incomplete gamma functions, and so is where a wall floats.
"""
import json
import random

from mpmath import exp, findroot, gammainc, log, mp, mpf, pi, quad, sqrt

mp.dps = 50
random.seed(20260126)

# CODATA 2022
e = mpf("1.602176634e-19")
m_e = mpf("9.1093837139e-31")
u = mpf("1.66053906892e-27")


def between(low, high):
    """Log-uniform, as the double that the test will use."""
    return low * (high / low) ** random.random()


def row(inputs, value):
    return {"inputs": inputs, "value": mp.nstr(value, 25)}


def bisect(f, low, high):
    """The zero of a falling function, to all digits."""
    low, high = mpf(low), mpf(high)
    for _ in range(180):
        middle = (low + high) / 2
        low, high = (middle, high) if f(middle) > 0 else (low, middle)
    return (low + high) / 2


tables = {"hot": [], "eepf": [], "straight": []}

for _ in range(80):
    cold, hot, share = between(0.2, 20), between(0.5, 2000), random.choice([random.random(), between(1e-9, 0.2)])
    mass, Z = between(1, 240), random.randint(1, 3)
    M, f = mpf(mass) * u, mpf(share)
    screening = 1 / ((1 - f) / mpf(cold) + f / mpf(hot))
    u_B = sqrt(Z * e * screening / M)

    def net(size):
        electrons = 0
        for part, T in ((1 - f, mpf(cold)), (f, mpf(hot))):
            electrons += part * sqrt(8 * e * T / (pi * m_e)) / 4 * exp(-size / T)
        return electrons - u_B

    tables["hot"].append(row([cold, hot, share, mass, Z], -bisect(net, 0, 60 * max(cold, hot))))


def exponential_integral(p, a, b, F_a, beta):
    """∫ E^p F_a exp(−beta (E − a)) dE from a to b (None: to infinity)."""
    p, s = mpf(p), mpf(p) + 1
    upper = 0 if b is None else gammainc(s, beta * b)
    return F_a * exp(beta * a) * (gammainc(s, beta * a) - upper) / beta**s


for _ in range(12):
    T, n = between(1, 8), between(1e13, 1e17)
    points = random.randint(70, 110)
    energy, logs = [random.uniform(0.05, 0.3) * T], [0.0]
    beta = 1 / T
    for k in range(1, points):
        step = T * random.uniform(0.15, 0.3)
        # The ends are one exponential each, as their continuations will be.
        if 8 < k < points - 25:
            beta = (1 + 0.03 * (2 * random.random() - 1)) / T
        elif k == points - 25:
            beta = random.uniform(0.95, 1.05) / T
        energy.append(energy[-1] + step)
        logs.append(logs[-1] - beta * step)
    F = [n / T**1.5 * float(exp(mpf(each))) for each in logs]
    E = [mpf(each) for each in energy]
    G = [mpf(each) for each in F]
    pieces = [(E[k], E[k + 1], G[k], log(G[k] / G[k + 1]) / (E[k + 1] - E[k])) for k in range(points - 1)]
    first, last = pieces[0], pieces[-1]
    pieces.insert(0, (mpf(0), E[0], G[0] * exp(first[3] * E[0]), first[3]))
    pieces.append((E[-1], None, G[-1], last[3]))
    moment = {p: sum(exponential_integral(p, *piece) for piece in pieces) for p in (-0.5, 0.5, 1, 1.5)}
    density, mean = moment[0.5], moment[1.5] / moment[0.5]
    screening = 2 * density / moment[-0.5]
    flux = sqrt(2 * e / m_e) / 4 * moment[1]
    mass = random.choice([1.00783, 4.0026, 20.18])
    demand = density * sqrt(e * screening / (mpf(mass) * u)) * 4 / sqrt(2 * e / m_e)

    def surplus(V):
        total = 0
        for a, b, F_a, beta in pieces:
            if b is None or b > V:
                start = max(a, V)
                F_start = F_a * exp(-beta * (start - a))
                far = 0 if b is None else exp(-beta * (b - start)) * (1 / beta**2 + (b - V) / beta)
                total += F_start * (1 / beta**2 + (start - V) / beta - far)
        return total - demand

    V = bisect(surplus, 0, energy[-1])
    assert energy[-1] - V > 6 * T
    values = [density, mean, 2 * mean / 3, screening, flux, -V]
    tables["eepf"].append({"energy": energy, "F": F, "mass": mass, "values": [mp.nstr(each, 25) for each in values]})

for _ in range(40):
    a, width = random.choice([0.0, between(1e-3, 50)]), between(1e-3, 5)
    b = a + width
    F_a, F_b = between(1e-3, 1), random.choice([-1, 1]) * between(1e-3, 1)
    V = a + width * random.random()

    def F(E):
        return mpf(F_a) + (mpf(F_b) - mpf(F_a)) * (E - mpf(a)) / (mpf(b) - mpf(a))

    # With E = s² all integrands are polynomials, which the rule takes exactly.
    sums = [quad(lambda s: 2 * s ** (2 * p + 1) * F(s * s), [sqrt(mpf(a)), sqrt(mpf(b))]) for p in (mpf(-0.5), mpf(0.5), 1, mpf(1.5))]
    above = [quad(F, [mpf(V), mpf(b)]), quad(lambda E: (E - mpf(V)) * F(E), [mpf(V), mpf(b)])]
    size = max(abs(F_a), abs(F_b))
    scales = [size * mpf(b) ** p * width for p in (mpf(-0.5), mpf(0.5), 1, mpf(1.5))] + [size * (b - V), size * (b - V) ** 2]
    tables["straight"].append(
        {"piece": [a, b, F_a, F_b], "V": V, "values": [mp.nstr(each, 25) for each in sums + above], "scales": [float(s) for s in scales]}
    )
print(json.dumps(tables, indent=1))
