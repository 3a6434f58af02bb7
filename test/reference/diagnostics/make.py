"""Independent figures for the diagnostics: 50-digit arithmetic (mpmath) from the formulas, by sums of products and elimination.

    /usr/bin/python3 test/reference/diagnostics/make.py

writes figures.json beside this file. Nothing is shared with the program. Two figures come from elsewhere: W and its p-value from
scipy.stats.shapiro, and eigenvalues for the Durbin-Watson p-value from numpy (double precision), put into Imhof's integral with
mpmath's quadrature.
"""

import csv
import json
import re
from pathlib import Path

import numpy as np
from mpmath import mp, mpf, matrix, lu_solve, inverse, betainc, gammainc, quad, atan, sin, sqrt, log, pi, exp, inf, erfc, findroot
from scipy import stats

mp.dps = 50
HERE = Path(__file__).parent
ROOT = HERE.parent


def arrays(path, names):
    text = Path(path).read_text()
    found = {}
    for name in names:
        body = re.search(r"\b%s: \[([^\]]*)\]" % name, text).group(1)
        found[name] = [mpf(x.strip()) for x in body.replace("\n", " ").split(",") if x.strip()]
    return found


def f_upper(f, a, b):
    return betainc(mpf(b) / 2, mpf(a) / 2, 0, b / (b + a * f), regularized=True)


def chi_upper(x, k):
    return gammainc(mpf(k) / 2, mpf(x) / 2, inf, regularized=True)


def fit(X, y):
    """Least squares on a list of columns: estimates, residuals, inverse of X'X."""
    p = len(X)
    G = matrix(p, p)
    g = matrix(p, 1)
    for i in range(p):
        for j in range(i + 1):
            G[i, j] = G[j, i] = mp.fdot(X[i], X[j])
        g[i] = mp.fdot(X[i], y)
    V = inverse(G)
    b = lu_solve(G, g)
    e = [y[t] - mp.fsum(b[j] * X[j][t] for j in range(p)) for t in range(len(y))]
    return b, e, V


def rss(X, y):
    e = fit(X, y)[1]
    return mp.fdot(e, e)


def independent(columns):
    """Columns that are not combinations of earlier ones, by Gram-Schmidt in 50 digits."""
    basis, kept = [], []
    for c in columns:
        v = list(c)
        size = mp.fdot(v, v)
        for q in basis:
            k = mp.fdot(q, v)
            v = [a - k * b for a, b in zip(v, q)]
        left = mp.fdot(v, v)
        if size > 0 and left > mpf(10) ** -60 * size:
            basis.append([a / sqrt(left) for a in v])
            kept.append(c)
    return kept


def n_r2(X, z):
    m = mp.fsum(z) / len(z)
    total = mp.fsum((v - m) ** 2 for v in z)
    return len(z) * (1 - rss(X, z) / total)


def durbin_watson_p(X, e, order):
    """Two tails by Imhof's integral over the eigenvalues of the projected difference matrix."""
    n = len(order)
    e = [e[i] for i in order]
    d = mp.fsum((e[t] - e[t - 1]) ** 2 for t in range(1, n)) / mp.fdot(e, e)
    # An orthonormal basis from 50 digits, so that ill-conditioned columns lose nothing.
    basis = []
    for c in X:
        v = [c[i] for i in order]
        for q in basis:
            k = mp.fdot(q, v)
            v = [a - k * b for a, b in zip(v, q)]
        size = sqrt(mp.fdot(v, v))
        basis.append([a / size for a in v])
    Q = np.array([[float(a) for a in q] for q in basis]).T
    D = np.diff(np.eye(n), axis=0)
    full, _ = np.linalg.qr(np.hstack([Q, np.eye(n)]))
    Q2 = full[:, Q.shape[1] :]
    nu = np.linalg.eigvalsh(Q2.T @ (D.T @ D) @ Q2)
    mp.dps = 20
    lam = [mpf(float(v)) - d for v in nu]
    scale = 1 / sqrt(mp.fsum(l * l for l in lam))

    def integrand(u):
        theta = mp.fsum(atan(l * u) for l in lam) / 2
        rho = mpf(1)
        for l in lam:
            rho *= 1 + (l * u) ** 2
        return sin(theta) / (u * rho ** mpf("0.25"))

    ends = [scale * k for k in (0, 1, 2, 3, 4, 6, 8, 12, 20, 50, 200)]
    if n < 60:
        ends.append(inf)
    upper = mpf(1) / 2 + quad(integrand, ends) / pi
    mp.dps = 50
    return d, 1 - upper, upper


