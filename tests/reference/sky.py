"""Writes sky.json: positions, twilights, Moon and target windows at four places by Astropy's own ephemerides.
Airless altitudes. Run: /usr/bin/python3 sky.py
"""
import json
import math
import os
import warnings

import astropy
import astropy.units as u
import numpy as np
from astropy.coordinates import AltAz, EarthLocation, SkyCoord, get_body, get_sun
from astropy.time import Time, TimeDelta
from astropy.utils import iers
from scipy.optimize import brentq

iers.conf.auto_download = False
iers.conf.iers_degraded_accuracy = 'warn'
warnings.simplefilter('ignore')

SITES = {
    'south': (-37.4, -70.2, 2390),
    'north': (57.2, 24.4, 120),
    'arctic': (69.7, 18.9, 100),
    'equator': (0.5, 101.0, 900),
}
TARGETS = {
    '3C 273': SkyCoord('12 29 06.70 +02 03 08.6', unit=(u.hourangle, u.deg)),
    'near the south pole': SkyCoord(80.0, -75.0, unit=u.deg),
    'near the north pole': SkyCoord(210.0, 72.0, unit=u.deg),
    'Fornax': SkyCoord(53.1, -27.8, unit=u.deg),
    'at 0 h': SkyCoord(0.0, -10.0, unit=u.deg),
    'just before 0 h': SkyCoord(359.98, 20.0, unit=u.deg),
    'a degree from the south pole': SkyCoord(120.0, -89.0, unit=u.deg),
    'a degree from the north pole': SkyCoord(37.95, 89.0, unit=u.deg),
    'on the ecliptic': SkyCoord(95.0, 23.4, unit=u.deg),
    'the galactic centre': SkyCoord(266.417, -29.008, unit=u.deg),
    'Lockman': SkyCoord(161.3, 58.0, unit=u.deg),
    # Barnard's star, ICRS J2000 and proper motion of Hipparcos (van Leeuwen 2007), to 1 mas/yr.
    'fast star': SkyCoord(269.452075 * u.deg, 4.693391 * u.deg, pm_ra_cosdec=-798.6 * u.mas / u.yr,
                          pm_dec=10328.1 * u.mas / u.yr, obstime=Time('J2000'), distance=1.83 * u.pc),
}
INSTANTS = ['2020-03-20T02:30:00', '2020-07-05T23:00:00', '2021-01-28T10:15:00', '2021-10-10T06:45:00',
            '2027-07-19T04:00:00', '2027-12-13T07:30:00', '2024-02-29T12:00:00', '2028-09-22T00:00:00']
NIGHTS = ['2020-03-20', '2020-06-21', '2021-10-02', '2021-12-30', '2027-07-01', '2027-10-05', '2024-02-29', '2028-09-22']
HORIZONS = {'sunset': -50 / 60, 'civil': -6, 'nautical': -12, 'astronomical': -18}


def place(name):
    lat, lon, height = SITES[name]
    return EarthLocation.from_geodetic(lon * u.deg, lat * u.deg, height * u.m)


def at_epoch(target, t):
    if not target.data.differentials:
        return target
    # One moment for a whole array of times: the star moves 0.03 arcseconds a day.
    moment = t if t.isscalar else t[0]
    moved = target.apply_space_motion(new_obstime=moment)
    return SkyCoord(moved.ra, moved.dec)


def frame(location, t):
    return AltAz(obstime=t, location=location, pressure=0 * u.hPa)


def sun_altitude(location, t):
    return get_sun(t).transform_to(frame(location, t)).alt.deg


def moon_altitude(location, t):
    return get_body('moon', t, location).transform_to(frame(location, t)).alt.deg


def illumination(t):
    sun, moon = get_sun(t), get_body('moon', t)
    s = sun.cartesian.xyz.to_value(u.au)
    m = moon.cartesian.xyz.to_value(u.au)
    to_sun, to_earth = s - m, -m
    cos = np.dot(to_sun, to_earth) / np.linalg.norm(to_sun) / np.linalg.norm(to_earth)
    return 0.5 * (1 + cos)


