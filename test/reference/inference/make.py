"""Figures of inference and collinearity in 50-digit arithmetic, written apart from the program they check.

    python3 test/reference/inference/make.py

writes figures.json and studentised-range.json beside this file. Every formula is typed again from where it was
published, in its plainest form (sums of products, explicit inverses), where the program works on orthogonal factors of
doubles and never forms a cross-product. Data values are the doubles nearest to the decimal text. Takes about a minute.
"""

import csv
import json
import re
from datetime import date
from pathlib import Path

from mpmath import mp, mpf, matrix, sqrt, betainc, findroot, eigsy, floor
from scipy.stats import studentized_range

mp.dps = 50
HERE = Path(__file__).parent
ROOT = HERE.parent


# ---------------------------------------------------------------- distributions


def f_upper(f, d1, d2):
    """Abramowitz & Stegun 26.6.2."""
    return betainc(mpf(d2) / 2, mpf(d1) / 2, 0, mpf(d2) / (d2 + d1 * f), regularized=True)


def t_two_sided(t, df):
    return f_upper(t * t, 1, df)


def t_quantile(tail, df):
    with mp.workdps(40):
        return findroot(lambda t: t_two_sided(t, df) - tail, mpf(2) if df > 2 else mpf(5), tol=mpf(10) ** -35)


def f_quantile(tail, d1, d2):
    with mp.workdps(40):
        return findroot(lambda f: f_upper(f, d1, d2) - tail, mpf(3), tol=mpf(10) ** -35)


# ---------------------------------------------------------------- data


def numbers(values):
    return [mpf(float(v)) for v in values]


def arrays(path):
    """Name -> list of numbers in a TypeScript file of plain arrays; later sets of the same name are numbered."""
    text = re.sub(r"/\*.*?\*/", "", (ROOT / path).read_text(), flags=re.S)
    found = {}
    for name, body in re.findall(r"(\w+)(?::|\s*=)\s*\[([-0-9.,\s]+)\]", text):
        key, k = name, 1
        while key in found:
            k += 1
            key = f"{name}{k}"
        found[key] = numbers(v for v in body.replace("\n", " ").split(",") if v.strip())
    return found


longley = arrays("longley.ts")
hald = arrays("hald-cement/hald-cement.ts")
anscombe = arrays("anscombe.ts")
with open(ROOT / "cars/cars.csv", newline="") as file:
    # A row without horsepower is not used.
    cars = [row for row in csv.DictReader(file) if row["horsepower"] not in ("", "NA", "n/a") and row["economy"] not in ("", "NA", "n/a")]


# ---------------------------------------------------------------- least squares


