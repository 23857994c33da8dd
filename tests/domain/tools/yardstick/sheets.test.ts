import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { plotQuantity } from '@/lib/domain/tools/yardstick/curves'
import { citationLine } from '@/lib/domain/tools/yardstick/exports/citation'
import { sheetCsv } from '@/lib/domain/tools/yardstick/exports/csv'
import { sheetEcsv } from '@/lib/domain/tools/yardstick/exports/ecsv'
import { sheetLatex } from '@/lib/domain/tools/yardstick/exports/latex'
import { latexUnit } from '@/lib/domain/tools/yardstick/exports/latexText'
import { sheetPlain } from '@/lib/domain/tools/yardstick/exports/plain'
import { readValues } from '@/lib/domain/tools/yardstick/inverseFields'
import { missingSentence } from '@/lib/domain/tools/yardstick/missingSentence'
import { quantities } from '@/lib/domain/tools/yardstick/quantities'
import { compareSheet } from '@/lib/domain/tools/yardstick/sheets/compareSheet'
import { distancesSheet } from '@/lib/domain/tools/yardstick/sheets/distancesSheet'
import { historiesOf } from '@/lib/domain/tools/yardstick/histories'
import { inverseSheet } from '@/lib/domain/tools/yardstick/sheets/inverseSheet'
import { nearSheet } from '@/lib/domain/tools/yardstick/sheets/nearSheet'
import { emptyOwn, type Chosen } from '@/lib/domain/tools/yardstick/state'
import { readyUniverses, universesOf } from '@/lib/domain/tools/yardstick/universes'

// Seen to fail with D_M written for D_L, with the power of the sky-limited time as 2, and with values rounded in the
// files.

interface Reference {
  models: { name: string; rows: Record<string, number>[] }[]
}
const reference = JSON.parse(
  readFileSync(new URL('../../../reference/cosmology.json', import.meta.url), 'utf8'),
) as Reference
const planckRows = reference.models.find(({ name }) => name === 'planck-2018')?.rows ?? []

const preset = (id: string): Chosen => ({ own: null, id })
const own = (text: Partial<typeof emptyOwn>): Chosen => ({ own: { ...emptyOwn, ...text }, id: null })
const ready = (...chosen: Chosen[]) => readyUniverses(universesOf(chosen))
const bouncing = own({ Ode0: '1.75' })

describe('numbers in the files, against Astropy', () => {
  const redshifts = planckRows.map(({ z }) => z ?? 0)
  const universes = ready(preset('planck-2018'))
  const ids = quantities.map(({ id }) => id).filter((id) => planckRows[1]?.[id] !== undefined)
  const sheet = distancesSheet(redshifts, universes, ids)

  it('holds every quantity of the reference tables', () => {
    expect(redshifts.length).toBeGreaterThan(10)
    expect(ids).toEqual(
      expect.arrayContaining([
        'luminosityMpc',
        'angularDiameterMpc',
        'lookbackGyr',
        'ageGyr',
        'kpcPerArcsec',
        'q',
      ]),
    )
  })

  it.each([
    ['CSV', sheetCsv(sheet).trim().split('\r\n').slice(1)],
    [
      'ECSV',
      sheetEcsv(sheet, universes, 'https://noctuary.example')
        .trim()
        .split('\n')
        .filter((line) => !line.startsWith('#'))
        .slice(1),
    ],
  ])('%s', (_name, lines) => {
    expect(lines).toHaveLength(redshifts.length)
    lines.forEach((line, row) => {
      const cells = line.split(',')
      ids.forEach((id, at) => {
        const wanted = planckRows[row]?.[id]
        if (wanted === undefined) return
        const got = Number(cells[at + 1])
        // The library and this engine agree to 1e-8; the files must not lose a digit of it.
        expect(Math.abs(got - wanted), `${id} at z = ${redshifts[row]}`).toBeLessThanOrEqual(
          2e-8 * Math.abs(wanted) + 1e-12,
        )
      })
    })
  })
})

