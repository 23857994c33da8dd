import { versionNumbered } from '@/db/queries/versions'
import { authorize } from '@/lib/auth/authorize'
import { compareTexts, type Difference } from '@/lib/writing/compareTexts'
import type { ActingContext } from '../../context'
import type { ProposalComputation } from '../../observations/types'
import { mayReadProposal } from '../policy'
import type { ProposalContents } from '../types'
import type { WritingPart } from '../writingTypes'
import { compareContents, type ThingChange } from './compareContents'

type Sums = Pick<ProposalComputation, 'askedSeconds' | 'neededSeconds' | 'verdict'>

export interface VersionChanges {
  from: number
  /** The next version sent; null for what stands now. */
  to: number | null
  /** What the request came to, before and after. */
  sums: { was: Sums; is: Sums }
  things: ThingChange[]
  /** Texts that differ. */
  parts: { part: WritingPart | 'abstract'; differences: Difference[] }[]
}

const texts = ({ abstract, writings }: Pick<ProposalContents, 'abstract' | 'writings'>) => ({
  abstract,
  justification: writings.justification.text,
  references: writings.references.text,
  team: writings.team.text,
})
const order = ['abstract', 'justification', 'references', 'team'] as const

/** How a proposal went on after a version that was sent; null when there is no such version. */
export async function readVersionChanges(
  ctx: ActingContext,
  now: { contents: ProposalContents; computation: ProposalComputation },
  from: number,
): Promise<VersionChanges | null> {
  authorize(mayReadProposal(ctx.actor, now.contents))
  const [version, next] = await Promise.all([
    versionNumbered(ctx.db, now.contents.id, from),
    versionNumbered(ctx.db, now.contents.id, from + 1),
  ])
  if (!version) return null
  const was = version.snapshot
  const is = next?.snapshot ?? now
  const [before, after] = [texts(was.contents), texts(is.contents)]
  return {
    from,
    to: next?.versionNumber ?? null,
    sums: { was: was.computation, is: is.computation },
    things: compareContents(was.contents, is.contents),
    parts: order
      .filter((part) => before[part] !== after[part])
      .map((part) => ({ part, differences: compareTexts(before[part], after[part]) })),
  }
}
