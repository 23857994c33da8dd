import { beforeEach, describe, expect, it, vi } from 'vitest'
import { NextRequest } from 'next/server'

vi.mock('@/lib/env', () => ({ env: () => ({ NOCTUARY_MODE: 'production' }) }))
vi.mock('@/lib/auth/readActor', () => ({ readActor: async () => null }))
vi.mock('@/lib/auth/requestFacts', () => ({
  requestFacts: async () => ({
    id: 'b5f0',
    address: '192.0.2.1',
    userAgent: '',
    origin: 'https://x.example',
  }),
}))
// No database: what fails here must fail before one is asked.
vi.mock('@/lib/auth/contextFor', () => ({
  contextFor: (actor: null, request: object) => ({ actor, request }),
}))

type Handler = (request: NextRequest, route: { params: Promise<unknown> }) => Promise<Response>

beforeEach(() => vi.resetModules())

const ask = (
  handler: Handler,
  address: string,
  init: { method?: string; body?: string; type?: string } = {},
) =>
  handler(
    new NextRequest(`https://x.example${address}`, {
      method: init.method ?? 'GET',
      ...(init.body === undefined ? {} : { body: init.body }),
      headers: init.type === undefined ? {} : { 'content-type': init.type },
    }),
    { params: Promise.resolve({}) },
  )

describe('a calculation', () => {
  const post = async (body: string, type?: string) => {
    const { POST } = await import('@/app/api/v1/light/observe/route')
    return ask(POST, '/api/v1/light/observe', { method: 'POST', body, type })
  }
  const body = JSON.stringify({ cosmology: 'planck-2018', z: 1, restWavelengthsA: [1300] })

  it.each(['application/json', 'application/json; charset=utf-8', 'Application/JSON'])(
    'takes a body of %s',
    async (type) => {
      const response = await post(body, type)
      expect(response.status).toBe(200)
      expect(await response.json()).toMatchObject({ z: 1, rows: [{ observedA: 2600 }] })
    },
  )

  it.each(['text/plain', 'application/x-www-form-urlencoded', 'text/json', 'application/jsonp', ''])(
    'refuses a body of %j',
    async (type) => {
      const response = await post(body, type)
      expect([response.status, response.headers.get('content-type')]).toEqual([
        415,
        'application/problem+json',
      ])
      expect(await response.json()).toMatchObject({ status: 415, title: 'Wrong media type' })
    },
  )

  it('refuses what is not JSON, and points at what is wrong', async () => {
    expect((await post('', 'application/json')).status).toBe(422)
    const wrong = await post('{"cosmology":"planck-2018","z":1e999}', 'application/json')
    expect(await wrong.json()).toMatchObject({ status: 422, errors: [{ pointer: '/z' }] })
  })

  it('refuses a body past a million bytes', async () => {
    expect((await post(`{"z":"${'x'.repeat(1_000_000)}"}`, 'application/json')).status).toBe(413)
  })
})

describe('a query of the virtual observatory', () => {
  const query = () => import('@/app/api/vo/observability/query/route')

  it('that is asked wrongly is told so in a VOTable, with 400', async () => {
    const { GET } = await query()
    const response = await ask(GET, '/api/vo/observability/query?POS=1,95')
    expect([response.status, response.headers.get('content-type')]).toEqual([
      400,
      'application/x-votable+xml',
    ])
    expect(await response.text()).toContain(
      '<INFO name="QUERY_STATUS" value="ERROR">The declination of POS lies between -90 and 90 degrees.</INFO>',
    )
  })

  it('as a form is read too, and other bodies are refused', async () => {
    const { POST } = await query()
    const send = (body: string, type: string) =>
      ask(POST, '/api/vo/observability/query', { method: 'POST', body, type })
    const form = 'application/x-www-form-urlencoded'
    expect(await (await send('pos=1,95', form)).text()).toContain('The declination of POS')
    expect((await send('{}', 'application/json')).status).toBe(415)
    expect((await send(`POS=${'1'.repeat(10_001)}`, form)).status).toBe(413)
  })

  it('that fails on our side says its reference and nothing else', async () => {
    const { GET } = await query()
    const response = await ask(GET, '/api/vo/observability/query?POS=1,2')
    expect(response.status).toBe(500)
    expect(await response.text()).toContain('Something failed on our side. Reference b5f0.')
  })

  it('is answered sixty times a minute, then told how long to wait', async () => {
    const { GET } = await query()
    for (let n = 0; n < 60; n += 1) expect((await ask(GET, '/api/vo/observability/query')).status).toBe(400)
    const response = await ask(GET, '/api/vo/observability/query')
    expect(response.status).toBe(429)
    expect(Number(response.headers.get('retry-after'))).toBeGreaterThan(0)
    expect(await response.text()).toContain('value="ERROR"')
  })
})
