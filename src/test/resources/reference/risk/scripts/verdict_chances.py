"""Chances of CONFORMS and of not DOES NOT CONFORM by piecewise adaptive quadrature over s.

Independent of the program: scipy.integrate.quad on [0, s_max], cut at the resolution's jump and on a
fine grid, Student quantiles from scipy.stats. Run: python3 verdict_chances.py > ../verdict_chances.csv
"""
import itertools
import math
import random

import scipy
from scipy import integrate, stats
from scipy.special import ndtr

COLUMNS = ("n,resolution,u_r,nu_r,in_rule,below,above,bias_rule,alpha,"
           "sigma0,precision_rule,beta,sigma,conforms,not_rejected")


def margin(s, n, d, u_r, nu_r, in_rule, alpha):
    if s / math.sqrt(n) > d / math.sqrt(12):
        u_rep, nu = s / math.sqrt(n), n - 1
    else:
        u_rep, nu = d / math.sqrt(12), math.inf
    u = u_r if in_rule else 0.0
    u_b2 = u_rep ** 2 + u ** 2
    denominator = u_rep ** 4 / nu + u ** 4 / nu_r
    if denominator == 0:
        return stats.norm.isf(alpha) * math.sqrt(u_b2)
    return stats.t.isf(alpha, u_b2 ** 2 / denominator) * math.sqrt(u_b2)


def chance(inner, n, d, u_r, nu_r, in_rule, below, above, rule, alpha, s0, srule, beta, sigma):
    nu = n - 1
    sign = {"GUARDED_ACCEPTANCE": -1 if inner else 1, "GUARDED_REJECTION": 1, "SIMPLE_ACCEPTANCE": 0}[rule]
    s_max = math.inf
    if s0 > 0:
        if srule == "SIMPLE_ACCEPTANCE":
            s_max = s0
        elif inner and srule == "GUARDED_ACCEPTANCE":
            s_max = s0 * math.sqrt(stats.chi2.ppf(alpha, nu) / nu)
        else:
            s_max = s0 * math.sqrt(stats.chi2.isf(alpha, nu) / nu)
    tau = math.hypot(sigma / math.sqrt(n), u_r)

    def f(s):
        m = sign * margin(s, n, d, u_r, nu_r, in_rule, alpha) if sign else 0.0
        low, high = -below - m, above + m
        if low >= high:
            return 0.0
        band = ndtr((high - beta) / tau) - ndtr((low - beta) / tau)
        return band * stats.chi.pdf(s / sigma * math.sqrt(nu), nu) * math.sqrt(nu) / sigma

    top = min(s_max, sigma * stats.chi.isf(1e-18, nu) / math.sqrt(nu))
    cuts = {top * (i / 60) ** 2 for i in range(61)}
    jump = d * math.sqrt(n / 12)
    if 0 < jump < top:
        cuts.add(jump)
    cuts = sorted(cuts)
    # the points just beside a cut keep the jump out of the panels
    return math.fsum(integrate.quad(f, a * (1 + 1e-15), b, epsabs=1e-15, epsrel=1e-13, limit=200)[0]
                     for a, b in zip(cuts, cuts[1:]))


random.seed(7)
print("# chances by scipy.integrate.quad, scipy", scipy.__version__ + "; scripts/verdict_chances.py says how")
print("# conforms = P(CONFORMS), not_rejected = 1 - P(DOES NOT CONFORM); sigma0 = 0: precision not asked;"
      " no floor of equal readings")
print(COLUMNS)
RULES = ("GUARDED_ACCEPTANCE", "GUARDED_REJECTION", "SIMPLE_ACCEPTANCE")
rows = []
for n, rule, srule in itertools.product((2, 3, 5, 10, 30), RULES, RULES):
    for _ in range(4):
        d = random.choice((0, 0.3, 1.0, 2.0))
        u_r = random.choice((0, 0.05, 0.4, 1.5))
        nu_r = random.choice((math.inf, 2, 8))
        in_rule = random.choice((True, True, False))
        below = random.choice((1.0, 2.0, 4.0, math.inf))
        above = random.choice((1.5, 2.0, 3.0))
        alpha = random.choice((0.05, 0.05, 0.01, 0.001))
        s0 = random.choice((0, 0.8, 1.0, 2.0))
        beta = random.choice((0.0, 0.5, -1.0, 2.0))
        sigma = random.choice((0.3, 1.0, 1.0, 2.5))
        rows.append((n, d, u_r, nu_r, in_rule, below, above, rule, alpha, s0, srule, beta, sigma))
for row in rows:
    # where equal readings alone would decide, the case belongs to another table
    values = [chance(inner, *row) for inner in (True, False)]
    print(",".join(str(x).lower() if isinstance(x, (bool, float)) else str(x) for x in row)
          + ",%.16g,%.16g" % tuple(values))
