"""Makes cars.json: errors of held-out cars by fitting again without them. Run from the project's folder:

    /usr/bin/python3 test/reference/validation/make.py

Needs python3 with numpy; reads ../cars/cars.csv. Every fit is LAPACK's least squares on columns scaled to unit length, from the rows
themselves; the random numbers are drawn by a second writing of the published generator (xoshiro128**, Blackman & Vigna 2021).
Shares nothing with the program.
"""

import csv
import json
import os

import numpy as np

HERE = os.path.dirname(os.path.abspath(__file__))
MASK = 0xFFFFFFFF


def mixed(word):
    h = word & MASK
    h = ((h ^ (h >> 16)) * 0x85EBCA6B) & MASK
    h = ((h ^ (h >> 13)) * 0xC2B2AE35) & MASK
    return h ^ (h >> 16)


class Generator:
    def __init__(self, seed, stream=0):
        walk = seed ^ mixed(stream)
        self.s = []
        for _ in range(4):
            walk = (walk + 0x9E3779B9) & MASK
            self.s.append(mixed(walk))

    def bits(self):
        rotated = lambda x, k: ((x << k) | (x >> (32 - k))) & MASK
        s = self.s
        result = (rotated((s[1] * 5) & MASK, 7) * 9) & MASK
        t = (s[1] << 9) & MASK
        s[2] ^= s[0]
        s[3] ^= s[1]
        s[1] ^= s[2]
        s[0] ^= s[3]
        s[2] ^= t
        s[3] = rotated(s[3], 11)
        return result

    def below(self, n):
        high = self.bits() >> 5
        return int((high * 67108864 + (self.bits() >> 6)) / 9007199254740992 * n)

    def shuffled(self, n):
        order = list(range(n))
        for i in range(n - 1, 0, -1):
            j = self.below(i + 1)
            order[i], order[j] = order[j], order[i]
        return order


with open(os.path.join(HERE, "..", "cars", "cars.csv"), encoding="utf-8") as file:
    rows = [row for row in csv.DictReader(file) if row["economy"] and row["horsepower"]]
n = len(rows)
column = lambda name: np.array([float(row[name]) for row in rows])
economy, weight, horsepower, acceleration = map(column, ["economy", "weight", "horsepower", "acceleration"])
sold = [row["first_sold"] for row in rows]
year = np.array([float(text[:4]) for text in sold])
origin = [row["origin"] for row in rows]
one = np.ones(n)
level = lambda name: np.array([1.0 if value == name else 0.0 for value in origin])

CANDIDATES = {
    "Numbers": ("natural", [one, weight, horsepower, year]),
    "Curved": ("natural", [one, weight, weight**2, horsepower, year]),
    "Weight": ("natural", [one, weight]),
    "Origin": ("natural", [one, weight, horsepower, year, level("Europe"), level("Japan")]),
    "Numbers, log": ("log", [one, weight, horsepower, year]),
    "Numbers, root": ("sqrt", [one, weight, horsepower, year]),
}
TO = {"natural": lambda y: y, "log": np.log, "sqrt": np.sqrt}
BACK = {"natural": lambda z: z, "log": np.exp, "sqrt": lambda z: np.where(z < 0, 0, z) ** 2}


def solve(x, y, w):
    root = np.sqrt(w)
    lengths = np.linalg.norm(x * root[:, None], axis=0)
    b, _, rank, _ = np.linalg.lstsq(x * root[:, None] / lengths, y * root, rcond=1e-13)
    assert rank == x.shape[1]
    return b / lengths


def held_out_errors(name, training, held, w):
    scale, columns = CANDIDATES[name]
    x = np.column_stack(columns)
    y = TO[scale](economy)
    b = solve(x[training], y[training], w[training])
    residuals = y[training] - x[training] @ b
    z = x[held] @ b
    if scale == "natural":
        return economy[held] - z
    return economy[held] - np.array([np.mean(BACK[scale](value + residuals)) for value in z])


def partition(order, k):
    parts = [[] for _ in range(k)]
    for position, row in enumerate(order):
        parts[position % k].append(row)
    return [sorted(part) for part in parts]


def rest_of(part):
    inside = set(part)
    return [row for row in range(n) if row not in inside]


