"""Writes colour.json: magnitudes between bands and wavelengths by SciPy's quad: power laws in closed form, black bodies
by Astropy, a table, all as photons through a band; dust and the gas between by a law of our own. Run:
/usr/bin/python3 colour.py
"""
import json
import math
import os

import astropy
import astropy.units as u
import numpy as np
import scipy
from astropy.modeling.models import BlackBody
from scipy.integrate import quad

# Middle and width, as lib/science/light/bands.ts has them.
BANDS = dict(g=(4825, 1379), r=(6261, 1382), i=(7672, 1535), z=(9097, 1370), V=(5448, 840), J=(12350, 1620),
             H=(16620, 2510), K=(21590, 2620))


def box(band):
    middle, width = BANDS[band]
    return middle - width / 2, middle + width / 2


def mean(f_nu, low, high, through=lambda a: 1.0, points=None):
    """Photons of f_nu over those of a source flat in f_nu: both over lambda, integrated in wavelength."""
    kw = dict(epsabs=0, epsrel=1e-12, limit=800)
    cuts = sorted(p for p in (points or []) if low < p < high)
    edges = [low, *cuts, high]
    light = sum(quad(lambda a: f_nu(a) * through(a) / a, x, y, **kw)[0] for x, y in zip(edges, edges[1:]))
    weight = sum(quad(lambda a: through(a) / a, x, y, **kw)[0] for x, y in zip(edges, edges[1:]))
    return light / weight


def mag(ratio):
    return -2.5 * math.log10(ratio)


def law_mean(index, low, high):
    """<nu^index> over d nu / nu, in closed form."""
    if index == 0:
        return 1.0
    return ((1e4 / low) ** index - (1e4 / high) ** index) / (index * math.log(high / low))


laws = [dict(index=a, source=s, to=t, colourMag=mag(law_mean(a, *box(t)) / law_mean(a, *box(s))))
        for a in (-3, -1.5, -0.5, 0, 0.7, 2) for s, t in (('i', 'H'), ('r', 'g'), ('V', 'K'))]


def black(temperature, z):
    model = BlackBody(temperature=temperature * u.K)

    def f_nu(observed_a):
        return model(observed_a / (1 + z) * u.AA).value * 1e5
    return f_nu


bodies = []
for temperature, z in ((3000, 0), (5772, 0), (5000, 0.8), (12000, 0), (30000, 3), (1000, 0)):
    f = black(temperature, z)
    for s, t in (('i', 'H'), ('r', 'J'), ('V', 'g')):
        bodies.append(dict(temperatureK=temperature, z=z, source=s, to=t,
                           colourMag=mag(mean(f, *box(t)) / mean(f, *box(s)))))

wavelengths = [280, 364.5, 364.6, 420, 500, 612.5, 700, 850, 1100]
flux = [0.2, 0.35, 1.1, 1.4, 1.0, 0.9, 0.65, 0.6, 0.3]
tables = []
for z in (0, 0.4):
    knots = [10 * w * (1 + z) for w in wavelengths]
    f = lambda a: a ** 2 * float(np.interp(a, knots, flux))
    for s, t in (('g', 'r'), ('r', 'i')):
        tables.append(dict(z=z, source=s, to=t,
                           colourMag=mag(mean(f, *box(t), points=knots) / mean(f, *box(s), points=knots))))

# Through a filter with a throughput table, photons weighed by it, the light dimmed as lambda^-1.3 on its way.
rows = [(6800, 0.02), (7000, 0.3), (7600, 0.36), (8300, 0.31), (8450, 0.01)]
curve = lambda a: float(np.interp(a, [r[0] for r in rows], [r[1] for r in rows]))
lost = lambda a: 0.3 * (a / 5500) ** -1.3
dimmed = lambda f: (lambda a: f(a) * 10 ** (-0.4 * lost(a)))
points = [r[0] for r in rows]
filters = []
for temperature, z in ((5000, 0.3), (15000, 0)):
    f = black(temperature, z)
    through = dict(low=6800, high=8450, through=curve, points=points)
    to_bare, to_dim = mean(f, **through), mean(dimmed(f), **through)
    filters.append(dict(temperatureK=temperature, z=z, source='g', bareMag=mag(to_bare / mean(f, *box('g'))),
                        observedMag=mag(to_dim / mean(dimmed(f), *box('g'))),
                        predictedMag=mag(to_dim / mean(f, *box('g')))))

out = dict(
    made=dict(astropy=astropy.__version__, scipy=scipy.__version__),
    bands={name: dict(fromA=box(name)[0], toA=box(name)[1]) for name in BANDS},
    laws=laws, bodies=bodies, table=dict(wavelengthsNm=wavelengths, fLambda=flux, colours=tables),
    filter=dict(rows=[dict(wavelengthA=w, efficiency=e) for w, e in rows], colours=filters),
)
with open(os.path.join(os.path.dirname(os.path.abspath(__file__)), 'colour.json'), 'w') as file:
    json.dump(out, file, indent=1)
    file.write('\n')
