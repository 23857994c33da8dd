import { observationsOf } from '@/db/queries/observations'
import { modeRecordsOnOffer } from '@/db/queries/facility'
import { touchProposal } from '@/db/queries/proposals'
import { insertWish, updateWish, wishesOf } from '@/db/queries/wishes'
import { refuse } from '@/lib/errors'
import { formatHoursFromSeconds } from '@/lib/format'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { observationsOn } from '../nights/observationsOn'
import { openForEditing } from '../proposals/openProposal'
import { staleProposal } from '../proposals/staleProposal'
import type { ServiceWish } from '../proposals/types'
import type { SaveWishInput } from './schema'
import { wishRow } from './wishForm'

/** Says how a proposal wishes to be given time on one of its instruments: the least of use, in the queue or on a visit. */
export function saveWish(ctx: Context, input: SaveWishInput): Promise<ServiceWish> {
  return inTransaction(ctx, async (tx) => {
    const { row, subject } = await openForEditing(tx, input.reference)
    const { instrumentId, wish } = input
    const [wishes, observations, modes] = await Promise.all([
      wishesOf(tx.db, row.id),
      observationsOf(tx.db, row.id),
      modeRecordsOnOffer(tx.db, subject.call.id, subject.call.seasonFrom),
    ])
    const own = observationsOn({ observations, modes }, instrumentId)
    if (own.length === 0) throw refuse.notFound('instrument')
    const before = wishes.find((one) => one.instrumentId === instrumentId) ?? null
    if ((before?.version ?? 0) !== input.version)
      throw await staleProposal(
        tx,
        { reference: input.reference, version: before?.version ?? 0, updated_at: row.updated_at },
        wishRow(before),
      )
    const asked = own.reduce((sum, { askedSeconds }) => sum + askedSeconds, 0)
    if (wish.leastSeconds !== null && wish.leastSeconds > asked)
      throw refuse.field('wish.least', `Not more than the ${formatHoursFromSeconds(asked)} asked of it.`)
    const id = before?.id ?? (await insertWish(tx.db, row.id, instrumentId, wish))
    if (before) await updateWish(tx.db, before, wish)
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'wish.save',
      subject: { kind: 'proposal', id: input.reference },
      actingAs: 'investigator',
      before: before ? { wish: wishRow(before), instrumentId } : undefined,
      after: { wish: wishRow(wish), instrumentId },
    })
    return { id, instrumentId, ...wish, version: input.version + 1 }
  })
}
