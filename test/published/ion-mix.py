"""Reference values of the mixtures, from the Bohm condition of Riemann 1995, with mpmath at 50 digits.

Shares no code with functions/: run `python3 test/published/ion-mix.py > test/published/ion-mix.json` to make them again.
The common speed is found as the root of the Bohm condition, not from its closed form. Inputs are drawn from a seeded
generator and rounded to doubles first.
"""
import json
import random

from mpmath import findroot, mp, mpf, sqrt

mp.dps = 50
random.seed(20260115)

# CODATA 2022
e = mpf("1.602176634e-19")
u = mpf("1.66053906892e-27")


def between(low, high):
    """Log-uniform, as the double that the test will use."""
    return low * (high / low) ** random.random()


mixes = []
for _ in range(60):
    T, n = between(0.5, 20), between(1e14, 1e19)
    species = [(between(1, 240), random.randint(1, 4), random.random()) for _ in range(random.randint(1, 5))]
    total = sum(weight for _, _, weight in species)
    fractions = [weight / total / Z for _, Z, weight in species]
    bohm = lambda speed: sum(mpf(f) * Z**2 * e * mpf(T) / (mpf(m) * u * speed**2) for (m, Z, _), f in zip(species, fractions)) - 1
    guess = sqrt(e * mpf(T) / (mpf(species[0][0]) * u))
    common = findroot(lambda log: bohm(mp.exp(log)), mp.log(guess))
    mixes.append(
        {
            "T_e": T,
            "n_edge": n,
            "species": [
                {
                    "mass": m,
                    "charge": Z,
                    "fraction": f,
                    "own": mp.nstr(sqrt(Z * e * mpf(T) / (mpf(m) * u)), 25),
                    "commonFlux": mp.nstr(mpf(f) * mpf(n) * mp.exp(common), 25),
                }
                for (m, Z, _), f in zip(species, fractions)
            ],
            "common": mp.nstr(mp.exp(common), 25),
        }
    )
print(json.dumps(mixes, indent=1))
