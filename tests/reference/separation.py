"""Writes separation.json: angles between places on the sky by Astropy. Run: /usr/bin/python3 separation.py"""
import json
import os

import astropy
import astropy.units as u
from astropy.coordinates import SkyCoord

PAIRS = [((53.1, -27.8), (53.1, -27.8)), ((53.1, -27.8), (53.1013888, -27.8)), ((53.1, -27.8), (53.1, -27.8013889)),
         ((359.9999, 0), (0.0001, 0)), ((10, 89.9999), (190, 89.9999)), ((306.5434583, -45.6075278), (306.5434, -45.6075)),
         ((0, 90), (77, -90)), ((12, 34), (192, -34)), ((150.1, 2.2), (210.3, -33.7)), ((83.6, 22.0), (83.6000001, 22.0))]


def rows():
    for a, b in PAIRS:
        first, second = (SkyCoord(ra * u.deg, dec * u.deg) for ra, dec in (a, b))
        yield dict(a=dict(raDeg=a[0], decDeg=a[1]), b=dict(raDeg=b[0], decDeg=b[1]),
                   arcsec=first.separation(second).to_value(u.arcsec))


with open(os.path.join(os.path.dirname(os.path.abspath(__file__)), 'separation.json'), 'w') as out:
    json.dump(dict(astropy=astropy.__version__, rows=list(rows())), out, indent=1)
    out.write('\n')
