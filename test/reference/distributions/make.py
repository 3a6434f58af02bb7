"""Tail probabilities of F, t, chi-squared and normal in 60-digit arithmetic.

Run with a Python that has mpmath:  python3 make.py  writes tails.json beside this file.
Upper tails come from the regularised incomplete beta and gamma functions of mpmath, and each one is worked
out a second time by integrating the density; the script stops where the two differ.
"""
import json
import os

import mpmath as mp

mp.mp.dps = 60


def f_upper(f, d1, d2):
    f, d1, d2 = mp.mpf(f), mp.mpf(d1), mp.mpf(d2)
    if f == 0:
        return mp.mpf(1)
    return mp.betainc(d2 / 2, d1 / 2, 0, d2 / (d2 + d1 * f), regularized=True)


def f_by_density(f, d1, d2):
    """Integral of the F density from f to infinity, with f·e^u in place of x for the long tail."""
    f, d1, d2 = mp.mpf(f), mp.mpf(d1), mp.mpf(d2)
    log_c = mp.loggamma((d1 + d2) / 2) - mp.loggamma(d1 / 2) - mp.loggamma(d2 / 2) + d1 / 2 * mp.log(d1 / d2)

    def density(u):
        x = f * mp.e ** u
        return mp.e ** (log_c + d1 / 2 * mp.log(x) - (d1 + d2) / 2 * mp.log1p(d1 * x / d2))

    # The bulk lies within some multiples of 1/d1 + 1/d2 of ln(1/f); the cuts are for the quadrature only.
    step = mp.sqrt(2 / d1 + 2 / d2)
    centre = max(mp.mpf(0), -mp.log(f))
    decay = 2 * (d2 + d1 * f) / (d1 * d2 * f)
    cuts = {mp.mpf(0), centre, *[centre + k * step for k in (1, 3, 8, 20, 50, 120, 400)]}
    cuts = sorted(cuts | {k * decay for k in (*range(1, 60, 4), 80, 120, 400)})
    if centre > 0:
        cuts = sorted({*cuts, *[max(mp.mpf(0), centre - k * step) for k in (1, 3, 8, 20, 50)]})
    # The quadrature stops at an absolute error, so the integrand is made of the order of 1.
    peak = max(density(u) for u in cuts)
    return peak * mp.quad(lambda u: density(u) / peak, [*cuts, mp.inf])


def chi_upper(x, df):
    return mp.gammainc(mp.mpf(df) / 2, mp.mpf(x) / 2, mp.inf, regularized=True)


def normal_upper(z):
    return mp.erfc(mp.mpf(z) / mp.sqrt(2)) / 2


def t_two_sided(t, df):
    return f_upper(mp.mpf(t) ** 2, 1, df)


def agree(a, b, what):
    if abs(a - b) > mp.mpf(10) ** -18 * abs(a):
        raise SystemExit(f"{what}: {mp.nstr(a, 20)} against {mp.nstr(b, 20)}")


def t_quantile(p, df):
    """The t > 0 with two-sided tail p, by bisection on ln t and then secant steps."""
    low, high = mp.mpf("1e-12"), mp.mpf(10)
    while t_two_sided(high, df) > p:
        high *= 10
    for _ in range(60):
        middle = mp.sqrt(low * high)
        low, high = (middle, high) if t_two_sided(middle, df) > p else (low, middle)
    return mp.findroot(lambda t: t_two_sided(t, df) - p, (low, high), solver="anderson", tol=mp.mpf(10) ** -80, verify=False)


def text(value):
    return mp.nstr(value, 20, min_fixed=0, max_fixed=0)


f_cases = []
for d1 in (1, 2, 3, 7, 20, 60):
    for d2 in (1, 2, 5, 10, 38, 200, 5000, 1000000):
        for f in (1e-6, 0.05, 0.5, 1, 2.5, 10, 60, 500):
            p = f_upper(f, d1, d2)
            if p > mp.mpf("1e-305"):
                f_cases.append((f, d1, d2, p))
for f, d1, d2 in ((1e4, 1, 60), (3000, 1, 400), (1200, 4, 500), (1e5, 3, 120), (1e30, 1, 19), (690, 2, 100000), (1e60, 1, 10)):
    f_cases.append((f, d1, d2, f_upper(f, d1, d2)))
for k, (f, d1, d2, p) in enumerate(f_cases):
    if k % 7 == 0 and d2 < 1000000 and p < mp.mpf("0.999"):
        agree(p, f_by_density(f, d1, d2), f"F {f} on {d1}, {d2}")

t_cases = [(t, df, t_two_sided(t, df)) for df in (1, 2, 3, 10, 35, 388, 10000, 1000000)
           for t in (1e-9, 1e-3, 0.3, 1, 2, 4, 9, 25) if t_two_sided(t, df) > mp.mpf("1e-305")]
t_cases += [(t, df, t_two_sided(t, df)) for t, df in ((1e3, 100), (1e6, 50), (37, 1000000), (60, 300), (1e30, 9))]

chi_cases = [(x, df, chi_upper(x, df)) for df in (1, 2, 3, 10, 50, 400)
             for x in (1e-8, 0.01, 0.5, 1, 3, 12, 60, 300, 1000) if chi_upper(x, df) > mp.mpf("1e-305")]
chi_cases += [(x, df, chi_upper(x, df)) for x, df in ((1370, 1), (1380, 4), (2200, 300))]

normal_cases = [(z, normal_upper(z)) for z in (-8, -2, -0.5, 0, 1e-6, 0.3, 1, 1.96, 3, 6, 10, 20, 30, 37)]

# The doubles nearest to these, as the program gets them.
quantile_cases = [(p, df, t_quantile(mp.mpf(p), df)) for df in (1, 2, 3, 5, 11, 38, 150, 201, 1000, 100000)
                  for p in (0.9, 0.5, 0.2, 0.1, 0.05, 0.01, 0.001, 1e-6, 1e-12)]
for p, df, t in quantile_cases:
    agree(t_two_sided(t, df), mp.mpf(p), f"t quantile {p} on {df}")

result = {
    "f_upper": [[f, d1, d2, text(p)] for f, d1, d2, p in f_cases],
    "t_two_sided": [[t, df, text(p)] for t, df, p in t_cases],
    "chi_squared_upper": [[x, df, text(p)] for x, df, p in chi_cases],
    "normal_upper": [[z, text(p)] for z, p in normal_cases],
    "t_two_sided_quantile": [[p, df, text(t)] for p, df, t in quantile_cases],
    "normal_quantile": [[p, text(mp.sqrt(2) * mp.erfinv(2 * mp.mpf(p) - 1))] for p in
                        (1e-12, 1e-6, 0.001, 0.025, 0.2, 0.5, 0.7, 0.95, 0.975, 0.999)],
}
with open(os.path.join(os.path.dirname(os.path.abspath(__file__)), "tails.json"), "w", encoding="utf-8") as file:
    rows = ",\n".join(
        f' "{name}": [\n' + ",\n".join("  " + json.dumps(row) for row in cases) + "\n ]" for name, cases in result.items()
    )
    file.write("{\n" + rows + "\n}\n")
