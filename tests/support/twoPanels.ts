import type { Database } from '@/db/client'
import { insertRanking } from '@/db/queries/rankings'
import type { Actor } from '@/lib/domain/actor'
import { freezeRanking } from '@/lib/domain/rankings/freezeRanking'
import { makePanelCall, type PanelCall, type PanelProposalMade } from './panelCall'
import { makePerson } from './scenario/people'

export interface TwoPanels extends PanelCall {
  secondId: number
  secondChair: Actor
  first: PanelProposalMade[]
  second: PanelProposalMade[]
  /** Begins the list of a panel in the order its proposals were made, and freezes it unless told otherwise. */
  rank: (panelId: number, isFrozen?: boolean) => Promise<void>
}

/** A call in its ranking stage whose proposals stand in two panels, each with a chair of its own; 110 hours on offer. */
export async function makeTwoPanels(
  db: Database,
  askedHours: { first: readonly number[]; second: readonly number[] },
): Promise<TwoPanels> {
  const call = await makePanelCall(db, [...askedHours.first, ...askedHours.second])
  await db('night_blocks')
    .where({ call_id: call.callId })
    .andWhere('evening_date', '>', '2027-07-10')
    .delete()
  const [secondId = 0] = await db('panels').insert({
    call_id: call.callId,
    name: 'Nearby universe',
    quorum: 1,
  })
  const secondChair = await makePerson(db, call.tag, 'Moss Quarrowby', 'chair', {
    callId: call.callId,
    panelId: secondId,
  })
  await db('panel_members').insert({
    panel_id: secondId,
    person_id: secondChair.personId,
    seat: 'chair',
    number: 1,
  })
  const first = call.proposals.slice(0, askedHours.first.length)
  const second = call.proposals.slice(askedHours.first.length)
  const ids = second.map(({ id }) => id)
  if (ids.length > 0) await db('proposals').whereIn('id', ids).update({ panel_id: secondId })
  await db('proposals').where({ call_id: call.callId, state: 'submitted' }).update({ state: 'under-review' })
  await db('calls').where({ id: call.callId }).update({ stage: 'ranking' })
  const rank = async (panelId: number, isFrozen = true) => {
    const own = panelId === secondId ? second : first
    const chair = panelId === secondId ? secondChair : call.chair
    const rankingId = await insertRanking(db, {
      panelId,
      entries: own.map(({ id }) => ({ proposalId: id, rawMean: null, setAsideAt: null })),
      lineAfter: 1,
      madeBy: chair.personId,
    })
    if (isFrozen) await freezeRanking(call.as(chair), { panelId, rankingId, version: 1 })
  }
  return { ...call, secondId, secondChair, first, second, rank }
}
