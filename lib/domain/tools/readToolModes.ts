import { retirementDates } from '@/db/queries/retirements'
import { readCurrentCall } from '../calls/readCall'
import type { Context } from '../context'
import type { ModeRecord, SiteRecord } from '../facility/types'

/** The modes a tool computes with: those of the call that is on now, or was last, that are not retired today. */
export async function readToolModes(ctx: Context): Promise<{ site: SiteRecord; modes: ModeRecord[] } | null> {
  const view = await readCurrentCall(ctx)
  if (!view) return null
  const today = view.now.toISOString().slice(0, 10)
  const dates = await retirementDates(ctx.db, 'mode')
  return {
    site: view.site,
    modes: view.modes.filter(({ modeId }) => (dates.get(modeId) ?? '9999') > today),
  }
}
