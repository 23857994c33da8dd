import { seriesDashes, type SeriesTone } from './geometry/chartTypes'

/** A piece of a series' line, beside its name. */
export function SeriesSwatch({ tone }: { tone: SeriesTone }) {
  return (
    <svg width="28" height="10" viewBox="0 0 28 10" className="shrink-0" aria-hidden="true" focusable="false">
      <path d="M0 5H28" stroke={`var(--${tone})`} strokeWidth="2.5" strokeDasharray={seriesDashes[tone]} />
    </svg>
  )
}
