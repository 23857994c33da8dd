import { describe, expect, it } from 'vitest'
import { operations } from '@/lib/domain/calculations/operations'
import { fieldErrorsOf } from '@/lib/fieldErrorsOf'

const asked = operations.filter(({ request }) => request)
const errorsOf = (path: string, over: object) => {
  const operation = operations.find((one) => one.path === path)
  const body = Object.defineProperties(
    { ...operation?.example },
    Object.getOwnPropertyDescriptors(JSON.parse(JSON.stringify(over))),
  )
  const read = operation?.request?.safeParse(body)
  return read?.error && fieldErrorsOf(read.error)
}

// Seen to fail with the objects made loose again.
describe('a request', () => {
  it.each(asked)('to $path holds no member that is not its own', ({ path }) => {
    expect(errorsOf(path, {})).toBeUndefined()
    expect(errorsOf(path, { maxAirmas: 2 })).toEqual({ form: 'Nothing here is called “maxAirmas”.' })
    expect(errorsOf(path, { ['x'.repeat(1000)]: 2 })?.form).toHaveLength(
      'Nothing here is called “”.'.length + 40,
    )
  })

  it.each(asked)('to $path is an object', ({ request }) => {
    for (const body of [null, [], 'text', 1, true, undefined])
      expect(request?.safeParse(body).error?.issues[0]).toMatchObject({
        path: [],
        message: 'Give an object of JSON.',
      })
  })

  it('names a member that no universe has', () => {
    const over = { cosmology: { H0: 70, Om0: 0.3, flat: true, w: -0.9 } }
    expect(errorsOf('/api/v1/cosmology', over)).toEqual({ cosmology: 'Nothing here is called “w”.' })
  })

  it.each([
    ['/api/v1/sky/positions', { targets: [{ id: 'a', raDeg: 1, decDeg: 2, pmRa: 3 }] }, 'targets.0'],
    ['/api/v1/sky/positions', { targets: [null] }, 'targets.0'],
    ['/api/v1/sky/visibility', { moon: { minSeparation: 30 } }, 'moon'],
    ['/api/v1/sky/visibility', { site: { latitudeDeg: 1, longitudeDeg: 2 } }, 'site.elevationM'],
    ['/api/v1/exposure/ccd', { solve: 'all' }, 'solve'],
    ['/api/v1/cosmology/inverse', { quantity: '__proto__' }, 'quantity'],
    ['/api/v1/cosmology/survey', { areaDeg2: 0 }, 'areaDeg2'],
    ['/api/v1/cosmology/survey', { edges: ['1', 2] }, 'edges.0'],
    ['/api/v1/cosmology/survey', { densityMpc3: -1 }, 'densityMpc3'],
    ['/api/v1/cosmology/survey', { stellarMass: '12' }, 'stellarMass'],
  ])('to %s with %j is told in our own words at %s', (path, over, field) => {
    const errors = errorsOf(path, over) ?? {}
    expect(Object.keys(errors)).toEqual([field])
    expect(Object.values(errors)[0]).not.toMatch(/invalid|expected|received/i)
  })

  it.each([
    ['/api/v1/sky/positions', 'targets', 501, '501 targets were given; one call takes at most 500.'],
    ['/api/v1/sky/visibility', 'targets', 501, '501 targets were given; one call takes at most 500.'],
    ['/api/v1/sky/positions', 'instants', 1001, '1,001 instants were given; one call takes at most 1,000.'],
  ])('to %s is counted before it is looked at: %s', (path, member, count, sentence) => {
    const many = Array.from({ length: count }, () => null)
    expect(() => errorsOf(path, { [member]: many })).toThrow(sentence)
    expect(Object.keys(errorsOf(path, { [member]: many.slice(1) }) ?? {})).toHaveLength(count - 1)
  })
})
