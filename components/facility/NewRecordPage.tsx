import type { ReactNode } from 'react'
import { Main } from '@/components/layout/Main'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { EmptyState } from '@/components/ui/EmptyState'
import { LinkButton } from '@/components/ui/LinkButton'
import { PageTitle } from '@/components/ui/PageTitle'

export interface NewRecordPageProps {
  title: string
  lead: string
  back: { label: string; href: string }
  /** What has to be there first and is not, and where it is added, for those who may. */
  needs?: { what: string; href?: string }
  /** The form. */
  children: ReactNode
}

/** A page on which something new enters the facility. */
export function NewRecordPage({ title, lead, back, needs, children }: NewRecordPageProps) {
  return (
    <Main>
      <Breadcrumb steps={[back, { label: title }]} />
      <PageTitle title={title} lead={lead} />
      <div className="mt-8">
        {needs ? (
          <EmptyState
            title={`No ${needs.what} could carry it`}
            actions={
              needs.href ? <LinkButton href={needs.href}>{`Add a new ${needs.what}`}</LinkButton> : undefined
            }
          >
            One that is not retired comes first.
          </EmptyState>
        ) : (
          children
        )}
      </div>
    </Main>
  )
}
