import type { Verdict } from './types'

const order: readonly Verdict[] = ['feasible', 'marginal', 'not-feasible']

/** The worst of several verdicts; null of none. */
export function worstVerdict(verdicts: readonly Verdict[]): Verdict | null {
  return verdicts.reduce<Verdict | null>(
    (worst, verdict) => (worst === null || order.indexOf(verdict) > order.indexOf(worst) ? verdict : worst),
    null,
  )
}
