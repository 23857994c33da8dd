'use client'

import { useState } from 'react'
import type { Target } from '@/lib/domain/proposals/types'

interface Steady {
  given: readonly Target[]
  targets: Target[]
  texts: ReadonlyMap<number, string>
}

const textsOf = (targets: readonly Target[]) =>
  new Map(targets.map((target) => [target.id, JSON.stringify(target)]))

/** Targets as the page brings them, each the very object it was before while it says the same. */
export function useSteadyTargets(given: readonly Target[]): Target[] {
  const [steady, setSteady] = useState<Steady>(() => ({ given, targets: [...given], texts: textsOf(given) }))
  if (steady.given === given) return steady.targets
  const texts = textsOf(given)
  const before = new Map(steady.targets.map((target) => [target.id, target]))
  const targets = given.map((target) => {
    const old = before.get(target.id)
    return old && steady.texts.get(target.id) === texts.get(target.id) ? old : target
  })
  // While rendering, so that the new page is painted once, with what did not change left alone.
  setSteady({ given, targets, texts })
  return targets
}
