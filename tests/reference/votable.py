"""Reads answers of the observability service with Astropy: every warning is an error, and each end of a window is held
against Astropy's own Sun and sky. Run against a server: /usr/bin/python3 votable.py http://127.0.0.1:3000
"""
import io
import sys
import urllib.error
import urllib.request
import warnings

import astropy.units as u
import numpy as np
from astropy.coordinates import AltAz, EarthLocation, SkyCoord, get_sun
from astropy.io.votable import parse
from astropy.time import Time
from astropy.utils import iers

iers.conf.auto_download = False
iers.conf.iers_degraded_accuracy = 'ignore'
warnings.simplefilter('ignore')

# The demonstration's site: latitude, longitude, elevation, lowest altitude.
LATITUDE, LONGITUDE, ELEVATION, LOWEST = -37.4, -70.2, 2390, 20.0
# The demonstration's records of its telescopes: horizon (azimuth, altitude) and highest altitude.
FENNEL = [(0, 12), (45, 13), (70, 18), (95, 24), (115, 22), (140, 14), (200, 12), (222, 12), (226, 29), (236, 29), (240, 12)]
HORIZONS = {'Aldous': [(0, 0)], 'Fennel': FENNEL}
HIGHEST = {'Aldous': 90.0, 'Fennel': 87.5}
# What the draft names a column's UCD and the list of UCD1+ words does not hold.
UNLISTED = "W06: Invalid UCD 'time.validity': Unknown word 'time.validity'"
QUERIES = ['POS=52,-27.8&TIME=61430/61460', 'pos=187.2779,2.0524&time=61500/61530&min_obs=7200&facility=fennel',
           'POS=80,-75&TIME=61430/61830', 'POS=10,89&TIME=61430/61460', 'POS=52,-27.8&TIME=61430/61460&MAXREC=0',
           'POS=52,-27.8&TIME=61430/61460&MAXREC=7', 'POS=52,95', 'TIME=61430/61460', 'POS=1,2&RESPONSEFORMAT=fits',
           'POS=1,2&FACILITY=%3C%26%22%5D%5D%3E%00']


def ask(base, query):
    try:
        with urllib.request.urlopen(f'{base}/api/vo/observability/query?{query}') as answer:
            return answer.status, answer.read()
    except urllib.error.HTTPError as error:
        return error.code, error.read()


def read(body):
    with warnings.catch_warnings(record=True) as said:
        warnings.simplefilter('always')
        table = parse(io.BytesIO(body), verify='warn')
    told = [str(one.message) for one in said]
    return table, [one for one in told if UNLISTED not in one], len(told)


def altitudes(position, mjd):
    t = Time(mjd, format='mjd', scale='utc')
    place = EarthLocation.from_geodetic(LONGITUDE * u.deg, LATITUDE * u.deg, ELEVATION * u.m)
    frame = AltAz(obstime=t, location=place, pressure=0 * u.hPa)
    here = position.transform_to(frame)
    return get_sun(t).transform_to(frame).alt.deg, here.alt.deg, here.az.deg


def furthest(query, rows):
    """How far the ends of windows lie from the nearest limit, degrees; those of the range aside. Then the highest Sun, and
    how far the target stands at least inside the limits of its telescope."""
    asked = {key.upper(): value for key, value in (part.split('=') for part in query.split('&'))}
    ra, dec = map(float, asked['POS'].split(','))
    low, high = map(float, asked['TIME'].split('/'))
    mjd = np.concatenate([rows['t_start'], rows['t_stop']])
    names = np.concatenate([rows['facility'], rows['facility']])
    inside = (mjd > low + 1e-6) & (mjd < high - 1e-6)
    mjd, names = mjd[inside], names[inside]
    sun, altitude, azimuth = altitudes(SkyCoord(ra * u.deg, dec * u.deg), mjd)
    wall = [np.interp(az, *zip(*HORIZONS[name]), period=360) for az, name in zip(azimuth, names)]
    room = np.minimum(altitude - np.maximum(LOWEST, wall), [HIGHEST[name] for name in names] - altitude)
    return np.max(np.minimum(np.abs(sun + 18), np.abs(room))), np.max(sun), np.min(room)


def main(base):
    for query in QUERIES:
        status, body = ask(base, query)
        table, unexpected, count = read(body)
        infos = [(info.name, info.value) for info in table.resources[0].infos if info.name == 'QUERY_STATUS']
        rows = [one.array for one in table.iter_tables()]
        line = f'{status} {[value for _, value in infos]} {len(rows[0]) if rows else "-"} rows, version {table.version}'
        if status == 200 and len(rows[0]):
            off, sun, target = furthest(query, rows[0])
            line += f'; ends within {off:.4f} deg, Sun below {sun:.3f}, target inside its limits by {target:.3f}'
            assert off < 0.01 and sun < -17.99 and target > -0.01
        print(f'{query}\n  {line}; {count} notes of the unlisted word')
        assert not unexpected, unexpected


main(sys.argv[1] if len(sys.argv) > 1 else 'http://127.0.0.1:3000')