def shapiro_wilk(values):
    """W with Royston's (1995, AS R94) weights, the normal quantiles to 50 digits; n > 5."""
    x = sorted(values)
    n = len(x)
    quantile = lambda p: findroot(lambda z: erfc(-z / sqrt(mpf(2))) / 2 - p, mpf(float(stats.norm.ppf(float(p)))))
    m = [quantile((k - mpf(3) / 8) / (n + mpf(1) / 4)) for k in range(1, n + 1)]
    mm = mp.fdot(m, m)
    u = 1 / sqrt(mpf(n))
    an = -mpf("2.706056") * u**5 + mpf("4.434685") * u**4 - mpf("2.071190") * u**3 - mpf("0.147981") * u**2 + mpf("0.221157") * u + m[-1] / sqrt(mm)
    an1 = -mpf("3.582633") * u**5 + mpf("5.682633") * u**4 - mpf("1.752461") * u**3 - mpf("0.293762") * u**2 + mpf("0.042981") * u + m[-2] / sqrt(mm)
    phi = (mm - 2 * m[-1] ** 2 - 2 * m[-2] ** 2) / (1 - 2 * an**2 - 2 * an1**2)
    a = [-an, -an1] + [v / sqrt(phi) for v in m[2:-2]] + [an1, an]
    mean = mp.fsum(x) / n
    return mp.fdot(a, x) ** 2 / mp.fsum((v - mean) ** 2 for v in x)


def box_cox(X, y, confidence):
    n = len(y)
    mean = mp.fsum(log(v) for v in y) / n
    z = [log(v) - mean for v in y]

    def height(lam):
        r = [(exp(lam * v) - 1) / lam if lam != 0 else v for v in z]
        return -mpf(n) / 2 * log(rss(X, r))

    mp.dps = 40
    grid = [mpf(k) / 10 for k in range(-20, 21)]
    heights = [height(l) for l in grid]
    best = max(range(len(grid)), key=lambda k: heights[k])
    if best in (0, len(grid) - 1):
        mp.dps = 50
        return None
    # Golden section, then the crossings by bisection.
    a, b = grid[best - 1], grid[best + 1]
    g = (sqrt(mpf(5)) - 1) / 2
    while b - a > mpf(10) ** -12:
        c, e = b - g * (b - a), a + g * (b - a)
        if height(c) > height(e):
            b = e
        else:
            a = c
    peak = (a + b) / 2
    z975 = mpf(float(stats.norm.ppf(float(0.5 + confidence / 2))))
    target = height(peak) - z975**2 / 2

    def cross(inside, outside):
        if height(outside) > target:
            return None
        while abs(outside - inside) > mpf(10) ** -12:
            m = (inside + outside) / 2
            if height(m) > target:
                inside = m
            else:
                outside = m
        return (inside + outside) / 2

    found = {"lambda": peak, "lower": cross(peak, mpf(-2)), "upper": cross(peak, mpf(2))}
    mp.dps = 50
    return found


