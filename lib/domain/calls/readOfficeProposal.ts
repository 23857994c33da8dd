import { databaseNow } from '@/db/queries/clock'
import { repairsOf } from '@/db/queries/paperRepairs'
import { versionsOf, type VersionHead } from '@/db/queries/proposalVersions'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import type { PaperRepair } from '../papers/repairTypes'
import { readContents } from '../proposals/readContents'
import type { ProposalContents } from '../proposals/types'
import { mayManageCalls } from './policy'
import { deadlineOf } from './rules'

export interface OfficeProposalView {
  contents: ProposalContents
  deadline: Date
  now: Date
  versions: VersionHead[]
  repairs: PaperRepair[]
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
  return { contents, now, deadline: deadlineOf(contents.call, contents.kind, contents), versions, repairs }
}
