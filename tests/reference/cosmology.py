"""Writes cosmology.json: every quantity for ten models at 31 redshifts, by Astropy and, for what Astropy
gets wrong or does not offer, by direct quadrature with scipy. Run: /usr/bin/python3 cosmology.py
"""
import json
import math
import os

import astropy
import astropy.units as u
import numpy as np
import scipy
from astropy.cosmology import LambdaCDM, FlatLambdaCDM, Flatw0waCDM, w0waCDM
from scipy.integrate import quad

REDSHIFTS = [0, 1e-4, 3e-4, 1e-3, 3e-3, 0.01, 0.02, 0.05, 0.1, 0.15834, 0.2, 0.3, 0.4, 0.5, 0.65, 0.8, 1,
             1.25, 1.5, 1.678, 2, 2.5, 3, 4, 5, 6.6145, 8, 11, 15, 20, 1100]


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
}


def deceleration(c, z):
    """q = -1 + (1+z) dE/dz / E, by a five-point derivative in ln(1+z)."""
    x, h = math.log1p(z), 1e-3
    e = lambda y: math.log(c.efunc(math.expm1(y)))
    return -1 + (8 * (e(x + h) - e(x - h)) - (e(x + 2 * h) - e(x - 2 * h))) / (12 * h)


def ball(c, z):
    """Comoving volume by quadrature of 4 pi D_M^2 dD_C in ln(1+z): right on both sides of the equator."""
    dh = c.hubble_distance.to_value(u.Mpc)
    k = c.Ok0

    def transverse(chi):
        if k > 0:
            return math.sinh(math.sqrt(k) * chi) / math.sqrt(k)
        if k < 0:
            return math.sin(math.sqrt(-k) * chi) / math.sqrt(-k)
        return chi

    def shell(x):
        zz = math.expm1(x)
        chi = quad(lambda y: math.exp(y) / c.efunc(math.expm1(y)), 0, x, epsabs=0, epsrel=1e-12)[0]
        return transverse(chi) ** 2 * math.exp(x) / c.efunc(zz)

    value, _ = quad(shell, 0, math.log1p(z), epsabs=0, epsrel=1e-10, limit=200)
    return 4 * math.pi * dh ** 3 * value


def age(c, z):
    """Age by quadrature in ln(1+z) with Astropy's E(z); c.age(1100) itself is off by up to 3e-6."""
    value, _ = quad(lambda x: 1 / c.efunc(math.expm1(x)), math.log1p(z), 60, epsabs=0, epsrel=1e-12, limit=500)
    return value * c.hubble_time.to_value(u.Gyr)


def row(c, z):
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
        comovingVolumeMpc3=ball(c, z) if z > 0 else 0.0,
        astropyVolumeMpc3=c.comoving_volume(z).value,
        differentialVolumeMpc3Sr=c.differential_comoving_volume(z).value,
        criticalDensityGCm3=c.critical_density(z).value,
        Om=float(c.Om(z)),
        Ode=float(c.Ode(z)),
        Ok=float(c.Ok(z)),
        q=deceleration(c, z),
    )
    if z > 0:
        values['distanceModulusMag'] = c.distmod(z).value
        values['kpcPerArcsec'] = 1 / c.arcsec_per_kpc_proper(z).value
    return {key: float(value) for key, value in values.items()}


PAIRS = [(0.2, 0.9), (0.5, 3), (1, 1.0001), (3, 0.5)]

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
)
with open(os.path.join(os.path.dirname(__file__), 'cosmology.json'), 'w') as f:
    json.dump(out, f, indent=1)
    f.write('\n')
