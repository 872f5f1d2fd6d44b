# SPDX-License-Identifier: EPL-2.0
"""Writes gain-fixture.csv: extreme gains of filters, by scipy.

Each line: side, sample rate, lower edge, upper edge, extreme gain in dB, coefficients...
A grid of 20,001 points per band brackets the extreme, scipy.optimize.minimize_scalar refines it.
Made with Python 3, scipy 1.17.1, numpy 2.4.6.
"""
import numpy as np
from scipy import optimize, signal


def gain(h, f, fs):
    return 20 * np.log10(np.abs(signal.freqz(h, 1, np.atleast_1d(f), fs=fs)[1]))


def extreme(h, lo, hi, fs, sign):
    grid = np.linspace(lo, hi, 20001)
    values = sign * gain(h, grid, fs)
    k = int(np.argmax(values))
    best = values[k]
    a, b = grid[max(k - 1, 0)], grid[min(k + 1, len(grid) - 1)]
    found = optimize.minimize_scalar(lambda f: -sign * gain(h, f, fs)[0], bounds=(a, b), method="bounded",
                                     options={"xatol": 1e-12 * fs})
    return sign * max(best, -found.fun)


def main():
    cases = [
        (signal.remez(31, [0, 0.1, 0.16, 0.5], [1, 0]), 1.0, (0, 0.1), (0.16, 0.5)),
        (signal.remez(64, [0, 9000, 11000, 24000], [1, 0], fs=48000), 48000.0, (0, 9000), (11000, 24000)),
        (signal.firwin(101, 0.3, window=("kaiser", 8.6), fs=2), 2.0, (0, 0.25), (0.36, 1)),
        (signal.firls(41, [0, 0.2, 0.3, 1], [1, 1, 0, 0], fs=2), 2.0, (0, 0.2), (0.3, 1)),
        (signal.minimum_phase(signal.firwin(81, 0.25, fs=2), "hilbert"), 2.0, (0, 0.15), (0.5, 0.9)),
        (signal.remez(30, [0.05, 0.5], [1], type="hilbert", fs=1), 1.0, (0.05, 0.45), (0.01, 0.02)),
        (signal.savgol_coeffs(11, 3), 50.0, (0, 2), (8, 20)),
    ]
    with open("gain-fixture.csv", "w") as out:
        for h, fs, passband, other in cases:
            for side, band, sign in (("upper", passband, 1), ("lower", passband, -1), ("upper", other, 1)):
                value = extreme(h, band[0], band[1], fs, sign)
                numbers = [fs, band[0], band[1], value, *h]
                out.write(side + "," + ",".join(repr(float(x)) for x in numbers) + "\n")


main()
