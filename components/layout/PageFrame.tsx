import type { ReactNode } from 'react'
import { classNames } from '@/components/ui/classNames'
import { Footer } from './Footer'

export interface PageFrameProps {
  /** `NightBand`. */
  band: ReactNode
  /** `SiteHeader`. */
  header: ReactNode
  /** `RequestStrip`, on pages of a proposal. */
  strip?: ReactNode
  /** `SectionLinks`, on pages of a section. */
  sections?: ReactNode
  caution?: string
  /** From edge to edge, for the reviewer's desk. */
  bare?: boolean
  children: ReactNode
}

/** Every page: night band, head, strip, links, the page itself, the caution. */
export function PageFrame({
  band,
  header,
  strip,
  sections,
  caution,
  bare = false,
  children,
}: PageFrameProps) {
  return (
    <div className="flex min-h-screen flex-col">
      {band}
      {header}
      {strip}
      {sections}
      <main id="main" tabIndex={-1} className={classNames('grow', !bare && 'px-gutter pt-9 max-sm:pt-6')}>
        {children}
      </main>
      <Footer caution={caution} />
    </div>
  )
}
