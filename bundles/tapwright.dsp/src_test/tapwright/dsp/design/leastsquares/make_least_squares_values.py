# SPDX-License-Identifier: EPL-2.0
"""Makes least-squares-values.csv with scipy.signal.firls: taps;bands;desired;weight;coefficients (first half)."""
import numpy as np
import scipy
from scipy.signal import firls

rng = np.random.default_rng(20)
with open("least-squares-values.csv", "w") as out:
    out.write(f"# scipy {scipy.__version__}, numpy {np.__version__}; frequencies in cycles per sample\n")
    for _ in range(60):
        n = 2 * int(rng.integers(3, 40)) + 1
        count = int(rng.integers(1, 4))
        while True:
            edges = np.round(np.sort(rng.uniform(0, 0.5, 2 * count)), 4)
            edges[0], edges[-1] = 0, 0.5
            gaps = edges[2::2] - edges[1:-1:2]
            if np.all(np.diff(edges) > 0.005) and np.all(gaps < 2.0 / n):
                break
        desired = np.round(rng.uniform(0, 1.5, 2 * count), 3)
        weight = np.round(10 ** rng.uniform(-1, 1, count), 3)
        h = firls(n, edges, desired, weight=weight, fs=1)
        text = [" ".join(repr(float(v)) for v in row) for row in (edges, desired, weight, h[: n // 2 + 1])]
        out.write(f"{n};" + ";".join(text) + "\n")
