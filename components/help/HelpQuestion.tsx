import type { ReactNode } from 'react'

/** A question and its short answer, as an entry of a ledger. */
export function HelpQuestion({ question, children }: { question: string; children: ReactNode }) {
  return (
    <section className="border-t border-rule py-3 pl-6 first:border-t-0 max-sm:pl-0">
      <h3 className="text-body font-semibold">{question}</h3>
      <p className="mt-1 max-w-prose text-body text-muted">{children}</p>
    </section>
  )
}
