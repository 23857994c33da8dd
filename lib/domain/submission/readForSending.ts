import { feeOf } from '@/db/queries/fees'
import type { ActingContext } from '../context'
import { readGiveaways } from '../anonymity/readGiveaways'
import { everythingMissing } from '../proposals/completeness'
import { maySendProposal } from '../proposals/policy'
import type { ReadProposal } from '../proposals/readProposal'
import type { Missing } from '../proposals/sections/finding'
import { papersWords } from './papersWords'
import { mayReopenProposal } from './policy'
import { readThrough, type ReadThroughGroup } from './readThrough'
import { recognisedWords } from './recognisedWords'

export interface ForSending extends ReadProposal {
  groups: ReadThroughGroup[]
  missing: Missing[]
  /** Why it cannot be sent by this person at this moment; null when it can. */
  whyNot: string | null
  isIn: boolean
  mayReopen: boolean
  /** What sending it will make due; null where nothing is. */
  due: { amountMinor: number; currency: string; dueAt: Date } | null
}

/** A proposal as it is read through before it is sent. */
export async function readForSending(ctx: ActingContext, read: ReadProposal): Promise<ForSending> {
  const { contents, computation, now } = read
  const may = maySendProposal(ctx.actor, contents, now)
  const standing = await feeOf(ctx.db, contents.id)
  const owed = standing
    ? standing.state === 'due' && { amountMinor: standing.amount_minor, currency: standing.currency }
    : read.feeToCome
  return {
    ...read,
    groups: readThrough(contents, computation, {
      justification: papersWords(contents),
      recognised: recognisedWords(await readGiveaways(ctx, contents)),
    }),
    missing: everythingMissing(read.sections),
    whyNot: may.allowed ? null : may.sentence,
    isIn: contents.state !== 'draft' && !contents.isReopened,
    mayReopen: mayReopenProposal(ctx.actor, contents, now).allowed,
    due: owed ? { ...owed, dueAt: standing?.due_at ?? contents.call.graceUntil } : null,
  }
}
