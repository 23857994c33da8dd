import type { ActingContext } from '../context'
import { changeCall } from './changeCall'
import { openingOf } from './changes'

/** Opens a planned call for proposals from this second on. */
export function openCall(ctx: ActingContext, input: { slug: string; version: number }): Promise<void> {
  return changeCall(ctx, { action: 'call.open', ...input, decide: openingOf })
}
