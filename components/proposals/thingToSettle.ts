import { isSpared, needOf } from '@/lib/domain/observations/rules'
import type { FeasibilityCheck } from '@/lib/domain/observations/types'
import type { ReadProposal } from '@/lib/domain/proposals/readProposal'
import type { Missing } from '@/lib/domain/proposals/sections/finding'

export type ThingToSettle =
  | {
      kind: 'check'
      verdict: 'not-feasible' | 'marginal'
      target: string
      check: FeasibilityCheck
      observationId: number
    }
  | { kind: 'missing'; missing: Missing; others: number }
  | { kind: 'nothing' }

/** The one thing worth doing next: a verdict that harms the whole, against a required target first, then what is missing, then a doubt. */
export function thingToSettle({ contents, computation, sections }: ReadProposal): ThingToSettle {
  const needs = { required: 0, shared: 1, optional: 2, backup: 3 }
  const isHarmless = (targetId: number, { verdict }: FeasibilityCheck) =>
    isSpared({ targetId, verdict }, contents, computation)
  const found = computation.observations
    .flatMap((observation) => {
      const target = contents.targets.find(({ id }) => id === observation.targetId)
      return target
        ? observation.checks.map((check) => ({ check, target, observationId: observation.observationId }))
        : []
    })
    .sort((a, b) => needs[needOf(a.target, contents.groups)] - needs[needOf(b.target, contents.groups)])
  const asThing = (verdict: 'not-feasible' | 'marginal'): ThingToSettle | null => {
    const first = found.find(
      ({ check, target }) => check.verdict === verdict && !isHarmless(target.id, check),
    )
    return first
      ? {
          kind: 'check',
          verdict,
          target: first.target.name,
          check: first.check,
          observationId: first.observationId,
        }
      : null
  }
  const isAnswered = contents.sectionsDone.includes('feasibility')
  const failing = isAnswered ? null : asThing('not-feasible')
  if (failing) return failing
  const missing = sections.flatMap((section) => section.missing)
  const first = missing[0]
  if (first) return { kind: 'missing', missing: first, others: missing.length - 1 }
  return (isAnswered ? null : asThing('marginal')) ?? { kind: 'nothing' }
}
