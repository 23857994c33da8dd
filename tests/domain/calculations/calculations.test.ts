import { describe, expect, it } from 'vitest'
import { ccdRequest, computeCcd } from '@/lib/domain/calculations/computeCcd'
import { computeCosmology, cosmologyRequest } from '@/lib/domain/calculations/computeCosmology'
import { computePositions, positionsRequest } from '@/lib/domain/calculations/computePositions'
import { computeVisibility, visibilityRequest } from '@/lib/domain/calculations/computeVisibility'
import { inverseRequest, invertCosmology } from '@/lib/domain/calculations/invertCosmology'
import { listCosmologies } from '@/lib/domain/calculations/listCosmologies'
import { fieldErrorsOf } from '@/lib/fieldErrorsOf'
import { Refusal } from '@/lib/errors'
import { jsonOrCsv } from '@/lib/http/jsonOrCsv'

const site = { latitudeDeg: -37.4, longitudeDeg: -70.2, elevationM: 2390 }
const quasar = { id: '3C 273', raDeg: 187.2779, decDeg: 2.0524 }

function refused(work: () => unknown): Refusal {
  try {
    work()
  } catch (error) {
    if (error instanceof Refusal) return error
    throw error
  }
  return expect.fail('it was not refused')
}

describe('the cosmology calculation', () => {
  const compute = (body: unknown) => computeCosmology(cosmologyRequest.parse(body))

  it('gives every quantity at each redshift and between pairs', () => {
    const answer = compute({ cosmology: 'planck-2018', z: [0, 1], pairs: [[0.5, 1]] })
    expect(answer.rows[0]).toMatchObject({ z: 0, luminosityMpc: 0, distanceModulusMag: null })
    expect(answer.rows[0]?.E).toBeCloseTo(1, 14)
    expect(answer.rows[1]?.luminosityMpc).toBeCloseTo((answer.rows[1]?.angularDiameterMpc ?? 0) * 4, 6)
    expect(answer.pairs[0]?.angularDiameterMpc).toBeGreaterThan(0)
    expect(answer.universe).toMatchObject({ origin: 'big-bang', fate: 'expands-forever' })
  })

  it('agrees with the closed form of Einstein and de Sitter', () => {
    const [row] = compute({ cosmology: { H0: 70, Om0: 1, Ode0: 0 }, z: [3] }).rows
    // D_C = 2 c/H0 (1 - 1/sqrt(1+z)).
    expect(row?.comovingMpc).toBeCloseTo((2 * 299_792.458) / 70 / 2, 6)
  })

  it('makes a flat universe exactly flat', () => {
    const { cosmology } = compute({ cosmology: { H0: 70, Om0: 0.3, flat: true }, z: [] })
    expect(cosmology).toMatchObject({ Ok0: 0, Ode0: 0.7 })
  })

  it('fails as a whole and names each value a bouncing universe does not have', () => {
    const refusal = refused(() => compute({ cosmology: { H0: 70, Om0: 0.3, Ode0: 1.75 }, z: [0.5, 2, 3] }))
    expect(Object.keys(refusal.fieldErrors)).toEqual(['z.1', 'z.2'])
    expect(refusal.fieldErrors['z.1']).toContain('no big bang')
  })

  it.each([
    ['an unknown preset', { cosmology: 'nowhere', z: [] }, 'cosmology'],
    ['no dark energy and not flat', { cosmology: { H0: 70, Om0: 0.3 }, z: [] }, 'cosmology.Ode0'],
    ['both', { cosmology: { H0: 70, Om0: 0.3, Ode0: 0.7, flat: true }, z: [] }, 'cosmology.Ode0'],
    ['a Hubble constant of 0', { cosmology: { H0: 0, Om0: 0.3, Ode0: 0.7 }, z: [] }, 'cosmology.H0'],
    ['a negative redshift', { cosmology: 'planck-2018', z: [-2] }, 'z.0'],
  ])('refuses %s at its place', (_, body, field) => {
    expect(Object.keys(refused(() => compute(body)).fieldErrors)).toEqual([field])
  })

  it('names every parameter and every value that is wrong, in redshifts and pairs alike', () => {
    const own = { H0: 0, Om0: -1, Ode0: 0.7, Tcmb0: 2.7, mNu: [1, 2, 3, 4] }
    expect(refused(() => compute({ cosmology: own, z: [] })).fieldErrors).toEqual({
      'cosmology.H0': 'The Hubble constant H₀ must be above 0 km/s/Mpc.',
      'cosmology.Om0': 'The matter density Ωm must be 0 or more.',
      'cosmology.mNu': '4 neutrino masses were given for 3 species.',
    })
    const body = {
      cosmology: { H0: 70, Om0: 0.3, Ode0: 1.75 },
      z: [0.5, 2],
      pairs: [
        [0.1, 0.2],
        [0.1, 9],
      ],
    }
    const refusal = refused(() => compute(body))
    expect(Object.keys(refusal.fieldErrors)).toEqual(['z.1', 'pairs.1'])
    expect(refusal.message).toBe('2 of 4 values cannot be in this model.')
  })

  it('counts all wrong values of many and names the first hundred', () => {
    const z = Array.from({ length: 100_000 }, () => 5)
    const refusal = refused(() => compute({ cosmology: { H0: 70, Om0: 0.3, Ode0: 1.75 }, z }))
    expect(Object.keys(refusal.fieldErrors)).toHaveLength(100)
    expect(refusal.message).toBe('100000 of 100000 values cannot be in this model. The first 100 are named.')
  })

  it('refuses more than 100,000 redshifts by size', () => {
    const z = Array.from({ length: 100_001 }, () => 1)
    expect(refused(() => compute({ cosmology: 'planck-2018', z })).kind).toBe('too-large')
    const pairs = z.map(() => ['wrong', null])
    expect(refused(() => compute({ cosmology: 'planck-2018', z: [], pairs })).message).toBe(
      '100,001 pairs were given; one call takes at most 100,000.',
    )
    expect(
      refused(() =>
        invertCosmology(inverseRequest.parse({ cosmology: 'wmap-9', quantity: 'ageGyr', values: z })),
      ).kind,
    ).toBe('too-large')
  })

  it('does not take text for numbers', () => {
    const read = cosmologyRequest.safeParse({
      cosmology: 'planck-2018',
      z: ['1', null, Number.POSITIVE_INFINITY],
    })
    expect(read.error && Object.keys(fieldErrorsOf(read.error))).toEqual(['z.0', 'z.1', 'z.2'])
  })

  it.each([
    [{ cosmology: 'planck-2018' }, { z: 'Give a list of redshifts.' }],
    [{ cosmology: 'planck-2018', z: {} }, { z: 'Give a list of redshifts.' }],
    [null, { form: 'Give an object of JSON.' }],
    [
      { z: [1], cosmology: ['planck-2018'] },
      { cosmology: 'Give the id of a preset, or H0, Om0 and Ode0 (or flat: true).' },
    ],
  ])('says what is missing in %j', (body, errors) => {
    const read = cosmologyRequest.safeParse(body)
    expect(read.error && fieldErrorsOf(read.error)).toEqual(errors)
  })

  it('finds both redshifts of an angular-diameter distance', () => {
    const invert = (quantity: string, values: number[]) =>
      invertCosmology(inverseRequest.parse({ cosmology: 'planck-2018', quantity, values }))
    const [row] = invert('angularDiameterMpc', [1500]).rows
    expect(row?.redshifts).toHaveLength(2)
    expect(invert('ageGyr', [40]).rows[0]?.redshifts).toEqual([])
  })

  it('lists the presets with citations', () => {
    expect(listCosmologies().find(({ id }) => id === 'planck-2018')).toMatchObject({
      H0: 67.66,
      Ok0: 0,
      standing: 'current',
    })
  })
})

