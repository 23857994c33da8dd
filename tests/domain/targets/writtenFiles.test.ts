import { describe, expect, it } from 'vitest'
import fc from 'fast-check'
import { readTargetFile } from '@/lib/domain/targets/readTargetFile'
import { targetRowSchema } from '@/lib/domain/targets/schema'
import { targetRow } from '@/lib/domain/targets/targetRow'
import { targetsCsv } from '@/lib/domain/targets/targetsCsv'
import { targetsEcsv } from '@/lib/domain/targets/targetsEcsv'
import { targetsVotable } from '@/lib/domain/targets/targetsVotable'
import { computeProposal } from '@/lib/domain/observations/rules'
import type { Target } from '@/lib/domain/proposals/types'
import { contents, target } from '@/tests/support/contents'

const formats = [
  ['CSV', targetsCsv],
  ['ECSV', targetsEcsv],
  ['VOTable', targetsVotable],
] as const

const file = (targets: readonly Target[]) => ({
  reference: '2027A-014',
  targets,
  computed: computeProposal(contents()).targets,
  cosmologyName: 'Planck 2018',
  engineVersion: '1.4.0',
})

const line = { name: 'Hβ', kind: 'luminosity', value: 2.5e42, error: 3e41, widthKmS: 300 } as const
/** A target as it is kept: its numbers are those of the text typed. */
const kept = (one: Target): Target => ({ ...one, ...targetRowSchema.parse(targetRow(one)) })

const opportunity = { event: 'Kilonova', trigger: 'A burst, r < 20', reactionSeconds: 5400, triggers: 3 }

const targets: Target[] = [
  target(),
  target({
    ...{ id: 12, name: 'Lamp 27 "south" & <north>', raTyped: '12.61590', raDeg: 12.6159 },
    ...{
      decTyped: '−17 40 08.8',
      decDeg: -17.669111111111,
      pmRaMasYr: -1.25,
      pmDecMasYr: 0.5,
      epochYr: 2020.5,
    },
    ...{
      geometry: 'sersic',
      effectiveRadiusArcsec: 0.8,
      effectiveRadiusErrorArcsec: 0.15,
      sersicIndex: 2.5,
      redshiftError: 0.0004,
    },
    ...{ galacticEbv: 0.021, magnification: 6, magnificationError: 0.9, line, need: 'backup' },
    ...{ redshiftTyped: '0.1580', redshift: 0.158, redshiftFrame: 'cmb', redshiftType: 'photometric' },
  }),
  target({
    id: 13,
    name: '=1+1',
    decTyped: '-00 12 30',
    decDeg: -0.208333333333,
    geometry: 'uniform',
    effectiveRadiusArcsec: 4,
  }),
  target({
    ...{ id: 16, name: 'Lamp 31', spectrum: { kind: 'power-law', index: -0.5, indexError: 0.2 } },
  }),
  target({ id: 17, name: 'Lamp 32', spectrum: { kind: 'black-body', temperatureK: 5772 } }),
  target({
    ...{ id: 18, name: 'Lamp 33' },
    spectrum: { kind: 'table', wavelengthsNm: [300, 550.5, 1100], fLambda: [0, 2.5e-17, 1.25e-17] },
  }),
  target({
    ...{ id: 19, name: 'The next one', group: 'Bright, "near" ones', opportunity },
    ...{ raTyped: '', decTyped: '', raDeg: null, decDeg: null },
  }),
  target({
    id: 14,
    name: '#5, a comment',
    line: { ...line, kind: 'flux', value: 2.5e-17, error: null, widthKmS: 0 },
  }),
  target({
    id: 15,
    name: "'-x",
    brightness: null,
    redshift: null,
    redshiftTyped: '',
    raTyped: '',
    raDeg: null,
    decTyped: '',
    decDeg: null,
  }),
].map(kept)
const values = (list: readonly Target[]) => list.map((one) => targetRowSchema.parse(targetRow(one)))

function readBack(text: string) {
  const read = readTargetFile(text)
  if (!read.ok) throw new Error(read.message)
  expect(read.rows.map(({ errors }) => errors)).toEqual(read.rows.map(() => ({})))
  return read.rows.map(({ row }) => targetRowSchema.parse(row))
}

describe.each(formats)('targets written as %s', (_, write) => {
  it('read back unchanged', () => {
    expect(readBack(write(file(targets)))).toEqual(values(targets))
  })

  it('are the same file when written again from what was read', () => {
    const again = readBack(write(file(targets))).map((one, index) => ({
      ...one,
      id: targets[index]?.id ?? 0,
      position: 1,
      version: 1,
    }))
    expect(write(file(again))).toBe(write(file(targets)))
  })

  it('keep any name', () => {
    const name = fc
      .string({ unit: fc.constantFrom(...'ab \'"=+-@#,;<>&\\{}[]:%|β−0'), minLength: 1, maxLength: 20 })
      .filter((text) => text.trim() !== '')
    fc.assert(
      fc.property(name, (text) => {
        const one = target({ name: text.trim() })
        expect(readBack(write(file([one])))).toEqual(values([one]))
      }),
      { numRuns: 300 },
    )
  })
})

describe('a file for a spreadsheet', () => {
  it.each(['=1+1', '+A1', '-A1', '@SUM(A1)', '\t=1', "'=1"])('begins no cell as a formula: %j', (name) => {
    const text = targetsCsv(file([target({ name, brightness: null })]))
    const cells = text
      .split('\r\n')
      .slice(1)
      .join(',')
      .split(',')
      .map((cell) => cell.replace(/^"/, ''))
    expect(cells.filter((cell) => /^[=+\-@\t]/.test(cell) && !Number.isFinite(Number(cell)))).toEqual([])
  })
})

// Read by Astropy with every warning an error, and the same from both: tests/reference/targets.py.
describe('the files that Astropy was given', () => {
  it.each([
    ['ecsv', targetsEcsv],
    ['vot', targetsVotable],
  ] as const)('are what is written: %s', async (ending, write) => {
    await expect(write(file(targets))).toMatchFileSnapshot(`../../reference/targets/written.${ending}`)
  })
})
