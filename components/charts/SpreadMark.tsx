export interface SpreadMarkProps {
  value: number
  sigma: number
  /** The scale's ends; zero is a line. */
  domain: readonly [number, number]
  label: string
  width?: number
}

/** A value with its one-sigma bar on a scale: leniency, an offset. */
export function SpreadMark({ value, sigma, domain: [from, to], label, width = 200 }: SpreadMarkProps) {
  const x = (at: number) => ((Math.min(to, Math.max(from, at)) - from) / (to - from)) * width
  return (
    <svg role="img" aria-label={label} width={width} height="26" className="block">
      <path d={`M${x(0)} 0V26`} stroke="var(--edge)" />
      <path d={`M${x(value - sigma)} 13H${x(value + sigma)}`} stroke="var(--s3)" strokeWidth="1.5" />
      <rect x={x(value) - 1.5} y="7" width="3" height="12" fill="var(--s3)" />
    </svg>
  )
}
