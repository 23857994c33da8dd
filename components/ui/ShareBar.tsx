export interface ShareBarPart {
  label: string
  value: string
  /** The size of the part, in any unit all parts share. */
  amount: number
  colour: 'feasible' | 'accent' | 'lamp' | 'edge'
}

/** Parts of a whole as one bar with the numbers under it: fees paid, waived, owed. */
export function ShareBar({ parts, label }: { parts: readonly ShareBarPart[]; label: string }) {
  const shown = parts.filter((part) => part.amount > 0)
  return (
    <dl aria-label={label} className="m-0 flex gap-0.5 max-sm:flex-col">
      {shown.map((part) => (
        <div key={part.label} className="min-w-max" style={{ flexGrow: part.amount, flexBasis: 0 }}>
          <div aria-hidden="true" className="h-5" style={{ background: `var(--${part.colour})` }} />
          <dd className="m-0 mt-1 text-strip font-semibold">{part.value}</dd>
          <dt className="text-caption text-muted">{part.label}</dt>
        </div>
      ))}
    </dl>
  )
}
