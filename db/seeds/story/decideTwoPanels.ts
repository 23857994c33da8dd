import { approveDecisions } from '../../../lib/domain/decisions/approveDecisions.ts'
import { openDecision } from '../../../lib/domain/decisions/openDecision.ts'
import { prepareDecisions } from '../../../lib/domain/decisions/prepareDecisions.ts'
import { releaseDecisions } from '../../../lib/domain/decisions/releaseDecisions.ts'
import { takePlan } from '../../../lib/domain/decisions/takePlan.ts'
import { discussNow } from '../../../lib/domain/discussions/discussNow.ts'
import { setPresence } from '../../../lib/domain/discussions/setPresence.ts'
import { freezeRanking } from '../../../lib/domain/rankings/freezeRanking.ts'
import { readRanking } from '../../../lib/domain/rankings/readRanking.ts'
import { startRanking } from '../../../lib/domain/rankings/startRanking.ts'
import { bringTogether } from '../../../lib/domain/sharing/bringTogether.ts'
import { freezeMerged } from '../../../lib/domain/sharing/freezeMerged.ts'
import { moveInMerged } from '../../../lib/domain/sharing/moveInMerged.ts'
import { readSharing } from '../../../lib/domain/sharing/readSharing.ts'
import type { TwoPanelsCall } from './tellTwoPanels.ts'
import type { Teller } from './teller.ts'
import { seatsOfTwo } from './twoPanelsRoles.ts'

const hour = 3_600_000
const minute = 60_000
const slug = 'call-11'

/** Everyone comes, the first two proposals that all may hear are talked over, and everyone leaves. */
async function discuss(story: Teller, chairName: string, panelId: number): Promise<void> {
  const chair = await story.as(chairName)
  const members = await story.db('panel_members').where({ panel_id: panelId }).select('person_id')
  const note = async (isPresent: boolean) => {
    for (const { person_id } of members) await setPresence(chair, { panelId, personId: person_id, isPresent })
  }
  const began = await story.db('rankings').where({ panel_id: panelId }).max({ at: 'created_at' }).first()
  const begunAt = (began?.at as Date | undefined)?.getTime() ?? 0
  await note(true)
  const { rows } = await readRanking(chair, { callSlug: slug, panelId })
  for (const [index, { proposalId }] of rows.slice(0, 2).entries()) {
    await story.at(new Date(begunAt + (index * 20 + 5) * minute))
    await discussNow(chair, { panelId, proposalId })
  }
  await story.at(new Date(begunAt + 50 * minute))
  await discussNow(chair, { panelId, proposalId: null })
  await note(false)
}

async function rankAndFreeze(story: Teller, chairName: string, panelId: number): Promise<void> {
  const chair = await story.as(chairName)
  await startRanking(chair, { panelId })
  const ranking = await story.db('rankings').where({ panel_id: panelId }).whereNull('superseded_at').first()
  if (!ranking) throw new Error('the ranking was not started')
  await discuss(story, chairName, panelId)
  await freezeRanking(chair, { panelId, rankingId: ranking.id, version: ranking.version })
}

/** Both chairs order what stands near the lines: the first two neighbours of different panels change places. */
async function meet(story: Teller, call: TwoPanelsCall): Promise<void> {
  const [edda, tobin] = [await story.as(seatsOfTwo.regular[0]), await story.as(seatsOfTwo.large[0])]
  await bringTogether(edda, { callId: call.id })
  const key = async () => {
    const { list } = await readSharing(tobin, slug)
    return { callId: call.id, listId: list?.id ?? 0, version: list?.version ?? 0 }
  }
  await freezeMerged(edda, await key())
  const { rows } = await readSharing(tobin, slug)
  const at = rows.findIndex(
    (row, index) => row.isNear && rows[index - 1]?.isNear && rows[index - 1]?.panelId !== row.panelId,
  )
  const moved = rows[at]
  if (!moved) throw new Error('no neighbours of two panels stand near the lines')
  await moveInMerged(tobin, {
    ...(await key()),
    ...{ proposalId: moved.proposalId, place: at },
    reason: 'Both chairs: its field is up in this season only, the other can wait for the next call.',
  })
  await freezeMerged(tobin, await key())
}

/** Each panel ranks and freezes, the chairs meet, the nights follow their order, and the letters go out. */
export async function decideTwoPanels(story: Teller, call: TwoPanelsCall): Promise<void> {
  const panels = [
    [call.panelId, seatsOfTwo.regular[0]],
    [call.largePanelId, seatsOfTwo.large[0]],
  ] as const
  await story.at(call.dates.panel_meets_at)
  for (const [panelId, name] of panels) await rankAndFreeze(story, name, panelId)
  await story.at(new Date(call.dates.panel_meets_at.getTime() + 4 * hour))
  await meet(story, call)
  for (const [panelId, name] of panels) {
    const chair = await story.as(name)
    await takePlan(chair, { panelId, policy: 'rank' })
    await prepareDecisions(chair, { panelId })
    const decisions = await story
      .db('decisions as d')
      .join('proposals as p', 'p.id', 'd.proposal_id')
      .where({ 'p.panel_id': panelId })
      .whereNull('d.superseded_at')
      .select('d.proposal_id as proposalId', 'd.version')
    const office = await story.as('Maud Ferrisay')
    for (const decision of decisions) await openDecision(office, { panelId, ...decision })
    await approveDecisions(office, { panelId, decisions })
  }
  await story.at(call.dates.letters_at)
  for (const [panelId, name] of panels)
    await releaseDecisions(await story.as(name), { panelId, typed: String(call.number) })
}
