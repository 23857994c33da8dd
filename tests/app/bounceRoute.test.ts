import { NextRequest } from 'next/server'
import { beforeEach, expect, it, vi } from 'vitest'
import { reportText } from '../support/reportText'

const secret = vi.hoisted(() => ({ value: undefined as string | undefined }))

vi.mock('@/lib/env', () => ({
  env: () => ({ NOCTUARY_MODE: 'production', MAIL_REPORT_SECRET: secret.value }),
}))
vi.mock('@/lib/auth/readActor', () => ({ readActor: async () => null }))
vi.mock('@/lib/auth/requestFacts', () => ({
  requestFacts: async () => ({
    id: 'b5f0',
    address: '192.0.2.1',
    userAgent: '',
    origin: 'https://x.example',
  }),
}))
// No database: a report that reaches it is known by that, so that a refusal is seen to come before.
vi.mock('@/lib/auth/contextFor', () => ({
  contextFor: (actor: null, request: object) => ({
    actor,
    request,
    db: { transaction: () => Promise.reject(new Error('reached')) },
  }),
}))

// Seen to fail: with the secret asked for only where one is set.

const right = 'Zq8wLr2vTn5xKd7mPb4cHs9yFg3jWe6u'

async function post(given: string | null, type = 'message/rfc822', body = reportText()) {
  const { POST } = await import('@/app/api/mail/bounces/route')
  const headers = { 'content-type': type, ...(given === null ? {} : { 'x-report-secret': given }) }
  const request = new NextRequest('https://x.example/api/mail/bounces', { method: 'POST', body, headers })
  const response = await POST(request, { params: Promise.resolve({}) })
  return { status: response.status, said: (await response.json()) as Record<string, unknown> }
}

beforeEach(() => {
  vi.resetModules()
  secret.value = right
})

it.each([
  ['none', null],
  ['an empty one', ''],
  ['another', right.toLowerCase()],
  ['more than it', `${right}u`],
])('refuses a report with %s for a secret', async (_, given) => {
  expect((await post(given)).status).toBe(403)
})

it('refuses every report where no secret is set', async () => {
  secret.value = undefined
  for (const given of [null, '', 'undefined', right]) expect((await post(given)).status).toBe(403)
})

it('takes a message and nothing else, and not without end', async () => {
  expect((await post(right, 'application/json', '{}')).status).toBe(415)
  expect((await post(right, 'message/rfc822', 'x'.repeat(1_100_000))).status).toBe(413)
  expect(await post(right, 'message/rfc822', 'Subject: x\r\n\r\nThank you.')).toMatchObject({
    status: 200,
    said: { taken: 'no report' },
  })
  expect((await post(right)).status).toBe(500)
})
