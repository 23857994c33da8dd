import type { z } from 'zod'
import { findCallOfKind } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import { lockProgramme, programmeInCall } from '@/db/queries/programmes'
import { findProposal, findTwin, insertProposal } from '@/db/queries/proposals'
import type { ProposalsRow } from '@/db/tables'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { formatUtcInstant } from '@/lib/format'
import { deadlineOf, takesProposals } from '../calls/rules'
import type { Call, CallKind } from '../calls/types'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { categories } from '../proposals/categories'
import { freeReference } from '../proposals/freeReference'
import { mayReadProposal } from '../proposals/policy'
import { contentsOf, readContents } from '../proposals/readContents'
import type { ProposalContents } from '../proposals/types'
import { carryContents } from './carryContents'
import { carryPeople } from './carryPeople'
import { carryWriting } from './carryWriting'
import { copyFiles } from './copyFiles'
import { mayContinue } from './policy'
import type { continueSchema } from './schema'

export type ContinueInput = z.output<typeof continueSchema>

/** The kind asked for, in a call that takes proposals now and is not the one the old proposal belongs to. */
async function openKind(
  ctx: ActingContext,
  old: ProposalContents,
  kindId: number,
): Promise<{ call: Call; kind: CallKind; now: Date }> {
  const [found, now] = await Promise.all([findCallOfKind(ctx.db, kindId), databaseNow(ctx.db)])
  if (!found) throw refuse.field('kindId', 'This kind of proposal is not on offer.')
  if (found.call.id === old.call.id)
    throw refuse.closed(
      `This proposal is of call ${found.call.number} itself. It is carried on in a later one.`,
    )
  const deadline = deadlineOf(found.call, found.kind, { closesAt: null })
  if (takesProposals(found.call, deadline, now)) return { ...found, now }
  throw refuse.closed(
    now < deadline
      ? `Call ${found.call.number} is not open.`
      : `Call ${found.call.number} closed at ${formatUtcInstant(deadline)}.`,
  )
}

/** A programme has one proposal in a call. Which one it is, is told to those who may read it. */
async function requireFirst(tx: ActingContext, row: ProposalsRow, call: Call): Promise<void> {
  const standing = await programmeInCall(tx.db, row.programme_id, call.id)
  if (!standing) return
  const { people } = await readContents(tx.db, standing.id)
  const which = mayReadProposal(tx.actor, { people }).allowed ? `: ${standing.reference}` : ''
  throw refuse.closed(`This programme has a proposal in call ${call.number} already${which}.`)
}

/**
 * Carries a proposal of an earlier call on in an open one, under the same programme. What does not fit the new call is
 * kept as it was and listed where it is mended; people must agree anew.
 */
export async function continueProposal(
  ctx: ActingContext,
  input: ContinueInput,
): Promise<{ reference: string }> {
  const before = await readContents(ctx.db, input.reference)
  authorize(mayContinue(ctx.actor, before))
  await openKind(ctx, before, input.kindId)
  const papers = await copyFiles(ctx, before.papers, () => 'application/pdf')
  const figures = await copyFiles(ctx, before.figures, ({ contentType }) => contentType)

  return inTransaction(ctx, async (tx) => {
    const row = await findProposal(tx.db, before.id)
    if (!row) throw refuse.notFound('proposal')
    await lockProgramme(tx.db, row.programme_id)
    const old = await contentsOf(tx.db, row)
    authorize(mayContinue(tx.actor, old))
    const { call, kind, now } = await openKind(tx, old, input.kindId)
    // A double press opens the draft just begun.
    const twin = await findTwin(tx.db, {
      personId: tx.actor.personId,
      kindId: kind.id,
      title: old.title,
      continuesId: old.id,
    })
    if (twin) return { reference: twin }
    await requireFirst(tx, row, call)

    const reference = await freeReference(tx)
    const id = await insertProposal(tx.db, {
      reference,
      programmeId: row.programme_id,
      callId: call.id,
      callKindId: kind.id,
      title: old.title,
      abstract: old.abstract,
      category: categories.some((known) => known === old.category) ? old.category : '',
      cosmologyId: old.cosmology.id,
      cosmologyParameters: old.cosmology.parameters,
      comparisonCosmologyId: old.cosmology.comparisonId,
      continuesId: old.id,
      createdBy: tx.actor.personId,
    })
    await carryPeople(tx, old.people, { id, reference, title: old.title, call, kind, now })
    await carryContents(tx, old, { proposalId: id, call })
    await carryWriting(tx, old, { proposalId: id, papers, figures })
    await writeLogbook(tx, {
      action: 'proposal.continue',
      subject: { kind: 'proposal', id: reference },
      actingAs: 'investigator',
      before: { reference: old.reference, call: old.call.number, kind: old.kind.title },
      after: { title: old.title, call: call.number, kind: kind.title, papers: papers.length },
    })
    return { reference }
  })
}