describe('a comparison', () => {
  const universes = ready(preset('planck-2018'), preset('local-ladder'))
  const [planck, ladder] = universes
  if (!planck || !ladder) throw new Error('Both presets make a universe.')
  const sheet = compareSheet([1, 0], universes, planck, ['luminosityMpc', 'distanceModulusMag', 'Ok'])

  it('gives ratios, differences of magnitudes and exposure times', () => {
    const ratio = ladder.cosmology.luminosityMpc(1) / planck.cosmology.luminosityMpc(1)
    const values = sheet.rows[0]?.cells.map(({ value }) => value)
    expect(values).toEqual([
      1,
      ratio,
      expect.closeTo(5 * Math.log10(ratio), 10),
      null,
      expect.closeTo(ratio ** 2, 12),
      expect.closeTo(ratio ** 4, 12),
    ])
  })

  it('says why there is no ratio at z = 0', () => {
    expect(sheet.rows[1]?.cells[1]?.absent?.words).toBe('0 under both')
    expect(sheet.rows[1]?.cells[2]?.absent?.words).toBe('none at z = 0')
  })
})

describe('what a universe does not have', () => {
  it('says where a bounce lies', () => {
    const [universe] = ready(bouncing)
    const sheet = distancesSheet([0.5, 2], ready(bouncing), ['luminosityMpc', 'ageGyr'])
    expect(sheet.rows[0]?.cells[1]?.value).toBeGreaterThan(1000)
    expect(sheet.rows[0]?.cells[2]?.absent?.words).toBe('no big bang')
    expect(sheet.rows[1]?.cells[1]?.absent?.words).toMatch(/^does not exist: past the turn at z = 0\.9\d$/)
    expect(universe && missingSentence([0.5, 2, 3], universe)).toBe(
      'Of your redshifts, 2 and 3 do not exist in it.',
    )
  })

  it('says where an antipode lies, and keeps the times beyond it', () => {
    const closed = own({ Om0: '0.3', Ode0: '1.68' })
    const sheet = distancesSheet([30], ready(closed), ['luminosityMpc', 'lookbackGyr'])
    expect(sheet.rows[0]?.cells[1]?.absent?.words).toMatch(/^past the antipode at z = \d/)
    expect(sheet.rows[0]?.cells[2]?.value).toBeGreaterThan(10)
  })

  it('gives times but no distance in the future', () => {
    const sheet = distancesSheet([-0.5], ready(preset('planck-2018')), ['luminosityMpc', 'lookbackGyr'])
    expect(sheet.rows[0]?.cells[1]?.absent?.words).toBe('in the future: no distance')
    expect(sheet.rows[0]?.cells[2]?.value).toBeLessThan(0)
  })

  it('ends its curve at the turn, and says so', () => {
    const [curve] = plotQuantity(ready(bouncing), 'angularDiameterMpc', [2]).curves
    expect(curve?.ends).toMatch(/^ends at its turn, z = 0\.9\d$/)
    expect(curve?.points.at(-1)?.[0]).toBeLessThan(1)
  })
})

describe('the way back', () => {
  it('finds both redshifts of an angular-diameter distance', () => {
    const { values } = readValues('1.5 Gpc; 5 Gpc', 'angularDiameterMpc')
    const universes = ready(preset('planck-2018'))
    const sheet = inverseSheet(values, universes, 'angularDiameterMpc')
    const [near, far] = (sheet.rows[0]?.cells.slice(1) ?? []).map(({ value }) => Number(value))
    expect(universes[0]?.cosmology.angularDiameterMpc(near ?? 0)).toBeCloseTo(1500, 6)
    expect(universes[0]?.cosmology.angularDiameterMpc(far ?? 0)).toBeCloseTo(1500, 6)
    expect(far).toBeGreaterThan(near ?? 0)
    expect(sheet.rows[1]?.cells[1]?.absent?.words).toBe('nothing is that far')
  })

  it('says that a universe is younger, or had no beginning', () => {
    const { values } = readValues('20 Gyr', 'ageGyr')
    const words = inverseSheet(values, ready(preset('planck-2018'), bouncing), 'ageGyr').rows[0]?.cells.map(
      ({ absent }) => absent?.words,
    )
    expect(words).toEqual([undefined, 'Planck 2018 is younger', 'no big bang to count from'])
  })

  it('names the value that cannot be read', () => {
    expect(readValues('13 Mpc', 'ageGyr').troubles).toEqual([
      '13 Mpc: An age is given in Gyr or alike, such as 3.3 Gyr.',
    ])
  })
})

