import type { ActingContext } from '../context'
import { changeCall } from './changeCall'
import { closingOf } from './changes'

/** Closes an open call now, before its date. */
export function closeCall(ctx: ActingContext, input: { slug: string; version: number }): Promise<void> {
  return changeCall(ctx, { action: 'call.close', ...input, decide: closingOf })
}
