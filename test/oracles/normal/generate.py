"""Quantiles and distribution function of the standard normal from Python's statistics.NormalDist.

Run: python3 generate.py > normal.json
"""
import json
import sys
from statistics import NormalDist

normal = NormalDist()
points = [1e-12, 1e-9, 1e-6, 1e-4, 0.001, 0.01, 0.025, 0.05, 0.074, 0.075, 0.1, 0.2, 0.3, 0.4, 0.5,
          0.6, 0.7, 0.8, 0.9, 0.925, 0.95, 0.975, 0.99, 0.999, 1 - 1e-6, 1 - 1e-9]
arguments = [-7.5, -6, -4, -3, -2, -1.2815515655446004, -1, -0.5, -0.1, 0, 0.1, 0.5, 1, 1.5, 2, 3, 4, 6, 7.5]
json.dump({
    "source": "Python %d.%d statistics.NormalDist, generate.py beside this file" % sys.version_info[:2],
    "quantiles": [{"p": p, "z": normal.inv_cdf(p)} for p in points],
    "distribution": [{"x": x, "p": normal.cdf(x)} for x in arguments],
}, sys.stdout, indent=1)
