import { findLetterCase, letterCases, type CaseLine } from '@/db/queries/letterCases'
import { newestByTemplate } from '@/db/queries/outbox'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { mayReadOutbox } from './policy'
import { renderLetter } from './renderLetter'
import { letterSamples } from './samples/samples'

export interface SampleView {
  templates: { template: string; title: string }[]
  cases: CaseLine[]
  /** Letters that are written elsewhere and cannot be tried: the newest of each that was sent. */
  others: { template: string; id: number }[]
  template: string
  reference: string
  /** The letter with this proposal's facts; null where the proposal has nothing it could tell. */
  letter: { subject: string; text: string; html: string } | null
}

const mostCases = 300

/** A letter of the product with the facts of a real proposal. Nothing is sent; links carry no secret. */
export async function readSample(
  ctx: ActingContext,
  asked: { template?: string | undefined; reference?: string | undefined },
): Promise<SampleView> {
  authorize(mayReadOutbox(ctx.actor))
  const [cases, sent] = await Promise.all([letterCases(ctx.db, mostCases), newestByTemplate(ctx.db)])
  const template = asked.template ?? 'proposal-sent'
  const reference = asked.reference ?? cases.find(({ state }) => state !== 'draft')?.reference ?? ''
  const sample = letterSamples.find((one) => one.template === template)
  const of = await findLetterCase(ctx.db, reference)
  const built = of && sample ? sample.build({ of, clerk: ctx.actor.name, origin: ctx.request.origin }) : null
  return {
    templates: letterSamples.map(({ template: name, title }) => ({ template: name, title })),
    others: sent.filter(({ template: name }) => !letterSamples.some((one) => one.template === name)),
    cases,
    template,
    reference,
    letter: built ? { subject: built.subject, ...renderLetter(built) } : null,
  }
}
