import { readdirSync, readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import type { LetterCase } from '@/db/queries/letterCases'
import { renderLetter } from '@/lib/domain/outbox/renderLetter'
import { letterSamples } from '@/lib/domain/outbox/samples/samples'

const at = new Date('2027-03-31T22:00:00Z')
const of: LetterCase = {
  reference: '4F7-K2M',
  title: 'Quasars & <lenses>',
  reviewNumber: '14-083',
  lead: 'Maren Sollvik',
  second: 'Odo Pellering',
  call: { number: 14, title: 'Call 14', slug: 'call-14', closesAt: at, reviewsDueAt: at },
  chair: 'Gwil Harrowgate',
  version: { number: 1, arrivedAt: at, sha256: 'a'.repeat(64) },
  fee: { amountMinor: 12_000, currency: 'EUR', dueAt: at, state: 'due' },
  receipt: { number: 'QR-2027-0001', amountMinor: 12_000, currency: 'EUR', cardLast4: '4242', paidAt: at },
  waiver: { reason: 'No funds.', state: 'granted', note: 'As the rules allow.', askedBy: 'Maren Sollvik' },
  invoice: {
    number: 'QI-2027-0001',
    institute: 'Institute of <Dust>',
    purchaseOrder: 'PO 7',
    amountMinor: 12_000,
    currency: 'EUR',
    dueAt: at,
    isSettled: true,
    billing: {
      name: 'Office',
      address: 'Ridge',
      taxNumber: '',
      contact: 'office@noctuary.example',
      accountHolder: 'Observatory',
      iban: 'QZ69447011820093000012',
      bic: 'QRBKQZ2X',
      bank: 'Bank',
    },
  },
  creditNote: {
    number: 'QC-2027-0001',
    invoiceNumber: 'QI-2027-0001',
    amountMinor: 12_000,
    currency: 'EUR',
    isMoney: true,
  },
  failedRefund: { amountMinor: 5000, currency: 'EUR', failure: 'The card was closed.' },
  dispute: {
    amountMinor: 12_000,
    currency: 'EUR',
    status: 'lost',
    decision: 'waive',
    note: 'It was <no> fault of theirs.',
  },
  decision: { outcome: 'awarded', lines: [] },
  question: { instrument: 'EMBER', question: 'Which slit?', answer: 'The wide one.', dueAt: at },
}
const facts = { of, clerk: 'Kit Larkmoor', origin: 'https://noctuary.example' }

// Seen to fail: with a sample under another letter's name; without the samples of invoices and refunds.
describe('letters to be tried', () => {
  it.each(letterSamples)('$template is built under its own name, and its words are escaped', (sample) => {
    const letter = sample.build(facts)
    expect(letter?.template).toBe(sample.sentAs ?? sample.template)
    const { html } = renderLetter(letter ?? expect.fail('not built'))
    expect(html).not.toContain('<lenses>')
  })

  it('stand once each', () => {
    const names = letterSamples.map(({ template }) => template)
    expect(new Set(names).size).toBe(names.length)
  })

  // A bulk letter is written by the office, and tried on its own page.
  it('are there for every letter the product has', () => {
    const under = 'lib/domain/outbox'
    const letters = readdirSync(`${under}/letters`).map((file) => file.replace(/\.ts$/, ''))
    const samples = readdirSync(`${under}/samples`)
      .map((file) => readFileSync(`${under}/samples/${file}`, 'utf8'))
      .join('\n')
    expect(letters.length).toBeGreaterThan(30)
    expect(letters.filter((name) => !samples.includes(`'../letters/${name}'`))).toEqual([])
  })
})
