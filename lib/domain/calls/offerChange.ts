import { countInWords } from '@/lib/format'

export interface OfferMode {
  id: number
  name: string
  isOffered: boolean
  /** Proposals of the call that observe with it. */
  proposals: number
}

export interface OfferChange {
  add: number[]
  remove: number[]
  /** Why it cannot be; null when it can. */
  problem: string | null
}

function problemOf(modes: readonly OfferMode[], remove: readonly OfferMode[], wanted: readonly number[]) {
  if (wanted.length === 0) return 'A call offers one mode at least.'
  const known = new Set(modes.map(({ id }) => id))
  if (!wanted.every((id) => known.has(id)))
    return 'One of these modes is not at the site of the call, or is retired.'
  const needed = remove.find(({ proposals }) => proposals > 0)
  if (!needed) return null
  const verb = needed.proposals === 1 ? 'observes' : 'observe'
  const proposals = countInWords(needed.proposals, 'proposal')
  return `${needed.name} stays on offer: ${proposals} of this call ${verb} with it.`
}

/** What changes between what a call offers and what it is to offer. A mode that proposals observe with stays. */
export function offerChange(modes: readonly OfferMode[], wanted: readonly number[]): OfferChange {
  const add = modes.filter((mode) => !mode.isOffered && wanted.includes(mode.id))
  const remove = modes.filter((mode) => mode.isOffered && !wanted.includes(mode.id))
  return {
    add: add.map(({ id }) => id),
    remove: remove.map(({ id }) => id),
    problem: problemOf(modes, remove, wanted),
  }
}
