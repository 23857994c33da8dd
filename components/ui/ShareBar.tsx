export interface ShareBarPart {
  label: string
  value: string
  /** The size of the part, in any unit all parts share. */
  amount: number
  colour: 'feasible' | 'accent' | 'lamp' | 'edge'
}

/**
 * Parts of a whole as one bar with the numbers under it: fees paid, waived, owed. On phones a bar each, against the
 * largest.
 */
export function ShareBar({ parts, label }: { parts: readonly ShareBarPart[]; label: string }) {
  const shown = parts.filter((part) => part.amount > 0)
  const most = Math.max(...shown.map((part) => part.amount))
  return (
    <dl aria-label={label} className="m-0 flex gap-0.5 max-sm:flex-col max-sm:gap-3">
      {shown.map((part) => (
        <div key={part.label} className="min-w-max" style={{ flexGrow: part.amount, flexBasis: 0 }}>
          <div
            aria-hidden="true"
            className="h-5 max-sm:w-(--share)"
            style={{
              background: `var(--${part.colour})`,
              ['--share' as string]: `${(100 * part.amount) / most}%`,
            }}
          />
          <dd className="m-0 mt-1 pr-3 text-strip font-semibold">{part.value}</dd>
          <dt className="pr-3 text-caption text-muted">{part.label}</dt>
        </div>
      ))}
    </dl>
  )
}
