"""Writes exposure.json: the CCD equation by direct evaluation and root search, light inside apertures by
two-dimensional quadrature, Sersic profiles by the incomplete gamma function and spread by the seeing on a fine
grid by FFT, photons through a tabulated throughput. Run: /usr/bin/python3 exposure.py
"""
import json
import math
import os
import random

import astropy
import astropy.constants as const
import astropy.units as u
import numpy as np
import scipy
from scipy.integrate import dblquad
from scipy.optimize import brentq
from scipy.signal import fftconvolve
from scipy.special import gammainc, gammaincinv

rng = random.Random(20270701)


def noise2(c, t):
    n, nb = c['pixels'], c.get('backgroundPixels', math.inf)
    read = c['exposures'] * (c['readNoise'] ** 2 + (0.289 * c.get('gain', 0)) ** 2)
    body = n * (1 + n / nb) * (c['skyRatePerPixel'] * t + c['darkRatePerPixel'] * t + read)
    floor = (c.get('systematicFloor', 0) * n * c['skyRatePerPixel'] * t) ** 2
    return c['sourceRate'] * t + body + floor


def snr(c, t):
    return c['sourceRate'] * t / math.sqrt(noise2(c, t))


def case(i):
    c = dict(
        sourceRate=10 ** rng.uniform(-2, 4), skyRatePerPixel=10 ** rng.uniform(-3, 2),
        darkRatePerPixel=10 ** rng.uniform(-4, 0), readNoise=rng.uniform(0, 12), pixels=rng.uniform(1, 200),
        exposures=rng.randint(1, 40),
    )
    if i % 3 == 0:
        c.update(backgroundPixels=rng.uniform(50, 500), gain=rng.uniform(1, 8))
    if i % 4 == 0:
        c['systematicFloor'] = 10 ** rng.uniform(-5, -3)
    t = 10 ** rng.uniform(0, 4.5)
    q = snr(c, t)
    back = math.exp(brentq(lambda x: snr(c, math.exp(x)) - q, math.log(t) - 3, math.log(t) + 3, xtol=1e-14))
    h = 1e-5
    c2 = dict(c, sourceRate=c['sourceRate'] * math.exp(h))
    c1 = dict(c, sourceRate=c['sourceRate'] * math.exp(-h))
    time = lambda d: brentq(lambda x: snr(d, math.exp(x)) - q, math.log(t) - 3, math.log(t) + 3, xtol=1e-14)
    return dict(input=c, timeS=t, snr=q, timeBackS=back, timeExponent=(time(c2) - time(c1)) / (2 * h))


def moffat(x, y, fwhm, beta):
    alpha = fwhm / (2 * math.sqrt(2 ** (1 / beta) - 1))
    return (beta - 1) / (math.pi * alpha ** 2) * (1 + (x * x + y * y) / alpha ** 2) ** -beta


def aperture(fwhm, beta, a, b):
    rectangle = 4 * dblquad(lambda y, x: moffat(x, y, fwhm, beta), 0, a, 0, b, epsabs=1e-12)[0]
    circle = dblquad(lambda t, r: r * moffat(r, 0, fwhm, beta), 0, a, 0, 2 * math.pi, epsabs=1e-12)[0]
    return dict(fwhm=fwhm, beta=beta, halfWidth=a, halfHeight=b, rectangle=rectangle, circle=circle)


def sersic(n, radius):
    """Light of a Sersic profile of unit half-light radius inside a circle."""
    b = gammaincinv(2 * n, 0.5)
    return dict(n=n, radius=radius, circle=gammainc(2 * n, b * radius ** (1 / n)))


def spread(n, effective, fwhm, beta):
    """The same spread by a Moffat profile, in circles and slits; each cell of the grid holds the mean of its light."""
    half, cell, fine = 24.0, 0.08, 8
    edge = np.arange(-half, half + cell / 2, cell)
    x, y = np.meshgrid(edge, edge)
    b = gammaincinv(2 * n, 0.5)
    inner = (np.arange(fine) + 0.5) / fine - 0.5
    galaxy = np.zeros_like(x)
    for dx in inner:
        for dy in inner:
            r = np.hypot(x + dx * cell, y + dy * cell) / effective
            galaxy += np.exp(-b * r ** (1 / n))
    total = 2 * math.pi * n * effective ** 2 * math.gamma(2 * n) * b ** (-2 * n)
    galaxy *= cell ** 2 / fine ** 2 / total
    point = moffat(x, y, fwhm, beta) * cell ** 2
    image = fftconvolve(galaxy, point, mode='same')
    fraction = lambda inside: float(image[inside].sum())
    r = np.hypot(x, y)
    circles = []
    for radius in (0.5, 1.0, 2.0):
        # Cells cut by the edge count by the part of their width inside it.
        weight = np.clip((radius - r) / cell + 0.5, 0, 1)
        circles.append(dict(radius=radius, share=float((image * weight).sum())))
    slits = []
    for w, h in ((0.52, 1.0), (0.76, 2.04)):
        slits.append(dict(halfWidth=w, halfHeight=h, share=fraction((abs(x) < w) & (abs(y) < h))))
    return dict(n=n, effectiveArcsec=effective, fwhm=fwhm, beta=beta, circles=circles, slits=slits)


def photons(ab, wavelength):
    """Photons/s/cm2/A of an AB magnitude by Astropy's units."""
    flux = (ab * u.ABmag).to(u.photon / u.s / u.cm ** 2 / u.AA, u.spectral_density(wavelength * u.AA))
    return dict(ab=ab, wavelengthA=wavelength, rate=flux.value)


def line_photons(flux, wavelength):
    energy = (const.h * const.c / (wavelength * u.AA)).to_value(u.erg)
    return dict(fluxErgSCm2=flux, wavelengthA=wavelength, rate=flux / energy)


out = dict(
    source=f'astropy {astropy.__version__}, scipy {scipy.__version__}, numpy {np.__version__}',
    ccd=[case(i) for i in range(60)],
    apertures=[aperture(f, b, x, y) for f in (0.6, 1.1) for b in (2.5, 3, 4) for x, y in ((0.5, 0.5), (0.3, 2), (1.5, 1))],
    sersic=[sersic(n, r) for n in (0.5, 0.6, 0.8, 1, 1.5, 2, 3, 4, 6, 8) for r in (0.1, 0.5, 1, 2, 5)],
    spread=[spread(n, e, f, 3) for n, e in ((0.5, 0.5), (1, 0.8), (4, 0.6), (2.5, 1.5)) for f in (0.7, 1.2)],
    photons=[photons(ab, w) for ab in (0, 19.5, 27) for w in (3600, 5480, 9000, 21500)],
    linePhotons=[line_photons(1e-16, w) for w in (3728, 6565, 21500)],
)
with open(os.path.join(os.path.dirname(__file__), 'exposure.json'), 'w') as f:
    json.dump(out, f, indent=1)
    f.write('\n')
