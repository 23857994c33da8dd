import { access } from '../../lib/auth/access'
import type { Who } from '../../lib/auth/who'
import { expect, test, password } from './support/test'

// Over HTTP: every page, for every role, allowed or refused as the access matrix says.
// Seen to fail: a row changed from `office` to 'anyone' in the matrix.

const people = {
  visitor: { email: null, roles: [] },
  investigator: { email: 'ilse@tarnhead.example', roles: ['investigator'] },
  reviewer: { email: 'delphine@ostbury.example', roles: ['investigator', 'reviewer'] },
  chair: { email: 'edda@velm.example', roles: ['investigator', 'reviewer', 'chair'] },
  scientist: { email: 'signe@quillonridge.example', roles: ['investigator', 'instrument-scientist'] },
  office: { email: 'maud@quillonridge.example', roles: ['investigator', 'office'] },
} as const

/** Pages about one thing: what stands in the brackets, of a thing that nobody has. */
const strangers: Record<string, string> = {
  '[reference]': '000-000',
  '[request]': '999999',
  '[assignment]': '999999',
  '[person]': '999999',
  '[letter]': '999999',
  '[bulk]': '999999',
  '[token]': 'x'.repeat(43),
  '[slug]': 'call-14',
  '[call]': 'call-13',
  '[number]': '00-000',
  '[site]': 'quillon-ridge',
  '[telescope]': 'aldous',
  '[mode]': 'ember-short',
}

const passes = (who: Who, roles: readonly string[], signedIn: boolean) =>
  who === 'anyone' || (signedIn && (who === 'signed-in' || who.some((role) => roles.includes(role))))

const examples: Record<string, string> = {
  '/office/facility/retire/[kind]/[slug]': '/office/facility/retire/telescope/aldous',
}

const concrete = (path: string) =>
  examples[path] ?? path.replace(/\[\w+\]/g, (part) => strangers[part] ?? part)

for (const [name, person] of Object.entries(people)) {
  test.describe(name, () => {
    test.use({ expectedNoise: [/status of 4\d\d/] })

    test('sees the pages of the matrix and no other', async ({ page, signIn }) => {
      if (person.email) await signIn(person.email, password)
      for (const [path, who] of Object.entries(access.pages) as [string, Who][]) {
        const reply = await page.request.get(concrete(path), { maxRedirects: 0 })
        const isAboutAStranger = /\[(reference|request|assignment|number|person|letter|bulk)\]/.test(path)
        const status = passes(who, person.roles, person.email !== null)
          ? isAboutAStranger
            ? [404]
            : [200, 307]
          : person.email
            ? [404]
            : [307]
        expect(status, `${name} at ${path}: ${reply.status()}`).toContain(reply.status())
        if (status[0] === 307) expect(reply.headers().location).toContain('/sign-in')
      }
    })

    test('gets the data of the matrix and no other', async ({ page, signIn }) => {
      if (person.email) await signIn(person.email, password)
      const tables = Object.entries(access.routes).filter(([route]) => route.startsWith('GET /api/tables/'))
      expect(tables.length).toBeGreaterThan(5)
      for (const [route, who] of tables as [string, Who][]) {
        const reply = await page.request.get(`${route.slice(4)}?call=call-13`)
        const allowed = passes(who, person.roles, person.email !== null)
        if (allowed) expect([200, 422], `${name} at ${route}`).toContain(reply.status())
        else expect(reply.status(), `${name} at ${route}`).toBe(person.email ? 404 : 401)
      }
    })
  })
}

test.describe('another person’s proposal', () => {
  test.use({ expectedNoise: [/status of 404/] })

  test('is not there, whoever asks and however', async ({ page, signIn, browser, baseURL }) => {
    await signIn('ilse@tarnhead.example')
    const own = (await (await page.request.get('/api/tables/proposals')).json()) as {
      rows: { reference: string }[]
    }
    const reference = own.rows[0]?.reference ?? ''
    expect(reference).toMatch(/^[0-9A-Z]{3}-[0-9A-Z]{3}$/)

    const other = await browser.newContext({ baseURL })
    const stranger = await other.newPage()
    await stranger.goto('/sign-in')
    await stranger.getByLabel('E-mail').fill('hugo@maresk.example')
    await stranger.getByLabel('Password', { exact: true }).fill(password)
    await stranger.getByRole('button', { name: 'Sign in' }).click()
    await stranger.waitForURL(/\/proposals$/)
    for (const part of [
      '',
      '/question',
      '/targets',
      '/send',
      '/sent',
      '/outcome',
      '/packet',
      '/record',
      '/receipt',
    ])
      expect((await stranger.request.get(`/proposals/${reference}${part}`)).status(), part).toBe(404)
    await other.close()
  })
})

test('answers carry the headers that keep a browser safe', async ({ request }) => {
  const reply = await request.get('/')
  const headers = reply.headers()
  expect(headers['content-security-policy']).toMatch(/script-src 'self' 'nonce-[^']+' 'strict-dynamic';/)
  expect(headers['content-security-policy']).toContain("object-src 'none'")
  expect(headers['x-content-type-options']).toBe('nosniff')
  expect(headers['strict-transport-security']).toContain('max-age=31536000')
  expect(headers['x-powered-by']).toBeUndefined()
})

test('a file carries a policy under which nothing in it runs', async ({ page, signIn }) => {
  await signIn('ilse@tarnhead.example')
  const own = (await (await page.request.get('/api/tables/proposals')).json()) as {
    rows: { reference: string }[]
  }
  const reply = await page.request.get(`/proposals/${own.rows[0]?.reference}/packet`)
  expect(reply.headers()['content-type']).toBe('application/pdf')
  expect(reply.headers()['content-security-policy']).toContain("default-src 'none'")
})
