import { letter, lettersTo } from './support/inbox'
import { textOf } from './support/pdf'
import { expect, test } from './support/test'

/** What follows once a proposal is in: settle later, ask for a waiver, write it again, take it back. */
const pi = 'ilse@tarnhead.example'
const title = 'Hβ in lensed quasars, second half'
let reference = ''

test.describe.serial('second thoughts', () => {
  test('it is sent, to be settled later, and its record can be kept', async ({ page, signIn, request }) => {
    await signIn(pi)
    await page.goto('/proposals')
    const href = await page.getByRole('link', { name: title }).first().getAttribute('href')
    reference = /[0-9A-Z]{3}-[0-9A-Z]{3}/.exec(href ?? '')?.[0] ?? ''
    await page.goto(`/proposals/${reference}/send`)
    await page.locator('input[type="checkbox"]').first().check()
    await page.getByRole('button', { name: /^Send it in, settle by/ }).click()
    await page.waitForURL(new RegExp(`/proposals/${reference}/sent`))
    await expect(page.getByText('The fee is due by').first()).toBeVisible()
    expect((await letter(request, pi, new RegExp(reference))).text).toContain('EUR')

    const record = await page.request.get(`/proposals/${reference}/record`)
    expect(record.headers()['content-type']).toContain('application/pdf')
    expect(record.headers()['content-disposition']).toMatch(/^attachment/)
    expect(textOf(await record.body())).toContain(reference)
    const calendar = await page.request.get(`/proposals/${reference}/calendar.ics`)
    expect(calendar.headers()['content-type']).toContain('text/calendar')
    expect(await calendar.text()).toMatch(/^BEGIN:VCALENDAR[\s\S]+BEGIN:VEVENT[\s\S]+END:VCALENDAR\s*$/)
    expect((await page.request.get(`/proposals/${reference}/receipt`)).status()).toBe(404)
  })

  test('a waiver wants a reason, and goes to the office', async ({ page, signIn }) => {
    await signIn(pi)
    await page.goto(`/proposals/${reference}/sent`)
    await page.getByRole('button', { name: 'Ask for a waiver' }).click()
    const form = page.getByRole('form', { name: 'Ask for a waiver' })
    await form.getByRole('button', { name: 'Ask for a waiver' }).click()
    await expect(form.getByText(/Say in a sentence why/).first()).toBeVisible()
    await form
      .getByLabel('Why the fee should be waived')
      .fill('The institute closed its travel and fee budget.')
    await form.getByRole('button', { name: 'Ask for a waiver' }).click()
    await expect(page.getByText('A waiver is asked for.').first()).toBeVisible()
  })

  test('the office grants it, and says so by letter', async ({ page, signIn, request }) => {
    await signIn('maud@quillonridge.example')
    await page.goto('/office/fees?call=call-14')
    const asked = page.getByText('The institute closed its travel and fee budget.')
    const answer = page.locator('div', { has: asked }).last()
    await answer.getByRole('radio', { name: /Grant/ }).check()
    await answer.getByRole('button', { name: 'Decide' }).click()
    expect((await letter(request, pi, /waive/i)).text).toContain(reference)
  })

  test('it is written again while the version sent stands, and sent without a fee', async ({
    page,
    signIn,
  }) => {
    await signIn(pi)
    await page.goto(`/proposals/${reference}/sent`)
    await page.getByRole('button', { name: 'Reopen it' }).click()
    await page.waitForURL((url) => !url.pathname.endsWith('/sent'))
    await page.goto(`/proposals/${reference}/send`)
    await page.locator('input[type="checkbox"]').first().check()
    await page.getByRole('button', { name: 'Send it in', exact: true }).click()
    await page.waitForURL(new RegExp(`/proposals/${reference}/sent`))
    await expect(page.getByText(/^2, engine/).first()).toBeVisible()
  })

  test('it is withdrawn with a reason, for good', async ({ page, signIn, request }) => {
    await signIn(pi)
    await page.goto(`/proposals/${reference}/sent`)
    await page.getByRole('button', { name: 'Withdraw it' }).click()
    await page.getByRole('button', { name: `Withdraw ${reference}` }).click()
    await expect(page.getByText('Say in a few words why it is withdrawn.').first()).toBeVisible()
    await page.getByLabel('Why it is withdrawn').fill('The lens model has changed the question.')
    await page.getByRole('button', { name: `Withdraw ${reference}` }).click()
    await expect(page.getByRole('button', { name: 'Withdraw it' })).toBeHidden()
    const told = await letter(request, pi, /withdrawn/i)
    expect(told.text).toContain(reference)
    expect((await lettersTo(request, pi)).filter(({ subject }) => /withdrawn/i.test(subject))).toHaveLength(1)
    await page.goto('/proposals')
    await expect(page.getByRole('row').filter({ hasText: title })).toContainText('withdrawn')
  })
})
