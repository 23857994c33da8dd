import { beforeEach, describe, expect, it } from 'vitest'
import { readAssignments } from '@/lib/domain/assignments/readAssignments'
import type { Actor } from '@/lib/domain/actor'
import { readDecisions } from '@/lib/domain/decisions/readDecisions'
import { readNights } from '@/lib/domain/decisions/readNights'
import { readLedPanels } from '@/lib/domain/panels/readLedPanels'
import { readDiscussion } from '@/lib/domain/rankings/readDiscussion'
import { readRanking } from '@/lib/domain/rankings/readRanking'
import { useRolledBackDatabase } from '../../support/database'
import { makePanelCall, type PanelCall, type PanelProposalMade } from '../../support/panelCall'

// Seen to fail with the seat left out of what is led, and with the panel of the address not looked at.

const db = useRolledBackDatabase()
let call: PanelCall
let secondId: number
let moved: PanelProposalMade
let kept: PanelProposalMade

const seat = (who: Actor, kind: 'chair' | 'deputy' | 'member', number: number) =>
  db()('panel_members').insert({ panel_id: secondId, person_id: who.personId, seat: kind, number })
const granted = (who: Actor): Actor => ({
  ...who,
  grants: [...who.grants, { role: 'chair', callId: call.callId, panelId: secondId, instrumentId: null }],
})
const led = (who: Actor) => readLedPanels(call.as(who), call.callSlug)

beforeEach(async () => {
  call = await makePanelCall(db(), [20, 10])
  ;[kept, moved] = call.proposals as [PanelProposalMade, PanelProposalMade]
  const [id] = await db()('panels').insert({ call_id: call.callId, name: 'Nearby universe', quorum: 3 })
  secondId = Number(id)
  await db()('proposals').where({ id: moved.id }).update({ panel_id: secondId })
})

describe('a person of two panels', () => {
  it.each(['chair', 'deputy'] as const)('as %s of the second, chooses between both', async (kind) => {
    await seat(call.chair, kind, 1)
    expect(await led(granted(call.chair))).toMatchObject([
      { id: call.panelId },
      { id: secondId, name: 'Nearby universe' },
    ])
  })

  it('reaches every page of the second, and of the first without asking', async () => {
    await seat(call.chair, 'chair', 1)
    const ctx = call.as(granted(call.chair))
    for (const read of [readAssignments, readRanking, readNights, readDecisions]) {
      expect((await read(ctx, { callSlug: call.callSlug })).panelId).toBe(call.panelId)
      expect((await read(ctx, { callSlug: call.callSlug, panelId: secondId })).panelId).toBe(secondId)
    }
    const shown = async (panelId: number) =>
      (await readDiscussion(ctx, { callSlug: call.callSlug, panelId })).proposals.map(
        (one) => one.reviewNumber,
      )
    expect(await shown(call.panelId)).toEqual([kept.reviewNumber])
    expect(await shown(secondId)).toEqual([moved.reviewNumber])
  })

  it('is not offered a panel as a member, with the seat alone, or with the role alone', async () => {
    expect(await led(granted(call.chair))).toMatchObject([{ id: call.panelId }])
    await seat(call.chair, 'member', 1)
    expect(await led(granted(call.chair))).toMatchObject([{ id: call.panelId }])
    await db()('panel_members').where({ panel_id: secondId }).update({ seat: 'chair' })
    expect(await led(call.chair)).toMatchObject([{ id: call.panelId }])
    await expect(
      readRanking(call.as(call.chair), { callSlug: call.callSlug, panelId: secondId }),
    ).rejects.toMatchObject({ kind: 'not-found' })
  })
})

it('a reviewer, an investigator and the office are offered none, nor is anyone in a call that is not', async () => {
  await seat(call.reviewers[0], 'member', 2)
  for (const who of [call.reviewers[0], kept.pi, call.office, call.stranger])
    expect(await led(who)).toEqual([])
  expect(await readLedPanels(call.as(call.chair), 'no-such-call')).toEqual([])
})
