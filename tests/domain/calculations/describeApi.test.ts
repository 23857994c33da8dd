import { readdirSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import {
  ccdAnswer,
  cosmologiesAnswer,
  cosmologyAnswer,
  inverseAnswer,
  positionsAnswer,
  problemAnswer,
  visibilityAnswer,
} from '@/lib/domain/calculations/answers'
import { computeCcd } from '@/lib/domain/calculations/computeCcd'
import { computeCosmology } from '@/lib/domain/calculations/computeCosmology'
import { computePositions } from '@/lib/domain/calculations/computePositions'
import { computeVisibility } from '@/lib/domain/calculations/computeVisibility'
import { callOf } from '@/lib/domain/calculations/callOf'
import { describeApi } from '@/lib/domain/calculations/describeApi'
import { invertCosmology } from '@/lib/domain/calculations/invertCosmology'
import { operations } from '@/lib/domain/calculations/operations'
import { listCosmologies } from '@/lib/domain/calculations/listCosmologies'
import { refuse } from '@/lib/errors'
import { problem } from '@/lib/http/problem'

const document = JSON.parse(JSON.stringify(describeApi())) as Record<string, unknown> & {
  paths: Record<string, Record<string, { operationId: string; responses: object; requestBody?: object }>>
  components: { schemas: Record<string, object> }
}

/** Every object below a value, itself included. */
function objectsOf(value: unknown): Record<string, unknown>[] {
  if (typeof value !== 'object' || value === null) return []
  const below = Object.values(value).flatMap(objectsOf)
  return Array.isArray(value) ? below : [value as Record<string, unknown>, ...below]
}

const jsonTypes = new Set(['object', 'array', 'string', 'number', 'integer', 'boolean', 'null'])

describe('the OpenAPI document', () => {
  it('has what OpenAPI 3.1 asks of a document, a path and an operation', () => {
    expect(Object.keys(document).sort()).toEqual(
      ['components', 'info', 'jsonSchemaDialect', 'openapi', 'paths', 'security'].sort(),
    )
    expect(document.openapi).toMatch(/^3\.1\.\d+$/)
    expect(document.info).toMatchObject({ title: expect.any(String), version: expect.any(String) })
    const ids: string[] = []
    for (const [path, item] of Object.entries(document.paths)) {
      expect(path).toMatch(/^\//)
      for (const [method, operation] of Object.entries(item)) {
        expect(['get', 'post']).toContain(method)
        ids.push(operation.operationId)
        expect('requestBody' in operation).toBe(method === 'post')
        for (const [status, response] of Object.entries(operation.responses)) {
          expect(status).toMatch(/^[1-5]\d\d$/)
          expect(response).toMatchObject({
            description: expect.stringMatching(/\.$/),
            content: expect.any(Object),
          })
        }
      }
    }
    expect(new Set(ids).size).toBe(ids.length)
  })

  it('has schemas of known types, and references that lead somewhere', () => {
    const all = objectsOf(document)
    const types = all.flatMap(({ type }) => (typeof type === 'string' ? [type] : []))
    expect(types.length).toBeGreaterThan(100)
    expect(types.filter((type) => !jsonTypes.has(type))).toEqual([])
    const references = all.flatMap(({ $ref }) => (typeof $ref === 'string' ? [$ref] : []))
    expect(new Set(references)).toEqual(new Set(['#/components/schemas/Problem']))
    for (const { properties, required } of all) {
      if (properties && Array.isArray(required))
        expect(Object.keys(properties)).toEqual(expect.arrayContaining(required))
    }
    expect(JSON.stringify(document.paths['/api/v1/cosmology'])).toContain('"maxItems":100000')
  })

  it('describes the parameters of a query, of which POS alone is wanted', () => {
    const { parameters } = document.paths['/api/vo/observability/query']?.get as unknown as {
      parameters: { name: string; in: string; required: boolean; description: string }[]
    }
    expect(parameters.map(({ name }) => name)).toEqual([
      'POS',
      'TIME',
      'MAXREC',
      'MIN_OBS',
      'FACILITY',
      'RESPONSEFORMAT',
    ])
    expect(parameters.filter(({ required }) => required).map(({ name }) => name)).toEqual(['POS'])
    for (const parameter of parameters)
      expect(parameter).toMatchObject({
        in: 'query',
        description: expect.any(String),
        schema: { type: 'string' },
      })
  })

  it('describes each public calculation there is, and no other', () => {
    const routes = ['v1', 'vo'].flatMap((family) =>
      readdirSync(new URL(`../../../app/api/${family}`, import.meta.url), { recursive: true })
        .map((name) => String(name))
        .filter((name) => name.endsWith('/route.ts') && !name.startsWith('openapi.json'))
        .map((name) => `/api/${family}/${name.slice(0, -'/route.ts'.length)}`),
    )
    expect(Object.keys(document.paths).sort()).toEqual(routes.sort())
  })
})

describe('the examples', () => {
  const asked = operations.filter(({ request }) => request)

  it.each(asked)(
    'of $path is a request that can be read, and typed in a shell',
    ({ path, request, example }) => {
      expect(request?.safeParse(example).error).toBeUndefined()
      expect(document.paths[path]?.post?.requestBody).toMatchObject({
        content: { 'application/json': { example } },
      })
      const call = callOf({ path, example }, 'https://x.example')
      const typed = /^curl (\S+) \\\n {2}-H 'content-type: application\/json' \\\n {2}-d '([^']+)'$/.exec(
        call,
      )
      expect(typed?.[1]).toBe(`https://x.example${path}`)
      expect(JSON.parse(typed?.[2] ?? '')).toEqual(example)
    },
  )

  it('have none where nothing is sent', () => {
    const rest = operations.filter(({ request }) => !request)
    expect(rest.length).toBeGreaterThan(0)
    for (const operation of rest)
      expect(callOf(operation, 'https://x.example')).toBe(`curl https://x.example${operation.path}`)
  })
})

