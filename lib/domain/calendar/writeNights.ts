import { awardedByTelescope, type CallTelescope } from '@/db/queries/callTelescopes'
import { siteRecordAt } from '@/db/queries/facility'
import { deleteNightBlocks, insertNightBlocks, nightBlocksOf } from '@/db/queries/nightBlocks'
import type { CallsRow } from '@/db/tables'
import { standingHalves } from '@/db/queries/visits'
import { refuse } from '@/lib/errors'
import { formatCalendarDate, formatHoursFromSeconds } from '@/lib/format'
import { darkSeconds } from '@/lib/science/sky'
import type { NightBlock } from '../calls/nightBlock'
import type { Context } from '../context'
import { refuseOfferedTwice } from './refuseOfferedTwice'
import { visitInTheWay } from '../visits/visitInTheWay'
import type { NightPart } from './types'

interface Change {
  call: Pick<CallsRow, 'id' | 'site_id' | 'season_from'>
  telescope: CallTelescope
  /** Evenings with what each becomes. */
  nights: ReadonlyMap<string, readonly NightPart[]>
  mayTakePromised: boolean
  /** Where a refusal of a night is shown: the field it was typed in. */
  field: 'from' | 'text'
}

const secondsOf = (blocks: readonly NightBlock[], useFor: NightBlock['useFor']) =>
  blocks.reduce((sum, block) => sum + (block.useFor === useFor ? block.darkSeconds : 0), 0)

export interface NightsWritten {
  before: NightBlock[]
  after: NightBlock[]
}

/**
 * Writes what some nights of a telescope are for, dark time computed from the real sky. What is awarded cannot be
 * taken, what is promised only when those it was promised to agree, and what another call offers not at all.
 */
export async function writeNights(tx: Context, change: Change): Promise<NightsWritten> {
  const { call, telescope, nights } = change
  const site = await siteRecordAt(tx.db, call.site_id, call.season_from)
  const all = await nightBlocksOf(tx.db, call.id, telescope.id)
  const before = all.filter(({ eveningDate }) => nights.has(eveningDate))
  const after = [...nights].flatMap(([eveningDate, parts]) =>
    parts.map((part): NightBlock => ({
      ...part,
      telescopeId: telescope.id,
      eveningDate,
      darkSeconds: darkSeconds({ site, date: eveningDate, from: part.from, to: part.to }),
    })),
  )
  await refuseOfferedTwice(tx, {
    callId: call.id,
    telescopes: [telescope],
    blocks: after,
    field: change.field,
    before: change.field === 'text' ? 'Nothing was taken. ' : '',
  })
  const offered = secondsOf(all, 'science') - secondsOf(before, 'science') + secondsOf(after, 'science')
  const awarded = (await awardedByTelescope(tx.db, call.id)).get(telescope.id) ?? 0
  if (offered < awarded)
    throw refuse.invalid(
      `${telescope.name} would offer ${formatHoursFromSeconds(offered)} for science, and ${formatHoursFromSeconds(awarded)} are awarded. Nothing was changed.`,
    )
  // Parts are rounded each for itself: a minute less is none.
  const taken = secondsOf(before, 'promised') - secondsOf(after, 'promised')
  if (taken > 60 && !change.mayTakePromised)
    throw refuse.field(
      'mayTakePromised',
      `This takes ${formatHoursFromSeconds(taken)} of ${telescope.name} from time that is promised. Tick this if those it was promised to agree.`,
    )
  const visited = visitInTheWay(
    (await standingHalves(tx.db, call.id)).filter(
      ({ telescopeId, date }) => telescopeId === telescope.id && nights.has(date),
    ),
    after,
  )
  if (visited)
    throw refuse.invalid(
      `The ${visited.half} half of the night of ${formatCalendarDate(visited.date)} on ${telescope.name} is given to a visit. Nothing was changed.`,
    )
  await deleteNightBlocks(tx.db, call.id, telescope.id, [...nights.keys()])
  await insertNightBlocks(tx.db, call.id, after)
  return { before, after }
}
