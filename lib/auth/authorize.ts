import { refuse } from '../errors'
import type { Decision } from './decision'

/** Goes on when a policy says yes; otherwise throws its named no as a refusal. */
export function authorize(decision: Decision): void {
  if (decision.allowed) return
  if (decision.because === 'unseen') throw refuse.notFound(decision.sentence)
  if (decision.because === 'window') throw refuse.closed(decision.sentence)
  throw refuse.forbidden(decision.sentence)
}
