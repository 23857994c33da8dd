import { Check } from 'lucide-react'
import type { ReactNode } from 'react'

/** A value as it was understood, under its field: a tick and the parsed form. */
export function ReadBack({ children }: { children: ReactNode }) {
  return (
    <span className="mt-1 flex items-center gap-1.5 text-caption">
      <Check size={14} strokeWidth={2.5} className="shrink-0 text-feasible" aria-hidden="true" />
      {children}
    </span>
  )
}
