import { assignReviewers } from '../../../lib/domain/assignments/assignReviewers.ts'
import { startReview } from '../../../lib/domain/assignments/startReview.ts'
import { suggestForPanel } from '../../../lib/domain/assignments/suggestForPanel.ts'
import { declareInterests } from '../../../lib/domain/conflicts/declareInterests.ts'
import { saveShareRule } from '../../../lib/domain/sharing/saveShareRule.ts'
import type { ObjectStore } from '../../../lib/services/storage/ObjectStore.ts'
import type { Database } from '../../client.ts'
import { callDates } from '../callDates.ts'
import { seedCall, type Facility, type SeededCall } from '../calls.ts'
import { culminating } from './culminating.ts'
import { decideTwoPanels } from './decideTwoPanels.ts'
import type { PastPayments } from './pastPayments.ts'
import { earlierLarge, earlierRegular, type SeedProposal } from './proposalData.ts'
import { dice, type Dice } from './random.ts'
import { assessCall } from './reviewCall.ts'
import { teller, type Teller } from './teller.ts'
import { seatPanel, seatsOfTwo } from './twoPanelsRoles.ts'
import { writeProposal } from './writeProposal.ts'
import { writeReviews } from './writeReviews.ts'

const day = 86_400_000

export interface TwoPanelsCall extends SeededCall {
  /** The second panel, for large programmes. */
  largePanelId: number
}

/** Few nights, from the middle of the season, so that the panels ask for more than there is; the rest is promised. */
async function keepFewNights(db: Database, callId: number, facility: Facility): Promise<void> {
  for (const [slug, from, to] of [
    ['aldous', 3, 7],
    ['fennel', 2, 4],
  ] as const) {
    const nights = await db('night_blocks')
      .where({ call_id: callId, telescope_id: facility.telescopeIds.get(slug), use_for: 'science' })
      .orderBy('evening_date')
      .select('id')
    const others = nights.filter((_, index) => index < from || index >= to).map(({ id }) => id)
    await db('night_blocks').whereIn('id', others).update({ use_for: 'promised' })
  }
}

/** The earlier call without a fee, its large programmes given to a panel of their own. */
async function openTwoPanels(
  db: Database,
  facility: Facility,
  people: ReadonlyMap<string, number>,
  anchor: Date,
): Promise<TwoPanelsCall> {
  const call = await seedCall(db, facility, {
    number: 11,
    dates: callDates(anchor).earlier,
    summary:
      'Time on the Aldous 3.8 m and the Fennel 1.5 m. Large programmes are judged by a panel of their own; the time is shared between the panels.',
  })
  await db('calls').where({ id: call.id }).update({ currency: null })
  await keepFewNights(db, call.id, facility)
  const [largePanelId] = (await db('panels').insert({
    call_id: call.id,
    name: 'Large programmes',
    quorum: 3,
  })) as [number]
  await db('panels').where({ id: call.panelId }).update({ quorum: 3 })
  await db('call_kinds').where({ call_id: call.id, kind: 'large' }).update({ panel_id: largePanelId })
  await seatPanel(db, people, { callId: call.id, panelId: call.panelId }, seatsOfTwo.regular)
  await seatPanel(db, people, { callId: call.id, panelId: largePanelId }, seatsOfTwo.large)
  return { ...call, largePanelId }
}

/** Both chairs agree how to share before anything is read; reviewers declare, and each panel deals out its own. */
async function reviewTwoPanels(
  story: Teller,
  chance: Dice,
  call: TwoPanelsCall,
  all: readonly SeedProposal[],
): Promise<void> {
  await story.at(new Date(call.dates.closes_at.getTime() + 2 * day))
  const shared = { callId: call.id, percents: [] }
  await saveShareRule(await story.as('Edda Vorskell'), {
    ...{ ...shared, rule: 'proposals' },
    reason: 'Simple to explain: each proposal counts once, whatever it asks.',
  })
  await story.at(new Date(call.dates.closes_at.getTime() + 3 * day))
  await saveShareRule(await story.as('Tobin Aldersey'), {
    ...{ ...shared, rule: 'hours' },
    reason:
      'Large programmes are few and long: by hours both panels can fund the same part of what they are asked.',
  })
  await startReview(await story.as('Edda Vorskell'), { callId: call.id })
  for (const name of [...seatsOfTwo.regular, ...seatsOfTwo.large])
    await declareInterests(await story.as(name), { callSlug: 'call-11', names: [], wentThrough: true })
  for (const [panelId, [chairName]] of [
    [call.panelId, seatsOfTwo.regular],
    [call.largePanelId, seatsOfTwo.large],
  ] as const) {
    const chair = await story.as(chairName)
    const { pairs } = await suggestForPanel(chair, { panelId, each: 3 }, null)
    await assignReviewers(chair, { panelId, pairs })
  }
  await story.at(new Date(call.dates.closes_at.getTime() + 12 * day))
  await assessCall(story, chance, call, 1)
  const proposals = new Map(all.map((seed) => [seed.title, seed] as const))
  for (const panelId of [call.panelId, call.largePanelId])
    await writeReviews(story, chance, { id: call.id, panelId }, { finished: 1, proposals })
}

/** An earlier call whose two panels shared the time by hours asked and met over what stood near their lines. */
export async function tellTwoPanels(
  db: Database,
  world: { people: Map<string, number>; facility: Facility; anchor: Date },
  services: { storage: ObjectStore; payments: PastPayments; origin: string },
): Promise<void> {
  const chance = dice(20270320)
  const story = teller(db, world.people, services, chance)
  const call = await openTwoPanels(db, world.facility, world.people, world.anchor)
  const all = [...earlierRegular, ...earlierLarge]
  for (const [index, seed] of all.entries())
    await writeProposal(story, chance, seed, {
      ...{ call, facility: world.facility, raHours: culminating(call.dates.season_from) },
      begunAt: new Date(call.dates.closes_at.getTime() - (20 - index) * day),
      sentAt: new Date(call.dates.closes_at.getTime() - (5 - index / 2) * day),
    })
  await reviewTwoPanels(story, chance, call, all)
  await decideTwoPanels(story, call)
}
