import type { ReactNode } from 'react'

export interface TwoColumnsProps {
  children: ReactNode
  side: ReactNode
}

/** Main column and a side of 384 px; below a laptop's width the side comes after. */
export function TwoColumns({ children, side }: TwoColumnsProps) {
  return (
    <div className="grid gap-x-16 gap-y-10 lg:grid-cols-[minmax(0,1fr)_24rem]">
      <div className="min-w-0">{children}</div>
      <aside className="flex min-w-0 flex-col gap-8">{side}</aside>
    </div>
  )
}
