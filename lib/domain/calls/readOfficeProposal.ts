import { databaseNow } from '@/db/queries/clock'
import { repairsOf } from '@/db/queries/paperRepairs'
import { versionsOf, type VersionHead } from '@/db/queries/proposalVersions'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import type { PaperRepair } from '../papers/repairTypes'
import { readContents } from '../proposals/readContents'
import type { ProposalContents } from '../proposals/types'
import { whyNoRepair } from '../papers/rules'
import { whyNoExtension } from './extensionRules'
import { mayManageCalls } from './policy'
import { deadlineOf } from './rules'

export interface OfficeProposalView {
  contents: ProposalContents
  deadline: Date
  now: Date
  versions: VersionHead[]
  repairs: PaperRepair[]
  /** Why it cannot have a deadline of its own, and why no paper can be opened, whatever the date; null where they can. */
  noExtension: string | null
  noRepair: string | null
}

/** One proposal of a call with what the office may do about it: its deadline, its papers, its versions. */
export async function readOfficeProposal(
  ctx: ActingContext,
  input: { slug: string; reference: string },
): Promise<OfficeProposalView> {
  authorize(mayManageCalls(ctx.actor))
  const [contents, now] = await Promise.all([readContents(ctx.db, input.reference), databaseNow(ctx.db)])
  if (contents.call.slug !== input.slug) throw refuse.notFound('proposal')
  const [versions, repairs] = await Promise.all([
    versionsOf(ctx.db, contents.id),
    repairsOf(ctx.db, contents.id),
  ])
  const { call, papers } = contents
  const [paper] = papers
  const extension = whyNoExtension(contents, new Date(call.reviewsDueAt.getTime() - 1), now)
  const repair = whyNoRepair(
    contents,
    { kind: paper?.kind ?? 'justification', openUntil: call.panelMeetsAt },
    repairs,
    now,
  )
  const whole = (why: { field: string | null; sentence: string } | null) =>
    why?.field === null ? why.sentence : null
  return {
    contents,
    now,
    deadline: deadlineOf(call, contents.kind, contents),
    versions,
    repairs,
    noExtension: whole(extension),
    noRepair: whole(repair),
  }
}
