import type { ReactNode } from 'react'
import { Panel } from '@/components/ui/Panel'

/** A letter is on its way: the same words whether or not the address has an account. */
export function LetterSent({ to, children }: { to: string; children: ReactNode }) {
  return (
    <Panel bar="feasible" title="A letter is on its way">
      <p role="status">
        We wrote to <strong className="font-semibold">{to}</strong>. {children}
      </p>
      <p className="mt-2 text-table text-muted">
        Nothing after ten minutes? Look among the unwanted mail, or try again.
      </p>
    </Panel>
  )
}
