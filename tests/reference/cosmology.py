"""Writes cosmology.json: every quantity for fourteen models at 44 redshifts, by Astropy and, for what Astropy
gets wrong or does not offer, by direct quadrature with scipy; and what becomes of universes that turn or tear.
Run: /usr/bin/python3 cosmology.py
"""
import json
import math
import os
import re

import astropy
import astropy.units as u
import numpy as np
import scipy
from astropy.cosmology import LambdaCDM, FlatLambdaCDM, Flatw0waCDM, w0waCDM
from scipy.integrate import quad
from scipy.optimize import brentq

REDSHIFTS = [0, 1e-4, 3e-4, 1e-3, 3e-3, 0.01, 0.02, 0.03, 0.05, 0.07, 0.1, 0.15834, 0.2, 0.25, 0.3, 0.4, 0.5, 0.65,
             0.8, 0.9, 1, 1.1, 1.25, 1.5, 1.678, 2, 2.5, 3, 3.5, 4, 5, 6.6145, 7, 8, 9, 11, 13, 15, 17, 20, 50, 200,
             600, 1100]


def massive(*masses):
    return u.Quantity(masses, u.eV)


MODELS = {
    'planck-2018': (FlatLambdaCDM(67.66, 0.30966, Tcmb0=2.7255, Neff=3.046, m_nu=massive(0, 0, 0.06)),
                    dict(H0=67.66, Om0=0.30966, Ode0='flat', w0=-1, wa=0, Tcmb0=2.7255, Neff=3.046, mNuEv=[0, 0, 0.06])),
    'wmap-9': (FlatLambdaCDM(69.32, 0.2865, Tcmb0=2.725, Neff=3.04),
               dict(H0=69.32, Om0=0.2865, Ode0='flat', w0=-1, wa=0, Tcmb0=2.725, Neff=3.04, mNuEv=[])),
    'flat-70-30': (FlatLambdaCDM(70, 0.3, Tcmb0=0),
                   dict(H0=70, Om0=0.3, Ode0='flat', w0=-1, wa=0, Tcmb0=0, Neff=0, mNuEv=[])),
    'einstein-de-sitter': (FlatLambdaCDM(70, 1.0, Tcmb0=0),
                           dict(H0=70, Om0=1, Ode0='flat', w0=-1, wa=0, Tcmb0=0, Neff=0, mNuEv=[])),
    'open': (LambdaCDM(70, 0.3, 0.0, Tcmb0=0),
             dict(H0=70, Om0=0.3, Ode0=0, w0=-1, wa=0, Tcmb0=0, Neff=0, mNuEv=[])),
    'closed': (LambdaCDM(70, 0.3, 0.9, Tcmb0=2.725, Neff=3.04),
               dict(H0=70, Om0=0.3, Ode0=0.9, w0=-1, wa=0, Tcmb0=2.725, Neff=3.04, mNuEv=[])),
    'closed past the equator': (LambdaCDM(70, 1.5, 0.5, Tcmb0=2.725, Neff=3.04),
                                dict(H0=70, Om0=1.5, Ode0=0.5, w0=-1, wa=0, Tcmb0=2.725, Neff=3.04, mNuEv=[])),
    'evolving, flat': (Flatw0waCDM(67.51, 0.31, w0=-0.838, wa=-0.62, Tcmb0=2.7255, Neff=3.046,
                                   m_nu=massive(0, 0, 0.06)),
                       dict(H0=67.51, Om0=0.31, Ode0='flat', w0=-0.838, wa=-0.62, Tcmb0=2.7255, Neff=3.046,
                            mNuEv=[0, 0, 0.06])),
    'evolving, curved': (w0waCDM(72, 0.28, 0.68, w0=-0.9, wa=0.3, Tcmb0=2.7255, Neff=3.046),
                         dict(H0=72, Om0=0.28, Ode0=0.68, w0=-0.9, wa=0.3, Tcmb0=2.7255, Neff=3.046, mNuEv=[])),
    'heavy neutrinos': (LambdaCDM(68, 0.29, 0.7, Tcmb0=2.7255, Neff=3.046, m_nu=massive(0.1, 0.2, 0.3)),
                        dict(H0=68, Om0=0.29, Ode0=0.7, w0=-1, wa=0, Tcmb0=2.7255, Neff=3.046,
                             mNuEv=[0.1, 0.2, 0.3])),
    'negative Lambda': (LambdaCDM(70, 0.4, -0.3, Tcmb0=2.7255, Neff=3.046),
                        dict(H0=70, Om0=0.4, Ode0=-0.3, w0=-1, wa=0, Tcmb0=2.7255, Neff=3.046, mNuEv=[])),
    'phantom, flat': (Flatw0waCDM(71, 0.27, w0=-1.3, wa=0, Tcmb0=2.7255, Neff=3.046),
                      dict(H0=71, Om0=0.27, Ode0='flat', w0=-1.3, wa=0, Tcmb0=2.7255, Neff=3.046, mNuEv=[])),
    'hardly closed': (LambdaCDM(67.4, 0.315, 0.6851, Tcmb0=2.7255, Neff=3.046),
                      dict(H0=67.4, Om0=0.315, Ode0=0.6851, w0=-1, wa=0, Tcmb0=2.7255, Neff=3.046, mNuEv=[])),
    'evolving, closed, massive': (w0waCDM(67, 0.3, 0.74, w0=-1.1, wa=0.4, Tcmb0=2.7255, Neff=3.046,
                                          m_nu=massive(0.05, 0.05, 0.05)),
                                  dict(H0=67, Om0=0.3, Ode0=0.74, w0=-1.1, wa=0.4, Tcmb0=2.7255, Neff=3.046,
                                       mNuEv=[0.05, 0.05, 0.05])),
}


