import { lockTelescopes, nightsElsewhere } from '@/db/queries/nightsElsewhere'
import { refuse } from '@/lib/errors'
import type { NightBlock } from '../calls/nightBlock'
import type { Context } from '../context'
import { offeredTwiceWords } from './offeredTwiceWords'

/** Locks the telescopes of these nights and refuses, at a field, when another call offers one of them. */
export async function refuseOfferedTwice(
  tx: Context,
  asked: {
    /** The call that is to offer them; 0 where it is being planned. */
    callId: number
    telescopes: readonly { id: number; name: string }[]
    blocks: readonly NightBlock[]
    field: string
    /** Said before the sentence. */
    before?: string
  },
): Promise<void> {
  await lockTelescopes(
    tx.db,
    asked.telescopes.map(({ id }) => id),
  )
  for (const { id, name } of asked.telescopes) {
    const own = asked.blocks.filter(({ telescopeId }) => telescopeId === id)
    const nights = own.map(({ eveningDate }) => eveningDate).sort()
    const [from, to] = [nights[0], nights.at(-1)]
    if (from === undefined || to === undefined) continue
    const elsewhere = await nightsElsewhere(tx.db, { telescopeId: id, from, to, exceptCallId: asked.callId })
    const sentence = offeredTwiceWords(name, own, elsewhere)
    if (sentence) throw refuse.field(asked.field, `${asked.before ?? ''}${sentence}`)
  }
}
