import type { ReactNode } from 'react'

/** The page itself, between head and foot; every page returns one. `bare` goes from edge to edge. */
export function Main({ bare = false, children }: { bare?: boolean; children: ReactNode }) {
  return (
    <main id="main" tabIndex={-1} className={bare ? 'grow' : 'grow px-gutter pt-9 max-sm:pt-6'}>
      {children}
    </main>
  )
}
