"""Writes horizon.json: when targets can be observed over a horizon that is not flat, and beside the blind spot of an
altazimuth telescope, by Astropy's own ephemerides. Airless altitudes; the night is walked through every 20 s and
each edge refined. Run: /usr/bin/python3 horizon.py
"""
import json
import os
import warnings

import astropy
import astropy.units as u
import numpy as np
from astropy.coordinates import AltAz, EarthLocation, SkyCoord, get_sun
from astropy.time import Time, TimeDelta
from astropy.utils import iers
from scipy.optimize import brentq

iers.conf.auto_download = False
iers.conf.iers_degraded_accuracy = 'warn'
warnings.simplefilter('ignore')

SITES = {
    'south': (-37.4, -70.2, 2390),
    'north': (57.2, 24.4, 120),
    'equator': (0.5, 101.0, 900),
}
# Azimuth from north through east, altitude; degrees.
HORIZONS = {
    'a ridge in the east': [(0, 12), (50, 12), (75, 18), (95, 24), (120, 21), (150, 12)],
    'walls and gaps': [(2, 30), (40, 30), (42, 5), (100, 5), (101, 41), (160, 41), (160.5, 8), (178, 8), (182, 55),
                       (186, 8), (260, 16), (300, 48), (340, 10), (355, 62)],
    'a slope across the north': [(300, 10), (330, 58), (20, 66), (60, 10)],
    'level': [(77, 27)],
}
TARGETS = {
    '3C 273': (187.27791666666664, 2.052388888888889),
    'Fornax': (53.1, -27.8),
    'over the southern zenith': (330.0, -37.6),
    'over the northern zenith': (15.0, 57.0),
    'near the south pole': (80.0, -75.0),
    'near the north pole': (210.0, 72.0),
    'a degree from the north pole': (37.95, 89.0),
    'on the ecliptic': (95.0, 23.4),
}
NIGHTS = ['2020-03-20', '2021-10-02', '2027-07-01', '2027-12-13']
LOWEST, HIGHEST = 12.0, 86.0
STEP_S = 20.0


def horizon(name, azimuth):
    rows = sorted(HORIZONS[name])
    return np.interp(azimuth, [r[0] for r in rows], [r[1] for r in rows], period=360)


def night(site, date):
    """Moments of a day from noon to noon with the Sun low enough, and all that is needed again and again."""
    lat, lon, height = SITES[site]
    location = EarthLocation.from_geodetic(lon * u.deg, lat * u.deg, height * u.m)
    start = Time(date + 'T12:00:00', scale='utc') - TimeDelta(lon / 360, format='jd')
    seconds = np.arange(0, 86_400 + STEP_S, STEP_S)
    times = start + TimeDelta(seconds, format='sec')
    frame = AltAz(obstime=times, location=location, pressure=0 * u.hPa)
    return location, start, seconds, frame, get_sun(times).transform_to(frame).alt.deg


def windows(here, target, profile):
    location, start, seconds, frame, sun = here
    star = SkyCoord(*TARGETS[target], unit=u.deg)

    def least(altitude, azimuth, sun_altitude):
        limit = np.maximum(LOWEST, horizon(profile, azimuth))
        return np.minimum(np.minimum(altitude - limit, HIGHEST - altitude), -18 - sun_altitude)

    def at(second):
        t = start + TimeDelta(second, format='sec')
        one = AltAz(obstime=t, location=location, pressure=0 * u.hPa)
        aa = star.transform_to(one)
        return float(least(aa.alt.deg, aa.az.deg, get_sun(t).transform_to(one).alt.deg))

    aa = star.transform_to(frame)
    values = least(aa.alt.deg, aa.az.deg, sun)
    edges = []
    for i in np.nonzero((values[:-1] > 0) != (values[1:] > 0))[0]:
        root = brentq(at, seconds[i], seconds[i + 1], xtol=0.05)
        edges.append((start + TimeDelta(root, format='sec')).utc.isot + 'Z')
    assert values[0] <= 0 and values[-1] <= 0 and len(edges) % 2 == 0
    return [edges[i:i + 2] for i in range(0, len(edges), 2)]


rows = []
for site in SITES:
    for date in NIGHTS:
        here = night(site, date)
        for profile in HORIZONS:
            for target in TARGETS:
                rows.append(dict(site=site, date=date, horizon=profile, id=target,
                                 windows=windows(here, target, profile)))

out = dict(
    source=f'astropy {astropy.__version__}, its built-in ephemerides, no refraction, every {STEP_S:.0f} s',
    lowestAltitudeDeg=LOWEST,
    highestAltitudeDeg=HIGHEST,
    sites={k: dict(latitudeDeg=v[0], longitudeDeg=v[1], elevationM=v[2]) for k, v in SITES.items()},
    horizons={k: [dict(azimuthDeg=a, altitudeDeg=h) for a, h in sorted(v)] for k, v in HORIZONS.items()},
    targets=[dict(id=k, raDeg=v[0], decDeg=v[1]) for k, v in TARGETS.items()],
    windows=rows,
)
with open(os.path.join(os.path.dirname(__file__), 'horizon.json'), 'w') as f:
    json.dump(out, f, indent=1)
    f.write('\n')
