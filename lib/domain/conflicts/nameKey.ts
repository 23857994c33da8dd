import { createHash } from 'node:crypto'

/**
 * What stands for a name in the form. It depends on the call and the person alone: order, spacing and value
 * tell nothing of the proposals the name stands on.
 */
export function nameKey(callId: number, identity: string): string {
  return `n${createHash('sha256').update(`${callId}|${identity}`).digest('hex').slice(0, 16)}`
}
