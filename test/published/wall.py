"""Reference values of the wall family, from the equations of its sources, with mpmath at 50 digits.

Shares no code with functions/: run `python3 test/published/wall.py > test/published/wall.json` to make them again.
Inputs are drawn from a seeded generator over the ranges of the trade and rounded to doubles first. Densities n are those
at the edge; V, where it is null, floats. The emission limit is solved as a system of five equations in five unknowns,
the mean yield by quadrature over energy: not in the ways the functions take.
"""
import json
import random

from mpmath import exp, findroot, inf, log, mp, mpf, pi, quad, sin, sqrt

mp.dps = 50
random.seed(20260114)

# CODATA 2022
e = mpf("1.602176634e-19")
m_e = mpf("9.1093837139e-31")
k_B = mpf("1.380649e-23")
h = mpf("6.62607015e-34")
u = mpf("1.66053906892e-27")


def between(low, high):
    """Log-uniform, as the double that the test will use."""
    return low * (high / low) ** random.random()


def row(inputs, value, **more):
    return {"inputs": inputs, "value": mp.nstr(value, 25), **{name: float(each) for name, each in more.items()}}


def bohm(T, Ti, Z, M):
    return sqrt(e * (Z * T + Ti) / M)


def mean_speed(T):
    return sqrt(8 * e * T / (pi * m_e))


def floating(T, Ti, Z, M, delta):
    return -T * log((1 - delta) * mean_speed(T) / (4 * bohm(T, Ti, Z, M)))


def heat_per_ion(T, Ti, Z, M, V, delta):
    """Energy per ion in eV; the electrons' flux over the ions' from the two fluxes themselves."""
    floats = V is None
    V = floating(T, Ti, Z, M, delta) if floats else mpf(V)
    u_B = bohm(T, Ti, Z, M)
    electrons = exp(V / T) * mean_speed(T) / 4 / (u_B / Z)
    return -Z * V + M * u_B**2 / (2 * e) + mpf(5) / 2 * Ti + 2 * T * electrons


def emission_limit(mass_per_charge):
    """Neutral edge, marginal Bohm, no field at the wall, no net current, emitted flux: from large mu down to this one."""
    start = [mpf("0.909"), mpf("0.091"), mpf("0.578"), mpf("1.025"), mpf("8.265")]
    for mass in [1e6, 1e3, 30, 5, 1, 0.3, 0.1, 0.05, mass_per_charge]:
        mass = max(mass, mass_per_charge)
        root = sqrt(m_e / (mpf(mass) * u))

        def equations(a, s, energy, drop, d):  # delta = 1 - d root
            delta = 1 - d * root
            return [
                a + s - 1,
                a - s / (2 * drop) - 1 / (2 * energy),
                2 * energy * (sqrt(1 + drop / energy) - 1) - a * (1 - exp(-drop)) - 2 * s * drop,
                d * a * exp(-drop) - sqrt(4 * pi * energy),
                delta * sqrt(energy / drop) - d * s,
            ]

        start = list(findroot(equations, start, tol=1e-40, maxsteps=60))
    a, s, energy, drop, d = start
    return 1 - d * root, drop, energy