describe('answers are as described', () => {
  const site = { latitudeDeg: -37.4, longitudeDeg: -70.2, elevationM: 2390 }
  const targets = [{ id: 'a', raDeg: 10, decDeg: -10 }]
  const own = { H0: 70, Om0: 0.3, Ode0: 1.75 }

  it.each([
    ['cosmologies', cosmologiesAnswer, () => ({ cosmologies: listCosmologies() })],
    [
      'cosmology',
      cosmologyAnswer,
      () => computeCosmology({ cosmology: 'planck-2018', z: [0, 1], pairs: [[1, 2]] }),
    ],
    ['a bounce', cosmologyAnswer, () => computeCosmology({ cosmology: own, z: [0, 0.5] })],
    [
      'inverse',
      inverseAnswer,
      () => invertCosmology({ cosmology: 'wmap-9', quantity: 'angularDiameterMpc', values: [1500, 1e5] }),
    ],
    [
      'positions',
      positionsAnswer,
      () => computePositions({ site, targets, instants: ['2027-03-05T06:00:00Z'] }),
    ],
    [
      'visibility',
      visibilityAnswer,
      () =>
        computeVisibility({
          site,
          targets,
          from: '2027-03-01',
          to: '2027-03-02',
          maxAirmass: 2,
          twilight: 'astronomical',
        }),
    ],
    [
      'ccd',
      ccdAnswer,
      () =>
        computeCcd({
          sourceRate: 1,
          skyRatePerPixel: 1,
          darkRatePerPixel: 0,
          readNoise: 3,
          pixels: 9,
          exposures: 1,
          solve: 'snr',
          timeS: 100,
        }),
    ],
  ])('%s', (_, schema, answer) => {
    const found = JSON.parse(JSON.stringify(answer())) as unknown
    // Parsing drops what the schema does not name, so equality says that nothing is left out of it.
    expect(schema.parse(found)).toEqual(found)
  })

  it('problems', async () => {
    const response = problem(refuse.field('z.3', 'A redshift is a number.'), 'b5f0')
    const found = (await response.json()) as unknown
    expect(problemAnswer.parse(found)).toEqual(found)
    expect(found).toMatchObject({ status: 422, errors: [{ pointer: '/z/3' }] })
    const whole = (await problem(refuse.field('form', 'Give an object.'), 'b5f0').json()) as unknown
    expect(whole).toMatchObject({ errors: [{ pointer: '' }] })
    const many = Object.fromEntries(
      Array.from({ length: 500 }, (_, i) => [`z.${i}`, 'A redshift is a number.']),
    )
    const long = (await problem(refuse.invalid('No.', many), 'b5f0').json()) as { errors: unknown[] }
    expect(long.errors).toHaveLength(100)
  })
})