def deceleration(c, z):
    """q = -1 + (1+z) dE/dz / E, by a five-point derivative in ln(1+z)."""
    x, h = math.log1p(z), 1e-3
    e = lambda y: math.log(c.efunc(math.expm1(y)))
    return -1 + (8 * (e(x + h) - e(x - h)) - (e(x + 2 * h) - e(x - 2 * h))) / (12 * h)


def tight(c, z, weight):
    """Integral of exp(weight x)/E over x = ln(1+z), Astropy's own E; its own integrals stop at 1e-8 of themselves."""
    ends = [*np.arange(0, math.log1p(z), 0.5), math.log1p(z)]
    f = lambda x: math.exp(weight * x) / c.efunc(math.expm1(x))
    return sum(quad(f, a, b, epsabs=0, epsrel=1e-13)[0] for a, b in zip(ends, ends[1:]))


def ball(c, chi):
    """Comoving volume by quadrature of the sphere at each distance: right on both sides of the equator."""
    dh = c.hubble_distance.to_value(u.Mpc)
    k = c.Ok0

    def transverse(x):
        if k > 0:
            return math.sinh(math.sqrt(k) * x) / math.sqrt(k)
        if k < 0:
            return math.sin(math.sqrt(-k) * x) / math.sqrt(-k)
        return x

    value, _ = quad(lambda x: transverse(x) ** 2, 0, chi, epsabs=0, epsrel=1e-13)
    return 4 * math.pi * dh ** 3 * value


def age(c, z):
    """Age by quadrature in ln(1+z) with Astropy's E(z); c.age(1100) itself is off by up to 3e-6."""
    value, _ = quad(lambda x: 1 / c.efunc(math.expm1(x)), math.log1p(z), 60, epsabs=0, epsrel=1e-12, limit=500)
    return value * c.hubble_time.to_value(u.Gyr)


def row(c, z):
    chi = tight(c, z, 1) if z > 0 else 0.0
    values = dict(
        z=z,
        E=float(c.efunc(z)),
        hubbleKmSMpc=c.H(z).value,
        comovingMpc=c.comoving_distance(z).value,
        transverseComovingMpc=c.comoving_transverse_distance(z).value,
        angularDiameterMpc=c.angular_diameter_distance(z).value,
        luminosityMpc=c.luminosity_distance(z).value,
        lookbackGyr=c.lookback_time(z).value,
        ageGyr=age(c, z),
        astropyAgeGyr=c.age(z).value,
        comovingVolumeMpc3=ball(c, chi) if z > 0 else 0.0,
        tightComovingMpc=chi * c.hubble_distance.to_value(u.Mpc),
        tightLookbackGyr=tight(c, z, 0) * c.hubble_time.to_value(u.Gyr) if z > 0 else 0.0,
        astropyVolumeMpc3=c.comoving_volume(z).value,
        differentialVolumeMpc3Sr=c.differential_comoving_volume(z).value,
        criticalDensityGCm3=c.critical_density(z).value,
        Om=float(c.Om(z)),
        Ode=float(c.Ode(z)),
        Ok=float(c.Ok(z)),
        Or=float(c.Ogamma(z) + c.Onu(z)),
        q=deceleration(c, z),
        dimmingMag=2.5 * math.log10(1 + z) * 4,
        timeDilation=1 + z,
    )
    if z > 0:
        values['distanceModulusMag'] = c.distmod(z).value
        values['kpcPerArcsec'] = 1 / c.arcsec_per_kpc_proper(z).value
        values['kpcComovingPerArcsec'] = 1 / c.arcsec_per_kpc_comoving(z).value
    return {key: float(value) for key, value in values.items()}


PAIRS = [(0.2, 0.9), (0.5, 3), (1, 1.0001), (3, 0.5), (0, 2), (2, 2), (0.01, 15)]

