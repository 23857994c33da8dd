import type { Database } from '@/db/client'
import { heldTime } from '@/db/queries/nightTerms'
import { offeredTime } from '@/db/queries/panel'
import { shareRules } from '@/db/queries/shareRules'
import { sharesOf } from '@/lib/panel/sharing/sharesOf'
import type { Claim, Share, ShareRule } from '@/lib/panel/sharing/types'
import { offeredByTelescope } from '../rankings/offered'
import type { PanelList } from './panelLists'
import { usualRule } from './rules'

export interface SharedTime {
  rule: ShareRule
  percents: { panelId: number; percent: number }[]
  pools: { id: number; name: string; seconds: number; heldSeconds: number }[]
  claims: Claim[]
  shares: Share[]
}

/** What a panel asks of each pool: all it judges, so that its share is known before anything is ranked. */
function claimsOf({ panelId, lines }: PanelList): Claim[] {
  const claims = new Map<number, { seconds: number; asking: Set<number> }>()
  for (const { telescopeId, askedSeconds, proposalId } of lines) {
    const claim = claims.get(telescopeId) ?? { seconds: 0, asking: new Set() }
    claim.asking.add(proposalId)
    claims.set(telescopeId, { ...claim, seconds: claim.seconds + askedSeconds })
  }
  return [...claims].map(([pool, { seconds, asking }]) => ({
    ...{ panel: panelId, pool, seconds },
    proposals: asking.size,
  }))
}

/** How the time of each telescope of a call is shared between its panels by the rule that stands. */
export async function sharedTime(
  db: Database,
  callId: number,
  lists: readonly PanelList[],
): Promise<SharedTime> {
  const [blocks, held, written] = await Promise.all([
    offeredTime(db, callId),
    heldTime(db, callId),
    shareRules(db, callId),
  ])
  const standing = written.find(({ isStanding }) => isStanding)
  const rule = standing?.rule ?? usualRule
  const percents = standing?.percents ?? []
  const pools = [...offeredByTelescope(blocks)].map(([id, offered]) => {
    const heldSeconds = held.get(id)?.seconds ?? 0
    const name = blocks.find(({ telescopeId }) => telescopeId === id)?.telescope ?? ''
    return { id, name, seconds: Math.max(0, offered - heldSeconds), heldSeconds }
  })
  const claims = lists.flatMap(claimsOf)
  const shares = sharesOf({
    ...{ rule, pools, claims },
    panels: lists.map(({ panelId }) => panelId),
    percents: new Map(percents.map(({ panelId, percent }) => [panelId, percent])),
  })
  return { rule, percents, pools, claims, shares }
}
