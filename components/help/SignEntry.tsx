import type { ReactNode } from 'react'

export interface SignEntryProps {
  /** The sign or control as it stands on the pages. */
  sign: ReactNode
  /** What it means. */
  children: ReactNode
}

/** One sign and what it means. */
export function SignEntry({ sign, children }: SignEntryProps) {
  return (
    <div className="grid gap-x-6 gap-y-1 border-b border-rule py-2 last:border-b-0 sm:grid-cols-[12rem_1fr]">
      <div className="min-w-0">{sign}</div>
      <div className="max-w-prose text-table text-muted">{children}</div>
    </div>
  )
}