class Model:
    """y on named columns, the first of them the intercept; weights of one where none are given."""

    def __init__(self, names, columns, y, weights=None):
        n, p = len(y), len(columns)
        self.n, self.p, self.names = n, p, names
        w = weights or [mpf(1)] * n
        self.x = [[sqrt(w[i]) * columns[j][i] for j in range(p)] for i in range(n)]
        self.y = [sqrt(w[i]) * y[i] for i in range(n)]
        self.plain = columns
        xx = matrix(p, p)
        xy = matrix(p, 1)
        for i in range(n):
            for j in range(p):
                xy[j] += self.x[i][j] * self.y[i]
                for k in range(p):
                    xx[j, k] += self.x[i][j] * self.x[i][k]
        self.inverse = xx ** -1
        self.b = self.inverse * xy
        self.e = [self.y[i] - sum(self.x[i][j] * self.b[j] for j in range(p)) for i in range(n)]
        self.h = [
            sum(self.x[i][j] * self.inverse[j, k] * self.x[i][k] for j in range(p) for k in range(p)) for i in range(n)
        ]
        self.rss = sum(e * e for e in self.e)
        self.df = n - p
        self.s2 = self.rss / self.df
        mean = sum(w[i] * y[i] for i in range(n)) / sum(w)
        self.tss = sum(w[i] * (y[i] - mean) ** 2 for i in range(n))
        self.w = w

    def sandwich(self, scores):
        """The inverse on both sides of the sum of products of rows of scores."""
        p = self.p
        middle = matrix(p, p)
        for row in scores:
            for j in range(p):
                for k in range(p):
                    middle[j, k] += row[j] * row[k]
        return self.inverse * middle * self.inverse

    def scores(self, stretch=None):
        return [
            [self.x[i][j] * self.e[i] * (stretch[i] if stretch else 1) for j in range(self.p)] for i in range(self.n)
        ]

    def covariance(self, kind, groups=None, lags=None, order=None):
        n, p, h = self.n, self.p, self.h
        if kind == "classical":
            return self.inverse * self.s2
        if kind == "hc0":
            return self.sandwich(self.scores())
        if kind == "hc1":
            return self.sandwich(self.scores()) * mpf(n) / (n - p)
        if kind in ("hc2", "hc3", "hc4"):
            stretch = []
            for hi in h:
                # A leverage of 1 leaves nothing to divide: the row adds nothing.
                if hi > 1 - mpf(10) ** -12:
                    stretch.append(mpf(0))
                    continue
                power = {"hc2": mpf(1), "hc3": mpf(2), "hc4": min(mpf(4), n * hi / p)}[kind]
                stretch.append((1 - hi) ** (-power / 2))
            return self.sandwich(self.scores(stretch))
        if kind == "clustered":
            sums = {}
            for group, row in zip(groups, self.scores()):
                have = sums.setdefault(group, [mpf(0)] * p)
                for j in range(p):
                    have[j] += row[j]
            g = len(sums)
            return self.sandwich(sums.values()) * (mpf(g) / (g - 1)) * (mpf(n - 1) / (n - p))
        if kind == "hac":
            z = self.scores()
            z = [z[i] for i in order]
            middle = matrix(p, p)
            for lag in range(lags + 1):
                weight = 1 - mpf(lag) / (lags + 1)
                for t in range(lag, n):
                    for j in range(p):
                        for k in range(p):
                            product = z[t][j] * z[t - lag][k]
                            middle[j, k] += weight * product
                            if lag > 0:
                                middle[k, j] += weight * product
            return self.inverse * middle * self.inverse
        raise ValueError(kind)

    def errors(self, v):
        return [float(sqrt(v[j, j])) for j in range(self.p)]

    def combined(self, c, v):
        estimate = sum(c[j] * self.b[j] for j in range(self.p))
        variance = sum(c[j] * v[j, k] * c[k] for j in range(self.p) for k in range(self.p))
        return estimate, sqrt(variance)

    def wald(self, rows, values, v, df2):
        q = len(rows)
        d = matrix(q, 1)
        m = matrix(q, q)
        for a in range(q):
            d[a] = sum(rows[a][j] * self.b[j] for j in range(self.p)) - values[a]
            for c in range(q):
                m[a, c] = sum(rows[a][j] * v[j, k] * rows[c][k] for j in range(self.p) for k in range(self.p))
        statistic = (d.T * (m ** -1) * d)[0] / q
        return {"statistic": float(statistic), "df1": q, "df2": df2, "p_value": float(f_upper(statistic, q, df2))}

    def measures(self):
        """Standardised coefficients, partial and semi-partial correlations by their definitions, not from t."""
        n, p, w = self.n, self.p, self.w
        total = sum(w)

        def centred(values):
            mean = sum(w[i] * values[i] for i in range(n)) / total
            return [sqrt(w[i]) * (values[i] - mean) for i in range(n)]

        def dot(a, b):
            return sum(x * y for x, y in zip(a, b))

        y = centred([self.y[i] / sqrt(w[i]) for i in range(n)])
        found = []
        for j in range(1, p):
            x = centred(self.plain[j])
            others = [k for k in range(p) if k != j]
            rest = Model([], [self.plain[k] for k in others], self.plain[j], self.w if self.weighted() else None)
            without = Model([], [self.plain[k] for k in others], [self.y[i] / sqrt(w[i]) for i in range(n)], self.w if self.weighted() else None)
            found.append(
                {
                    "name": self.names[j],
                    "standardised": float(self.b[j] * sqrt(dot(x, x) / dot(y, y))),
                    "partial_correlation": float(dot(rest.e, without.e) / sqrt(dot(rest.e, rest.e) * dot(without.e, without.e))),
                    "semi_partial_correlation": float(dot(rest.e, y) / sqrt(dot(rest.e, rest.e) * dot(y, y))),
                }
            )
        return found

    def weighted(self):
        return any(w != 1 for w in self.w)

    def condition(self):
        """Belsley, Kuh & Welsch 1980: from the eigenvalues of the scaled cross-products, at full precision."""
        p = self.p
        lengths = [sqrt(sum(row[j] ** 2 for row in self.x)) for j in range(p)]
        scaled = matrix(p, p)
        for j in range(p):
            for k in range(p):
                scaled[j, k] = sum(row[j] * row[k] for row in self.x) / lengths[j] / lengths[k]
        values, vectors = eigsy(scaled)
        order = sorted(range(p), key=lambda k: -values[k])
        shares = [[vectors[j, k] ** 2 / values[k] for k in order] for j in range(p)]
        return {
            "indices": [float(sqrt(values[order[0]] / values[k])) for k in order],
            "proportions": [[float(shares[j][k] / sum(shares[j])) for j in range(p)] for k in range(p)],
        }


