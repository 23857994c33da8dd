import type { ReactNode } from 'react'

/** A ruled list in two columns: the question at the left, its entries at the right (`LedgerGroup`, `LedgerRow`). */
export function LedgerList({ children }: { children: ReactNode }) {
  return <div className="border-b-[1.5px] border-ink">{children}</div>
}