def case(data, names, lags, split=None, weights=None, scales=True, intercept=True):
    """`names` are columns of the model beside the intercept, in order; rows in the order of data['order']."""
    y = data["y"]
    n = len(y)
    order = data.get("order", list(range(n)))
    w = data[weights] if weights else [mpf(1)] * n
    root = [sqrt(v) for v in w]
    plain = ([[mpf(1)] * n] if intercept else []) + [data[c] for c in names]
    X = [[a * r for a, r in zip(c, root)] for c in plain]
    v = [a * r for a, r in zip(y, root)]
    p = len(X)
    b, e, V = fit(X, v)
    total = mp.fdot(e, e)
    s2 = total / (n - p)
    out = {"rows": n}

    # White: squares and cross-products of the columns, on the squared (weighted) residuals.
    ones = [mpf(1)] * n
    z = [a * a for a in e]
    cols = [data[c] for c in names]
    products = [[a * c for a, c in zip(cols[i], cols[j])] for i in range(len(cols)) for j in range(i + 1)]
    aux = independent([ones] + cols + products)
    if len(aux) < n:
        stat = n_r2(aux, z)
        out["uneven_spread"] = {"statistic": stat, "df": [len(aux) - 1], "p_value": chi_upper(stat, len(aux) - 1)}
    stat = n_r2([ones] + cols, z)
    out["equal_spread"] = {"statistic": stat, "df": [len(cols)], "p_value": chi_upper(stat, len(cols))}

    # Breusch-Godfrey with presample residuals zero.
    if n - p - lags >= 1:
        place = {row: t for t, row in enumerate(order)}
        lagged = [[e[order[place[i] - l]] if place[i] >= l else mpf(0) for i in range(n)] for l in range(1, lags + 1)]
        stat = n * (1 - rss(X + lagged, e) / total)
        out["serial_correlation"] = {"statistic": stat, "df": [lags], "p_value": chi_upper(stat, lags)}

    # RESET with squares and cubes of the fitted values.
    fitted = [mp.fsum(b[j] * plain[j][t] for j in range(p)) for t in range(n)]
    raw = [[r * f**k for f, r in zip(fitted, root)] for k in (2, 3)]
    aux = independent(X + raw)
    q = len(aux) - p
    if q > 0 and n > len(aux):
        left = rss(aux, v)
        stat = ((total - left) / q) / (left / (n - len(aux)))
        out["shape"] = {"statistic": stat, "df": [q, n - len(aux)], "p_value": f_upper(stat, q, n - len(aux))}

    # Moments.
    m = mp.fsum(e) / n
    m2, m3, m4 = (mp.fsum((a - m) ** k for a in e) / n for k in (2, 3, 4))
    skew, excess = m3 / m2 ** mpf("1.5"), m4 / m2**2 - 3
    stat = n * (skew**2 / 6 + excess**2 / 24)
    out["skewness_and_tails"] = {"statistic": stat, "df": [2], "p_value": chi_upper(stat, 2)}
    W = stats.shapiro([float(a) for a in e])
    out["normality"] = {"statistic": W.statistic, "df": [], "p_value": W.pvalue, "w": shapiro_wilk(e)}

    d, lower, upper = durbin_watson_p(X, e, order)
    out["independence"] = {"statistic": d, "df": [], "lower": lower, "upper": upper}

    # Lack of fit.
    groups = {}
    for t in range(n):
        groups.setdefault(tuple(str(c[t]) for c in cols), []).append(t)
    if len(groups) < n and len(groups) > p:
        pure = mpf(0)
        for rows in groups.values():
            mean = mp.fsum(w[t] * y[t] for t in rows) / mp.fsum(w[t] for t in rows)
            pure += mp.fsum(w[t] * (y[t] - mean) ** 2 for t in rows)
        if pure > 0:
            d1, d2 = len(groups) - p, n - len(groups)
            stat = ((total - pure) / d1) / (pure / d2)
            out["lack_of_fit"] = {"statistic": stat, "df": [d1, d2], "p_value": f_upper(stat, d1, d2)}

    # Chow.
    if split:
        name, value = split
        parts = [[t for t in range(n) if data[name][t] < value], [t for t in range(n) if data[name][t] >= value]]
        left, df = mpf(0), 0
        for rows in parts:
            part = independent([[c[t] for t in rows] for c in X])
            if len(rows) > len(part):
                left += rss(part, [v[t] for t in rows])
                df += len(rows) - len(part)
        d1 = n - p - df
        stat = ((total - left) / d1) / (left / df)
        out["same_in_both_parts"] = {"statistic": stat, "df": [d1, df], "p_value": f_upper(stat, d1, df)}

    # Recursive residuals by refitting, and the largest cumulated sum.
    if data.get("recursive", True):
        start = p
        while len(independent([[c[i] for i in order[:start]] for c in X])) < p:
            start += 1
        # Rows before the first full rank can be predicted as well, where they lie in the span of earlier ones.
        sums, total_w, best = [], mpf(0), mpf(-1)
        ws = []
        for t in range(1, n):
            rows = order[:t]
            sub = [[c[i] for i in rows] for c in X]
            keep = []
            basis = []
            for j, c in enumerate(sub):
                u = list(c)
                for qv in basis:
                    k = mp.fdot(qv, u)
                    u = [a2 - k * b2 for a2, b2 in zip(u, qv)]
                size = mp.fdot(u, u)
                if mp.fdot(c, c) > 0 and size > mpf(10) ** -60 * mp.fdot(c, c):
                    basis.append([a2 / sqrt(size) for a2 in u])
                    keep.append(j)
            i = order[t]
            if len(keep) < p:
                with_row = independent([[c[k] for k in order[: t + 1]] for c in X])
                if len(with_row) > len(keep):
                    continue
            part = [sub[j] for j in keep]
            bb, _, vv = fit(part, [v[k] for k in rows])
            x = [X[j][i] for j in keep]
            h = mp.fsum(x[a] * vv[a, c] * x[c] for a in range(len(x)) for c in range(len(x)))
            ws.append((v[i] - mp.fsum(bb[a] * x[a] for a in range(len(x)))) / sqrt(1 + h))
        m = len(ws)
        assert m == n - p, (m, n, p)
        for r, wt in enumerate(ws, 1):
            total_w += wt
            best = max(best, abs(total_w) / sqrt(s2) / (sqrt(mpf(m)) * (1 + mpf(2) * r / m)))
        upper_tail = lambda q: erfc(q / sqrt(mpf(2))) / 2
        prob = 2 * (upper_tail(3 * best) + exp(-4 * best**2) * upper_tail(-best))
        out["drift"] = {"statistic": best, "df": [], "p_value": min(prob, mpf(1))}

    if scales:
        found = box_cox(X, v, mpf("0.95")) if not weights else None
        if found:
            out["response_scale"] = found

    # Influence of every row by formula from deletions carried out.
    rows = []
    inv = [V[j, j] for j in range(p)]
    for t in range(n) if n < 60 else [0, 13, 111, 200, n - 1]:
        h = mp.fsum(X[a][t] * V[a, c] * X[c][t] for a in range(p) for c in range(p))
        if abs(1 - h) < mpf(10) ** -20:
            continue
        rest = [k for k in range(n) if k != t]
        bi, ei, Vi = fit([[c[k] for k in rest] for c in X], [v[k] for k in rest])
        si = sqrt(mp.fdot(ei, ei) / (n - 1 - p))
        dfbetas = [(b[j] - bi[j]) / (si * sqrt(inv[j])) for j in range(p)]
        yhat = mp.fsum(X[j][t] * b[j] for j in range(p))
        yhat_i = mp.fsum(X[j][t] * bi[j] for j in range(p))
        det = mp.det(Vi * si**2) / mp.det(V * s2)
        rows.append(
            {
                "row": t,
                "leverage": h,
                "deleted_residual": e[t] / (si * sqrt(1 - h)),
                "dffits": (yhat - yhat_i) / (si * sqrt(h)),
                "covratio": det,
                "dfbetas": dfbetas,
                "estimates": [bi[j] for j in range(p)],
            }
        )
    out["influence"] = rows
    return out


