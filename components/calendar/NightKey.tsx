const hatched = 'repeating-linear-gradient(45deg, var(--edge) 0 1.5px, transparent 1.5px 5px)'

const entries = [
  { words: 'science in this call, with the initial of a mounted instrument', look: 'bg-accent' },
  { words: 'engineering', look: 'border border-edge', style: { background: hatched } },
  { words: 'promised before', look: 'border border-edge bg-tint' },
  { words: 'science in another call: a line below', look: 'border-b-4 border-lamp' },
  { words: 'for nothing', look: 'border border-dashed border-edge' },
] as const

/** What the marks of the calendar mean. */
export function NightKey() {
  return (
    <ul className="plain-list mt-3 flex flex-wrap gap-x-6 gap-y-1 text-caption text-muted">
      {entries.map((entry) => (
        <li key={entry.words} className="flex items-center gap-2">
          <span
            aria-hidden="true"
            className={`inline-block h-4 w-7 ${entry.look}`}
            style={'style' in entry ? entry.style : undefined}
          />
          {entry.words}
        </li>
      ))}
      <li>The bar above a night: how much of the Moon is lit.</li>
    </ul>
  )
}
