import { createAlmanac, nightAt, visibility } from '../../lib/science/sky'
import { independentTimes } from './independent'
import { measure } from './measure'
import { report } from './report'

const site = { latitudeDeg: -37.4, longitudeDeg: -70.2, elevationM: 2390 }
const season = { from: '2027-07-01', to: '2027-12-31', maxAirmass: 1.8 }
const NIGHTS = 184
const targets = Array.from({ length: 100 }, (_, i) => ({
  id: String(i),
  raDeg: (i * 37) % 360,
  decDeg: -80 + i,
}))

// The independent way: Sun and target every ten minutes of ten nights; a season is as many times longer.
const theirs = independentTimes(`
import json, time
import numpy as np, astropy.units as u
from astropy.coordinates import AltAz, EarthLocation, SkyCoord, get_sun
from astropy.time import Time
from astropy.utils import iers
iers.conf.auto_download = False
iers.conf.iers_degraded_accuracy = 'warn'
place = EarthLocation.from_geodetic(-70.2 * u.deg, -37.4 * u.deg, 2390 * u.m)
t = Time('2027-07-01T16:00:00') + np.arange(0, 1440) * 10 * u.min
frame = AltAz(obstime=t, location=place)
target = SkyCoord(53.1 * u.deg, -27.8 * u.deg)
target.transform_to(frame[:10])
start = time.process_time(); get_sun(t).transform_to(frame); sun = time.process_time() - start
start = time.process_time(); target.transform_to(frame); star = time.process_time() - start
print(json.dumps(dict(night=sun / 10, target=star / 10)))
`)

const first = measure(() => nightAt(site, '2027-08-14', -18, createAlmanac()))
report('one night, nothing kept', first, theirs?.night)
const almanac = createAlmanac()
const shared = { site, ...season, almanac }
const seasonTime = measure(() => visibility({ site, ...season, targets: [], almanac: createAlmanac() }), 3)
report(
  'a season of 184 nights, Sun and Moon',
  seasonTime,
  theirs?.night === undefined ? undefined : theirs.night * NIGHTS,
)
const withTargets = measure(() => visibility({ ...shared, targets }), 3)
const without = measure(() => visibility({ ...shared, targets: [] }), 3)
report(
  'one target through a season, Sun and Moon known',
  (withTargets - without) / targets.length,
  theirs?.target === undefined ? undefined : theirs.target * NIGHTS,
)
