import { formatUtcInstant } from '@/lib/format'
import type { ProposalContents } from '../proposals/types'

type Subject = Pick<ProposalContents, 'state' | 'closesAt' | 'call' | 'kind'>

export interface NoExtension {
  /** The field at fault; null where no date would do. */
  field: 'closesAt' | null
  sentence: string
}

const never = (sentence: string): NoExtension => ({ field: null, sentence })
const date = (sentence: string): NoExtension => ({ field: 'closesAt', sentence })

/** Why one proposal cannot have this deadline of its own; null when it can. */
export function whyNoExtension(subject: Subject, closesAt: Date, now: Date): NoExtension | null {
  const { call, kind } = subject
  if (call.stage === 'planned') return never('The call has not opened yet.')
  if (call.stage !== 'published')
    return never('The review of this call has started: nothing can be sent any more.')
  if (subject.state !== 'draft' && subject.state !== 'submitted')
    return never('This proposal has left the call. Its deadline does not matter any more.')
  if (closesAt <= now) return date('This moment has passed. Give one that lies ahead.')
  const usual = kind.closesAt ?? call.closesAt
  if (closesAt <= usual)
    return date(`It may be sent until ${formatUtcInstant(usual)} as it is. Give a later moment.`)
  if (closesAt >= call.reviewsDueAt)
    return date(`Reviews are due at ${formatUtcInstant(call.reviewsDueAt)}: it must arrive before that.`)
  return null
}
