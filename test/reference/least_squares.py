"""Least squares in 80-digit arithmetic, written apart from the program it checks.

Shares no code, no language and no algorithm with src/: sums of products and a Cholesky-like elimination in
mpmath numbers with 80 digits, where the program uses orthogonal factors of doubles. The normal equations lose
at most half of the digits, which leaves more than 40. All formulas are those of the project's definitions,
typed again from the sources named there; every result is rounded to a double only when it is written.

Data values are taken as the doubles nearest to the decimal text, since that is what any program reads.
"""

import json
from mpmath import mp, mpf, matrix, sqrt, log, exp, pi, betainc, gammainc, findroot, eigsy

mp.dps = 80


def number(text):
    """The double nearest to a decimal text or JSON number, as an exact mpf."""
    return mpf(float(text))


# ---------------------------------------------------------------- distributions


def f_upper(f, d1, d2):
    """P(F > f), Abramowitz & Stegun 26.6.2."""
    return betainc(mpf(d2) / 2, mpf(d1) / 2, 0, mpf(d2) / (d2 + d1 * f), regularized=True)


def t_two_sided(t, df):
    """P(|T| > |t|)."""
    return betainc(mpf(df) / 2, mpf(1) / 2, 0, mpf(df) / (df + t * t), regularized=True)


def chi_squared_upper(x, df):
    """P(chi squared > x), Abramowitz & Stegun 26.4.2."""
    return gammainc(mpf(df) / 2, mpf(x) / 2, mp.inf, regularized=True)


_quantiles = {}


def t_quantile(confidence, df):
    """The t with P(|T| < t) = confidence."""
    key = (str(confidence), df)
    if key not in _quantiles:
        tail = 1 - mpf(str(confidence))
        with mp.workdps(50):
            _quantiles[key] = findroot(lambda t: t_two_sided(t, df) - tail, mpf(2), tol=mpf(10) ** -40)
    return _quantiles[key]


# ---------------------------------------------------------------- columns

SUPERSCRIPT = {1: "", 2: "²", 3: "³", 4: "⁴"}


class Data:
    """Named columns (lists of mpf, or of str for a category) over the common rows."""

    def __init__(self, rows, categories):
        self.rows = rows  # list of dicts: name -> mpf or str
        self.categories = categories  # name -> levels, baseline first


def term_columns(term, data):
    """A term as a list of (column name, function of a row). The shapes are those of a study file."""
    if isinstance(term, str):
        if term in data.categories:
            return [
                (f"{term} {level}", lambda row, level=level: mpf(row[term] == level))
                for level in data.categories[term][1:]
            ]
        return [(term, lambda row: row[term])]
    if "interaction" in term:
        products = [("", lambda row: mpf(1))]
        for member in term["interaction"]:
            products = [
                (f"{left} × {right}" if left else right, lambda row, f=f, g=g: f(row) * g(row))
                for left, f in products
                for right, g in term_columns(member, data)
            ]
        return products
    if "polynomial" in term:
        x = term["polynomial"]
        return [(x + SUPERSCRIPT[k], lambda row, k=k: row[x] ** k) for k in range(1, term["degree"] + 1)]
    if "power" in term:
        x, k = term["power"], term["to"]
        return [(x + SUPERSCRIPT[k], lambda row: row[x] ** k)]
    if "bend" in term:
        x, at, side = term["bend"], number(term["at"]), term.get("side", "above")
        sign = 1 if side == "above" else -1
        return [(f"{x} {side} {term['at']}", lambda row: max(mpf(0), sign * (row[x] - at)))]
    if "spline" in term:
        # Natural cubic spline, Hastie, Tibshirani & Friedman, The Elements of Statistical Learning, 5.2.1.
        x, knots = term["spline"], [number(k) for k in term["knots"]]
        last = knots[-1]

        def d(value, j):
            return (max(mpf(0), value - knots[j]) ** 3 - max(mpf(0), value - last) ** 3) / (last - knots[j])

        curved = [
            (f"{x}, curve {j + 1}", lambda row, j=j: d(row[x], j) - d(row[x], len(knots) - 2))
            for j in range(len(knots) - 2)
        ]
        return [(x, lambda row: row[x])] + curved
    raise ValueError(term)


