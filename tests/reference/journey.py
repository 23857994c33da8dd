"""Writes journey.json: three published objects under Planck 2018, by Astropy. Run: /usr/bin/python3 journey.py

3C 273: position ICRF (Charlot et al. 2020, A&A 644, A159) to the digits given, z = 0.158339 (Strauss et al.
  1992, ApJS 83, 29), rounded as 0.15834.
Abell 1689: position and z = 0.1832 after Abell, Corwin & Olowin 1989 (ApJS 70, 1) and Struble & Rood 1999
  (ApJS 125, 35).
Himiko: position and z = 6.595 from Ouchi et al. 2009 (ApJ 696, 1164).
"""
import json
import os

import astropy
import astropy.units as u
from astropy.coordinates import SkyCoord
from astropy.cosmology import FlatLambdaCDM

planck = FlatLambdaCDM(67.66, 0.30966, Tcmb0=2.7255, Neff=3.046, m_nu=u.Quantity([0, 0, 0.06], u.eV))

OBJECTS = [
    ('3C 273', '12 29 06.70', '+02 03 08.6', 0.15834,
     'Charlot et al. 2020, A&A 644, A159; Strauss et al. 1992, ApJS 83, 29'),
    ('Abell 1689', '13 11 29.5', '-01 20 28', 0.1832,
     'Abell, Corwin & Olowin 1989, ApJS 70, 1; Struble & Rood 1999, ApJS 125, 35'),
    ('Himiko', '02 17 57.563', '-05 08 44.45', 6.595, 'Ouchi et al. 2009, ApJ 696, 1164'),
]


def entry(name, ra, dec, z, citation):
    place = SkyCoord(f'{ra} {dec}', unit=(u.hourangle, u.deg))
    return dict(
        name=name, ra=ra, dec=dec, raDeg=place.ra.deg, decDeg=place.dec.deg, redshift=z, citation=citation,
        luminosityMpc=planck.luminosity_distance(z).value,
        angularDiameterMpc=planck.angular_diameter_distance(z).value,
        comovingMpc=planck.comoving_distance(z).value,
        kpcPerArcsec=1 / planck.arcsec_per_kpc_proper(z).value,
        distanceModulusMag=planck.distmod(z).value,
        lookbackGyr=planck.lookback_time(z).value,
        ageGyr=planck.age(z).value,
    )


out = dict(source=f'astropy {astropy.__version__}', cosmology='planck-2018', objects=[entry(*o) for o in OBJECTS])
with open(os.path.join(os.path.dirname(__file__), 'journey.json'), 'w') as f:
    json.dump(out, f, indent=1)
    f.write('\n')
