"""Writes nearby.json: redshifts between frames, distances near by with their errors by finite differences, and
matter without massive neutrinos, by Astropy. Run: /usr/bin/python3 nearby.py
"""
import json
import math
import os

import astropy
import astropy.units as u
from astropy.constants import c as light
from astropy.coordinates import SkyCoord
from astropy.cosmology import FlatLambdaCDM, LambdaCDM

LIGHT = light.to_value(u.km / u.s)
SPEED = 369.82
APEX = SkyCoord(l=264.021 * u.deg, b=48.253 * u.deg, frame='galactic')

POSITIONS = [(167.942, -6.944), (347.942, 6.944), (0, 0), (360, 0), (83.6, 22.0), (187.706, 12.391), (266.4, -29.0),
             (12.3, 89.99), (201.4, -43.0), (54.6, -35.5), (210.8, -90)]
REDSHIFTS = [-0.0009, 0, 0.0008, 0.0042, 0.0123, 0.05, 1.5]

COSMOLOGIES = {
    'planck-2018': FlatLambdaCDM(67.66, 0.30966, Tcmb0=2.7255, Neff=3.046, m_nu=u.Quantity([0, 0, 0.06], u.eV)),
    'open-30': LambdaCDM(70, 0.3, 0, Tcmb0=0),
}


def solar_factor(position):
    """1 + z of the Sun's motion: gamma (1 - beta cos theta), the angle by Astropy's own frames."""
    ra, dec = position
    theta = SkyCoord(ra * u.deg, dec * u.deg).galactic.separation(APEX).rad
    beta = SPEED / LIGHT
    return (1 - beta * math.cos(theta)) / math.sqrt(1 - beta * beta)


def frames():
    for position in POSITIONS:
        for z in REDSHIFTS:
            yield dict(raDeg=position[0], decDeg=position[1], zHeliocentric=z,
                       zCmb=(1 + z) / solar_factor(position) - 1)


def distance(cosmology, factor, z_hel, motion):
    """D_L of a galaxy of which `motion` (km/s) of the redshift is its own."""
    z_cmb = (1 + z_hel) / factor - 1
    own = (1 + z_cmb) / (1 + motion / LIGHT) - 1
    return (1 + z_hel) * cosmology.comoving_transverse_distance(own).to_value(u.Mpc)


def distances():
    for name, cosmology in COSMOLOGIES.items():
        for position in POSITIONS[:5]:
            factor = solar_factor(position)
            for z in (0.004, 0.0123, 0.05, 1.5):
                d = lambda v, dz: distance(cosmology, factor, z + dz, v)
                moved = 300 * abs(d(10, 0) - d(-10, 0)) / 20
                read = 1e-3 * abs(d(0, 1e-5) - d(0, -1e-5)) / 2e-5
                yield dict(cosmology=name, raDeg=position[0], decDeg=position[1], zHeliocentric=z,
                           luminosityMpc=d(0, 0), errorOfMotionMpc=moved, errorOfBothMpc=math.hypot(moved, read))


def matter():
    """The massive share of Onu0: the same species without mass, of which each has an equal part, taken away."""
    for H0, masses, Neff, T in [(67.66, [0, 0, 0.06], 3.046, 2.7255), (73.04, [0.1, 0.2, 0.3], 3.046, 2.7255),
                                (70, [0.05, 0.05], 2.5, 2.725), (67.66, [0, 0, 0], 3.046, 2.7255),
                                (67.66, [1, 1, 1], 3.046, 2.7255)]:
        make = lambda m: FlatLambdaCDM(H0, 0.3, Tcmb0=T, Neff=Neff, m_nu=u.Quantity(m, u.eV))
        heavy = make(masses).Onu0
        light_part = make([0] * len(masses)).Onu0 * masses.count(0) / len(masses)
        yield dict(H0KmSMpc=H0, mNuEv=masses, Neff=Neff, Tcmb0K=T, massive=heavy - light_part if any(masses) else 0)


out = dict(source=f'astropy {astropy.__version__}', frames=list(frames()), distances=list(distances()),
           matter=list(matter()))
with open(os.path.join(os.path.dirname(__file__), 'nearby.json'), 'w') as f:
    json.dump(out, f, indent=1)
    f.write('\n')
