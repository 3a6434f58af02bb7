"""Makes penguins.csv and body-mass.json beside it. Run from the project's folder after npm ci:

    /usr/bin/python3 test/reference/penguins/make.py

Needs python3 with mpmath and the development dependency vega-datasets (data/penguins.json).
"""

import csv
import json
import os
import sys

HERE = os.path.dirname(os.path.abspath(__file__))
sys.dont_write_bytecode = True
sys.path.insert(0, os.path.dirname(HERE))
from least_squares import Data, number, study_fixtures, write  # noqa: E402

SOURCE = os.path.join(HERE, "..", "..", "..", "node_modules", "vega-datasets", "data", "penguins.json")
HEADERS = ["Species", "Island", "Beak Length (mm)", "Beak Depth (mm)", "Flipper Length (mm)", "Body Mass (g)", "Sex"]
SEX = {"FEMALE": 0, "MALE": 1}
CATEGORIES = {"species": ["Adelie", "Chinstrap", "Gentoo"]}

with open(SOURCE, encoding="utf-8") as file:
    penguins = json.load(file)

with open(os.path.join(HERE, "penguins.csv"), "w", encoding="utf-8", newline="") as file:
    out = csv.writer(file, lineterminator="\n")
    out.writerow(["Bird", *HEADERS])
    for position, bird in enumerate(penguins):
        out.writerow([position + 1, *("NA" if bird[h] is None else bird[h] for h in HEADERS)])

rows, lines = [], []
for position, bird in enumerate(penguins):
    if bird["Body Mass (g)"] is None or bird["Sex"] not in SEX:
        continue
    rows.append(
        {
            "body_mass": number(bird["Body Mass (g)"]),
            "flipper": number(bird["Flipper Length (mm)"]),
            "beak_length": number(bird["Beak Length (mm)"]),
            "beak_depth": number(bird["Beak Depth (mm)"]),
            "male": number(SEX[bird["Sex"]]),
            "species": bird["Species"],
        }
    )
    lines.append(position + 2)


def at(label, flipper, beak_length, beak_depth, male, species):
    return {
        "label": label,
        "flipper": number(flipper),
        "beak_length": number(beak_length),
        "beak_depth": number(beak_depth),
        "male": number(male),
        "species": species,
    }


PREDICT = [
    at("Female Adelie", 188, 37.3, 17.6, 0, "Adelie"),
    at("Male Gentoo", 221.5, 49.5, 15.7, 1, "Gentoo"),
    at("Long-billed male Chinstrap", 200, 58, 19.3, 1, "Chinstrap"),
]

candidates = [
    {"name": "Flipper alone", "terms": ["flipper"]},
    {"name": "Three lengths", "terms": ["flipper", "beak_length", "beak_depth"]},
    {"name": "Flipper, sex and species", "terms": ["flipper", "male", "species"]},
    {"name": "Everything", "terms": ["flipper", "beak_length", "beak_depth", "male", "species"]},
    {
        "name": "Sex differs by species",
        "terms": ["flipper", "beak_length", "beak_depth", "male", "species", {"interaction": ["male", "species"]}],
    },
]
write(
    os.path.join(HERE, "body-mass.json"),
    study_fixtures(candidates, Data(rows, CATEGORIES), lines, "body_mass", PREDICT),
)