def term_name(term):
    if isinstance(term, str):
        return term
    if "interaction" in term:
        return " × ".join(term_name(member) for member in term["interaction"])
    if "polynomial" in term:
        return f"{term['polynomial']}, degree {term['degree']}"
    if "power" in term:
        return term["power"] + SUPERSCRIPT[term["to"]]
    if "bend" in term:
        return f"{term['bend']} {term.get('side', 'above')} {term['at']}"
    return f"{term['spline']}, spline"


class Model:
    """A candidate: its columns in the order in which its terms name them, the intercept first."""

    def __init__(self, candidate, data, default_scale="natural"):
        self.name = candidate["name"]
        self.scale = candidate.get("scale", default_scale)
        self.intercept = candidate.get("intercept", True)
        self.columns = [("intercept", lambda row: mpf(1))] if self.intercept else []
        self.terms = []
        for term in candidate["terms"]:
            own = []
            for name, value in term_columns(term, data):
                if name not in [c[0] for c in self.columns]:
                    self.columns.append((name, value))
                own.append(name)
            self.terms.append((term_name(term), own))
        self.names = [c[0] for c in self.columns]

    def design(self, rows):
        return [[value(row) for _, value in self.columns] for row in rows]


# ---------------------------------------------------------------- linear algebra on lists of mpf


def cross(a, b):
    """A'B for lists of rows."""
    return [[mp.fsum(x[i] * y[j] for x, y in zip(a, b)) for j in range(len(b[0]))] for i in range(len(a[0]))]


def invert(a):
    """Inverse of a positive definite matrix by Gauss-Jordan elimination."""
    n = len(a)
    m = [list(row) + [mpf(i == j) for j in range(n)] for i, row in enumerate(a)]
    for i in range(n):
        pivot = max(range(i, n), key=lambda r: abs(m[r][i]))
        m[i], m[pivot] = m[pivot], m[i]
        scale = m[i][i]
        m[i] = [v / scale for v in m[i]]
        for r in range(n):
            if r != i and m[r][i] != 0:
                factor = m[r][i]
                m[r] = [v - factor * w for v, w in zip(m[r], m[i])]
    return [row[n:] for row in m]


def determinant(a):
    return mp.det(matrix(a))


def times(a, v):
    return [mp.fsum(x * y for x, y in zip(row, v)) for row in a]


def dot(a, b):
    return mp.fsum(x * y for x, y in zip(a, b))


def orthogonal_basis(columns):
    """Gram-Schmidt with exact dependents left out: a basis of the span."""
    basis = []
    for column in columns:
        length = sqrt(dot(column, column))
        rest = column
        for _ in range(2):
            for q in basis:
                c = dot(q, rest)
                rest = [v - c * w for v, w in zip(rest, q)]
        size = sqrt(dot(rest, rest))
        if size > length * mpf(10) ** -25:
            basis.append([v / size for v in rest])
    return basis


def inside(column, basis):
    rest = column
    for _ in range(2):
        for q in basis:
            c = dot(q, rest)
            rest = [v - c * w for v, w in zip(rest, q)]
    return sqrt(dot(rest, rest)) <= sqrt(dot(column, column)) * mpf(10) ** -25


# ---------------------------------------------------------------- the fit

FORWARD = {"natural": lambda y: y, "log": log, "sqrt": sqrt}
BACKWARD = {"natural": lambda z: z, "log": exp, "sqrt": lambda z: z * z}


def jacobian(scale, y):
    """Log-Jacobian of the response's scale (Box & Cox 1964)."""
    if scale == "log":
        return -mp.fsum(log(v) for v in y)
    if scale == "sqrt":
        return mp.fsum(log(1 / (2 * sqrt(v))) for v in y)
    return mpf(0)


