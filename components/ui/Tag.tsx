import type { ReactNode } from 'react'

/** A quiet label on a thing: `Payments in test mode`, `for the chair only`. */
export function Tag({ children }: { children: ReactNode }) {
  return (
    <span className="inline-block rounded border border-edge px-2 py-0.5 text-tick whitespace-nowrap text-muted">
      {children}
    </span>
  )
}
