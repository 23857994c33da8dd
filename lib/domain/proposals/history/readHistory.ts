import { entriesOf } from '@/db/queries/logbook'
import { versionsOf, type VersionHead } from '@/db/queries/proposalVersions'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../../context'
import { mayReadProposal } from '../policy'
import type { ProposalContents } from '../types'
import { changesOf, type Change } from './changesOf'
import type { RowNames } from './entryWords'

export interface History {
  versions: VersionHead[]
  changes: Change[]
}

const most = 1000

function namesOf({ targets, observations }: Pick<ProposalContents, 'targets' | 'observations'>): RowNames {
  const target = (id: number) => targets.find((one) => one.id === id)?.name ?? null
  return {
    target,
    observation: (id) => target(observations.find((one) => one.id === id)?.targetId ?? 0),
  }
}

/** Versions sent and changes made, for those who may read the proposal. */
export async function readHistory(
  ctx: ActingContext,
  contents: Pick<ProposalContents, 'id' | 'reference' | 'people' | 'targets' | 'observations'>,
): Promise<History> {
  authorize(mayReadProposal(ctx.actor, contents))
  const [versions, entries] = await Promise.all([
    versionsOf(ctx.db, contents.id),
    entriesOf(ctx.db, 'proposal', contents.reference, most),
  ])
  return { versions, changes: changesOf(entries, ctx.actor.personId, namesOf(contents)) }
}
