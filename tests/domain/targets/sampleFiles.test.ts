import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { readTargetFile } from '@/lib/domain/targets/readTargetFile'
import { targetRowSchema } from '@/lib/domain/targets/schema'

const folder = 'tests/reference/targets'
const sample = (name: string) => readFileSync(`${folder}/${name}`, 'utf8')

interface Expected {
  name: string
  raDeg: number
  decDeg: number
  redshift: number
  magnitude: number
  effectiveRadiusArcsec: number
  pmRaMasYr: number
  pmDecMasYr: number
  lineFlux: number | null
}

// Written by Astropy 5.2, converted by its units: tests/reference/targets.py.
const expected = JSON.parse(readFileSync('tests/reference/targets.json', 'utf8')) as Expected[]

function values(text: string) {
  const file = readTargetFile(text)
  if (!file.ok) throw new Error(file.message)
  expect(file.rows.map(({ errors }) => errors)).toEqual(file.rows.map(() => ({})))
  return file.rows.map(({ row }) => targetRowSchema.parse(row))
}

/** To the rounding of the two conversions; angles to some 1e-12 of a turn. */
const isNear = (value: number | null | undefined, to: number | null) =>
  to === null
    ? value === null
    : Math.abs((value ?? Number.NaN) - to) <= 4e-13 * Math.max(Math.abs(to), Math.abs(to) > 1e-6 ? 1 : 0)

describe('a table of targets as Astropy writes it', () => {
  it.each([
    ['ECSV, blanks', 'named.ecsv', true],
    ['ECSV, commas', 'named-comma.ecsv', true],
    ['ECSV of quantities', 'quantities.ecsv', true],
    ['VOTable 1.1', 'told-1.1.vot', false],
    ['VOTable 1.2', 'told-1.2.vot', false],
    ['VOTable 1.3', 'told-1.3.vot', false],
    ['VOTable 1.4', 'told-1.4.vot', false],
  ])('says the same here: %s', (_, name, hasRadius) => {
    const read = values(sample(name))
    expect(read.map((one) => one.name)).toEqual(expected.map((one) => one.name))
    read.forEach((one, index) => {
      const row = expected[index] as Expected
      expect(one.redshift).toBe(row.redshift)
      expect(one.brightness).toMatchObject({ value: row.magnitude, band: 'r', system: 'AB' })
      expect([one.raDeg, row.raDeg]).toSatisfy(() => isNear(one.raDeg, row.raDeg))
      expect([one.decDeg, row.decDeg]).toSatisfy(() => isNear(one.decDeg, row.decDeg))
      expect([one.pmRaMasYr, row.pmRaMasYr]).toSatisfy(() => isNear(one.pmRaMasYr, row.pmRaMasYr))
      expect([one.pmDecMasYr, row.pmDecMasYr]).toSatisfy(() => isNear(one.pmDecMasYr, row.pmDecMasYr))
      expect([one.line, row.lineFlux]).toSatisfy(() => isNear(one.line?.value ?? null, row.lineFlux))
      if (hasRadius) expect(one.effectiveRadiusArcsec).toBeCloseTo(row.effectiveRadiusArcsec, 12)
    })
  })

  it('reads sexagesimal text to what its digits hold', () => {
    values(sample('plain.csv')).forEach((one, index) => {
      const row = expected[index] as Expected
      expect(Math.abs((one.raDeg ?? Number.NaN) - row.raDeg)).toBeLessThan((15 * 0.5e-4) / 3600)
      expect(Math.abs((one.decDeg ?? Number.NaN) - row.decDeg)).toBeLessThan(0.51e-3 / 3600)
      expect(one.redshift).toBe(row.redshift)
    })
  })

  it('reads VOTable 1.5 as 1.4, and a prefix before every element', () => {
    const text = sample('told-1.4.vot')
    const newer = text.replace('version="1.4"', 'version="1.5"')
    const prefixed = newer.replaceAll(/<(\/?)(?=[A-Z])/g, '<$1vot:').replace('xmlns=', 'xmlns:vot=')
    expect(values(newer)).toEqual(values(text))
    expect(values(prefixed)).toEqual(values(text))
  })

  it.each(['binary', 'binary2'])('says how to save one stored as %s', (kind) => {
    const file = readTargetFile(sample(`${kind}.vot`))
    expect(file).toEqual({
      ok: false,
      message: `Its rows are stored as ${kind.toUpperCase()}. Save it again with its rows as TABLEDATA: in Astropy, table.write(name, format="votable", tabledata_format="tabledata").`,
    })
  })
})