names = ["floating", "fromPlasma", "ionFlux", "ionCurrent", "electronFlux", "wallCurrent", "wallVoltage", "impact"]
names += ["heatFlux", "heatFactor", "emissionLimit", "richardson", "erosion", "emissionYield", "ionEmission"]
tables = {name: [] for name in names}
for i in range(60):
    n, T, mass, Z = between(1e13, 1e21), between(0.1, 200), between(1, 240), random.randint(1, 4)
    Ti = 0 if i % 3 == 0 else T * between(0.01, 3)
    delta = 0 if i % 4 == 0 else between(0.01, 0.7)
    ratio, angle = between(0.1, 1), 90 if i % 2 == 0 else between(1, 89)
    M, mT, mTi, md = mpf(mass) * u, mpf(T), mpf(Ti), mpf(delta)
    V_f = floating(mT, mTi, Z, M, md)
    u_B = bohm(mT, mTi, Z, M)
    tables["floating"].append(row([T, mass, Z, Ti, delta], V_f))
    tables["fromPlasma"].append(row([T, mass, Z, Ti, delta, ratio], V_f + mT * log(mpf(ratio))))
    flux = mpf(n) * u_B / Z * sin(mpf(angle) * pi / 180)
    tables["ionFlux"].append(row([n, T, mass, Z, Ti, angle], flux))
    tables["ionCurrent"].append(row([n, T, mass, Z, Ti, angle], Z * e * flux))

    V = float(V_f) * between(0.05, 3)
    electrons = mpf(n) * mean_speed(mT) / 4 * (exp(mpf(V) / mT))
    tables["electronFlux"].append(row([n, T, V], electrons, exponent=abs(V / T)))
    brought = (1 - md) * e * electrons
    ions = e * mpf(n) * u_B
    tables["wallCurrent"].append(row([V, n, T, mass, Z, Ti, delta], ions - brought, scale=max(ions, brought)))
    J = float(ions - brought)
    exact = mT * log((ions - mpf(J)) / ((1 - md) * e * mpf(n) * mean_speed(mT) / 4))
    condition = (ions + abs(J)) / (ions - mpf(J)) / abs(exact / mT)
    tables["wallVoltage"].append(row([J, n, T, mass, Z, Ti, delta], exact, condition=condition))

    V = [None, -between(0.1, 3000), -between(0.1, 5) * T][i % 3]
    impact = -Z * (floating(mT, mTi, Z, M, 0) if V is None else mpf(V)) + M * u_B**2 / (2 * e)
    tables["impact"].append(row([T, mass, Z, Ti, V], impact))
    heat = heat_per_ion(mT, mTi, Z, M, V, md)
    exponent = 0 if V is None else abs(V / T)
    tables["heatFactor"].append(row([T, mass, Z, Ti, V, delta], heat / mT, exponent=exponent))
    surface = between(0.1, 30)
    tables["heatFlux"].append(
        row([n, T, mass, Z, Ti, V, delta, surface, angle], e * flux * (heat + mpf(surface)), exponent=exponent)
    )

    hot, work = between(600, 4500), between(1, 6)
    A_R = between(1e4, 2e6)
    exponent = e * mpf(work) / (k_B * mpf(hot))
    dushman = 4 * pi * m_e * e * k_B**2 / h**3
    rounded = 2 * exponent  # the exponent is a product of three rounded numbers
    tables["richardson"].append(row([hot, work, None], dushman * mpf(hot) ** 2 * exp(-exponent), exponent=rounded))
    tables["richardson"].append(row([hot, work, A_R], mpf(A_R) * mpf(hot) ** 2 * exp(-exponent), exponent=rounded))
    arrivals, removed, target, density = between(1e15, 1e24), between(1e-3, 5), between(6, 400), between(500, 2e4)
    tables["erosion"].append(
        row([arrivals, removed, target, density], mpf(arrivals) * mpf(removed) * mpf(target) * u / mpf(density))
    )
    E_iz = between(12, 25)
    work = between(1, 5)
    left = mpf(E_iz) - 2 * mpf(work)
    tables["ionEmission"].append(row([E_iz, work], mpf("0.016") * left, condition=E_iz / left))

# Mean yields: T_e over E_max from 1e-5 to 1e4, closely where one method takes over from the other (0.36).
for i in range(50):
    E_max = between(50, 2000)
    T = E_max * (between(1e-5, 1e4) if i % 2 == 0 else between(0.2, 0.6))
    peak = between(0.5, 5)
    mT, mE = mpf(T), mpf(E_max)
    integrand = lambda E: E / mT**2 * mpf(peak) * exp(2) * E / mE * exp(-2 * sqrt(E / mE) - E / mT)
    scale = min(mT, mE)
    value = quad(integrand, [0] + [scale * mpf(2) ** k for k in range(-12, 15)] + [inf])
    tables["emissionYield"].append(row([T, peak, E_max], value))

masses = [1.00728, 1.00728 * 2, 2.01355, 3.01550, 4.00151 / 2, 4.00205, 39.948, 83.798, 131.293, 0.02, 0.1, 4000]
for mass in masses + [between(0.5, 300) for _ in range(20)]:
    delta, drop, energy = emission_limit(mass)
    tables["emissionLimit"].append(
        {"inputs": [mass], "value": [mp.nstr(each, 25) for each in (delta, drop, energy)]}
    )
print(json.dumps(tables, indent=1))
