import { versionNumbered } from '@/db/queries/versions'
import { authorize } from '@/lib/auth/authorize'
import { compareTexts, type Difference } from '@/lib/writing/compareTexts'
import type { ActingContext } from '../../context'
import { mayReadProposal } from '../policy'
import type { ProposalContents, Writings, WritingPart } from '../types'

export interface TextChanges {
  from: number
  /** The next version sent; null for what stands now. */
  to: number | null
  /** Parts that differ. */
  parts: { part: WritingPart; differences: Difference[] }[]
}

const order: readonly WritingPart[] = ['justification', 'references', 'team']

/** How the texts written here went on after a version that was sent; null when there is no such version. */
export async function readTextChanges(
  ctx: ActingContext,
  contents: Pick<ProposalContents, 'id' | 'people' | 'writings'>,
  from: number,
): Promise<TextChanges | null> {
  authorize(mayReadProposal(ctx.actor, contents))
  const [version, next] = await Promise.all([
    versionNumbered(ctx.db, contents.id, from),
    versionNumbered(ctx.db, contents.id, from + 1),
  ])
  if (!version) return null
  const before: Writings = version.snapshot.contents.writings
  const after = next?.snapshot.contents.writings ?? contents.writings
  return {
    from,
    to: next?.versionNumber ?? null,
    parts: order
      .filter((part) => before[part].text !== after[part].text)
      .map((part) => ({ part, differences: compareTexts(before[part].text, after[part].text) })),
  }
}