ODD = {
    'bounce of Lambda': dict(H0=70, Om0=0.3, Ode0=1.75, w0=-1, wa=0),
    'bounce, w = -0.9': dict(H0=60, Om0=0.1, Ode0=2.0, w0=-0.9, wa=0),
    'falls back, closed': dict(H0=70, Om0=2.0, Ode0=0.02, w0=-1, wa=0),
    'falls back, negative dark energy': dict(H0=70, Om0=0.3, Ode0=-0.3, w0=-0.8, wa=0.1),
    'rip, w = -1.3': dict(H0=70, Om0=0.3, Ode0=0.7, w0=-1.3, wa=0),
    'rip, wa = 0.5': dict(H0=70, Om0=0.3, Ode0=0.72, w0=-1, wa=0.5),
    'lingers': dict(H0=70, Om0=0.3, Ode0=1.7, w0=-1, wa=0),
}


def odd(p):
    """Turns, ends and epochs of a model without radiation, by roots and quadrature of E^2 in a, in Gyr."""
    Om, Ode, w0, wa = p['Om0'], p['Ode0'], p['w0'], p['wa']
    Ok = 1 - Om - Ode
    dark = lambda a: Ode * a ** (-3 * (1 + w0 + wa)) * math.exp(-3 * wa * (1 - a))
    E2 = lambda a: Om / a ** 3 + Ok / a ** 2 + dark(a)
    # (d2a/dt2)/a over -H0^2/2, with w(a) = w0 + wa (1 - a).
    slowing = lambda a: Om / a ** 3 + dark(a) * (1 + 3 * (w0 + wa * (1 - a)))
    hubble = 977.7922216807891 / p['H0']

    def root(f, grid):
        for x, y in zip(grid, grid[1:]):
            if f(x) * f(y) < 0:
                return brentq(f, x, y, xtol=1e-15, rtol=8.9e-16)
        return None

    def time(f, *ends):
        return hubble * sum(quad(f, a, b, epsabs=0, epsrel=1e-12, limit=400)[0] for a, b in zip(ends, ends[1:]))

    plain = lambda a: 1 / (a * math.sqrt(E2(a)))
    # a = v^2 takes the big bang's singularity away, a = turn -+ v^2 that of a turn.
    early = lambda v: 2 / (v * math.sqrt(E2(v * v))) if v > 0 else 0.0
    out = dict(p)
    bounce = root(E2, np.linspace(1, 0.01, 2000))
    if bounce is not None:
        near = lambda v: 2 * v / ((bounce + v * v) * math.sqrt(abs(E2(bounce + v * v))))
        return dict(out, turnaroundRedshift=1 / bounce - 1,
                    turnaroundGyr=time(near, 0, math.sqrt((1 - bounce) / 2)) + time(plain, bounce + (1 - bounce) / 2, 1))
    out['ageGyr'] = time(early, 0, 0.5, 1)
    since = root(slowing, np.linspace(1, 0.01, 2000))
    out['acceleratingSinceRedshift'] = None if since is None or slowing(1) > 0 else 1 / since - 1
    greatest = root(E2, np.linspace(1, 200, 100000))
    if greatest is not None:
        near = lambda v: 2 * v / ((greatest - v * v) * math.sqrt(abs(E2(greatest - v * v))))
        middle = 1 + (greatest - 1) / 2
        out['greatestSizeInGyr'] = time(plain, 1, middle) + time(near, 0, math.sqrt(greatest - middle))
        out['recollapseAgeGyr'] = 2 * (out['ageGyr'] + out['greatestSizeInGyr'])
    elif w0 < -1 or wa > 0:
        tail = lambda x: 1 / math.sqrt(E2(math.exp(x))) if x < 300 and wa * math.exp(x) < 200 else 0.0
        out['ripInGyr'] = time(tail, 0, 1, 2, 4, 8, 16, 32, 64)
    return out


out = dict(
    source=f'astropy {astropy.__version__}, scipy {scipy.__version__}, numpy {np.__version__}',
    models=[
        dict(
            name=name,
            parameters=dict(name=name, **parameters),
            Ok0=float(c.Ok0),
            rows=[row(c, z) for z in REDSHIFTS],
            pairs=[dict(z1=a, z2=b, angularDiameterMpc=float(c.angular_diameter_distance_z1z2(a, b).value))
                   for a, b in PAIRS],
        )
        for name, (c, parameters) in MODELS.items()
    ],
    odd=[dict(name=name, **odd(p)) for name, p in ODD.items()],
)
text = json.dumps(out, indent=1)
# One line a row.
text = re.sub(r'\{([^{}]*)\}', lambda m: '{' + re.sub(r'\s*\n\s*', ' ', m[1]).strip() + '}', text)
with open(os.path.join(os.path.dirname(__file__), 'cosmology.json'), 'w') as f:
    f.write(text + '\n')