def automatic(n):
    return int(floor(4 * (mpf(n) / 100) ** (mpf(2) / 9)))


KINDS = ("classical", "hc0", "hc1", "hc2", "hc3", "hc4")


def common(model, order=None, lags=(1, 3)):
    """Everything that is worked out for every set."""
    n = model.n
    order = order or list(range(n))
    errors = {kind: model.errors(model.covariance(kind)) for kind in KINDS}
    for l in (*lags, automatic(n)):
        errors[f"hac {l}"] = model.errors(model.covariance("hac", lags=l, order=order))
    return {
        "names": model.names,
        "estimates": [float(b) for b in model.b],
        "errors": errors,
        "automatic_lags": automatic(n),
        "measures": model.measures(),
        "condition": model.condition(),
    }


def without(model, dropped, partners):
    """The partners' estimates and classical errors with one column left out."""
    names = [name for name in model.names if name != dropped]
    columns = [model.plain[model.names.index(name)] for name in names]
    y = [model.y[i] / sqrt(model.w[i]) for i in range(model.n)]
    again = Model(names, columns, y)
    errors = again.errors(again.covariance("classical"))
    return {
        "left_out": dropped,
        "coefficients": [
            {"name": name, "estimate": float(again.b[names.index(name)]), "standard_error": errors[names.index(name)]}
            for name in partners
        ],
    }


# ---------------------------------------------------------------- studentised range


def studentised_upper(q, k, df):
    """By scipy's own double integral (about 1e-12 absolutely), which shares nothing with the program's sum."""
    return mpf(float(studentized_range.sf(float(q), k, df)))


def studentised_quantile(tail, k, df):
    return mpf(float(studentized_range.isf(float(tail), k, df)))


def studentised_figures():
    upper = [
        {"q": q, "k": k, "df": df, "p": float(studentised_upper(q, k, df))}
        for k, df in ((2, 7), (3, 2), (3, 3), (3, 20), (4, 5), (5, 60), (10, 12), (15, 3), (15, 385))
        for q in (0.5, 2, 3.5, 8, 15)
    ]
    quantile = [
        {"p": p, "k": k, "df": df, "q": float(studentised_quantile(p, k, df))}
        for k, df in ((3, 2), (3, 20), (5, 60), (10, 12), (15, 385))
        for p in (0.1, 0.05, 0.01)
    ]
    return {"upper": upper, "quantile": quantile}


# ---------------------------------------------------------------- the sets


