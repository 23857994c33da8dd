import { readFileSync } from 'node:fs'
import type { Page } from '@playwright/test'
import { fillDate } from './support/fillDate'
import { letter, lettersTo, linkIn } from './support/inbox'
import { pdfOf, textOf } from './support/pdf'
import { sentComputation } from './support/sentComputation'
import { savedAfter } from './support/savedAfter'
import { expect, test } from './support/test'

/**
 * One call from opening to letters, on real objects. Names, positions, redshifts and their sources stand in
 * tests/reference/journey.json; the distances beside them are Astropy's (tests/reference/journey.py), and the
 * numbers on screen, in the packet and in the database are held against those.
 */
interface Known {
  name: string
  ra: string
  dec: string
  redshift: number
  luminosityMpc: number
  kpcPerArcsec: number
  lookbackGyr: number
}

const { objects } = JSON.parse(readFileSync('tests/reference/journey.json', 'utf8')) as { objects: Known[] }
// Apparent magnitudes for the exposure: of the order given in the literature, from memory; no number here is checked.
const magnitudes: Record<string, string> = { '3C 273': '12.9', 'Abell 1689': '17.4', Himiko: '22.0' }

const title = 'Three rungs of one ladder'
const day = 86_400_000
const inDays = (days: number) => new Date(Math.floor((Date.now() + days * day) / 1000) * 1000)
const comma = (value: number, decimals: number) =>
  value.toLocaleString('en-GB', { minimumFractionDigits: decimals, maximumFractionDigits: decimals })

let slug = ''
let number = ''
let reference = ''
let reviewNumber = ''

async function typeCell(page: Page, label: string, text: string): Promise<void> {
  const cell = page.getByLabel(label, { exact: true })
  await cell.fill(text)
  await cell.blur()
}