class Fitted:
    def __init__(self, model, data, response, weights=None):
        self.model = model
        rows = data.rows
        n, p = len(rows), len(model.names)
        own_y = [row[response] for row in rows]
        y = [FORWARD[model.scale](v) for v in own_y]
        w = [row[weights] for row in rows] if weights else [mpf(1)] * n
        root = [sqrt(v) for v in w]
        x = model.design(rows)
        xw = [[v * r for v in row] for row, r in zip(x, root)]
        yw = [[v * r] for v, r in zip(y, root)]
        gram = cross(xw, xw)
        self.inverse = invert(gram)
        self.b = times(self.inverse, [v[0] for v in cross(xw, yw)])
        self.n, self.p, self.x, self.xw, self.w = n, p, x, xw, w
        self.raw_e = [v - dot(row, self.b) for v, row in zip(y, x)]
        self.e = [v * r for v, r in zip(self.raw_e, root)]
        self.rss = dot(self.e, self.e)
        centre = dot(w, y) / mp.fsum(w) if model.intercept else mpf(0)
        self.tss = mp.fsum(v * (u - centre) ** 2 for v, u in zip(w, y))
        self.df = n - p
        self.s2 = self.rss / self.df
        self.h = [dot(row, times(self.inverse, row)) for row in xw]
        self.press = mp.fsum((e / (1 - h)) ** 2 for e, h in zip(self.e, self.h))
        self.log_likelihood = (
            -mpf(n) / 2 * (log(2 * pi) + log(self.rss / n) + 1)
            + mp.fsum(log(v) for v in w) / 2
            + jacobian(model.scale, own_y)
        )
        self.gram = gram

    def criteria(self):
        n, p, k = self.n, self.p, self.p + 1
        minus2 = -2 * self.log_likelihood
        total_df = n - 1 if self.model.intercept else n
        r2 = 1 - self.rss / self.tss
        df1 = p - 1 if self.model.intercept else p
        f = ((self.tss - self.rss) / df1) / self.s2
        return {
            "residual_sum_of_squares": self.rss,
            "total_sum_of_squares": self.tss,
            "residual_standard_error": sqrt(self.s2),
            "degrees_of_freedom": self.df,
            "r_squared": r2,
            "adjusted_r_squared": 1 - (self.rss / self.df) / (self.tss / total_df),
            "press": self.press,
            "predicted_r_squared": 1 - self.press / self.tss,
            "log_likelihood": self.log_likelihood,
            "aic": minus2 + 2 * k,
            "aicc": minus2 + 2 * k + mpf(2 * k * (k + 1)) / (n - k - 1),
            "bic": minus2 + k * log(n),
            "overall_f": {"statistic": f, "df1": df1, "df2": self.df, "p_value": f_upper(f, df1, self.df)},
        }

    def coefficients(self, confidence):
        reach = t_quantile(confidence, self.df)
        vif = self.vif()
        result = []
        for j, name in enumerate(self.model.names):
            se = sqrt(self.s2 * self.inverse[j][j])
            t = self.b[j] / se
            result.append(
                {
                    "name": name,
                    "estimate": self.b[j],
                    "standard_error": se,
                    "t": t,
                    "p_value": t_two_sided(t, self.df),
                    "lower": self.b[j] - reach * se,
                    "upper": self.b[j] + reach * se,
                    "vif": vif.get(name),
                }
            )
        return result

    def predictor_cross(self):
        """Names of the columns without the intercept and their (weighted, centred) sums of products."""
        names = [n for n in self.model.names if n != "intercept"]
        at = [self.model.names.index(n) for n in names]
        if not self.model.intercept:
            return names, [[self.gram[i][j] for j in at] for i in at]
        total = self.gram[0][0]
        return names, [[self.gram[i][j] - self.gram[0][i] * self.gram[0][j] / total for j in at] for i in at]

    def vif(self):
        """Marquardt 1970: 1/(1 − R_j²), which is the diagonal of the inverse times the sum of squares."""
        names, c = self.predictor_cross()
        if len(names) < 2:
            return {}
        back = invert(c)
        return {name: c[j][j] * back[j][j] for j, name in enumerate(names)}

    def generalised_vif(self, own):
        """Fox & Monette 1992: det R11 · det R22 / det R of the correlations of the columns."""
        names, c = self.predictor_cross()
        r = [[c[i][j] / sqrt(c[i][i] * c[j][j]) for j in range(len(names))] for i in range(len(names))]
        inner = [names.index(n) for n in own]
        outer = [i for i in range(len(names)) if i not in inner]
        if not outer:
            return mpf(1)
        part = lambda at: [[r[i][j] for j in at] for i in at]
        return determinant(part(inner)) * determinant(part(outer)) / determinant(r)

    def joint_f(self, own):
        """Wald form b1′ V11⁻¹ b1 / (q s²) for the columns of one term."""
        at = [self.model.names.index(n) for n in own]
        v = invert([[self.inverse[i][j] for j in at] for i in at])
        b = [self.b[i] for i in at]
        f = dot(b, times(v, b)) / (len(at) * self.s2)
        return {"statistic": f, "df1": len(at), "df2": self.df, "p_value": f_upper(f, len(at), self.df)}

    def condition_number(self):
        """Belsley, Kuh & Welsch 1980: columns with the intercept scaled to unit length, not centred."""
        p = self.p
        r = matrix(p, p)
        for i in range(p):
            for j in range(p):
                r[i, j] = self.gram[i][j] / sqrt(self.gram[i][i] * self.gram[j][j])
        values = eigsy(r, eigvals_only=True)
        return sqrt(max(values) / min(values))

    def terms(self):
        result = []
        for name, own in self.model.terms:
            own = list(dict.fromkeys(own))
            several = len(self.model.names) - int(self.model.intercept) > 1
            g = self.generalised_vif(own) if several else None
            result.append(
                {
                    "name": name,
                    "columns": own,
                    "joint_f": self.joint_f(own),
                    "generalised_vif": g,
                    "generalised_vif_per_column": None if g is None else g ** (mpf(1) / (2 * len(own))),
                }
            )
        return result

    def influence(self, lines, count=5):
        """The rows of the largest Cook's distance, largest first."""
        s = sqrt(self.s2)
        rows = [
            {
                "row": lines[i],
                "residual": e,
                "leverage": h,
                "standardised_residual": e / (s * sqrt(1 - h)),
                "cooks_distance": e * e * h / (self.p * self.s2 * (1 - h) ** 2),
            }
            for i, (e, h) in enumerate(zip(self.e, self.h))
        ]
        return sorted(rows, key=lambda r: -r["cooks_distance"])[:count]

    def durbin_watson(self):
        """Durbin & Watson 1950, rows as they stand."""
        return mp.fsum((b - a) ** 2 for a, b in zip(self.e, self.e[1:])) / self.rss

    def breusch_pagan(self):
        """Koenker 1981: n R² of the squared residuals on all design columns, χ² on p − 1."""
        square = [e * e for e in self.e]
        back = invert(cross(self.x, self.x))
        b = times(back, [v[0] for v in cross(self.x, [[v] for v in square])])
        mean = mp.fsum(square) / self.n
        rest = mp.fsum((v - dot(row, b)) ** 2 for v, row in zip(square, self.x))
        statistic = self.n * (1 - rest / mp.fsum((v - mean) ** 2 for v in square))
        return {"statistic": statistic, "df": self.p - 1, "p_value": chi_squared_upper(statistic, self.p - 1)}

    def predict(self, rows, interval, weight=None):
        """Each row's estimate with the intervals for the mean and for a new row (of the given weight)."""
        reach = t_quantile(interval, self.df)
        back = BACKWARD[self.model.scale]
        result = []
        for row in rows:
            x = [value(row) for _, value in self.model.columns]
            centre = dot(x, self.b)
            h = dot(x, times(self.inverse, x))
            mean_se = sqrt(self.s2 * h)
            new_se = sqrt(self.s2 * (h + 1 / (weight(row) if weight else mpf(1))))
            natural = self.model.scale == "natural"
            result.append(
                {
                    "label": row["label"],
                    "estimate": back(centre),
                    "mean": None if natural else mp.fsum(back(centre + e) for e in self.raw_e) / self.n,
                    "mean_lower": back(centre - reach * mean_se),
                    "mean_upper": back(centre + reach * mean_se),
                    "lower": back(centre - reach * new_se),
                    "upper": back(centre + reach * new_se),
                    "leverage": h,
                }
            )
        return result

    def predict_total(self, rows, interval):
        """The sum over rows on the natural scale: variance m s² + s² 1′X*(X′X)⁻¹X*′1."""
        reach = t_quantile(interval, self.df)
        total = [mp.fsum(value(row) for row in rows) for _, value in self.model.columns]
        centre = dot(total, self.b)
        se = sqrt(self.s2 * (len(rows) + dot(total, times(self.inverse, total))))
        return {"rows": len(rows), "estimate": centre, "lower": centre - reach * se, "upper": centre + reach * se}