def longley_figures():
    names = ["intercept", "x1", "x2", "x3", "x4", "x5", "x6"]
    columns = [[mpf(1)] * 16] + [longley[name] for name in names[1:]]
    model = Model(names, columns, longley["y"])
    figures = common(model)
    # Stock and flow alike: x3 = x4, and x2 and x5 together zero.
    rows = [[0, 0, 0, 1, -1, 0, 0], [0, 0, 1, 0, 0, 0, 0], [0, 0, 0, 0, 0, 1, 0]]
    figures["single"] = {}
    figures["joint"] = {}
    for kind in ("classical", "hc3"):
        v = model.covariance(kind)
        estimate, error = model.combined(rows[0], v)
        t = (estimate - mpf(float(-0.5))) / error
        half = t_quantile(mpf(1) - mpf(0.95), model.df) * error
        figures["single"][kind] = {
            "estimate": float(estimate),
            "standard_error": float(error),
            "t": float(t),
            "p_value": float(t_two_sided(t, model.df)),
            "lower": float(estimate - half),
            "upper": float(estimate + half),
        }
        figures["joint"][kind] = model.wald(rows[1:], [0, mpf(0.25)], v, model.df)
    figures["simultaneous"] = {
        "bonferroni": float(t_quantile((1 - mpf(0.95)) / 7, model.df)),
        "scheffe": float(sqrt(7 * f_quantile(1 - mpf(0.95), 7, model.df))),
    }
    figures["without"] = [without(model, "x6", ["x2", "x3"]), without(model, "x2", ["x3", "x6"])]
    return figures


def hald_figures():
    names = ["intercept", "x1", "x2", "x3", "x4"]
    return common(Model(names, [[mpf(1)] * 13] + [hald[name] for name in names[1:]], hald["y"]))


def anscombe_figures():
    found = {}
    for key, x, y in (("1", "x", "y"), ("2", "x", "y2"), ("3", "x", "y3"), ("4", "x2", "y4")):
        model = Model(["intercept", "x"], [[mpf(1)] * 11, anscombe[x]], anscombe[y])
        found[key] = {"errors": {kind: model.errors(model.covariance(kind)) for kind in KINDS}}
    return found


def cars_columns():
    weight = numbers(row["weight"] for row in cars)
    power = numbers(row["horsepower"] for row in cars)
    year = numbers(row["first_sold"][:4] for row in cars)
    origin = [row["origin"] for row in cars]
    europe = [mpf(o == "Europe") for o in origin]
    japan = [mpf(o == "Japan") for o in origin]
    one = [mpf(1)] * len(cars)
    return one, weight, power, year, europe, japan, origin


def product(a, b):
    return [x * y for x, y in zip(a, b)]


