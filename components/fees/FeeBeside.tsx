import type { ReactNode } from 'react'

/** A table with the fee that is open: beside it, and on small screens before it, where whoever opened it looks. */
export function FeeBeside({ fee, children }: { fee: ReactNode; children: ReactNode }) {
  return (
    <div className="grid gap-x-10 gap-y-10 lg:grid-cols-[minmax(0,1fr)_24rem]">
      <div className="min-w-0">{children}</div>
      <aside className="min-w-0 max-lg:order-first">{fee}</aside>
    </div>
  )
}