def study_fixtures(candidates, data, lines, response, predict_rows, *, scale="natural", weights=None,
                   confidence="0.95", interval="0.9"):
    """Everything about every candidate of one study, and what holds between them."""
    fits = [Fitted(Model(c, data, scale), data, response, weights) for c in candidates]
    root = [sqrt(row[weights]) for row in data.rows] if weights else [mpf(1)] * len(data.rows)
    columns = {
        f.model.name: [[row[j] * r for row, r in zip(f.x, root)] for j in range(f.p)] for f in fits
    }
    bases = {f.model.name: orthogonal_basis(columns[f.model.name]) for f in fits}

    # s² of the union of all terms of all candidates, for each response scale (Mallows 1973).
    union = {}
    for f in fits:
        for name, column in zip(f.model.names, columns[f.model.name]):
            union.setdefault(name, column)
    union_basis = orthogonal_basis(list(union.values()))
    full = {}
    for f in fits:
        if f.model.scale not in full:
            yw = [FORWARD[f.model.scale](row[response]) * r for row, r in zip(data.rows, root)]
            rest = yw
            for _ in range(2):
                for q in union_basis:
                    c = dot(q, rest)
                    rest = [v - c * u for v, u in zip(rest, q)]
            full[f.model.scale] = dot(rest, rest) / (f.n - len(union_basis))

    result = {"rows": len(data.rows), "confidence": float(confidence), "interval": float(interval), "candidates": []}
    for f in fits:
        entry = {"name": f.model.name, "scale": f.model.scale, "intercept": f.model.intercept,
                 "coefficient_count": f.p}
        entry.update(f.criteria())
        entry["mallows_cp"] = f.rss / full[f.model.scale] - f.n + 2 * f.p
        entry["condition_number"] = f.condition_number()
        vif = f.vif()
        entry["largest_vif"] = max(vif.values()) if vif else None
        entry["coefficients"] = f.coefficients(confidence)
        entry["terms"] = f.terms()
        entry["influential_rows"] = f.influence(lines)
        entry["durbin_watson"] = f.durbin_watson()
        entry["breusch_pagan"] = f.breusch_pagan() if f.model.intercept else None
        weight = (lambda row: row[weights]) if weights else None
        entry["predictions"] = f.predict(predict_rows, interval, weight)
        if weights:
            entry["predictions_at_weight_1"] = f.predict(predict_rows, interval)
        if f.model.scale == "natural" and not weights:
            entry["prediction_total"] = f.predict_total(predict_rows, interval)
        result["candidates"].append(entry)

    result["partial_f"] = []
    for small in fits:
        for large in fits:
            if small.p >= large.p or small.model.scale != large.model.scale:
                continue
            if all(inside(c, bases[large.model.name]) for c in columns[small.model.name]):
                df1 = large.p - small.p
                f = ((small.rss - large.rss) / df1) / large.s2
                result["partial_f"].append(
                    {"smaller": small.model.name, "larger": large.model.name, "statistic": f, "df1": df1,
                     "df2": large.df, "p_value": f_upper(f, df1, large.df)}
                )
    return result


def plain(value):
    """mpf to the nearest double, everything else as it is."""
    if isinstance(value, dict):
        return {k: plain(v) for k, v in value.items()}
    if isinstance(value, (list, tuple)):
        return [plain(v) for v in value]
    return float(value) if isinstance(value, mpf) else value


def write(path, fixtures):
    with open(path, "w", encoding="utf-8") as file:
        json.dump(plain(fixtures), file, ensure_ascii=False, indent=1, allow_nan=False)
        file.write("\n")
    print(path)
