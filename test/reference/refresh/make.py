"""Makes earlier.csv, later.csv, to-predict.csv and figures.json beside it. Run from the project's folder:

    /usr/bin/python3 test/reference/refresh/make.py

Needs python3 with mpmath and test/reference/penguins/penguins.csv. Every step between two records is a fit of its own
in 80-digit arithmetic; nothing here is read from the program.
"""

import csv
import os
import sys

HERE = os.path.dirname(os.path.abspath(__file__))
sys.dont_write_bytecode = True
sys.path.insert(0, os.path.dirname(HERE))
from least_squares import (  # noqa: E402
    betainc,
    cross,
    dot,
    exp,
    f_upper,
    findroot,
    invert,
    log,
    mp,
    mpf,
    number,
    sqrt,
    t_quantile,
    times,
    write,
)

HEADERS = ["bird", "species", "island", "sex", "flipper", "beak_length", "beak_depth", "body_mass"]
NUMBERS = ["flipper", "beak_length", "beak_depth", "body_mass"]
SPECIES = ["Adelie", "Chinstrap", "Gentoo"]
CONFIDENCE, INTERVAL = "0.9", "0.8"

# ---------------------------------------------------------------- the two files

with open(os.path.join(HERE, "..", "penguins", "penguins.csv"), encoding="utf-8", newline="") as file:
    birds = [
        {
            "bird": row["Bird"],
            "species": row["Species"],
            "island": row["Island"],
            "sex": row["Sex"] if row["Sex"] in ("MALE", "FEMALE") else "NA",
            "flipper": row["Flipper Length (mm)"],
            "beak_length": row["Beak Length (mm)"],
            "beak_depth": row["Beak Depth (mm)"],
            "body_mass": row["Body Mass (g)"],
        }
        for row in csv.DictReader(file)
    ]
whole = lambda row: all(row[name] != "NA" for name in HEADERS)

# Before: no Gentoo yet, and two birds of three of the others. One has lost its mass.
earlier = [dict(row) for row in birds if row["species"] != "Gentoo" and int(row["bird"]) % 3 != 0]
next(row for row in earlier if row["bird"] == "40")["body_mass"] = "NA"

# Now: some are gone, the rest of them has come, and with them every fourth Gentoo; the order is another.
later = [
    dict(row)
    for row in reversed(birds)
    if (int(row["bird"]) % 4 == 0 if row["species"] == "Gentoo" else int(row["bird"]) % 17 != 5)
]
REVISE = {
    "1": {"body_mass": "4050"},
    "2": {"body_mass": "3650", "flipper": "197"},
    "7": {"beak_depth": "19.6"},
    "13": {"species": "Chinstrap"},
    "155": {"sex": "FEMALE"},
    "160": {"flipper": "201"},
    "163": {"body_mass": "3550", "beak_length": "42.9"},
    "170": {"flipper": "NA"},
}
for row in later:
    row.update(REVISE.get(row["bird"], {}))
to_predict = [row for row in later if row["species"] != "Gentoo" and whole(row)][::2]


def save(name, rows, headers):
    with open(os.path.join(HERE, name), "w", encoding="utf-8", newline="") as file:
        out = csv.DictWriter(file, headers, extrasaction="ignore", lineterminator="\n")
        out.writeheader()
        out.writerows(rows)


save("earlier.csv", earlier, HEADERS)
save("later.csv", later, HEADERS)
save("to-predict.csv", to_predict, [name for name in HEADERS if name != "body_mass"])


def used(rows):
    return [
        {name: number(row[name]) if name in NUMBERS else row[name] for name in HEADERS} for row in rows if whole(row)
    ]


old, new = used(earlier), used(later)

# ---------------------------------------------------------------- fits


class Fit:
    """flipper, long, sex, species and flipper × species, without the columns that are zero in every row."""

    def __init__(self, rows, weights="beak_depth", shift=0, scale=log):
        self.scale, self.weights, self.shift = scale, weights, shift
        levels = [s for s in SPECIES[1:] if any(row["species"] == s for row in rows)]
        self.columns = {
            "intercept": lambda row: mpf(1),
            "flipper": lambda row: row["flipper"],
            "long": lambda row: log(row["beak_length"] + shift),
            "sex": lambda row: mpf(row["sex"] == "MALE"),
            **{f"species {s}": lambda row, s=s: mpf(row["species"] == s) for s in levels},
            **{
                f"flipper × species {s}": lambda row, s=s: row["flipper"] * (row["species"] == s) for s in levels
            },
        }
        self.names = list(self.columns)
        root = [sqrt(row[weights]) for row in rows]
        x = [[v * r for v in self.at(row)] for row, r in zip(rows, root)]
        y = [[scale(row["body_mass"]) * r] for row, r in zip(rows, root)]
        self.inverse = invert(cross(x, x))
        self.b = times(self.inverse, [v[0] for v in cross(x, y)])
        self.n, self.p = len(rows), len(self.names)
        self.df = self.n - self.p
        e = [v[0] - dot(row, self.b) for v, row in zip(y, x)]
        self.own = [scale(row["body_mass"]) - dot(self.at(row), self.b) for row in rows]
        self.rss = dot(e, e)
        self.s2 = self.rss / self.df
        # HC3 (MacKinnon & White 1985) of the weighted rows.
        h = [dot(row, times(self.inverse, row)) for row in x]
        scores = [[v * u / (1 - g) for v in row] for row, u, g in zip(x, e, h)]
        middle = cross(scores, scores)
        half = [times(middle, column) for column in self.inverse]
        self.v = [times(self.inverse, row) for row in half]
        self.error = {name: sqrt(self.v[j][j]) for j, name in enumerate(self.names)}
        self.estimate = dict(zip(self.names, self.b))

    def at(self, row):
        return [value(row) for value in self.columns.values()]

    def variance_of(self, x):
        return dot(x, times(self.v, x))