describe('the sky calculations', () => {
  it('place Sun, Moon and targets', () => {
    const body = { site, targets: [quasar], instants: ['2027-03-05T06:00:00Z', '2027-03-05T03:00:00-03:00'] }
    const { instants } = computePositions(positionsRequest.parse(body))
    expect(instants[0]).toEqual(instants[1])
    expect(instants[0]?.targets[0]?.altitudeDeg).toBeGreaterThan(40)
    expect(instants[0]?.at).toBe('2027-03-05T06:00:00.000Z')
  })

  const see = (over: object = {}) =>
    computeVisibility(
      visibilityRequest.parse({
        site,
        targets: [quasar],
        from: '2027-03-01',
        to: '2027-03-03',
        maxAirmass: 2,
        ...over,
      }),
    )

  it('give the nights of a season and the hours in them', () => {
    const { nights, targets } = see()
    expect(nights.map(({ date }) => date)).toEqual(['2027-03-01', '2027-03-02', '2027-03-03'])
    expect(targets[0]?.totalHours).toBeCloseTo(targets[0]?.byNight.reduce((a, b) => a + b, 0) ?? 0, 9)
    expect(see({ twilight: 'nautical' }).nights[0]?.darkHours).toBeGreaterThan(nights[0]?.darkHours ?? 0)
  })

  it.each([
    ['a last evening before the first', { to: '2027-02-01' }, 'invalid', 'to'],
    ['401 nights', { to: '2028-04-04' }, 'too-large', undefined],
    ['two targets of one id', { targets: [quasar, quasar] }, 'invalid', 'targets.1.id'],
  ])('refuse %s', (_, over, kind, field) => {
    const refusal = refused(() => see(over))
    expect([refusal.kind, Object.keys(refusal.fieldErrors)[0]]).toEqual([kind, field])
  })

  it.each([
    ['30 February', { from: '2027-02-30' }, 'from'],
    ['a latitude of 91', { site: { ...site, latitudeDeg: 91 } }, 'site.latitudeDeg'],
    ['a declination of −91', { targets: [{ ...quasar, decDeg: -91 }] }, 'targets.0.decDeg'],
    ['an airmass below 1', { maxAirmass: 0.5 }, 'maxAirmass'],
  ])('do not take %s', (_, over, field) => {
    const body = { site, targets: [quasar], from: '2027-03-01', to: '2027-03-03', maxAirmass: 2, ...over }
    const read = visibilityRequest.safeParse(body)
    expect(read.error && Object.keys(fieldErrorsOf(read.error))).toEqual([field])
  })
})

