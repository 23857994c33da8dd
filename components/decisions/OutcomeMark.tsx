import type { Outcome } from '@/lib/domain/decisions/rules'

const tones: Record<Outcome, string> = {
  awarded: 'font-semibold text-feasible',
  reserve: 'font-semibold text-marginal',
  declined: 'font-semibold text-muted',
}

/** The word of a decision: awarded, reserve, declined. */
export function OutcomeMark({ outcome }: { outcome: Outcome }) {
  return <span className={tones[outcome]}>{outcome}</span>
}