def position(site, iso):
    location, t = place(site), Time(iso, scale='utc')
    here = frame(location, t)
    moon = get_body('moon', t, location).transform_to(here)
    sun = get_sun(t).transform_to(here)
    targets = []
    for name, target in TARGETS.items():
        aa = at_epoch(target, t).transform_to(here)
        aa = SkyCoord(AltAz(alt=aa.alt, az=aa.az, obstime=t, location=location, pressure=0 * u.hPa))
        flat = lambda b: SkyCoord(AltAz(alt=b.alt, az=b.az, obstime=t, location=location, pressure=0 * u.hPa))
        targets.append(dict(id=name, altitudeDeg=aa.alt.deg, azimuthDeg=aa.az.deg,
                            moonSeparationDeg=aa.separation(flat(moon)).deg,
                            sunSeparationDeg=aa.separation(flat(sun)).deg))
    return dict(site=site, at=iso + 'Z', sunAltitudeDeg=sun.alt.deg, moonAltitudeDeg=moon.alt.deg,
                moonIllumination=float(illumination(t)),
                lastHours=t.sidereal_time('apparent', location.lon).hour, targets=targets)


def crossings(f, start, step_min=10, hours=24):
    """Times of sign changes of f in the day after `start`: (iso, rising)."""
    steps = np.arange(0, hours * 60 + step_min, step_min)
    values = f(start + TimeDelta(steps * 60, format='sec'))
    found = []
    for i in range(len(steps) - 1):
        if (values[i] > 0) != (values[i + 1] > 0):
            root = brentq(lambda m: float(f(start + TimeDelta(m * 60, format='sec'))), steps[i], steps[i + 1],
                          xtol=1e-3)
            found.append(((start + TimeDelta(root * 60, format='sec')).utc.isot + 'Z', bool(values[i + 1] > 0)))
    return found


def noon(site, date):
    return Time(date + 'T12:00:00', scale='utc') - TimeDelta(SITES[site][1] / 360, format='jd')


def night(site, date):
    location, start = place(site), noon(site, date)
    out = dict(site=site, date=date)
    for name, altitude in HORIZONS.items():
        edges = crossings(lambda t: altitude - sun_altitude(location, t), start)
        out[name] = dict(evening=next((e[0] for e in edges if e[1]), None),
                         morning=next((e[0] for e in reversed(edges) if not e[1]), None))
    out['moonEdges'] = [dict(at=e[0], rising=e[1]) for e in crossings(lambda t: moon_altitude(location, t), start)]
    out['moonIllumination'] = float(illumination(start + TimeDelta(0.5, format='jd')))
    return out


def young(altitude):
    c = math.sin(math.radians(altitude))
    return (1.002432 * c ** 2 + 0.148386 * c + 0.0096467) / (c ** 3 + 0.149864 * c ** 2 + 0.0102963 * c + 0.000303978)


MAX_AIRMASS = 1.8
LOWEST = brentq(lambda a: young(a) - MAX_AIRMASS, 1, 90)


def window(site, date, name):
    location, start = place(site), noon(site, date)
    target = TARGETS[name]
    edges = crossings(lambda t: at_epoch(target, t).transform_to(frame(location, t)).alt.deg - LOWEST, start)
    return dict(site=site, date=date, id=name, edges=[dict(at=e[0], rising=e[1]) for e in edges])


out = dict(
    source=f'astropy {astropy.__version__}, its built-in ephemerides, no refraction',
    maxAirmass=MAX_AIRMASS,
    lowestAltitudeDeg=LOWEST,
    sites={k: dict(latitudeDeg=v[0], longitudeDeg=v[1], elevationM=v[2]) for k, v in SITES.items()},
    targets=[dict(id=k, raDeg=v.icrs.ra.deg, decDeg=v.icrs.dec.deg,
                  **(dict(pmRaMasYr=-798.6, pmDecMasYr=10328.1) if k == 'fast star' else {}))
             for k, v in TARGETS.items()],
    positions=[position(s, i) for s in SITES for i in INSTANTS],
    nights=[night(s, d) for s in SITES for d in NIGHTS],
    windows=[window(s, d, n) for s in SITES for d in NIGHTS[::2] for n in TARGETS],
)
with open(os.path.join(os.path.dirname(__file__), 'sky.json'), 'w') as f:
    json.dump(out, f, indent=1)
    f.write('\n')
