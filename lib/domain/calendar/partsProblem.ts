import type { NightUse } from '../calls/nightUseList'
import type { NightPart } from './types'

const useWords: Readonly<Record<NightUse, string>> = {
  science: 'science',
  engineering: 'engineering',
  promised: 'time promised',
}

const plain = (fraction: number) => String(Math.round(fraction * 1000) / 1000)
const span = ({ from, to, useFor }: NightPart) => `${plain(from)} to ${plain(to)} for ${useWords[useFor]}`

/** Thousandths are what the calendar keeps. */
const isFraction = (value: number) =>
  value >= 0 && value <= 1 && Math.abs(value * 1000 - Math.round(value * 1000)) < 1e-6

/** Why a night cannot be divided like this, in a sentence; null when it can. */
export function partsProblem(
  parts: readonly NightPart[],
  instruments: readonly { id: number }[],
): string | null {
  const odd = parts.find(({ from, to }) => !isFraction(from) || !isFraction(to))
  if (odd) return 'Parts of a night are fractions from 0 to 1, with at most three decimals.'
  const empty = parts.find(({ from, to }) => from >= to)
  if (empty) return `A part must end after it begins: ${span(empty)} does not.`
  const foreign = parts.find(
    ({ instrumentId }) => instrumentId !== null && !instruments.some(({ id }) => id === instrumentId),
  )
  if (foreign) return 'This instrument is not on this telescope.'
  const ordered = parts.toSorted((a, b) => a.from - b.from)
  for (const [index, part] of ordered.entries()) {
    const next = ordered[index + 1]
    if (next && next.from < part.to) return `Two parts of a night overlap: ${span(part)}, and ${span(next)}.`
  }
  return null
}