test.describe.serial('a whole call', () => {
  test('the office plans a call and opens it', async ({ page, signIn }) => {
    await signIn('maud@quillonridge.example')
    await page.goto('/office/calls')
    await page.getByLabel('First evening').fill('2028-01-10')
    await page.getByLabel('Last evening').fill('2028-07-09')
    const dates = [0.01, 20, 34, 34, 57, 63, 77]
    const labels = [
      'Opens',
      'Proposals close',
      'Fees settled by',
      'Assessments in by',
      'Reviews in by',
      'Panel meets',
      'Letters go out',
    ]
    for (const [index, label] of labels.entries()) await fillDate(page, label, inDays(dates[index] ?? 0))
    await page.getByRole('button', { name: 'Plan this call' }).click()
    await page.waitForURL(/\/office\/calls\/call-\d+$/)
    slug = page.url().split('/').at(-1) ?? ''
    number = slug.replace('call-', '')
    await expect(page.getByText('It is planned.').first()).toBeVisible()

    await page.getByRole('button', { name: 'Open this call' }).click()
    await page.getByRole('dialog').getByRole('textbox').fill(number)
    await page.getByRole('button', { name: 'Open it now' }).click()
    await expect(page.getByText('It is open.').first()).toBeVisible()
  })

  test('the investigator writes a proposal on three real objects', async ({ page, signIn }) => {
    test.setTimeout(240_000)
    await signIn('ilse@tarnhead.example')
    await page.goto(`/proposals/new?call=${slug}`)
    await page.getByRole('radio', { name: /Regular proposal/ }).check()
    await page.getByLabel('What is it called?').fill(title)
    await page.getByRole('button', { name: 'Begin the proposal' }).click()
    await page.waitForURL(/\/proposals\/[0-9A-Z]{3}-[0-9A-Z]{3}/)
    reference = /[0-9A-Z]{3}-[0-9A-Z]{3}/.exec(page.url())?.[0] ?? ''

    await page.goto(`/proposals/${reference}/question`)
    await savedAfter(page, () =>
      page
        .getByLabel('Abstract')
        .fill('A quasar, a cluster and a galaxy past z = 6, each with its distance: σ, λ and Ω as they are.'),
    )
    await savedAfter(page, () => page.getByLabel('Category').selectOption('Distances and the expansion'))
    await page.getByLabel(/I am done with the question/).check()

    await page.goto(`/proposals/${reference}/targets`)
    for (const [index, object] of objects.entries()) {
      await page.getByRole('button', { name: 'Add a target' }).click()
      await typeCell(page, `Name of target ${index + 1}`, object.name)
      await typeCell(page, `Right ascension of ${object.name}`, object.ra)
      await typeCell(page, `Declination of ${object.name}`, object.dec)
      await typeCell(page, `Redshift of ${object.name}`, String(object.redshift))
      await typeCell(page, `Magnitude of ${object.name}`, magnitudes[object.name] ?? '20')
      const row = page.getByRole('row').filter({ has: page.getByLabel(`Redshift of ${object.name}`) })
      await expect(row).toContainText(comma(object.luminosityMpc, 1))
      await expect(row).toContainText(comma(object.kpcPerArcsec, 3))
    }
    // Rows save themselves; the page is read anew only once the last of them has arrived.
    const far = comma(objects.at(-1)?.luminosityMpc ?? 0, 1)
    const kept = async () => (await (await page.request.get(page.url())).text()).includes(far)
    await expect.poll(kept, { timeout: 20_000 }).toBe(true)
    await page.reload()
    for (const object of objects) {
      const row = page.getByRole('row').filter({ has: page.getByLabel(`Redshift of ${object.name}`) })
      await expect(row).toContainText(comma(object.luminosityMpc, 1))
    }
    await page.getByLabel(/I am done with the targets/).check()
    await page.goto(`/proposals/${reference}/cosmology`)
    await page.getByLabel(/I am done with the cosmology/).check()
    await page.goto(`/proposals/${reference}/people`)
    await page.getByLabel(/I am done with the people/).check()
  })

  test('says what is observed, and how deep', async ({ page, signIn }) => {
    test.setTimeout(240_000)
    await signIn('ilse@tarnhead.example')
    await page.goto(`/proposals/${reference}/observing`)
    await page.getByLabel('with', { exact: true }).selectOption({ label: 'LANTERN, r band' })
    await page.getByRole('button', { name: 'Add', exact: true }).click()
    await expect(page.getByLabel(/^Signal-to-noise wanted/)).toHaveCount(3)
    await page.getByRole('button', { name: 'Ask for what is needed' }).click()
    await expect(page.getByText('Asked for what is needed').first()).toBeVisible()
    await page.getByLabel(/I am done with the observing/).check()
    await page.goto(`/proposals/${reference}/feasibility`)
    await expect(page.getByRole('heading', { level: 1 })).toBeVisible()
    await page.getByLabel(/I am done with the feasibility/).check()

    await page.goto(`/proposals/${reference}/papers`)
    await page
      .locator('input[type="file"][accept=".pdf"]')
      .first()
      .setInputFiles({ name: 'ladder.pdf', mimeType: 'application/pdf', buffer: await pdfOf(3) })
    await expect(page.getByText('ladder.pdf is kept').first()).toBeVisible()
    await page.getByLabel(/I am done with the papers/).check()
  })

  test('sends it, and pays after a card was declined', async ({ page, signIn, request }) => {
    await signIn('ilse@tarnhead.example')
    await page.goto(`/proposals/${reference}/send`)
    await page.getByRole('button', { name: /Send it in for EUR 120/ }).click()
    await expect(page.getByText(/Say that everyone named has read this version/).first()).toBeVisible()
    await page.locator('input[type="checkbox"]').first().check()
    await page.getByRole('button', { name: /Send it in for EUR 120/ }).click()

    await page.waitForURL(/\/pay\//)
    await page.getByRole('button', { name: 'The card is declined' }).click()
    await expect(page).toHaveURL(/\/pay\//)
    await page.getByRole('button', { name: 'Pay: the card is accepted' }).click()
    await page.waitForURL(new RegExp(`/proposals/${reference}/sent`))
    await expect(page.getByText('It is in, and the fee is settled').first()).toBeVisible()
    await expect(page.getByRole('heading', { name: reference })).toBeVisible()
    const received = await letter(request, 'ilse@tarnhead.example', new RegExp(reference))
    expect(received.text).toContain(reference)

    const packet = await page.request.get(`/proposals/${reference}/packet`)
    expect(packet.headers()['content-type']).toContain('application/pdf')
    const text = textOf(await packet.body())
    for (const object of objects) {
      expect(text).toContain(object.name)
      expect(text).toContain(comma(object.luminosityMpc, 1))
    }
    for (const glyph of ['σ', 'λ', 'Ω']) expect(text).toContain(glyph)

    const frozen = await sentComputation(reference)
    expect(frozen.map(({ name }) => name)).toEqual(objects.map(({ name }) => name))
    for (const [index, object] of objects.entries())
      for (const quantity of ['luminosityMpc', 'kpcPerArcsec', 'lookbackGyr'] as const)
        expect(Math.abs((frozen[index]?.[quantity] ?? 0) / object[quantity] - 1)).toBeLessThan(1e-8)
  })

  test('the office closes the call, sees who paid, and invites a reviewer who accepts', async ({
    page,
    signIn,
    request,
    browser,
    baseURL,
  }) => {
    await signIn('maud@quillonridge.example')
    await page.goto(`/office/calls/${slug}`)
    const row = page.getByRole('row').filter({ hasText: reference })
    await expect(row).toContainText('submitted')
    await expect(row).toContainText('120.00')
    await expect(row).toContainText('paid')
    await page.getByRole('button', { name: 'Close this call' }).click()
    await page.getByRole('dialog').getByRole('textbox').fill(number)
    await page.getByRole('button', { name: 'Close it now' }).click()
    await expect(page.getByText('It is closed, being assessed.').first()).toBeVisible()

    await page.goto('/office/people')
    const email = `orla.${Date.now()}@fenmark.example`
    await page.getByRole('textbox', { name: 'Name', exact: true }).fill('Orla Fenmark')
    await page.getByLabel('E-mail').fill(email)
    await page.getByLabel('Panel').selectOption({ label: `Distant universe, call ${number}` })
    await page.getByRole('button', { name: 'Send the invitation' }).click()
    await expect(page.getByText(`Invitation on its way to ${email}`).first()).toBeVisible()

    const guest = await (await browser.newContext({ baseURL })).newPage()
    await guest.goto(linkIn((await letter(request, email, /Invitation/)).text))
    await guest.getByLabel('Institute').fill('Fenmark Observatory')
    await guest.getByLabel('Password', { exact: true }).fill('a lamp beside the dome')
    await guest.getByRole('button', { name: 'Accept and open an account' }).click()
    await guest.waitForURL(/\/sign-in/)
    await guest.getByLabel('E-mail').fill(email)
    await guest.getByLabel('Password', { exact: true }).fill('a lamp beside the dome')
    await guest.getByRole('button', { name: 'Sign in' }).click()
    await expect(guest.getByRole('link', { name: 'Reviews' }).first()).toBeVisible()
  })

  test('the instrument scientist changes the hours, without a name in sight', async ({ page, signIn }) => {
    await signIn('piers@quillonridge.example')
    await page.goto('/assessments')
    await expect(page.getByText(title).first()).toBeVisible()
    await page.getByRole('row').filter({ hasText: title }).getByRole('link').first().click()
    await page.waitForURL(/\/assessments\/\d+/)
    expect(await page.content()).not.toContain('Marrowby')
    await page.getByRole('radio', { name: /Accept/ }).check()
    await page.getByLabel('Reason').fill('The hours agree with our own images of last season.')
    await page.getByLabel('Note to the panel').fill('Runs in any Moon.')
    await page.getByRole('button', { name: /^Accept at/ }).click()
    await expect(page.getByText('Assessment saved').first()).toBeVisible()
  })

  test('the chair starts the review and assigns', async ({ page, signIn }) => {
    await signIn('edda@velm.example')
    await page.goto(`/panel/${slug}/assignments`)
    await page.getByRole('button', { name: 'Start the review' }).click()
    const row = page.getByRole('row').filter({ hasText: title })
    reviewNumber = /\d+-\d{3}/.exec((await row.textContent()) ?? '')?.[0] ?? ''
    expect(reviewNumber).toMatch(new RegExp(`^${number}-\\d{3}$`))
    for (const name of ['Delphine Ostrake', 'Tobin Aldersey']) {
      const add = page.getByRole('button', { name: `Add a reader to ${reviewNumber}` }).first()
      const choice = page.getByRole('button', { name: new RegExp(`^${name}`) })
      await expect(async () => {
        if (!(await choice.isVisible())) await add.click()
        await expect(choice).toBeVisible({ timeout: 2000 })
      }).toPass()
      await choice.click()
      await expect(page.getByText(`${name} reads ${reviewNumber}`).first()).toBeVisible()
      await page.keyboard.press('Escape')
    }
    expect(await page.content()).not.toContain('Marrowby')
  })

  for (const [email, score] of [
    ['delphine@ostbury.example', '8'],
    ['tobin@maresk.example', '7'],
  ] as const)
    test(`${email} declares interests, reads, scores and finishes`, async ({ page, signIn }) => {
      test.setTimeout(180_000)
      await signIn(email)
      await page.goto(`/reviews/interests/${slug}`)
      await expect(page.getByText('Marrowby').first()).toBeVisible()
      await page.getByLabel('I have been through all the names').check()
      await page.locator('#main').getByRole('button', { name: 'Save and go to my reviews' }).last().click()
      await page.waitForURL(/\/reviews$/)
      await page.getByRole('link', { name: reviewNumber }).first().click()
      await page.waitForURL(/\/reviews\/\d+/)
      // Read anew: the document still holds the data of the list of names one came from.
      const html = await (await page.request.get(page.url())).text()
      for (const secret of ['Marrowby', reference, 'ladder.pdf', 'tarnhead'])
        expect(html).not.toContain(secret)
      const packet = await page.request.get(`${page.url()}/packet`)
      const text = textOf(await packet.body())
      for (const secret of ['Marrowby', reference, 'ladder.pdf']) expect(text).not.toContain(secret)
      expect(text).toContain(reviewNumber)

      for (const ruler of await page.getByRole('slider').all()) {
        await ruler.focus()
        await page.keyboard.press('Home')
        await page.keyboard.press(score)
      }
      await page
        .getByLabel('To the investigators')
        .fill(
          'A well-bounded request: each object answers the question by itself, and the hours follow from the depth.',
        )
      await page.getByLabel('To the panel only').fill('Hours look honest.')
      await expect(page.getByText(/Saved \d\d:\d\d:\d\d UTC/).first()).toBeVisible()
      await page.getByRole('button', { name: 'Finish this review' }).click()
      await expect(page.getByText('Review finished').first()).toBeVisible()
    })

  test('the chair ranks, divides the nights and decides; the letters go out', async ({
    page,
    signIn,
    request,
  }) => {
    test.setTimeout(180_000)
    await signIn('edda@velm.example')
    await page.goto(`/panel/${slug}/ranking`)
    await page.getByRole('button', { name: 'Begin the ranking' }).click()
    await expect(page.getByRole('row').filter({ hasText: title })).toContainText('7.5')
    await page.getByRole('button', { name: 'Freeze this ranking' }).click()
    await expect(page.getByText(/^Version \d+, frozen$/)).toBeVisible()

    await page.goto(`/panel/${slug}/nights`)
    await page.getByRole('button', { name: 'Take the suggestion over' }).click()
    await expect(page.getByText(/given the hours suggested/).first()).toBeVisible()
    await page.goto(`/panel/${slug}/decisions`)
    await page.getByRole('button', { name: /Prepare/ }).click()
    await expect(page.getByText(/decisions? (is|are) prepared/).first()).toBeVisible()
    await expect(page.getByRole('button', { name: 'Make them known …' })).toBeDisabled()
    await page.context().clearCookies()
    await signIn('maud@quillonridge.example')
    await page.goto(`/office/calls/${slug}/decisions`)
    // None is approved unread: each is opened on the way.
    const next = (left: string) => page.getByRole('button', { name: `Open the next of ${left} to read` })
    const all = page.getByRole('button', { name: /^Approve (all|the one)/ })
    const left = Number(
      /of (\d+) /.exec((await page.getByText(/^Open the next of/).textContent()) ?? '')?.[1],
    )
    await expect(all).toHaveCount(0)
    for (let count = left; count > 0; count -= 1) await next(String(count)).click()
    await all.click()
    await expect(page.getByText(/decisions? (is|are) approved/).first()).toBeVisible()
    await page.context().clearCookies()
    await signIn('edda@velm.example')
    await page.goto(`/panel/${slug}/decisions`)
    await page.getByRole('button', { name: 'Make them known …' }).click()
    await page.getByRole('dialog').getByRole('textbox').fill(number)
    await page.getByRole('button', { name: 'Make them known', exact: true }).click()
    const told = await letter(
      request,
      'ilse@tarnhead.example',
      new RegExp(`${reference}|decision|Call ${number}`, 'i'),
    )
    expect(told.text.length).toBeGreaterThan(50)
  })

  test('the investigator reads the outcome and the comments, unsigned', async ({ page, signIn, request }) => {
    await signIn('ilse@tarnhead.example')
    await page.goto(`/proposals/${reference}/outcome`)
    await expect(page.getByText('awarded').first()).toBeVisible()
    await expect(page.getByText('each object answers the question by itself').first()).toBeVisible()
    const html = await page.content()
    for (const secret of ['Ostrake', 'Aldersey', 'Hours look honest']) expect(html).not.toContain(secret)
    const letters = await lettersTo(request, 'ilse@tarnhead.example')
    expect(letters.filter((one) => one.text.includes(reference)).length).toBeGreaterThan(1)
  })
})
