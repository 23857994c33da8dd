import type { Page } from '@playwright/test'
import Stripe from 'stripe'
import { pdfOf } from './support/pdf'
import { savedAfter } from './support/savedAfter'
import { expect, test } from './support/test'

/** What a person can get wrong while writing: each is answered in words, in its place, and nothing typed is lost. */
const openCall = 'call-14'
const closedCall = 'call-13'
let reference = ''

async function cell(page: Page, label: string, text: string): Promise<void> {
  const field = page.getByLabel(label, { exact: true })
  await field.fill(text)
  await field.blur()
}

test.describe.serial('a draft', () => {
  test('is begun in an open call, and in no other', async ({ page, signIn }) => {
    await signIn('ilse@tarnhead.example')
    await page.goto(`/proposals/new?call=${closedCall}`)
    await expect(page.getByText('The call you came for is not open.')).toBeVisible()
    await page.goto(`/calls/${closedCall}`)
    await expect(page.getByRole('link', { name: 'Start a proposal' })).toHaveCount(0)

    await page.goto(`/proposals/new?call=${openCall}`)
    await page.getByRole('radio', { name: /Regular proposal/ }).check()
    await page.getByRole('button', { name: 'Begin the proposal' }).click()
    await expect(page.getByText('Give it a title').first()).toBeVisible()
    await page.getByLabel('What is it called?').fill('A draft full of slips')
    await page.getByRole('button', { name: 'Begin the proposal' }).click()
    await page.waitForURL(/\/proposals\/[0-9A-Z]{3}-[0-9A-Z]{3}/)
    reference = /[0-9A-Z]{3}-[0-9A-Z]{3}/.exec(page.url())?.[0] ?? ''
  })

  test('says at the cell why a position or redshift cannot be, and keeps what was typed', async ({
    page,
    signIn,
  }) => {
    await signIn('ilse@tarnhead.example')
    await page.goto(`/proposals/${reference}/targets`)
    await page.getByRole('button', { name: 'Add a target' }).click()
    await cell(page, 'Name of target 1', 'Slip')
    for (const [label, text, sentence] of [
      ['Right ascension of Slip', '25:61:00', /60|24h/],
      ['Declination of Slip', '-91 00 00', 'A declination lies between −90° and +90°.'],
      ['Redshift of Slip', 'abc', 'A redshift is a number, such as 0.158.'],
      ['Redshift of Slip', '-2', 'A redshift lies above −1; for a distance it is 0 or more.'],
    ] as const) {
      await cell(page, label, text)
      const field = page.getByLabel(label, { exact: true })
      await expect(field).toHaveValue(text)
      await expect(field).toHaveAttribute('aria-invalid', 'true')
      await expect(page.getByText(sentence).first()).toBeVisible()
    }
    await expect(page.getByLabel('Right ascension of Slip', { exact: true })).toHaveValue('25:61:00')
  })

  test.describe('and its files', () => {
    // A refused file is an answer of 422, which Chromium writes into the console.
    test.use({ expectedNoise: [/status of 422/] })

    test('takes no picture called a PDF and no paper of 60 pages', async ({ page, signIn }) => {
      await signIn('ilse@tarnhead.example')
      await page.goto(`/proposals/${reference}/papers`)
      const upload = page.locator('input[type="file"][accept=".pdf"]').first()
      const jpeg = Buffer.concat([Buffer.from([0xff, 0xd8, 0xff, 0xe0]), Buffer.alloc(2000, 1)])
      // The page may be on screen a moment before it listens.
      await expect(async () => {
        await upload.setInputFiles({ name: 'sky.pdf', mimeType: 'application/pdf', buffer: jpeg })
        await expect(
          page.getByText('sky.pdf is not a PDF: by its contents it is a JPEG picture.').first(),
        ).toBeVisible({ timeout: 4000 })
      }).toPass()

      await upload.setInputFiles({ name: 'long.pdf', mimeType: 'application/pdf', buffer: await pdfOf(60) })
      await expect(
        page.getByText('The PDF has 60 pages; this document may have four pages.').first(),
      ).toBeVisible()
      await page.reload()
      await expect(page.getByText(/is kept/)).toHaveCount(0)
    })
  })

  test('written in two windows shows the second both versions and loses neither', async ({
    page,
    signIn,
    context,
  }) => {
    await signIn('ilse@tarnhead.example')
    const other = await context.newPage()
    await page.goto(`/proposals/${reference}/question`)
    await other.goto(`/proposals/${reference}/question`)
    await savedAfter(page, () => page.getByLabel('Abstract').fill('Written in the first window.'))
    await expect(page.getByText(/Saved/).first()).toBeVisible()
    await other.getByLabel('Abstract').fill('Written in the second window.')
    const comparison = other.getByRole('alert', { name: 'Another window of yours changed this first' })
    await expect(comparison).toContainText('Written in the first window.')
    await expect(comparison).toContainText('Written in the second window.')
    await expect(comparison.getByRole('button', { name: 'Keep this choice' })).toBeDisabled()
    await comparison.getByRole('radio', { name: /^yours/ }).check()
    await savedAfter(other, () => comparison.getByRole('button', { name: 'Keep this choice' }).click())
    await expect(comparison).toBeHidden()
    await page.reload()
    await expect(page.getByLabel('Abstract')).toHaveValue('Written in the second window.')
  })

  test('that is not complete is not sent, and each gap is named', async ({ page, signIn }) => {
    await signIn('ilse@tarnhead.example')
    await page.goto(`/proposals/${reference}/send`)
    await expect(page.locator('#main')).toContainText(/justification/)
    await expect(page.getByRole('button', { name: /^Send it in/ })).toHaveCount(0)
  })
})

test.describe('a notice to the webhook', () => {
  const body = JSON.stringify({
    id: `evt_e2e_${Date.now()}`,
    object: 'event',
    api_version: Stripe.API_VERSION,
    created: Math.floor(Date.now() / 1000),
    type: 'checkout.session.completed',
    livemode: false,
    data: { object: { id: 'cs_nobody', object: 'checkout.session', metadata: {}, payment_intent: null } },
  })
  const signed = (timestamp: number) =>
    new Stripe('sk_test_none').webhooks.generateTestHeaderString({
      payload: body,
      secret: process.env.STRIPE_WEBHOOK_SECRET ?? '',
      timestamp,
    })
  const now = () => Math.floor(Date.now() / 1000)

  for (const [what, header] of [
    ['no signature', () => ''],
    ['a wrong signature', () => `t=${now()},v1=${'0'.repeat(64)}`],
    ['a signature an hour old', () => signed(now() - 3600)],
    ['a signature from the future', () => signed(now() + 3600)],
  ] as const)
    test(`with ${what} is refused as the sender's mistake`, async ({ request }) => {
      const reply = await request.post('/api/webhooks/stripe', {
        data: body,
        headers: { 'stripe-signature': header(), 'content-type': 'application/json' },
      })
      expect(reply.status()).toBe(422)
      expect(((await reply.json()) as { detail: string }).detail).toMatch(/signature|date/)
    })

  test('signed well is taken, and the second time known', async ({ request }) => {
    const post = () =>
      request.post('/api/webhooks/stripe', {
        data: body,
        headers: { 'stripe-signature': signed(now()), 'content-type': 'application/json' },
      })
    const first = await post()
    expect(first.status()).toBe(200)
    expect(await first.json()).toEqual({ effect: 'nothing: it speaks of no payment of ours' })
    expect(await (await post()).json()).toEqual({ effect: 'known before' })
  })
})