def binomial_interval(k, n, confidence):
    """Clopper & Pearson 1934, each end solved from the tail that it makes equal to half the rest."""
    tail = (1 - mpf(confidence)) / 2
    at_least = lambda share, k: betainc(k, n - k + 1, 0, share, regularized=True)
    near = mpf(k) / n
    solve = lambda f, low, high: findroot(f, (low, high), solver="anderson", tol=mpf(10) ** -30)
    with mp.workdps(40):
        low = mpf(0) if k == 0 else solve(lambda s: at_least(s, k) - tail, near / 4, near)
        high = mpf(1) if k == n else solve(lambda s: 1 - at_least(s, k + 1) - tail, near, (1 + 3 * near) / 4)
    return [low, high]


# ---------------------------------------------------------------- the comparison

before, now = {row["bird"]: row for row in old}, {row["bird"]: row for row in new}
kept = [bird for bird in before if bird in now]
revised_cells = {
    name: sorted((bird for bird in kept if before[bird][name] != now[bird][name]), key=int)
    for name in HEADERS
}
revised = {bird for cells in revised_cells.values() for bird in cells}
added = [row for row in new if row["bird"] not in before]
steps = [
    Fit(old),
    Fit([before[bird] for bird in kept]),
    Fit([now[bird] for bird in kept]),
    Fit(new),
]


def compared(fits):
    """Each coefficient by the five fits from the earlier rows to the later declaration."""
    first, last = fits[0], fits[-1]
    result = []
    for name in last.names:
        at = [fit.estimate.get(name) for fit in fits]
        there = None not in at
        result.append(
            {
                "name": name,
                "before": at[0],
                "before_standard_error": first.error.get(name),
                "after": at[-1],
                "after_standard_error": last.error[name],
                "difference": at[-1] - at[0] if there else None,
                "parts": {
                    part: at[k + 1] - at[k]
                    for k, part in enumerate(["removed", "revised", "added", "declaration"])
                }
                if there
                else None,
                "in_standard_errors": (at[-1] - at[0]) / first.error[name] if there else None,
            }
        )
    return result


model = steps[0]
scored = [row for row in added if row["species"] != "Gentoo"]
reach = t_quantile(INTERVAL, model.df)
errors, inside = [], 0
for row in scored:
    x = model.at(row)
    centre = dot(x, model.b)
    # The mean on the own scale by smearing (Duan 1983), over unweighted residuals.
    errors.append(row["body_mass"] - mp.fsum(exp(centre + e) for e in model.own) / model.n)
    half = reach * sqrt(model.s2 / row["beak_depth"] + model.variance_of(x))
    inside += exp(centre - half) <= row["body_mass"] <= exp(centre + half)
pooled, alone = Fit(old + scored), Fit(scored)
apart = model.rss + alone.rss


def f_test(extra, df1, rest, df2):
    statistic = extra / df1 / (rest / df2)
    return {"statistic": statistic, "df1": df1, "df2": df2, "p_value": f_upper(statistic, df1, df2)}


new_rows = {
    "rows": len(added),
    "scored": len(scored),
    "bias": mp.fsum(errors) / len(errors),
    "root_mean_squared_error": sqrt(dot(errors, errors) / len(errors)),
    "inside": inside,
    "share": binomial_interval(inside, len(scored), CONFIDENCE),
    # Chow 1960, first and second test.
    "same_surface": f_test(
        pooled.rss - apart, model.p + alone.p - pooled.p, apart, model.n + alone.n - model.p - alone.p
    ),
    "predictive": f_test(pooled.rss - model.rss, alone.n, model.rss, model.df),
}

# ---------------------------------------------------------------- totals of rows to be predicted

natural = Fit(old, scale=lambda y: y)


def total(rows):
    """Variance Σ s²/w + 1′XVX′1: rows share the coefficients' errors, and each has its own."""
    x = [mp.fsum(column) for column in zip(*(natural.at(row) for row in rows))]
    centre = dot(x, natural.b)
    half = t_quantile(INTERVAL, natural.df) * sqrt(
        mp.fsum(natural.s2 / row["beak_depth"] for row in rows) + natural.variance_of(x)
    )
    return {"rows": len(rows), "estimate": centre, "lower": centre - half, "upper": centre + half}


rows = used(to_predict)
islands = list(dict.fromkeys(row["island"] for row in rows))

write(
    os.path.join(HERE, "figures.json"),
    {
        "rows": {
            "kept": len(kept) - len(revised),
            "revised": len(revised),
            "added": len(added),
            "removed": len(old) - len(kept),
            "removed_rows": [row["bird"] for row in old if row["bird"] not in now][:20],
            "revised_cells": {name: cells for name, cells in revised_cells.items() if cells},
        },
        "residual_standard_error": {"before": sqrt(model.s2), "after": sqrt(steps[-1].s2)},
        "refreshed": compared([*steps, steps[-1]]),
        "redeclared": compared([*steps, Fit(new, weights="beak_length", shift=2)]),
        "new_rows": new_rows,
        "totals": [
            {"group": None, **total(rows)},
            *({"group": name, **total([row for row in rows if row["island"] == name])} for name in islands),
        ],
    },
)