describe('the CCD equation', () => {
  const body = {
    sourceRate: 100,
    skyRatePerPixel: 10,
    darkRatePerPixel: 0.1,
    readNoise: 5,
    pixels: 20,
    exposures: 3,
  }
  const solve = (over: object) => computeCcd(ccdRequest.parse({ ...body, ...over }))

  it('is solved both ways', () => {
    const { snr } = solve({ solve: 'snr', timeS: 900 })
    expect(solve({ solve: 'time', snr }).timeS).toBeCloseTo(900, 6)
    // S t / sqrt(S t + n (B t + D t + k R^2)).
    const noise = Math.sqrt(90_000 + 20 * (9000 + 90 + 75))
    expect(snr).toBeCloseTo(90_000 / noise, 6)
  })

  it('wants what it is to be solved from', () => {
    expect(refused(() => solve({ solve: 'snr' })).fieldErrors).toHaveProperty('timeS')
    expect(refused(() => solve({ solve: 'time' })).fieldErrors).toHaveProperty('snr')
  })
})

describe('an answer', () => {
  const rows = [{ z: 1, name: '=cmd', list: [1, 2], none: null }]
  const ask = (accept: string) =>
    jsonOrCsv(new Request('http://x.example', { headers: { accept } }), { rows }, rows)

  it('is JSON, or its rows as CSV that no spreadsheet runs', async () => {
    expect(await ask('application/json').json()).toEqual({ rows })
    const csv = ask('text/csv')
    expect(csv.headers.get('content-type')).toBe('text/csv; charset=utf-8')
    expect(await csv.text()).toBe("z,name,list,none\r\n1,'=cmd,1 2,\r\n")
  })
})
