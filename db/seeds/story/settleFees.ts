import { askForWaiver } from '../../../lib/domain/fees/askForWaiver.ts'
import { confirmPayment } from '../../../lib/domain/fees/confirmPayment.ts'
import { decideWaiver } from '../../../lib/domain/fees/decideWaiver.ts'
import { startPayment } from '../../../lib/domain/fees/startPayment.ts'
import type { Teller } from './teller.ts'

const reason =
  'Our institute has no budget line for fees this year, and the grant that pays the travel excludes them.'

/** Most fees are paid the day after sending, some are waived, and a few of the open call wait. */
export async function settleFees(
  story: Teller,
  proposals: readonly { reference: string; lead: string; sentAt: Date }[],
  waits: boolean,
): Promise<void> {
  for (const [index, { reference, lead, sentAt }] of proposals.entries()) {
    await story.at(new Date(sentAt.getTime() + 3_600_000))
    const person = await story.as(lead)
    const fee = await story
      .db('fees as f')
      .join('proposals as p', 'p.id', 'f.proposal_id')
      .where('p.reference', reference)
      .first('f.id')
    if (!fee) continue
    if (waits && index % 3 === 2) continue
    if (index % 6 === 4 || (waits && index % 3 === 1)) {
      await askForWaiver(person, { reference, reason })
      if (waits) continue
      const waiver = await story.db('waivers').where({ fee_id: fee.id }).first()
      await decideWaiver(await story.as('Maud Ferrisay'), {
        waiverId: waiver?.id ?? 0,
        decision: 'granted',
        note: '',
      })
      continue
    }
    await startPayment(person, { reference })
    await confirmPayment(person, { reference })
  }
}
