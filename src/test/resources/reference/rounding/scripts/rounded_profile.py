"""Profile-likelihood intervals of rounded normal readings by plain grids and bisection.

Independent of the program: likelihood by scipy.special.log_ndtr differences, profile by a dense grid
followed by bounded minimisation, ends by bisection. Run: python3 rounded_profile.py > ../rounded_profile.csv
"""
import math

import numpy as np
import scipy
from scipy import optimize, stats
from scipy.special import log_ndtr


def loglik(x, mu, sigma, d):
    a = (x - d / 2 - mu) / sigma
    b = (x + d / 2 - mu) / sigma
    flip = a > 0
    lo = np.where(flip, -b, a)
    hi = np.where(flip, -a, b)
    lh, ll = log_ndtr(hi), log_ndtr(lo)
    return float(np.sum(lh + np.log1p(-np.exp(np.minimum(ll - lh, -1e-300)))))


def best(f, low, high):
    grid = np.linspace(low, high, 400)
    values = [f(g) for g in grid]
    i = int(np.argmax(values))
    r = optimize.minimize_scalar(lambda v: -f(v), bounds=(grid[max(0, i - 1)], grid[min(399, i + 1)]),
                                 method="bounded", options={"xatol": 1e-10})
    return max(-r.fun, values[i])


def bisect(f, inside, outside):
    for _ in range(45):
        mid = (inside + outside) / 2
        if f(mid) >= 0:
            inside = mid
        else:
            outside = mid
    return inside


def thresholds(n, alpha):
    t = stats.t.isf(alpha / 2, n - 1)

    def outside(w):
        r1 = optimize.brentq(lambda r: r - 1 - math.log(r) - w, 1e-300, 1)
        r2 = optimize.brentq(lambda r: r - 1 - math.log(r) - w, 1, 2 * w + 4)
        return stats.chi2.cdf(n * r1, n - 1) + stats.chi2.sf(n * r2, n - 1) - alpha

    w = optimize.brentq(outside, 1e-6, 500)
    return n / 2 * math.log1p(t * t / (n - 1)), n / 2 * w


print("# readings so coarse that few values occur: profile-likelihood intervals (mean less the readings'"
      " mean; sigma), scipy", scipy.__version__ + ", scripts/rounded_profile.py")
print("# thresholds: those at which unrounded readings have exactly the level 1 - alpha; sigma from 0.001 d up")
print("readings,resolution,alpha,mean_low,mean_high,sigma_low,sigma_high")
for readings, d, alpha in (
        ("5 5 5 5 6", 1, 0.05), ("5 5 6 6 6 6", 1, 0.05), ("2 3 3 4", 1, 0.05), ("0.1 0.2 0.2 0.3 0.2 0.2", 0.1, 0.01),
        ("7 7 7", 1, 0.05), ("7 7", 1, 0.05), ("1 3 3 3 4 5 5 8", 1, 0.1), ("10 10 10 10 10 10 10 10 10 12", 1, 0.05)):
    x = np.array([float(v) for v in readings.split()])
    n = len(x)
    x = x - x.mean()
    lo, hi = x.min() - d / 2, x.max() + d / 2

    def at_mean(mu):
        reach = max(hi - mu, mu - lo)
        return best(lambda s: loglik(x, mu, math.exp(s), d), math.log(1e-3 * d), math.log(2 * reach + 2 * d))

    def at_sigma(s):
        return best(lambda mu: loglik(x, mu, s, d), lo, hi)

    top = best(at_mean, lo, hi)
    tm, ts = thresholds(n, alpha)
    inside = max(np.linspace(lo, hi, 200), key=at_mean)
    m_low = bisect(lambda m: at_mean(m) - top + tm, inside, lo - 100 * d)
    m_high = bisect(lambda m: at_mean(m) - top + tm, inside, hi + 100 * d)
    sigmas = np.exp(np.linspace(math.log(1e-3 * d), math.log(5 * (hi - lo)), 60))
    s_in = max(sigmas, key=at_sigma)
    s_high = bisect(lambda s: at_sigma(s) - top + ts, s_in, 1e3 * (hi - lo))
    s_low = 0.0 if at_sigma(1e-3 * d) >= top - ts else bisect(lambda s: at_sigma(s) - top + ts, s_in, 1e-3 * d)
    print(f"{readings},{d},{alpha},{m_low:.8f},{m_high:.8f},{s_low:.8f},{s_high:.8f}", flush=True)
