import type { Page } from '@playwright/test'
import { letter } from './support/inbox'
import { textOf } from './support/pdf'
import { expect, test } from './support/test'

/** Money beside the card that simply pays: an institute that is invoiced, and a fee that goes back in parts. */
const office = 'maud@quillonridge.example'
const institute = 'Institute of Quiet Skies'
const billsTo = 'bills@quietskies.example'

interface Owing {
  reference: string
  lead: string
  email: string
  feeMinor: number
}

interface Tables {
  fees: { rows: (Omit<Owing, 'email'> & { feeState: string | null; waiverId: number | null })[] }
  people: { people: { name: string; email: string }[] }
}

/** Proposals of the open call whose fee is owed and may be settled, with the address of whoever leads each. */
async function owing(page: Page): Promise<Owing[]> {
  const fees = (await (
    await page.request.get('/api/tables/office-proposals?call=call-14')
  ).json()) as Tables['fees']
  const { people } = (await (await page.request.get('/api/tables/office-people')).json()) as Tables['people']
  return fees.rows
    .filter(({ feeState, waiverId }) => feeState === 'due' && waiverId === null)
    .flatMap(({ reference, lead, feeMinor }) => {
      const person = people.find(({ name }) => name === lead)
      return person ? [{ reference, lead, feeMinor, email: person.email }] : []
    })
}

const typed = (minor: number) => (minor / 100).toFixed(2)
/** As it is printed, with a space that does not break. */
const money = (minor: number) => `EUR\u00A0${typed(minor)}`

async function booksBalance(page: Page): Promise<void> {
  await page.goto('/office/fees/ledger')
  await expect(page.getByText('every one and the whole balance.').first()).toBeVisible()
}

async function paper(page: Page, reference: string, number: string): Promise<string> {
  const reply = await page.request.get(`/proposals/${reference}/bills/${number}`)
  expect(reply.headers()['content-type']).toContain('application/pdf')
  expect(reply.headers()['content-disposition']).toMatch(/^attachment/)
  return textOf(await reply.body())
}

let invoiced: Owing
let byCard: Owing
let number = ''

