#!/usr/bin/env python3
# SPDX-License-Identifier: EPL-2.0
"""Worst gains of some filters of the sample workspace, by a general-purpose library: the fixture of SampleWorkspaceTest.

Evaluates a dense grid with scipy.signal.freqz and refines around its largest value with scipy.optimize.minimize_scalar.
Usage, from the folder of this file: ./worst_values.py > worst_values.json
"""
import json
import pathlib
import xml.etree.ElementTree as ET

import numpy as np
import scipy
from scipy import optimize, signal

ROOT = pathlib.Path(__file__).resolve().parents[6] / "sample-workspace" / "marram"
# filter, requirement, sample rate, from, to, which limit rules, bits after the binary point of the coefficients (None: as stored)
CASES = [
    ("hydrophone-decimator-2", "pass", 96000, 0, 20000, "deviation", 23),
    ("hydrophone-decimator-2", "stop", 96000, 28000, 48000, "largest", 23),
    ("strain-antialias", "pass", 1000, 0, 90, "deviation", 15),
    ("strain-antialias", "stop", 1000, 125, 500, "largest", 15),
    ("modem-channel", "below", 48000, 0, 6500, "largest", 18),
    ("wave-antialias", "stop", 50, 8, 25, "largest", None),
    ("strain-notch", "mains", 1000, 49.5, 50.5, "largest", 15),
]


def taps(name, fraction):
    values = np.array([float(v.text) for v in ET.parse(ROOT / f"{name}.filter").iter("values")])
    return values if fraction is None else np.round(values * 2.0**fraction) / 2.0**fraction  # ties to even


def worst(h, rate, low, high, rule):
    def decibel(f):
        return 20 * np.log10(np.abs(signal.freqz(h, worN=np.atleast_1d(f), fs=rate)[1]) + 1e-300)

    def badness(f):
        return np.abs(decibel(f)) if rule == "deviation" else decibel(f)

    grid = np.linspace(low, high, 200001)
    k = int(np.argmax(badness(grid)))
    left, right = grid[max(k - 1, 0)], grid[min(k + 1, len(grid) - 1)]
    fine = optimize.minimize_scalar(lambda f: -badness(f)[0], bounds=(left, right), method="bounded",
                                    options={"xatol": 1e-13 * rate})
    best = max((fine.x, grid[k]), key=lambda f: badness(f)[0])
    return float(best), float(decibel(best)[0])


rows = []
for name, requirement, rate, low, high, rule, fraction in CASES:
    at, value = worst(taps(name, fraction), rate, low, high, rule)
    rows.append({"filter": name, "requirement": requirement, "at": at, "value": value})
print(json.dumps({"library": f"scipy {scipy.__version__}, numpy {np.__version__}", "rows": rows}, indent=1))
