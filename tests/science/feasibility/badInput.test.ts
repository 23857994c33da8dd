import { describe, expect, it } from 'vitest'
import { observationReport } from '../../../lib/science/feasibility'
import { ridge, slit } from '../support/instruments'
import { request } from '../support/request'

const table = (...rows: [number, number][]) =>
  rows.map(([wavelengthA, efficiency]) => ({ wavelengthA, efficiency }))
const mode = (change: Partial<typeof slit>) => ({ input: { mode: { ...slit, ...change } } })
const polar = { ...ridge, latitudeDeg: 69.7, longitudeDeg: 18.9 }
const june = { from: '2027-06-01', to: '2027-06-30' }

/** Each is refused by the check named, with its reason, and by no exception. */
const rows: [string, Parameters<typeof request>[0], string, string][] = [
  ['a target never up', { target: { decDeg: 80 } }, 'up-in-the-dark', 'Never rises here'],
  [
    'a site without a night',
    { input: { site: polar, season: june }, target: { decDeg: 40 } },
    'up-in-the-dark',
    'No night of this season is dark enough',
  ],
  [
    'an empty throughput table',
    mode({ throughput: [] }),
    'signal-to-noise',
    'throughput table of this mode is empty',
  ],
  [
    'wavelengths out of order',
    mode({ throughput: table([7000, 0.2], [4000, 0.2]) }),
    'signal-to-noise',
    'must grow from row to row',
  ],
  [
    'a throughput above 1',
    mode({ throughput: table([3000, 0.2], [8000, 20]) }),
    'signal-to-noise',
    'A throughput lies between 0 and 1.',
  ],
  ['a signal-to-noise of 0', { observation: { snr: 0 } }, 'signal-to-noise', 'must be above 0'],
  [
    'a line outside the mode',
    { target: { redshift: 3 } },
    'signal-to-noise',
    'The feature lies outside the range of this mode.',
  ],
  [
    'a size of 0',
    { target: { geometry: { kind: 'extended', effectiveRadiusArcsec: 0 } } },
    'signal-to-noise',
    'A half-light radius lies above 0',
  ],
  ['a redshift of 0', { target: { redshift: 0 } }, 'distance-trusted', 'peculiar motion'],
  ['no hours', { observation: { askedS: 0 } }, 'signal-to-noise', 'do not cover the overheads'],
]

describe('bad input gets a reason and what would help', () => {
  it.each(rows)('%s', (_, change, id, words) => {
    const report = observationReport(request(change))
    const check = report.checks.find((one) => one.id === id)
    expect([report.verdict, check?.verdict]).toEqual(['not-feasible', 'not-feasible'])
    expect(check?.why).toContain(words)
    expect(check?.fix).toMatch(/\.$/)
    expect(JSON.stringify(report)).not.toMatch(/NaN|Infinity/)
  })

  it('the Moon is not blamed for what is never up', () => {
    const { checks } = observationReport(request({ target: { decDeg: 80 } }))
    expect(checks.map(({ id }) => id)).not.toContain('hours-with-moon')
  })

  it('dates in the wrong order are refused in words', () => {
    const season = { from: '2027-09-30', to: '2027-09-01' }
    expect(() => observationReport(request({ input: { season } }))).toThrow(
      'The last night lies before the first.',
    )
  })
})
