import { panelsOfCall } from '@/db/queries/approvals'
import { offeredTime } from '@/db/queries/panel'
import type { Database } from '@/db/client'
import { offeredByTelescope } from '../rankings/offered'
import { panelLists } from './panelLists'
import { sharedTime } from './sharedTime'

/** Seconds a panel may rank into, by telescope: its share where the call has several panels, else all on offer. */
export async function panelOffer(
  db: Database,
  callId: number,
  panelId: number,
): Promise<Map<number, number>> {
  const panels = await panelsOfCall(db, callId)
  if (panels.length < 2) return offeredByTelescope(await offeredTime(db, callId))
  const { shares } = await sharedTime(db, callId, await panelLists(db, panels))
  return new Map(
    shares.filter(({ panel }) => panel === panelId).map(({ pool, seconds }) => [pool, seconds] as const),
  )
}