def cars_figures():
    one, weight, power, year, europe, japan, origin = cars_columns()
    n = len(cars)
    economy = numbers(row["economy"] for row in cars)
    names = ["intercept", "weight", "horsepower", "model_year", "origin Europe", "origin Japan", "weight × origin Europe", "weight × origin Japan"]
    columns = [one, weight, power, year, europe, japan, product(weight, europe), product(weight, japan)]
    model = Model(names, columns, economy)
    order = sorted(range(n), key=lambda i: date.fromisoformat(cars[i]["first_sold"]))
    figures = common(model, order, (4,))
    years = [row["first_sold"][:4] for row in cars]
    cylinders = [row["cylinders"] for row in cars]
    covariances = {
        "classical": (model.covariance("classical"), model.df),
        "hc3": (model.covariance("hc3"), model.df),
        "by origin": (model.covariance("clustered", groups=origin), len(set(origin)) - 1),
        "by model_year": (model.covariance("clustered", groups=years), len(set(years)) - 1),
        "by cylinders": (model.covariance("clustered", groups=cylinders), len(set(cylinders)) - 1),
    }
    for name, (v, _) in covariances.items():
        if name.startswith("by"):
            figures["errors"][name] = model.errors(v)
    figures["clusters"] = {"by origin": len(set(origin)), "by model_year": len(set(years)), "by cylinders": len(set(cylinders))}
    # Joint tests of the terms of several columns.
    unit = lambda j: [mpf(j == k) for k in range(model.p)]
    figures["joint"] = {
        name: {
            term: model.wald([unit(j) for j in at], [0] * len(at), v, df)
            for term, at in (("origin", (4, 5)), ("weight × origin", (6, 7)))
        }
        for name, (v, df) in covariances.items()
        if name in ("classical", "hc3", "by model_year")
    }
    # Level means at the means of the other columns; the product columns at the level's own mean weight.
    means = [sum(column) / n for column in columns]
    level = {
        "USA": [one[0], means[1], means[2], means[3], 0, 0, 0, 0],
        "Europe": [one[0], means[1], means[2], means[3], 1, 0, means[1], 0],
        "Japan": [one[0], means[1], means[2], means[3], 0, 1, 0, means[1]],
    }
    figures["levels"] = {}
    for name in ("classical", "hc3", "by model_year"):
        v, df = covariances[name]
        t = t_quantile(1 - mpf(0.95), df)
        pairs = []
        for a, b in (("Europe", "USA"), ("Japan", "USA"), ("Japan", "Europe")):
            c = [x - y for x, y in zip(level[a], level[b])]
            estimate, error = model.combined(c, v)
            pairs.append({"level": a, "other": b, "estimate": estimate, "error": error, "p": t_two_sided(estimate / error, df)})
        ranked = sorted(pairs, key=lambda pair: pair["p"])
        most = mpf(0)
        for k, pair in enumerate(ranked):
            most = max(most, min(mpf(1), (3 - k) * pair["p"]))
            pair["holm"] = most
        reach = studentised_quantile(1 - mpf(0.95), 3, df) / sqrt(mpf(2))
        for pair in pairs:
            pair["tukey"] = studentised_upper(abs(pair["estimate"] / pair["error"]) * sqrt(mpf(2)), 3, df)
        shown = []
        for pair in pairs:
            estimate, error = pair["estimate"], pair["error"]
            shown.append(
                {
                    "level": pair["level"],
                    "other": pair["other"],
                    "estimate": float(estimate),
                    "standard_error": float(error),
                    "p_value": float(pair["p"]),
                    "holm": float(pair["holm"]),
                    "tukey": float(pair["tukey"]),
                    "lower": float(estimate - t * error),
                    "upper": float(estimate + t * error),
                    "tukey_lower": float(estimate - reach * error),
                    "tukey_upper": float(estimate + reach * error),
                }
            )
        figures["levels"][name] = {
            "means": [
                {
                    "level": key,
                    "rows": origin.count(key),
                    "estimate": float(model.combined(c, v)[0]),
                    "lower": float(model.combined(c, v)[0] - t * model.combined(c, v)[1]),
                    "upper": float(model.combined(c, v)[0] + t * model.combined(c, v)[1]),
                }
                for key, c in level.items()
            ],
            "pairs": shown,
        }
    # A prediction: the mean by each covariance, a new row with the classical s² beside it.
    x = [mpf(1), mpf(2100), mpf(68), mpf(1982), 0, 1, 0, mpf(2100)]
    figures["prediction"] = {}
    for name in ("hc3", "by model_year"):
        v, df = covariances[name]
        estimate, error = model.combined(x, v)
        t = t_quantile(1 - mpf(0.9), df)
        figures["prediction"][name] = {
            "estimate": float(estimate),
            "mean_lower": float(estimate - t * error),
            "mean_upper": float(estimate + t * error),
            "lower": float(estimate - t * sqrt(model.s2 + error**2)),
            "upper": float(estimate + t * sqrt(model.s2 + error**2)),
        }
    return figures


def weighted_figures():
    """Weights in proportion to horsepower: as good as any for a check."""
    one, weight, power, year, europe, japan, origin = cars_columns()
    economy = numbers(row["economy"] for row in cars)
    model = Model(["intercept", "weight", "model_year"], [one, weight, year], economy, power)
    figures = common(model, sorted(range(len(cars)), key=lambda i: cars[i]["first_sold"]), (4,))
    figures["errors"]["by model_year"] = model.errors(model.covariance("clustered", groups=[row["first_sold"][:4] for row in cars]))
    return figures


if __name__ == "__main__":
    figures = {
        "longley": longley_figures(),
        "hald": hald_figures(),
        "anscombe": anscombe_figures(),
        "cars": cars_figures(),
        "cars weighted": weighted_figures(),
    }
    (HERE / "figures.json").write_text(json.dumps(figures, indent=1, ensure_ascii=False) + "\n")
    (HERE / "studentised-range.json").write_text(json.dumps(studentised_figures(), indent=1) + "\n")
