"""The shortcut arithmetic as a script with numpy and scipy would do it, one case at a time.

python3 shortcutReference.py [cases]; prints nanoseconds per case and the checksum of all cases.
"""
import sys
import time

import numpy as np
from scipy.optimize import brentq

COMPONENTS = 5
state = 12345


def uniform():
    """Park and Miller's minimal standard generator: the same cases in every language."""
    global state
    state = 16807 * state % 2147483647
    return state / 2147483647.0


def draw():
    volatility = [1.0] * COMPONENTS
    for i in range(COMPONENTS - 2, -1, -1):
        volatility[i] = volatility[i + 1] * (1.15 + 1.35 * uniform())
    amounts = [0.05 + uniform() for _ in range(COMPONENTS)]
    total = 0.0
    for amount in amounts:
        total += amount
    fraction = [amount / total for amount in amounts]
    q = 1.25 * uniform()
    light = min(3, int(4 * uniform()))
    recoveries = 0.90 + 0.0999 * uniform(), 0.90 + 0.0999 * uniform()
    return volatility, fraction, q, light, recoveries, 1.05 + 0.95 * uniform()


def design(volatility, fraction, q, light, recoveries, reflux_factor):
    a, z, heavy = np.array(volatility), np.array(fraction), light + 1
    kept_light, kept_heavy = recoveries
    feed = lambda t: np.sum(a * z / (a - t)) - (1 - q)
    roots = [
        brentq(feed, a[k + 1] * (1 + 1e-12), a[k] * (1 - 1e-12), xtol=1e-13, rtol=1e-13)
        for k in range(COMPONENTS - 1)
    ]
    splits = kept_light / (1 - kept_light), (1 - kept_heavy) / kept_heavy
    minimum_stages = np.log(splits[0] / splits[1]) / np.log(a[light] / a[heavy])
    split = splits[1] * (a / a[heavy]) ** minimum_stages
    split[light], split[heavy] = splits
    d = z * split / (1 + split)
    distillate = d.sum()
    minimum_reflux = max(np.sum(a * d / (a - roots[light])) / distillate - 1, 0.05)
    reflux = reflux_factor * minimum_reflux
    x = (reflux - minimum_reflux) / (reflux + 1)
    y = 1 - np.exp((1 + 54.4 * x) / (11 + 117.2 * x) * (x - 1) / np.sqrt(x))
    stages = (minimum_stages + y) / (1 - y)
    bottoms = 1 - distillate
    impurities = (z[light] - d[light]) / bottoms / (d[heavy] / distillate)
    ratio = (z[heavy] / z[light] * impurities**2 * bottoms / distillate) ** 0.206
    return stages + minimum_reflux + stages * ratio / (1 + ratio)


if __name__ == "__main__":
    count = int(sys.argv[1]) if len(sys.argv) > 1 else 2000
    cases = [draw() for _ in range(count)]
    start = time.perf_counter()
    checksum = 0.0
    for case in cases:
        checksum += design(*case)
    print("%.1f %.12e" % ((time.perf_counter() - start) / count * 1e9, checksum))
