# SPDX-License-Identifier: EPL-2.0
"""Makes window-values.csv with scipy 1.17.1 and numpy: windows and windowed designs to compare with. Run: python3 make_window_values.py

Each line: name;parameter;length;values separated by blanks. Windows of scipy that are scaled another way are scaled to a largest
sample of 1.
"""
import numpy as np
import scipy
from scipy import signal

assert scipy.__version__ == "1.17.1", scipy.__version__
w = signal.windows
rows = []


def row(name, parameter, length, values):
    rows.append(";".join([name, repr(parameter), str(length), " ".join(repr(float(v)) for v in values)]))


def top(values):
    return values / values.max()


for n in (2, 3, 8, 17, 64, 129):
    for name, f in [("RECTANGULAR", w.boxcar), ("BARTLETT", w.bartlett), ("HANN", w.hann), ("BLACKMAN", w.blackman),
                    ("BLACKMAN_HARRIS", w.blackmanharris), ("NUTTALL", w.nuttall), ("FLAT_TOP", w.flattop)]:
        row(name, 0, n, f(n))
    row("HAMMING", 0, n, w.general_hamming(n, 0.54))
    row("HAMMING_EXACT", 0, n, w.general_hamming(n, 25 / 46))
    row("BLACKMAN_EXACT", 0, n, w.general_cosine(n, [7938 / 18608, 9240 / 18608, 1430 / 18608]))
    for alpha in (2.5, 4.0):
        row("gaussian", alpha, n, w.gaussian(n, (n - 1) / 2 / alpha))
    for taper in (0.0, 0.3, 1.0):
        row("tukey", taper, n, w.tukey(n, taper))
    for beta in (0.0, 3.0, 8.6, 40.0):
        row("kaiser", beta, n, w.kaiser(n, beta))
    for at in (50.0, 70.0, 120.0):
        if n > 2:
            row("chebyshev", at, n, top(w.chebwin(n, at)))
    for nw in (0.9, 2.5, 4.0):
        if nw < n / 2:
            row("slepian", nw, n, top(w.dpss(n, nw)))
for n in (31, 64, 201):
    row("lowpass", 0.13, n, signal.firwin(n, 0.13, window="hamming", fs=1))
    row("bandpass", 0.13, n, signal.firwin(n, [0.13, 0.29], window=("kaiser", 6.0), pass_zero=False, fs=1))
    if n % 2:
        row("highpass", 0.13, n, signal.firwin(n, 0.13, window="hann", pass_zero=False, fs=1))
        row("bandstop", 0.13, n, signal.firwin(n, [0.13, 0.29], window="blackman", fs=1))
open("window-values.csv", "w").write("\n".join(rows) + "\n")
