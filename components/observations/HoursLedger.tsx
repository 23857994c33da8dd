import type { HoursHangOn } from '@/lib/domain/observations/rules'
import type { ObservationComputation } from '@/lib/domain/observations/types'
import { formatHoursFromSeconds, formatList } from '@/lib/format'

function flipSentence({ own, cosmologies, errors }: HoursHangOn, askedSeconds: number): string {
  const flipped = cosmologies.filter(({ verdict }) => verdict !== own.verdict).map(({ name }) => name)
  const byCosmology =
    cosmologies.length === 0
      ? 'Not by cosmology: the brightness was observed.'
      : flipped.length === 0
        ? 'Not by cosmology: the verdict is the same under every current one.'
        : `By cosmology: another verdict under ${formatList(flipped)}.`
  if (errors.length === 0) return `${byCosmology} The target states no errors to try.`
  const drawn = errors.find(({ tried, flips }) => tried > 2 && flips > 0)
  const share = drawn ? ` The verdict is another one in ${drawn.flips} of ${drawn.tried} draws.` : ''
  const over = errors.filter(({ high }) => high === null || high > askedSeconds)
  const worst = over.at(-1)
  if (!worst)
    return `${byCosmology} Nor by the errors of the target: all of them fit in the hours asked.${share}`
  const reach = worst.high === null ? 'is not reached at all' : `needs ${formatHoursFromSeconds(worst.high)}`
  return `${byCosmology} By the target: at the far end of ${worst.name} it ${reach}.${share}`
}

export interface HoursLedgerProps {
  hangOn: HoursHangOn
  computed: ObservationComputation
  askedSeconds: number
  /** What would have to move, or could be spared; empty when nothing of the kind helps. */
  moves: readonly string[]
}

/** Three questions under the charts: does the verdict flip, what would have to move, what do better nights bring. */
export function HoursLedger({ hangOn, computed, askedSeconds, moves }: HoursLedgerProps) {
  const conditions = hangOn.conditions.map(({ name, seconds }) =>
    seconds === null ? `out of reach at ${name}` : `${formatHoursFromSeconds(seconds)} at ${name}`,
  )
  const rows = [
    { term: 'Does the verdict flip?', words: flipSentence(hangOn, askedSeconds) },
    {
      term: computed.verdict === 'feasible' ? 'What could be spared' : 'What would have to move',
      words:
        moves.length > 0
          ? moves.join(' ')
          : 'Nothing: no other mode, Moon or target on offer here shortens it.',
    },
    { term: 'Conditions', words: `${conditions.join(', ')}.` },
  ]
  return (
    <dl className="m-0 mt-8 border-b border-rule text-table">
      {rows.map(({ term, words }) => (
        <div key={term} className="grid gap-x-8 border-t border-rule py-3 md:grid-cols-[13rem_minmax(0,1fr)]">
          <dt className="font-semibold">{term}</dt>
          <dd className="m-0">{words}</dd>
        </div>
      ))}
    </dl>
  )
}
