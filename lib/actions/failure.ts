import 'server-only'
import { asRefusal } from '@/lib/http/asRefusal'
import { log } from '@/lib/log'
import type { ActionResult } from './result'

/** An expected failure in words; anything else is logged and shown by its reference number alone. */
export function failure(error: unknown, action: string, requestId: string): ActionResult<never> {
  const refusal = asRefusal(error)
  if (refusal) {
    log.info({ action, requestId, refusal: refusal.kind }, 'action refused')
    return {
      ok: false,
      kind: refusal.kind,
      message: refusal.message,
      fieldErrors: { ...refusal.fieldErrors },
      ...(refusal.stale ? { stale: refusal.stale } : {}),
    }
  }
  log.error({ err: error, action, requestId }, 'action failed')
  return {
    ok: false,
    kind: 'unexpected',
    message: 'Something failed on our side. What you typed is still here.',
    fieldErrors: {},
    reference: requestId,
  }
}
