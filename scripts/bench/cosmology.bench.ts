import { createCosmology, findPreset, type CosmologyQuantity } from '../../lib/science/cosmology'
import { independentTimes } from './independent'
import { measure } from './measure'
import { report } from './report'

const COUNT = 100_000
const { parameters } = findPreset('planck-2018')

const theirs = independentTimes(`
import json, time
import numpy as np, astropy.units as u
from astropy.cosmology import FlatLambdaCDM
def make():
    return FlatLambdaCDM(67.66, 0.30966, Tcmb0=2.7255, Neff=3.046, m_nu=u.Quantity([0, 0, 0.06], u.eV))
c = make()
z = np.random.default_rng(1).uniform(0, 10, 2000)
out = {}
for name, f in dict(luminosityMpc=c.luminosity_distance, lookbackGyr=c.lookback_time, E=c.efunc).items():
    f(z[:10]); start = time.process_time(); f(z); out[name] = (time.process_time() - start) / len(z)
start = time.process_time()
for i in range(20): make().luminosity_distance(1.0)
out['first'] = (time.process_time() - start) / 20
print(json.dumps(out))
`)

const redshifts = Float64Array.from({ length: COUNT }, (_, i) => (10 * ((i * 7919) % COUNT)) / COUNT)
const out = new Float64Array(COUNT)
const cosmology = createCosmology(parameters)

const quantities: readonly CosmologyQuantity[] = ['luminosityMpc', 'lookbackGyr', 'E']
for (const quantity of quantities) {
  const ours = measure(() => cosmology.batch(quantity, redshifts, out)) / COUNT
  report(`${quantity} of one redshift, in a batch`, ours, theirs?.[quantity])
}
let changed = 0
const first = measure(() => {
  for (let i = 0; i < 100; i += 1) {
    changed += 1
    createCosmology({ ...parameters, Om0: 0.3 + changed * 1e-6 }).luminosityMpc(1)
  }
})
report('a new cosmology and its first distance', first / 100, theirs?.first)
