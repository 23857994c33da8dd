import { figuresOf } from '@/db/queries/figures'
import { investigatorsOf } from '@/db/queries/proposalPeople'
import { findProposal } from '@/db/queries/proposals'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { storedBytes } from '../papers/storedBytes'
import { mayReadProposal } from '../proposals/policy'
import type { Figure } from '../proposals/writingTypes'

/** The picture of a figure that stands, for the investigators of its proposal and the office. */
export async function readFigure(
  ctx: Context,
  input: { reference: string; figureId: number },
): Promise<{ bytes: Uint8Array; contentType: Figure['contentType'] }> {
  if (!ctx.actor) throw refuse.notSignedIn()
  const row = await findProposal(ctx.db, input.reference)
  if (!row) throw refuse.notFound('proposal')
  authorize(mayReadProposal(ctx.actor, { people: await investigatorsOf(ctx.db, row.id) }))
  const figure = (await figuresOf(ctx.db, row.id)).find(({ id }) => id === input.figureId)
  if (!figure) throw refuse.notFound('figure')
  return { bytes: await storedBytes(ctx, figure), contentType: figure.contentType }
}
