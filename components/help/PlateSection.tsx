import { useId, type ReactNode } from 'react'

export interface PlateSectionProps {
  title: string
  children: ReactNode
}

/** One row of the plate: what it is about at the left, the signs themselves at the right. */
export function PlateSection({ title, children }: PlateSectionProps) {
  const id = useId()
  return (
    <section aria-labelledby={id} className="grid rule-open lg:grid-cols-[9.25rem_minmax(0,1fr)]">
      <h2 id={id} className="py-4 pr-4 text-body font-semibold">
        {title}
      </h2>
      <div className="min-w-0 pb-8 lg:border-l lg:border-rule lg:py-4 lg:pl-7">{children}</div>
    </section>
  )
}
