import { mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { createCosmology, findPreset } from '../../lib/science/cosmology'
import { timesOfFile } from './independent'
import { measure, sayTime } from './measure'
import { report, reportText } from './report'

const COUNT = 100_000
const { parameters } = findPreset('planck-2018')
const cosmology = createCosmology(parameters)
const redshifts = Float64Array.from({ length: COUNT }, (_, i) => (10 * ((i * 7919) % COUNT)) / COUNT)
const out = new Float64Array(COUNT)

const folder = mkdtempSync(join(tmpdir(), 'bench-'))
const file = join(folder, 'astropy.f64')
const theirs = timesOfFile('cosmology.py', file)
const expected = theirs ? new Float64Array(Uint8Array.from(readFileSync(file)).buffer) : null
rmSync(folder, { recursive: true })

const per = (seconds: number | undefined): number | undefined => seconds && seconds / COUNT

let at = 0
for (const quantity of ['luminosityMpc', 'lookbackGyr', 'E'] as const) {
  const ours = measure(() => cosmology.batch(quantity, redshifts, out), 20) / COUNT
  report(`${quantity} of one redshift, 100,000 in a call`, ours, per(theirs?.[quantity]))
  if (!expected || quantity === 'E') continue
  let worst = 0
  for (let i = 0; i < COUNT; i += 1) {
    const there = expected[at + i] ?? NaN
    if (there > 0) worst = Math.max(worst, Math.abs((out[i] ?? NaN) / there - 1))
  }
  reportText('  largest difference of the two, of the value', worst.toExponential(1))
  at += COUNT
}

let changed = 0
const fresh = () => {
  changed += 1
  return createCosmology({ ...parameters, Om0: 0.3 + changed * 1e-6 })
}
const hundred = (run: () => unknown): number =>
  measure(() => {
    for (let i = 0; i < 100; i += 1) run()
  }) / 100

const read = measure(() => cosmology.batch('luminosityMpc', redshifts, out), 20)
const made = hundred(() => fresh().luminosityMpc(1))
report('luminosityMpc against a spline of 1,000 knots: reading', read / COUNT, per(theirs?.splineRead))
report(
  '  making it and reading all',
  made + read,
  theirs ? (theirs.splineMade ?? NaN) + (theirs.splineRead ?? NaN) : undefined,
)
if (theirs)
  reportText('  error of that spline beyond z = 0.001', '', (theirs.splineError ?? NaN).toExponential(1))
report('a new cosmology and its first distance', made, theirs?.first)
reportText(
  'a new cosmology with distance, lookback time and age',
  sayTime(
    hundred(() => {
      const c = fresh()
      c.luminosityMpc(1)
      c.lookbackGyr(1)
      c.ageGyr(1)
    }),
  ),
)

// The cost as the count grows: a whole call, from array to array.
const million = Float64Array.from({ length: 1_000_000 }, (_, i) => redshifts[i % COUNT] ?? 0)
const filled = new Float64Array(1_000_000)
for (let count = 1; count <= 1_000_000; count *= 10) {
  const [from, to] = [million.subarray(0, count), filled.subarray(0, count)]
  const repeats = Math.ceil(200_000 / count)
  const ours =
    measure(() => {
      for (let i = 0; i < repeats; i += 1) cosmology.batch('luminosityMpc', from, to)
    }) / repeats
  const name = `luminosityMpc of ${count.toLocaleString('en-GB')} in a call`
  if (count === 1_000_000) reportText(name, sayTime(ours))
  else report(name, ours, theirs?.[`luminosityMpc${count}`])
}
