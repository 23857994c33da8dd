import { formatUtcInstant } from '@/lib/format'
import { deadlineOf } from '../calls/rules'
import type { ProposalContents } from '../proposals/types'
import type { PaperRepair } from './repairTypes'

type Subject = Pick<ProposalContents, 'state' | 'isReopened' | 'closesAt' | 'call' | 'kind' | 'papers'>

export interface NoRepair {
  /** The field at fault; null where nothing typed would do. */
  field: 'kind' | 'openUntil' | null
  sentence: string
}

/** A repair that still waits for its file at `at`. */
export const isWaiting = (repair: PaperRepair, at: Date): boolean =>
  repair.versionNumber === null && repair.takenBackAt === null && at < repair.openUntil

/** Why this paper cannot be opened for a replacement until then; null when it can. */
export function whyNoRepair(
  subject: Subject,
  wanted: { kind: PaperRepair['kind']; openUntil: Date },
  known: readonly PaperRepair[],
  now: Date,
): NoRepair | null {
  const no = (sentence: string, field: NoRepair['field'] = null): NoRepair => ({ field, sentence })
  if (subject.state !== 'submitted' && subject.state !== 'under-review')
    return no('Only a proposal that was sent, and is not decided, has a paper to repair.')
  const deadline = deadlineOf(subject.call, subject.kind, subject)
  if (now < deadline)
    return no(
      `Until ${formatUtcInstant(deadline)} its investigators can reopen it and put in another file themselves.`,
    )
  if (subject.call.stage !== 'published' && subject.call.stage !== 'review')
    return no('The proposals of this call are being ranked: what was read stays as it is.')
  if (subject.papers.length === 0) return no('It was sent without a file: there is none to replace.')
  if (!subject.papers.some(({ kind }) => kind === wanted.kind))
    return no('This proposal has no such paper.', 'kind')
  if (known.some((repair) => repair.kind === wanted.kind && isWaiting(repair, now)))
    return no('This paper is open for a replacement already.', 'kind')
  if (wanted.openUntil <= now) return no('This moment has passed. Give one that lies ahead.', 'openUntil')
  if (wanted.openUntil > subject.call.panelMeetsAt)
    return no(
      `The panel meets at ${formatUtcInstant(subject.call.panelMeetsAt)}. Give an earlier moment.`,
      'openUntil',
    )
  return null
}
