export interface ProgressBarProps {
  /** From 0 to 1. */
  share: number
  /** Names the work for screen readers: `Sending quads-v6.pdf`. */
  label: string
  /** How far it is in words, where per cent say less: `3.2 MB of 12.4 MB sent`. */
  valueText?: string
}

/** How far a long work has got, as a 6 px bar. */
export function ProgressBar({ share, label, valueText }: ProgressBarProps) {
  const percent = Math.round(Math.min(1, Math.max(0, share)) * 100)
  return (
    <div
      role="progressbar"
      aria-label={label}
      aria-valuemin={0}
      aria-valuemax={100}
      aria-valuenow={percent}
      aria-valuetext={valueText}
      className="h-1.5 w-full bg-rule"
    >
      <div className="h-full bg-accent transition-[width] duration-move" style={{ width: `${percent}%` }} />
    </div>
  )
}
