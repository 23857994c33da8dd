import type { Metadata } from 'next'
import { OfficeDecisions } from '@/components/decisions/OfficeDecisions'
import { Main } from '@/components/layout/Main'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readOfficeDecisions } from '@/lib/domain/decisions/readOfficeDecisions'
import { paths } from '@/lib/paths'
import { approveAsOfficeAction, openAsOfficeAction } from './actions'

export const metadata: Metadata = { title: 'Decisions' }

export default async function OfficeDecisionsPage({ params }: { params: Promise<{ slug: string }> }) {
  const ctx = await openPage('/office/calls/[slug]/decisions')
  const { slug } = await params
  const view = await orNotFound(readOfficeDecisions(ctx, slug))
  return (
    <Main>
      <Breadcrumb
        steps={[
          { label: 'Calls', href: paths.office('calls') },
          { label: `Call ${view.callNumber}`, href: paths.officeCall(slug) },
          { label: 'Decisions' },
        ]}
      />
      <OfficeDecisions initial={view} approve={approveAsOfficeAction} openDecision={openAsOfficeAction} />
    </Main>
  )
}
