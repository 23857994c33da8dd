import { computeProposal } from '../../lib/domain/observations/computeProposal'
import { exposureTimes } from '../../lib/science/exposure'
import { createAlmanac, visibility } from '../../lib/science/sky'
import { contents, observation, slitMode, target } from '../../tests/support/contents'
import { dark, imager } from '../../tests/science/support/instruments'
import { independentTimes } from './independent'
import { measure, sayTime } from './measure'
import { report, reportText } from './report'

const COUNT = 10_000
const ab = Float64Array.from({ length: COUNT }, (_, i) => 16 + (8 * i) / COUNT)
const out = new Float64Array(COUNT)
const source = { kind: 'magnitude', ab: 20, geometry: { kind: 'point' }, provenance: 'observed' } as const

reportText(
  `${COUNT.toLocaleString('en')} exposures, best apertures and whole frames included`,
  sayTime(measure(() => exposureTimes({ mode: imager, source, conditions: dark, snr: 12 }, ab, out))),
)

const targets = Array.from({ length: 50 }, (_, i) =>
  target({ id: i + 1, name: `T${i}`, raDeg: (i * 37) % 360, decDeg: -70 + i, redshift: 0.05 + i / 400 }),
)
const modes = [0, 1, 2].map((i) => ({ ...slitMode, modeId: 7 + i }))
const observations = targets.flatMap(({ id }) =>
  modes.map(({ modeId }, i) => observation({ id: id * 10 + i, targetId: id, modeId })),
)
let round = 0
/** Another brightness each time, so that nothing is remembered but the nights of the site. */
const whole = () => {
  round += 1
  const brightness = { ...targets[0]?.brightness, value: 18 + round / 1000 } as never
  return contents({
    targets: targets.map((one) => ({ ...one, brightness })),
    modes,
    observations,
    call: { ...contents().call, seasonFrom: '2027-07-01', seasonTo: '2027-12-31' },
  })
}
reportText(
  'a report on 50 targets in 3 modes, 184 nights, nights known',
  sayTime(measure(() => computeProposal(whole()), 3)),
)

const site = { latitudeDeg: -37.4, longitudeDeg: -70.2, elevationM: 2390 }
const many = Array.from({ length: 200 }, (_, i) => ({
  id: String(i),
  raDeg: (i * 37) % 360,
  decDeg: -80 + i / 2,
}))
const season = { site, from: '2027-07-01', to: '2027-12-31', maxAirmass: 1.8, targets: many }
const moon = { maxIllumination: 0.6, minSeparationDeg: 30 }
const theirs = independentTimes(`
import json, time
import numpy as np, astropy.units as u
from astropy.coordinates import AltAz, EarthLocation, SkyCoord, get_sun, get_moon
from astropy.time import Time
from astropy.utils import iers
iers.conf.auto_download = False
iers.conf.iers_degraded_accuracy = 'warn'
place = EarthLocation.from_geodetic(-70.2 * u.deg, -37.4 * u.deg, 2390 * u.m)
t = Time('2027-07-01T16:00:00') + np.arange(0, 288) * 10 * u.min
frame = AltAz(obstime=t, location=place)
ten = SkyCoord(np.arange(10) * 36 * u.deg, np.linspace(-80, 10, 10) * u.deg)
ten[:1, None].transform_to(frame[None, :3])
start = time.process_time()
get_sun(t).transform_to(frame)
moon = get_moon(t, place)
moon.transform_to(frame)
sky = time.process_time() - start
start = time.process_time()
ten[:, None].transform_to(frame[None, :])
for one in ten: one.separation(moon)
print(json.dumps(dict(night=sky / 2, target=(time.process_time() - start) / 10 / 2)))
`)
const independent = theirs ? 184 * ((theirs.night ?? 0) + 200 * (theirs.target ?? 0)) : undefined
report(
  '200 targets through 184 nights with the Moon, nothing known',
  measure(() => visibility({ ...season, moon, almanac: createAlmanac() }), 3),
  independent,
)
const almanac = createAlmanac()
report(
  'the same once the nights of the site are known',
  measure(() => visibility({ ...season, moon, almanac }), 3),
  independent,
)

// A wall all around that reaches far above the airmass limit: no star gets by without being held against it.
const wall = Array.from({ length: 36 }, (_, i) => ({ azimuthDeg: 10 * i, altitudeDeg: 36 + ((i * 7) % 20) }))
const limited = { ...season, moon, highestAltitudeDeg: 87 }
report(
  'the same under a horizon of 36 rows, nothing known',
  measure(() => visibility({ ...limited, horizons: [[...wall]], almanac: createAlmanac() }), 3),
  independent,
)
report(
  'under it once the nights of the site are known',
  measure(() => visibility({ ...limited, horizons: [wall], almanac }), 3),
  independent,
)
