# SPDX-License-Identifier: EPL-2.0
"""Makes equiripple-values.csv with scipy 1.17.1 and numpy: random minimax problems and reference errors. Run: python3 make_equiripple_values.py

Each line: method;taps;symmetry;bands;error. Bands are from,to,desiredFrom,desiredTo,weightFrom,weightTo separated by blanks, in cycles
per sample. Method remez: the error, on a dense grid, of the coefficients that scipy.signal.remez gives, so nearly an upper
bound of the optimum. Method linprog: the optimum on a grid by linear programming (HiGHS), so a lower bound of the optimum.
"""
import warnings
import numpy as np
import scipy
from scipy import optimize, signal

assert scipy.__version__ == "1.17.1", scipy.__version__
rng = np.random.default_rng(20)
rows = []


def amplitude_matrix(taps, odd, f):
    n = taps // 2
    v = (np.arange(n) + 0.5) if taps % 2 == 0 else (np.arange(1, n + 1) if odd else np.arange(n + 1))
    angle = 2 * np.pi * np.outer(f, v)
    return np.sin(angle) if odd else np.cos(angle)


def grid(bands, points):
    f, d, w = [], [], []
    for b in bands:
        t = (1 - np.cos(np.linspace(0, np.pi, points))) / 2
        f.append(b[0] + (b[1] - b[0]) * t)
        d.append(b[2] + (b[3] - b[2]) * t)
        w.append(b[4] + (b[5] - b[4]) * t)
    return np.concatenate(f), np.concatenate(d), np.concatenate(w)


def write(method, taps, odd, bands, error):
    cells = " ".join(",".join(repr(float(v)) for v in b) for b in bands)
    rows.append(f"{method};{taps};{'ODD' if odd else 'EVEN'};{cells};{float(error)!r}")


def edges(count, taps, low, high):
    """Rising band edges with transitions of one to four times 1/taps."""
    for _ in range(100):
        cut = np.sort(rng.uniform(low, high, count - 1))
        gap = rng.uniform(1, 4, count - 1) / taps
        e = np.concatenate([[low], np.ravel(np.column_stack([cut - gap / 2, cut + gap / 2])), [high]])
        if np.all(np.diff(e) > 0.3 / taps):
            return np.round(e, 6)
    return None


while len(rows) < 200:
    taps = int(rng.integers(8, 130))
    odd = rng.random() < 0.25
    count = 1 if odd else int(rng.integers(2, min(6, 3 + taps // 20)))
    if odd:
        e = [round(rng.uniform(.5, 3) / taps, 6), 0.5 if taps % 2 == 0 else round(0.5 - rng.uniform(.5, 3) / taps, 6)]
        desired = [1.0]
    else:
        e = edges(count, taps, 0.0, 0.5)
        if e is None:
            continue
        start = rng.integers(2)
        desired = [float((k + start) % 2) for k in range(count)]
        if taps % 2 == 0 and desired[-1] != 0:
            continue
    weight = [1.0] if odd else [float(np.round(10 ** rng.uniform(-1, 1), 4)) for _ in range(count)]
    try:
        with warnings.catch_warnings():
            warnings.simplefilter("error")
            h = signal.remez(taps, e, desired, weight=weight, type="hilbert" if odd else "bandpass", grid_density=64, maxiter=100, fs=1)
    except Exception:
        continue
    bands = [(e[2 * k], e[2 * k + 1], desired[k], desired[k], weight[k], weight[k]) for k in range(count)]
    f, d, w = grid(bands, 60 * taps)
    H = np.exp(2j * np.pi * np.outer(f, (taps - 1) / 2 - np.arange(taps))) @ h
    error = np.max(np.abs(w * ((H.imag if odd else H.real) - d)))
    if 1e-7 < error < 0.5 and np.abs(h).sum() < 20:
        write("remez", taps, odd, bands, error)

while len(rows) < 240:
    taps = int(rng.integers(6, 40))
    odd = rng.random() < 0.4
    count = int(rng.integers(1, 4))
    low = 2 / taps / 4 if odd else 0.0
    high = 0.5 if taps % 2 else 0.45
    if odd and taps % 2:
        high = 0.45
    e = edges(count, taps, round(low, 6), high)
    if e is None:
        continue
    bands = [(e[2 * k], e[2 * k + 1], *np.round(rng.uniform(-1, 2, 2), 3), *np.round(10 ** rng.uniform(-1, 1, 2), 3)) for k in range(count)]
    f, d, w = grid(bands, 12 * taps)
    A = amplitude_matrix(taps, odd, f)
    ones = np.ones((len(f), 1)) / w[:, None]
    res = optimize.linprog(np.r_[np.zeros(A.shape[1]), 1], A_ub=np.block([[A, -ones], [-A, -ones]]), b_ub=np.r_[d, -d],
                           bounds=[(None, None)] * A.shape[1] + [(0, None)], method="highs",
                           options={"primal_feasibility_tolerance": 1e-9, "dual_feasibility_tolerance": 1e-9})
    if res.status == 0 and res.fun > 1e-4 and np.max(np.abs(res.x)) < 1e3:
        write("linprog", taps, odd, bands, res.fun)
open("equiripple-values.csv", "w").write("\n".join(rows) + "\n")
