"""Writes targets/: tables of targets as Astropy writes them, and targets.json: what they say in a target's own units by
Astropy's units and coordinates. Then reads this product's own files in that folder, every warning an error.
Run: /usr/bin/python3 tests/reference/targets.py
"""
import json
import pathlib
import re
import warnings

import astropy.units as u
import numpy as np
from astropy.coordinates import SkyCoord
from astropy.io.votable import from_table, parse
from astropy.table import MaskedColumn, QTable, Table

FOLDER = pathlib.Path(__file__).parent / 'targets'
FOLDER.mkdir(exist_ok=True)
LINE = 1e-17 * u.erg / u.s / u.cm**2

names = ['Lamp 12', 'Lamp 27 "south"', 'Lamp 31, b', "Lamp 40 d'"]
place = SkyCoord([12.6159, 187.27791667, 359.999875, 83.8220833], [-17.6691, 2.05238861, -0.00375, 88.125], unit='deg')
redshift = [0.1583, 2.0, 0.00421, 6.125]
magnitude = [17.25, 21.5, 12.9, 24.0]
radius = [0.8, 1.25, 40.0, 0.5] * u.arcsec
motion = SkyCoord(place.ra, place.dec, pm_ra_cosdec=[12.5, -3.25, 0, 1500] * u.mas / u.yr,
                  pm_dec=[-0.5, 4.125, 0, -870] * u.mas / u.yr)
flux = np.array([2.5, 130.0, 0.75, 9.0]) * LINE
masked = np.array([False, False, True, False])
lines = ['Hα', 'Hα', '', 'Hα']

# Named columns in units that are not a target's.
named = Table()
named['Object'] = names
named['RA'] = place.ra.to(u.hourangle)
named['Dec'] = place.dec.to(u.rad)
named['redshift'] = redshift
named['rmag'] = magnitude * u.mag
named['Re'] = radius.to(u.arcmin)
named['pmRA'] = motion.pm_ra_cosdec.to(u.arcsec / u.yr)
named['pmDE'] = motion.pm_dec.to(u.arcsec / u.yr)
named['line'] = lines
named['line_flux'] = MaskedColumn(flux.to_value(LINE), mask=masked, unit=LINE)
named['note'] = ['a', 'b: c', '#d', "it's"]
named['Re'].info.description = ("Half-light radius: measured along the major axis, in the image of the deepest band there is, and 'not' "
                                'corrected for the width of the stars in it')
named['Re'].info.meta = {'aperture': [1, 2], 'ucd': 'phys.angSize'}
named.meta['comments'] = ['first', 'second: {x}']
named.meta['nested'] = {'datatype': [{'name': 'RA', 'unit': 'nothing'}]}
named.write(FOLDER / 'named.ecsv', format='ascii.ecsv', overwrite=True)
named.write(FOLDER / 'named-comma.ecsv', format='ascii.ecsv', delimiter=',', overwrite=True)
quantities = QTable(named[[name for name in named.colnames if name != 'line_flux']])
quantities['line_flux'] = flux.to(u.W / u.m**2)
quantities['line_flux'][masked] = np.nan
quantities.write(FOLDER / 'quantities.ecsv', format='ascii.ecsv', overwrite=True)

# Columns that only their UCDs tell.
told = Table()
for name, values, ucd in [
    ('c1', names, 'meta.id;meta.main'),
    ('c2', place.ra.to(u.rad), 'pos.eq.ra;meta.main'),
    ('c3', place.dec.to(u.arcmin), 'pos.eq.dec;meta.main'),
    ('c4', redshift, 'src.redshift'),
    ('c5', magnitude * u.mag, 'phot.mag;em.opt.R'),
    ('c6', motion.pm_ra_cosdec, 'pos.pm;pos.eq.ra'),
    ('c7', motion.pm_dec.to(u.deg / u.yr), 'pos.pm;pos.eq.dec'),
    ('c8', MaskedColumn(flux.to_value(u.mW / u.m**2), mask=masked, unit=u.mW / u.m**2), 'phot.flux;spect.line'),
    ('c9', lines, 'meta.id;spect.line'),
]:
    told[name] = values
    told[name].info.meta = {'ucd': ucd}
told['c4'].description = 'Redshift & nothing <else>'
for version in ['1.1', '1.2', '1.3', '1.4']:
    document = from_table(told)
    document.version = version
    document.to_xml(str(FOLDER / f'told-{version}.vot'))
for kind in ['binary', 'binary2']:
    told.write(FOLDER / f'{kind}.vot', format='votable', tabledata_format=kind, overwrite=True)

# Sexagesimal text, as people keep it.
plain = Table()
plain['Name'] = names
plain['RAJ2000'] = place.ra.to_string(unit='hourangle', sep=':', precision=4, pad=True)
plain['DEJ2000'] = place.dec.to_string(unit='deg', sep=':', precision=3, pad=True, alwayssign=True)
plain['z_spec'] = redshift
plain['r_mag'] = magnitude
plain.write(FOLDER / 'plain.csv', format='ascii.csv', overwrite=True)

expected = [
    {'name': names[i], 'raDeg': place.ra.deg[i], 'decDeg': place.dec.deg[i], 'redshift': redshift[i],
     'magnitude': magnitude[i], 'effectiveRadiusArcsec': radius.to_value(u.arcsec)[i],
     'pmRaMasYr': motion.pm_ra_cosdec.to_value(u.mas / u.yr)[i], 'pmDecMasYr': motion.pm_dec.to_value(u.mas / u.yr)[i],
     'lineFlux': None if masked[i] else flux.to_value(u.erg / u.s / u.cm**2)[i]}
    for i in range(len(names))
]
(FOLDER.parent / 'targets.json').write_text(json.dumps(expected, indent=1) + '\n')

# What this product writes; the tests hold these two files to the code.
written = [FOLDER / 'written.ecsv', FOLDER / 'written.vot']
if all(path.exists() for path in written):
    warnings.simplefilter('error')
    ecsv = Table.read(written[0], format='ascii.ecsv')
    votable = parse(str(written[1]), verify='exception').get_first_table().to_table(use_names_over_ids=True)
    assert ecsv.colnames == votable.colnames
    for name in ecsv.colnames:
        assert (ecsv[name].unit or u.one) == (votable[name].unit or u.one), name
        left, right = (np.ma.filled(np.ma.asarray(table[name]), np.nan if ecsv[name].dtype.kind == 'f' else '')
                       for table in (ecsv, votable))
        if ecsv[name].dtype.kind != 'f':
            # The apostrophe that keeps spreadsheets from running a cell is of the text file only.
            left = np.array([re.sub(r"^'(?='*[=+\-@])", '', text) for text in left])
            right = np.array([str(text) for text in right])
        assert np.array_equal(left, right, equal_nan=ecsv[name].dtype.kind == 'f'), (name, left, right)
    print('Astropy reads', len(ecsv), 'targets of ours, the same from both, without a warning:', ecsv.meta)
