"""Times Astropy as its users call it, and a spline table made from it; prints seconds as JSON and writes the
luminosity distances and lookback times of all redshifts to the file named, for comparison. Redshifts are those
of cosmology.bench.ts."""
import json
import sys
import time

import astropy.units as u
import numpy as np
from astropy.cosmology import FlatLambdaCDM
from scipy.interpolate import CubicSpline

COUNT = 100_000
KNOTS = 1000


def make():
    return FlatLambdaCDM(67.66, 0.30966, Tcmb0=2.7255, Neff=3.046, m_nu=u.Quantity([0, 0, 0.06], u.eV))


def timed(run, times=1):
    """Best processor time of several runs, and what the last gave."""
    best = float('inf')
    for _ in range(times):
        start = time.process_time()
        value = run()
        best = min(best, time.process_time() - start)
    return best, value


c = make()
z = 10 * ((np.arange(COUNT) * 7919) % COUNT) / COUNT
c.luminosity_distance(z[:10])
out = {}
out['luminosityMpc'], distance = timed(lambda: c.luminosity_distance(z))
out['lookbackGyr'], lookback = timed(lambda: c.lookback_time(z))
out['E'], _ = timed(lambda: c.efunc(z), 3)
out['first'] = timed(lambda: [make().luminosity_distance(1.0) for _ in range(20)])[0] / 20


def table():
    knots = np.expm1(np.linspace(0, np.log1p(10), KNOTS))
    return CubicSpline(knots, make().luminosity_distance(knots).value)


out['splineMade'], spline = timed(table, 3)
out['splineRead'], read = timed(lambda: spline(z), 10)
near = z > 1e-3
out['splineError'] = float(np.max(np.abs(read[near] / distance.value[near] - 1)))
for count in (1, 10, 100, 1000, 10_000):
    some = z[:count] if count > 1 else float(z[1])
    out[f'luminosityMpc{count}'], _ = timed(lambda: c.luminosity_distance(some), 5)
out['luminosityMpc100000'] = out['luminosityMpc']
np.concatenate([distance.value, lookback.value]).tofile(sys.argv[1])
print(json.dumps(out))
