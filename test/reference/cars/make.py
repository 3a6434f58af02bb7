"""Makes cars.csv and the fixtures beside it. Run from the project's folder after npm ci:

    /usr/bin/python3 test/reference/cars/make.py

Needs python3 with mpmath and the development dependency vega-datasets (data/cars.json).
"""

import csv
import json
import os
import sys

HERE = os.path.dirname(os.path.abspath(__file__))
sys.dont_write_bytecode = True
sys.path.insert(0, os.path.dirname(HERE))
from least_squares import Data, number, study_fixtures, write  # noqa: E402

SOURCE = os.path.join(HERE, "..", "..", "..", "node_modules", "vega-datasets", "data", "cars.json")
COLUMNS = {
    "economy": "Miles_per_Gallon",
    "cylinders": "Cylinders",
    "displacement": "Displacement",
    "horsepower": "Horsepower",
    "weight": "Weight_in_lbs",
    "acceleration": "Acceleration",
    "first_sold": "Year",
    "origin": "Origin",
}
NUMBERS = ["economy", "cylinders", "displacement", "horsepower", "weight", "acceleration"]
CATEGORIES = {"origin": ["USA", "Europe", "Japan"]}


def text(value):
    if value is None:
        return ""
    return repr(int(value)) if isinstance(value, float) and value.is_integer() else str(value)


with open(SOURCE, encoding="utf-8") as file:
    cars = json.load(file)

with open(os.path.join(HERE, "cars.csv"), "w", encoding="utf-8", newline="") as file:
    out = csv.writer(file, lineterminator="\n")
    out.writerow(["car", "name", *COLUMNS])
    for position, car in enumerate(cars):
        out.writerow([position + 1, car["Name"], *(text(car[source]) for source in COLUMNS.values())])

rows, lines = [], []
for position, car in enumerate(cars):
    values = {name: car[source] for name, source in COLUMNS.items()}
    if values["economy"] is None or values["horsepower"] is None:
        continue
    row = {name: number(values[name]) for name in NUMBERS}
    row["model_year"] = number(int(values["first_sold"][:4]))
    row["origin"] = values["origin"]
    rows.append(row)
    lines.append(position + 2)
data = Data(rows, CATEGORIES)


def at(label, weight, horsepower, model_year, origin, acceleration):
    return {
        "label": label,
        "weight": number(weight),
        "horsepower": number(horsepower),
        "model_year": number(model_year),
        "origin": origin,
        "acceleration": number(acceleration),
    }


PREDICT = [
    at("Light Japanese, 1982", 2100, 68, 1982, "Japan", 16.5),
    at("Middling European, 1976", 2800.5, 92.5, 1976, "Europe", 15),
    at("Heavy American, 1970", 4400, 190, 1970, "USA", 11.2),
]

natural = [
    {"name": "Numbers", "terms": ["weight", "horsepower", "model_year"]},
    {"name": "Origin", "terms": ["weight", "horsepower", "model_year", "origin"]},
    {
        "name": "Slope by origin",
        "terms": ["weight", "horsepower", "model_year", "origin", {"interaction": ["weight", "origin"]}],
    },
    {
        "name": "Product of two numbers",
        "terms": ["weight", "horsepower", {"interaction": ["weight", "horsepower"]}, "model_year"],
    },
    {"name": "Quadratic", "terms": [{"polynomial": "weight", "degree": 2}, "horsepower", "model_year"]},
    {"name": "Cubic", "terms": [{"polynomial": "weight", "degree": 3}, "horsepower", "model_year", "origin"]},
    {
        "name": "Spline",
        "terms": [{"spline": "weight", "knots": [1900, 2400, 3000.5, 3700, 4600]}, "horsepower", "model_year"],
    },
    {
        "name": "Bend",
        "terms": ["weight", "horsepower", {"bend": "horsepower", "at": 102.5}, "model_year", "origin"],
    },
    {
        "name": "Bend below",
        "terms": ["weight", {"bend": "horsepower", "at": 102.5, "side": "below"}, {"power": "model_year", "to": 2}],
    },
    {"name": "One number", "terms": ["weight"]},
]
write(os.path.join(HERE, "natural.json"), study_fixtures(natural, data, lines, "economy", PREDICT))

log_scale = [
    {"name": "Numbers, log", "terms": ["weight", "horsepower", "model_year"]},
    {"name": "Origin, log", "terms": ["weight", "horsepower", "model_year", "origin"]},
    {
        "name": "Spline, log",
        "terms": [{"spline": "weight", "knots": [1900, 2400, 3000.5, 3700, 4600]}, "horsepower", "model_year"],
    },
    {"name": "Numbers, natural", "scale": "natural", "terms": ["weight", "horsepower", "model_year"]},
    {
        "name": "Cubic, natural",
        "scale": "natural",
        "terms": [{"polynomial": "weight", "degree": 3}, "horsepower", "model_year", "origin"],
    },
    {"name": "Numbers, root", "scale": "sqrt", "terms": ["weight", "horsepower", "model_year"]},
]
write(
    os.path.join(HERE, "scales.json"),
    study_fixtures(log_scale, data, lines, "economy", PREDICT, scale="log"),
)

weighted = [
    {"name": "Numbers, weighted", "terms": ["weight", "horsepower", "model_year"]},
    {"name": "Origin, weighted", "terms": ["weight", "horsepower", "model_year", "origin"]},
    {
        "name": "Quadratic, weighted",
        "terms": [{"polynomial": "weight", "degree": 2}, "horsepower", "model_year", "origin"],
    },
]
write(
    os.path.join(HERE, "weighted.json"),
    study_fixtures(weighted, data, lines, "economy", PREDICT, weights="acceleration"),
)

through_zero = [
    {"name": "Through zero", "intercept": False, "terms": ["weight", "horsepower"]},
    {"name": "Through zero, curved", "intercept": False, "terms": [{"polynomial": "weight", "degree": 2}, "horsepower"]},
]
write(
    os.path.join(HERE, "through-zero.json"),
    study_fixtures(through_zero, data, lines, "economy", PREDICT),
)
