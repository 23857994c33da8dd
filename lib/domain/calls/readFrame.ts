import { listCalls } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import { siteRecordAt } from '@/db/queries/facility'
import type { Role } from '../actor'
import type { Context } from '../context'
import type { SiteRecord } from '../facility/types'
import { nextDeadline, type Deadline } from './nextDeadline'

export interface Frame {
  now: Date
  site: SiteRecord | null
  next: Deadline | null
  /** Slug of the call whose panel is at work, else of the newest one. */
  panelCall: string | null
}

/** What stands around every page: tonight's site, the next date, the panel's call. */
export async function readFrame(ctx: Context, role: Role | null): Promise<Frame> {
  const [now, calls] = await Promise.all([databaseNow(ctx.db), listCalls(ctx.db)])
  const newest = calls[0]
  const site = newest ? await siteRecordAt(ctx.db, newest.siteId, now.toISOString().slice(0, 10)) : null
  const atWork = calls.find((call) => call.stage === 'review' || call.stage === 'ranking')
  const sits = (callId: number) =>
    ctx.actor?.grants.some((g) => g.role === 'chair' && (g.callId === null || g.callId === callId)) ?? false
  const own =
    calls.find((call) => call.id === atWork?.id && sits(call.id)) ?? calls.find((call) => sits(call.id))
  return { now, site, next: nextDeadline(calls, role, now), panelCall: own?.slug ?? null }
}
