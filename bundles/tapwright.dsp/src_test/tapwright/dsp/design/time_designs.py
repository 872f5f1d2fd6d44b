# SPDX-License-Identifier: EPL-2.0
"""Times designs of scipy for DesignBenchmark, which reads the lines: name;seconds;weighted error on a dense grid, 'refused' or nothing."""
import time
import warnings
import numpy as np
from scipy import signal

warnings.simplefilter("ignore")


def best(f, budget=0.4):
    f()
    least, start = 1e9, time.perf_counter()
    while time.perf_counter() - start < budget:
        t = time.perf_counter()
        f()
        least = min(least, time.perf_counter() - t)
    return least


def remez(taps, bands, desired, weight):
    name = f"equiripple {taps}" + (f" {bands[2]}" if weight[1] == 1 else "")
    call = lambda: signal.remez(taps, bands, desired, weight=weight, maxiter=250, fs=1)
    try:
        h = call()
    except Exception:
        print(f"{name};nan;refused", flush=True)
        return
    size = 1 << int(np.ceil(np.log2(64 * taps)))
    f = np.arange(size + 1) / (2 * size)
    a = (np.fft.rfft(h, 2 * size) * np.exp(1j * np.pi * f * (taps - 1))).real
    error = max(np.max(np.abs(a[(f >= bands[2 * k]) & (f <= bands[2 * k + 1])] - desired[k])) * weight[k] for k in range(len(desired)))
    print(f"{name};{best(call)};{error}", flush=True)


for taps in (51, 201, 801, 2001, 4001):
    remez(taps, [0, .2, .2 + 57 / (14.6 * (taps - 1)), .5], [1, 0], [1, 10])
remez(401, [0, .2, .22, .5], [1, 0], [1, 1])
remez(1001, [0, .2, .205, .5], [1, 0], [1, 1])
remez(2001, [0, .2, .205, .5], [1, 0], [1, 1])
remez(4001, [0, .2, .2025, .5], [1, 0], [1, 1])
for taps in (51, 801):
    print(f"window {taps};{best(lambda: signal.firwin(taps, .2, window=('kaiser', 7.0), fs=1))};", flush=True)
