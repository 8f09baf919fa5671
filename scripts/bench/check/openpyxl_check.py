"""Reads a filled-in template with openpyxl and applies two rules, as a script beside a spreadsheet would: fill-short and
embedment-short, for set poles in a plain round bore that tapers straight, without bell, bed or slope.

Usage: openpyxl_check.py FILE < figures.json, where the figures are {standard, product} as the product keeps them.
Prints one JSON document: the structures that either rule finds, and the rows read.
"""

import json
import math
import sys

try:
    import openpyxl
except ImportError:
    sys.exit("openpyxl is not installed. On Debian: apt-get install --no-install-recommends python3-openpyxl")

DATA_FROM = 4


def rows_of(book, name):
    """Rows of a sheet as dictionaries by the keys of its first row."""
    keys = None
    for number, row in enumerate(book[name].iter_rows(values_only=True), start=1):
        if keys is None:
            keys = row
        elif number >= DATA_FROM:
            yield {key: value for key, value in zip(keys, row) if key is not None and value is not None}


def frustum(height_ft, top_in, bottom_in):
    """Volume in cubic feet of a round solid between two diameters in inches."""
    return math.pi / 12 * height_ft * (top_in**2 + top_in * bottom_in + bottom_in**2) / 144


def between(start, end, share):
    return start + (end - start) * share


def void_ft3(line):
    """Bore less pole from the foam's top to the bottom of the bore."""
    depth = line["boreDepthFt"]
    top_in = line["boreTopIn"]
    bottom_in = line.get("boreBottomIn", top_in)
    from_ft = min(max(0, line["foamTopBelowGradeIn"] / 12), depth)
    bore = frustum(depth - from_ft, between(top_in, bottom_in, from_ft / depth), bottom_in)
    embedment = line["embedmentFt"]
    ground_line = line["girthGroundLineIn"] / math.pi
    butt = line["girthButtIn"] / math.pi
    to_ft = min(depth, embedment)
    if to_ft <= from_ft:
        return bore
    pole = frustum(
        to_ft - from_ft,
        between(ground_line, butt, from_ft / embedment),
        between(ground_line, butt, to_ft / embedment),
    )
    return max(0, bore - pole)


def factor_at(points, temp_f):
    """Straight between the points, level beyond them."""
    points = sorted((point["tempF"], point["factor"]) for point in points)
    if temp_f <= points[0][0]:
        return points[0][1]
    for (t1, f1), (t2, f2) in zip(points, points[1:]):
        if temp_f <= t2:
            return between(f1, f2, (temp_f - t1) / (t2 - t1))
    return points[-1][1]


def placed_ft3(pours, product):
    return sum(
        max(0, pour["quantity"] - pour.get("wastedQuantity", 0))
        * pour["kitFt3"]
        * factor_at(product["yieldFactors"], min(pour["componentATempF"], pour["componentBTempF"]))
        for pour in pours
    )


def due_ft(length_ft, due):
    """Depth due in soil."""
    for row in sorted(due["table"], key=lambda row: row["lengthFt"]):
        if row["lengthFt"] >= length_ft - 1e-9:
            return row["soilFt"]
    return max(due["beyondLeastFt"], due["beyondShare"] * length_ft + due["beyondPlusFt"])


def main():
    figures = json.load(sys.stdin)
    standard, product = figures["standard"], figures["product"]
    book = openpyxl.load_workbook(sys.argv[1], read_only=True, data_only=True)
    lines = list(rows_of(book, "Set"))
    pours = {}
    for pour in rows_of(book, "Pours"):
        pours.setdefault(pour["structureNumber"], []).append(pour)
    least = standard["rules"]["fill-short"]["params"]["leastRatio"]
    tolerance = standard["rules"]["embedment-short"]["params"]["toleranceFt"]
    fill_short, embedment_short = [], []
    for line in lines:
        number = line["structureNumber"]
        void = void_ft3(line)
        if void > 0 and placed_ft3(pours.get(number, []), product) / void < least - 1e-9:
            fill_short.append(number)
        if line["embedmentFt"] < due_ft(line["poleLengthFt"], standard["dueDepth"]) - tolerance - 1e-9:
            embedment_short.append(number)
    json.dump(
        {
            "lines": len(lines),
            "pours": sum(map(len, pours.values())),
            "fill-short": sorted(fill_short),
            "embedment-short": sorted(embedment_short),
        },
        sys.stdout,
    )


main()
