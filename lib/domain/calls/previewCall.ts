import { authorize } from '@/lib/auth/authorize'
import type { Context } from '../context'
import { mayManageCalls } from './policy'
import { readCall, type CallView } from './readCall'

/** A call as everyone reads it, or will once it is open: a planned one is shown at the moment it opens. */
export async function previewCall(
  ctx: Context,
  slug: string,
): Promise<{ view: CallView; isPlanned: boolean }> {
  authorize(mayManageCalls(ctx.actor))
  const view = await readCall(ctx, slug)
  const isPlanned = view.phase === 'planned'
  return { view: isPlanned ? { ...view, phase: 'open', now: view.call.opensAt } : view, isPlanned }
}
