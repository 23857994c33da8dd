import type { ObjectStore } from '../../../lib/services/storage/ObjectStore.ts'
import type { Database } from '../../client.ts'
import type { Facility, SeededCall } from '../calls.ts'
import { afterPayments } from './afterPayments.ts'
import { culminating } from './culminating.ts'
import { decideCall } from './decideCall.ts'
import { byRule, decided, inReview, open, type SeedProposal } from './proposalData.ts'
import type { PastPayments } from './pastPayments.ts'
import { dice, type Dice } from './random.ts'
import { reviewCall } from './reviewCall.ts'
import { settleFees } from './settleFees.ts'
import { teller, type Teller } from './teller.ts'
import { tellTwoPanels } from './tellTwoPanels.ts'
import { writeProposal } from './writeProposal.ts'

const day = 86_400_000

interface Calls {
  decided: SeededCall
  inReview: SeededCall
  open: SeededCall
}

async function writeAll(
  story: Teller,
  chance: Dice,
  facility: Facility,
  call: SeededCall,
  seeds: readonly SeedProposal[],
  when: (index: number) => { begunAt: Date; sentAt: Date | null },
): Promise<{ reference: string; lead: string; sentAt: Date }[]> {
  const sent: { reference: string; lead: string; sentAt: Date }[] = []
  for (const [index, seed] of seeds.entries()) {
    const { begunAt, sentAt } = when(index)
    const raHours = culminating(call.dates.season_from)
    const reference = await writeProposal(story, chance, seed, { call, facility, raHours, begunAt, sentAt })
    if (sentAt) sent.push({ reference, lead: seed.lead, sentAt })
  }
  return sent
}

const byTitle = (seeds: readonly SeedProposal[]) => new Map(seeds.map((seed) => [seed.title, seed] as const))

/**
 * Tells what has happened at the observatory before the demonstration begins, through the product's own verbs with
 * the database's clock set back: so the past obeys every rule the present does.
 */
export async function tellStory(
  db: Database,
  world: { people: Map<string, number>; facility: Facility; calls: Calls; anchor: Date },
  services: { storage: ObjectStore; payments: PastPayments; origin: string },
): Promise<void> {
  const chance = dice(20270318)
  const story = teller(db, world.people, services, chance)
  const { calls, facility, anchor } = world
  const before = (call: SeededCall, days: number) => new Date(call.dates.closes_at.getTime() - days * day)

  for (const [call, seeds] of [
    [calls.decided, decided],
    [calls.inReview, inReview],
  ] as const) {
    const sent = await writeAll(story, chance, facility, call, seeds, (index) => ({
      begunAt: before(call, chance.between(8, 40)),
      sentAt: before(call, index === 0 ? 0.002 : chance.between(0.02, 6)),
    }))
    await settleFees(story, sent, { waits: false, leavesOneOverdue: call === calls.inReview })
  }
  await afterPayments(story, services.payments, calls)
  await reviewCall(story, chance, calls.decided, { readers: 3, finished: 1, proposals: byTitle(decided) })
  await decideCall(story, calls.decided)
  await reviewCall(story, chance, calls.inReview, { readers: 5, finished: 0.9, proposals: byTitle(inReview) })

  const ago = (days: number) => new Date(anchor.getTime() - days * day)
  const sent = await writeAll(story, chance, facility, calls.open, open, (index) => ({
    begunAt: ago(12 - index),
    sentAt: index < 3 ? ago(3 - index * 0.7) : null,
  }))
  await settleFees(story, sent, { waits: true, leavesOneOverdue: false })
  // Dice of their own: the rest of the story stays as it is.
  await writeAll(story, dice(20270319), facility, calls.open, byRule, (index) => ({
    begunAt: ago(4 - index),
    sentAt: index === 0 ? null : ago(1),
  }))
  // A teller with dice of its own, last: keys and numbers of the rest stay as they are.
  await tellTwoPanels(db, world, services)

  await db.raw('SET SESSION timestamp = DEFAULT')
  // Letters of the past were sent in the past: the inbox of the demonstration begins empty.
  await db('outbox').update({ state: 'sent', attempts: 1, sent_at: db.ref('created_at') as never })
}