describe('near by', () => {
  const around = { frame: 'heliocentric', raDeg: 168, decDeg: -7, peculiarKmS: 300 } as const
  const sheet = nearSheet([0.005, 0.1, 0.0005], ready(preset('planck-2018')), around)

  it('adds what the Sun moves, towards the apex', () => {
    // 369.82 km/s over c is 0.00123: Planck Collaboration 2020, A&A 641, A1, table 3.
    expect(Number(sheet.rows[0]?.cells[1]?.value) - 0.005).toBeCloseTo(0.00124, 4)
  })

  it('says when a redshift is no distance', () => {
    expect(sheet.rows[0]?.cells.at(-1)?.caution).toMatch(/Give a measured distance/)
    expect(sheet.rows[1]?.cells.at(-1)?.value).toBe('yes')
  })
})

describe('files', () => {
  const risky = own({ name: '=1+1 & Ω_x "%', Ode0: '1.75' })
  const universes = ready(preset('planck-2018'), risky)
  const sheet = distancesSheet([0.5, 2], universes, ['luminosityMpc', 'comovingVolumeMpc3'])
  const citation = citationLine(universes)

  it('cites each cosmology, the method and the engine', () => {
    expect(citation).toMatch(
      /Planck Collaboration 2020.*own parameters.*Hogg 1999.*cosmology engine \d+\.\d+\.\d+\.$/,
    )
  })

  it('escapes what LaTeX would run', () => {
    const latex = sheetLatex(sheet, universes, citation)
    expect(latex).toContain('\\multicolumn{2}{c}{=1+1 \\& $\\Omega$\\_x "\\%}')
    expect(latex).toContain('$D_\\mathrm{L}$')
    expect(latex).toContain(' & \\dots & \\dots \\\\')
    expect(latex).toMatch(/\$\d\.\d+\\times10\^\{\d+\}\$/)
    expect(latexUnit('km / (Mpc s)')).toBe('km\\,Mpc$^{-1}$\\,s$^{-1}$')
    expect(latexUnit('Mpc3 / sr')).toBe('Mpc$^{3}$\\,sr$^{-1}$')
  })

  it('lines up as text', () => {
    const lines = sheetPlain(sheet, universes, citation).split('\n')
    expect(lines[2]).toMatch(/Planck 2018\s+=1\+1/)
    expect(lines[3]).toMatch(/^ *z +D_L +volume +D_L +volume$/)
    expect(new Set(lines.slice(3, 5).map((line) => line.length <= (lines[5]?.length ?? 0)))).toEqual(
      new Set([true]),
    )
  })

  it('quotes names in the head of ECSV so that they stay names', () => {
    const ecsv = sheetEcsv(sheet, universes, 'https://noctuary.example/tools/yardstick?z=2')
    expect(ecsv.split('\n')[0]).toBe('# %ECSV 1.0')
    expect(ecsv).toContain('# - {name: luminosityMpc_1, unit: "Mpc", datatype: float64')
    expect(ecsv).toContain('- name: "=1+1 & Ω_x \\"%"')
    expect(ecsv).toMatch(/\n2,\d+\.\d+,\d+\.?\d*,,\n$/)
  })
})

describe('the history of a universe', () => {
  it('runs from a big bang to its greatest size and back', () => {
    // Closed, matter alone, Ωm = 2: Ωm/a³ + (1 − Ωm)/a² = 0 gives the greatest size Ωm / (Ωm − 1) = 2.
    const { histories, domain, largest } = historiesOf(ready(own({ Om0: '2', Ode0: '0' })))
    const [history] = histories
    const sizes = history?.points.map(([, size]) => size) ?? []
    expect(Math.max(...sizes)).toBeCloseTo(2, 3)
    expect(largest).toBeGreaterThan(2)
    expect(sizes[0]).toBeLessThan(0.01)
    expect(sizes.at(-1)).toBeLessThan(0.01)
    expect(history?.points.at(-1)?.[0]).toBeLessThan(domain[1])
    expect(history?.event).toMatch(/^largest in \d+\.\d Gyr$/)
  })

  it('shrinks and grows about a bounce', () => {
    const [history] = historiesOf(ready(bouncing)).histories
    const sizes = history?.points.map(([, size]) => size) ?? []
    // z = 0.92 is the largest redshift there is.
    expect(Math.min(...sizes)).toBeCloseTo(1 / 1.92, 2)
    expect(sizes[0]).toBeGreaterThan(1)
    expect(history?.event).toMatch(/^turned 18\.4 Gyr ago$/)
  })
})
