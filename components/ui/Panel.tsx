import type { ReactNode } from 'react'
import { classNames } from './classNames'

export type PanelBar = 'lamp' | 'accent' | 'feasible' | 'marginal' | 'not-feasible'

const bars: Record<PanelBar, string> = {
  lamp: 'border-t-lamp',
  accent: 'border-t-accent',
  feasible: 'border-t-feasible',
  marginal: 'border-t-marginal',
  'not-feasible': 'border-t-not-feasible',
}

export interface PanelProps {
  /** The colour of the 4 px top bar: what wants action (lamp), is chosen (accent), or is an assessment. */
  bar: PanelBar
  title?: string
  /** Small muted words at the right of the title. */
  aside?: ReactNode
  children: ReactNode
}

/** The one panel of a view that wants action, is chosen, or is the assessment. Everything else is ruled, not boxed. */
export function Panel({ bar, title, aside, children }: PanelProps) {
  return (
    <section
      className={classNames('rounded-b border border-t-4 border-rule bg-surface p-6 max-sm:p-4', bars[bar])}
      aria-label={title}
    >
      {title ? (
        <div className="mb-3 flex items-baseline justify-between gap-4">
          <h2 className="text-section">{title}</h2>
          {aside ? <span className="text-caption text-muted">{aside}</span> : null}
        </div>
      ) : null}
      {children}
    </section>
  )
}