def figures(name, sets, w):
    """sets: for each repeat a list of (training, held)."""
    squares, errors, weights, variances = 0.0, 0.0, 0.0, []
    for folds in sets:
        s, v = [], []
        for training, held in folds:
            e = held_out_errors(name, training, held, w)
            s.append(np.sum(w[held] * e**2))
            v.append(np.sum(w[held]))
            errors += np.sum(w[held] * e)
        s, v = np.array(s), np.array(v)
        squares += s.sum()
        weights += v.sum()
        k = len(s)
        variances.append(k / (k - 1) * np.sum((s - s.sum() / v.sum() * v) ** 2) / v.sum() ** 2)
    held = [row for folds in sets for _, part in folds for row in part]
    mean = np.sum(w[held] * economy[held]) / np.sum(w[held])
    mse = squares / weights
    return {
        "rows": len(held),
        "mean_squared_error": mse,
        "root_mean_squared_error": np.sqrt(mse),
        "standard_error": np.sqrt(np.mean(variances)),
        "mean_error": errors / weights,
        "cv_rmse_percent": 100 * np.sqrt(mse) / mean,
        "mean_bias_percent": 100 * errors / weights / mean,
    }


generator = Generator(5)
by_rows = [[(rest_of(part), part) for part in partition(generator.shuffled(n), 10)] for _ in range(2)]
by_group = [[(rest_of(part), part) for part in ([i for i in range(n) if origin[i] == g] for g in dict.fromkeys(origin))]]
times = sorted(set(sold))
at = {time: [i for i in range(n) if sold[i] == time] for time in times}
START, HORIZON = 4, 2
by_time = [
    [
        (
            sorted(row for time in times[:k] for row in at[time]),
            sorted(row for time in times[k : k + HORIZON] for row in at[time]),
        )
        for k in range(START, len(times), HORIZON)
    ]
]
one_out = [[(rest_of([row]), [row]) for row in range(n)]]

ones = np.ones(n)
result = {"schemes": {}}
for scheme, sets in {"rows": by_rows, "group": by_group, "time": by_time, "leave_one_out": one_out}.items():
    for weighted in [False, True]:
        w = acceleration if weighted else ones
        out = {}
        for name in CANDIDATES:
            # Without one origin its cars cannot be predicted by a candidate with that category.
            out[name] = None if scheme == "group" and name == "Origin" else figures(name, sets, w)
        result["schemes"][scheme + (", weighted" if weighted else "")] = out


# The whole procedure: AICc among the natural candidates, chosen anew without each of 8 parts drawn with seed 3.
def aicc(name, training):
    x = np.column_stack(CANDIDATES[name][1])[training]
    y = economy[training]
    rss = np.sum((y - x @ solve(x, y, np.ones(len(y)))) ** 2)
    m, k = len(y), x.shape[1] + 1
    return m * (np.log(2 * np.pi * rss / m) + 1) + 2 * k + 2 * k * (k + 1) / (m - k - 1)


NATURAL = ["Numbers", "Curved", "Weight", "Origin"]
squares, of_mean, choices = 0.0, 0.0, {}
for part in partition(Generator(3).shuffled(n), 8):
    training = rest_of(part)
    chosen = min(NATURAL, key=lambda name: aicc(name, training))
    choices[chosen] = choices.get(chosen, 0) + 1
    squares += np.sum(held_out_errors(chosen, training, part, ones) ** 2)
    of_mean += np.sum((economy[part] - np.mean(economy[training])) ** 2)
result["honest_error"] = {
    "choices": choices,
    "procedure": np.sqrt(squares / n),
    "mean": np.sqrt(of_mean / n),
}

# The last 60 in time set aside (ties in the order of the file), the best AICc of the rest tried on them.
order = sorted(range(n), key=lambda row: (sold[row], row))
held, training = sorted(order[-60:]), sorted(order[:-60])
chosen = min(NATURAL, key=lambda name: aicc(name, training))
e = held_out_errors(chosen, training, held, ones)
result["hold_out"] = {
    "chosen": chosen,
    "mean_error": np.mean(e),
    "root_mean_squared_error": np.sqrt(np.mean(e**2)),
    "mean_bias_percent": 100 * np.mean(e) / np.mean(economy[held]),
}

with open(os.path.join(HERE, "cars.json"), "w", encoding="utf-8") as file:
    json.dump(result, file, indent=1, default=float)
    file.write("\n")