test.describe.serial('invoices and refunds', () => {
  test('an investigator has the fee invoiced, with the order of the institute', async ({
    page,
    signIn,
    request,
  }) => {
    await signIn(office)
    const [first, second] = await owing(page)
    if (!first || !second) throw new Error('the demonstration leaves two fees owed')
    ;[invoiced, byCard] = [first, second]
    await page.context().clearCookies()

    await signIn(invoiced.email)
    await page.goto(`/proposals/${invoiced.reference}/sent`)
    await page.getByRole('button', { name: 'Have it invoiced to an institute' }).click()
    const form = page.getByRole('form', { name: 'Ask for an invoice' })
    await form.getByRole('button', { name: 'Have the invoice written' }).click()
    await expect(form.getByText('Give its postal address.').first()).toBeVisible()
    await form.getByLabel('Institute that pays').fill(institute)
    await form.getByLabel('Postal address').fill('3 Lamp Street\nQuillon')
    await form.getByLabel('Purchase order').fill('PO-2201')
    await form.getByLabel('Mail it to').fill(billsTo)
    await form.getByRole('button', { name: 'Have the invoice written' }).click()
    await expect(page.getByText('The fee goes by invoice').first()).toBeVisible()
    const link = page.getByRole('link', { name: /^Invoice QI-\d{4}-\d{4} as PDF/ })
    number = /QI-\d{4}-\d{4}/.exec((await link.textContent()) ?? '')?.[0] ?? ''

    const text = await paper(page, invoiced.reference, number)
    for (const words of [institute, 'PO-2201', 'IBAN', invoiced.reference, typed(invoiced.feeMinor)])
      expect(text).toContain(words)
    expect((await letter(request, billsTo, new RegExp(number))).text).toContain('PO-2201')
  })

  test('the office sees it, and settles it when all of it has come', async ({
    page,
    signIn,
    checkAccessible,
  }) => {
    await signIn(office)
    await page.goto(`/office/fees?fee=${invoiced.reference}`)
    await expect(page.getByText(`${number} to ${institute}`).first()).toBeVisible()
    await checkAccessible()
    await page.getByRole('button', { name: 'Settle the invoice …' }).click()
    const form = page.getByRole('form', { name: `Settle ${number}` })
    await form.getByLabel('Amount received').fill(typed(invoiced.feeMinor / 2))
    await form.getByLabel('Day it arrived').fill(new Date().toISOString().slice(0, 10))
    await form.getByLabel('Reference on the statement').fill('SEPA 77')
    await form.getByRole('button', { name: `Settle ${number}` }).click()
    await expect(
      form.getByText(`The invoice is for ${money(invoiced.feeMinor)}. Settle it when that has come`).first(),
    ).toBeVisible()
    await booksBalance(page)

    await page.goto(`/office/fees?fee=${invoiced.reference}`)
    await page.getByRole('button', { name: 'Settle the invoice …' }).click()
    await form.getByLabel('Amount received').fill(typed(invoiced.feeMinor))
    await form.getByLabel('Day it arrived').fill(new Date().toISOString().slice(0, 10))
    await form.getByLabel('Reference on the statement').fill('SEPA 78')
    await form.getByRole('button', { name: `Settle ${number}` }).click()
    await expect(page.getByText(`reached the bank on invoice ${number}; SEPA 78`).first()).toBeVisible()
    expect(await paper(page, invoiced.reference, number)).toContain(institute)
    await booksBalance(page)
  })

  test('another pays by card, and has a receipt', async ({ page, signIn }) => {
    await signIn(byCard.email)
    await page.goto(`/proposals/${byCard.reference}/sent`)
    await page.getByRole('button', { name: /^Pay EUR/ }).click()
    await page.waitForURL(/\/pay\//)
    await page.getByRole('button', { name: 'Pay: the card is accepted' }).click()
    await page.waitForURL(new RegExp(`/proposals/${byCard.reference}/sent`))
    await expect(page.getByText('the fee is settled').first()).toBeVisible()
    const receipt = await page.request.get(`/proposals/${byCard.reference}/receipt`)
    expect(receipt.headers()['content-type']).toContain('application/pdf')
    expect(textOf(await receipt.body())).toContain(typed(byCard.feeMinor))
  })

  test('it goes back in part, then whole, and never more than was paid', async ({
    page,
    signIn,
    request,
  }) => {
    await signIn(office)
    const part = 4_000
    const rest = byCard.feeMinor - part
    const give = async (minor: number, why: string) => {
      await page.goto(`/office/fees?fee=${byCard.reference}`)
      await page.getByRole('button', { name: 'Give back …' }).click()
      const form = page.getByRole('form', { name: 'Give the fee back' })
      await form.getByLabel('Amount').fill(typed(minor))
      await form.getByLabel('Why').fill(why)
      await form.getByLabel(/^Type the reference/).fill(byCard.reference)
      await form.getByRole('button', { name: 'Give it back' }).click()
      return form
    }
    const tooMuch = await give(byCard.feeMinor + 1, 'More than there is.')
    await expect(
      tooMuch.getByText(`At most ${money(byCard.feeMinor)} can be given back`).first(),
    ).toBeVisible()
    await booksBalance(page)

    await give(part, 'A night was lost.')
    await expect(
      page.getByText(new RegExp(`${money(part)} given back; credit note QC-`)).first(),
    ).toBeVisible()
    await booksBalance(page)

    await give(rest, 'The other night, too.')
    await expect(
      page.getByText(new RegExp(`${money(rest)} given back; credit note QC-`)).first(),
    ).toBeVisible()
    await expect(page.getByRole('button', { name: 'Give back …' })).toBeHidden()
    const notes = await page.getByRole('link', { name: /^QC-\d{4}-\d{4}$/ }).allTextContents()
    expect(notes).toHaveLength(2)
    expect(await paper(page, byCard.reference, notes[0] ?? '')).toContain(typed(part))
    expect(await paper(page, byCard.reference, notes[1] ?? '')).toContain(typed(rest))
    expect((await letter(request, byCard.email, new RegExp(notes[1] ?? '-'))).text).toContain(
      'has been given back',
    )
    await booksBalance(page)
    await expect(page.getByRole('cell', { name: byCard.reference }).first()).toBeVisible()
  })
})
