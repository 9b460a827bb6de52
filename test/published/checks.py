"""Reference values of the checks: slopes, uncertainties and random bits, made without any code of functions/.

Run `python3 test/published/checks.py > test/published/checks.json` to make them again. Slopes and moments come from
mpmath at 50 digits, distributions drawn from numpy's own generator (PCG64, four million draws, so that their own
statistical error is a sixth of ours).
"""
import json

import numpy as np
from mpmath import diff, exp, log, mp, mpf, npdf, quad, sin, sqrt, tan
from scipy.stats import norm

mp.dps = 50
draws = 4_000_000
rng = np.random.default_rng(20260112)

SLOPES = {
    "sqrt": (sqrt, [1e-12, 0.5, 3, 1e16]),
    "exp": (exp, [-20, 0, 3]),
    "log": (log, [1e-3, 1, 1e17]),
    "tan": (tan, [0.3, 1.5]),
    "inverse cube": (lambda x: x**-3, [0.02, 40]),
    "oscillating": (lambda x: sin(20 * x), [0.1, 2]),
}


def slopes():
    return [
        {"f": name, "x": x, "slope": mp.nstr(diff(f, mpf(x)), 20)} for name, (f, points) in SLOPES.items() for x in points
    ]


def drawn(f, means, us):
    """Mean, standard deviation and the 95 % interval of f over independent normal arguments."""
    y = f(*[rng.normal(mean, u, draws) for mean, u in zip(means, us)])
    low, high = np.quantile(y, [0.025, 0.975])
    return {"mean": float(y.mean()), "u": float(y.std(ddof=1)), "low": float(low), "high": float(high)}


def first_order(f, means, us):
    """JCGM 100, 5.1.2, with slopes from mpmath."""
    parts = []
    for i, u in enumerate(us):
        along = lambda x: f(*[x if j == i else mpf(m) for j, m in enumerate(means)])
        parts.append((diff(along, mpf(means[i]), h=mpf("1e-20") * max(1, abs(means[i]))) * u) ** 2)
    total = sum(parts)
    return {"u": float(sqrt(total)), "shares": [float(part / total) for part in parts]}


def end_gauge(l_s, d, alpha_s, theta, d_alpha, d_theta):
    """JCGM 100, H.1: length in nm of a gauge compared with a standard of 50 mm."""
    return l_s + d - l_s * (d_alpha * theta + alpha_s * d_theta)


END_GAUGE = ([50000623, 215, 11.5e-6, -0.1, 0, 0], [25, 9.7, 1.2e-6, 0.41, 0.58e-6, 0.029])


def mass(m_r, dm, a, rho_w, rho_r):
    """JCGM 101, 9.3: deviation in mg of a weight from 100 g, weighed in air; here with normal arguments throughout."""
    return (m_r + dm) * (1 + (a - 1.2) * (1 / rho_w - 1 / rho_r)) - 100000


MASS = ([100000.000, 1.234, 1.2, 8000, 8000], [0.050, 0.020, 0.1 / 3**0.5, 1000 / 3**0.5, 50 / 3**0.5])


def debye_moments(rel_n, rel_t):
    """√(T/n) with normal T and n about 1: moments of the independent factors by quadrature."""
    t = lambda k: quad(lambda x: x ** (mpf(k) / 2) * npdf(x, 1, rel_t), [1 - 9 * rel_t if 9 * rel_t < 1 else 0, 1, 1 + 9 * rel_t])
    n = lambda k: quad(lambda x: x ** (-mpf(k) / 2) * npdf(x, 1, rel_n), [0.1, 0.5, 1, 1.5, 1 + 9 * rel_n])
    mean = t(1) * n(1)
    return {"mean": float(mean), "u": float(sqrt(t(2) * n(2) - mean**2))}


def xoshiro128(seed, count):
    """xoshiro128** 1.1 as its authors define it, in plain integers modulo 2^32."""
    s = list(seed)
    word = 2**32
    rotl = lambda x, k: ((x << k) % word) | (x >> (32 - k))
    out = []
    for _ in range(count):
        out.append((rotl((s[1] * 5) % word, 7) * 9) % word)
        t = (s[1] << 9) % word
        s[2] ^= s[0]
        s[3] ^= s[1]
        s[1] ^= s[2]
        s[0] ^= s[3]
        s[2] ^= t
        s[3] = rotl(s[3], 11)
    return out


SEED = [0x9E3779B9, 0x243F6A88, 0xB7E15162, 0x6A09E667]

print(
    json.dumps(
        {
            "slopes": slopes(),
            "endGauge": {"firstOrder": first_order(end_gauge, *END_GAUGE), "drawn": drawn(end_gauge, *END_GAUGE)},
            "mass": {"firstOrder": first_order(mass, *MASS), "drawn": drawn(mass, *MASS)},
            "debye": debye_moments(0.1, 0.05),
            "bits": {"seed": SEED, "first": xoshiro128(SEED, 8), "thousandth": xoshiro128(SEED, 1000)[-1]},
            "normal": {str(k): float(norm.cdf(k)) for k in [-3, -2, -1, 0, 1, 2, 3]},
        },
        indent=1,
    )
)