def cars():
    with open(ROOT / "cars" / "cars.csv") as f:
        rows = [r for r in csv.DictReader(f) if all(r[c] != "" for c in ("economy", "weight", "horsepower"))]
    data = {c: [mpf(r[c]) for r in rows] for c in ("weight", "horsepower", "acceleration")}
    data["y"] = [mpf(r["economy"]) for r in rows]
    data["year"] = [mpf(r["first_sold"][:4]) for r in rows]
    data["Europe"] = [mpf(r["origin"] == "Europe") for r in rows]
    data["Japan"] = [mpf(r["origin"] == "Japan") for r in rows]
    data["order"] = sorted(range(len(rows)), key=lambda t: rows[t]["first_sold"])
    data["recursive"] = False
    return data


def plain(value):
    if isinstance(value, dict):
        return {k: plain(v) for k, v in value.items()}
    if isinstance(value, (list, tuple)):
        return [plain(v) for v in value]
    if isinstance(value, (mpf, np.floating)):
        return float(value)
    return value


longley = arrays(ROOT / "longley.ts", ["y", "x1", "x2", "x3", "x4", "x5", "x6"])
cement = arrays(ROOT / "hald-cement" / "hald-cement.ts", ["x1", "x2", "x3", "x4", "y"])
cement["t"] = [mpf(k) for k in range(13)]
anscombe = {}
X1 = [10, 8, 13, 9, 11, 14, 6, 4, 12, 7, 5]
text = (ROOT / "anscombe.ts").read_text()
ys = re.findall(r"y: \[([^\]]*)\]", text)
for k in range(4):
    x = X1 if k < 3 else [8] * 7 + [19] + [8] * 3
    anscombe[k + 1] = {"x": [mpf(a) for a in x], "y": [mpf(a.strip()) for a in ys[k].split(",")]}

found = {
    "longley": case(longley, ["x1", "x2", "x3", "x4", "x5", "x6"], 1, ("x6", 1955)),
    "longley two": case(longley, ["x2", "x4"], 2, ("x6", 1960)),
    "cement": case(cement, ["x1", "x2"], 1, ("t", 6)),
    "cement weighted": case(cement, ["x1", "x2"], 2, ("t", 6), weights="x4"),
    "cement through zero": case(cement, ["x1", "x2"], 1, intercept=False, scales=False),
    **{f"anscombe {k}": case(anscombe[k], ["x"], 1) for k in (1, 2, 3, 4)},
    "cars": case(cars(), ["weight", "horsepower", "year", "Europe", "Japan"], 3, ("year", 1976)),
}
(HERE / "figures.json").write_text(json.dumps(plain(found), indent=1) + "\n")
